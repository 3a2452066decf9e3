// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/font.h"

#include <QApplication>

#include <gtest/gtest.h>

#include <clocale>
#include <cstdio>

int main(int argc, char** argv) {
  qputenv("QT_QPA_PLATFORM", "offscreen");
  QApplication application(argc, argv);
  std::setlocale(LC_NUMERIC, "C");
  if (!planewright::loadProgramFont()) {
    std::fputs("the embedded font does not load\n", stderr);
    return 1;
  }
  QApplication::setFont(planewright::programFont(13));
  testing::InitGoogleTest(&argc, argv);
  return RUN_ALL_TESTS();
}
