// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/section_view.h"

#include "core/study/case_sources.h"
#include "core/study/section_edits.h"
#include "ui/desk/turning.h"
#include "ui/look/look.h"
#include "ui/paint/painter.h"

#include <QKeyEvent>
#include <QMouseEvent>
#include <QPainter>

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double reach = 6; ///< px within which a ready place takes the mark

Edits placeOf(const Study& study) {
  const Point& point = shownPoint(study);
  Edits edits;
  for (const Spot spot : {Spot::fibreY, Spot::fibreZ})
    edits.push_back(Type{{spot, point.name, {}}, textAt(study, {spot, point.name, {}}).value_or("")});
  return edits;
}

/// The ready place of this view within reach.
std::optional<Fibre> snapped(const LoadedSection& section, const SectionFrame& frame, QPointF to) {
  std::optional<Fibre> nearest;
  double least = reach;
  for (const NamedFibre& ready : readyFibres(section.model)) {
    const Vec at = frame.at({ready.fibre.y, ready.fibre.z});
    const double distance = std::hypot(at.x - to.x(), at.y - to.y());
    if (ready.fibre.view == section.fibre.view && distance < least) {
      least = distance;
      nearest = ready.fibre;
    }
  }
  return nearest;
}

/// The greatest power of ten of the unit of length that is no longer than so many mm; in mm.
double decadeOf(const Study& study, double length) {
  const Unit unit = entryKindOf(study, Spot::fibreY).unit;
  return unit.toBase(decadeBelow(unit.fromBase(length)));
}

double clamped(double value, double low, double high) {
  return std::clamp(value, std::min(low, high), std::max(low, high));
}

} // namespace

SectionView::SectionView(Desk& desk, QWidget* parent) : QWidget(parent), m_desk(desk) {
  setFocusPolicy(Qt::StrongFocus);
  setAccessibleName(tr("drawing of the section"));
  setToolTip(tr("Pull the mark to the fibre that is looked at. Arrow keys move it, PageUp and PageDown go to "
                "the next ready place."));
  connect(&m_desk, &Desk::changed, this, &SectionView::refresh);
  refresh();
}

std::optional<LoadedSection> SectionView::loaded() const {
  return loadedSectionOf(m_desk.study(), m_desk.readout(), m_desk.readout().state());
}

std::optional<SectionDrawing> SectionView::drawing() const {
  const std::optional<LoadedSection> section = loaded();
  if (!section)
    return std::nullopt;
  const StressForm stresses = stressFormOf(m_desk.study(), m_desk.readout().state());
  return drawnSection(*section, stresses, width(), height(), fontInfo().pixelSize());
}

std::optional<QPointF> SectionView::pointAt(double y, double z) const {
  const std::optional<SectionDrawing> drawn = drawing();
  if (!drawn)
    return std::nullopt;
  const Vec at = drawn->frame.at({y, z});
  return QPointF(at.x, at.y);
}

void SectionView::paintEvent(QPaintEvent*) {
  QPainter painter(this);
  painter.setRenderHint(QPainter::Antialiasing);
  const Look look = lookOf(*this);
  painter.fillRect(rect(), look.colour(Role::canvas));
  if (const std::optional<SectionDrawing> drawn = drawing())
    paintPicture(painter, drawn->picture, look.palette);
  if (hasFocus()) {
    painter.setRenderHint(QPainter::Antialiasing, false);
    painter.setPen(QPen(look.colour(Role::focus), 2));
    painter.drawRect(rect().adjusted(1, 1, -1, -1));
  }
}

void SectionView::mousePressEvent(QMouseEvent* event) {
  if (event->button() != Qt::LeftButton || !drawing())
    return;
  m_drag = m_desk.newGesture();
  m_before = placeOf(m_desk.study());
  drag(event->position(), event->modifiers());
}

void SectionView::mouseMoveEvent(QMouseEvent* event) {
  if (m_drag)
    drag(event->position(), event->modifiers());
}

void SectionView::mouseReleaseEvent(QMouseEvent*) {
  m_drag.reset();
}

// A place in the air beside the section asks for the nearest one in its box; what is still outside the
// material is not taken.
void SectionView::drag(QPointF to, Qt::KeyboardModifiers held) {
  const std::optional<LoadedSection> section = loaded();
  const std::optional<SectionDrawing> drawn = drawing();
  if (!section || !drawn)
    return;
  const bool isFree = held.testFlag(Qt::ControlModifier);
  if (const std::optional<Fibre> ready = isFree ? std::nullopt : snapped(*section, drawn->frame, to))
    return place(*ready, *m_drag);
  const SectionPoint at = drawn->frame.placeAt({to.x(), to.y()});
  const double decade = decadeOf(m_desk.study(), 1 / drawn->frame.scale);
  const Region& region = section->model.region;
  place({clamped(roundedTo(at.y, decade), region.yLow, region.yHigh),
         clamped(roundedTo(at.z, decade), region.zLow, region.zHigh), section->fibre.view},
        *m_drag);
}

void SectionView::place(const Fibre& fibre, Gesture gesture) {
  if (const auto problem = m_desk.request(editsThatPlaceFibre(m_desk.study(), m_desk.readout().point, fibre),
                                          gesture, tr("place of the fibre")))
    m_desk.say(shown(problem->what));
}

void SectionView::keyPressEvent(QKeyEvent* event) {
  const std::optional<LoadedSection> section = loaded();
  if (!section)
    return QWidget::keyPressEvent(event);
  if (event->key() == Qt::Key_Escape && m_drag) {
    m_desk.request(m_before, *m_drag, tr("place of the fibre"));
    m_drag.reset();
    return;
  }
  Fibre fibre = section->fibre;
  const double step = decadeOf(m_desk.study(), 1) * (event->modifiers().testFlag(Qt::ShiftModifier)     ? 0.1
                                                     : event->modifiers().testFlag(Qt::ControlModifier) ? 10
                                                                                                        : 1);
  const int key = event->key();
  if (key == Qt::Key_Up || key == Qt::Key_Down) {
    fibre.y += key == Qt::Key_Up ? step : -step;
  } else if (key == Qt::Key_Left || key == Qt::Key_Right) {
    fibre.z += key == Qt::Key_Right ? step : -step;
  } else if (key == Qt::Key_PageUp || key == Qt::Key_PageDown) {
    std::vector<NamedFibre> ready = readyFibres(section->model);
    std::erase_if(ready, [&](const NamedFibre& one) { return one.fibre.view != fibre.view; });
    const auto here = std::ranges::find(ready, fibre, &NamedFibre::fibre);
    if (ready.empty())
      return;
    const auto count = static_cast<std::ptrdiff_t>(ready.size());
    const std::ptrdiff_t index = here == ready.end() ? 0 : here - ready.begin();
    const std::ptrdiff_t to = here == ready.end() ? 0 : index + (key == Qt::Key_PageDown ? 1 : -1);
    fibre = ready[static_cast<std::size_t>((to + count) % count)].fibre;
  } else {
    return QWidget::keyPressEvent(event);
  }
  const Region& region = section->model.region;
  fibre.y = clamped(fibre.y, region.yLow, region.yHigh);
  fibre.z = clamped(fibre.z, region.zLow, region.zHigh);
  place(fibre, m_desk.newCommand());
}

void SectionView::refresh() {
  const auto length = [units = writtenUnitsOf(m_desk.study())](double value) {
    return fromUtf8(units.shown(value, dimension::length));
  };
  if (const std::optional<LoadedSection> section = loaded())
    setAccessibleDescription(
        tr("fibre at y = %1, z = %2").arg(length(section->fibre.y), length(section->fibre.z)));
  update();
}

} // namespace planewright
