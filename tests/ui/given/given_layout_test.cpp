// SPDX-License-Identifier: GPL-3.0-or-later
#include "given_fixture.h"

#include "core/study/section_edits.h"
#include "ui/entry/complaint.h"
#include "ui/look/look.h"

#include <QImage>
#include <QPlainTextEdit>

#include <cmath>

namespace planewright {
namespace {

/// Visible widgets that show something of their own, and where they stand on the content.
QList<std::pair<QWidget*, QRect>> pieces(GivenPanel& panel) {
  QList<std::pair<QWidget*, QRect>> result;
  QWidget* content = panel.widget();
  for (QWidget* widget : content->findChildren<QWidget*>()) {
    const bool shows = qobject_cast<QLabel*>(widget) || qobject_cast<QLineEdit*>(widget) ||
                       qobject_cast<QAbstractButton*>(widget) || qobject_cast<Complaint*>(widget) ||
                       qobject_cast<QPlainTextEdit*>(widget);
    if (shows && widget->isVisibleTo(content))
      result += {widget, QRect(widget->mapTo(content, QPoint()), widget->size())};
  }
  return result;
}

std::string nameOf(const QWidget* widget) {
  const auto* label = qobject_cast<const QLabel*>(widget);
  return (label ? label->text() : widget->accessibleName()).toStdString() + " (" +
         widget->metaObject()->className() + ")";
}

void expectDisjoint(GivenPanel& panel) {
  const auto all = pieces(panel);
  const QRect content = panel.widget()->rect();
  for (qsizetype i = 0; i < all.size(); ++i) {
    EXPECT_TRUE(content.contains(all[i].second)) << nameOf(all[i].first);
    for (qsizetype j = 0; j < i; ++j)
      EXPECT_FALSE(all[i].second.intersects(all[j].second))
          << nameOf(all[i].first) << " meets " << nameOf(all[j].first);
  }
}

struct GivenLayout : GivenTest {
  GivenLayout() {
    for (const char* group : {"Conventions", "Notes", "Third direction", "Inclined axes"})
      button(group).click();
    settle();
  }
  /// Nested layouts pass a change on one level at each turn of the event loop.
  void settle() {
    for (int turn = 0; turn < 10; ++turn)
      QCoreApplication::processEvents();
  }
  QList<EntryField*> fields() { return panel.findChildren<EntryField*>(); }
  int topOf(EntryField* field) { return field->mapTo(panel.widget(), QPoint()).y(); }
};

TEST_F(GivenLayout, sourcesAndSectionsFitTheNarrowPanel) {
  const auto ask = [this](const Edits& edits) {
    const auto problem = desk.request(edits, desk.newGesture(), {});
    ASSERT_FALSE(problem) << plain(*problem);
    settle();
    EXPECT_LE(panel.widget()->width(), panel.viewport()->width());
    expectDisjoint(panel);
  };
  ask(editsThatGiveFibre(desk.study(), "P1", "a beam with a long name"));
  ask({Insert{{Spot::forces, "P1", "G"}, {}}, Type{{Spot::forceN, "P1", "G"}, "40"},
       Type{{Spot::forceMz, "P1", "G"}, "10"}});
  ask({Insert{{Spot::pressure, "P1", "G"}, {}}});
  ask({Type{{Spot::caseNature, "G", {}}, "measured"}, Insert{{Spot::rosette, "P1", "G"}, {}}});
  ask({Type{{Spot::rosetteMaterial, "P1", "G"}, "orthotropic"}});
  ask({Insert{{Spot::line, "P1", "scarf"}, {}}, Type{{Spot::freeEdge, "P1", {}}, "1 in 10"},
       Type{{Spot::shearForce, {}, {}}, "slope"}});
  for (const Named<SectionShape>& shape : namesOf<SectionShape>())
    if (shape.value != SectionShape::tabled) // it has no second moments to bend by
      ask(editsThatReshape(desk.study(), "a beam with a long name", shape.value));
}

TEST_F(GivenLayout, aWrongEntryCoversNothingAndMovesNothingAboveIt) {
  const char* longWrong = "12 kN*1,5/(90 mm*240 mm) + 17 furlongs";
  for (EntryField* wrong : fields()) {
    if (!wrong->isVisible())
      continue;
    QMap<EntryField*, int> before;
    for (EntryField* one : fields())
      before[one] = topOf(one);
    wrong->edit().setFocus();
    wrong->edit().selectAll();
    QTest::keyClicks(&wrong->edit(), longWrong);
    QTest::keyClick(&wrong->edit(), Qt::Key_Return);
    settle();
    ASSERT_FALSE(wrong->isTaken()) << wrong->name().toStdString();
    expectDisjoint(panel);
    for (EntryField* one : fields()) {
      if (one->isVisible() && before[one] <= before[wrong]) {
        EXPECT_EQ(topOf(one), before[one]) << one->name().toStdString();
      }
    }
    QTest::keyClick(&wrong->edit(), Qt::Key_Escape);
    settle();
  }
}

TEST_F(GivenLayout, nothingIsCutAtTheNarrowestWidth) {
  type("angle φ", "-1 in 12.5");
  type("± within", "1 in 100");
  settle();
  ASSERT_LE(panel.widget()->width(), 264);
  for (const auto& [widget, box] : pieces(panel)) {
    const auto* label = qobject_cast<QLabel*>(widget);
    if (label && label->wordWrap()) {
      EXPECT_GE(box.height(), label->heightForWidth(box.width())) << nameOf(widget);
    } else if (label || qobject_cast<QAbstractButton*>(widget)) {
      EXPECT_GE(box.width(), widget->sizeHint().width()) << nameOf(widget);
      EXPECT_GE(box.height(), widget->sizeHint().height()) << nameOf(widget);
    }
  }
  expectDisjoint(panel);
}

TEST_F(GivenLayout, largerTextScrollsInsteadOfMeeting) {
  panel.setFont(QFont(panel.font().family(), 15));
  panel.resize(300, 500);
  settle();
  expectDisjoint(panel);
}

/// Part of the pixels that are lighter than L* 80.
double lightPart(const QImage& image) {
  qsizetype light = 0;
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x) {
      const QColor colour = image.pixelColor(x, y);
      const auto linear = [](double c) {
        return c <= 0.04045 ? c / 12.92 : std::pow((c + 0.055) / 1.055, 2.4);
      };
      const double luminance =
          0.2126 * linear(colour.redF()) + 0.7152 * linear(colour.greenF()) + 0.0722 * linear(colour.blueF());
      light += 116 * std::cbrt(luminance) - 16 > 80 ? 1 : 0;
    }
  return static_cast<double>(light) / static_cast<double>(image.width() * image.height());
}

TEST_F(GivenLayout, darkIsDarkAllOver) {
  const QPalette before = QApplication::palette();
  QApplication::setPalette(paletteFor(Look{Palette::dark}));
  settle();
  const QImage grabbed = panel.grab().toImage();
  // Text and arrows are light; no ground is: in no cell of 24 by 24 pixels does light prevail.
  for (int y = 0; y + 24 <= grabbed.height(); y += 24)
    for (int x = 0; x + 24 <= grabbed.width(); x += 24)
      EXPECT_LT(lightPart(grabbed.copy(x, y, 24, 24)), 0.6) << x << ", " << y;
  QApplication::setPalette(before);
}

} // namespace
} // namespace planewright
