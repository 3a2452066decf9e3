// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_dialog.h"

#include "core/record/embedded_study.h"
#include "tests/support/judged_study.h"
#include "ui/sheet/sheet_options.h"
#include "ui/sheet/sheet_preview.h"

#include <QCheckBox>
#include <QFile>
#include <QLabel>
#include <QListWidget>
#include <QPrinter>
#include <QPushButton>
#include <QRadioButton>
#include <QSettings>
#include <QTemporaryDir>
#include <QTest>

#include <gtest/gtest.h>

#include <stdexcept>

namespace planewright {
namespace {

class SheetDialogTest : public testing::Test {
protected:
  SheetDialogTest() {
    QSettings::setDefaultFormat(QSettings::IniFormat);
    QSettings::setPath(QSettings::IniFormat, QSettings::UserScope, folder.path());
    QCoreApplication::setOrganizationName(QStringLiteral("planewright-tests"));
    QCoreApplication::setApplicationName(QStringLiteral("sheet"));
    QSettings().clear();
  }

  static Study twoPoints() {
    Study study = judgedStudy();
    study.points.push_back(study.points.front());
    study.points.back().name = "P2";
    return study;
  }

  template <class Button>
  static Button& button(const QWidget& dialog, const char* words) {
    for (Button* one : dialog.findChildren<Button*>())
      if (one->text() == QString::fromUtf8(words))
        return *one;
    throw std::runtime_error(words);
  }

  /// The pages once they are those of the study as it is now.
  static const std::vector<Picture>& pagesOf(const SheetDialog& dialog) {
    EXPECT_TRUE(QTest::qWaitFor([&] { return dialog.isUpToDate(); }));
    return dialog.preview().pages();
  }

  QByteArray contents(const QString& path) const {
    QFile file(path);
    return file.open(QIODevice::ReadOnly) ? file.readAll() : QByteArray();
  }

  QTemporaryDir folder;
  Desk desk{twoPoints()};
};

TEST_F(SheetDialogTest, showsThePagesAndFollowsTheStudy) {
  SheetDialog dialog(desk);
  dialog.show();
  const std::vector<Picture> before = pagesOf(dialog);
  EXPECT_GT(before.size(), 3u);
  desk.request({Type{{Spot::titleSubject, {}, {}}, "Tie at the eaves"}}, desk.newCommand(), {});
  EXPECT_NE(pagesOf(dialog).front(), before.front());
}

TEST_F(SheetDialogTest, choicesChangeTheSheetAndAreRemembered) {
  {
    SheetDialog dialog(desk);
    dialog.show();
    const std::size_t pages = pagesOf(dialog).size();
    button<QRadioButton>(dialog, "Inputs and results").click();
    EXPECT_LT(pagesOf(dialog).size(), pages);
    button<QRadioButton>(dialog, "Letter").click();
    EXPECT_DOUBLE_EQ(pagesOf(dialog).front().width, 215.9);
  }
  const SheetSettings remembered = rememberedSheet(QSettings());
  EXPECT_EQ(remembered.depth, Depth::results);
  EXPECT_EQ(remembered.paper, Paper::letter);
}

TEST_F(SheetDialogTest, pointsCanBeLeftOutByMouseAndByKey) {
  SheetDialog dialog(desk);
  dialog.show();
  QListWidget& list = dialog.options().pointList();
  ASSERT_EQ(list.count(), 2);
  EXPECT_TRUE(dialog.options().points().empty());
  list.setCurrentRow(1);
  list.setFocus();
  QTest::keyClick(&list, Qt::Key_Space);
  EXPECT_EQ(dialog.options().points(), std::vector<std::string>{"P1"});
  desk.request({Insert{{Spot::point, "P3", {}}, std::nullopt}}, desk.newCommand(), {});
  EXPECT_EQ(list.count(), 3);
  EXPECT_EQ(dialog.options().points(), (std::vector<std::string>{"P1", "P3"}))
      << "what was left out stays so";
}

TEST_F(SheetDialogTest, savesPdfAndHtmlWithAndWithoutTheStudy) {
  SheetDialog dialog(desk);
  dialog.show();
  const QString pdf = folder.filePath(QStringLiteral("s.pdf"));
  const QString html = folder.filePath(QStringLiteral("s.html"));
  ASSERT_TRUE(dialog.saveTo(pdf));
  ASSERT_TRUE(dialog.saveTo(html));
  EXPECT_TRUE(contents(pdf).startsWith("%PDF"));
  EXPECT_EQ(openedStudy(contents(pdf).toStdString())->study, desk.study());
  EXPECT_EQ(openedStudy(contents(html).toStdString())->study, desk.study());
  button<QCheckBox>(dialog, "Carry the study inside the file").click();
  ASSERT_TRUE(dialog.saveTo(pdf));
  EXPECT_FALSE(openedStudy(contents(pdf).toStdString()));
  EXPECT_FALSE(dialog.saveTo(folder.filePath(QStringLiteral("nowhere/s.pdf"))));
}

TEST_F(SheetDialogTest, comparesWithAnotherRevision) {
  SheetDialog dialog(desk);
  dialog.show();
  const std::size_t pages = pagesOf(dialog).size();
  const QString file = folder.filePath(QStringLiteral("earlier.pdf"));
  ASSERT_TRUE(dialog.saveTo(file));
  desk.request({Type{{Spot::sx, "P1", "G"}, "6 MPa"}}, desk.newCommand(), {});
  ASSERT_TRUE(dialog.compareWith(file));
  EXPECT_GE(pagesOf(dialog).size(), pages);
  bool said = false;
  for (const QLabel* label : dialog.findChildren<QLabel*>())
    said = said || label->text().startsWith(QStringLiteral("earlier.pdf: 1 input(s)"));
  EXPECT_TRUE(said);
  EXPECT_FALSE(dialog.compareWith(folder.filePath(QStringLiteral("nothing.planewright"))));
}

TEST_F(SheetDialogTest, ofManySheetsAskedForAtOnceTheLastOneIsShown) {
  SheetRun run;
  std::vector<MadeSheet> made;
  QObject::connect(&run, &SheetRun::made, [&](const MadeSheet& sheet) { made.push_back(sheet); });
  SheetJob job{twoPoints(), {}, Paper::a4};
  for (const char* subject : {"first", "second", "third", "last"}) {
    job.study.title.subject = subject;
    run.ask(job);
  }
  EXPECT_TRUE(QTest::qWaitFor([&] { return !run.isRunning(); }));
  ASSERT_EQ(made.size(), 2u);
  EXPECT_EQ(made.back().pages, planewright::pagesOf(sheetOf(job.study, job.order), job.paper));
}

TEST_F(SheetDialogTest, printsAllPages) {
  SheetDialog dialog(desk);
  dialog.show();
  QPrinter printer(QPrinter::HighResolution);
  printer.setOutputFormat(QPrinter::PdfFormat);
  const QString file = folder.filePath(QStringLiteral("printed.pdf"));
  printer.setOutputFileName(file);
  ASSERT_TRUE(dialog.printTo(printer));
  EXPECT_EQ(contents(file).count("/MediaBox"), static_cast<qsizetype>(pagesOf(dialog).size()));
}

TEST_F(SheetDialogTest, pagesLieInsideThePreview) {
  SheetDialog dialog(desk);
  dialog.resize(760, 560);
  dialog.show();
  ASSERT_FALSE(pagesOf(dialog).empty());
  QTest::qWait(20);
  SheetPreview& preview = dialog.preview();
  for (std::size_t i = 0; i < preview.pages().size(); ++i) {
    EXPECT_GE(preview.pageRect(i).left(), 0);
    EXPECT_LE(preview.pageRect(i).right(), preview.width());
    EXPECT_LE(preview.pageRect(i).bottom(), preview.height());
  }
}

} // namespace
} // namespace planewright
