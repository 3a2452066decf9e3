// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/app/run_program.h"

#include <gmock/gmock.h>

namespace planewright {
namespace {

using testing::HasSubstr;

class Program : public ProgramTest {};

const std::string state = "resolve --sx 80 --sy 20 --txy -30";

void expectMachineFailed(const Ran& ran, const std::string& words) {
  EXPECT_EQ(ran.exit, 3) << ran.err;
  EXPECT_THAT(ran.err, HasSubstr(words));
}

TEST_F(Program, saysItsVersionAndHowItIsUsed) {
  const Ran version = run("--version");
  EXPECT_EQ(version.exit, 0);
  EXPECT_THAT(version.out, testing::ContainsRegex("^Planewright [0-9]+[.][0-9]+[.][0-9]+\n"));
  for (const std::string words : {"--help", "resolve --help", "figure --help"}) {
    const Ran help = run(words);
    EXPECT_EQ(help.exit, 0);
    EXPECT_EQ(help.err, "");
    EXPECT_THAT(help.out, HasSubstr("planewright"));
  }
  expectWrongUse(run("--version 2"), "The word “2” is one too many.");
  expectWrongUse(run("--help figure"), "The word “figure” is one too many.");
}

TEST_F(Program, knowsItsCommands) {
  expectWrongUse(run("reslove --sx 1"), "“reslove” is neither a command nor a file.");
  expectWrongUse(run("--resolve"), "--resolve");
}

TEST_F(Program, noticesAFullDisk) {
  expectMachineFailed(shell("\"$program\" " + state + " >/dev/full"),
                      "standard output: This could not be written: the disk is full.");
  expectMachineFailed(shell("\"$program\" --help >/dev/full"), "the disk is full");
  expectMachineFailed(run(state + " -o /dev/full"),
                      "/dev/full: This could not be written: the disk is full.");
  for (const std::string ending : {"svg", "pdf", "png"})
    expectMachineFailed(
        shell("ln -s /dev/full full." + ending + "; \"$program\" figure \"$demo\" -o full." + ending),
        "the disk is full");
}

TEST_F(Program, noticesAClosedPipe) {
  const Ran ran = shell("{ sleep 0.5; \"$program\" " + state + "; echo \"exit $?\" >&2; } | true");
  EXPECT_THAT(ran.err, HasSubstr("its reader has gone"));
  EXPECT_THAT(ran.err, HasSubstr("exit 3"));
  expectMachineFailed(shell("\"$program\" " + state + " >&-"), "standard output");
}

TEST_F(Program, noticesAFolderThatIsMissingOrClosed) {
  expectMachineFailed(run(state + " -o none/a.txt"), "none/a.txt: This could not be written");
  expectMachineFailed(run("figure \"$demo\" -o none/a.pdf"), "none/a.pdf");
  expectMachineFailed(run(state + " -o /proc/planewright"), "/proc/planewright");
  EXPECT_EQ(files(), 0U);
}

TEST_F(Program, neverLetsWordsFallIntoAFile) {
  EXPECT_EQ(shell("\"$program\" " + state + " -o a.txt >&- 2>&-").exit, 0);
  EXPECT_EQ(contents("a.txt"), run(state).out);
  EXPECT_EQ(shell("\"$program\" resolve none.planewright 2>&-").exit, 2);
  EXPECT_EQ(files(), 1U);
}

TEST_F(Program, paintsWithoutAnyFontOfTheSystem) {
  const std::string bare = "env FONTCONFIG_PATH=/nowhere FONTCONFIG_FILE=/nowhere/none.conf "
                           "XDG_CACHE_HOME=/nowhere HOME=/nowhere XDG_RUNTIME_DIR=/nowhere "
                           "QT_QPA_PLATFORM=xcb QT_QPA_PLATFORMTHEME=gtk3";
  for (const std::string kind : {"pdf", "png"}) {
    const Ran ran = run("figure \"$demo\" -o bare." + kind, bare);
    EXPECT_EQ(ran.exit, 0) << ran.err;
    EXPECT_EQ(ran.err, "");
    ASSERT_EQ(run("figure \"$demo\" -o usual." + kind).exit, 0);
  }
  EXPECT_EQ(contents("bare.png"), contents("usual.png"));
  EXPECT_THAT(shell("pdffonts bare.pdf").out, HasSubstr("LiberationSans"));
  EXPECT_EQ(shell("pdftotext -layout bare.pdf -").out, shell("pdftotext -layout usual.pdf -").out);
}

TEST_F(Program, writesPointsInEveryLocale) {
  ASSERT_EQ(shell("localedef -i de_DE -f UTF-8 ./de_DE.UTF-8").exit, 0) << "needs the package locales";
  const std::string german = "env LOCPATH=. LC_ALL=de_DE.UTF-8 LANGUAGE=de";
  ASSERT_EQ(shell(german + " printf '%.1f' 2,5").out, "2,5") << "the locale is in force";
  for (const std::string format : {"text", "json", "csv"}) {
    const std::string words = state + " --line '1 in 10' --format " + format;
    EXPECT_EQ(run(words, german).out, run(words).out);
  }
  EXPECT_EQ(run("figure \"$demo\" -o -", german).out, run("figure \"$demo\" -o -").out);
  ASSERT_EQ(run("figure \"$demo\" -o german.pdf", german).exit, 0);
  ASSERT_EQ(run("figure \"$demo\" -o usual.pdf").exit, 0);
  EXPECT_EQ(shell("pdftotext -layout german.pdf -").out, shell("pdftotext -layout usual.pdf -").out);
}

} // namespace
} // namespace planewright
