// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/plan.h"

#include "core/strength/line_criteria.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

/// Why no field can be judged by a check; empty where one can.
Text reasonAgainst(const CheckSetup& check) {
  if (!check.plane.empty())
    return PW_TEXT("Screen", "it judges a plane, and a field is judged along a line");
  if (rowOf(check.criterion).actsOn != ActsOn::line)
    return PW_TEXT("Screen", "its criterion knows no line");
  switch (check.criterion) {
  case Criterion::hankinson:
  case Criterion::compressionAtAngle:
  case Criterion::taperedEdge:
    return PW_TEXT("Screen",
                   "its criterion is for uniaxial stress only, which the points of a field rarely have");
  default:
    return {};
  }
}

/// Forms as the kernels take them; the one place where they are told apart.
class KernelForms {
public:
  static void add(ScreenedForms& forms) {
    RatiosForm ratios{};
    bool hasRatios = false;
    for (const SignedForm& part : forms.parts) {
      const Interaction& pulls = part.pieces[0][0];
      const bool hasSquares = pulls.a66 != 0 || pulls.a11 != 0 || pulls.a22 != 0;
      const bool hasLinear = pulls.b1 != 0 || pulls.b2 != 0 || pulls.b6 != 0;
      if (hasSquares && hasLinear) {
        forms.linears.push_back(linear(pulls));
      } else if (hasSquares) {
        forms.squares.push_back(squares(part));
      } else if ((pulls.b1 != 0) + (pulls.b2 != 0) + (pulls.b6 != 0) > 1) {
        forms.sums.push_back(sum(part));
      } else {
        addRatio(ratios, part);
        hasRatios = true;
      }
    }
    if (hasRatios)
      forms.ratios.push_back(ratios);
  }

private:
  static LinearForm linear(const Interaction& f) { return {f.a11, f.a12, f.a22, f.a66, f.b1, f.b2}; }
  static SquaresForm squares(const SignedForm& part) {
    const auto& p = part.pieces;
    SquaresForm form{{p[0][0].a11, p[1][0].a11},
                     {p[0][0].a22, p[0][1].a22},
                     {{p[0][0].a12, p[0][1].a12}, {p[1][0].a12, p[1][1].a12}},
                     p[0][0].a66,
                     false};
    for (const auto& row : p)
      for (const Interaction& piece : row)
        form.hasProducts = form.hasProducts || piece.a12 != 0;
    return form;
  }
  static SumForm sum(const SignedForm& part) {
    const auto& p = part.pieces;
    return {{p[0][0].b1, -p[1][0].b1}, {p[0][0].b2, -p[0][1].b2}, p[0][0].b6};
  }
  static void addRatio(RatiosForm& ratios, const SignedForm& part) {
    const SumForm one = sum(part);
    for (int sign : {0, 1}) {
      ratios.along[sign] = std::max(ratios.along[sign], one.along[sign]);
      ratios.across[sign] = std::max(ratios.across[sign], one.across[sign]);
    }
    ratios.shear = std::max(ratios.shear, one.shear);
  }
};

bool isBorne(double size, const Bounds& bounds) {
  return size >= bounds.least && size <= bounds.greatest;
}

bool areBorne(const LineStrengths& f) {
  return std::ranges::all_of(std::initializer_list<double>{f.Xt, f.Xc, f.Yt, f.Yc, f.S},
                             [](double strength) { return isBorne(strength, bornStrengths); });
}

Result<ScreenedForms> formsOf(const CheckSetup& setup, const StrengthFactor& factor) {
  ScreenedForms forms;
  forms.factor = factor;
  const Result<Judge> judge = Judge::of(setup.criterion, factor.value * setup.strengths,
                                        forStrengthsTimes(factor.value, setup.parameters), Demand{});
  if (!judge)
    return tl::unexpected(judge.error());
  for (const Branch& branch : judge->branches())
    forms.parts.push_back(std::get<SignedForm>(branch));
  forms.strengths = *lineStrengthsOf(factor.value * setup.strengths, Demand{});
  KernelForms::add(forms);
  return forms;
}

Problem atCheck(Problem problem, const std::string& point, const std::string& check) {
  problem.place = "points/" + point + "/checks/" + check;
  return problem;
}

Result<ScreenedCheck> screenedCheck(const Readout& readout, std::size_t number) {
  const CheckSetup& setup = readout.checks[number];
  ScreenedCheck check{setup, *setup.band, {}};
  for (const StateReading& state : readout.states) {
    if (!state.judged)
      continue;
    const CheckReading& reading = state.checks[number];
    if (!reading.hasFactor)
      return tl::unexpected(atCheck(*reading.problem, readout.point, setup.id));
    Result<ScreenedForms> forms = formsOf(setup, reading.factor);
    if (!forms)
      return tl::unexpected(atCheck(std::move(forms).error(), readout.point, setup.id));
    check.forms.push_back(*std::move(forms));
  }
  return check;
}

void addCombinations(ScreenPlan& plan, const Readout& readout) {
  plan.acts.assign(readout.cases.size(), false);
  for (const CaseReading& one : readout.cases)
    plan.cases.push_back(one.id);
  for (const StateReading& state : readout.states) {
    if (!state.judged)
      continue;
    plan.combinations.push_back({state.combination, state.acting});
    for (const ActingCase& acting : state.acting) {
      plan.acts[acting.index] = true;
      plan.kernelsHold = plan.kernelsHold && isBorne(std::abs(acting.factor), bornFactors);
    }
  }
}

std::optional<Problem> unknownCheck(const Readout& readout, const std::vector<std::string>& asked) {
  for (const std::string& id : asked)
    if (std::ranges::find(readout.checks, id, &CheckSetup::id) == readout.checks.end())
      return Problem{"points/" + readout.point + "/checks",
                     0,
                     0,
                     id,
                     PW_TEXT("Screen", "The point has no check “%1”.").with(id),
                     PW_TEXT("Screen", "Take one that it has.")};
  return std::nullopt;
}

Problem noCheck(const ScreenPlan& plan, const std::string& point) {
  if (plan.unscreened.empty())
    return {"points/" + point + "/checks",
            0,
            0,
            {},
            PW_TEXT("Screen", "The point has no check to judge a field by."),
            PW_TEXT("Screen", "Give it a check of a line: material, criterion and line.")};
  return {
      "points/" + point + "/checks/" + plan.unscreened.front().id,
      0,
      0,
      {},
      PW_TEXT("Screen", "No check of the point can judge a field: %1.").with(plan.unscreened.front().reason),
      PW_TEXT("Screen", "Take a criterion of combined stresses along a line, such as sum-of-squares.")};
}

} // namespace

Result<ScreenPlan> screenPlanOf(const Study& study, std::string_view point,
                                const std::vector<std::string>& asked) {
  const Readout readout = evaluate(study, point);
  if (auto problem = unknownCheck(readout, asked))
    return tl::unexpected(*std::move(problem));
  ScreenPlan plan;
  plan.positive = readout.positive;
  addCombinations(plan, readout);
  for (std::size_t i = 0; i < readout.checks.size(); ++i) {
    const CheckSetup& setup = readout.checks[i];
    const bool isAsked = std::ranges::find(asked, setup.id) != asked.end();
    if (!asked.empty() && !isAsked)
      continue;
    if (const Text reason = reasonAgainst(setup); !reason.empty()) {
      plan.unscreened.push_back({setup.id, reason});
      if (isAsked)
        return tl::unexpected(noCheck(plan, readout.point));
      continue;
    }
    Result<ScreenedCheck> check = screenedCheck(readout, i);
    if (!check)
      return tl::unexpected(std::move(check).error());
    for (const ScreenedForms& forms : check->forms)
      plan.kernelsHold = plan.kernelsHold && areBorne(forms.strengths);
    plan.checks.push_back(*std::move(check));
  }
  if (plan.checks.empty())
    return tl::unexpected(noCheck(plan, readout.point));
  return plan;
}

} // namespace planewright
