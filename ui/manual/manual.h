// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/text.h"

#include <QString>
#include <QStringList>

namespace planewright {

/// A place in the manual is written "page" or "page#anchor", as in its links: "lines#slopes".
struct ManualPlace {
  QString page;
  QString anchor;
  bool operator==(const ManualPlace&) const = default;
};
ManualPlace manualPlace(const QString& written);

/// The names of the pages, in the order in which they are read.
const QStringList& manualPages();

/// The languages that the program carries the manual in, and the one that the program speaks; English where
/// the manual is not there in it.
QStringList manualLanguages();
QString manualLanguage();

/// A page as it stands in resources/manual: well-formed HTML that begins with its title. Empty for a page
/// that is not there.
QString manualSource(const QString& page, const QString& language);
/// The words of its first heading.
QString manualTitle(const QString& page, const QString& language);
/// A text of the program as a page of this language has it: the manual does not mix languages.
Runs manualRuns(const Text& text, const QString& language);
QString manualWords(const Text& text, const QString& language);
/// The names of all anchors in HTML, in their order.
QStringList anchorsIn(const QString& html);

} // namespace planewright
