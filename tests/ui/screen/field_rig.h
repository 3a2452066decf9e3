// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"
#include "tests/support/judged_study.h"
#include "ui/screen/field_page.h"
#include "ui/screen/field_setup.h"
#include "ui/screen/screen_dialog.h"

#include <QCheckBox>
#include <QComboBox>
#include <QFile>
#include <QLineEdit>
#include <QPlainTextEdit>
#include <QPushButton>
#include <QTableView>
#include <QTemporaryDir>
#include <QTest>

#include <gtest/gtest.h>

namespace planewright {

/// A dialog over the judged study, whose checks of a plane are gone, and tables in a folder of their own.
class FieldRig : public testing::Test {
protected:
  FieldRig() : m_desk(study()) { m_dialog.show(); }

  static Study study() {
    Study study = judgedStudy();
    study.points[0].checks.pop_back();
    return study;
  }

  QString path(const char* name) const { return m_folder.filePath(QString::fromUtf8(name)); }
  QString written(const QByteArray& table) const {
    QFile file(path("deck.csv"));
    EXPECT_TRUE(file.open(QIODevice::WriteOnly));
    file.write(table);
    return file.fileName();
  }
  QByteArray bytesOf(const char* name) const {
    QFile file(path(name));
    return file.open(QIODevice::ReadOnly) ? file.readAll() : QByteArray();
  }

  void screen(const QByteArray& table) {
    m_dialog.setup().setTable(written(table));
    run();
  }
  void run() {
    m_dialog.setup().start().click();
    ASSERT_TRUE(QTest::qWaitFor([&] { return !m_dialog.isRunning(); }, 60000));
    if (m_dialog.showsResults()) {
      ASSERT_TRUE(QTest::qWaitFor([&] { return model().rowCount() > 0; }, 60000));
    }
  }
  FieldPage& page() { return m_dialog.page(); }
  FieldModel& model() { return m_dialog.page().model(); }
  QStringList column(FieldKey key) {
    QStringList texts;
    for (int row = 0; row < model().rowCount(); ++row)
      texts << model().index(row, model().columnOf(key)).data().toString();
    return texts;
  }

  Desk m_desk;
  ScreenDialog m_dialog{m_desk};

private:
  QTemporaryDir m_folder;
};

inline constexpr auto threePoints = "point,region,sx G,sy G,txy G,sx S,sy S,txy S\n"
                                    "n1,deck,1,0,0.1,2,0.05,0.1\n"
                                    "n2,corner,4,0.1,0.3,5,0.05,0.2\n"
                                    "n10,deck,0.5,0,0,0,0,0\n";

/// A mesh of 30 by 10 points, 100 mm apart; those of the right side exceed, and n17 has no place.
inline QByteArray mesh() {
  QByteArray table = "point,x [m],y [m],sx G,sy G,txy G,sx S,sy S,txy S\n";
  for (int i = 0; i < 300; ++i) {
    const int column = i % 30, row = i / 30;
    const QByteArray place =
        i == 17 ? QByteArray(",") : QByteArray::number(column / 10.0) + ',' + QByteArray::number(row / 10.0);
    table += 'n' + QByteArray::number(i) + ',' + place + ',' + QByteArray::number(column / 5.0) +
             ",0,0.1,2,0.05,0.1\n";
  }
  return table;
}

} // namespace planewright
