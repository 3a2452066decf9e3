// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/title_dialog.h"

#include "ui/entry/draft_edit.h"
#include "ui/entry/entry_field.h"
#include "ui/look/look.h"
#include "ui/shell/signing_line.h"

#include <QDialogButtonBox>
#include <QVBoxLayout>

namespace planewright {

namespace {

/// The name is the point's key: typing another renames it and what refers to it. Its spot is told by the
/// order of the points, which stays the same meanwhile.
EntryBinding nameOfPoint() {
  EntryBinding binding;
  binding.path = [](const Study& study) {
    return "points/" + std::to_string(&shownPoint(study) - study.points.data());
  };
  binding.text = [](const Study& study) { return shownPoint(study).name; };
  binding.edits = [](const Study& study, const std::string& typed) -> Result<Edits> {
    return Edits{Rename{{Spot::point, shownPoint(study).name, {}}, typed}};
  };
  return binding;
}

} // namespace

TitleDialog::TitleDialog(Desk& desk, QWidget* parent) : QDialog(parent) {
  setWindowTitle(tr("Title block"));
  setProperty("helpPlace", "sheets#title-block");
  resize(520, 10);
  auto* rows = new QVBoxLayout(this);
  rows->addWidget(new EntryField(desk, nameOfPoint(),
                                 {PW_TEXT("TitleDialog", "point"), tr("name of the shown point")}, this));
  for (const Spot spot :
       {Spot::titleProject, Spot::titleSubject, Spot::titleNumber, Spot::titleRevision, Spot::titlePrepared,
        Spot::titleChecked, Spot::titleDate, Spot::titlePurpose, Spot::titleNotes}) {
    rows->addWidget(new EntryField(desk, boundTo([spot](const Study&) {
                                     return Place{spot, {}, {}};
                                   }),
                                   {rowOf(spot).label, shown(rowOf(spot).label)}, this));
    if (spot == Spot::titlePrepared || spot == Spot::titleChecked)
      rows->addWidget(new SigningLine(desk, spot, this));
  }
  auto* buttons = new QDialogButtonBox(QDialogButtonBox::Close, this);
  connect(buttons, &QDialogButtonBox::rejected, this, &QDialog::close);
  rows->addWidget(buttons);
}

} // namespace planewright
