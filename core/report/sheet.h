// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "core/report/second_route.h"
#include "core/words/decimal_sign.h"
#include "core/working/step.h"

namespace planewright {

/// A heading of the first level (1), with a rule under it, or of the second (2).
struct SheetHeading {
  std::string number; ///< "4", "4.2"; may be empty
  Text words;
  int level = 1;
  bool operator==(const SheetHeading&) const = default;
};

enum class Voice { plain, soft, strong, caution };

/// A paragraph; a user's own line ends are kept.
struct SheetText {
  Text words;
  Voice voice = Voice::plain;
  bool operator==(const SheetText&) const = default;
};

/// A few lines in a frame that nobody overlooks.
struct SheetBox {
  std::vector<Text> lines;
  bool alarms = false; ///< a limit is exceeded, or the two routes disagree
  bool operator==(const SheetBox&) const = default;
};

/// A line of the calculation; `reference` leads to the list of sources: "[2]".
struct SheetStep {
  Step step;
  std::string reference;
};

struct SheetColumn {
  Text heading;
  bool isNumber = true;
  bool operator==(const SheetColumn&) const = default;
};

struct SheetTable {
  std::vector<SheetColumn> columns;
  std::vector<std::vector<Text>> rows;
  bool operator==(const SheetTable&) const = default;
};

/// A picture in mm with its caption.
struct SheetFigure {
  Picture picture;
  Text caption;
};

/// Lines to sign on; what the study says of them stands on them.
struct SheetSignatures {
  Text prepared;
  Text checked;
  Text date;
  bool operator==(const SheetSignatures&) const = default;
};

using SheetBlock =
    std::variant<SheetHeading, SheetText, SheetBox, SheetStep, SheetTable, SheetFigure, SheetSignatures>;

/// What stands at the head of every page.
struct SheetTitle {
  std::string project;
  std::string subject;
  std::string number;
  std::string revision;
  Text prepared; ///< with what became of it since; empty: a line to sign
  Text checked;
  std::string date;
  bool operator==(const SheetTitle&) const = default;
};

/// A calculation sheet before it is set on pages or written as HTML.
struct Sheet {
  SheetTitle title;
  std::vector<SheetBlock> blocks;
  Text caution;                             ///< at the foot of every page
  Text identity;                            ///< file, fingerprint and version, at the foot of every page
  Text routes;                              ///< how the two routes agree, at the foot of every page
  DecimalSign decimal = DecimalSign::point; ///< of all numbers, also of those that are written later
  bool disagrees = false;                   ///< the two routes do
  bool exceeds = false;                     ///< some judged combination does, or a check could not be judged
};

} // namespace planewright
