// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/figure/figure_settings.h"

#include <QByteArray>

class QMimeData;
class QWidget;

namespace planewright {

/// The figure of a readout of the study as the settings arrange it. `studyFile` is the file that the study
/// was saved to, or empty.
Result<Picture> figureFor(const Study& study, const Readout& readout, const FigureSettings& settings,
                          const QString& studyFile, const QString& caption = {});
/// The same of what is shown.
Result<Picture> figureFor(const Desk& desk, const FigureSettings& settings, const QString& studyFile,
                          const QString& caption = {});

/// The picture as a file of the settings' format. It carries the study, with the readout that it shows, where
/// the settings say so; what goes to the clipboard or a printer never does.
Result<QByteArray> fileBytes(const Picture& picture, const FigureSettings& settings, const Study& study,
                             const Readout& readout);

/// The picture for the clipboard: SVG, PDF and a pixel image, so that a document takes the best it knows.
Result<std::unique_ptr<QMimeData>> mimeOf(const Picture& picture, const FigureSettings& settings);

/// What is said of a figure that was printed at this part of its true size.
QString printedWords(double part);

/// Asks for a printer and prints the picture, at true size where the paper holds it; what is to be said about
/// it, nothing when the user thinks better of it.
Result<QString> printAsked(const Picture& picture, const FigureSettings& settings, QWidget* parent);

/// Study, point and combination joined to the name of a file, without an ending.
QString figureName(const Readout& readout, const QString& studyFile);

/// Puts the figure, arranged as the last one was, on the clipboard (Edit, Copy figure).
Result<void> copyFigure(const Desk& desk, const QString& studyFile);

/// Prints the figure, arranged as the last one was (File, Print).
Result<QString> printFigure(const Desk& desk, const QString& studyFile, QWidget* parent);

} // namespace planewright
