// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/over_angles.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace planewright {

namespace {

constexpr double halfTurn = 180;

/// One smooth part of one combination.
struct Part {
  const Branch* branch;
  const TurningState* state;
  double at(double degrees) const { return utilisationOf(*branch, *state, Angle::fromDegrees(degrees)); }
  /// -90, the turning points between, 90.
  std::vector<double> pieces() const {
    std::vector<double> ends = {-90, 90};
    for (const Angle turning : turningPointsOf(*branch, *state))
      ends.push_back(turning.degrees());
    std::ranges::sort(ends);
    ends.erase(std::unique(ends.begin(), ends.end()), ends.end());
    return ends;
  }
};

std::vector<Part> partsOf(Judges judges) {
  std::vector<Part> parts;
  for (const Judge& judge : judges)
    for (const Branch& branch : judge.branches())
      parts.push_back({&branch, &judge.state()});
  return parts;
}

/// Halves [low, high] until no double lies between; `isLow(low)` holds and `isLow(high)` does not.
template <class IsLow>
std::pair<double, double> bisected(double low, double high, IsLow isLow) {
  while (true) {
    const double middle = low + (high - low) / 2;
    if (middle == low || middle == high)
      return {low, high};
    (isLow(middle) ? low : high) = middle;
  }
}

struct Stretch {
  double from, to;
};
using Stretches = std::vector<Stretch>;

void append(Stretches& stretches, double from, double to) {
  if (!stretches.empty() && stretches.back().to >= from)
    stretches.back().to = to;
  else
    stretches.push_back({from, to});
}

/// Stretches of [-90, 90] in which one part stays within the limit.
Stretches withinOf(const Part& part) {
  Stretches within;
  const std::vector<double> ends = part.pieces();
  const auto holds = [&part](double degrees) { return !exceedsLimit(part.at(degrees)); };
  for (std::size_t i = 0; i + 1 < ends.size(); ++i) {
    const double from = ends[i];
    const double to = ends[i + 1];
    const bool first = holds(from);
    const bool last = holds(to);
    if (first && last)
      append(within, from, to);
    else if (first)
      append(within, from, bisected(from, to, holds).first);
    else if (last)
      append(within, bisected(from, to, [&](double at) { return !holds(at); }).second, to);
  }
  return within;
}

Stretches both(const Stretches& a, const Stretches& b) {
  Stretches common;
  for (std::size_t i = 0, j = 0; i < a.size() && j < b.size();) {
    const double from = std::max(a[i].from, b[j].from);
    const double to = std::min(a[i].to, b[j].to);
    if (from <= to)
      common.push_back({from, to});
    (a[i].to < b[j].to ? i : j)++;
  }
  return common;
}

double greatestOf(const std::vector<double>& utilisations) {
  double greatest = 0;
  for (const double utilisation : utilisations)
    greatest = std::max(greatest, utilisation);
  return greatest;
}

class Best {
public:
  explicit Best(const std::vector<Part>& parts) : m_parts(parts) {
    for (const Part& part : parts)
      m_pieces.push_back(part.pieces());
  }

  BestDirection found() {
    constexpr double step = 1;
    std::vector<std::pair<double, Stretch>> cells;
    std::vector<double> before = allAt(-90);
    for (double from = -90; from < 90; from += step) {
      look(from, greatestOf(before));
      std::vector<double> after = allAt(from + step);
      cells.push_back({leastIn({from, from + step}, before, after), {from, from + step}});
      before = std::move(after);
    }
    std::ranges::stable_sort(cells, {}, &std::pair<double, Stretch>::first);
    for (const auto& [least, cell] : cells)
      if (least < m_best.utilisation)
        search(cell);
    return {folded(m_best.angle), m_best.utilisation};
  }

private:
  std::vector<double> allAt(double degrees) const {
    std::vector<double> all;
    all.reserve(m_parts.size());
    for (const Part& part : m_parts)
      all.push_back(part.at(degrees));
    return all;
  }

  void look(double degrees, double utilisation) {
    if (utilisation < m_best.utilisation)
      m_best = {Angle::fromDegrees(degrees), utilisation};
  }
  void look(double degrees) { look(degrees, greatestOf(allAt(degrees))); }

  bool isMonotone(std::size_t part, const Stretch& cell) const {
    const std::vector<double>& ends = m_pieces[part];
    const auto next = std::ranges::upper_bound(ends, cell.from);
    return next == ends.end() || *next >= cell.to;
  }

  /// What the greatest utilisation in a cell is at least, from those of all parts at its ends.
  double leastIn(const Stretch& cell, const std::vector<double>& before,
                 const std::vector<double>& after) const {
    double least = 0;
    for (std::size_t i = 0; i < m_parts.size(); ++i)
      if (isMonotone(i, cell))
        least = std::max(least, std::min(before[i], after[i]));
    return least;
  }

  void search(const Stretch& cell) {
    std::vector<double> ends = {cell.from, cell.to};
    for (const std::vector<double>& pieces : m_pieces)
      for (const double end : pieces)
        if (end > cell.from && end < cell.to)
          ends.push_back(end);
    std::ranges::sort(ends);
    for (const double end : ends)
      look(end);
    for (std::size_t i = 0; i + 1 < ends.size(); ++i) {
      const Stretch piece{ends[i], ends[i + 1]};
      if (leastIn(piece, allAt(piece.from), allAt(piece.to)) < m_best.utilisation)
        meet(piece.from, piece.to);
    }
  }

  /// Between turning points the greatest of the rising parts rises and that of the falling ones falls: the
  /// least of both is where they meet.
  void meet(double from, double to) {
    std::vector<const Part*> rising;
    std::vector<const Part*> falling;
    for (const Part& part : m_parts)
      (part.at(from) <= part.at(to) ? rising : falling).push_back(&part);
    const auto greatest = [](const std::vector<const Part*>& parts, double degrees) {
      double value = 0;
      for (const Part* part : parts)
        value = std::max(value, part->at(degrees));
      return value;
    };
    const auto falls = [&](double at) { return greatest(falling, at) > greatest(rising, at); };
    if (!falls(from) || falls(to))
      return;
    constexpr double enough = 1e-10; // deg
    while (to - from > enough) {
      const double middle = from + (to - from) / 2;
      (falls(middle) ? from : to) = middle;
    }
    look(from);
    look(to);
  }

  const std::vector<Part>& m_parts;
  std::vector<std::vector<double>> m_pieces;
  BestDirection m_best{{}, std::numeric_limits<double>::infinity()};
};

} // namespace

double greatestUtilisation(Judges judges, Angle direction) {
  double greatest = 0;
  for (const Judge& judge : judges)
    greatest = std::max(greatest, judge.utilisation(direction));
  return greatest;
}

std::vector<Within> withinLimit(Judges judges) {
  Stretches within = {{-90, 90}};
  for (const Part& part : partsOf(judges))
    within = both(within, withinOf(part));
  std::vector<Within> result;
  for (const Stretch& one : within)
    if (one.to - one.from > coinciding.degrees())
      result.push_back({Angle::fromDegrees(one.from), Angle::fromDegrees(one.to)});
  // -90 and 90 are one direction: what ends there goes on.
  const auto upright = Angle::fromDegrees(90);
  const bool goesRound = result.size() > 1 && result.front().from == -upright && result.back().to == upright;
  if (goesRound) {
    result.back().to = result.front().to + Angle::fromDegrees(halfTurn);
    result.erase(result.begin());
  }
  return result;
}

std::optional<Angle> allowedTolerance(std::span<const Within> within, Angle nominal) {
  for (const Within& one : within) {
    if ((one.to - one.from).degrees() >= halfTurn)
      return Angle::fromDegrees(90);
    for (const double turns : {0.0, halfTurn}) {
      const Angle angle = folded(nominal) + Angle::fromDegrees(turns);
      if (angle >= one.from && angle <= one.to)
        return std::min({angle - one.from, one.to - angle, Angle::fromDegrees(90)});
    }
  }
  return std::nullopt;
}

BestDirection bestDirection(Judges judges) {
  const std::vector<Part> parts = partsOf(judges);
  return Best(parts).found();
}

std::optional<double> slopePerDegree(Judges judges, Angle direction) {
  constexpr double h = 1e-3; // deg
  const auto at = [&](double by) { return greatestUtilisation(judges, direction + Angle::fromDegrees(by)); };
  const double here = at(0);
  const double ahead = (-3 * here + 4 * at(h) - at(2 * h)) / (2 * h);
  const double behind = (3 * here - 4 * at(-h) + at(-2 * h)) / (2 * h);
  const double steeper = std::abs(ahead) > std::abs(behind) ? ahead : behind;
  if (!std::isfinite(steeper))
    return std::nullopt;
  constexpr double errorShare = 1e-7; // of differences
  return std::abs(steeper) <= errorShare * here ? 0 : steeper;
}

} // namespace planewright
