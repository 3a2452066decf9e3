// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/materials_file.h"

#include "core/record/study_file.h"

#include <gtest/gtest.h>

#include "tests/support/study_gen.h"

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

RC_GTEST_PROP(MaterialsFile, readsBackWhatItWrote, ()) {
  const std::vector<Material> materials = (*anyStudy()).materials;
  const std::string bytes = writeMaterials(materials);
  const Results<std::vector<Material>> again = readMaterials(bytes);
  RC_LOG() << (again ? "" : plain(again.error().front()));
  RC_ASSERT(again);
  RC_ASSERT(*again == materials);
  RC_ASSERT(writeMaterials(*again) == bytes);
}

RC_GTEST_PROP(MaterialsFile, itsListIsThatOfAStudy, ()) {
  const Study study = *anyStudy();
  const std::string bytes = writeMaterials(study.materials);
  const std::size_t from = bytes.find("  \"materials\":");
  RC_ASSERT(from != std::string::npos);
  const std::string list = bytes.substr(from, bytes.rfind('}') - 1 - from);
  RC_ASSERT(writeStudy(study).find(list) != std::string::npos);
}

Problem firstIn(const std::string& bytes) {
  const Results<std::vector<Material>> materials = readMaterials(bytes);
  EXPECT_FALSE(materials);
  return materials ? Problem{} : materials.error().front();
}

TEST(MaterialsFile, anotherFormatIsRefused) {
  const Problem problem = firstIn(writeStudy(newStudy()));
  EXPECT_EQ(problem.place, "format");
  EXPECT_EQ(plain(problem.what), "This is not a file of materials of Planewright.");
  EXPECT_EQ(problem.line, 2);
  EXPECT_FALSE(readStudy(writeMaterials({})));
}

TEST(MaterialsFile, aNewerVersionIsRefused) {
  const Problem problem = firstIn(R"({"format": "planewright-materials", "version": 2, "colours": []})");
  EXPECT_EQ(problem.place, "version");
  EXPECT_EQ(problem.quoted, "2");
}

TEST(MaterialsFile, problemsStandAtTheirMaterial) {
  const std::string head = R"({"format": "planewright-materials", "version": 1,
 "materials": [{"name": "ash",
)";
  const Problem unit = firstIn(head + R"("shear": "4 kN"}]})");
  EXPECT_EQ(unit.place, "materials/ash/shear");
  EXPECT_EQ(unit.line, 3);
  EXPECT_EQ(plain(firstIn(head + R"("shear": "4"}]})").mend), "Write “4 MPa”.");
  EXPECT_EQ(firstIn(head + R"("shear": "0 MPa"}]})").place, "materials/ash/shear");
  EXPECT_EQ(firstIn(head + R"("fu": "360 MPa"}]})").place, "materials/ash/fu");
  EXPECT_EQ(firstIn(head + R"("colour": "grey"}]})").place, "materials/ash/colour");
  EXPECT_EQ(firstIn(head + R"("edition": ""}, {"name": "ash"}]})").quoted, "ash");
}

TEST(MaterialsFile, theListMayBeMissing) {
  const Results<std::vector<Material>> materials =
      readMaterials(R"({"format": "planewright-materials", "version": 1})");
  ASSERT_TRUE(materials);
  EXPECT_TRUE(materials->empty());
}

} // namespace
} // namespace planewright
