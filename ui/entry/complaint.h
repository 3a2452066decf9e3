// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QWidget>

namespace planewright {

/// What is wrong and what to do, cut to at most three lines so that the second sentence stays whole.
QStringList complaintLines(const QString& what, const QString& mend, const QFont& font, int width);

/// The message under a wrong entry: a triangle and at most three lines. It takes lines of its own.
class Complaint : public QWidget {
  Q_OBJECT

public:
  explicit Complaint(QWidget* parent = nullptr);

  void say(const QString& what, const QString& mend);
  QString words() const;

  bool hasHeightForWidth() const override { return true; }
  int heightForWidth(int width) const override;
  QSize sizeHint() const override;
  QSize minimumSizeHint() const override;

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  QStringList linesIn(int width) const;

  QString m_what;
  QString m_mend;
};

} // namespace planewright
