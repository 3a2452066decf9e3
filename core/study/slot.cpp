// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/slot.h"

namespace planewright {

namespace {

Slot slotInTitle(Study& study, Spot spot) {
  Title& title = study.title;
  switch (spot) {
  case Spot::titleProject:
    return {.text = &title.project};
  case Spot::titleSubject:
    return {.text = &title.subject};
  case Spot::titleNumber:
    return {.text = &title.number};
  case Spot::titleRevision:
    return {.text = &title.revision};
  case Spot::titlePrepared:
    return {.text = &title.prepared};
  case Spot::titleChecked:
    return {.text = &title.checked};
  case Spot::titleDate:
    return {.text = &title.date};
  case Spot::titleNotes:
    return {.text = &title.notes};
  default:
    return {};
  }
}

Slot slotOfStudy(Study& study, Spot spot) {
  switch (spot) {
  case Spot::unitStress:
    return {.text = &study.units.stress};
  case Spot::unitForce:
    return {.text = &study.units.force};
  case Spot::unitLength:
    return {.text = &study.units.length};
  case Spot::unitMoment:
    return {.text = &study.units.moment};
  case Spot::positive:
    return {.positive = &study.convention.positive};
  case Spot::shearAxis:
    return {.shearAxis = &study.convention.shearAxis};
  case Spot::shownPoint:
    return {.text = &study.shown.point};
  case Spot::shownCombination:
    return {.text = &study.shown.combination};
  default:
    return slotInTitle(study, spot);
  }
}

Slot slotInCase(LoadCase& loadCase, Spot spot) {
  switch (spot) {
  case Spot::caseName:
    return {.text = &loadCase.name};
  case Spot::caseNature:
    return {.nature = &loadCase.nature};
  case Spot::caseDuration:
    return {.duration = &loadCase.duration};
  case Spot::caseExcludes:
    return {.ids = &loadCase.excludes};
  default:
    return {};
  }
}

Slot slotInCombination(Combination& combination, const Place& place) {
  if (place.spot == Spot::combinationBasis)
    return {.basis = &combination.basis};
  if (place.spot == Spot::factor)
    if (Factor* factor = itemIn(combination.factors, &Factor::caseId, place.item))
      return {.text = &factor->factor};
  return {};
}

Slot slotInStress(CaseStress& stress, Spot spot) {
  switch (spot) {
  case Spot::sx:
    return {.text = &stress.sx};
  case Spot::sy:
    return {.text = &stress.sy};
  case Spot::txy:
    return {.text = &stress.txy};
  default:
    return {.text = &stress.sz};
  }
}

Slot slotInLine(Line& line, Spot spot) {
  switch (spot) {
  case Spot::lineName:
    return {.text = &line.name};
  case Spot::lineKind:
    return {.lineKind = &line.kind};
  case Spot::lineAngle:
    return {.text = &line.angle};
  default:
    return {.text = &line.tolerance};
  }
}

Slot slotInPlanes(Point& point, const Place& place) {
  WatchedPlane* plane = itemIn(point.planes, &WatchedPlane::name, place.item);
  if (!plane)
    return {};
  return {.text = place.spot == Spot::planeNormal ? &plane->normal : &plane->tolerance};
}

Slot slotInPoint(Point& point, const Place& place) {
  switch (place.spot) {
  case Spot::pointNote:
    return {.text = &point.note};
  case Spot::axes:
    return {.text = &point.axes};
  case Spot::reading:
    return {.text = &point.reading};
  case Spot::planeNormal:
  case Spot::planeTolerance:
    return slotInPlanes(point, place);
  case Spot::lineName:
  case Spot::lineKind:
  case Spot::lineAngle:
  case Spot::lineTolerance:
    return point.line ? slotInLine(*point.line, place.spot) : Slot{};
  case Spot::sx:
  case Spot::sy:
  case Spot::txy:
  case Spot::sz:
    break;
  default:
    return {};
  }
  CaseStress* stress = itemIn(point.stress, &CaseStress::caseId, place.item);
  return stress ? slotInStress(*stress, place.spot) : Slot{};
}

template <class Enum>
bool put(Enum* target, std::string_view word) {
  const std::optional<Enum> value = fromWord<Enum>(word);
  if (value)
    *target = *value;
  return value.has_value();
}

template <class Enum>
std::string joinedWords() {
  std::string words;
  for (const Named<Enum>& row : namesOf<Enum>())
    words += (words.empty() ? "" : ", ") + std::string(row.word);
  return words;
}

std::vector<std::string> idsIn(std::string_view text) {
  std::vector<std::string> ids;
  while (!text.empty()) {
    const auto comma = text.find(',');
    std::string_view id = text.substr(0, comma);
    while (id.starts_with(' '))
      id.remove_prefix(1);
    while (id.ends_with(' '))
      id.remove_suffix(1);
    ids.emplace_back(id);
    text = comma == std::string_view::npos ? std::string_view{} : text.substr(comma + 1);
  }
  return ids;
}

/// Calls `visit` with the enum pointer that is set.
template <class Visit>
auto withWord(const Slot& slot, Visit visit) -> decltype(visit(slot.positive)) {
  if (slot.positive)
    return visit(slot.positive);
  if (slot.shearAxis)
    return visit(slot.shearAxis);
  if (slot.lineKind)
    return visit(slot.lineKind);
  if (slot.nature)
    return visit(slot.nature);
  if (slot.duration)
    return visit(slot.duration);
  if (slot.basis)
    return visit(slot.basis);
  return {};
}

} // namespace

Slot slotOf(Study& study, const Place& place) {
  const std::string_view path = rowOf(place.spot).path;
  if (path.starts_with("points/")) {
    Point* point = itemIn(study.points, &Point::name, place.owner);
    return point ? slotInPoint(*point, place) : Slot{};
  }
  if (path.starts_with("cases/")) {
    LoadCase* loadCase = itemIn(study.cases, &LoadCase::id, place.owner);
    return loadCase ? slotInCase(*loadCase, place.spot) : Slot{};
  }
  if (path.starts_with("combinations/")) {
    Combination* combination = itemIn(study.combinations, &Combination::name, place.owner);
    return combination ? slotInCombination(*combination, place) : Slot{};
  }
  return slotOfStudy(study, place.spot);
}

std::optional<std::string> written(const Slot& slot) {
  if (slot.text)
    return *slot.text;
  if (slot.ids) {
    std::string joined;
    for (const std::string& id : *slot.ids)
      joined += (joined.empty() ? "" : ", ") + id;
    return joined;
  }
  const std::string word = withWord(slot, [](auto* value) { return std::string(wordOf(*value)); });
  return word.empty() ? std::nullopt : std::optional(word);
}

bool putWord(const Slot& slot, std::string_view text) {
  if (slot.ids) {
    *slot.ids = idsIn(text);
    return true;
  }
  return withWord(slot, [text](auto* value) { return put(value, text); });
}

std::string wordsOf(const Slot& slot) {
  return withWord(slot, [](auto* value) { return joinedWords<std::remove_pointer_t<decltype(value)>>(); });
}

std::optional<std::string> textAt(const Study& study, const Place& place) {
  // The slot is only read here; slots exist once, for reading and writing.
  return written(slotOf(const_cast<Study&>(study), place));
}

} // namespace planewright
