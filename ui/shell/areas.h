// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QList>
#include <QObject>
#include <QPointer>

class QWidget;

namespace planewright {

/// The areas of the window in the order in which F6 goes round them. An area that was left keeps its place:
/// the focus comes back to where it was.
class Areas : public QObject {
  Q_OBJECT

public:
  explicit Areas(const QList<QWidget*>& areas, QObject* parent = nullptr);

  /// The area that holds the focus; none when it is elsewhere.
  QWidget* current() const { return m_current; }
  /// The keys of the area with the focus, from the property "areaKeys" of the nearest widget that has it.
  QString keys() const;
  /// Gives the focus to an area.
  static void enter(QWidget& area, Qt::FocusReason reason = Qt::TabFocusReason);

public slots:
  void next() { step(1); }
  void previous() { step(-1); }

signals:
  void focusMoved();

protected:
  bool eventFilter(QObject* watched, QEvent* event) override;

private:
  void follow(QWidget* focused);
  void step(int by);

  QList<QWidget*> m_areas;
  QPointer<QWidget> m_current;
  QPointer<QWidget> m_focused;
};

} // namespace planewright
