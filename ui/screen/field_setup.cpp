// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/field_setup.h"

#include "core/quantity/format.h"
#include "core/record/heading.h"
#include "core/screen/table_row.h"
#include "core/words/utf8.h"
#include "ui/files/file_bytes.h"
#include "ui/look/dialog_parts.h"
#include "ui/look/look.h"
#include "ui/look/meaning_header.h"

#include <QCheckBox>
#include <QComboBox>
#include <QDir>
#include <QFileInfo>
#include <QFormLayout>
#include <QHBoxLayout>
#include <QLabel>
#include <QLineEdit>
#include <QPlainTextEdit>
#include <QProgressBar>
#include <QPushButton>
#include <QStandardItemModel>
#include <QTableView>
#include <QVBoxLayout>

namespace planewright {

namespace {

constexpr std::size_t startSize = 64 << 10; // bytes of a table that are looked at
constexpr int shownRows = 6;
constexpr int permille = 1000;

std::string_view takeLine(std::string_view& rest) {
  std::string_view line = rest.substr(0, rest.find('\n'));
  rest.remove_prefix(std::min(rest.size(), line.size() + 1));
  if (line.ends_with('\r'))
    line.remove_suffix(1);
  return line;
}

} // namespace

FieldSetup::FieldSetup(Desk& desk, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_path(new QLineEdit(this)),
      m_choose(new QPushButton(tr("&Choose…"), this)), m_rows(new QStandardItemModel(this)),
      m_meanings(new MeaningHeader(ColumnMeanings::meaningsFor(desk.study()), this)),
      m_preview(new QTableView(this)), m_judging(new QComboBox(this)), m_except(new QLineEdit(this)),
      m_leavesOut(new QCheckBox(tr("Leave &faulty rows out"), this)), m_sentence(new QLabel(this)),
      m_complaints(new QPlainTextEdit(this)), m_progress(new QProgressBar(this)),
      m_start(new QPushButton(tr("&Screen"), this)), m_cancel(new QPushButton(tr("Cancel"), this)) {
  setProperty("helpPlace", "screening#table");
  build();
  connect(m_choose, &QPushButton::clicked, this, &FieldSetup::tableWanted);
  connect(m_path, &QLineEdit::editingFinished, this, [this] {
    if (path() != m_read)
      readStart();
  });
  connect(m_start, &QPushButton::clicked, this, &FieldSetup::started);
  connect(m_cancel, &QPushButton::clicked, this, &FieldSetup::cancelled);
  connect(m_meanings, &MeaningHeader::meaningChosen, this, [this](int column) {
    m_choices.choose(static_cast<std::size_t>(column), m_meanings->meaning(column).currentIndex());
    showColumns();
  });
  connect(m_meanings, &MeaningHeader::meaningEntered, this,
          [this](int column) { m_preview->scrollTo(m_rows->index(0, column)); });
  connect(&m_desk, &Desk::changed, this, [this] {
    if (isVisible())
      listPoints();
  });
  listPoints();
  settle({});
}

QFormLayout* FieldSetup::entries() {
  m_except->setPlaceholderText(tr("names of points or regions, commas between: corner*, support"));
  m_except->setAccessibleName(tr("Points and regions to leave out"));
  m_judging->setAccessibleName(tr("Point whose checks judge"));
  m_judging->setSizeAdjustPolicy(QComboBox::AdjustToMinimumContentsLengthWithIcon);
  m_judging->setMinimumContentsLength(16);
  m_leavesOut->setToolTip(tr("Without it a faulty row ends the run; they are counted either way."));
  auto* form = new QFormLayout;
  form->addRow(tr("Judged by the checks of"), m_judging);
  form->addRow(tr("Left out"), m_except);
  form->addRow(QString(), m_leavesOut);
  return form;
}

void FieldSetup::build() {
  constexpr int heightOfList = 132; // pixels
  m_path->setAccessibleName(tr("File of the table"));
  m_path->setPlaceholderText(tr("a table as CSV: point,case,sx,sy,txy or three columns for each case"));
  auto* file = new QHBoxLayout;
  file->addWidget(m_path, 1);
  file->addWidget(m_choose);
  m_preview->setModel(m_rows);
  m_preview->setHorizontalHeader(m_meanings);
  m_preview->setAccessibleName(tr("start of the table"));
  m_preview->setEditTriggers(QAbstractItemView::NoEditTriggers);
  m_preview->setTabKeyNavigation(false);
  m_preview->setWordWrap(false);
  m_preview->verticalHeader()->hide();
  m_sentence->setWordWrap(true);
  m_sentence->setTextFormat(Qt::PlainText);
  m_complaints->setReadOnly(true);
  m_complaints->setAccessibleName(tr("What is wrong with the table"));
  m_complaints->setFixedHeight(heightOfList);
  m_complaints->setLineWrapMode(QPlainTextEdit::NoWrap);
  m_progress->setRange(0, permille);
  m_progress->setTextVisible(false);
  m_choose->setAutoDefault(false);
  m_cancel->setAutoDefault(false);
  m_start->setDefault(true);
  auto* buttons = new QHBoxLayout;
  buttons->addWidget(m_progress, 1);
  buttons->addStretch();
  buttons->addWidget(m_start);
  buttons->addWidget(m_cancel);
  auto* rows = new QVBoxLayout(this);
  rows->addLayout(file);
  rows->addWidget(m_preview, 1);
  rows->addLayout(entries());
  rows->addWidget(m_sentence);
  rows->addWidget(m_complaints);
  rows->addLayout(buttons);
  m_settled << m_path << m_choose << m_preview << m_judging << m_except << m_leavesOut << m_start;
}

QComboBox& FieldSetup::meaning(int column) const {
  return m_meanings->meaning(column);
}

QString FieldSetup::path() const {
  return QDir::fromNativeSeparators(m_path->text().trimmed());
}

QString FieldSetup::complaints() const {
  return m_complaints->toPlainText();
}

void FieldSetup::setTable(const QString& path) {
  m_path->setText(QDir::toNativeSeparators(path));
  readStart();
}

void FieldSetup::showEvent(QShowEvent* event) {
  QWidget::showEvent(event);
  listPoints();
}

void FieldSetup::listPoints() {
  const QString before = m_judging->currentText();
  m_judging->clear();
  for (const Point& point : m_desk.study().points)
    m_judging->addItem(fromUtf8(point.name));
  const QString wanted = m_judging->findText(before) >= 0 ? before : fromUtf8(m_desk.readout().point);
  m_judging->setCurrentIndex(m_judging->findText(wanted));
  showColumns();
}

/// The header and a few rows; what is wrong with the rest is seen when it is read.
void FieldSetup::readStart() {
  m_read = path();
  m_rows->clear();
  m_header.clear();
  m_choices.setHeader({}, 0);
  list({});
  m_start->setEnabled(false);
  if (path().isEmpty())
    return;
  if (!QFileInfo(path()).isFile())
    return list({{path().toStdString(), 0, 0, "", PW_TEXT("Screen", "There is no such file."),
                  PW_TEXT("Screen", "Choose a table as CSV.")}});
  const Result<std::string> bytes = bytesOf(path().toStdString(), startSize);
  if (!bytes)
    return list({bytes.error()});
  std::string_view rest = *bytes;
  constexpr std::string_view byteOrderMark = "\xEF\xBB\xBF";
  if (rest.starts_with(byteOrderMark))
    rest.remove_prefix(byteOrderMark.size());
  while (!rest.empty() && m_header.find_first_not_of(" \t,;") == std::string::npos)
    m_header = std::string(takeLine(rest));
  const char separator = separatorOf(m_header);
  std::vector<std::string> cells;
  if (!isUtf8(m_header) || !cutRow(m_header, separator, cells))
    return list({{path().toStdString(), 0, 0, "", PW_TEXT("Screen", "This is no table in UTF-8."),
                  PW_TEXT("Screen", "Export it as CSV in UTF-8.")}});
  QStringList headings;
  for (const std::string& cell : cells)
    headings << fromUtf8(cell);
  m_rows->setHorizontalHeaderLabels(headings);
  // The last line may be cut.
  for (int row = 0; row < shownRows && rest.find('\n') != std::string_view::npos; ++row) {
    cells.clear();
    cutRow(takeLine(rest), separator, cells);
    QList<QStandardItem*> items;
    for (const std::string& cell : cells)
      items << new QStandardItem(fromUtf8(cell));
    m_rows->appendRow(items);
  }
  m_choices.setHeader(m_header, static_cast<std::size_t>(headings.size()));
  showColumns();
  m_preview->resizeColumnsToContents();
}

/// What the columns mean to the study as it is, and what stands against that.
void FieldSetup::showColumns() {
  if (m_header.empty() || m_isRunning)
    return;
  const Study& study = m_desk.study();
  m_meanings->setMeanings(ColumnMeanings::meaningsFor(study));
  m_meanings->show(m_choices.meanings(study));
  QWidget* before = m_choose;
  for (int i = 0; i < m_meanings->meanings(); ++i) {
    setTabOrder(before, &m_meanings->meaning(i));
    before = &m_meanings->meaning(i);
  }
  setTabOrder(before, m_preview);
  const Results<FieldColumns> columns = fieldColumnsOf(study, m_header, m_choices.mapped(study));
  list(columns ? Problems() : columns.error());
  m_start->setEnabled(columns.has_value());
}

FieldOrder FieldSetup::order() const {
  FieldOrder order{path().toStdString(),
                   m_judging->currentText().toStdString(),
                   m_choices.mapped(m_desk.study()),
                   {},
                   m_leavesOut->isChecked()};
  for (const QString& name : m_except->text().split(QLatin1Char(','), Qt::SkipEmptyParts))
    if (const QString one = name.trimmed(); !one.isEmpty())
      order.except.push_back(one.toStdString());
  return order;
}

void FieldSetup::showProgress(const FieldProgress& progress) {
  m_isRunning = true;
  for (QWidget* widget : m_settled)
    widget->setEnabled(false);
  m_progress->show();
  m_cancel->show();
  m_complaints->hide();
  const std::size_t done = progress.done, all = progress.all;
  m_progress->setValue(
      all > 0 ? static_cast<int>(permille * static_cast<double>(done) / static_cast<double>(all)) : 0);
  tell(*m_sentence, progress.isJudging ? tr("Judging the points …") : tr("Reading the table …"), false);
}

void FieldSetup::settle(const Problems& problems) {
  m_isRunning = false;
  for (QWidget* widget : m_settled)
    widget->setEnabled(true);
  m_progress->hide();
  m_cancel->hide();
  showColumns();
  m_start->setEnabled(!m_header.empty() && complaints().isEmpty());
  if (!problems.empty())
    list(problems);
}

void FieldSetup::list(const Problems& problems) {
  QStringList lines;
  for (const Problem& problem : problems)
    lines << shown(problem);
  m_complaints->setPlainText(lines.join(QLatin1Char('\n')));
  m_complaints->setVisible(!lines.isEmpty());
  tell(*m_sentence, lines.isEmpty() ? QString() : tr("Nothing is screened while something is wrong:"),
       !lines.isEmpty());
}

} // namespace planewright
