// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/strength_rules.h"

#include "core/study/text_fields.h"
#include "core/study/typed.h"

#include <algorithm>

namespace planewright {

namespace {

// In MPa or a plain number. Squares of what lies between, and of their inverses, are far from overflow.
constexpr double leastValue = 1e-9;
constexpr double greatestValue = 1e9;

std::optional<double> valueIn(const Study& study, Spot spot, const std::string& text) {
  if (text.empty())
    return std::nullopt;
  const Result<Entry> entry = readEntry(text, entryKindOf(study, spot));
  return entry ? std::optional(entry->value) : std::nullopt;
}

class MaterialRules {
public:
  MaterialRules(const Study& study, const Material& material) : m_study(study), m_material(material) {}

  Problems broken() {
    for (std::size_t i = 0; i < strengthKeys; ++i)
      strength(static_cast<StrengthKey>(i));
    positive(Spot::partialFactor, m_material.partialFactor);
    positive(Spot::strengthFactor, m_material.factor);
    for (const TextField<DurationTexts>& field : textFieldsOf<DurationTexts>())
      positive(field.spot, m_material.durations.*field.text);
    return std::move(m_problems);
  }

private:
  void add(Spot spot, const std::string& text, Text what, Text mend) {
    m_problems.push_back(problemAt({spot, m_material.name, {}}, text, std::move(what), std::move(mend)));
  }

  void strength(StrengthKey key) {
    const Spot spot = spotOf(key);
    const std::string& text = strengthText(m_material, key);
    if (text.empty())
      return;
    if (!has(m_material.kind, key))
      return add(spot, text,
                 PW_TEXT("Study", "“%1” is of the kind “%2”, which has no %3.")
                     .with(m_material.name)
                     .with(labelOf(m_material.kind))
                     .with(rowOf(spot).label),
                 PW_TEXT("Study", "Take it out, or give the material another kind."));
    const std::optional<double> value = valueIn(m_study, spot, text);
    if (key == StrengthKey::friction && value && !(*value >= 0 && *value < 90))
      return add(spot, text, PW_TEXT("Study", "An angle of friction is at least 0° and less than 90°."),
                 PW_TEXT("Study", "Give it in degrees, such as 30 deg."));
    if (key == StrengthKey::friction && value && *value == 0 &&
        valueIn(m_study, spotOf(StrengthKey::cohesion), m_material.cohesion) == 0)
      return add(spot, text, PW_TEXT("Study", "A plane with neither cohesion nor friction carries nothing."),
                 PW_TEXT("Study", "Give one of them."));
    if (rowOf(key).mayBeZero && value && *value == 0)
      return;
    positive(spot, text);
  }

  void positive(Spot spot, const std::string& text) {
    const std::optional<double> value = valueIn(m_study, spot, text);
    if (value && !(*value > 0))
      add(spot, text, PW_TEXT("Study", "The %1 is not greater than 0.").with(rowOf(spot).label),
          PW_TEXT("Study", "Give a positive number, for compression too."));
    else if (value && !(*value >= leastValue && *value <= greatestValue))
      add(spot, text,
          PW_TEXT("Study", "The %1 is out of every range that can be meant.").with(rowOf(spot).label),
          PW_TEXT("Study", "Check the exponent and the unit."));
  }

  const Study& m_study;
  const Material& m_material;
  Problems m_problems;
};

class CheckRules {
public:
  CheckRules(const Study& study, const Point& point, const Check& check)
      : m_study(study), m_point(point), m_check(check) {}

  Problems broken() {
    if (const Material* material = findMaterial(m_study, m_check.material))
      suits(*material);
    else
      add(Spot::checkMaterial, m_check.material,
          PW_TEXT("Study", "There is no material “%1” in this study.").with(m_check.material),
          PW_TEXT("Study", "Take one from the library, or add it to the materials."));
    const ActsOn actsOn = rowOf(m_check.criterion).actsOn;
    direction(Spot::checkLine, m_check.line, actsOn == ActsOn::line,
              findLine(m_point, m_check.line) != nullptr);
    direction(Spot::checkPlane, m_check.plane, actsOn == ActsOn::plane,
              findPlane(m_point, m_check.plane) != nullptr);
    for (const TextField<ParameterTexts>& field : textFieldsOf<ParameterTexts>())
      parameter(field.spot, m_check.parameters.*field.text);
    return std::move(m_problems);
  }

private:
  void add(Spot spot, const std::string& text, Text what, Text mend) {
    m_problems.push_back(problemAt({spot, m_point.name, m_check.id}, text, std::move(what), std::move(mend)));
  }

  void suits(const Material& material) {
    if (applies(m_check.criterion, material.kind))
      return;
    add(Spot::checkCriterion, std::string(wordOf(m_check.criterion)),
        PW_TEXT("Study", "The criterion “%1” does not judge a material of the kind “%2”.")
            .with(labelOf(m_check.criterion))
            .with(labelOf(material.kind)),
        PW_TEXT("Study", "Take a criterion of that kind, or another material."));
  }

  void direction(Spot spot, const std::string& name, bool isWanted, bool isThere) {
    if (isWanted && !isThere)
      add(spot, name,
          name.empty()
              ? PW_TEXT("Study", "Check “%1” needs its %2.").with(m_check.id).with(rowOf(spot).label)
              : PW_TEXT("Study", "Point %1 has no “%2” for its check.").with(m_point.name).with(name),
          PW_TEXT("Study", "Name one that the point has."));
    if (!isWanted && !name.empty())
      add(spot, name,
          PW_TEXT("Study", "The criterion “%1” takes no %2.")
              .with(labelOf(m_check.criterion))
              .with(rowOf(spot).label),
          PW_TEXT("Study", "Leave it empty."));
  }

  void parameter(Spot spot, const std::string& text) {
    if (text.empty())
      return;
    const std::vector<Spot> known = parametersOf(m_check.criterion);
    if (std::ranges::find(known, spot) == known.end())
      return add(spot, text,
                 PW_TEXT("Study", "The criterion “%1” takes no %2.")
                     .with(labelOf(m_check.criterion))
                     .with(rowOf(spot).label),
                 PW_TEXT("Study", "Leave it empty."));
    const bool hasSign = spot == Spot::checkF12 || spot == Spot::checkEdge;
    const std::optional<double> value = valueIn(m_study, spot, text);
    if (!hasSign && value && !(*value > 0))
      add(spot, text, PW_TEXT("Study", "The parameter %1 is not greater than 0.").with(rowOf(spot).label),
          PW_TEXT("Study", "Give a positive number."));
  }

  const Study& m_study;
  const Point& m_point;
  const Check& m_check;
  Problems m_problems;
};

} // namespace

std::vector<Spot> parametersOf(Criterion criterion) {
  switch (criterion) {
  case Criterion::hankinson:
    return {Spot::checkN};
  case Criterion::tsaiWu:
    return {Spot::checkF12};
  case Criterion::compressionAtAngle:
    return {Spot::checkKc90};
  case Criterion::taperedEdge:
    return {Spot::checkEdge};
  default:
    return {};
  }
}

Problems brokenStrengths(const Study& study, const Material& material) {
  return MaterialRules(study, material).broken();
}

Problems brokenCheck(const Study& study, const Point& point, const Check& check) {
  return CheckRules(study, point, check).broken();
}

} // namespace planewright
