// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/status_line.h"

#include "ui/look/look.h"

#include <QEvent>
#include <QHBoxLayout>
#include <QLabel>
#include <QTextDocumentFragment>

#include <algorithm>

namespace planewright {

namespace {

/// A sentence begins with a capital; a symbol, "y now 20 mm", is written as it is.
QString capital(QString sentence) {
  const bool isWord =
      sentence.size() > 1 && sentence[1].isLetter() && sentence[0].script() == QChar::Script_Latin;
  if (isWord)
    sentence[0] = sentence[0].toUpper();
  return sentence;
}

} // namespace

StatusLine::StatusLine(QWidget* parent)
    : QWidget(parent), m_left(new QLabel(this)), m_right(new QLabel(this)) {
  auto* row = new QHBoxLayout(this);
  row->setContentsMargins(12, 0, 12, 0);
  row->setSpacing(24);
  row->addWidget(m_left, 1);
  row->addWidget(m_right);
  m_left->setTextFormat(Qt::RichText);
  m_left->setMinimumWidth(80);
  m_left->setTextInteractionFlags(Qt::LinksAccessibleByMouse);
  m_right->setAlignment(Qt::AlignRight | Qt::AlignVCenter);
  setFixedHeight(std::max(24, fontMetrics().height() + 6));
  setAccessibleName(tr("Status"));
  setProperty("helpPlace", "window#status-line");
  connect(m_left, &QLabel::linkActivated, this, [this](const QString& link) {
    if (link == QLatin1String("entry"))
      Q_EMIT notTakenClicked();
    else
      Q_EMIT actionClicked();
  });
  write();
}

void StatusLine::say(const QString& message, const QString& action) {
  m_message = capital(message);
  m_action = action;
  m_isNewMessage = true;
  write();
}

void StatusLine::setNotTaken(int count, const QString& first) {
  m_isNewMessage = m_isNewMessage && count == m_notTaken && first == m_firstNotTaken;
  m_notTaken = count;
  m_firstNotTaken = first;
  write();
}

void StatusLine::setKeys(const QString& keys) {
  m_right->setText(keys.isEmpty() ? tr("F1 help") : tr("%1 · F1 help").arg(keys));
}

QString StatusLine::words() const {
  return QTextDocumentFragment::fromHtml(m_left->text()).toPlainText();
}

void StatusLine::changeEvent(QEvent* event) {
  QWidget::changeEvent(event);
  if (event->type() == QEvent::PaletteChange)
    write();
}

void StatusLine::write() {
  const Look look = lookOf(*this);
  QPalette soft = palette();
  soft.setColor(QPalette::WindowText, look.colour(Role::soft));
  m_right->setPalette(soft);
  QString text = m_message.toHtmlEscaped();
  if (!m_action.isEmpty())
    text += QStringLiteral(" <a href=\"action\" style=\"color:%1\">%2</a>")
                .arg(look.colour(Role::focus).name(), m_action.toHtmlEscaped());
  if (m_notTaken > 0) {
    const QString words = m_notTaken == 1
                              ? tr("1 entry not taken: %1").arg(m_firstNotTaken)
                              : tr("%1 entries not taken, first %2").arg(m_notTaken).arg(m_firstNotTaken);
    const QString entry = QStringLiteral("<a href=\"entry\" style=\"color:%1; font-weight:bold\">%2</a>")
                              .arg(look.colour(Role::wrong).name(), words.toHtmlEscaped());
    text = m_isNewMessage && !m_message.isEmpty() ? text + QLatin1Char(' ') + entry : entry;
  }
  m_left->setText(text);
}

} // namespace planewright
