// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/pages_view.h"

#include "ui/look/dialog_parts.h"
#include "ui/sheet/sheet_preview.h"

#include <QButtonGroup>
#include <QHBoxLayout>
#include <QScrollArea>
#include <QToolButton>
#include <QVBoxLayout>

namespace planewright {

PagesView::PagesView(QWidget* parent) : QWidget(parent), m_preview(new SheetPreview) {
  auto* scroll = new QScrollArea(this);
  scroll->setWidget(m_preview);
  scroll->setWidgetResizable(true);
  scroll->setFrameShape(QFrame::NoFrame);
  scroll->setAccessibleName(tr("Pages"));
  auto* zooms = new QHBoxLayout;
  auto* group = new QButtonGroup(this);
  const auto add = [&](const QString& words, SheetPreview::Zoom zoom) {
    auto* button = choiceButton(*zooms, *group, words, zoom == SheetPreview::Zoom::width);
    connect(button, &QToolButton::clicked, this, [this, zoom] { m_preview->setZoom(zoom); });
  };
  zooms->addStretch();
  add(tr("Whole width"), SheetPreview::Zoom::width);
  add(tr("100 %"), SheetPreview::Zoom::trueSize);
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins({});
  column->addLayout(zooms);
  column->addWidget(scroll, 1);
}

} // namespace planewright
