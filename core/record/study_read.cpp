// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/object_reader.h"
#include "core/record/study_file.h"
#include "core/record/study_spots.h"
#include "core/study/edit.h"

#include <charconv>

namespace planewright {

namespace {

/// The name of an item, for the path of its Problems; empty as long as it has none.
std::string nameIn(const Json& json, const char* key) {
  const JsonMember* name = json.kind == Json::Kind::object ? member(json, key) : nullptr;
  return name && name->value.kind == Json::Kind::text ? name->value.text : "";
}

void read(const Json& json, Reading& reading, Title& title) {
  ObjectReader object(json, "title", reading);
  object.text("project", title.project);
  object.text("subject", title.subject);
  object.text("number", title.number);
  object.text("revision", title.revision);
  object.text("prepared", title.prepared);
  object.text("checked", title.checked);
  object.text("date", title.date);
  object.text("notes", title.notes);
  object.refuseUnread();
}

void read(const Json& json, Reading& reading, Units& units) {
  ObjectReader object(json, "units", reading);
  object.text("stress", units.stress);
  object.text("force", units.force);
  object.text("length", units.length);
  object.text("moment", units.moment);
  object.refuseUnread();
}

void read(const Json& json, Reading& reading, Convention& convention) {
  ObjectReader object(json, "convention", reading);
  object.word("positive", convention.positive);
  object.word("shear_axis", convention.shearAxis);
  object.refuseUnread();
}

void read(const Json& json, Reading& reading, Shown& shown) {
  ObjectReader object(json, "shown", reading);
  object.text("point", shown.point);
  object.text("combination", shown.combination);
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

void read(const JsonMember& from, const std::string& point, Reading& reading, CaseStress& stress) {
  stress.caseId = from.key;
  ObjectReader object(from.value, pathOf({Spot::caseStress, point, from.key}), reading);
  object.text("sx", stress.sx);
  object.text("sy", stress.sy);
  object.text("txy", stress.txy);
  object.text("sz", stress.sz);
  object.refuseUnread();
}

void read(const Json& json, const std::string& point, Reading& reading, Line& line) {
  ObjectReader object(json, pathOf({Spot::line, point, {}}), reading);
  object.text("name", line.name);
  object.word("kind", line.kind);
  object.text("angle", line.angle);
  object.text("tolerance", line.tolerance);
  object.refuseUnread();
}

void read(const Json& json, const std::string& point, Reading& reading, WatchedPlane& plane) {
  ObjectReader object(json, pathOf({Spot::plane, point, nameIn(json, "name")}), reading);
  object.neededText("name", plane.name);
  object.neededText("normal", plane.normal);
  object.text("tolerance", plane.tolerance);
  object.refuseUnread();
}

void read(const Json& json, Reading& reading, Point& point) {
  ObjectReader object(json, pathOf({Spot::point, nameIn(json, "name"), {}}), reading);
  object.neededText("name", point.name);
  object.text("note", point.note);
  object.text("axes", point.axes);
  if (const auto* cases = object.object("stress"))
    for (const JsonMember& one : *cases)
      read(one, point.name, reading, point.stress.emplace_back());
  if (const Json* line = object.value("line"))
    read(*line, point.name, reading, point.line.emplace());
  if (const auto* planes = object.list("planes"))
    for (const JsonMember& one : *planes)
      read(one.value, point.name, reading, point.planes.emplace_back());
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
  // The point of a new study has stresses of that study's own case.
  if (!readItems(object, "points", reading, study.points))
    std::erase_if(study.points.front().stress,
                  [&](const CaseStress& stress) { return !findCase(study, stress.caseId); });
  readPart(object, "shown", reading, study.shown);
  object.refuseUnread();
  return study;
}

Problem refused(std::string place, Text what, Text mend = {}) {
  return {std::move(place), 0, 0, {}, std::move(what), std::move(mend)};
}

/// Why the file is not a study that this program reads, told by its first two keys.
void checkHead(const Json& root, FileProblems& problems) {
  if (nameIn(root, "format") != studyFormat) {
    const JsonMember* format = root.kind == Json::Kind::object ? member(root, "format") : nullptr;
    problems.add(format ? format->value.offset : root.offset,
                 refused("format", PW_TEXT("File", "This is not a study of Planewright."),
                         PW_TEXT("File", "A study begins with \"format\": \"%1\".").with(studyFormat)));
    return;
  }
  const JsonMember* version = member(root, "version");
  if (!version) {
    problems.add(root.offset, refused("version", PW_TEXT("File", "The version of the file is missing."),
                                      PW_TEXT("File", "Write \"version\": 1.")));
    return;
  }
  const Json& value = version->value;
  int number = 0;
  const char* end = value.text.data() + value.text.size();
  const auto [parsed, error] = std::from_chars(value.text.data(), end, number);
  const bool isWhole = value.kind == Json::Kind::number && parsed == end;
  if (isWhole && (error == std::errc::result_out_of_range || number > studyFileVersion))
    problems.add(value.offset, "version",
                 PW_TEXT("File", "This file has version %1; this program reads version 1.").with(value.text),
                 PW_TEXT("File", "Open it with a newer Planewright; the file is left as it is."));
  else if (!isWhole || number < 1)
    problems.add(value.offset, "version", PW_TEXT("File", "The version of a file is a whole number from 1."),
                 PW_TEXT("File", "Write \"version\": 1."));
}

} // namespace

Results<Study> readStudy(std::string_view bytes) {
  FileProblems problems(bytes);
  const std::optional<Json> root = readJson(problems);
  if (!root)
    return tl::unexpected(problems.taken());
  FileProblems head(bytes);
  checkHead(*root, head);
  if (!head.empty())
    return tl::unexpected(head.taken());
  Reading reading{problems, problems.empty()};
  Study study = readParts(*root, reading);
  if (reading.complete)
    for (Problem& problem : problemsIn(study)) {
      const std::size_t offset = offsetOf(problem, *root, bytes);
      problems.add(offset, std::move(problem));
    }
  if (!problems.empty())
    return tl::unexpected(problems.taken());
  return study;
}

} // namespace planewright
