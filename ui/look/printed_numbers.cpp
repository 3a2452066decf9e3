// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/printed_numbers.h"

#include <QSettings>

namespace planewright {

namespace {

QString key() {
  return QStringLiteral("outputs/decimal");
}

} // namespace

DecimalSign chosenDecimalSign() {
  return fromWord<DecimalSign>(QSettings().value(key()).toString().toStdString())
      .value_or(DecimalSign::point);
}

void chooseDecimalSign(DecimalSign sign) {
  QSettings().setValue(key(), QString::fromStdString(std::string(wordOf(sign))));
}

} // namespace planewright
