// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QWidget>

namespace planewright {

class SheetPreview;

/// The pages of a report in a scrolled column, with the choice between the whole width and true size.
class PagesView : public QWidget {
  Q_OBJECT

public:
  explicit PagesView(QWidget* parent = nullptr);
  SheetPreview& preview() const { return *m_preview; }

private:
  SheetPreview* m_preview;
};

} // namespace planewright
