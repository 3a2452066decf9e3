// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/map_legend.h"

#include "core/quantity/format.h"
#include "ui/screen/map_picture.h"

#include <QPainter>

namespace planewright {

namespace {

constexpr int patch = 14; // pixels
constexpr int gap = 5;
constexpr int between = 14;

QString nameOf(MapClass mapClass) {
  const auto end = [](std::size_t i) { return fromUtf8(exactNumber(mapClassEnds[i])); };
  switch (mapClass) {
  case MapClass::empty:
    return {};
  case MapClass::notWanted:
    return MapLegend::tr("not in the rows");
  case MapClass::notJudged:
    return MapLegend::tr("not judged");
  case MapClass::exceeding:
    return MapLegend::tr("above %1").arg(end(mapClassEnds.size() - 1));
  default:
    return MapLegend::tr("up to %1")
        .arg(end(static_cast<std::size_t>(mapClass) - static_cast<std::size_t>(MapClass::upTo50)));
  }
}

} // namespace

MapLegend::MapLegend(QWidget* parent) : QWidget(parent) {
  QSizePolicy policy(QSizePolicy::Preferred, QSizePolicy::Minimum);
  policy.setHeightForWidth(true);
  setSizePolicy(policy);
}

void MapLegend::show(std::vector<MapClass> classes) {
  m_classes = std::move(classes);
  QStringList names;
  for (const MapClass one : m_classes)
    names << nameOf(one);
  setAccessibleName(tr("Classes of utilisation: %1").arg(names.join(QStringLiteral(", "))));
  updateGeometry();
  update();
}

std::vector<MapLegend::Entry> MapLegend::laidOut(int width) const {
  const int height = std::max(fontMetrics().height(), patch) + 2;
  std::vector<Entry> entries;
  entries.reserve(m_classes.size());
  QPoint at;
  for (const MapClass one : m_classes) {
    const int length = patch + gap + fontMetrics().horizontalAdvance(nameOf(one));
    if (at.x() > 0 && at.x() + length > width)
      at = {0, at.y() + height};
    entries.push_back({one, QRect(at, QSize(length, height))});
    at.rx() += length + between;
  }
  return entries;
}

int MapLegend::heightForWidth(int width) const {
  const std::vector<Entry> entries = laidOut(width);
  return entries.empty() ? 0 : entries.back().room.bottom() + 1;
}

QSize MapLegend::sizeHint() const {
  constexpr int width = 320;
  return {width, heightForWidth(width)};
}

void MapLegend::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  const Look look = lookOf(*this);
  for (const Entry& entry : laidOut(width())) {
    const QRect square(entry.room.left(), entry.room.center().y() - patch / 2, patch, patch);
    painter.drawImage(square, mapPatch(entry.mapClass, square.size(), patternUnit(*this), look));
    painter.setPen(look.colour(Role::soft));
    painter.drawRect(square.adjusted(0, 0, -1, -1));
    painter.setPen(look.colour(Role::ink));
    painter.drawText(entry.room.adjusted(patch + gap, 0, 0, 0), Qt::AlignLeft | Qt::AlignVCenter,
                     nameOf(entry.mapClass));
  }
}

} // namespace planewright
