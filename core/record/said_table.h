// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/column_texts.h"
#include "core/record/pasted_points.h"

#include <map>
#include <unordered_map>

namespace planewright {

/// The points, cases and sections of a study, found without searching them. It keeps references to the study.
class KnownThings {
public:
  explicit KnownThings(const Study& study);

  const Point* point(std::string_view name) const;
  bool hasCase(std::string_view id) const { return m_cases.contains(id); }
  bool hasSection(std::string_view name) const { return m_sections.contains(name); }

private:
  std::unordered_map<std::string_view, const Point*> m_points;
  std::unordered_map<std::string_view, const LoadCase*> m_cases;
  std::unordered_map<std::string_view, const TypedSection*> m_sections;
};

/// What a row says of its case, when all of it reads.
struct SaidRow {
  std::string point;
  std::string loadCase;                    ///< empty: nothing but the point
  std::map<ColumnKind, std::string> texts; ///< of the case, as the study will keep them; no empty ones

  bool says(Spot thing) const;
};

/// What all rows of a point say of the point, each with the row that says it first; no empty texts.
struct SaidPoint {
  struct Said {
    std::string text;
    std::size_t row = 0;
  };
  std::map<ColumnKind, Said> texts;
  std::size_t firstRow = 0;

  bool says(Spot thing) const;
  /// None where nothing is said.
  const std::string* text(ColumnKind kind) const;
};

/// A table of points as it is understood.
struct SaidTable {
  std::vector<SaidRow> rows;
  std::unordered_map<std::string, SaidPoint> points;
  bool namesLines = false; ///< it has a column with the names of lines

  /// What a row is about in a study.
  RowThings thingsOf(const KnownThings& known, const SaidRow& row) const;
  /// The name of the line that the texts of a point go to; none where it gets no line.
  std::optional<std::string> lineOf(const std::string& point, const Point* before) const;
};

/// Reads the rows of a table with sound columns: texts that read stand in the cells as they will be kept,
/// what is wrong with a row is added to it.
SaidTable saidIn(const Study& study, const KnownThings& known, char separator, PastedPoints& pasted);

} // namespace planewright
