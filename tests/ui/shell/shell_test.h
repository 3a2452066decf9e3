// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"
#include "ui/shell/filing.h"

#include <QCoreApplication>
#include <QSettings>
#include <QTemporaryDir>

#include <gtest/gtest.h>

#include <vector>

namespace planewright {

/// A folder and settings of its own for each test, and a person who answers the questions about files.
class ShellTest : public testing::Test {
protected:
  ShellTest() {
    QCoreApplication::setOrganizationName(QStringLiteral("planewright-tests"));
    QCoreApplication::setApplicationName(QStringLiteral("planewright-tests"));
    QSettings::setDefaultFormat(QSettings::IniFormat);
    QSettings::setPath(QSettings::IniFormat, QSettings::UserScope, m_folder.path());
    QSettings().clear();
  }

  QString file(const QString& name) const { return m_folder.filePath(name); }

  FileQuestions answers() {
    return {[this](const QString&) {
              ++m_askedUnsaved;
              return m_unsaved;
            },
            [this] { return m_openPath; },
            [this](const QString& proposed) {
              m_proposedPath = proposed;
              return m_savePath;
            },
            [this] { return m_importPath; },
            [this](const QString&) { return m_exportPath; },
            [this](const QString&, const Holder&) {
              ++m_askedElsewhere;
              return m_elsewhere;
            },
            [this](const QString&, Obstacle obstacle) {
              m_obstacles.push_back(obstacle);
              return m_overwrite;
            }};
  }

  static void type(Desk& desk, Spot spot, const std::string& text) {
    const Point& point = shownPoint(desk.study());
    const bool isOfLine = spot == Spot::lineAngle || spot == Spot::lineTolerance;
    const bool isOfCase = spot == Spot::sx || spot == Spot::sy || spot == Spot::txy;
    const std::string item = isOfLine ? point.lines[0].name : isOfCase ? point.stress[0].caseId : "";
    ASSERT_FALSE(
        desk.request({Type{{spot, point.name, item}, text}}, desk.newGesture(), QStringLiteral("typing")));
  }

  Unsaved m_unsaved = Unsaved::stay;
  QString m_openPath;
  QString m_savePath;
  QString m_proposedPath;
  QString m_importPath;
  QString m_exportPath;
  int m_askedUnsaved = 0;
  Elsewhere m_elsewhere = Elsewhere::stay;
  int m_askedElsewhere = 0;
  Overwrite m_overwrite = Overwrite::stay;
  std::vector<Obstacle> m_obstacles;

private:
  QTemporaryDir m_folder;
};

} // namespace planewright
