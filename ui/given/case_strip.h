// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"

#include <QWidget>

namespace planewright {

/// Chooses the load case whose stresses are typed: a segment for each of up to five, beyond that a list.
/// A single case needs no choice and shows nothing.
class CaseStrip : public QWidget {
  Q_OBJECT

public:
  explicit CaseStrip(QWidget* parent);
  void showCases(const Study& study, const std::string& current);

  QList<QWidget*> buttons() const;

signals:
  void chosen(const std::string& id);
  /// Other buttons stand here than before.
  void rebuilt();

private:
  void rebuild(const std::vector<LoadCase>& cases);
  void addSegment(const LoadCase& one);
  void addList(const std::vector<LoadCase>& cases);

  std::vector<LoadCase> m_cases; ///< those that the buttons stand for
};

} // namespace planewright
