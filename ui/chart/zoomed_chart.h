// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

class QChartView;

namespace planewright {

/// Shows the chart of a view so many times as large: it is laid out for the smaller room and fills the view.
void zoomTo(QChartView& view, double zoom);

} // namespace planewright
