// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/manual/manual.h"

#include <QCoreApplication>
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

// A translation of the program says the name of the folder that goes with it.
QString manualLanguage() {
  const QString wanted = QCoreApplication::translate(
      "Manual", "en", "the folder in resources/manual with the manual in this language");
  return manualLanguages().contains(wanted) ? wanted : english();
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

QStringList anchorsIn(const QString& html) {
  static const QRegularExpression anchor(QStringLiteral("<a (?:name|id)=\"([^\"]*)\""));
  QStringList names;
  for (const QRegularExpressionMatch& match : anchor.globalMatch(html))
    names += match.captured(1);
  return names;
}

} // namespace planewright
