// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/convention_group.h"

#include "ui/given/choice_button.h"
#include "ui/given/sense_picture.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"

#include <QButtonGroup>
#include <QGridLayout>
#include <QHBoxLayout>
#include <QLabel>
#include <QMenu>
#include <QVBoxLayout>

namespace planewright {

namespace {

ChoiceButton::Picture pictureOf(Positive positive) {
  return [positive](QPainter& painter, const QRectF& box, const Look& look) {
    paintSense(painter, box, positive, look);
  };
}

ChoiceButton::Picture pictureOf(ShearAxis axis) {
  return [axis](QPainter& painter, const QRectF& box, const Look& look) {
    paintShearAxis(painter, box, axis, look);
  };
}

/// The labels as they fit under a picture and beside a folded heading.
Text shortLabel(Positive positive) {
  return positive == Positive::tension ? PW_TEXT("Given", "tension +") : PW_TEXT("Given", "compression +");
}

Text shortLabel(ShearAxis axis) {
  return axis == ShearAxis::tensorDown ? PW_TEXT("Given", "τ drawn + down")
                                       : PW_TEXT("Given", "τ drawn + up");
}

void check(const QList<ChoiceButton*>& buttons, int which) {
  buttons.at(which)->setChecked(true);
}

} // namespace

ConventionGroup::ConventionGroup(Desk& desk, QWidget* parent)
    : FoldGroup(tr("Conventions"), Role::ink, parent), m_desk(desk) {
  setProperty("helpPlace", "conventions#choose");
  auto* grid = new QGridLayout;
  grid->setSpacing(6);
  addChoices<Positive>(*grid, m_positive);
  addChoices<ShearAxis>(*grid, m_shearAxis);
  body().addLayout(grid);
  // It counts only in section forces, but whoever types them must see it.
  m_shearForce = addWord<ShearRule>(Spot::shearForce, tr("sense of the shear force"));
  addUnits();
  m_digits = addWord<Digits>(Spot::digits, tr("digits of stresses"));
  setFolded(true);
  connect(&m_desk, &Desk::changed, this, &ConventionGroup::refresh);
  refresh();
}

template <class Enum>
void ConventionGroup::addChoices(QGridLayout& grid, QList<ChoiceButton*>& buttons) {
  const int row = grid.count() / 2;
  auto* group = new QButtonGroup(this);
  for (const Named<Enum>& choice : namesOf<Enum>()) {
    auto* button = new ChoiceButton(pictureOf(choice.value), shortLabel(choice.value), this);
    button->setAccessibleName(shown(choice.label));
    connect(button, &QAbstractButton::clicked, this, [this, value = choice.value] { choose(value); });
    group->addButton(button);
    grid.addWidget(button, row, static_cast<int>(buttons.size()));
    buttons += button;
  }
}

void ConventionGroup::addUnits() {
  auto* heading = new QLabel(tr("Units of bare numbers and of results"), this);
  heading->setForegroundRole(QPalette::PlaceholderText);
  heading->setWordWrap(true);
  body().addWidget(heading);
  const std::initializer_list<std::pair<Spot, Text>> units = {{Spot::unitStress, PW_TEXT("Given", "stress")},
                                                              {Spot::unitForce, PW_TEXT("Given", "force")},
                                                              {Spot::unitLength, PW_TEXT("Given", "length")},
                                                              {Spot::unitMoment, PW_TEXT("Given", "moment")}};
  for (const auto& [spot, caption] : units) {
    EntryBinding binding = boundTo([spot = spot](const Study&) { return Place{spot, {}, {}}; });
    auto* field = new EntryField(m_desk, std::move(binding), {caption, shown(rowOf(spot).label)}, this);
    field->caption().setFixedWidth(fontMetrics().horizontalAdvance(tr("moment")) + 8);
    body().addWidget(field);
    m_fields += field;
  }
}

template <class Enum>
QuietButton* ConventionGroup::addWord(Spot spot, const QString& what) {
  auto* button = new QuietButton({}, Role::focus, this);
  button->setAccessibleName(shown(rowOf(spot).label));
  auto* menu = new QMenu(button);
  for (const Named<Enum>& row : namesOf<Enum>())
    menu->addAction(shown(row.label), this, [this, spot, what, word = std::string(row.word)] {
      m_desk.request({Type{{spot, {}, {}}, word}}, m_desk.newCommand(), what);
    });
  button->setMenu(menu);
  auto* line = new QHBoxLayout;
  line->addWidget(button);
  line->addStretch();
  body().addLayout(line);
  return button;
}

QList<QWidget*> ConventionGroup::buttons() const {
  return {m_positive.at(0), m_positive.at(1), m_shearAxis.at(0), m_shearAxis.at(1), m_shearForce, m_digits};
}

void ConventionGroup::choose(Positive positive) {
  if (positive == m_desk.study().convention.positive)
    return;
  m_desk.request({Type{{Spot::positive, {}, {}}, std::string(wordOf(positive))}}, m_desk.newCommand(),
                 tr("sign convention"));
  m_desk.say(positive == Positive::tension
                 ? tr("Tension now counts positive. Typed numbers keep their digits and now mean the "
                      "opposite sense.")
                 : tr("Compression now counts positive. Typed numbers keep their digits and now mean the "
                      "opposite sense."));
}

void ConventionGroup::choose(ShearAxis axis) {
  m_desk.request({Type{{Spot::shearAxis, {}, {}}, std::string(wordOf(axis))}}, m_desk.newCommand(),
                 tr("direction of the shear axis"));
}

void ConventionGroup::refresh() {
  const Convention& convention = m_desk.study().convention;
  check(m_positive, static_cast<int>(convention.positive));
  check(m_shearAxis, static_cast<int>(convention.shearAxis));
  m_shearForce->setText(convention.shearForce == ShearRule::upward ? tr("Vy positive upwards")
                                                                   : tr("Vy = dMz/dx"));
  m_shearForce->setToolTip(shown(labelOf(convention.shearForce)));
  m_shearForce->updateGeometry();
  m_digits->setText(shown(labelOf(convention.digits)));
  m_digits->updateGeometry();
  setSummary(
      tr("%1, %2").arg(shown(shortLabel(convention.positive)), shown(shortLabel(convention.shearAxis))));
}

} // namespace planewright
