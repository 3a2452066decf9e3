// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field_csv.h"
#include "core/screen/field_reader.h"
#include "core/screen/screened.h"

namespace planewright {

/// Why a table of very many points was not read.
struct UnreadField {
  enum class Why {
    ended,      ///< by the watch; there is no Problem
    unreadable, ///< the file
    refused     ///< what it holds: no table, or faults in it
  };
  Why why = Why::refused;
  Problems problems;
};

/// Reads the table in a file, or ("-") on standard input, piece by piece; the watch is told the bytes. One
/// without a row below its header is refused; one with faults is not: that is for the caller to see.
tl::expected<FieldReading, UnreadField> fieldIn(const std::string& path, const Study& study,
                                                const ScreenPlan& plan,
                                                const std::vector<MappedHeading>& headings,
                                                const Watch& watch);

/// Writes what `write` puts into its sink to a file, whole or not at all, or ("-") to standard output. False
/// where `goesOn` ended it, and nothing was written.
Result<bool> writeField(const std::string& path, const std::function<bool(const Sink&)>& write,
                        const std::function<bool()>& goesOn);

} // namespace planewright
