// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/labels.h"
#include "core/study/readout.h"

namespace planewright {

/// How a stress element is drawn, in the figure (mm) and in the window (pixels) alike.
struct ElementOrder {
  Vec centre;
  double outer = 20;       ///< R: every radius of the drawing is a part of it
  bool turned = true;      ///< turned to the reading plane with n, t tractions; false: in the given axes
  bool givenSquare = true; ///< the pale given square under the turned one
  bool handles = false;    ///< ring, knob and bars of the window
  double wide = 0.5;       ///< stroke of the turned square
  double cut = 0.7;        ///< stroke of the cut
  double medium = 0.35;    ///< arrows, line
  double narrow = 0.25;    ///< given square
  double hair = 0.18;      ///< texture
  double textSize = 2.8;   ///< of x, y and the knob's n
  Translate translate;
};

/// Draws the element into the picture and says which labels want to stand where.
std::vector<LabelWish> drawElement(Picture& picture, const Study& study, const Readout& readout,
                                   const ElementOrder& order);

/// One linear scale for normal and shear arrows: `full` of length for the largest |stress| on any plane of
/// the state, so lengths do not rescale while turning.
double arrowScale(const StateReading& state, double full);

} // namespace planewright
