// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field_reader.h"

#include "tests/support/field_reading.h"

#include <gmock/gmock.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

using testing::HasSubstr;

std::string problemsOf(const Results<FieldReading>& reading) {
  return reading ? "sound" : written(reading);
}

TEST(FieldReader, readsARowForEachCase) {
  const auto reading = readingOf(readingStudy(), "point,case,sx,sy,txy\n"
                                                 "1,G,1,2,3\n1,S,4,5,6\n2,G,-1,0,1e-3\n2,S,+.5,0.0,-7\n");
  ASSERT_TRUE(reading) << problemsOf(reading);
  EXPECT_TRUE(reading->isSound()) << written(reading);
  EXPECT_EQ(reading->field.size(), 2U);
  EXPECT_EQ(reading->field.nameOf(1), "2");
  EXPECT_EQ(reading->field.stressOf(0, 0), (PlaneStress{1, 2, 3}));
  EXPECT_EQ(reading->field.stressOf(1, 0), (PlaneStress{4, 5, 6}));
  EXPECT_EQ(reading->field.stressOf(1, 1), (PlaneStress{.5, 0, -7}));
}

TEST(FieldReader, rowsOfAPointMayBeScatteredAndCasesGoByTheirNames) {
  const auto reading = readingOf(
      readingStudy(), "case;point;sx;sy;txy\nPermanent;a;1;0;0\nG;b;2;0;0\nSnow;b;3;0;0\nS;a;4;0;0\n");
  ASSERT_TRUE(reading) << problemsOf(reading);
  EXPECT_TRUE(reading->isSound()) << written(reading);
  EXPECT_EQ(reading->field.stressOf(1, 0).sx, 4);
  EXPECT_EQ(reading->field.stressOf(1, 1).sx, 3);
}

TEST(FieldReader, readsATripleForEachCaseWithUnitsAndAllElse) {
  const auto reading =
      readingOf(readingStudy(),
                "point,layer,axes,line [rad],region,x [m],y,sx G [kPa],sy G,txy G,G mises,S sx,S_sy,txy S\n"
                "\"a, 1\",top,10,,edge,1,2,1000,2,3,99,4,5,6\n"
                "\"a, 1\",bottom,,0.5,,3,4,-1000,-2,-3,99,-4,-5,-6\n");
  ASSERT_TRUE(reading) << problemsOf(reading);
  EXPECT_TRUE(reading->isSound()) << written(reading);
  const Field& field = reading->field;
  EXPECT_EQ(field.nameOf(1), "a, 1");
  EXPECT_EQ(field.layerOf(1), Layer::bottom);
  EXPECT_EQ(field.axesOf(0), 10);
  EXPECT_TRUE(std::isnan(field.lineOf(0)));
  EXPECT_NEAR(field.lineOf(1), 28.647889756541161, 1e-12);
  EXPECT_EQ(field.regionOf(0), "edge");
  EXPECT_EQ(field.xOf(0), 1000);
  EXPECT_EQ(field.yOf(0), 2);
  EXPECT_EQ(field.stressOf(0, 0), (PlaneStress{1, 2, 3}));
  EXPECT_EQ(field.stressOf(1, 1), (PlaneStress{-4, -5, -6}));
  EXPECT_EQ(reading->columns.columns[10].role, FieldRole::unread);
}

TEST(FieldReader, headingsAreMapped) {
  const auto reading =
      readingOf(readingStudy(), "Label,S11 [psi],S22,S12,LC\nn,1,0,0,G\nn,1,0,0,S\n",
                {{"point", "Label"}, {"sx", "S11"}, {"sy [GPa]", "S22"}, {"txy", "S12"}, {"case", "LC"}});
  ASSERT_TRUE(reading) << problemsOf(reading);
  EXPECT_NEAR(reading->field.stressOf(0, 0).sx, 0.006894757293168361, 1e-17);
  EXPECT_THAT(problemsOf(readingOf(readingStudy(), "point,case,sx,sy,txy\n", {{"sx", "S11"}})),
              HasSubstr("no column “S11”"));
  EXPECT_THAT(problemsOf(readingOf(readingStudy(), "point,case,sx,sy,txy\n", {{"stress", "sx"}})),
              HasSubstr("No column can be “stress”"));
  const auto wide =
      readingOf(readingStudy(), "point,a,b,c,d,e,f\nn,1,2,3,4,5,6\n",
                {{"sx G", "a"}, {"sy G", "b"}, {"txy G", "c"}, {"sx S", "d"}, {"sy S", "e"}, {"txy S", "f"}});
  ASSERT_TRUE(wide) << problemsOf(wide);
  EXPECT_EQ(wide->field.stressOf(1, 0), (PlaneStress{4, 5, 6}));
}

TEST(FieldReader, aMissingCaseIsNeverZero) {
  const auto reading = readingOf(readingStudy(), "point,case,sx,sy,txy\n1,G,1,2,3\n2,G,1,2,3\n2,S,1,2,3\n");
  ASSERT_TRUE(reading);
  EXPECT_EQ(reading->incompletePoints, 1U);
  EXPECT_THAT(plain(reading->faults[0]), HasSubstr("line 2: The point “1” lacks case S."));
  EXPECT_THAT(problemsOf(readingOf(readingStudy(), "point,case,sx,sy,txy\n1,G,1,2,3\n")),
              HasSubstr("nothing of case S"));
  const Study study = readingStudy();
  FieldReader idle(study, {true, false});
  ASSERT_TRUE(idle.take("point,case,sx,sy,txy\n1,G,1,2,3\n"));
  EXPECT_TRUE(idle.finish()->isSound());
}

TEST(FieldReader, aSecondRowMakesThePointIncomplete) {
  const auto reading = readingOf(readingStudy(), "point,case,sx,sy,txy\n1,G,1,2,3\n1,S,1,2,3\n1,G,9,9,9\n");
  EXPECT_EQ(reading->faultyRows, 1U);
  EXPECT_EQ(reading->field.standingOf(0), PointStanding::incomplete);
  EXPECT_EQ(reading->field.stressOf(0, 0).sx, 1);
}

TEST(FieldReader, countsAllFaultsAndTellsTheFirstHundred) {
  std::string table = "point,case,sx,sy,txy\n1,G,1,2,3\n1,S,1,2,3\n";
  for (int i = 0; i < 250; ++i)
    table += i % 2 ? "2,G,nan,0,0\n" : "2,G,x,0,0\n";
  const auto reading = readingOf(readingStudy(), table);
  EXPECT_EQ(reading->rows, 252U);
  EXPECT_EQ(reading->faultyRows, 250U);
  EXPECT_EQ(reading->notFinite, 125U);
  EXPECT_EQ(reading->faults.size(), 100U);
  EXPECT_EQ(reading->faults[1].line, 5);
  EXPECT_EQ(reading->faults[1].column, 3);
  EXPECT_EQ(reading->faults[1].quoted, "nan");
}

// However the bytes are cut into pieces.
RC_GTEST_PROP(FieldReader, doesNotDependOnThePieces, ()) {
  const auto table =
      *rc::gen::map(rc::gen::container<std::vector<std::string>>(rc::gen::element<std::string>(
                        "1", "2", "G", "S", ",", ",", ",", "\n", "\n", "\r\n", "\"", " ", "nan", "-3.5",
                        "1e999", "top", "1,G,1,2,3\n", "1,S,1,2,3\r\n", "2,G,0,0,0\n", "\xFF")),
                    [](const std::vector<std::string>& parts) {
                      std::string text = "\xEF\xBB\xBFpoint,case,sx,sy,txy\n";
                      for (const std::string& part : parts)
                        text += part;
                      return text;
                    });
  const std::string whole = written(readingOf(readingStudy(), table));
  for (const std::size_t piece : {1U, 2U, 3U, 7U, 64U})
    RC_ASSERT(written(readingOf(readingStudy(), table, {}, piece)) == whole);
}

// What is read is what was written, to the last bit.
RC_GTEST_PROP(FieldReader, numbersComeBackAsTheyWere, ()) {
  const auto value = *rc::gen::suchThat<double>([](double one) { return std::abs(one) < 1e100; });
  const std::string text = shortestNumber(value);
  const auto reading =
      readingOf(readingStudy(), "point,case,sx,sy,txy\n1,G," + text + ",0,0\n1,S,0,0," + text);
  RC_ASSERT(reading.has_value());
  RC_ASSERT(reading->field.stressOf(0, 0).sx == value + 0.0);
  RC_ASSERT(reading->field.stressOf(1, 0).txy == value + 0.0);
}

} // namespace
} // namespace planewright
