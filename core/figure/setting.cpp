// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/setting.h"

#include <algorithm>

namespace planewright {

namespace {
constexpr double mmPerPoint = 25.4 / 72;
constexpr double leastPoints = 7;
} // namespace

Setting settingOf(const Study& study, const Readout& readout, const FigureOrder& order) {
  const double points = order.textPoints;
  const double smallPoints = std::max(leastPoints, points - 1);
  Setting setting{study, readout, order, stressFormOf(study, readout.state())};
  setting.isNarrow = order.width < leastWidthBeside;
  setting.text = points * mmPerPoint;
  setting.small = smallPoints * mmPerPoint;
  setting.title = setting.isNarrow ? setting.text : setting.text + 2 * mmPerPoint;
  setting.table = setting.isNarrow ? setting.small : setting.text;
  if (setting.isNarrow) {
    setting.cut = 0.5;
    setting.wide = 0.35;
    setting.medium = 0.25;
    setting.narrow = 0.18;
    setting.hair = 0.13;
    setting.mark = 1.8;
  }
  return setting;
}

void setWords(Picture& picture, Vec at, const Runs& words, double size, Align align, Role role, bool bold) {
  picture.parts.push_back(Label{at, words, size, align, role, bold, false, ""});
}

void setLine(Picture& picture, Vec from, Vec to, const Pen& pen) {
  picture.parts.push_back(Path{{from, to}, false, pen, {}});
}

} // namespace planewright
