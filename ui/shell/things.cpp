// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/things.h"

#include "core/study/combination_text.h"
#include "core/study/copied_point.h"
#include "core/study/fresh_name.h"
#include "core/study/section_edits.h"
#include "core/study/typed.h"
#include "core/table/cautions.h"
#include "ui/look/look.h"

#include <QCoreApplication>

namespace planewright {

namespace {

QString words(const char* source) {
  return QCoreApplication::translate("Things", source);
}

/// A column over a typed spot of the thing at the row's place.
ThingColumn typedColumn(const QString& heading, Spot spot,
                        const std::function<Place(const Study&, std::size_t)>& place) {
  const auto spotOf = [spot, place](const Study& study, std::size_t row) {
    return Place{spot, place(study, row).owner, {}};
  };
  return {heading,
          [spotOf](const Study& study, std::size_t row) {
            return fromUtf8(textAt(study, spotOf(study, row)).value_or(std::string()));
          },
          [spotOf](const Study& study, std::size_t row, const std::string& typed) -> Result<Edits> {
            return Edits{Type{spotOf(study, row), typed}};
          }};
}

/// A column over a word, shown and chosen by its label.
template <class Enum>
ThingColumn wordColumn(const QString& heading, Spot spot,
                       const std::function<Place(const Study&, std::size_t)>& place) {
  ThingColumn column = typedColumn(heading, spot, place);
  const auto wordText = column.text;
  column.text = [wordText](const Study& study, std::size_t row) {
    const auto value = fromWord<Enum>(wordText(study, row).toStdString());
    return value ? shown(labelOf(*value)) : QString();
  };
  const auto typeWord = column.edits;
  column.edits = [typeWord](const Study& study, std::size_t row, const std::string& typed) {
    for (const Named<Enum>& name : namesOf<Enum>())
      if (shown(name.label).toStdString() == typed)
        return typeWord(study, row, std::string(name.word));
    return typeWord(study, row, typed);
  };
  for (const Named<Enum>& name : namesOf<Enum>())
    column.choices << shown(name.label);
  return column;
}

/// The column of the key: typing in it renames the thing and what refers to it.
ThingColumn keyColumn(const QString& heading, const std::function<Place(const Study&, std::size_t)>& place) {
  return {heading, [place](const Study& study, std::size_t row) { return fromUtf8(place(study, row).owner); },
          [place](const Study& study, std::size_t row, const std::string& typed) -> Result<Edits> {
            return Edits{Rename{place(study, row), typed}};
          }};
}

/// The next letter of an action that is free: G, Q, S, W, then Q2.
std::string freshCaseId(const Study& study) {
  for (const char* id : {"G", "Q", "S", "W"})
    if (!findCase(study, id))
      return id;
  return freshName(
      2, [](const std::string& number) { return "Q" + number; },
      [&](const std::string& id) { return findCase(study, id); });
}

Edits newCase(const Study& study) {
  const std::string id = freshCaseId(study);
  Edits edits = {Insert{{Spot::loadCase, id, {}}, std::nullopt}};
  if (id != "G")
    edits.push_back(Type{{Spot::caseNature, id, {}}, std::string(wordOf(Nature::variable))});
  if (id != "G")
    edits.push_back(Type{{Spot::caseDuration, id, {}}, std::string(wordOf(Duration::medium))});
  return edits;
}

/// "b = 140 mm, h = 600 mm"
QString sizesOf(const TypedSection& section) {
  QStringList sizes;
  for (const TypedSize& size : section.sizes)
    sizes << fromUtf8(size.key + " = " + size.text);
  return sizes.join(QStringLiteral(", "));
}

QString joined(const std::vector<std::string>& names) {
  QStringList words;
  for (const std::string& name : names)
    words << fromUtf8(name);
  return words.join(QStringLiteral(", "));
}

} // namespace

Things loadCases() {
  const auto place = [](const Study& study, std::size_t row) {
    return Place{Spot::loadCase, study.cases[row].id, {}};
  };
  ThingColumn id = keyColumn(words(QT_TRANSLATE_NOOP("Things", "Case")), place);
  id.edits = [](const Study& study, std::size_t row, const std::string& typed) -> Result<Edits> {
    return editsThatRenameCase(study, study.cases[row].id, typed);
  };
  return {words(QT_TRANSLATE_NOOP("Things", "Load cases")),
          words(QT_TRANSLATE_NOOP("Things", "load case")),
          "combinations#cases",
          [](const Study& study) { return study.cases.size(); },
          {id, typedColumn(words(QT_TRANSLATE_NOOP("Things", "Name")), Spot::caseName, place),
           wordColumn<Nature>(words(QT_TRANSLATE_NOOP("Things", "Nature")), Spot::caseNature, place),
           wordColumn<Duration>(words(QT_TRANSLATE_NOOP("Things", "Duration")), Spot::caseDuration, place),
           typedColumn(words(QT_TRANSLATE_NOOP("Things", "Never together with")), Spot::caseExcludes, place)},
          newCase,
          place,
          {},
          {},
          [](const Study& study, std::size_t row) -> Result<Edits> {
            return editsThatRemoveCase(study, study.cases[row].id);
          }};
}

Things combinations() {
  const auto place = [](const Study& study, std::size_t row) {
    return Place{Spot::combination, study.combinations[row].name, {}};
  };
  const ThingColumn terms{
      words(QT_TRANSLATE_NOOP("Things", "Factors")),
      [](const Study& study, std::size_t row) { return fromUtf8(textOf(study.combinations[row])); },
      [](const Study& study, std::size_t row, const std::string& typed) {
        return editsThatSet(study, study.combinations[row].name, typed);
      }};
  return {words(QT_TRANSLATE_NOOP("Things", "Combinations")),
          words(QT_TRANSLATE_NOOP("Things", "combination")),
          "combinations#list",
          [](const Study& study) { return study.combinations.size(); },
          {keyColumn(words(QT_TRANSLATE_NOOP("Things", "Name")), place), terms,
           wordColumn<Basis>(words(QT_TRANSLATE_NOOP("Things", "Basis")), Spot::combinationBasis, place)},
          editsThatAddNext,
          place,
          {},
          editsThatAddLines,
          {},
          [](const Study& study, std::size_t row) {
            const Combination& one = study.combinations[row];
            return isMisnamed(study, one) ? shown(misnamed(one.name, textOf(one))) : QString();
          }};
}

Things points() {
  const auto place = [](const Study& study, std::size_t row) {
    return Place{Spot::point, study.points[row].name, {}};
  };
  return {words(QT_TRANSLATE_NOOP("Things", "Points")),
          words(QT_TRANSLATE_NOOP("Things", "point")),
          "combinations#points",
          [](const Study& study) { return study.points.size(); },
          {keyColumn(words(QT_TRANSLATE_NOOP("Things", "Point")), place),
           typedColumn(words(QT_TRANSLATE_NOOP("Things", "Note")), Spot::pointNote, place)},
          [](const Study& study) {
            const std::string name = freshPointName(study, study.points.back().name);
            Edits edits = {Insert{{Spot::point, name, {}}, std::nullopt}};
            edits.push_back(Insert{{Spot::line, name, "grain"}, std::nullopt});
            return edits;
          },
          place,
          [](const Study& study, std::size_t row) {
            const std::string& name = study.points[row].name;
            return editsThatCopyPoint(study, name, freshPointName(study, name));
          }};
}

Things sections() {
  const auto place = [](const Study& study, std::size_t row) {
    return Place{Spot::section, study.sections[row].name, {}};
  };
  ThingColumn shape =
      wordColumn<SectionShape>(words(QT_TRANSLATE_NOOP("Things", "Shape")), Spot::sectionShape, place);
  shape.edits = [](const Study& study, std::size_t row, const std::string& typed) -> Result<Edits> {
    const std::string& name = study.sections[row].name;
    for (const Named<SectionShape>& one : namesOf<SectionShape>())
      if (shown(one.label).toStdString() == typed)
        return editsThatReshape(study, name, one.value);
    return Edits{Type{{Spot::sectionShape, name, {}}, typed}};
  };
  return {words(QT_TRANSLATE_NOOP("Things", "Sections")),
          words(QT_TRANSLATE_NOOP("Things", "section")),
          "given#section",
          [](const Study& study) { return study.sections.size(); },
          {keyColumn(words(QT_TRANSLATE_NOOP("Things", "Section")), place),
           shape,
           {words(QT_TRANSLATE_NOOP("Things", "Sizes")),
            [](const Study& study, std::size_t row) { return sizesOf(study.sections[row]); }},
           {words(QT_TRANSLATE_NOOP("Things", "Points in it")),
            [](const Study& study, std::size_t row) {
              return joined(pointsIn(study, study.sections[row].name));
            }}},
          [](const Study& study) {
            return Edits{Insert{{Spot::section, freshSectionName(study), {}}, std::nullopt}};
          },
          place,
          [](const Study& study, std::size_t row) {
            const std::string& name = study.sections[row].name;
            return editsThatCopySection(study, name, freshSectionName(study, name));
          },
          {},
          [](const Study& study, std::size_t row) -> Result<Edits> {
            const std::string& name = study.sections[row].name;
            const std::vector<std::string> inside = pointsIn(study, name);
            if (inside.empty())
              return Edits{Remove{{Spot::section, name, {}}}};
            return tl::unexpected(problemAt({Spot::section, name, {}}, name,
                                            PW_TEXT("Things", "Points lie in the section “%1”: %2.")
                                                .with(name)
                                                .with(joined(inside).toStdString()),
                                            PW_TEXT("Things", "Give them another section, or none, first.")));
          }};
}

} // namespace planewright
