// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/distribution.h"

#include "core/source/seen.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>

namespace planewright {

namespace {

/// A stretch of material between two levels of the outline.
struct Band {
  double low = 0;
  double high = 0;
};

/// A line through a section along the second axis of a view.
class Line {
public:
  Line(const SectionModel& model, const SectionForces& forces, const Fibre& fibre, ShearRule rule)
      : m_model(model), m_forces(forces), m_fibre(fibre), m_rule(rule), m_seen(model, fibre) {}

  /// From the bottom up, cut at the axis as well; ends of a round outline are found where the line leaves it.
  std::vector<Band> bands() const {
    std::vector<Band> bands;
    for (const Span& span : stretches()) {
      std::vector<double> cuts = {span.from, span.to};
      std::vector<double> levels = levelsOf(m_seen.region);
      levels.push_back(0);
      for (const double level : levels)
        if (level > span.from + slack() && level < span.to - slack())
          cuts.push_back(level);
      std::ranges::sort(cuts);
      for (std::size_t i = 0; i + 1 < cuts.size(); ++i)
        if (cuts[i + 1] - cuts[i] > 4 * slack())
          bands.push_back({cuts[i], cuts[i + 1]});
    }
    return bands;
  }

  /// Stretches of material along the line, on an outline those of its inner side.
  std::vector<Span> stretches() const {
    const Region& across = m_seen.view == View::side ? m_model.transposed : m_model.region;
    const double level = nearestLevelOr(across, m_seen.w);
    std::vector<Span> spans = spansAt(across, level, Side::below);
    for (const Span& span : spansAt(across, level, Side::above))
      spans.push_back(span);
    std::ranges::sort(spans, {}, &Span::from);
    std::vector<Span> joined;
    for (const Span& span : spans) {
      if (!joined.empty() && span.from <= joined.back().to + slack())
        joined.back().to = std::max(joined.back().to, span.to);
      else
        joined.push_back(span);
    }
    return joined;
  }

  Fibre fibreAt(double at) const {
    return m_seen.view == View::side ? Fibre{at, m_fibre.z, View::side} : Fibre{m_fibre.y, at, View::top};
  }
  Result<FibreStress> stressAt(double at, const SectionForces& forces) const {
    return planewright::stressAt(m_model, forces, fibreAt(at), m_rule);
  }
  Result<FibreStress> stressAt(double at) const { return stressAt(at, m_forces); }

  double slack() const { return m_seen.slack(); }

private:
  const SectionModel& m_model;
  const SectionForces& m_forces;
  const Fibre& m_fibre;
  ShearRule m_rule;
  Seen m_seen;
};

Problem noShape() {
  return {{},
          0,
          0,
          {},
          PW_TEXT("Source", "Tabled values have no shape to look along."),
          PW_TEXT("Source", "Choose a shape with sizes.")};
}

Problem noMaterial() {
  return {{},
          0,
          0,
          {},
          PW_TEXT("Source", "There is no material along this line through the section."),
          PW_TEXT("Source", "Take a fibre in the section.")};
}

/// The places of a band at which a curve is drawn; its ends from just inside, so that junctions show both
/// their sides.
std::vector<double> placesIn(const Band& band, double slack) {
  constexpr int parts = 16;
  std::vector<double> places = {band.low, band.low + 2 * slack};
  for (int i = 1; i < parts; ++i)
    places.push_back(band.low + (band.high - band.low) * i / parts);
  places.push_back(band.high - 2 * slack);
  places.push_back(band.high);
  return places;
}

/// Finds the worst place along a line.
class Search {
public:
  Search(const Line& line, const Measure& measure) : m_line(line), m_measure(measure) {}

  Result<WorstFibre> worst() {
    const std::vector<Span> stretches = m_line.stretches();
    if (stretches.empty())
      return tl::unexpected(noMaterial());
    const std::vector<Band> bands = m_line.bands();
    for (auto band = bands.rbegin(); band != bands.rend(); ++band)
      scan(*band);
    if (bands.empty()) // the line touches a round outline
      judge((stretches.front().from + stretches.front().to) / 2);
    if (!m_best)
      return tl::unexpected(std::move(*m_problem));
    m_best->isPartial = m_problem.has_value();
    return std::move(*m_best);
  }

private:
  std::optional<double> judge(double at) {
    Result<FibreStress> stress = m_line.stressAt(at);
    if (!stress) {
      if (!m_problem)
        m_problem = std::move(stress).error();
      return std::nullopt;
    }
    const double measure = m_measure(stress->stress);
    if (!m_best || measure > m_best->measure + 1e-12 * std::abs(m_best->measure)) {
      m_best = WorstFibre{m_line.fibreAt(at), *std::move(stress), measure, false};
    }
    return measure;
  }

  /// Every place that is no less bad than its neighbours is looked at closely: two peaks may be nearly equal.
  void scan(const Band& band) {
    constexpr int parts = 64;
    const auto place = [&band](int i) {
      return i == parts ? band.high : band.low + (band.high - band.low) * i / parts;
    };
    std::vector<double> measures;
    for (int i = parts; i >= 0; --i)
      measures.push_back(judge(place(i)).value_or(-std::numeric_limits<double>::infinity()));
    std::ranges::reverse(measures);
    for (int i = 0; i <= parts; ++i) {
      const int below = std::max(0, i - 1);
      const int above = std::min(parts, i + 1);
      const auto at = [&measures](int k) { return measures[static_cast<std::size_t>(k)]; };
      if (at(i) >= at(below) && at(i) >= at(above))
        narrow({place(below), place(above)});
    }
  }

  /// Golden section.
  void narrow(Band around) {
    const double ratio = (std::sqrt(5.0) - 1) / 2;
    while (around.high - around.low > 2 * m_line.slack()) {
      const double length = ratio * (around.high - around.low);
      const std::optional<double> lower = judge(around.high - length);
      const std::optional<double> upper = judge(around.low + length);
      if (!lower || !upper)
        return;
      if (*lower > *upper)
        around.high = around.low + length;
      else
        around.low = around.high - length;
    }
  }

  const Line& m_line;
  const Measure& m_measure;
  std::optional<WorstFibre> m_best;
  std::optional<Problem> m_problem;
};

} // namespace

Result<Distribution> distributionThrough(const SectionModel& model, const SectionForces& forces,
                                         const Fibre& fibre, ShearRule rule) {
  if (model.isTabled())
    return tl::unexpected(noShape());
  const Line line(model, forces, fibre, rule);
  const SectionForces bending{forces.N, 0, 0, 0, forces.My, forces.Mz};
  Distribution distribution;
  for (const Span& stretch : line.stretches()) {
    Curve curve;
    for (const double at : {stretch.from, stretch.to})
      if (const Result<FibreStress> stress = line.stressAt(at, bending))
        curve.push_back({at, stress->stress.sx});
    distribution.sx.push_back(std::move(curve));
  }
  if (distribution.sx.empty())
    return tl::unexpected(noMaterial());
  Curve run;
  const auto endRun = [&] {
    if (run.size() > 1)
      distribution.txy.push_back(run);
    run.clear();
  };
  double reached = 0;
  for (const Band& band : line.bands()) {
    if (band.low > reached + line.slack())
      endRun();
    reached = band.high;
    for (const double at : placesIn(band, line.slack())) {
      if (const Result<FibreStress> stress = line.stressAt(at))
        run.push_back({at, stress->stress.txy});
      else
        endRun();
    }
  }
  endRun();
  return distribution;
}

Result<WorstFibre> worstFibre(const SectionModel& model, const SectionForces& forces, const Fibre& fibre,
                              ShearRule rule, const Measure& measure) {
  if (model.isTabled())
    return tl::unexpected(noShape());
  const Line line(model, forces, fibre, rule);
  return Search(line, measure).worst();
}

} // namespace planewright
