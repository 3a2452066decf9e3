// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/app/run_program.h"

#include <gmock/gmock.h>

namespace planewright {
namespace {

using testing::HasSubstr;
using testing::StartsWith;

class FigureCommand : public ProgramTest {};

TEST_F(FigureCommand, writesTheKindThatTheNameEndsWith) {
  for (const auto& [name, head] :
       {std::pair{"a.svg", "<?xml"}, {"a.pdf", "%PDF-"}, {"a.png", "\x89PNG"}, {"B.SVG", "<?xml"}}) {
    const Ran ran = run(std::string("figure \"$demo\" -o ") + name);
    EXPECT_EQ(ran.exit, 0) << name << ": " << ran.err;
    EXPECT_EQ(ran.out + ran.err, "");
    EXPECT_THAT(contents(name), StartsWith(head));
  }
  EXPECT_EQ(files(), 4U);
  EXPECT_THAT(run("figure \"$demo\" -o -").out, StartsWith("<?xml"));
}

TEST_F(FigureCommand, carriesTheStudyUnlessToldNotTo) {
  const std::string readings = run("resolve \"$demo\" --format json").out;
  ASSERT_FALSE(readings.empty());
  for (const std::string name : {"a.svg", "a.pdf", "a.png"}) {
    ASSERT_EQ(run("figure \"$demo\" -o " + name).exit, 0);
    const Ran again = run("resolve " + name + " --format json");
    EXPECT_EQ(again.exit, 1) << "as for the study: " << again.err;
    EXPECT_EQ(again.out, readings);
    EXPECT_EQ(run("resolve - --format json < " + name).out, readings);
    ASSERT_EQ(run("figure \"$demo\" --without-study -o " + name).exit, 0);
    expectWrongUse(run("resolve " + name), "This file carries no study.");
  }
}

TEST_F(FigureCommand, isDrawnAgainFromItsOwnFigure) {
  const std::string options = " --point 'P2 above the post' -o -";
  const std::string first = run("figure \"$demo\"" + options).out;
  put("a.svg", first);
  const std::string alone = run("figure a.svg --without-study -o b.svg && cat b.svg").out;
  ASSERT_NE(alone, "");
  EXPECT_THAT(alone, HasSubstr("P2 above the post")) << "it opens where the figure was";
  EXPECT_EQ(run("figure a.svg -o c.svg").exit, 0);
  const auto study = [](const std::string& svg) { return svg.substr(svg.find("<metadata>")); };
  EXPECT_EQ(study(contents("c.svg")), study(first));
}

TEST_F(FigureCommand, givesTheSameSvgEveryTime) {
  const std::string first = run("figure \"$demo\" -o -").out;
  EXPECT_THAT(first, StartsWith("<?xml"));
  EXPECT_EQ(run("figure \"$demo\" -o -", "env LC_ALL=C.UTF-8 HOME=/nowhere TZ=Asia/Tokyo").out, first);
}

TEST_F(FigureCommand, obeysWidthAndResolution) {
  ASSERT_EQ(run("figure \"$demo\" -o a.pdf --width 90").exit, 0);
  EXPECT_THAT(shell("pdfinfo a.pdf").out, HasSubstr("255.118 x")) << "90 mm in points";
  ASSERT_EQ(run("figure \"$demo\" -o a.svg --width '9 cm'").exit, 0);
  EXPECT_THAT(contents("a.svg"), HasSubstr("width=\"90mm\""));
  ASSERT_EQ(run("figure \"$demo\" -o a.png --dpi 150 --width 100").exit, 0);
  // 100 mm at 150 dpi are 590.55 pixels; 150 dpi are 5906 (0x1712) pixels a metre.
  EXPECT_EQ(contents("a.png").substr(16, 4), std::string("\0\0\x02\x4F", 4));
  EXPECT_THAT(contents("a.png"), HasSubstr(std::string("pHYs\0\0\x17\x12\0\0\x17\x12\x01", 13)));
}

TEST_F(FigureCommand, obeysArrangementAndOrder) {
  const std::string usual = run("figure \"$demo\" -o -").out;
  EXPECT_EQ(run("figure \"$demo\" -o - --arrange by-width --order elements").out, usual);
  EXPECT_EQ(run("figure \"$demo\" -o - --arrange beside").out, usual);
  const std::string below = run("figure \"$demo\" -o - --arrange below --order circle").out;
  EXPECT_THAT(below, StartsWith("<?xml"));
  EXPECT_GT(below.find("Given axes"), below.find("Circle of the state"));
  EXPECT_LT(usual.find("Given axes"), usual.find("Circle of the state"));
}

TEST_F(FigureCommand, drawsInMonoWithoutAnyColour) {
  ASSERT_EQ(run("figure \"$demo\" -o a.svg --mono").exit, 0);
  const std::string svg = contents("a.svg");
  int colours = 0;
  for (auto at = svg.find("\"#"); at != std::string::npos; at = svg.find("\"#", at + 1)) {
    const std::string hex = svg.substr(at + 2, 6);
    EXPECT_TRUE(hex.substr(0, 2) == hex.substr(2, 2) && hex.substr(2, 2) == hex.substr(4, 2)) << hex;
    ++colours;
  }
  EXPECT_GT(colours, 50);
}

TEST_F(FigureCommand, refusesWrongUse) {
  expectWrongUse(run("figure"), "No study is given.");
  expectWrongUse(run("figure \"$demo\""), "No file is given for the figure.");
  expectWrongUse(run("figure \"$demo\" -o a.jpg"), "End the name with .svg, .pdf or .png.");
  expectWrongUse(run("figure \"$demo\" -o a"), "End the name with .svg, .pdf or .png.");
  expectWrongUse(run("figure \"$demo\" -o a.svg -o b.svg"), "The option -o is given twice.");
  expectWrongUse(run("figure \"$demo\" -o a.svg --point none"), "The study has no “none”.");
  expectWrongUse(run("figure \"$demo\" -o a.svg --combination none"), "The study has no “none”.");
  expectWrongUse(run("figure \"$demo\" -o a.svg --width 30"), "--width");
  expectWrongUse(run("figure \"$demo\" -o a.svg --width 3e9"), "--width");
  expectWrongUse(run("figure \"$demo\" -o a.svg --width '90 MPa'"), "--width");
  expectWrongUse(run("figure \"$demo\" -o a.svg --text 4"), "--text");
  expectWrongUse(run("figure \"$demo\" -o a.svg --arrange side"), "beside");
  expectWrongUse(run("figure \"$demo\" -o a.svg --arrange beside --width 90"), "Take 130 mm or more");
  expectWrongUse(run("figure \"$demo\" -o a.svg --order circle,round"), "--order: “round” names no part");
  expectWrongUse(run("figure \"$demo\" -o a.svg --mono=yes"), "takes no value");
  expectWrongUse(run("figure \"$demo\" -o a.svg --dpi 300"), "Only a PNG has a resolution");
  expectWrongUse(run("figure \"$demo\" -o a.png --dpi 3.5"), "“3.5” is not a whole number.");
  expectWrongUse(run("figure \"$demo\" -o a.png --dpi 10"), "--dpi");
  expectWrongUse(run("figure \"$demo\" -o a.png --dpi 99999999999"), "--dpi");
  expectWrongUse(run("figure \"$demo\" -o a.png --dpi 2400 --width 400"), "too many pixels");
  expectWrongUse(run("figure none -o a.svg"), "there is no such file");
  EXPECT_EQ(files(), 0U);
}

TEST_F(FigureCommand, writesAFigureForEachPointIntoAFolder) {
  for (const std::string format : {"svg", "pdf", "png"}) {
    const Ran ran = run("figure \"$demo\" --folder out/" + format + " --width 90 --format " + format);
    EXPECT_EQ(ran.exit, 0) << ran.err;
    EXPECT_EQ(ran.err, "");
    EXPECT_THAT(ran.out, HasSubstr("out/" + format + "/boat-shed-beam-P2-above-the-post-"));
    EXPECT_EQ(shell("ls out/" + format + "/*." + format + " | wc -l").out, "4\n") << "points of the demo";
    EXPECT_EQ(shell("ls out/" + format + "/*").out, shell("sort <<'.'\n" + ran.out + ".").out);
  }
  const std::string name = "out/svg/boat-shed-beam-P2-above-the-post-1.35-G+1.5-S.svg";
  const std::string alone = " --width 90 --point 'P2 above the post' --combination '1.35 G + 1.5 S' -o -";
  EXPECT_EQ(contents(name), run("figure \"$demo\"" + alone).out) << "the same as one alone";
}

TEST_F(FigureCommand, writesOnlyNamedPointsInANamedCombination) {
  const Ran ran =
      run("figure \"$demo\" --folder . --point 'P2 above the post' --combination '1.35 G' --without-study");
  EXPECT_EQ(ran.out, "./boat-shed-beam-P2-above-the-post-1.35-G.svg\n") << ran.err;
  EXPECT_EQ(files(), 1U);
  expectWrongUse(run("resolve boat-shed-beam-P2-above-the-post-1.35-G.svg"), "This file carries no study.");
}

TEST_F(FigureCommand, replacesFilesOfAFolderOnlyWhenToldTo) {
  const std::string words = "figure \"$demo\" --folder . --point 'P2 above the post' --combination '1.35 G'";
  const std::string name = "boat-shed-beam-P2-above-the-post-1.35-G.svg";
  put(name, "mine");
  expectWrongUse(run(words), "has 1 of the 1 files already");
  EXPECT_EQ(contents(name), "mine");
  EXPECT_EQ(run(words + " --replace").exit, 0);
  EXPECT_THAT(contents(name), StartsWith("<?xml"));
}

TEST_F(FigureCommand, writesNothingIntoAFolderForWrongUse) {
  expectWrongUse(run("figure \"$demo\" --folder out -o a.svg"), "Leave out -o or --folder.");
  expectWrongUse(run("figure \"$demo\" --folder out --format gif"), "Take svg, pdf or png.");
  expectWrongUse(run("figure \"$demo\" --folder out --point none"), "The study has no “none”.");
  expectWrongUse(run("figure \"$demo\" --folder out --width 90 --arrange beside"), "P2 above the post: ");
  expectWrongUse(run("figure \"$demo\" -o a.svg --replace"), "belongs to --folder");
  expectWrongUse(run("figure \"$demo\" -o a.svg --point a --point b"), "Write --folder FOLDER for several.");
  EXPECT_EQ(files(), 0U);
  put("taken", "a file");
  const Ran ran = run("figure \"$demo\" --folder taken");
  EXPECT_EQ(ran.exit, 3);
  EXPECT_THAT(ran.err, HasSubstr("The folder “taken” cannot be made"));
}

TEST_F(FigureCommand, drawsTheNamedPointAndCombination) {
  put("s.planewright", R"({"format":"planewright-study","version":1,
 "cases":[{"id":"G"},{"id":"S"}],
 "points":[{"name":"A & <B>","stress":{"G":{"sx":"8 MPa"},"S":{"sx":"3 MPa"}}},
           {"name":"second","stress":{"G":{"sx":"5 MPa"},"S":{"sx":"4 MPa"}}}]})");
  const Ran first = run("figure s.planewright -o -");
  ASSERT_EQ(first.exit, 0) << first.err;
  EXPECT_THAT(first.out, HasSubstr("A &amp; &lt;B&gt;"));
  const Ran second = run("figure s.planewright -o - --point second --combination S");
  ASSERT_EQ(second.exit, 0) << second.err;
  EXPECT_THAT(second.out, HasSubstr("second"));
  EXPECT_THAT(second.out, HasSubstr("4.000"));
  EXPECT_THAT(second.out, testing::Not(HasSubstr("A &amp;")));
}

TEST_F(FigureCommand, takesACommandsNameForAFileBehindAPath) {
  ASSERT_EQ(shell("cp \"$demo\" figure").exit, 0);
  EXPECT_EQ(run("figure ./figure -o a.svg").exit, 0);
  EXPECT_EQ(run("resolve figure").exit, 1) << "a check of the worked example exceeds";
}

} // namespace
} // namespace planewright
