// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/stress_group.h"

#include "core/table/cautions.h"
#include "core/table/table.h"
#include "ui/entry/draft_edit.h"
#include "ui/given/case_strip.h"
#include "ui/given/echoes.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QVBoxLayout>

namespace planewright {

namespace {

enum Field { sx, sy, txy, sz, axes };

} // namespace

StressGroup::StressGroup(Desk& desk, QWidget* parent)
    : FoldGroup(tr("Stress"), Role::ink, parent), m_desk(desk), m_strip(new CaseStrip(this)),
      m_sum(new QLabel(this)), m_caution(new QLabel(this)),
      m_addThird(new QuietButton(tr("Third direction"), Role::focus, this)),
      m_addAxes(new QuietButton(tr("Inclined axes"), Role::focus, this)) {
  body().addWidget(m_strip);
  addComponent(Spot::sx, tr("normal stress on the x face"), &PlaneStress::sx);
  addComponent(Spot::sy, tr("normal stress on the y face"), &PlaneStress::sy);
  addComponent(Spot::txy, tr("shear stress on the x face"), &PlaneStress::txy);
  addStress(Spot::sz, tr("normal stress in the third direction"),
            [this](const Study& study, const Readout& readout, const std::string&) {
              return echoOfThird(study, readout, caseId(study));
            });
  addAxes();
  buildMore();
  connect(m_strip, &CaseStrip::chosen, this, &StressGroup::chooseCase);
  connect(&m_desk, &Desk::changed, this, &StressGroup::refresh);
  refresh();
}

void StressGroup::addStress(Spot spot, const QString& meaning, decltype(EntryBinding::echo) echo) {
  EntryBinding binding = boundInto(
      [this](const Study& study) {
        return Place{Spot::caseStress, shownPoint(study).name, caseId(study)};
      },
      spot);
  binding.echo = std::move(echo);
  auto* field = new EntryField(m_desk, std::move(binding), {rowOf(spot).label, meaning, true}, this);
  field->caption().setFixedWidth(fontMetrics().horizontalAdvance(QStringLiteral("τxyx")));
  body().addWidget(field);
  m_fields += field;
}

void StressGroup::addComponent(Spot spot, const QString& meaning, double PlaneStress::*component) {
  addStress(spot, meaning, [this, component](const Study& study, const Readout& readout, const std::string&) {
    return echoOfStress(study, readout, caseId(study), component);
  });
}

void StressGroup::addAxes() {
  EntryBinding binding = boundTo([](const Study& study) {
    return Place{Spot::axes, shownPoint(study).name, {}};
  });
  binding.echo = [](const Study& study, const Readout& readout, const std::string&) {
    return echoOfDirection(shownPoint(study).axes, readout.axes);
  };
  auto* field = new EntryField(
      m_desk, std::move(binding),
      {PW_TEXT("Given", "x axis at"), tr("inclination of the member; it turns only the drawing"), false},
      this);
  body().addWidget(field);
  m_fields += field;
}

void StressGroup::buildMore() {
  m_sum->setForegroundRole(QPalette::PlaceholderText);
  m_sum->setWordWrap(true);
  body().addWidget(m_sum);
  m_caution->setWordWrap(true);
  body().addWidget(m_caution);
  m_addThird->setToolTip(
      tr("A normal stress out of the plane; it counts only in the absolute greatest shear"));
  m_addAxes->setToolTip(tr("Draw the element in the axes of an inclined member; no stress changes"));
  auto* line = new QHBoxLayout;
  line->addWidget(m_addThird);
  line->addWidget(m_addAxes);
  line->addStretch();
  body().addLayout(line);
  connect(m_addThird, &QAbstractButton::clicked, this, [this] {
    m_thirdWanted = true;
    refresh();
    m_fields[sz]->edit().setFocus();
  });
  connect(m_addAxes, &QAbstractButton::clicked, this, [this] {
    m_axesWanted = true;
    refresh();
    m_fields[axes]->edit().setFocus();
  });
}

bool StressGroup::isOfCase(const EntryField& field) const {
  return isAncestorOf(&field) && &field != m_fields[axes];
}

QList<QWidget*> StressGroup::buttons() const {
  return {m_addThird, m_addAxes};
}

std::string StressGroup::caseId(const Study& study) const {
  return findCase(study, m_case) ? m_case : study.cases.front().id;
}

void StressGroup::chooseCase(const std::string& id) {
  m_case = id;
  for (EntryField* field : m_fields)
    field->refresh();
  refresh();
}

void StressGroup::refresh() {
  m_strip->showCases(m_desk.study(), caseId(m_desk.study()));
  const StateReading* state = stateOfCase(m_desk.readout(), caseId(m_desk.study()));
  const bool third = state && state->sz != 0;
  const bool inclined = m_desk.readout().axes != Angle();
  m_fields[sz]->setVisible(third || m_thirdWanted);
  m_addThird->setVisible(!third && !m_thirdWanted);
  m_fields[axes]->setVisible(inclined || m_axesWanted);
  m_addAxes->setVisible(!inclined && !m_axesWanted);
  const QString sum = sumLine();
  m_sum->setText(sum);
  m_sum->setVisible(!sum.isEmpty());
  const QString caution = cautionLine();
  m_caution->setText(caution);
  m_caution->setVisible(!caution.isEmpty());
  setSummary(summary());
}

// Only where the shown state is not just the case that is typed here.
QString StressGroup::sumLine() const {
  const StateReading& state = m_desk.readout().state();
  if (&state == stateOfCase(m_desk.readout(), caseId(m_desk.study())))
    return {};
  return tr("in %1: %2").arg(fromUtf8(state.combination), componentsOf(state));
}

QString StressGroup::cautionLine() const {
  QStringList sentences;
  for (const Text& caution : cautionsOf(m_desk.readout(), m_desk.readout().state()))
    sentences << shown(caution);
  return sentences.join(QLatin1Char(' '));
}

QString StressGroup::summary() const {
  const StateReading* state = stateOfCase(m_desk.readout(), caseId(m_desk.study()));
  return state ? componentsOf(*state) : QString();
}

// The three numbers and their unit stay on one line.
QString StressGroup::componentsOf(const StateReading& state) const {
  const Study& study = m_desk.study();
  const auto one = [&](double stress) { return fromUtf8(shownStress(study, state, stress)); };
  const QString words = tr("%1   %2   %3 %4")
                            .arg(one(state.stress.sx), one(state.stress.sy), one(state.stress.txy),
                                 fromUtf8(study.units.stress));
  return QString(words).replace(QLatin1Char(' '), QChar(QChar::Nbsp));
}

} // namespace planewright
