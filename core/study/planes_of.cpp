// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/readout.h"

namespace planewright {

namespace {

constexpr NormalAngle normalAt(double degrees) {
  return {Angle::fromDegrees(degrees)};
}

void addPrincipal(std::vector<PlaneReading>& planes, const Circle& circle) {
  planes.push_back({PlaneKind::s1, {}, circle.theta1, {circle.s1, 0}});
  planes.push_back({PlaneKind::s2, {}, circle.theta2(), {circle.s2, 0}});
  planes.push_back({PlaneKind::shearMax, {}, circle.thetaTauMax, {circle.mean, circle.radius}});
  planes.push_back({PlaneKind::shearMin, {}, circle.thetaTauMin(), {circle.mean, 0.0 - circle.radius}});
}

} // namespace

PlaneReading planeAt(const StateReading& state, NormalAngle normal) {
  return {PlaneKind::watched, {}, normal, tractionOn(state.stress, normal)};
}

std::vector<PlaneReading> planesOf(const Readout& readout, const StateReading& state) {
  std::vector<PlaneReading> planes;
  planes.push_back({PlaneKind::reading, {}, readout.reading, state.reading});
  planes.push_back({PlaneKind::x, {}, normalAt(0), tractionOn(state.stress, normalAt(0))});
  planes.push_back({PlaneKind::y, {}, normalAt(90), tractionOn(state.stress, normalAt(90))});
  addPrincipal(planes, state.circle);
  for (std::size_t i = 0; i < readout.lines.size(); ++i) {
    const LineReading& line = readout.lines[i];
    const LineStress& stress = state.lines[i];
    planes.push_back({PlaneKind::crossing, line.name, crossing(line.angle), {stress.along, stress.shear}});
    planes.push_back(
        {PlaneKind::following, line.name, following(line.angle), {stress.across, 0.0 - stress.shear}});
  }
  for (std::size_t i = 0; i < readout.watched.size(); ++i)
    planes.push_back(
        {PlaneKind::watched, readout.watched[i].name, readout.watched[i].normal, state.watched[i]});
  return planes;
}

} // namespace planewright
