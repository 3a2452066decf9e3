// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/platform_name.h"

#include <QString>
#include <QSysInfo>

namespace planewright {

std::string platformName() {
  return (QSysInfo::prettyProductName() + QStringLiteral(", ") + QSysInfo::currentCpuArchitecture())
      .toStdString();
}

} // namespace planewright
