// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/sweep_page.h"

#include "core/quantity/expression.h"
#include "core/study/cut_text.h"
#include "ui/entry/complaint.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/look.h"
#include "ui/planes/go_to.h"
#include "ui/planes/plane_table.h"
#include "ui/planes/sweep_model.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QVBoxLayout>

namespace planewright {

namespace {

/// A step as it is typed, an expression of an angle within the range that a sweep takes.
Result<Angle> stepOf(const std::string& typed) {
  Result<Entry> entry = readEntry(typed, {dimension::angle, degreeUnit(), Slopes::none});
  if (!entry)
    return tl::unexpected(std::move(entry).error());
  if (entry->value >= SweepModel::leastStep && entry->value <= SweepModel::greatestStep)
    return Angle::fromDegrees(entry->value);
  Problem problem;
  problem.quoted = typed;
  problem.what = PW_TEXT("Sweep", "A step lies between 0.1 and 90 deg.");
  return tl::unexpected(std::move(problem));
}

} // namespace

SweepPage::SweepPage(Desk& desk, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_model(new SweepModel(desk, this)),
      m_table(new PlaneTable(*m_model, this)), m_step(new DraftEdit(this)), m_complaint(new Complaint(this)) {
  auto* caption = new QLabel(tr("step"), this);
  setProperty("helpPlace", "planes#sweep");
  caption->setBuddy(m_step);
  m_step->setAccessibleName(tr("step of the sweep"));
  m_step->setFixedWidth(fontMetrics().horizontalAdvance(QStringLiteral("0000000000")) + 24);
  m_complaint->hide();
  auto* line = new QHBoxLayout;
  line->setContentsMargins(10, 0, 10, 0);
  line->addWidget(caption);
  line->addWidget(m_step);
  line->addWidget(m_complaint, 1);
  line->addStretch();
  auto* rows = new QVBoxLayout(this);
  rows->setContentsMargins(0, 2, 0, 0);
  rows->setSpacing(4);
  rows->addLayout(line);
  rows->addWidget(m_table, 1);
  m_table->setAccessibleName(tr("Sweep"));
  m_table->hideColumn(static_cast<int>(PlaneColumn::plane)); // it would only repeat the normal
  connect(&m_desk, &Desk::changed, this, [this] {
    if (isVisible())
      m_model->refresh();
  });
  connect(m_step, &DraftEdit::accepted, this, &SweepPage::takeStep);
  connect(m_step, &DraftEdit::left, this, &SweepPage::takeStep);
  connect(m_table, &PlaneTable::goTo, this,
          [this](int row) { bringReadingTo(m_desk, m_model->table(), row); });
  connect(m_table, &PlaneTable::combinationWanted, this,
          [this](const QString& combination) { showCombination(m_desk, combination); });
  m_step->setPutBack([this] {
    const bool typed = m_step->isModified();
    showStep();
    return typed;
  });
  showStep();
}

// The sweep opens at the reading plane.
void SweepPage::showEvent(QShowEvent* event) {
  QWidget::showEvent(event);
  m_model->refresh();
  const QModelIndex nearest = m_model->index(m_model->tintedRow(), static_cast<int>(PlaneColumn::normal));
  m_table->setCurrentIndex(nearest);
  m_table->scrollTo(nearest, QAbstractItemView::PositionAtCenter);
}

// The focus may leave the step as the page goes.
SweepPage::~SweepPage() {
  m_step->disconnect(this);
}

QString SweepPage::complaint() const {
  return m_complaint->isHidden() ? QString() : m_complaint->words();
}

void SweepPage::takeStep() {
  const Result<Angle> step = stepOf(m_step->text().toStdString());
  if (step) {
    m_model->setStep(*step);
    showStep();
    return;
  }
  m_step->setWrong(true);
  m_step->selectPiece(step.error().quoted, step.error().column);
  m_complaint->say(shown(step.error().what), shown(step.error().mend));
  m_step->setAccessibleDescription(m_complaint->words());
  m_complaint->show();
}

void SweepPage::showStep() {
  m_step->setText(fromUtf8(angleText(m_model->step())));
  m_step->setWrong(false);
  m_step->setAccessibleDescription({});
  m_complaint->hide();
}

} // namespace planewright
