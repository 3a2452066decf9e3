// SPDX-License-Identifier: GPL-3.0-or-later
#include "shell_test.h"
#include "ui/look/strip.h"
#include "ui/shell/body.h"
#include "ui/shell/change_words.h"
#include "ui/shell/filter_list.h"
#include "ui/shell/picker.h"
#include "ui/shell/status_line.h"

#include <QLabel>
#include <QLineEdit>
#include <QPushButton>
#include <QSignalSpy>
#include <QTest>
#include <QTreeWidget>

#include <algorithm>

namespace planewright {
namespace {

class ShellWords : public ShellTest {};

TEST_F(ShellWords, oneTypedTextIsToldWithWhatItWas) {
  Desk desk(newStudy());
  const Study before = desk.study();
  type(desk, Spot::lineAngle, "1 in 10");
  EXPECT_EQ(changeInWords(before, desk.study()), "Grain now 1 in 10, was 0 deg");
  EXPECT_EQ(changeInWords(desk.study(), desk.study()), "");
  type(desk, Spot::sx, "8 MPa");
  EXPECT_EQ(changeInWords(before, desk.study()), "σx now 8 MPa, grain now 1 in 10");
  type(desk, Spot::txy, "8 MPa");
  EXPECT_EQ(changeInWords(before, desk.study()), "") << "three texts changed";
  const Study three = desk.study();
  type(desk, Spot::lineTolerance, "3 deg");
  EXPECT_EQ(changeInWords(three, desk.study()), "Tolerance of the line's angle now 3 deg, was none");
  const Study turned = desk.study();
  type(desk, Spot::reading, "-84.2894068625004 deg");
  EXPECT_EQ(changeInWords(turned, desk.study()),
            QString::fromUtf8("Normal of the reading plane now −84.29°, was 0 deg"));
}

TEST_F(ShellWords, whatIsShownDoesNotCountAsAChange) {
  Desk desk(newStudy());
  Study before = desk.study();
  before.shown.point = "another";
  type(desk, Spot::sx, "8 MPa");
  EXPECT_EQ(changeInWords(before, desk.study()), "σx now 8 MPa, was 0 MPa");
}

TEST_F(ShellWords, whatIsNewIsNoChangeOfATextBefore) {
  Desk desk(newStudy());
  const Study before = desk.study();
  desk.request({Insert{{Spot::plane, "P1", "scarf"}, {}}}, desk.newGesture(), {});
  ASSERT_NE(desk.study(), before);
  EXPECT_EQ(changeInWords(before, desk.study()), "");
}

TEST_F(ShellWords, longTextsAreCut) {
  Desk desk(newStudy());
  const Study before = desk.study();
  type(desk, Spot::sx, "1 MPa + 2 MPa + 3 MPa + 4 MPa + 5 MPa + 6 MPa + 7 MPa");
  EXPECT_TRUE(changeInWords(before, desk.study()).contains(QStringLiteral("…, was 0 MPa")));
}

TEST_F(ShellWords, entriesNotTakenStayBesideEveryMessage) {
  StatusLine line(nullptr);
  line.say(QStringLiteral("Angle now 7 deg."), QStringLiteral("Undo"));
  EXPECT_EQ(line.words(), "Angle now 7 deg. Undo");
  line.setNotTaken(1, QStringLiteral("τxy of case S"));
  EXPECT_EQ(line.words(), "1 entry not taken: τxy of case S") << "it is newer";
  line.say(QStringLiteral("Saved."));
  EXPECT_EQ(line.words(), "Saved. 1 entry not taken: τxy of case S");
  line.setNotTaken(2, QStringLiteral("τxy"));
  EXPECT_EQ(line.words(), "2 entries not taken, first τxy");
  line.setNotTaken(0, {});
  EXPECT_EQ(line.words(), "Saved.");
}

TEST_F(ShellWords, aSentenceBeginsWithACapitalAndASymbolAsItIsWritten) {
  StatusLine line(nullptr);
  line.say(QStringLiteral("shape of the section."));
  EXPECT_EQ(line.words(), "Shape of the section.");
  line.say(QStringLiteral("y now 20 mm."));
  EXPECT_EQ(line.words(), "y now 20 mm.");
}

TEST_F(ShellWords, numbersAreToldWithTheDigitsThatAreRead) {
  Desk desk(newStudy());
  ASSERT_FALSE(
      desk.request({Insert{{Spot::section, "beam", {}}, {}}, Insert{{Spot::fibre, "P1", {}}, {}},
                    Type{{Spot::fibreSection, "P1", {}}, "beam"}, Type{{Spot::size, "beam", "h"}, "500 mm"},
                    Type{{Spot::fibreY, "P1", {}}, "-173.257281553398 mm"}},
                   desk.newGesture(), {}));
  const Study before = desk.study();
  type(desk, Spot::fibreY, "-100 mm");
  EXPECT_EQ(changeInWords(before, desk.study()), QString::fromUtf8("y now −100 mm, was −173.3 mm"));
  type(desk, Spot::fibreY, "-(50+50) mm");
  EXPECT_EQ(changeInWords(before, desk.study()), QString::fromUtf8("y now -(50+50) mm, was −173.3 mm"));
}

TEST_F(ShellWords, wordsOfTheUserAreNoMarkup) {
  StatusLine line(nullptr);
  line.say(QStringLiteral("a <b> & c"));
  EXPECT_EQ(line.words(), "a <b> & c");
}

TEST_F(ShellWords, aStripFollowsOnlyTheLinksOfItsSentence) {
  Strip strip(nullptr);
  int first = 0;
  int second = 0;
  strip.say(QStringLiteral("One."));
  strip.offer(QStringLiteral("Do it"), [&] { ++first; });
  strip.follow(QStringLiteral("Do it"));
  strip.say(QStringLiteral("Two."));
  strip.offer(QStringLiteral("Do it"), [&] { ++second; });
  strip.offer(QStringLiteral("Do else"), [] { FAIL(); });
  strip.follow(QStringLiteral("Do it"));
  EXPECT_EQ(first, 1);
  EXPECT_EQ(second, 1);
  EXPECT_EQ(strip.offers().size(), 2);
}

TEST_F(ShellWords, aPickerShowsAnAmpersandOfAName) {
  Picker picker(QStringLiteral("Point"), QStringLiteral("Ctrl"), nullptr);
  picker.setNameWidth(200);
  picker.show({"P1 R&D hall"}, 0);
  EXPECT_EQ(picker.findChild<QPushButton*>()->text(), "P1 R&&D hall");
  EXPECT_TRUE(picker.findChild<QPushButton*>()->shortcut().isEmpty());
}

TEST_F(ShellWords, aPickerStepsInsideItsNamesAndCounts) {
  Picker picker(QStringLiteral("Point"), QStringLiteral("Ctrl"), nullptr);
  QSignalSpy chosen(&picker, &Picker::chosen);
  picker.show({"A", "B", "C"}, 1);
  picker.next();
  picker.previous();
  ASSERT_EQ(chosen.size(), 2);
  EXPECT_EQ(chosen[0][0], "C");
  EXPECT_EQ(chosen[1][0], "A");
  picker.show({"A"}, 0);
  picker.next();
  picker.previous();
  EXPECT_EQ(chosen.size(), 2);
  const QList<QLabel*> labels = picker.findChildren<QLabel*>();
  EXPECT_TRUE(std::ranges::any_of(labels, [](const QLabel* label) { return label->text() == "1 of 1"; }));
}

TEST_F(ShellWords, typingFiltersTheListAndEnterChooses) {
  FilterList list({"1.35 G", "1.35 G + 1.5 S", "1.35 G + 1.5 W"}, {}, QStringLiteral("1.35 G"), nullptr);
  QSignalSpy chosen(&list, &FilterList::chosen);
  QTest::keyClicks(&list.filter(), QStringLiteral("1.5 w"));
  EXPECT_TRUE(list.list().topLevelItem(0)->isHidden());
  EXPECT_FALSE(list.list().topLevelItem(2)->isHidden());
  list.setAttribute(Qt::WA_DeleteOnClose, false);
  QTest::keyClick(&list.filter(), Qt::Key_Return);
  ASSERT_EQ(chosen.size(), 1);
  EXPECT_EQ(chosen[0][0], "1.35 G + 1.5 W");
}

TEST_F(ShellWords, panelsHaveTheSizesOfTheWindow) {
  const BodySizes small = sizesIn({1024, 600}, 220);
  EXPECT_EQ(small.given, 264);
  EXPECT_EQ(small.element + small.circle, 760);
  EXPECT_NEAR(double(small.element) / 760, 0.48, 0.002);
  EXPECT_EQ(small.planes, 220) << "never less than its rows";
  const BodySizes usual = sizesIn({1600, 900}, 220);
  EXPECT_EQ(usual.given, 300);
  EXPECT_EQ(usual.planes, 315) << "35 % of the height";
  EXPECT_EQ(usual.drawings + usual.planes, 900);
  const BodySizes large = sizesIn({3800, 2000}, 220);
  EXPECT_EQ(large.drawings, 900) << "above that the table gets the room";
  EXPECT_EQ(large.planes, 1100);
}

} // namespace
} // namespace planewright
