// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/kernels.h"

#include <vector>

namespace planewright {

/// All kernels of one build of their sources.
struct KernelSet {
  decltype(&resolveLane) resolve;
  decltype(&combineLane) combine;
  decltype(&keepSquares) squares;
  decltype(&keepLinear) linear;
  decltype(&keepRatios) ratios;
  decltype(&keepSum) sum;
  decltype(&keepSquaresInBand) squaresInBand;
  decltype(&keepLinearInBand) linearInBand;
  decltype(&keepRatiosInBand) ratiosInBand;
  decltype(&keepSumInBand) sumInBand;
  decltype(&principalLane) principal;
};

/// A build for one level of processors, and whether this one has it.
struct Level {
  const char* name;
  bool isHere;
  KernelSet kernels;
};

KernelSet kernelsOfProgram();
/// None where the compiler or the machine knows no levels.
std::vector<Level> levels();

} // namespace planewright
