// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/unsaved_study.h"

#include "core/record/study_file.h"
#include "core/study/edit.h"

#include <gtest/gtest.h>

#include "tests/support/study_gen.h"

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

RC_GTEST_PROP(UnsavedStudy, readsBackWhatItWrote, ()) {
  UnsavedStudy unsaved;
  unsaved.study = *anyStudy();
  unsaved.saved =
      *rc::gen::oneOf(rc::gen::just(std::string()),
                      rc::gen::map(anyStudy(), [](const Study& study) { return writeStudy(study); }),
                      rc::gen::arbitrary<std::string>());
  unsaved.file = "/tmp/\xC3\xBC \"beam\".planewright";
  unsaved.written = "2026-12-03T07:00:00Z";
  const Results<UnsavedStudy> again = readUnsaved(writeUnsaved(unsaved));
  RC_LOG() << (again ? "" : plain(again.error().front()));
  RC_ASSERT(again);
  RC_ASSERT(*again == unsaved);
}

TEST(UnsavedStudy, whatWasSavedBeforeIsThatOrTheNewStudy) {
  UnsavedStudy unsaved;
  EXPECT_EQ(studyBefore(unsaved), newStudy());
  Study saved = newStudy();
  saved.title.project = "Boat shed";
  unsaved.saved = "\xEF\xBB\xBF" + writeStudy(saved);
  EXPECT_EQ(studyBefore(unsaved), saved);
  unsaved.saved = "{";
  EXPECT_EQ(studyBefore(unsaved), newStudy());
}

TEST(UnsavedStudy, aPathThatNoTextCanHoldIsLeftOut) {
  UnsavedStudy unsaved;
  unsaved.study = newStudy();
  unsaved.file = "/tmp/\x01.planewright";
  EXPECT_EQ(readUnsaved(writeUnsaved(unsaved)).value().file, "");
}

TEST(UnsavedStudy, savedBytesThatMakeItTooLargeAreLeftOut) {
  UnsavedStudy unsaved;
  unsaved.study = newStudy();
  unsaved.saved = std::string(greatestStudyFile, ' ');
  const std::string bytes = writeUnsaved(unsaved);
  EXPECT_LT(bytes.size(), greatestStudyFile);
  EXPECT_EQ(readUnsaved(bytes).value().study, newStudy());
}

std::string firstIn(const std::string& bytes) {
  const Results<UnsavedStudy> unsaved = readUnsaved(bytes);
  return unsaved ? "" : plain(unsaved.error().front().what);
}

TEST(UnsavedStudy, anythingElseIsRefused) {
  UnsavedStudy unsaved;
  unsaved.study = newStudy();
  const std::string bytes = writeUnsaved(unsaved);
  EXPECT_EQ(firstIn(writeStudy(newStudy())), "This is not an unsaved study of Planewright.");
  const auto with = [&](const std::string& from, const std::string& to) {
    std::string other = bytes;
    return other.replace(other.find(from), from.size(), to);
  };
  EXPECT_NE(firstIn(with("\"saved\": \"\"", "\"saved\": \"*\"")), "");
  EXPECT_NE(firstIn(with("\"written\"", "\"writ\"")), "");
  EXPECT_NE(firstIn(with("planewright-study", "planewright-studies")), "");
  for (std::size_t size = 0; size + 1 < bytes.size(); size += 7)
    EXPECT_NE(firstIn(bytes.substr(0, size)), "") << size;
}

} // namespace
} // namespace planewright
