// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <cstddef>
#include <memory>
#include <vector>

namespace planewright {

/// Memory for arrays of very many points. Large pieces ask the system for large pages: the first touch of a
/// million small ones costs more than all the arithmetic on them. Throws std::bad_alloc as `new` does.
void* wideMemory(std::size_t bytes);
void freeWideMemory(void* memory);

template <class T>
struct WideAllocator {
  using value_type = T;
  WideAllocator() = default;
  template <class U>
  WideAllocator(const WideAllocator<U>&) {}
  T* allocate(std::size_t count) { return static_cast<T*>(wideMemory(count * sizeof(T))); }
  void deallocate(T* memory, std::size_t) { freeWideMemory(memory); }
  bool operator==(const WideAllocator&) const = default;
};

/// An array with a value for each of very many points.
template <class T>
using WideVector = std::vector<T, WideAllocator<T>>;

/// Hands out many pieces of one size, which are never moved and go all at once.
class Pieces {
public:
  /// `size` values each.
  explicit Pieces(std::size_t size) : m_size(size) {}
  /// A new piece; its values are not set.
  double* next();

private:
  std::size_t m_size;
  std::size_t m_left = 0; ///< pieces in the last slab that are not handed out
  struct Free {
    void operator()(void* memory) const { freeWideMemory(memory); }
  };
  std::vector<std::unique_ptr<void, Free>> m_slabs;
};

} // namespace planewright
