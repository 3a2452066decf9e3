// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

#include <functional>

class QWidget;

namespace planewright {

/// What assistive techniques are told of a drawing in which something turns, and may do with it.
struct DialWords {
  std::function<double()> value;      ///< deg, from −90 to 90
  std::function<void(double)> turn;   ///< to that angle, as one step
  std::function<QString()> said;      ///< the value in words, as it is spoken
  std::function<QString()> described; ///< everything that the drawing reads out
};

/// Makes a drawing known as a dial. Its name is the widget's own.
void makeDial(QWidget& widget, const DialWords& words);

/// Tells that the value has changed.
void announceDial(QWidget& widget);

} // namespace planewright
