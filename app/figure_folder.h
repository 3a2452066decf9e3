// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "app/delivery.h"
#include "ui/figure/figure_batch.h"

namespace planewright {

/// Writes the figures of a batch to a folder at `path`, which is made where it is not there, and delivers
/// their names, one a line. Wrong use, and nothing written, where a figure cannot be drawn, or a file exists
/// that is not to be replaced. A file that fails stops none of the others; what failed is the Failure.
Outcome<Delivery> writtenFigures(const FigureBatch& batch, const std::string& path, bool replaces);

} // namespace planewright
