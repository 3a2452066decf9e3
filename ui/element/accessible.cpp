// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/accessible.h"

#include "ui/element/element_view.h"

#include <QAccessible>
#include <QAccessibleWidget>

namespace planewright {

namespace {

double valueOf(const ElementView& view) {
  return view.angleOf(view.currentHandle()).value_or(Angle()).degrees();
}

class ElementAccessible : public QAccessibleWidget, public QAccessibleValueInterface {
public:
  explicit ElementAccessible(ElementView& view) : QAccessibleWidget(&view, QAccessible::Dial), m_view(view) {}

  void* interface_cast(QAccessible::InterfaceType type) override {
    return type == QAccessible::ValueInterface ? static_cast<QAccessibleValueInterface*>(this)
                                               : QAccessibleWidget::interface_cast(type);
  }

  QString text(QAccessible::Text kind) const override {
    if (kind == QAccessible::Value)
      return m_view.wordsOf(m_view.currentHandle());
    if (kind != QAccessible::Description)
      return QAccessibleWidget::text(kind);
    const QString reading = m_view.wordsOf(ElementHandle::reading);
    const QString line = m_view.wordsOf(ElementHandle::line);
    return line.isEmpty() ? reading : reading + QStringLiteral("; ") + line;
  }

  QVariant currentValue() const override { return valueOf(m_view); }
  void setCurrentValue(const QVariant& value) override {
    m_view.turn(m_view.currentHandle(), Angle::fromDegrees(value.toDouble()));
  }
  QVariant minimumValue() const override { return -90.0; }
  QVariant maximumValue() const override { return 90.0; }
  QVariant minimumStepSize() const override { return 0.1; }

private:
  ElementView& m_view;
};

QAccessibleInterface* made(const QString&, QObject* object) {
  auto* view = qobject_cast<ElementView*>(object);
  return view ? new ElementAccessible(*view) : nullptr;
}

} // namespace

void installElementAccessibility() {
  static const bool installed = (QAccessible::installFactory(made), true);
  Q_UNUSED(installed)
}

void announceElement(ElementView& view) {
  if (!QAccessible::isActive())
    return;
  QAccessibleValueChangeEvent event(&view, valueOf(view));
  QAccessible::updateAccessibility(&event);
}

} // namespace planewright
