// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/app/run_program.h"

#include <gmock/gmock.h>

#include <charconv>
#include <cmath>

namespace planewright {
namespace {

using testing::HasSubstr;

class Resolve : public ProgramTest {};

const std::string golden = "resolve --sx '80 MPa' --sy '20 MPa' --txy '-30 MPa'";

/// The number behind `key` in a JSON text, the first behind `after`.
double numberAt(const std::string& json, const std::string& key, const std::string& after = "") {
  const std::string wanted = "\"" + key + "\":";
  const auto from = json.find(after);
  const auto at = from == std::string::npos ? from : json.find(wanted, from);
  double number = std::nan("");
  if (at == std::string::npos)
    return number;
  const auto start = json.find_first_not_of(" ", at + wanted.size());
  std::from_chars(json.data() + start, json.data() + json.size(), number);
  return number;
}

// Golden numbers of the program's contract: own arithmetic, two routes.
TEST_F(Resolve, givesTheGoldenNumbers) {
  const Ran ran = run(golden + " --normal '25 deg' --line '1 in 10' --format json");
  ASSERT_EQ(ran.exit, 0) << ran.err;
  EXPECT_EQ(ran.err, "");
  EXPECT_NEAR(numberAt(ran.out, "mean"), 50, 1e-12);
  EXPECT_NEAR(numberAt(ran.out, "radius"), 42.426407, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "s1"), 92.426407, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "s2"), 7.573593, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "theta1"), -22.5, 1e-12);
  EXPECT_NEAR(numberAt(ran.out, "theta_tau_max"), -67.5, 1e-12);
  EXPECT_NEAR(numberAt(ran.out, "tau_abs_max"), 46.213203, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "sn", "\"normal 1\""), 46.302295, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "tnt", "\"normal 1\""), -42.264962, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "angle", "\"line 1\""), 5.710593, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "along", "\"line 1\""), 73.465347, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "across", "\"line 1\""), 26.534653, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "shear", "\"line 1\""), -35.346535, 5e-7);
  EXPECT_THAT(ran.out, HasSubstr("\"P1\""));
  EXPECT_THAT(ran.out, HasSubstr("\"typed\""));
}

// The corner of norris-plane inside a band: golden numbers, own arithmetic by two routes; C24 from memory.
TEST_F(Resolve, judgesByTheGoldenCorner) {
  put("corner.planewright", R"({"format":"planewright-study","version":1,
 "materials":[{"name":"C24","kind":"timber","basis":"characteristic","source":"EN 338:2016","trust":"from memory",
   "along_tension":"14.5 MPa","along_compression":"21 MPa","across_tension":"0.4 MPa","across_compression":"2.5 MPa",
   "shear":"4 MPa"}],
 "points":[{"name":"P1","stress":{"G":{"sx":"-0.08 MPa","sy":"4.36 MPa","txy":"0.085 MPa"}},
   "line":{"name":"grain","kind":"grain","angle":"94 deg","tolerance":"5 deg"},
   "checks":[{"id":"grain","material":"C24","criterion":"norris-plane","line":"grain","parameters":{}}]}]})");
  const Ran ran = run("resolve corner.planewright --format json");
  ASSERT_EQ(ran.exit, 0) << ran.err;
  EXPECT_NEAR(numberAt(ran.out, "utilisation", "\"checks\""), 0.323415, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "worst_utilisation"), 0.330724, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "worst_angle"), -83.3065, 5e-5);
  EXPECT_NEAR(numberAt(ran.out, "utilisation", "\"governing\""), 0.330724, 5e-7);
  EXPECT_THAT(ran.out, HasSubstr("not a design check"));
}

TEST_F(Resolve, saysByItsExitThatSomethingExceedsOrCouldNotBeJudged) {
  const auto judged = [this](const std::string& sx, const std::string& criterion) {
    const std::string material =
        R"({"name":"steel","kind":"isotropic","basis":"design","source":"invented","tension":"235 MPa"})";
    const std::string check = R"({"id":"steel","material":"steel","criterion":")" + criterion + "\"}";
    put("judged.planewright", R"({"format":"planewright-study","version":1,"materials":[)" + material +
                                  R"(],"points":[{"name":"P1","stress":{"G":{"sx":")" + sx +
                                  R"( MPa"}},"checks":[)" + check + "]}]}");
    return run("resolve judged.planewright");
  };
  EXPECT_EQ(judged("235", "von-mises").exit, 0) << "exactly at the limit";
  const Ran exceeds = judged("235.1", "von-mises");
  EXPECT_EQ(exceeds.exit, 1);
  EXPECT_THAT(exceeds.err, HasSubstr("exceeds, 1.01"));
  EXPECT_THAT(exceeds.out, HasSubstr("exceeds the stated strengths"));
  const Ran unjudged = judged("1", "rankine");
  EXPECT_EQ(unjudged.exit, 1);
  EXPECT_THAT(unjudged.err, HasSubstr("not judged"));
}

TEST_F(Resolve, takesCompressionAsPositive) {
  const Ran ran = run("resolve --sx=-80 --sy -20 --txy 30 --positive compression --format json");
  ASSERT_EQ(ran.exit, 0) << ran.err;
  EXPECT_NEAR(numberAt(ran.out, "s1"), -7.573593, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "s2"), -92.426407, 5e-7);
  EXPECT_NEAR(numberAt(ran.out, "theta1"), 67.5, 1e-12);
}

TEST_F(Resolve, takesBareNumbersExpressionsAndAThirdStress) {
  const Ran ran = run("resolve --sx '18.6 kN/(90 mm*240 mm)' --sy 0 --txy=-1e-1 --sz '-2 MPa' --format json");
  ASSERT_EQ(ran.exit, 0) << ran.err;
  EXPECT_NEAR(numberAt(ran.out, "sx"), 18600.0 / 21600, 1e-12);
  EXPECT_NEAR(numberAt(ran.out, "txy"), -0.1, 1e-15);
  // s1 = 0.8726 and s3 = -2 lie farthest apart.
  EXPECT_NEAR(numberAt(ran.out, "tau_abs_max"), (numberAt(ran.out, "s1") + 2) / 2, 1e-12);
}

TEST_F(Resolve, givesEachToleranceToTheLineBeforeIt) {
  const Ran ran =
      run(golden + " --line 10 --tolerance 3 --line '1 in 8' --line=20 --tolerance='1:20' --format json");
  ASSERT_EQ(ran.exit, 0) << ran.err;
  EXPECT_NEAR(numberAt(ran.out, "tolerance", "\"line 1\""), 3, 1e-12);
  EXPECT_EQ(numberAt(ran.out, "tolerance", "\"line 2\""), 0);
  EXPECT_NEAR(numberAt(ran.out, "tolerance", "\"line 3\""), 2.862405, 5e-7);
}

TEST_F(Resolve, writesEveryFormatToAFileOrStandardOutput) {
  for (const std::string format : {"text", "json", "csv"}) {
    const Ran ran = run(golden + " --format " + format);
    EXPECT_EQ(ran.exit, 0) << ran.err;
    ASSERT_GT(ran.out.size(), 200U);
    EXPECT_EQ(ran.out.back(), '\n');
    const Ran silent = run(golden + " -o readings --format " + format);
    EXPECT_EQ(silent.exit, 0);
    EXPECT_EQ(silent.out, "");
    EXPECT_EQ(contents("readings"), ran.out);
    EXPECT_EQ(run(golden + " -o - --format " + format).out, ran.out);
  }
  EXPECT_EQ(files(), 1U);
}

TEST_F(Resolve, readsAStudyFromAFileAndFromStandardInput) {
  const Ran file = run("resolve \"$demo\" --format json --normal 12");
  EXPECT_EQ(file.exit, 1) << "a check of the worked example exceeds";
  EXPECT_THAT(file.out, HasSubstr("\"normal 1\""));
  EXPECT_EQ(shell("\"$program\" resolve - --format json --normal 12 <\"$demo\"").out, file.out);
}

TEST_F(Resolve, refusesWrongComponents) {
  expectWrongUse(run("resolve --sx '80 MPaa' --sy 20 --txy -30"), "--sx, column");
  expectWrongUse(run("resolve --sx 80 --sy '12 kN' --txy -30"), "a force (12 kN)");
  expectWrongUse(run("resolve --sx 80 --sy '20,5' --txy -30"), "--sy, column");
  expectWrongUse(run("resolve --sx 1e999 --sy 20 --txy -30"), "--sx");
  expectWrongUse(run("resolve --sx nan --sy 20 --txy -30"), "--sx");
  expectWrongUse(run("resolve --sx '12 kN/6 kN' --sy 20 --txy -30"), "--sx");
  expectWrongUse(run("resolve --sx 1e200 --sy 20 --txy -30"), "--sx");
  EXPECT_EQ(files(), 0U);
}

TEST_F(Resolve, refusesWrongUse) {
  expectWrongUse(run("resolve"), "Neither a study nor all three components are given.");
  expectWrongUse(run("resolve --sx 80 --sy 20"), "--txy");
  expectWrongUse(run("resolve --sx --normal 25"), "The option --sx needs a value.");
  expectWrongUse(run("resolve --sx 80 --sx 81 --sy 20 --txy 0"), "The option --sx is given twice.");
  expectWrongUse(run(golden + " --format xml"), "Take text, json or csv.");
  expectWrongUse(run(golden + " --format json --format csv"), "The option --format is given twice.");
  expectWrongUse(run(golden + " --positive up"), "--positive");
  expectWrongUse(run(golden + " --angle 3"), "There is no option --angle here.");
  expectWrongUse(run(golden + " --normal '1 in 10'"), "--normal");
  expectWrongUse(run(golden + " --normal '3 MPa'"), "--normal");
  expectWrongUse(run(golden + " --tolerance 3 --line 10"), "--tolerance");
  expectWrongUse(run(golden + " --line 10 --tolerance 3 --tolerance 4"), "--tolerance");
  expectWrongUse(run(golden + " --line 10 --tolerance=-3"), "negative; a tolerance is not");
  expectWrongUse(run(golden + " extra.planewright"), "A study brings its own stresses");
  expectWrongUse(run("resolve \"$demo\" --sz 3"), "A study brings its own stresses");
  expectWrongUse(run("resolve \"$demo\" --positive tension"), "A study brings its own stresses");
  expectWrongUse(run("resolve a b"), "The word “b” is one too many.");
  EXPECT_EQ(files(), 0U);
}

TEST_F(Resolve, refusesWhatIsNoStudy) {
  expectWrongUse(run("resolve none.planewright"),
                 "none.planewright: This cannot be read: there is no such file");
  expectWrongUse(run("resolve /"), "it is a folder");
  expectWrongUse(run("resolve /dev/zero"), "/dev/zero");
  put("text", "not a study");
  expectWrongUse(run("resolve text"), "text");
  put("empty", "");
  expectWrongUse(run("resolve empty"), "empty");
  put("misspelt", R"({"format":"planewright-study","version":1,"pionts":[]})");
  expectWrongUse(run("resolve misspelt"), "pionts");
  put("newer", R"({"format":"planewright-study","version":2})");
  expectWrongUse(run("resolve newer"), "newer");
}

TEST_F(Resolve, writesNoOutputOverTheStudyItself) {
  ASSERT_EQ(shell("cp \"$demo\" study; ln -s study link").exit, 0);
  const std::string before = contents("study");
  expectWrongUse(run("resolve study -o study"), "is the study itself");
  expectWrongUse(run("resolve study -o link"), "is the study itself");
  EXPECT_EQ(contents("study"), before);
}

} // namespace
} // namespace planewright
