// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/document_lock.h"

#include <QCoreApplication>
#include <QFile>
#include <QFileInfo>
#include <QSysInfo>

#include <vector>

namespace planewright {

namespace {

/// The same for all paths that lead to a document, also before it is there.
QString lockOf(const QString& document) {
  const QFileInfo named(document);
  const QFileInfo file(named.exists() ? named.canonicalFilePath()
                                      : QFileInfo(named.absolutePath()).canonicalFilePath() +
                                            QLatin1Char('/') + named.fileName());
  return file.absolutePath() + QStringLiteral("/.") + file.fileName() + QStringLiteral(".open");
}

std::unique_ptr<QLockFile> lockFileAt(const QString& path) {
  auto lock = std::make_unique<QLockFile>(path);
  lock->setStaleLockTime(0); // never by age: a window may be open for weeks
  return lock;
}

/// Locks that others took over: to let go of one, also at the end of the program, would remove theirs.
std::vector<std::unique_ptr<QLockFile>>& lost() {
  static auto* const locks = new std::vector<std::unique_ptr<QLockFile>>;
  return *locks;
}

} // namespace

DocumentLock& DocumentLock::operator=(DocumentLock&& other) noexcept {
  release();
  m_path = std::move(other.m_path);
  m_lock = std::move(other.m_lock);
  return *this;
}

DocumentLock::~DocumentLock() {
  release();
}

void DocumentLock::release() {
  if (m_lock && !isOurs())
    lost().push_back(std::move(m_lock));
  m_lock.reset();
}

std::optional<Holder> DocumentLock::lock(const QString& document, DocumentLock& lock) {
  if (lock.isOf(document) && lock.isOurs())
    return std::nullopt;
  DocumentLock wanted;
  wanted.m_path = lockOf(document);
  wanted.m_lock = lockFileAt(wanted.m_path);
  if (wanted.m_lock->tryLock(0)) {
    lock = std::move(wanted);
    return std::nullopt;
  }
  Holder holder;
  QString program;
  if (wanted.m_lock->error() == QLockFile::LockFailedError &&
      wanted.m_lock->getLockInfo(&holder.process, &holder.host, &program))
    return holder;
  lock = DocumentLock();
  return std::nullopt;
}

void DocumentLock::takeOver(const QString& document, DocumentLock& lock) {
  lock = DocumentLock();
  QFile::remove(lockOf(document));
  static_cast<void>(DocumentLock::lock(document, lock));
}

bool DocumentLock::isOf(const QString& document) const {
  return m_lock && m_path == lockOf(document);
}

bool DocumentLock::isOurs() const {
  if (!m_lock)
    return true;
  Holder holder;
  QString program;
  return QFile::exists(m_path) && m_lock->getLockInfo(&holder.process, &holder.host, &program) &&
         holder.process == QCoreApplication::applicationPid() && holder.host == QSysInfo::machineHostName();
}

} // namespace planewright
