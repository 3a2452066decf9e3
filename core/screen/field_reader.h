// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field.h"
#include "core/screen/field_columns.h"
#include "core/words/problem.h"

#include <memory>

namespace planewright {

/// What came of a table of very many points.
struct FieldReading {
  Field field;
  FieldColumns columns;
  std::size_t rows = 0; ///< below the header, without blank ones
  std::size_t faultyRows = 0;
  std::size_t notFinite = 0; ///< of them, those with a number that is infinite or none
  /// Points that lack a case that acts, or of which a row was doubled or at odds with another.
  std::size_t incompletePoints = 0;
  /// The first hundred faulty rows and incomplete points, by their line.
  Problems faults;

  bool isSound() const { return faultyRows == 0 && incompletePoints == 0; }
};

/// Reads a table of very many points, given in pieces of any size. Nothing of the table is kept but one row
/// that a piece cuts; numbers go straight into the field, in N/mm2, degrees and mm.
///
/// In the long form the rows of a point may stand anywhere. A point that lacks a case that acts in some
/// combination is incomplete, never taken as zero there; a case that acts and of which the whole table has
/// nothing is a Problem. A point of the same name and layer twice (in the long form with the same case twice)
/// is a fault of the second row and makes the point incomplete, since nobody can tell which one is meant; so
/// do rows of a point that differ in axes, line, region or place. Faulty rows leave nothing behind, also no
/// point that has no other row.
class FieldReader {
public:
  /// `acts`: of each case of the study, whether a point needs it.
  FieldReader(const Study& study, std::vector<bool> acts, std::vector<MappedHeading> mapped = {});
  ~FieldReader();

  /// The next piece. Problems where the header tells no table; what follows is then passed over.
  Results<void> take(std::string_view bytes);
  /// After the last piece; the reader is empty then.
  Results<FieldReading> finish();

private:
  class Rows;
  Results<void> takeLine(std::string_view line);

  const Study& m_study;
  std::vector<bool> m_acts;
  std::vector<MappedHeading> m_mapped;
  std::string m_cut; ///< the start of a row that the last piece cut
  std::uint32_t m_line = 0;
  std::unique_ptr<Rows> m_rows; ///< from the header on
  bool m_isRefused = false;
};

} // namespace planewright
