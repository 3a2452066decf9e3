// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/quantity/shown_count.h"
#include "core/source/block_contact.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

/// Gathers what is wrong with one section.
class Inspection {
public:
  explicit Inspection(const Section& section) : m_section(section) {}

  Problems problems() {
    inspectSizes();
    if (m_problems.empty())
      inspectFit();
    return std::move(m_problems);
  }

private:
  void add(std::string_view key, Text what, Text mend) {
    const auto row = m_section.sizes.find(key);
    const bool shown = row != m_section.sizes.end() && std::isfinite(row->second);
    m_problems.push_back({std::string(key), 0, 0, shown ? exactNumber(row->second) : std::string(),
                          std::move(what), std::move(mend)});
  }

  void inspectSizes() {
    std::vector<std::string> known;
    if (m_section.shape == SectionShape::built) {
      for (int n = 1; n == 1 || hasBlock(n); ++n)
        for (const SizeKind& kind : sizesOf(m_section.shape))
          known.push_back(inspect(blockKey(n, kind.key), kind));
    } else {
      for (const SizeKind& kind : sizesOf(m_section.shape))
        known.push_back(inspect(std::string(kind.key), kind));
    }
    for (const auto& [key, value] : m_section.sizes)
      if (std::ranges::find(known, key) == known.end())
        add(key, PW_TEXT("Source", "This shape has no size %1.").with(key),
            PW_TEXT("Source", "Leave it out, or choose the shape that has it."));
  }

  bool hasBlock(int number) const {
    return std::ranges::any_of(sizesOf(SectionShape::built), [&](const SizeKind& kind) {
      return m_section.sizes.contains(blockKey(number, kind.key));
    });
  }

  std::string inspect(std::string key, const SizeKind& kind) {
    const auto row = m_section.sizes.find(key);
    if (row == m_section.sizes.end()) {
      if (!kind.optional)
        add(key, PW_TEXT("Source", "The %1 is missing.").with(kind.meaning), PW_TEXT("Source", "Give it."));
    } else if (!std::isfinite(row->second)) {
      add(key, PW_TEXT("Source", "The %1 is no finite number.").with(kind.meaning),
          PW_TEXT("Source", "Give a finite one."));
    } else if (kind.range == SizeRange::positive && row->second <= 0) {
      add(key, PW_TEXT("Source", "The %1 must be greater than zero.").with(kind.meaning),
          PW_TEXT("Source", "Give it without a sign."));
    } else if (kind.range == SizeRange::zeroOrMore && row->second < 0) {
      add(key, PW_TEXT("Source", "The %1 must not be negative.").with(kind.meaning),
          PW_TEXT("Source", "Give it without a sign, or 0 where there is none."));
    }
    return key;
  }

  double size(std::string_view key) const { return m_section.size(key); }

  void inspectFit() {
    switch (m_section.shape) {
    case SectionShape::tube:
      return fits("t", 2 * size("t"), size("d"), PW_TEXT("Source", "half the diameter"));
    case SectionShape::box:
      fits("t_w", 2 * size("t_w"), size("b"), PW_TEXT("Source", "half the width"));
      return fits("t_f", 2 * size("t_f"), size("h"), PW_TEXT("Source", "half the depth"));
    case SectionShape::i:
      return inspectI();
    case SectionShape::t:
      fits("t_f", size("t_f"), size("h"), PW_TEXT("Source", "the depth"));
      return fits("t_w", size("t_w"), size("b"), PW_TEXT("Source", "the width of the flange"));
    case SectionShape::channel:
      fits("t_f", 2 * size("t_f"), size("h"), PW_TEXT("Source", "half the depth"));
      return fits("t_w", size("t_w"), size("b"), PW_TEXT("Source", "the width of the flange"));
    case SectionShape::built:
      return inspectBlocks();
    default:
      return;
    }
  }

  void fits(std::string_view key, double needed, double available, Text limit) {
    if (needed >= available)
      add(key, PW_TEXT("Source", "This wall is as thick as %1 or thicker.").with(std::move(limit)),
          PW_TEXT("Source", "Give a thinner wall, or choose the solid shape."));
  }

  void inspectI() {
    fits("t_top", size("t_top") + size("t_bottom"), size("h"),
         PW_TEXT("Source", "the depth that the other flange leaves"));
    const double flange = std::min(size("b_top"), size("b_bottom"));
    fits("t_w", size("t_w"), flange, PW_TEXT("Source", "the width of the flange"));
    const double clear = size("h") - size("t_top") - size("t_bottom");
    if (m_problems.empty() && (2 * size("r") >= clear || size("t_w") + 2 * size("r") > flange))
      add("r", PW_TEXT("Source", "The root fillets do not fit between web and flanges."),
          PW_TEXT("Source", "Give a smaller radius, or 0 for sharp corners."));
  }

  void inspectBlocks() {
    const std::vector<Block> blocks = blocksOf(m_section);
    for (std::size_t i = 0; i < blocks.size(); ++i)
      for (std::size_t k = 0; k < i; ++k)
        if (contactOf(blocks[i], blocks[k]) == Contact::overlapping)
          add(blockKey(static_cast<int>(i) + 1, "b"),
              PW_TEXT("Source", "Block %1 overlaps block %2.")
                  .with(shownCount(i + 1))
                  .with(shownCount(k + 1)),
              PW_TEXT("Source", "Move one of them so that they only touch."));
    for (const int number : looseBlocks(blocks))
      add(blockKey(number, "b"),
          PW_TEXT("Source", "Block %1 does not hang together with block 1.").with(exactNumber(number)),
          PW_TEXT("Source", "Move it until edges touch; a section of loose parts does not bend as one."));
  }

  const Section& m_section;
  Problems m_problems;
};

} // namespace

Problems problemsOf(const Section& section) {
  return Inspection(section).problems();
}

} // namespace planewright
