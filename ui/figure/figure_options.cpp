// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/figure_options.h"

#include "core/quantity/expression.h"
#include "core/quantity/format.h"
#include "ui/figure/figure_arrangement.h"
#include "ui/look/dialog_parts.h"
#include "ui/look/look.h"

#include <QButtonGroup>
#include <QCheckBox>
#include <QComboBox>
#include <QHBoxLayout>
#include <QLabel>
#include <QLineEdit>
#include <QPushButton>
#include <QRadioButton>
#include <QVBoxLayout>

#include <algorithm>
#include <vector>

namespace planewright {

namespace {

constexpr double columnWidth = 90;
constexpr double pageWidth = 160;

/// A box of numbers with the present one among them.
template <class Number>
QComboBox* boxOf(std::vector<Number> numbers, Number present, const QString& unit) {
  if (std::ranges::find(numbers, present) == numbers.end())
    numbers.insert(std::ranges::upper_bound(numbers, present), present);
  auto* box = new QComboBox;
  for (const Number number : numbers)
    box->addItem(fromUtf8(exactNumber(number)) + QStringLiteral(" ") + unit, number);
  box->setCurrentIndex(box->findData(present));
  return box;
}

} // namespace

FigureOptions::FigureOptions(const FigureSettings& settings, QWidget* parent)
    : QWidget(parent), m_settings(settings), m_carryingChosen(settings.carriesStudy) {
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins(0, 0, gapToBar, 0);
  column->setSpacing(10);
  buildParts();
  buildArrangement();
  buildWidth();
  buildText();
  buildFormat();
  buildCarrying();
  column->addStretch();
}

QString FigureOptions::caption() const {
  return m_caption->text();
}

void FigureOptions::addSwitch(QVBoxLayout& group, const QString& words, bool* value) {
  auto* box = new QCheckBox(words, this);
  box->setChecked(*value);
  group.addWidget(box);
  connect(box, &QCheckBox::clicked, this, [this, value](bool on) {
    *value = on;
    emit changed();
  });
}

QRadioButton* FigureOptions::addChoice(QVBoxLayout& group, const QString& words, bool chosen,
                                       std::function<void()> choose) {
  auto* button = new QRadioButton(words, this);
  button->setChecked(chosen);
  group.addWidget(button);
  connect(button, &QRadioButton::clicked, this, std::move(choose));
  return button;
}

void FigureOptions::buildParts() {
  QVBoxLayout* rows = headedRows(*this, tr("Parts"));
  FigureParts& parts = m_settings.parts;
  addSwitch(*rows, tr("Title"), &parts.title);
  addSwitch(*rows, tr("Element in the given axes"), &parts.givenElement);
  addSwitch(*rows, tr("Element at the reading plane"), &parts.turnedElement);
  addSwitch(*rows, tr("Circle"), &parts.circle);
  addSwitch(*rows, tr("Table of planes"), &parts.planes);
  addSwitch(*rows, tr("Check"), &parts.check);
  addSwitch(*rows, tr("Utilisation over the angle"), &parts.utilisation);
  auto* conventions = new QCheckBox(tr("Conventions"), this);
  conventions->setChecked(true);
  conventions->setEnabled(false);
  conventions->setToolTip(tr("A figure without its sign conventions can be misread; they always stand."));
  rows->addWidget(conventions);
}

void FigureOptions::buildArrangement() {
  QVBoxLayout* rows = headedRows(*this, tr("Arrangement"));
  auto* arrangement = new FigureArrangement(m_settings.arrangement, m_settings.blocks, this);
  rows->addWidget(arrangement);
  connect(arrangement, &FigureArrangement::changed, this, [this, arrangement] {
    m_settings.arrangement = arrangement->arrangement();
    m_settings.blocks = arrangement->blocks();
    emit changed();
  });
}

void FigureOptions::buildWidth() {
  QVBoxLayout* rows = headedRows(*this, tr("Width"));
  auto* choices = new QButtonGroup(this);
  const bool isOwn = m_settings.width != columnWidth && m_settings.width != pageWidth;
  choices->addButton(addChoice(*rows, tr("Text column, 90 mm"), m_settings.width == columnWidth,
                               [this] { takeWidth(columnWidth); }));
  choices->addButton(addChoice(*rows, tr("Full page, 160 mm"), m_settings.width == pageWidth,
                               [this] { takeWidth(pageWidth); }));
  auto* own = new QHBoxLayout;
  auto* button = addChoice(*rows, tr("Own width"), isOwn, [this] { takeOwnWidth(); });
  choices->addButton(button);
  rows->removeWidget(button);
  m_ownWidth = new QLineEdit(isOwn ? fromUtf8(exactNumber(m_settings.width)) : QStringLiteral("120"), this);
  m_ownWidth->setAccessibleName(tr("Own width in mm"));
  own->addWidget(button);
  own->addWidget(m_ownWidth);
  own->addWidget(new QLabel(tr("mm"), this));
  rows->addLayout(own);
  connect(m_ownWidth, &QLineEdit::textEdited, this, [this, button] {
    button->setChecked(true);
    takeOwnWidth();
  });
}

void FigureOptions::takeWidth(double width) {
  m_settings.width = width;
  m_problem.reset();
  emit changed();
}

void FigureOptions::takeOwnWidth() {
  const Unit mm{"mm", dimension::length, 1, 1};
  const Result<Entry> entry =
      readEntry(m_ownWidth->text().toStdString(), {dimension::length, mm, Slopes::none});
  if (entry) {
    takeWidth(entry->value);
    return;
  }
  m_problem = entry.error();
  emit changed();
}

void FigureOptions::buildText() {
  QVBoxLayout* rows = headedRows(*this, tr("Text and colour"));
  auto* size = new QHBoxLayout;
  auto* label = new QLabel(tr("Size of the text"), this);
  auto* box = boxOf<double>({7, 7.5, 8, 8.5, 9, 9.5, 10}, m_settings.textPoints, tr("pt"));
  label->setBuddy(box);
  size->addWidget(label);
  size->addWidget(box);
  rows->addLayout(size);
  connect(box, &QComboBox::activated, this, [this, box] {
    m_settings.textPoints = box->currentData().toDouble();
    emit changed();
  });
  addSwitch(*rows, tr("Mono: black and greys only"), &m_settings.mono);
  auto* caption = new QLabel(tr("Caption"), this);
  m_caption = new QLineEdit(this);
  caption->setBuddy(m_caption);
  rows->addWidget(caption);
  rows->addWidget(m_caption);
  connect(m_caption, &QLineEdit::textEdited, this, &FigureOptions::changed);
}

void FigureOptions::buildFormat() {
  QVBoxLayout* rows = headedRows(*this, tr("Format"));
  auto* choices = new QButtonGroup(this);
  const auto add = [&](const QString& words, FigureFormat format) {
    choices->addButton(
        addChoice(*rows, words, m_settings.format == format, [this, format] { takeFormat(format); }));
  };
  add(tr("SVG, lines and text"), FigureFormat::svg);
  add(tr("PDF, lines and text"), FigureFormat::pdf);
  add(tr("PNG, pixels"), FigureFormat::png);
  m_dpi = boxOf<int>({150, 300, 600, 1200}, m_settings.dpi, tr("dpi"));
  m_dpi->setAccessibleName(tr("Resolution of the PNG"));
  m_dpi->setEnabled(m_settings.format == FigureFormat::png);
  rows->addWidget(m_dpi);
  connect(m_dpi, &QComboBox::activated, this, [this] {
    m_settings.dpi = m_dpi->currentData().toInt();
    emit changed();
  });
}

void FigureOptions::buildCarrying() {
  QVBoxLayout* rows = headedRows(*this, tr("Study"));
  m_carrying = new QCheckBox(tr("Carry the study inside the file"), this);
  m_carryingWords = new QLabel(this);
  m_carryingWords->setWordWrap(true);
  auto* outside = new QPushButton(tr("For sending outside"), this);
  outside->setAutoDefault(false);
  outside->setToolTip(tr("Leaves the study out until this window is closed."));
  rows->addWidget(m_carrying);
  rows->addWidget(m_carryingWords);
  rows->addWidget(outside, 0, Qt::AlignLeft);
  carry(m_carryingChosen);
  connect(m_carrying, &QCheckBox::clicked, this, [this](bool on) {
    m_carryingChosen = on;
    carry(on);
    emit changed();
  });
  connect(outside, &QPushButton::clicked, this, [this] {
    carry(false);
    emit changed();
  });
}

void FigureOptions::carry(bool on) {
  m_settings.carriesStudy = on;
  m_carrying->setChecked(on);
  m_carryingWords->setText(on ? tr("The whole study, with all points and notes, travels inside; opening the "
                                   "figure brings it back.")
                              : tr("The file holds the figure alone; no study comes back from it."));
}

FigureSettings FigureOptions::remembered() const {
  FigureSettings settings = m_settings;
  settings.carriesStudy = m_carryingChosen;
  return settings;
}

void FigureOptions::endSendingOutside() {
  carry(m_carryingChosen);
}

void FigureOptions::takeFormat(FigureFormat format) {
  m_settings.format = format;
  m_dpi->setEnabled(format == FigureFormat::png);
  emit changed();
}

} // namespace planewright
