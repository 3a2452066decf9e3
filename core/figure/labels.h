// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

namespace planewright {

/// A label that wants to stand beside its mark.
struct LabelWish {
  Vec mark;
  Runs longForm;
  Runs shortForm;
  Role role = Role::ink;
  bool bold = false;
  int priority = 0; ///< greater ones go short first when a column is too full
  std::string key;
  bool operator==(const LabelWish&) const = default;
};

/// Two columns at the sides of a drawing. A mark belongs to the column on its side of `centre`.
struct LabelColumns {
  double centre = 0;     ///< x that parts left from right
  double leftEnd = 0;    ///< labels of the left column end here
  double rightStart = 0; ///< labels of the right column start here
  double top = 0;        ///< no label's box leaves top..bottom
  double bottom = 0;
  double size = 0; ///< of the text
  double leaderWidth = 0.18;
  double leftStart = -1e9; ///< no label's text begins before this or
  double rightEnd = 1e9;   ///< ends behind that
};

/// Distance of two rows of labels, as part of the text's size.
inline constexpr double labelPitch = 1.2;

/// The labels on opaque ground and their straight leaders, or what did not fit.
struct PlacedLabels {
  std::vector<Path> leaders;
  std::vector<Label> labels;
  std::vector<std::string> shortened; ///< keys of the wishes that went short
  bool fits = true; ///< false: a column is too full even in the short forms, and wishes were left out
};

/// Heights are the least-squares solution with a least spacing, in the order of the marks (pool adjacent
/// violators, exact): labels never overlap, leaders never cross. Where straight leaders in that order would
/// cross, the two labels change places.
///
/// A label too wide for its column goes short. In a column too full for one row each, labels go short from
/// the greatest priority number on, and neighbours that are short share a row, side by side.
PlacedLabels placeLabels(const std::vector<LabelWish>& wishes, const LabelColumns& columns);

/// Adds the labels that went short to what the picture gave up.
void noteShortened(Picture& picture, const PlacedLabels& placed);

} // namespace planewright
