// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/section_edits.h"

#include "core/quantity/format.h"
#include "core/study/case_sources.h"
#include "core/study/fresh_name.h"

#include <algorithm>
#include <cassert>
#include <cmath>
#include <map>
#include <tuple>

namespace planewright {

namespace {

using Sizes = std::vector<TypedSize>;

/// Sizes to begin with.
const Sizes& usualSizes(SectionShape shape) {
  static const std::map<SectionShape, Sizes> usual = {
      {SectionShape::rectangle, {{"b", "100 mm"}, {"h", "200 mm"}}},
      {SectionShape::circle, {{"d", "100 mm"}}},
      {SectionShape::tube, {{"d", "200 mm"}, {"t", "10 mm"}}},
      {SectionShape::box, {{"b", "100 mm"}, {"h", "200 mm"}, {"t_w", "8 mm"}, {"t_f", "8 mm"}}},
      {SectionShape::i,
       {{"h", "300 mm"},
        {"t_w", "8 mm"},
        {"b_top", "150 mm"},
        {"t_top", "12 mm"},
        {"b_bottom", "150 mm"},
        {"t_bottom", "12 mm"},
        {"r", "0 mm"}}},
      {SectionShape::t, {{"h", "200 mm"}, {"b", "150 mm"}, {"t_w", "8 mm"}, {"t_f", "12 mm"}}},
      {SectionShape::channel, {{"h", "200 mm"}, {"b", "80 mm"}, {"t_w", "8 mm"}, {"t_f", "12 mm"}}},
      {SectionShape::built,
       {{"1.b", "100 mm"}, {"1.h", "200 mm"}, {"1.y", "0 mm"}, {"1.z", "0 mm"}, {"1.turn", "0 deg"}}},
      {SectionShape::tabled, {{"A", "20000 mm^2"}}}};
  return usual.at(shape);
}

Place placeOf(const std::string& section, const std::string& key) {
  return {Spot::size, section, key};
}

/// The section as a study of its own, in which edits of it can be tried.
Study alone(const Study& study, const TypedSection& section) {
  Study part = newStudy();
  part.units = study.units;
  part.sections = {section};
  return part;
}

std::string lengthText(const Study& study, double length) {
  const Unit unit = entryKindOf(study, Spot::fibreY).unit;
  return exactNumber(unit.fromBase(length)) + " " + unit.name;
}

/// The section with edits of it taken, or why not.
Result<SectionModel> modelAfter(const Study& study, const std::string& section, const Edits& edits) {
  const Result<Study> after = edited(alone(study, *findSection(study, section)), edits);
  if (!after)
    return tl::unexpected(after.error());
  Results<SectionModel> model = modelOf(*after, after->sections.front());
  assert(model);
  return *std::move(model);
}

/// The number of the ready place at which a fibre lies.
std::optional<std::size_t> readyPlace(const SectionModel& model, const Fibre& fibre) {
  const std::vector<NamedFibre> ready = readyFibres(model);
  const double slack = model.region.slack();
  const auto at = std::ranges::find_if(ready, [&](const NamedFibre& one) {
    return one.fibre.view == fibre.view && std::abs(one.fibre.y - fibre.y) <= slack &&
           std::abs(one.fibre.z - fibre.z) <= slack;
  });
  return at == ready.end() ? std::nullopt : std::optional(static_cast<std::size_t>(at - ready.begin()));
}

/// The lowest ready place, in the middle of the width where there are several; the centroid without any.
Fibre lowestOf(const SectionModel& model) {
  const std::vector<NamedFibre> ready = readyFibres(model);
  const auto lowest = std::ranges::min_element(ready, {}, [](const NamedFibre& one) {
    return std::tuple(one.fibre.y, one.fibre.view, std::abs(one.fibre.z));
  });
  return lowest == ready.end() ? Fibre{} : lowest->fibre;
}

int blocksIn(const TypedSection& section) {
  int count = 0;
  const auto has = [&](const std::string& key) {
    return std::ranges::find(section.sizes, key, &TypedSize::key) != section.sizes.end();
  };
  while (has(blockKey(count + 1, "b")))
    ++count;
  return count;
}

} // namespace

Edits editsThatReshape(const Study& study, const std::string& name, SectionShape shape) {
  const TypedSection* section = findSection(study, name);
  assert(section);
  if (section->shape == shape)
    return {};
  Edits edits;
  for (const TypedSize& size : section->sizes)
    edits.push_back(Remove{placeOf(name, size.key)});
  edits.push_back(Type{{Spot::sectionShape, name, {}}, std::string(wordOf(shape))});
  for (const TypedSize& usual : usualSizes(shape)) {
    const auto kept = std::ranges::find(section->sizes, usual.key, &TypedSize::key);
    edits.push_back(Insert{placeOf(name, usual.key), std::nullopt});
    edits.push_back(Type{placeOf(name, usual.key), kept == section->sizes.end() ? usual.text : kept->text});
  }
  const Result<SectionModel> model = modelAfter(study, name, edits);
  if (!model)
    return edits;
  const Fibre place = lowestOf(*model);
  for (const Point& point : study.points)
    if (point.fibre && point.fibre->section == name) {
      const Edits moved = editsThatPlaceFibre(study, point.name, place);
      edits.insert(edits.end(), moved.begin(), moved.end());
    }
  return edits;
}

Result<Edits> editsThatResize(const Study& study, const Place& size, const std::string& text) {
  const std::string& name = size.owner;
  Edits edits = {Type{size, text}};
  const Result<SectionModel> after = modelAfter(study, name, edits);
  if (!after)
    return tl::unexpected(after.error());
  const Results<SectionModel> before = modelOf(study, *findSection(study, name));
  assert(before);
  const std::vector<NamedFibre> ready = readyFibres(*after);
  if (ready.size() != readyFibres(*before).size())
    return edits;
  for (const Point& point : study.points) {
    if (!point.fibre || point.fibre->section != name)
      continue;
    const Results<PointSources> sources = PointSources::of(study, point);
    assert(sources);
    const std::optional<std::size_t> place = readyPlace(*before, sources->fibre());
    if (!place || ready[*place].fibre == sources->fibre())
      continue;
    const Edits moved = editsThatPlaceFibre(study, point.name, ready[*place].fibre);
    edits.insert(edits.end(), moved.begin(), moved.end());
  }
  return edits;
}

Edits editsThatAddBlock(const Study& study, const std::string& name) {
  const TypedSection* section = findSection(study, name);
  assert(section && section->shape == SectionShape::built);
  const Results<SectionModel> model = modelOf(study, *section);
  assert(model);
  const int number = blocksIn(*section) + 1;
  double top = 0;
  for (const Block& block : blocksOf(model->section))
    for (const SectionPoint& corner : cornersOf(block))
      top = std::max(top, corner.y);
  constexpr double depth = 20;
  const std::vector<std::pair<const char*, std::string>> texts = {{"b", lengthText(study, 100)},
                                                                  {"h", lengthText(study, depth)},
                                                                  {"y", lengthText(study, top + depth / 2)},
                                                                  {"z", lengthText(study, 0)},
                                                                  {"turn", "0 deg"}};
  Edits edits;
  for (const auto& [key, text] : texts) {
    edits.push_back(Insert{placeOf(name, blockKey(number, key)), std::nullopt});
    edits.push_back(Type{placeOf(name, blockKey(number, key)), text});
  }
  return edits;
}

Edits editsThatDropBlock(const Study& study, const std::string& name) {
  const TypedSection* section = findSection(study, name);
  assert(section);
  const int last = blocksIn(*section);
  Edits edits;
  if (last > 1)
    for (const SizeKind& kind : sizesOf(SectionShape::built))
      edits.push_back(Remove{placeOf(name, blockKey(last, kind.key))});
  return edits;
}

Edits editsThatPlaceFibre(const Study& study, const std::string& point, const Fibre& fibre) {
  return {Type{{Spot::fibreY, point, {}}, lengthText(study, fibre.y)},
          Type{{Spot::fibreZ, point, {}}, lengthText(study, fibre.z)},
          Type{{Spot::fibreView, point, {}}, std::string(wordOf(fibre.view))}};
}

Edits editsThatGiveFibre(const Study& study, const std::string& point, const std::string& section) {
  Edits edits;
  const TypedSection* known = findSection(study, section);
  if (!known)
    edits.push_back(Insert{{Spot::section, section, {}}, std::nullopt});
  if (!findPoint(study, point)->fibre)
    edits.push_back(Insert{{Spot::fibre, point, {}}, std::nullopt});
  edits.push_back(Type{{Spot::fibreSection, point, {}}, section});
  const TypedSection fresh{section};
  const Study part = alone(study, known ? *known : fresh);
  const Results<SectionModel> model = modelOf(part, part.sections.front());
  const Edits placed = editsThatPlaceFibre(study, point, model ? lowestOf(*model) : Fibre{});
  edits.insert(edits.end(), placed.begin(), placed.end());
  return edits;
}

Edits editsThatCopySection(const Study& study, const std::string& from, const std::string& to) {
  const TypedSection* section = findSection(study, from);
  assert(section);
  const auto index = static_cast<std::size_t>(section - study.sections.data()) + 1;
  Edits edits = {Insert{{Spot::section, to, {}}, index}};
  for (const TypedSize& size : TypedSection().sizes)
    edits.push_back(Remove{placeOf(to, size.key)});
  edits.push_back(Type{{Spot::sectionShape, to, {}}, std::string(wordOf(section->shape))});
  for (const TypedSize& size : section->sizes) {
    edits.push_back(Insert{placeOf(to, size.key), std::nullopt});
    edits.push_back(Type{placeOf(to, size.key), size.text});
  }
  return edits;
}

std::string freshSectionName(const Study& study, const std::string& like) {
  return freshNameLike(like, [&](const std::string& name) { return findSection(study, name); });
}

std::vector<std::string> pointsIn(const Study& study, const std::string& section) {
  std::vector<std::string> names;
  for (const Point& point : study.points)
    if (point.fibre && point.fibre->section == section)
      names.push_back(point.name);
  return names;
}

std::string freshSectionName(const Study& study) {
  return freshName(
      1, [](const std::string& number) { return "section " + number; },
      [&](const std::string& name) { return findSection(study, name); });
}

} // namespace planewright
