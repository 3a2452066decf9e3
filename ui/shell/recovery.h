// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/beside.h"
#include "ui/files/recovery_folder.h"
#include "ui/shell/filing.h"

#include <QTimer>

#include <optional>

namespace planewright {

/// Keeps a study with changes on the disk, outside its file, within a second of each edit, so that the next
/// start can offer it; takes it away when it is saved, and puts it among the discarded ones when the person
/// lets it go. It is written beside the window.
class Recovery : public QObject {
  Q_OBJECT

public:
  Recovery(Desk& desk, Filing& filing, std::string folder, QObject* parent = nullptr);
  /// What is unsaved is on the disk when it ends.
  ~Recovery() override;

  const std::string& folder() const { return m_folder; }
  /// Unsaved studies of windows that ended without saving or discarding them.
  std::vector<LeftStudy> left() const { return leftStudies(m_folder); }
  std::vector<LeftStudy> discarded() const { return discardedStudies(m_folder); }

  /// Puts a left or discarded study on the desk, as unsaved as it was. False where the person wants to stay
  /// with the one that is there, or another window was quicker.
  bool open(const LeftStudy& study);
  void discardLeft(const LeftStudy& study);

signals:
  /// It cannot be kept; told once until it can be again.
  void troubled(const planewright::Problem& problem);

private:
  void note();
  void keep();
  /// Ends what is being written; after it the disk has what is unsaved now.
  void settle();
  void discardHere();
  /// None where nothing is unsaved.
  std::optional<UnsavedStudy> unsaved() const;
  bool hasPlace();
  void tell(const Result<void>& outcome);

  Filing& m_filing;
  std::string m_folder;
  std::optional<RecoveryPlace> m_place; ///< from the first change on
  bool m_isTroubled = false;
  bool m_isDropped = false; ///< nothing was changed since the person let the changes go
  QTimer m_due;
  std::optional<Beside> m_work;
};

} // namespace planewright
