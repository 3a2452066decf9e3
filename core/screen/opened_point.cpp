// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/opened_point.h"

#include "core/quantity/format.h"
#include "core/study/copied_point.h"
#include "core/study/typed.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace planewright {

namespace {

/// What of a study counts when a field is judged by this point.
Study judgingPartOf(const Study& study, std::string_view point) {
  Study part;
  part.units = study.units;
  part.convention = study.convention;
  part.cases = study.cases;
  part.combinations = study.combinations;
  part.materials = study.materials;
  if (const Point* one = findPoint(study, point)) {
    Point& judging = part.points.emplace_back();
    judging.lines = one->lines;
    judging.planes = one->planes;
    judging.checks = one->checks;
  }
  return part;
}

std::string degreesText(double degrees) {
  return shortestNumber(degrees) + " deg";
}

/// Turns what a point says of directions into its axes.
class Turned {
public:
  Turned(const Study& study, const ScreenPlan& plan, const Field& field, std::size_t point)
      : m_study(study), m_plan(plan), m_own(field.lineOf(point)), m_axes(field.axesOf(point)) {}

  void turn(Point& point) const {
    if (m_axes != 0)
      point.axes = degreesText(folded(Angle::fromDegrees(m_axes)).degrees());
    for (Line& line : point.lines) {
      const bool hasOwn = !std::isnan(m_own) && judges(line.name);
      if (hasOwn || m_axes != 0)
        line.angle = inAxes(hasOwn ? m_own : valueOf(m_study, Spot::lineAngle, line.angle));
    }
    for (WatchedPlane& plane : point.planes)
      if (m_axes != 0)
        plane.normal = inAxes(valueOf(m_study, Spot::planeNormal, plane.normal));
  }

private:
  bool judges(const std::string& line) const {
    return std::ranges::any_of(m_plan.checks,
                               [&](const ScreenedCheck& check) { return check.setup.line == line; });
  }
  std::string inAxes(double degrees) const {
    return degreesText(folded(folded(Angle::fromDegrees(degrees)) - Angle::fromDegrees(m_axes)).degrees());
  }

  const Study& m_study;
  const ScreenPlan& m_plan;
  double m_own;
  double m_axes;
};

/// A stress in N/mm2 as a text in the study's unit, or in N/mm2 where no number of that unit reads back as
/// the same.
std::string stressText(const Study& study, double stress) {
  const EntryKind kind = entryKindOf(study, Spot::sx);
  double number = kind.unit.fromBase(stress);
  constexpr int mostSteps = 4;
  constexpr double far = std::numeric_limits<double>::max();
  for (double up = number, down = number, step = 0; step < mostSteps; ++step) {
    for (const double one : {up, down}) {
      std::string text = shortestNumber(one) + " " + study.units.stress;
      if (const Result<Entry> read = readEntry(text, kind); read && read->value == stress)
        return text;
    }
    up = std::nextafter(up, far);
    down = std::nextafter(down, -far);
  }
  return shortestNumber(stress) + " N/mm^2";
}

std::string nameOf(const Study& study, const Field& field, std::size_t point, const Translate& translate) {
  std::string name(field.nameOf(point));
  if (field.layerOf(point) != Layer::none)
    if (std::string more = " " + plain(labelOf(field.layerOf(point)), translate);
        name.size() + more.size() <= longestName)
      name += more;
  return findPoint(study, name) ? freshPointName(study, name) : name;
}

} // namespace

bool isScreenedAlike(const Study& a, const Study& b, std::string_view point) {
  return judgingPartOf(a, point) == judgingPartOf(b, point);
}

Result<OpenedPoint> openedPoint(const Study& study, std::string_view judging, const ScreenPlan& plan,
                                const Field& field, const FieldResults& results, std::size_t point,
                                const Text& source, const Translate& translate) {
  const Point& by = *findPoint(study, judging);
  Point opened;
  opened.name = nameOf(study, field, point, translate);
  opened.note =
      plain(PW_TEXT("Screen", "From %1, line %2.").with(source).with(exactNumber(field.fileLineOf(point))),
            translate);
  opened.lines = by.lines;
  opened.planes = by.planes;
  opened.checks = by.checks;
  Turned(study, plan, field, point).turn(opened);
  for (std::size_t k = 0; k < plan.cases.size(); ++k) {
    const PlaneStress stress = field.stressOf(k, point);
    if (!std::isnan(stress.sx))
      opened.stress.push_back({plan.cases[k], stressText(study, stress.sx), stressText(study, stress.sy),
                               stressText(study, stress.txy)});
    else if (plan.acts[k])
      return tl::unexpected(
          Problem{opened.name, static_cast<int>(field.fileLineOf(point)), 0, "",
                  PW_TEXT("Field", "The point “%1” lacks case %2.").with(opened.name).with(plan.cases[k]),
                  PW_TEXT("Screen", "Open one that has all cases that act.")});
  }
  OpenedPoint result{opened.name, {}, editsThatMakePoint(study, opened)};
  if (const PointResult one = results[point]; one.isJudged())
    result.combination = plan.combinations[one.combination].name;
  return result;
}

} // namespace planewright
