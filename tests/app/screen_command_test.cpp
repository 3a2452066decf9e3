// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/record/csv.h"
#include "core/record/embedded_study.h"
#include "core/study/readout.h"
#include "tests/app/run_program.h"

#include <gmock/gmock.h>

#include <algorithm>
#include <charconv>
#include <fstream>

namespace planewright {
namespace {

using testing::HasSubstr;
using testing::Not;
using testing::StartsWith;

const std::string header = "point,region,case,sx,sy,txy\n";

/// The rows of a point with these stresses in every case of the worked example.
std::string rowsOf(const std::string& name, const std::string& stresses, const std::string& region = "") {
  std::string rows;
  for (const char* id : {"G", "S", "W", "M"})
    rows.append(name).append(",").append(region).append(",").append(id).append(",").append(stresses).append(
        "\n");
  return rows;
}

class ScreenCommand : public ProgramTest {
protected:
  Ran screen(const std::string& more, const std::string& point = "P2 above the post") const {
    return run("screen points.csv --study $demo --point '" + point + "' " + more);
  }
};

const std::string quiet = rowsOf("a", "0.5,0.01,0") + rowsOf("b", "0.4,0,0.01");

TEST_F(ScreenCommand, writesARowForEachPointAndASummary) {
  put("points.csv", header + quiet);
  const Ran ran = screen("-o out.csv");
  EXPECT_EQ(ran.exit, 0) << ran.err;
  EXPECT_EQ(ran.out, "");
  EXPECT_THAT(contents("out.csv"),
              StartsWith("point,utilisation,load_multiplier,combination,check,mode,worst_angle\na,"));
  EXPECT_THAT(ran.err, StartsWith("Judged by point P2 above the post, over 6 combinations.\n"));
  EXPECT_THAT(ran.err, HasSubstr("Points: 2, judged: 2, incomplete and not judged: 0"));
  EXPECT_THAT(ran.err, HasSubstr("Exceeding: 0 of 2 judged points."));
  EXPECT_THAT(ran.err, HasSubstr("99.9 % of the points do not exceed"));
  EXPECT_THAT(ran.err, HasSubstr("Points by utilisation:"));
  EXPECT_THAT(ran.err, HasSubstr("local codes and a licensed engineer decide."));
  EXPECT_THAT(ran.err, Not(HasSubstr("\r")));
  EXPECT_EQ(screen("-o -").out, contents("out.csv"));
  EXPECT_EQ(files(), 2U);
}

// A row with the stresses that a point of the study has gives what the study gives.
TEST_F(ScreenCommand, agreesWithTheReadingsOfAPoint) {
  std::ifstream file(PLANEWRIGHT_DEMO, std::ios::binary);
  const std::string bytes{std::istreambuf_iterator<char>(file), {}};
  const Readout readout = evaluate(openedStudy(bytes)->study, "P2 above the post");
  std::string rows;
  for (const CaseReading& one : readout.cases)
    rows += "n,," + one.id + "," + shortestNumber(one.stress.sx) + "," + shortestNumber(one.stress.sy) + "," +
            shortestNumber(one.stress.txy) + "\n";
  put("points.csv", header + rows);
  screen("-o out.csv");
  double worst = 0;
  std::string combination;
  for (const StateReading& state : readout.states)
    if (state.judged && state.checks[0].worst.utilisation > worst) {
      worst = state.checks[0].worst.utilisation;
      combination = state.combination;
    }
  const std::string out = contents("out.csv");
  const std::vector<std::string> fields =
      csvFields(out.substr(out.find('\n') + 1, out.rfind('\n') - out.find('\n') - 1));
  ASSERT_EQ(fields.size(), 7U) << out;
  double utilisation = 0;
  std::from_chars(fields[1].data(), fields[1].data() + fields[1].size(), utilisation);
  EXPECT_NEAR(utilisation, worst, 1e-11 * worst);
  EXPECT_EQ(fields[3], combination);
}

TEST_F(ScreenCommand, saysByItsExitWhatExceedsAndWhatWasLeftOut) {
  put("points.csv", header + quiet + rowsOf("corner1", "900,0,0", "support"));
  const Ran all = screen("-o out.csv");
  EXPECT_EQ(all.exit, 1);
  EXPECT_THAT(all.err, HasSubstr("Exceeding: 1 of 3 judged points."));
  for (const std::string words : {"--except support", "--except 'corner*'", "--except-list list.txt"}) {
    put("list.txt", "corner1\r\n\n");
    const Ran ran = screen("-o out.csv " + words);
    EXPECT_EQ(ran.exit, 4) << ran.err;
    EXPECT_THAT(ran.err, HasSubstr("planewright: Points left out on request: 1."));
    EXPECT_THAT(contents("out.csv"), Not(HasSubstr("corner1")));
  }
  expectWrongUse(screen("-o none.csv --except nothing"), "“nothing”");
  put("list.txt", "a\nnobody\n");
  expectWrongUse(screen("-o none.csv --except-list list.txt"), "“nobody”");
}

TEST_F(ScreenCommand, aFaultyRowStopsItOrIsLeftOut) {
  put("points.csv", header + quiet + rowsOf("c", "1,nan,0") + "d,,G,1,2\n");
  put("out.csv", "as it was");
  const Ran stopped = screen("-o out.csv");
  expectWrongUse(stopped, "points.csv, line 10, column 5: “nan” is no finite number.");
  EXPECT_THAT(stopped.err, HasSubstr("line 14: The row has fewer cells than the header."));
  EXPECT_THAT(stopped.err, HasSubstr("Rows with a fault: 5 of 13"));
  EXPECT_EQ(contents("out.csv"), "as it was");
  const Ran went = screen("-o out.csv --leave-out");
  EXPECT_EQ(went.exit, 4) << went.err;
  EXPECT_THAT(went.err, HasSubstr("Left out: 5 of 13 rows"));
  EXPECT_THAT(went.err, HasSubstr("of them faulty and left out: 5, of these not finite: 4."));
  EXPECT_THAT(contents("out.csv"), HasSubstr("\nb,"));
}

TEST_F(ScreenCommand, countsAllFaultsAndTellsAHundred) {
  std::string rows;
  for (int i = 0; i < 250; ++i)
    rows += "x,,G,1,2,three\n";
  put("points.csv", header + quiet + rows);
  const Ran ran = screen("-o out.csv");
  EXPECT_EQ(ran.exit, 2);
  EXPECT_THAT(ran.err, HasSubstr("Rows with a fault: 250 of 258"));
  EXPECT_EQ(std::ranges::count(ran.err, '\n'), 101);
}

TEST_F(ScreenCommand, takesTheWorstAndOtherHeadings) {
  put("points.csv", "node;LC;SXX;SYY [kPa];SXY\n"
                    "1;G;1;0;0\n1;S;1;0;0\n1;W;1;0;0\n1;M;1;0;0\n"
                    "2;G;2;0;0\n2;S;2;0;0\n2;W;2;0;0\n2;M;2;0;0\n"
                    "3;G;0.5;0;0\n3;S;0.5;0;0\n3;W;0.5;0;0\n3;M;0.5;0;0\n");
  const Ran ran = screen("-o out.csv --top 2 --principals --column txy=SXY");
  EXPECT_EQ(ran.exit, 0) << ran.err;
  const std::string out = contents("out.csv");
  EXPECT_THAT(out, HasSubstr("worst_angle,s1,s2,theta1\n2,"));
  EXPECT_EQ(std::ranges::count(out, '\n'), 3);
  expectWrongUse(screen("-o none.csv --column txy"), "does not say which column is which");
  expectWrongUse(screen("-o none.csv --column txy=TAU"), "no column “TAU”");
  expectWrongUse(screen("-o none.csv --top 0"), "no count of points");
}

TEST_F(ScreenCommand, leavesTheTargetAsItWasWhenItFails) {
  std::string rows;
  for (int i = 0; i < 1000; ++i)
    rows += rowsOf("n" + exactNumber(i), "0.1,0,0");
  put("points.csv", header + rows);
  put("out.csv", "as it was");
  const std::string command = "\"$program\" screen points.csv --study $demo --point 'P2 above the post' -o ";
  const Ran full = shell("trap '' XFSZ; ulimit -f 16; " + command + "out.csv");
  EXPECT_EQ(full.exit, 3) << full.err;
  EXPECT_THAT(full.err, HasSubstr("out.csv: This could not be written"));
  EXPECT_EQ(contents("out.csv"), "as it was");
  EXPECT_EQ(files(), 2U);
  EXPECT_EQ(shell(command + "/dev/full").exit, 3);
  EXPECT_EQ(shell(command + "none/out.csv").exit, 3);
}

// The table comes from a pipe that does not end, so that the run is caught in the midst of it.
TEST_F(ScreenCommand, anInterruptLeavesNoHalfFile) {
  put("points.csv", header + quiet);
  put("out.csv", "as it was");
  const Ran ran =
      shell("mkfifo pipe; { cat points.csv; exec sleep 20; } >pipe & feeder=$!\n"
            "\"$program\" screen pipe --study $demo --point 'P2 above the post' -o out.csv & run=$!\n"
            "sleep 0.5; kill -TERM $run; wait $run; ended=$?; kill $feeder; exit $ended");
  EXPECT_EQ(ran.exit, 128 + 15) << ran.err;
  EXPECT_EQ(contents("out.csv"), "as it was");
  EXPECT_EQ(files(), 3U);
}

TEST_F(ScreenCommand, refusesWrongUse) {
  put("points.csv", header + quiet);
  expectWrongUse(run("screen"), "No table of points is given.");
  expectWrongUse(run("screen points.csv -o out.csv"), "No study is given");
  expectWrongUse(run("screen points.csv --study $demo"), "No file is given for the results.");
  expectWrongUse(screen("-o points.csv"), "is read, and cannot be written");
  expectWrongUse(run("screen - --study - -o out.csv"), "either the table or the study");
  expectWrongUse(run("screen none.csv --study $demo -o out.csv"), "none.csv: This cannot be read");
  expectWrongUse(screen("-o out.csv", "nobody"), "nobody");
  expectWrongUse(screen("-o out.csv", "P3 gauge on the side face"), "no check to judge a field by");
  expectWrongUse(screen("-o out.csv --check scarf", "P1 lower edge near midspan"), "judges a plane");
  put("points.csv", header);
  expectWrongUse(screen("-o out.csv"), "The table has a header and no row.");
  put("points.csv", header + "a,,G,1,2,3\n");
  expectWrongUse(screen("-o out.csv"), "nothing of case S");
  EXPECT_EQ(files(), 1U);
}

// A file of that name in the folder opens no window.
TEST_F(ScreenCommand, aFirstWordThatIsACommandIsOne) {
  for (const std::string command : {"screen", "sheet", "compare"}) {
    put(command, "");
    EXPECT_EQ(run(command).exit, 2);
  }
  EXPECT_THAT(run("screen --help").out, HasSubstr("--except-list FILE"));
}

} // namespace
} // namespace planewright
