// SPDX-License-Identifier: GPL-3.0-or-later
// What it costs to judge a million points, on one thread, beside the memory, the processor and what a user
// would write instead. All are measured in turn in one run, by processor time; what counts are the ratios at
// the end. screen_numpy.py holds the same against numpy.
//   screen_bench [TABLE.csv] [options of Google Benchmark]    the table is one in the long form, cases A to F
#include "core/screen/field_csv.h"
#include "core/screen/field_reader.h"
#include "core/screen/screened.h"
#include "tests/bench/screen_rivals.h"
#include "tests/support/field_gen.h"

#include <benchmark/benchmark.h>

#include <algorithm>
#include <cstdio>
#include <cstdlib>
#include <fstream>
#include <iterator>
#include <map>

namespace planewright {
namespace {

constexpr std::size_t points = (std::size_t{1'000'000} / laneSize) * laneSize;
constexpr std::size_t cases = 6;
constexpr double tolerance = 15; // degrees
const SquaresForm squares{{1 / 196.0, 1 / 441.0}, {1 / 0.16, 1 / 6.25}, {}, 1 / 16.0, false};
const LinearForm linear{1 / 294.0, -0.01, 1.0, 1 / 16.0, 1 / 14.0 - 1 / 21.0, 1 / 0.4 - 1 / 2.5};

/// Rows of a million values, made once.
const std::vector<WideVector<double>>& rows() {
  static const std::vector<WideVector<double>> all = [] {
    std::vector<WideVector<double>> made(3 * cases + 6);
    Dice dice(1);
    for (WideVector<double>& row : made) {
      row.resize(points);
      for (double& value : row)
        value = dice.between(-10, 10);
    }
    for (std::size_t i = 0; i < points; ++i) {
      const double angle = made[0][i] / 10;
      made[3 * cases][i] = std::cos(angle);
      made[3 * cases + 1][i] = std::sin(angle);
    }
    return made;
  }();
  return all;
}

const double* given(std::size_t row) {
  return rows()[row].data();
}
const double* cos2() {
  return given(3 * cases);
}
const double* sin2() {
  return given(3 * cases + 1);
}
/// One of four rows for what is made; who measures owns them.
double* made(std::size_t row) {
  return const_cast<double*>(given(3 * cases + 2 + row));
}

void stream(benchmark::State& state, std::size_t inputs, std::size_t outputs) {
  std::vector<const double*> from;
  std::vector<double*> to;
  for (std::size_t i = 0; i < inputs; ++i)
    from.push_back(given(i));
  for (std::size_t i = 0; i < outputs; ++i)
    to.push_back(made(i));
  for (auto _ : state) {
    streamThrough(from, to, points);
    benchmark::ClobberMemory();
  }
}

void principal(benchmark::State& state) {
  for (auto _ : state) {
    for (std::size_t from = 0; from < points; from += laneSize)
      principalLane(given(0) + from, given(1) + from, given(2) + from, made(0) + from, made(1) + from,
                    made(2) + from, made(3) + from);
    benchmark::ClobberMemory();
  }
}

void principalEigen(benchmark::State& state) {
  double* const to[4] = {made(0), made(1), made(2), made(3)};
  for (auto _ : state) {
    principalByEigen(given(0), given(1), given(2), to, points);
    benchmark::ClobberMemory();
  }
}

void combinations(benchmark::State& state, std::size_t count) {
  std::vector<double> resolved(cases * stateSize), sum(stateSize);
  std::vector<const double*> terms;
  for (std::size_t k = 0; k < cases; ++k)
    terms.push_back(&resolved[k * stateSize]);
  Dice dice(2);
  std::vector<std::vector<double>> factors(count);
  for (std::vector<double>& row : factors)
    for (std::size_t k = 0; k < cases; ++k)
      row.push_back(dice.between(0.3, 1.5));
  for (auto _ : state) {
    for (std::size_t from = 0; from < points; from += laneSize) {
      for (std::size_t k = 0; k < cases; ++k)
        resolveLane(given(3 * k) + from, given(3 * k + 1) + from, given(3 * k + 2) + from, cos2() + from,
                    sin2() + from, &resolved[k * stateSize]);
      std::fill_n(made(0) + from, laneSize, -1.0);
      for (std::size_t c = 0; c < count; ++c) {
        combineLane(terms.data(), factors[c].data(), cases, sum.data());
        keepSquares(sum.data(), squares, static_cast<double>(c), made(0) + from, made(1) + from);
      }
    }
    benchmark::ClobberMemory();
  }
}

/// Each lane of states, turned to the line, by `keep`.
template <class Keep>
void band(benchmark::State& state, std::size_t size, Keep keep) {
  std::vector<double> resolved(stateSize);
  for (auto _ : state) {
    for (std::size_t from = 0; from < size; from += laneSize) {
      resolveLane(given(0) + from, given(1) + from, given(2) + from, cos2() + from, sin2() + from,
                  resolved.data());
      std::fill_n(made(0) + from, laneSize, -1.0);
      keep(resolved.data(), made(0) + from, made(1) + from);
    }
    benchmark::ClobberMemory();
  }
  state.SetItemsProcessed(static_cast<std::int64_t>(size) * state.iterations());
}

const HalfBand& half() {
  static const CosSin twice = cosSinOfDouble(Angle::fromDegrees(tolerance));
  static const HalfBand made{twice.cos, twice.sin};
  return made;
}

void exactBand(benchmark::State& state, const auto& form, auto kernel) {
  band(state, points,
       [&](const double* lane, double* best, double* which) { kernel(lane, form, half(), 1, best, which); });
}

constexpr std::size_t scanned = points / 16; // the scan takes its time

void scannedBand(benchmark::State& state, const auto& form) {
  const BandScan scan(tolerance);
  band(state, scanned,
       [&](const double* lane, double* best, double* which) { scan.keep(lane, form, best, which); });
}

void peak(benchmark::State& state) {
  for (auto _ : state)
    benchmark::DoNotOptimize(spinAtPeak());
}

// From file to file.

const Study& study() {
  static const Study made = [] {
    std::vector<std::vector<double>> factors;
    Dice dice(3);
    for (int c = 0; c < 8; ++c) {
      std::vector<double>& row = factors.emplace_back();
      for (std::size_t k = 0; k < cases; ++k)
        row.push_back(std::round(dice.between(0.3, 1.5) * 100) / 100);
    }
    return fieldStudy(Criterion::sumOfSquares, c24(), Angle::fromDegrees(5), Angle::fromDegrees(3), factors);
  }();
  return made;
}

const ScreenPlan& plan() {
  static const ScreenPlan made = *screenPlanOf(study(), "field");
  return made;
}

void addNumber(std::string& text, double value) {
  char buffer[32];
  text.append(buffer, static_cast<std::size_t>(std::snprintf(buffer, sizeof buffer, "%.6g", value)));
}

/// A million points in the wide form.
const std::string& wideTable() {
  static const std::string made = [] {
    std::string text = "point";
    for (const char* id : {"A", "B", "C", "D", "E", "F"})
      text.append(",sx ").append(id).append(",sy ").append(id).append(",txy ").append(id);
    text += '\n';
    for (std::size_t i = 0; i < points; ++i) {
      text += exactNumber(static_cast<double>(i));
      for (std::size_t row = 0; row < 3 * cases; ++row) {
        text += ',';
        addNumber(text, given(row)[i]);
      }
      text += '\n';
    }
    return text;
  }();
  return made;
}

std::string longTable;

FieldReading readingOf(const std::string& table) {
  FieldReader reader(study(), plan().acts);
  constexpr std::size_t piece = std::size_t{1} << 20;
  for (std::size_t from = 0; from < table.size(); from += piece)
    if (!reader.take(std::string_view(table).substr(from, piece)))
      std::abort();
  return *reader.finish();
}

void read(benchmark::State& state, const std::string& table) {
  for (auto _ : state)
    benchmark::DoNotOptimize(readingOf(table).rows);
}

const Field& field() {
  static const FieldReading reading = readingOf(wideTable());
  return reading.field;
}

const FieldResults& results() {
  static const FieldResults made = *screened(plan(), field(), 1);
  return made;
}

void judge(benchmark::State& state) {
  for (auto _ : state)
    benchmark::DoNotOptimize(screened(plan(), field(), 1)->size());
}

void write(benchmark::State& state) {
  std::FILE* nowhere = std::fopen("/dev/null", "w");
  const Sink sink = [&](std::string_view bytes) {
    return std::fwrite(bytes.data(), 1, bytes.size(), nowhere) == bytes.size();
  };
  for (auto _ : state)
    benchmark::DoNotOptimize(writeFieldCsv(study(), plan(), field(), results(), sink));
  static_cast<void>(std::fclose(nowhere));
}

void writeByPrintf(benchmark::State& state) {
  std::FILE* nowhere = std::fopen("/dev/null", "w");
  for (auto _ : state)
    for (std::size_t i = 0; i < field().size(); ++i) {
      const PointResult one = results()[i];
      const std::string_view name = field().nameOf(i);
      std::fprintf(nowhere, "%.*s,%.12g,%.12g,%s,%s,%s,%.6f\n", static_cast<int>(name.size()), name.data(),
                   one.utilisation, *one.multiplier(), plan().combinations[one.combination].name.c_str(),
                   plan().checks[one.check].setup.id.c_str(), "interaction", one.worstAngle);
    }
  static_cast<void>(std::fclose(nowhere));
}

/// Prints what Google Benchmark prints, and keeps the medians.
class Medians : public benchmark::ConsoleReporter {
public:
  void ReportRuns(const std::vector<Run>& runs) override {
    ConsoleReporter::ReportRuns(runs);
    for (const Run& run : runs)
      if (run.run_type == Run::RT_Iteration)
        m_times[run.run_name.function_name].push_back(run.cpu_accumulated_time /
                                                      static_cast<double>(run.iterations));
  }

  /// Seconds; 0 of what was not run.
  double of(const std::string& name) const {
    const auto found = m_times.find(name);
    if (found == m_times.end())
      return 0;
    std::vector<double> times = found->second;
    std::ranges::sort(times);
    return times[times.size() / 2];
  }

private:
  std::map<std::string, std::vector<double>> m_times;
};

void say(const char* what, double ratio, const char* bar) {
  if (ratio > 0 && std::isfinite(ratio))
    std::printf("%-60s %8.2f   bar: %s\n", what, ratio, bar);
}

/// Multiplications, additions and comparisons of one point of the form of squares with 32 combinations.
constexpr double operationsOf32 = 32 * (3 * 11 + 2 + 9) + cases * 10;

void sayRatios(const Medians& t) {
  say("principal values / stream", t.of("principal") / t.of("stream 3 to 4"), "at most 3");
  say("Eigen computeDirect / principal values", t.of("principal by Eigen") / t.of("principal"),
      "at least 25");
  say("8 combinations / stream", t.of("combinations of 8") / t.of("stream 20 to 2"), "at most 4");
  const double peakTime = t.of("peak") * operationsOf32 * static_cast<double>(points) / peakOperations;
  say("32 combinations / max(stream, operations at peak)",
      t.of("combinations of 32") / std::max(t.of("stream 20 to 2"), peakTime), "at most 3");
  say("exact band, no linear terms / stream", t.of("band of squares") / t.of("stream 5 to 2"), "at most 8");
  say("exact band, linear terms / stream", t.of("band with linear terms") / t.of("stream 5 to 2"),
      "at most 12");
  constexpr double share = static_cast<double>(points) / scanned;
  say("scan at 0.1 deg / exact band, no linear terms",
      share * t.of("scan of squares") / t.of("band of squares"), "at least 30");
  say("scan at 0.1 deg / exact band, linear terms",
      share * t.of("scan with linear terms") / t.of("band with linear terms"), "at least 30");
  say("fprintf / writing", t.of("write by fprintf") / t.of("write"), "at least 2");
  const double files = t.of("read") + t.of("write");
  say("read, judge with band and write / read and write", (files + t.of("judge")) / files, "at most 2.5");
}

void registerAll() {
  const auto add = [](const char* name, auto work) {
    benchmark::RegisterBenchmark(name, work)->Unit(benchmark::kMillisecond);
  };
  add("stream 3 to 4", [](benchmark::State& s) { stream(s, 3, 4); });
  add("principal", principal);
  add("principal by Eigen", principalEigen);
  add("stream 20 to 2", [](benchmark::State& s) { stream(s, 3 * cases + 2, 2); });
  add("combinations of 8", [](benchmark::State& s) { combinations(s, 8); });
  add("combinations of 32", [](benchmark::State& s) { combinations(s, 32); });
  add("peak", peak);
  add("stream 5 to 2", [](benchmark::State& s) { stream(s, 5, 2); });
  add("band of squares", [](benchmark::State& s) { exactBand(s, squares, &keepSquaresInBand); });
  add("band with linear terms", [](benchmark::State& s) { exactBand(s, linear, &keepLinearInBand); });
  add("scan of squares", [](benchmark::State& s) { scannedBand(s, squares); });
  add("scan with linear terms", [](benchmark::State& s) { scannedBand(s, linear); });
  add("read", [](benchmark::State& s) { read(s, wideTable()); });
  add("judge", judge);
  add("write", write);
  add("write by fprintf", writeByPrintf);
  if (!longTable.empty())
    add("read long", [](benchmark::State& s) { read(s, longTable); });
  if (!longTable.empty())
    add("read bare", [](benchmark::State& s) {
      for (auto _ : s)
        benchmark::DoNotOptimize(readBare(longTable));
    });
}

} // namespace
} // namespace planewright

int main(int argc, char** argv) {
  using namespace planewright;
  benchmark::Initialize(&argc, argv);
  if (argc > 1) {
    std::ifstream file(argv[1], std::ios::binary);
    longTable.assign(std::istreambuf_iterator<char>(file), {});
  }
  registerAll();
  Medians medians;
  benchmark::RunSpecifiedBenchmarks(&medians);
  sayRatios(medians);
}
