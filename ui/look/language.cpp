// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/language.h"

#include "ui/look/look.h"

#include <QCoreApplication>
#include <QLocale>
#include <QSettings>
#include <QTranslator>

#include <algorithm>
#include <memory>

namespace planewright {

namespace {

QString key() {
  return QStringLiteral("language");
}

bool isSpoken(const QString& code) {
  return std::ranges::any_of(languages(), [&](const Language& one) { return one.code == code; });
}

/// What speak() has taken up; without an application, as on the command line, nothing else asks it.
std::vector<std::unique_ptr<QTranslator>>& spoken() {
  static std::vector<std::unique_ptr<QTranslator>> translators;
  return translators;
}

QString& spokenCode() {
  static QString code = languages().front().code;
  return code;
}

std::unique_ptr<QTranslator> catalogue(const QString& name) {
  auto translator = std::make_unique<QTranslator>();
  if (!translator->load(QStringLiteral(":/planewright/languages/") + name))
    translator.reset();
  return translator;
}

} // namespace

const std::vector<Language>& languages() {
  static const std::vector<Language> spoken = {{QStringLiteral("en"), QStringLiteral("English")},
                                               {QStringLiteral("de"), QStringLiteral("Deutsch")}};
  return spoken;
}

QString chosenLanguage() {
  const QString code = QSettings().value(key()).toString();
  return isSpoken(code) ? code : QString();
}

void chooseLanguage(const QString& code) {
  if (isSpoken(code))
    QSettings().setValue(key(), code);
  else
    QSettings().remove(key());
}

QString languageOfWindow() {
  QStringList wanted = QLocale::system().uiLanguages();
  wanted.prepend(chosenLanguage());
  for (QString& code : wanted) {
    code = code.section(QLatin1Char('-'), 0, 0);
    if (isSpoken(code))
      return code;
  }
  return languages().front().code;
}

bool speak(const QString& code) {
  if (!isSpoken(code))
    return false;
  for (const auto& before : spoken())
    QCoreApplication::removeTranslator(before.get());
  spoken().clear();
  // The toolkit's own words first: what is installed last is asked first.
  for (const QString& name : {QStringLiteral("qtbase_"), QStringLiteral("planewright_")})
    if (auto translator = catalogue(name + code)) {
      if (QCoreApplication::instance())
        QCoreApplication::installTranslator(translator.get());
      spoken().push_back(std::move(translator));
    }
  spokenCode() = code;
  return true;
}

QString spokenLanguage() {
  return spokenCode();
}

Translate translation() {
  return [](const std::string& context, const std::string& source) {
    for (const auto& translator : spoken())
      if (const QString found = translator->translate(context.c_str(), source.c_str()); !found.isEmpty())
        return found.toStdString();
    return QCoreApplication::translate(context.c_str(), source.c_str()).toStdString();
  };
}

} // namespace planewright
