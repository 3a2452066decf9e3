// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/circle_view.h"

#include "ui/circle/circle_plot.h"
#include "ui/look/quiet_button.h"

#include <QActionGroup>
#include <QHBoxLayout>
#include <QLabel>
#include <QMenu>
#include <QPainter>
#include <QVBoxLayout>

namespace planewright {

namespace {

QLabel* newHeading(const QString& words, QWidget* parent) {
  auto* heading = new QLabel(words, parent);
  QFont font = heading->font();
  font.setBold(true);
  heading->setFont(font);
  return heading;
}

} // namespace

CircleView::CircleView(Desk& desk, QWidget* parent)
    : QWidget(parent), m_heading(newHeading(tr("Circle"), this)), m_plot(new CirclePlot(desk, this)),
      m_menu(new QuietButton(QString(), Role::soft, this)) {
  auto* menu = new QMenu(m_menu);
  auto* group = new QActionGroup(menu);
  m_this = group->addAction(tr("This circle"));
  m_all = group->addAction(tr("All combinations"));
  m_limit = group->addAction(tr("With the limit of checked planes"));
  for (QAction* action : group->actions())
    action->setCheckable(true);
  menu->addActions(group->actions());
  connect(m_this, &QAction::triggered, this, &CircleView::fit);
  connect(m_all, &QAction::triggered, this, [this] {
    m_plot->setFit(Fit::allCombinations);
    showFit();
  });
  connect(m_limit, &QAction::triggered, this, [this] {
    m_plot->setFit(Fit::withLimit);
    showFit();
  });
  m_menu->setMenu(menu);
  m_menu->setFocusPolicy(Qt::TabFocus);

  auto* row = new QHBoxLayout;
  row->setContentsMargins(12, 4, 8, 0);
  row->addWidget(m_heading);
  row->addStretch();
  row->addWidget(m_menu);
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins({});
  column->setSpacing(0);
  column->addLayout(row);
  column->addWidget(m_plot, 1);

  setAccessibleName(tr("Circle"));
  setProperty("helpPlace", "drawings#circle");
  setFocusProxy(m_plot);
  setProperty("areaKeys", tr("Left/Right turn by 1°, Shift 0.1°, Ctrl 15°"));
  connect(m_plot, &CirclePlot::angleEntryWanted, this, &CircleView::angleEntryWanted);
  showFit();
}

/// Where both have no room, the fit matters more than the heading, which the drawing explains.
void CircleView::resizeEvent(QResizeEvent* event) {
  QWidget::resizeEvent(event);
  constexpr int gaps = 40;
  m_heading->setVisible(m_heading->sizeHint().width() + m_menu->sizeHint().width() + gaps <= width());
}

/// The heading stands on the same ground as the drawing.
void CircleView::paintEvent(QPaintEvent*) {
  QPainter(this).fillRect(rect(), lookOf(*this).colour(Role::canvas));
}

void CircleView::fit() {
  m_plot->setFit(Fit::thisCircle);
  showFit();
}

void CircleView::showFit() {
  const Fit now = m_plot->fit();
  (now == Fit::allCombinations ? m_all : now == Fit::withLimit ? m_limit : m_this)->setChecked(true);
  m_menu->setText(now == Fit::allCombinations ? tr("fit: all combinations")
                  : now == Fit::withLimit     ? tr("fit: with the limit")
                                              : tr("fit: this circle"));
  m_menu->setAccessibleName(m_menu->text());
}

} // namespace planewright
