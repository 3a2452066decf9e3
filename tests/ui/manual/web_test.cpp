// SPDX-License-Identifier: GPL-3.0-or-later
#include "manual_places.h"
#include "ui/manual/manual.h"
#include "ui/manual/manual_web.h"

#include <gtest/gtest.h>

#include <map>

namespace planewright {
namespace {

std::map<QString, QString> files(const QString& language) {
  std::map<QString, QString> all;
  for (const ManualFile& file : webManual(language)) {
    EXPECT_FALSE(file.bytes.isEmpty()) << file.name.toStdString();
    EXPECT_TRUE(all.emplace(file.name, QString::fromUtf8(file.bytes)).second) << file.name.toStdString();
  }
  return all;
}

TEST(WebManual, hasALinkFromTheContentsToEveryPage) {
  const auto all = files(QStringLiteral("en"));
  for (const QString& page : manualPages()) {
    const QString name = page + QStringLiteral(".html");
    ASSERT_TRUE(all.contains(name)) << name.toStdString();
    EXPECT_TRUE(all.at(QStringLiteral("index.html")).contains(QStringLiteral("href=\"%1\"").arg(name)));
  }
}

TEST(WebManual, hasLinksPicturesAndStyleThatResolve) {
  for (const QString& language : manualLanguages()) {
    const auto all = files(language);
    for (const auto& [name, text] : all) {
      if (!name.endsWith(QLatin1String(".html")))
        continue;
      SCOPED_TRACE(name.toStdString());
      EXPECT_FALSE(text.contains(QLatin1String("://"))) << "nothing leads outside";
      for (const QString& picture : allOf(text, "<img src=\"([^\"]*)\""))
        EXPECT_TRUE(all.contains(picture)) << picture.toStdString();
      for (const QString& link : allOf(text, "href=\"([^\"]*)\"")) {
        const QString file = link.section(QLatin1Char('#'), 0, 0);
        const QString anchor = link.section(QLatin1Char('#'), 1);
        const auto target = all.find(file.isEmpty() ? name : file);
        ASSERT_NE(target, all.end()) << link.toStdString();
        if (!anchor.isEmpty()) {
          EXPECT_TRUE(anchorsIn(target->second).contains(anchor)) << link.toStdString();
        }
      }
    }
  }
}

} // namespace
} // namespace planewright
