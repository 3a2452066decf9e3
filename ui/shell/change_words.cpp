// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/change_words.h"

#include "core/quantity/format.h"
#include "core/study/place_list.h"
#include "core/table/table.h"
#include "ui/look/look.h"

#include <QCoreApplication>

#include <algorithm>

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

QString capital(QString words) {
  if (!words.isEmpty() && words[0].script() == QChar::Script_Latin)
    words[0] = words[0].toUpper();
  return words;
}

/// A text as it is told: numbers with more digits than anyone reads are rounded, long texts are cut.
QString told(const Study& study, const Place& place) {
  const std::string text = textAt(study, place).value_or(std::string());
  if (text.empty())
    return QCoreApplication::translate("ChangeWords", "none");
  const EntryKind kind = entryKindOf(study, place);
  const bool isAngle = rowOf(place.spot).holds == Holds::expression && kind.dimension == dimension::angle;
  constexpr std::size_t readable = 14;
  if (isAngle && text.size() > readable)
    if (const Result<Entry> entry = readEntry(text, kind))
      return fromUtf8(shownDegrees(Angle::fromDegrees(entry->value), angleDecimals));
  return cut(text);
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
