// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/dial_access.h"

#include <QAccessible>
#include <QAccessibleWidget>
#include <QHash>
#include <QWidget>

namespace planewright {

namespace {

/// By their widgets, which take them along when they go.
QHash<QObject*, DialWords>& dials() {
  static QHash<QObject*, DialWords> made;
  return made;
}

class DialAccess : public QAccessibleWidget, public QAccessibleValueInterface {
public:
  DialAccess(QWidget& widget, const DialWords& words)
      : QAccessibleWidget(&widget, QAccessible::Dial), m_words(words) {}

  void* interface_cast(QAccessible::InterfaceType type) override {
    return type == QAccessible::ValueInterface ? static_cast<QAccessibleValueInterface*>(this)
                                               : QAccessibleWidget::interface_cast(type);
  }
  QString text(QAccessible::Text kind) const override {
    if (kind == QAccessible::Value)
      return m_words.said();
    return kind == QAccessible::Description ? m_words.described() : QAccessibleWidget::text(kind);
  }
  QVariant currentValue() const override { return m_words.value(); }
  void setCurrentValue(const QVariant& value) override { m_words.turn(value.toDouble()); }
  QVariant minimumValue() const override { return -90.0; }
  QVariant maximumValue() const override { return 90.0; }
  QVariant minimumStepSize() const override { return 0.1; }

private:
  DialWords m_words;
};

QAccessibleInterface* madeFor(const QString&, QObject* object) {
  const auto at = dials().constFind(object);
  return at == dials().constEnd() ? nullptr : new DialAccess(*static_cast<QWidget*>(object), *at);
}

} // namespace

void makeDial(QWidget& widget, const DialWords& words) {
  [[maybe_unused]] static const bool once = (QAccessible::installFactory(madeFor), true);
  dials().insert(&widget, words);
  QObject::connect(&widget, &QObject::destroyed, [](QObject* gone) { dials().remove(gone); });
}

void announceDial(QWidget& widget) {
  const auto at = dials().constFind(&widget);
  if (!QAccessible::isActive() || at == dials().constEnd())
    return;
  QAccessibleValueChangeEvent event(&widget, at->value());
  QAccessible::updateAccessibility(&event);
}

} // namespace planewright
