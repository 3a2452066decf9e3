// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/circle_plot.h"

#include "core/study/stress_form.h"
#include "ui/circle/circle_words.h"
#include "ui/circle/failure_layer.h"
#include "ui/circle/others.h"
#include "ui/circle/ranges.h"
#include "ui/look/dial_access.h"
#include "ui/look/look.h"
#include "ui/paint/picture_item.h"

#include <QChart>
#include <QGraphicsPathItem>
#include <QGraphicsRectItem>
#include <QLineSeries>
#include <QPen>

namespace planewright {

namespace {

// The order of the layers. The frame draws its grid and axes at 3, the chart its series at 4.
constexpr double underFrame = 2.5;
constexpr double failureDepth = 3.3;
constexpr double rangesDepth = 3.4;
constexpr double wordsDepth = 3.6;
constexpr double leadersDepth = 3.8;
constexpr double overSeries = 5;

/// Changes that follow each other this closely are one motion, wherever it comes from.
constexpr int motionGap = 250;
constexpr int segments = 180;

/// Paths are clipped to the plot by their parent, which has the plot's shape.
QGraphicsPathItem* newPath(QGraphicsItem* clip, double depth) {
  auto* item = new QGraphicsPathItem(clip);
  item->setZValue(depth);
  return item;
}

QGraphicsRectItem* newClip(QGraphicsItem* parent) {
  auto* item = new QGraphicsRectItem(parent);
  item->setPen(Qt::NoPen);
  item->setFlag(QGraphicsItem::ItemClipsChildrenToShape);
  item->setZValue(underFrame);
  return item;
}

} // namespace

CirclePlot::CirclePlot(Desk& desk, QWidget* parent)
    : EqualScaleFrame(parent), m_desk(desk), m_circle(new QLineSeries(chart())), m_plotClip(newClip(chart())),
      m_shape(newPath(m_plotClip, 0)), m_hairlines(newPath(m_plotClip, 1)),
      m_extremes(newPath(m_plotClip, 2)), m_old(newPath(m_plotClip, 3)), m_near(newPath(m_plotClip, 4)),
      m_failure(new PictureItem(chart(), failureDepth)), m_ranges(new PictureItem(chart(), rangesDepth)),
      m_words(new PictureItem(chart(), wordsDepth)), m_leaders(new PictureItem(chart(), leadersDepth)),
      m_still(new PictureItem(chart(), overSeries)), m_reading(new PictureItem(chart(), overSeries + 1)),
      m_ear(new PictureItem(chart(), overSeries + 2)), m_names(new PictureItem(chart(), overSeries + 3)),
      m_focus(new PictureItem(chart(), overSeries + 4)) {
  // Before anything asks for the plot's interface, which Qt keeps from then on.
  makeDial(*this, {[this] { return reading().degrees(); },
                   [this](double degrees) { turnTo(Angle::fromDegrees(degrees)); },
                   [this] { return tr("%1 degrees").arg(reading().degrees(), 0, 'f', angleDecimals); },
                   [this] { return stressesInWords(); }});
  setAccessibleName(tr("Reading plane on the circle"));
  attach(m_circle);
  setFocusPolicy(Qt::StrongFocus);
  viewport()->setMouseTracking(true);
  m_settle.setSingleShot(true);
  m_settle.setInterval(motionGap);
  connect(&m_settle, &QTimer::timeout, this, &CirclePlot::rest);
  connect(&m_desk, &Desk::changed, this, &CirclePlot::follow);
}

QString CirclePlot::stressesInWords() const {
  const StateReading& state = m_desk.readout().state();
  const StressForm form = stressFormOf(m_desk.study(), state);
  const auto words = [&](double stress) { return fromUtf8(form.withUnit(stress)); };
  return tr("normal stress %1, shear stress %2; principal stresses %3 and %4")
      .arg(words(state.reading.sn), words(state.reading.tnt), words(state.circle.s1), words(state.circle.s2));
}

void CirclePlot::setFit(Fit fit) {
  m_fit = fit;
  refit();
}

std::optional<QPointF> CirclePlot::handleAt(Handle handle) const {
  const std::optional<QPointF> place = placeOf(handle);
  return place ? std::optional(*place * zoom()) : std::nullopt;
}

/// In the drawing's own pixels.
std::optional<QPointF> CirclePlot::placeOf(Handle handle) const {
  return handle == Handle::ear ? earAt(stage()) : std::optional(readingAt(stage()));
}

EqualScale CirclePlot::fittedTo(const QRectF& plot) const {
  const QSizeF panel = parentWidget() ? parentWidget()->size() : size();
  return fittedCircle(m_desk.study(), m_desk.readout(), m_fit, plot, panel / zoom());
}

/// During a drag of its own the axes stand still, else the circle would run away under the hand.
void CirclePlot::follow() {
  announceDial(*this);
  const bool moving = m_drag || m_settle.isActive();
  if (moving && !m_ride)
    m_ride = m_labels;
  m_settle.start();
  if (m_drag)
    arrange();
  else
    refit();
}

/// What moved has come to rest: the labels take their best places.
void CirclePlot::rest() {
  if (m_drag)
    return;
  m_ride.reset();
  arrangeLabels();
}

void CirclePlot::arrange() {
  const Stage now = stage();
  m_plotClip->setRect(now.scale.plot());
  hoverNothing(); // what was under the pointer may be elsewhere now
  arrangeCircle();
  arrangeOthers();
  arrangeLabels();
  m_failure->show(failureLayer(now), look());
  m_ranges->show(rangesLayer(now), look());
  m_still->show(stillLayer(now), look());
  arrangeHandles();
}

void CirclePlot::arrangeCircle() {
  const Round circle = round();
  QList<QPointF> points;
  for (int i = 0; i <= segments && circle.radius > 0; ++i) {
    const QPointF pixel = circle.at(Angle::fromDegrees(360.0 * i / segments), circle.radius);
    points << chartPoint(scale().valuesAt(pixel));
  }
  if (points != m_circle->points())
    m_circle->replace(points);
  const QPen pen(look().colour(Role::state), 2);
  if (pen != m_circle->pen())
    m_circle->setPen(pen);
}

void CirclePlot::arrangeOthers() {
  const Look now = look();
  const OthersDrawing others = drawingOfOthers(stage());
  const auto cosmetic = [&](Role role, Qt::PenStyle style) {
    QPen pen(now.colour(role), devicePixelRatioF(), style);
    pen.setCosmetic(true);
    return pen;
  };
  m_shape->setPath(others.shape);
  m_shape->setBrush(now.colour(Role::grid));
  m_shape->setPen(cosmetic(Role::other, Qt::SolidLine));
  m_hairlines->setPath(others.hairlines);
  m_hairlines->setPen(cosmetic(Role::hush, Qt::SolidLine));
  m_extremes->setPath(others.extremes);
  m_extremes->setPen(cosmetic(Role::other, Qt::DashLine));
  m_old->setPen(cosmetic(Role::state, Qt::DotLine));
  m_near->setPen(cosmetic(Role::other, Qt::SolidLine));
}

void CirclePlot::arrangeLabels() {
  const Stage now = stage();
  m_labels = m_ride ? riddenLabels(now, *m_ride, m_labels) : placedLabels(now);
  Picture leaders;
  leaders.parts.assign(m_labels.placed.leaders.begin(), m_labels.placed.leaders.end());
  m_leaders->show(std::move(leaders), look());
  Picture names;
  names.parts.assign(m_labels.placed.labels.begin(), m_labels.placed.labels.end());
  m_names->show(std::move(names), look());
}

void CirclePlot::arrangeHandles() {
  const Stage now = stage();
  const ReadingDrag* turning = m_drag ? std::get_if<ReadingDrag>(&m_drag->hand) : nullptr;
  const bool snapped = turning && !turning->on().empty();
  m_reading->show(readingLayer(now, snapped), look());
  m_ear->show(earLayer(now), look());
  m_focus->show(hasFocus() ? focusLayer(now, m_handle) : Picture(), look());
  m_words->show(wordsLayer(now, extent(), snapped ? snapNote(turning->on()) : Text()), look());
}

} // namespace planewright
