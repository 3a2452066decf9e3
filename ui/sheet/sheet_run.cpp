// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_run.h"

#include <QThread>

#include <utility>

namespace planewright {

namespace {

MadeSheet madeOf(const SheetJob& job) {
  const Sheet sheet = sheetOf(job.study, job.order);
  return {pagesOf(sheet, job.paper, job.order.translate), sheet.routes, sheet.disagrees};
}

} // namespace

SheetRun::SheetRun(QObject* parent) : QObject(parent) {}

SheetRun::~SheetRun() {
  if (m_thread)
    m_thread->wait();
}

void SheetRun::ask(SheetJob job) {
  if (m_thread)
    m_next = std::move(job);
  else
    begin(std::move(job));
}

void SheetRun::begin(SheetJob job) {
  m_thread.reset(QThread::create([this, job = std::move(job)] {
    QMetaObject::invokeMethod(
        this, [this, sheet = madeOf(job)] { take(sheet); }, Qt::QueuedConnection);
  }));
  m_thread->start();
}

void SheetRun::take(const MadeSheet& sheet) {
  m_thread->wait();
  m_thread.reset();
  if (std::optional<SheetJob> next = std::exchange(m_next, std::nullopt))
    begin(*std::move(next));
  emit made(sheet);
}

} // namespace planewright
