// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/typed_state.h"

#include "core/study/edit.h"

#include <array>

namespace planewright {

namespace {

constexpr auto pointName = "P1";
constexpr auto caseName = "typed";

struct Component {
  const char* option;
  Spot spot;
  bool needed;
};
constexpr std::array components = {Component{"--sx", Spot::sx, true}, Component{"--sy", Spot::sy, true},
                                   Component{"--txy", Spot::txy, true}, Component{"--sz", Spot::sz, false}};

Study bareStudy() {
  Study study = newStudy();
  study.cases = {{caseName, "", Nature::permanent, Duration::permanent, {}}};
  Point& point = study.points.front();
  point.name = pointName;
  point.stress = {CaseStress{caseName}};
  point.lines.clear();
  return study;
}

/// Types `text` at a place; a Problem names the option that it came with.
Result<Study> typedAt(const Study& study, const Place& place, const std::string& text,
                      const std::string& option) {
  Result<Study> after = edited(study, Type{place, text});
  if (!after)
    after.error().place = option;
  return after;
}

/// The angle or tolerance as a study would keep it at such a place.
Result<std::string> keptAngle(Spot spot, const GivenOption& option) {
  Study study = bareStudy();
  study.points.front().lines = {Line{pointName, LineKind::other, "0 deg", ""}};
  study.points.front().planes = {WatchedPlane{pointName, "0 deg", ""}};
  const Place place{spot, pointName, pointName};
  const Result<Study> after = typedAt(study, place, option.value, option.name);
  if (!after)
    return tl::unexpected(after.error());
  return textAt(*after, place).value();
}

Problem loneTolerance(const GivenOption& option) {
  return {option.name,
          0,
          0,
          option.value,
          PW_TEXT("Command", "A tolerance belongs to the --line before it, and to one only."),
          PW_TEXT("Command", "Write --line ANGLE --tolerance ANGLE.")};
}

} // namespace

std::optional<Problem> problemOfMixing(const Arguments& arguments) {
  if (arguments.operands.empty()) {
    for (const Component& component : components)
      if (component.needed && !arguments.has(component.option))
        return Problem{component.option,
                       0,
                       0,
                       "",
                       PW_TEXT("Command", "Neither a study nor all three components are given."),
                       PW_TEXT("Command", "Name a study file, or give --sx, --sy and --txy.")};
    return std::nullopt;
  }
  for (const char* option : {"--sx", "--sy", "--txy", "--sz", "--positive"})
    if (arguments.has(option))
      return Problem{option,
                     0,
                     0,
                     arguments.operands.front(),
                     PW_TEXT("Command", "A study brings its own stresses and convention."),
                     PW_TEXT("Command", "Leave out the study, or %1.").with(option)};
  return std::nullopt;
}

Result<Study> typedStudy(const Arguments& arguments) {
  Result<Study> study = bareStudy();
  if (const std::string* word = arguments.valueOf("--positive"))
    study = typedAt(*study, {Spot::positive, {}, {}}, *word, "--positive");
  for (const Component& component : components)
    if (const std::string* text = arguments.valueOf(component.option); text && study)
      study = typedAt(*study, {component.spot, pointName, caseName}, *text, component.option);
  return study;
}

Result<Extras> extrasOf(const Arguments& arguments) {
  Extras extras;
  Line* last = nullptr;
  for (const GivenOption& option : arguments.options) {
    if (option.name == "--normal") {
      const Result<std::string> normal = keptAngle(Spot::planeNormal, option);
      if (!normal)
        return tl::unexpected(normal.error());
      extras.planes.push_back({"normal " + std::to_string(extras.planes.size() + 1), *normal, ""});
    } else if (option.name == "--line") {
      const Result<std::string> angle = keptAngle(Spot::lineAngle, option);
      if (!angle)
        return tl::unexpected(angle.error());
      last = &extras.lines.emplace_back(
          Line{"line " + std::to_string(extras.lines.size() + 1), LineKind::other, *angle, ""});
    } else if (option.name == "--tolerance") {
      if (!last || !last->tolerance.empty())
        return tl::unexpected(loneTolerance(option));
      const Result<std::string> tolerance = keptAngle(Spot::lineTolerance, option);
      if (!tolerance)
        return tl::unexpected(tolerance.error());
      last->tolerance = *tolerance;
    }
  }
  return extras;
}

} // namespace planewright
