// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/section_drawing.h"

#include "core/study/edit.h"
#include "core/study/section_edits.h"

#include <gtest/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

constexpr double width = 260;
constexpr double height = 190;

Study studyWith(SectionShape shape) {
  Study study = *edited(newStudy(), editsThatGiveFibre(newStudy(), "P1", "beam"));
  study = *edited(study, editsThatReshape(study, "beam", shape));
  return *edited(study, Edits{Insert{{Spot::forces, "P1", "G"}, {}}, Type{{Spot::forceN, "P1", "G"}, "40"},
                              Type{{Spot::forceMz, "P1", "G"}, "10"}});
}

std::optional<SectionDrawing> drawn(const Study& study) {
  const Readout readout = evaluate(study);
  return drawnSection(*loadedSectionOf(study, readout, readout.state()), stressFormOf(study, readout.state()),
                      width, height, 12);
}

bool isInside(Vec at) {
  return at.x >= 0 && at.x <= width && at.y >= 0 && at.y <= height;
}

TEST(SectionDrawing, staysInItsFrameForEveryShapeAndView) {
  for (const Named<SectionShape>& row : namesOf<SectionShape>()) {
    if (row.value == SectionShape::tabled)
      continue;
    const Study side = studyWith(row.value);
    const Study top = *edited(side, Edits{Type{{Spot::fibreView, "P1", {}}, "top"}});
    for (const Study* study : {&side, &top}) {
      const std::optional<SectionDrawing> drawing = drawn(*study);
      ASSERT_TRUE(drawing) << row.word;
      for (const auto& part : drawing->picture.parts) {
        const Path* path = std::get_if<Path>(&part);
        if (!path)
          continue;
        for (const Vec point : path->points)
          EXPECT_TRUE(isInside(point)) << row.word << " " << point.x << " " << point.y;
      }
    }
  }
}

TEST(SectionDrawing, theFrameTakesPlacesThereAndBack) {
  const SectionDrawing drawing = *drawn(studyWith(SectionShape::i));
  const SectionPoint place{-150, 4};
  const SectionPoint back = drawing.frame.placeAt(drawing.frame.at(place));
  EXPECT_NEAR(back.y, place.y, 1e-9);
  EXPECT_NEAR(back.z, place.z, 1e-9);
}

TEST(SectionDrawing, theMarkLiesAtTheFibre) {
  const SectionDrawing drawing = *drawn(studyWith(SectionShape::rectangle));
  const Vec fibre = drawing.frame.at({-100, 0});
  EXPECT_TRUE(std::ranges::any_of(drawing.picture.parts, [&](const auto& part) {
    const Arc* arc = std::get_if<Arc>(&part);
    return arc && arc->centre == fibre && arc->fill == Role::reading;
  }));
}

TEST(SectionDrawing, tabledValuesHaveNoOutline) {
  EXPECT_TRUE(drawn(studyWith(SectionShape::rectangle)));
  Study tabled = *edited(newStudy(), editsThatGiveFibre(newStudy(), "P1", "beam"));
  tabled = *edited(tabled, editsThatReshape(tabled, "beam", SectionShape::tabled));
  EXPECT_FALSE(drawn(tabled));
}

} // namespace
} // namespace planewright
