// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/desk/beside.h"

namespace planewright {

Beside::Beside(QObject* parent)
    : QObject(parent), m_thread([this](const std::stop_token& ended) { live(ended); }) {}

Beside::~Beside() {
  stop();
}

void Beside::run(Work work) {
  {
    const std::lock_guard lock(m_mutex);
    m_stop.request_stop();
    m_stop = std::stop_source();
    m_next = Task{std::move(work), m_stop};
  }
  m_wake.notify_one();
}

void Beside::stop() {
  const std::lock_guard lock(m_mutex);
  m_stop.request_stop();
  m_next.reset();
}

void Beside::live(const std::stop_token& ended) {
  for (;;) {
    Task task;
    {
      std::unique_lock lock(m_mutex);
      if (!m_wake.wait(lock, ended, [this] { return m_next.has_value(); }))
        return;
      task = *std::exchange(m_next, std::nullopt);
    }
    Then then = task.work(task.stop.get_token());
    if (then && !task.stop.stop_requested())
      QMetaObject::invokeMethod(
          this,
          [then = std::move(then), stop = task.stop] {
            if (!stop.stop_requested())
              then();
          },
          Qt::QueuedConnection);
  }
}

} // namespace planewright
