// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/record/embedded_study.h"
#include "core/report/make_sheet.h"
#include "core/working/recoverable.h"
#include "tests/app/run_program.h"

#include <gmock/gmock.h>

#include <cmath>
#include <fstream>
#include <set>
#include <sstream>

namespace planewright {
namespace {

using testing::HasSubstr;
using testing::Not;
using testing::StartsWith;

class SheetCommand : public ProgramTest {};

Study demoStudy() {
  std::ifstream file(PLANEWRIGHT_DEMO, std::ios::binary);
  const std::string bytes{std::istreambuf_iterator<char>(file), {}};
  return openedStudy(bytes)->study;
}

std::multiset<std::string> wordsIn(const std::string& text) {
  std::multiset<std::string> words;
  std::istringstream stream(text);
  for (std::string word; stream >> word;)
    words.insert(word);
  return words;
}

/// The value of a number as it is printed.
double read(std::string printed) {
  if (printed.starts_with("−"))
    printed.replace(0, std::string("−").size(), "-");
  return std::stod(printed);
}

TEST_F(SheetCommand, writesAPdfThatSaysWhatGoverns) {
  const Ran ran = run("sheet $demo -o sheet.pdf");
  EXPECT_EQ(ran.exit, 1) << ran.err;
  EXPECT_THAT(ran.err, HasSubstr("exceeds, 1.11"));
  const std::string text = shell("pdftotext -layout sheet.pdf -").out;
  EXPECT_THAT(text, HasSubstr("Stress at this point exceeds the stated strengths."));
  EXPECT_THAT(text, HasSubstr("1 of "));
  EXPECT_THAT(text, HasSubstr("Second route agrees within"));
  EXPECT_THAT(shell("pdfinfo sheet.pdf").out, HasSubstr("A4"));
  EXPECT_THAT(shell("pdffonts sheet.pdf").out, HasSubstr("LiberationSans"));
}

TEST_F(SheetCommand, writesTextThatSaysWhatThePagesSay) {
  EXPECT_EQ(run("sheet $demo -o sheet.txt").exit, 1);
  const std::string text = contents("sheet.txt");
  EXPECT_THAT(text, StartsWith("Project: "));
  EXPECT_THAT(text, HasSubstr("| Stress at this point exceeds the stated strengths."));
  EXPECT_THAT(text, HasSubstr("Second route agrees within"));
}

// Each number put in is found in the text of the PDF; the formula evaluated with those printed texts gives
// the printed result to half of its last digit.
TEST_F(SheetCommand, everyResultFollowsFromTheNumbersInThePdf) {
  ASSERT_EQ(run("sheet $demo -o sheet.pdf --depth all").exit, 1);
  const std::multiset<std::string> words = wordsIn(shell("pdftotext -raw sheet.pdf -").out);
  const auto isPrinted = [&](const std::string& number) {
    return words.contains(number) || words.contains("(" + number + ")") || words.contains("(" + number) ||
           words.contains(number + ")") || words.contains(number + ",");
  };
  SheetOrder order;
  order.depth = Depth::all;
  int steps = 0;
  int missing = 0;
  for (const SheetBlock& block : sheetOf(demoStudy(), order).blocks) {
    const auto* sheetStep = std::get_if<SheetStep>(&block);
    if (!sheetStep)
      continue;
    const Step& step = sheetStep->step;
    NumbersPutIn printed = step.putIn;
    for (NumberPutIn& number : printed) {
      const std::string text = shownNumber(number.value / number.scale, number.decimals);
      if (number.decimals <= 15)
        number.value = read(text) * number.scale;
      missing += isPrinted(text) || isPrinted(text + "°") ? 0 : 1;
    }
    const std::string result = shownNumber(step.result / step.scale, step.decimals);
    EXPECT_TRUE(isPrinted(result) || isPrinted(result + "°")) << result;
    const double half = 0.5 * std::pow(10.0, -step.decimals);
    EXPECT_NEAR(step.formula.valueWith(printed) / step.scale, step.result / step.scale, half * (1 + 1e-9))
        << plain(written(step));
    ++steps;
  }
  EXPECT_GT(steps, 200);
  // Inside formulas a parenthesis or a sign may touch a number and hide it from a search of words.
  EXPECT_LT(missing, steps / 10);
}

TEST_F(SheetCommand, writesHtmlInOneFile) {
  EXPECT_EQ(run("sheet $demo -o sheet.html --point 'P2 above the post'").exit, 0);
  const std::string html = contents("sheet.html");
  EXPECT_THAT(html, StartsWith("<!DOCTYPE html>"));
  EXPECT_THAT(html, HasSubstr("<math>"));
  EXPECT_THAT(html, Not(HasSubstr("P4 strut at the gable, ")));
}

TEST_F(SheetCommand, carriesTheStudyUnlessItIsLeftOut) {
  for (const char* name : {"a.pdf", "a.html"}) {
    ASSERT_EQ(run(std::string("sheet $demo -o ") + name).exit, 1);
    const auto carried = openedStudy(contents(name));
    ASSERT_TRUE(carried) << name;
    EXPECT_EQ(carried->study, demoStudy());
    ASSERT_EQ(run(std::string("sheet $demo --without-study -o ") + name).exit, 1);
    EXPECT_FALSE(openedStudy(contents(name))) << name;
  }
}

TEST_F(SheetCommand, comparesWithAnEarlierRevision) {
  Study study = demoStudy();
  ASSERT_EQ(shell("sed 's/\"95.71 deg\"/\"96 deg\"/' $demo > later.planewright").exit, 0);
  EXPECT_EQ(run("sheet later.planewright --since $demo -o sheet.html").exit, 1);
  EXPECT_THAT(contents("sheet.html"), HasSubstr("Changes since another revision"));
  EXPECT_THAT(contents("sheet.html"), HasSubstr("96 deg"));
  const Ran ran = run("compare $demo later.planewright");
  EXPECT_EQ(ran.exit, 0);
  EXPECT_THAT(ran.out, HasSubstr("scarf face: normal of the plane: 96 deg, was 95.71 deg"));
}

TEST_F(SheetCommand, refusesWrongUse) {
  expectWrongUse(run("sheet $demo"), "No file is given for the sheet.");
  expectWrongUse(run("sheet -o a.pdf"), "No study is given.");
  expectWrongUse(run("sheet $demo -o a.doc"), "names no kind of sheet");
  expectWrongUse(run("sheet $demo -o a.pdf --depth deep"), "results, governing, all");
  expectWrongUse(run("sheet $demo -o a.html --paper A4"), "Only a PDF has a paper.");
  expectWrongUse(run("sheet $demo -o a.pdf --point nobody"), "nobody");
  expectWrongUse(run("compare $demo"), "Two studies are compared.");
}

} // namespace
} // namespace planewright
