// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/screened_field.h"

#include "core/screen/leave_out.h"
#include "ui/files/field_file.h"

#include <new>

namespace planewright {

namespace {

tl::unexpected<Problems> refused(Problem problem) {
  return tl::unexpected(Problems{std::move(problem)});
}

/// The first hundred faults and, ahead of them, how many there are.
Problems faultsOf(const FieldReading& reading, const std::string& table) {
  Problems problems = {
      {table, 0, 0, "",
       withFaultCounts(
           PW_TEXT("Screen", "Rows with a fault: %1 of %2; points that lack something: %3 of %4."), reading),
       PW_TEXT("Screen", "Mend them, or go on without them by “Leave faulty rows out”.")}};
  for (Problem fault : reading.faults) {
    fault.place = table;
    problems.push_back(std::move(fault));
  }
  return problems;
}

std::optional<Problem> leaveOutAll(ScreenedField& field) {
  for (const std::string& name : field.order.except) {
    const std::size_t points = leaveOut(field.reading.field, name);
    if (points == 0)
      return Problem{field.order.table,
                     0,
                     0,
                     name,
                     PW_TEXT("Screen", "The table has no point and no region “%1”.").with(name),
                     PW_TEXT("Screen", "Write the name as it stands there, or its beginning with a star: "
                                       "“corner*”.")};
    field.leftOut.push_back({name, points});
  }
  return std::nullopt;
}

Results<std::shared_ptr<const ScreenedField>> screenedWhole(const Study& study, const FieldOrder& order,
                                                            FieldProgress& progress,
                                                            const std::stop_token& stop) {
  const auto watch = [&](std::size_t done, std::size_t all) {
    progress.done = done;
    progress.all = all;
    return !stop.stop_requested();
  };
  Result<ScreenPlan> plan = screenPlanOf(study, order.point);
  if (!plan)
    return refused(std::move(plan).error());
  auto field = std::make_shared<ScreenedField>();
  field->order = order;
  field->study = study;
  field->plan = *std::move(plan);
  auto reading = fieldIn(order.table, field->study, field->plan, order.headings, watch);
  if (!reading)
    return tl::unexpected(std::move(reading.error().problems));
  field->reading = *std::move(reading);
  if (!field->reading.isSound() && !order.leavesOut)
    return tl::unexpected(faultsOf(field->reading, order.table));
  if (std::optional<Problem> problem = leaveOutAll(*field))
    return refused(*std::move(problem));
  progress.isJudging = true;
  std::optional<FieldResults> results = screened(field->plan, field->reading.field, 0, watch);
  if (!results)
    return tl::unexpected(Problems{});
  field->results = *std::move(results);
  field->summary = summaryOf(field->reading.field, field->results);
  field->extent = extentOf(field->reading.field);
  if (field->summary.judged == 0)
    return refused({order.table, 0, 0, "", PW_TEXT("Screen", "No point of the table is left to be judged."),
                    PW_TEXT("Screen", "Give each point all cases that act in a combination.")});
  return field;
}

} // namespace

Results<std::shared_ptr<const ScreenedField>> screenedField(const Study& study, const FieldOrder& order,
                                                            FieldProgress& progress,
                                                            const std::stop_token& stop) {
  try {
    return screenedWhole(study, order, progress, stop);
  } catch (const std::bad_alloc&) {
    return refused({order.table, 0, 0, "",
                    PW_TEXT("Screen", "The table does not fit into the memory of this machine."),
                    PW_TEXT("Screen", "Screen it in parts, or close other programs.")});
  }
}

} // namespace planewright
