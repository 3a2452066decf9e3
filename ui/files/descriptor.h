// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <cerrno>
#include <utility>

#include <unistd.h>

namespace planewright {

/// An open file of the system, closed at the end of its life.
class Descriptor {
public:
  Descriptor() = default;
  explicit Descriptor(int number) : m_number(number) {}
  Descriptor(Descriptor&& other) noexcept : m_number(std::exchange(other.m_number, -1)) {}
  Descriptor& operator=(Descriptor&& other) noexcept {
    std::swap(m_number, other.m_number);
    return *this;
  }
  ~Descriptor() { errorOfClosing(); }

  explicit operator bool() const { return m_number >= 0; }
  int number() const { return m_number; }

  /// Closes now; 0, or the error that only closing shows on some disks.
  int errorOfClosing() {
    const int number = std::exchange(m_number, -1);
    return number >= 0 && ::close(number) != 0 ? errno : 0;
  }

private:
  int m_number = -1;
};

} // namespace planewright
