// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/materials_dialog.h"

#include "core/shipped/shipped_materials.h"
#include "core/study/material_edits.h"
#include "ui/entry/draft_edit.h"
#include "ui/look/look.h"
#include "ui/look/strip.h"
#include "ui/shell/choice_box.h"
#include "ui/shell/material_fields.h"
#include "ui/shell/material_words.h"
#include "ui/shell/materials_list.h"
#include "ui/shell/problem_list.h"

#include <QEvent>
#include <QHBoxLayout>
#include <QLabel>
#include <QLineEdit>
#include <QMenu>
#include <QPushButton>
#include <QScrollArea>
#include <QSplitter>
#include <QStackedWidget>
#include <QTreeWidget>
#include <QVBoxLayout>

#include <algorithm>

namespace planewright {

namespace {

std::vector<std::string> namesIn(const std::vector<Material>& materials) {
  std::vector<std::string> names;
  names.reserve(materials.size());
  for (const Material& material : materials)
    names.push_back(material.name);
  return names;
}

std::vector<MaterialGroup> shippedGroups() {
  std::vector<MaterialGroup> groups;
  for (const Named<MaterialFamily>& row : namesOf<MaterialFamily>()) {
    MaterialGroup& group =
        groups.emplace_back(MaterialGroup{MaterialOrigin::shipped, shown(row.label), {}, {}});
    for (const ShippedMaterial& one : shippedMaterials())
      if (one.family == row.value)
        group.names.push_back(one.material.name);
  }
  return groups;
}

QScrollArea* scrolling(QWidget* content, QWidget* parent) {
  auto* area = new QScrollArea(parent);
  area->setWidgetResizable(true);
  area->setFrameShape(QFrame::NoFrame);
  area->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
  content->setContentsMargins(10, 0, 14, 0);
  area->setWidget(content);
  return area;
}

} // namespace

// The dialog follows the study before its fields do, so that they stand for the material under its new name.
MaterialsDialog::MaterialsDialog(Desk& desk, const std::string& ownPath, QWidget* parent)
    : QDialog(parent), m_desk(desk), m_own(ownPath), m_message(new Strip(this)),
      m_pages(new QStackedWidget(this)), m_sheet(new QLabel(this)), m_serviceRow(new QWidget(this)),
      m_serviceClass(new ChoiceBox(this)) {
  connect(&m_desk, &Desk::changed, this, &MaterialsDialog::follow);
  build();
  const auto& own = m_desk.study().materials;
  choose(own.empty() ? MaterialChoice{MaterialOrigin::shipped, shippedMaterials().front().material.name}
                     : MaterialChoice{MaterialOrigin::study, own.front().name});
  m_list->filter().setFocus();
}

void MaterialsDialog::build() {
  setWindowTitle(tr("Materials"));
  setProperty("helpPlace", "strength#materials");
  resize(940, 640);
  m_list = new MaterialsList(this);
  m_fields = new MaterialFields(m_desk, this);
  auto* columns = new QSplitter(this);
  columns->setChildrenCollapsible(false);
  columns->addWidget(m_list);
  columns->addWidget(page());
  columns->setSizes({285, 655});
  columns->setStretchFactor(1, 1);
  auto* rows = new QVBoxLayout(this);
  rows->addWidget(m_message);
  rows->addWidget(columns, 1);
  rows->addWidget(buttons());
  // Undo is of the whole study, here as in the main window.
  QAction* undo = m_desk.undoStack()->createUndoAction(this, tr("Undo"));
  undo->setShortcut(QKeySequence::Undo);
  QAction* redo = m_desk.undoStack()->createRedoAction(this, tr("Redo"));
  redo->setShortcut(QKeySequence::Redo);
  addActions({undo, redo});
  connect(m_list, &MaterialsList::chosen, this, [this](const MaterialChoice& choice) {
    if (choice != m_choice)
      choose(choice);
  });
  connect(m_list, &MaterialsList::opened, this, &MaterialsDialog::open);
  connect(m_list, &MaterialsList::renameWanted, this, &MaterialsDialog::rename);
}

QWidget* MaterialsDialog::page() {
  m_sheet->setWordWrap(true);
  m_sheet->setTextFormat(Qt::RichText);
  m_sheet->setAlignment(Qt::AlignTop | Qt::AlignLeft);
  m_sheet->setTextInteractionFlags(Qt::TextSelectableByMouse | Qt::TextSelectableByKeyboard);
  for (const std::string& one : serviceClasses())
    m_serviceClass->addItem(fromUtf8(one));
  m_serviceClass->setAccessibleName(tr("service class to be taken for"));
  connect(m_serviceClass, &QComboBox::activated, this, &MaterialsDialog::showPage);
  auto* line = new QHBoxLayout(m_serviceRow);
  line->setContentsMargins(0, 0, 0, 0);
  line->addWidget(new QLabel(tr("Factors for service class"), m_serviceRow));
  line->addWidget(m_serviceClass);
  line->addStretch();
  auto* reading = new QWidget(this);
  auto* rows = new QVBoxLayout(reading);
  rows->setContentsMargins(0, 0, 0, 0);
  rows->addWidget(m_sheet);
  rows->addWidget(m_serviceRow);
  rows->addStretch();
  m_pages->addWidget(scrolling(m_fields, this));
  m_pages->addWidget(scrolling(reading, this));
  return m_pages;
}

QPushButton* MaterialsDialog::addButton(const QString& words, void (MaterialsDialog::*act)()) {
  auto* button = new QPushButton(words, this);
  button->setAutoDefault(false);
  connect(button, &QPushButton::clicked, this, act);
  return button;
}

QWidget* MaterialsDialog::buttons() {
  auto* row = new QWidget(this);
  auto* line = new QHBoxLayout(row);
  line->setContentsMargins(0, 0, 0, 0);
  auto* fresh = new QPushButton(tr("&Add"), this);
  fresh->setAutoDefault(false);
  auto* kinds = new QMenu(fresh);
  for (const Named<MaterialKind>& kind : namesOf<MaterialKind>())
    kinds->addAction(shown(kind.label), this, [this, value = kind.value] { add(value); });
  fresh->setMenu(kinds);
  m_take = addButton(tr("&Take into the study"), &MaterialsDialog::take);
  m_remove = addButton(tr("&Remove from the study"), &MaterialsDialog::remove);
  m_keep = addButton(tr("&Keep in own library"), &MaterialsDialog::keep);
  m_drop = addButton(tr("Remove from &own library"), &MaterialsDialog::dropOwn);
  auto* close = new QPushButton(tr("&Close"), this);
  close->setAutoDefault(false);
  connect(close, &QPushButton::clicked, this, &QDialog::close);
  for (QPushButton* button : {fresh, m_take, m_keep, m_remove, m_drop})
    line->addWidget(button);
  line->addStretch();
  line->addWidget(close);
  return row;
}

QString MaterialsDialog::sheet() const {
  return m_sheet->text();
}

void MaterialsDialog::showEvent(QShowEvent* event) {
  QDialog::showEvent(event);
  m_own.readAgain();
  settleMessage();
  refresh();
}

void MaterialsDialog::changeEvent(QEvent* event) {
  QDialog::changeEvent(event);
  if (event->type() == QEvent::PaletteChange && m_take)
    showPage();
}

void MaterialsDialog::follow() {
  if (!isVisible())
    return;
  settleMessage();
  refresh();
}

void MaterialsDialog::choose(const MaterialChoice& choice) {
  m_choice = choice;
  refresh();
}

// A material that has another name or has gone is followed by the one in its row.
void MaterialsDialog::refresh() {
  const auto& materials = m_desk.study().materials;
  if (m_choice.origin == MaterialOrigin::study && !findMaterial(m_desk.study(), m_choice.name))
    m_choice.name = materials.empty() ? "" : materials[std::min(m_row, materials.size() - 1)].name;
  const auto at = std::ranges::find(materials, m_choice.name, &Material::name);
  if (m_choice.origin == MaterialOrigin::study && at != materials.end())
    m_row = static_cast<std::size_t>(at - materials.begin());
  std::vector<MaterialGroup> groups = {
      {MaterialOrigin::study, tr("In this study"), tr("none yet"), namesIn(materials)},
      {MaterialOrigin::own, tr("Own library"),
       m_own.problems().empty() ? tr("none kept yet") : tr("not read, see above"), namesIn(m_own.all())}};
  std::ranges::move(shippedGroups(), std::back_inserter(groups));
  m_list->fill(groups, m_choice);
  showPage();
}

std::optional<Material> MaterialsDialog::ofLibrary() const {
  if (m_choice.origin == MaterialOrigin::own) {
    const auto own = std::ranges::find(m_own.all(), m_choice.name, &Material::name);
    return own == m_own.all().end() ? std::nullopt : std::optional(*own);
  }
  if (m_choice.origin == MaterialOrigin::shipped)
    for (const ShippedMaterial& one : shippedMaterials())
      if (one.material.name == m_choice.name)
        return inServiceClass(one.material, m_serviceClass->currentText().toStdString());
  return std::nullopt;
}

void MaterialsDialog::showPage() {
  const bool ofStudy =
      m_choice.origin == MaterialOrigin::study && findMaterial(m_desk.study(), m_choice.name);
  const std::optional<Material> material = ofLibrary();
  if (ofStudy)
    m_fields->turnTo(m_choice.name);
  const QString sheet = material ? sheetOf(*material, lookOf(*this)) : tr("Choose a material, or add one.");
  if (sheet != m_sheet->text())
    m_sheet->setText(sheet);
  m_serviceRow->setVisible(material && m_choice.origin == MaterialOrigin::shipped &&
                           !material->serviceClass.empty());
  m_pages->setCurrentIndex(ofStudy ? 0 : 1);
  m_take->setVisible(!ofStudy);
  m_take->setEnabled(material.has_value());
  m_keep->setVisible(ofStudy);
  m_remove->setVisible(ofStudy);
  m_drop->setVisible(material && m_choice.origin == MaterialOrigin::own);
}

// What stands above is of the last step; only a file that does not read stays told.
void MaterialsDialog::settleMessage() {
  m_message->hide();
  const Problems& problems = m_own.problems();
  if (problems.empty())
    return;
  m_message->say(tr("Your library does not read and is left as it is (%1): %2")
                     .arg(fromUtf8(m_own.path()), shown(problems.front())),
                 Strip::Tone::wrong);
  if (problems.size() > 1)
    m_message->offer(tr("All %1 problems").arg(problems.size()), [this, problems] {
      (new ProblemList(tr("Problems in your library"), problems, this))->show();
    });
}

void MaterialsDialog::complain(const Problem& problem) {
  m_message->say(QStringList{shown(problem.what), shown(problem.mend)}.join(QLatin1Char(' ')),
                 Strip::Tone::wrong);
}

void MaterialsDialog::done(int result) {
  // The field that has the keys takes what is typed there, or refuses it, when it loses them.
  if (QWidget* focused = focusWidget())
    focused->clearFocus();
  const QStringList left = m_fields->notTaken();
  QDialog::done(result);
  if (!left.isEmpty())
    m_desk.say(left.size() == 1
                   ? tr("%1 of %2 was not taken.").arg(left.front(), fromUtf8(m_choice.name))
                   : tr("%1 and %2 more of %3 were not taken.")
                         .arg(left.front(), QString::number(left.size() - 1), fromUtf8(m_choice.name)));
}

void MaterialsDialog::open(const MaterialChoice& choice) {
  if (choice.origin != MaterialOrigin::study)
    return take();
  const MaterialKind kind = findMaterial(m_desk.study(), choice.name)->kind;
  m_fields->field(spotOf(keysOf(kind).front())).edit().setFocus(Qt::TabFocusReason);
}

void MaterialsDialog::rename(const MaterialChoice& choice) {
  if (choice.origin != MaterialOrigin::study)
    return;
  m_fields->name().edit().setFocus(Qt::OtherFocusReason);
  m_fields->name().edit().selectAll();
}

void MaterialsDialog::take() {
  const std::optional<Material> material = ofLibrary();
  if (!material)
    return;
  const std::string name = freshMaterialName(m_desk.study(), material->name);
  if (const auto problem = m_desk.request(editsThatTake(*material, name), m_desk.newCommand(),
                                          tr("%1 from the library").arg(fromUtf8(material->name))))
    return complain(*problem);
  choose({MaterialOrigin::study, name});
  if (name != material->name)
    m_message->say(tr("The study has another “%1” already; this one is “%2”.")
                       .arg(fromUtf8(material->name), fromUtf8(name)));
}

void MaterialsDialog::add(MaterialKind kind) {
  Material material;
  material.kind = kind;
  const std::string name = freshMaterialName(m_desk.study(), std::string(wordOf(kind)));
  if (const auto problem =
          m_desk.request(editsThatTake(material, name), m_desk.newCommand(), tr("new material")))
    return complain(*problem);
  m_list->filter().clear();
  choose({MaterialOrigin::study, name});
  rename(m_choice);
}

void MaterialsDialog::remove() {
  const QString name = fromUtf8(m_choice.name);
  const auto checks = checksBy(m_desk.study(), m_choice.name).size();
  if (const auto problem = m_desk.request({Remove{{Spot::material, m_choice.name, {}}}}, m_desk.newCommand(),
                                          tr("removal of %1").arg(name)))
    return complain(*problem);
  m_message->say(checks == 0   ? tr("%1 is removed.").arg(name)
                 : checks == 1 ? tr("%1 is removed, and with it the check by it.").arg(name)
                               : tr("%1 is removed, and with it the %2 checks by it.").arg(name).arg(checks));
  m_message->offer(tr("Undo"), [this] { m_desk.undoStack()->undo(); });
}

void MaterialsDialog::keep() {
  if (const auto problem = m_own.keep(*findMaterial(m_desk.study(), m_choice.name)))
    return complain(*problem);
  refresh();
  m_message->say(tr("%1 is in your library now, for every study.").arg(fromUtf8(m_choice.name)));
}

void MaterialsDialog::dropOwn() {
  const std::optional<Material> material = ofLibrary();
  if (!material)
    return;
  if (const auto problem = m_own.drop(material->name))
    return complain(*problem);
  choose({});
  m_message->say(tr("%1 is no longer in your library.").arg(fromUtf8(material->name)));
  m_message->offer(tr("Put it back"), [this, material = *material] {
    if (const auto problem = m_own.keep(material))
      return complain(*problem);
    choose({MaterialOrigin::own, material.name});
    m_message->hide();
  });
}

} // namespace planewright
