// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QTextBrowser>

namespace planewright {

/// A browser of the manual: it knows pages and pictures by their names, and draws what the program draws
/// itself in its own palette.
class HelpText : public QTextBrowser {
  Q_OBJECT

public:
  HelpText(QString language, QWidget* parent);

  /// The page at hand, and the place on it that was asked for.
  QString page() const;
  QString anchor() const;
  void showPlace(const QString& place);
  /// Wears the palette anew.
  void dress();

  /// Marks the words wherever they stand on the page.
  void mark(const QStringList& words);
  /// Goes to the next mark behind what is chosen, or the last before it; false where there is none.
  bool goToMark(int step);
  /// Goes to the first or the last mark.
  void goToFirstMark();
  void goToLastMark();

protected:
  QVariant loadResource(int type, const QUrl& name) override;

private:
  QList<QTextCursor> m_marks;
  void goTo(const QTextCursor& mark);

  QString m_language;
  QUrl m_shown; ///< source() is one behind while sourceChanged is told
};

} // namespace planewright
