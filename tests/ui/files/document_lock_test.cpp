// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/document_lock.h"

#include "tests/ui/files/folder_test.h"

#include <QCoreApplication>
#include <QSysInfo>

#include <sys/wait.h>
#include <unistd.h>

namespace planewright {
namespace {

class DocumentLockTest : public FolderTest {
protected:
  DocumentLockTest() { EXPECT_TRUE(writeAside(m_document.toStdString(), "a study")); }
  std::string lockPath() const { return path(".beam.planewright.open"); }
  /// A lock as a window of this process and host would leave it.
  void leaveLock(const std::string& process, const std::string& program, const std::string& host) const {
    ASSERT_TRUE(writeAside(lockPath(), process + "\n" + program + "\n" + host + "\n"));
  }
  static std::string thisProcess() { return std::to_string(::getpid()); }

  const QString m_document = QString::fromStdString(path("beam.planewright"));
};

TEST_F(DocumentLockTest, isHeldByOneAndGoneWithIt) {
  {
    DocumentLock one, other;
    EXPECT_FALSE(DocumentLock::lock(m_document, one));
    EXPECT_FALSE(DocumentLock::lock(m_document, one)) << "its own";
    EXPECT_TRUE(one.isOurs());
    const std::optional<Holder> holder = DocumentLock::lock(m_document, other);
    ASSERT_TRUE(holder);
    EXPECT_EQ(holder->process, QCoreApplication::applicationPid());
    EXPECT_EQ(holder->host, QSysInfo::machineHostName());
    EXPECT_TRUE(std::filesystem::exists(lockPath()));
  }
  EXPECT_FALSE(std::filesystem::exists(lockPath()));
}

TEST_F(DocumentLockTest, theSameFileByAnotherPathIsTheSameDocument) {
  std::filesystem::create_symlink(m_document.toStdString(), path("link.planewright"));
  DocumentLock one, other;
  EXPECT_FALSE(DocumentLock::lock(m_document, one));
  EXPECT_TRUE(DocumentLock::lock(QString::fromStdString(path("link.planewright")), other));
}

TEST_F(DocumentLockTest, whatADeadProcessLeftHoldsNobodyUp) {
  const pid_t child = ::fork();
  ASSERT_GE(child, 0);
  if (child == 0)
    ::_exit(0);
  int status = 0;
  ::waitpid(child, &status, 0);
  leaveLock(std::to_string(child), "files_tests", QSysInfo::machineHostName().toStdString());
  DocumentLock lock;
  EXPECT_FALSE(DocumentLock::lock(m_document, lock));
  EXPECT_TRUE(lock.isOurs());
}

TEST_F(DocumentLockTest, anotherHostIsBelieved) {
  leaveLock("4711", "planewright", "workshop");
  DocumentLock lock;
  const std::optional<Holder> holder = DocumentLock::lock(m_document, lock);
  ASSERT_TRUE(holder);
  EXPECT_EQ(holder->host, "workshop");
  EXPECT_EQ(holder->process, 4711);
}

TEST_F(DocumentLockTest, whoIsTakenOverNotices) {
  DocumentLock one;
  EXPECT_FALSE(DocumentLock::lock(m_document, one));
  leaveLock("4711", "planewright", "workshop"); // another took it
  EXPECT_FALSE(one.isOurs());
  one = DocumentLock();
  EXPECT_TRUE(std::filesystem::exists(lockPath())) << "theirs stays";
  DocumentLock::takeOver(m_document, one);
  EXPECT_TRUE(one.isOurs());
}

TEST_F(DocumentLockTest, aFolderThatIsNotThereLocksNothing) {
  DocumentLock lock;
  EXPECT_FALSE(DocumentLock::lock(QString::fromStdString(path("none/beam.planewright")), lock));
  EXPECT_TRUE(lock.isOurs());
}

} // namespace
} // namespace planewright
