// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

// Qt's reader of headers stumbles where this one comes first.
#include "core/report/make_sheet.h"
#include "core/report/sheet_pages.h"

#include <QObject>

#include <memory>

class QThread;

namespace planewright {

/// What a sheet is made of: values of their own, so that the study can go on changing.
struct SheetJob {
  Study study;
  SheetOrder order;
  Paper paper = Paper::a4;
};

struct MadeSheet {
  std::vector<Picture> pages;
  Text routes;
  bool disagrees = false;
};

/// Makes the pages of sheets beside the window, one sheet after the other: of those asked for meanwhile only
/// the last one.
class SheetRun : public QObject {
  Q_OBJECT

public:
  explicit SheetRun(QObject* parent = nullptr);
  ~SheetRun() override;

  void ask(SheetJob job);
  bool isRunning() const { return m_thread != nullptr; }

signals:
  void made(const MadeSheet& sheet);

private:
  void begin(SheetJob job);
  void take(const MadeSheet& sheet);

  std::optional<SheetJob> m_next;
  std::unique_ptr<QThread> m_thread; ///< while one is being made
};

} // namespace planewright
