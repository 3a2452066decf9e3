// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/field_map_view.h"

#include "core/quantity/format.h"
#include "core/quantity/unit.h"
#include "ui/chart/equal_scale.h"
#include "ui/screen/field_model.h"

#include <QApplication>
#include <QHelpEvent>
#include <QItemSelectionModel>
#include <QMouseEvent>
#include <QPainter>
#include <QToolTip>

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr int margin = 12; // pixels, as all lengths here
constexpr int reach = 8;   ///< of a click beside a mark
constexpr double ringRadius = 9;
constexpr double greatestZoom = 1e4;
constexpr double stepOfZoom = 1.25;
constexpr int stepOfMove = 40;
constexpr double notch = 120; ///< of a wheel, in its eighths of a degree

std::optional<MapWay> wayOf(int key) {
  switch (key) {
  case Qt::Key_Left:
    return MapWay::left;
  case Qt::Key_Right:
    return MapWay::right;
  case Qt::Key_Up:
    return MapWay::up;
  case Qt::Key_Down:
    return MapWay::down;
  default:
    return std::nullopt;
  }
}

} // namespace

FieldMapView::FieldMapView(const FieldModel& model, QItemSelectionModel& current, QWidget* parent)
    : QWidget(parent), m_model(model), m_current(current) {
  setFocusPolicy(Qt::StrongFocus);
  setAccessibleName(tr("Map of the field by utilisation"));
  setProperty("helpPlace", "screening#map");
  setSizePolicy(QSizePolicy::Expanding, QSizePolicy::Expanding);
  // A field has rows only after it has come.
  connect(&m_model, &QAbstractItemModel::modelReset, this, [this] {
    if (m_model.field() != m_asked.field) {
      // Of the field before, which may be large, nothing is kept.
      m_drawing.stop();
      m_picture.reset();
      m_asked = {};
      showAll();
    }
    update();
  });
  connect(&m_model, &QAbstractItemModel::dataChanged, this, qOverload<>(&QWidget::update));
  connect(&m_current, &QItemSelectionModel::currentChanged, this, qOverload<>(&QWidget::update));
}

bool FieldMapView::hasMap() const {
  return m_model.field() && m_model.field()->extent;
}

QSize FieldMapView::mapSize() const {
  return {width(), height() - fontMetrics().height() - 6};
}

MapView FieldMapView::view() const {
  const double ratio = devicePixelRatioF();
  const QSize pixels(static_cast<int>(std::ceil(mapSize().width() * ratio)),
                     static_cast<int>(std::ceil(mapSize().height() * ratio)));
  MapView view =
      wholeOf(*m_model.field()->extent, pixels.width(), pixels.height(), static_cast<int>(margin * ratio));
  view.scale *= m_zoom;
  if (m_centre) {
    view.centreX = m_centre->x();
    view.centreY = m_centre->y();
  }
  return view;
}

MapOrder FieldMapView::order() const {
  return {m_model.field(), m_model.rows(), view(), patternUnit(*this), lookOf(*this)};
}

bool FieldMapView::isDrawn() const {
  return m_picture && m_picture->order == order();
}

void FieldMapView::ask(const MapOrder& order) {
  m_asked = order;
  m_drawing.run([this, order](const std::stop_token& stop) -> Beside::Then {
    auto picture = mapPicture(order, [&] { return !stop.stop_requested(); });
    if (!picture)
      return {};
    return [this, picture = std::move(picture)] {
      m_picture = picture;
      update();
    };
  });
}

void FieldMapView::showAll() {
  m_zoom = 1;
  m_centre.reset();
  update();
}

void FieldMapView::zoom(double factor, QPointF around) {
  const double ratio = devicePixelRatioF();
  const MapView before = view();
  const Vec pixel = {around.x() * ratio, around.y() * ratio};
  const Vec kept = before.placeAt(pixel);
  m_zoom = std::clamp(m_zoom * factor, 1.0, greatestZoom);
  if (m_zoom == 1)
    return showAll();
  const Vec now = view().placeAt(pixel);
  m_centre = QPointF(before.centreX + kept.x - now.x, before.centreY + kept.y - now.y);
  move({});
}

void FieldMapView::move(QPointF pixels) {
  const FieldExtent& extent = *m_model.field()->extent;
  const MapView before = view();
  const double length = devicePixelRatioF() / before.scale;
  m_centre = QPointF(std::clamp(before.centreX - pixels.x() * length, extent.lowX, extent.highX),
                     std::clamp(before.centreY + pixels.y() * length, extent.lowY, extent.highY));
  update();
}

std::optional<std::uint32_t> FieldMapView::current() const {
  const QModelIndex index = m_current.currentIndex();
  return index.isValid() ? std::optional(m_model.pointAt(index.row())) : std::nullopt;
}

std::optional<std::uint32_t> FieldMapView::pointAt(QPointF at) const {
  if (!m_picture || m_picture->order.field != m_model.field())
    return std::nullopt;
  const double ratio = devicePixelRatioF();
  const Vec place = view().placeAt({at.x() * ratio, at.y() * ratio});
  const Vec pixel = m_picture->order.view.pixelOf(place.x, place.y);
  if (std::abs(pixel.x) > m_picture->pixels.width * 2.0 || std::abs(pixel.y) > m_picture->pixels.height * 2.0)
    return std::nullopt;
  return m_picture->pixels.pointNear(static_cast<int>(std::floor(pixel.x)),
                                     static_cast<int>(std::floor(pixel.y)), static_cast<int>(reach * ratio));
}

QPointF FieldMapView::placeOf(std::uint32_t point) const {
  const Field& field = m_model.field()->reading.field;
  const Vec pixel = view().pixelOf(field.xOf(point), field.yOf(point));
  return QPointF(pixel.x, pixel.y) / devicePixelRatioF();
}

void FieldMapView::pick(QPointF at) {
  if (const std::optional<std::uint32_t> point = pointAt(at))
    choose(*point);
}

// From the middle of the view where no point with a place is chosen.
void FieldMapView::pick(MapWay way) {
  const Field& field = m_model.field()->reading.field;
  const MapView view = this->view();
  Vec from = {view.centreX, view.centreY};
  if (const std::optional<std::uint32_t> point = current(); point && isPlaced(field, *point))
    from = {field.xOf(*point), field.yOf(*point)};
  const std::optional<std::uint32_t> point = neighbourOf(field, *m_model.rows(), from.x, from.y, way);
  if (!point)
    return;
  choose(*point);
  if (!QRectF(QPointF(), mapSize()).contains(placeOf(*point))) {
    m_centre = QPointF(field.xOf(*point), field.yOf(*point));
    update();
  }
}

void FieldMapView::choose(std::uint32_t point) {
  if (const std::optional<int> row = m_model.rowOf(point))
    m_current.setCurrentIndex(m_model.index(*row, 0),
                              QItemSelectionModel::ClearAndSelect | QItemSelectionModel::Rows);
}

void FieldMapView::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  const Look look = lookOf(*this);
  painter.fillRect(QRect(QPoint(), mapSize()), look.colour(Role::canvas));
  if (!hasMap())
    return;
  // What is asked for follows from how the widget stands now, whatever has changed it.
  if (const MapOrder wanted = order(); wanted != m_asked)
    ask(wanted);
  painter.setClipRect(QRect(QPoint(), mapSize()));
  drawMap(painter);
  drawRing(painter);
  painter.setClipping(false);
  drawScale(painter);
  if (hasFocus()) {
    painter.setPen(look.colour(Role::focus));
    painter.setBrush(Qt::NoBrush);
    painter.drawRect(QRect(QPoint(), mapSize()).adjusted(0, 0, -1, -1));
  }
}

// Until what was asked for has come, the last map is shown where its places now lie.
void FieldMapView::drawMap(QPainter& painter) const {
  if (!m_picture || m_picture->image.isNull())
    return;
  const double ratio = devicePixelRatioF();
  const MapView& drawn = m_picture->order.view;
  const MapView now = view();
  const Vec corner = drawn.placeAt({0, 0});
  const Vec at = now.pixelOf(corner.x, corner.y);
  const double scale = now.scale / drawn.scale / ratio;
  painter.drawImage(QRectF(at.x / ratio, at.y / ratio, drawn.width * scale, drawn.height * scale),
                    m_picture->image);
}

void FieldMapView::drawRing(QPainter& painter) const {
  const std::optional<std::uint32_t> point = current();
  if (!point || !isPlaced(m_model.field()->reading.field, *point))
    return;
  const Look look = lookOf(*this);
  painter.setRenderHint(QPainter::Antialiasing);
  painter.setBrush(Qt::NoBrush);
  for (const auto& [role, width] : {std::pair(Role::canvas, 5.0), std::pair(Role::reading, 2.5)}) {
    painter.setPen(QPen(look.colour(role), width));
    painter.drawEllipse(placeOf(*point), ringRadius, ringRadius);
  }
  painter.setRenderHint(QPainter::Antialiasing, false);
}

void FieldMapView::drawScale(QPainter& painter) const {
  constexpr int tick = 4;
  const Look look = lookOf(*this);
  const std::string& name = m_model.field()->study.units.length;
  const Unit unit = *readUnit(name, dimension::length);
  const double pixelsPerUnit = view().scale / devicePixelRatioF() * unit.toBase(1);
  const double length = tickStep(mapSize().width() / 8.0 / pixelsPerUnit);
  const int top = mapSize().height() + 3;
  const int middle = top + fontMetrics().height() / 2;
  const int end = static_cast<int>(std::lround(length * pixelsPerUnit));
  painter.setPen(look.colour(Role::soft));
  painter.drawLine(0, middle, end, middle);
  painter.drawLine(0, middle - tick, 0, middle + tick);
  painter.drawLine(end, middle - tick, end, middle + tick);
  const QString words = tr("%1 %2   x →  y ↑").arg(fromUtf8(exactNumber(length)), fromUtf8(name));
  const QRect room(end + 8, top, width() - end - 8, fontMetrics().height());
  painter.drawText(room, Qt::AlignLeft | Qt::AlignVCenter,
                   fontMetrics().elidedText(words, Qt::ElideRight, room.width()));
}

bool FieldMapView::event(QEvent* event) {
  if (event->type() == QEvent::ToolTip) {
    const auto* help = static_cast<QHelpEvent*>(event);
    const std::optional<std::uint32_t> point = pointAt(help->pos());
    if (point)
      QToolTip::showText(help->globalPos(), m_model.linesOf(*point), this);
    else
      QToolTip::hideText();
    return true;
  }
  return QWidget::event(event);
}

void FieldMapView::mousePressEvent(QMouseEvent* event) {
  m_pressed = event->position();
  m_last = m_pressed;
  m_isMoving = false;
}

void FieldMapView::mouseMoveEvent(QMouseEvent* event) {
  if (!(event->buttons() & Qt::LeftButton) || !hasMap())
    return;
  m_isMoving =
      m_isMoving || (event->position() - m_pressed).manhattanLength() >= QApplication::startDragDistance();
  if (!m_isMoving)
    return;
  move(event->position() - m_last);
  m_last = event->position();
}

void FieldMapView::mouseReleaseEvent(QMouseEvent* event) {
  if (event->button() == Qt::LeftButton && !m_isMoving)
    pick(event->position());
  m_isMoving = false;
}

void FieldMapView::wheelEvent(QWheelEvent* event) {
  if (!hasMap())
    return;
  zoom(std::pow(stepOfZoom, event->angleDelta().y() / notch), event->position());
  event->accept();
}

void FieldMapView::keyPressEvent(QKeyEvent* event) {
  if (!hasMap())
    return QWidget::keyPressEvent(event);
  if (event->modifiers() & Qt::ControlModifier)
    if (const std::optional<MapWay> way = wayOf(event->key()))
      return pick(*way);
  const QPointF middle(mapSize().width() / 2.0, mapSize().height() / 2.0);
  switch (event->key()) {
  case Qt::Key_Plus:
    return zoom(stepOfZoom, middle);
  case Qt::Key_Minus:
    return zoom(1 / stepOfZoom, middle);
  case Qt::Key_Home:
    return showAll();
  case Qt::Key_Left:
    return move({stepOfMove, 0});
  case Qt::Key_Right:
    return move({-stepOfMove, 0});
  case Qt::Key_Up:
    return move({0, stepOfMove});
  case Qt::Key_Down:
    return move({0, -stepOfMove});
  default:
    return QWidget::keyPressEvent(event);
  }
}

} // namespace planewright
