// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"

#include <QString>
#include <QStringList>

#include <functional>

namespace planewright {

/// One column of a list of things of a study: how it reads and what typing in it asks for.
struct ThingColumn {
  QString heading;
  std::function<QString(const Study&, std::size_t row)> text;
  /// None of a column that is only read.
  std::function<Result<Edits>(const Study&, std::size_t row, const std::string& typed)> edits = {};
  QStringList choices = {}; ///< the texts to choose from; empty where anything is typed
};

/// A list of a study as a table to edit: cases, combinations, points, sections.
struct Things {
  QString title;
  QString one;                     ///< "load case", for the words of undo
  const char* helpPlace = nullptr; ///< where the manual tells of the list
  std::function<std::size_t(const Study&)> count;
  std::vector<ThingColumn> columns;
  std::function<Edits(const Study&)> add; ///< a new thing at the end
  std::function<Place(const Study&, std::size_t row)> place;
  /// A copy of a row; none where copying has no sense.
  std::function<Edits(const Study&, std::size_t row)> copy = {};
  /// What adds the rows of a pasted text; none where nothing is pasted.
  std::function<Result<Edits>(const Study&, const std::string& text)> paste = {};
  /// What takes a row away, where that is more than its thing.
  std::function<Result<Edits>(const Study&, std::size_t row)> remove = {};
  /// What must be known of a row; none where there is nothing.
  std::function<QString(const Study&, std::size_t row)> caution = {};
};

Things loadCases();
Things combinations();
Things points();
Things sections();

} // namespace planewright
