// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/metrics.h"
#include "core/figure/utilisation_curves.h"
#include "core/table/check_words.h"

namespace planewright {

/// How utilisation over direction lies on the sheet: directions from -90 to 90 deg to the right, utilisation
/// from `lowest` to `highest` upwards, linear or by its logarithm.
struct UtilisationFrame {
  Box plot;
  double lowest = 0;
  double highest = 2;
  bool logarithmic = false;
  double size = 8; ///< of the text
  double pen = 1;  ///< units of the drawing for a width of 0.25 mm

  double xOf(double degrees) const;
  /// Clamped to the plot.
  double yOf(double utilisation) const;
  double degreesAt(double x) const;
  Vec at(Vec point) const { return {xOf(point.x), yOf(point.y)}; }
};

/// The usual frame inside a rectangle: room for tick labels at the left and below, the top at 2, or with
/// `logarithmic` from 0.01 to the power of ten above what is highest.
UtilisationFrame utilisationFrameIn(const Box& room, double size, double pen, double highest,
                                    bool logarithmic, const Translate& translate);
/// Whether a logarithmic scale is worth offering.
bool isFarBeyond(double highest);
/// Whether the scale is logarithmic until a user chooses another: where the worst of the band would lie over
/// the linear one.
bool suitsLogarithm(const std::optional<WorstInBand>& worst);

/// Tells the curves apart in a row of its own: the shown combination and the greatest of all; empty where
/// there is only one curve.
Picture utilisationKey(const Box& row, double size, double pen, const UtilisationCurves& curves,
                       const std::string& shown, const Translate& translate);
/// Height of that row, 0 where it is empty.
double heightOfKey(const UtilisationCurves& curves, double size);

/// Band, grid, ticks and their labels, titles, the limit with its hatch above, and the angles within the
/// limit as bars on the base line.
Picture utilisationGround(const UtilisationFrame& frame, const CheckSetup& check,
                          const std::vector<Within>& within, const Translate& translate);
/// A curve cut off at the top of the plot.
std::vector<Path> utilisationLines(const UtilisationFrame& frame, const UtilisationCurve& curve,
                                   const Pen& pen);
/// The direction of the line with a grip at its foot, and the worst of its band as a triangle.
Picture utilisationMarks(const UtilisationFrame& frame, const CheckSetup& check,
                         const std::optional<WorstInBand>& worst);

} // namespace planewright
