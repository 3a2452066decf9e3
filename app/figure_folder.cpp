// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/figure_folder.h"

#include "app/offscreen.h"
#include "core/quantity/shown_count.h"
#include "ui/files/file_bytes.h"

#include <algorithm>
#include <filesystem>

namespace planewright {

namespace {

namespace fs = std::filesystem;

std::string pathIn(const std::string& folder, const PointFigure& figure) {
  return (fs::path(folder) / figure.file.toStdString()).string();
}

std::optional<Problem> existingProblem(const std::string& folder, const std::vector<PointFigure>& figures) {
  const auto exists = [&](const PointFigure& figure) {
    std::error_code failed;
    return fs::exists(pathIn(folder, figure), failed);
  };
  const auto first = std::ranges::find_if(figures, exists);
  if (first == figures.end())
    return std::nullopt;
  return Problem{"--folder",
                 0,
                 0,
                 folder,
                 PW_TEXT("Command", "“%1” has %2 of the %3 files already, “%4” among them.")
                     .with(folder)
                     .with(shownCount(static_cast<std::size_t>(std::ranges::count_if(figures, exists))))
                     .with(shownCount(figures.size()))
                     .with(first->file.toStdString()),
                 PW_TEXT("Command", "Take another folder, or --replace.")};
}

Problems undrawable(const FigureBatch& batch, const std::vector<PointFigure>& figures) {
  Problems problems;
  for (const PointFigure& figure : figures)
    if (std::optional<Problem> problem = problemOf(batch, figure))
      problems.push_back(*std::move(problem));
  return problems;
}

std::optional<Problem> madeFolder(const std::string& folder) {
  std::error_code failed;
  fs::create_directories(folder, failed);
  if (!failed)
    return std::nullopt;
  return Problem{
      "--folder",
      0,
      0,
      folder,
      PW_TEXT("Command", "The folder “%1” cannot be made: %2.").with(folder).with(failed.message()),
      PW_TEXT("Command", "Take another folder.")};
}

/// What came of the files: the names of those that were written, and what failed.
struct Written {
  std::string names;
  Failure failure;
};

Written write(const FigureBatch& batch, const std::vector<PointFigure>& figures, const std::string& folder) {
  Written all{"", {Exit::done, {}}};
  const auto fail = [&](Exit exit, const Problem& problem) {
    all.failure.exit = std::max(all.failure.exit, exit);
    all.failure.problems.push_back(problem);
  };
  for (const PointFigure& figure : figures) {
    const std::string path = pathIn(folder, figure);
    if (const Result<QByteArray> bytes = bytesOf(batch, figure); !bytes)
      fail(Exit::wrongUse, bytes.error());
    else if (const Result<void> written = writeAside(path, bytes->toStdString()); !written)
      fail(Exit::machineFailed, written.error());
    else
      all.names += path + "\n";
  }
  return all;
}

} // namespace

Outcome<Delivery> writtenFigures(const FigureBatch& batch, const std::string& folder, bool replaces) {
  const std::vector<PointFigure> figures = figuresOf(batch);
  if (Problems problems = undrawable(batch, figures); !problems.empty())
    return tl::unexpected(Failure{Exit::wrongUse, std::move(problems)});
  if (!replaces)
    if (std::optional<Problem> problem = existingProblem(folder, figures))
      return wrongUse(*std::move(problem));
  if (std::optional<Problem> problem = madeFolder(folder))
    return machineFailed(*std::move(problem));
  Written all;
  const auto writeAll = [&]() -> Result<QByteArray> {
    all = write(batch, figures, folder);
    return QByteArray();
  };
  if (batch.settings.format == FigureFormat::svg)
    all = write(batch, figures, folder);
  else if (const Outcome<std::string> painted = paintedOffscreen(writeAll); !painted)
    return tl::unexpected(painted.error());
  if (!all.failure.problems.empty())
    return tl::unexpected(std::move(all.failure));
  return Delivery{std::move(all.names)};
}

} // namespace planewright
