// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/build_dialog.h"

#include "ui/entry/complaint.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/look.h"

#include <QComboBox>
#include <QDialogButtonBox>
#include <QFormLayout>
#include <QHBoxLayout>
#include <QLabel>
#include <QPlainTextEdit>
#include <QPushButton>
#include <QVBoxLayout>

namespace planewright {

namespace {

constexpr std::string_view ofCase = "of "; ///< begins the key of a psi_0

} // namespace

BuildDialog::BuildDialog(Desk& desk, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_rule(new QComboBox(this)), m_form(new QFormLayout),
      m_complaint(new Complaint(this)), m_count(new QLabel(this)), m_list(new QPlainTextEdit(this)),
      m_notes(new QLabel(this)), m_take(new QPushButton(this)) {
  build();
  connect(m_rule, &QComboBox::activated, this, &BuildDialog::preview);
  connect(m_take, &QPushButton::clicked, this, &BuildDialog::take);
  connect(&m_desk, &Desk::changed, this, &BuildDialog::followCases);
  followCases();
}

void BuildDialog::addFactor(const std::string& key, const QString& caption, const std::string& text) {
  auto* edit = new DraftEdit(this);
  edit->setText(fromUtf8(text));
  edit->setAccessibleName(caption);
  connect(edit, &QLineEdit::textEdited, this, &BuildDialog::preview);
  m_form->addRow(caption, edit);
  m_factors[key] = edit;
}

// Cases come, go and change their nature while this window is open; what was typed for the others stays.
void BuildDialog::followCases() {
  const CombinationFactors recommended = recommendedFactors(m_desk.study());
  for (auto field = m_factors.begin(); field != m_factors.end();) {
    if (!field->first.starts_with(ofCase) ||
        recommended.accompanying.contains(field->first.substr(ofCase.size()))) {
      ++field;
      continue;
    }
    m_form->removeRow(field->second);
    field = m_factors.erase(field);
  }
  for (const auto& [id, text] : recommended.accompanying)
    if (const std::string key = std::string(ofCase) + id; !m_factors.contains(key))
      addFactor(key, tr("ψ₀ of %1").arg(fromUtf8(id)), text);
  preview();
}

void BuildDialog::build() {
  setWindowTitle(tr("Build combinations"));
  setProperty("helpPlace", "combinations#build");
  resize(720, 520);
  setAttribute(Qt::WA_DeleteOnClose);
  const CombinationFactors start = recommendedFactors(m_desk.study());
  for (const Named<CombinationRule>& row : namesOf<CombinationRule>())
    m_rule->addItem(shown(row.label));
  m_rule->setAccessibleName(tr("rule"));
  m_form->addRow(tr("by"), m_rule);
  addFactor("upper", tr("γ of permanent, unfavourable"), start.permanentUpper);
  addFactor("lower", tr("γ of permanent, favourable"), start.permanentLower);
  addFactor("variable", tr("γ of variable"), start.variable);
  addFactor("reduction", tr("ξ, of (6.10b) only"), start.reduction);
  m_complaint->hide();
  m_list->setReadOnly(true);
  m_list->setTabChangesFocus(true);
  m_list->setAccessibleName(tr("combinations that are built"));
  auto* right = new QVBoxLayout;
  right->addWidget(m_count);
  right->addWidget(m_list, 1);
  auto* columns = new QHBoxLayout;
  columns->addLayout(m_form);
  columns->addLayout(right, 1);
  m_notes->setWordWrap(true);
  m_notes->setForegroundRole(QPalette::PlaceholderText);
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Close, this);
  buttons->addButton(m_take, QDialogButtonBox::ActionRole);
  buttons->button(QDialogButtonBox::Close)->setAutoDefault(false);
  m_take->setAutoDefault(false);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::close);
  auto* rows = new QVBoxLayout(this);
  rows->addLayout(columns, 1);
  rows->addWidget(m_complaint);
  rows->addWidget(m_notes);
  rows->addWidget(buttons);
}

QString BuildDialog::listed() const {
  return m_list->toPlainText();
}

QString BuildDialog::complaint() const {
  return m_complaint->isHidden() ? QString() : m_complaint->words();
}

QString BuildDialog::count() const {
  return m_count->text();
}

QString BuildDialog::notes() const {
  return m_notes->text();
}

CombinationFactors BuildDialog::typed() const {
  const auto text = [this](const std::string& key) { return m_factors.at(key)->text().toStdString(); };
  CombinationFactors factors{
      namesOf<CombinationRule>()[static_cast<std::size_t>(m_rule->currentIndex())].value,
      text("upper"),
      text("lower"),
      text("variable"),
      text("reduction"),
      {}};
  for (const auto& [key, edit] : m_factors)
    if (key.starts_with(ofCase))
      factors.accompanying[key.substr(ofCase.size())] = edit->text().toStdString();
  return factors;
}

/// What the field of a factor is called, by the place of a Problem with it.
QString BuildDialog::captionOf(const std::string& place) const {
  const std::string key = place == "permanent upper" ? "upper" : place == "permanent lower" ? "lower" : place;
  for (const std::string& one : {key, std::string(ofCase) + place})
    if (const auto field = m_factors.find(one); field != m_factors.end())
      return tr("%1: ").arg(field->second->accessibleName());
  return {};
}

void BuildDialog::complain(const Problem& problem) {
  m_complaint->say(captionOf(problem.place) + shown(problem.what), shown(problem.mend));
  m_complaint->show();
}

void BuildDialog::preview() {
  m_complaint->hide();
  const Results<BuiltCombinations> built = builtCombinations(m_desk.study(), typed());
  m_take->setText(tr("Add them"));
  m_take->setEnabled(false);
  if (!built) {
    m_count->setText(tr("Nothing is built."));
    m_list->clear();
    return complain(built.error().front());
  }
  QStringList names;
  int there = 0;
  for (const Combination& combination : built->combinations) {
    names << fromUtf8(combination.name);
    there += findCombination(m_desk.study(), combination.name) ? 1 : 0;
  }
  const auto fresh = static_cast<int>(names.size()) - there;
  m_count->setText(there == 0
                       ? tr("%1 combinations").arg(names.size())
                       : tr("%1 combinations, %2 of them in the study already").arg(names.size()).arg(there));
  QStringList notes;
  for (const Text& note : built->notes)
    notes << shown(note);
  m_notes->setText(notes.join(QLatin1Char(' ')));
  m_list->setPlainText(names.join(QLatin1Char('\n')));
  m_take->setText(tr("Add %1").arg(fresh));
  m_take->setEnabled(fresh > 0);
}

void BuildDialog::take() {
  const Results<BuiltCombinations> built = builtCombinations(m_desk.study(), typed());
  if (!built)
    return complain(built.error().front());
  if (const auto problem = m_desk.request(editsThatAdd(m_desk.study(), built->combinations),
                                          m_desk.newCommand(), tr("built combinations")))
    complain(*problem);
}

} // namespace planewright
