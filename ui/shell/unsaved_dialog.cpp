// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/unsaved_dialog.h"

#include "core/report/comparison.h"
#include "ui/look/dialog_parts.h"
#include "ui/look/look.h"

#include <QDateTime>
#include <QDialogButtonBox>
#include <QDir>
#include <QFileInfo>
#include <QHeaderView>
#include <QLabel>
#include <QLocale>
#include <QPlainTextEdit>
#include <QPushButton>
#include <QSplitter>
#include <QTreeWidget>
#include <QVBoxLayout>

#include <algorithm>

namespace planewright {

namespace {

enum Column { name, written, file };

QString nameOf(const UnsavedStudy& unsaved) {
  for (const std::string& path : {unsaved.file, unsaved.restoredFrom})
    if (!path.empty())
      return QFileInfo(fromUtf8(path)).completeBaseName();
  const std::string& subject = unsaved.study.title.subject;
  return subject.empty() ? UnsavedDialog::tr("New study") : fromUtf8(subject);
}

QString timeOf(const UnsavedStudy& unsaved) {
  const QDateTime time = QDateTime::fromString(fromUtf8(unsaved.written), Qt::ISODate);
  return time.isValid() ? QLocale().toString(time.toLocalTime(), QLocale::ShortFormat)
                        : fromUtf8(unsaved.written);
}

QString changesOf(const UnsavedStudy& unsaved) {
  const Comparison changes = compared(studyBefore(unsaved), unsaved.study);
  if (changes.empty())
    return UnsavedDialog::tr("Nothing that is typed or found differs from what was saved.");
  return fromUtf8(comparisonText(changes, translation()));
}

} // namespace

UnsavedDialog::UnsavedDialog(Recovery& recovery, QWidget* parent)
    : QDialog(parent), m_recovery(recovery), m_sentence(sentenceIn(*this)), m_studies(new QTreeWidget(this)),
      m_changes(new QPlainTextEdit(this)), m_open(new QPushButton(tr("&Open"), this)),
      m_discard(new QPushButton(tr("&Discard"), this)) {
  setWindowTitle(tr("Unsaved studies"));
  setProperty("helpPlace", "files#unsaved");
  resizeOnScreen(*this, {760, 520});
  m_studies->setHeaderLabels({tr("study"), tr("last change"), tr("file")});
  m_studies->setAccessibleName(tr("Unsaved studies"));
  m_studies->setRootIsDecorated(false);
  m_studies->setItemsExpandable(false);
  m_studies->setIndentation(12);
  m_changes->setReadOnly(true);
  m_changes->setTabChangesFocus(true);
  m_changes->setLineWrapMode(QPlainTextEdit::NoWrap);
  m_changes->setAccessibleName(tr("What changed since it was saved"));
  auto* parts = new QSplitter(Qt::Vertical, this);
  parts->addWidget(m_studies);
  parts->addWidget(m_changes);
  parts->setChildrenCollapsible(false);
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Close, this);
  buttons->addButton(m_open, QDialogButtonBox::ActionRole);
  buttons->addButton(m_discard, QDialogButtonBox::ActionRole);
  m_open->setDefault(true);
  auto* rows = new QVBoxLayout(this);
  rows->addWidget(m_sentence);
  rows->addWidget(parts, 1);
  rows->addWidget(buttons);
  connect(m_studies, &QTreeWidget::currentItemChanged, this, &UnsavedDialog::showCurrent);
  connect(m_studies, &QTreeWidget::itemActivated, this, &UnsavedDialog::openCurrent);
  connect(m_open, &QPushButton::clicked, this, &UnsavedDialog::openCurrent);
  connect(m_discard, &QPushButton::clicked, this, &UnsavedDialog::discardCurrent);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::close);
  list();
}

void UnsavedDialog::list() {
  m_left = m_recovery.left();
  m_discarded = m_recovery.discarded();
  m_studies->clear();
  QTreeWidgetItem* left = addGroup(tr("Not saved when their window ended"), m_left);
  QTreeWidgetItem* discarded =
      addGroup(tr("Discarded; kept for %1 days").arg(keptDiscarded.count()), m_discarded);
  for (int column = name; column < file; ++column)
    m_studies->resizeColumnToContents(column);
  tell(*m_sentence,
       m_left.empty() ? tr("No study was left unsaved.")
                      : tr("These studies had changes that were in no file when their window ended. What is "
                           "opened here stays unsaved until you save it."),
       false);
  for (const QTreeWidgetItem* group : {left, discarded})
    if (group && group->childCount() > 0)
      return m_studies->setCurrentItem(group->child(0));
  showCurrent();
}

QTreeWidgetItem* UnsavedDialog::addGroup(const QString& words, const std::vector<LeftStudy>& studies) {
  if (studies.empty())
    return nullptr;
  auto* group = new QTreeWidgetItem(m_studies, {words});
  group->setFlags(Qt::ItemIsEnabled);
  group->setFirstColumnSpanned(true);
  group->setExpanded(true);
  for (const LeftStudy& one : studies) {
    const QStringList texts =
        one.study ? QStringList{nameOf(*one.study), timeOf(*one.study),
                                QDir::toNativeSeparators(fromUtf8(one.study->file))}
                  : QStringList{tr("not readable"), {}, QDir::toNativeSeparators(fromUtf8(one.path))};
    (new QTreeWidgetItem(group, texts))->setData(name, Qt::UserRole, fromUtf8(one.path));
  }
  return group;
}

const LeftStudy* UnsavedDialog::current() const {
  const QTreeWidgetItem* item = m_studies->currentItem();
  const QVariant path = item ? item->data(name, Qt::UserRole) : QVariant();
  for (const std::vector<LeftStudy>* studies : {&m_left, &m_discarded})
    for (const LeftStudy& one : *studies)
      if (path.isValid() && fromUtf8(one.path) == path.toString())
        return &one;
  return nullptr;
}

bool UnsavedDialog::isLeft(const LeftStudy& study) const {
  return std::ranges::any_of(m_left, [&](const LeftStudy& one) { return &one == &study; });
}

void UnsavedDialog::showCurrent() {
  const LeftStudy* study = current();
  m_open->setEnabled(study && study->study);
  m_discard->setEnabled(study && isLeft(*study));
  m_changes->setPlainText(!study         ? QString()
                          : study->study ? changesOf(*study->study)
                                         : shown(study->study.error().front()));
}

void UnsavedDialog::openCurrent() {
  const LeftStudy* study = current();
  if (study && study->study && m_recovery.open(*study))
    close();
  else
    list();
}

void UnsavedDialog::discardCurrent() {
  const LeftStudy* study = current();
  if (!study || !isLeft(*study))
    return;
  m_recovery.discardLeft(*study);
  list();
}

} // namespace planewright
