// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/figure_dialog.h"

#include "core/record/embedded_study.h"
#include "core/study/edit.h"
#include "ui/figure/figure_arrangement.h"
#include "ui/figure/figure_page.h"
#include "ui/figure/figure_sharing.h"

#include <QCheckBox>
#include <QClipboard>
#include <QComboBox>
#include <QFile>
#include <QGuiApplication>
#include <QImage>
#include <QLabel>
#include <QLineEdit>
#include <QListWidget>
#include <QMimeData>
#include <QPushButton>
#include <QRadioButton>
#include <QSettings>
#include <QTemporaryDir>
#include <QTest>

#include <gtest/gtest.h>

#include <algorithm>
#include <stdexcept>

namespace planewright {
namespace {

class Arrange : public testing::Test {
protected:
  Arrange() {
    QSettings::setDefaultFormat(QSettings::IniFormat);
    QSettings::setPath(QSettings::IniFormat, QSettings::UserScope, m_folder.path());
    QCoreApplication::setOrganizationName(QStringLiteral("planewright-tests"));
    QCoreApplication::setApplicationName(QStringLiteral("figure"));
    QSettings().clear();
    const Edits edits = {Type{{Spot::sx, "P1", "G"}, "8.4 MPa"}, Type{{Spot::txy, "P1", "G"}, "2.1 MPa"},
                         Type{{Spot::reading, "P1", ""}, "30 deg"}};
    desk.request(edits, desk.newGesture(), QString());
  }

  QString path(const char* name) const { return m_folder.filePath(QString::fromLatin1(name)); }
  QByteArray contents(const char* name) const {
    QFile file(path(name));
    return file.open(QIODevice::ReadOnly) ? file.readAll() : QByteArray();
  }

  Desk desk{newStudy()};

private:
  QTemporaryDir m_folder;
};

template <class Button>
Button& button(const QWidget& dialog, const char* words) {
  for (Button* one : dialog.findChildren<Button*>())
    if (one->text() == QString::fromUtf8(words))
      return *one;
  throw std::runtime_error(words);
}

QLineEdit& ownWidth(const QWidget& dialog) {
  for (QLineEdit* edit : dialog.findChildren<QLineEdit*>())
    if (edit->accessibleName() == QStringLiteral("Own width in mm"))
      return *edit;
  throw std::runtime_error("own width");
}

void click(QAbstractButton& one) {
  QTest::mouseClick(&one, Qt::LeftButton, {}, QPoint(8, one.height() / 2));
}

void typeWidth(const QWidget& dialog, const char* text) {
  QLineEdit& edit = ownWidth(dialog);
  edit.selectAll();
  QTest::keyClicks(&edit, QString::fromUtf8(text));
}

bool says(const QWidget& dialog, const char* words) {
  for (const QLabel* label : dialog.findChildren<QLabel*>())
    if (label->text().contains(QString::fromUtf8(words)))
      return true;
  return false;
}

TEST_F(Arrange, SavesWhatIsArrangedInEveryFormat) {
  FigureDialog dialog(desk);
  dialog.show();
  click(button<QRadioButton>(dialog, "Text column, 90 mm"));
  ASSERT_TRUE(dialog.saveTo(path("a.svg")));
  EXPECT_TRUE(contents("a.svg").contains("width=\"90mm\""));
  click(button<QRadioButton>(dialog, "PDF, lines and text"));
  ASSERT_TRUE(dialog.saveTo(path("a.pdf")));
  EXPECT_TRUE(contents("a.pdf").startsWith("%PDF-"));
  click(button<QRadioButton>(dialog, "PNG, pixels"));
  ASSERT_TRUE(dialog.saveTo(path("a.png")));
  EXPECT_EQ(QImage(path("a.png")).width(), qRound(90 / 25.4 * 300));
}

TEST_F(Arrange, FollowsTheStudy) {
  FigureDialog dialog(desk);
  dialog.show();
  ASSERT_TRUE(dialog.saveTo(path("before.svg")));
  const QImage before = dialog.findChild<FigurePage*>()->grab().toImage();
  desk.request({Type{{Spot::reading, "P1", ""}, "75 deg"}}, desk.newGesture(), QString());
  EXPECT_NE(dialog.findChild<FigurePage*>()->grab().toImage(), before);
  ASSERT_TRUE(dialog.saveTo(path("after.svg")));
  EXPECT_TRUE(contents("after.svg").contains("75.00°"));
  EXPECT_FALSE(contents("before.svg").contains("75.00°"));
}

TEST_F(Arrange, LeavesOutPartsButNeverTheConventions) {
  FigureDialog dialog(desk);
  dialog.show();
  EXPECT_FALSE(button<QCheckBox>(dialog, "Conventions").isEnabled());
  ASSERT_TRUE(dialog.saveTo(path("all.svg")));
  for (const char* part :
       {"Title", "Element in the given axes", "Element at the reading plane", "Circle", "Table of planes"})
    click(button<QCheckBox>(dialog, part));
  ASSERT_TRUE(dialog.saveTo(path("least.svg")));
  EXPECT_LT(contents("least.svg").size(), contents("all.svg").size() / 3);
  EXPECT_TRUE(contents("least.svg").contains("ension positive"));
}

TEST_F(Arrange, SaysWhatIsWrongWithAWidthAndSavesNothing) {
  FigureDialog dialog(desk);
  dialog.show();
  typeWidth(dialog, "40");
  EXPECT_TRUE(button<QRadioButton>(dialog, "Own width").isChecked());
  EXPECT_TRUE(says(dialog, "A width of 40 mm is out of range. Take a number from 90 to 400."));
  EXPECT_FALSE(button<QPushButton>(dialog, "Save").isEnabled());
  EXPECT_FALSE(dialog.saveTo(path("a.svg")));
  typeWidth(dialog, "12x");
  EXPECT_FALSE(dialog.saveTo(path("a.svg")));
  EXPECT_FALSE(QFile::exists(path("a.svg")));
  typeWidth(dialog, "12.5 cm");
  ASSERT_TRUE(dialog.saveTo(path("a.svg")));
  EXPECT_TRUE(contents("a.svg").contains("width=\"125mm\""));
}

TEST_F(Arrange, SaysWhichValuesMovedToTheTable) {
  FigureDialog dialog(desk);
  dialog.show();
  EXPECT_FALSE(says(dialog, "No room beside the drawings"));
  Edits edits;
  for (int i = 1; i <= 30; ++i) {
    const std::string name = "seam " + std::to_string(i);
    edits.push_back(Insert{{Spot::plane, "P1", name}, {}});
    edits.push_back(Type{{Spot::planeNormal, "P1", name}, std::to_string(6 * i) + " deg"});
  }
  desk.request(edits, desk.newGesture(), QString());
  click(button<QRadioButton>(dialog, "Text column, 90 mm"));
  EXPECT_TRUE(says(dialog, "No room beside the drawings"));
  EXPECT_TRUE(says(dialog, "they stand in the table."));
}

TEST_F(Arrange, OpensWithTheChoicesUsedLast) {
  {
    FigureDialog dialog(desk);
    dialog.show();
    typeWidth(dialog, "117");
    click(button<QCheckBox>(dialog, "Mono: black and greys only"));
    click(button<QRadioButton>(dialog, "PNG, pixels"));
  }
  const FigureDialog dialog(desk);
  EXPECT_TRUE(button<QRadioButton>(dialog, "Own width").isChecked());
  EXPECT_EQ(ownWidth(dialog).text(), QStringLiteral("117"));
  EXPECT_TRUE(button<QCheckBox>(dialog, "Mono: black and greys only").isChecked());
  EXPECT_TRUE(button<QRadioButton>(dialog, "PNG, pixels").isChecked());
}

TEST_F(Arrange, HasWidthsForATextColumnAndAFullPage) {
  FigureDialog dialog(desk);
  dialog.show();
  EXPECT_TRUE(button<QRadioButton>(dialog, "Full page, 160 mm").isChecked());
  for (const auto& [words, width] :
       {std::pair{"Text column, 90 mm", "width=\"90mm\""}, {"Full page, 160 mm", "width=\"160mm\""}}) {
    click(button<QRadioButton>(dialog, words));
    ASSERT_TRUE(dialog.saveTo(path("a.svg")));
    EXPECT_TRUE(contents("a.svg").contains(width));
  }
}

TEST_F(Arrange, ArrangesPartsAsAskedAndRemembersIt) {
  {
    FigureDialog dialog(desk);
    dialog.show();
    ASSERT_TRUE(dialog.saveTo(path("usual.svg")));
    auto& arrangement = *dialog.findChild<FigureArrangement*>();
    EXPECT_FALSE(button<QPushButton>(arrangement, "Earlier").isEnabled());
    button<QPushButton>(arrangement, "Later").click();
    EXPECT_EQ(arrangement.blocks(), *blocksIn("circle"));
    EXPECT_EQ(arrangement.list().currentRow(), 1) << "it goes on with the same part";
    ASSERT_TRUE(dialog.saveTo(path("first.svg")));
    EXPECT_NE(contents("first.svg"), contents("usual.svg"));
    auto* box = arrangement.findChild<QComboBox*>();
    box->setCurrentIndex(2);
    emit box->activated(2);
  }
  FigureDialog dialog(desk);
  const auto& arrangement = *dialog.findChild<FigureArrangement*>();
  EXPECT_EQ(arrangement.arrangement(), Arrangement::below);
  EXPECT_EQ(arrangement.blocks(), *blocksIn("circle"));
}

TEST_F(Arrange, SaysWhatIsWrongWithAWidthForPartsBesideOneAnother) {
  FigureDialog dialog(desk);
  dialog.show();
  auto* box = dialog.findChild<FigureArrangement*>()->findChild<QComboBox*>();
  box->setCurrentIndex(1);
  emit box->activated(1);
  EXPECT_TRUE(button<QPushButton>(dialog, "Save").isEnabled());
  click(button<QRadioButton>(dialog, "Text column, 90 mm"));
  EXPECT_TRUE(says(dialog, "Take 130 mm or more, or set them one below another."));
  EXPECT_FALSE(button<QPushButton>(dialog, "Save").isEnabled());
}

TEST_F(Arrange, OffersTheResolutionOnlyForAPng) {
  FigureDialog dialog(desk);
  dialog.show();
  const QList<QComboBox*> boxes = dialog.findChildren<QComboBox*>();
  const auto dpi = std::find_if(boxes.begin(), boxes.end(), [](const QComboBox* box) {
    return box->accessibleName() == QStringLiteral("Resolution of the PNG");
  });
  ASSERT_NE(dpi, boxes.end());
  EXPECT_FALSE((*dpi)->isEnabled());
  click(button<QRadioButton>(dialog, "PNG, pixels"));
  EXPECT_TRUE((*dpi)->isEnabled());
}

/// The study that a saved file carries; none when it says that it carries none.
std::optional<Study> restored(const QByteArray& bytes) {
  const Results<OpenedStudy> opened = openedStudy(bytes.toStdString());
  if (opened)
    return opened->study;
  EXPECT_EQ(plain(opened.error().front().what), "This file carries no study.");
  return std::nullopt;
}

constexpr const char* carrying = "Carry the study inside the file";

TEST_F(Arrange, CarriesTheStudyInEveryFormatWhenAskedTo) {
  FigureDialog dialog(desk);
  dialog.show();
  EXPECT_TRUE(button<QCheckBox>(dialog, carrying).isChecked());
  EXPECT_TRUE(says(dialog, "The whole study, with all points and notes, travels inside"));
  Study shown = desk.study();
  shown.shown = {"P1", "G"};
  for (const auto& [format, name] : {std::pair{"SVG, lines and text", "a.svg"},
                                     {"PDF, lines and text", "a.pdf"},
                                     {"PNG, pixels", "a.png"}}) {
    click(button<QRadioButton>(dialog, format));
    ASSERT_TRUE(dialog.saveTo(path(name)));
    EXPECT_EQ(restored(contents(name)), shown) << name;
    click(button<QCheckBox>(dialog, carrying));
    EXPECT_TRUE(says(dialog, "The file holds the figure alone"));
    ASSERT_TRUE(dialog.saveTo(path(name)));
    EXPECT_EQ(restored(contents(name)), std::nullopt) << name;
    click(button<QCheckBox>(dialog, carrying));
  }
}

TEST_F(Arrange, RemembersWhetherTheStudyIsCarried) {
  {
    FigureDialog dialog(desk);
    dialog.show();
    click(button<QCheckBox>(dialog, carrying));
  }
  FigureDialog dialog(desk);
  dialog.show();
  EXPECT_FALSE(button<QCheckBox>(dialog, carrying).isChecked());
}

TEST_F(Arrange, LeavesTheStudyOutForSendingOutsideThisTimeOnly) {
  FigureDialog dialog(desk);
  dialog.show();
  button<QPushButton>(dialog, "For sending outside").click();
  EXPECT_FALSE(button<QCheckBox>(dialog, carrying).isChecked());
  click(button<QRadioButton>(dialog, "Text column, 90 mm"));
  ASSERT_TRUE(dialog.saveTo(path("a.svg")));
  EXPECT_EQ(restored(contents("a.svg")), std::nullopt);
  EXPECT_TRUE(rememberedFigure(QSettings()).carriesStudy);
  dialog.hide();
  dialog.show();
  EXPECT_TRUE(button<QCheckBox>(dialog, carrying).isChecked());
  EXPECT_TRUE(button<QRadioButton>(dialog, "Text column, 90 mm").isChecked());
}

TEST_F(Arrange, SavesBesideTheStudyAndSaysWhere) {
  FigureDialog dialog(desk);
  dialog.setStudyFile(path("rafter foot.planewright"));
  dialog.show();
  QString said;
  QObject::connect(&desk, &Desk::said, &dialog, [&](const QString& message) { said = message; });
  EXPECT_TRUE(button<QPushButton>(dialog, "Save").isDefault());
  button<QPushButton>(dialog, "Save").click();
  EXPECT_TRUE(QFile::exists(path("rafter-foot-P1-G.svg")));
  EXPECT_TRUE(says(dialog, "rafter-foot-P1-G.svg, with the study inside."));
  EXPECT_TRUE(said.contains(QStringLiteral("rafter-foot-P1-G.svg")));
}

TEST_F(Arrange, SaysSoWhenTheDiskIsFull) {
  FigureDialog dialog(desk);
  const Result<void> saved = dialog.saveTo(QStringLiteral("/dev/full"));
  ASSERT_FALSE(saved);
  EXPECT_EQ(plain(saved.error().what), "This could not be written: the disk is full.");
}

TEST_F(Arrange, CopiesLinesAndPixels) {
  ASSERT_TRUE(copyFigure(desk, QString()));
  const QMimeData* mime = QGuiApplication::clipboard()->mimeData();
  EXPECT_TRUE(mime->data(QStringLiteral("image/svg+xml")).startsWith("<?xml"));
  EXPECT_TRUE(mime->data(QStringLiteral("application/pdf")).startsWith("%PDF-"));
  EXPECT_EQ(qvariant_cast<QImage>(mime->imageData()).width(), qRound(160 / 25.4 * 300));
  for (const char* type : {"image/svg+xml", "application/pdf"})
    EXPECT_EQ(restored(mime->data(QString::fromLatin1(type))), std::nullopt) << "nobody asked for it there";
}

TEST_F(Arrange, ShowsTheStartOfALongFileName) {
  FigureDialog dialog(desk);
  dialog.setStudyFile(
      path("a-study-whose-name-is-longer-than-the-field-for-the-name-of-a-figure.planewright"));
  dialog.show();
  const QList<QLineEdit*> edits = dialog.findChildren<QLineEdit*>();
  const auto name = std::ranges::find_if(
      edits, [](const QLineEdit* edit) { return edit->text().startsWith(QStringLiteral("a-study")); });
  ASSERT_NE(name, edits.end());
  EXPECT_EQ((*name)->cursorPosition(), 0);
}

TEST(PrintedWords, SayWhenTheFigureIsSmallerThanItsSize) {
  EXPECT_EQ(printedWords(1), "The figure is printed at its true size.");
  EXPECT_EQ(printedWords(0.8749),
            "The paper does not hold the figure: it is printed at 87 % of its true size.");
  EXPECT_TRUE(printedWords(0.9999).contains(QStringLiteral("99 %"))) << "never more than it is";
}

TEST_F(Arrange, ShowsTheFigureOnWhiteInADarkWindow) {
  FigureDialog dialog(desk);
  dialog.show();
  auto* page = dialog.findChild<FigurePage*>();
  const auto figure = [&] { return page->grab().toImage().copy(page->figureRect().toAlignedRect()); };
  const QImage light = figure();
  QPalette dark;
  dark.setColor(QPalette::Window, Qt::black);
  dark.setColor(QPalette::WindowText, Qt::white);
  dialog.setPalette(dark);
  EXPECT_EQ(figure(), light);
  EXPECT_EQ(light.pixelColor(light.width() - 3, light.height() / 2), QColor(Qt::white));
}

TEST_F(Arrange, NamesAFileAfterStudyPointAndCombination) {
  EXPECT_EQ(figureName(desk.readout(), QStringLiteral("/a/b/roof: 1.planewright")),
            QStringLiteral("roof-1-P1-G"));
  EXPECT_EQ(figureName(desk.readout(), QString()), QStringLiteral("figure-P1-G"));
  desk.request({Insert{{Spot::combination, "1.35 G + 1.5 S", ""}, {}}}, desk.newGesture(), QString());
  EXPECT_EQ(figureName(desk.readout(), QString()), QStringLiteral("figure-P1-1.35-G+1.5-S"));
}

} // namespace
} // namespace planewright
