// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "ui/figure/figure_settings.h"

#include <QString>

namespace planewright {

/// A figure of its own for each of several points, all arranged alike.
struct FigureBatch {
  Study study;
  FigureSettings settings;
  QString studyFile; ///< where the study is saved, or empty
  QString caption;
  std::vector<std::string> points;  ///< their names
  std::optional<std::size_t> state; ///< shown of every point; without it what governs each
};

/// One figure of a batch.
struct PointFigure {
  std::string point;
  std::size_t state = 0; ///< in the readout of the point
  QString file;          ///< its name, with the ending; no two are alike
};
std::vector<PointFigure> figuresOf(const FigureBatch& batch);

/// The bytes of one of them, or a Problem with the point as its place.
Result<QByteArray> bytesOf(const FigureBatch& batch, const PointFigure& figure);

/// Why it cannot be drawn as the batch is arranged; none when it can. Much quicker than its bytes.
std::optional<Problem> problemOf(const FigureBatch& batch, const PointFigure& figure);

} // namespace planewright
