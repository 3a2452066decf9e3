// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QLockFile>
#include <QString>

#include <memory>
#include <optional>

namespace planewright {

/// Who has a document open.
struct Holder {
  QString host;
  qint64 process = 0;
};

/// Says to other windows, also on other machines that share the folder, that a document is open here: a
/// hidden file beside it with host and process. One that a crash left is recognised on its own host by its
/// process. A folder that takes no file, or a disk that knows no locks, leaves the document unlocked.
class DocumentLock {
public:
  DocumentLock() = default;
  DocumentLock(DocumentLock&&) noexcept = default;
  DocumentLock& operator=(DocumentLock&& other) noexcept;
  ~DocumentLock();

  /// Locks a document, or tells who else has it open.
  static std::optional<Holder> lock(const QString& document, DocumentLock& lock);
  /// Locks it although another has it open, who will notice before saving.
  static void takeOver(const QString& document, DocumentLock& lock);

  /// Whether this is a lock of the document, whoever may have taken it over.
  bool isOf(const QString& document) const;
  /// False where another has taken the document over.
  bool isOurs() const;

private:
  void release();

  QString m_path;
  std::unique_ptr<QLockFile> m_lock;
};

} // namespace planewright
