// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/state_bar.h"

#include "ui/look/look.h"
#include "ui/shell/governing_words.h"
#include "ui/shell/picker.h"
#include "ui/shell/verdict_chip.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QPushButton>

namespace planewright {

namespace {

/// A narrower bar has shorter names and does not say what governs.
constexpr int roomy = 85; // in sizes of the text, as is the next
constexpr int leastForCaptions = 70;

} // namespace

StateBar::StateBar(Desk& desk, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_points(new Picker(tr("Point"), tr("Ctrl"), this)),
      m_combinations(new Picker(tr("Combination"), tr("Alt"), this)),
      m_governs(new QLabel(tr("governs here"), this)), m_verdict(new VerdictChip(desk, this)),
      m_figure(new QPushButton(tr("Figure…"), this)) {
  auto* row = new QHBoxLayout(this);
  row->setContentsMargins(12, 0, 12, 0);
  row->setSpacing(20);
  row->addWidget(m_points);
  row->addWidget(m_combinations);
  row->addWidget(m_governs);
  row->addWidget(m_verdict);
  row->addStretch();
  row->addWidget(m_figure);
  setFixedHeight(barHeight);
  setAutoFillBackground(true);
  setBackgroundRole(QPalette::AlternateBase);
  setAccessibleName(tr("What is shown"));
  setProperty("helpPlace", "window#state-bar");
  m_figure->setProperty("helpPlace", "figures#arrange");
  setProperty("areaKeys", tr("Ctrl+PageUp/PageDown point, Alt+PageUp/PageDown combination"));
  connect(m_points, &Picker::chosen, this,
          [this](const QString& name) { m_desk.show(name.toStdString(), m_desk.study().shown.combination); });
  connect(m_combinations, &Picker::chosen, this,
          [this](const QString& name) { m_desk.show(m_desk.study().shown.point, name.toStdString()); });
  m_points->setDetails([this] { return pointDetails(m_desk.study()); });
  m_combinations->setDetails([this] { return combinationDetails(m_desk.study(), m_desk.readout()); });
  connect(&m_desk, &Desk::changed, this, &StateBar::refresh);
  refresh();
}

void StateBar::refresh() {
  QStringList points;
  for (const Point& point : m_desk.study().points)
    points << fromUtf8(point.name);
  m_points->show(points, points.indexOf(fromUtf8(shownPoint(m_desk.study()).name)));
  QStringList states;
  for (const StateReading& state : m_desk.readout().states)
    states << fromUtf8(state.combination);
  m_combinations->show(states, static_cast<qsizetype>(m_desk.readout().shown));
  refreshGoverns();
}

void StateBar::refreshGoverns() {
  const QString how = governsInWords(m_desk.readout(), m_desk.readout().shown);
  m_governs->setToolTip(how);
  m_governs->setAccessibleDescription(how);
  m_governs->setVisible(!how.isEmpty() && width() >= roomy * font().pixelSize());
}

void StateBar::resizeEvent(QResizeEvent* event) {
  QWidget::resizeEvent(event);
  const int name = width() < roomy * font().pixelSize() ? 128 : 200;
  for (Picker* picker : {m_points, m_combinations})
    picker->showCaption(width() >= leastForCaptions * font().pixelSize());
  m_points->setNameWidth(name);
  m_combinations->setNameWidth(name);
  refreshGoverns();
}

} // namespace planewright
