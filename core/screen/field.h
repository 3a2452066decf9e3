// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/wide_memory.h"
#include "core/stress/plane_stress.h"
#include "core/words/names.h"

#include <cstdint>
#include <string>
#include <string_view>

namespace planewright {

/// The face of a shell that a row of a field speaks of.
enum class Layer : std::uint8_t { none, top, mid, bottom };
template <>
const std::vector<Named<Layer>>& namesOf<Layer>();

/// Whether a point of a field is judged.
enum class PointStanding : std::uint8_t {
  whole,      ///< all that is needed is there
  incomplete, ///< a case that acts is missing, or a row of it was faulty
  leftOut     ///< on request, by its name or region
};

/// The stresses of very many points for several load cases, in N/mm2 and the study's sign convention, each in
/// the axes of its point. A structure of arrays in blocks: what is read is never moved, and a block of one
/// case is three rows of values, sx, sy and txy. A value that was not given is NaN; none that was given is.
class Field {
public:
  static constexpr std::size_t blockSize = 1024; ///< points

  /// What a table has besides names and stresses.
  struct Columns {
    bool layer = false, axes = false, line = false, region = false, x = false, y = false;
  };

  Field() = default;
  /// `cases` are ids of the study.
  Field(std::vector<std::string> cases, Columns columns);

  std::size_t size() const { return m_ends.size(); }
  std::size_t blocks() const { return (size() + blockSize - 1) / blockSize; }
  const std::vector<std::string>& cases() const { return m_cases; }
  const Columns& columns() const { return m_columns; }

  std::string_view nameOf(std::size_t point) const;
  Layer layerOf(std::size_t point) const { return m_columns.layer ? m_layers[point] : Layer::none; }
  /// The line of the file on which the point was first given.
  std::uint32_t fileLineOf(std::size_t point) const { return m_fileLines[point]; }
  /// Turn of the point's x axis from the x axis in which lines are given, in degrees; 0 unless given.
  double axesOf(std::size_t point) const { return m_columns.axes ? m_axes[point] : 0; }
  /// The point's own angle of the line in degrees; NaN where it has the study's.
  double lineOf(std::size_t point) const;
  std::string_view regionOf(std::size_t point) const;
  /// Where the point lies, mm; NaN where that is not given.
  double xOf(std::size_t point) const;
  double yOf(std::size_t point) const;
  bool hasStress(std::size_t loadCase, std::size_t point) const;
  PlaneStress stressOf(std::size_t loadCase, std::size_t point) const;
  PointStanding standingOf(std::size_t point) const { return m_standings[point]; }

  /// Three rows of blockSize values; null where no point of the block has the case.
  const double* block(std::size_t loadCase, std::size_t block) const;

  /// Adds a point without stresses; gives its number.
  std::size_t add(std::string_view name, Layer layer, std::uint32_t fileLine);
  void setStress(std::size_t loadCase, std::size_t point, const PlaneStress& stress);
  void setAxes(std::size_t point, double degrees) { m_axes[point] = degrees; }
  void setLine(std::size_t point, double degrees) { m_lines[point] = degrees; }
  void setPlace(std::size_t point, double x, double y);
  void setRegion(std::size_t point, std::string_view region);
  void setStanding(std::size_t point, PointStanding standing) { m_standings[point] = standing; }

private:
  std::vector<std::string> m_cases;
  Columns m_columns;
  WideVector<char> m_names;
  WideVector<std::size_t> m_ends; ///< of each name in m_names
  WideVector<std::uint32_t> m_fileLines;
  WideVector<PointStanding> m_standings;
  WideVector<Layer> m_layers;
  WideVector<double> m_axes, m_lines, m_xs, m_ys;
  WideVector<std::uint32_t> m_regions; ///< number in m_regionNames
  std::vector<std::string> m_regionNames = {""};
  Pieces m_pieces{3 * blockSize};
  std::vector<std::vector<double*>> m_blocks; ///< of each case
};

} // namespace planewright
