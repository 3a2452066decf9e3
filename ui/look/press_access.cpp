// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/press_access.h"

#include <QAbstractButton>
#include <QAccessible>
#include <QAccessibleWidget>
#include <QButtonGroup>
#include <QCheckBox>
#include <QPushButton>
#include <QToolButton>

namespace planewright {

namespace {

class PressAccess : public QAccessibleWidget {
public:
  explicit PressAccess(QAbstractButton& button) : QAccessibleWidget(&button), m_button(button) {}

  // Asked anew each time: it may be made before its button is complete.
  QAccessible::Role role() const override {
    if (hasMenu())
      return QAccessible::ButtonMenu;
    if (m_button.autoExclusive() || (m_button.group() && m_button.group()->exclusive()))
      return QAccessible::RadioButton;
    return qobject_cast<const QCheckBox*>(&m_button) ? QAccessible::CheckBox : QAccessible::Button;
  }
  QString text(QAccessible::Text kind) const override {
    if (kind == QAccessible::Name && m_button.accessibleName().isEmpty())
      return m_button.text().remove(QLatin1Char('&'));
    return QAccessibleWidget::text(kind);
  }
  QAccessible::State state() const override {
    QAccessible::State state = QAccessibleWidget::state();
    state.checkable = m_button.isCheckable();
    state.checked = m_button.isChecked();
    return state;
  }
  QStringList actionNames() const override {
    QStringList names;
    if (m_button.isEnabled())
      names << (hasMenu() ? showMenuAction() : m_button.isCheckable() ? toggleAction() : pressAction());
    return names + QAccessibleWidget::actionNames();
  }
  void doAction(const QString& action) override {
    if (action == showMenuAction())
      QMetaObject::invokeMethod(&m_button, "showMenu", Qt::QueuedConnection); // it ends with the menu
    else if (action == toggleAction() || action == pressAction())
      m_button.click();
    else
      QAccessibleWidget::doAction(action);
  }

private:
  bool hasMenu() const {
    const auto* tool = qobject_cast<const QToolButton*>(&m_button);
    return tool && tool->menu();
  }

  QAbstractButton& m_button;
};

/// Push buttons are left to the toolkit.
QAccessibleInterface* madeFor(const QString&, QObject* object) {
  auto* button = qobject_cast<QAbstractButton*>(object);
  const bool isPushed = qobject_cast<QPushButton*>(object) && !button->isCheckable();
  return button && !isPushed ? new PressAccess(*button) : nullptr;
}

} // namespace

void installPressAccess() {
  [[maybe_unused]] static const bool once = (QAccessible::installFactory(madeFor), true);
}

} // namespace planewright
