// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/paste_dialog.h"

#include "core/record/pasted_points.h"
#include "ui/entry/complaint.h"
#include "ui/look/look.h"
#include "ui/look/meaning_header.h"
#include "ui/shell/paste_model.h"

#include <QCheckBox>
#include <QComboBox>
#include <QDialogButtonBox>
#include <QHBoxLayout>
#include <QLabel>
#include <QPushButton>
#include <QShortcut>
#include <QStyledItemDelegate>
#include <QTableView>
#include <QVBoxLayout>

#include <algorithm>

namespace planewright {

namespace {

/// The first few names, and how many more there are.
QString listed(const std::vector<std::string>& names) {
  constexpr std::size_t most = 12;
  QStringList words;
  for (std::size_t i = 0; i < std::min(names.size(), most); ++i)
    words << fromUtf8(names[i]);
  if (names.size() > most)
    words << PasteDialog::tr("%1 more").arg(names.size() - most);
  return words.join(QStringLiteral(", "));
}

bool hasPoints(const PastedPoints& pasted) {
  return std::ranges::count(pasted.columns, ColumnKind::point, &PastedColumn::kind) > 0;
}

QStringList whatIsAdded(const Study& study, const PastedPoints& pasted) {
  QStringList lines;
  if (!pasted.isSound())
    return {PasteDialog::tr("Nothing is taken while something is wrong.")};
  if (!hasPoints(pasted))
    lines << PasteDialog::tr("The table has no column of points: its rows go to %1, which is shown.")
                 .arg(fromUtf8(shownPoint(study).name));
  if (!pasted.newPoints.empty())
    lines << PasteDialog::tr("Points that are added: %1.").arg(listed(pasted.newPoints));
  if (!pasted.newCases.empty())
    lines << PasteDialog::tr("Load cases that are added, as variable: %1.").arg(listed(pasted.newCases));
  if (!pasted.newMeasured.empty())
    lines << PasteDialog::tr("Load cases that are added, as measured: %1.").arg(listed(pasted.newMeasured));
  if (pasted.replaced > 0)
    lines << PasteDialog::tr("Texts of the study that are replaced: %1.").arg(pasted.replaced);
  if (pasted.edits.empty())
    lines << PasteDialog::tr("The study has all of this already.");
  return lines;
}

/// Leaves the mark of a wrong cell in the selected row as well.
class CellDelegate : public QStyledItemDelegate {
public:
  using QStyledItemDelegate::QStyledItemDelegate;

protected:
  void initStyleOption(QStyleOptionViewItem* option, const QModelIndex& index) const override {
    QStyledItemDelegate::initStyleOption(option, index);
    if (index.data(Qt::BackgroundRole).isValid())
      option->state.setFlag(QStyle::State_Selected, false);
  }
};

QStringList meaningsOfColumns() {
  QStringList words = {PasteDialog::tr("choose…")};
  for (const Named<ColumnKind>& row : namesOf<ColumnKind>())
    words << shown(row.label);
  return words;
}

std::vector<int> chosenIn(const std::vector<PastedColumn>& columns) {
  std::vector<int> chosen;
  chosen.reserve(columns.size());
  for (const PastedColumn& column : columns)
    chosen.push_back(column.kind ? 1 + static_cast<int>(*column.kind) : 0);
  return chosen;
}

std::vector<std::optional<ColumnKind>> kindsIn(const std::vector<int>& chosen) {
  std::vector<std::optional<ColumnKind>> kinds;
  kinds.reserve(chosen.size());
  for (const int one : chosen)
    kinds.push_back(one > 0 ? std::optional(static_cast<ColumnKind>(one - 1)) : std::nullopt);
  return kinds;
}

void makeNote(QLabel& label, const QString& name) {
  label.setWordWrap(true);
  label.setTextFormat(Qt::PlainText);
  label.setAccessibleName(name);
}

} // namespace

PasteDialog::PasteDialog(Desk& desk, std::string table, const QString& title, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_text(std::move(table)), m_model(new PasteModel(*this)),
      m_meanings(new MeaningHeader(meaningsOfColumns(), this)), m_table(new QTableView(this)),
      m_header(new QCheckBox(tr("The first row has &headings"), this)), m_count(new QLabel(this)),
      m_complaint(new Complaint(this)), m_additions(new QLabel(this)), m_cautions(new QLabel(this)),
      m_next(new QPushButton(tr("&Next wrong row"), this)), m_take(new QPushButton(tr("&Take"), this)) {
  setWindowTitle(title);
  setProperty("helpPlace", "files#tables");
  build();
  connectParts();
  preview();
}

void PasteDialog::build() {
  resize(900, 560);
  setAttribute(Qt::WA_DeleteOnClose);
  m_table->setModel(m_model);
  m_table->setHorizontalHeader(m_meanings);
  m_table->setItemDelegate(new CellDelegate(m_table));
  m_table->setAccessibleName(tr("rows of the table"));
  m_table->setTabKeyNavigation(false);
  m_table->setWordWrap(false);
  m_table->setSelectionBehavior(QAbstractItemView::SelectRows);
  m_table->setSelectionMode(QAbstractItemView::SingleSelection);
  makeNote(*m_additions, tr("what is added"));
  makeNote(*m_cautions, tr("cautions"));
  m_cautions->setForegroundRole(QPalette::PlaceholderText);
  new QShortcut(Qt::Key_F8, this, this, &PasteDialog::nextWrongRow);
  m_next->setToolTip(tr("F8"));
  m_next->setAutoDefault(false);
  m_take->setDefault(true);
  auto* head = new QHBoxLayout;
  head->addWidget(m_header);
  head->addStretch(1);
  head->addWidget(m_count);
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Cancel, this);
  buttons->addButton(m_next, QDialogButtonBox::ActionRole);
  buttons->addButton(m_take, QDialogButtonBox::AcceptRole);
  buttons->button(QDialogButtonBox::Cancel)->setAutoDefault(false);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::close);
  connect(buttons, &QDialogButtonBox::accepted, this, &PasteDialog::take);
  auto* rows = new QVBoxLayout(this);
  rows->addLayout(head);
  rows->addWidget(m_table, 1);
  rows->addWidget(m_complaint);
  rows->addWidget(m_additions);
  rows->addWidget(m_cautions);
  rows->addWidget(buttons);
}

void PasteDialog::connectParts() {
  connect(m_header, &QCheckBox::clicked, this, [this](bool on) {
    m_choices = {{}, on};
    preview();
  });
  connect(m_meanings, &MeaningHeader::meaningChosen, this, [this] {
    m_choices.kinds = kindsIn(m_meanings->chosen());
    preview();
  });
  connect(m_meanings, &MeaningHeader::meaningEntered, this, [this](int column) {
    const int row = std::max(0, m_table->currentIndex().row());
    m_table->scrollTo(m_model->index(row, column));
  });
  connect(m_next, &QPushButton::clicked, this, &PasteDialog::nextWrongRow);
  connect(m_table->selectionModel(), &QItemSelectionModel::currentChanged, this,
          &PasteDialog::tellCurrentRow);
  connect(&m_desk, &Desk::changed, this, &PasteDialog::preview);
}

QComboBox& PasteDialog::meaning(int column) const {
  return m_meanings->meaning(column);
}

QString PasteDialog::additions() const {
  return m_additions->text();
}

QString PasteDialog::cautions() const {
  return m_cautions->text();
}

QString PasteDialog::complaint() const {
  return m_complaint->isHidden() ? QString() : m_complaint->words();
}

void PasteDialog::preview() {
  m_model->put(pastedPoints(m_desk.study(), m_text, m_choices));
  const PastedPoints& pasted = m_model->pasted();
  m_meanings->show(chosenIn(pasted.columns));
  QWidget* before = m_header;
  for (int i = 0; i < m_meanings->meanings(); ++i) {
    setTabOrder(before, &m_meanings->meaning(i));
    before = &m_meanings->meaning(i);
  }
  setTabOrder(before, m_table);
  tell(pasted);
  fitColumns();
  if (!pasted.problems.empty() && m_model->rowCount() > 0)
    m_table->setCurrentIndex(m_model->index(0, std::max(0, pasted.problems.front().column - 1)));
  else if (m_model->nextWrongRow(0) >= 0)
    goToWrongRow(m_model->nextWrongRow(0));
  else
    m_table->setCurrentIndex(m_model->index(0, 0));
  tellCurrentRow();
}

/// Long texts are cut, so that the other columns stay in sight.
void PasteDialog::fitColumns() {
  constexpr int widest = 320;
  m_table->resizeColumnsToContents();
  for (int i = 0; i < m_model->columnCount(); ++i)
    if (m_table->columnWidth(i) > widest)
      m_table->setColumnWidth(i, widest);
}

void PasteDialog::tell(const PastedPoints& pasted) {
  const auto wrong =
      std::ranges::count_if(pasted.rows, [](const PastedRow& row) { return !row.problems.empty(); });
  m_count->setText(wrong == 0 ? tr("rows: %1").arg(pasted.rows.size())
                              : tr("rows: %1, wrong ones: %2").arg(pasted.rows.size()).arg(wrong));
  m_header->setChecked(pasted.hasHeader);
  m_header->setEnabled(!pasted.columns.empty());
  m_next->setEnabled(wrong > 0);
  const int ofWords = static_cast<int>(pasted.columns.size());
  m_table->setColumnHidden(ofWords, wrong == 0);
  // First, so that it is seen in the widest table.
  if (wrong > 0)
    m_meanings->moveSection(m_meanings->visualIndex(ofWords), 0);
  m_additions->setText(whatIsAdded(m_desk.study(), pasted).join(QLatin1Char('\n')));
  QStringList cautions;
  for (const Text& caution : pasted.cautions)
    cautions << shown(caution);
  m_cautions->setText(cautions.join(QLatin1Char('\n')));
  m_cautions->setVisible(!cautions.isEmpty());
  m_take->setEnabled(pasted.isSound() && !pasted.edits.empty());
}

void PasteDialog::tellCurrentRow() {
  const PastedPoints& pasted = m_model->pasted();
  const int row = m_table->currentIndex().row();
  const bool some = row >= 0 && row < m_model->rowCount();
  const Problems& problems =
      some && pasted.problems.empty() ? pasted.rows[static_cast<std::size_t>(row)].problems : pasted.problems;
  complain(problems.empty() ? nullptr : &problems.front());
}

void PasteDialog::complain(const Problem* problem) {
  m_complaint->setVisible(problem);
  if (!problem)
    return;
  const QString where = problem->column > 0
                            ? tr("Line %1, column %2: ").arg(problem->line).arg(problem->column)
                        : problem->line > 0 ? tr("Line %1: ").arg(problem->line)
                                            : QString();
  m_complaint->say(where + shown(problem->what), shown(problem->mend));
}

void PasteDialog::nextWrongRow() {
  const int row = m_model->nextWrongRow(m_table->currentIndex().row() + 1);
  if (row < 0)
    return;
  goToWrongRow(row);
  m_table->setFocus();
}

void PasteDialog::goToWrongRow(int row) {
  const Problem& problem = m_model->pasted().rows[static_cast<std::size_t>(row)].problems.front();
  m_table->setCurrentIndex(m_model->index(row, std::max(0, problem.column - 1)));
}

void PasteDialog::take() {
  const PastedPoints& pasted = m_model->pasted();
  if (!pasted.isSound())
    return;
  // The dialog follows the study, so its own change must not be read as a table once more.
  disconnect(&m_desk, &Desk::changed, this, nullptr);
  if (const auto problem = m_desk.request(pasted.edits, m_desk.newCommand(), tr("pasted table"))) {
    connect(&m_desk, &Desk::changed, this, &PasteDialog::preview);
    return complain(&*problem);
  }
  accept();
}

} // namespace planewright
