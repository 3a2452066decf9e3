// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/built_combinations.h"

#include "core/study/combination_text.h"

#include "core/quantity/shown_count.h"

#include <algorithm>
#include <unordered_set>

namespace planewright {

template <>
const std::vector<Named<CombinationRule>>& namesOf() {
  static const std::vector<Named<CombinationRule>> names = {
      {CombinationRule::one, "6.10", PW_TEXT("Combination", "EN 1990 (6.10)")},
      {CombinationRule::pair, "6.10a/b", PW_TEXT("Combination", "EN 1990 (6.10a) and (6.10b)")}};
  return names;
}

namespace {

/// A factor with its text and its value.
struct Typed {
  std::string text;
  double value = 0;
};

Typed product(const Typed& a, const Typed& b) {
  const auto held = [](const std::string& text) {
    return text.find_first_of("+-") == std::string::npos ? text : "(" + text + ")";
  };
  return {held(a.text) + "*" + held(b.text), a.value * b.value};
}

struct ReadFactors {
  Typed upper, lower, variable, reduction;
  std::map<std::string, Typed, std::less<>> accompanying;
};

class Reading {
public:
  explicit Reading(const Study& study) : m_kind(entryKindOf(study, Spot::factor)) {}

  Typed read(const char* place, const std::string& text) {
    Result<Entry> entry = readEntry(text, m_kind);
    if (entry && entry->value >= 0)
      return {entry->text, entry->value};
    Problem problem = entry ? Problem{{},
                                      0,
                                      0,
                                      text,
                                      PW_TEXT("Combination", "A factor of %1 is negative.").with(text),
                                      PW_TEXT("Combination", "Give 0 or more.")}
                            : std::move(entry).error();
    problem.place = place;
    problems.push_back(std::move(problem));
    return {};
  }

  Problems problems;

private:
  EntryKind m_kind;
};

/// The cases of one nature.
std::vector<const LoadCase*> casesOf(const Study& study, Nature nature) {
  std::vector<const LoadCase*> cases;
  for (const LoadCase& one : study.cases)
    if (one.nature == nature)
      cases.push_back(&one);
  return cases;
}

using Cases = std::vector<const LoadCase*>;

/// All subsets in which no two exclude each other, small ones first; none when there are more than `most`.
std::vector<Cases> subsetsOf(const Cases& cases, std::size_t most) {
  std::vector<Cases> subsets = {{}};
  for (const LoadCase* one : cases) {
    const std::size_t before = subsets.size();
    for (std::size_t i = 0; i < before; ++i) {
      if (std::ranges::any_of(subsets[i], [&](const LoadCase* other) { return areExclusive(*one, *other); }))
        continue;
      subsets.push_back(subsets[i]);
      subsets.back().push_back(one);
      if (subsets.size() > most)
        return {};
    }
  }
  std::ranges::stable_sort(subsets, {}, &Cases::size);
  return subsets;
}

/// Collects combinations by their names.
class Builder {
public:
  Builder(const ReadFactors& factors, const Cases& permanent) : m_factors(factors), m_permanent(permanent) {}

  /// For each way in which the permanent cases act: their terms, then those of the variable cases.
  bool add(const Typed& upper, const std::vector<std::pair<std::string, Typed>>& variable) {
    const std::size_t ways = std::size_t(1) << m_permanent.size();
    for (std::size_t way = 0; way < ways; ++way) {
      Combination combination;
      for (std::size_t i = 0; i < m_permanent.size(); ++i)
        addTerm(combination, m_permanent[i]->id, (way >> i) & 1 ? m_factors.lower : upper);
      for (const auto& [id, factor] : variable)
        addTerm(combination, id, factor);
      if (!combination.factors.empty() && m_names.insert(combination.name).second)
        built.push_back(std::move(combination));
      if (built.size() > mostBuilt)
        return false;
    }
    return true;
  }

  std::vector<Combination> built;

private:
  static void addTerm(Combination& combination, const std::string& id, const Typed& factor) {
    if (factor.value == 0)
      return;
    planewright::addTerm(combination.name, factor.value, id);
    combination.factors.push_back({id, factor.text});
  }

  const ReadFactors& m_factors;
  const Cases& m_permanent;
  std::unordered_set<std::string> m_names;
};

Results<ReadFactors> readFactors(const Study& study, const CombinationFactors& factors,
                                 const Cases& variable) {
  Reading reading(study);
  ReadFactors read;
  read.upper = reading.read("permanent upper", factors.permanentUpper);
  read.lower = reading.read("permanent lower", factors.permanentLower);
  read.variable = reading.read("variable", factors.variable);
  if (factors.rule == CombinationRule::pair)
    read.reduction = reading.read("reduction", factors.reduction);
  for (const LoadCase* one : variable) {
    const auto typed = factors.accompanying.find(one->id);
    read.accompanying[one->id] =
        reading.read(one->id.c_str(), typed == factors.accompanying.end() ? std::string() : typed->second);
  }
  if (!reading.problems.empty())
    return tl::unexpected(std::move(reading.problems));
  return read;
}

Problems tooMany() {
  return {
      {{},
       0,
       0,
       {},
       PW_TEXT("Combination", "These cases make more than %1 combinations.").with(shownCount(mostBuilt)),
       PW_TEXT("Combination", "Let cases that never meet exclude each other, or type the combinations that "
                              "matter.")}};
}

using Terms = std::vector<std::pair<std::string, Typed>>;

/// The variable terms of a subset with one case leading, or none.
Terms termsOf(const ReadFactors& factors, const Cases& subset, const LoadCase* leading) {
  Terms terms;
  for (const LoadCase* one : subset)
    terms.emplace_back(one->id, one == leading
                                    ? factors.variable
                                    : product(factors.variable, factors.accompanying.find(one->id)->second));
  return terms;
}

bool addAll(Builder& builder, const ReadFactors& factors, CombinationRule rule,
            const std::vector<Cases>& subsets) {
  const bool pair = rule == CombinationRule::pair;
  if (pair)
    for (const Cases& subset : subsets)
      if (!builder.add(factors.upper, termsOf(factors, subset, nullptr)))
        return false;
  const Typed upper = pair ? product(factors.reduction, factors.upper) : factors.upper;
  for (const Cases& subset : subsets) {
    const Cases leading = subset.empty() ? Cases{nullptr} : subset;
    for (const LoadCase* one : leading)
      if (!builder.add(upper, termsOf(factors, subset, one)))
        return false;
  }
  return true;
}

std::vector<Text> notesOn(const Study& study) {
  std::vector<Text> notes = {
      PW_TEXT("Combination",
              "Recommended factors are those of EN 1990:2002, Tables A1.1 and A1.2(B), from memory; "
              "they are nationally determined: check them against the code in force."),
      PW_TEXT("Combination", "Accidental and seismic combinations are not built.")};
  std::string left;
  for (const LoadCase& one : study.cases)
    if (one.nature != Nature::permanent && one.nature != Nature::variable)
      left += (left.empty() ? "" : ", ") + one.id;
  if (!left.empty())
    notes.push_back(
        PW_TEXT("Combination", "Neither permanent nor variable, so in none of them: %1.").with(left));
  return notes;
}

/// psi_0 by the letter of the action.
std::string recommendedAccompanying(const std::string& id) {
  switch (id.empty() ? ' ' : id.front()) {
  case 'S':
    return "0.5";
  case 'W':
  case 'T':
    return "0.6";
  default:
    return "0.7";
  }
}

} // namespace

bool areExclusive(const LoadCase& one, const LoadCase& other) {
  return std::ranges::count(one.excludes, other.id) > 0 || std::ranges::count(other.excludes, one.id) > 0;
}

CombinationFactors recommendedFactors(const Study& study) {
  CombinationFactors factors{CombinationRule::one, "1.35", "1.00", "1.5", "0.85", {}};
  for (const LoadCase* one : casesOf(study, Nature::variable))
    factors.accompanying[one->id] = recommendedAccompanying(one->id);
  return factors;
}

Results<BuiltCombinations> builtCombinations(const Study& study, const CombinationFactors& factors) {
  const Cases permanent = casesOf(study, Nature::permanent);
  const Cases variable = casesOf(study, Nature::variable);
  const Results<ReadFactors> read = readFactors(study, factors, variable);
  if (!read)
    return tl::unexpected(read.error());
  const std::vector<Cases> subsets = subsetsOf(variable, mostBuilt);
  Builder builder(*read, permanent);
  constexpr std::size_t mostPermanent = 13; // two to the power of it is beyond mostBuilt
  if (subsets.empty() || permanent.size() >= mostPermanent || !addAll(builder, *read, factors.rule, subsets))
    return tl::unexpected(tooMany());
  return BuiltCombinations{std::move(builder.built), notesOn(study)};
}

Edits editsThatAdd(const Study& study, const std::vector<Combination>& combinations) {
  Edits edits;
  for (const Combination& combination : combinations) {
    if (findCombination(study, combination.name))
      continue;
    edits.push_back(Insert{{Spot::combination, combination.name, {}}, std::nullopt});
    edits.push_back(
        Type{{Spot::combinationBasis, combination.name, {}}, std::string(wordOf(combination.basis))});
    for (const Factor& factor : combination.factors) {
      const Place place{Spot::factor, combination.name, factor.caseId};
      edits.push_back(Insert{place, std::nullopt});
      edits.push_back(Type{place, factor.factor});
    }
  }
  return edits;
}

} // namespace planewright
