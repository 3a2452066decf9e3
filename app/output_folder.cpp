// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/output_folder.h"

#include "core/quantity/shown_count.h"

#include <algorithm>
#include <filesystem>

namespace planewright {

namespace fs = std::filesystem;

std::string OutputFolder::pathOf(const std::string& file) const {
  return (fs::path(path) / file).string();
}

std::optional<Problem> OutputFolder::existing(const std::vector<std::string>& files) const {
  const auto exists = [&](const std::string& file) {
    std::error_code failed;
    return fs::exists(pathOf(file), failed);
  };
  const auto first = std::ranges::find_if(files, exists);
  if (first == files.end())
    return std::nullopt;
  return Problem{option,
                 0,
                 0,
                 path,
                 PW_TEXT("Command", "“%1” has %2 of the %3 files already, “%4” among them.")
                     .with(path)
                     .with(shownCount(static_cast<std::size_t>(std::ranges::count_if(files, exists))))
                     .with(shownCount(files.size()))
                     .with(*first),
                 PW_TEXT("Command", "Take another folder, or --replace.")};
}

std::optional<Problem> OutputFolder::make(const std::string& inner) const {
  std::error_code failed;
  fs::create_directories(inner.empty() ? fs::path(path) : fs::path(path) / inner, failed);
  if (!failed)
    return std::nullopt;
  return Problem{option,
                 0,
                 0,
                 path,
                 PW_TEXT("Command", "The folder “%1” cannot be made: %2.").with(path).with(failed.message()),
                 PW_TEXT("Command", "Take another folder.")};
}

} // namespace planewright
