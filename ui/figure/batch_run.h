// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/figure/figure_batch.h"

#include <QObject>

#include <atomic>
#include <memory>

class QThread;

namespace planewright {

/// Writes the figures of a batch to a folder, one after the other, beside the window: it tells of each and
/// can be stopped between two. A file is written whole or not at all; one that fails stops none of the
/// others.
class BatchRun : public QObject {
  Q_OBJECT

public:
  BatchRun(FigureBatch batch, std::vector<PointFigure> figures, const QString& folder,
           QObject* parent = nullptr);
  ~BatchRun() override;

  /// Begins with the next figure no more.
  void stop();
  std::size_t all() const { return m_all; }
  std::size_t written() const { return m_written; }
  const Problems& problems() const { return m_problems; }
  bool wasStopped() const { return m_stopped; }

signals:
  /// So many figures are written or have failed.
  void progressed(int done);
  void ended();

private:
  void take(const std::optional<Problem>& problem);

  std::size_t m_all;
  std::size_t m_written = 0;
  Problems m_problems;
  std::atomic<bool> m_stopped = false;
  std::unique_ptr<QThread> m_thread;
};

} // namespace planewright
