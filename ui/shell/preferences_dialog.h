// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/shell/preferences.h"

#include <QDialog>

#include <functional>
#include <vector>

class QComboBox;
class QFormLayout;
class QLineEdit;
class QVBoxLayout;

namespace planewright {

/// What the user prefers, in one page; taken with OK.
class PreferencesDialog : public QDialog {
  Q_OBJECT

public:
  explicit PreferencesDialog(QWidget* parent = nullptr);

  /// What is chosen in the page.
  Preferences chosen() const;
  void accept() override;

signals:
  /// The preferences are kept; `needsStart` says that the language counts from the next start.
  void kept(bool needsStart);

private:
  QFormLayout* group(const QString& heading);
  /// A list of choices, or a text, that stands for one part of the preferences.
  QComboBox* addChoice(QFormLayout& form, const QString& caption, const QStringList& words,
                       std::function<int(const Preferences&)> place,
                       std::function<void(Preferences&, int)> take);
  QLineEdit* addText(QFormLayout& form, const QString& caption,
                     std::function<QString(const Preferences&)> text,
                     std::function<void(Preferences&, const QString&)> take);
  /// The words of an enum; `at` gives its place in the Preferences.
  template <class At>
  void addWord(QFormLayout& form, const QString& caption, At at);
  void addUnit(QFormLayout& form, const QString& caption, const QStringList& units, std::string Units::*unit);
  void addTitle(QFormLayout& form, const QString& caption, std::string Title::*title);
  void addFolder(QFormLayout& form, const QString& caption, const QString& otherwise,
                 QString Preferences::*folder);
  void addWindow();
  void addStudies();
  void addOutputs();
  void show(const Preferences& preferences);

  /// How each part of the page is shown and taken.
  struct Part {
    std::function<void(const Preferences&)> show;
    std::function<void(Preferences&)> take;
  };
  std::vector<Part> m_parts;
  QVBoxLayout* m_rows;
};

} // namespace planewright
