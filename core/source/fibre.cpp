// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/fibre.h"

#include <cmath>

namespace planewright {

template <>
const std::vector<Named<View>>& namesOf() {
  static const std::vector<Named<View>> names = {
      {View::side, "side", PW_TEXT("Source", "from the side (x-y plane, seen from +z)")},
      {View::top, "top", PW_TEXT("Source", "from the top (x-z plane, seen from +y)")}};
  return names;
}

template <>
const std::vector<Named<ShearRule>>& namesOf() {
  static const std::vector<Named<ShearRule>> names = {
      {ShearRule::upward, "upward", PW_TEXT("Source", "V_{y} positive upwards on the +x face")},
      {ShearRule::slope, "slope", PW_TEXT("Source", "V_{y} = dM_{z}/dx")}};
  return names;
}

namespace {

/// Gathers the ready places of one section.
class Places {
public:
  explicit Places(const SectionModel& model) : m_section(model.section), m_region(model.region) {
    if (model.isTabled())
      return;
    const bool isRound = m_section.shape == SectionShape::circle || m_section.shape == SectionShape::tube;
    addExtreme(PW_TEXT("Source", "extreme fibre, top"), m_region.yHigh, View::side);
    if (!isRound)
      addCorners(m_region.yHigh, PW_TEXT("Source", "top corner, near face"),
                 PW_TEXT("Source", "top corner, far face"));
    addWalls();
    if (!isRound)
      addCorners(m_region.yLow, PW_TEXT("Source", "bottom corner, near face"),
                 PW_TEXT("Source", "bottom corner, far face"));
    addExtreme(PW_TEXT("Source", "extreme fibre, bottom"), m_region.yLow, View::side);
    addExtreme(PW_TEXT("Source", "top face, middle"), m_region.yHigh, View::top);
    addFlanges();
    addExtreme(PW_TEXT("Source", "bottom face, middle"), m_region.yLow, View::top);
  }

  std::vector<NamedFibre> taken() { return std::move(m_places); }

private:
  void add(Text name, double y, double z, View view = View::side) {
    const auto cleared = [&](double place) { return std::abs(place) <= m_region.slack() ? 0 : place; };
    m_places.push_back({std::move(name), {cleared(y), cleared(z), view}});
  }

  std::vector<Span> inside(double y) const { return spansAt(m_region, y, y > 0 ? Side::below : Side::above); }

  /// Where the widest material at the extreme height has its middle.
  void addExtreme(Text name, double y, View view) {
    Span widest{0, 0};
    for (const Span& span : inside(y))
      if (span.length() > widest.length())
        widest = span;
    add(std::move(name), y, (widest.from + widest.to) / 2, view);
  }

  void addCorners(double y, Text near, Text far) {
    const std::vector<Span> spans = inside(y);
    if (spans.empty())
      return;
    add(std::move(near), y, spans.back().to);
    add(std::move(far), y, spans.front().from);
  }

  /// Places on the web or the upright walls, at the junctions and on the level axis.
  void addWalls() {
    const std::vector<double> levels = levelsOf(m_region);
    const bool hasJunctions =
        m_section.shape != SectionShape::circle && m_section.shape != SectionShape::tube;
    bool axisAdded = false;
    for (auto level = levels.rbegin(); level != levels.rend(); ++level) {
      if (!axisAdded && *level <= 0) {
        addAxis();
        axisAdded = true;
      }
      if (hasJunctions && isJunction(*level))
        addWall(*level, *level > 0 ? PW_TEXT("Source", "upper junction, near face")
                                   : PW_TEXT("Source", "lower junction, near face"));
    }
  }

  bool isJunction(double level) const {
    return m_region.yLow < level && level < m_region.yHigh && !isUnderFillet(level);
  }

  /// Where root fillets meet a flange no face of the web is seen; it begins at their other end.
  bool isUnderFillet(double level) const {
    if (m_section.shape != SectionShape::i || m_section.size("r") == 0)
      return false;
    const double slack = m_region.slack();
    return std::abs(m_region.yHigh - m_section.size("t_top") - level) <= slack ||
           std::abs(m_region.yLow + m_section.size("t_bottom") - level) <= slack;
  }

  void addAxis() {
    addWall(0, PW_TEXT("Source", "axis, near face"));
    const std::vector<Span> spans = thinSpans(0);
    if (spans.empty())
      return;
    add(PW_TEXT("Source", "axis, far face"), 0, spans.front().from);
    add(PW_TEXT("Source", "axis, middle"), 0, (spans.back().from + spans.back().to) / 2);
  }

  void addWall(double y, Text name) {
    const std::vector<Span> spans = thinSpans(y);
    if (!spans.empty())
      add(std::move(name), y, spans.back().to);
  }

  std::vector<Span> thinSpans(double y) const {
    const std::vector<Span> below = spansAt(m_region, y, Side::below);
    const std::vector<Span> above = spansAt(m_region, y, Side::above);
    const auto length = [](const std::vector<Span>& spans) {
      double sum = 0;
      for (const Span& span : spans)
        sum += span.length();
      return sum;
    };
    return above.empty() || (!below.empty() && length(below) < length(above)) ? below : above;
  }

  /// Where a flange leaves the web, on its outer face seen from the top.
  void addFlanges() {
    switch (m_section.shape) {
    case SectionShape::i: {
      const double z = m_section.size("t_w") / 2 + m_section.size("r");
      add(PW_TEXT("Source", "top flange beside the web"), m_region.yHigh, z, View::top);
      return add(PW_TEXT("Source", "bottom flange beside the web"), m_region.yLow, z, View::top);
    }
    case SectionShape::t:
      return add(PW_TEXT("Source", "flange beside the web"), m_region.yHigh, m_section.size("t_w") / 2,
                 View::top);
    case SectionShape::channel: {
      const double z = m_region.zLow + m_section.size("t_w");
      add(PW_TEXT("Source", "top flange beside the web"), m_region.yHigh, z, View::top);
      return add(PW_TEXT("Source", "bottom flange beside the web"), m_region.yLow, z, View::top);
    }
    default:
      return;
    }
  }

  const Section& m_section;
  const Region& m_region;
  std::vector<NamedFibre> m_places;
};

} // namespace

std::vector<NamedFibre> readyFibres(const SectionModel& model) {
  return Places(model).taken();
}

} // namespace planewright
