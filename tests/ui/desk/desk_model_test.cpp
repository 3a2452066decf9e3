// SPDX-License-Identifier: GPL-3.0-or-later
// The desk and a plain list of studies run the same random commands and must agree after each.
#include "ui/desk/desk.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

/// The history as it should be: one study per step, the open gesture on top.
struct Model {
  std::vector<Study> past;
  Study now = newStudy();
  std::vector<Study> future;
  bool open = false; ///< the top step belongs to the gesture that is still going on

  void take(const Study& after, bool newGesture) {
    if (newGesture)
      open = false;
    if (after == now)
      return;
    future.clear();
    if (!open)
      past.push_back(now);
    now = after;
    open = true;
    if (now == past.back()) {
      past.pop_back();
      open = false;
    }
  }
  void undo() {
    open = false;
    if (past.empty())
      return;
    future.push_back(now);
    now = past.back();
    past.pop_back();
  }
  void redo() {
    open = false;
    if (future.empty())
      return;
    past.push_back(now);
    now = future.back();
    future.pop_back();
  }
};

Place anyPlace() {
  return *rc::gen::element(Place{Spot::sx, "P1", "G"}, Place{Spot::txy, "P1", "G"},
                           Place{Spot::reading, "P1", {}}, Place{Spot::lineAngle, "P1", "grain"},
                           Place{Spot::lineTolerance, "P1", "grain"});
}

/// Few names, so that edits often meet what is there.
std::string anyKey() {
  return *rc::gen::element<std::string>("P1", "P2", "G", "S", "W");
}

Place anyThing() {
  const std::string owner = anyKey();
  return *rc::gen::element(Place{Spot::point, owner, {}}, Place{Spot::loadCase, owner, {}},
                           Place{Spot::caseStress, owner, anyKey()},
                           Place{Spot::combination, owner + " sum", {}},
                           Place{Spot::factor, owner + " sum", anyKey()}, Place{Spot::line, owner, "seam"},
                           Place{Spot::section, "beam", {}}, Place{Spot::pressure, owner, anyKey()});
}

/// Texts typed and whole points, cases and combinations that come, go and move.
Edit anyEdit() {
  const int what = *rc::gen::inRange(0, 8);
  if (what == 0)
    return Remove{anyThing()};
  if (what == 1)
    return Move{anyThing(), *rc::gen::inRange<std::size_t>(0, 2)};
  if (what == 2)
    return Rename{anyThing(), anyKey()};
  if (what < 5)
    return Insert{anyThing(), std::nullopt};
  // Few values, so that drags often come back to where they began.
  return Type{anyPlace(), *rc::gen::element<std::string>("0", "1", "2", "no number", "3 deg", "4 MPa")};
}

RC_GTEST_PROP(DeskModel, agreesWithAListOfStudies, ()) {
  Desk desk(newStudy());
  Model model;
  Gesture gesture = desk.newGesture();
  const int steps = *rc::gen::inRange(1, 40);
  for (int i = 0; i < steps; ++i) {
    const int what = *rc::gen::inRange(0, 8);
    if (what == 0) {
      desk.undoStack()->undo();
      model.undo();
      gesture = desk.newGesture();
    } else if (what == 1) {
      desk.undoStack()->redo();
      model.redo();
      gesture = desk.newGesture();
    } else {
      const bool fresh = what < 5;
      if (fresh)
        gesture = desk.newGesture();
      const Edit edit = anyEdit();
      const Result<Study> after = edited(model.now, Edit{edit});
      RC_ASSERT(desk.request({edit}, gesture, QStringLiteral("Type")).has_value() == !after.has_value());
      model.take(after.value_or(model.now), fresh);
    }
    RC_ASSERT(desk.study() == model.now);
    RC_ASSERT(desk.undoStack()->canUndo() == !model.past.empty());
    RC_ASSERT(desk.readout() == evaluate(model.now));
  }
  while (desk.undoStack()->canUndo())
    desk.undoStack()->undo();
  RC_ASSERT(desk.study() == newStudy());
}

} // namespace
} // namespace planewright
