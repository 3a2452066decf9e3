// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/element_frame.h"
#include "core/figure/labels.h"
#include "core/study/readout.h"

namespace planewright {

/// How a stress element is drawn, in the figure (mm) and in the window (pixels) alike.
///
/// Nothing but the letters x and y leaves the circle of radius `outer`: with handles the drawing reaches 1.03
/// of it and the letters stand outside; without handles the letters stand inside it.
struct ElementOrder {
  Vec centre;
  double outer = 20;        ///< R: every radius of the drawing is a part of it
  bool turned = true;       ///< turned to the reading plane with n, t tractions; false: in the given axes
  bool givenSquare = true;  ///< the pale given square under the turned one
  bool givenArrows = false; ///< its open-headed arrows, left out within 14 deg of the turned ones
  bool handles = false;     ///< ring, knob and bars of the window
  bool otherFace = false;   ///< n face and knob at theta + 180 deg: the same plane seen from its other side
  bool otherEnd = false;    ///< the wish of phi at the line's end at phi; else at phi + 180 deg
  bool lineArc = false;     ///< the arc of phi
  bool letters = true;      ///< x and y at the ends of the axes
  bool knob = true;         ///< with handles; false where it is drawn later, over the labels
  double wide = 0.5;        ///< stroke of the turned square
  double cut = 0.7;         ///< stroke of the cut
  double medium = 0.35;     ///< arrows, line
  double narrow = 0.25;     ///< given square
  double hair = 0.18;       ///< texture
  double textSize = 2.8;    ///< of x, y and the knob's n
  Translate translate;
};

/// Draws the element into the picture and says which labels want to stand where: sigma_n, tau_nt, theta,
/// sigma_t and phi of the turned one, sigma_x, sigma_y, tau_xy and phi of the given one (also their keys).
/// Arrows show what the body feels: tension leaves a face, whatever sign the study gives it. A component that
/// is printed as zero has no arrow.
std::vector<LabelWish> drawElement(Picture& picture, const Study& study, const Readout& readout,
                                   const ElementOrder& order);

/// One linear scale for normal and shear arrows: `full` of length for the largest |stress| on any plane of
/// the state, so lengths do not rescale while turning. 0 for a state without stress. Length per N/mm2.
double arrowScale(const StateReading& state, double full);

} // namespace planewright
