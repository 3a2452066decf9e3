// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/field_page.h"

#include "core/quantity/format.h"
#include "core/screen/field_csv.h"
#include "core/screen/opened_point.h"
#include "core/screen/plain_number.h"
#include "ui/files/field_file.h"
#include "ui/look/dialog_parts.h"
#include "ui/look/look.h"
#include "ui/look/strip.h"
#include "ui/screen/field_map_view.h"
#include "ui/screen/histogram_view.h"
#include "ui/screen/map_legend.h"

#include <QCheckBox>
#include <QComboBox>
#include <QFileInfo>
#include <QHBoxLayout>
#include <QHeaderView>
#include <QKeyEvent>
#include <QLabel>
#include <QLineEdit>
#include <QPlainTextEdit>
#include <QPushButton>
#include <QSplitter>
#include <QTabBar>
#include <QTabWidget>
#include <QTableView>
#include <QVBoxLayout>

namespace planewright {

FieldPage::FieldPage(Desk& desk, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_strip(new Strip(this)), m_heading(new QLabel(this)),
      m_text(new QLineEdit(this)), m_from(new QLineEdit(this)),
      m_exceeds(new QCheckBox(tr("e&xceeding only"), this)), m_combination(new QComboBox(this)),
      m_count(new QLabel(this)), m_model(new FieldModel(this)), m_table(new QTableView(this)),
      m_histogram(new HistogramView(this)), m_legend(new MapLegend(this)), m_notes(new QPlainTextEdit(this)),
      m_views(new QTabWidget(this)), m_open(new QPushButton(tr("&Open as a point"), this)) {
  setProperty("helpPlace", "screening#results");
  m_heading->setWordWrap(true);
  m_heading->setTextFormat(Qt::PlainText);
  auto* parts = new QSplitter(this);
  parts->addWidget(tableColumn());
  buildViews();
  parts->addWidget(m_views);
  parts->setChildrenCollapsible(false);
  parts->setSizes({5000, 4000}); // in this proportion, whatever the width
  auto* rows = new QVBoxLayout(this);
  rows->addWidget(m_strip);
  rows->addWidget(m_heading);
  rows->addWidget(parts, 1);
  rows->addLayout(buttons());
  connect(m_text, &QLineEdit::textEdited, this, &FieldPage::arrange);
  connect(m_from, &QLineEdit::textEdited, this, &FieldPage::arrange);
  connect(m_exceeds, &QCheckBox::clicked, this, &FieldPage::arrange);
  connect(m_combination, &QComboBox::activated, this, &FieldPage::arrange);
  connect(m_histogram, &HistogramView::choiceMoved, this, &FieldPage::arrange);
  connect(m_model, &FieldModel::sortWanted, this, [this](const FieldSort& sort) {
    m_sort = sort;
    arrange();
  });
  connect(m_table, &QTableView::doubleClicked, this, &FieldPage::openCurrent);
  connect(m_table->selectionModel(), &QItemSelectionModel::currentChanged, this,
          [this] { offer(m_field && isOfStudy()); });
  connect(m_open, &QPushButton::clicked, this, &FieldPage::openCurrent);
  connect(&m_desk, &Desk::changed, this, [this] {
    if (isVisible())
      follow();
  });
}

QWidget* FieldPage::tableColumn() {
  m_text->setPlaceholderText(tr("name or region"));
  m_text->setAccessibleName(tr("Filter by name or region"));
  m_text->setClearButtonEnabled(true);
  m_from->setPlaceholderText(tr("utilisation from"));
  m_from->setAccessibleName(tr("Filter by the least utilisation"));
  m_from->setMaximumWidth(120);
  m_combination->setAccessibleName(tr("Filter by combination"));
  m_combination->setSizeAdjustPolicy(QComboBox::AdjustToMinimumContentsLengthWithIcon);
  m_combination->setMinimumContentsLength(14);
  m_table->setModel(m_model);
  m_table->setAccessibleName(tr("Points of the field"));
  m_table->setSelectionBehavior(QAbstractItemView::SelectRows);
  m_table->setSelectionMode(QAbstractItemView::SingleSelection);
  m_table->setEditTriggers(QAbstractItemView::NoEditTriggers);
  m_table->setTabKeyNavigation(false);
  m_table->setShowGrid(false);
  m_table->setWordWrap(false);
  m_table->verticalHeader()->hide();
  m_table->verticalHeader()->setSectionResizeMode(QHeaderView::Fixed);
  m_table->horizontalHeader()->setDefaultAlignment(Qt::AlignLeft | Qt::AlignVCenter);
  m_table->installEventFilter(this);
  auto* column = new QWidget(this);
  auto* filters = new QHBoxLayout;
  filters->addWidget(m_text, 1);
  filters->addWidget(m_from);
  filters->addWidget(m_exceeds);
  filters->addWidget(m_combination);
  auto* rows = new QVBoxLayout(column);
  rows->setContentsMargins(0, 0, 0, 0);
  rows->addLayout(filters);
  rows->addWidget(m_table, 1);
  rows->addWidget(m_count);
  return column;
}

void FieldPage::buildViews() {
  // It shares the choice of rows with the table, which has it once it has a model.
  m_map = new FieldMapView(*m_model, *m_table->selectionModel(), this);
  m_notes->setReadOnly(true);
  m_notes->setTabChangesFocus(true);
  m_notes->setAccessibleName(tr("What was judged and read, and cautions"));
  m_views->tabBar()->setAccessibleName(tr("Map, bars and notes"));
  m_views->addTab(mapPage(), tr("&Map"));
  m_views->addTab(barsPage(), tr("&Bars"));
  m_views->addTab(m_notes, tr("&Notes"));
}

QWidget* FieldPage::mapPage() {
  auto* page = new QWidget(this);
  auto* rows = new QVBoxLayout(page);
  rows->addWidget(m_map, 1);
  rows->addWidget(m_legend);
  return page;
}

QWidget* FieldPage::barsPage() {
  auto* page = new QWidget(this);
  auto* rows = new QVBoxLayout(page);
  rows->addWidget(new QLabel(tr("Points by utilisation"), page));
  rows->addWidget(m_histogram);
  rows->addStretch();
  return page;
}

QLayout* FieldPage::buttons() {
  auto* another = new QPushButton(tr("Screen &another…"), this);
  auto* save = new QPushButton(tr("&Save results…"), this);
  for (QPushButton* button : {another, save, m_open})
    button->setAutoDefault(false);
  setTabOrder(save, m_open);
  connect(another, &QPushButton::clicked, this, &FieldPage::anotherWanted);
  connect(save, &QPushButton::clicked, this, &FieldPage::saveWanted);
  auto* row = new QHBoxLayout;
  row->addWidget(another);
  row->addWidget(save);
  row->addStretch();
  row->addWidget(m_open);
  return row;
}

void FieldPage::show(std::shared_ptr<const ScreenedField> field) {
  m_field = std::move(field);
  m_sort = {};
  m_model->show(m_field);
  QStringList sentences = {
      tr("%1, judged by %2.")
          .arg(QFileInfo(fromUtf8(m_field->order.table)).fileName(), fromUtf8(m_field->order.point))};
  for (const Text& sentence : outcomeSentences(m_field->reading.field, m_field->results, m_field->summary))
    sentences << shown(sentence);
  m_heading->setText(sentences.join(QLatin1Char(' ')));
  m_notes->setPlainText(
      fromUtf8(fieldNotes(m_field->study, m_field->order.point, m_field->plan, m_field->reading,
                          m_field->results, m_field->summary, m_field->leftOut, translation())));
  m_views->setTabVisible(0, m_field->extent.has_value());
  m_views->setCurrentIndex(m_field->extent ? 0 : 1);
  m_histogram->show(m_field->summary.histogram);
  m_combination->clear();
  m_combination->addItem(tr("all combinations"));
  for (const ScreenedCombination& one : m_field->plan.combinations)
    m_combination->addItem(fromUtf8(one.name));
  m_text->clear();
  m_from->clear();
  m_exceeds->setChecked(false);
  m_table->setSortingEnabled(false);
  m_table->horizontalHeader()->setSortIndicator(m_model->columnOf(FieldKey::utilisation),
                                                Qt::DescendingOrder);
  m_table->setSortingEnabled(true); // asks for the rows
  follow();
}

QString FieldPage::heading() const {
  return m_heading->text();
}

FieldFilter FieldPage::filter() const {
  FieldFilter filter;
  filter.text = m_text->text().trimmed().toStdString();
  filter.exceedingOnly = m_exceeds->isChecked();
  if (const auto from = plainNumber(m_from->text().trimmed().toStdString()))
    filter.from = *from;
  if (m_combination->currentIndex() > 0)
    filter.combination = static_cast<std::size_t>(m_combination->currentIndex() - 1);
  filter.bin = m_histogram->chosen();
  return filter;
}

void FieldPage::arrange() {
  m_rows.run(
      [this, field = m_field, filter = filter(), sort = m_sort](const std::stop_token& stop) -> Beside::Then {
        auto rows = fieldRowsOf(field->reading.field, field->results, filter, sort,
                                [&] { return !stop.stop_requested(); });
        if (!rows)
          return {};
        return [this, rows = std::make_shared<const std::vector<std::uint32_t>>(*std::move(rows))] {
          takeRows(rows);
        };
      });
}

void FieldPage::takeRows(FieldRows rows) {
  const QModelIndex before = m_table->currentIndex();
  const std::optional<std::uint32_t> point =
      before.isValid() ? std::optional(m_model->pointAt(before.row())) : std::nullopt;
  const bool isFirst = m_model->rowCount() == 0;
  m_model->take(std::move(rows));
  if (isFirst)
    m_table->resizeColumnsToContents();
  const int row = point ? m_model->rowOf(*point).value_or(0) : 0;
  if (m_model->rowCount() > 0)
    m_table->setCurrentIndex(m_model->index(row, 0));
  tellRows();
  tellClasses();
  offer(isOfStudy());
  Q_EMIT arranged();
}

void FieldPage::tellRows() {
  const QString from = m_from->text().trimmed();
  if (!from.isEmpty() && !plainNumber(from.toStdString()))
    tell(*m_count, tr("“%1” is no utilisation. Write a number with a point, as 0.8.").arg(from), true);
  else
    tell(*m_count, tr("rows: %1 of %2").arg(m_model->rowCount()).arg(m_field->summary.points), false);
}

void FieldPage::tellClasses() {
  using enum MapClass;
  std::vector<MapClass> classes = {upTo50, upTo80, upTo95, upTo100, exceeding};
  if (m_field->summary.judged < m_field->summary.points)
    classes.push_back(notJudged);
  if (static_cast<std::size_t>(m_model->rowCount()) < m_field->summary.points)
    classes.push_back(notWanted);
  m_legend->show(std::move(classes));
}

bool FieldPage::isOfStudy() const {
  return isScreenedAlike(m_field->study, m_desk.study(), m_field->order.point);
}

void FieldPage::follow() {
  if (!m_field)
    return;
  const bool isOfStudy = this->isOfStudy();
  if (isOfStudy)
    m_strip->hide();
  else
    m_strip->say(tr("The study has changed since: these results are of the study as it was. Screen again."),
                 Strip::Tone::wrong);
  offer(isOfStudy);
}

void FieldPage::showEvent(QShowEvent* event) {
  QWidget::showEvent(event);
  follow();
}

void FieldPage::offer(bool isOfStudy) {
  m_open->setEnabled(isOfStudy && m_table->currentIndex().isValid());
}

void FieldPage::openCurrent() {
  if (!m_open->isEnabled())
    return;
  const std::string file = QFileInfo(fromUtf8(m_field->order.table)).fileName().toStdString();
  const Result<OpenedPoint> opened = openedPoint(
      m_desk.study(), m_field->order.point, m_field->plan, m_field->reading.field, m_field->results,
      m_model->pointAt(m_table->currentIndex().row()), verbatim(file), translation());
  std::optional<Problem> problem;
  if (!opened)
    problem = opened.error();
  else
    problem = m_desk.request(opened->edits, m_desk.newCommand(),
                             tr("point %1 of a field").arg(fromUtf8(opened->name)));
  if (problem) {
    m_strip->say(shown(*problem), Strip::Tone::wrong);
    return;
  }
  m_desk.show(opened->name,
              opened->combination.empty() ? m_desk.study().shown.combination : opened->combination);
  Q_EMIT this->opened();
}

void FieldPage::saveTo(const QString& path) {
  m_saving.run(
      [this, field = m_field, path = path.toStdString()](const std::stop_token& stop) -> Beside::Then {
        Result<bool> written = writeField(
            path,
            [&](const Sink& sink) {
              return writeFieldCsv(field->study, field->plan, field->reading.field, field->results, sink);
            },
            [&] { return !stop.stop_requested(); });
        return [this, written = std::move(written), path] {
          if (written)
            m_desk.say(tr("Results written to %1.").arg(fromUtf8(path)));
          m_strip->say(written ? tr("Results written to %1.").arg(fromUtf8(path)) : shown(written.error()),
                       written ? Strip::Tone::quiet : Strip::Tone::wrong);
        };
      });
}

bool FieldPage::eventFilter(QObject* watched, QEvent* event) {
  if (watched == m_table && event->type() == QEvent::KeyPress) {
    const int key = static_cast<QKeyEvent*>(event)->key();
    if (key == Qt::Key_Return || key == Qt::Key_Enter) {
      openCurrent();
      return true;
    }
  }
  return QWidget::eventFilter(watched, event);
}

} // namespace planewright
