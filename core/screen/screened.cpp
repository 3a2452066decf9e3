// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/screened.h"

#include "core/screen/one_point.h"

#include <algorithm>
#include <atomic>
#include <cassert>
#include <cmath>
#include <limits>
#include <thread>

namespace planewright {

namespace {

constexpr double none = std::numeric_limits<double>::quiet_NaN();
/// Below this many points waking another thread costs more than it saves.
constexpr std::size_t manyPoints = 20'000;
/// A sum that cancelled to less than this share of its terms is judged by the core, which knows rounding when
/// it sees it.
constexpr double cancelled = 1e-2;

/// A line of the study and the checks on it.
struct LineOfPlan {
  Angle nominal;
  std::vector<std::size_t> checks;
};

std::vector<LineOfPlan> linesOf(const ScreenPlan& plan) {
  std::vector<LineOfPlan> lines;
  for (std::size_t i = 0; i < plan.checks.size(); ++i) {
    const Angle nominal = plan.checks[i].band.nominal;
    const auto line = std::ranges::find(lines, nominal, &LineOfPlan::nominal);
    if (line == lines.end())
      lines.push_back({nominal, {i}});
    else
      line->checks.push_back(i);
  }
  return lines;
}

/// One thread's work: goes through a block lane by lane. Keeps its arrays between blocks.
class BlockWorker {
public:
  BlockWorker(const ScreenPlan& plan, const Field& field, FieldResults& results)
      : m_plan(plan), m_field(field), m_results(results), m_lines(linesOf(plan)),
        m_resolved(plan.cases.size() * stateSize), m_sum(stateSize), m_cos2(laneSize), m_sin2(laneSize),
        m_best(laneSize), m_which(laneSize) {
    for (const ScreenedCheck& check : plan.checks) {
      const CosSin twice = cosSinOfDouble(check.band.tolerance);
      m_bands.push_back({twice.cos, twice.sin});
      m_finders.emplace_back(check);
    }
    m_sense = plan.positive == Positive::tension ? 1 : -1;
    for (const ScreenedCombination& combination : plan.combinations) {
      std::vector<double>& factors = m_factors.emplace_back();
      for (const ActingCase& acting : combination.acting)
        factors.push_back(m_sense * acting.factor);
    }
  }

  void judge(std::size_t block) {
    const std::size_t end = std::min((block + 1) * Field::blockSize, m_field.size());
    for (std::size_t from = block * Field::blockSize; from < end; from += laneSize)
      judgeLane(block, from, std::min(from + laneSize, end));
  }

private:
  void judgeLane(std::size_t block, std::size_t from, std::size_t end) {
    if (!m_plan.kernelsHold || !isBorne(block, from)) {
      for (std::size_t point = from; point < end; ++point)
        if (m_field.standingOf(point) == PointStanding::whole)
          m_results.set(point, judgedByCore(m_plan, m_field, point));
      return;
    }
    std::ranges::fill(m_best, -1.0);
    std::ranges::fill(m_which, 0.0);
    for (const LineOfPlan& line : m_lines)
      keepWorst(line, block, from, end);
    for (std::size_t point = from; point < end; ++point)
      if (m_field.standingOf(point) == PointStanding::whole) {
        assert(m_best[point - from] >= 0); // a whole point has numbers only
        m_results.set(point, resultOf(point, m_which[point - from]));
      }
  }

  /// A row of a lane of one case; null where no point of the block has it.
  const double* row(std::size_t loadCase, std::size_t block, std::size_t from, std::size_t component) const {
    const double* rows = m_field.block(loadCase, block);
    return rows ? rows + component * Field::blockSize + from % Field::blockSize : nullptr;
  }

  bool isBorne(std::size_t block, std::size_t from) const {
    Bounds bounds{1, 1};
    for (std::size_t k = 0; k < m_plan.cases.size(); ++k)
      if (m_plan.acts[k])
        for (std::size_t component : {0U, 1U, 2U})
          if (const double* values = row(k, block, from, component))
            widenBounds(values, laneSize, bounds);
    return bounds.least >= bornStresses.least && bounds.greatest <= bornStresses.greatest;
  }

  /// The turn from the axes of each point to the line.
  void turnTo(const LineOfPlan& line, std::size_t from, std::size_t end) {
    const auto& columns = m_field.columns();
    if (!columns.axes && !columns.line) {
      const CosSin twice = cosSinOfDouble(line.nominal);
      std::ranges::fill(m_cos2, twice.cos);
      std::ranges::fill(m_sin2, twice.sin);
      return;
    }
    for (std::size_t point = from; point < end; ++point) {
      const CosSin twice = cosSinOfDouble(lineInAxesOf(m_plan.checks[line.checks.front()], point));
      m_cos2[point - from] = twice.cos;
      m_sin2[point - from] = twice.sin;
    }
  }

  Angle lineInAxesOf(const ScreenedCheck& check, std::size_t point) const {
    return folded(lineAt(check, m_field, point) - Angle::fromDegrees(m_field.axesOf(point)));
  }

  void keepWorst(const LineOfPlan& line, std::size_t block, std::size_t from, std::size_t end) {
    turnTo(line, from, end);
    for (std::size_t k = 0; k < m_plan.cases.size(); ++k) {
      double* resolved = &m_resolved[k * stateSize];
      if (m_plan.acts[k] && row(k, block, from, 0))
        resolveLane(row(k, block, from, 0), row(k, block, from, 1), row(k, block, from, 2), m_cos2.data(),
                    m_sin2.data(), resolved);
      else
        std::fill_n(resolved, stateSize, none);
    }
    for (std::size_t c = 0; c < m_plan.combinations.size(); ++c) {
      m_terms.clear();
      for (const ActingCase& acting : m_plan.combinations[c].acting)
        m_terms.push_back(&m_resolved[acting.index * stateSize]);
      combineLane(m_terms.data(), m_factors[c].data(), m_terms.size(), m_sum.data());
      for (const std::size_t i : line.checks)
        keep(m_plan.checks[i].forms[c], m_plan.checks[i].band, m_bands[i],
             static_cast<double>(c * m_plan.checks.size() + i));
    }
  }

  void keep(const ScreenedForms& forms, const Band& band, const HalfBand& half, double number) {
    const double* sum = m_sum.data();
    double* best = m_best.data();
    double* which = m_which.data();
    if (band.tolerance == Angle()) {
      for (const SquaresForm& form : forms.squares)
        keepSquares(sum, form, number, best, which);
      for (const LinearForm& form : forms.linears)
        keepLinear(sum, form, number, best, which);
      for (const RatiosForm& form : forms.ratios)
        keepRatios(sum, form, number, best, which);
      for (const SumForm& form : forms.sums)
        keepSum(sum, form, number, best, which);
      return;
    }
    for (const SquaresForm& form : forms.squares)
      keepSquaresInBand(sum, form, half, number, best, which);
    for (const LinearForm& form : forms.linears)
      keepLinearInBand(sum, form, half, number, best, which);
    for (const RatiosForm& form : forms.ratios)
      keepRatiosInBand(sum, form, half, number, best, which);
    for (const SumForm& form : forms.sums)
      keepSumInBand(sum, form, half, number, best, which);
  }

  /// All that is said of a point, from the combination and check that govern it.
  PointResult resultOf(std::size_t point, double which) {
    const auto number = static_cast<std::size_t>(which);
    const std::size_t c = number / m_plan.checks.size();
    const std::size_t i = number % m_plan.checks.size();
    const ScreenedCheck& check = m_plan.checks[i];
    const Angle line = lineAt(check, m_field, point);
    const StateOfLine state = stateOf(point, c, cosSinOfDouble(lineInAxesOf(check, point)));
    const double size = std::abs(state.mean) + std::abs(state.half) + std::abs(state.shear);
    if (size < cancelled * state.scale)
      return judgedByCore(m_plan, m_field, point);
    const WorstOfState worst = m_finders[i].worstOf(check.forms[c], state);
    PointResult result;
    result.utilisation = worst.utilisation;
    result.mode = worst.mode;
    result.combination = static_cast<std::uint32_t>(c);
    result.check = static_cast<std::uint32_t>(i);
    result.worstAngle = (line + worst.offset).degrees();
    return result;
  }

  StateOfLine stateOf(std::size_t point, std::size_t combination, const CosSin& twice) const {
    PlaneStress sum;
    double scale = 0;
    const std::vector<ActingCase>& acting = m_plan.combinations[combination].acting;
    for (std::size_t k = 0; k < acting.size(); ++k) {
      const PlaneStress stress = m_field.stressOf(acting[k].index, point);
      sum = sum + m_factors[combination][k] * stress;
      scale += std::abs(acting[k].factor) * scaleOf(stress);
    }
    const double half = sum.sx / 2 - sum.sy / 2;
    return {sum.sx / 2 + sum.sy / 2, half * twice.cos + sum.txy * twice.sin,
            sum.txy * twice.cos - half * twice.sin, scale};
  }

  const ScreenPlan& m_plan;
  const Field& m_field;
  FieldResults& m_results;
  std::vector<LineOfPlan> m_lines;
  std::vector<HalfBand> m_bands;
  std::vector<WorstFinder> m_finders;
  std::vector<std::vector<double>> m_factors; ///< of each combination, with the sense of the study
  std::vector<const double*> m_terms;
  std::vector<double> m_resolved, m_sum, m_cos2, m_sin2, m_best, m_which;
  double m_sense = 1;
};

} // namespace

std::optional<FieldResults> screened(const ScreenPlan& plan, const Field& field, unsigned threads,
                                     const Watch& watch) {
  if (watch && !watch(0, field.size()))
    return std::nullopt;
  FieldResults results(field.size());
  std::atomic<std::size_t> next = 0;
  std::atomic<std::size_t> done = 0;
  std::atomic<bool> goesOn = true;
  const auto work = [&](bool watches) {
    BlockWorker worker(plan, field, results);
    for (std::size_t block = next++; block < field.blocks() && goesOn; block = next++) {
      worker.judge(block);
      ++done;
      if (watches && watch && !watch(std::min(done * Field::blockSize, field.size()), field.size()))
        goesOn = false;
    }
  };
  if (threads == 0)
    threads = field.size() < manyPoints ? 1 : std::max(std::thread::hardware_concurrency(), 1U);
  {
    std::vector<std::jthread> others;
    for (unsigned i = 1; i < threads; ++i)
      others.emplace_back(work, false);
    work(true);
  }
  if (!goesOn)
    return std::nullopt;
  return results;
}

} // namespace planewright
