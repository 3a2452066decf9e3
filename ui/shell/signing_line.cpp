// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/signing_line.h"

#include "core/record/fingerprint.h"

namespace planewright {

SigningLine::SigningLine(Desk& desk, Spot spot, QWidget* parent)
    : QLabel(parent), m_desk(desk), m_spot(spot) {
  setWordWrap(true);
  setTextInteractionFlags(Qt::LinksAccessibleByKeyboard | Qt::LinksAccessibleByMouse);
  connect(this, &QLabel::linkActivated, this, &SigningLine::giveAgain);
  connect(&m_desk, &Desk::changed, this, &SigningLine::refresh);
  refresh();
}

void SigningLine::refresh() {
  const bool isPrepared = m_spot == Spot::titlePrepared;
  const Signings signings = signingsOf(m_desk.study());
  const QString again =
      QStringLiteral(" <a href=\"again\">") + tr("Give it for the study as it is") + QStringLiteral("</a>");
  switch (isPrepared ? signings.prepared : signings.checked) {
  case Signing::open:
    setText({});
    break;
  case Signing::bound:
    setText(
        tr("Given for the study as it is, %1.").arg(QString::fromStdString(fingerprintOf(m_desk.study()))));
    break;
  case Signing::changed:
    setText((isPrepared ? tr("The study changed since it was prepared.")
                        : tr("The study changed since it was checked.")) +
            again);
    break;
  case Signing::unbound:
    setText(tr("Nothing says for which state of the study the name was given.") + again);
    break;
  }
  setVisible(!text().isEmpty());
}

void SigningLine::giveAgain() {
  const Place place{m_spot, {}, {}};
  static_cast<void>(m_desk.request({Type{place, textAt(m_desk.study(), place).value_or("")}},
                                   m_desk.newCommand(), tr("Name given again")));
}

} // namespace planewright
