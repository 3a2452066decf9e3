// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/file_bytes.h"
#include "ui/files/own_materials.h"

#include <QTemporaryDir>

#include <gtest/gtest.h>

#include <filesystem>

namespace planewright {
namespace {

class OwnMaterialsTest : public testing::Test {
protected:
  std::string path() const {
    return m_folder.filePath(QStringLiteral("new/folder/materials.json")).toStdString();
  }
  static Material ash() {
    Material material;
    material.name = "ash";
    material.shear = "9 MPa";
    material.trust = "measured here";
    return material;
  }

private:
  QTemporaryDir m_folder;
};

TEST_F(OwnMaterialsTest, aFileThatIsNotThereIsAnEmptyLibrary) {
  const OwnMaterials own(path());
  EXPECT_TRUE(own.all().empty());
  EXPECT_TRUE(own.problems().empty());
  EXPECT_FALSE(std::filesystem::exists(path()));
}

TEST_F(OwnMaterialsTest, whatIsKeptStandsThereForTheNextWindow) {
  OwnMaterials own(path());
  EXPECT_FALSE(own.keep(ash()));
  EXPECT_EQ(OwnMaterials(path()).all(), std::vector<Material>{ash()});
  EXPECT_FALSE(own.drop("ash"));
  EXPECT_TRUE(OwnMaterials(path()).all().empty());
}

TEST_F(OwnMaterialsTest, twoWindowsLoseNothingOfEachOther) {
  OwnMaterials one(path());
  OwnMaterials other(path());
  EXPECT_FALSE(one.keep(ash()));
  Material oak = ash();
  oak.name = "oak";
  EXPECT_FALSE(other.keep(oak));
  EXPECT_EQ(other.all(), (std::vector<Material>{ash(), oak}));
}

TEST_F(OwnMaterialsTest, aNameThatIsTakenIsNotOverwritten) {
  OwnMaterials own(path());
  ASSERT_FALSE(own.keep(ash()));
  Material other = ash();
  other.shear = "1 MPa";
  const std::optional<Problem> problem = own.keep(other);
  ASSERT_TRUE(problem);
  EXPECT_EQ(problem->quoted, "ash");
  EXPECT_EQ(OwnMaterials(path()).all().front().shear, "9 MPa");
}

TEST_F(OwnMaterialsTest, aDamagedFileIsToldAndLeftAsItIs) {
  ASSERT_FALSE(OwnMaterials(path()).keep(ash()));
  const std::string damaged = bytesOf(path(), 1 << 20).value().substr(0, 60);
  ASSERT_TRUE(writeAside(path(), damaged));
  OwnMaterials own(path());
  ASSERT_FALSE(own.problems().empty());
  EXPECT_GT(own.problems().front().line, 0);
  EXPECT_TRUE(own.keep(ash()));
  EXPECT_TRUE(own.drop("ash"));
  EXPECT_EQ(bytesOf(path(), 1 << 20).value(), damaged);
}

TEST_F(OwnMaterialsTest, whatWouldNotBeReadAgainIsNotWritten) {
  OwnMaterials own(path());
  Material material = ash();
  material.shear = "9 kN";
  EXPECT_TRUE(own.keep(material));
  EXPECT_FALSE(std::filesystem::exists(path()));
}

} // namespace
} // namespace planewright
