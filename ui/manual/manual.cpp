// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/manual/manual.h"

#include "ui/look/language.h"
#include "ui/look/look.h"

#include <QDir>
#include <QFile>
#include <QRegularExpression>

namespace planewright {

namespace {

QString folderOf(const QString& language) {
  return QStringLiteral(":/planewright/manual/") + language;
}

QString english() {
  return QStringLiteral("en");
}

} // namespace

ManualPlace manualPlace(const QString& written) {
  return {written.section(QLatin1Char('#'), 0, 0), written.section(QLatin1Char('#'), 1)};
}

const QStringList& manualPages() {
  static const QStringList pages = {
      QStringLiteral("first-figure"), QStringLiteral("window"),    QStringLiteral("conventions"),
      QStringLiteral("entries"),      QStringLiteral("given"),     QStringLiteral("lines"),
      QStringLiteral("drawings"),     QStringLiteral("planes"),    QStringLiteral("combinations"),
      QStringLiteral("strength"),     QStringLiteral("criteria"),  QStringLiteral("figures"),
      QStringLiteral("sheets"),       QStringLiteral("screening"), QStringLiteral("command-line"),
      QStringLiteral("files"),        QStringLiteral("keys"),      QStringLiteral("troubleshooting"),
      QStringLiteral("cautions")};
  return pages;
}

QStringList manualLanguages() {
  QStringList languages;
  for (const QString& name : QDir(folderOf({})).entryList(QDir::Dirs))
    if (QFile::exists(folderOf(name) + QStringLiteral("/cautions.html")))
      languages += name;
  return languages;
}

QString manualLanguage() {
  const QString spoken = spokenLanguage();
  return manualLanguages().contains(spoken) ? spoken : english();
}

QString manualSource(const QString& page, const QString& language) {
  QFile file(folderOf(language) + QLatin1Char('/') + page + QStringLiteral(".html"));
  return file.open(QIODevice::ReadOnly) ? QString::fromUtf8(file.readAll()) : QString();
}

QString manualTitle(const QString& page, const QString& language) {
  static const QRegularExpression heading(QStringLiteral("<h2>(.*?)</h2>"));
  QString title = heading.match(manualSource(page, language)).captured(1);
  static const QRegularExpression tags(QStringLiteral("<[^>]*>"));
  return title.remove(tags);
}

Runs manualRuns(const Text& text, const QString& language) {
  return runs(text, language == english() ? Translate() : translation());
}

QString manualWords(const Text& text, const QString& language) {
  return fromUtf8(plain(manualRuns(text, language)));
}

QStringList anchorsIn(const QString& html) {
  static const QRegularExpression anchor(QStringLiteral("<a (?:name|id)=\"([^\"]*)\""));
  QStringList names;
  for (const QRegularExpressionMatch& match : anchor.globalMatch(html))
    names += match.captured(1);
  return names;
}

} // namespace planewright
