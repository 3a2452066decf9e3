// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/point_index.h"

#include <cstring>

namespace planewright {

namespace {

std::uint64_t mixed(std::uint64_t value) {
  value *= 0x9E3779B97F4A7C15U;
  return value ^ (value >> 29);
}

std::uint32_t hashOf(std::string_view name, Layer layer) {
  std::uint64_t hash = mixed(name.size() * 4 + static_cast<std::uint64_t>(layer));
  for (; name.size() >= 8; name.remove_prefix(8)) {
    std::uint64_t word = 0;
    std::memcpy(&word, name.data(), 8);
    hash = mixed(hash ^ word);
  }
  std::uint64_t rest = 0;
  for (const char c : name)
    rest = rest << 8 | static_cast<unsigned char>(c);
  return static_cast<std::uint32_t>(mixed(mixed(hash ^ rest)) >> 32);
}

} // namespace

std::optional<std::size_t> PointIndex::find(std::string_view name, Layer layer) {
  for (const std::size_t near : {m_last, m_last + 1})
    if (near < m_count && isIt(near, name, layer))
      return m_last = near;
  m_soughtHash = hashOf(name, layer);
  const std::size_t mask = m_slots.size() - 1;
  for (m_soughtSlot = m_soughtHash & mask;; m_soughtSlot = (m_soughtSlot + 1) & mask) {
    const Slot& slot = m_slots[m_soughtSlot];
    if (slot.point == 0)
      return std::nullopt;
    if (slot.hash == m_soughtHash && isIt(slot.point - 1, name, layer))
      return m_last = slot.point - 1;
  }
}

void PointIndex::added(std::size_t point) {
  m_slots[m_soughtSlot] = {m_soughtHash, static_cast<std::uint32_t>(point + 1)};
  m_last = point;
  if (2 * ++m_count > m_slots.size())
    grow();
}

void PointIndex::grow() {
  WideVector<Slot> slots(2 * m_slots.size());
  const std::size_t mask = slots.size() - 1;
  for (const Slot& one : m_slots) {
    if (one.point == 0)
      continue;
    std::size_t at = one.hash & mask;
    while (slots[at].point != 0)
      at = (at + 1) & mask;
    slots[at] = one;
  }
  m_slots = std::move(slots);
}

} // namespace planewright
