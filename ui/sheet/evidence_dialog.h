// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/evidence/evidence.h"
#include "core/report/sheet_pages.h"

#include <QDialog>

class QHBoxLayout;
class QLabel;
class QPrinter;

namespace planewright {

class SheetPreview;

/// The published values that the program carries, recomputed when the dialog opens: what an office files as
/// its evidence for using the program. Shows the report's pages, saves them as PDF, HTML or text, prints
/// them.
class EvidenceDialog : public QDialog {
  Q_OBJECT

public:
  explicit EvidenceDialog(QWidget* parent = nullptr);
  /// The report of these results: what the dialog shows once it is open.
  EvidenceDialog(Results<std::vector<CheckResult>> checks, QWidget* parent);

  SheetPreview& preview() const { return *m_preview; }

  /// Saves the report by the ending of the name: HTML, text, else PDF.
  Result<void> saveTo(const QString& path);
  /// Prints all pages.
  Result<void> printTo(QPrinter& printer);

private:
  QHBoxLayout* footer();
  void say(const QString& sentence, bool isWrong = false);
  void save(const QString& ending, const QString& kind);
  void print();

  Paper m_paper; ///< that sheets were made for last
  Sheet m_report;
  SheetPreview* m_preview = nullptr;
  QLabel* m_sentence = nullptr;
};

} // namespace planewright
