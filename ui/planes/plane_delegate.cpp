// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/plane_delegate.h"

#include "core/figure/marks.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/look.h"
#include "ui/look/runs_text.h"
#include "ui/planes/planes_model.h"

#include <QApplication>
#include <QKeyEvent>
#include <QMouseEvent>
#include <QPainter>
#include <QPolygonF>

namespace planewright {

namespace {

constexpr int markRoom = 30;
constexpr int sidePadding = 9;
constexpr qreal markSize = 9;
constexpr int noteGap = 14;
constexpr int notePadding = 6;
constexpr int leastEditor = 150;

const TableModel& modelOf(const QModelIndex& index) {
  return *static_cast<const TableModel*>(index.model());
}

/// Null for the row in which a plane to watch is typed.
const Row* rowAt(const QModelIndex& index) {
  const auto& rows = modelOf(index).table().rows;
  const auto at = static_cast<std::size_t>(index.row());
  return at < rows.size() ? &rows[at] : nullptr;
}

Runs wordsAt(const QModelIndex& index) {
  if (const Row* row = rowAt(index))
    return runs(row->cells[static_cast<std::size_t>(index.column())].shown, translation());
  const QString words = index.data().toString();
  return words.isEmpty() ? Runs{} : Runs{{words.toStdString(), false}};
}

QFont fontFor(QFont font, const QModelIndex& index) {
  font.setBold(modelOf(index).tintIsBold() && modelOf(index).tintedRow() == index.row());
  return font;
}

void paintMark(QPainter& painter, const QRectF& box, PlaneKind kind, const Look& look) {
  const SignShape shape = shapeOf(signOf(kind), markSize);
  const QColor colour = look.colour(roleOf(kind));
  painter.save();
  painter.setRenderHint(QPainter::Antialiasing);
  painter.translate(box.left() + markRoom / 2.0, box.center().y());
  painter.setPen(QPen(colour, kind == PlaneKind::watched ? 1.2 : 1.6));
  painter.setBrush(shape.filled ? QBrush(colour) : QBrush(Qt::NoBrush));
  if (shape.round)
    painter.drawEllipse(QPointF(), markSize / 2, markSize / 2);
  QPolygonF outline;
  for (const Vec& corner : shape.outline)
    outline += QPointF(corner.x, corner.y);
  if (outline.size() == 2)
    painter.drawLine(outline.at(0), outline.at(1));
  else if (!outline.isEmpty())
    painter.drawPolygon(outline);
  painter.restore();
}

/// A hair rule stands over the first row of a group.
bool startsGroup(const QModelIndex& index) {
  const Row* row = rowAt(index);
  const Row* above = index.row() > 0 ? rowAt(index.siblingAtRow(index.row() - 1)) : nullptr;
  return above && (!row || row->group != above->group);
}

void paintGround(QPainter& painter, const QStyleOptionViewItem& option, const QModelIndex& index,
                 const Look& look) {
  Role ground = Role::canvas;
  if (modelOf(index).tintedRow() == index.row())
    ground = Role::selection;
  else if (option.state & QStyle::State_Selected)
    ground = Role::grid;
  painter.fillRect(option.rect, look.colour(ground));
  if (startsGroup(index))
    painter.fillRect(QRect(option.rect.left(), option.rect.top(), option.rect.width(), 1),
                     look.colour(Role::rule));
}

/// The box of the note at the right end of a row's first cell.
QRectF noteBox(const QStyleOptionViewItem& option, const QModelIndex& index, const RowNote& note) {
  QFont font = option.font;
  font.setBold(false);
  const QRectF text = PlaneDelegate::textBox(option.rect, index.column());
  const qreal start = text.left() + runsWidth(wordsAt(index), fontFor(option.font, index)) + noteGap;
  const qreal wanted = runsWidth(runs(note.words, translation()), font) + 2 * notePadding;
  const qreal width = qMin(wanted, text.right() - start);
  return {start, option.rect.top() + 2.0, width, option.rect.height() - 4.0};
}

void paintNote(QPainter& painter, const QStyleOptionViewItem& option, const QModelIndex& index,
               const Look& look) {
  const RowNote note = modelOf(index).noteOf(index.row());
  if (note.kind == RowNote::Kind::none)
    return;
  const QRectF box = noteBox(option, index, note);
  QFont font = option.font;
  font.setBold(false);
  painter.setFont(font);
  const bool wrong = note.kind == RowNote::Kind::wrong;
  painter.setRenderHint(QPainter::Antialiasing);
  if (note.kind == RowNote::Kind::choice) {
    painter.setPen(QPen(look.colour(Role::focus), 1));
    painter.setBrush(look.colour(Role::canvas));
    painter.drawRoundedRect(box.adjusted(0.5, 0.5, -0.5, -0.5), 8, 8);
  }
  if (wrong) {
    painter.setPen(Qt::NoPen);
    painter.setBrush(look.colour(Role::wrongGround));
    painter.drawRoundedRect(box, 3, 3);
  }
  painter.setPen(look.colour(wrong ? Role::wrong : Role::ink));
  const QRectF text = box.adjusted(notePadding, 0, -notePadding, 0);
  const Runs words = runs(note.words, translation());
  if (runsWidth(words, font) <= text.width() + 1)
    drawRuns(painter, text, words, Qt::AlignLeft);
  else
    painter.drawText(text, Qt::AlignLeft | Qt::AlignVCenter,
                     QFontMetricsF(font).elidedText(shown(note.words), Qt::ElideRight, text.width() + 1));
}

/// Editable cells carry a thin line under their text.
void paintUnderline(QPainter& painter, const QRectF& box, qreal width, bool right, const Look& look) {
  const qreal y = box.bottom() - 2.5;
  const qreal start = right ? box.right() - width : box.left();
  painter.setRenderHint(QPainter::Antialiasing, false);
  painter.setPen(QPen(look.colour(Role::other), 1));
  painter.drawLine(QPointF(start, y), QPointF(start + width, y));
}

} // namespace

QRectF PlaneDelegate::textBox(const QRect& cell, int column) {
  return QRectF(cell).adjusted(column == 0 ? markRoom : sidePadding, 0, -sidePadding, 0);
}

int PlaneDelegate::cellWidth(const QFont& font, const QModelIndex& index) {
  QFont bold = font;
  bold.setBold(true);
  const int padding = index.column() == 0 ? markRoom + sidePadding : 2 * sidePadding;
  return qCeil(runsWidth(wordsAt(index), bold)) + padding;
}

int PlaneDelegate::rowHeight(const QFont& font) {
  return QFontMetrics(font).height() + 7;
}

void PlaneDelegate::paint(QPainter* painter, const QStyleOptionViewItem& option,
                          const QModelIndex& index) const {
  const Look look = lookOf(*option.widget);
  painter->save();
  paintGround(*painter, option, index, look);
  const Row* row = rowAt(index);
  if (row && index.column() == 0 && modelOf(index).tintIsBold())
    paintMark(*painter, option.rect, row->kind, look);
  const QRectF box = textBox(option.rect, index.column());
  const bool right = index.column() > 0;
  const Runs words = wordsAt(index);
  painter->setFont(fontFor(option.font, index));
  painter->setPen(look.colour(row ? Role::ink : Role::soft));
  drawRuns(*painter, box, words, right ? Qt::AlignRight : Qt::AlignLeft);
  if (!words.empty() && index.flags() & Qt::ItemIsEditable)
    paintUnderline(*painter, box, runsWidth(words, painter->font()), right, look);
  if (index.column() == 0)
    paintNote(*painter, option, index, look);
  if (option.state & QStyle::State_HasFocus) {
    painter->setRenderHint(QPainter::Antialiasing);
    painter->setBrush(Qt::NoBrush);
    painter->setPen(QPen(look.colour(Role::focus), 2));
    painter->drawRoundedRect(QRectF(option.rect).adjusted(1, 1, -1, -1), 2, 2);
  }
  painter->restore();
}

QWidget* PlaneDelegate::createEditor(QWidget* parent, const QStyleOptionViewItem&,
                                     const QModelIndex& index) const {
  auto* editor = new DraftEdit(parent);
  editor->setTextMargins(4, 0, 4, 0);
  editor->setAlignment(index.column() > 0 ? Qt::AlignRight : Qt::AlignLeft);
  const QString heading = index.model()->headerData(index.column(), Qt::Horizontal).toString();
  editor->setAccessibleName(heading + QStringLiteral(", ") + index.siblingAtColumn(0).data().toString());
  connect(editor, &QLineEdit::textEdited, editor, [editor] { editor->setWrong(false); });
  return editor;
}

// Called at each change of the table too: what is being typed stays.
void PlaneDelegate::setEditorData(QWidget* editor, const QModelIndex& index) const {
  auto* edit = static_cast<DraftEdit*>(editor);
  if (!edit->isModified())
    edit->setText(index.data(Qt::EditRole).toString());
}

// A text that was not touched is no entry.
void PlaneDelegate::setModelData(QWidget* editor, QAbstractItemModel* model, const QModelIndex& index) const {
  auto* edit = static_cast<DraftEdit*>(editor);
  if (!edit->isModified())
    return;
  const std::optional<Problem> problem = static_cast<TableModel*>(model)->enter(index, edit->text());
  edit->setWrong(problem.has_value());
  edit->setModified(edit->isWrong());
  if (problem)
    edit->selectPiece(problem->quoted, problem->column);
}

void PlaneDelegate::updateEditorGeometry(QWidget* editor, const QStyleOptionViewItem& option,
                                         const QModelIndex& index) const {
  QRect place = option.rect;
  const int widen = qMax(0, leastEditor - place.width());
  if (index.column() > 0)
    place.setLeft(place.left() - widen);
  else
    place.setLeft(place.left() + markRoom - 4);
  editor->setGeometry(place);
}

// Enter and Tab leave the editor open on an entry that is not taken.
bool PlaneDelegate::eventFilter(QObject* object, QEvent* event) {
  auto* editor = qobject_cast<DraftEdit*>(object);
  if (!editor || event->type() != QEvent::KeyPress)
    return QStyledItemDelegate::eventFilter(object, event);
  const int key = static_cast<QKeyEvent*>(event)->key();
  if (key != Qt::Key_Return && key != Qt::Key_Enter && key != Qt::Key_Tab && key != Qt::Key_Backtab)
    return QStyledItemDelegate::eventFilter(object, event);
  Q_EMIT commitData(editor);
  if (!editor->isWrong())
    Q_EMIT closeEditor(editor, NoHint);
  return true;
}

bool PlaneDelegate::editorEvent(QEvent* event, QAbstractItemModel*, const QStyleOptionViewItem& option,
                                const QModelIndex& index) {
  if (event->type() != QEvent::MouseButtonRelease || index.column() != 0)
    return false;
  const RowNote note = modelOf(index).noteOf(index.row());
  const auto* mouse = static_cast<QMouseEvent*>(event);
  if (note.kind != RowNote::Kind::choice || !noteBox(option, index, note).contains(mouse->position()))
    return false;
  Q_EMIT noteClicked(index);
  return true;
}

} // namespace planewright
