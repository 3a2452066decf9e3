// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/chart/zoomed_chart.h"

#include <QChart>
#include <QChartView>

namespace planewright {

void zoomTo(QChartView& view, double zoom) {
  const QSizeF extent = QSizeF(view.viewport()->size()) / zoom;
  if (view.transform().m11() != zoom)
    view.setTransform(QTransform::fromScale(zoom, zoom));
  if (view.chart()->size() != extent)
    view.chart()->resize(extent);
  if (const QRectF all(QPointF(), extent); view.sceneRect() != all)
    view.setSceneRect(all);
}

} // namespace planewright
