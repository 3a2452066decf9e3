// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/kernels.h"

#include <string_view>
#include <vector>

namespace planewright {

// What the kernels of very many points are held against: the memory, the processor, and what a user would
// write instead.

/// Reads all inputs and writes all outputs, with intrinsics: a plain loop is cut into copies by the compiler,
/// and is then no limit. `size` is a multiple of 8.
void streamThrough(const std::vector<const double*>& inputs, const std::vector<double*>& outputs,
                   std::size_t size);

/// Multiplications and additions per second that one thread can make, at the width the kernels have here; one
/// call makes `peakOperations`.
inline constexpr double peakOperations = 12 * 1e6 * 2;
double spinAtPeak();

/// The greatest of a form over directions 0.1 deg apart, by turning with a table.
class BandScan {
public:
  explicit BandScan(double tolerance);
  void keep(const double* state, const SquaresForm& form, double* best, double* which) const;
  void keep(const double* state, const LinearForm& form, double* best, double* which) const;
  std::size_t directions() const { return m_cos2.size(); }

private:
  template <class Form, class Kernel>
  void scan(const double* state, const Form& form, Kernel kernel, double* best, double* which) const;
  std::vector<double> m_cos2, m_sin2;
};

/// Principal values and direction of each point by Eigen's closed form for 2 by 2; `made` has four rows.
void principalByEigen(const double* sx, const double* sy, const double* txy, double* const made[4],
                      std::size_t size);

/// The sum of the three numbers of each row point,case,sx,sy,txy: by the library's reader of numbers and
/// nothing else, without a check, a name or a place to keep them. Reading can hardly be faster on one thread.
double readBare(std::string_view table);

} // namespace planewright
