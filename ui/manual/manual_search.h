// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QStringList>

#include <vector>

namespace planewright {

/// A page in which every word that is searched for stands, and how often they stand there together.
struct FoundPage {
  QString page;
  int count = 0;
  bool operator==(const FoundPage&) const = default;
};

/// The words of what is typed into the search: parted by blanks, without regard to case.
QStringList searchedWords(const QString& typed);

/// The text of all pages of one language, to search in.
class ManualSearch {
public:
  explicit ManualSearch(const QString& language);
  /// In the order of the manual; empty without a word.
  std::vector<FoundPage> find(const QStringList& words) const;

private:
  struct PageText {
    QString page;
    QString text;
  };
  std::vector<PageText> m_pages;
};

} // namespace planewright
