// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/source_fields.h"

#include "core/study/section_edits.h"
#include "core/study/typed.h"
#include "ui/entry/draft_edit.h"
#include "ui/given/echoes.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QMenu>
#include <QVBoxLayout>

#include <algorithm>

namespace planewright {

namespace {

bool isOfOrthotropic(Spot spot) {
  return spot == Spot::rosetteAlong || spot == Spot::rosetteAcross || spot == Spot::rosetteNu12 ||
         spot == Spot::rosetteG;
}

/// "100 mm × 200 mm"
QString sizesOf(const TypedSection& section) {
  QStringList sizes;
  for (const TypedSize& size : section.sizes)
    sizes << fromUtf8(size.text);
  return sizes.join(QStringLiteral(" × "));
}

Spot firstOf(Spot source) {
  switch (source) {
  case Spot::forces:
    return Spot::forceN;
  case Spot::pressure:
    return Spot::pressureP;
  default:
    return Spot::gaugeStrainA;
  }
}

bool isOfIsotropic(Spot spot) {
  return spot == Spot::rosetteE || spot == Spot::rosetteNu;
}

} // namespace

SourceFields::SourceFields(Desk& desk, Spot source, CaseId caseId, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_source(source), m_caseId(std::move(caseId)) {
  setProperty("helpPlace", source == Spot::forces     ? "given#section-forces"
                           : source == Spot::pressure ? "given#pressure"
                                                      : "given#rosette");
}

void SourceFields::make() {
  makeHead();
  if (m_source == Spot::forces)
    addForces();
  else if (m_source == Spot::pressure)
    addPressure();
  else
    addRosette();
  Q_EMIT made();
}

void SourceFields::makeHead() {
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 4, 0, 0);
  rows->setSpacing(4);
  auto* head = new QHBoxLayout;
  auto* title = new QLabel(shown(rowOf(m_source).label), this);
  title->setForegroundRole(QPalette::PlaceholderText);
  m_remove = new QuietButton(tr("remove"), Role::focus, this);
  m_remove->setAccessibleName(tr("remove %1").arg(shown(rowOf(m_source).label)));
  connect(m_remove, &QAbstractButton::clicked, this, &SourceFields::remove);
  head->addWidget(title);
  head->addStretch();
  head->addWidget(m_remove);
  rows->addLayout(head);
}

Place SourceFields::place(const Study& study, Spot spot) const {
  return {spot, shownPoint(study).name, m_caseId(study)};
}

void SourceFields::addField(Spot spot, const QString& meaning) {
  EntryBinding binding = boundTo([this, spot](const Study& study) { return place(study, spot); });
  binding.echo = [this, spot](const Study& study, const Readout&, const std::string& typed) {
    return echoOfValue(entryKindOf(study, place(study, spot)), typed);
  };
  auto* field = new EntryField(m_desk, std::move(binding), {rowOf(spot).label, meaning}, this);
  field->caption().setFixedWidth(fontMetrics().horizontalAdvance(QStringLiteral("Eφ+90°")));
  layout()->addWidget(field);
  m_fields += field;
  m_spots += spot;
}

void SourceFields::addForces() {
  addField(Spot::forceN, tr("normal force, tension positive"));
  addField(Spot::forceVy, tr("shear force in y"));
  addField(Spot::forceVz, tr("shear force in z"));
  addField(Spot::forceT, tr("torsional moment, right-handed about +x"));
  addField(Spot::forceMy, tr("bending moment about y, positive when it pulls at z > 0"));
  addField(Spot::forceMz, tr("bending moment about z, sagging positive"));
}

void SourceFields::addPressure() {
  addField(Spot::pressureP, tr("pressure inside over that outside"));
  addField(Spot::pressureR, tr("inner radius"));
  addField(Spot::pressureT, tr("thickness of the wall"));
  addChoice<Ends>(Spot::pressureEnds, tr("ends of the vessel"));
}

void SourceFields::addRosette() {
  addField(Spot::gaugeStrainA, tr("strain of gauge a"));
  addField(Spot::gaugeAngleA, tr("direction of gauge a from +x"));
  addField(Spot::gaugeStrainB, tr("strain of gauge b"));
  addField(Spot::gaugeAngleB, tr("direction of gauge b from +x"));
  addField(Spot::gaugeStrainC, tr("strain of gauge c"));
  addField(Spot::gaugeAngleC, tr("direction of gauge c from +x"));
  addChoice<Elasticity>(Spot::rosetteMaterial, tr("material under the gauges"));
  addField(Spot::rosetteE, tr("modulus of elasticity"));
  addField(Spot::rosetteNu, tr("Poisson's ratio"));
  addField(Spot::rosetteAlong, tr("modulus of elasticity along the line"));
  addField(Spot::rosetteAcross, tr("modulus of elasticity across the line"));
  addField(Spot::rosetteNu12, tr("Poisson's ratio: contraction across the line when stressed along it"));
  addField(Spot::rosetteG, tr("shear modulus"));
}

template <class Enum>
void SourceFields::addChoice(Spot spot, const QString& meaning) {
  m_choice = new QuietButton({}, Role::focus, this);
  m_choice->setAccessibleName(meaning);
  auto* menu = new QMenu(m_choice);
  for (const Named<Enum>& row : namesOf<Enum>())
    menu->addAction(shown(row.label), this, [this, spot, word = std::string(row.word), meaning] {
      ask({Type{place(m_desk.study(), spot), word}}, meaning);
    });
  m_choice->setMenu(menu);
  auto* line = new QHBoxLayout;
  line->addWidget(m_choice);
  line->addStretch();
  static_cast<QVBoxLayout*>(layout())->addLayout(line);
}

QList<QWidget*> SourceFields::buttons() const {
  if (!m_remove)
    return {};
  return m_choice ? QList<QWidget*>{m_choice, m_remove} : QList<QWidget*>{m_remove};
}

bool SourceFields::isPresent() const {
  return textAt(m_desk.study(), place(m_desk.study(), firstOf(m_source))).has_value();
}

// Section forces need a section, and measured strains a case that is measured.
Edits SourceFields::editsThatAdd() const {
  const Study& study = m_desk.study();
  const Point& point = shownPoint(study);
  Edits edits;
  if (m_source == Spot::forces && !point.fibre)
    edits = editsThatGiveFibre(
        study, point.name, study.sections.empty() ? freshSectionName(study) : study.sections.front().name);
  if (m_source == Spot::rosette)
    edits.push_back(Type{{Spot::caseNature, m_caseId(study), {}}, std::string(wordOf(Nature::measured))});
  if (!findStress(point, m_caseId(study)))
    edits.push_back(Insert{place(study, Spot::caseStress), std::nullopt});
  edits.push_back(Insert{place(study, m_source), std::nullopt});
  return edits;
}

Nature SourceFields::nature() const {
  return findCase(m_desk.study(), m_caseId(m_desk.study()))->nature;
}

void SourceFields::ask(const Edits& edits, const QString& what) {
  if (const auto problem = m_desk.request(edits, m_desk.newCommand(), what))
    m_desk.say(shown(*problem));
}

// What the case was before its rosette came is not known any more.
void SourceFields::remove() {
  ask({Remove{place(m_desk.study(), m_source)}}, tr("removal of %1").arg(shown(rowOf(m_source).label)));
  if (m_source == Spot::rosette && !isPresent() && nature() == Nature::measured)
    m_desk.say(tr("Case %1 is still a measured one; its nature is in the list of load cases.")
                   .arg(fromUtf8(m_caseId(m_desk.study()))));
}

bool SourceFields::isFactored() const {
  return std::ranges::any_of(m_desk.study().combinations, [this](const Combination& one) {
    return std::ranges::any_of(one.factors, [this](const Factor& factor) {
      return factor.caseId == m_caseId(m_desk.study()) &&
             valueOf(m_desk.study(), Spot::factor, factor.factor) != 1;
    });
  });
}

void SourceFields::add() {
  const QString id = fromUtf8(m_caseId(m_desk.study()));
  if (m_source == Spot::rosette && nature() != Nature::measured && isFactored())
    return m_desk.say(
        tr("What is measured takes factor 1 only, and a combination has another one for case %1: give the "
           "rosette a case of its own.")
            .arg(id));
  const Nature before = nature();
  const std::size_t sections = m_desk.study().sections.size();
  ask(editsThatAdd(), tr("new: %1").arg(shown(rowOf(m_source).label)));
  if (!isPresent())
    return;
  if (nature() != before)
    m_desk.say(tr("Case %1 is a measured one now, at all points: it takes factor 1 only.").arg(id));
  if (m_desk.study().sections.size() > sections)
    m_desk.say(
        tr("The forces need a section: “%1” was added, to begin with a rectangle %2. Give it its own shape "
           "and sizes.")
            .arg(fromUtf8(m_desk.study().sections.back().name), sizesOf(m_desk.study().sections.back())));
  m_fields.front()->edit().setFocus(Qt::OtherFocusReason);
  m_fields.front()->edit().selectAll();
}

void SourceFields::refresh() {
  const bool present = isPresent();
  if (present && m_fields.empty())
    make(); // while hidden, so that all of it is shown together
  setVisible(present);
  if (!present)
    return;
  for (EntryField* field : m_fields)
    field->refresh();
  const CaseStress* stress = findStress(shownPoint(m_desk.study()), m_caseId(m_desk.study()));
  if (m_choice) {
    m_choice->setText(m_source == Spot::pressure ? shown(labelOf(stress->pressure->ends))
                                                 : shown(labelOf(stress->rosette->material)));
    m_choice->updateGeometry();
  }
  if (m_source == Spot::rosette)
    for (qsizetype i = 0; i < m_fields.size(); ++i) {
      const bool isotropic = stress->rosette->material == Elasticity::isotropic;
      m_fields.at(i)->setVisible(isotropic ? !isOfOrthotropic(m_spots.at(i)) : !isOfIsotropic(m_spots.at(i)));
    }
}

} // namespace planewright
