// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field_rows.h"

#include "core/screen/summary.h"

#include <algorithm>
#include <bit>
#include <charconv>
#include <cmath>
#include <limits>
#include <unordered_map>

namespace planewright {

namespace {

using std::string_view;

constexpr std::size_t piece = 1 << 15; // rows between two looks at whether it goes on
constexpr std::uint64_t last = std::numeric_limits<std::uint64_t>::max();

struct Item {
  std::uint64_t key; ///< `last` where there is no value
  std::uint32_t point;
};

/// Whole numbers in the order of the doubles; `last` is none of them.
std::uint64_t orderedBits(double value) {
  const auto bits = std::bit_cast<std::uint64_t>(value + 0.0); // no -0
  constexpr std::uint64_t sign = std::uint64_t{1} << 63;
  return bits & sign ? ~bits : bits | sign;
}

char small(char letter) {
  return letter >= 'A' && letter <= 'Z' ? static_cast<char>(letter - 'A' + 'a') : letter;
}

bool isDigit(char letter) {
  return letter >= '0' && letter <= '9';
}

/// Takes the digits at the start of a text off it, without the zeros before them.
string_view takeNumber(string_view& text) {
  std::size_t end = 0;
  while (end < text.size() && isDigit(text[end]))
    ++end;
  string_view number = text.substr(0, end);
  text.remove_prefix(end);
  number.remove_prefix(std::min(number.find_first_not_of('0'), number.size()));
  return number;
}

/// Names in the order of their letters, the numbers in them in that of their values.
bool isNameBefore(string_view a, string_view b) {
  while (!a.empty() && !b.empty()) {
    if (isDigit(a.front()) && isDigit(b.front())) {
      const string_view one = takeNumber(a);
      const string_view other = takeNumber(b);
      if (one.size() != other.size())
        return one.size() < other.size();
      if (one != other)
        return one < other;
    } else if (a.front() != b.front()) {
      return static_cast<unsigned char>(a.front()) < static_cast<unsigned char>(b.front());
    } else {
      a.remove_prefix(1);
      b.remove_prefix(1);
    }
  }
  return a.size() < b.size();
}

/// Sorts in pieces that are merged, so that it can be ended between two; false where it was.
template <class Value, class Less>
bool sortInPieces(std::vector<Value>& values, Less less, const GoesOn& goesOn) {
  const auto at = [](std::vector<Value>& of, std::size_t i) {
    return of.begin() + static_cast<std::ptrdiff_t>(std::min(i, of.size()));
  };
  for (std::size_t from = 0; from < values.size(); from += piece) {
    if (!goesOn())
      return false;
    std::sort(at(values, from), at(values, from + piece), less);
  }
  std::vector<Value> merged(values.size() > piece ? values.size() : 0);
  for (std::size_t width = piece; width < values.size(); width *= 2) {
    for (std::size_t from = 0; from < values.size(); from += 2 * width) {
      if (!goesOn())
        return false;
      std::merge(at(values, from), at(values, from + width), at(values, from + width),
                 at(values, from + 2 * width), at(merged, from), less);
    }
    values.swap(merged);
  }
  return true;
}

class Rows {
public:
  Rows(const Field& field, const FieldResults& results, const GoesOn& goesOn)
      : m_field(field), m_results(results), m_goesOn(goesOn) {}

  bool filter(const FieldFilter& filter) {
    std::string text = filter.text;
    std::ranges::transform(text, text.begin(), small);
    m_points.reserve(m_field.size());
    for (std::size_t point = 0; point < m_field.size(); ++point) {
      if (point % piece == 0 && !m_goesOn())
        return false;
      if (isWanted(point, filter) &&
          (text.empty() || holds(m_field.nameOf(point), text) || holds(m_field.regionOf(point), text)))
        m_points.push_back(static_cast<std::uint32_t>(point));
    }
    return true;
  }

  bool sort(const FieldSort& sort) {
    switch (sort.key) {
    case FieldKey::point:
      return sortByName(sort.isFalling);
    case FieldKey::region:
      rankRegions();
      return sortBy(sort.isFalling, [this](std::size_t i) { return m_ranks.at(m_field.regionOf(i)); });
    case FieldKey::layer:
      return sortBy(sort.isFalling,
                    [this](std::size_t i) { return static_cast<double>(m_field.layerOf(i)); });
    case FieldKey::x:
      return sortBy(sort.isFalling, [this](std::size_t i) { return m_field.xOf(i); });
    case FieldKey::y:
      return sortBy(sort.isFalling, [this](std::size_t i) { return m_field.yOf(i); });
    default:
      return sortBy(sort.isFalling, [this, key = sort.key](std::size_t i) { return ofResult(i, key); });
    }
  }

  std::vector<std::uint32_t> taken() { return std::move(m_points); }

private:
  bool isWanted(std::size_t point, const FieldFilter& filter) const {
    const double utilisation = m_results.utilisations()[point];
    if (std::isnan(utilisation))
      return !filter.exceedingOnly && !filter.from && !filter.combination && !filter.bin;
    return !(filter.exceedingOnly && !exceedsLimit(utilisation)) &&
           !(filter.from && utilisation < *filter.from) &&
           !(filter.combination && m_results[point].combination != *filter.combination) &&
           !(filter.bin && binOf(utilisation) != *filter.bin);
  }

  static bool holds(string_view words, string_view text) {
    return std::ranges::search(words, text, {}, small).begin() != words.end();
  }

  /// NaN where the point has no such value.
  double ofResult(std::size_t point, FieldKey key) const {
    constexpr double none = std::numeric_limits<double>::quiet_NaN();
    const PointResult result = m_results[point];
    if (!result.isJudged())
      return none;
    switch (key) {
    case FieldKey::multiplier:
      return result.multiplier().value_or(none);
    case FieldKey::combination:
      return static_cast<double>(result.combination);
    case FieldKey::check:
      return static_cast<double>(result.check);
    case FieldKey::mode:
      return result.mode ? static_cast<double>(*result.mode) : none;
    case FieldKey::worstAngle:
      return result.worstAngle;
    default:
      return result.utilisation;
    }
  }

  template <class ValueOf>
  bool sortBy(bool isFalling, ValueOf valueOf) {
    std::vector<Item> items;
    items.reserve(m_points.size());
    for (const std::uint32_t point : m_points) {
      const double value = valueOf(point);
      const std::uint64_t bits = std::isnan(value) ? last : orderedBits(value);
      items.push_back({isFalling && bits != last ? ~bits : bits, point});
    }
    return sortItems(items);
  }

  bool sortItems(std::vector<Item>& items) {
    const auto isBefore = [](const Item& a, const Item& b) {
      return a.key != b.key ? a.key < b.key : a.point < b.point;
    };
    if (!sortInPieces(items, isBefore, m_goesOn))
      return false;
    std::ranges::transform(items, m_points.begin(), &Item::point);
    return true;
  }

  /// Most tables number their points: what is a number behind the same letters is sorted as one.
  bool sortByName(bool isFalling) {
    if (std::optional<std::vector<Item>> numbered = numbers()) {
      for (Item& item : *numbered)
        item.key = isFalling ? ~item.key - 1 : item.key;
      return sortItems(*numbered);
    }
    const auto isBefore = [&](std::uint32_t a, std::uint32_t b) {
      const string_view one = m_field.nameOf(a);
      const string_view other = m_field.nameOf(b);
      if (isFalling ? isNameBefore(other, one) : isNameBefore(one, other))
        return true;
      return !(isFalling ? isNameBefore(one, other) : isNameBefore(other, one)) && a < b;
    };
    return sortInPieces(m_points, isBefore, m_goesOn);
  }

  std::optional<std::vector<Item>> numbers() const {
    std::vector<Item> items;
    items.reserve(m_points.size());
    if (m_points.empty())
      return items;
    const string_view first = m_field.nameOf(m_points.front());
    const string_view letters = first.substr(0, first.find_last_not_of("0123456789") + 1);
    for (const std::uint32_t point : m_points) {
      const string_view name = m_field.nameOf(point);
      if (!name.starts_with(letters))
        return std::nullopt;
      const char* end = name.data() + name.size();
      std::uint64_t number = 0;
      const auto read = std::from_chars(name.data() + letters.size(), end, number);
      if (read.ec != std::errc() || read.ptr != end || number >= last - 1)
        return std::nullopt;
      items.push_back({number, point});
    }
    return items;
  }

  void rankRegions() {
    std::vector<string_view> names;
    for (const std::uint32_t point : m_points)
      if (m_ranks.try_emplace(m_field.regionOf(point)).second)
        names.push_back(m_field.regionOf(point));
    std::ranges::sort(names, isNameBefore);
    double rank = 0;
    for (const string_view name : names)
      m_ranks[name] = rank++;
  }

  const Field& m_field;
  const FieldResults& m_results;
  const GoesOn& m_goesOn;
  std::vector<std::uint32_t> m_points;
  std::unordered_map<string_view, double> m_ranks; ///< of regions
};

} // namespace

std::optional<std::vector<std::uint32_t>> fieldRowsOf(const Field& field, const FieldResults& results,
                                                      const FieldFilter& filter, const FieldSort& sort,
                                                      const GoesOn& goesOn) {
  Rows rows(field, results, goesOn);
  if (!rows.filter(filter) || !rows.sort(sort))
    return std::nullopt;
  return rows.taken();
}

} // namespace planewright
