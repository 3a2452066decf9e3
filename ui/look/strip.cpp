// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/strip.h"

#include "ui/look/look.h"
#include "ui/look/steady_label.h"

#include <QEvent>
#include <QHBoxLayout>
#include <QLabel>
#include <QPainter>
#include <QToolButton>
#include <QUrl>

namespace planewright {

Strip::Strip(QWidget* parent) : QWidget(parent), m_label(new SteadyLabel(this)), m_scope(new QObject(this)) {
  auto* row = new QHBoxLayout(this);
  row->setContentsMargins(12, 4, 8, 4);
  row->addWidget(m_label, 1);
  auto* away = new QToolButton(this);
  away->setText(QString(QChar(0x00D7)));
  away->setAutoRaise(true);
  away->setAccessibleName(tr("Put this line away"));
  away->setToolTip(away->accessibleName());
  row->addWidget(away, 0, Qt::AlignTop);
  m_label->label().setTextFormat(Qt::RichText);
  m_label->label().setTextInteractionFlags(Qt::LinksAccessibleByMouse | Qt::LinksAccessibleByKeyboard);
  connect(away, &QToolButton::clicked, this, &QWidget::hide);
  connect(&m_label->label(), &QLabel::linkActivated, this,
          [this](const QString& link) { Q_EMIT linkClicked(QUrl::fromPercentEncoding(link.toLatin1())); });
  hide();
}

void Strip::say(const QString& sentence, Tone tone) {
  delete m_scope;
  m_scope = new QObject(this);
  m_sentence = sentence;
  m_offers.clear();
  m_tone = tone;
  write();
  show();
}

void Strip::changeEvent(QEvent* event) {
  QWidget::changeEvent(event);
  if (event->type() == QEvent::PaletteChange)
    write();
}

void Strip::paintEvent(QPaintEvent*) {
  const Look look = lookOf(*this);
  QPainter painter(this);
  const bool wrong = m_tone == Tone::wrong;
  painter.fillRect(rect(), look.colour(wrong ? Role::wrongGround : Role::selection));
  painter.fillRect(0, height() - 1, width(), 1, look.colour(wrong ? Role::wrong : Role::rule));
}

void Strip::write() {
  const Look look = lookOf(*this);
  const QString ink = look.colour(m_tone == Tone::wrong ? Role::wrong : Role::ink).name();
  QString text = QStringLiteral("<span style=\"color:%1\">%2%3</span>")
                     .arg(ink, m_tone == Tone::wrong ? QStringLiteral("\u25B2 ") : QString(),
                          m_sentence.toHtmlEscaped());
  for (const QString& words : m_offers)
    text += QStringLiteral(" &nbsp; <a href=\"%1\" style=\"color:%2\">%3</a>")
                .arg(QString::fromLatin1(QUrl::toPercentEncoding(words)), look.colour(Role::ink).name(),
                     words.toHtmlEscaped());
  m_label->setText(text);
}

} // namespace planewright
