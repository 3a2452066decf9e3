// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QWidget>

class QLabel;

namespace planewright {

/// The line at the foot: left the newest message with one action, or how many entries are not taken; right
/// the keys of the area that has the focus.
class StatusLine : public QWidget {
  Q_OBJECT

public:
  explicit StatusLine(QWidget* parent);

  /// A message; `action` is a word to click, such as "Undo", or empty.
  void say(const QString& message, const QString& action = {});
  /// Entries that stand in fields but not in the study; they go before every message until there are none.
  void setNotTaken(int count, const QString& first);
  void setKeys(const QString& keys);
  /// What stands at the left, without marks.
  QString words() const;

signals:
  void actionClicked();
  void notTakenClicked();

protected:
  void changeEvent(QEvent* event) override;

private:
  void write();

  QLabel* m_left;
  QLabel* m_right;
  QString m_message;
  bool m_isNewMessage = false; ///< said since the entries not taken are what they are
  QString m_action;
  int m_notTaken = 0;
  QString m_firstNotTaken;
};

} // namespace planewright
