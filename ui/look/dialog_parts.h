// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

class QButtonGroup;
class QHBoxLayout;
class QLabel;
class QSize;
class QToolButton;
class QVBoxLayout;
class QWidget;

namespace planewright {

constexpr int gapToBar = 8; ///< pixels between what stands in a column and its scroll bar

/// Rows under a bold heading, at the end of the page's own column.
QVBoxLayout* headedRows(QWidget& page, const QString& heading);

/// One of the buttons of which one is down, at the end of a row.
QToolButton* choiceButton(QHBoxLayout& row, QButtonGroup& group, const QString& words, bool isDown);

/// A label for sentences of a dialog, which can be copied.
QLabel* sentenceIn(QWidget& dialog);

/// Gives a dialog its first size, smaller where the screen is.
void resizeOnScreen(QWidget& dialog, const QSize& size);

/// Asks for the file to save to; empty when it is cancelled. `offered` ends with the ending that a name typed
/// without one gets; `kind` says it, as "PDF (*.pdf)".
QString askedFileToSave(QWidget& over, const QString& title, const QString& offered, const QString& kind);

/// Shows a sentence in ink, or in the colour of what is wrong.
void tell(QLabel& label, const QString& sentence, bool isWrong);

} // namespace planewright
