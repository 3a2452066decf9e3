// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/language.h"

#include "ui/look/look.h"

#include <QFile>
#include <QRegularExpression>
#include <QXmlStreamReader>

#include <gtest/gtest.h>

namespace planewright {
namespace {

/// What a translation must carry over: places of arguments, lowered indices, tags.
QStringList marksOf(const QString& text) {
  static const QRegularExpression marks(QStringLiteral("%n|%[1-9]|_\\{|</?[a-z]+>"));
  QStringList found;
  for (auto at = marks.globalMatch(text); at.hasNext();)
    found << at.next().captured();
  found.sort();
  return found;
}

TEST(Language, everyGermanTextCarriesItsMarks) {
  QFile file(QString::fromUtf8(PLANEWRIGHT_LANGUAGES "/planewright_de.ts"));
  ASSERT_TRUE(file.open(QIODevice::ReadOnly));
  QXmlStreamReader xml(&file);
  QString source;
  int texts = 0;
  while (!xml.atEnd()) {
    if (xml.readNext() != QXmlStreamReader::StartElement)
      continue;
    if (xml.name() == QLatin1String("source")) {
      source = xml.readElementText();
    } else if (xml.name() == QLatin1String("translation")) {
      ++texts;
      EXPECT_FALSE(xml.attributes().hasAttribute(QStringLiteral("type")))
          << "unfinished: " << source.toStdString();
      const QString german = xml.readElementText(QXmlStreamReader::SkipChildElements);
      if (german.trimmed().isEmpty())
        continue; // its plural forms
      EXPECT_EQ(marksOf(source).join(' ').toStdString(), marksOf(german).join(' ').toStdString())
          << source.toStdString();
      EXPECT_EQ(source.count('&'), german.count('&')) << source.toStdString();
    }
  }
  EXPECT_FALSE(xml.hasError()) << xml.errorString().toStdString();
  EXPECT_GT(texts, 1000);
}

TEST(Language, textsComeInTheLanguageThatIsSpoken) {
  const Text text = PW_TEXT("Language", "en");
  EXPECT_EQ(plain(text, translation()), "en");
  EXPECT_TRUE(speak(QStringLiteral("de")));
  EXPECT_EQ(plain(text, translation()), "de");
  EXPECT_FALSE(speak(QStringLiteral("xx")));
  EXPECT_EQ(plain(text, translation()), "de");
  EXPECT_EQ(plain(PW_TEXT("Language", "no such text"), translation()), "no such text");
  EXPECT_TRUE(speak(QStringLiteral("en")));
  EXPECT_EQ(plain(text, translation()), "en");
}

} // namespace
} // namespace planewright
