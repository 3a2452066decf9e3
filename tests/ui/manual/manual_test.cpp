// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/criterion.h"
#include "manual_places.h"
#include "ui/look/look.h"
#include "ui/manual/manual.h"
#include "ui/manual/manual_html.h"
#include "ui/manual/pictures.h"

#include <QDir>
#include <QSet>
#include <QXmlStreamReader>

#include <gtest/gtest.h>

namespace planewright {
namespace {

QString english() {
  return QStringLiteral("en");
}

QString filled(const QString& page, const QString& language) {
  return manualHtml(page, language, ManualMedium::program);
}

/// Every page in every language that is there.
template <class Look>
void forAll(Look look) {
  for (const QString& language : manualLanguages())
    for (const QString& page : manualPages()) {
      SCOPED_TRACE((language + QLatin1Char('/') + page).toStdString());
      look(page, language);
    }
}

TEST(Manual, isThereInEnglishAndBeginsEachPageWithItsTitle) {
  EXPECT_TRUE(manualLanguages().contains(english()));
  EXPECT_EQ(manualLanguage(), english());
  forAll([](const QString& page, const QString& language) {
    EXPECT_TRUE(manualSource(page, language).startsWith(QLatin1String("<h2>")));
    EXPECT_FALSE(manualTitle(page, language).isEmpty());
    EXPECT_GT(manualSource(page, language).size(), 600);
  });
}

TEST(Manual, hasNoPageThatIsNotListed) {
  for (const QString& language : manualLanguages()) {
    QStringList files = QDir(QStringLiteral(":/planewright/manual/") + language).entryList();
    files.replaceInStrings(QStringLiteral(".html"), QString());
    EXPECT_EQ(QSet<QString>(files.begin(), files.end()),
              QSet<QString>(manualPages().begin(), manualPages().end()));
  }
}

TEST(Manual, hasTheSamePlacesAndPicturesInAllLanguages) {
  forAll([](const QString& page, const QString& language) {
    EXPECT_EQ(anchorsIn(filled(page, language)), anchorsIn(filled(page, english())));
    for (const char* kind : {"<img src=\"([^\"]*)\"", "\\{\\{([^}]*)\\}\\}"})
      EXPECT_EQ(allOf(manualSource(page, language), kind), allOf(manualSource(page, english()), kind));
  });
}

TEST(Manual, isWellFormed) {
  forAll([](const QString& page, const QString& language) {
    QXmlStreamReader reader(QStringLiteral("<page>%1</page>").arg(filled(page, language)));
    while (!reader.atEnd())
      reader.readNext();
    EXPECT_FALSE(reader.hasError()) << reader.errorString().toStdString() << " in line "
                                    << reader.lineNumber();
  });
}

TEST(Manual, leavesNoPlaceholderAndNamesEachPlaceOnce) {
  forAll([](const QString& page, const QString& language) {
    const QString html = filled(page, language);
    EXPECT_FALSE(html.contains(QLatin1String("{{")));
    const QStringList anchors = anchorsIn(html);
    EXPECT_EQ(QSet<QString>(anchors.begin(), anchors.end()).size(), anchors.size());
  });
}

TEST(Manual, linksToPlacesThatAreThere) {
  forAll([](const QString& page, const QString& language) {
    for (const QString& link : allOf(filled(page, language), "<a href=\"([^\"]*)\"")) {
      const ManualPlace place = manualPlace(link);
      const QString target = place.page.isEmpty() ? page : place.page;
      EXPECT_TRUE(manualPages().contains(target)) << link.toStdString();
      if (!place.anchor.isEmpty()) {
        EXPECT_TRUE(anchorsIn(filled(target, language)).contains(place.anchor)) << link.toStdString();
      }
    }
  });
}

TEST(Manual, showsPicturesThatAreThereAndSaysWhatIsOnThem) {
  forAll([](const QString& page, const QString& language) {
    const QString html = filled(page, language);
    for (const QString& picture : allOf(html, "<img src=\"([^\"]*)\""))
      EXPECT_TRUE(isPicture(picture)) << picture.toStdString();
    EXPECT_EQ(html.count(QLatin1String("<img ")),
              html.count(QRegularExpression(QStringLiteral("<img [^>]*alt=\"[^\"]{3,}\""))));
  });
}

TEST(Manual, hasAPlaceForEachCriterionWithItsEquation) {
  const QString page = filled(QStringLiteral("criteria"), english());
  for (const Named<Criterion>& one : namesOf<Criterion>()) {
    EXPECT_TRUE(anchorsIn(page).contains(QLatin1String(one.word))) << one.word;
    EXPECT_TRUE(page.contains(shownRich(symbol(rowOf(one.value).equation)))) << one.word;
    EXPECT_TRUE(page.contains(shownRich(rowOf(one.value).source))) << one.word;
  }
}

} // namespace
} // namespace planewright
