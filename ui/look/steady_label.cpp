// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/steady_label.h"

#include <QLabel>

namespace planewright {

SteadyLabel::SteadyLabel(QWidget* parent) : QWidget(parent), m_label(new QLabel(this)) {
  m_label->setWordWrap(true);
  QSizePolicy policy(QSizePolicy::Preferred, QSizePolicy::Preferred);
  policy.setHeightForWidth(true);
  setSizePolicy(policy);
}

QString SteadyLabel::text() const {
  return m_label->text();
}

void SteadyLabel::setText(const QString& text) {
  if (text == m_label->text())
    return;
  m_label->setText(text);
  m_heights.clear();
  if (heightForWidth(width()) != height())
    updateGeometry();
}

int SteadyLabel::heightForWidth(int width) const {
  const auto known = m_heights.constFind(width);
  if (known != m_heights.cend())
    return *known;
  return *m_heights.insert(width, m_label->heightForWidth(width));
}
QSize SteadyLabel::sizeHint() const {
  return m_label->sizeHint();
}
QSize SteadyLabel::minimumSizeHint() const {
  return m_label->minimumSizeHint();
}

void SteadyLabel::changeEvent(QEvent* event) {
  m_heights.clear();
  QWidget::changeEvent(event);
}

void SteadyLabel::resizeEvent(QResizeEvent*) {
  m_label->setGeometry(rect());
}

} // namespace planewright
