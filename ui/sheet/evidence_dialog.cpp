// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/evidence_dialog.h"

#include "core/evidence/evidence_count.h"
#include "core/report/evidence_sheet.h"
#include "core/report/sheet_html.h"
#include "core/report/sheet_pages.h"
#include "core/report/sheet_text.h"
#include "ui/files/file_bytes.h"
#include "ui/files/folders.h"
#include "ui/files/platform_name.h"
#include "ui/look/dialog_parts.h"
#include "ui/look/look.h"
#include "ui/paint/export.h"
#include "ui/sheet/pages_view.h"
#include "ui/sheet/report_output.h"
#include "ui/sheet/sheet_preview.h"
#include "ui/sheet/sheet_settings.h"

#include <QDir>
#include <QHBoxLayout>
#include <QLabel>
#include <QPrinter>
#include <QPushButton>
#include <QSettings>
#include <QVBoxLayout>

namespace planewright {

EvidenceDialog::EvidenceDialog(QWidget* parent) : EvidenceDialog(publishedChecks(), parent) {}

EvidenceDialog::EvidenceDialog(Results<std::vector<CheckResult>> checks, QWidget* parent)
    : QDialog(parent), m_paper(rememberedSheet(QSettings()).paper) {
  constexpr QSize first(900, 780);
  setWindowTitle(tr("Published values, recomputed"));
  setProperty("helpPlace", "sheets#evidence");
  m_sentence = sentenceIn(*this);
  auto* view = new PagesView(this);
  m_preview = &view->preview();
  auto* column = new QVBoxLayout(this);
  column->addWidget(view, 1);
  column->addWidget(m_sentence);
  if (checks) {
    m_report = evidenceSheet(*checks, platformName());
    m_preview->setPages(pagesOf(m_report, m_paper, translation()));
    column->addLayout(footer());
    QStringList words;
    for (const Text& sentence : wordsOfCount(*checks))
      words << shown(sentence);
    say(words.join(QLatin1Char(' ')), m_report.disagrees);
  } else {
    say(shown(checks.error().front()), true);
  }
  resizeOnScreen(*this, first);
}

QHBoxLayout* EvidenceDialog::footer() {
  auto* row = new QHBoxLayout;
  const auto add = [&](const QString& words, auto act) {
    auto* button = new QPushButton(words, this);
    button->setAutoDefault(false);
    row->addWidget(button);
    connect(button, &QPushButton::clicked, this, act);
  };
  row->addStretch();
  add(tr("Save PDF…"), [this] { save(QStringLiteral(".pdf"), tr("PDF (*.pdf)")); });
  add(tr("Save HTML…"), [this] { save(QStringLiteral(".html"), tr("HTML (*.html)")); });
  add(tr("Save text…"), [this] { save(QStringLiteral(".txt"), tr("Text (*.txt)")); });
  add(tr("Print…"), [this] { print(); });
  return row;
}

void EvidenceDialog::say(const QString& sentence, bool isWrong) {
  tell(*m_sentence, sentence, isWrong);
}

Result<void> EvidenceDialog::saveTo(const QString& path) {
  if (path.endsWith(QStringLiteral(".html"), Qt::CaseInsensitive))
    return writeAside(path.toStdString(), sheetHtml(m_report, translation()));
  if (path.endsWith(QStringLiteral(".txt"), Qt::CaseInsensitive))
    return writeAside(path.toStdString(), sheetText(m_report, translation()));
  const Result<QByteArray> bytes = pdfOfPages(m_preview->pages(), Palette::paper);
  return bytes ? writeAside(path.toStdString(), bytes->toStdString()) : tl::unexpected(bytes.error());
}

void EvidenceDialog::save(const QString& ending, const QString& kind) {
  const QString offered = outputFolder(QString()) + QLatin1Char('/') + tr("published-values") + ending;
  const QString path = askedFileToSave(*this, tr("Save the report"), offered, kind);
  if (path.isEmpty())
    return;
  if (const Result<void> saved = saveTo(path); !saved)
    say(shown(saved.error()), true);
  else
    say(tr("Saved as %1.").arg(QDir::toNativeSeparators(path)));
}

Result<void> EvidenceDialog::printTo(QPrinter& printer) {
  printer.setDocName(windowTitle());
  return printPages(printer, m_preview->pages(), Palette::paper);
}

void EvidenceDialog::print() {
  const auto printed = printedByDialog(this, m_paper, [this](QPrinter& printer) { return printTo(printer); });
  if (printed && !*printed)
    say(shown(printed->error()), true);
  else if (printed)
    say(tr("The report is printed."));
}

} // namespace planewright
