// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/shell/help_pages.h"

#include <QDialog>

class QListWidget;

namespace planewright {

class HelpText;

/// Help beside the window: pages at the left, the page at the right.
class HelpWindow : public QDialog {
  Q_OBJECT

public:
  explicit HelpWindow(QWidget* parent);
  void showPage(HelpPage page);
  HelpPage page() const;

protected:
  void changeEvent(QEvent* event) override;

private:
  void write();

  QListWidget* m_pages;
  HelpText* m_text;
};

} // namespace planewright
