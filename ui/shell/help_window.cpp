// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/help_window.h"

#include <QEvent>
#include <QHBoxLayout>
#include <QListWidget>
#include <QTextBrowser>

namespace planewright {

/// A browser that draws the pictures of its pages in its own palette.
class HelpText : public QTextBrowser {
public:
  using QTextBrowser::QTextBrowser;

protected:
  QVariant loadResource(int type, const QUrl& name) override {
    if (name.scheme() != QLatin1String("picture"))
      return QTextBrowser::loadResource(type, name);
    return helpPicture(name.toString(), lookOf(*this), devicePixelRatioF());
  }
};

HelpWindow::HelpWindow(QWidget* parent)
    : QDialog(parent), m_pages(new QListWidget(this)), m_text(new HelpText(this)) {
  setWindowTitle(tr("Help"));
  resize(900, 620);
  for (int page = 0; page < helpPageCount; ++page)
    m_pages->addItem(titleOf(static_cast<HelpPage>(page)));
  m_pages->setFixedWidth(170);
  m_pages->setAccessibleName(tr("Pages"));
  m_text->setAccessibleName(tr("Page"));
  auto* row = new QHBoxLayout(this);
  row->addWidget(m_pages);
  row->addWidget(m_text, 1);
  connect(m_pages, &QListWidget::currentRowChanged, this, &HelpWindow::write);
  m_pages->setCurrentRow(0);
}

void HelpWindow::showPage(HelpPage page) {
  m_pages->setCurrentRow(static_cast<int>(page));
  show();
  raise();
  activateWindow();
}

HelpPage HelpWindow::page() const {
  return static_cast<HelpPage>(m_pages->currentRow());
}

void HelpWindow::changeEvent(QEvent* event) {
  QDialog::changeEvent(event);
  if (event->type() == QEvent::PaletteChange)
    write();
}

void HelpWindow::write() {
  m_text->setHtml(htmlOf(page(), lookOf(*this)));
}

} // namespace planewright
