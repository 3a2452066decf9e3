// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/screen_dialog.h"

#include "ui/files/file_names.h"
#include "ui/look/look.h"
#include "ui/screen/field_page.h"
#include "ui/screen/field_setup.h"

#include <QFileDialog>
#include <QFileInfo>
#include <QPushButton>
#include <QStackedWidget>
#include <QTableView>
#include <QVBoxLayout>

namespace planewright {

ScreenDialog::ScreenDialog(Desk& desk, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_pages(new QStackedWidget(this)), m_setup(new FieldSetup(desk, this)),
      m_page(new FieldPage(desk, this)) {
  constexpr int betweenLooks = 50; // ms
  setWindowTitle(tr("Screen points"));
  setProperty("helpPlace", "screening#table");
  resize(1000, 640);
  m_pages->addWidget(m_setup);
  m_pages->addWidget(m_page);
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 0, 0, 0);
  rows->addWidget(m_pages);
  m_look.setInterval(betweenLooks);
  connect(&m_look, &QTimer::timeout, this, [this] { m_setup->showProgress(*m_progress); });
  connect(m_setup, &FieldSetup::tableWanted, this, &ScreenDialog::chooseTable);
  connect(m_setup, &FieldSetup::started, this, &ScreenDialog::start);
  connect(m_setup, &FieldSetup::cancelled, this, &ScreenDialog::cancel);
  connect(m_page, &FieldPage::anotherWanted, this, [this] { m_pages->setCurrentWidget(m_setup); });
  connect(m_page, &FieldPage::saveWanted, this, &ScreenDialog::chooseResults);
  connect(m_page, &FieldPage::opened, this, &ScreenDialog::opened);
}

bool ScreenDialog::showsResults() const {
  return m_pages->currentWidget() == m_page;
}

void ScreenDialog::chooseTable() {
  const QString path = QFileDialog::getOpenFileName(this, tr("Table of points"), folderOf(m_setup->path()),
                                                    tr("Tables (*.csv *.tsv *.txt);;All files (*)"));
  if (!path.isEmpty())
    m_setup->setTable(path);
}

void ScreenDialog::chooseResults() {
  const QFileInfo table(m_setup->path());
  const QString proposed =
      table.absolutePath() + QLatin1Char('/') + tr("%1-results.csv").arg(table.completeBaseName());
  const QString path = QFileDialog::getSaveFileName(this, tr("Save the results"), proposed,
                                                    tr("Tables (*.csv);;All files (*)"));
  if (!path.isEmpty())
    m_page->saveTo(path);
}

void ScreenDialog::start() {
  m_progress = std::make_shared<FieldProgress>();
  m_setup->showProgress(*m_progress);
  m_look.start();
  m_work.run([this, study = m_desk.study(), order = m_setup->order(),
              progress = m_progress](const std::stop_token& stop) -> Beside::Then {
    auto outcome = screenedField(study, order, *progress, stop);
    return [this, outcome = std::move(outcome)] { end(outcome); };
  });
}

void ScreenDialog::end(const Results<std::shared_ptr<const ScreenedField>>& outcome) {
  m_look.stop();
  m_progress.reset();
  m_setup->settle(outcome ? Problems() : outcome.error());
  if (!outcome)
    return;
  m_page->show(*outcome);
  m_pages->setCurrentWidget(m_page);
  m_page->table().setFocus();
}

void ScreenDialog::cancel() {
  m_work.stop();
  end(tl::unexpected(Problems{}));
}

void ScreenDialog::reject() {
  if (isRunning())
    cancel();
  else
    QDialog::reject();
}

} // namespace planewright
