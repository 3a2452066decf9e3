// SPDX-License-Identifier: GPL-3.0-or-later
#include "field_rig.h"

#include "ui/screen/field_map_view.h"
#include "ui/screen/histogram_view.h"

#include <QApplication>

namespace planewright {
namespace {

/// The dialog in the order of Tab, by what a screen reader says of each part.
class ScreenByKeyboard : public FieldRig {
protected:
  void SetUp() override {
    m_dialog.activateWindow();
    ASSERT_TRUE(QTest::qWaitForWindowActive(&m_dialog));
  }

  static QString nameOf(const QWidget& widget) {
    if (!widget.accessibleName().isEmpty())
      return widget.accessibleName();
    return widget.property("text").toString().remove(QLatin1Char('&'));
  }
  /// What Tab comes to until it is back at the first.
  std::string round(QWidget& first) {
    QStringList names;
    first.setFocus(Qt::TabFocusReason);
    for (int i = 0; i < 60; ++i) {
      QWidget* focused = QApplication::focusWidget();
      if (!focused || (focused == &first && i > 0))
        break;
      names << nameOf(*focused);
      QTest::keyClick(focused, Qt::Key_Tab);
    }
    return names.join(QStringLiteral("; ")).toStdString();
  }
};

TEST_F(ScreenByKeyboard, tabGoesThroughTheSetupAsItIsRead) {
  m_dialog.setup().setTable(written("point,case,sx,sy,txy\na,G,1,0,0\na,S,1,0,0\n"));
  auto* path = m_dialog.setup().findChild<QLineEdit*>();
  ASSERT_TRUE(path);
  EXPECT_EQ(round(*path),
            "File of the table; Choose…; meaning of column 1; meaning of column 2; meaning of column 3; "
            "meaning of column 4; meaning of column 5; start of the table; Point whose checks judge; "
            "Points and regions to leave out; Leave faulty rows out; Screen");
}

TEST_F(ScreenByKeyboard, tabGoesThroughTheResultsAsTheyAreRead) {
  screen(mesh());
  EXPECT_EQ(QApplication::focusWidget(), &page().table());
  EXPECT_EQ(
      round(page().text()),
      "Filter by name or region; Filter by the least utilisation; exceeding only; Filter by combination; "
      "Points of the field; Map, bars and notes; Map of the field by utilisation; Screen another…; "
      "Save results…; Open as a point");
  QTest::keyClick(&m_dialog, Qt::Key_B, Qt::AltModifier);
  EXPECT_TRUE(page().histogram().isVisible());
  QTest::keyClick(&m_dialog, Qt::Key_N, Qt::AltModifier);
  EXPECT_TRUE(page().notes().isVisible());
  QTest::keyClick(&m_dialog, Qt::Key_M, Qt::AltModifier);
  EXPECT_TRUE(page().map().isVisible());
}

} // namespace
} // namespace planewright
