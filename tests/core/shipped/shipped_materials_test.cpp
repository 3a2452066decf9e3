// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/shipped/shipped_materials.h"

#include "core/record/csv.h"
#include "core/study/edit.h"
#include "core/study/material_edits.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <fstream>
#include <map>
#include <set>

namespace planewright {
namespace {

using Row = std::map<std::string, std::string>;

/// The rows of a collected file by the names of their columns.
std::vector<Row> published(const std::string& name) {
  std::ifstream file(std::string(PLANEWRIGHT_TESTS_DIR) + "/core/shipped/published/" + name);
  std::string line;
  std::getline(file, line);
  const std::vector<std::string> heading = csvFields(line);
  std::vector<Row> rows;
  while (std::getline(file, line)) {
    const std::vector<std::string> fields = csvFields(line);
    EXPECT_EQ(fields.size(), heading.size()) << line;
    for (std::size_t i = 0; i < heading.size(); ++i)
      (i == 0 ? rows.emplace_back() : rows.back())[heading[i]] = fields.at(i);
  }
  EXPECT_FALSE(rows.empty()) << name;
  return rows;
}

const ShippedMaterial& shipped(const std::string& name) {
  const auto found = std::ranges::find(shippedMaterials(), name,
                                       [](const ShippedMaterial& one) { return one.material.name; });
  EXPECT_NE(found, shippedMaterials().end()) << name;
  return found == shippedMaterials().end() ? shippedMaterials().front() : *found;
}

double valueOf(const std::string& text, Spot spot) {
  const Result<Entry> entry = readEntry(text, entryKindOf(newStudy(), spot));
  EXPECT_TRUE(entry) << text;
  return entry ? entry->value : 0;
}

/// Whether a strength is the number of a column, in this unit.
void expectStrength(const std::string& text, const std::string& number, const std::string& unit) {
  EXPECT_DOUBLE_EQ(valueOf(text, Spot::alongTension), valueOf(number + " " + unit, Spot::alongTension))
      << text;
}

bool contains(const std::string& text, const std::string& piece) {
  return text.find(piece) != std::string::npos;
}

TEST(ShippedMaterials, eachCanBeTakenIntoAStudyAndTellsWhereItComesFrom) {
  Study study = newStudy();
  std::set<std::string> names;
  for (const ShippedMaterial& one : shippedMaterials()) {
    const Material& material = one.material;
    EXPECT_TRUE(names.insert(material.name).second) << material.name;
    EXPECT_FALSE(material.source.empty()) << material.name;
    EXPECT_FALSE(material.edition.empty()) << material.name;
    EXPECT_FALSE(material.trust.empty()) << material.name;
    const Result<Study> after = edited(study, editsThatTake(material, material.name));
    ASSERT_TRUE(after) << plain(after.error());
    EXPECT_EQ(after->materials.back(), material);
    study = *after;
  }
  const Problems problems = problemsIn(study);
  EXPECT_TRUE(problems.empty()) << plain(problems.front());
}

TEST(ShippedMaterials, familiesStandTogetherInTheirOrder) {
  EXPECT_TRUE(std::ranges::is_sorted(shippedMaterials(), {}, &ShippedMaterial::family));
}

TEST(ShippedMaterials, timberClassesAreThePublishedOnes) {
  const std::vector<Row> rows = published("timber_classes.csv");
  for (const Row& row : rows) {
    const auto& [family, material] = shipped(row.at("class"));
    SCOPED_TRACE(material.name);
    expectStrength(material.alongBending, row.at("fm_k_MPa"), "MPa");
    expectStrength(material.alongTension, row.at("ft0_k_MPa"), "MPa");
    expectStrength(material.acrossTension, row.at("ft90_k_MPa"), "MPa");
    expectStrength(material.alongCompression, row.at("fc0_k_MPa"), "MPa");
    expectStrength(material.acrossCompression, row.at("fc90_k_MPa"), "MPa");
    expectStrength(material.shear, row.at("fv_k_MPa"), "MPa");
    EXPECT_EQ(material.kind, MaterialKind::timber);
    EXPECT_EQ(material.basis, StrengthBasis::characteristic);
    EXPECT_TRUE(material.source.starts_with(row.at("edition"))) << material.source;
    EXPECT_TRUE(material.source.starts_with("EN 338:" + material.edition) ||
                material.source.starts_with("EN 14080:" + material.edition));
    EXPECT_TRUE(material.trust.starts_with(row.at("basis"))) << material.trust;
    EXPECT_EQ(family == MaterialFamily::glulam, row.at("edition").starts_with("EN 14080"));
  }
  // Laminated veneer lumber has no published class.
  const auto timber = std::ranges::count(shippedMaterials(), MaterialKind::timber,
                                         [](const ShippedMaterial& one) { return one.material.kind; });
  EXPECT_EQ(static_cast<std::size_t>(timber), rows.size() + 1);
}

TEST(ShippedMaterials, laminaeAreThePublishedOnesAndMeansOfTests) {
  for (const Row& row : published("lamina_strengths.csv")) {
    const auto& [family, material] = shipped(row.at("material"));
    SCOPED_TRACE(material.name);
    expectStrength(material.alongTension, row.at("Xt"), row.at("unit"));
    expectStrength(material.alongCompression, row.at("Xc"), row.at("unit"));
    expectStrength(material.acrossTension, row.at("Yt"), row.at("unit"));
    expectStrength(material.acrossCompression, row.at("Yc"), row.at("unit"));
    expectStrength(material.shear, row.at("S"), row.at("unit"));
    EXPECT_EQ(material.basis, StrengthBasis::testMean);
    EXPECT_EQ(material.source, row.at("source"));
    EXPECT_TRUE(material.trust.starts_with("read")) << material.trust;
    EXPECT_EQ(contains(material.source, "second-hand"), contains(material.trust, "second-hand"));
    EXPECT_EQ(family, MaterialFamily::lamina);
  }
}

TEST(ShippedMaterials, filletWeldsAreThePublishedOnes) {
  for (const Row& row : published("weld_strengths.csv")) {
    const auto found = std::ranges::find_if(shippedMaterials(), [&](const ShippedMaterial& one) {
      return one.material.name == "fillet weld, " + row.at("case");
    });
    ASSERT_NE(found, shippedMaterials().end()) << row.at("case");
    const Material& material = found->material;
    const std::string inputs = row.at("inputs");
    const std::string fu = material.fu.substr(0, material.fu.find(' '));
    EXPECT_EQ("fu=" + fu + "; bw=" + material.betaW + "; gM2=" + material.gammaM2, inputs);
    EXPECT_NEAR(valueOf(material.fu, Spot::fu) /
                    (valueOf(material.betaW, Spot::betaW) * valueOf(material.gammaM2, Spot::gammaM2)),
                std::stod(row.at("recomputed")), 1e-6);
    EXPECT_EQ(material.seam, Seam::fillet);
    EXPECT_EQ(material.source, row.at("source"));
    EXPECT_TRUE(contains(material.trust, row.at("basis"))) << material.trust;
    EXPECT_TRUE(contains(material.trust, row.at("note"))) << material.trust;
  }
}

std::string joined(const DurationTexts& texts) {
  return texts.permanent + ";" + texts.longTerm + ";" + texts.medium + ";" + texts.shortTerm + ";" +
         texts.instantaneous;
}

TEST(ShippedMaterials, timberHasThePublishedFactorsOfItsFamilyAndServiceClass) {
  std::map<std::string, Row> rows;
  for (const Row& row : published("ec5_factors.csv"))
    rows[row.at("item")] = row;
  const Row& dry = rows.at("kmod solid/glulam/LVL SC1 and SC2 (perm,long,med,short,inst)");
  const Row& wet = rows.at("kmod SC3");
  const std::map<MaterialFamily, Row> partial = {
      {MaterialFamily::solidTimber, rows.at("gamma_M solid timber")},
      {MaterialFamily::glulam, rows.at("gamma_M glulam")},
      {MaterialFamily::lvl, rows.at("gamma_M LVL")}};
  for (const auto& [family, material] : shippedMaterials()) {
    if (material.kind != MaterialKind::timber)
      continue;
    SCOPED_TRACE(material.name);
    const Row& factor = partial.at(family);
    EXPECT_EQ(material.partialFactor, factor.at("value"));
    EXPECT_TRUE(contains(material.source, factor.at("clause")));
    EXPECT_TRUE(contains(material.trust, factor.at("read_or_memory") == "READ"
                                             ? "partial factor read in"
                                             : "partial factor from memory"));
    EXPECT_TRUE(contains(material.trust, factor.at("note")));
    EXPECT_TRUE(contains(material.source, dry.at("clause")));
    EXPECT_TRUE(contains(material.trust, "duration factors read in " + dry.at("source")));
    EXPECT_EQ(material.serviceClass, "1");
    EXPECT_EQ(joined(material.durations), dry.at("value"));
    EXPECT_EQ(joined(inServiceClass(material, "2").durations), dry.at("value"));
    const Material exposed = inServiceClass(material, "3");
    EXPECT_EQ(joined(exposed.durations), wet.at("value"));
    EXPECT_EQ(exposed.serviceClass, "3");
    EXPECT_EQ(inServiceClass(exposed, "1"), material);
  }
}

TEST(ShippedMaterials, whatIsNoTimberHasNoServiceClass) {
  const Material& weld = shipped("fillet weld, S235").material;
  EXPECT_EQ(inServiceClass(weld, "3"), weld);
  EXPECT_EQ(serviceClasses(), (std::vector<std::string>{"1", "2", "3"}));
}

} // namespace
} // namespace planewright
