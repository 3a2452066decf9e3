// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/screen/field_map.h"
#include "core/screen/plan.h"
#include "core/screen/summary_text.h"

#include <atomic>
#include <stop_token>

namespace planewright {

/// What the person at the window asks for.
struct FieldOrder {
  std::string table; ///< path of the file
  std::string point; ///< of the study, whose checks judge
  std::vector<MappedHeading> headings;
  std::vector<std::string> except; ///< names of points and regions, or beginnings of them
  bool leavesOut = false;          ///< faulty rows
};

/// A table that was screened, with the study as it was then. Not changed any more: threads share it.
struct ScreenedField {
  FieldOrder order;
  Study study;
  ScreenPlan plan;
  FieldReading reading;
  std::vector<LeftOut> leftOut;
  FieldResults results{0};
  FieldSummary summary;
  std::optional<FieldExtent> extent; ///< of the places, where any are given
};

/// Points of a field in the order in which they are wanted.
using FieldRows = std::shared_ptr<const std::vector<std::uint32_t>>;

/// How far a screening is; written by its thread and read by the window.
struct FieldProgress {
  std::atomic<bool> isJudging = false;
  std::atomic<std::size_t> done = 0;
  std::atomic<std::size_t> all = 0;
};

/// Reads and judges the table; the Problems where it comes to nothing, none of them where it was ended.
Results<std::shared_ptr<const ScreenedField>> screenedField(const Study& study, const FieldOrder& order,
                                                            FieldProgress& progress,
                                                            const std::stop_token& stop);

} // namespace planewright
