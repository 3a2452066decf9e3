// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/check_fields.h"

#include "core/study/check_edits.h"
#include "core/study/strength_rules.h"
#include "core/table/check_words.h"
#include "ui/entry/value_echo.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"

#include <QGridLayout>
#include <QLabel>
#include <QMenu>

#include <algorithm>

namespace planewright {

namespace {

/// What an empty parameter counts as.
QString usualOf(Spot spot) {
  switch (spot) {
  case Spot::checkN:
    return CheckFields::tr("2, usual");
  case Spot::checkKc90:
    return CheckFields::tr("1, usual");
  case Spot::checkF12:
    return CheckFields::tr("−0.5 √(F₁₁ F₂₂), usual");
  default:
    return {};
  }
}

QLabel* captionOf(const QString& words, QWidget* parent) {
  auto* label = new QLabel(words, parent);
  label->setForegroundRole(QPalette::PlaceholderText);
  return label;
}

} // namespace

CheckFields::CheckFields(Desk& desk, std::function<std::optional<std::size_t>()> selected, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_selectedIndex(std::move(selected)),
      m_material(new QuietButton({}, Role::focus, this)), m_criterion(new QuietButton({}, Role::focus, this)),
      m_direction(new QuietButton({}, Role::line, this)) {
  setProperty("helpPlace", "strength#checks");
  auto* grid = new QGridLayout(this);
  grid->setContentsMargins(0, 0, 0, 0);
  grid->setVerticalSpacing(2);
  const std::pair<QString, QuietButton*> rows[] = {
      {tr("material"), m_material}, {tr("criterion"), m_criterion}, {tr("on"), m_direction}};
  int row = 0;
  for (const auto& [caption, button] : rows) {
    grid->addWidget(captionOf(caption, this), row, 0);
    grid->addWidget(button, row++, 1, Qt::AlignLeft);
    button->setMenu(new QMenu(button));
    button->setAccessibleName(caption);
    button->setFocusPolicy(Qt::TabFocus);
  }
  grid->setColumnStretch(1, 1);
  connect(m_material->menu(), &QMenu::aboutToShow, this, &CheckFields::listMaterials);
  connect(m_criterion->menu(), &QMenu::aboutToShow, this, &CheckFields::listCriteria);
  connect(m_direction->menu(), &QMenu::aboutToShow, this, &CheckFields::listDirections);
  addParameter(Spot::checkN, tr("exponent of Hankinson's formula, 2 unless given"));
  addParameter(Spot::checkF12, tr("product coefficient of Tsai and Wu; half the usual root unless given"));
  addParameter(Spot::checkKc90, tr("factor of compression across the grain, 1 unless given"));
  addParameter(Spot::checkEdge, tr("direction of the tapered edge"));
  connect(&m_desk, &Desk::changed, this, &CheckFields::refresh);
  refresh();
}

QList<QWidget*> CheckFields::buttons() const {
  return {m_material, m_criterion, m_direction};
}

const Check* CheckFields::check() const {
  const std::optional<std::size_t> index = m_selectedIndex();
  return index ? findCheck(shownPoint(m_desk.study()), m_desk.readout().checks[*index].id) : nullptr;
}

void CheckFields::addParameter(Spot spot, const QString& meaning) {
  EntryBinding binding = boundTo([this, spot](const Study& study) {
    const Check* now = check();
    return Place{spot, shownPoint(study).name, now ? now->id : std::string()};
  });
  binding.echo = [this, spot](const Study& study, const Readout&, const std::string& typed) {
    const Check* now = check();
    if (typed.empty() || !now)
      return usualOf(spot);
    return echoOfValue(study, {spot, shownPoint(study).name, now->id}, typed);
  };
  auto* field = new EntryField(m_desk, std::move(binding), {rowOf(spot).label, meaning}, this);
  auto* grid = static_cast<QGridLayout*>(layout());
  grid->addWidget(field, grid->rowCount(), 0, 1, 2);
  m_fields << field;
  m_spots << spot;
}

void CheckFields::ask(const Edits& edits, const QString& what) {
  if (const auto problem = m_desk.request(edits, m_desk.newCommand(), what))
    m_desk.say(shown(*problem));
}

void CheckFields::listMaterials() {
  QMenu& menu = *m_material->menu();
  menu.clear();
  for (const Material& material : m_desk.study().materials)
    menu.addAction(fromUtf8(material.name), this, [this, name = material.name] {
      if (const Check* now = check())
        ask(withMaterial(m_desk.study(), shownPoint(m_desk.study()), *now, name),
            tr("material of the check"));
    });
}

void CheckFields::listCriteria() {
  QMenu& menu = *m_criterion->menu();
  menu.clear();
  menu.setToolTipsVisible(true);
  const Check* now = check();
  if (!now)
    return;
  for (const Criterion criterion : criteriaFor(findMaterial(m_desk.study(), now->material)->kind)) {
    QAction* action = menu.addAction(shown(labelOf(criterion)), this, [this, criterion] {
      if (const Check* one = check())
        ask(withCriterion(shownPoint(m_desk.study()), *one, criterion), tr("criterion of the check"));
    });
    const CriterionRow& row = rowOf(criterion);
    action->setToolTip(shown(symbol(row.equation)) + QLatin1Char('\n') + shown(row.source));
    action->setCheckable(true);
    action->setChecked(criterion == now->criterion);
  }
}

void CheckFields::listDirections() {
  QMenu& menu = *m_direction->menu();
  menu.clear();
  const Check* now = check();
  if (!now)
    return;
  const Point& point = shownPoint(m_desk.study());
  const auto add = [&](const std::string& name) {
    menu.addAction(fromUtf8(name), this, [this, name] {
      if (const Check* one = check())
        ask(withDirection(shownPoint(m_desk.study()), *one, name), tr("direction of the check"));
    });
  };
  if (rowOf(now->criterion).actsOn == ActsOn::line)
    for (const Line& line : point.lines)
      add(line.name);
  if (rowOf(now->criterion).actsOn == ActsOn::plane)
    for (const WatchedPlane& plane : point.planes)
      add(plane.name);
}

void CheckFields::refresh() {
  const Check* now = check();
  setVisible(now != nullptr);
  if (!now)
    return;
  m_material->setText(fromUtf8(now->material));
  m_criterion->setText(shown(labelOf(now->criterion)));
  m_criterion->setProperty("helpPlace",
                           QLatin1String("criteria#") + QLatin1String(nameRow(now->criterion).word));
  m_criterion->setToolTip(shown(symbol(rowOf(now->criterion).equation)) + QLatin1Char('\n') +
                          shown(rowOf(now->criterion).source));
  const std::string& direction = now->line.empty() ? now->plane : now->line;
  m_direction->setText(direction.empty() ? tr("every direction") : fromUtf8(direction));
  m_direction->setEnabled(!direction.empty());
  const std::vector<Spot> known = parametersOf(now->criterion);
  for (int i = 0; i < m_fields.size(); ++i) {
    m_fields[i]->setVisible(std::ranges::find(known, m_spots[i]) != known.end());
    m_fields[i]->refresh();
  }
}

} // namespace planewright
