// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/figure_settings.h"

#include <QSettings>
#include <QTemporaryDir>

#include <gtest/gtest.h>

namespace planewright {
namespace {

class FigureSettingsFile : public testing::Test {
protected:
  QString path() const { return m_folder.filePath(QStringLiteral("settings.ini")); }

private:
  QTemporaryDir m_folder;
};

TEST_F(FigureSettingsFile, RemembersEveryChoice) {
  FigureSettings figure;
  figure.parts.title = figure.parts.givenElement = figure.parts.circle = false;
  figure.width = 123.5;
  figure.textPoints = 9.5;
  figure.mono = true;
  figure.arrangement = Arrangement::below;
  figure.blocks = *blocksIn("circle,planes");
  figure.format = FigureFormat::png;
  figure.dpi = 600;
  figure.carriesStudy = false;
  {
    QSettings settings(path(), QSettings::IniFormat);
    rememberFigure(settings, figure);
  }
  EXPECT_EQ(rememberedFigure(QSettings(path(), QSettings::IniFormat)), figure);
}

TEST_F(FigureSettingsFile, StartsAsNewWithoutAMemory) {
  EXPECT_EQ(rememberedFigure(QSettings(path(), QSettings::IniFormat)), FigureSettings());
}

TEST_F(FigureSettingsFile, TakesNothingOutOfRange) {
  QSettings settings(path(), QSettings::IniFormat);
  settings.setValue(QStringLiteral("figure/width"), QStringLiteral("1e9"));
  settings.setValue(QStringLiteral("figure/text"), QStringLiteral("nan"));
  settings.setValue(QStringLiteral("figure/format"), QStringLiteral("gif"));
  settings.setValue(QStringLiteral("figure/dpi"), -3);
  settings.setValue(QStringLiteral("figure/arrangement"), QStringLiteral("round"));
  settings.setValue(QStringLiteral("figure/order"), QStringLiteral("circle,circle"));
  EXPECT_EQ(rememberedFigure(settings), FigureSettings());
}

} // namespace
} // namespace planewright
