// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/report/sheet_writer.h"
#include "core/strength/strength_key.h"
#include "core/study/place_list.h"

#include <algorithm>
#include <cmath>
#include <functional>

namespace planewright {

namespace {

/// Everything that the user typed, as it was typed, with its value.
class Inputs {
public:
  Inputs(SheetWriter& sheet, const Study& study) : m_sheet(sheet), m_study(study) {}

  void write(const std::vector<Readout>& points) {
    m_sheet.heading(PW_TEXT("Sheet", "Given, as typed"));
    cases();
    combinations();
    for (const TypedSection& section : m_study.sections)
      writtenSection(section);
    for (const Material& material : m_study.materials)
      writtenMaterial(material);
    for (const Readout& readout : points)
      point(*findPoint(m_study, readout.point));
  }

private:
  void cases() {
    SheetTable table;
    table.columns = {{PW_TEXT("Sheet", "Load case"), false},
                     {PW_TEXT("Sheet", "Name"), false},
                     {PW_TEXT("Sheet", "Nature"), false},
                     {PW_TEXT("Sheet", "Duration"), false},
                     {PW_TEXT("Sheet", "Never with"), false}};
    for (const LoadCase& one : m_study.cases) {
      std::string excludes;
      for (const std::string& id : one.excludes)
        excludes += (excludes.empty() ? "" : ", ") + id;
      table.rows.push_back({verbatim(one.id), verbatim(one.name), labelOf(one.nature), labelOf(one.duration),
                            verbatim(excludes)});
    }
    m_sheet.subheading(PW_TEXT("Sheet", "Load cases and combinations"));
    m_sheet.table(std::move(table));
  }

  void combinations() {
    if (m_study.combinations.empty())
      return m_sheet.text(PW_TEXT("Sheet", "No combinations are given: each case is judged with factor 1."));
    SheetTable table;
    table.columns = {{PW_TEXT("Sheet", "Combination"), false},
                     {PW_TEXT("Sheet", "Factors as typed"), false},
                     {PW_TEXT("Sheet", "Basis"), false}};
    for (const Combination& one : m_study.combinations) {
      std::string factors;
      for (const Factor& factor : one.factors)
        factors += (factors.empty() ? "" : ", ") + factor.caseId + ": " + factor.factor;
      table.rows.push_back({verbatim(one.name), verbatim(factors), labelOf(one.basis)});
    }
    m_sheet.table(std::move(table));
  }

  /// What is typed at some places, but for what is empty; `skipZero` leaves out what is nothing.
  SheetTable typedTexts(const std::vector<Place>& places, bool skipZero,
                        const std::function<Text(const Place&)>& labelOf) const {
    SheetTable table;
    table.columns = {{PW_TEXT("Sheet", "Quantity"), false},
                     {PW_TEXT("Sheet", "As typed"), false},
                     {PW_TEXT("Sheet", "Value"), true}};
    for (const Place& place : places) {
      const std::string text = textAt(m_study, place).value_or("");
      if (text.empty() || isToldElsewhere(place.spot))
        continue;
      std::string value;
      if (rowOf(place.spot).holds == Holds::expression) {
        const EntryKind kind = entryKindOf(m_study, place);
        const Result<Entry> entry = readEntry(text, kind);
        if (entry && entry->value == 0 && skipZero)
          continue;
        value = entry ? valueWithUnit(entry->value, kind) : std::string();
      }
      table.rows.push_back({labelOf(place), wordsOf(place.spot, text), verbatim(value)});
    }
    return table;
  }

  /// A word of a file as people know it.
  static Text wordsOf(Spot spot, const std::string& text) {
    if (spot == Spot::checkCriterion)
      if (const auto criterion = fromWord<Criterion>(text))
        return planewright::labelOf(*criterion);
    return verbatim(text);
  }

  /// What stands in a heading or in a sentence already.
  static bool isToldElsewhere(Spot spot) {
    constexpr Spot told[] = {Spot::pointNote,      Spot::materialKind,    Spot::materialBasis,
                             Spot::materialSource, Spot::materialEdition, Spot::materialTrust};
    return std::ranges::find(told, spot) != std::end(told);
  }

  /// With the digits that a hand calculation has, without zeros behind them.
  static std::string valueWithUnit(double value, const EntryKind& kind) {
    constexpr int significant = 7;
    const double inUnit = kind.unit.fromBase(value);
    std::string shown = shownNumber(inUnit, decimalsFor(std::abs(inUnit), significant));
    constexpr auto signs = ".,";
    if (shown.find_first_of(signs) != std::string::npos && shown.find('e') == std::string::npos) {
      shown.erase(shown.find_last_not_of('0') + 1);
      shown.erase(shown.find_last_not_of(signs) + 1);
    }
    if (kind.dimension == dimension::angle)
      return shown + "°";
    return kind.unit.name.empty() ? shown : shown + " " + kind.unit.name;
  }

  void writtenSection(const TypedSection& section) {
    m_sheet.subheading(
        PW_TEXT("Sheet", "Section %1: %2").with(section.name).with(planewright::labelOf(section.shape)));
    std::vector<Place> places;
    for (const Place& place : typedPlacesIn(section))
      if (place.spot == Spot::size)
        places.push_back(place);
    m_sheet.table(typedTexts(places, false, [&](const Place& place) {
      const SizeKind* kind = sizeOfKey(section.shape, place.item);
      const Text name =
          kind ? PW_TEXT("Sheet", "%1, %2").with(kind->symbol).with(kind->meaning) : verbatim(place.item);
      const auto dot = place.item.find('.');
      return dot == std::string::npos
                 ? name
                 : PW_TEXT("Sheet", "block %1: %2").with(place.item.substr(0, dot)).with(name);
    }));
  }

  void writtenMaterial(const Material& material) {
    m_sheet.subheading(
        PW_TEXT("Sheet", "Material %1: %2").with(material.name).with(planewright::labelOf(material.kind)));
    m_sheet.text(PW_TEXT("Sheet", "Basis: %1.").with(planewright::labelOf(material.basis)));
    told(PW_TEXT("Sheet", "Source: %1."), material.source);
    told(PW_TEXT("Sheet", "Edition: %1."), material.edition);
    told(PW_TEXT("Sheet", "How it was read: %1."), material.trust);
    std::vector<Place> places = typedPlacesIn(material);
    if (material.kind != MaterialKind::throat)
      std::erase_if(places, [](const Place& place) { return place.spot == Spot::seam; });
    m_sheet.table(typedTexts(places, false, [&](const Place& place) {
      for (const StrengthKey key : keysOf(material.kind))
        if (spotOf(key) == place.spot)
          return PW_TEXT("Sheet", "%1, %2")
              .with(planewright::labelOf(material.kind, key))
              .with(rowOf(place.spot).label);
      return rowOf(place.spot).label;
    }));
  }

  void told(const Text& sentence, const std::string& words) {
    if (!words.empty())
      m_sheet.text(sentence.with(words));
  }

  void point(const Point& point) {
    m_sheet.subheading(PW_TEXT("Sheet", "Point %1").with(point.name));
    m_sheet.text(verbatim(point.note));
    m_sheet.table(typedTexts(typedPlacesIn(point), true, [&](const Place& place) {
      const Text& label = rowOf(place.spot).label;
      if (place.item.empty())
        return label;
      const bool ofCase = findStress(point, place.item) &&
                          std::string_view(rowOf(place.spot).path).find("/stress/") != std::string_view::npos;
      return ofCase ? PW_TEXT("Sheet", "case %1: %2").with(place.item).with(label)
                    : PW_TEXT("Sheet", "%1: %2").with(place.item).with(label);
    }));
    m_sheet.text(PW_TEXT("Sheet", "What is not listed is 0."), Voice::soft);
  }

  SheetWriter& m_sheet;
  const Study& m_study;
};

} // namespace

void writeInputs(SheetWriter& sheet, const Study& study, const std::vector<Readout>& points) {
  Inputs(sheet, study).write(points);
}

} // namespace planewright
