// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/slip_dialog.h"

#include "core/study/slips.h"
#include "core/table/table.h"
#include "ui/entry/complaint.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/look.h"

#include <QComboBox>
#include <QDialogButtonBox>
#include <QFormLayout>
#include <QLabel>
#include <QPushButton>
#include <QVBoxLayout>

namespace planewright {

SlipDialog::SlipDialog(Desk& desk, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_question(new QComboBox(this)), m_number(new DraftEdit(this)),
      m_complaint(new Complaint(this)), m_answer(new QLabel(this)) {
  build();
  connect(m_number, &QLineEdit::textEdited, this, &SlipDialog::compare);
  connect(m_question, &QComboBox::activated, this, &SlipDialog::compare);
  connect(&m_desk, &Desk::changed, this, &SlipDialog::compare);
  compare();
}

void SlipDialog::build() {
  setWindowTitle(tr("Compare somebody else's number"));
  setProperty("helpPlace", "lines#slips");
  resize(460, 300);
  for (const Named<Asked>& row : namesOf<Asked>())
    m_question->addItem(shown(row.label));
  m_question->setAccessibleName(tr("what the number is"));
  m_number->setAccessibleName(tr("the other number"));
  m_complaint->hide();
  m_answer->setWordWrap(true);
  m_answer->setTextFormat(Qt::PlainText);
  m_answer->setTextInteractionFlags(Qt::TextSelectableByMouse | Qt::TextSelectableByKeyboard);
  m_answer->setAccessibleName(tr("comparison"));
  m_answer->setAlignment(Qt::AlignTop | Qt::AlignLeft);
  auto* form = new QFormLayout;
  form->addRow(tr("Their"), m_question);
  form->addRow(tr("is"), m_number);
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Close, this);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::close);
  // Enter in the field compares; it does not close.
  for (QAbstractButton* button : buttons->buttons())
    static_cast<QPushButton*>(button)->setAutoDefault(false);
  auto* rows = new QVBoxLayout(this);
  rows->addLayout(form);
  rows->addWidget(m_complaint);
  rows->addWidget(m_answer, 1);
  rows->addWidget(buttons);
  m_number->setFocus();
}

QString SlipDialog::answer() const {
  return m_answer->text();
}

void SlipDialog::refuse(const Problem& problem) {
  m_number->setWrong(true);
  m_complaint->say(shown(problem.what), shown(problem.mend));
  m_complaint->show();
  m_answer->clear();
}

void SlipDialog::compare() {
  m_number->setWrong(false);
  m_complaint->hide();
  if (m_number->text().trimmed().isEmpty()) {
    m_answer->setText(
        tr("Type the number; a bare one is in %1. A number agrees when it is this one to the last "
           "digit typed.")
            .arg(fromUtf8(m_desk.study().units.stress)));
    return;
  }
  const Asked asked = namesOf<Asked>()[static_cast<std::size_t>(m_question->currentIndex())].value;
  const Result<Comparison> result =
      compared(m_desk.study(), m_desk.readout(), asked, m_number->text().toStdString());
  if (!result)
    return refuse(result.error());
  const QString ours = fromUtf8(shownStress(m_desk.study(), m_desk.readout().state(), result->ours) + " " +
                                m_desk.study().units.stress);
  QStringList lines;
  if (result->agrees)
    lines << tr("Agrees with this study: %1.").arg(ours);
  else if (result->slips.empty())
    lines << tr("In this study it is %1. No slip that this program knows makes the other number.").arg(ours);
  else
    lines << tr("In this study it is %1. The other number comes out with:").arg(ours);
  for (const Text& slip : result->slips)
    lines << QStringLiteral("  •  ") + shown(slip);
  m_answer->setText(lines.join(QLatin1Char('\n')));
}

} // namespace planewright
