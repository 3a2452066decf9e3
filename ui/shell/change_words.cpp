// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/change_words.h"

#include "core/study/place_list.h"
#include "ui/look/look.h"

#include <QCoreApplication>

namespace planewright {

namespace {

bool isShown(const Place& place) {
  return place.spot == Spot::shownPoint || place.spot == Spot::shownCombination;
}

/// Places of `after` whose text is another in `before`; only the first two matter.
std::vector<Place> changedPlaces(const Study& before, const Study& after) {
  std::vector<Place> changed;
  for (const Place& place : typedPlacesIn(after)) {
    if (!isShown(place) && textAt(before, place) != textAt(after, place))
      changed.push_back(place);
    if (changed.size() == 2)
      break;
  }
  return changed;
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

} // namespace

QString changeInWords(const Study& before, const Study& after) {
  const std::vector<Place> changed = changedPlaces(before, after);
  if (changed.size() != 1 || rowOf(changed.front().spot).holds == Holds::word)
    return {};
  const auto was = textAt(before, changed.front());
  const auto now = textAt(after, changed.front());
  if (!was || !now || was->empty() || now->empty())
    return {};
  return QCoreApplication::translate("ChangeWords", "%1 now %2, was %3")
      .arg(capital(shown(rowOf(changed.front().spot).label)), cut(*now), cut(*was));
}

} // namespace planewright
