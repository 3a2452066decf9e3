// SPDX-License-Identifier: GPL-3.0-or-later
// session FOLDER SEED [BYTES]: edits and saves one study in FOLDER without an end, as a person at the window
// would, until it is killed. It goes on with what is left unsaved, else with the file. BYTES is the size at
// which its disk refuses to let a file grow. Standard output gets a line for each edit: its number, which is
// σx of the study, and the time in ms; and one for each message.
#include "core/study/edit.h"
#include "ui/shell/recovery.h"

#include <QCoreApplication>
#include <QElapsedTimer>
#include <QFileInfo>

#include <csignal>
#include <random>

#include <sys/resource.h>
#include <unistd.h>

using namespace planewright;

namespace {

class Session {
public:
  Session(const QString& folder, unsigned seed)
      : m_path(folder + QStringLiteral("/beam.planewright")), m_dice(seed), m_filing(m_desk, answers()),
        m_recovery(m_desk, m_filing, (folder + QStringLiteral("/unsaved")).toStdString()) {
    QObject::connect(&m_filing, &Filing::refused, [](const QString&, const Problems& problems) {
      note("message " + plain(problems.front()));
    });
    QObject::connect(&m_recovery, &Recovery::troubled,
                     [](const Problem& problem) { note("message " + plain(problem)); });
    const std::vector<LeftStudy> left = m_recovery.left();
    if ((left.empty() || !m_recovery.open(left.front())) && QFileInfo::exists(m_path) &&
        !m_filing.open(m_path))
      note("message the file was not opened");
    m_edits = std::atoi(m_desk.study().points[0].stress[0].sx.c_str());
    QObject::connect(&m_next, &QTimer::timeout, [this] { act(); });
    m_next.start(0);
  }

private:
  FileQuestions answers() {
    return {[](const QString&) { return Unsaved::stay; },
            [] { return QString(); },
            [this](const QString&) { return m_path; },
            [] { return QString(); },
            [](const QString&) { return QString(); },
            [](const QString&, const Holder&) {
              note("message open elsewhere");
              return Elsewhere::takeOver;
            },
            [](const QString&, Obstacle) {
              note("message obstacle");
              return Overwrite::replace;
            }};
  }
  int upTo(int most) { return std::uniform_int_distribution<int>(0, most)(m_dice); }

  // In one piece, for it may be killed at any moment.
  static void note(const std::string& line) {
    const std::string whole = line + "\n";
    static_cast<void>(::write(STDOUT_FILENO, whole.data(), whole.size()));
  }

  void act() {
    m_next.setInterval(upTo(40));
    if (upTo(25) == 0) {
      if (m_filing.save())
        note("saved");
      return;
    }
    ++m_edits;
    const Point& point = m_desk.study().points[0];
    const Place place{Spot::sx, point.name, point.stress[0].caseId};
    if (m_desk.request({Type{place, std::to_string(m_edits) + " MPa"}}, m_desk.newGesture(),
                       QStringLiteral("σx")))
      note("message the edit was not taken");
    const auto now = std::chrono::steady_clock::now().time_since_epoch();
    note("edit " + std::to_string(m_edits) + " " +
         std::to_string(std::chrono::duration_cast<std::chrono::milliseconds>(now).count()));
  }

  QString m_path;
  std::mt19937 m_dice;
  Desk m_desk{newStudy()};
  Filing m_filing;
  Recovery m_recovery;
  int m_edits = 0;
  QTimer m_next;
};

} // namespace

int main(int argc, char** argv) {
  QCoreApplication application(argc, argv);
  const QStringList words = QCoreApplication::arguments();
  if (words.size() < 3)
    return 2;
  if (words.size() > 3) {
    const auto bytes = static_cast<rlim_t>(words[3].toULong());
    const rlimit limit{bytes, bytes};
    ::setrlimit(RLIMIT_FSIZE, &limit);
    std::signal(SIGXFSZ, SIG_IGN);
  }
  const Session session(words[1], words[2].toUInt());
  return QCoreApplication::exec();
}
