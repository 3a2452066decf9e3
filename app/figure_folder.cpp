// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/figure_folder.h"

#include "app/offscreen.h"
#include "app/output_folder.h"
#include "ui/files/file_bytes.h"

#include <algorithm>

namespace planewright {

namespace {

std::vector<std::string> namesOf(const std::vector<PointFigure>& figures) {
  std::vector<std::string> names;
  names.reserve(figures.size());
  for (const PointFigure& figure : figures)
    names.push_back(figure.file.toStdString());
  return names;
}

Problems undrawable(const FigureBatch& batch, const std::vector<PointFigure>& figures) {
  Problems problems;
  for (const PointFigure& figure : figures)
    if (std::optional<Problem> problem = problemOf(batch, figure))
      problems.push_back(*std::move(problem));
  return problems;
}

/// What came of the files: the names of those that were written, and what failed.
struct Written {
  std::string names;
  Failure failure;
};

Written write(const FigureBatch& batch, const std::vector<PointFigure>& figures, const OutputFolder& folder) {
  Written all{"", {Exit::done, {}}};
  const auto fail = [&](Exit exit, const Problem& problem) {
    all.failure.exit = std::max(all.failure.exit, exit);
    all.failure.problems.push_back(problem);
  };
  for (const PointFigure& figure : figures) {
    const std::string path = folder.pathOf(figure.file.toStdString());
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

Outcome<Delivery> writtenFigures(const FigureBatch& batch, const std::string& path, bool replaces) {
  const OutputFolder folder{"--folder", path};
  const std::vector<PointFigure> figures = figuresOf(batch);
  if (Problems problems = undrawable(batch, figures); !problems.empty())
    return tl::unexpected(Failure{Exit::wrongUse, std::move(problems)});
  if (!replaces)
    if (std::optional<Problem> problem = folder.existing(namesOf(figures)))
      return wrongUse(*std::move(problem));
  if (std::optional<Problem> problem = folder.make())
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
