// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/delivery.h"

namespace planewright {

/// `figure`: the labelled figure of a study as SVG, PDF or PNG.
Outcome<Delivery> drawnFigure(std::span<const std::string> words);

} // namespace planewright
