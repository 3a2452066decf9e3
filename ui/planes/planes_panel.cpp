// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/planes_panel.h"

#include "core/table/cautions.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"
#include "ui/planes/plane_table.h"
#include "ui/planes/planes_page.h"
#include "ui/planes/quiet_tabs.h"
#include "ui/planes/sweep_page.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QStackedWidget>
#include <QVBoxLayout>

namespace planewright {

namespace {
constexpr int ownPages = 2; ///< the tables; what is adopted comes behind them
}

PlanesPanel::PlanesPanel(Desk& desk, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_tabs(new QuietTabs(this)), m_pages(new QStackedWidget(this)),
      m_planes(new PlanesPage(desk, m_pages)),
      m_sweep(new Later<SweepPage>([&desk](QWidget* place) { return new SweepPage(desk, place); }, m_pages)),
      m_copy(new QuietButton(tr("Copy table"), Role::focus, this)), m_range(new QLabel(this)) {
  setAutoFillBackground(true);
  setBackgroundRole(QPalette::AlternateBase);
  setAccessibleName(tr("Planes"));
  setProperty("helpPlace", "planes#table");
  m_tabs->addTab(tr("Planes"));
  m_tabs->addTab(tr("Sweep"));
  m_pages->addWidget(m_planes);
  m_pages->addWidget(m_sweep);
  m_copy->setToolTip(tr("Copies the table for a spreadsheet and for a document"));
  auto* line = new QHBoxLayout;
  line->setContentsMargins(4, 0, 8, 0);
  line->addWidget(m_tabs);
  line->addStretch();
  line->addWidget(m_copy);
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 4, 0, 0);
  rows->setSpacing(2);
  rows->addLayout(line);
  rows->addWidget(m_pages, 1);
  m_range->setWordWrap(true);
  m_range->setTextFormat(Qt::PlainText);
  m_range->setContentsMargins(10, 0, 10, 2);
  rows->addWidget(m_range);
  setFocusProxy(m_planes);
  connect(m_tabs, &QTabBar::tabBarClicked, this, &PlanesPanel::showPage);
  connect(m_tabs, &QTabBar::currentChanged, this, &PlanesPanel::showPage);
  connect(m_copy, &QAbstractButton::clicked, this, &PlanesPanel::copyShown);
  const auto tellRange = [this, &desk] {
    QStringList sentences;
    for (const Text& caution : cautionsOfEnvelope(desk.readout()))
      sentences << shown(caution);
    m_range->setText(sentences.join(QLatin1Char(' ')));
    m_range->setVisible(m_pages->currentIndex() < ownPages && !sentences.isEmpty());
  };
  connect(&desk, &Desk::changed, this, tellRange);
  tellRange();
  showPage(0);
}

// While a window goes the focus leaves its cell, which takes what was typed: by then this is no panel.
PlanesPanel::~PlanesPanel() {
  m_desk.disconnect(this);
}

void PlanesPanel::showPage(int index) {
  m_pages->setCurrentIndex(index);
  setFocusProxy(m_pages->currentWidget());
  m_copy->setVisible(index < ownPages);
  m_range->setVisible(index < ownPages && !m_range->text().isEmpty());
  setProperty("areaKeys",
              index == 2   ? m_pages->currentWidget()->property("areaKeys").toString()
              : index == 0 ? tr("F2 edit, Enter go there, Ctrl+Enter other solution, Ins watch, Del remove")
                           : tr("Enter brings the reading plane here, Ctrl+C copies"));
}

void PlanesPanel::adopt(QWidget* page, const QString& title) {
  m_pages->addWidget(page);
  m_tabs->addTab(title);
  m_tabs->updateGeometry(); // a hidden bar does not ask for the room itself
}

void PlanesPanel::release() {
  if (m_tabs->count() <= ownPages)
    return;
  m_tabs->setCurrentIndex(0);
  m_tabs->removeTab(ownPages);
  showPage(0);
}

void PlanesPanel::showAdopted() {
  m_tabs->setCurrentIndex(m_tabs->count() - 1);
}

SweepPage& PlanesPanel::sweep() const {
  return m_sweep->page();
}

PlaneTable& PlanesPanel::shownTable() const {
  return m_pages->currentWidget() == m_sweep ? sweep().table() : m_planes->table();
}

void PlanesPanel::copyShown() {
  shownTable().copyAll();
}

} // namespace planewright
