// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/json_writer.h"
#include "core/record/study_file.h"

namespace planewright {

namespace {

void put(JsonWriter& json, const char* key, std::string_view text) {
  json.key(key).text(text);
}

void put(JsonWriter& json, const Title& title) {
  json.key("title").beginObject();
  put(json, "project", title.project);
  put(json, "subject", title.subject);
  put(json, "number", title.number);
  put(json, "revision", title.revision);
  put(json, "prepared", title.prepared);
  put(json, "checked", title.checked);
  put(json, "date", title.date);
  put(json, "notes", title.notes);
  json.endObject();
}

void put(JsonWriter& json, const Units& units) {
  json.key("units").beginObject();
  put(json, "stress", units.stress);
  put(json, "force", units.force);
  put(json, "length", units.length);
  put(json, "moment", units.moment);
  json.endObject();
}

void put(JsonWriter& json, const Convention& convention) {
  json.key("convention").beginObject();
  put(json, "positive", wordOf(convention.positive));
  put(json, "shear_axis", wordOf(convention.shearAxis));
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

void put(JsonWriter& json, const CaseStress& stress) {
  json.key(stress.caseId).beginObject();
  put(json, "sx", stress.sx);
  put(json, "sy", stress.sy);
  put(json, "txy", stress.txy);
  put(json, "sz", stress.sz);
  json.endObject();
}

void put(JsonWriter& json, const Line& line) {
  json.key("line").beginObject();
  put(json, "name", line.name);
  put(json, "kind", wordOf(line.kind));
  put(json, "angle", line.angle);
  put(json, "tolerance", line.tolerance);
  json.endObject();
}

void put(JsonWriter& json, const WatchedPlane& plane) {
  json.beginObject();
  put(json, "name", plane.name);
  put(json, "normal", plane.normal);
  put(json, "tolerance", plane.tolerance);
  json.endObject();
}

void put(JsonWriter& json, const Point& point) {
  json.beginObject();
  put(json, "name", point.name);
  put(json, "note", point.note);
  put(json, "axes", point.axes);
  json.key("stress").beginObject();
  for (const CaseStress& stress : point.stress)
    put(json, stress);
  json.endObject();
  if (point.line)
    put(json, *point.line);
  json.key("planes").beginList();
  for (const WatchedPlane& plane : point.planes)
    put(json, plane);
  json.endList();
  put(json, "reading", point.reading);
  json.endObject();
}

template <class Item>
void put(JsonWriter& json, const char* key, const std::vector<Item>& items) {
  json.key(key).beginList();
  for (const Item& item : items)
    put(json, item);
  json.endList();
}

} // namespace

std::string writeStudy(const Study& study) {
  JsonWriter json;
  json.beginObject();
  put(json, "format", studyFormat);
  json.key("version").whole(studyFileVersion);
  put(json, study.title);
  put(json, study.units);
  put(json, study.convention);
  put(json, "cases", study.cases);
  put(json, "combinations", study.combinations);
  put(json, "points", study.points);
  json.key("shown").beginObject();
  put(json, "point", study.shown.point);
  put(json, "combination", study.shown.combination);
  json.endObject();
  json.endObject();
  return json.taken();
}

} // namespace planewright
