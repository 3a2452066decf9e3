// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <algorithm>
#include <cstddef>
#include <ctime>
#include <string>
#include <vector>

namespace planewright {

/// Times of one thing, in ms of the thread's own processor time: on an idle machine the time that passes, on
/// a shared one at least not the time of others.
class Samples {
public:
  explicit Samples(std::string name) : m_name(std::move(name)) {}

  template <class Work>
  void time(Work work) {
    const double start = now();
    work();
    add(now() - start);
  }

  void add(double time) { m_times.push_back(time); }

  const std::string& name() const { return m_name; }
  double median() const { return at(0.5); }
  double percentile99() const { return at(0.99); }

private:
  static double now() {
    timespec time{};
    clock_gettime(CLOCK_THREAD_CPUTIME_ID, &time);
    return 1e3 * static_cast<double>(time.tv_sec) + 1e-6 * static_cast<double>(time.tv_nsec);
  }

  double at(double share) const {
    std::vector<double> sorted = m_times;
    std::ranges::sort(sorted);
    return sorted[static_cast<std::size_t>(share * static_cast<double>(sorted.size() - 1))];
  }

  std::string m_name;
  std::vector<double> m_times;
};

} // namespace planewright
