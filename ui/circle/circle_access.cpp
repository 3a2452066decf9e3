// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/circle_access.h"

#include "core/table/table.h"
#include "ui/circle/circle_plot.h"

#include <QAccessible>
#include <QAccessibleWidget>

namespace planewright {

namespace {

/// The plot as a dial: its value is the angle of the reading plane's normal.
class CircleDial : public QAccessibleWidget, public QAccessibleValueInterface {
public:
  explicit CircleDial(CirclePlot& plot) : QAccessibleWidget(&plot, QAccessible::Dial), m_plot(plot) {}

  void* interface_cast(QAccessible::InterfaceType type) override {
    if (type == QAccessible::ValueInterface)
      return static_cast<QAccessibleValueInterface*>(this);
    return QAccessibleWidget::interface_cast(type);
  }

  QString text(QAccessible::Text kind) const override {
    if (kind == QAccessible::Value)
      return CirclePlot::tr("%1 degrees").arg(m_plot.reading().degrees(), 0, 'f', angleDecimals);
    return QAccessibleWidget::text(kind);
  }

  QVariant currentValue() const override { return m_plot.reading().degrees(); }
  void setCurrentValue(const QVariant& value) override {
    m_plot.turnTo(Angle::fromDegrees(value.toDouble()));
  }
  QVariant maximumValue() const override { return 90.0; }
  QVariant minimumValue() const override { return -90.0; }
  QVariant minimumStepSize() const override { return 0.1; }

private:
  CirclePlot& m_plot;
};

QAccessibleInterface* dialOf(const QString&, QObject* object) {
  auto* plot = qobject_cast<CirclePlot*>(object);
  return plot ? new CircleDial(*plot) : nullptr;
}

} // namespace

void makeAccessible(CirclePlot& plot, Desk& desk) {
  [[maybe_unused]] static const bool once = (QAccessible::installFactory(dialOf), true);
  plot.setAccessibleName(CirclePlot::tr("Reading plane on the circle"));
  QObject::connect(&desk, &Desk::changed, &plot, [&plot] {
    if (!QAccessible::isActive())
      return;
    QAccessibleValueChangeEvent event(&plot, plot.reading().degrees());
    QAccessible::updateAccessibility(&event);
  });
}

} // namespace planewright
