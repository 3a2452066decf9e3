// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/exact_words.h"

#include "core/figure/metrics.h"
#include "core/quantity/format.h"
#include "core/table/table.h"
#include "ui/look/look.h"

namespace planewright {

namespace {

std::string keyAt(const Picture& picture, QPointF at) {
  for (const auto& part : picture.parts) {
    const Label* label = std::get_if<Label>(&part);
    if (!label || label->key.empty())
      continue;
    const Box box = boxOf(*label);
    if (at.x() >= box.left && at.x() <= box.right && at.y() >= box.top && at.y() <= box.bottom)
      return label->key;
  }
  return {};
}

QString withMinus(double value) {
  QString number = fromUtf8(exactNumber(value));
  return number.replace(QLatin1Char('-'), QChar(0x2212));
}

QString stressWords(const Study& study, const char* symbol, double stress) {
  return QStringLiteral("%1 = %2 %3")
      .arg(QString::fromUtf8(symbol), withMinus(inStressUnit(study, stress)), fromUtf8(study.units.stress));
}

QString angleWords(const char* symbol, Angle angle) {
  return QStringLiteral("%1 = %2°").arg(QString::fromUtf8(symbol), withMinus(angle.degrees()));
}

} // namespace

QString exactWords(const Study& study, const Readout& readout, const Picture& picture, QPointF at) {
  const std::string key = keyAt(picture, at);
  const StateReading& state = readout.state();
  if (key == "sigma_n")
    return stressWords(study, "σn", state.reading.sn);
  if (key == "tau_nt")
    return stressWords(study, "τnt", state.reading.tnt);
  if (key == "sigma_t")
    return stressWords(study, "σt",
                       tractionOn(state.stress, {readout.reading.value + Angle::fromDegrees(90)}).sn);
  if (key == "theta")
    return angleWords("θ", readout.reading.value);
  if (key == "phi" && !readout.lines.empty())
    return angleWords("φ", readout.lines.front().angle.value);
  return {};
}

} // namespace planewright
