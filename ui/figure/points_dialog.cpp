// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/points_dialog.h"

#include "ui/files/folders.h"
#include "ui/look/dialog_parts.h"
#include "ui/look/look.h"

#include <QDir>
#include <QFileDialog>
#include <QFormLayout>
#include <QLabel>
#include <QLineEdit>
#include <QListWidget>
#include <QMessageBox>
#include <QPlainTextEdit>
#include <QProgressBar>
#include <QPushButton>
#include <QRadioButton>
#include <QVBoxLayout>

#include <algorithm>

namespace planewright {

Existing askExisting(QWidget& over, const QString& folder, int existing, int all) {
  QMessageBox box(QMessageBox::NoIcon, over.windowTitle(),
                  PointsDialog::tr("%1 of these %2 files exist in %3.").arg(existing).arg(all).arg(folder),
                  QMessageBox::Cancel, &over);
  box.setInformativeText(PointsDialog::tr("Replace them?"));
  const auto* replace = box.addButton(PointsDialog::tr("Replace them"), QMessageBox::AcceptRole);
  const auto* keep = box.addButton(PointsDialog::tr("Write only the others"), QMessageBox::AcceptRole);
  box.setDefaultButton(QMessageBox::Cancel);
  box.exec();
  return box.clickedButton() == replace ? Existing::replace
         : box.clickedButton() == keep  ? Existing::keep
                                        : Existing::stop;
}

PointsDialog::PointsDialog(Desk& desk, FigureBatch arranged, AskExisting ask, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_arranged(std::move(arranged)), m_ask(std::move(ask)) {
  setWindowTitle(tr("Figures of all points"));
  setProperty("helpPlace", "figures#all-points");
  setWindowModality(Qt::WindowModal);
  resize(560, 560);
  auto* rows = new QVBoxLayout(this);
  rows->addLayout(pointColumn(), 1);
  rows->addLayout(choices());
  rows->addLayout(outcome());
  auto* buttons = new QHBoxLayout;
  m_write = new QPushButton(tr("Write the figures"), this);
  m_close = new QPushButton(this);
  m_close->setAutoDefault(false);
  m_write->setDefault(true);
  buttons->addStretch();
  buttons->addWidget(m_write);
  buttons->addWidget(m_close);
  rows->addLayout(buttons);
  m_settled << m_write;
  connect(m_write, &QPushButton::clicked, this, &PointsDialog::write);
  connect(m_close, &QPushButton::clicked, this, &PointsDialog::reject);
  connect(m_points, &QListWidget::itemChanged, this, &PointsDialog::refresh);
  connect(m_folder, &QLineEdit::textEdited, this, &PointsDialog::refresh);
  connect(m_governing, &QRadioButton::toggled, this, &PointsDialog::refresh);
  refresh();
}

QVBoxLayout* PointsDialog::pointColumn() {
  m_points = new QListWidget(this);
  m_points->setAccessibleName(tr("Points"));
  for (const Point& point : m_arranged.study.points) {
    auto* item = new QListWidgetItem(fromUtf8(point.name), m_points);
    item->setFlags(Qt::ItemIsEnabled | Qt::ItemIsSelectable | Qt::ItemIsUserCheckable);
    item->setCheckState(Qt::Checked);
  }
  m_points->setCurrentRow(0);
  auto* column = new QVBoxLayout;
  auto* heading = new QLabel(tr("Points"), this);
  heading->setBuddy(m_points);
  auto* marks = new QHBoxLayout;
  const auto addMark = [&](const QString& words, Qt::CheckState state) {
    auto* button = new QPushButton(words, this);
    button->setAutoDefault(false);
    marks->addWidget(button);
    m_settled << button;
    connect(button, &QPushButton::clicked, this, [this, state] { check(state); });
  };
  addMark(tr("All"), Qt::Checked);
  addMark(tr("None"), Qt::Unchecked);
  marks->addStretch();
  column->addWidget(heading);
  column->addWidget(m_points, 1);
  column->addLayout(marks);
  m_settled << m_points;
  return column;
}

QFormLayout* PointsDialog::choices() {
  const StateReading& shownState = m_desk.readout().state();
  m_governing = new QRadioButton(tr("The one that governs each point"), this);
  auto* shownOne = new QRadioButton(tr("The shown one: %1").arg(fromUtf8(shownState.combination)), this);
  m_governing->setChecked(true);
  auto* states = new QVBoxLayout;
  states->addWidget(m_governing);
  states->addWidget(shownOne);
  m_folder = new QLineEdit(QDir::toNativeSeparators(outputFolder(m_arranged.studyFile)), this);
  auto* choose = new QPushButton(tr("Choose…"), this);
  choose->setAutoDefault(false);
  connect(choose, &QPushButton::clicked, this, &PointsDialog::chooseFolder);
  auto* folder = new QHBoxLayout;
  folder->addWidget(m_folder, 1);
  folder->addWidget(choose);
  auto* form = new QFormLayout;
  form->addRow(tr("Combination"), states);
  form->addRow(tr("Folder"), folder);
  m_settled << m_governing << shownOne << m_folder << choose;
  return form;
}

QVBoxLayout* PointsDialog::outcome() {
  constexpr int linesOfProblems = 96; // pixels
  m_sentence = sentenceIn(*this);
  m_progress = new QProgressBar(this);
  m_progress->setTextVisible(false);
  m_progress->hide();
  m_problems = new QPlainTextEdit(this);
  m_problems->setReadOnly(true);
  m_problems->setAccessibleName(tr("What could not be written"));
  m_problems->setFixedHeight(linesOfProblems);
  m_problems->hide();
  auto* rows = new QVBoxLayout;
  rows->addWidget(m_sentence);
  rows->addWidget(m_progress);
  rows->addWidget(m_problems);
  return rows;
}

void PointsDialog::check(Qt::CheckState state) {
  for (int i = 0; i < m_points->count(); ++i)
    m_points->item(i)->setCheckState(state);
}

void PointsDialog::setFolder(const QString& folder) {
  m_folder->setText(folder);
  refresh();
}

void PointsDialog::chooseFolder() {
  const QString folder =
      QFileDialog::getExistingDirectory(this, tr("Folder of the figures"), m_folder->text());
  if (!folder.isEmpty())
    setFolder(QDir::toNativeSeparators(folder));
}

/// What would be written; the result of the run before is forgotten.
void PointsDialog::refresh() {
  m_arranged.points.clear();
  for (int i = 0; i < m_points->count(); ++i)
    if (m_points->item(i)->checkState() == Qt::Checked)
      m_arranged.points.push_back(m_points->item(i)->text().toStdString());
  m_arranged.state = m_governing->isChecked() ? std::nullopt : std::optional(m_desk.readout().shown);
  m_close->setText(tr("Close"));
  m_problems->hide();
  m_write->setEnabled(!m_arranged.points.empty() && !m_folder->text().trimmed().isEmpty());
  if (m_arranged.points.empty())
    return tell(*m_sentence, tr("No point is chosen."), false);
  FigureBatch first = m_arranged;
  first.points.resize(1);
  const QString example = figuresOf(first).front().file;
  const QString sentence = m_arranged.settings.carriesStudy
                               ? tr("Figures: %1, with the study inside each, named like %2.")
                               : tr("Figures: %1, without the study, named like %2.");
  tell(*m_sentence, sentence.arg(m_arranged.points.size()).arg(example), false);
}

void PointsDialog::write() {
  const QDir folder(QDir::fromNativeSeparators(m_folder->text().trimmed()));
  std::vector<PointFigure> figures = figuresOf(m_arranged);
  const auto exists = [&](const PointFigure& figure) { return folder.exists(figure.file); };
  const auto existing = std::ranges::count_if(figures, exists);
  m_kept = 0;
  if (existing > 0) {
    const Existing answer =
        m_ask(*this, m_folder->text(), static_cast<int>(existing), static_cast<int>(figures.size()));
    if (answer == Existing::stop)
      return;
    if (answer == Existing::keep)
      m_kept = static_cast<qsizetype>(std::erase_if(figures, exists));
  }
  if (!folder.mkpath(QStringLiteral(".")))
    return tell(*m_sentence, tr("The folder %1 cannot be made. Choose another one.").arg(m_folder->text()),
                true);
  begin(std::move(figures), folder.path());
}

void PointsDialog::begin(std::vector<PointFigure> figures, const QString& folder) {
  for (QWidget* widget : m_settled)
    widget->setEnabled(false);
  m_problems->hide();
  m_progress->setRange(0, static_cast<int>(figures.size()));
  m_progress->setValue(0);
  m_progress->show();
  m_close->setText(tr("Stop"));
  m_close->setFocus();
  m_run = std::make_unique<BatchRun>(m_arranged, std::move(figures), folder);
  connect(m_run.get(), &BatchRun::progressed, this, [this](int done) {
    m_progress->setValue(done);
    tell(*m_sentence, tr("%1 of %2 …").arg(done).arg(m_run->all()), false);
  });
  connect(m_run.get(), &BatchRun::ended, this, &PointsDialog::end);
}

void PointsDialog::end() {
  for (QWidget* widget : m_settled)
    widget->setEnabled(true);
  m_progress->hide();
  m_close->setText(tr("Close"));
  m_close->setEnabled(true);
  QStringList lines;
  for (const Problem& problem : m_run->problems())
    lines << shown(problem);
  m_problems->setPlainText(lines.join(QLatin1Char('\n')));
  m_problems->setVisible(!lines.isEmpty());
  const QString sentence = outcomeInWords();
  tell(*m_sentence, sentence, !lines.isEmpty());
  m_desk.say(sentence);
  m_run.release()->deleteLater(); // it is telling of its end
}

QString PointsDialog::outcomeInWords() const {
  const bool isCut = m_run->wasStopped() && m_run->written() + m_run->problems().size() < m_run->all();
  QStringList sentences;
  sentences << (isCut ? tr("Stopped. Figures written: %1 of %2, to %3.")
                      : tr("Figures written: %1 of %2, to %3."))
                   .arg(m_run->written())
                   .arg(m_run->all())
                   .arg(m_folder->text());
  if (m_kept > 0)
    sentences << tr("Left as they were: %1.").arg(m_kept);
  if (!m_run->problems().empty())
    sentences << tr("Not written: %1.").arg(m_run->problems().size());
  return sentences.join(QLatin1Char(' '));
}

void PointsDialog::reject() {
  if (!m_run)
    return QDialog::reject();
  m_run->stop();
  m_close->setEnabled(false);
  tell(*m_sentence, tr("Stopping …"), false);
}

} // namespace planewright
