// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/page_flow.h"

namespace planewright {

namespace {

/// Fills one page after the other.
class Pages {
public:
  explicit Pages(double height) : m_height(height) {}

  void place(const std::vector<PageStrip>& strips) {
    for (std::size_t from = 0; from < strips.size();) {
      std::size_t to = from;
      while (strips[to].keepsWithNext && to + 1 < strips.size())
        ++to;
      if (!fits(strips, from, to))
        begin();
      for (; from <= to; ++from)
        place(strips[from]);
    }
  }

  std::vector<std::vector<PicturePart>> taken() { return std::move(m_pages); }

private:
  bool isFresh() const { return m_used == 0; }

  void begin() {
    if (isFresh())
      return;
    m_pages.emplace_back();
    m_used = 0;
  }

  double needed(const PageStrip& strip, bool first) const {
    return (first ? (strip.head ? strip.head->height : 0) : strip.before) + strip.height;
  }

  bool fits(const std::vector<PageStrip>& strips, std::size_t from, std::size_t to) const {
    double used = m_used;
    for (std::size_t i = from; i <= to; ++i)
      used += needed(strips[i], used == 0);
    return used <= m_height;
  }

  void put(const PageStrip& strip) {
    for (const PicturePart& part : strip.parts)
      m_pages.back().push_back(moved(part, {0, m_used}));
    m_used += strip.height;
  }

  void place(const PageStrip& strip) {
    if (!isFresh() && m_used + needed(strip, false) > m_height)
      begin();
    if (!isFresh())
      m_used += strip.before;
    else if (strip.head)
      put(*strip.head);
    put(strip);
  }

  double m_height;
  double m_used = 0;
  std::vector<std::vector<PicturePart>> m_pages{1};
};

} // namespace

std::vector<std::vector<PicturePart>> flowed(const std::vector<PageStrip>& strips, double height) {
  Pages pages(height);
  pages.place(strips);
  return pages.taken();
}

} // namespace planewright
