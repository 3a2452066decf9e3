// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/labels.h"
#include "core/figure/marks.h"
#include "ui/circle/round.h"

namespace planewright {

/// The label of a mark that stands at this pixel.
LabelWish wishOf(const Mark& mark, QPointF at);
/// The key of the reading plane's label.
std::string readingKey();

/// The labels of the circle as they stand: what they wished and where they were put.
struct CircleLabels {
  NormalAngle reading;
  bool goesRound = false; ///< the reading plane's label has left its column and goes round with its mark
  std::vector<LabelWish> wishes;
  PlacedLabels placed;
};

/// In two columns beside the circle.
CircleLabels placedLabels(const Stage& stage);

/// While something is dragged labels ride on their marks as they stood before, so that none hops: each keeps
/// its distance to its mark, and that of a reading plane that turns goes round the circle just outside its
/// own. `latest` is how they stood at the last step of the motion.
CircleLabels riddenLabels(const Stage& stage, const CircleLabels& before, const CircleLabels& latest);

} // namespace planewright
