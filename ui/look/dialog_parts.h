// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

class QButtonGroup;
class QHBoxLayout;
class QLabel;
class QToolButton;
class QVBoxLayout;
class QWidget;

namespace planewright {

/// Rows under a bold heading, at the end of the page's own column.
QVBoxLayout* headedRows(QWidget& page, const QString& heading);

/// One of the buttons of which one is down, at the end of a row.
QToolButton* choiceButton(QHBoxLayout& row, QButtonGroup& group, const QString& words, bool isDown);

/// Shows a sentence in ink, or in the colour of what is wrong.
void tell(QLabel& label, const QString& sentence, bool isWrong);

} // namespace planewright
