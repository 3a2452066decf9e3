// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

#include <vector>

namespace planewright {

/// A language that the program speaks: its code (ISO 639-1) and how it calls itself.
struct Language {
  QString code;
  QString name;
};
/// English first, which the texts of the sources are written in.
const std::vector<Language>& languages();

/// The code that is chosen in the settings; empty where that of the system counts.
QString chosenLanguage();
/// Counts from the next start on.
void chooseLanguage(const QString& code);

/// The language of the window: the chosen one, else the first of the system's that the program speaks, else
/// English.
QString languageOfWindow();

/// Has this process speak a language: what translation() gives, and windows that are made from now on. Of a
/// language that the program does not speak nothing changes, and the answer is false.
bool speak(const QString& code);
/// What speak() was last told; English before.
QString spokenLanguage();

} // namespace planewright
