// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_field.h"

#include <QWidget>

class QComboBox;
class QGridLayout;
class QAbstractButton;
class QLabel;
class QPushButton;

namespace planewright {

class Complaint;

/// One material of the study as fields over it: what it is, where it comes from, the strengths that its kind
/// has, and their factors.
class MaterialFields : public QWidget {
  Q_OBJECT

public:
  MaterialFields(Desk& desk, QWidget* parent);

  /// Stands for this material of the study from now on, as the study has it now.
  void turnTo(const std::string& material);
  const std::string& material() const { return m_material; }

  EntryField& name() const { return *m_name; }
  /// The field of a text; of a strength the one of the kind that is shown.
  EntryField& field(Spot spot) const;
  QComboBox& choice(Spot spot) const;
  /// What stands in the fields and was not taken, "“-3” for shear strength".
  QStringList notTaken() const;
  /// What is said of duration factors that are not those of the service class; empty where they are.
  QString classRemark() const;
  QAbstractButton& classButton() const;
  /// Why a kind, basis or seam was not taken.
  QString complaint() const;

private:
  struct Field {
    Spot spot;
    std::optional<MaterialKind> kind; ///< none: of all kinds
    EntryField* field;
  };
  struct Choice {
    Spot spot;
    QComboBox* box;
    QWidget* row;
  };

  void build();
  QWidget* choices();
  QWidget* origin();
  QWidget* strengths(MaterialKind kind);
  QWidget* factors();
  QWidget* heading(const QString& words);
  EntryField* addField(Spot spot, const Text& caption, std::optional<MaterialKind> kind = std::nullopt);
  void addColumns(QGridLayout& grid, const QList<EntryField*>& left, const QList<EntryField*>& right);
  template <class Enum>
  QWidget* addChoice(Spot spot, const QString& caption);
  void choose(const Choice& choice, const std::string& word);
  void takeFactorsOfClass();
  void showClass(const Material& material);
  Place place(Spot spot) const;
  const Material* shownMaterial() const;
  void refresh();

  Desk& m_desk;
  std::string m_material;
  EntryField* m_name = nullptr;
  std::vector<Field> m_fields;
  std::vector<Choice> m_choices;
  std::vector<std::pair<MaterialKind, QWidget*>> m_strengths;
  QWidget* m_factors = nullptr;
  QLabel* m_classRemark = nullptr;
  QPushButton* m_classButton = nullptr;
  Complaint* m_complaint;
  QLabel* m_use;
};

} // namespace planewright
