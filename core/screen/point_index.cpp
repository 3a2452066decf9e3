// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/point_index.h"

#include <cstring>

namespace planewright {

namespace {

std::uint64_t mixed(std::uint64_t value) {
  value *= 0x9E3779B97F4A7C15U;
  return value ^ (value >> 29);
}

std::uint64_t hashOf(std::string_view name, Layer layer) {
  std::uint64_t hash = mixed(name.size() * 4 + static_cast<std::uint64_t>(layer));
  for (; name.size() >= 8; name.remove_prefix(8)) {
    std::uint64_t word = 0;
    std::memcpy(&word, name.data(), 8);
    hash = mixed(hash ^ word);
  }
  std::uint64_t rest = 0;
  for (const char c : name)
    rest = rest << 8 | static_cast<unsigned char>(c);
  return mixed(mixed(hash ^ rest));
}

} // namespace

std::size_t PointIndex::slotOf(std::string_view name, Layer layer) const {
  const std::size_t mask = m_slots.size() - 1;
  std::size_t slot = hashOf(name, layer) & mask;
  while (m_slots[slot] != 0 && !isIt(m_slots[slot] - 1, name, layer))
    slot = (slot + 1) & mask;
  return slot;
}

std::optional<std::size_t> PointIndex::find(std::string_view name, Layer layer) {
  for (const std::size_t near : {m_last, m_last + 1})
    if (near < m_count && isIt(near, name, layer))
      return m_last = near;
  const std::uint32_t found = m_slots[slotOf(name, layer)];
  if (found == 0)
    return std::nullopt;
  return m_last = found - 1;
}

void PointIndex::put(std::size_t point) {
  m_slots[slotOf(m_field->nameOf(point), m_field->layerOf(point))] = static_cast<std::uint32_t>(point + 1);
}

void PointIndex::added(std::size_t point) {
  ++m_count;
  m_last = point;
  if (2 * m_count <= m_slots.size())
    return put(point);
  m_slots.assign(2 * m_slots.size(), 0);
  for (std::size_t one = 0; one < m_count; ++one)
    put(one);
}

} // namespace planewright
