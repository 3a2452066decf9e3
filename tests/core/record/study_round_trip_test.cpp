// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/edit.h"

#include <gtest/gtest.h>

#include "tests/support/study_gen.h"

#include <rapidcheck/gtest.h>

#include <filesystem>
#include <fstream>

namespace planewright {
namespace {

RC_GTEST_PROP(StudyFile, readsBackWhatItWrote, ()) {
  const Study study = *anyStudy();
  const Problems faults = problemsIn(study);
  RC_LOG() << (faults.empty() ? "" : plain(faults.front()));
  RC_ASSERT(faults.empty());
  const std::string bytes = writeStudy(study);
  const Results<Study> again = readStudy(bytes);
  RC_LOG() << (again ? "" : plain(again.error().front()));
  RC_ASSERT(again);
  RC_ASSERT(*again == study);
  RC_ASSERT(writeStudy(*again) == bytes);
}

RC_GTEST_PROP(StudyFile, writesOneValueALine, ()) {
  const std::string bytes = writeStudy(*anyStudy());
  RC_ASSERT(bytes.ends_with("}\n"));
  std::size_t start = 0;
  for (std::size_t end; (end = bytes.find('\n', start)) != std::string::npos; start = end + 1) {
    const std::string_view line = std::string_view(bytes).substr(start, end - start);
    RC_ASSERT(!line.empty());
    RC_ASSERT(line.back() != ' ');
  }
}

TEST(StudyFile, aNewStudyIsReadFromItsHeadAlone) {
  const Results<Study> study = readStudy(R"({"format": "planewright-study", "version": 1})");
  ASSERT_TRUE(study);
  EXPECT_EQ(*study, newStudy());
}

TEST(StudyFile, keysMayStandInAnyOrderAndWhatIsNaturalMayBeLeftOut) {
  const Results<Study> study = readStudy(R"({"points": [{"stress": {"S": {"txy": "3 MPa"}}, "name": "A"}],
    "cases": [{"id": "S", "nature": "variable"}], "version": 1, "format": "planewright-study"})");
  ASSERT_TRUE(study);
  ASSERT_EQ(study->points.size(), 1u);
  const Point& point = study->points.front();
  EXPECT_EQ(point.stress, (std::vector<CaseStress>{{"S", "0 MPa", "0 MPa", "3 MPa", "0 MPa"}}));
  EXPECT_TRUE(point.lines.empty());
  EXPECT_EQ(study->cases.front().nature, Nature::variable);
  EXPECT_EQ(study->units, Units{});
}

TEST(StudyFile, aByteOrderMarkAndOtherBlanksAreRead) {
  const std::string bytes = "\xEF\xBB\xBF\r\n" + writeStudy(newStudy()) + "\r\n\t ";
  const Results<Study> study = readStudy(bytes);
  ASSERT_TRUE(study);
  EXPECT_EQ(*study, newStudy());
}

TEST(StudyFile, theShippedStudiesReadAndStandAsTheProgramWritesThem) {
  const std::filesystem::path folder = std::filesystem::path(PLANEWRIGHT_TESTS_DIR) / "../resources/demo";
  int count = 0;
  for (const auto& entry : std::filesystem::directory_iterator(folder)) {
    if (entry.path().extension() != ".planewright")
      continue;
    std::ifstream file(entry.path(), std::ios::binary);
    const std::string bytes{std::istreambuf_iterator<char>(file), {}};
    const Results<Study> study = readStudy(bytes);
    ASSERT_TRUE(study) << entry.path() << ": " << plain(study.error().front());
    EXPECT_EQ(writeStudy(*study), bytes) << entry.path();
    ++count;
  }
  EXPECT_GE(count, 1);
}

} // namespace
} // namespace planewright
