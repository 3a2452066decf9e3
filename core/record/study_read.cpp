// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/file_head.h"
#include "core/record/material_json.h"
#include "core/record/study_file.h"
#include "core/record/study_spots.h"
#include "core/record/typed_texts.h"
#include "core/study/edit.h"

namespace planewright {

namespace {

void read(const Json& json, Reading& reading, Title& title) {
  readAllTexts(json, "title", reading, title);
}

void read(const Json& json, Reading& reading, Units& units) {
  readAllTexts(json, "units", reading, units);
}

void read(const Json& json, Reading& reading, Shown& shown) {
  readAllTexts(json, "shown", reading, shown);
}

void read(const Json& json, Reading& reading, Convention& convention) {
  ObjectReader object(json, "convention", reading);
  object.word("positive", convention.positive);
  object.word("shear_axis", convention.shearAxis);
  object.word("shear_force", convention.shearForce);
  object.word("digits", convention.digits);
  object.refuseUnread();
}

void read(const Json& json, Reading& reading, LoadCase& one) {
  ObjectReader object(json, pathOf({Spot::loadCase, nameIn(json, "id"), {}}), reading);
  object.neededText("id", one.id);
  object.text("name", one.name);
  object.word("nature", one.nature);
  object.word("duration", one.duration);
  object.texts("excludes", one.excludes);
  object.refuseUnread();
}

void read(const Json& json, Reading& reading, Combination& one) {
  ObjectReader object(json, pathOf({Spot::combination, nameIn(json, "name"), {}}), reading);
  object.neededText("name", one.name);
  if (const auto* factors = object.object("factors"))
    for (const JsonMember& factor : *factors) {
      isOf(Json::Kind::text, factor.value, pathOf({Spot::factor, one.name, factor.key}), reading);
      one.factors.push_back({factor.key, factor.value.text});
    }
  object.word("basis", one.basis);
  object.refuseUnread();
}

void read(const Json& json, Reading& reading, TypedSection& section) {
  ObjectReader object(json, pathOf({Spot::section, nameIn(json, "name"), {}}), reading);
  object.neededText("name", section.name);
  object.word("shape", section.shape);
  if (const auto* sizes = object.object("sizes")) {
    section.sizes.clear();
    for (const JsonMember& size : *sizes) {
      isOf(Json::Kind::text, size.value, pathOf({Spot::size, section.name, size.key}), reading);
      section.sizes.push_back({size.key, size.value.text});
    }
  }
  object.refuseUnread();
}

void read(const Json& json, const std::string& point, Reading& reading, FibreTexts& fibre) {
  ObjectReader object(json, pathOf({Spot::fibre, point, {}}), reading);
  object.neededText("section", fibre.section);
  readTexts(object, fibre);
  object.word("view", fibre.view);
  object.refuseUnread();
}

void read(const Json& json, const Place& place, Reading& reading, ForceTexts& forces) {
  readAllTexts(json, pathOf(place), reading, forces);
}

void read(const Json& json, const Place& place, Reading& reading, PressureTexts& pressure) {
  ObjectReader object(json, pathOf(place), reading);
  readTexts(object, pressure);
  object.word("ends", pressure.ends);
  object.refuseUnread();
}

void read(const Json& json, const Place& place, Reading& reading, RosetteTexts& rosette) {
  ObjectReader object(json, pathOf(place), reading);
  readTexts(object, rosette);
  object.word("material", rosette.material);
  object.refuseUnread();
}

/// A source of a case, where the file has it.
template <class Source>
void readSource(ObjectReader& object, const Place& place, Reading& reading, std::optional<Source>& source) {
  if (const Json* json = object.value(rowOf(place.spot).key()))
    read(*json, place, reading, source.emplace());
}

void read(const JsonMember& from, const std::string& point, Reading& reading, CaseStress& stress) {
  stress.caseId = from.key;
  ObjectReader object(from.value, pathOf({Spot::caseStress, point, from.key}), reading);
  readTexts(object, stress);
  readSource(object, {Spot::forces, point, from.key}, reading, stress.forces);
  readSource(object, {Spot::pressure, point, from.key}, reading, stress.pressure);
  readSource(object, {Spot::rosette, point, from.key}, reading, stress.rosette);
  object.refuseUnread();
}

void read(const Json& json, const std::string& point, Reading& reading, Line& line) {
  ObjectReader object(json, pathOf({Spot::line, point, nameIn(json, "name")}), reading);
  object.text("name", line.name);
  object.word("kind", line.kind);
  readTexts(object, line);
  object.refuseUnread();
}

void read(const Json& json, const std::string& point, Reading& reading, WatchedPlane& plane) {
  ObjectReader object(json, pathOf({Spot::plane, point, nameIn(json, "name")}), reading);
  object.neededText("name", plane.name);
  object.neededText("normal", plane.normal);
  object.text("tolerance", plane.tolerance);
  object.refuseUnread();
}

void read(const Json& json, const std::string& point, Reading& reading, Check& check) {
  const std::string path = pathOf({Spot::check, point, nameIn(json, "id")});
  ObjectReader object(json, path, reading);
  object.neededText("id", check.id);
  object.neededText("material", check.material);
  object.word("criterion", check.criterion);
  readTexts(object, check);
  if (const Json* parameters = object.value("parameters"))
    readAllTexts(*parameters, path + "/parameters", reading, check.parameters);
  object.refuseUnread();
}

/// One line under "line", several under "lines"; both at once are read as one list.
void readLines(ObjectReader& object, Reading& reading, Point& point) {
  if (const Json* line = object.value("line"))
    read(*line, point.name, reading, point.lines.emplace_back());
  if (const auto* lines = object.list("lines"))
    for (const JsonMember& one : *lines)
      read(one.value, point.name, reading, point.lines.emplace_back());
}

void read(const Json& json, Reading& reading, Point& point) {
  ObjectReader object(json, pathOf({Spot::point, nameIn(json, "name"), {}}), reading);
  object.neededText("name", point.name);
  object.text("note", point.note);
  object.text("axes", point.axes);
  if (const Json* fibre = object.value("fibre"))
    read(*fibre, point.name, reading, point.fibre.emplace());
  object.text("free_edge", point.freeEdge);
  if (const auto* cases = object.object("stress"))
    for (const JsonMember& one : *cases)
      read(one, point.name, reading, point.stress.emplace_back());
  readLines(object, reading, point);
  if (const auto* planes = object.list("planes"))
    for (const JsonMember& one : *planes)
      read(one.value, point.name, reading, point.planes.emplace_back());
  if (const auto* checks = object.list("checks"))
    for (const JsonMember& one : *checks)
      read(one.value, point.name, reading, point.checks.emplace_back());
  object.text("reading", point.reading);
  object.refuseUnread();
}

/// Reads a list in place of what a new study has; false when the file has none.
template <class Item>
bool readItems(ObjectReader& object, const char* key, Reading& reading, std::vector<Item>& target) {
  const auto* items = object.list(key);
  if (!items)
    return false;
  target.clear();
  for (const JsonMember& item : *items)
    read(item.value, reading, target.emplace_back());
  return true;
}

template <class Part>
void readPart(ObjectReader& object, const char* key, Reading& reading, Part& target) {
  if (const Json* part = object.value(key))
    read(*part, reading, target);
}

Study readParts(const Json& root, Reading& reading) {
  Study study = newStudy();
  ObjectReader object(root, {}, reading);
  object.value("format");
  object.value("version");
  readPart(object, "title", reading, study.title);
  readPart(object, "units", reading, study.units);
  readPart(object, "convention", reading, study.convention);
  readItems(object, "cases", reading, study.cases);
  readItems(object, "combinations", reading, study.combinations);
  readItems(object, "materials", reading, study.materials);
  readItems(object, "sections", reading, study.sections);
  // The point of a new study has stresses of that study's own case.
  if (!readItems(object, "points", reading, study.points))
    std::erase_if(study.points.front().stress,
                  [&](const CaseStress& stress) { return !findCase(study, stress.caseId); });
  readPart(object, "shown", reading, study.shown);
  object.refuseUnread();
  return study;
}

} // namespace

Results<Study> readStudy(std::string_view bytes) {
  FileProblems problems(bytes);
  const std::optional<Json> root = readJson(problems);
  if (!root)
    return tl::unexpected(problems.taken());
  FileProblems head(bytes);
  checkHead(*root,
            {studyFormat, studyFileVersion, PW_TEXT("File", "This is not a study of Planewright."),
             PW_TEXT("File", "A study begins with \"format\": \"%1\".")},
            head);
  if (!head.empty())
    return tl::unexpected(head.taken());
  Reading reading{problems, problems.empty()};
  Study study = readParts(*root, reading);
  if (reading.complete)
    addProblemsOf(study, *root, bytes, problems);
  if (!problems.empty())
    return tl::unexpected(problems.taken());
  return study;
}

} // namespace planewright
