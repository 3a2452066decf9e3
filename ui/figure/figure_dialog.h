// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/figure/picture.h"
#include "ui/desk/desk.h"

#include <QDialog>

class QHBoxLayout;
class QLabel;
class QLineEdit;
class QPushButton;
class QScrollArea;
class QVBoxLayout;

namespace planewright {

class FigureOptions;
class FigurePage;

/// Arrange figure: follows the study, shows the figure as it will be and saves, copies or prints it, or saves
/// one for each of several points. It opens with the choices used last.
class FigureDialog : public QDialog {
  Q_OBJECT

public:
  explicit FigureDialog(Desk& desk, QWidget* parent = nullptr);

  /// Where the study is saved; empty while it is not. Figures are offered beside it and bear its name.
  void setStudyFile(const QString& path);

  /// Saves the figure as it is arranged now; the format is the chosen one, whatever the name.
  Result<void> saveTo(const QString& path);

protected:
  void showEvent(QShowEvent* event) override;

private:
  void build();
  QVBoxLayout* previewColumn();
  QHBoxLayout* footer();
  QPushButton* addButton(QHBoxLayout& row, const QString& words, void (FigureDialog::*act)());
  void arrange();
  void refresh();
  void say(const QString& sentence, bool isWrong);
  QString givenUp(const Picture& picture) const;
  Result<Picture> picture() const;
  QString offeredPath() const;
  void save();
  void saveAs();
  void saveAndTell(const QString& path);
  void copy();
  void print();
  void writeAllPoints();

  Desk& m_desk;
  QString m_studyFile;
  FigureOptions* m_options = nullptr;
  FigurePage* m_page = nullptr;
  QScrollArea* m_scroll = nullptr;
  QLabel* m_sentence = nullptr;
  QLineEdit* m_name = nullptr;
  QLabel* m_ending = nullptr;
  QPushButton* m_allPoints = nullptr;
  QList<QPushButton*> m_needPicture;
};

} // namespace planewright
