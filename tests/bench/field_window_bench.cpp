// SPDX-License-Identifier: GPL-3.0-or-later
// Prints how long the window stands still at most while a table of a million points is screened, sorted and
// filtered beside it, and how long each takes until it is shown.
//   field_window_bench [POINTS]
#include "tests/support/judged_study.h"
#include "ui/look/font.h"
#include "ui/screen/field_page.h"
#include "ui/screen/field_setup.h"
#include "ui/screen/screen_dialog.h"

#include <QApplication>
#include <QCheckBox>
#include <QElapsedTimer>
#include <QEventLoop>
#include <QFile>
#include <QPushButton>
#include <QTableView>
#include <QTemporaryDir>
#include <QTimer>

#include <algorithm>
#include <cstdio>
#include <string>
#include <utility>

namespace planewright {
namespace {

/// Looks at the clock as often as the window comes round.
class Stalls {
public:
  Stalls() {
    m_clock.start();
    QObject::connect(&m_timer, &QTimer::timeout,
                     [this] { m_longest = std::max(m_longest, m_clock.restart()); });
    m_timer.start(0);
  }
  template <class Act, class IsDone>
  void measure(const char* words, Act act, IsDone isDone) {
    m_longest = 0;
    m_clock.restart();
    QElapsedTimer all;
    all.start();
    act();
    while (!isDone())
      QCoreApplication::processEvents(QEventLoop::AllEvents);
    QCoreApplication::processEvents(QEventLoop::AllEvents);
    m_longest = std::max(m_longest, m_clock.restart());
    std::printf("%-36s %6lld ms, longest stall %4lld ms\n", words, static_cast<long long>(all.elapsed()),
                static_cast<long long>(m_longest));
  }

private:
  QTimer m_timer;
  QElapsedTimer m_clock;
  qint64 m_longest = 0;
};

void write(const QString& path, long points) {
  std::string table = "point,region,x,y,sx G,sy G,txy G,sx S,sy S,txy S\n";
  std::uint64_t state = 1;
  const auto number = [&state](int most) {
    state = state * 6364136223846793005ULL + 1442695040888963407ULL;
    return std::to_string(static_cast<double>((state >> 33) % 10000) / 10000 * most);
  };
  for (long i = 0; i < points; ++i)
    table += "n" + std::to_string(i) + ",R" + std::to_string(i / 1000) + ',' + std::to_string(i % 1000) +
             ',' + std::to_string(i / 1000) + ',' + number(2) + ",0.01,0.1," + number(3) + ",0.02," +
             number(1) + '\n';
  QFile file(path);
  if (file.open(QIODevice::WriteOnly))
    file.write(table.data(), static_cast<qint64>(table.size()));
}

void run(long points) {
  const QTemporaryDir folder;
  const QString path = folder.filePath(QStringLiteral("deck.csv"));
  write(path, points);
  Study study = judgedStudy();
  study.points[0].checks.pop_back();
  Desk desk(study);
  ScreenDialog dialog(desk);
  dialog.show();
  dialog.setup().setTable(path);
  FieldPage& page = dialog.page();
  FieldModel& model = page.model();
  bool isArranged = false;
  QObject::connect(&page, &FieldPage::arranged, [&] { isArranged = true; });
  const auto arranged = [&] { return std::exchange(isArranged, false); };
  Stalls stalls;
  stalls.measure(
      "read, judged and sorted", [&] { dialog.setup().start().click(); }, arranged);
  const auto sort = [&](const char* words, FieldKey key) {
    stalls.measure(
        words, [&] { page.table().sortByColumn(model.columnOf(key), Qt::AscendingOrder); }, arranged);
  };
  sort("sorted by utilisation", FieldKey::utilisation);
  sort("sorted by name", FieldKey::point);
  sort("sorted by region", FieldKey::region);
  sort("sorted by worst angle", FieldKey::worstAngle);
  stalls.measure(
      "filtered to what exceeds", [&] { page.exceedsOnly().click(); }, arranged);
  stalls.measure(
      "all again", [&] { page.exceedsOnly().click(); }, arranged);
  stalls.measure(
      "scrolled to the end", [&] { page.table().scrollToBottom(); }, [] { return true; });
}

} // namespace
} // namespace planewright

int main(int argc, char* argv[]) {
  const QApplication app(argc, argv);
  planewright::loadProgramFont();
  planewright::run(argc > 1 ? std::stol(argv[1]) : 1000000);
}
