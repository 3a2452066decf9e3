// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/ranges.h"

#include "tests/ui/circle/panel.h"
#include "ui/paint/picture_item.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

Stage stageOf(const Panel& panel) {
  return {panel.desk.study(), panel.desk.readout(), panel.plot.scale()};
}

TEST(Ranges, areThereOnlyWhereSeveralCombinationsAreJudged) {
  const Panel one(studyOf());
  EXPECT_FALSE(rangeBarsOf(stageOf(one)));
  EXPECT_TRUE(rangesLayer(stageOf(one)).parts.empty());
  const Panel single(studyWithCombinations(1));
  EXPECT_TRUE(rangesLayer(stageOf(single)).parts.empty()) << "cases beside combinations are not judged";
  const Panel many(studyWithCombinations(12));
  EXPECT_EQ(rangesLayer(stageOf(many)).parts.size(), 4U) << "two bars, a tick on each";
}

TEST(Ranges, goFromTheLeastToTheGreatestStressOnTheReadingPlane) {
  Panel panel(studyWithCombinations(12), {700, 700});
  panel.plot.setFit(Fit::allCombinations);
  const Stage stage = stageOf(panel);
  const std::optional<RangeBars> bars = rangeBarsOf(stage);
  ASSERT_TRUE(bars);
  const Envelope& envelope = bars->envelope;
  EXPECT_EQ(bars->normalFrom, stage.pixelOf({envelope.leastNormal.stress, 0}));
  EXPECT_EQ(bars->normalTo, stage.pixelOf({envelope.greatestNormal.stress, 0}));
  EXPECT_EQ(bars->shearFrom, stage.pixelOf({0, envelope.leastTnt.stress}));
  EXPECT_EQ(bars->shearTo, stage.pixelOf({0, envelope.greatestTnt.stress}));
  const QPointF mark = *panel.plot.handleAt(Handle::reading);
  EXPECT_DOUBLE_EQ(bars->normalAt.x(), mark.x());
  EXPECT_DOUBLE_EQ(bars->shearAt.y(), mark.y());
}

TEST(Ranges, stayInsideThePlotWhereTheyReachBeyondIt) {
  Study study = studyWithCombinations(12);
  study.combinations.push_back({"far", {{study.cases.front().id, "-40"}}, Basis::design});
  const Panel panel(study);
  const std::optional<RangeBars> bars = rangeBarsOf(stageOf(panel));
  ASSERT_TRUE(bars);
  const QRectF plot = panel.plot.scale().plot();
  const QRectF box = boundsOf(rangesLayer(stageOf(panel)));
  EXPECT_TRUE(plot.adjusted(-8, -8, 8, 8).contains(box));
  EXPECT_EQ(bars->normalFrom.x(), plot.left());
}

TEST(Ranges, sayWhichCombinationsTheyComeFrom) {
  Panel panel(studyWithCombinations(12), {700, 700});
  panel.plot.setFit(Fit::allCombinations);
  const std::optional<RangeBars> bars = rangeBarsOf(stageOf(panel));
  ASSERT_TRUE(bars);
  const auto nameOf = [&](const Extreme& extreme) {
    return " in " + panel.desk.readout().states[extreme.state].combination;
  };
  const std::string normal = plain(rangeWords(stageOf(panel), bars->normalTo));
  EXPECT_NE(normal.find("σn on the reading plane: from "), std::string::npos) << normal;
  EXPECT_NE(normal.find(nameOf(bars->envelope.leastNormal)), std::string::npos) << normal;
  EXPECT_NE(normal.find(nameOf(bars->envelope.greatestNormal)), std::string::npos) << normal;
  const std::string shear = plain(rangeWords(stageOf(panel), bars->shearFrom));
  EXPECT_NE(shear.find("τnt on the reading plane: from "), std::string::npos) << shear;
  EXPECT_TRUE(rangeWords(stageOf(panel), panel.plot.scale().plot().topLeft() + QPointF(20, 20)).empty());
}

TEST(Ranges, followTheReadingPlane) {
  Panel panel(studyWithCombinations(12));
  const Picture before = rangesLayer(stageOf(panel));
  panel.key(Qt::Key_Right, Qt::ControlModifier);
  EXPECT_NE(rangesLayer(stageOf(panel)), before);
}

} // namespace
} // namespace planewright
