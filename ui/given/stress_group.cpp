// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/stress_group.h"

#include "core/table/cautions.h"
#include "core/table/parts_of_sx.h"
#include "core/table/table.h"
#include "ui/entry/draft_edit.h"
#include "ui/given/case_strip.h"
#include "ui/given/echoes.h"
#include "ui/given/source_fields.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QMenu>
#include <QVBoxLayout>

#include <algorithm>
#include <utility>

namespace planewright {

namespace {

enum Field { sx, sy, txy, sz, axes, edge };

/// The case to type in: the current one where it acts in the shown state and the point lists it, else the
/// first that does; of cases that are not listed likewise.
std::string caseToOpen(const Readout& readout, const std::string& current) {
  for (const bool listed : {true, false}) {
    const std::string* first = nullptr;
    for (const ActingCase& acting : readout.state().acting) {
      const CaseReading& one = readout.cases[acting.index];
      if (one.isListed != listed)
        continue;
      if (one.id == current)
        return current;
      first = first ? first : &one.id;
    }
    if (first)
      return *first;
  }
  const bool isThere = std::ranges::count(readout.cases, current, &CaseReading::id) > 0;
  return isThere ? current : readout.cases.front().id;
}

} // namespace

StressGroup::StressGroup(Desk& desk, QWidget* parent)
    : FoldGroup(tr("Stress"), Role::ink, parent), m_desk(desk), m_strip(new CaseStrip(this)),
      m_whole(new QLabel(this)), m_sum(new QLabel(this)), m_caution(new QLabel(this)),
      m_addSource(new QuietButton(tr("Add a source"), Role::focus, this)),
      m_addThird(new QuietButton(tr("Third direction"), Role::focus, this)),
      m_addAxes(new QuietButton(tr("Inclined axes"), Role::focus, this)),
      m_addEdge(new QuietButton(tr("Free edge"), Role::focus, this)) {
  setProperty("helpPlace", "given#typed");
  // Before the fields, so that they ask for the case that is to be seen.
  connect(&m_desk, &Desk::changed, this, &StressGroup::followShown);
  followShown();
  body().addWidget(m_strip);
  addComponent(Spot::sx, tr("normal stress on the x face"));
  addComponent(Spot::sy, tr("normal stress on the y face"));
  addComponent(Spot::txy, tr("shear stress on the x face"));
  addSources();
  addStress(Spot::sz, tr("normal stress in the third direction"),
            [this](const Study& study, const Readout& readout, const std::string&) {
              return echoOfThird(study, readout, caseId(study));
            });
  addAxes();
  buildMore();
  connect(m_strip, &CaseStrip::rebuilt, this, &StressGroup::fieldsChanged);
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

void StressGroup::addComponent(Spot spot, const QString& meaning) {
  addStress(spot, meaning, [this](const Study& study, const Readout& readout, const std::string& typed) {
    return echoOfStress(study, readout, caseId(study), typed);
  });
}

void StressGroup::addSources() {
  auto* menu = new QMenu(m_addSource);
  for (const Spot spot : {Spot::forces, Spot::pressure, Spot::rosette}) {
    auto* source = new SourceFields(
        m_desk, spot, [this](const Study& study) { return caseId(study); }, this);
    body().addWidget(source);
    m_sources += source;
    connect(source, &SourceFields::made, this, &StressGroup::fieldsChanged);
    menu->addAction(shown(rowOf(spot).label), source, &SourceFields::add);
  }
  m_addSource->setMenu(menu);
  m_addSource->setProperty("helpPlace", "given#sources");
  m_addSource->setToolTip(
      tr("Section forces, pressure in a thin wall or measured strains: they add to the typed stresses"));
  m_whole->setWordWrap(true);
  body().addWidget(m_whole);
}

void StressGroup::addDirection(Spot spot, const Text& caption, const QString& meaning,
                               decltype(EntryBinding::echo) echo) {
  EntryBinding binding = boundTo([spot](const Study& study) {
    return Place{spot, shownPoint(study).name, {}};
  });
  binding.echo = std::move(echo);
  auto* field = new EntryField(m_desk, std::move(binding), {caption, meaning, false}, this);
  field->setProperty("helpPlace", spot == Spot::axes ? "given#axes" : "given#free-edge");
  body().addWidget(field);
  m_fields += field;
}

void StressGroup::addAxes() {
  addDirection(Spot::axes, PW_TEXT("Given", "x axis at"),
               tr("inclination of the member; it turns only the drawing"),
               [](const Study& study, const Readout& readout, const std::string&) {
                 return echoOfDirection(shownPoint(study).axes, readout.axes);
               });
  addDirection(
      Spot::freeEdge, PW_TEXT("Given", "free edge at"), tr("direction of an edge that carries nothing"),
      [](const Study& study, const Readout& readout, const std::string&) {
        return readout.edge ? echoOfDirection(shownPoint(study).freeEdge, readout.edge->value) : QString();
      });
}

QList<EntryField*> StressGroup::fields() const {
  QList<EntryField*> fields = m_fields.mid(0, sz);
  for (const SourceFields* source : m_sources)
    fields += source->fields();
  return fields + m_fields.mid(sz);
}

void StressGroup::buildMore() {
  m_sum->setForegroundRole(QPalette::PlaceholderText);
  m_sum->setWordWrap(true);
  body().addWidget(m_sum);
  m_caution->setWordWrap(true);
  body().addWidget(m_caution);
  m_addThird->setProperty("helpPlace", "given#third");
  m_addAxes->setProperty("helpPlace", "given#axes");
  m_addEdge->setProperty("helpPlace", "given#free-edge");
  m_addThird->setToolTip(
      tr("A normal stress out of the plane; it counts only in the absolute greatest shear"));
  m_addAxes->setToolTip(tr("Draw the element in the axes of an inclined member; no stress changes"));
  auto* line = new QHBoxLayout;
  line->addWidget(m_addThird);
  line->addWidget(m_addAxes);
  line->addStretch();
  auto* sources = new QHBoxLayout;
  sources->addWidget(m_addSource);
  sources->addWidget(m_addEdge);
  sources->addStretch();
  body().addLayout(sources);
  body().addLayout(line);
  m_addEdge->setToolTip(
      tr("An edge that carries nothing: what the stresses leave there finds wrong signs and wrong fibres"));
  connect(m_addEdge, &QAbstractButton::clicked, this, [this] {
    m_edgeWanted = true;
    refresh();
    m_fields[edge]->edit().setFocus();
  });
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
  return isAncestorOf(&field) && &field != m_fields[axes] && &field != m_fields[edge];
}

QList<QWidget*> StressGroup::buttons() const {
  QList<QWidget*> buttons = m_strip->buttons() + QList<QWidget*>{m_addSource};
  for (const SourceFields* source : m_sources)
    buttons += source->buttons();
  return buttons + QList<QWidget*>{m_addThird, m_addAxes, m_addEdge};
}

std::string StressGroup::caseId(const Study& study) const {
  return findCase(study, m_case) ? m_case : study.cases.front().id;
}

void StressGroup::followShown() {
  const Readout& readout = m_desk.readout();
  const Shown now{readout.point, readout.state().combination};
  if (now == m_chosenAt && findCase(m_desk.study(), m_case))
    return;
  m_chosenAt = now;
  m_case = caseToOpen(readout, m_case);
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
  for (SourceFields* source : m_sources) {
    if (!source->isPresent())
      keepKeys(*source, m_fields[sx]->edit());
    source->refresh();
  }
  for (qsizetype i = 0; i < m_sources.size(); ++i)
    m_addSource->menu()->actions().at(i)->setEnabled(!m_sources.at(i)->isPresent());
  const QString whole = caseLine();
  m_whole->setText(whole);
  m_whole->setVisible(!whole.isEmpty());
  const bool hasEdge = m_desk.readout().edge.has_value();
  for (const auto& [field, stays] : {std::pair{edge, hasEdge || m_edgeWanted},
                                     {sz, third || m_thirdWanted},
                                     {axes, inclined || m_axesWanted}})
    if (!stays)
      keepKeys(*m_fields[field], m_fields[sx]->edit());
  m_fields[edge]->setVisible(hasEdge || m_edgeWanted);
  m_addEdge->setVisible(!hasEdge && !m_edgeWanted);
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

// The typed stresses and the sources together, where there are both.
QString StressGroup::caseLine() const {
  const std::string id = caseId(m_desk.study());
  const auto& cases = m_desk.readout().cases;
  const auto one = std::ranges::find(cases, id, &CaseReading::id);
  const StateReading* state = stateOfCase(m_desk.readout(), id);
  if (one == cases.end() || one->isDirect || !state)
    return {};
  const QString sum = tr("%1 in all: %2").arg(fromUtf8(id), componentsOf(*state));
  const Text parts = partsOfSx(stressFormOf(m_desk.study(), *state), *one);
  return parts.empty() ? sum : sum + QLatin1Char('\n') + shown(parts);
}

QString StressGroup::edgeLine() const {
  const StateReading& state = m_desk.readout().state();
  if (!state.edge)
    return {};
  const auto part = [&](double stress) { return fromUtf8(shownStress(m_desk.study(), state, stress)); };
  constexpr double noticed = 0.005;
  if (state.edge->share() < noticed)
    return tr("The free edge carries nothing, as it should.");
  return tr("On the free edge are left σn = %1 and τnt = %2 %3: look for a wrong sign or fibre.")
      .arg(part(state.edge->traction.sn), part(state.edge->traction.tnt),
           fromUtf8(m_desk.study().units.stress));
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
  const Readout& readout = m_desk.readout();
  for (const Text& caution : cautionsOf(readout, readout.state()))
    sentences << shown(caution);
  // What is typed here has its limits also where it does not act in what is shown.
  const auto typed = std::ranges::find(readout.cases, caseId(m_desk.study()), &CaseReading::id);
  if (typed != readout.cases.end())
    for (const Text& caution : typed->cautions)
      if (!sentences.contains(shown(caution)))
        sentences << shown(caution);
  if (const QString left = edgeLine(); !left.isEmpty())
    sentences.prepend(left);
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
