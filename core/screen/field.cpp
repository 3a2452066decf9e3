// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field.h"

#include <algorithm>
#include <cassert>
#include <cmath>
#include <limits>

namespace planewright {

namespace {
constexpr double none = std::numeric_limits<double>::quiet_NaN();
}

template <>
const std::vector<Named<Layer>>& namesOf() {
  static const std::vector<Named<Layer>> names = {{Layer::none, "", {}},
                                                  {Layer::top, "top", PW_TEXT("Field", "top")},
                                                  {Layer::mid, "mid", PW_TEXT("Field", "mid")},
                                                  {Layer::bottom, "bottom", PW_TEXT("Field", "bottom")}};
  return names;
}

Field::Field(std::vector<std::string> cases, Columns columns)
    : m_cases(std::move(cases)), m_columns(columns), m_blocks(m_cases.size()) {}

std::string_view Field::nameOf(std::size_t point) const {
  const std::size_t from = point == 0 ? 0 : m_ends[point - 1];
  return {m_names.data() + from, m_ends[point] - from};
}

double Field::lineOf(std::size_t point) const {
  return m_columns.line ? m_lines[point] : none;
}

std::string_view Field::regionOf(std::size_t point) const {
  return m_columns.region ? m_regionNames[m_regions[point]] : std::string_view();
}

double Field::xOf(std::size_t point) const {
  return m_columns.x ? m_xs[point] : none;
}

double Field::yOf(std::size_t point) const {
  return m_columns.y ? m_ys[point] : none;
}

bool Field::hasStress(std::size_t loadCase, std::size_t point) const {
  const double* rows = block(loadCase, point / blockSize);
  return rows && !std::isnan(rows[point % blockSize]);
}

PlaneStress Field::stressOf(std::size_t loadCase, std::size_t point) const {
  const double* rows = block(loadCase, point / blockSize);
  if (!rows)
    return {none, none, none};
  const std::size_t at = point % blockSize;
  return {rows[at], rows[blockSize + at], rows[2 * blockSize + at]};
}

const double* Field::block(std::size_t loadCase, std::size_t block) const {
  const std::vector<double*>& blocks = m_blocks[loadCase];
  return block < blocks.size() ? blocks[block] : nullptr;
}

std::size_t Field::add(std::string_view name, Layer layer, std::uint32_t fileLine) {
  m_names.insert(m_names.end(), name.begin(), name.end());
  m_ends.push_back(m_names.size());
  m_fileLines.push_back(fileLine);
  m_standings.push_back(PointStanding::whole);
  if (m_columns.layer)
    m_layers.push_back(layer);
  if (m_columns.axes)
    m_axes.push_back(0);
  if (m_columns.line)
    m_lines.push_back(none);
  if (m_columns.x)
    m_xs.push_back(none);
  if (m_columns.y)
    m_ys.push_back(none);
  if (m_columns.region)
    m_regions.push_back(0);
  return size() - 1;
}

void Field::setStress(std::size_t loadCase, std::size_t point, const PlaneStress& stress) {
  assert(point < size());
  assert(std::isfinite(stress.sx) && std::isfinite(stress.sy) && std::isfinite(stress.txy));
  std::vector<double*>& blocks = m_blocks[loadCase];
  const std::size_t number = point / blockSize;
  if (number >= blocks.size())
    blocks.resize(number + 1);
  double*& rows = blocks[number];
  if (!rows) {
    rows = m_pieces.next();
    std::fill_n(rows, 3 * blockSize, none);
  }
  const std::size_t at = point % blockSize;
  rows[at] = stress.sx;
  rows[blockSize + at] = stress.sy;
  rows[2 * blockSize + at] = stress.txy;
}

void Field::setPlace(std::size_t point, double x, double y) {
  if (m_columns.x)
    m_xs[point] = x;
  if (m_columns.y)
    m_ys[point] = y;
}

void Field::setRegion(std::size_t point, std::string_view region) {
  // Rows of a region mostly stand together: the last one is looked at first.
  const auto isIt = [region](const std::string& name) { return name == region; };
  if (point > 0 && isIt(m_regionNames[m_regions[point - 1]])) {
    m_regions[point] = m_regions[point - 1];
    return;
  }
  const auto known = std::ranges::find_if(m_regionNames, isIt);
  m_regions[point] = static_cast<std::uint32_t>(known - m_regionNames.begin());
  if (known == m_regionNames.end())
    m_regionNames.emplace_back(region);
}

} // namespace planewright
