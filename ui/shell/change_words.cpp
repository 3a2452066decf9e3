// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/change_words.h"

#include "core/quantity/format.h"
#include "core/study/place_list.h"
#include "core/table/table.h"
#include "ui/look/look.h"

#include <QCoreApplication>

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

bool isShown(const Place& place) {
  return place.spot == Spot::shownPoint || place.spot == Spot::shownCombination;
}

/// Places of `after` whose text is another in `before`; no more than are told.
std::vector<Place> changedPlaces(const Study& before, const Study& after) {
  std::vector<Place> changed;
  for (const Place& place : typedPlacesIn(after)) {
    if (!isShown(place) && textAt(before, place) != textAt(after, place))
      changed.push_back(place);
    if (changed.size() > 2)
      break;
  }
  return changed;
}

/// A line goes by its own name.
QString nameOf(const Place& place) {
  return place.spot == Spot::lineAngle ? fromUtf8(place.item) : shown(rowOf(place.spot).label);
}

QString cut(const std::string& text) {
  constexpr int most = 40;
  const QString line = fromUtf8(text).simplified();
  return line.size() > most ? line.left(most - 1) + QChar(0x2026) : line;
}

/// A number with or without a unit, no power of ten.
bool isPlainNumber(const std::string& text) {
  const std::size_t digits = text.find_first_not_of("-.0123456789");
  const std::string_view unit =
      digits == std::string::npos ? std::string_view() : std::string_view(text).substr(digits);
  const bool hasSignInside = text.find('-', 1) != std::string::npos;
  return digits != 0 && !hasSignInside &&
         (unit.empty() || (unit.starts_with(' ') && unit.find(' ', 1) == std::string_view::npos));
}

/// A symbol of one letter stays as it is written.
QString capital(QString words) {
  if (words.size() > 1 && words[1].isLetter() && words[0].script() == QChar::Script_Latin)
    words[0] = words[0].toUpper();
  return words;
}

/// A text as it is told: numbers with more digits than anyone reads are rounded, long texts are cut.
QString told(const Study& study, const Place& place) {
  const std::string text = textAt(study, place).value_or(std::string());
  if (text.empty())
    return QCoreApplication::translate("ChangeWords", "none");
  if (rowOf(place.spot).holds != Holds::expression)
    return cut(text);
  const EntryKind kind = entryKindOf(study, place);
  constexpr std::size_t readable = 14;
  const bool isLong = text.size() > readable;
  const Result<Entry> entry = isLong ? readEntry(text, kind) : Result<Entry>();
  if (isLong && entry && kind.dimension == dimension::angle)
    return fromUtf8(shownDegrees(Angle::fromDegrees(entry->value), angleDecimals));
  if (!isPlainNumber(text))
    return cut(text);
  if (isLong && entry) {
    const double value = kind.unit.fromBase(entry->value);
    return fromUtf8(shownNumber(value, decimalsFor(std::abs(value))) + " " + kind.unit.name);
  }
  return cut(text).replace(QLatin1Char('-'), QChar(0x2212));
}

} // namespace

QString changeInWords(const Study& before, const Study& after) {
  const std::vector<Place> changed = changedPlaces(before, after);
  const auto holdsWord = [](const Place& place) { return rowOf(place.spot).holds == Holds::word; };
  const auto isNew = [&](const Place& place) { return !textAt(before, place); };
  if (changed.empty() || changed.size() > 2 || std::ranges::any_of(changed, holdsWord) ||
      std::ranges::any_of(changed, isNew))
    return {};
  if (changed.size() == 2)
    return capital(
        QCoreApplication::translate("ChangeWords", "%1 now %2, %3 now %4")
            .arg(nameOf(changed[0]), told(after, changed[0]), nameOf(changed[1]), told(after, changed[1])));
  const Place& place = changed.front();
  return capital(QCoreApplication::translate("ChangeWords", "%1 now %2, was %3")
                     .arg(nameOf(place), told(after, place), told(before, place)));
}

} // namespace planewright
