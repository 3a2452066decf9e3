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

BuildDialog::BuildDialog(Desk& desk, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_rule(new QComboBox(this)), m_complaint(new Complaint(this)),
      m_count(new QLabel(this)), m_list(new QPlainTextEdit(this)), m_notes(new QLabel(this)),
      m_take(new QPushButton(this)) {
  build();
  connect(m_rule, &QComboBox::activated, this, &BuildDialog::preview);
  connect(m_take, &QPushButton::clicked, this, &BuildDialog::take);
  connect(&m_desk, &Desk::changed, this, &BuildDialog::preview);
  preview();
}

DraftEdit* BuildDialog::addFactor(QFormLayout& form, const std::string& key, const QString& caption,
                                  const std::string& text) {
  auto* edit = new DraftEdit(this);
  edit->setText(fromUtf8(text));
  edit->setAccessibleName(caption);
  connect(edit, &QLineEdit::textEdited, this, &BuildDialog::preview);
  form.addRow(caption, edit);
  m_factors[key] = edit;
  return edit;
}

void BuildDialog::build() {
  setWindowTitle(tr("Build combinations"));
  resize(720, 520);
  setAttribute(Qt::WA_DeleteOnClose);
  const CombinationFactors start = recommendedFactors(m_desk.study());
  for (const Named<CombinationRule>& row : namesOf<CombinationRule>())
    m_rule->addItem(shown(row.label));
  m_rule->setAccessibleName(tr("rule"));
  auto* form = new QFormLayout;
  form->addRow(tr("by"), m_rule);
  addFactor(*form, "upper", tr("γ of permanent, unfavourable"), start.permanentUpper);
  addFactor(*form, "lower", tr("γ of permanent, favourable"), start.permanentLower);
  addFactor(*form, "variable", tr("γ of variable"), start.variable);
  addFactor(*form, "reduction", tr("ξ, of (6.10b) only"), start.reduction);
  for (const auto& [id, text] : start.accompanying)
    addFactor(*form, "of " + id, tr("ψ₀ of %1").arg(fromUtf8(id)), text);
  m_complaint->hide();
  m_list->setReadOnly(true);
  m_list->setTabChangesFocus(true);
  m_list->setAccessibleName(tr("combinations that are built"));
  auto* right = new QVBoxLayout;
  right->addWidget(m_count);
  right->addWidget(m_list, 1);
  auto* columns = new QHBoxLayout;
  columns->addLayout(form);
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
    if (key.starts_with("of "))
      factors.accompanying[key.substr(3)] = edit->text().toStdString();
  return factors;
}

void BuildDialog::complain(const Problem& problem) {
  m_complaint->say(shown(problem.what), shown(problem.mend));
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
                                          m_desk.newGesture(), tr("built combinations")))
    complain(*problem);
}

} // namespace planewright
