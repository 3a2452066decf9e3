// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/evidence/evidence_text.h"

#include "core/quantity/format.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr int shownDigits = 6;

std::string number(double value) {
  return shownNumber(value, decimalsFor(value, shownDigits));
}

class Writer {
public:
  explicit Writer(const Translate& translate) : m_translate(translate) {}

  std::string written(const std::vector<CheckResult>& checks) {
    line(PW_TEXT("Validate",
                 "Published values, recomputed by this program. A value without a printed one, or one "
                 "that its source rounded on its way, is judged by own arithmetic."));
    std::string source;
    for (const CheckResult& check : checks) {
      if (check.source != source) {
        m_out += '\n';
        line(verbatim(check.source));
        source = check.source;
      }
      row(check);
    }
    end(checks);
    return std::move(m_out);
  }

private:
  void line(const Text& text) { m_out += plain(text, m_translate) + "\n"; }

  void row(const CheckResult& check) {
    const Text printed = check.printed ? verbatim(exactNumber(*check.printed)) : PW_TEXT("Validate", "none");
    line(PW_TEXT("Validate", "  %1  %2 %3 (%4): printed %5, computed %6, %7. %8; %9")
             .with(check.agrees ? PW_TEXT("Validate", "agrees   ") : PW_TEXT("Validate", "DISAGREES"))
             .with(check.id)
             .with(check.quantity)
             .with(check.unit)
             .with(printed)
             .with(number(check.computed))
             .with(labelOf(check.status))
             .with(check.locator)
             .with(check.basis));
  }

  void end(const std::vector<CheckResult>& checks) {
    const EvidenceCount count = countOf(checks);
    m_out += '\n';
    line(PW_TEXT("Validate", "%1 values, %2 of them printed in their sources; %3 disagree.")
             .with(exactNumber(static_cast<double>(count.values)))
             .with(exactNumber(static_cast<double>(count.printed)))
             .with(exactNumber(static_cast<double>(count.disagreeing))));
    for (const CheckResult& check : checks)
      if (!check.agrees)
        row(check);
  }

  const Translate& m_translate;
  std::string m_out;
};

} // namespace

EvidenceCount countOf(const std::vector<CheckResult>& checks) {
  EvidenceCount count{checks.size(), 0, 0};
  for (const CheckResult& check : checks) {
    count.printed += check.printed ? 1 : 0;
    count.disagreeing += check.agrees ? 0 : 1;
  }
  return count;
}

std::string evidenceText(const std::vector<CheckResult>& checks, const Translate& translate) {
  return Writer(translate).written(checks);
}

} // namespace planewright
