// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/ui/paint/sample.h"

namespace planewright {

Picture samplePicture() {
  Picture picture;
  picture.width = 90;
  picture.height = 60;
  picture.title = "Chord & strut <invented>";
  picture.description = "One of each part.";
  const Pen wide{Role::state, 0.5, Dash::solid};
  picture.parts = {
      Path{{{0, 0}, {90, 0}, {90, 60}, {0, 60}}, true, {}, Role::field},
      Path{{{2, 8}, {88, 8}}, false, Pen{Role::ink, 0.35, Dash::solid}, {}},
      Arc{{30, 35}, 15, 0, 360, wide, Role::band},
      Arc{{30, 35}, 8, 0, 60, Pen{Role::reading, 0.35, Dash::solid}, {}},
      Path{{{10, 35}, {50, 35}}, false, Pen{Role::line, 0.35, Dash::longDashDot}, {}},
      Path{{{10, 53}, {50, 53}}, false, Pen{Role::other, 0.25, Dash::shortDash}, {}},
      Path{{{10, 56}, {50, 56}}, false, Pen{Role::other, 0.25, Dash::dotted}, {}},
      Path{{{44, 34}, {46, 34}, {46, 36}, {44, 36}}, true, {}, Role::state},
      Label{
          {2, 6}, {{"Chord & strut <invented>", false}}, 3.5, Align::start, Role::ink, true, false, "title"},
      Label{{88, 6}, {{"1.35 G + 1.5 S", false}}, 2.8, Align::end, Role::soft, false, false, "combination"},
      Label{{30, 35.9},
            {{"σ", false}, {"n", true}, {" = −7.97 MPa", false}},
            2.8,
            Align::middle,
            Role::ink,
            false,
            true,
            "sn"},
      Label{{56, 30},
            {{"τ", false}, {"nt", true}, {" = 2.85 MPa", false}},
            2.8,
            Align::start,
            Role::state,
            true,
            false,
            "tnt"},
      Label{{56, 40}, {{"θ = 30.0°", false}}, 2.8, Align::start, Role::reading, false, false, "theta"}};
  return picture;
}

} // namespace planewright
