// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/material_edits.h"

#include "core/study/fresh_name.h"
#include "core/study/text_fields.h"

#include <cassert>

namespace planewright {

namespace {

template <class Thing>
void typeTexts(Edits& edits, const Thing& thing, const std::string& name) {
  for (const TextField<Thing>& field : textFieldsOf<Thing>())
    if (const std::string& text = thing.*field.text; !text.empty())
      edits.push_back(Type{{field.spot, name, {}}, text});
}

} // namespace

Edits editsThatTake(const Material& material, const std::string& name) {
  Edits edits = {Insert{{Spot::material, name, {}}, std::nullopt},
                 Type{{Spot::materialKind, name, {}}, std::string(wordOf(material.kind))},
                 Type{{Spot::materialBasis, name, {}}, std::string(wordOf(material.basis))},
                 Type{{Spot::seam, name, {}}, std::string(wordOf(material.seam))}};
  typeTexts(edits, material, name);
  typeTexts(edits, material.durations, name);
  return edits;
}

Edits editsThatChangeKind(const Study& study, const std::string& name, MaterialKind kind) {
  const Material* material = findMaterial(study, name);
  assert(material);
  Edits edits = {Type{{Spot::materialKind, name, {}}, std::string(wordOf(kind))}};
  for (std::size_t i = 0; i < strengthKeys; ++i)
    if (const auto key = static_cast<StrengthKey>(i); has(material->kind, key) && !has(kind, key))
      edits.push_back(Type{{spotOf(key), name, {}}, ""});
  if (kind != MaterialKind::throat)
    edits.push_back(Type{{Spot::seam, name, {}}, std::string(wordOf(Material{}.seam))});
  return edits;
}

std::string freshMaterialName(const Study& study, const std::string& wanted) {
  const auto isTaken = [&](const std::string& name) { return findMaterial(study, name) != nullptr; };
  if (!isTaken(wanted))
    return wanted;
  return freshName(
      2, [&](const std::string& number) { return wanted + " " + number; }, isTaken);
}

std::vector<Place> checksBy(const Study& study, const std::string& material) {
  std::vector<Place> checks;
  for (const Point& point : study.points)
    for (const Check& check : point.checks)
      if (check.material == material)
        checks.push_back({Spot::check, point.name, check.id});
  return checks;
}

} // namespace planewright
