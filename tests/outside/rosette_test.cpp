// SPDX-License-Identifier: GPL-3.0-or-later
// Rosettes and strains printed in textbooks; each row of resources/checks/strain_rosettes.csv names its
// source, place and basis.
#include "core/record/csv.h"
#include "core/source/measured.h"
#include "core/stress/circle.h"

#include <gtest/gtest.h>

#include <charconv>
#include <cmath>
#include <fstream>
#include <map>

namespace planewright {
namespace {

/// The numbers of "name=1" or "name=[1, 2, 3]" among pieces between semicolons.
std::vector<double> numbersOf(const std::string& pieces, const std::string& name) {
  std::vector<double> numbers;
  std::size_t at = pieces.starts_with(name + "=") ? 0 : pieces.find(" " + name + "=");
  if (at == std::string::npos)
    return numbers;
  at = pieces.find('=', at) + 1;
  while (at < pieces.size() && pieces[at] != ';') {
    double value = 0;
    const auto [end, error] = std::from_chars(pieces.data() + at, pieces.data() + pieces.size(), value);
    if (error == std::errc()) {
      numbers.push_back(value);
      at = static_cast<std::size_t>(end - pieces.data());
    } else {
      ++at;
    }
    if (pieces.compare(at, 1, "]") == 0)
      break;
  }
  return numbers;
}

constexpr double micro = 1e-6;

/// Every quantity that a row can ask for, in the row's unit.
std::map<std::string, double> quantitiesOf(const std::string& inputs) {
  std::map<std::string, double> found;
  PlaneStrain strain;
  const std::vector<double> angles = numbersOf(inputs, "angles");
  const std::vector<double> readings = numbersOf(inputs, "e");
  const double scale = angles.empty() && !numbersOf(inputs, "e1").empty() ? 1 : micro;
  if (angles.size() == 3) {
    Rosette rosette;
    for (std::size_t i = 0; i < 3; ++i)
      rosette[i] = {Angle::fromDegrees(angles[i]), readings.at(i) * micro};
    strain = solved(rosette).value().strain;
  } else if (scale == 1) {
    strain = {numbersOf(inputs, "e1").at(0), numbersOf(inputs, "e2").at(0), 0};
  } else {
    strain = {numbersOf(inputs, "ex").at(0) * micro, numbersOf(inputs, "ey").at(0) * micro,
              numbersOf(inputs, "gxy").at(0) * micro};
  }
  const PrincipalStrains principal = principalOf(strain);
  found = {{"ex", strain.ex / micro},
           {"ey", strain.ey / micro},
           {"gxy", strain.gxy / micro},
           {"e1", principal.e1 / micro},
           {"e2", principal.e2 / micro}};
  if (principal.direction) {
    found["thp1"] = principal.direction->degrees();
    found["thp2"] = folded(*principal.direction + Angle::fromDegrees(90)).degrees();
  }
  if (const auto theta = numbersOf(inputs, "theta"); !theta.empty()) {
    const PlaneStrain turned = inTurnedAxes(strain, Angle::fromDegrees(theta[0]));
    found["exp_x"] = turned.ex / micro;
    found["exp_y"] = turned.ey / micro;
    found["gxpyp"] = turned.gxy / micro;
  }
  if (const auto E = numbersOf(inputs, "E"); !E.empty()) {
    const double nu = numbersOf(inputs, "nu").at(0);
    const PlaneStress stress = stressOf(strain, Isotropic{E[0] * 1e3, nu}); // printed in GPa
    const Circle circle = circleOf(stress);
    found["s1"] = circle.s1;
    found["s2"] = circle.s2;
    found["tmax"] = circle.radius;
    // The third strain of a free surface: -nu/(1 - nu)(ex + ey).
    const double e3 = -nu / (1 - nu) * (strain.ex + strain.ey);
    found["e3"] = e3 / micro;
    found["gabs"] =
        (std::max({principal.e1, principal.e2, e3}) - std::min({principal.e1, principal.e2, e3})) / micro;
  }
  return found;
}

TEST(PublishedRosettes, everyRowAgrees) {
  std::ifstream file(std::string(PLANEWRIGHT_TESTS_DIR) + "/../resources/checks/strain_rosettes.csv");
  std::string line;
  ASSERT_TRUE(std::getline(file, line));
  std::string inputs;
  int rows = 0;
  while (std::getline(file, line)) {
    const std::vector<std::string> fields = csvFields(line);
    ASSERT_EQ(fields.size(), 14u) << line;
    if (fields[3] != "same" && !fields[3].empty())
      inputs = fields[3];
    const std::map<std::string, double> found = quantitiesOf(inputs);
    const auto computed = found.find(fields[4]);
    ASSERT_NE(computed, found.end()) << line;
    const auto number = [](const std::string& text) { return std::stod(text); };
    const bool isAngle = fields[4].starts_with("thp");
    const auto apartFrom = [&](double other) {
      return isAngle ? apart(Angle::fromDegrees(computed->second), Angle::fromDegrees(other)).degrees()
                     : std::abs(computed->second - other);
    };
    EXPECT_LE(apartFrom(number(fields[8])), 2e-9 * std::max(1.0, std::abs(number(fields[8])))) << line;
    if (fields[9] == "OK") {
      EXPECT_LE(apartFrom(number(fields[6])), number(fields[7]) * (1 + 1e-9)) << line;
    }
    ++rows;
  }
  EXPECT_EQ(rows, 29);
}

} // namespace
} // namespace planewright
