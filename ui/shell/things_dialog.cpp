// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/things_dialog.h"

#include "ui/entry/complaint.h"
#include "ui/look/look.h"
#include "ui/shell/things_model.h"

#include <QClipboard>
#include <QComboBox>
#include <QDialogButtonBox>
#include <QGuiApplication>
#include <QHeaderView>
#include <QLabel>
#include <QPushButton>
#include <QStyledItemDelegate>
#include <QTableView>
#include <QVBoxLayout>

namespace planewright {

namespace {

/// Offers the choices of a column in a list, and a plain field where there are none.
class ThingDelegate : public QStyledItemDelegate {
public:
  ThingDelegate(const ThingsModel& model, QObject* parent) : QStyledItemDelegate(parent), m_model(model) {}

  QWidget* createEditor(QWidget* parent, const QStyleOptionViewItem& option,
                        const QModelIndex& index) const override {
    const QStringList& choices = m_model.things().columns[static_cast<std::size_t>(index.column())].choices;
    if (choices.isEmpty())
      return QStyledItemDelegate::createEditor(parent, option, index);
    auto* list = new QComboBox(parent);
    list->addItems(choices);
    connect(list, &QComboBox::activated, list, [this, list] {
      auto* self = const_cast<ThingDelegate*>(this);
      Q_EMIT self->commitData(list);
      Q_EMIT self->closeEditor(list);
    });
    return list;
  }

  void setEditorData(QWidget* editor, const QModelIndex& index) const override {
    if (auto* list = qobject_cast<QComboBox*>(editor))
      list->setCurrentText(index.data(Qt::EditRole).toString());
    else
      QStyledItemDelegate::setEditorData(editor, index);
  }

  void setModelData(QWidget* editor, QAbstractItemModel* model, const QModelIndex& index) const override {
    if (auto* list = qobject_cast<QComboBox*>(editor))
      model->setData(index, list->currentText(), Qt::EditRole);
    else
      QStyledItemDelegate::setModelData(editor, model, index);
  }

private:
  const ThingsModel& m_model;
};

} // namespace

ThingsDialog::ThingsDialog(Desk& desk, Things things, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_model(new ThingsModel(desk, std::move(things), this)),
      m_table(new QTableView(this)), m_complaint(new Complaint(this)), m_caution(new QLabel(this)),
      m_buttons(new QDialogButtonBox(QDialogButtonBox::Close, this)) {
  build();
  connect(m_model, &ThingsModel::refused, this, &ThingsDialog::complain);
  connect(m_model, &ThingsModel::taken, m_complaint, &QWidget::hide);
  connect(m_table->selectionModel(), &QItemSelectionModel::currentChanged, this, &ThingsDialog::offer);
  connect(m_table->selectionModel(), &QItemSelectionModel::currentChanged, this, &ThingsDialog::moveOn);
  connect(&m_desk, &Desk::changed, this, &ThingsDialog::offer);
  select(0);
  offer();
}

void ThingsDialog::build() {
  const Things& things = m_model->things();
  setWindowTitle(things.title);
  setProperty("helpPlace", things.helpPlace);
  resize(680, 360);
  m_table->setModel(m_model);
  m_table->setItemDelegate(new ThingDelegate(*m_model, m_table));
  m_table->setAccessibleName(things.title);
  m_table->setTabKeyNavigation(false);
  m_table->setSelectionBehavior(QAbstractItemView::SelectRows);
  m_table->setSelectionMode(QAbstractItemView::SingleSelection);
  m_table->verticalHeader()->hide();
  m_table->horizontalHeader()->setSectionResizeMode(QHeaderView::Stretch);
  m_table->horizontalHeader()->setDefaultAlignment(Qt::AlignLeft | Qt::AlignVCenter);
  m_complaint->hide();
  m_caution->setWordWrap(true);
  m_caution->setTextFormat(Qt::PlainText);
  connect(addButton(tr("&Add")), &QPushButton::clicked, this, &ThingsDialog::add);
  if (things.copy) {
    m_copy = addButton(tr("&Duplicate"));
    connect(m_copy, &QPushButton::clicked, this, &ThingsDialog::copy);
  }
  if (things.paste) {
    QPushButton* paste = addButton(tr("&Paste"));
    paste->setToolTip(tr("Adds what is on the clipboard, one a line: 1.35 G + 1.5 S"));
    connect(paste, &QPushButton::clicked, this, &ThingsDialog::paste);
  }
  m_remove = addButton(tr("&Remove"));
  connect(m_remove, &QPushButton::clicked, this, &ThingsDialog::remove);
  m_up = addButton(tr("&Up"));
  connect(m_up, &QPushButton::clicked, this, &ThingsDialog::moveUp);
  m_down = addButton(tr("Do&wn"));
  connect(m_down, &QPushButton::clicked, this, &ThingsDialog::moveDown);
  m_buttons->button(QDialogButtonBox::Close)->setAutoDefault(false);
  connect(m_buttons, &QDialogButtonBox::rejected, this, &QDialog::close);
  auto* rows = new QVBoxLayout(this);
  rows->addWidget(m_table, 1);
  rows->addWidget(m_complaint);
  rows->addWidget(m_caution);
  rows->addWidget(m_buttons);
}

QPushButton* ThingsDialog::addButton(const QString& words) {
  QPushButton* button = m_buttons->addButton(words, QDialogButtonBox::ActionRole);
  button->setAutoDefault(false);
  return button;
}

QString ThingsDialog::complaint() const {
  return m_complaint->isHidden() ? QString() : m_complaint->words();
}

int ThingsDialog::row() const {
  return m_table->currentIndex().row();
}

bool ThingsDialog::hasRow() const {
  return row() >= 0 && row() < m_model->rowCount();
}

void ThingsDialog::select(int row) {
  if (row >= 0 && row < m_model->rowCount())
    m_table->setCurrentIndex(m_model->index(row, 0));
}

void ThingsDialog::showEvent(QShowEvent* event) {
  QDialog::showEvent(event);
  m_table->setFocus(Qt::OtherFocusReason);
}

// What was refused when an editor closed is told while the keys go to another row: it stays for that.
void ThingsDialog::moveOn() {
  if (!m_isNewComplaint)
    m_complaint->hide();
}

void ThingsDialog::complain(const Problem& problem) {
  m_isNewComplaint = true;
  QMetaObject::invokeMethod(
      this, [this] { m_isNewComplaint = false; }, Qt::QueuedConnection);
  const QString where = problem.line > 0 ? tr("Line %1: ").arg(problem.line) : QString();
  m_complaint->say(where + shown(problem.what), shown(problem.mend));
  m_complaint->show();
}

// The first few; hundreds of rows may be wrong in the same way. Asked while rows go, the table still has what
// the study has not.
QString ThingsDialog::cautions() const {
  const Things& things = m_model->things();
  constexpr int most = 3;
  QStringList sentences;
  int count = 0;
  for (std::size_t i = 0; things.caution && i < things.count(m_desk.study()); ++i) {
    const QString one = things.caution(m_desk.study(), i);
    if (one.isEmpty())
      continue;
    if (count++ < most)
      sentences << one;
  }
  if (count > most)
    sentences << tr("So do %1 more.").arg(count - most);
  return sentences.join(QLatin1Char('\n'));
}

void ThingsDialog::offer() {
  const bool some = hasRow();
  if (m_copy)
    m_copy->setEnabled(some);
  m_remove->setEnabled(some);
  m_up->setEnabled(some && row() > 0);
  m_down->setEnabled(some && row() + 1 < m_model->rowCount());
  m_caution->setText(cautions());
  m_caution->setVisible(!m_caution->text().isEmpty());
}

void ThingsDialog::add() {
  if (m_model->ask(m_model->things().add(m_desk.study()), tr("new %1").arg(m_model->things().one)))
    select(m_model->rowCount() - 1);
}

void ThingsDialog::copy() {
  if (!hasRow())
    return;
  const int from = row();
  const Edits edits = m_model->things().copy(m_desk.study(), static_cast<std::size_t>(from));
  if (m_model->ask(edits, tr("copy of a %1").arg(m_model->things().one)))
    select(from + 1);
}

void ThingsDialog::paste() {
  const std::string text = QGuiApplication::clipboard()->text().toStdString();
  const Result<Edits> edits = m_model->things().paste(m_desk.study(), text);
  if (!edits)
    return complain(edits.error());
  if (m_model->ask(*edits, tr("pasted list")))
    select(m_model->rowCount() - 1);
}

void ThingsDialog::remove() {
  if (!hasRow())
    return;
  const int from = row();
  const Things& things = m_model->things();
  const auto index = static_cast<std::size_t>(from);
  const Result<Edits> edits = things.remove ? things.remove(m_desk.study(), index)
                                            : Edits{Remove{things.place(m_desk.study(), index)}};
  if (!edits)
    return complain(edits.error());
  if (m_model->ask(*edits, tr("removal of a %1").arg(things.one)))
    select(qMin(from, m_model->rowCount() - 1));
}

void ThingsDialog::move(int by) {
  if (!hasRow())
    return;
  const int from = row();
  const Place place = m_model->things().place(m_desk.study(), static_cast<std::size_t>(from));
  if (m_model->ask({Move{place, static_cast<std::size_t>(from + by)}},
                   tr("order of the list of each %1").arg(m_model->things().one)))
    select(from + by);
}

} // namespace planewright
