// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/case_strip.h"

#include "ui/look/look.h"
#include "ui/look/quiet_button.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QMenu>
#include <QPainter>

namespace planewright {

namespace {

constexpr std::size_t mostSegments = 5;

/// One segment: the letter of the action, on the selection ground when it is the chosen one.
class Segment : public QAbstractButton {
public:
  Segment(const LoadCase& one, QWidget* parent) : QAbstractButton(parent) {
    setObjectName(fromUtf8(one.id));
    setText(fromUtf8(one.id));
    setToolTip(fromUtf8(one.name));
    setAccessibleName(CaseStrip::tr("case %1").arg(text()));
    setCheckable(true);
    setAutoExclusive(true);
    setFocusPolicy(Qt::TabFocus);
  }
  QSize sizeHint() const override {
    return {qMax(28, fontMetrics().horizontalAdvance(text()) + 14), fontMetrics().height() + 6};
  }

protected:
  void paintEvent(QPaintEvent*) override {
    QPainter painter(this);
    painter.setRenderHint(QPainter::Antialiasing);
    const Look look = lookOf(*this);
    QFont face = font();
    face.setBold(isChecked());
    const Role edge = hasFocus() || isChecked() ? Role::focus : Role::other;
    painter.setPen(QPen(look.colour(edge), hasFocus() ? 2 : 1));
    painter.setBrush(look.colour(isChecked() ? Role::selection : Role::canvas));
    painter.drawRoundedRect(QRectF(rect()).adjusted(1, 1, -1, -1), 3, 3);
    painter.setFont(face);
    painter.setPen(look.colour(Role::ink));
    painter.drawText(rect(), Qt::AlignCenter, text());
  }
};

} // namespace

CaseStrip::CaseStrip(QWidget* parent) : QWidget(parent) {
  setProperty("helpPlace", "combinations#cases");
  auto* line = new QHBoxLayout(this);
  line->setContentsMargins(0, 0, 0, 0);
  line->setSpacing(4);
}

void CaseStrip::showCases(const Study& study, const std::string& current) {
  if (study.cases != m_cases)
    rebuild(study.cases);
  setVisible(m_cases.size() > 1);
  for (auto* segment : findChildren<QAbstractButton*>())
    if (auto* list = qobject_cast<QuietButton*>(segment))
      list->setText(fromUtf8(current));
    else
      segment->setChecked(segment->text() == fromUtf8(current));
}

void CaseStrip::rebuild(const std::vector<LoadCase>& cases) {
  qDeleteAll(findChildren<QWidget*>(QString(), Qt::FindDirectChildrenOnly));
  while (QLayoutItem* item = layout()->takeAt(0))
    delete item;
  m_cases = cases;
  layout()->addWidget(new QLabel(tr("Case"), this));
  if (cases.size() > mostSegments)
    addList(cases);
  else
    for (const LoadCase& one : cases)
      addSegment(one);
  static_cast<QHBoxLayout*>(layout())->addStretch();
  Q_EMIT rebuilt();
}

QList<QWidget*> CaseStrip::buttons() const {
  QList<QWidget*> buttons;
  for (auto* button : findChildren<QAbstractButton*>())
    buttons += button;
  return buttons;
}

void CaseStrip::addSegment(const LoadCase& one) {
  auto* segment = new Segment(one, this);
  connect(segment, &QAbstractButton::clicked, this, [this, id = one.id] { Q_EMIT chosen(id); });
  layout()->addWidget(segment);
}

void CaseStrip::addList(const std::vector<LoadCase>& cases) {
  auto* list = new QuietButton({}, Role::ink, this);
  auto* menu = new QMenu(list);
  for (const LoadCase& one : cases)
    menu->addAction(nameForMenu(fromUtf8(one.name.empty() ? one.id : one.id + "  " + one.name)), this,
                    [this, id = one.id] { Q_EMIT chosen(id); });
  list->setMenu(menu);
  list->setAccessibleName(tr("case"));
  layout()->addWidget(list);
}

} // namespace planewright
