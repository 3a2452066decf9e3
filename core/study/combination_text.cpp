// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/combination_text.h"

#include "core/quantity/format.h"
#include "core/quantity/lexer.h"
#include "core/study/built_combinations.h"
#include "core/study/fresh_name.h"
#include "core/words/utf8.h"

#include <algorithm>
#include <cmath>
#include <unordered_set>

namespace planewright {

namespace {

/// One term with the place where it begins in the text.
struct Term {
  std::string_view words;
  std::size_t at = 0;
  bool negative = false;
};

bool isBlank(char c) {
  return c == ' ' || c == '\t';
}

Problem fault(std::string_view text, const Term& term, Text what, Text mend) {
  Problem problem;
  if (isUtf8(text))
    problem.column = static_cast<int>(codePointsIn(text.substr(0, term.at))) + 1;
  problem.quoted = term.words;
  problem.what = std::move(what);
  problem.mend = std::move(mend);
  return problem;
}

/// Cuts at + and - outside parentheses that stand behind a term, not inside a number or a product.
std::vector<Term> termsIn(std::string_view text) {
  std::vector<Term> terms;
  std::size_t start = 0;
  bool negative = false;
  int depth = 0;
  const auto close = [&](std::size_t end) {
    const std::string_view words = trimmed(text.substr(start, end - start));
    terms.push_back(
        {words, words.empty() ? start : static_cast<std::size_t>(words.data() - text.data()), negative});
  };
  for (std::size_t i = 0; i < text.size(); ++i) {
    const char c = text[i];
    depth += c == '(' ? 1 : c == ')' ? -1 : 0;
    const std::string_view before = trimmed(text.substr(start, i - start));
    const bool isSign = (c == '+' || c == '-') && depth == 0;
    const bool afterBlank = i > 0 && isBlank(text[i - 1]);
    if (!isSign || (!before.empty() && !afterBlank))
      continue;
    if (!before.empty() && (before.back() == '*' || before.back() == '/'))
      continue;
    if (!before.empty())
      close(i);
    else if (!terms.empty() || start > 0)
      continue;
    negative = c == '-';
    start = i + 1;
  }
  close(text.size());
  return terms;
}

/// The case whose id ends the term, the longest where several do.
const LoadCase* caseOf(const Study& study, std::string_view words) {
  const LoadCase* found = nullptr;
  for (const LoadCase& one : study.cases) {
    if (!words.ends_with(one.id) || (found && found->id.size() > one.id.size()))
      continue;
    const std::size_t rest = words.size() - one.id.size();
    const std::string_view joints = " \t*)";
    if (rest == 0 || joints.find(words[rest - 1]) != std::string_view::npos)
      found = &one;
  }
  return found;
}

std::string_view withoutProductSign(std::string_view factor) {
  factor = trimmed(factor);
  if (factor.ends_with('*'))
    factor = trimmed(factor.substr(0, factor.size() - 1));
  return factor;
}

Result<Factor> factorOf(const Study& study, std::string_view text, const Term& term) {
  const LoadCase* one = caseOf(study, term.words);
  if (!one)
    return tl::unexpected(fault(text, term, PW_TEXT("Combination", "“%1” names no case.").with(term.words),
                                PW_TEXT("Combination", "Write terms such as 1.35 G, joined by +.")));
  std::string factor(withoutProductSign(term.words.substr(0, term.words.size() - one->id.size())));
  if (factor.empty())
    factor = "1";
  const Result<Entry> entry = readEntry(factor, entryKindOf(study, Spot::factor));
  if (!entry)
    return tl::unexpected(fault(text, term, entry.error().what, entry.error().mend));
  if (!term.negative)
    return Factor{one->id, factor};
  const bool isOne = factor.find_first_of("+-") == std::string::npos;
  return Factor{one->id, isOne ? "-" + factor : "-(" + factor + ")"};
}

/// The expression by which a combination goes; null where it has a name of its own.
std::string (*expressionOf(const Combination& combination))(const Combination&) {
  for (auto* expression : {textOf, valuesOf})
    if (combination.name == expression(combination))
      return expression;
  return nullptr;
}

/// Names of combinations while they change.
class Names {
public:
  explicit Names(const Study& study) : m_study(study) {
    for (const Combination& one : study.combinations)
      m_names.insert(one.name);
  }
  bool isFree(const std::string& name) const {
    return !name.empty() && !m_names.contains(name) && !findCase(m_study, name);
  }
  Rename rename(const std::string& from, const std::string& to) {
    m_names.erase(from);
    m_names.insert(to);
    return {{Spot::combination, from, {}}, to};
  }
  Remove remove(const std::string& name) {
    m_names.erase(name);
    return {{Spot::combination, name, {}}};
  }

private:
  const Study& m_study;
  std::unordered_set<std::string> m_names;
};

} // namespace

Result<std::vector<Factor>> factorsIn(const Study& study, std::string_view text) {
  std::vector<Factor> factors;
  for (const Term& term : termsIn(text)) {
    Result<Factor> factor = factorOf(study, text, term);
    if (!factor)
      return tl::unexpected(std::move(factor).error());
    if (std::ranges::count(factors, factor->caseId, &Factor::caseId) > 0)
      return tl::unexpected(fault(text, term,
                                  PW_TEXT("Combination", "The case %1 stands twice.").with(factor->caseId),
                                  PW_TEXT("Combination", "Give it one factor, the sum of the two.")));
    factors.push_back(*std::move(factor));
  }
  return factors;
}

std::string textOf(const Combination& combination) {
  std::string text;
  for (const Factor& factor : combination.factors) {
    // A sum would be read as terms of its own.
    const bool isSum = termsIn(factor.factor).size() > 1;
    const bool negative = !isSum && factor.factor.starts_with('-');
    text += text.empty() ? (negative ? "-" : "") : negative ? " - " : " + ";
    text +=
        (isSum ? "(" + factor.factor + ")" : factor.factor.substr(negative ? 1 : 0)) + " " + factor.caseId;
  }
  return text;
}

void addTerm(std::string& values, double factor, const std::string& caseId) {
  values += (values.empty() ? "" : " + ") + exactNumber(factor) + " " + caseId;
}

std::string valuesOf(const Combination& combination) {
  std::string values;
  for (const Factor& factor : combination.factors) {
    const Result<Entry> entry = readEntry(factor.factor, {});
    if (entry && entry->value != 0)
      addTerm(values, entry->value, factor.caseId);
  }
  return values;
}

bool isMisnamed(const Study& study, const Combination& combination) {
  if (expressionOf(combination))
    return false;
  const Result<std::vector<Factor>> named = factorsIn(study, combination.name);
  if (!named)
    return false;
  const auto entryOf = [](const std::vector<Factor>& factors, const std::string& id) {
    const auto one = std::ranges::find(factors, id, &Factor::caseId);
    return one == factors.end() ? Entry{} : readEntry(one->factor, {}).value_or(Entry{});
  };
  constexpr double roughest = 0.005; // "1 G" is not said of 1.35 G
  return std::ranges::any_of(study.cases, [&](const LoadCase& one) {
    const Entry said = entryOf(*named, one.id);
    const double has = entryOf(combination.factors, one.id).value;
    return std::abs(said.value - has) > std::min(said.halfWidth, roughest) + 1e-9 * std::abs(has);
  });
}

Edits editsThatRenameCase(const Study& study, const std::string& id, const std::string& to) {
  Edits edits = {Rename{{Spot::loadCase, id, {}}, to}};
  Names names(study);
  for (const Combination& one : study.combinations) {
    Combination renamed = one;
    for (Factor& factor : renamed.factors)
      if (factor.caseId == id)
        factor.caseId = to;
    auto* expression = expressionOf(one);
    if (expression && renamed != one && names.isFree(expression(renamed)))
      edits.push_back(names.rename(one.name, expression(renamed)));
  }
  return edits;
}

Edits editsThatRemoveCase(const Study& study, const std::string& id) {
  Edits edits = {Remove{{Spot::loadCase, id, {}}}};
  Names names(study);
  for (const Combination& one : study.combinations) {
    Combination rest = one;
    auto* expression = expressionOf(one);
    if (!expression || std::erase_if(rest.factors, [&](const Factor& f) { return f.caseId == id; }) == 0)
      continue;
    const std::string name = expression(rest);
    const Combination* same = findCombination(study, name);
    if (names.isFree(name))
      edits.push_back(names.rename(one.name, name));
    else if (name.empty() || (same && same->factors == rest.factors && same->basis == rest.basis))
      edits.push_back(names.remove(one.name));
  }
  return edits;
}

Result<Edits> editsThatSet(const Study& study, const std::string& name, std::string_view text) {
  const Combination* old = findCombination(study, name);
  const Result<std::vector<Factor>> factors = factorsIn(study, text);
  if (!factors)
    return tl::unexpected(factors.error());
  Edits edits;
  // All anew, so that the terms stand in the order in which they were written.
  if (old)
    for (const Factor& factor : old->factors)
      edits.push_back(Remove{{Spot::factor, name, factor.caseId}});
  for (const Factor& factor : *factors) {
    const Place place{Spot::factor, name, factor.caseId};
    edits.push_back(Insert{place, std::nullopt});
    edits.push_back(Type{place, factor.factor});
  }
  if (old && expressionOf(*old))
    edits.push_back(Rename{{Spot::combination, name, {}}, textOf({name, *factors, {}})});
  return edits;
}

Result<Edits> editsThatAdd(const Study& study, std::string_view text) {
  const Result<std::vector<Factor>> factors = factorsIn(study, text);
  if (!factors)
    return tl::unexpected(factors.error());
  const std::string name = textOf({{}, *factors, {}});
  Edits edits = {Insert{{Spot::combination, name, {}}, std::nullopt}};
  const Result<Edits> terms = editsThatSet(study, name, text);
  if (!terms)
    return tl::unexpected(terms.error());
  edits.insert(edits.end(), terms->begin(), terms->end());
  return edits;
}

namespace {

/// "1.35 G + 1.5 S", with a name of its own before a tab or without one.
Result<Combination> namedCombinationIn(const Study& study, std::string_view line) {
  const std::size_t tab = line.find('\t');
  const bool isNamed = tab != std::string_view::npos;
  Result<std::vector<Factor>> factors = factorsIn(study, isNamed ? trimmed(line.substr(tab + 1)) : line);
  if (!factors)
    return tl::unexpected(std::move(factors).error());
  Combination one;
  one.factors = *std::move(factors);
  one.name = isNamed ? std::string(trimmed(line.substr(0, tab))) : textOf(one);
  return one;
}

Problem nameIsTaken(const std::string& name) {
  return {{},
          0,
          0,
          name,
          PW_TEXT("Combination", "The name “%1” is taken.").with(name),
          PW_TEXT("Combination", "Give this combination a name of its own.")};
}

} // namespace

Result<Edits> editsThatAddLines(const Study& study, std::string_view text) {
  Edits edits;
  std::unordered_set<std::string> added;
  bool isEmpty = true;
  for (int number = 1; !text.empty(); ++number) {
    const std::size_t end = std::min(text.find('\n'), text.size());
    const std::string_view line = trimmed(text.substr(0, end));
    text.remove_prefix(std::min(end + 1, text.size()));
    if (line.empty())
      continue;
    isEmpty = false;
    Result<Combination> one = namedCombinationIn(study, line);
    const Combination* same = one ? findCombination(study, one->name) : nullptr;
    if (same && same->factors == one->factors)
      continue;
    if (one && (same || !added.insert(one->name).second))
      one = tl::unexpected(nameIsTaken(one->name));
    if (!one) {
      Problem problem = std::move(one).error();
      problem.line = number;
      return tl::unexpected(std::move(problem));
    }
    const Edits more = editsThatAdd(study, std::vector<Combination>{*one});
    edits.insert(edits.end(), more.begin(), more.end());
  }
  if (isEmpty)
    return tl::unexpected(Problem{{},
                                  0,
                                  0,
                                  {},
                                  PW_TEXT("Combination", "There is no combination in this text."),
                                  PW_TEXT("Combination", "Copy one a line, such as 1.35 G + 1.5 S.")});
  return edits;
}

Edits editsThatAddNext(const Study& study) {
  std::vector<const LoadCase*> together;
  for (const LoadCase& one : study.cases)
    if (one.nature != Nature::measured &&
        std::ranges::none_of(together, [&](const LoadCase* other) { return areExclusive(one, *other); }))
      together.push_back(&one);
  const bool isMeasured = together.empty();
  if (isMeasured)
    together.push_back(&study.cases.front());
  std::string factor;
  const auto nameOf = [&](const std::string& number) {
    factor = isMeasured ? "1" : number;
    std::string sum;
    for (const LoadCase* one : together)
      sum += (sum.empty() ? "" : " + ") + factor + " " + one->id;
    return factor == number ? sum : sum + ", " + number;
  };
  const std::string name = freshName(1, nameOf, [&](const std::string& taken) {
    return findCombination(study, taken) || findCase(study, taken);
  });
  Edits edits = {Insert{{Spot::combination, name, {}}, std::nullopt}};
  for (const LoadCase* one : together) {
    const Place place{Spot::factor, name, one->id};
    edits.push_back(Insert{place, std::nullopt});
    edits.push_back(Type{place, factor});
  }
  return edits;
}

} // namespace planewright
