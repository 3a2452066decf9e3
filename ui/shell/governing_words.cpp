// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/governing_words.h"

#include "core/study/envelope.h"
#include "core/study/stress_form.h"
#include "core/table/check_words.h"
#include "ui/look/look.h"

#include <QCoreApplication>

#include <algorithm>

namespace planewright {

namespace {

QString words(const char* source) {
  return QCoreApplication::translate("Governing", source);
}

/// By the other measure where the first is shown already.
void showOneOf(Desk& desk, const GoverningStates& worst) {
  const Readout& readout = desk.readout();
  const auto isShown = [&readout](const Governing& governing) {
    return governing.point == readout.point && governing.combination == readout.state().combination;
  };
  const bool byShear = isShown(worst.principal);
  const Governing& next = byShear ? worst.shear : worst.principal;
  const StressForm stresses = stressFormOf(desk.study(), evaluate(desk.study(), next.point));
  desk.show(next.point, next.combination);
  const QString told = byShear
                           ? words(QT_TRANSLATE_NOOP("Governing", "%1, %2: greatest shear in the plane, %3"))
                           : words(QT_TRANSLATE_NOOP("Governing", "%1, %2: greatest σ1, %3"));
  desk.say(
      told.arg(fromUtf8(next.point), fromUtf8(next.combination), fromUtf8(stresses.withUnit(next.stress))));
}

bool isChecked(const Readout& readout) {
  return !readout.checks.empty();
}

bool governsByStrength(const Readout& readout, std::size_t state) {
  const Verdict verdict = verdictOf(readout);
  return verdict.governing && verdict.governing->state == state && judgedStates(readout) > 1;
}

QString utilisationOf(const Readout& readout, std::size_t state) {
  const Verdict verdict = verdictOfState(readout, state);
  if (verdict.standing == Standing::unjudged || !verdict.governing)
    return shown(wordOfStanding(verdict.standing));
  return shown(shownWorst(readingOf(readout, *verdict.governing)));
}

/// What stands first in a list: what exceeds, then what could not be judged, then the rest by utilisation.
double weightOf(const Verdict& verdict) {
  const double utilisation = verdict.governing ? verdict.governing->utilisation : -1;
  return verdict.standing == Standing::unjudged ? exceedingFrom : utilisation;
}

/// False where nothing is checked.
bool showGoverningCheck(Desk& desk, const std::vector<Readout>& points) {
  const Verdict verdict = verdictOf(points);
  if (!verdict.governing)
    return false;
  const auto readout = std::ranges::find(points, verdict.governing->point, &Readout::point);
  const std::string combination = readout->states[verdict.governing->state].combination;
  const QString worst = shown(shownWorst(readingOf(*readout, *verdict.governing)));
  desk.show(verdict.governing->point, combination);
  desk.say(words(QT_TRANSLATE_NOOP("Governing", "%1, %2: greatest utilisation, %3"))
               .arg(fromUtf8(verdict.governing->point), fromUtf8(combination), worst));
  return true;
}

} // namespace

QString governsBriefly(const Readout& readout, std::size_t state) {
  if (isChecked(readout))
    return governsByStrength(readout, state) ? words(QT_TRANSLATE_NOOP("Governing", "governs")) : QString();
  const Governs how = governs(readout, readout.states[state]);
  if (how.principal && how.shear)
    return words(QT_TRANSLATE_NOOP("Governing", "governs"));
  if (how.principal)
    return words(QT_TRANSLATE_NOOP("Governing", "governs by σ1"));
  return how.shear ? words(QT_TRANSLATE_NOOP("Governing", "governs by shear")) : QString();
}

QString governsInWords(const Readout& readout, std::size_t state) {
  if (isChecked(readout))
    return governsByStrength(readout, state)
               ? words(QT_TRANSLATE_NOOP("Governing",
                                         "The greatest utilisation of all combinations at this point"))
               : QString();
  const Governs how = governs(readout, readout.states[state]);
  if (how.principal && how.shear)
    return words(QT_TRANSLATE_NOOP(
        "Governing",
        "The greatest σ1 and the greatest shear in the plane of all combinations at this point"));
  if (how.principal)
    return words(QT_TRANSLATE_NOOP("Governing", "The greatest σ1 of all combinations at this point"));
  return how.shear ? words(QT_TRANSLATE_NOOP(
                         "Governing", "The greatest shear in the plane of all combinations at this point"))
                   : QString();
}

ListDetails combinationDetails(const Study& study, const Readout& readout) {
  const StressForm stresses = stressFormOf(study, readout);
  const bool checked = isChecked(readout);
  ListDetails details{words(QT_TRANSLATE_NOOP("Governing", "combination")),
                      checked
                          ? words(QT_TRANSLATE_NOOP("Governing", "utilisation"))
                          : words(QT_TRANSLATE_NOOP("Governing", "σn, %1")).arg(fromUtf8(study.units.stress)),
                      checked ? words(QT_TRANSLATE_NOOP("Governing", "Worst of all checks over their bands"))
                              : words(QT_TRANSLATE_NOOP("Governing", "Normal stress on the reading plane")),
                      {},
                      {}};
  for (std::size_t i = 0; i < readout.states.size(); ++i) {
    details.values << (checked ? utilisationOf(readout, i)
                               : fromUtf8(stresses.shown(readout.states[i].reading.sn)));
    details.remarks << governsBriefly(readout, i);
    if (checked)
      details.weights << weightOf(verdictOfState(readout, i));
  }
  return details;
}

ListDetails pointDetails(const Study& study) {
  ListDetails details;
  for (const Point& point : study.points) {
    const Readout readout = evaluate(study, point.name);
    const Verdict verdict = verdictOf(readout);
    const std::optional<JudgedCheck>& told = toldOf(verdict);
    if (isChecked(readout))
      details.valueHeading = words(QT_TRANSLATE_NOOP("Governing", "worst utilisation"));
    details.values << (told ? shown(shownWorst(readingOf(readout, *told)))
                            : shown(wordOfStanding(verdict.standing)));
    details.remarks << (told ? fromUtf8(readout.states[told->state].combination) : QString());
    details.weights << weightOf(verdict);
  }
  if (details.valueHeading.isEmpty())
    return {};
  details.nameHeading = words(QT_TRANSLATE_NOOP("Governing", "point"));
  details.valueMeaning = words(QT_TRANSLATE_NOOP("Governing", "Over all combinations and bands"));
  return details;
}

void showGoverningCombination(Desk& desk) {
  if (showGoverningCheck(desk, {desk.readout()}))
    return;
  if (const std::optional<GoverningStates> worst = governingOf(desk.readout()))
    showOneOf(desk, *worst);
}

void showGoverningPoint(Desk& desk) {
  std::vector<Readout> points;
  for (const Point& point : desk.study().points)
    points.push_back(evaluate(desk.study(), point.name));
  if (showGoverningCheck(desk, points))
    return;
  if (const std::optional<GoverningStates> worst = governingOf(points))
    showOneOf(desk, *worst);
}

} // namespace planewright
