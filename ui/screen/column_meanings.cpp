// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/column_meanings.h"

#include "ui/look/look.h"

#include <QCoreApplication>

#include <algorithm>
#include <array>

namespace planewright {

namespace {

struct Meaning {
  FieldRole role = FieldRole::unread;
  bool isOfCase = false;
  std::size_t loadCase = 0;
  bool operator==(const Meaning&) const = default;
};

constexpr std::array stresses = {FieldRole::sx, FieldRole::sy, FieldRole::txy};

std::vector<Meaning> meaningsOf(const Study& study) {
  std::vector<Meaning> meanings;
  for (const Named<FieldRole>& role : namesOf<FieldRole>())
    meanings.push_back({role.value});
  for (std::size_t k = 0; k < study.cases.size(); ++k)
    for (const FieldRole role : stresses)
      meanings.push_back({role, true, k});
  return meanings;
}

} // namespace

void ColumnMeanings::setHeader(std::string header, std::size_t columns) {
  m_header = std::move(header);
  m_chosen.assign(columns, std::nullopt);
}

void ColumnMeanings::choose(std::size_t column, int meaning) {
  m_chosen[column] = meaning;
}

QStringList ColumnMeanings::meaningsFor(const Study& study) {
  QStringList words;
  for (const Meaning& meaning : meaningsOf(study)) {
    const QString role = shown(labelOf(meaning.role));
    words << (meaning.isOfCase ? QCoreApplication::translate("ColumnMeanings", "%1 of %2")
                                     .arg(role, fromUtf8(study.cases[meaning.loadCase].id))
                               : role);
  }
  return words;
}

std::vector<int> ColumnMeanings::meanings(const Study& study) const {
  const std::vector<Meaning> all = meaningsOf(study);
  std::vector<int> meanings;
  for (const NamedColumn& one : namedColumnsOf(study, m_header, mapped(study))) {
    const Meaning meaning{one.column.role, one.isOfCase, one.isOfCase ? one.column.loadCase : 0};
    meanings.push_back(static_cast<int>(std::ranges::find(all, meaning) - all.begin()));
  }
  return meanings;
}

std::vector<MappedHeading> ColumnMeanings::mapped(const Study& study) const {
  const std::vector<Meaning> all = meaningsOf(study);
  const std::vector<NamedColumn> columns = namedColumnsOf(study, m_header);
  std::vector<MappedHeading> mapped;
  for (std::size_t i = 0; i < std::min(m_chosen.size(), columns.size()); ++i)
    if (m_chosen[i] && static_cast<std::size_t>(*m_chosen[i]) < all.size()) {
      const Meaning& meaning = all[static_cast<std::size_t>(*m_chosen[i])];
      mapped.push_back({meaning.isOfCase ? nameOfColumn(study, meaning.role, meaning.loadCase)
                                         : nameOfColumn(study, meaning.role),
                        columns[i].column.heading});
    }
  return mapped;
}

} // namespace planewright
