// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/bench/screen_rivals.h"

#include <Eigen/Dense>

#include <charconv>
#include <cmath>
#include <cstring>
#include <numbers>

#include <immintrin.h>

namespace planewright {

namespace {

bool isWide() {
  return __builtin_cpu_supports("avx512f") != 0;
}

__attribute__((target("avx512f"))) void streamWide(const std::vector<const double*>& inputs,
                                                   const std::vector<double*>& outputs, std::size_t size) {
  for (std::size_t i = 0; i < size; i += 8) {
    __m512d sum = _mm512_setzero_pd();
    for (const double* input : inputs)
      sum = _mm512_add_pd(sum, _mm512_loadu_pd(input + i));
    for (double* output : outputs)
      _mm512_storeu_pd(output + i, sum);
  }
}

__attribute__((target("avx2"))) void streamNarrow(const std::vector<const double*>& inputs,
                                                  const std::vector<double*>& outputs, std::size_t size) {
  for (std::size_t i = 0; i < size; i += 4) {
    __m256d sum = _mm256_setzero_pd();
    for (const double* input : inputs)
      sum = _mm256_add_pd(sum, _mm256_loadu_pd(input + i));
    for (double* output : outputs)
      _mm256_storeu_pd(output + i, sum);
  }
}

/// Twelve sums that do not wait for each other; `lanes` numbers each.
constexpr int sums = 12;

__attribute__((target("avx512f,fma"))) double spinWide() {
  __m512d sum[sums];
  for (int k = 0; k < sums; ++k)
    sum[k] = _mm512_set1_pd(1 + k);
  const __m512d a = _mm512_set1_pd(0.999), b = _mm512_set1_pd(1e-3);
  for (int i = 0; i < static_cast<int>(peakOperations) / (sums * 2 * 8); ++i)
    for (int k = 0; k < sums; ++k)
      sum[k] = _mm512_fmadd_pd(sum[k], a, b);
  double all = 0;
  for (int k = 0; k < sums; ++k)
    all += _mm512_reduce_add_pd(sum[k]);
  return all;
}

__attribute__((target("avx2,fma"))) double spinNarrow() {
  __m256d sum[sums];
  for (int k = 0; k < sums; ++k)
    sum[k] = _mm256_set1_pd(1 + k);
  const __m256d a = _mm256_set1_pd(0.999), b = _mm256_set1_pd(1e-3);
  for (int i = 0; i < static_cast<int>(peakOperations) / (sums * 2 * 4); ++i)
    for (int k = 0; k < sums; ++k)
      sum[k] = _mm256_fmadd_pd(sum[k], a, b);
  double all = 0;
  for (int k = 0; k < sums; ++k)
    all += _mm256_cvtsd_f64(sum[k]);
  return all;
}

} // namespace

void streamThrough(const std::vector<const double*>& inputs, const std::vector<double*>& outputs,
                   std::size_t size) {
  if (isWide())
    streamWide(inputs, outputs, size);
  else
    streamNarrow(inputs, outputs, size);
}

double spinAtPeak() {
  return isWide() ? spinWide() : spinNarrow();
}

BandScan::BandScan(double tolerance) {
  const int steps = static_cast<int>(std::lround(tolerance * 10));
  for (int i = -steps; i <= steps; ++i) {
    m_cos2.push_back(std::cos(2 * 0.1 * i * std::numbers::pi / 180));
    m_sin2.push_back(std::sin(2 * 0.1 * i * std::numbers::pi / 180));
  }
}

template <class Form, class Kernel>
void BandScan::scan(const double* state, const Form& form, Kernel kernel, double* best, double* which) const {
  double turned[stateSize];
  for (std::size_t k = 0; k < m_cos2.size(); ++k) {
    const double cos2 = m_cos2[k], sin2 = m_sin2[k];
    for (std::size_t i = 0; i < laneSize; ++i) {
      turned[i] = state[i];
      turned[laneSize + i] = state[laneSize + i] * cos2 + state[2 * laneSize + i] * sin2;
      turned[2 * laneSize + i] = state[2 * laneSize + i] * cos2 - state[laneSize + i] * sin2;
    }
    kernel(turned, form, static_cast<double>(k), best, which);
  }
}

void BandScan::keep(const double* state, const SquaresForm& form, double* best, double* which) const {
  scan(state, form, &keepSquares, best, which);
}

void BandScan::keep(const double* state, const LinearForm& form, double* best, double* which) const {
  scan(state, form, &keepLinear, best, which);
}

double readBare(std::string_view table) {
  const char* at = table.data();
  const char* const end = at + table.size();
  const auto behind = [&](char c) {
    at = static_cast<const char*>(std::memchr(at, c, static_cast<std::size_t>(end - at))) + 1;
  };
  double sum = 0;
  behind('\n');
  while (at < end) {
    behind(',');
    behind(',');
    for (int i = 0; i < 3; ++i) {
      double value = 0;
      at = std::from_chars(at, end, value).ptr + 1;
      sum += value;
    }
  }
  return sum;
}

void principalByEigen(const double* sx, const double* sy, const double* txy, double* const made[4],
                      std::size_t size) {
  for (std::size_t i = 0; i < size; ++i) {
    Eigen::Matrix2d stress;
    stress << sx[i], txy[i], txy[i], sy[i];
    Eigen::SelfAdjointEigenSolver<Eigen::Matrix2d> solver;
    solver.computeDirect(stress);
    made[0][i] = solver.eigenvalues()[1];
    made[1][i] = solver.eigenvalues()[0];
    made[2][i] = 0.5 * (made[0][i] - made[1][i]);
    const Eigen::Vector2d axis = solver.eigenvectors().col(1);
    made[3][i] = std::atan2(axis[1], axis[0]) * 180 / std::numbers::pi;
  }
}

} // namespace planewright
