// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/preferences_dialog.h"

#include "ui/look/dialog_parts.h"
#include "ui/look/language.h"
#include "ui/look/look.h"

#include <QComboBox>
#include <QDialogButtonBox>
#include <QDir>
#include <QFileDialog>
#include <QFormLayout>
#include <QGroupBox>
#include <QHBoxLayout>
#include <QLineEdit>
#include <QPushButton>
#include <QScrollArea>
#include <QVBoxLayout>

#include <algorithm>
#include <type_traits>
#include <utility>

namespace planewright {

PreferencesDialog::PreferencesDialog(QWidget* parent) : QDialog(parent), m_rows(new QVBoxLayout) {
  setWindowTitle(tr("Preferences"));
  setProperty("helpPlace", "window#preferences");
  auto* page = new QWidget(this);
  page->setLayout(m_rows);
  auto* scroll = new QScrollArea(this);
  scroll->setWidget(page);
  scroll->setWidgetResizable(true);
  scroll->setFrameShape(QFrame::NoFrame);
  addWindow();
  addStudies();
  addOutputs();
  m_rows->addStretch();
  auto* buttons = new QDialogButtonBox(
      QDialogButtonBox::Ok | QDialogButtonBox::Cancel | QDialogButtonBox::RestoreDefaults, this);
  connect(buttons, &QDialogButtonBox::accepted, this, &PreferencesDialog::accept);
  connect(buttons, &QDialogButtonBox::rejected, this, &PreferencesDialog::reject);
  connect(buttons->button(QDialogButtonBox::RestoreDefaults), &QPushButton::clicked, this,
          [this] { show(Preferences()); });
  auto* rows = new QVBoxLayout(this);
  rows->addWidget(scroll, 1);
  rows->addWidget(buttons);
  resizeOnScreen(*this, {520, 680});
  show(preferences());
}

QFormLayout* PreferencesDialog::group(const QString& heading) {
  auto* box = new QGroupBox(heading, this);
  auto* form = new QFormLayout(box);
  form->setFieldGrowthPolicy(QFormLayout::ExpandingFieldsGrow);
  m_rows->addWidget(box);
  return form;
}

QComboBox* PreferencesDialog::addChoice(QFormLayout& form, const QString& caption, const QStringList& words,
                                        std::function<int(const Preferences&)> place,
                                        std::function<void(Preferences&, int)> take) {
  auto* list = new QComboBox(this);
  list->addItems(words);
  list->setAccessibleName(caption);
  form.addRow(caption, list);
  m_parts.push_back(
      {[list, place = std::move(place)](const Preferences& shown) {
         list->setCurrentIndex(std::max(place(shown), 0));
       },
       [list, take = std::move(take)](Preferences& taken) { take(taken, list->currentIndex()); }});
  return list;
}

QLineEdit* PreferencesDialog::addText(QFormLayout& form, const QString& caption,
                                      std::function<QString(const Preferences&)> text,
                                      std::function<void(Preferences&, const QString&)> take) {
  auto* edit = new QLineEdit(this);
  edit->setAccessibleName(caption);
  form.addRow(caption, edit);
  m_parts.push_back(
      {[edit, text = std::move(text)](const Preferences& shown) { edit->setText(text(shown)); },
       [edit, take = std::move(take)](Preferences& taken) { take(taken, edit->text().trimmed()); }});
  return edit;
}

template <class At>
void PreferencesDialog::addWord(QFormLayout& form, const QString& caption, At at) {
  using Enum = std::remove_cvref_t<decltype(at(std::declval<Preferences&>()))>;
  QStringList words;
  for (const Named<Enum>& row : namesOf<Enum>())
    words << shown(row.label);
  addChoice(
      form, caption, words,
      [at](const Preferences& preferences) { return static_cast<int>(at(preferences)); },
      [at](Preferences& preferences, int place) { at(preferences) = static_cast<Enum>(place); });
}

void PreferencesDialog::addUnit(QFormLayout& form, const QString& caption, const QStringList& units,
                                std::string Units::*unit) {
  addChoice(
      form, caption, units,
      [unit, units](const Preferences& preferences) {
        return static_cast<int>(units.indexOf(fromUtf8(preferences.units.*unit)));
      },
      [unit, units](Preferences& preferences, int place) {
        preferences.units.*unit = units[place].toStdString();
      });
}

void PreferencesDialog::addTitle(QFormLayout& form, const QString& caption, std::string Title::*title) {
  addText(
      form, caption, [title](const Preferences& preferences) { return fromUtf8(preferences.title.*title); },
      [title](Preferences& preferences, const QString& text) {
        preferences.title.*title = text.toStdString();
      });
}

void PreferencesDialog::addFolder(QFormLayout& form, const QString& caption, const QString& otherwise,
                                  QString Preferences::*folder) {
  QLineEdit* edit = addText(
      form, caption,
      [folder](const Preferences& preferences) { return QDir::toNativeSeparators(preferences.*folder); },
      [folder](Preferences& preferences, const QString& text) {
        preferences.*folder = QDir::fromNativeSeparators(text);
      });
  edit->setPlaceholderText(otherwise);
  auto* choose = new QPushButton(tr("Choose…"), this);
  choose->setAutoDefault(false);
  choose->setAccessibleName(tr("Choose: %1").arg(caption));
  connect(choose, &QPushButton::clicked, this, [this, edit, caption] {
    const QString path = QFileDialog::getExistingDirectory(this, caption, edit->text());
    if (!path.isEmpty())
      edit->setText(QDir::toNativeSeparators(path));
  });
  form.addRow(QString(), choose);
}

void PreferencesDialog::addWindow() {
  QFormLayout& form = *group(tr("Window"));
  QStringList names = {tr("as the system")};
  QStringList codes = {QString()};
  for (const Language& one : languages()) {
    names << one.name;
    codes << one.code;
  }
  addChoice(
      form, tr("language (from the next start)"), names,
      [codes](const Preferences& preferences) {
        return static_cast<int>(codes.indexOf(preferences.language));
      },
      [codes](Preferences& preferences, int place) { preferences.language = codes[place]; });
  addChoice(
      form, tr("appearance"), {tr("as the system"), tr("light"), tr("dark"), tr("high contrast")},
      [](const Preferences& preferences) { return static_cast<int>(preferences.appearance); },
      [](Preferences& preferences, int place) { preferences.appearance = static_cast<Appearance>(place); });
  QStringList sizes;
  for (const int percent : textPercents)
    sizes << tr("%1 %").arg(percent);
  addChoice(
      form, tr("size of text"), sizes,
      [](const Preferences& preferences) {
        return static_cast<int>(std::ranges::find(textPercents, preferences.textPercent) -
                                textPercents.begin());
      },
      [](Preferences& preferences, int place) {
        preferences.textPercent = textPercents[static_cast<std::size_t>(place)];
      });
}

void PreferencesDialog::addStudies() {
  QFormLayout& form = *group(tr("New studies"));
  addUnit(form, tr("stress in"), {"MPa", "kPa", "Pa", "GPa", "psi", "ksi", "psf", "bar"}, &Units::stress);
  addUnit(form, tr("force in"), {"kN", "N", "MN", "lbf", "kip", "kgf", "tf"}, &Units::force);
  addUnit(form, tr("length in"), {"mm", "cm", "m", "in", "ft"}, &Units::length);
  addUnit(form, tr("moment in"), {"kN*m", "N*m", "N*mm", "kN*mm", "lbf*ft", "lbf*in", "kip*ft", "kip*in"},
          &Units::moment);
  addWord(
      form, tr("positive normal stress"),
      [](auto& preferences) -> auto& { return preferences.convention.positive; });
  addWord(
      form, tr("shear on the circle"),
      [](auto& preferences) -> auto& { return preferences.convention.shearAxis; });
  addWord(
      form, tr("shear force"), [](auto& preferences) -> auto& { return preferences.convention.shearForce; });
  addWord(
      form, tr("stresses with"), [](auto& preferences) -> auto& { return preferences.convention.digits; });
  addTitle(form, tr("project"), &Title::project);
  addTitle(form, tr("prepared by"), &Title::prepared);
  addTitle(form, tr("purpose"), &Title::purpose);
  addFolder(form, tr("folder of studies"), tr("that of the newest study"), &Preferences::studiesFolder);
}

void PreferencesDialog::addOutputs() {
  QFormLayout& form = *group(tr("Figures and sheets"));
  addWord(
      form, tr("paper of sheets"), [](auto& preferences) -> auto& { return preferences.paper; });
  addWord(
      form, tr("decimal sign"), [](auto& preferences) -> auto& { return preferences.decimal; });
  addFolder(form, tr("folder of figures and sheets"), tr("that of the study"), &Preferences::outputsFolder);
}

void PreferencesDialog::show(const Preferences& preferences) {
  for (const Part& part : m_parts)
    part.show(preferences);
}

Preferences PreferencesDialog::chosen() const {
  Preferences taken = preferences();
  for (const Part& part : m_parts)
    part.take(taken);
  return taken;
}

void PreferencesDialog::accept() {
  const bool needsStart = chosen().language != preferences().language;
  prefer(chosen());
  QDialog::accept();
  Q_EMIT kept(needsStart);
}

} // namespace planewright
