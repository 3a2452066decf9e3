// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/press_access.h"

#include <QAccessible>
#include <QCheckBox>
#include <QRadioButton>
#include <QSignalSpy>

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(PressAccess, pressesAsAClickDoes) {
  installPressAccess();
  QCheckBox check(QStringLiteral("e&xceeding only"));
  QRadioButton radio(QStringLiteral("τ"));
  radio.setAccessibleName(QStringLiteral("shear"));
  for (QAbstractButton* button :
       {static_cast<QAbstractButton*>(&check), static_cast<QAbstractButton*>(&radio)}) {
    QSignalSpy clicked(button, &QAbstractButton::clicked);
    QAccessibleInterface* access = QAccessible::queryAccessibleInterface(button);
    ASSERT_TRUE(access && access->actionInterface());
    EXPECT_FALSE(access->state().checked);
    access->actionInterface()->doAction(access->actionInterface()->actionNames().front());
    EXPECT_EQ(clicked.count(), 1);
    EXPECT_TRUE(button->isChecked());
    EXPECT_TRUE(access->state().checked);
  }
  EXPECT_EQ(QAccessible::queryAccessibleInterface(&check)->text(QAccessible::Name), "exceeding only");
  EXPECT_EQ(QAccessible::queryAccessibleInterface(&check)->role(), QAccessible::CheckBox);
  EXPECT_EQ(QAccessible::queryAccessibleInterface(&radio)->text(QAccessible::Name), "shear");
  EXPECT_EQ(QAccessible::queryAccessibleInterface(&radio)->role(), QAccessible::RadioButton);
}

} // namespace
} // namespace planewright
