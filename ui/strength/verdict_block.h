// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

#include <QFrame>

class QLabel;

namespace planewright {

class SteadyLabel;

/// What all checks of the shown point come to over all combinations: the word, the utilisation in large
/// figures, by how much all loads could be multiplied, where in the band the worst lies.
class VerdictBlock : public QFrame {
  Q_OBJECT

public:
  VerdictBlock(Desk& desk, QWidget* parent);

  QString word() const;
  QString number() const;
  QString sentences() const;

protected:
  void paintEvent(QPaintEvent* event) override;

private:
  void refresh();

  Desk& m_desk;
  QLabel* m_word;
  QLabel* m_number;
  SteadyLabel* m_sentences;
};

} // namespace planewright
