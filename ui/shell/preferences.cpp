// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/preferences.h"

#include "core/study/edit.h"
#include "ui/files/folders.h"
#include "ui/look/language.h"
#include "ui/look/look.h"
#include "ui/look/printed_numbers.h"

#include <QSettings>

#include <array>

namespace planewright {

namespace {

/// A text of new studies: its key in the settings, its spot and where it stands.
struct NewText {
  const char* key;
  Spot spot;
  std::string Units::*unit = nullptr;
  std::string Title::*title = nullptr;
};
const std::array newTexts = {NewText{"new/stress", Spot::unitStress, &Units::stress},
                             NewText{"new/force", Spot::unitForce, &Units::force},
                             NewText{"new/length", Spot::unitLength, &Units::length},
                             NewText{"new/moment", Spot::unitMoment, &Units::moment},
                             NewText{"new/project", Spot::titleProject, nullptr, &Title::project},
                             NewText{"new/prepared", Spot::titlePrepared, nullptr, &Title::prepared},
                             NewText{"new/purpose", Spot::titlePurpose, nullptr, &Title::purpose}};

std::string& textOf(Preferences& preferences, const NewText& row) {
  return row.unit ? preferences.units.*row.unit : preferences.title.*row.title;
}

template <class Enum>
void readWord(const QSettings& settings, const char* key, Enum& value) {
  value = fromWord<Enum>(settings.value(QLatin1String(key)).toString().toStdString()).value_or(value);
}

template <class Enum>
void keepWord(QSettings& settings, const char* key, Enum value) {
  settings.setValue(QLatin1String(key), fromUtf8(std::string(wordOf(value))));
}

} // namespace

Preferences preferences() {
  const QSettings settings;
  Preferences preferences;
  preferences.language = chosenLanguage();
  preferences.appearance = chosenAppearance();
  preferences.textPercent = chosenTextPercent();
  for (const NewText& row : newTexts) {
    std::string& text = textOf(preferences, row);
    text = settings.value(QLatin1String(row.key), fromUtf8(text)).toString().toStdString();
  }
  readWord(settings, "new/positive", preferences.convention.positive);
  readWord(settings, "new/shearAxis", preferences.convention.shearAxis);
  readWord(settings, "new/shearForce", preferences.convention.shearForce);
  readWord(settings, "new/digits", preferences.convention.digits);
  preferences.paper = rememberedSheet(settings).paper;
  preferences.decimal = chosenDecimalSign();
  preferences.studiesFolder = chosenFolder(Folder::studies);
  preferences.outputsFolder = chosenFolder(Folder::outputs);
  return preferences;
}

void prefer(const Preferences& wanted) {
  QSettings settings;
  chooseLanguage(wanted.language);
  for (const NewText& row : newTexts) {
    Preferences usual;
    Preferences kept = wanted;
    if (textOf(kept, row) == textOf(usual, row))
      settings.remove(QLatin1String(row.key));
    else
      settings.setValue(QLatin1String(row.key), fromUtf8(textOf(kept, row)));
  }
  keepWord(settings, "new/positive", wanted.convention.positive);
  keepWord(settings, "new/shearAxis", wanted.convention.shearAxis);
  keepWord(settings, "new/shearForce", wanted.convention.shearForce);
  keepWord(settings, "new/digits", wanted.convention.digits);
  SheetSettings sheet = rememberedSheet(settings);
  sheet.paper = wanted.paper;
  rememberSheet(settings, sheet);
  chooseDecimalSign(wanted.decimal);
  chooseFolder(Folder::studies, wanted.studiesFolder);
  chooseFolder(Folder::outputs, wanted.outputsFolder);
  chooseTextPercent(wanted.textPercent);
  chooseAppearance(wanted.appearance);
}

Study preferredStudy() {
  Preferences wanted = preferences();
  Study study = newStudy();
  // What an older or other program wrote into the settings may be none of ours: it is passed over.
  for (const NewText& row : newTexts)
    if (const Result<Study> with = edited(study, Edits{Type{{row.spot, {}, {}}, textOf(wanted, row)}}))
      study = *with;
  study.convention = wanted.convention;
  for (std::string CaseStress::*component : {&CaseStress::sx, &CaseStress::sy, &CaseStress::txy})
    study.points[0].stress[0].*component = "0 " + study.units.stress;
  return study;
}

} // namespace planewright
