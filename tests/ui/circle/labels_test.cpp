// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/ui/circle/panel.h"

#include "core/figure/metrics.h"
#include "core/study/cut_text.h"

#include <gtest/gtest.h>

#include <cmath>
#include <random>

namespace planewright {
namespace {

/// Every pair of labels that lie over each other, by their keys.
std::vector<std::string> overlaps(const CircleLabels& labels) {
  std::vector<std::string> found;
  const std::vector<Label>& all = labels.placed.labels;
  for (std::size_t i = 0; i < all.size(); ++i)
    for (std::size_t j = i + 1; j < all.size(); ++j)
      if (overlap(boxOf(all[i]), boxOf(all[j])))
        found.push_back(all[i].key + " and " + all[j].key);
  return found;
}

const Label* labelOf(const CircleLabels& labels, const std::string& key) {
  for (const Label& label : labels.placed.labels)
    if (label.key == key)
      return &label;
  return nullptr;
}

std::vector<Study> specialStates() {
  std::vector<Study> studies = {newStudy(),
                                studyOf("10 MPa", "0 MPa", "0 MPa", "0 deg"),
                                studyOf("0 MPa", "10 MPa", "0 MPa", "90 deg"),
                                studyOf("0 MPa", "0 MPa", "3 MPa", "45 deg"),
                                studyOf("5 MPa", "5 MPa", "0 MPa", "20 deg"),
                                studyOf("500 MPa", "-600 MPa", "2 MPa", "90 deg"),
                                studyOf("1000 MPa", "1010 MPa", "-3 MPa", "5.7 deg")};
  for (const double reading : {0.0, -22.5, 67.5, 5.71, -84.29, 45.0})
    studies.push_back(studyOf("80 MPa", "20 MPa", "-30 MPa", std::to_string(reading) + " deg"));
  std::mt19937 random(20240);
  std::uniform_int_distribution<int> stress(-99, 99);
  for (int i = 0; i < 40; ++i)
    studies.push_back(
        studyOf(std::to_string(stress(random)) + " MPa", std::to_string(stress(random)) + " MPa",
                std::to_string(stress(random)) + " MPa", std::to_string(stress(random)) + " deg"));
  return studies;
}

TEST(CircleLabels, NeverLieOverEachOtherNorLeaveTheWidget) {
  for (const QSize size : {QSize(418, 369), QSize(430, 560), QSize(900, 700)})
    for (const Study& study : specialStates()) {
      Panel panel(study, size);
      const CircleLabels& labels = panel.plot.labels();
      const CaseStress& stress = panel.typed();
      const std::string state =
          stress.sx + ", " + stress.sy + ", " + stress.txy + " at " + study.points[0].reading;
      EXPECT_TRUE(labels.placed.fits) << state;
      EXPECT_EQ(overlaps(labels), std::vector<std::string>()) << state;
      for (const Label& label : labels.placed.labels) {
        const Box box = boxOf(label);
        EXPECT_TRUE(QRectF(panel.plot.rect())
                        .contains(QRectF(QPointF(box.left, box.top), QPointF(box.right, box.bottom))))
            << label.key << ": " << state;
      }
    }
}

TEST(CircleLabels, RideOnTheirMarksInADrag) {
  Panel panel(studyOf());
  panel.press(*panel.plot.handleAt(Handle::reading));
  panel.move(panel.markOf(Angle::fromDegrees(26)), Qt::ControlModifier);
  const CircleLabels first = panel.plot.labels();
  Vec last = labelOf(first, readingKey())->at;
  // Once round the whole circle in steps of 1 deg of the normal, which is about 3.5 px of arc.
  for (int normal = 27; normal < 206; ++normal) {
    panel.move(panel.markOf(Angle::fromDegrees(normal)), Qt::ControlModifier);
    const CircleLabels& now = panel.plot.labels();
    const Vec at = labelOf(now, readingKey())->at;
    EXPECT_LT(std::hypot(at.x - last.x, at.y - last.y), 12) << normal;
    last = at;
    for (const Label& label : now.placed.labels)
      EXPECT_TRUE(label.key == readingKey() || label == *labelOf(first, label.key))
          << label.key << " " << normal;
  }
  panel.release({});
  EXPECT_EQ(overlaps(panel.plot.labels()), std::vector<std::string>());
}

TEST(CircleLabels, KeepTheirDistanceWhileTheEarIsDrawn) {
  Panel panel(studyOf());
  const CircleLabels before = panel.plot.labels();
  panel.press(*panel.plot.handleAt(Handle::ear));
  panel.move(*panel.plot.handleAt(Handle::ear) + QPointF(-4, 6));
  const CircleLabels& now = panel.plot.labels();
  for (std::size_t i = 0; i < now.wishes.size(); ++i) {
    const Label* old = labelOf(before, now.wishes[i].key);
    const Label* label = labelOf(now, now.wishes[i].key);
    ASSERT_TRUE(old && label);
    const Vec moved = now.wishes[i].mark - before.wishes[i].mark;
    EXPECT_NEAR(label->at.x - old->at.x, moved.x, 1e-9) << label->key;
    EXPECT_NEAR(label->at.y - old->at.y, moved.y, 1e-9) << label->key;
  }
}

TEST(CircleLabels, RideInAMotionFromElsewhereAndSettleAfterIt) {
  Panel panel(studyOf());
  const auto turn = [&](double normal) {
    const std::string typed = angleText(Angle::fromDegrees(normal));
    panel.desk.request({Type{readingPlace(panel.desk.readout()), typed}}, {7000}, "turn");
  };
  for (int normal = 30; normal < 120; normal += 3)
    turn(normal);
  const Label moving = *labelOf(panel.plot.labels(), readingKey());
  QTest::qWait(400);
  const Label settled = *labelOf(panel.plot.labels(), readingKey());
  EXPECT_NE(moving.at, settled.at);
  EXPECT_EQ(overlaps(panel.plot.labels()), std::vector<std::string>());
}

} // namespace
} // namespace planewright
