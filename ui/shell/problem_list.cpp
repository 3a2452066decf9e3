// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/problem_list.h"

#include "ui/look/look.h"

#include <QDialogButtonBox>
#include <QPlainTextEdit>
#include <QVBoxLayout>

namespace planewright {

ProblemList::ProblemList(const QString& heading, const Problems& problems, QWidget* parent)
    : QDialog(parent) {
  setAttribute(Qt::WA_DeleteOnClose);
  setWindowTitle(heading);
  setProperty("helpPlace", "troubleshooting#files");
  resize(720, 400);
  QStringList lines;
  for (const Problem& problem : problems)
    lines << shown(problem);
  auto* text = new QPlainTextEdit(lines.join(QLatin1Char('\n')), this);
  text->setReadOnly(true);
  text->setAccessibleName(heading);
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Close, this);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::close);
  auto* rows = new QVBoxLayout(this);
  rows->addWidget(text);
  rows->addWidget(buttons);
}

} // namespace planewright
