// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/help_window.h"

#include "ui/look/dialog_parts.h"
#include "ui/manual/manual.h"
#include "ui/shell/help_text.h"

#include <QAction>
#include <QEvent>
#include <QHBoxLayout>
#include <QKeyEvent>
#include <QLabel>
#include <QLineEdit>
#include <QListWidget>
#include <QToolButton>
#include <QVBoxLayout>

namespace planewright {

namespace {

constexpr int pageRole = Qt::UserRole;

} // namespace

HelpWindow::HelpWindow(QWidget* parent)
    : QDialog(parent), m_language(manualLanguage()), m_search(new QLineEdit(this)), m_found(new QLabel(this)),
      m_contents(new QListWidget(this)), m_text(new HelpText(m_language, this)) {
  setWindowTitle(tr("Handbook"));
  setProperty("helpPlace", "window#handbook");
  resizeOnScreen(*this, {980, 680});
  m_search->setPlaceholderText(tr("Search (Ctrl+F)"));
  m_search->setAccessibleName(tr("Search"));
  m_search->setClearButtonEnabled(true);
  m_contents->setAccessibleName(tr("Pages"));
  m_contents->setSpacing(2);
  m_text->setAccessibleName(tr("Page"));
  m_found->setWordWrap(true);
  m_back = button(QStringLiteral("←"), tr("Back (Alt+Left)"), &HelpWindow::back);
  m_forward = button(QStringLiteral("→"), tr("Forward (Alt+Right)"), &HelpWindow::forward);
  auto* bar = new QHBoxLayout;
  bar->addWidget(m_back);
  bar->addWidget(m_forward);
  bar->addWidget(m_search, 1);
  auto* left = new QWidget(this);
  left->setFixedWidth(236);
  auto* column = new QVBoxLayout(left);
  column->setContentsMargins(0, 0, 0, 0);
  column->addLayout(bar);
  column->addWidget(m_found);
  column->addWidget(m_contents, 1);
  auto* row = new QHBoxLayout(this);
  row->addWidget(left);
  row->addWidget(m_text, 1);
  m_found->hide();
  listPages();
  addKeys();
  connect(m_contents, &QListWidget::currentRowChanged, this, &HelpWindow::chosen);
  connect(m_text, &QTextBrowser::sourceChanged, this, &HelpWindow::follow);
  connect(m_search, &QLineEdit::textEdited, this, &HelpWindow::filter);
  connect(m_text, &QTextBrowser::backwardAvailable, m_back, &QWidget::setEnabled);
  connect(m_text, &QTextBrowser::forwardAvailable, m_forward, &QWidget::setEnabled);
  m_back->setEnabled(false);
  m_forward->setEnabled(false);
  m_text->showPlace(manualPages().front());
  m_contents->setFocus();
}

HelpWindow::~HelpWindow() = default;

QToolButton* HelpWindow::button(const QString& words, const QString& tip, void (HelpWindow::*act)()) {
  auto* made = new QToolButton(this);
  made->setText(words);
  made->setToolTip(tip);
  made->setAccessibleName(tip);
  made->setFocusPolicy(Qt::StrongFocus);
  connect(made, &QToolButton::clicked, this, act);
  return made;
}

void HelpWindow::addKeys() {
  const auto key = [this](const QKeySequence& keys, auto act) {
    auto* action = new QAction(this);
    action->setShortcut(keys);
    connect(action, &QAction::triggered, this, act);
    addAction(action);
  };
  key(QKeySequence(Qt::ALT | Qt::Key_Left), &HelpWindow::back);
  key(QKeySequence(Qt::ALT | Qt::Key_Right), &HelpWindow::forward);
  key(QKeySequence(Qt::Key_F3), &HelpWindow::findNext);
  key(QKeySequence(Qt::SHIFT | Qt::Key_F3), &HelpWindow::findPrevious);
  key(QKeySequence::Find, [this] {
    m_search->setFocus(Qt::ShortcutFocusReason);
    m_search->selectAll();
  });
}

void HelpWindow::showPlace(const QString& place) {
  m_text->showPlace(place);
  show();
  raise();
  activateWindow();
}

QString HelpWindow::place() const {
  const QString anchor = m_text->anchor();
  return anchor.isEmpty() ? m_text->page() : m_text->page() + QLatin1Char('#') + anchor;
}

void HelpWindow::back() {
  m_text->backward();
}

void HelpWindow::forward() {
  m_text->forward();
}

void HelpWindow::listPages() {
  const std::vector<FoundPage> found = m_words.isEmpty() ? std::vector<FoundPage>() : m_texts->find(m_words);
  m_contents->clear();
  const auto add = [this](const QString& page, const QString& words) {
    auto* item = new QListWidgetItem(words, m_contents);
    item->setData(pageRole, page);
  };
  if (m_words.isEmpty())
    for (const QString& page : manualPages())
      add(page, manualTitle(page, m_language));
  for (const FoundPage& one : found)
    add(one.page, tr("%1 (%2)").arg(manualTitle(one.page, m_language)).arg(one.count));
  m_found->setVisible(!m_words.isEmpty());
  m_found->setText(found.empty() ? tr("These words stand on no page together.")
                                 : tr("Enter goes to the next place, Esc shows all pages."));
}

/// The contents follow the page, and the page the contents.
void HelpWindow::chosen() {
  const QListWidgetItem* item = m_contents->currentItem();
  if (!item || item->data(pageRole).toString() == m_text->page())
    return;
  m_text->showPlace(item->data(pageRole).toString());
  m_text->goToFirstMark();
}

void HelpWindow::follow() {
  for (int row = 0; row < m_contents->count(); ++row)
    if (m_contents->item(row)->data(pageRole).toString() == m_text->page())
      m_contents->setCurrentRow(row);
  mark();
}

void HelpWindow::filter() {
  m_words = searchedWords(m_search->text());
  if (!m_words.isEmpty() && !m_texts)
    m_texts = std::make_unique<ManualSearch>(m_language);
  listPages();
  follow();
  if (!m_words.isEmpty() && !m_contents->currentItem() && m_contents->count() > 0)
    m_contents->setCurrentRow(0);
  else
    m_text->goToFirstMark();
}

void HelpWindow::mark() {
  m_text->mark(m_words);
}

void HelpWindow::findNext() {
  step(1);
}

void HelpWindow::findPrevious() {
  step(-1);
}

void HelpWindow::step(int by) {
  if (m_words.isEmpty() || m_contents->count() == 0 || m_text->goToMark(by))
    return;
  const int count = m_contents->count();
  m_contents->setCurrentRow((m_contents->currentRow() + by + count) % count);
  if (by > 0)
    m_text->goToFirstMark();
  else
    m_text->goToLastMark();
}

void HelpWindow::keyPressEvent(QKeyEvent* event) {
  const bool isEnter = event->key() == Qt::Key_Return || event->key() == Qt::Key_Enter;
  if (isEnter && m_search->hasFocus()) {
    step(event->modifiers().testFlag(Qt::ShiftModifier) ? -1 : 1);
  } else if (event->key() == Qt::Key_Escape && !m_words.isEmpty()) {
    m_search->clear();
    filter();
  } else if (event->key() == Qt::Key_Down && m_search->hasFocus()) {
    m_contents->setFocus();
  } else {
    QDialog::keyPressEvent(event);
  }
}

void HelpWindow::changeEvent(QEvent* event) {
  QDialog::changeEvent(event);
  if (event->type() == QEvent::PaletteChange)
    dress();
}

void HelpWindow::dress() {
  m_text->dress();
  mark();
}

} // namespace planewright
