// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/screen_command.h"

#include "app/help.h"
#include "app/interrupts.h"
#include "app/naming.h"
#include "app/progress.h"
#include "app/screen_options.h"
#include "app/study_source.h"
#include "core/quantity/format.h"
#include "core/quantity/shown_count.h"
#include "core/record/heading.h"
#include "core/screen/leave_out.h"
#include "core/screen/summary_text.h"
#include "ui/files/field_file.h"
#include "ui/files/file_bytes.h"

namespace planewright {

namespace {

constexpr std::size_t greatestList = std::size_t{64} << 20;

/// What the caller gets to see of an interrupt; the program then ends by it.
tl::unexpected<Failure> interrupted() {
  return machineFailed({"", 0, 0, "", PW_TEXT("Command", "Interrupted: nothing was written."), {}});
}

/// One run of the command, from the order to the file.
class FieldRun {
public:
  explicit FieldRun(ScreenOrder order) : m_order(std::move(order)) {}

  Outcome<Delivery> delivered() {
    if (Outcome<void> made = makePlan(); !made)
      return tl::unexpected(std::move(made).error());
    if (Outcome<void> read = readTable(); !read)
      return tl::unexpected(std::move(read).error());
    if (Outcome<void> left = leaveOutNamed(); !left)
      return tl::unexpected(std::move(left).error());
    std::optional<FieldResults> results =
        screened(m_plan, m_reading.field, 0, [&](std::size_t done, std::size_t all) {
          m_progress.tell(PW_TEXT("Command", "Judging"), done, all);
          return !Interrupts::came();
        });
    if (!results)
      return interrupted();
    const FieldSummary summary = summaryOf(m_reading.field, *results);
    if (summary.judged == 0)
      return wrongUse(aboutTable(PW_TEXT("Command", "No point of the table is left to be judged."),
                                 PW_TEXT("Command", "Give each point all cases that act in a combination.")));
    if (Outcome<void> written = write(*results); !written)
      return tl::unexpected(std::move(written).error());
    return delivery(*results, summary);
  }

private:
  Problem aboutTable(Text what, Text mend) const {
    return {m_order.table, 0, 0, "", std::move(what), std::move(mend)};
  }

  Outcome<void> makePlan() {
    Outcome<Study> study = studyIn(m_order.study);
    if (!study)
      return tl::unexpected(std::move(study).error());
    m_study = *std::move(study);
    if (!m_order.point.empty())
      if (std::optional<Problem> problem = missingPoint(m_study, m_order.point))
        return wrongUse(*std::move(problem));
    if (m_order.point.empty())
      m_order.point = evaluate(m_study).point;
    Result<ScreenPlan> plan = screenPlanOf(m_study, m_order.point, m_order.checks);
    if (!plan) {
      plan.error().place = m_order.study + ": " + plan.error().place;
      return wrongUse(std::move(plan).error());
    }
    m_plan = *std::move(plan);
    return {};
  }

  Outcome<void> readTable() {
    const auto watch = [&](std::size_t done, std::size_t all) {
      m_progress.tell(PW_TEXT("Command", "Reading"), done, all);
      return !Interrupts::came();
    };
    tl::expected<FieldReading, UnreadField> reading =
        fieldIn(m_order.table, m_study, m_plan, m_order.headings, watch);
    if (!reading) {
      UnreadField& unread = reading.error();
      switch (unread.why) {
      case UnreadField::Why::ended:
        return interrupted();
      case UnreadField::Why::unreadable:
        return tl::unexpected(failedToRead(m_order.table, std::move(unread.problems.front())));
      default:
        return refused(std::move(unread.problems));
      }
    }
    m_reading = *std::move(reading);
    if (m_reading.isSound() || m_order.leavesOut)
      return {};
    Problems problems = m_reading.faults;
    problems.push_back(aboutTable(
        withFaultCounts(
            PW_TEXT("Command", "Rows with a fault: %1 of %2; points that lack something: %3 of %4."),
            m_reading),
        PW_TEXT("Command", "Mend them, or go on without them by --leave-out. Nothing was written.")));
    return refused(std::move(problems));
  }

  Outcome<void> refused(Problems problems) const {
    for (Problem& problem : problems)
      problem.place = m_order.table;
    return tl::unexpected(Failure{Exit::wrongUse, std::move(problems)});
  }

  Outcome<void> leaveOutNamed() {
    for (const std::string& name : m_order.except) {
      const std::size_t points = leaveOut(m_reading.field, name);
      if (points == 0)
        return wrongUse(
            {"--except", 0, 0, name,
             PW_TEXT("Command", "The table has no point and no region “%1”.").with(name),
             PW_TEXT("Command", "Write the name as it stands there, or its beginning with a star: "
                                "“corner*”.")});
      m_leftOut.push_back({name, points});
    }
    return m_order.exceptList.empty() ? Outcome<void>() : leaveOutList();
  }

  Outcome<void> leaveOutList() {
    Result<std::string> bytes = bytesOf(m_order.exceptList, greatestList);
    if (!bytes)
      return tl::unexpected(failedToRead(m_order.exceptList, std::move(bytes).error()));
    if (bytes->size() > greatestList)
      return wrongUse({m_order.exceptList, 0, 0, "", PW_TEXT("Command", "The list has more than 64 MB."),
                       PW_TEXT("Command", "Leave out whole regions by --except.")});
    std::vector<std::string> names;
    for (std::string_view rest = *bytes; !rest.empty();) {
      const std::string_view line = rest.substr(0, rest.find('\n'));
      rest.remove_prefix(std::min(rest.size(), line.size() + 1));
      const std::string_view name =
          withoutBlanks(line.ends_with('\r') ? line.substr(0, line.size() - 1) : line);
      if (!name.empty())
        names.emplace_back(name);
    }
    const std::size_t listed = names.size();
    const std::vector<std::string> unmet = leaveOutListed(m_reading.field, std::move(names));
    if (!unmet.empty())
      return wrongUse(
          {m_order.exceptList, 0, 0, unmet.front(),
           PW_TEXT("Command", "The table has no point for %1 of the names in the list, such as “%2”.")
               .with(shownCount(unmet.size()))
               .with(unmet.front()),
           PW_TEXT("Command", "Write one name of a point a line, as it stands in the table.")});
    m_leftOut.push_back({m_order.exceptList, listed});
    return {};
  }

  bool writeInto(const FieldResults& results, const Sink& sink) const {
    std::vector<std::uint32_t> top;
    if (m_order.top > 0)
      top = worstOf(results, m_order.top);
    std::optional<FieldPrincipals> principals;
    if (m_order.hasPrincipals)
      principals = principalsOf(m_plan, m_reading.field, results);
    return writeFieldCsv(m_study, m_plan, m_reading.field, results, sink, m_order.top > 0 ? &top : nullptr,
                         principals ? &*principals : nullptr);
  }

  Outcome<void> write(const FieldResults& results) {
    const Result<bool> isWhole = writeField(
        m_order.output, [&](const Sink& sink) { return writeInto(results, sink); },
        [&] {
          m_progress.tell(PW_TEXT("Command", "Writing"), 0, 0);
          return !Interrupts::came();
        });
    if (!isWhole)
      return machineFailed(isWhole.error());
    return *isWhole || m_order.output == "-" ? Outcome<void>() : interrupted();
  }

  Delivery delivery(const FieldResults& results, const FieldSummary& summary) const {
    Delivery delivery;
    for (Problem fault : m_reading.faults) {
      fault.place = m_order.table;
      delivery.facts.push_back(verbatim(plain(fault)));
    }
    if (!m_reading.isSound())
      delivery.facts.push_back(
          withFaultCounts(PW_TEXT("Command", "Left out: %1 of %2 rows, for a fault; %3 of %4 points, which "
                                             "lack something."),
                          m_reading));
    if (summary.leftOut > 0)
      delivery.facts.push_back(
          PW_TEXT("Command", "Points left out on request: %1.").with(shownCount(summary.leftOut)));
    if (!m_reading.isSound() || summary.leftOut > 0)
      delivery.exit = Exit::leftOut;
    if (summary.exceeding > 0)
      delivery.exit = Exit::exceeds;
    delivery.said = summaryText(m_study, m_order.point, m_plan, m_reading, results, summary, m_leftOut);
    return delivery;
  }

  ScreenOrder m_order;
  Study m_study;
  ScreenPlan m_plan;
  FieldReading m_reading;
  std::vector<LeftOut> m_leftOut;
  Progress m_progress;
};

} // namespace

Outcome<Delivery> screenedField(std::span<const std::string> words) {
  const Result<Arguments> arguments = screenArgumentsOf(words);
  if (!arguments)
    return wrongUse(arguments.error());
  if (arguments->helpAsked)
    return Delivery{screenHelp()};
  Result<ScreenOrder> order = screenOrderOf(*arguments);
  if (!order)
    return wrongUse(std::move(order).error());
  const Interrupts interrupts;
  return FieldRun(*std::move(order)).delivered();
}

} // namespace planewright
