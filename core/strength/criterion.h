// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/strength/strength_key.h"

namespace planewright {

/// How strengths interact; the words of `namesOf` stand in files. For criteria of a line 1 = along it, 2 =
/// across it, t = shear in those axes; Xt Xc along, Yt Yc across, S shear, all positive; X and Y by the signs
/// of s1 and s2 (0 counts as tension). For planes sn, t. Where no domain is named, any state of plane stress
/// is judged. Utilisation is 1/R, R being the multiplier on all loads, except where said.
enum class Criterion {
  /// max(|s1|/X, |s2|/Y, |t|/S) = 1. Jenkin 1920 (author from memory).
  maximumStress,
  /// |s| (sin^n a/Q + cos^n a/P) = 1, a = angle of the one stress s to the line, P = X and Q = Y by its sign;
  /// n = 2 unless given. Uniaxial states only, the others at most 1e-6 of it. Hankinson 1921; n: USDA Wood
  /// Handbook, equation 5-2.
  hankinson,
  /// (s1/X)^2 + (s2/Y)^2 + (t/S)^2 = 1. ANC-18, section 2:55; USDA Wood Handbook, page 9-15.
  sumOfSquares,
  /// (s1/X)^2 - s1 s2/(X Y) + (s2/Y)^2 + (t/S)^2 = 1. Norris 1950, FPL report 1816 (equation from memory).
  norrisPlane,
  /// norrisPlane, and |s1| <= X, |s2| <= Y. The same source.
  norrisThreePlane,
  /// (s1/X)^2 - s1 s2/X^2 + (s2/Y)^2 + (t/S)^2 = 1, for 2 Xt > Yt and 2 Xc > Yc. Azzi and Tsai 1965.
  azziTsai,
  /// The same with the product over X2^2, X2 = Xt or Xc by the sign of s2. Form of Azzi and Tsai given by
  /// Kaw.
  azziTsaiTwoSign,
  /// s1^2/(Xt Xc) - s1 s2/(Xt Xc) + s2^2/(Yt Yc) + (1/Xt - 1/Xc) s1 + (1/Yt - 1/Yc) s2 + (t/S)^2 = 1,
  /// for 4 Xt Xc > Yt Yc.
  /// Hoffman 1967.
  hoffman,
  /// F1 s1 + F2 s2 + F11 s1^2 + F22 s2^2 + F66 t^2 + 2 F12 s1 s2 = 1 with F1 = 1/Xt - 1/Xc, F11 = 1/(Xt Xc),
  /// F2 and F22 likewise of Y, F66 = 1/S^2; F12 = -0.5 sqrt(F11 F22) unless given,
  /// F12^2 < F11 F22.
  /// Tsai and Wu 1971.
  tsaiWu,
  /// |s1|/X + |s2|/Y + |t|/S = 1. Published for uniaxial tension and bending at an angle, for other states an
  /// extension of this program. LVL Handbook Europe 2025, equations 4.15 and 4.16.
  linearSum,
  /// hankinson with n = 2, P = f_c,0 and Q = k_c,90 f_c,90, k_c,90 = 1 unless given; uniaxial compression
  /// only. EN 1995-1-1, 6.2.2, equation (6.16).
  compressionAtAngle,
  /// sumOfSquares with X = f_m and, for tension along the edge, Y = f_t,90 and S = 0.75 f_v, for compression
  /// Y = f_c,90 and S = 1.5 f_v;
  /// uniaxial stress along the edge only, within 0.01 deg. EN 1995-1-1, 6.4.2,
  /// equations (6.38) to (6.40), numbers from memory.
  taperedEdge,
  /// sqrt(((s1-s2)^2 + (s2-s3)^2 + (s3-s1)^2)/2) = f, s1 to s3 the principal stresses with sz. Common
  /// practice, no source.
  vonMises,
  /// Greatest less least of the three principal stresses = f. Common practice, no source.
  tresca,
  /// Greatest principal stress = f_t, least = -f_c. Common practice, no source.
  rankine,
  /// (sa - sb)/2 = c cos phi - (sa + sb)/2 sin phi, sa and sb the greatest and least principal stress. The
  /// utilisation is the left side over the right, infinite where that is not positive; R = c cos phi/((sa -
  /// sb)/2 + (sa + sb)/2 sin phi), none where that is not positive. Common practice, no source.
  mohrCoulomb,
  /// |t| = c - sn tan phi and sn <= cut-off, which is 0 unless given. The utilisation is the greater of
  /// |t|/(c - sn tan phi)
  /// and sn/cut-off, infinite where there is no finite one; R apart, since clamping grows with
  /// the loads. Common practice, no source.
  coulomb,
  /// sqrt(sn^2 + 3 t^2) = fu/(beta_w gamma_M2) and |sn| = 0.9 fu/gamma_M2; fillet welds only. EN 1993-1-8,
  /// 4.5.3.2.
  throat,
  /// (max(sn, 0)/fn)^2 + (t/fs)^2 = 1. Own form, common practice, no source.
  bond
};
template <>
const std::vector<Named<Criterion>>& namesOf<Criterion>();

/// What a criterion is a function of.
enum class ActsOn { line, plane, principal };

/// What is published of a criterion. 1 = along the line, 2 = across it, t = shear in those axes, X and Y the
/// strengths along and across by the sign of the stress.
struct CriterionRow {
  Criterion criterion;
  ActsOn actsOn;
  const char* equation; ///< the limit, in symbols of the trade, the source of a symbol()
  Text domain;          ///< what it is meant for; empty: any state of plane stress
  Text source;
};
const CriterionRow& rowOf(Criterion criterion);

/// Whether a criterion can judge a material of this kind.
bool applies(Criterion criterion, MaterialKind kind);
/// All that can, the usual one of the kind first.
std::vector<Criterion> criteriaFor(MaterialKind kind);

} // namespace planewright
