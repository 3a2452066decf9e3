// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/side_by_side.h"

#include "core/strength/cautions.h"
#include "core/strength/shown_ratio.h"
#include "core/study/check_edits.h"
#include "core/table/check_words.h"
#include "ui/look/look.h"

#include <QDialogButtonBox>
#include <QHeaderView>
#include <QLabel>
#include <QTreeWidget>
#include <QVBoxLayout>

#include <algorithm>

namespace planewright {

namespace {

QString remarkOf(const SideBySide& row, const CheckSetup& setup) {
  if (row.problem)
    return shown(row.problem->what);
  const std::vector<Text> cautions = cautionsOf(row.criterion, setup.strengths, setup.parameters, setup.band);
  return cautions.empty() ? QString() : shown(cautions.front());
}

} // namespace

SideBySideDialog::SideBySideDialog(Desk& desk, std::string check, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_check(std::move(check)), m_heading(new QLabel(this)),
      m_table(new QTreeWidget(this)) {
  setWindowTitle(tr("All criteria side by side"));
  setProperty("helpPlace", "strength#side-by-side");
  setAttribute(Qt::WA_DeleteOnClose);
  m_heading->setWordWrap(true);
  m_table->setHeaderLabels({tr("criterion"), tr("nominal"), tr("worst"), tr("combination"), tr("remark")});
  m_table->headerItem()->setTextAlignment(1, Qt::AlignRight);
  m_table->headerItem()->setTextAlignment(2, Qt::AlignRight);
  m_table->setRootIsDecorated(false);
  m_table->setUniformRowHeights(true);
  m_table->header()->setSectionResizeMode(QHeaderView::ResizeToContents);
  m_table->setAccessibleName(tr("Utilisation by every criterion"));
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Close, this);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::close);
  auto* rows = new QVBoxLayout(this);
  rows->addWidget(m_heading);
  rows->addWidget(m_table, 1);
  rows->addWidget(buttons);
  resize(720, 420);
  connect(&m_desk, &Desk::changed, this, &SideBySideDialog::refresh);
  refresh();
}

void SideBySideDialog::refresh() {
  const Readout& readout = m_desk.readout();
  const auto at = std::ranges::find(readout.checks, m_check, &CheckSetup::id);
  m_table->clear();
  if (at == readout.checks.end()) {
    m_heading->setText(tr("This point has no check “%1”.").arg(fromUtf8(m_check)));
    return;
  }
  const auto check = static_cast<std::size_t>(at - readout.checks.begin());
  m_heading->setText(tr("%1, the worst of all combinations. Which criterion suits the material is for the "
                        "engineer to decide.")
                         .arg(shown(checkName(*at))));
  for (const SideBySide& row : criteriaSideBySide(readout, check)) {
    const bool hasNumber = row.standing() != Standing::unjudged;
    auto* item = new QTreeWidgetItem(m_table);
    item->setText(0, shown(labelOf(row.criterion)));
    item->setText(1, hasNumber ? fromUtf8(shownUtilisation(row.nominal.utilisation)) : QString());
    item->setText(2, hasNumber ? fromUtf8(shownUtilisation(row.worst.utilisation))
                               : shown(wordOfStanding(Standing::unjudged)));
    item->setText(3, hasNumber ? fromUtf8(readout.states[*row.state].combination) : QString());
    item->setText(4, remarkOf(row, *at));
    item->setToolTip(4, item->text(4));
    item->setTextAlignment(1, Qt::AlignRight | Qt::AlignVCenter);
    item->setTextAlignment(2, Qt::AlignRight | Qt::AlignVCenter);
    QFont font = m_table->font();
    font.setBold(row.isChosen);
    for (int column = 0; column < m_table->columnCount(); ++column)
      item->setFont(column, font);
  }
}

} // namespace planewright
