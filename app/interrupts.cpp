// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/interrupts.h"

namespace planewright {

namespace {

volatile std::sig_atomic_t noted = 0;

void note(int signal) {
  noted = signal;
}

} // namespace

Interrupts::Interrupts() {
  noted = 0;
  struct sigaction action {};
  action.sa_handler = note;
  action.sa_flags = static_cast<int>(SA_RESETHAND); // and no restart: who waits for input is woken
  for (std::size_t i = 0; i < signals.size(); ++i) {
    ::sigaction(signals[i], nullptr, &m_before[i]);
    if (m_before[i].sa_handler != SIG_IGN)
      ::sigaction(signals[i], &action, nullptr);
  }
}

Interrupts::~Interrupts() {
  for (std::size_t i = 0; i < signals.size(); ++i)
    ::sigaction(signals[i], &m_before[i], nullptr);
  if (noted != 0)
    static_cast<void>(std::raise(noted));
}

bool Interrupts::came() {
  return noted != 0;
}

} // namespace planewright
