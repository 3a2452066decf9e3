// SPDX-License-Identifier: GPL-3.0-or-later
// The kernels once more, for one level of processors: the build gives the level, another name to the
// namespace, PW_ONE_LEVEL and the name of the table.
#include "core/screen/band_kernels.cpp"
#include "core/screen/nominal_kernels.cpp"
#include "core/screen/principal_kernels.cpp"
#include "core/screen/state_kernels.cpp"

extern "C" const void* const PW_TABLE[];
extern "C" const void* const PW_TABLE[] = {reinterpret_cast<const void*>(&planewright::resolveLane),
                                           reinterpret_cast<const void*>(&planewright::combineLane),
                                           reinterpret_cast<const void*>(&planewright::keepSquares),
                                           reinterpret_cast<const void*>(&planewright::keepLinear),
                                           reinterpret_cast<const void*>(&planewright::keepRatios),
                                           reinterpret_cast<const void*>(&planewright::keepSum),
                                           reinterpret_cast<const void*>(&planewright::keepSquaresInBand),
                                           reinterpret_cast<const void*>(&planewright::keepLinearInBand),
                                           reinterpret_cast<const void*>(&planewright::keepRatiosInBand),
                                           reinterpret_cast<const void*>(&planewright::keepSumInBand),
                                           reinterpret_cast<const void*>(&planewright::principalLane)};
