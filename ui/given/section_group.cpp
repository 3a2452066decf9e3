// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/section_group.h"

#include "core/study/case_sources.h"
#include "core/study/fibre_of_state.h"
#include "core/study/section_edits.h"
#include "ui/entry/draft_edit.h"
#include "ui/given/echoes.h"
#include "ui/given/section_view.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QMenu>
#include <QVBoxLayout>

namespace planewright {

namespace {

constexpr int longestName = 120; ///< px of a section's name beside the heading

QHBoxLayout* rowOf(std::initializer_list<QWidget*> widgets) {
  auto* row = new QHBoxLayout;
  row->setSpacing(8);
  for (QWidget* widget : widgets)
    row->addWidget(widget);
  row->addStretch();
  return row;
}

/// "2.turn" is "ψ_{2}": the number of the block goes down.
Text captionOf(SectionShape shape, const std::string& key) {
  const SizeKind* kind = sizeOfKey(shape, key);
  if (!kind)
    return verbatim(key);
  if (shape != SectionShape::built)
    return kind->symbol;
  return symbol("%1_{%2}").with(kind->symbol).with(key.substr(0, key.find('.')));
}

/// A number does not part from its unit.
std::string onOneLine(const std::string& quantity) {
  return fromUtf8(quantity).replace(QLatin1Char(' '), QChar(QChar::Nbsp)).toStdString();
}

} // namespace

SectionGroup::SectionGroup(Desk& desk, QWidget* parent)
    : FoldGroup(tr("Section"), Role::ink, parent), m_desk(desk),
      m_choice(new QuietButton({}, Role::focus, this)), m_shape(new QuietButton({}, Role::focus, this)),
      m_side(new QuietButton({}, Role::focus, this)),
      m_ready(new QuietButton(tr("Ready places"), Role::focus, this)),
      m_worst(new QuietButton(tr("Worst fibre"), Role::focus, this)),
      m_addBlock(new QuietButton(tr("Add a block"), Role::focus, this)),
      m_dropBlock(new QuietButton(tr("Remove the last"), Role::focus, this)), m_sizeRows(new QWidget(this)),
      m_rest(new QWidget(this)), m_drawn(new QLabel(m_rest)), m_properties(new QLabel(m_rest)),
      m_view(new SectionView(desk, m_rest)) {
  setProperty("helpPlace", "given#section");
  buildButtons();
  body().addLayout(rowOf({m_shape}));
  auto* sizes = new QVBoxLayout(m_sizeRows);
  sizes->setContentsMargins(0, 0, 0, 0);
  sizes->setSpacing(4);
  body().addWidget(m_sizeRows);
  auto* rest = new QVBoxLayout(m_rest);
  rest->setContentsMargins(0, 0, 0, 0);
  rest->setSpacing(6);
  rest->addLayout(rowOf({m_addBlock, m_dropBlock}));
  buildPlaces();
  buildView();
  body().addWidget(m_rest);
  connect(&m_desk, &Desk::changed, this, &SectionGroup::refresh);
  refresh();
}

void SectionGroup::buildButtons() {
  auto* choice = new QMenu(m_choice);
  m_choice->setMenu(choice);
  m_choice->setAccessibleName(tr("section of the point"));
  setCorner(m_choice);
  connect(choice, &QMenu::aboutToShow, this, &SectionGroup::listSections);
  listSections();
  auto* shapes = new QMenu(m_shape);
  for (const Named<SectionShape>& row : namesOf<SectionShape>())
    shapes->addAction(shown(row.label), this, [this, shape = row.value] { reshape(shape); });
  m_shape->setMenu(shapes);
  m_shape->setAccessibleName(tr("shape of the section"));
  auto* sides = new QMenu(m_side);
  for (const Named<View>& row : namesOf<View>())
    sides->addAction(shown(row.label), this, [this, view = row.value] {
      ask({Type{{Spot::fibreView, shownPoint(m_desk.study()).name, {}}, std::string(wordOf(view))}},
          tr("side from which the fibre is seen"));
    });
  m_side->setMenu(sides);
  m_side->setAccessibleName(tr("side from which the fibre is seen"));
  auto* ready = new QMenu(m_ready);
  m_ready->setMenu(ready);
  connect(ready, &QMenu::aboutToShow, this, &SectionGroup::listPlaces);
  auto* worst = new QMenu(m_worst);
  m_worst->setMenu(worst);
  connect(worst, &QMenu::aboutToShow, this, &SectionGroup::listWorst);
  connect(m_addBlock, &QAbstractButton::clicked, this,
          [this] { ask(editsThatAddBlock(m_desk.study(), section()->name), tr("new block")); });
  connect(m_dropBlock, &QAbstractButton::clicked, this,
          [this] { ask(editsThatDropBlock(m_desk.study(), section()->name), tr("removal of a block")); });
}

void SectionGroup::buildPlaces() {
  const auto add = [this](Spot spot, const QString& meaning) {
    EntryBinding binding = boundTo([spot](const Study& study) {
      return Place{spot, shownPoint(study).name, {}};
    });
    binding.echo = [spot](const Study& study, const Readout&, const std::string& typed) {
      return echoOfValue(entryKindOf(study, spot), typed);
    };
    auto* field =
        new EntryField(m_desk, std::move(binding), {planewright::rowOf(spot).label, meaning}, m_rest);
    field->caption().setFixedWidth(fontMetrics().horizontalAdvance(QStringLiteral("bbotx")));
    m_rest->layout()->addWidget(field);
    m_places += field;
  };
  add(Spot::fibreY, tr("height of the fibre over the centroid"));
  add(Spot::fibreZ, tr("place of the fibre beside the centroid, towards the near face"));
}

void SectionGroup::buildView() {
  auto* rest = static_cast<QVBoxLayout*>(m_rest->layout());
  rest->addLayout(rowOf({m_ready, m_worst}));
  rest->addLayout(rowOf({m_side}));
  m_drawn->setWordWrap(true);
  m_drawn->setTextFormat(Qt::PlainText);
  m_drawn->setForegroundRole(QPalette::PlaceholderText);
  rest->addWidget(m_drawn);
  rest->addWidget(m_view);
  m_properties->setWordWrap(true);
  m_properties->setForegroundRole(QPalette::PlaceholderText);
  rest->addWidget(m_properties);
}

QList<QWidget*> SectionGroup::buttons() const {
  return {m_choice, m_shape, m_addBlock, m_dropBlock, m_ready, m_worst, m_side, m_view};
}

const TypedSection* SectionGroup::section() const {
  const Point& point = shownPoint(m_desk.study());
  return point.fibre ? findSection(m_desk.study(), point.fibre->section) : nullptr;
}

void SectionGroup::ask(const Edits& edits, const QString& what) {
  if (const auto problem = m_desk.request(edits, m_desk.newCommand(), what))
    m_desk.say(shown(*problem));
}

void SectionGroup::listSections() {
  QMenu* menu = m_choice->menu();
  menu->clear();
  const auto give = [this](const std::string& name) {
    ask(editsThatGiveFibre(m_desk.study(), shownPoint(m_desk.study()).name, name),
        tr("section of the point"));
  };
  for (const TypedSection& one : m_desk.study().sections)
    menu->addAction(nameForMenu(fromUtf8(one.name)), this, [give, name = one.name] { give(name); });
  menu->addSeparator();
  menu->addAction(tr("new section"), this, [this, give] { give(freshSectionName(m_desk.study())); });
  QAction* none = menu->addAction(tr("no section"), this, [this] {
    ask({Remove{{Spot::fibre, shownPoint(m_desk.study()).name, {}}}},
        tr("removal of the section of the point"));
  });
  none->setEnabled(section());
}

void SectionGroup::listPlaces() {
  m_ready->menu()->clear();
  const TypedSection* own = section();
  const Results<SectionModel> model = own ? modelOf(m_desk.study(), *own) : Results<SectionModel>();
  if (!own || !model)
    return;
  for (const NamedFibre& ready : readyFibres(*model))
    m_ready->menu()->addAction(shown(ready.name), this, [this, fibre = ready.fibre] {
      ask(editsThatPlaceFibre(m_desk.study(), shownPoint(m_desk.study()).name, fibre),
          tr("place of the fibre"));
    });
}

void SectionGroup::listWorst() {
  QMenu* menu = m_worst->menu();
  menu->clear();
  const Study& study = m_desk.study();
  const StateReading& state = m_desk.readout().state();
  const std::optional<LoadedSection> loaded = loadedSectionOf(study, m_desk.readout(), state);
  const Result<WorstFibres> worst =
      loaded ? worstFibresOf(*loaded) : Result<WorstFibres>(tl::unexpect, Problem{});
  if (!worst) {
    menu->addAction(loaded ? shown(worst.error().what) : tr("The point has no section."))->setEnabled(false);
    return;
  }
  const auto length = [units = writtenUnitsOf(study)](double value) {
    return fromUtf8(units.shown(value, dimension::length));
  };
  const auto add = [&](const QString& words, const WorstFibre& one) {
    menu->addAction(words.arg(length(one.fibre.y), length(one.fibre.z),
                              fromUtf8(stressFormOf(study, state).withUnit(one.measure))) +
                        (one.isPartial ? tr(" (where theory gives the shear)") : QString()),
                    this, [this, fibre = readablePlace(study, *loaded, one.fibre)] {
                      ask(editsThatPlaceFibre(m_desk.study(), shownPoint(m_desk.study()).name, fibre),
                          tr("place of the fibre"));
                    });
  };
  add(tr("greatest tension σ₁: y = %1, z = %2, %3"), worst->principal);
  add(tr("greatest shear in the plane: y = %1, z = %2, %3"), worst->shear);
}

void SectionGroup::reshape(SectionShape shape) {
  if (const TypedSection* own = section())
    ask(editsThatReshape(m_desk.study(), own->name, shape), tr("shape of the section"));
}

void SectionGroup::addSize(const std::string& key) {
  const std::string name = section()->name;
  const SectionShape shape = section()->shape;
  EntryBinding binding = boundTo([name, key](const Study&) { return Place{Spot::size, name, key}; });
  binding.edits = [name, key](const Study& study, const std::string& typed) {
    return editsThatResize(study, {Spot::size, name, key}, typed);
  };
  binding.echo = [name, key](const Study& study, const Readout&, const std::string& typed) {
    return echoOfValue(entryKindOf(study, Place{Spot::size, name, key}), typed);
  };
  const SizeKind* kind = sizeOfKey(shape, key);
  auto* field =
      new EntryField(m_desk, std::move(binding),
                     {captionOf(shape, key), kind ? shown(kind->meaning) : fromUtf8(key)}, m_sizeRows);
  field->caption().setFixedWidth(fontMetrics().horizontalAdvance(QStringLiteral("bbotx")));
  m_sizeRows->layout()->addWidget(field);
  field->show();
  m_sizes += field;
}

// Fields are made anew only where other sizes stand here than before, so that typing in one keeps it.
void SectionGroup::rebuildSizes() {
  const TypedSection* own = section();
  std::string wanted;
  if (own) {
    wanted = own->name;
    for (const TypedSize& size : own->sizes)
      wanted += "\n" + size.key;
  }
  if (wanted == m_builtFor)
    return;
  m_builtFor = wanted;
  for (EntryField* field : m_sizes) {
    keepKeys(*field, *m_choice);
    field->hide();
    field->deleteLater();
  }
  m_sizes.clear();
  if (own)
    for (const TypedSize& size : own->sizes)
      addSize(size.key);
  Q_EMIT fieldsChanged();
}

// As rich text.
QString SectionGroup::properties() const {
  const TypedSection* own = section();
  const Results<SectionModel> model = own ? modelOf(m_desk.study(), *own) : Results<SectionModel>();
  if (!own || !model || model->isTabled())
    return {};
  const WrittenUnits units = writtenUnitsOf(m_desk.study());
  return shownRich(PW_TEXT("Given", "A = %1, I_{z} = %2, I_{y} = %3")
                       .with(onOneLine(units.shown(model->properties.A, dimension::area)))
                       .with(onOneLine(units.shown(model->properties.Iz, dimension::secondMoment)))
                       .with(onOneLine(units.shown(model->properties.Iy, dimension::secondMoment))));
}

void SectionGroup::refresh() {
  const TypedSection* own = section();
  const Point& point = shownPoint(m_desk.study());
  rebuildSizes();
  const QString name = own ? fromUtf8(own->name) : tr("no section");
  m_choice->setText(m_choice->fontMetrics().elidedText(name, Qt::ElideRight, longestName));
  m_choice->setToolTip(name);
  m_choice->updateGeometry();
  if (!own)
    for (const QWidget* going : std::initializer_list<QWidget*>{m_shape, m_rest})
      keepKeys(*going, *m_choice);
  m_shape->setVisible(own);
  m_sizeRows->setVisible(own);
  m_rest->setVisible(own);
  const bool isBuilt = own && own->shape == SectionShape::built;
  m_addBlock->setVisible(isBuilt);
  m_dropBlock->setVisible(isBuilt);
  m_drawn->setText(tr("Drawn for %1, which is shown.").arg(fromUtf8(m_desk.readout().state().combination)));
  m_drawn->setVisible(own && own->shape != SectionShape::tabled);
  m_view->setVisible(own && own->shape != SectionShape::tabled);
  m_worst->setVisible(own && own->shape != SectionShape::tabled);
  m_ready->setVisible(own && own->shape != SectionShape::tabled);
  if (own) {
    m_shape->setText(shown(labelOf(own->shape)));
    m_shape->updateGeometry();
    m_side->setText(point.fibre->view == View::side ? tr("seen from the side") : tr("seen from the top"));
    m_side->setToolTip(shown(labelOf(point.fibre->view)));
    m_side->updateGeometry();
  }
  const QString words = properties();
  m_properties->setText(words);
  m_properties->setVisible(!words.isEmpty());
  setSummary(own ? tr("%1, y = %2").arg(fromUtf8(own->name), fromUtf8(point.fibre->y)) : tr("no section"));
}

} // namespace planewright
