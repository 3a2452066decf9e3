// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/governing_words.h"

#include "core/study/envelope.h"
#include "core/study/stress_form.h"
#include "ui/look/look.h"

#include <QCoreApplication>

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

} // namespace

QString governsBriefly(const Governs& governs) {
  if (governs.principal && governs.shear)
    return words(QT_TRANSLATE_NOOP("Governing", "governs"));
  if (governs.principal)
    return words(QT_TRANSLATE_NOOP("Governing", "governs by σ1"));
  return governs.shear ? words(QT_TRANSLATE_NOOP("Governing", "governs by shear")) : QString();
}

QString governsInWords(const Governs& governs) {
  if (governs.principal && governs.shear)
    return words(QT_TRANSLATE_NOOP(
        "Governing",
        "The greatest σ1 and the greatest shear in the plane of all combinations at this point"));
  if (governs.principal)
    return words(QT_TRANSLATE_NOOP("Governing", "The greatest σ1 of all combinations at this point"));
  return governs.shear
             ? words(QT_TRANSLATE_NOOP("Governing",
                                       "The greatest shear in the plane of all combinations at this point"))
             : QString();
}

ListDetails combinationDetails(const Study& study, const Readout& readout) {
  const StressForm stresses = stressFormOf(study, readout);
  ListDetails details{words(QT_TRANSLATE_NOOP("Governing", "combination")),
                      words(QT_TRANSLATE_NOOP("Governing", "σn, %1")).arg(fromUtf8(study.units.stress)),
                      words(QT_TRANSLATE_NOOP("Governing", "Normal stress on the reading plane")),
                      {},
                      {}};
  for (const StateReading& state : readout.states) {
    details.values << fromUtf8(stresses.shown(state.reading.sn));
    details.remarks << governsBriefly(governs(readout, state));
  }
  return details;
}

void showGoverningCombination(Desk& desk) {
  if (const std::optional<GoverningStates> worst = governingOf(desk.readout()))
    showOneOf(desk, *worst);
}

void showGoverningPoint(Desk& desk) {
  std::vector<Readout> points;
  for (const Point& point : desk.study().points)
    points.push_back(evaluate(desk.study(), point.name));
  if (const std::optional<GoverningStates> worst = governingOf(points))
    showOneOf(desk, *worst);
}

} // namespace planewright
