// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/files/file_bytes.h"

#include <QTemporaryDir>

#include <gtest/gtest.h>

#include <filesystem>

namespace planewright {

/// A test with a folder of its own.
class FolderTest : public testing::Test {
protected:
  std::string path(const char* name) const {
    return m_folder.filePath(QString::fromLatin1(name)).toStdString();
  }
  std::size_t filesInFolder() const {
    return static_cast<std::size_t>(
        std::distance(std::filesystem::directory_iterator(m_folder.path().toStdString()), {}));
  }
  std::string read(const std::string& file) const { return bytesOf(file, 1 << 20).value_or("unread"); }

private:
  QTemporaryDir m_folder;
};

} // namespace planewright
