// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/faces_dialog.h"

#include "core/quantity/format.h"
#include "core/study/slope_edits.h"
#include "ui/look/look.h"

#include <QDialogButtonBox>
#include <QFormLayout>
#include <QLabel>
#include <QLineEdit>
#include <QPushButton>
#include <QVBoxLayout>

namespace planewright {

FacesDialog::FacesDialog(Line line, QWidget* parent)
    : QDialog(parent), m_line(std::move(line)), m_first(new QLineEdit(this)), m_second(new QLineEdit(this)),
      m_told(new QLabel(this)) {
  setWindowTitle(tr("True slope of the grain from two faces"));
  setProperty("helpPlace", "lines#faces");
  auto* form = new QFormLayout;
  form->addRow(tr("Slope on the wide face"), m_first);
  form->addRow(tr("Slope on the narrow face"), m_second);
  m_first->setPlaceholderText(tr("1 in 12"));
  m_second->setPlaceholderText(tr("1 in 20"));
  m_told->setWordWrap(true);
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Cancel, this);
  m_take = buttons->addButton(tr("Take either way"), QDialogButtonBox::AcceptRole);
  m_take->setDefault(true);
  connect(buttons, &QDialogButtonBox::accepted, this, &QDialog::accept);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::reject);
  for (QLineEdit* field : {m_first, m_second})
    connect(field, &QLineEdit::textEdited, this, &FacesDialog::refresh);
  auto* rows = new QVBoxLayout(this);
  rows->addLayout(form);
  rows->addWidget(m_told);
  rows->addWidget(buttons);
  setMinimumWidth(380);
  refresh();
}

QString FacesDialog::told() const {
  return m_told->text();
}

void FacesDialog::refresh() {
  m_slope.clear();
  const bool hasBoth = !m_first->text().trimmed().isEmpty() && !m_second->text().trimmed().isEmpty();
  const Result<Angle> slope = trueSlopeOf(m_first->text().toStdString(), m_second->text().toStdString());
  if (!hasBoth)
    m_told->setText(tr("tan φ = √(tan² a + tan² b): the sense is lost, so it counts either way."));
  else if (!slope)
    m_told->setText(shown(slope.error()));
  else {
    m_slope = toleranceText(*slope);
    const QString old = m_line.tolerance.empty() ? tr("none") : fromUtf8(m_line.tolerance);
    m_told->setText(
        tr("True slope %1 (%2), either way. The angle of the line stays %3; its tolerance, now %4, "
           "becomes %5.")
            .arg(fromUtf8(shownDegrees(*slope, 2)), fromUtf8(shownSlope(*slope)), fromUtf8(m_line.angle), old,
                 fromUtf8(m_slope)));
  }
  m_take->setEnabled(!m_slope.empty());
}

} // namespace planewright
