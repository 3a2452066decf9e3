// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/line_group.h"

#include "core/quantity/format.h"
#include "core/table/table.h"
#include "ui/entry/draft_edit.h"
#include "ui/given/echoes.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"

#include <QLabel>
#include <QMenu>
#include <QVBoxLayout>

namespace planewright {

namespace {

Place lineSpot(const Study& study, Spot spot) {
  return {spot, shownPoint(study).name, {}};
}

EntryBinding boundToLine(Spot spot) {
  return boundTo([spot](const Study& study) { return lineSpot(study, spot); });
}

} // namespace

LineGroup::LineGroup(Desk& desk, QWidget* parent)
    : FoldGroup(tr("Line"), Role::ink, parent), m_desk(desk), m_kind(new QuietButton({}, Role::line, this)),
      m_sentence(new QLabel(this)) {
  buildKinds();
  addName();
  addAngle();
  addTolerance();
  m_fields.move(0, 2);
  m_sentence->setWordWrap(true);
  m_sentence->setForegroundRole(QPalette::PlaceholderText);
  body().addWidget(m_sentence);
  connect(&m_desk, &Desk::changed, this, &LineGroup::refresh);
  refresh();
}

void LineGroup::buildKinds() {
  auto* menu = new QMenu(m_kind);
  for (const Named<LineKind>& row : namesOf<LineKind>())
    menu->addAction(shown(row.label), this, [this, kind = row.value] { chooseKind(kind); });
  menu->addSeparator();
  menu->addAction(tr("another name…"), this, &LineGroup::editName);
  menu->addAction(tr("no line"), this, &LineGroup::removeLine);
  m_kind->setMenu(menu);
  m_kind->setAccessibleName(tr("kind of line"));
  setCorner(m_kind);
}

void LineGroup::addField(EntryBinding binding, EntryWords words) {
  auto* field = new EntryField(m_desk, std::move(binding), std::move(words), this);
  field->caption().setFixedWidth(fontMetrics().horizontalAdvance(tr("± within")) + 6);
  body().addWidget(field);
  m_fields += field;
}

void LineGroup::addName() {
  EntryBinding binding = boundToLine(Spot::lineName);
  binding.edits = [](const Study& study, const std::string& typed) -> Result<Edits> {
    return Edits{Rename{lineSpot(study, Spot::line), typed}};
  };
  addField(std::move(binding), {PW_TEXT("Given", "name"), tr("name of the line")});
}

void LineGroup::addAngle() {
  EntryBinding binding = boundToLine(Spot::lineAngle);
  binding.echo = [](const Study&, const Readout& readout, const std::string&) { return echoOfLine(readout); };
  addField(std::move(binding),
           {PW_TEXT("Given", "angle φ"), tr("angle of the line from +x, or a slope"), true});
}

void LineGroup::addTolerance() {
  EntryBinding binding = boundToLine(Spot::lineTolerance);
  binding.echo = [](const Study& study, const Readout& readout, const std::string&) {
    return echoOfTolerance(study, readout);
  };
  addField(std::move(binding), {PW_TEXT("Given", "± within"), tr("tolerance of the line's angle")});
}

QList<QWidget*> LineGroup::buttons() const {
  return {m_kind};
}

// A name that only repeats the kind follows it.
void LineGroup::chooseKind(LineKind kind) {
  const Study& study = m_desk.study();
  const std::optional<Line>& line = shownPoint(study).line;
  const Place place = lineSpot(study, Spot::line);
  Edits edits;
  if (!line)
    edits.push_back(Insert{place, std::nullopt});
  edits.push_back(Type{lineSpot(study, Spot::lineKind), std::string(wordOf(kind))});
  if (!line || isNamedByKind())
    edits.push_back(Rename{place, plain(labelOf(kind), translation())});
  m_desk.request(edits, m_desk.newGesture(), tr("kind of line"));
}

bool LineGroup::isNamedByKind() const {
  const std::optional<Line>& line = shownPoint(m_desk.study()).line;
  return line && line->name == plain(labelOf(line->kind), translation());
}

void LineGroup::editName() {
  m_nameWanted = true;
  refresh();
  m_fields.back()->edit().setFocus(Qt::OtherFocusReason);
}

void LineGroup::removeLine() {
  m_nameWanted = false;
  m_desk.request({Remove{lineSpot(m_desk.study(), Spot::line)}}, m_desk.newGesture(),
                 tr("removal of the line"));
}

void LineGroup::refresh() {
  const std::optional<Line>& line = shownPoint(m_desk.study()).line;
  m_kind->setText(line ? shown(labelOf(line->kind)) : tr("no line"));
  m_kind->updateGeometry();
  for (EntryField* field : m_fields)
    field->setVisible(line.has_value());
  m_fields.back()->setVisible(line && (m_nameWanted || !isNamedByKind()));
  m_kind->menu()->actions().at(m_kind->menu()->actions().size() - 2)->setEnabled(line.has_value());
  m_sentence->setText(sentence());
  setSummary(summary());
}

QString LineGroup::sentence() const {
  if (m_desk.readout().lines.empty())
    return tr("Without a line, only planes are read.");
  const NormalAngle normal = following(m_desk.readout().lines.front().angle);
  return tr("The cut following it has its normal at %1.")
      .arg(fromUtf8(shownDegrees(normal.value, angleDecimals)));
}

QString LineGroup::summary() const {
  const std::optional<Line>& line = shownPoint(m_desk.study()).line;
  if (!line)
    return tr("no line");
  if (line->tolerance.empty())
    return fromUtf8(line->name + ", " + line->angle);
  return fromUtf8(line->name + ", " + line->angle + " ± " + line->tolerance);
}

} // namespace planewright
