// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/planes_panel.h"

#include "ui/look/quiet_button.h"
#include "ui/planes/plane_table.h"
#include "ui/planes/planes_page.h"
#include "ui/planes/quiet_tabs.h"
#include "ui/planes/sweep_page.h"

#include <QHBoxLayout>
#include <QStackedWidget>
#include <QVBoxLayout>

namespace planewright {

PlanesPanel::PlanesPanel(Desk& desk, QWidget* parent)
    : QWidget(parent), m_tabs(new QuietTabs(this)), m_pages(new QStackedWidget(this)),
      m_planes(new PlanesPage(desk, m_pages)), m_sweep(new SweepPage(desk, m_pages)) {
  setAutoFillBackground(true);
  setBackgroundRole(QPalette::AlternateBase);
  setAccessibleName(tr("Planes"));
  m_tabs->addTab(tr("Planes"));
  m_tabs->addTab(tr("Sweep"));
  m_pages->addWidget(m_planes);
  m_pages->addWidget(m_sweep);
  auto* copy = new QuietButton(tr("Copy table"), Role::focus, this);
  copy->setToolTip(tr("Copies the table for a spreadsheet and for a document"));
  auto* line = new QHBoxLayout;
  line->setContentsMargins(4, 0, 8, 0);
  line->addWidget(m_tabs);
  line->addStretch();
  line->addWidget(copy);
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 4, 0, 0);
  rows->setSpacing(2);
  rows->addLayout(line);
  rows->addWidget(m_pages, 1);
  setFocusProxy(m_planes);
  connect(m_tabs, &QTabBar::tabBarClicked, this, &PlanesPanel::showPage);
  connect(m_tabs, &QTabBar::currentChanged, this, &PlanesPanel::showPage);
  connect(copy, &QAbstractButton::clicked, this, &PlanesPanel::copyShown);
  showPage(0);
}

void PlanesPanel::showPage(int index) {
  m_pages->setCurrentIndex(index);
  setFocusProxy(m_pages->currentWidget());
  setProperty("areaKeys",
              index == 0 ? tr("F2 edit, Enter go there, Ctrl+Enter other solution, Ins watch, Del remove")
                         : tr("Enter brings the reading plane here, Ctrl+C copies"));
}

void PlanesPanel::copyShown() {
  (m_pages->currentIndex() == 0 ? m_planes->table() : m_sweep->table()).copyAll();
}

} // namespace planewright
