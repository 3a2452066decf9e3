// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/ring_style.h"

#include "ui/look/look.h"
#include "ui/look/more_icon.h"

#include <QAbstractButton>
#include <QAbstractItemView>
#include <QLineEdit>
#include <QPainter>
#include <QStyleOption>
#include <QTextFormat>

namespace planewright {

namespace {
constexpr int room = 5; ///< beside a text, in pixels
constexpr double corner = 2;
} // namespace

RingStyle::RingStyle() : QProxyStyle(QStringLiteral("Fusion")) {}

void RingStyle::drawPrimitive(PrimitiveElement element, const QStyleOption* option, QPainter* painter,
                              const QWidget* widget) const {
  if (element == PE_IndicatorHeaderArrow)
    if (const auto* header = qstyleoption_cast<const QStyleOptionHeader*>(option)) {
      QStyleOptionHeader turned = *header;
      turned.sortIndicator = header->sortIndicator == QStyleOptionHeader::SortUp
                                 ? QStyleOptionHeader::SortDown
                                 : QStyleOptionHeader::SortUp;
      return QProxyStyle::drawPrimitive(element, &turned, painter, widget);
    }
  if (element != PE_FrameFocusRect || !qobject_cast<const QAbstractButton*>(widget)) {
    QProxyStyle::drawPrimitive(element, option, painter, widget);
    const bool isField = element == PE_FrameLineEdit && qobject_cast<const QLineEdit*>(widget);
    const bool isList = element == PE_Frame && qobject_cast<const QAbstractItemView*>(widget);
    if ((isField || isList) && !(option->state & State_HasFocus))
      drawEdge(*option, *painter, *widget, corner);
    const bool isTick = element == PE_IndicatorCheckBox || element == PE_IndicatorItemViewItemCheck;
    if (widget && (isTick || element == PE_IndicatorRadioButton))
      drawEdge(*option, *painter, *widget, isTick ? corner : option->rect.width() / 2.0);
    return;
  }
  painter->save();
  painter->setRenderHint(QPainter::Antialiasing);
  painter->setPen(QPen(lookOf(*widget).colour(Role::focus), 2));
  painter->setBrush(Qt::NoBrush);
  painter->drawRoundedRect(QRectF(option->rect).adjusted(1, 1, -1, -1), 3, 3);
  painter->restore();
}

int RingStyle::pixelMetric(PixelMetric metric, const QStyleOption* option, const QWidget* widget) const {
  const bool isText = metric == PM_FocusFrameHMargin && qobject_cast<const QAbstractItemView*>(widget);
  if (isText || metric == PM_HeaderMargin)
    return room;
  return QProxyStyle::pixelMetric(metric, option, widget);
}

QIcon RingStyle::standardIcon(StandardPixmap icon, const QStyleOption* option, const QWidget* widget) const {
  return icon == SP_ToolBarHorizontalExtensionButton ? moreIcon()
                                                     : QProxyStyle::standardIcon(icon, option, widget);
}

int RingStyle::styleHint(StyleHint hint, const QStyleOption* option, const QWidget* widget,
                         QStyleHintReturn* data) const {
  if (auto* ring = hint == SH_TextControl_FocusIndicatorTextCharFormat && widget
                       ? qstyleoption_cast<QStyleHintReturnVariant*>(data)
                       : nullptr) {
    QTextCharFormat format;
    format.setProperty(QTextFormat::OutlinePen, QPen(lookOf(*widget).colour(Role::focus), 2));
    ring->variant = format;
    return 1;
  }
  return QProxyStyle::styleHint(hint, option, widget, data);
}

QRect RingStyle::subElementRect(SubElement element, const QStyleOption* option, const QWidget* widget) const {
  const QRect rect = QProxyStyle::subElementRect(element, option, widget);
  const auto* field = qobject_cast<const QLineEdit*>(widget);
  return element == SE_LineEditContents && field && field->hasFrame() ? rect.adjusted(room, 0, -room, 0)
                                                                      : rect;
}

void RingStyle::drawEdge(const QStyleOption& option, QPainter& painter, const QWidget& widget,
                         double radius) const {
  painter.save();
  painter.setRenderHint(QPainter::Antialiasing);
  painter.setPen(QPen(lookOf(widget).colour(Role::other), 1));
  painter.setBrush(Qt::NoBrush);
  painter.drawRoundedRect(QRectF(option.rect).adjusted(0.5, 0.5, -0.5, -0.5), radius, radius);
  painter.restore();
}

} // namespace planewright
