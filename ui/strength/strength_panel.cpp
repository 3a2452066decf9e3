// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/strength/strength_panel.h"

#include "core/strength/cautions.h"
#include "core/study/check_edits.h"
#include "core/table/check_words.h"
#include "ui/look/column_area.h"
#include "ui/look/look.h"
#include "ui/look/quiet_button.h"
#include "ui/look/steady_label.h"
#include "ui/strength/check_fields.h"
#include "ui/strength/check_list.h"
#include "ui/strength/side_by_side.h"
#include "ui/strength/utilisation_plot.h"
#include "ui/strength/verdict_block.h"

#include <QHBoxLayout>
#include <QLabel>
#include <QMenu>
#include <QMessageBox>
#include <QPainter>

#include <QVBoxLayout>

namespace planewright {

namespace {

SteadyLabel* wrappedLabel(QPalette::ColorRole role, QWidget* parent) {
  auto* label = new SteadyLabel(parent);
  label->label().setForegroundRole(role);
  label->label().setTextInteractionFlags(Qt::TextSelectableByMouse);
  return label;
}

QHBoxLayout* rowOf(std::initializer_list<QWidget*> widgets) {
  auto* row = new QHBoxLayout;
  row->setSpacing(10);
  for (QWidget* widget : widgets)
    row->addWidget(widget);
  row->addStretch();
  return row;
}

QString lines(const std::vector<Text>& texts) {
  QStringList all;
  for (const Text& text : texts)
    all << shownRich(text);
  return all.join(QStringLiteral("<br>"));
}

} // namespace

StrengthPanel::StrengthPanel(Desk& desk, QWidget* parent)
    : QWidget(parent), m_desk(desk), m_scroll(new ColumnArea(this)), m_verdict(new VerdictBlock(desk, this)),
      m_checks(new CheckList(desk, this)), m_add(new QuietButton(tr("Add a check"), Role::focus, this)),
      m_remove(new QuietButton(tr("Remove"), Role::focus, this)),
      m_side(new QuietButton(tr("All criteria side by side"), Role::focus, this)),
      m_fields(new CheckFields(
          desk, [this] { return m_checks->selected(); }, this)),
      m_mode(wrappedLabel(QPalette::WindowText, this)), m_governs(new QuietButton({}, Role::focus, this)),
      m_plot(new Later<UtilisationPlot>([this](QWidget* place) { return newPlot(place); }, this)),
      m_scale(new QuietButton({}, Role::focus, this)), m_sentences(wrappedLabel(QPalette::WindowText, this)),
      m_cautions(wrappedLabel(QPalette::PlaceholderText, this)),
      m_more(new QuietButton(tr("More"), Role::focus, this)) {
  build();
  connect(m_add, &QAbstractButton::clicked, this, [this] {
    if (m_desk.study().materials.empty())
      emit materialsWanted();
    else
      m_add->showMenu();
  });
  connect(m_add->menu(), &QMenu::aboutToShow, this, &StrengthPanel::listMaterials);
  connect(m_remove, &QAbstractButton::clicked, this, &StrengthPanel::removeCheck);
  connect(m_checks, &CheckList::removalWanted, this, &StrengthPanel::removeCheck);
  connect(m_checks, &CheckList::selectionMoved, this, [this] {
    m_fields->refresh();
    if (m_plot->isMade())
      plot().refresh();
    refresh();
  });
  connect(m_side, &QAbstractButton::clicked, this, &StrengthPanel::showSideBySide);
  connect(m_governs, &QAbstractButton::clicked, this, &StrengthPanel::showGoverning);
  connect(m_scale, &QAbstractButton::clicked, this, [this] {
    plot().setLogarithmic(!plot().isLogarithmic());
    refresh();
  });
  connect(m_more, &QAbstractButton::clicked, this, &StrengthPanel::showLimits);
  connect(&m_desk, &Desk::changed, this, &StrengthPanel::refreshAdd);
  connect(&m_desk, &Desk::judgedAnew, this, &StrengthPanel::refresh);
  refreshAdd();
  refresh();
}

UtilisationPlot* StrengthPanel::newPlot(QWidget* place) {
  auto* plot = new UtilisationPlot(
      m_desk, [this] { return m_checks->selected(); }, place);
  connect(plot, &UtilisationPlot::reachChanged, this, &StrengthPanel::refresh);
  return plot;
}

UtilisationPlot& StrengthPanel::plot() const {
  return m_plot->page();
}

void StrengthPanel::build() {
  auto* heading = new QLabel(tr("Strength"), this);
  QFont bold = heading->font();
  bold.setBold(true);
  heading->setFont(bold);
  m_add->setMenu(new QMenu(m_add));
  m_add->setPopupMode(QToolButton::DelayedPopup);
  for (QuietButton* button : {m_add, m_remove, m_side, m_governs, m_scale, m_more})
    button->setFocusPolicy(Qt::TabFocus);

  auto* inside = new QWidget(m_scroll);
  auto* rows = new QVBoxLayout(inside);
  rows->setContentsMargins(12, 4, 12, 8);
  rows->setSpacing(8);
  rows->addWidget(heading);
  rows->addWidget(m_verdict);
  rows->addWidget(m_checks);
  rows->addLayout(rowOf({m_add, m_remove, m_side}));
  rows->addWidget(m_fields);
  rows->addWidget(m_mode);
  rows->addLayout(rowOf({m_governs}));
  rows->addWidget(m_plot);
  m_plot->hide();
  rows->addLayout(rowOf({m_scale}));
  rows->addWidget(m_sentences);
  rows->addWidget(m_cautions);
  rows->addLayout(rowOf({m_more}));
  rows->addStretch();
  m_scroll->setWidget(inside);
  auto* all = new QVBoxLayout(this);
  all->setContentsMargins(0, 0, 0, 0);
  all->addWidget(m_scroll);
  setAutoFillBackground(true);
  setBackgroundRole(QPalette::AlternateBase);
  setAccessibleName(tr("Strength"));
  setProperty("helpPlace", "strength#verdict");
  setProperty("areaKeys", tr("Up/Down choose a check, Del removes it; on the plot Left/Right turn the line"));
}

QString StrengthPanel::sentences() const {
  return m_sentences->text();
}
QString StrengthPanel::cautions() const {
  return m_cautions->text();
}
QString StrengthPanel::governs() const {
  return m_governs->text();
}

void StrengthPanel::listMaterials() {
  QMenu& menu = *m_add->menu();
  menu.clear();
  for (const Material& material : m_desk.study().materials)
    menu.addAction(fromUtf8(material.name), this, [this, name = material.name] { addCheck(name); });
  menu.addSeparator();
  menu.addAction(tr("Materials…"), this, &StrengthPanel::materialsWanted);
}

void StrengthPanel::addCheck(const std::string& material) {
  const Point& point = shownPoint(m_desk.study());
  const std::optional<Edits> edits = insertionOfCheck(m_desk.study(), point, material);
  if (!edits) {
    const bool onPlane = isPlaneKind(findMaterial(m_desk.study(), material)->kind);
    m_desk.say(onPlane
                   ? tr("Watch a plane first: %1 is checked on a plane.").arg(fromUtf8(material))
                   : tr("Give the point a line first: %1 is checked along a line.").arg(fromUtf8(material)));
    return;
  }
  if (const auto problem = m_desk.request(*edits, m_desk.newCommand(), tr("new check"))) {
    m_desk.say(shown(*problem));
    return;
  }
  m_checks->select(shownPoint(m_desk.study()).checks.back().id);
}

void StrengthPanel::removeCheck() {
  const std::optional<std::size_t> index = m_checks->selected();
  if (!index)
    return;
  const Readout& readout = m_desk.readout();
  const Place place{Spot::check, readout.point, readout.checks[*index].id};
  if (const auto problem = m_desk.request({Remove{place}}, m_desk.newCommand(), tr("removal of a check")))
    m_desk.say(shown(*problem));
}

void StrengthPanel::refreshAdd() {
  m_add->setText(m_desk.study().materials.empty() ? tr("Materials…") : tr("Add a check"));
}

void StrengthPanel::refreshGoverns() {
  const Readout& readout = m_desk.readout();
  const std::optional<std::size_t> check = m_checks->selected();
  const Verdict verdict = check ? verdictOfCheck(readout, *check) : Verdict();
  const std::optional<JudgedCheck>& told = verdict.governing ? verdict.governing : verdict.unjudged;
  m_mode->setVisible(told.has_value());
  m_governs->setVisible(told.has_value());
  if (!told)
    return;
  const CheckReading& reading = readingOf(readout, *told);
  QStringList mode;
  if (reading.worst.mode && !reading.problem)
    mode << tr("Mode: %1.").arg(shown(labelOf(*reading.worst.mode)));
  if (reading.hasFactor)
    mode << shown(factorSentence(reading.factor));
  m_mode->setText(mode.join(QLatin1Char(' ')));
  const bool isShown = told->state == readout.shown;
  const QString combination = fromUtf8(readout.states[told->state].combination);
  const QString governs = !verdict.governing ? tr("Not judged: %1")
                          : verdict.unjudged ? tr("Governs among those judged: %1")
                                             : tr("Governs: %1");
  m_governs->setText((isShown ? tr("%1 (shown)").arg(governs) : governs).arg(combination));
  m_governs->setEnabled(!isShown);
}

void StrengthPanel::showGoverning() {
  const std::optional<std::size_t> check = m_checks->selected();
  if (!check)
    return;
  const Verdict verdict = verdictOfCheck(m_desk.readout(), *check);
  if (const std::optional<JudgedCheck>& told = verdict.governing ? verdict.governing : verdict.unjudged)
    m_desk.show(m_desk.readout().point, m_desk.readout().states[told->state].combination);
}

// The best direction over all combinations takes too long to be sought where nobody looks.
void StrengthPanel::refresh() {
  if (!isVisible())
    return;
  const Readout& readout = m_desk.readout();
  const std::optional<std::size_t> check = m_checks->selected();
  for (QWidget* widget : std::initializer_list<QWidget*>{m_remove, m_side, m_sentences})
    widget->setVisible(check.has_value());
  refreshGoverns();
  const bool hasPlot = check && readout.checks[*check].band;
  m_plot->setVisible(hasPlot);
  m_scale->setVisible(hasPlot && plot().reachesFar());
  if (hasPlot)
    m_scale->setText(plot().isLogarithmic() ? tr("Scale: logarithmic") : tr("Scale: 0 to 2"));
  if (!check) {
    m_cautions->setText(shown(limitsOfPointChecks(MaterialKind::generic).front()));
    return;
  }
  const CheckSetup& setup = readout.checks[*check];
  const std::optional<DirectionsOfCheck>& directions = m_desk.allRound(*check).directions();
  m_sentences->setText(directions ? lines(sentencesOf(setup, *directions)) : QString());
  m_sentences->setVisible(directions.has_value());
  m_cautions->setText(lines(cautionsOf(readout, *check)));
}

void StrengthPanel::showSideBySide() {
  if (const std::optional<std::size_t> check = m_checks->selected())
    (new SideBySideDialog(m_desk, m_desk.readout().checks[*check].id, this))->show();
}

void StrengthPanel::showLimits() {
  const std::optional<std::size_t> check = m_checks->selected();
  const MaterialKind kind = check ? m_desk.readout().checks[*check].strengths.kind : MaterialKind::generic;
  auto* box = new QMessageBox(QMessageBox::NoIcon, tr("What a check at a point does not see"),
                              lines(limitsOfPointChecks(kind)), QMessageBox::Close, this);
  box->setProperty("helpPlace", "cautions#not-seen");
  box->setTextFormat(Qt::RichText);
  box->setAttribute(Qt::WA_DeleteOnClose);
  box->open();
}

void StrengthPanel::showEvent(QShowEvent* event) {
  QWidget::showEvent(event);
  refresh();
}

void StrengthPanel::paintEvent(QPaintEvent*) {
  QPainter(this).fillRect(rect(), palette().color(QPalette::AlternateBase));
}

} // namespace planewright
