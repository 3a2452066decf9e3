// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QTableView>

namespace planewright {

class PlaneDelegate;
class PlaneHeader;
class TableModel;

/// A table of planes on screen: fixed order, widths from the font, keys, copying. What a key means for the
/// study is for the page to say.
class PlaneTable : public QTableView {
  Q_OBJECT

public:
  explicit PlaneTable(TableModel& model, QWidget* parent = nullptr);
  PlaneDelegate& delegate() const { return *m_delegate; }

public slots:
  /// Copies the selected cells, or all when at most one is selected that holds no number.
  void copySelected();
  void copyAll();
  /// The same for documents written in Markdown and LaTeX.
  void copyMarkdown();
  void copyLatex();

signals:
  void goTo(int row);
  /// Enter or a double click on a value that a combination gives.
  void combinationWanted(const QString& combination);
  void insertPressed();
  void deletePressed(int row);
  void otherPressed();

protected:
  bool event(QEvent* event) override;
  void keyPressEvent(QKeyEvent* event) override;
  void mouseDoubleClickEvent(QMouseEvent* event) override;
  void resizeEvent(QResizeEvent* event) override;
  void changeEvent(QEvent* event) override;

private:
  void goFrom(const QModelIndex& index);
  void growColumns();
  void spreadColumns();
  QList<int> widthsOfNumbers(bool brokenHeadings) const;
  void measure();

  TableModel& m_model;
  PlaneDelegate* m_delegate;
  PlaneHeader* m_header;
  QList<int> m_needed; ///< widest cell so far of each column; grows only, so that nothing jitters in a drag
};

} // namespace planewright
