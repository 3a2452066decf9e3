// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field.h"

#include <optional>

namespace planewright {

/// Finds points of a field by name and layer. What was asked last is looked at first, then the next point:
/// tables go through their points in one of these two ways.
class PointIndex {
public:
  explicit PointIndex(const Field& field) : m_field(&field), m_slots(1024) {}

  std::optional<std::size_t> find(std::string_view name, Layer layer);
  /// The point, which was sought last and not found, was added to the field.
  void added(std::size_t point);

private:
  bool isIt(std::size_t point, std::string_view name, Layer layer) const {
    return m_field->nameOf(point) == name && m_field->layerOf(point) == layer;
  }
  void grow();

  /// Where a point is noted, with its hash: names are compared, and looked up far away, only where that is
  /// the same.
  struct Slot {
    std::uint32_t hash = 0;
    std::uint32_t point = 0; ///< its number and 1; 0 is free
  };

  const Field* m_field;
  WideVector<Slot> m_slots;
  std::size_t m_count = 0;
  std::size_t m_last = 0;
  std::uint32_t m_soughtHash = 0; ///< of what was not found last, with the slot that it would have
  std::size_t m_soughtSlot = 0;
};

} // namespace planewright
