// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QObject>
#include <QPointer>
#include <QString>

class QWidget;

namespace planewright {

class HelpWindow;

/// The widget that says where the manual tells of this one: the nearest one upwards with the property
/// "helpPlace" ("page#anchor"); none where no widget has it.
const QWidget* holderOfHelp(const QWidget* widget);
QString helpPlaceOf(const QWidget* widget);

/// F1 in every window of the program: opens the manual where it tells of the widget with the focus.
class HelpKey : public QObject {
  Q_OBJECT

public:
  /// `window` is the one over which the manual opens.
  explicit HelpKey(QWidget& window);

  void show(const QString& place);
  void showForFocus();
  HelpWindow& help();

protected:
  bool eventFilter(QObject* watched, QEvent* event) override;

private:
  QWidget& m_window;
  QPointer<HelpWindow> m_help;
};

} // namespace planewright
