// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QFrame>
#include <QStringList>

class QLineEdit;
class QListWidget;

namespace planewright {

/// A list that pops up under a picker: typing filters it, Enter or a click chooses, Escape leaves. It lives
/// as long as it is open.
class FilterList : public QFrame {
  Q_OBJECT

public:
  FilterList(const QStringList& names, const QString& current, QWidget* parent);

  QLineEdit& filter() const { return *m_filter; }
  QListWidget& list() const { return *m_list; }

signals:
  void chosen(const QString& name);

protected:
  bool eventFilter(QObject* watched, QEvent* event) override;

private:
  void narrow(const QString& typed);
  void choose();

  QLineEdit* m_filter;
  QListWidget* m_list;
};

} // namespace planewright
