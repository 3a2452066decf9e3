// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/wide_memory.h"

#include <algorithm>
#include <cstdlib>
#include <new>

#include <sys/mman.h>

namespace planewright {

namespace {

constexpr std::size_t largePage = std::size_t{2} << 20;
constexpr std::size_t largeFrom = std::size_t{4} << 20;
constexpr std::size_t cacheLine = 64;
constexpr std::size_t slabBytes = std::size_t{8} << 20;

std::size_t roundedUp(std::size_t bytes, std::size_t unit) {
  return (bytes + unit - 1) / unit * unit;
}

} // namespace

void* wideMemory(std::size_t bytes) {
  const bool isLarge = bytes >= largeFrom;
  const std::size_t unit = isLarge ? largePage : cacheLine;
  void* memory = std::aligned_alloc(unit, roundedUp(std::max<std::size_t>(bytes, 1), unit));
  if (!memory)
    throw std::bad_alloc();
#ifdef MADV_HUGEPAGE
  if (isLarge) // a wish: where it is not granted, small pages serve too
    static_cast<void>(::madvise(memory, roundedUp(bytes, unit), MADV_HUGEPAGE));
#endif
  return memory;
}

void freeWideMemory(void* memory) {
  std::free(memory);
}

double* Pieces::next() {
  const std::size_t perSlab = std::max<std::size_t>(slabBytes / sizeof(double) / m_size, 1);
  if (m_left == 0) {
    m_slabs.emplace_back(wideMemory(perSlab * m_size * sizeof(double)));
    m_left = perSlab;
  }
  double* slab = static_cast<double*>(m_slabs.back().get());
  return slab + (perSlab - m_left--) * m_size;
}

} // namespace planewright
