// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"

#include <map>

namespace planewright {

/// Which expressions of EN 1990:2002, 6.4.3.2 combine the actions of persistent and transient situations.
enum class CombinationRule {
  one,  ///< (6.10)
  pair, ///< the less favourable of (6.10a) and (6.10b)
};
template <>
const std::vector<Named<CombinationRule>>& namesOf<CombinationRule>();

/// The factors of a set of combinations, as typed texts without a dimension.
struct CombinationFactors {
  CombinationRule rule = CombinationRule::one;
  std::string permanentUpper; ///< gamma_G,sup
  std::string permanentLower; ///< gamma_G,inf
  std::string variable;       ///< gamma_Q; a variable action that acts favourably is left out
  std::string reduction;      ///< xi, of (6.10b)
  std::map<std::string, std::string, std::less<>> accompanying; ///< psi_0 of each variable case by its id
};

/// The recommended values of EN 1990:2002, Tables A1.1 and A1.2(B), from memory: 1.35, 1.00, 1.5, 0.85; psi_0
/// by the letter of the case: 0.7 for imposed loads (Q), 0.5 for snow (S, to 1000 m of altitude), 0.6 for
/// wind (W) and temperature (T), else 0.7. Nationally determined: the code in force decides.
CombinationFactors recommendedFactors(const Study& study);

/// Combinations that the rule makes of the cases of a study, before they are taken.
struct BuiltCombinations {
  std::vector<Combination> combinations; ///< named by their expressions: "1.35 G + 1.5 S"
  std::vector<Text> notes;               ///< what was left out, and where the factors are from
};

/// No more combinations than this are built.
inline constexpr std::size_t mostBuilt = 5000;

/// All subsets of the variable cases with each of those present leading in turn, each permanent case with its
/// upper and with its lower factor (one case can be favourable for one component and not for another); cases
/// that exclude each other never together; equal ones once. Accidental, seismic and measured cases take no
/// part.
///
/// (6.10): sum gamma_G G + gamma_Q Q_lead + sum gamma_Q psi_0 Q; without exclusions and for factors that all
/// differ 2^p (1 + v 2^(v-1)) combinations of p permanent and v variable cases. (6.10a): sum gamma_G G + sum
/// gamma_Q psi_0 Q; (6.10b): as (6.10) with xi gamma_G,sup. EN 1990:2002, 6.4.3.2 (from memory).
///
/// Problems: a factor that does not read, is negative, or makes more than mostBuilt combinations.
Results<BuiltCombinations> builtCombinations(const Study& study, const CombinationFactors& factors);

/// Whether two cases never act together, whichever of them says so.
bool areExclusive(const LoadCase& one, const LoadCase& other);

/// What takes combinations into a study that has none of these names yet; those that it has are left as they
/// are.
Edits editsThatAdd(const Study& study, const std::vector<Combination>& combinations);

} // namespace planewright
