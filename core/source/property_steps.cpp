// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/shown_count.h"
#include "core/source/pieces.h"
#include "core/source/section_properties.h"

#include <algorithm>
#include <cassert>
#include <cmath>
#include <numbers>

namespace planewright {

namespace {

Text commonPractice() {
  return PW_TEXT("Source", "common practice, no source");
}

Formula sym(const std::string& name) {
  return Formula::symbol(name);
}

/// Pieces of one name taken together, with the symbols of their numbers.
struct Part {
  Text name;
  bool isPlate = false;
  double b = 0, h = 0;
  AreaMoments own; ///< area and centroid from the bottom left corner, second moments about its own centroid
  std::string index;
};

/// Moments about a centroid in place of the origin.
AreaMoments aboutCentroid(AreaMoments moments) {
  moments.yy -= moments.y * moments.y / moments.area;
  moments.zz -= moments.z * moments.z / moments.area;
  moments.yz -= moments.y * moments.z / moments.area;
  moments.y /= moments.area;
  moments.z /= moments.area;
  return moments;
}

std::vector<Part> partsOf(const Section& section) {
  const std::vector<Piece> pieces = piecesOf(section);
  const auto bottom = std::ranges::min_element(pieces, {}, &Piece::yLow)->yLow;
  const auto left = std::ranges::min_element(pieces, {}, &Piece::zLow)->zLow;
  std::vector<Part> parts;
  for (const Piece& piece : pieces) {
    auto part = std::ranges::find(parts, piece.name, &Part::name);
    if (part == parts.end())
      part = parts.insert(
          part, {piece.name, piece.kind == Piece::Kind::plate, piece.width(), piece.height(), {}, {}});
    part->own = part->own + momentsOf(moved(piece.contour, -bottom, -left));
  }
  for (std::size_t i = 0; i < parts.size(); ++i) {
    parts[i].own = aboutCentroid(parts[i].own);
    parts[i].index = shownCount(i + 1);
  }
  return parts;
}

/// Writes the steps of one section.
class Working {
public:
  Working(const Section& section, const WrittenUnits& units)
      : m_section(section), m_units(units), m_properties(propertiesOf(regionOf(section))) {}

  std::vector<Step> steps() {
    switch (m_section.shape) {
    case SectionShape::rectangle:
      addRectangle();
      break;
    case SectionShape::circle:
    case SectionShape::tube:
      addRound();
      break;
    case SectionShape::box:
      addBox();
      break;
    default:
      addComposed();
    }
    if (m_properties.Iyz == 0)
      addModuli();
    return std::move(m_steps);
  }

private:
  void add(Text name, const char* symbolOf, Formula formula, NumbersPutIn numbers, double result,
           Dimension dimension, Text source = commonPractice()) {
    m_steps.push_back(m_units.step(std::move(name), symbolOf, std::move(formula), std::move(numbers), result,
                                   dimension, std::move(source)));
  }
  void addArea(Formula formula, NumbersPutIn numbers) {
    add(PW_TEXT("Source", "area"), "A", std::move(formula), std::move(numbers), m_properties.A,
        dimension::area);
  }
  void addSecond(bool aboutZ, Formula formula, NumbersPutIn numbers) {
    add(aboutZ ? PW_TEXT("Source", "second moment about the level axis z")
               : PW_TEXT("Source", "second moment about the upright axis y"),
        aboutZ ? "I_{z}" : "I_{y}", std::move(formula), std::move(numbers),
        aboutZ ? m_properties.Iz : m_properties.Iy, dimension::secondMoment);
  }

  NumbersPutIn sizes() const {
    NumbersPutIn numbers;
    for (const SizeKind& kind : sizesOf(m_section.shape))
      numbers.push_back(m_units.put(kind.symbol.source, m_section.size(kind.key), kind.dimension));
    return numbers;
  }

  void addRectangle() {
    const Formula b = sym("b");
    const Formula h = sym("h");
    addArea(b * h, sizes());
    addSecond(true, b * power(h, 3) / 12, sizes());
    addSecond(false, h * power(b, 3) / 12, sizes());
  }

  void addRound() {
    const Formula d = sym("d");
    const bool hollow = m_section.shape == SectionShape::tube;
    const Formula inner = d - 2 * sym("t");
    const auto powers = [&](double n) { return hollow ? power(d, n) - power(inner, n) : power(d, n); };
    NumbersPutIn numbers = sizes();
    numbers.push_back(WrittenUnits::pi());
    addArea(sym("π") * powers(2) / 4, numbers);
    addSecond(true, sym("π") * powers(4) / 64, numbers);
    addSecond(false, sym("π") * powers(4) / 64, numbers);
  }

  void addBox() {
    const Formula b = sym("b");
    const Formula h = sym("h");
    const Formula width = b - 2 * sym("t_{w}");
    const Formula depth = h - 2 * sym("t_{f}");
    addArea(b * h - width * depth, sizes());
    addSecond(true, (b * power(h, 3) - width * power(depth, 3)) / 12, sizes());
    addSecond(false, (h * power(b, 3) - depth * power(width, 3)) / 12, sizes());
  }

  void addComposed() {
    const std::vector<Part> parts = partsOf(m_section);
    for (const Part& part : parts)
      putIn(part);
    addArea(sum(parts, [&](const Part& part) { return areaOf(part); }), m_numbers);
    m_numbers.push_back(m_units.put("A", m_properties.A, dimension::area));
    addCentroid(parts, "y", PW_TEXT("Source", "centroid above the bottom"),
                m_properties.centroidFromBottom());
    addCentroid(parts, "z", PW_TEXT("Source", "centroid from the left end"), m_properties.centroidFromLeft());
    for (const bool aboutZ : {true, false})
      addSecond(aboutZ, sum(parts, [&](const Part& part) { return shiftedSecond(part, aboutZ); }), m_numbers);
    if (m_properties.Iyz != 0)
      add(PW_TEXT("Source", "product of inertia"), "I_{yz}",
          sum(parts, [&](const Part& part) { return shiftedProduct(part); }), m_numbers, m_properties.Iyz,
          dimension::secondMoment);
  }

  template <class Term>
  static Formula sum(const std::vector<Part>& parts, Term term) {
    Formula total = term(parts.front());
    for (std::size_t i = 1; i < parts.size(); ++i)
      total = total + term(parts[i]);
    return total;
  }

  static std::string with(const char* letter, const Part& part, const char* axis = "") {
    return std::string(letter) + "_{" + axis + part.index + "}";
  }

  /// The numbers of a part; areas and second moments with a step of their own where it is no plate.
  void putIn(const Part& part) {
    if (part.isPlate) {
      m_numbers.push_back(m_units.put(with("b", part), part.b, dimension::length));
      m_numbers.push_back(m_units.put(with("h", part), part.h, dimension::length));
    } else {
      addOwn(part, with("A", part), part.own.area, dimension::area);
      addOwn(part, with("I", part, "z"), part.own.yy, dimension::secondMoment);
      addOwn(part, with("I", part, "y"), part.own.zz, dimension::secondMoment);
      if (m_section.shape == SectionShape::built)
        addOwn(part, with("I", part, "yz"), part.own.yz, dimension::secondMoment);
    }
    m_numbers.push_back(m_units.put(with("y", part), part.own.y, dimension::length));
    m_numbers.push_back(m_units.put(with("z", part), part.own.z, dimension::length));
  }

  void addOwn(const Part& part, const std::string& symbolOf, double value, Dimension dimension) {
    m_numbers.push_back(m_units.put(symbolOf, value, dimension));
    const Formula formula = m_section.shape == SectionShape::i ? ofFillets(symbolOf) : ofBlock(symbolOf);
    NumbersPutIn numbers = m_section.shape == SectionShape::i ? sizes() : blockSizes(part);
    numbers.push_back(WrittenUnits::pi());
    // The names stand in the order of the sums: part 1, part 2 ...
    add(PW_TEXT("Source", "part %1, %2").with(part.index).with(part.name), symbolOf.c_str(), formula,
        std::move(numbers), value, dimension);
  }

  /// Of two fillets: each r^2 (1 - pi/4), its centroid r (10 - 3 pi)/(3 (4 - pi)) from either wall.
  Formula ofFillets(const std::string& symbolOf) const {
    const Formula r = sym("r");
    const Formula pi = sym("π");
    if (symbolOf.starts_with("A"))
      return (2 - pi / 2) * power(r, 2);
    const Formula own = (Formula(1) / 3 - pi / 16 - 1 / (9 * (4 - pi))) * power(r, 4);
    if (symbolOf.starts_with("I_{z"))
      return 2 * own;
    const Formula out = sym("t_{w}") / 2 + (10 - 3 * pi) / (3 * (4 - pi)) * r;
    return 2 * own + (2 - pi / 2) * power(r, 2) * power(out, 2);
  }

  Formula ofBlock(const std::string& symbolOf) const {
    const Formula b = sym("b");
    const Formula h = sym("h");
    const Formula c = cosine(sym("ψ"));
    const Formula s = sine(sym("ψ"));
    if (symbolOf.starts_with("A"))
      return b * h;
    if (symbolOf.starts_with("I_{yz"))
      return b * h * (power(b, 2) - power(h, 2)) * s * c / 12;
    return symbolOf.starts_with("I_{z") ? b * h * (power(h * c, 2) + power(b * s, 2)) / 12
                                        : b * h * (power(b * c, 2) + power(h * s, 2)) / 12;
  }

  NumbersPutIn blockSizes(const Part& part) const {
    const std::vector<Block> blocks = blocksOf(m_section);
    const auto isPart = [&](std::size_t i) { return shownCount(i + 1) == part.index; };
    std::size_t i = 0;
    while (!isPart(i))
      ++i;
    return {m_units.put("b", blocks[i].b, dimension::length),
            m_units.put("h", blocks[i].h, dimension::length),
            WrittenUnits::angle("ψ", blocks[i].turn.degrees())};
  }

  static Formula areaOf(const Part& part) {
    return part.isPlate ? sym(with("b", part)) * sym(with("h", part)) : sym(with("A", part));
  }

  static Formula ownSecond(const Part& part, bool aboutZ) {
    if (!part.isPlate)
      return sym(with("I", part, aboutZ ? "z" : "y"));
    const Formula b = sym(with("b", part));
    const Formula h = sym(with("h", part));
    return aboutZ ? b * power(h, 3) / 12 : h * power(b, 3) / 12;
  }

  static Formula offset(const Part& part, const char* axis) {
    return sym(with(axis, part)) - sym(std::string(axis) + "_{s}");
  }

  static Formula shiftedSecond(const Part& part, bool aboutZ) {
    return ownSecond(part, aboutZ) + areaOf(part) * power(offset(part, aboutZ ? "y" : "z"), 2);
  }

  static Formula shiftedProduct(const Part& part) {
    const Formula shift = areaOf(part) * offset(part, "y") * offset(part, "z");
    return part.isPlate ? shift : sym(with("I", part, "yz")) + shift;
  }

  void addCentroid(const std::vector<Part>& parts, const char* axis, Text name, double value) {
    const std::string symbolOf = std::string(axis) + "_{s}";
    add(std::move(name), symbolOf.c_str(),
        sum(parts, [&](const Part& part) { return areaOf(part) * sym(with(axis, part)); }) / sym("A"),
        m_numbers, value, dimension::length);
    m_numbers.push_back(m_units.put(symbolOf, value, dimension::length));
  }

  void addModuli() {
    const SectionProperties& p = m_properties;
    addModulus(PW_TEXT("Source", "section modulus of the top fibre"), "W_{z,top}", "I_{z}", "y_{top}", p.Iz,
               p.yTop);
    addModulus(PW_TEXT("Source", "section modulus of the bottom fibre"), "W_{z,bot}", "I_{z}", "y_{bot}",
               p.Iz, -p.yBottom);
    addModulus(PW_TEXT("Source", "section modulus of the right fibre"), "W_{y,right}", "I_{y}", "z_{right}",
               p.Iy, p.zRight);
    addModulus(PW_TEXT("Source", "section modulus of the left fibre"), "W_{y,left}", "I_{y}", "z_{left}",
               p.Iy, -p.zLeft);
  }

  void addModulus(Text name, const char* symbolOf, const char* second, const char* distance,
                  double secondValue, double distanceValue) {
    add(std::move(name), symbolOf, sym(second) / sym(distance),
        {m_units.put(second, secondValue, dimension::secondMoment),
         m_units.put(distance, distanceValue, dimension::length)},
        secondValue / distanceValue, dimension::firstMoment);
  }

  const Section& m_section;
  const WrittenUnits& m_units;
  SectionProperties m_properties;
  NumbersPutIn m_numbers; ///< of the parts and of what was found so far
  std::vector<Step> m_steps;
};

} // namespace

std::vector<Step> propertySteps(const Section& section, const WrittenUnits& units) {
  return Working(section, units).steps();
}

} // namespace planewright
