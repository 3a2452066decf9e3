// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/figure_batch.h"

#include "core/study/governing_readout.h"
#include "ui/figure/figure_sharing.h"
#include "ui/files/file_names.h"

namespace planewright {

namespace {

Readout readoutOf(const FigureBatch& batch, const PointFigure& figure) {
  Readout readout = evaluate(batch.study, figure.point);
  readout.shown = figure.state;
  return readout;
}

/// What is wrong with a figure is said of its point.
template <class T>
Result<T> ofPoint(Result<T> result, const std::string& point) {
  if (!result)
    result.error().place = point;
  return result;
}

Result<Picture> pictureOf(const FigureBatch& batch, const PointFigure& figure, const Readout& readout) {
  return ofPoint(figureFor(batch.study, readout, batch.settings, batch.studyFile, batch.caption),
                 figure.point);
}

} // namespace

std::vector<PointFigure> figuresOf(const FigureBatch& batch) {
  std::vector<PointFigure> figures;
  std::vector<QString> names;
  for (const std::string& point : batch.points) {
    Readout readout = batch.state ? evaluate(batch.study, point) : governingReadout(batch.study, point);
    if (batch.state)
      readout.shown = *batch.state;
    figures.push_back({point, readout.shown, {}});
    names.push_back(figureName(readout, batch.studyFile));
  }
  names = distinctNames(std::move(names));
  const QString ending = QStringLiteral(".") + QString::fromLatin1(endingOf(batch.settings.format));
  for (std::size_t i = 0; i < figures.size(); ++i)
    figures[i].file = names[i] + ending;
  return figures;
}

Result<QByteArray> bytesOf(const FigureBatch& batch, const PointFigure& figure) {
  const Readout readout = readoutOf(batch, figure);
  const Result<Picture> picture = pictureOf(batch, figure, readout);
  if (!picture)
    return tl::unexpected(picture.error());
  return ofPoint(fileBytes(*picture, batch.settings, batch.study, readout), figure.point);
}

std::optional<Problem> problemOf(const FigureBatch& batch, const PointFigure& figure) {
  const Result<Picture> picture = pictureOf(batch, figure, readoutOf(batch, figure));
  return picture ? std::nullopt : std::optional(picture.error());
}

} // namespace planewright
