// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/working_dialog.h"

#include "core/record/readout_file.h"
#include "ui/look/look.h"

#include <QDialogButtonBox>
#include <QPlainTextEdit>
#include <QPushButton>
#include <QScrollBar>
#include <QVBoxLayout>

namespace planewright {

WorkingDialog::WorkingDialog(Desk& desk, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_text(new QPlainTextEdit(this)) {
  setWindowTitle(tr("Working of the shown stresses"));
  setProperty("helpPlace", "strength#working");
  resize(760, 560);
  m_text->setReadOnly(true);
  m_text->setTextInteractionFlags(Qt::TextSelectableByMouse | Qt::TextSelectableByKeyboard);
  m_text->setAccessibleName(tr("working"));
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Close, this);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::reject);
  auto* rows = new QVBoxLayout(this);
  rows->addWidget(m_text);
  rows->addWidget(buttons);
  connect(&m_desk, &Desk::changed, this, &WorkingDialog::refresh);
  refresh();
}

QString WorkingDialog::words() const {
  return m_text->toPlainText();
}

// The reader stays where he reads while a plane is turned behind.
void WorkingDialog::refresh() {
  const int at = m_text->verticalScrollBar()->value();
  m_text->setPlainText(fromUtf8(workingText(m_desk.study(), m_desk.readout(), translation())));
  m_text->verticalScrollBar()->setValue(at);
}

} // namespace planewright
