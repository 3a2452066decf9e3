// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/material_json.h"
#include "core/record/study_file.h"
#include "core/record/typed_texts.h"

namespace planewright {

namespace {

/// An object that holds nothing but texts.
template <class Thing>
void putTextsAs(JsonWriter& json, std::string_view key, const Thing& thing) {
  json.key(key).beginObject();
  putTexts(json, thing);
  json.endObject();
}

/// What a name was given for stands only where it was given.
void put(JsonWriter& json, const Title& title) {
  json.key("title").beginObject();
  for (const TextField<Title>& field : textFieldsOf<Title>())
    if (const bool isState = field.spot == Spot::titlePreparedFor || field.spot == Spot::titleCheckedFor;
        !isState || !(title.*field.text).empty())
      json.key(rowOf(field.spot).key()).text(title.*field.text);
  json.endObject();
}

/// The usual count of digits is not written: what was signed before there was a choice stays signed.
void put(JsonWriter& json, const Convention& convention) {
  json.key("convention").beginObject();
  put(json, "positive", wordOf(convention.positive));
  put(json, "shear_axis", wordOf(convention.shearAxis));
  put(json, "shear_force", wordOf(convention.shearForce));
  if (convention.digits != Convention().digits)
    put(json, "digits", wordOf(convention.digits));
  json.endObject();
}

void put(JsonWriter& json, const LoadCase& one) {
  json.beginObject();
  put(json, "id", one.id);
  put(json, "name", one.name);
  put(json, "nature", wordOf(one.nature));
  put(json, "duration", wordOf(one.duration));
  json.key("excludes").beginList();
  for (const std::string& id : one.excludes)
    json.text(id);
  json.endList();
  json.endObject();
}

void put(JsonWriter& json, const Combination& one) {
  json.beginObject();
  put(json, "name", one.name);
  json.key("factors").beginObject();
  for (const Factor& factor : one.factors)
    json.key(factor.caseId).text(factor.factor);
  json.endObject();
  put(json, "basis", wordOf(one.basis));
  json.endObject();
}

void put(JsonWriter& json, const TypedSection& section) {
  json.beginObject();
  put(json, "name", section.name);
  put(json, "shape", wordOf(section.shape));
  json.key("sizes").beginObject();
  for (const TypedSize& size : section.sizes)
    json.key(size.key).text(size.text);
  json.endObject();
  json.endObject();
}

void put(JsonWriter& json, const FibreTexts& fibre) {
  json.key("fibre").beginObject();
  putTexts(json, fibre);
  put(json, "view", wordOf(fibre.view));
  json.endObject();
}

void put(JsonWriter& json, const PressureTexts& pressure) {
  json.key("pressure").beginObject();
  putTexts(json, pressure);
  put(json, "ends", wordOf(pressure.ends));
  json.endObject();
}

void put(JsonWriter& json, const RosetteTexts& rosette) {
  json.key("rosette").beginObject();
  put(json, "material", wordOf(rosette.material));
  putTexts(json, rosette);
  json.endObject();
}

void put(JsonWriter& json, const CaseStress& stress) {
  json.key(stress.caseId).beginObject();
  putTexts(json, stress);
  if (stress.forces)
    putTextsAs(json, "forces", *stress.forces);
  if (stress.pressure)
    put(json, *stress.pressure);
  if (stress.rosette)
    put(json, *stress.rosette);
  json.endObject();
}

void put(JsonWriter& json, const Line& line) {
  json.beginObject();
  put(json, "name", line.name);
  put(json, "kind", wordOf(line.kind));
  putTexts(json, line);
  json.endObject();
}

void put(JsonWriter& json, const WatchedPlane& plane) {
  json.beginObject();
  put(json, "name", plane.name);
  putTexts(json, plane);
  json.endObject();
}

void put(JsonWriter& json, const Check& check) {
  json.beginObject();
  put(json, "id", check.id);
  put(json, "criterion", wordOf(check.criterion));
  putGivenTexts(json, check);
  json.key("parameters").beginObject();
  putGivenTexts(json, check.parameters);
  json.endObject();
  json.endObject();
}

void put(JsonWriter& json, const Point& point);

template <class Item>
void put(JsonWriter& json, const char* key, const std::vector<Item>& items) {
  json.key(key).beginList();
  for (const Item& item : items)
    put(json, item);
  json.endList();
}

/// Most points have one line, or none.
void putLines(JsonWriter& json, const std::vector<Line>& lines) {
  if (lines.size() > 1)
    return put(json, "lines", lines);
  if (lines.empty())
    return;
  json.key("line");
  put(json, lines.front());
}

void put(JsonWriter& json, const Point& point) {
  json.beginObject();
  put(json, "name", point.name);
  put(json, "note", point.note);
  put(json, "axes", point.axes);
  if (point.fibre)
    put(json, *point.fibre);
  if (!point.freeEdge.empty())
    put(json, "free_edge", point.freeEdge);
  json.key("stress").beginObject();
  for (const CaseStress& stress : point.stress)
    put(json, stress);
  json.endObject();
  putLines(json, point.lines);
  put(json, "planes", point.planes);
  put(json, "checks", point.checks);
  put(json, "reading", point.reading);
  json.endObject();
}

} // namespace

std::string writeStudy(const Study& study) {
  JsonWriter json;
  json.beginObject();
  put(json, "format", studyFormat);
  json.key("version").whole(studyFileVersion);
  put(json, study.title);
  putTextsAs(json, "units", study.units);
  put(json, study.convention);
  put(json, "cases", study.cases);
  put(json, "combinations", study.combinations);
  put(json, "materials", study.materials);
  put(json, "sections", study.sections);
  put(json, "points", study.points);
  putTextsAs(json, "shown", study.shown);
  json.endObject();
  return json.taken();
}

} // namespace planewright
