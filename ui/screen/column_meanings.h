// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field_columns.h"

#include <QStringList>

namespace planewright {

/// What the columns of a table are, as the lists above them show it: what their headings say, or what was
/// chosen instead.
class ColumnMeanings {
public:
  /// Another table, of which nothing is chosen yet.
  void setHeader(std::string header, std::size_t columns);
  void choose(std::size_t column, int meaning);

  /// The words of the lists for a study: not read, the roles, and the stresses of each case.
  static QStringList meaningsFor(const Study& study);
  /// What each column means, by its place in these words.
  std::vector<int> meanings(const Study& study) const;
  /// The headings for which something else was chosen.
  std::vector<MappedHeading> mapped(const Study& study) const;

private:
  std::string m_header;
  std::vector<std::optional<int>> m_chosen; ///< of each column
};

} // namespace planewright
