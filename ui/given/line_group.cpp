// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/line_group.h"

#include "core/quantity/format.h"
#include "core/study/fresh_name.h"
#include "core/study/slope_edits.h"
#include "core/table/table.h"
#include "ui/entry/draft_edit.h"
#include "ui/given/echoes.h"
#include "ui/given/faces_dialog.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"
#include "ui/look/steady_label.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QMenu>
#include <QVBoxLayout>

namespace planewright {

namespace {

constexpr int runsOfSlopes[] = {8, 10, 12, 15, 20}; // 1 in

/// A name for a line of this kind that no other line of the point has.
std::string freeName(const Point& point, LineKind kind) {
  const std::string word = plain(labelOf(kind), translation());
  return freshName(
      1, [&](const std::string& number) { return number == "1" ? word : word + " " + number; },
      [&](const std::string& name) { return findLine(point, name); });
}

} // namespace

LineGroup::LineGroup(Desk& desk, std::size_t index, QWidget* parent)
    : FoldGroup(index == 0 ? tr("Line") : tr("Second line"), Role::ink, parent), m_desk(desk), m_index(index),
      m_kind(new QuietButton({}, Role::line, this)),
      m_slopes(new QuietButton(tr("Slope of unknown sense"), Role::focus, this)),
      m_second(new QuietButton(tr("Second line"), Role::focus, this)), m_sentence(new SteadyLabel(this)) {
  setProperty("helpPlace", "lines#angle");
  buildKinds();
  addName();
  addAngle();
  addTolerance();
  buildSlopes();
  m_fields.move(0, 2);
  m_sentence->label().setForegroundRole(QPalette::PlaceholderText);
  body().addWidget(m_sentence);
  buildSecond();
  connect(&m_desk, &Desk::changed, this, &LineGroup::refresh);
  refresh();
}

const Line* LineGroup::line(const Study& study) const {
  const std::vector<Line>& lines = shownPoint(study).lines;
  return m_index < lines.size() ? &lines[m_index] : nullptr;
}

Place LineGroup::spot(const Study& study, Spot spot) const {
  const Line* own = line(study);
  return {spot, shownPoint(study).name, own ? own->name : std::string()};
}

EntryBinding LineGroup::boundToLine(Spot spotOf) const {
  return boundTo([this, spotOf](const Study& study) { return spot(study, spotOf); });
}

void LineGroup::buildSecond() {
  m_second->setProperty("helpPlace", "lines#second");
  m_second->setToolTip(
      tr("A second direction of the material at this point, such as the bond beside the grain"));
  auto* row = new QHBoxLayout;
  row->addWidget(m_second);
  row->addStretch();
  body().addLayout(row);
  connect(m_second, &QAbstractButton::clicked, this, [this] { addLine(LineKind::bond); });
}

/// A slope whose sense is unknown comes first: taken to one side only it may hide the worse one.
void LineGroup::buildSlopes() {
  auto* menu = new QMenu(m_slopes);
  for (const int run : runsOfSlopes)
    m_eitherWay << menu->addAction({}, this, [this, run] { takeEitherWay("1 in " + exactNumber(run)); });
  menu->addSeparator();
  menu->addAction(tr("true slope from two faces…"), this, [this] {
    const Line* own = line(m_desk.study());
    auto* dialog = new FacesDialog(own ? *own : Line(), this);
    dialog->setAttribute(Qt::WA_DeleteOnClose);
    connect(dialog, &QDialog::accepted, this, [this, dialog] { takeEitherWay(dialog->slope()); });
    dialog->open();
  });
  m_slopes->setMenu(menu);
  m_slopes->setProperty("helpPlace", "lines#slopes");
  m_slopes->setToolTip(
      tr("The slope of a grain whose sense is not known: the tolerance to either side of the angle above"));
  auto* row = new QHBoxLayout;
  row->addWidget(m_slopes);
  row->addStretch();
  body().addLayout(row);
}

/// The angle is named where it is not that of the member: it stays as the centre.
void LineGroup::nameSlopes() {
  const Line* own = line(m_desk.study());
  if (!own)
    return;
  const bool turned = m_desk.readout().lines[m_index].angle.value != Angle();
  for (int i = 0; i < m_eitherWay.size(); ++i)
    m_eitherWay[i]->setText(turned ? tr("within 1 in %1 either way of %2")
                                         .arg(runsOfSlopes[i])
                                         .arg(nameForMenu(fromUtf8(own->angle)))
                                   : tr("within 1 in %1 either way").arg(runsOfSlopes[i]));
}

void LineGroup::takeEitherWay(const std::string& slope) {
  const Line* own = line(m_desk.study());
  if (!own)
    return;
  if (const auto problem = m_desk.request(withinEitherWay(shownPoint(m_desk.study()).name, own->name, slope),
                                          m_desk.newCommand(), tr("slope of unknown sense")))
    m_desk.say(shown(*problem));
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
  EntryBinding binding = boundToLine(Spot::line);
  binding.text = [this](const Study& study) { return line(study) ? line(study)->name : std::string(); };
  binding.edits = [this](const Study& study, const std::string& typed) -> Result<Edits> {
    return Edits{Rename{spot(study, Spot::line), typed}};
  };
  addField(std::move(binding), {PW_TEXT("Given", "name"), tr("name of the line")});
}

void LineGroup::addAngle() {
  EntryBinding binding = boundToLine(Spot::lineAngle);
  binding.echo = [this](const Study&, const Readout& readout, const std::string&) {
    return echoOfLine(readout, m_index);
  };
  addField(std::move(binding),
           {PW_TEXT("Given", "angle φ"), tr("angle of the line from +x, or a slope"), true});
}

void LineGroup::addTolerance() {
  EntryBinding binding = boundToLine(Spot::lineTolerance);
  binding.echo = [this](const Study& study, const Readout& readout, const std::string&) {
    return echoOfTolerance(study, readout, m_index);
  };
  addField(std::move(binding), {PW_TEXT("Given", "± within"), tr("tolerance of the line's angle")});
}

QList<QWidget*> LineGroup::buttons() const {
  return {m_kind, m_slopes, m_second};
}

void LineGroup::addLine(LineKind kind) {
  const Point& point = shownPoint(m_desk.study());
  const std::string name = freeName(point, kind);
  m_desk.request({Insert{{Spot::line, point.name, name}, std::nullopt},
                  Type{{Spot::lineKind, point.name, name}, std::string(wordOf(kind))}},
                 m_desk.newCommand(), tr("new line"));
}

// A name that only repeats the kind follows it.
void LineGroup::chooseKind(LineKind kind) {
  const Study& study = m_desk.study();
  if (!line(study))
    return addLine(kind);
  Edits edits = {Type{spot(study, Spot::lineKind), std::string(wordOf(kind))}};
  if (isNamedByKind() && line(study)->kind != kind)
    edits.push_back(Rename{spot(study, Spot::line), freeName(shownPoint(study), kind)});
  m_desk.request(edits, m_desk.newCommand(), tr("kind of line"));
}

bool LineGroup::isNamedByKind() const {
  const Line* own = line(m_desk.study());
  return own && own->name == plain(labelOf(own->kind), translation());
}

void LineGroup::editName() {
  m_nameWanted = true;
  refresh();
  m_fields.back()->edit().setFocus(Qt::OtherFocusReason);
}

void LineGroup::removeLine() {
  m_nameWanted = false;
  m_desk.request({Remove{spot(m_desk.study(), Spot::line)}}, m_desk.newCommand(), tr("removal of the line"));
}

void LineGroup::refresh() {
  const Line* own = line(m_desk.study());
  m_kind->setText(own ? shown(labelOf(own->kind)) : tr("no line"));
  m_kind->updateGeometry();
  for (EntryField* field : m_fields) {
    if (!own)
      keepKeys(*field, *m_kind);
    field->setVisible(own);
  }
  m_fields.back()->setVisible(own && (m_nameWanted || !isNamedByKind()));
  m_kind->menu()->actions().at(m_kind->menu()->actions().size() - 2)->setEnabled(own);
  m_slopes->setVisible(own && own->kind == LineKind::grain);
  nameSlopes();
  m_second->setVisible(m_index == 0 && shownPoint(m_desk.study()).lines.size() == 1);
  m_sentence->setText(sentence());
  setSummary(summary());
}

QString LineGroup::sentence() const {
  if (!line(m_desk.study()))
    return tr("Without a line, only planes are read.");
  const NormalAngle normal = following(m_desk.readout().lines[m_index].angle);
  return tr("The cut following it has its normal at %1.")
      .arg(fromUtf8(shownDegrees(normal.value, angleDecimals)));
}

QString LineGroup::summary() const {
  const Line* own = line(m_desk.study());
  if (!own)
    return tr("no line");
  if (own->tolerance.empty())
    return fromUtf8(own->name + ", " + own->angle);
  return fromUtf8(own->name + ", " + own->angle + " ± " + own->tolerance);
}

} // namespace planewright
