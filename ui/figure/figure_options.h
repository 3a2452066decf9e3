// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/figure/figure_settings.h"

#include <QWidget>

#include <functional>
#include <optional>

class QCheckBox;
class QComboBox;
class QLabel;
class QLineEdit;
class QRadioButton;
class QVBoxLayout;

namespace planewright {

/// The choices of a figure: parts, width, text, colour, caption, format.
class FigureOptions : public QWidget {
  Q_OBJECT

public:
  explicit FigureOptions(const FigureSettings& settings, QWidget* parent = nullptr);

  /// What the next file is made by.
  const FigureSettings& settings() const { return m_settings; }
  /// The same without what holds only until the window is closed.
  FigureSettings remembered() const;
  QString caption() const;
  /// Why the width that stands in its field does not read; none when it does.
  const std::optional<Problem>& problem() const { return m_problem; }
  /// Goes back to the remembered choice of carrying the study.
  void endSendingOutside();

signals:
  void changed();

private:
  void addSwitch(QVBoxLayout& group, const QString& words, bool* value);
  QRadioButton* addChoice(QVBoxLayout& group, const QString& words, bool chosen,
                          std::function<void()> choose);
  void buildParts();
  void buildArrangement();
  void buildWidth();
  void buildText();
  void buildFormat();
  void buildCarrying();
  void carry(bool on);
  void takeWidth(double width);
  void takeOwnWidth();
  void takeFormat(FigureFormat format);

  FigureSettings m_settings;
  bool m_carryingChosen; ///< by the box; the preset for sending outside does not count
  std::optional<Problem> m_problem;
  QLineEdit* m_ownWidth = nullptr;
  QLineEdit* m_caption = nullptr;
  QComboBox* m_dpi = nullptr;
  QCheckBox* m_carrying = nullptr;
  QLabel* m_carryingWords = nullptr;
};

} // namespace planewright
