// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QPlainTextEdit>
#include <QTimer>

namespace planewright {

/// The note of the shown point: several lines of free text, taken after a pause and on leaving; one stay is
/// one undo step.
class NoteField : public QPlainTextEdit {
  Q_OBJECT

public:
  explicit NoteField(Desk& desk, QWidget* parent = nullptr);
  QSize sizeHint() const override;
  QSize minimumSizeHint() const override { return sizeHint(); }

protected:
  bool event(QEvent* event) override;
  void focusInEvent(QFocusEvent* event) override;
  void focusOutEvent(QFocusEvent* event) override;
  void paintEvent(QPaintEvent* event) override;

private:
  bool hasDraft() const;
  void take();
  void takeLater(const Type& draft);
  void request(const Type& draft, Gesture gesture);
  void refresh();
  void follow();

  Desk& m_desk;
  QTimer m_settle;
  Place m_place;       ///< the note that is shown,
  std::string m_known; ///< its text when last seen, to tell whether it has moved,
  QString m_shown;     ///< and as it stands here while nobody types
  std::optional<Gesture> m_visit;
};

} // namespace planewright
