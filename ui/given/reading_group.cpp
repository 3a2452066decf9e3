// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/reading_group.h"

#include "core/quantity/format.h"
#include "core/study/cut_text.h"
#include "core/study/named_directions.h"
#include "core/table/table.h"
#include "ui/given/echoes.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"

#include <QLabel>
#include <QMenu>
#include <QVBoxLayout>

namespace planewright {

namespace {

Place readingSpot(const Study& study) {
  return {Spot::reading, shownPoint(study).name, {}};
}

} // namespace

ReadingGroup::ReadingGroup(Desk& desk, QWidget* parent)
    : FoldGroup(tr("Reading plane"), Role::reading, parent), m_desk(desk),
      m_goTo(new QuietButton(tr("Go to"), Role::focus, this)) {
  setProperty("helpPlace", "lines#reading");
  auto* menu = new QMenu(m_goTo);
  m_goTo->setMenu(menu);
  m_goTo->setAccessibleName(tr("go to a named direction"));
  setCorner(m_goTo);
  connect(menu, &QMenu::aboutToShow, this, &ReadingGroup::listDirections);
  addNormal();
  addCut();
  connect(&m_desk, &Desk::changed, this, &ReadingGroup::refresh);
  refresh();
}

void ReadingGroup::addField(EntryBinding binding, EntryWords words) {
  auto* field = new EntryField(m_desk, std::move(binding), std::move(words), this);
  field->caption().setFixedWidth(fontMetrics().horizontalAdvance(tr("cut itself at")) + 6);
  body().addWidget(field);
  m_fields += field;
}

void ReadingGroup::addNormal() {
  EntryBinding binding = boundTo(readingSpot);
  binding.echo = [](const Study& study, const Readout& readout, const std::string&) {
    return echoOfDirection(shownPoint(study).reading, readout.reading.value);
  };
  addField(std::move(binding), {PW_TEXT("Given", "normal at"), tr("angle of the reading plane's normal")});
}

void ReadingGroup::addCut() {
  EntryBinding binding = boundTo(readingSpot);
  binding.text = [this](const Study&) { return cutText(m_desk.readout().reading); };
  binding.edits = [](const Study& study, const std::string& typed) {
    return normalTextForCut(typed).map([&](const std::string& normal) {
      return Edits{Type{readingSpot(study), normal}};
    });
  };
  binding.echo = [](const Study&, const Readout& readout, const std::string& typed) {
    return echoOfDirection(typed, cutOf(readout.reading).value);
  };
  addField(std::move(binding),
           {PW_TEXT("Given", "cut itself at"), tr("direction in which the reading plane runs")});
}

QList<QWidget*> ReadingGroup::buttons() const {
  return {m_goTo};
}

void ReadingGroup::listDirections() {
  QMenu* menu = m_goTo->menu();
  menu->clear();
  for (const NamedDirection& direction : directionsForNormal(m_desk.readout())) {
    QString words = shown(direction.name);
    if (direction.byName)
      words += QLatin1Char('\t') + fromUtf8(shownDegrees(direction.angle, angleDecimals));
    menu->addAction(words, this, [this, angle = direction.angle] {
      m_desk.request({Type{readingSpot(m_desk.study()), angleText(angle)}}, m_desk.newCommand(),
                     tr("turn of the reading plane"));
    });
  }
}

void ReadingGroup::refresh() {
  const NormalAngle normal = m_desk.readout().reading;
  setSummary(
      tr("normal %1, cut %2")
          .arg(fromUtf8(shownDegrees(normal.value, 1)), fromUtf8(shownDegrees(cutOf(normal).value, 1))));
}

} // namespace planewright
