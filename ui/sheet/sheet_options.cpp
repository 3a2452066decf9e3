// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/sheet/sheet_options.h"

#include "ui/look/dialog_parts.h"
#include "ui/look/look.h"

#include <QButtonGroup>
#include <QCheckBox>
#include <QLabel>
#include <QListWidget>
#include <QRadioButton>
#include <QVBoxLayout>

namespace planewright {

SheetOptions::SheetOptions(Desk& desk, const SheetSettings& settings, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_settings(settings) {
  auto* column = new QVBoxLayout(this);
  column->setContentsMargins(0, 0, gapToBar, 0);
  column->setSpacing(12);
  buildPoints();
  buildDepth();
  buildPaper();
  buildCarrying();
  column->addStretch();
  connect(&m_desk, &Desk::changed, this, &SheetOptions::listPoints);
}

void SheetOptions::buildPoints() {
  QVBoxLayout* rows = headedRows(*this, tr("Points"));
  m_points = new QListWidget(this);
  m_points->setAccessibleName(tr("Points of the sheet"));
  m_points->setFixedHeight(130);
  rows->addWidget(m_points);
  listPoints();
  connect(m_points, &QListWidget::itemClicked, this, &SheetOptions::changed);
  connect(m_points, &QListWidget::itemActivated, this, [this](QListWidgetItem* item) {
    item->setCheckState(item->checkState() == Qt::Checked ? Qt::Unchecked : Qt::Checked);
    emit changed();
  });
}

/// What was left out stays left out while its name stays.
void SheetOptions::listPoints() {
  QStringList names;
  for (const Point& point : m_desk.study().points)
    names << fromUtf8(point.name);
  QStringList listed;
  QStringList without;
  for (int i = 0; i < m_points->count(); ++i) {
    listed << m_points->item(i)->text();
    if (m_points->item(i)->checkState() == Qt::Unchecked)
      without << m_points->item(i)->text();
  }
  if (names == listed)
    return;
  m_points->clear();
  for (const QString& name : names) {
    auto* item = new QListWidgetItem(name, m_points);
    item->setFlags(Qt::ItemIsEnabled | Qt::ItemIsSelectable | Qt::ItemIsUserCheckable);
    item->setCheckState(without.contains(name) ? Qt::Unchecked : Qt::Checked);
  }
}

std::vector<std::string> SheetOptions::points() const {
  std::vector<std::string> chosen;
  for (int i = 0; i < m_points->count(); ++i)
    if (m_points->item(i)->checkState() == Qt::Checked)
      chosen.push_back(m_points->item(i)->text().toStdString());
  return chosen.size() == static_cast<std::size_t>(m_points->count()) ? std::vector<std::string>() : chosen;
}

void SheetOptions::buildDepth() {
  QVBoxLayout* rows = headedRows(*this, tr("Depth"));
  auto* choices = new QButtonGroup(this);
  for (const Named<Depth>& row : namesOf<Depth>()) {
    QString words = shown(row.label);
    words[0] = words[0].toUpper();
    auto* button = new QRadioButton(words, this);
    button->setChecked(row.value == m_settings.depth);
    choices->addButton(button);
    rows->addWidget(button);
    connect(button, &QRadioButton::clicked, this, [this, depth = row.value] {
      m_settings.depth = depth;
      emit changed();
    });
  }
  auto* figures = new QCheckBox(tr("Element and circle of each point"), this);
  figures->setChecked(m_settings.figures);
  rows->addWidget(figures);
  connect(figures, &QCheckBox::clicked, this, [this](bool on) {
    m_settings.figures = on;
    emit changed();
  });
}

void SheetOptions::buildPaper() {
  QVBoxLayout* rows = headedRows(*this, tr("Paper"));
  auto* choices = new QButtonGroup(this);
  for (const Named<Paper>& row : namesOf<Paper>()) {
    auto* button = new QRadioButton(shown(row.label), this);
    button->setChecked(row.value == m_settings.paper);
    choices->addButton(button);
    rows->addWidget(button);
    connect(button, &QRadioButton::clicked, this, [this, paper = row.value] {
      m_settings.paper = paper;
      emit changed();
    });
  }
}

void SheetOptions::buildCarrying() {
  QVBoxLayout* rows = headedRows(*this, tr("Study"));
  auto* carrying = new QCheckBox(tr("Carry the study inside the file"), this);
  carrying->setChecked(m_settings.carriesStudy);
  rows->addWidget(carrying);
  m_carryingWords = new QLabel(this);
  m_carryingWords->setWordWrap(true);
  rows->addWidget(m_carryingWords);
  tellCarrying();
  connect(carrying, &QCheckBox::clicked, this, [this](bool on) {
    m_settings.carriesStudy = on;
    tellCarrying();
    emit changed();
  });
}

void SheetOptions::tellCarrying() {
  m_carryingWords->setText(m_settings.carriesStudy
                               ? tr("The whole study, with all points and notes, travels inside; opening the "
                                    "sheet brings it back.")
                               : tr("The file holds the sheet alone; no study comes back from it."));
}

} // namespace planewright
