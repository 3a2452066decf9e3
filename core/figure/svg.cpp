// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/svg.h"

#include "core/figure/metrics.h"
#include "core/quantity/angle.h"
#include "core/words/markup.h"

#include <array>
#include <cassert>
#include <charconv>
#include <cmath>

namespace planewright {

namespace {

/// At most three decimals, never "-0".
std::string number(double value) {
  std::array<char, 400> digits{};
  const auto end =
      std::to_chars(digits.data(), digits.data() + digits.size(), value, std::chars_format::fixed, 3);
  assert(end.ec == std::errc());
  std::string result(digits.data(), end.ptr);
  result.erase(result.find_last_not_of('0') + 1);
  if (result.back() == '.')
    result.pop_back();
  return result == "-0" ? "0" : result;
}

std::string colour(Role role, Palette palette) {
  constexpr std::string_view hex = "0123456789abcdef";
  const std::uint32_t rgb = colourOf(role, palette).rgb;
  std::string result = "#";
  for (int shift = 20; shift >= 0; shift -= 4)
    result += hex[(rgb >> shift) & 0xF];
  return result;
}

std::string attribute(std::string_view name, std::string_view value) {
  return " " + std::string(name) + "=\"" + std::string(value) + "\"";
}

std::string attribute(std::string_view name, double value) {
  return attribute(name, number(value));
}

std::string strokeOf(const std::optional<Pen>& pen, Palette palette) {
  if (!pen)
    return {};
  std::string result =
      attribute("stroke", colour(pen->role, palette)) + attribute("stroke-width", pen->width);
  std::string dashes;
  for (const double length : dashLengths(pen->dash))
    dashes += (dashes.empty() ? "" : " ") + number(length * pen->width);
  return dashes.empty() ? result : result + attribute("stroke-dasharray", dashes);
}

std::string fillOf(const std::optional<Role>& fill, Palette palette) {
  return attribute("fill", fill ? colour(*fill, palette) : "none");
}

std::string pair(Vec at) {
  return number(at.x) + " " + number(at.y);
}

/// Writes the parts of one picture.
class Writer {
public:
  explicit Writer(Palette palette) : m_palette(palette) {}

  std::string operator()(const Path& path) const {
    std::string course;
    for (const Vec point : path.points)
      course += (course.empty() ? "M" : "L") + pair(point);
    if (path.closed)
      course += "Z";
    return "<path" + attribute("d", course) + fillOf(path.fill, m_palette) + strokeOf(path.pen, m_palette) +
           "/>\n";
  }

  std::string operator()(const Arc& arc) const {
    const std::string paint = fillOf(arc.fill, m_palette) + strokeOf(arc.pen, m_palette) + "/>\n";
    if (std::abs(arc.sweep) >= 360)
      return "<circle" + attribute("cx", arc.centre.x) + attribute("cy", arc.centre.y) +
             attribute("r", arc.radius) + paint;
    const auto at = [&](double degrees) {
      const CosSin d = cosSin(Angle::fromDegrees(degrees));
      return arc.centre + arc.radius * Vec{d.cos, -d.sin};
    };
    const std::string radius = number(arc.radius);
    const std::string course = "M" + pair(at(arc.start)) + "A" + radius + " " + radius + " 0 " +
                               (std::abs(arc.sweep) > 180 ? "1 " : "0 ") + (arc.sweep > 0 ? "0 " : "1 ") +
                               pair(at(arc.start + arc.sweep));
    return "<path" + attribute("d", course) + paint;
  }

  std::string operator()(const Label& label) const {
    constexpr std::array anchors = {"start", "middle", "end"};
    std::string result = label.ground ? ground(boxOf(label)) : std::string();
    result += "<text" + attribute("x", label.at.x) + attribute("y", label.at.y) +
              attribute("font-size", label.size) + attribute("fill", colour(label.role, m_palette));
    if (label.align != Align::start)
      result += attribute("text-anchor", anchors[static_cast<std::size_t>(label.align)]);
    if (label.bold)
      result += attribute("font-weight", "bold");
    return result + ">" + spans(label) + "</text>\n";
  }

private:
  std::string ground(const Box& box) const {
    return "<rect" + attribute("x", box.left) + attribute("y", box.top) +
           attribute("width", box.right - box.left) + attribute("height", box.bottom - box.top) +
           attribute("fill", colour(Role::canvas, m_palette)) + "/>\n";
  }

  /// The runs; a lowered one goes down and the next one up again.
  static std::string spans(const Label& label) {
    std::string result;
    bool down = false;
    for (const Run& run : label.runs) {
      const double shift = (run.lowered ? loweredDrop : 0) - (down ? loweredDrop : 0);
      down = run.lowered;
      if (!run.lowered && shift == 0) {
        result += markupOf(run.text);
        continue;
      }
      result += "<tspan";
      if (run.lowered)
        result += attribute("font-size", loweredSize * label.size);
      if (shift != 0)
        result += attribute("dy", shift * label.size);
      result += ">" + markupOf(run.text) + "</tspan>";
    }
    return result;
  }

  Palette m_palette;
};

} // namespace

std::string svgOf(const Picture& picture, Palette palette) {
  const std::string width = number(picture.width);
  const std::string height = number(picture.height);
  // Spaces are kept so that a text is as wide as it was measured.
  std::string result =
      "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<svg xmlns=\"http://www.w3.org/2000/svg\"" +
      attribute("width", width + "mm") + attribute("height", height + "mm") +
      attribute("viewBox", "0 0 " + width + " " + height) +
      attribute("font-family", "Liberation Sans, Arial, Helvetica, sans-serif") +
      attribute("font-kerning", "none") + attribute("xml:space", "preserve") + ">\n";
  result += "<title>" + markupOf(picture.title) + "</title>\n";
  result += "<desc>" + markupOf(picture.description) + "</desc>\n";
  result += "<rect" + attribute("width", width) + attribute("height", height) +
            attribute("fill", colour(Role::canvas, palette)) + "/>\n";
  for (const auto& part : picture.parts)
    result += std::visit(Writer(palette), part);
  return result + "</svg>\n";
}

} // namespace planewright
