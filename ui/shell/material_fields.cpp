// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/material_fields.h"

#include "core/shipped/shipped_materials.h"
#include "core/study/material_edits.h"
#include "core/study/text_fields.h"
#include "core/study/typed.h"
#include "ui/entry/complaint.h"
#include "ui/entry/draft_edit.h"
#include "ui/entry/value_echo.h"
#include "ui/look/look.h"
#include "ui/shell/choice_box.h"
#include "ui/shell/material_words.h"

#include <QGridLayout>
#include <QHBoxLayout>
#include <QLabel>
#include <QPushButton>
#include <QVBoxLayout>

#include <algorithm>

namespace planewright {

namespace {

/// Columns without margins of their own.
template <class Layout>
Layout* bare(QWidget* widget) {
  auto* layout = new Layout(widget);
  layout->setContentsMargins(0, 0, 0, 0);
  return layout;
}

void alignCaptions(const QList<EntryField*>& fields) {
  int width = 0;
  for (const EntryField* field : fields)
    width = std::max(width, field->caption().sizeHint().width());
  for (const EntryField* field : fields)
    field->caption().setFixedWidth(width);
}

/// Whether the duration factors are those that are shipped for the service class; also where there is none.
bool hasFactorsOfClass(const Study& study, const Material& material) {
  if (std::ranges::find(serviceClasses(), material.serviceClass) == serviceClasses().end())
    return true;
  const Material usual = inServiceClass(material, material.serviceClass);
  return std::ranges::all_of(textFieldsOf<DurationTexts>(), [&](const TextField<DurationTexts>& field) {
    const std::string& own = material.durations.*field.text;
    return !own.empty() &&
           valueOf(study, field.spot, own) == valueOf(study, field.spot, usual.durations.*field.text);
  });
}

bool hasFactors(const Material& material) {
  return !material.partialFactor.empty() || !material.factor.empty() || !material.serviceClass.empty() ||
         material.durations != DurationTexts{};
}

} // namespace

MaterialFields::MaterialFields(Desk& desk, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_complaint(new Complaint(this)), m_use(new QLabel(this)) {
  build();
}

Place MaterialFields::place(Spot spot) const {
  return {spot, m_material, {}};
}

const Material* MaterialFields::shownMaterial() const {
  return findMaterial(m_desk.study(), m_material);
}

void MaterialFields::build() {
  // The path stays the same while the key is typed over.
  EntryBinding name;
  name.path = [](const Study&) { return std::string("name of the material"); };
  name.text = [this](const Study&) { return m_material; };
  name.edits = [this](const Study&, const std::string& typed) -> Result<Edits> {
    return Edits{Rename{place(Spot::material), typed}};
  };
  m_name = new EntryField(m_desk, std::move(name),
                          {PW_TEXT("MaterialFields", "name"), tr("name of the material")}, this);
  m_use->setWordWrap(true);
  m_use->setTextFormat(Qt::PlainText);
  m_use->setForegroundRole(QPalette::PlaceholderText);
  m_complaint->hide();
  auto* rows = bare<QVBoxLayout>(this);
  rows->setSpacing(6);
  rows->addWidget(m_name);
  rows->addWidget(choices());
  rows->addWidget(m_complaint);
  rows->addWidget(m_use);
  rows->addWidget(heading(tr("Strengths")));
  for (const Named<MaterialKind>& row : namesOf<MaterialKind>()) {
    m_strengths.emplace_back(row.value, strengths(row.value));
    rows->addWidget(m_strengths.back().second);
  }
  rows->addWidget(heading(tr("Where they come from")));
  rows->addWidget(origin());
  m_factors = factors();
  rows->addWidget(m_factors);
  rows->addStretch();
}

QWidget* MaterialFields::heading(const QString& words) {
  auto* label = new QLabel(words, this);
  QFont bold = label->font();
  bold.setBold(true);
  label->setFont(bold);
  label->setContentsMargins(0, 8, 0, 0);
  return label;
}

EntryField* MaterialFields::addField(Spot spot, const Text& caption, std::optional<MaterialKind> kind) {
  EntryBinding binding = boundTo([this, spot](const Study&) { return place(spot); });
  if (rowOf(spot).holds == Holds::expression)
    binding.echo = [this, spot](const Study& study, const Readout&, const std::string& typed) {
      return echoOfValue(study, place(spot), typed);
    };
  auto* field = new EntryField(m_desk, std::move(binding), {caption, shown(rowOf(spot).label)}, this);
  field->setToolTip(shown(rowOf(spot).label));
  m_fields.push_back({spot, kind, field});
  return field;
}

// Downwards first, so that Tab reads as a list does.
void MaterialFields::addColumns(QGridLayout& grid, const QList<EntryField*>& left,
                                const QList<EntryField*>& right) {
  grid.setHorizontalSpacing(18);
  grid.setVerticalSpacing(4);
  grid.setColumnStretch(0, 1);
  grid.setColumnStretch(1, 1);
  for (int i = 0; i < left.size(); ++i)
    grid.addWidget(left[i], i, 0, Qt::AlignTop);
  for (int i = 0; i < right.size(); ++i)
    grid.addWidget(right[i], i, 1, Qt::AlignTop);
  alignCaptions(left);
  alignCaptions(right);
}

QWidget* MaterialFields::strengths(MaterialKind kind) {
  auto* box = new QWidget(this);
  auto* grid = bare<QGridLayout>(box);
  QList<EntryField*> fields;
  for (const StrengthKey key : keysOf(kind))
    fields += addField(spotOf(key), labelOf(kind, key), kind);
  const qsizetype half = (fields.size() + 1) / 2;
  addColumns(*grid, fields.first(half), fields.sliced(half));
  return box;
}

QWidget* MaterialFields::origin() {
  auto* box = new QWidget(this);
  auto* rows = bare<QVBoxLayout>(box);
  rows->setSpacing(4);
  const QList<EntryField*> fields = {addField(Spot::materialSource, PW_TEXT("MaterialFields", "source")),
                                     addField(Spot::materialEdition, PW_TEXT("MaterialFields", "edition")),
                                     addField(Spot::materialTrust, PW_TEXT("MaterialFields", "how read"))};
  for (EntryField* field : fields)
    rows->addWidget(field);
  alignCaptions(fields);
  return box;
}

QWidget* MaterialFields::factors() {
  auto* box = new QWidget(this);
  auto* rows = bare<QVBoxLayout>(box);
  rows->setSpacing(4);
  rows->addWidget(heading(tr("Factors")));
  auto* grid = new QGridLayout;
  const QList<EntryField*> own = {
      addField(Spot::serviceClass, PW_TEXT("MaterialFields", "service class")),
      addField(Spot::partialFactor, PW_TEXT("MaterialFields", "partial factor")),
      addField(Spot::strengthFactor, PW_TEXT("MaterialFields", "explicit factor"))};
  const QList<EntryField*> durations = {
      addField(Spot::durationPermanent, PW_TEXT("MaterialFields", "permanent loads")),
      addField(Spot::durationLong, PW_TEXT("MaterialFields", "long loads")),
      addField(Spot::durationMedium, PW_TEXT("MaterialFields", "medium loads")),
      addField(Spot::durationShort, PW_TEXT("MaterialFields", "short loads")),
      addField(Spot::durationInstantaneous, PW_TEXT("MaterialFields", "instantaneous loads"))};
  addColumns(*grid, own, durations);
  rows->addLayout(grid);
  auto* rule =
      new QLabel(tr("Strengths are multiplied by the factor of the shortest load that acts, over the partial "
                    "factor. An explicit factor takes the place of both."),
                 box);
  m_classRemark = new QLabel(box);
  m_classRemark->setWordWrap(true);
  m_classButton = new QPushButton(box);
  m_classButton->setAutoDefault(false);
  connect(m_classButton, &QPushButton::clicked, this, &MaterialFields::takeFactorsOfClass);
  rows->addWidget(m_classRemark);
  rows->addWidget(m_classButton, 0, Qt::AlignLeft);
  rule->setWordWrap(true);
  rule->setForegroundRole(QPalette::PlaceholderText);
  rows->addWidget(rule);
  return box;
}

template <class Enum>
QWidget* MaterialFields::addChoice(Spot spot, const QString& caption) {
  auto* row = new QWidget(this);
  auto* line = bare<QHBoxLayout>(row);
  auto* box = new ChoiceBox(row);
  for (const Named<Enum>& name : namesOf<Enum>())
    box->addItem(shown(name.label), QString::fromLatin1(name.word));
  box->setAccessibleName(shown(rowOf(spot).label));
  line->addWidget(new QLabel(caption, row));
  line->addWidget(box);
  m_choices.push_back({spot, box, row});
  connect(box, &QComboBox::activated, this, [this, choice = m_choices.back()] {
    choose(choice, choice.box->currentData().toString().toStdString());
  });
  return row;
}

QWidget* MaterialFields::choices() {
  auto* box = new QWidget(this);
  auto* line = bare<QHBoxLayout>(box);
  line->setSpacing(18);
  line->addWidget(addChoice<MaterialKind>(Spot::materialKind, tr("kind")));
  line->addWidget(addChoice<StrengthBasis>(Spot::materialBasis, tr("basis")));
  line->addWidget(addChoice<Seam>(Spot::seam, tr("seam")));
  line->addStretch();
  return box;
}

// What is not taken does not stay in the list.
void MaterialFields::choose(const Choice& choice, const std::string& word) {
  const Study& study = m_desk.study();
  const Edits edits = choice.spot == Spot::materialKind
                          ? editsThatChangeKind(study, m_material, *fromWord<MaterialKind>(word))
                          : Edits{Type{place(choice.spot), word}};
  const std::optional<Problem> problem = m_desk.request(
      edits, m_desk.newCommand(), tr("%1 of %2").arg(shown(rowOf(choice.spot).label), fromUtf8(m_material)));
  refresh();
  if (problem)
    m_complaint->say(shown(problem->what), shown(problem->mend));
  m_complaint->setVisible(problem.has_value());
}

void MaterialFields::takeFactorsOfClass() {
  const Material usual = inServiceClass(*shownMaterial(), shownMaterial()->serviceClass);
  Edits edits;
  for (const TextField<DurationTexts>& field : textFieldsOf<DurationTexts>())
    edits.push_back(Type{place(field.spot), usual.durations.*field.text});
  m_desk.request(edits, m_desk.newCommand(), tr("duration factors of %1").arg(fromUtf8(m_material)));
  refresh();
}

void MaterialFields::showClass(const Material& material) {
  const bool differs = !hasFactorsOfClass(m_desk.study(), material);
  m_classRemark->setText(
      tr("The duration factors are not those of service class %1 in EN 1995-1-1: the class alone changes no "
         "number.")
          .arg(fromUtf8(material.serviceClass)));
  m_classButton->setText(tr("Take the factors of service class %1").arg(fromUtf8(material.serviceClass)));
  m_classRemark->setVisible(differs);
  m_classButton->setVisible(differs);
}

QString MaterialFields::classRemark() const {
  return m_classRemark->isHidden() ? QString() : m_classRemark->text();
}

QAbstractButton& MaterialFields::classButton() const {
  return *m_classButton;
}

QStringList MaterialFields::notTaken() const {
  QStringList all;
  const auto add = [&all](const EntryField& field) {
    if (!field.isTaken())
      all << tr("“%1” for %2").arg(field.edit().text(), field.name());
  };
  add(*m_name);
  for (const Field& one : m_fields)
    add(*one.field);
  return all;
}

void MaterialFields::turnTo(const std::string& material) {
  if (material != m_material)
    m_complaint->hide();
  m_material = material;
  refresh();
}

EntryField& MaterialFields::field(Spot spot) const {
  const Material* material = shownMaterial();
  return *std::ranges::find_if(m_fields, [&](const Field& one) {
            return one.spot == spot && (!one.kind || (material && *one.kind == material->kind));
          })->field;
}

QComboBox& MaterialFields::choice(Spot spot) const {
  return *std::ranges::find(m_choices, spot, &Choice::spot)->box;
}

QString MaterialFields::complaint() const {
  return m_complaint->isHidden() ? QString() : m_complaint->words();
}

void MaterialFields::refresh() {
  const Material* material = shownMaterial();
  if (!material)
    return;
  m_name->refresh();
  for (const Field& one : m_fields) {
    one.field->refresh();
    // A long sentence is read whole in the tooltip.
    if (rowOf(one.spot).holds == Holds::freeText)
      one.field->setToolTip(fromUtf8(textAt(m_desk.study(), place(one.spot)).value_or("")));
  }
  for (const Choice& one : m_choices)
    one.box->setCurrentIndex(
        one.box->findData(fromUtf8(textAt(m_desk.study(), place(one.spot)).value_or(""))));
  choice(Spot::seam).parentWidget()->setVisible(material->kind == MaterialKind::throat);
  for (const auto& [kind, box] : m_strengths)
    box->setVisible(kind == material->kind);
  showClass(*material);
  // A throat carries its own partial factor.
  m_factors->setVisible(material->kind != MaterialKind::throat || hasFactors(*material));
  const QString use = usedBy(m_desk.study(), m_material);
  m_use->setText(use);
  m_use->setVisible(!use.isEmpty());
}

} // namespace planewright
