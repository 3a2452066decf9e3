// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/entry/entry_field.h"

#include <QWidget>

#include <functional>

namespace planewright {

class QuietButton;

/// One source of the stresses of a case: section forces, pressure or a rosette. Its fields are seen where the
/// case at the shown point has the source, and made when it first has.
class SourceFields : public QWidget {
  Q_OBJECT

public:
  using CaseId = std::function<std::string(const Study&)>;
  SourceFields(Desk& desk, Spot source, CaseId caseId, QWidget* parent = nullptr);

  /// In the order of Tab.
  const QList<EntryField*>& fields() const { return m_fields; }
  QList<QWidget*> buttons() const;
  bool isPresent() const;
  /// Asks for the source, with what it needs of the study besides.
  void add();
  void refresh();

signals:
  /// The fields are there from now on.
  void made();

private:
  void make();
  void makeHead();
  void addField(Spot spot, const QString& meaning);
  void addForces();
  void addPressure();
  void addRosette();
  template <class Enum>
  void addChoice(Spot spot, const QString& meaning);
  Place place(const Study& study, Spot spot) const;
  Edits editsThatAdd() const;
  void remove();
  Nature nature() const;
  /// Whether a combination has the case with another factor than 1.
  bool isFactored() const;
  void ask(const Edits& edits, const QString& what);

  Desk& m_desk;
  Spot m_source;
  CaseId m_caseId;
  QList<EntryField*> m_fields;
  QList<Spot> m_spots; ///< of the fields
  QuietButton* m_choice = nullptr;
  QuietButton* m_remove = nullptr;
};

} // namespace planewright
