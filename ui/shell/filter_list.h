// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QFrame>
#include <QStringList>

class QLineEdit;
class QTreeWidget;
class QTreeWidgetItem;

namespace planewright {

/// What stands behind the names of a list, one of each for each name. Without a heading for the values there
/// are names only.
struct ListDetails {
  QString nameHeading;
  QString valueHeading;
  QString valueMeaning; ///< the heading's tooltip
  QStringList values;
  QStringList remarks;
  QList<double> weights = {}; ///< the heaviest stands first; in the order of the names without them
};

/// A list that pops up under a picker: typing filters it, Enter or a click chooses, Escape leaves. It lives
/// as long as it is open.
class FilterList : public QFrame {
  Q_OBJECT

public:
  FilterList(const QStringList& names, const ListDetails& details, const QString& current, QWidget* parent);

  QLineEdit& filter() const { return *m_filter; }
  QTreeWidget& list() const { return *m_list; }

signals:
  void chosen(const QString& name);

protected:
  bool eventFilter(QObject* watched, QEvent* event) override;

private:
  void fill(const QStringList& names, const ListDetails& details);
  void narrow(const QString& typed);
  void choose();

  QLineEdit* m_filter;
  QTreeWidget* m_list;
};

} // namespace planewright
