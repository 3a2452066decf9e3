// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"

#include <QAbstractButton>
#include <QWidget>

class QVBoxLayout;

namespace planewright {

class SteadyLabel;

/// The heading that folds a group: a triangle and a bold title in the colour of its role.
class FoldHeading : public QAbstractButton {
  Q_OBJECT

public:
  FoldHeading(const QString& title, Role role, QWidget* parent);
  QSize sizeHint() const override;
  QSize minimumSizeHint() const override { return sizeHint(); }

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  Role m_role;
};

/// A group of fields under a heading; folded it shows one line in words instead.
class FoldGroup : public QWidget {
  Q_OBJECT

public:
  explicit FoldGroup(const QString& title, Role role = Role::ink, QWidget* parent = nullptr);

  QVBoxLayout& body() const { return *m_body; }
  FoldHeading& heading() const { return *m_heading; }
  /// What stands right of the heading while the group is open.
  void setCorner(QWidget* corner);
  void setSummary(const QString& summary);
  void setFolded(bool folded);
  /// Before a part of the group goes that may have the keys: `keeper` of the same group gets them then, for
  /// the next field in line would be one in which typing changes something else.
  static void keepKeys(const QWidget& going, QWidget& keeper);
  bool isFolded() const;

private:
  void showFold();

  FoldHeading* m_heading;
  SteadyLabel* m_summary;
  QWidget* m_content;
  QWidget* m_corner = nullptr;
  QVBoxLayout* m_body;
};

} // namespace planewright
