// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/draft_edit.h"
#include "ui/entry/entry_field.h"
#include "ui/given/given_panel.h"

#include <QAbstractButton>
#include <QApplication>
#include <QLabel>
#include <QTest>

#include <gtest/gtest.h>

#include <stdexcept>

namespace planewright {

/// A panel in an active window, its fields found by the beginning of their accessible names.
struct GivenTest : testing::Test {
  Desk desk{newStudy()};
  GivenPanel panel{desk};

  GivenTest() {
    panel.resize(264, 700);
    panel.show();
    panel.activateWindow();
    EXPECT_TRUE(QTest::qWaitForWindowActive(&panel));
  }

  EntryField& field(const char* name) {
    for (auto* one : panel.findChildren<EntryField*>())
      if (one->edit().accessibleName().startsWith(QString::fromUtf8(name)))
        return *one;
    throw std::runtime_error(std::string("no field called ") + name);
  }
  void type(const char* name, const char* text) {
    DraftEdit& edit = field(name).edit();
    edit.setFocus(Qt::TabFocusReason);
    edit.selectAll();
    QTest::keyClicks(&edit, text);
    QTest::keyClick(&edit, Qt::Key_Return);
  }
  QAbstractButton& button(const QString& name) {
    for (auto* one : panel.findChildren<QAbstractButton*>())
      if (one->text() == name || one->accessibleName() == name)
        return *one;
    throw std::runtime_error("no button called " + name.toStdString());
  }
  std::string kept(Spot spot, const std::string& owner = "P1", const std::string& item = {}) const {
    return textAt(desk.study(), {spot, owner, item}).value_or("nothing");
  }
  const Line& firstLine() const { return desk.study().points.front().lines.front(); }
  bool says(const QString& words) {
    for (auto* label : panel.findChildren<QLabel*>())
      if (label->isVisible() && label->text().contains(words))
        return true;
    return false;
  }
};

} // namespace planewright
