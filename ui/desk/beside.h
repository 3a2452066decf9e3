// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QObject>

#include <condition_variable>
#include <functional>
#include <mutex>
#include <optional>
#include <stop_token>
#include <thread>

namespace planewright {

/// Works beside the window, in a thread of its own, one thing at a time: what is newer ends what came before
/// it, and the outcome of that never comes.
class Beside : public QObject {
public:
  /// What is done in the window with the outcome of a work; may be empty.
  using Then = std::function<void()>;
  /// Done in the thread; it looks at the token now and then and may come to nothing once that asks for it.
  using Work = std::function<Then(const std::stop_token&)>;

  explicit Beside(QObject* parent = nullptr);
  /// Waits for what is being done to end.
  ~Beside() override;

  void run(Work work);
  /// Ends what is being done; its outcome does not come.
  void stop();

private:
  struct Task {
    Work work;
    std::stop_source stop;
  };
  void live(const std::stop_token& ended);

  std::mutex m_mutex;
  std::condition_variable_any m_wake;
  std::optional<Task> m_next;
  std::stop_source m_stop; ///< of the newest
  std::jthread m_thread;
};

} // namespace planewright
