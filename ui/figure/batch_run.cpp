// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/batch_run.h"

#include "ui/files/file_bytes.h"

#include <QDir>
#include <QThread>

namespace planewright {

namespace {

std::optional<Problem> writtenTo(const QString& folder, const FigureBatch& batch, const PointFigure& figure) {
  const Result<QByteArray> bytes = bytesOf(batch, figure);
  if (!bytes)
    return bytes.error();
  const Result<void> written =
      writeAside(QDir(folder).filePath(figure.file).toStdString(), bytes->toStdString());
  return written ? std::nullopt : std::optional(written.error());
}

} // namespace

BatchRun::BatchRun(FigureBatch batch, std::vector<PointFigure> figures, const QString& folder,
                   QObject* parent)
    : QObject(parent), m_all(figures.size()) {
  m_thread.reset(QThread::create([this, batch = std::move(batch), figures = std::move(figures), folder] {
    for (const PointFigure& figure : figures) {
      if (m_stopped)
        return;
      QMetaObject::invokeMethod(
          this, [this, problem = writtenTo(folder, batch, figure)] { take(problem); }, Qt::QueuedConnection);
    }
  }));
  connect(m_thread.get(), &QThread::finished, this, &BatchRun::ended);
  m_thread->start();
}

BatchRun::~BatchRun() {
  stop();
  m_thread->wait();
}

void BatchRun::stop() {
  m_stopped = true;
}

void BatchRun::take(const std::optional<Problem>& problem) {
  if (problem)
    m_problems.push_back(*problem);
  else
    ++m_written;
  emit progressed(static_cast<int>(m_written + m_problems.size()));
}

} // namespace planewright
