// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field.h"

#include <optional>

namespace planewright {

/// Finds points of a field by name and layer. What was asked last is looked at first, then the next point:
/// tables go through their points in one of these two ways.
class PointIndex {
public:
  explicit PointIndex(const Field& field) : m_field(&field), m_slots(1024, 0) {}

  std::optional<std::size_t> find(std::string_view name, Layer layer);
  /// The point was added to the field last.
  void added(std::size_t point);

private:
  bool isIt(std::size_t point, std::string_view name, Layer layer) const {
    return m_field->nameOf(point) == name && m_field->layerOf(point) == layer;
  }
  std::size_t slotOf(std::string_view name, Layer layer) const;
  void put(std::size_t point);

  const Field* m_field;
  WideVector<std::uint32_t> m_slots; ///< number of a point and 1; 0 is free
  std::size_t m_count = 0;
  std::size_t m_last = 0;
};

} // namespace planewright
