// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_dialog.h"

#include "core/record/embedded_study.h"
#include "core/record/study_file.h"
#include "core/report/comparison.h"
#include "core/report/sheet_html.h"
#include "ui/files/file_bytes.h"
#include "ui/files/folders.h"
#include "ui/look/column_area.h"
#include "ui/look/dialog_parts.h"
#include "ui/look/look.h"
#include "ui/look/printed_numbers.h"
#include "ui/paint/export.h"
#include "ui/sheet/pages_view.h"
#include "ui/sheet/report_output.h"
#include "ui/sheet/sheet_options.h"
#include "ui/sheet/sheet_preview.h"

#include <QDir>
#include <QFileDialog>
#include <QFileInfo>
#include <QHBoxLayout>
#include <QLabel>
#include <QPrinter>
#include <QPushButton>
#include <QSettings>
#include <QShowEvent>
#include <QVBoxLayout>

namespace planewright {

namespace {

constexpr int soon = 150; ///< ms after the last change

} // namespace

SheetDialog::SheetDialog(Desk& desk, QWidget* parent) : QDialog(parent), m_desk(desk) {
  setWindowTitle(tr("Calculation sheet"));
  setProperty("helpPlace", "sheets#window");
  setModal(false);
  build();
  m_run = new SheetRun(this);
  connect(m_run, &SheetRun::made, this, &SheetDialog::take);
  m_soon.setSingleShot(true);
  m_soon.setInterval(soon);
  connect(&m_soon, &QTimer::timeout, this, &SheetDialog::refresh);
  connect(&m_desk, &Desk::changed, this, [this] {
    if (isVisible())
      m_soon.start();
  });
  connect(m_options, &SheetOptions::changed, this, &SheetDialog::arrange);
}

void SheetDialog::build() {
  constexpr QSize first(1000, 780);
  m_options = new SheetOptions(m_desk, rememberedSheet(QSettings()), this);
  auto* options = new ColumnArea(this);
  options->setWidget(m_options);
  m_routes = sentenceIn(*this);
  m_sentence = sentenceIn(*this);
  m_sentence->hide();
  tell(*m_routes, tr("The pages are being set…"), false);
  auto* middle = new QHBoxLayout;
  middle->setSpacing(14);
  middle->addWidget(options);
  auto* pages = new PagesView(this);
  m_preview = &pages->preview();
  middle->addWidget(pages, 1);
  auto* column = new QVBoxLayout(this);
  column->addLayout(middle, 1);
  column->addWidget(m_routes);
  column->addWidget(m_sentence);
  column->addLayout(footer());
  resizeOnScreen(*this, first);
}

void SheetDialog::addButton(QHBoxLayout& row, const QString& words, void (SheetDialog::*act)()) {
  auto* button = new QPushButton(words, this);
  button->setAutoDefault(false);
  row.addWidget(button);
  connect(button, &QPushButton::clicked, this, act);
}

QHBoxLayout* SheetDialog::footer() {
  auto* row = new QHBoxLayout;
  addButton(*row, tr("Title block…"), &SheetDialog::titleAsked);
  addButton(*row, tr("Compare with…"), &SheetDialog::compare);
  row->addStretch();
  addButton(*row, tr("Save PDF…"), &SheetDialog::savePdf);
  addButton(*row, tr("Save HTML…"), &SheetDialog::saveHtml);
  addButton(*row, tr("Print…"), &SheetDialog::print);
  return row;
}

void SheetDialog::setStudyFile(const QString& path) {
  m_studyFile = path;
  if (isVisible())
    m_soon.start();
}

void SheetDialog::showEvent(QShowEvent* event) {
  QDialog::showEvent(event);
  refresh();
}

void SheetDialog::arrange() {
  QSettings settings;
  rememberSheet(settings, m_options->settings());
  refresh();
}

SheetOrder SheetDialog::order() const {
  SheetOrder order;
  order.points = m_options->points();
  order.depth = m_options->settings().depth;
  order.figures = m_options->settings().figures;
  order.studyName = QFileInfo(m_studyFile).completeBaseName().toStdString();
  order.earlier = m_earlier;
  order.earlierName = QFileInfo(m_earlierFile).completeBaseName().toStdString();
  order.decimal = chosenDecimalSign();
  order.translate = translation();
  return order;
}

Sheet SheetDialog::sheet() const {
  return sheetOf(m_desk.study(), order());
}

void SheetDialog::refresh() {
  m_soon.stop();
  say({});
  m_run->ask({m_desk.study(), order(), m_options->settings().paper});
}

void SheetDialog::take(const MadeSheet& made) {
  m_preview->setPages(made.pages);
  tell(*m_routes, shown(made.routes), made.disagrees);
}

void SheetDialog::say(const QString& sentence, bool isWrong) {
  tell(*m_sentence, sentence, isWrong);
  m_sentence->setVisible(!sentence.isEmpty());
}

Result<void> SheetDialog::saveTo(const QString& path) {
  const Sheet made = sheet();
  const SheetSettings& settings = m_options->settings();
  const std::string study = settings.carriesStudy ? writeStudy(m_desk.study()) : std::string();
  if (path.endsWith(QStringLiteral(".html"), Qt::CaseInsensitive)) {
    const std::string html = sheetHtml(made, translation());
    const Result<std::string> bytes = study.empty() ? Result<std::string>(html) : htmlWithStudy(html, study);
    return bytes ? writeAside(path.toStdString(), *bytes) : tl::unexpected(bytes.error());
  }
  const Result<QByteArray> bytes =
      pdfOfPages(pagesOf(made, settings.paper, translation()), Palette::paper, study);
  return bytes ? writeAside(path.toStdString(), bytes->toStdString()) : tl::unexpected(bytes.error());
}

QString SheetDialog::offeredPath(const QString& ending) const {
  const QString study = QFileInfo(m_studyFile).completeBaseName();
  const QString name = m_studyFile.isEmpty() ? tr("sheet") : tr("%1-sheet").arg(study);
  return outputFolder(m_studyFile) + QLatin1Char('/') + name + ending;
}

void SheetDialog::save(const QString& ending, const QString& kind) {
  const QString path = askedFileToSave(*this, tr("Save the sheet"), offeredPath(ending), kind);
  if (path.isEmpty())
    return;
  if (const Result<void> saved = saveTo(path); !saved)
    return say(shown(saved.error()), true);
  const QString sentence = tr("Saved as %1.").arg(QDir::toNativeSeparators(path));
  say(sentence);
  m_desk.say(sentence);
}

void SheetDialog::savePdf() {
  save(QStringLiteral(".pdf"), tr("PDF (*.pdf)"));
}

void SheetDialog::saveHtml() {
  save(QStringLiteral(".html"), tr("HTML (*.html)"));
}

Result<void> SheetDialog::compareWith(const QString& path) {
  const Result<std::string> bytes = bytesOf(path.toStdString(), greatestCarrier);
  if (!bytes)
    return tl::unexpected(bytes.error());
  const Results<OpenedStudy> opened = openedStudy(*bytes);
  if (!opened)
    return tl::unexpected(opened.error().front());
  m_earlier = opened->study;
  m_earlierFile = path;
  refresh();
  const Comparison changes = compared(*m_earlier, m_desk.study());
  say(tr("%1: %2 input(s) and %3 result(s) differ; the sheet has them under “Changes since another "
         "revision”.")
          .arg(QFileInfo(path).fileName())
          .arg(changes.inputs.size())
          .arg(changes.results.size()));
  return {};
}

void SheetDialog::compare() {
  const QString file = QFileDialog::getOpenFileName(
      this, tr("Compare with an earlier revision"), QFileInfo(m_studyFile).absolutePath(),
      tr("Studies, figures and sheets (*.planewright *.svg *.pdf *.png *.html)"));
  if (file.isEmpty())
    return;
  if (const Result<void> done = compareWith(file); !done)
    say(shown(done.error()), true);
}

Result<void> SheetDialog::printTo(QPrinter& printer) {
  printer.setDocName(windowTitle());
  return printPages(printer, pagesOf(sheet(), m_options->settings().paper, translation()), Palette::paper);
}

void SheetDialog::print() {
  const auto printed = printedByDialog(this, m_options->settings().paper,
                                       [this](QPrinter& printer) { return printTo(printer); });
  if (printed && !*printed)
    say(shown(printed->error()), true);
  else if (printed)
    say(tr("The sheet is printed."));
}

} // namespace planewright
