// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/evidence_dialog.h"

#include "ui/sheet/sheet_preview.h"

#include <QFile>
#include <QLabel>
#include <QPrinter>
#include <QPushButton>
#include <QTemporaryDir>

#include <gmock/gmock.h>

namespace planewright {
namespace {

using testing::HasSubstr;

std::string contents(const QString& path) {
  QFile file(path);
  return file.open(QIODevice::ReadOnly) ? file.readAll().toStdString() : std::string();
}

std::string sentenceOf(const EvidenceDialog& dialog) {
  std::string all;
  for (const QLabel* label : dialog.findChildren<QLabel*>())
    all += label->text().toStdString();
  return all;
}

TEST(EvidenceDialog, showsAndSavesTheReport) {
  QTemporaryDir folder;
  EvidenceDialog dialog;
  dialog.show();
  EXPECT_GT(dialog.preview().pages().size(), 3u);
  EXPECT_THAT(sentenceOf(dialog), HasSubstr("values agree."));
  const auto saved = [&](const char* name) {
    const QString path = folder.filePath(QString::fromUtf8(name));
    EXPECT_TRUE(dialog.saveTo(path)) << name;
    return contents(path);
  };
  EXPECT_THAT(saved("values.pdf"), testing::StartsWith("%PDF"));
  EXPECT_THAT(saved("values.html"), HasSubstr("Known misprints of the sources"));
  EXPECT_THAT(saved("values.txt"), HasSubstr("Known misprints of the sources"));
  EXPECT_FALSE(dialog.saveTo(folder.filePath(QStringLiteral("no/such/folder.pdf"))));
}

TEST(EvidenceDialog, aValueThatDisagreesIsSaidFirst) {
  std::vector<CheckResult> checks = *publishedChecks();
  checks[5].agrees = false;
  const EvidenceDialog dialog(checks, nullptr);
  EXPECT_THAT(sentenceOf(dialog), HasSubstr("1 of " + std::to_string(checks.size()) + " values disagree."));
}

TEST(EvidenceDialog, rowsThatDoNotReadAreSaidAndNothingCanBeSaved) {
  Problem problem;
  problem.what = PW_TEXT("Check", "This status is not known.");
  const EvidenceDialog dialog(tl::unexpected(Problems{problem}), nullptr);
  EXPECT_THAT(sentenceOf(dialog), HasSubstr("This status is not known."));
  EXPECT_TRUE(dialog.findChildren<QPushButton*>().isEmpty());
}

TEST(EvidenceDialog, printsAllPages) {
  QTemporaryDir folder;
  EvidenceDialog dialog;
  QPrinter printer(QPrinter::HighResolution);
  printer.setOutputFormat(QPrinter::PdfFormat);
  const QString file = folder.filePath(QStringLiteral("printed.pdf"));
  printer.setOutputFileName(file);
  ASSERT_TRUE(dialog.printTo(printer));
  EXPECT_EQ(QByteArray::fromStdString(contents(file)).count("/MediaBox"),
            static_cast<qsizetype>(dialog.preview().pages().size()));
}

} // namespace
} // namespace planewright
