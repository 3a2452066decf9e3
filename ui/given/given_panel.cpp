// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/given_panel.h"

#include "ui/entry/draft_edit.h"
#include "ui/entry/entry_field.h"
#include "ui/given/convention_group.h"
#include "ui/given/line_group.h"
#include "ui/given/note_field.h"
#include "ui/given/reading_group.h"
#include "ui/given/section_group.h"
#include "ui/given/section_view.h"
#include "ui/given/sense_key.h"
#include "ui/given/stress_group.h"
#include "ui/look/look.h"
#include "ui/look/steady_label.h"

#include <QFrame>
#include <QHBoxLayout>
#include <QLabel>
#include <QVBoxLayout>

#include <algorithm>

namespace planewright {

namespace {

constexpr int sideMargin = 12;

QFrame* rule(QWidget* parent) {
  auto* line = new QFrame(parent);
  line->setFrameShape(QFrame::HLine);
  line->setFrameShadow(QFrame::Plain);
  line->setForegroundRole(QPalette::Mid);
  return line;
}

} // namespace

GivenPanel::GivenPanel(Desk& desk, QWidget* parent) : ColumnArea(parent), m_desk(desk) {
  setAccessibleName(tr("Given"));
  setProperty("helpPlace", "given#typed");
  setProperty("areaKeys", tr("Enter takes an entry, Esc puts it back, F8 next entry not taken"));
  auto* content = new QWidget(this);
  buildHeading(content);
  buildGroups(content);
  setWidget(content);
  takeFields();
  connect(m_stress, &StressGroup::fieldsChanged, this, &GivenPanel::takeFields);
  connect(m_section, &SectionGroup::fieldsChanged, this, &GivenPanel::takeFields);
  connect(&m_desk, &Desk::changed, this, &GivenPanel::refresh);
  refresh();
}

// While a window goes the focus leaves its fields, and they take what was typed: by then this is no panel.
GivenPanel::~GivenPanel() {
  m_desk.disconnect(this);
  for (EntryField* field : fields())
    field->disconnect(this);
}

void GivenPanel::watchFields() {
  for (EntryField* field : fields())
    connect(field, &EntryField::takenChanged, this, &GivenPanel::countProblems, Qt::UniqueConnection);
}

void GivenPanel::buildHeading(QWidget* content) {
  auto* heading = new QLabel(tr("Given"), content);
  QFont bold = font();
  bold.setBold(true);
  heading->setFont(bold);
  m_fact = new SteadyLabel(content);
  m_fact->setForegroundRole(QPalette::PlaceholderText);
  m_fact->label().setAlignment(Qt::AlignRight | Qt::AlignVCenter);
  auto* line = new QHBoxLayout;
  line->addWidget(heading);
  line->addWidget(m_fact, 1);
  auto* rows = new QVBoxLayout(content);
  rows->setContentsMargins(sideMargin, 8, sideMargin, 12);
  rows->setSpacing(8);
  rows->addLayout(line);
  rows->addWidget(new SenseKey(m_desk, content));
}

void GivenPanel::buildGroups(QWidget* content) {
  auto* rows = static_cast<QVBoxLayout*>(content->layout());
  m_stress = new StressGroup(m_desk, content);
  m_section = new SectionGroup(m_desk, content);
  m_line = new LineGroup(m_desk, 0, content);
  m_reading = new ReadingGroup(m_desk, content);
  m_conventions = new ConventionGroup(m_desk, content);
  m_notes = new FoldGroup(tr("Notes"), Role::ink, content);
  m_note = new NoteField(m_desk, m_notes);
  m_notes->body().addWidget(m_note);
  m_notes->setFolded(true);
  for (FoldGroup* group :
       std::initializer_list<FoldGroup*>{m_stress, m_section, m_line, m_reading, m_conventions, m_notes}) {
    if (group != m_stress)
      rows->addWidget(rule(content));
    rows->addWidget(group);
  }
  rows->addStretch(1);
}

void GivenPanel::makeSecondLine() {
  m_secondLine = new LineGroup(m_desk, 1, widget());
  m_secondRule = rule(widget());
  auto* rows = static_cast<QVBoxLayout*>(widget()->layout());
  const int below = rows->indexOf(m_line) + 1;
  rows->insertWidget(below, m_secondRule);
  rows->insertWidget(below + 1, m_secondLine);
  takeFields();
}

void GivenPanel::takeFields() {
  watchFields();
  orderTabs();
}

// Tab goes down what an engineer types first: components and their sources, the section, line, reading plane;
// then everything else.
void GivenPanel::orderTabs() {
  QList<QWidget*> order;
  const auto add = [&order](const QList<EntryField*>& some) {
    for (EntryField* field : some)
      order += &field->edit();
  };
  const QList<EntryField*> ofStress = m_stress->fields();
  add(ofStress.mid(0, ofStress.size() - 1));
  add(m_section->fields());
  add(ofStress.mid(ofStress.size() - 1)); // the free edge
  add(m_line->fields().mid(0, 2));
  if (m_secondLine)
    add(m_secondLine->fields().mid(0, 2));
  add(m_reading->fields());
  order += m_reading->buttons();
  order += QList<QWidget*>{&m_section->heading()} + m_section->buttons();
  order += QList<QWidget*>{&m_stress->heading()} + m_stress->buttons();
  order += QList<QWidget*>{&m_line->heading()} + m_line->buttons();
  add(m_line->fields().mid(2));
  if (m_secondLine) {
    order += QList<QWidget*>{&m_secondLine->heading()} + m_secondLine->buttons();
    add(m_secondLine->fields().mid(2));
  }
  order += QList<QWidget*>{&m_reading->heading(), &m_conventions->heading()} + m_conventions->buttons();
  add(m_conventions->fields());
  order += QList<QWidget*>{&m_notes->heading(), m_note};
  for (qsizetype i = 1; i < order.size(); ++i)
    setTabOrder(order.at(i - 1), order.at(i));
}

QList<EntryField*> GivenPanel::fields() const {
  const QList<EntryField*> second = m_secondLine ? m_secondLine->fields() : QList<EntryField*>();
  return m_stress->fields() + m_section->fields() + m_line->fields() + second + m_reading->fields() +
         m_conventions->fields();
}

void GivenPanel::refresh() {
  m_fact->setText(tr("bare numbers in %1").arg(fromUtf8(m_desk.study().units.stress)));
  const QString note = fromUtf8(shownPoint(m_desk.study()).note);
  const bool hasSecond = shownPoint(m_desk.study()).lines.size() > 1;
  if (hasSecond && !m_secondLine)
    makeSecondLine();
  if (m_secondLine) {
    if (!hasSecond)
      FoldGroup::keepKeys(*m_secondLine, m_line->heading());
    m_secondLine->setVisible(hasSecond);
    m_secondRule->setVisible(hasSecond);
  }
  m_notes->setSummary(note.isEmpty() ? tr("none") : note.section(QLatin1Char('\n'), 0, 0));
  countProblems();
}

void GivenPanel::focusFirst() {
  m_stress->setFolded(false);
  DraftEdit& first = m_stress->fields().front()->edit();
  first.setFocus(Qt::OtherFocusReason);
  first.selectAll();
}

void GivenPanel::focusReading() {
  m_reading->setFolded(false);
  DraftEdit& normal = m_reading->fields().front()->edit();
  normal.setFocus(Qt::OtherFocusReason);
  normal.selectAll();
  ensureWidgetVisible(m_reading);
}

void GivenPanel::focusConventions() {
  m_conventions->setFolded(false);
  m_conventions->buttons().front()->setFocus(Qt::OtherFocusReason);
  ensureWidgetVisible(m_conventions);
}

void GivenPanel::focusNextProblem() {
  focusProblem(1);
}

void GivenPanel::focusPreviousProblem() {
  focusProblem(-1);
}

void GivenPanel::focusProblem(int step) {
  const QList<EntryField*> all = fields();
  const qsizetype count = all.size();
  qsizetype here = step > 0 ? -1 : count;
  for (qsizetype i = 0; i < count; ++i)
    if (all.at(i)->edit().hasFocus())
      here = i;
  for (qsizetype i = 1; i <= count; ++i) {
    EntryField* field = all.at((here + step * i + 2 * count) % count);
    if (field->isTaken())
      continue;
    for (QWidget* above = field->parentWidget(); above != nullptr; above = above->parentWidget())
      if (auto* group = qobject_cast<FoldGroup*>(above))
        group->setFolded(false);
    field->focusProblem();
    ensureWidgetVisible(field);
    return;
  }
}

QString GivenPanel::labelOfEntry(const EntryField& field) const {
  const Study& study = m_desk.study();
  const bool ofCase = study.cases.size() > 1 && m_stress->isOfCase(field);
  return ofCase ? tr("%1 of case %2").arg(field.name(), fromUtf8(m_stress->caseId(study))) : field.name();
}

void GivenPanel::countProblems() {
  int count = 0;
  QString first;
  for (const EntryField* field : fields()) {
    if (field->isTaken())
      continue;
    if (count++ == 0)
      first = labelOfEntry(*field);
  }
  Q_EMIT entriesNotTaken(count, first);
}

} // namespace planewright
