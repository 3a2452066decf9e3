// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/manual/manual_search.h"

#include "ui/manual/manual.h"
#include "ui/manual/manual_html.h"

#include <QTextDocumentFragment>

#include <algorithm>

namespace planewright {

QStringList searchedWords(const QString& typed) {
  return typed.simplified().split(QLatin1Char(' '), Qt::SkipEmptyParts);
}

ManualSearch::ManualSearch(const QString& language) {
  for (const QString& page : manualPages()) {
    const QString html = manualHtml(page, language, ManualMedium::program);
    m_pages.push_back({page, QTextDocumentFragment::fromHtml(html).toPlainText()});
  }
}

std::vector<FoundPage> ManualSearch::find(const QStringList& words) const {
  std::vector<FoundPage> found;
  if (words.isEmpty())
    return found;
  for (const PageText& page : m_pages) {
    const auto standsIn = [&](const QString& word) { return page.text.contains(word, Qt::CaseInsensitive); };
    if (!std::ranges::all_of(words, standsIn))
      continue;
    FoundPage one{page.page};
    for (const QString& word : words)
      one.count += static_cast<int>(page.text.count(word, Qt::CaseInsensitive));
    found.push_back(one);
  }
  return found;
}

} // namespace planewright
