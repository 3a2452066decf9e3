// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/plane_table.h"

#include "core/table/document_rows.h"
#include "ui/look/look.h"
#include "ui/planes/copied_table.h"
#include "ui/planes/plane_delegate.h"
#include "ui/planes/plane_header.h"
#include "ui/planes/table_model.h"

#include <QApplication>
#include <QClipboard>
#include <QKeyEvent>
#include <QMimeData>

#include <numeric>

namespace planewright {

namespace {

constexpr int headingPadding = 18;
constexpr int namesWithNote = 400;
constexpr int mostAir = 32;
constexpr int mostTight = 8; ///< of the space before a number, which stands at the right of its cell

void putOnClipboard(const Table& table) {
  auto* data = new QMimeData;
  data->setText(fromUtf8(tabSeparated(table, translation())));
  data->setHtml(fromUtf8(html(table, translation())));
  QApplication::clipboard()->setMimeData(data);
}

bool isEnter(const QKeyEvent& key) {
  return key.key() == Qt::Key_Return || key.key() == Qt::Key_Enter;
}

} // namespace

PlaneTable::PlaneTable(TableModel& model, QWidget* parent)
    : QTableView(parent), m_model(model), m_delegate(new PlaneDelegate(this)),
      m_header(new PlaneHeader(this)) {
  setHorizontalHeader(m_header);
  setItemDelegate(m_delegate);
  setModel(&m_model);
  verticalHeader()->hide();
  setShowGrid(false);
  setFrameShape(QFrame::NoFrame);
  setTabKeyNavigation(false);
  setSelectionMode(QAbstractItemView::ExtendedSelection);
  setEditTriggers(QAbstractItemView::EditKeyPressed | QAbstractItemView::AnyKeyPressed);
  setHorizontalScrollMode(QAbstractItemView::ScrollPerPixel);
  setWordWrap(false);
  viewport()->setBackgroundRole(QPalette::AlternateBase);
  connect(&m_model, &QAbstractItemModel::dataChanged, this, &PlaneTable::growColumns);
  connect(&m_model, &QAbstractItemModel::modelReset, this, &PlaneTable::measure);
  connect(&m_model, &QAbstractItemModel::columnsInserted, this, &PlaneTable::measure);
  connect(&m_model, &QAbstractItemModel::columnsRemoved, this, &PlaneTable::measure);
  connect(m_delegate, &QAbstractItemDelegate::closeEditor, this,
          [this](QWidget*, QAbstractItemDelegate::EndEditHint hint) {
            if (hint == QAbstractItemDelegate::RevertModelCache)
              m_model.forget();
          });
  measure();
}

void PlaneTable::measure() {
  m_needed.fill(0, m_model.columnCount());
  verticalHeader()->setDefaultSectionSize(PlaneDelegate::rowHeight(font()));
  verticalHeader()->setMinimumSectionSize(PlaneDelegate::rowHeight(font()));
  growColumns();
}

void PlaneTable::growColumns() {
  for (int column = 0; column < m_model.columnCount(); ++column) {
    int& needed = m_needed[column];
    for (int row = 0; row < m_model.rowCount(); ++row)
      needed = qMax(needed, PlaneDelegate::cellWidth(font(), m_model.index(row, column)));
  }
  spreadColumns();
}

QList<int> PlaneTable::widthsOfNumbers(bool brokenHeadings) const {
  QList<int> widths;
  // While columns go the view may be laid out before it has measured those that stay.
  const int count = qMin(static_cast<int>(m_needed.size()), m_model.columnCount());
  for (int column = 1; column < count; ++column)
    widths << qMax(m_needed.at(column), m_header->headingWidth(column, brokenHeadings) + headingPadding);
  return widths;
}

// First the names get room for a note behind them, then the numbers some air, then the names the rest. Where
// the numbers do not fit beside the names their headings are broken, then they stand closer.
void PlaneTable::spreadColumns() {
  const int least = isColumnHidden(0) ? 0 : m_needed.front();
  const auto sum = [](const QList<int>& widths) { return std::accumulate(widths.begin(), widths.end(), 0); };
  m_header->setBroken(sum(widthsOfNumbers(false)) + least > viewport()->width());
  const int room = viewport()->width(); // less where the higher headings bring a scroll bar
  const QList<int> widths = widthsOfNumbers(m_header->isBroken());
  const auto count = static_cast<int>(widths.size());
  const int numbers = sum(widths);
  const int withNote = isColumnHidden(0) ? 0 : qMax(least, namesWithNote);
  const int tight = qBound(-mostTight, (room - numbers - least - count + 1) / count, 0);
  const int air = tight < 0 ? tight : qBound(0, (room - numbers - withNote) / count, mostAir);
  for (int column = 1; column <= count; ++column)
    setColumnWidth(column, widths.at(column - 1) + air);
  setColumnWidth(0, qMax(m_needed.front(), room - numbers - count * air));
}

void PlaneTable::resizeEvent(QResizeEvent* event) {
  QTableView::resizeEvent(event);
  spreadColumns();
}

void PlaneTable::changeEvent(QEvent* event) {
  QTableView::changeEvent(event);
  if (event->type() == QEvent::FontChange)
    measure();
  if (event->type() == QEvent::PaletteChange)
    viewport()->update();
}

bool PlaneTable::event(QEvent* event) {
  if (event->type() == QEvent::ShortcutOverride) {
    const auto* key = static_cast<QKeyEvent*>(event);
    const bool own = key->matches(QKeySequence::Copy) || key->key() == Qt::Key_Delete ||
                     key->key() == Qt::Key_Insert || isEnter(*key);
    if (own) {
      event->accept();
      return true;
    }
  }
  return QTableView::event(event);
}

void PlaneTable::keyPressEvent(QKeyEvent* event) {
  if (event->matches(QKeySequence::Copy))
    copySelected();
  else if (isEnter(*event) && event->modifiers() & Qt::ControlModifier)
    Q_EMIT otherPressed();
  else if (isEnter(*event))
    goFrom(currentIndex());
  else if (event->key() == Qt::Key_Insert)
    Q_EMIT insertPressed();
  else if (event->key() == Qt::Key_Delete && currentIndex().isValid())
    Q_EMIT deletePressed(currentIndex().row());
  else
    QTableView::keyPressEvent(event);
}

void PlaneTable::mouseDoubleClickEvent(QMouseEvent* event) {
  QTableView::mouseDoubleClickEvent(event);
  if (const QModelIndex index = indexAt(event->pos()); index.isValid())
    goFrom(index);
}

// From a value of another combination to that combination, else to the plane of the row.
void PlaneTable::goFrom(const QModelIndex& index) {
  if (!index.isValid())
    return; // rows that came anew have no current one
  if (const QString combination = m_model.combinationIn(index); !combination.isEmpty())
    Q_EMIT combinationWanted(combination);
  else
    Q_EMIT goTo(index.row());
}

void PlaneTable::copyAll() {
  putOnClipboard(m_model.table());
}

void PlaneTable::copyMarkdown() {
  QApplication::clipboard()->setText(fromUtf8(markdown(m_model.table(), translation())));
}

void PlaneTable::copyLatex() {
  QApplication::clipboard()->setText(fromUtf8(latexRows(m_model.table(), translation())));
}

void PlaneTable::copySelected() {
  const QModelIndexList cells = selectionModel()->selectedIndexes();
  if (cells.size() == 1) {
    QApplication::clipboard()->setText(oneCell(m_model.table(), cells.front()));
    return;
  }
  putOnClipboard(cells.isEmpty() ? m_model.table() : partOf(m_model.table(), cells));
}

} // namespace planewright
