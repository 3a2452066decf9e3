// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/dialog_parts.h"

#include "ui/look/look.h"

#include <QButtonGroup>
#include <QFileDialog>
#include <QFileInfo>
#include <QHBoxLayout>
#include <QLabel>
#include <QScreen>
#include <QToolButton>
#include <QVBoxLayout>

namespace planewright {

QVBoxLayout* headedRows(QWidget& page, const QString& heading) {
  auto* rows = new QVBoxLayout;
  rows->setSpacing(3);
  auto* label = new QLabel(heading, &page);
  QFont bold = label->font();
  bold.setBold(true);
  label->setFont(bold);
  label->setSizePolicy(QSizePolicy::Preferred, QSizePolicy::Fixed);
  rows->addWidget(label);
  static_cast<QVBoxLayout*>(page.layout())->addLayout(rows);
  return rows;
}

QToolButton* choiceButton(QHBoxLayout& row, QButtonGroup& group, const QString& words, bool isDown) {
  auto* button = new QToolButton;
  button->setText(words);
  button->setCheckable(true);
  button->setChecked(isDown);
  group.addButton(button);
  row.addWidget(button);
  return button;
}

QLabel* sentenceIn(QWidget& dialog) {
  auto* label = new QLabel(&dialog);
  label->setWordWrap(true);
  label->setTextInteractionFlags(Qt::TextSelectableByMouse);
  return label;
}

void resizeOnScreen(QWidget& dialog, const QSize& size) {
  const QSize frame(20, 50); // of the window manager
  dialog.resize(size.boundedTo(dialog.screen()->availableSize() - frame));
}

QString askedFileToSave(QWidget& over, const QString& title, const QString& offered, const QString& kind) {
  QFileDialog dialog(&over, title, offered, kind);
  dialog.setAcceptMode(QFileDialog::AcceptSave);
  dialog.setDefaultSuffix(QFileInfo(offered).suffix());
  dialog.selectFile(offered);
  return dialog.exec() == QDialog::Accepted ? dialog.selectedFiles().constFirst() : QString();
}

void tell(QLabel& label, const QString& sentence, bool isWrong) {
  QPalette palette = label.parentWidget()->palette();
  palette.setColor(QPalette::WindowText,
                   lookOf(*label.parentWidget()).colour(isWrong ? Role::wrong : Role::ink));
  label.setPalette(palette);
  label.setText(sentence);
}

} // namespace planewright
