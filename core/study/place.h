// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/expression.h"
#include "core/study/study.h"

namespace planewright {

/// Every kind of spot in a study. The first group holds things that are inserted, removed, moved and renamed;
/// the second holds single texts that are typed (a factor and a size are both).
enum class Spot {
  loadCase,
  combination,
  material,
  section,
  point,
  fibre,
  caseStress,
  forces,
  pressure,
  rosette,
  line,
  plane,
  check,
  factor,
  size,
  // typed texts
  titleProject,
  titleSubject,
  titleNumber,
  titleRevision,
  titlePrepared,
  titlePreparedFor,
  titleChecked,
  titleCheckedFor,
  titleDate,
  titlePurpose,
  titleNotes,
  unitStress,
  unitForce,
  unitLength,
  unitMoment,
  positive,
  shearAxis,
  shearForce,
  digits,
  caseName,
  caseNature,
  caseDuration,
  caseExcludes, ///< ids joined by ", "
  combinationBasis,
  materialKind,
  materialSource,
  materialEdition,
  materialTrust,
  materialBasis,
  alongTension, ///< these in the order of StrengthKey
  alongCompression,
  alongBending,
  acrossTension,
  acrossCompression,
  strengthShear,
  strengthTension,
  strengthCompression,
  cohesion,
  friction,
  cutoff,
  fu,
  betaW,
  gammaM2,
  seam,
  partialFactor,
  strengthFactor,
  serviceClass,
  durationPermanent,
  durationLong,
  durationMedium,
  durationShort,
  durationInstantaneous,
  sectionShape,
  pointNote,
  axes,
  fibreSection,
  fibreY,
  fibreZ,
  fibreView,
  freeEdge,
  sx,
  sy,
  txy,
  sz,
  forceN,
  forceVy,
  forceVz,
  forceT,
  forceMy,
  forceMz,
  pressureP,
  pressureR,
  pressureT,
  pressureEnds,
  gaugeAngleA,
  gaugeAngleB,
  gaugeAngleC,
  gaugeStrainA,
  gaugeStrainB,
  gaugeStrainC,
  rosetteMaterial,
  rosetteE,
  rosetteNu,
  rosetteAlong,
  rosetteAcross,
  rosetteNu12,
  rosetteG,
  lineKind,
  lineAngle,
  lineTolerance,
  planeNormal,
  planeTolerance,
  checkMaterial,
  checkCriterion,
  checkLine,
  checkPlane,
  checkN,
  checkF12,
  checkKc90,
  checkEdge,
  reading,
  shownPoint,
  shownCombination
};

/// The spot of a strength in a material.
Spot spotOf(StrengthKey key);

/// One spot in a study: `owner` is the case id, combination, material, section or point it belongs to, `item`
/// the case id, size, line, plane or check inside that; both empty where the spot needs none.
struct Place {
  Spot spot = Spot::titleProject;
  std::string owner;
  std::string item;
  bool operator==(const Place&) const = default;
};

/// What a spot holds: a thing with spots of its own, or a typed text of some kind.
enum class Holds { thing, freeText, name, word, ids, unit, expression };

/// The one row that gives a spot its path, label and parser.
struct SpotRow {
  Spot spot;
  const char* path; ///< with * for owner and item: "points/*/stress/*/sx"
  Text label;       ///< "σ_{x}", "angle of the line"
  Holds holds = Holds::thing;
  Dimension dimension = dimension::none; ///< of an expression or a unit; that of a size goes by its key
  Slopes slopes = Slopes::none;
  bool mayBeEmpty = false;
  const char* ownUnit = nullptr; ///< of bare numbers, where it is not the study's unit of the dimension
  /// The last part of the path: the key of a text in files.
  std::string_view key() const;
};
const SpotRow& rowOf(Spot spot);

/// "points/P1/stress/G/sx"; "~" and "/" in names are written ~0 and ~1.
std::string pathOf(const Place& place);
/// The place of such a path; none when no spot has it.
std::optional<Place> placeOf(std::string_view path);

/// The typed text at a place, none when the place does not exist in this study.
std::optional<std::string> textAt(const Study& study, const Place& place);
/// What an expression at this place reads: dimension and the study's unit for it.
EntryKind entryKindOf(const Study& study, const Place& place);
/// The same where the spot alone tells, which it does of all but sizes.
EntryKind entryKindOf(const Study& study, Spot spot);

} // namespace planewright
