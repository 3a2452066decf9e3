// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/line_criteria.h"

#include "core/quantity/format.h"
#include "core/words/decimal_sign.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr double uniaxialShare = 1e-6;
constexpr double edgeWithin = 0.01; // deg

Problem problem(Text what, Text mend) {
  return {{}, 0, 0, {}, std::move(what), std::move(mend)};
}

Text written(double value) {
  return numberText(shownNumber(value, 4));
}

/// A form whose pieces differ by the signs of s1 and s2.
template <class Piece>
Branch signedForm(const LineStrengths& f, Piece piece) {
  SignedForm form;
  for (std::size_t along : {0U, 1U})
    for (std::size_t across : {0U, 1U})
      form.pieces[along][across] = piece(along ? f.Xc : f.Xt, across ? f.Yc : f.Yt, along, across);
  return form;
}

/// (s1/X)^2 + (s2/Y)^2 + (t/S)^2 with a product term.
template <class Product>
Branch squares(const LineStrengths& f, Product product) {
  return signedForm(f, [&](double X, double Y, std::size_t along, std::size_t across) {
    Interaction piece;
    piece.a11 = 1 / (X * X);
    piece.a22 = 1 / (Y * Y);
    piece.a66 = 1 / (f.S * f.S);
    piece.a12 = product(X, Y, along, across);
    return piece;
  });
}

/// u1 |s1|/X + u2 |s2|/Y + u6 |t|/S.
Branch ratios(const LineStrengths& f, double u1, double u2, double u6) {
  return signedForm(f, [&](double X, double Y, std::size_t along, std::size_t across) {
    Interaction piece;
    piece.b1 = (along ? -u1 : u1) / X;
    piece.b2 = (across ? -u2 : u2) / Y;
    piece.b6 = u6 == 0 ? 0 : u6 / f.S;
    return piece;
  });
}

Branch everywhere(const Interaction& piece) {
  return SignedForm{{{{piece, piece}, {piece, piece}}}};
}

std::optional<Problem> openSurface(bool isClosed, const char* condition) {
  if (isClosed)
    return std::nullopt;
  return problem(PW_TEXT("Strength",
                         "With these strengths the criterion sets no limit in some directions: %1 "
                         "does not hold.")
                     .with(condition),
                 PW_TEXT("Strength", "Check the strengths, or take another criterion."));
}

Result<std::vector<Branch>> azziTsai(const LineStrengths& f, bool bySecondSign) {
  if (auto open = openSurface(2 * f.Xt > f.Yt && 2 * f.Xc > f.Yc, "2 X > Y"))
    return tl::unexpected(*std::move(open));
  return std::vector{squares(f, [&](double X, double, std::size_t, std::size_t across) {
    const double product = bySecondSign ? (across ? f.Xc : f.Xt) : X;
    return -1 / (product * product);
  })};
}

Result<std::vector<Branch>> hoffman(const LineStrengths& f) {
  if (auto open = openSurface(4 * f.Xt * f.Xc > f.Yt * f.Yc, "4 Xt Xc > Yt Yc"))
    return tl::unexpected(*std::move(open));
  Interaction piece;
  piece.a11 = 1 / (f.Xt * f.Xc);
  piece.a12 = -piece.a11;
  piece.a22 = 1 / (f.Yt * f.Yc);
  piece.a66 = 1 / (f.S * f.S);
  piece.b1 = 1 / f.Xt - 1 / f.Xc;
  piece.b2 = 1 / f.Yt - 1 / f.Yc;
  return std::vector{everywhere(piece)};
}

Result<std::vector<Branch>> tsaiWu(const LineStrengths& f, const Parameters& parameters) {
  Interaction piece;
  piece.a11 = 1 / (f.Xt * f.Xc);
  piece.a22 = 1 / (f.Yt * f.Yc);
  piece.a66 = 1 / (f.S * f.S);
  piece.b1 = 1 / f.Xt - 1 / f.Xc;
  piece.b2 = 1 / f.Yt - 1 / f.Yc;
  const double F12 = parameters.F12.value_or(-0.5 * std::sqrt(piece.a11 * piece.a22));
  piece.a12 = 2 * F12;
  if (auto open = openSurface(piece.a11 * piece.a22 > F12 * F12, "F11 F22 > F12²"))
    return tl::unexpected(*std::move(open));
  return std::vector{everywhere(piece)};
}

/// The one principal stress of a uniaxial state and its axis.
struct Uniaxial {
  double stress = 0;
  Angle axis;
};

Result<Uniaxial> uniaxialOf(const Demand& demand) {
  const Circle circle = circleOf(demand.stress, demand.scale, demand.sz);
  const bool firstIsGreater = std::abs(circle.s1) >= std::abs(circle.s2);
  const double greater = firstIsGreater ? circle.s1 : circle.s2;
  const double smaller = firstIsGreater ? circle.s2 : circle.s1;
  if (std::abs(demand.sz) > uniaxialShare * std::abs(greater))
    return tl::unexpected(
        problem(PW_TEXT("Strength", "This criterion is for uniaxial stress only; the principal stresses "
                                    "here are %1 and %2 MPa, and %3 MPa out of the plane.")
                    .with(written(circle.s1))
                    .with(written(circle.s2))
                    .with(written(demand.sz)),
                PW_TEXT("Strength", "Take a criterion for combined stresses, such as sum-of-squares.")));
  if (std::abs(smaller) > uniaxialShare * std::abs(greater))
    return tl::unexpected(
        problem(PW_TEXT("Strength", "This criterion is for uniaxial stress only; the principal stresses "
                                    "here are %1 and %2 MPa.")
                    .with(written(circle.s1))
                    .with(written(circle.s2)),
                PW_TEXT("Strength", "Take a criterion for combined stresses, such as the sum of squares.")));
  if (!circle.theta1)
    return Uniaxial{};
  return Uniaxial{greater, (firstIsGreater ? circle.theta1 : circle.theta2())->value};
}

Result<std::vector<Branch>> hankinson(const Strengths& strengths, const Parameters& parameters,
                                      const Demand& demand) {
  const Result<Uniaxial> uniaxial = uniaxialOf(demand);
  if (!uniaxial)
    return tl::unexpected(uniaxial.error());
  const bool pulls = uniaxial->stress >= 0;
  const Result<double> P = alongStrengthOf(strengths, demand, pulls);
  if (!P)
    return tl::unexpected(P.error());
  const Result<double> Q =
      needed(strengths, pulls ? StrengthKey::acrossTension : StrengthKey::acrossCompression);
  if (!Q)
    return tl::unexpected(Q.error());
  return std::vector<Branch>{
      PowerOfAngle{std::abs(uniaxial->stress), uniaxial->axis, *P, *Q, parameters.n.value_or(2)}};
}

Result<std::vector<Branch>> compressionAtAngle(const Strengths& strengths, const Parameters& parameters,
                                               const Demand& demand) {
  const Result<Uniaxial> uniaxial = uniaxialOf(demand);
  if (!uniaxial)
    return tl::unexpected(uniaxial.error());
  if (uniaxial->stress > 0)
    return tl::unexpected(problem(
        PW_TEXT("Strength", "EN 1995-1-1, 6.2.2 is for compression; the stress here is %1 MPa in tension.")
            .with(written(uniaxial->stress)),
        PW_TEXT("Strength", "Take another criterion for this combination.")));
  const Result<double> P = needed(strengths, StrengthKey::alongCompression);
  if (!P)
    return tl::unexpected(P.error());
  const Result<double> Q = needed(strengths, StrengthKey::acrossCompression);
  if (!Q)
    return tl::unexpected(Q.error());
  return std::vector<Branch>{
      PowerOfAngle{-uniaxial->stress, uniaxial->axis, *P, *Q * parameters.kc90.value_or(1), 2}};
}

Result<LineStrengths> taperStrengths(const Strengths& strengths, bool pulls) {
  using enum StrengthKey;
  const Result<double> X = needed(strengths, alongBending);
  const Result<double> Y = needed(strengths, pulls ? acrossTension : acrossCompression);
  const Result<double> S = needed(strengths, shear);
  for (const Result<double>* one : {&X, &Y, &S})
    if (!*one)
      return tl::unexpected(one->error());
  return LineStrengths{*X, *X, *Y, *Y, taperShearFactor(pulls) * *S};
}

Result<std::vector<Branch>> taperedEdge(const Strengths& strengths, const Parameters& parameters,
                                        const Demand& demand) {
  if (!parameters.edge)
    return tl::unexpected(problem(PW_TEXT("Strength", "EN 1995-1-1, 6.4.2 needs the direction of the edge."),
                                  PW_TEXT("Strength", "Give the check its edge.")));
  const Result<Uniaxial> uniaxial = uniaxialOf(demand);
  if (!uniaxial)
    return tl::unexpected(uniaxial.error());
  if (uniaxial->stress != 0 && apart(uniaxial->axis, *parameters.edge).degrees() > edgeWithin)
    return tl::unexpected(
        problem(PW_TEXT("Strength", "The stress here acts at %1°, not along the edge at %2°.")
                    .with(written(uniaxial->axis.degrees()))
                    .with(written(folded(*parameters.edge).degrees())),
                PW_TEXT("Strength", "Give the stress that acts along the edge.")));
  const Result<LineStrengths> f = taperStrengths(strengths, uniaxial->stress >= 0);
  if (!f)
    return tl::unexpected(f.error());
  return std::vector{squares(*f, [](double, double, std::size_t, std::size_t) { return 0.0; })};
}

} // namespace

Result<double> needed(const Strengths& strengths, StrengthKey key) {
  if (const std::optional<double>& value = strengths[key])
    return *value;
  return tl::unexpected(problem(PW_TEXT("Strength", "The material has no %1, which this criterion needs.")
                                    .with(labelOf(strengths.kind, key)),
                                PW_TEXT("Strength", "Give it among the strengths of the material.")));
}

double taperShearFactor(bool pulls) {
  return pulls ? 0.75 : 1.5;
}

Result<double> alongStrengthOf(const Strengths& strengths, const Demand& demand, bool pulls) {
  using enum StrengthKey;
  Result<double> axial = needed(strengths, pulls ? alongTension : alongCompression);
  if (!axial || strengths.kind != MaterialKind::timber || !mixesBending(demand, pulls))
    return axial;
  Result<double> bending = needed(strengths, alongBending);
  if (!bending)
    return bending;
  const double w = bendingShareAlong(demand);
  return 1 / ((1 - w) / *axial + w / *bending);
}

Result<LineStrengths> lineStrengthsOf(const Strengths& strengths, const Demand& demand) {
  const Result<double> all[] = {
      alongStrengthOf(strengths, demand, true), alongStrengthOf(strengths, demand, false),
      needed(strengths, StrengthKey::acrossTension), needed(strengths, StrengthKey::acrossCompression),
      needed(strengths, StrengthKey::shear)};
  for (const Result<double>& one : all)
    if (!one)
      return tl::unexpected(one.error());
  return LineStrengths{*all[0], *all[1], *all[2], *all[3], *all[4]};
}

Result<std::vector<Branch>> lineBranchesOf(Criterion criterion, const Strengths& strengths,
                                           const Parameters& parameters, const Demand& demand) {
  if (criterion == Criterion::hankinson)
    return hankinson(strengths, parameters, demand);
  if (criterion == Criterion::compressionAtAngle)
    return compressionAtAngle(strengths, parameters, demand);
  if (criterion == Criterion::taperedEdge)
    return taperedEdge(strengths, parameters, demand);
  const Result<LineStrengths> given = lineStrengthsOf(strengths, demand);
  if (!given)
    return tl::unexpected(given.error());
  const LineStrengths& f = *given;
  const auto none = [](double, double, std::size_t, std::size_t) { return 0.0; };
  const auto norris = [](double X, double Y, std::size_t, std::size_t) { return -1 / (X * Y); };
  switch (criterion) {
  case Criterion::maximumStress:
    return std::vector{ratios(f, 1, 0, 0), ratios(f, 0, 1, 0), ratios(f, 0, 0, 1)};
  case Criterion::norrisPlane:
    return std::vector{squares(f, norris)};
  case Criterion::norrisThreePlane:
    return std::vector{squares(f, norris), ratios(f, 1, 0, 0), ratios(f, 0, 1, 0)};
  case Criterion::azziTsai:
    return azziTsai(f, false);
  case Criterion::azziTsaiTwoSign:
    return azziTsai(f, true);
  case Criterion::hoffman:
    return hoffman(f);
  case Criterion::tsaiWu:
    return tsaiWu(f, parameters);
  case Criterion::linearSum:
    return std::vector{ratios(f, 1, 1, 1)};
  default:
    return std::vector{squares(f, none)};
  }
}

} // namespace planewright
