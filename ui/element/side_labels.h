// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/labels.h"
#include "ui/element/geometry.h"

#include <map>

namespace planewright {

/// Keys of the labels that stand in the left column.
using Sides = std::map<std::string, bool>;

/// The column of each label. During a drag a label keeps its column until its mark is well beyond the centre,
/// so that labels do not hop to and fro.
Sides sidesOf(const std::vector<LabelWish>& wishes, const ElementGeometry& geometry, const Sides* before);

/// The labels in columns beside the ring. Columns reach over the ring where `widest`, the widest label that
/// can come to stand there, needs it.
PlacedLabels sideLabels(const std::vector<LabelWish>& wishes, const Sides& sides,
                        const ElementGeometry& geometry, QSizeF size, double widest, double textSize);

} // namespace planewright
