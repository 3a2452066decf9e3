// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/slot.h"

#include "core/study/text_fields.h"

namespace planewright {

namespace {

/// The text of this spot in a thing that may be absent.
template <class Thing>
Slot textIn(Thing* thing, Spot spot) {
  if (thing)
    for (const TextField<Thing>& field : textFieldsOf<Thing>())
      if (field.spot == spot)
        return &(thing->*field.text);
  return {};
}

template <class Thing>
Thing* inside(std::optional<Thing>& thing) {
  return thing ? &*thing : nullptr;
}

bool isSet(const Slot& slot) {
  return !std::holds_alternative<std::monostate>(slot);
}

Slot slotOfStudy(Study& study, Spot spot) {
  switch (spot) {
  case Spot::positive:
    return &study.convention.positive;
  case Spot::shearAxis:
    return &study.convention.shearAxis;
  case Spot::shearForce:
    return &study.convention.shearForce;
  case Spot::digits:
    return &study.convention.digits;
  default:
    break;
  }
  if (const Slot slot = textIn(&study.title, spot); isSet(slot))
    return slot;
  if (const Slot slot = textIn(&study.units, spot); isSet(slot))
    return slot;
  return textIn(&study.shown, spot);
}

Slot slotInCase(LoadCase& loadCase, Spot spot) {
  switch (spot) {
  case Spot::caseName:
    return &loadCase.name;
  case Spot::caseNature:
    return &loadCase.nature;
  case Spot::caseDuration:
    return &loadCase.duration;
  case Spot::caseExcludes:
    return &loadCase.excludes;
  default:
    return {};
  }
}

Slot slotInCombination(Combination& combination, const Place& place) {
  if (place.spot == Spot::combinationBasis)
    return &combination.basis;
  if (place.spot == Spot::factor)
    if (Factor* factor = itemIn(combination.factors, &Factor::caseId, place.item))
      return &factor->factor;
  return {};
}

Slot slotInMaterial(Material& material, Spot spot) {
  switch (spot) {
  case Spot::materialKind:
    return &material.kind;
  case Spot::materialBasis:
    return &material.basis;
  case Spot::seam:
    return &material.seam;
  default:
    break;
  }
  if (const Slot slot = textIn(&material, spot); isSet(slot))
    return slot;
  return textIn(&material.durations, spot);
}

Slot slotInSection(TypedSection& section, const Place& place) {
  if (place.spot == Spot::sectionShape)
    return &section.shape;
  if (place.spot == Spot::size)
    if (TypedSize* size = itemIn(section.sizes, &TypedSize::key, place.item))
      return &size->text;
  return {};
}

Slot slotInStress(CaseStress& stress, Spot spot) {
  PressureTexts* pressure = inside(stress.pressure);
  RosetteTexts* rosette = inside(stress.rosette);
  if (spot == Spot::pressureEnds && pressure)
    return &pressure->ends;
  if (spot == Spot::rosetteMaterial && rosette)
    return &rosette->material;
  if (const Slot slot = textIn(&stress, spot); isSet(slot))
    return slot;
  if (const Slot slot = textIn(inside(stress.forces), spot); isSet(slot))
    return slot;
  if (const Slot slot = textIn(pressure, spot); isSet(slot))
    return slot;
  return textIn(rosette, spot);
}

Slot slotInLine(Line& line, Spot spot) {
  return spot == Spot::lineKind ? Slot(&line.kind) : textIn(&line, spot);
}

Slot slotInCheck(Check& check, Spot spot) {
  if (spot == Spot::checkCriterion)
    return &check.criterion;
  if (const Slot slot = textIn(&check, spot); isSet(slot))
    return slot;
  return textIn(&check.parameters, spot);
}

Slot slotInPoint(Point& point, const Place& place) {
  switch (place.spot) {
  case Spot::pointNote:
    return &point.note;
  case Spot::axes:
    return &point.axes;
  case Spot::freeEdge:
    return &point.freeEdge;
  case Spot::reading:
    return &point.reading;
  case Spot::fibreView:
    return point.fibre ? Slot(&point.fibre->view) : Slot();
  default:
    break;
  }
  if (const Slot slot = textIn(inside(point.fibre), place.spot); isSet(slot))
    return slot;
  const std::string_view path = rowOf(place.spot).path;
  if (path.starts_with("points/*/lines/")) {
    Line* line = itemIn(point.lines, &Line::name, place.item);
    return line ? slotInLine(*line, place.spot) : Slot();
  }
  if (path.starts_with("points/*/planes/"))
    return textIn(itemIn(point.planes, &WatchedPlane::name, place.item), place.spot);
  if (path.starts_with("points/*/checks/")) {
    Check* check = itemIn(point.checks, &Check::id, place.item);
    return check ? slotInCheck(*check, place.spot) : Slot();
  }
  CaseStress* stress = itemIn(point.stress, &CaseStress::caseId, place.item);
  return stress ? slotInStress(*stress, place.spot) : Slot();
}

template <class Enum>
bool putWord(Enum& target, std::string_view word) {
  const std::optional<Enum> value = fromWord<Enum>(word);
  if (value)
    target = *value;
  return value.has_value();
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

std::string joined(const std::vector<std::string>& ids) {
  std::string words;
  for (const std::string& id : ids)
    words += (words.empty() ? "" : ", ") + id;
  return words;
}

struct Write {
  std::optional<std::string> operator()(std::monostate) const { return std::nullopt; }
  std::optional<std::string> operator()(const std::string* text) const { return *text; }
  std::optional<std::string> operator()(const std::vector<std::string>* ids) const { return joined(*ids); }
  template <class Enum>
  std::optional<std::string> operator()(const Enum* value) const {
    return std::string(wordOf(*value));
  }
};

struct Put {
  std::string_view text;
  bool operator()(std::monostate) const { return false; }
  bool operator()(std::string* target) const {
    *target = text;
    return true;
  }
  bool operator()(std::vector<std::string>* ids) const {
    *ids = idsIn(text);
    return true;
  }
  template <class Enum>
  bool operator()(Enum* target) const {
    return putWord(*target, text);
  }
};

struct Fit {
  std::string_view text;
  bool operator()(std::monostate) const { return false; }
  bool operator()(const std::string*) const { return true; }
  bool operator()(const std::vector<std::string>*) const { return true; }
  template <class Enum>
  bool operator()(const Enum*) const {
    return fromWord<Enum>(text).has_value();
  }
};

struct Words {
  std::string operator()(std::monostate) const { return {}; }
  std::string operator()(const std::string*) const { return {}; }
  std::string operator()(const std::vector<std::string>*) const { return {}; }
  template <class Enum>
  std::string operator()(const Enum*) const {
    std::vector<std::string> words;
    for (const Named<Enum>& row : namesOf<Enum>())
      words.emplace_back(row.word);
    return joined(words);
  }
};

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
  if (path.starts_with("materials/")) {
    Material* material = itemIn(study.materials, &Material::name, place.owner);
    return material ? slotInMaterial(*material, place.spot) : Slot{};
  }
  if (path.starts_with("sections/")) {
    TypedSection* section = itemIn(study.sections, &TypedSection::name, place.owner);
    return section ? slotInSection(*section, place) : Slot{};
  }
  return slotOfStudy(study, place.spot);
}

std::optional<std::string> written(const Slot& slot) {
  return std::visit(Write{}, slot);
}

bool put(const Slot& slot, std::string_view text) {
  return std::visit(Put{text}, slot);
}

bool fits(const Slot& slot, std::string_view text) {
  return std::visit(Fit{text}, slot);
}

std::string wordsOf(const Slot& slot) {
  return std::visit(Words{}, slot);
}

std::optional<std::string> textAt(const Study& study, const Place& place) {
  // The slot is only read here; slots exist once, for reading and writing.
  return written(slotOf(const_cast<Study&>(study), place));
}

} // namespace planewright
