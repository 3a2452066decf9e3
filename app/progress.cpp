// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/progress.h"

#include "core/quantity/format.h"
#include "ui/files/file_bytes.h"

#include <cmath>

#include <unistd.h>

namespace planewright {

namespace {

constexpr auto pause = std::chrono::milliseconds(100);
constexpr const char* lineAway = "\r\033[K";

void show(const std::string& line) {
  static_cast<void>(writeTo(STDERR_FILENO, lineAway + line, ""));
}

} // namespace

Progress::Progress()
    : m_isShown(::isatty(STDERR_FILENO) == 1), m_next(std::chrono::steady_clock::now() + pause) {}

Progress::~Progress() {
  if (m_hasLine)
    show("");
}

void Progress::tell(const Text& work, std::size_t done, std::size_t all) {
  const auto now = std::chrono::steady_clock::now();
  if (!m_isShown || now < m_next)
    return;
  m_next = now + pause;
  m_hasLine = true;
  const double share = all > 0 ? static_cast<double>(done) / static_cast<double>(all) : 0;
  show(all > 0 ? plain(work) + " " + exactNumber(std::floor(100 * share)) + " %" : plain(work));
}

} // namespace planewright
