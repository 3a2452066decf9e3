// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

namespace planewright {

/// Where a row of labels wants to stand, and how much that counts.
struct WishedHeight {
  double height = 0;
  double weight = 1;
};

/// The heights h minimising sum weight_i (h_i - wished_i)^2 with h_{i+1} >= h_i + pitch and all of them in
/// lowest..highest, which must hold them. Exact but for rounding: with g_i = h_i - i pitch it is isotonic
/// regression, solved by pooling adjacent violators (Ayer and others 1955, from memory); bounds on a
/// monotone fit are met by clamping it.
std::vector<double> spacedHeights(const std::vector<WishedHeight>& wished, double pitch, double lowest,
                                  double highest);

/// True when two segments cross inside both; touching ends do not count.
bool segmentsCross(Vec fromA, Vec toA, Vec fromB, Vec toB);

} // namespace planewright
