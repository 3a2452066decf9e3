// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/draft_edit.h"

#include <QCoreApplication>
#include <QKeyEvent>

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(DraftEdit, selectsThePieceAtItsColumn) {
  DraftEdit edit;
  edit.setText("1,5 + 1,5");
  edit.selectPiece("1,5", 7);
  EXPECT_EQ(edit.selectionStart(), 6);
  EXPECT_EQ(edit.selectedText(), "1,5");
}

TEST(DraftEdit, columnsCountCodePoints) {
  DraftEdit edit;
  edit.setText(QString::fromUtf8("😀 σ 1,5"));
  edit.selectPiece("1,5", 5);
  EXPECT_EQ(edit.selectedText(), "1,5");
}

TEST(DraftEdit, aPieceThatIsNotThereSelectsAll) {
  DraftEdit edit;
  edit.setText("12 kN");
  edit.selectPiece("mm", 40);
  EXPECT_EQ(edit.selectedText(), "12 kN");
  edit.selectPiece("", 0);
  EXPECT_EQ(edit.selectedText(), "12 kN");
}

bool takesUndo(DraftEdit& edit) {
  QKeyEvent key(QEvent::ShortcutOverride, Qt::Key_Z, Qt::ControlModifier);
  key.ignore();
  QCoreApplication::sendEvent(&edit, &key);
  return key.isAccepted();
}

TEST(DraftEdit, leavesTheKeyOfTheFigureToTheWindow) {
  DraftEdit edit;
  edit.setText("5 MPa");
  QKeyEvent key(QEvent::ShortcutOverride, Qt::Key_E, Qt::ControlModifier);
  key.ignore();
  QCoreApplication::sendEvent(&edit, &key);
  EXPECT_FALSE(key.isAccepted());
}

TEST(DraftEdit, undoGoesOnToTheStudyWhenNothingIsTyped) {
  DraftEdit edit;
  edit.setText("5 MPa");
  EXPECT_FALSE(takesUndo(edit));
  edit.insert("1");
  EXPECT_TRUE(takesUndo(edit));
}

} // namespace
} // namespace planewright
