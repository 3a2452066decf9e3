// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/picker.h"

#include "ui/look/look.h"

#include <QEvent>
#include <QHBoxLayout>
#include <QLabel>
#include <QPushButton>
#include <QToolButton>

#include <algorithm>

namespace planewright {

namespace {

QToolButton* arrow(Qt::ArrowType type, const QString& name, QWidget* parent) {
  auto* button = new QToolButton(parent);
  button->setArrowType(type);
  button->setAutoRaise(true);
  button->setAccessibleName(name);
  button->setToolTip(name);
  button->setFixedSize(24, 24);
  button->setFocusPolicy(Qt::TabFocus);
  return button;
}

} // namespace

Picker::Picker(const QString& caption, const QString& keys, QWidget* parent)
    : QWidget(parent), m_caption(new QLabel(caption, this)), m_name(new QPushButton(this)),
      m_previous(arrow(Qt::LeftArrow, tr("Previous (%1+PageUp)").arg(keys), this)),
      m_next(arrow(Qt::RightArrow, tr("Next (%1+PageDown)").arg(keys), this)), m_count(new QLabel(this)) {
  build(caption);
}

void Picker::build(const QString& caption) {
  auto* row = new QHBoxLayout(this);
  row->setContentsMargins(0, 0, 0, 0);
  row->setSpacing(4);
  row->addWidget(m_caption);
  row->addWidget(m_name);
  row->addWidget(m_previous);
  row->addWidget(m_next);
  row->addWidget(m_count);
  dress();
  m_name->setAccessibleName(caption);
  m_caption->setBuddy(m_name);
  m_caption->setContentsMargins(0, 0, 4, 0);
  connect(m_name, &QPushButton::clicked, this, &Picker::openList);
  connect(m_previous, &QToolButton::clicked, this, &Picker::previous);
  connect(m_next, &QToolButton::clicked, this, &Picker::next);
}

void Picker::dress() {
  m_name->setStyleSheet(QStringLiteral(
      "QPushButton { text-align: left; padding: 4px 8px; background: palette(base); border: 1px solid "
      "palette(dark); "
      "border-radius: 3px; } QPushButton:focus { border: 2px solid palette(link); padding: 3px 7px; }"));
}

// A style sheet looks its colours up when it is set.
void Picker::changeEvent(QEvent* event) {
  QWidget::changeEvent(event);
  if (event->type() == QEvent::PaletteChange) {
    m_name->setStyleSheet({});
    dress();
  }
}

void Picker::show(const QStringList& names, qsizetype current) {
  m_names = names;
  m_current = current;
  m_count->setText(tr("%1 of %2").arg(current + 1).arg(names.size()));
  m_previous->setEnabled(current > 0);
  m_next->setEnabled(current + 1 < names.size());
  writeName();
}

void Picker::setNameWidth(int width) {
  m_name->setFixedWidth(width);
  writeName();
}

void Picker::showCaption(bool shown) {
  m_caption->setVisible(shown);
}

void Picker::resizeEvent(QResizeEvent* event) {
  QWidget::resizeEvent(event);
  writeName();
}

void Picker::writeName() {
  const QString name = m_names.value(m_current);
  const int room = std::max(0, m_name->width() - 20);
  m_name->setText(nameForMenu(m_name->fontMetrics().elidedText(name, Qt::ElideRight, room)));
  m_name->setToolTip(name);
  m_name->setAccessibleDescription(name);
}

FilterList* Picker::openList() {
  auto* list =
      new FilterList(m_names, m_details ? m_details() : ListDetails(), m_names.value(m_current), this);
  connect(list, &FilterList::chosen, this, &Picker::chosen);
  list->move(m_name->mapToGlobal(QPoint(0, m_name->height() + 2)));
  list->QWidget::show();
  return list;
}

void Picker::step(int by) {
  const qsizetype wanted = m_current + by;
  if (wanted >= 0 && wanted < m_names.size())
    Q_EMIT chosen(m_names[wanted]);
}

} // namespace planewright
