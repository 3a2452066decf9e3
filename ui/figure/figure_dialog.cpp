// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/figure/figure_dialog.h"

#include "ui/figure/figure_options.h"
#include "ui/figure/figure_page.h"
#include "ui/figure/figure_sharing.h"
#include "ui/figure/points_dialog.h"
#include "ui/files/file_bytes.h"
#include "ui/files/folders.h"
#include "ui/look/column_area.h"
#include "ui/look/dialog_parts.h"
#include "ui/look/look.h"

#include <QButtonGroup>
#include <QClipboard>
#include <QDir>
#include <QFileInfo>
#include <QGuiApplication>
#include <QHBoxLayout>
#include <QLabel>
#include <QLineEdit>
#include <QMessageBox>
#include <QMimeData>
#include <QPushButton>
#include <QScreen>
#include <QScrollArea>
#include <QSettings>
#include <QShowEvent>
#include <QToolButton>
#include <QVBoxLayout>

namespace planewright {

FigureDialog::FigureDialog(Desk& desk, QWidget* parent) : QDialog(parent), m_desk(desk) {
  setWindowTitle(tr("Arrange figure"));
  setProperty("helpPlace", "figures#arrange");
  setModal(false);
  build();
  connect(&m_desk, &Desk::changed, this, [this] {
    if (isVisible())
      refresh();
  });
  connect(m_options, &FigureOptions::changed, this, &FigureDialog::arrange);
}

void FigureDialog::build() {
  constexpr QSize first(980, 760);
  m_options = new FigureOptions(rememberedFigure(QSettings()), this);
  auto* options = new ColumnArea(this);
  options->setWidget(m_options);
  m_sentence = sentenceIn(*this);
  auto* middle = new QHBoxLayout;
  middle->setSpacing(14);
  middle->addWidget(options);
  middle->addLayout(previewColumn(), 1);
  auto* column = new QVBoxLayout(this);
  column->addLayout(middle, 1);
  column->addWidget(m_sentence);
  column->addLayout(footer());
  resizeOnScreen(*this, first);
}

QVBoxLayout* FigureDialog::previewColumn() {
  m_page = new FigurePage;
  m_scroll = new QScrollArea(this);
  m_scroll->setAccessibleName(tr("Preview"));
  m_scroll->setWidget(m_page);
  m_scroll->setWidgetResizable(true);
  m_scroll->setFrameShape(QFrame::NoFrame);
  auto* zooms = new QHBoxLayout;
  auto* group = new QButtonGroup(this);
  const auto add = [&](const QString& words, FigurePage::Zoom zoom) {
    auto* button = choiceButton(*zooms, *group, words, zoom == FigurePage::Zoom::fit);
    connect(button, &QToolButton::clicked, this, [this, zoom] { m_page->setZoom(zoom); });
  };
  zooms->addStretch();
  add(tr("Fit"), FigurePage::Zoom::fit);
  add(tr("100 %"), FigurePage::Zoom::trueSize);
  auto* column = new QVBoxLayout;
  column->addLayout(zooms);
  column->addWidget(m_scroll, 1);
  return column;
}

QPushButton* FigureDialog::addButton(QHBoxLayout& row, const QString& words, void (FigureDialog::*act)()) {
  auto* button = new QPushButton(words, this);
  button->setAutoDefault(false);
  row.addWidget(button);
  m_needPicture << button;
  connect(button, &QPushButton::clicked, this, act);
  return button;
}

QHBoxLayout* FigureDialog::footer() {
  auto* row = new QHBoxLayout;
  auto* label = new QLabel(tr("File name"), this);
  m_name = new QLineEdit(this);
  m_ending = new QLabel(this);
  label->setBuddy(m_name);
  row->addWidget(label);
  row->addWidget(m_name, 1);
  row->addWidget(m_ending);
  addButton(*row, tr("Save"), &FigureDialog::save)->setDefault(true);
  addButton(*row, tr("Save as…"), &FigureDialog::saveAs);
  addButton(*row, tr("Copy"), &FigureDialog::copy);
  addButton(*row, tr("Print…"), &FigureDialog::print);
  m_allPoints = new QPushButton(tr("All points…"), this);
  m_allPoints->setAutoDefault(false);
  row->addWidget(m_allPoints);
  connect(m_allPoints, &QPushButton::clicked, this, &FigureDialog::writeAllPoints);
  return row;
}

void FigureDialog::setStudyFile(const QString& path) {
  m_studyFile = path;
  if (isVisible())
    refresh();
}

void FigureDialog::showEvent(QShowEvent* event) {
  QDialog::showEvent(event);
  if (!event->spontaneous())
    m_options->endSendingOutside();
  refresh();
}

void FigureDialog::arrange() {
  QSettings settings;
  if (!m_options->problem())
    rememberFigure(settings, m_options->remembered());
  refresh();
}

Result<Picture> FigureDialog::picture() const {
  if (m_options->problem())
    return tl::unexpected(*m_options->problem());
  return figureFor(m_desk, m_options->settings(), m_studyFile, m_options->caption());
}

void FigureDialog::refresh() {
  const FigureSettings& settings = m_options->settings();
  const Result<Picture> made = picture();
  m_page->setPicture(made ? std::optional(*made) : std::nullopt,
                     settings.mono ? Palette::mono : Palette::paper);
  for (QPushButton* button : m_needPicture)
    button->setEnabled(made.has_value());
  m_allPoints->setEnabled(!m_options->problem());
  m_ending->setText(QStringLiteral(".") + QString::fromLatin1(endingOf(settings.format)));
  if (!m_name->isModified()) {
    m_name->setText(figureName(m_desk.readout(), m_studyFile));
    m_name->setCursorPosition(0);
  }
  if (made)
    say(givenUp(*made), false);
  else
    say(shown(made.error().what) + QLatin1Char(' ') + shown(made.error().mend), true);
}

void FigureDialog::say(const QString& sentence, bool isWrong) {
  tell(*m_sentence, sentence, isWrong);
}

QString FigureDialog::givenUp(const Picture& picture) const {
  QStringList names;
  for (const std::string& label : picture.shortened)
    names << fromUtf8(label);
  names.removeDuplicates();
  if (names.isEmpty())
    return {};
  const QString list = names.join(QStringLiteral(", "));
  return m_options->settings().parts.planes
             ? tr("No room beside the drawings for the values of %1: they stand in the table.").arg(list)
             : tr("No room beside the drawings for the values of %1; the table of planes has them.")
                   .arg(list);
}

QString FigureDialog::offeredPath() const {
  return outputFolder(m_studyFile) + QLatin1Char('/') + m_name->text().trimmed() + m_ending->text();
}

Result<void> FigureDialog::saveTo(const QString& path) {
  const Result<Picture> made = picture();
  if (!made)
    return tl::unexpected(made.error());
  const Result<QByteArray> bytes = fileBytes(*made, m_options->settings(), m_desk.study(), m_desk.readout());
  if (!bytes)
    return tl::unexpected(bytes.error());
  return writeAside(path.toStdString(), bytes->toStdString());
}

void FigureDialog::saveAndTell(const QString& path) {
  const Result<void> saved = saveTo(path);
  if (!saved) {
    say(shown(saved.error()), true);
    return;
  }
  const QString file = QDir::toNativeSeparators(path);
  const QString sentence = m_options->settings().carriesStudy
                               ? tr("Saved as %1, with the study inside.").arg(file)
                               : tr("Saved as %1, without the study.").arg(file);
  say(sentence, false);
  m_desk.say(sentence);
}

void FigureDialog::save() {
  const QString path = offeredPath();
  if (m_studyFile.isEmpty() || m_name->text().trimmed().isEmpty()) {
    saveAs();
    return;
  }
  const auto question = tr("%1 exists. Replace it?").arg(QDir::toNativeSeparators(path));
  if (!QFileInfo::exists(path) ||
      QMessageBox::question(this, windowTitle(), question, QMessageBox::Yes | QMessageBox::Cancel,
                            QMessageBox::Cancel) == QMessageBox::Yes)
    saveAndTell(path);
}

void FigureDialog::saveAs() {
  const QString ending = m_ending->text();
  const QString path = askedFileToSave(*this, tr("Save figure"), offeredPath(),
                                       tr("%1 figure (*%2)").arg(ending.mid(1).toUpper(), ending));
  if (!path.isEmpty())
    saveAndTell(path);
}

void FigureDialog::copy() {
  const Result<Picture> made = picture();
  if (!made)
    return;
  Result<std::unique_ptr<QMimeData>> mime = mimeOf(*made, m_options->settings());
  if (!mime) {
    say(shown(mime.error()), true);
    return;
  }
  QGuiApplication::clipboard()->setMimeData(mime->release());
  say(tr("The figure is on the clipboard, as SVG, PDF and pixels."), false);
}

void FigureDialog::print() {
  const Result<Picture> made = picture();
  const Result<QString> printed =
      made ? printAsked(*made, m_options->settings(), this) : tl::unexpected(made.error());
  if (!printed)
    say(shown(printed.error()), true);
  else if (!printed->isEmpty())
    say(*printed, false);
}

void FigureDialog::writeAllPoints() {
  FigureBatch arranged;
  arranged.study = m_desk.study();
  arranged.settings = m_options->settings();
  arranged.studyFile = m_studyFile;
  arranged.caption = m_options->caption();
  auto* dialog = new PointsDialog(m_desk, std::move(arranged), askExisting, this);
  dialog->setAttribute(Qt::WA_DeleteOnClose);
  dialog->open();
}

} // namespace planewright
