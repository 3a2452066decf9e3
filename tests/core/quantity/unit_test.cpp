// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/unit.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <set>

namespace planewright {
namespace {

double factorOf(std::string_view name) {
  return findUnit(name)->toBase(1);
}

// Inch and pound: international yard and pound agreement 1959; g_n: 3rd CGPM 1901. The long double products
// are the outside values; the table holds quotients of whole numbers.
TEST(Unit, spellingsOfTablesAreWrittenOut) {
  EXPECT_EQ(spelledUnit("kNm"), "kN*m");
  EXPECT_EQ(spelledUnit("Nmm"), "N*mm");
  EXPECT_EQ(spelledUnit("kipft"), "kip*ft");
  EXPECT_EQ(spelledUnit("N/mm2"), "N/mm^2");
  EXPECT_EQ(spelledUnit("kN/m2"), "kN/m^2");
  EXPECT_EQ(spelledUnit("mm4"), "mm^4");
  for (const char* other : {"kN*m", "N/mm^2", "MPa", "", "kNs", "m2m", "mm5", "/", "1/kNm", "kg"})
    EXPECT_EQ(spelledUnit(other), "") << other;
}

TEST(Unit, poundsAndInchesFollowTheAgreementOf1959) {
  const long double lbf = 0.45359237L * 9.80665L;
  EXPECT_EQ(factorOf("lbf"), static_cast<double>(lbf));
  EXPECT_EQ(factorOf("kip"), static_cast<double>(1000 * lbf));
  EXPECT_EQ(factorOf("psi"), static_cast<double>(lbf / (25.4L * 25.4L)));
  EXPECT_EQ(factorOf("ksi"), static_cast<double>(1000 * lbf / (25.4L * 25.4L)));
  EXPECT_EQ(factorOf("psf"), static_cast<double>(lbf / (304.8L * 304.8L)));
  EXPECT_EQ(factorOf("kgf"), 9.80665);
  EXPECT_EQ(factorOf("tf"), 9806.65);
  EXPECT_EQ(factorOf("in"), 25.4);
  EXPECT_EQ(factorOf("ft"), 304.8);
}

TEST(Unit, decimalUnitsAreExact) {
  EXPECT_EQ(factorOf("Pa"), 1e-6);
  EXPECT_EQ(factorOf("kPa"), 1e-3);
  EXPECT_EQ(factorOf("MPa"), 1);
  EXPECT_EQ(factorOf("GPa"), 1e3);
  EXPECT_EQ(factorOf("bar"), 0.1);
  EXPECT_EQ(factorOf("um"), 1e-3);
  EXPECT_EQ(factorOf("ustrain"), 1e-6);
  EXPECT_EQ(factorOf("%"), 0.01);
  EXPECT_EQ(factorOf("deg"), 1);
  EXPECT_EQ(factorOf("rad"), 57.29577951308232);
}

TEST(Unit, namesAreUniqueAndEveryFactorHasItsSource) {
  std::set<std::string> names;
  for (const UnitRow& row : unitTable()) {
    EXPECT_TRUE(names.insert(row.unit.name).second) << row.unit.name;
    EXPECT_FALSE(std::string(row.source).empty()) << row.unit.name;
  }
  EXPECT_EQ(names.size(), 25u);
}

TEST(Unit, goesToTheBaseAndBackOverTheWholeRange) {
  for (const UnitRow& row : unitTable())
    for (const double value : {1.0, 0.3, 1e-290, 1e290, 1e301}) {
      const double base = row.unit.toBase(value);
      EXPECT_NEAR(row.unit.fromBase(base) / value, 1, 5e-16) << row.unit.name << " " << value;
    }
  EXPECT_TRUE(std::isfinite(findUnit("psi")->toBase(std::numeric_limits<double>::max())));
}

TEST(Unit, readsTheUnitsOfAStudy) {
  const Unit moment = readUnit(" kN*m ", dimension::moment).value();
  EXPECT_EQ(moment.name, "kN*m");
  EXPECT_EQ(moment.toBase(2), 2e6);
  EXPECT_EQ(readUnit("N/mm^2", dimension::stress)->toBase(3), 3);
  EXPECT_EQ(readUnit("kN/m²", dimension::stress)->toBase(1), 1e-3);
  EXPECT_EQ(readUnit("kN·m", dimension::moment)->name, "kN·m");
}

TEST(Unit, refusesWhatIsNoUnitOfItsKind) {
  EXPECT_EQ(
      plain(readUnit("kN", dimension::stress).error()),
      "column 1: “kN” is the unit of a force; the unit of a stress is needed. Type the unit as in 8 MPa.");
  EXPECT_EQ(plain(readUnit("Mpa", dimension::stress).error()),
            "column 1: There is no unit “Mpa”. Did you mean MPa?");
  EXPECT_EQ(readUnit("", dimension::stress).error().column, 1);
  EXPECT_EQ(readUnit("MPa 2", dimension::stress).error().quoted, "2");
  EXPECT_EQ(readUnit("2 MPa", dimension::stress).error().quoted, "2");
  EXPECT_EQ(readUnit("mm^x", dimension::length).error().quoted, "^");
  EXPECT_FALSE(readUnit("\xFF", dimension::length));
}

TEST(Unit, proposesTheNearestName) {
  const std::pair<const char*, const char*> meant[] = {
      {"mpa", "MPa"},         {"Mpa", "MPa"}, {"KN", "kN"},   {"kips", "kip"},    {"lb", "lbf"},
      {"kg", "kgf"},          {"inch", "in"}, {"PSI", "psi"}, {"degrees", "deg"}, {"µm", "um"},
      {"μstrain", "ustrain"}, {"Bar", "bar"}, {"feet", "ft"}};
  for (const auto& [typed, name] : meant)
    EXPECT_EQ(nearestUnitName(typed), name) << typed;
}

TEST(Dimension, haveNamesOfTheTrade) {
  EXPECT_EQ(plain(nameOf(dimension::none)), "a plain number");
  EXPECT_EQ(plain(nameOf(dimension::stress)), "a stress");
  EXPECT_EQ(plain(nameOf({2, 1, 0})), "force^2 * length");
  EXPECT_EQ(plain(nameOf({0, 0, -1})), "angle^-1");
}

} // namespace
} // namespace planewright
