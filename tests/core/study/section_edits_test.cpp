// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/section_edits.h"

#include "core/study/case_sources.h"
#include "core/study/fibre_of_state.h"
#include "core/study/readout.h"
#include "tests/core/study/rich_study.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

Study beam() {
  return with(newStudy(), editsThatGiveFibre(newStudy(), "P1", "beam"));
}

Fibre fibreOf(const Study& study) {
  return PointSources::of(study, study.points.front())->fibre();
}

TEST(SectionEdits, aPointGetsANewSectionAndItsLowestFibre) {
  const Study study = beam();
  ASSERT_EQ(study.sections.size(), 1U);
  EXPECT_EQ(study.points.front().fibre->section, "beam");
  EXPECT_EQ(fibreOf(study), (Fibre{-100, 0, View::side}));
  EXPECT_EQ(freshSectionName(study), "section 1");
  EXPECT_EQ(freshSectionName(with(study, {Rename{{Spot::section, "beam", {}}, "section 1"}})), "section 2");
}

TEST(SectionEdits, everyShapeBecomesEveryOther) {
  for (const Named<SectionShape>& from : namesOf<SectionShape>())
    for (const Named<SectionShape>& to : namesOf<SectionShape>()) {
      const Study first = with(beam(), editsThatReshape(beam(), "beam", from.value));
      const Study second = with(first, editsThatReshape(first, "beam", to.value));
      EXPECT_EQ(second.sections.front().shape, to.value);
      EXPECT_TRUE(problemsIn(second).empty()) << from.word << " to " << to.word;
    }
}

TEST(SectionEdits, aCopyHasShapeAndSizesAndNoPoints) {
  for (const Named<SectionShape>& shape : namesOf<SectionShape>()) {
    const Study study = with(beam(), editsThatReshape(beam(), "beam", shape.value));
    const Study copied = with(study, editsThatCopySection(study, "beam", freshSectionName(study, "beam")));
    ASSERT_EQ(copied.sections.size(), 2U);
    EXPECT_EQ(copied.sections[1].name, "beam 2");
    EXPECT_EQ(copied.sections[1].shape, shape.value);
    EXPECT_EQ(copied.sections[1].sizes, study.sections[0].sizes);
    EXPECT_EQ(pointsIn(copied, "beam"), std::vector<std::string>{"P1"});
    EXPECT_TRUE(pointsIn(copied, "beam 2").empty());
  }
}

TEST(SectionEdits, sizesThatBothShapesHaveStay) {
  const Study wide = with(beam(), {Type{{Spot::size, "beam", "b"}, "140"}});
  const Study box = with(wide, editsThatReshape(wide, "beam", SectionShape::box));
  EXPECT_EQ(textAt(box, {Spot::size, "beam", "b"}), "140 mm");
}

TEST(SectionEdits, aFibreStaysAtItsReadyPlaceOnly) {
  const Place depth{Spot::size, "beam", "h"};
  EXPECT_EQ(fibreOf(with(beam(), *editsThatResize(beam(), depth, "600"))).y, -300);
  const Study off = with(beam(), editsThatPlaceFibre(beam(), "P1", {-90, 0, View::side}));
  EXPECT_EQ(fibreOf(with(off, *editsThatResize(off, depth, "600"))).y, -90);
  EXPECT_FALSE(editsThatResize(beam(), depth, "-1"));
  EXPECT_FALSE(editsThatResize(beam(), depth, "six"));
}

TEST(SectionEdits, lengthsAreWrittenInTheUnitOfTheStudy) {
  const Study inches = with(beam(), {Type{{Spot::unitLength, {}, {}}, "in"}});
  const Study study = with(inches, editsThatPlaceFibre(inches, "P1", {25.4, -12.7, View::side}));
  EXPECT_EQ(study.points.front().fibre->y, "1 in");
  EXPECT_EQ(study.points.front().fibre->z, "-0.5 in");
}

TEST(SectionEdits, blocksComeOnTopAndGo) {
  const Study built = with(beam(), editsThatReshape(beam(), "beam", SectionShape::built));
  const Study two = with(built, editsThatAddBlock(built, "beam"));
  const Study three = with(two, editsThatAddBlock(two, "beam"));
  EXPECT_EQ(three.sections.front().sizes.size(), 15U);
  EXPECT_EQ(with(three, editsThatDropBlock(three, "beam")), two);
  EXPECT_TRUE(editsThatDropBlock(built, "beam").empty());
}

Study loaded() {
  Study study = beam();
  study = with(study, {Insert{{Spot::forces, "P1", "G"}, {}}, Type{{Spot::forceMz, "P1", "G"}, "10"},
                       Type{{Spot::forceVy, "P1", "G"}, "30"}});
  return with(study, editsThatPlaceFibre(study, "P1", {20, 0, View::side}));
}

TEST(FibreOfState, theWorstFibresAreTheExtremeAndTheAxisOfASlenderBeam) {
  const Study study = loaded();
  const Readout readout = evaluate(study);
  const WorstFibres worst = *worstFibresOf(*loadedSectionOf(study, readout, readout.state()));
  EXPECT_EQ(worst.principal.fibre.y, -100);
  EXPECT_NEAR(worst.principal.measure, 10e6 * 100 / (100.0 * 200 * 200 * 200 / 12), 1e-9);
  EXPECT_EQ(std::abs(worst.shear.fibre.y), 100);
}

TEST(FibreOfState, factorsCountAndWhatElseActsIsKept) {
  Study study =
      with(loaded(), {Type{{Spot::sx, "P1", "G"}, "-3"}, Insert{{Spot::combination, "2 G", {}}, {}},
                      Insert{{Spot::factor, "2 G", "G"}, {}}, Type{{Spot::factor, "2 G", "G"}, "2"}});
  const Readout readout = evaluate(study);
  const LoadedSection section = *loadedSectionOf(study, readout, readout.states.front());
  EXPECT_DOUBLE_EQ(section.forces.Mz, 20e6);
  EXPECT_NEAR(section.rest.sx, -6, 1e-12);
  EXPECT_NEAR(section.rest.txy, 0, 1e-12);
  const Study pressed = with(study, {Type{{Spot::positive, {}, {}}, "compression"}});
  const Readout negated = evaluate(pressed);
  EXPECT_NEAR(loadedSectionOf(pressed, negated, negated.states.front())->rest.sx, 6, 1e-12);
}

TEST(FibreOfState, aPointWithoutAFibreHasNone) {
  const Readout readout = evaluate(newStudy());
  EXPECT_FALSE(loadedSectionOf(newStudy(), readout, readout.state()));
}

} // namespace
} // namespace planewright
