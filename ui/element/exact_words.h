// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/study/readout.h"

#include <QPointF>
#include <QString>

namespace planewright {

/// What the label under a pixel says, with all digits; empty where there is none.
QString exactWords(const Study& study, const Readout& readout, const Picture& picture, QPointF at);

} // namespace planewright
