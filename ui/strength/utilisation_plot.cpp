// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/utilisation_plot.h"

#include "core/quantity/format.h"
#include "core/strength/shown_ratio.h"
#include "core/study/cut_text.h"
#include "core/study/named_directions.h"
#include "ui/chart/zoomed_chart.h"
#include "ui/desk/turning.h"
#include "ui/look/dial_access.h"
#include "ui/look/zoom.h"
#include "ui/paint/picture_item.h"

#include <QChart>
#include <QHelpEvent>
#include <QLineSeries>
#include <QMouseEvent>
#include <QToolTip>
#include <QValueAxis>

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double textSize = 11; // px
constexpr QSize least = {220, 176};
constexpr double penUnit = 1; // px for a width of 0.25 mm
constexpr double statePen = 2;
constexpr double greatestPen = 1.4;
constexpr double hair = 1;
constexpr double groundDepth = 2.5;
constexpr double othersDepth = 3; // the chart draws its series at 4
constexpr double marksDepth = 5;
constexpr double reach = 12; // px to either side of the cursor

QValueAxis* newAxis() {
  auto* axis = new QValueAxis;
  axis->setTickCount(2);
  axis->setVisible(false);
  return axis;
}

} // namespace

UtilisationPlot::UtilisationPlot(Desk& desk, std::function<std::optional<std::size_t>()> selected,
                                 QWidget* parent)
    : QChartView(parent), m_desk(desk), m_selectedIndex(std::move(selected)), m_x(newAxis()), m_y(newAxis()),
      m_shown(new QLineSeries(chart())), m_greatest(new QLineSeries(chart())),
      m_ground(new PictureItem(chart(), groundDepth)), m_others(new PictureItem(chart(), othersDepth)),
      m_marks(new PictureItem(chart(), marksDepth)) {
  // Before anything asks for the plot's interface, which Qt keeps from then on.
  makeDial(*this,
           {[this] { return turnedPlace() ? nominal().degrees() : 0; },
            [this](double degrees) { turnTo(degrees, m_desk.newCommand()); },
            [this] { return tr("%1 degrees").arg(turnedPlace() ? nominal().degrees() : 0, 0, 'f', 2); },
            [this] { return accessibleDescription(); }});
  chart()->addAxis(m_x, Qt::AlignBottom);
  chart()->addAxis(m_y, Qt::AlignLeft);
  chart()->legend()->hide();
  chart()->setMargins({});
  chart()->setBackgroundVisible(false);
  m_others->setCacheMode(QGraphicsItem::DeviceCoordinateCache); // they stand still while the line turns
  for (QLineSeries* series : {m_greatest, m_shown}) {
    chart()->addSeries(series);
    series->attachAxis(m_x);
    series->attachAxis(m_y);
  }
  setViewportUpdateMode(QGraphicsView::BoundingRectViewportUpdate);
  setRenderHint(QPainter::Antialiasing);
  setFrameShape(QFrame::NoFrame);
  setMinimumSize(least);
  QSizePolicy policy(QSizePolicy::Expanding, QSizePolicy::Preferred);
  policy.setHeightForWidth(true);
  setSizePolicy(policy);
  setFocusPolicy(Qt::StrongFocus);
  viewport()->setMouseTracking(true);
  setAccessibleName(tr("Utilisation over the angle of the line"));
  setProperty("helpPlace", "strength#plot");
  connect(&m_desk, &Desk::judgedAnew, this, &UtilisationPlot::refresh);
}

double UtilisationPlot::zoom() const {
  return zoomOf(*this, least);
}

void UtilisationPlot::setLogarithmic(bool logarithmic) {
  m_chosenScale = logarithmic;
  refresh();
}

void UtilisationPlot::refresh() {
  const std::optional<std::size_t> check = m_selectedIndex();
  const bool hasPlot = check && m_desk.readout().checks[*check].band;
  setVisible(hasPlot);
  if (!hasPlot || !isVisible())
    return;
  const bool wasFar = reachesFar();
  const AllRound& allRound = m_desk.allRound(*check);
  const UtilisationCurves& curves = allRound.curves();
  m_highest = curves.highest;
  const Readout& readout = m_desk.readout();
  const CheckSetup& setup = readout.checks[*check];
  std::optional<WorstInBand> worst;
  const Verdict verdict = verdictOfCheck(readout, *check);
  if (verdict.governing)
    if (const CheckReading& reading = readingOf(readout, *verdict.governing); reading.worstAngle)
      worst = {reading.worst, *reading.worstAngle};
  chooseScale(worst);
  zoomTo(*this, zoom());
  layOut(curves);
  drawCurves(curves);
  const std::optional<DirectionsOfCheck>& directions = allRound.directions();
  Picture ground = utilisationGround(m_frame, setup, directions ? directions->within : std::vector<Within>(),
                                     translation());
  const double bottom = viewport()->height() / zoom();
  const Picture key =
      utilisationKey({m_frame.plot.left, bottom - heightOfKey(curves, textSize), m_frame.plot.right, bottom},
                     textSize, penUnit, curves, readout.state().combination, translation());
  ground.parts.insert(ground.parts.end(), key.parts.begin(), key.parts.end());
  m_ground->show(std::move(ground), lookOf(*this));
  Picture marks = utilisationMarks(m_frame, setup, worst);
  if (hasFocus()) {
    const double x = m_frame.xOf(setup.band->nominal.degrees());
    const double y = m_frame.plot.bottom;
    marks.parts.emplace_back(Path{{{x - 12, y - 7}, {x + 12, y - 7}, {x + 12, y + 7}, {x - 12, y + 7}},
                                  true,
                                  Pen{Role::focus, 2},
                                  std::nullopt});
  }
  m_marks->show(std::move(marks), lookOf(*this));
  setAccessibleDescription(
      tr("%1 at %2")
          .arg(worst ? fromUtf8(shownUtilisation(worst->judgement.utilisation)) : QString(),
               fromUtf8(shownDegrees(setup.band->nominal, 2))));
  announceDial(*this);
  if (wasFar != reachesFar())
    emit reachChanged();
}

/// The scale does not change under a drag, nor is a choice kept where it does not help.
void UtilisationPlot::chooseScale(const std::optional<WorstInBand>& worst) {
  if (!reachesFar())
    m_chosenScale.reset();
  if (!m_hold)
    m_logarithmic = reachesFar() && m_chosenScale.value_or(suitsLogarithm(worst));
}

void UtilisationPlot::layOut(const UtilisationCurves& curves) {
  const planewright::Box room{4, 0, viewport()->width() / zoom() - 4,
                              viewport()->height() / zoom() - heightOfKey(curves, textSize)};
  m_frame = utilisationFrameIn(room, textSize, penUnit, m_highest, m_logarithmic, translation());
  const planewright::Box& plot = m_frame.plot;
  const QRectF area(plot.left, plot.top, plot.right - plot.left, plot.bottom - plot.top);
  if (chart()->plotArea() != area)
    chart()->setPlotArea(area);
  m_x->setRange(-90, 90);
  const auto height = [this](double value) { return m_logarithmic ? std::log10(value) : value; };
  m_y->setRange(height(m_frame.lowest), height(m_frame.highest));
  setBackgroundBrush(lookOf(*this).colour(Role::canvas));
}

void UtilisationPlot::put(QLineSeries& series, const UtilisationCurve& curve) {
  QList<QPointF> points;
  for (const Vec point : curve) {
    // A point far outside the plot would take its curve's stroke with it.
    const double y = std::clamp(point.y, m_frame.lowest / 2, 2 * m_frame.highest);
    points << QPointF(point.x, m_logarithmic ? std::log10(y) : y);
  }
  if (points != series.points())
    series.replace(points);
}

void UtilisationPlot::drawCurves(const UtilisationCurves& curves) {
  const Look look = lookOf(*this);
  put(*m_shown, curves.shown);
  m_shown->setPen(QPen(look.colour(Role::state), statePen));
  put(*m_greatest, curves.greatest);
  m_greatest->setPen(QPen(look.colour(Role::state), greatestPen, Qt::DashLine));
  Picture others;
  for (const UtilisationCurve& other : curves.others)
    std::ranges::copy(utilisationLines(m_frame, other, {Role::hush, hair}), std::back_inserter(others.parts));
  m_others->show(std::move(others), look);
}

std::optional<Place> UtilisationPlot::turnedPlace() const {
  const std::optional<std::size_t> check = m_selectedIndex();
  if (!check)
    return std::nullopt;
  const CheckSetup& setup = m_desk.readout().checks[*check];
  const std::string& point = m_desk.readout().point;
  if (!setup.line.empty())
    return Place{Spot::lineAngle, point, setup.line};
  return setup.plane.empty() ? std::nullopt : std::optional(Place{Spot::planeNormal, point, setup.plane});
}

Angle UtilisationPlot::nominal() const {
  return m_desk.readout().checks[*m_selectedIndex()].band->nominal;
}

void UtilisationPlot::turnTo(double degrees, Gesture gesture) {
  if (const std::optional<Place> place = turnedPlace())
    m_desk.request({Type{*place, angleText(folded(Angle::fromDegrees(degrees)))}}, gesture,
                   place->spot == Spot::lineAngle ? tr("turn of the line") : tr("turn of the plane"));
}

void UtilisationPlot::mousePressEvent(QMouseEvent* event) {
  if (event->button() != Qt::LeftButton || !turnedPlace())
    return;
  const double at = m_frame.degreesAt(inDrawing(event->position()).x());
  const double off = at - nominal().degrees();
  if (std::abs(m_frame.xOf(nominal().degrees()) - inDrawing(event->position()).x()) > reach)
    return;
  m_hold = Hold{m_desk.newGesture(), textAt(m_desk.study(), *turnedPlace()).value_or(std::string()), off};
}

void UtilisationPlot::mouseMoveEvent(QMouseEvent* event) {
  if (!m_hold) {
    const bool near = turnedPlace() &&
                      std::abs(m_frame.xOf(nominal().degrees()) - inDrawing(event->position()).x()) <= reach;
    viewport()->setCursor(near ? Qt::SizeHorCursor : Qt::ArrowCursor);
    return;
  }
  const double pixel = 180 / (m_frame.plot.right - m_frame.plot.left);
  const double step = decadeBelow(pixel) / (event->modifiers() & Qt::ShiftModifier ? 10 : 1);
  const double to = m_frame.degreesAt(inDrawing(event->position()).x()) - m_hold->grip;
  turnTo(roundedTo(std::clamp(to, -90.0, 90.0), step), m_hold->gesture);
}

void UtilisationPlot::mouseReleaseEvent(QMouseEvent*) {
  m_hold.reset();
}

void UtilisationPlot::keyPressEvent(QKeyEvent* event) {
  const std::optional<Place> place = turnedPlace();
  if (event->key() == Qt::Key_Escape && m_hold && place) {
    m_desk.request({Type{*place, m_hold->textAtStart}}, m_hold->gesture, tr("turn of the line"));
    m_hold.reset();
    return;
  }
  const std::optional<Angle> to =
      place ? keyedTurn(nominal(), event->key(), event->modifiers(), directionsForLine(m_desk.readout()))
            : std::nullopt;
  if (!to)
    return QChartView::keyPressEvent(event);
  turnTo(to->degrees(), m_keys.gestureOn(*place, m_desk));
  m_keys.pressed(m_desk);
}

QString UtilisationPlot::tipAt(QPointF drawn) const {
  const std::optional<std::size_t> check = m_selectedIndex();
  if (!check)
    return {};
  const Angle angle = Angle::fromDegrees(std::round(m_frame.degreesAt(drawn.x())));
  const double worst = greatestUtilisation(judgesOf(m_desk.readout(), *check).all, angle);
  return tr("%1 at %2, all combinations")
      .arg(fromUtf8(shownUtilisation(worst)), fromUtf8(shownDegrees(angle, 0)));
}

bool UtilisationPlot::viewportEvent(QEvent* event) {
  if (event->type() != QEvent::ToolTip)
    return QChartView::viewportEvent(event);
  const auto* help = static_cast<QHelpEvent*>(event);
  QToolTip::showText(help->globalPos(), m_hold ? QString() : tipAt(inDrawing(help->pos())), viewport());
  return true;
}

void UtilisationPlot::resizeEvent(QResizeEvent* event) {
  QChartView::resizeEvent(event);
  refresh();
}

void UtilisationPlot::showEvent(QShowEvent* event) {
  QChartView::showEvent(event);
  refresh();
}

void UtilisationPlot::changeEvent(QEvent* event) {
  QChartView::changeEvent(event);
  if (event->type() == QEvent::PaletteChange || event->type() == QEvent::FontChange)
    refresh();
}

void UtilisationPlot::focusInEvent(QFocusEvent* event) {
  QChartView::focusInEvent(event);
  m_keys.end();
  refresh();
}

void UtilisationPlot::focusOutEvent(QFocusEvent* event) {
  QChartView::focusOutEvent(event);
  m_keys.end();
  refresh();
}

} // namespace planewright
