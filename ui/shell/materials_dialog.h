// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/files/own_materials.h"
#include "ui/shell/material_choice.h"

#include <QDialog>

class QComboBox;
class QLabel;
class QPushButton;
class QStackedWidget;

namespace planewright {

class MaterialFields;
class MaterialsList;
class Strip;

/// The materials of the study beside the libraries that they are taken from: the user's own and that of the
/// program. Those of the study are edited, those of libraries read.
class MaterialsDialog : public QDialog {
  Q_OBJECT

public:
  /// `ownPath` is the file of the user's own materials.
  MaterialsDialog(Desk& desk, const std::string& ownPath, QWidget* parent);

  MaterialsList& list() const { return *m_list; }
  MaterialFields& fields() const { return *m_fields; }
  Strip& message() const { return *m_message; }
  QComboBox& serviceClass() const { return *m_serviceClass; }
  const MaterialChoice& choice() const { return m_choice; }
  /// What is to be read of a material of a library.
  QString sheet() const;
  void choose(const MaterialChoice& choice);

  /// Says what stands in the fields and was not taken, since it goes with the window.
  void done(int result) override;

public slots:
  void take();
  void add(planewright::MaterialKind kind);
  void remove();
  void keep();
  void dropOwn();

protected:
  void changeEvent(QEvent* event) override;
  void showEvent(QShowEvent* event) override;

private:
  void build();
  QWidget* page();
  QWidget* buttons();
  QPushButton* addButton(const QString& words, void (MaterialsDialog::*act)());
  void follow();
  void refresh();
  void showPage();
  void settleMessage();
  void complain(const Problem& problem);
  void open(const MaterialChoice& choice);
  void rename(const MaterialChoice& choice);
  /// The chosen material of a library, in the chosen service class.
  std::optional<Material> ofLibrary() const;

  Desk& m_desk;
  OwnMaterials m_own;
  MaterialChoice m_choice;
  std::size_t m_row = 0; ///< of the chosen one among those of the study
  MaterialsList* m_list = nullptr;
  MaterialFields* m_fields = nullptr;
  Strip* m_message;
  QStackedWidget* m_pages;
  QLabel* m_sheet;
  QWidget* m_serviceRow;
  QComboBox* m_serviceClass;
  QPushButton* m_take = nullptr;
  QPushButton* m_remove = nullptr;
  QPushButton* m_keep = nullptr;
  QPushButton* m_drop = nullptr;
};

} // namespace planewright
