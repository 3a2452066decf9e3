// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/material_words.h"

#include "core/study/material_edits.h"
#include "core/study/text_fields.h"

#include <QCoreApplication>

#include <algorithm>

namespace planewright {

namespace {

QString words(const char* source) {
  return QCoreApplication::translate("Material", source);
}

QString escaped(const std::string& text) {
  return fromUtf8(text).toHtmlEscaped();
}

/// A part of the sheet under its heading; nothing where it has no rows.
QString part(const QString& heading, const QString& rows) {
  if (rows.isEmpty())
    return {};
  return QStringLiteral("<p style=\"margin-top:10px;margin-bottom:2px\"><b>%1</b></p>"
                        "<table cellspacing=\"0\" cellpadding=\"2\">%2</table>")
      .arg(heading.toHtmlEscaped(), rows);
}

/// Symbol, value and meaning on one row.
QString row(const QString& richSymbol, const std::string& value, const QString& meaning,
            const QString& soft) {
  return QStringLiteral("<tr><td>%1&nbsp;&nbsp;</td><td align=\"right\"><b>%2</b>&nbsp;&nbsp;</td>"
                        "<td style=\"color:%3\">%4</td></tr>")
      .arg(richSymbol, escaped(value), soft, meaning.toHtmlEscaped());
}

QString strengthRows(const Material& material, const QString& soft) {
  QString rows;
  for (const StrengthKey key : keysOf(material.kind)) {
    const std::string& text = strengthText(material, key);
    const Text& symbol = labelOf(material.kind, key);
    const Text& meaning = rowOf(spotOf(key)).label;
    rows += row(shownRich(symbol),
                text.empty() ? words(QT_TRANSLATE_NOOP("Material", "not given")).toStdString() : text,
                symbol == meaning ? QString() : shown(meaning), soft);
  }
  if (material.kind == MaterialKind::throat)
    rows += row({}, shown(labelOf(material.seam)).toStdString(), {}, soft);
  return rows;
}

QString factorRows(const Material& material, const QString& soft) {
  QString rows;
  const auto add = [&](const std::string& text, Spot spot) {
    if (!text.empty())
      rows += row({}, text, shown(rowOf(spot).label), soft);
  };
  add(material.partialFactor, Spot::partialFactor);
  add(material.factor, Spot::strengthFactor);
  add(material.serviceClass, Spot::serviceClass);
  for (const TextField<DurationTexts>& field : textFieldsOf<DurationTexts>())
    add(material.durations.*field.text, field.spot);
  return rows;
}

QString sentence(const QString& caption, const std::string& text, const QString& soft) {
  const QString shownText =
      text.empty() ? words(QT_TRANSLATE_NOOP("Material", "not told")).toHtmlEscaped() : escaped(text);
  return QStringLiteral(
             "<p style=\"margin-top:0;margin-bottom:3px\"><span style=\"color:%1\">%2:</span> %3</p>")
      .arg(soft, caption.toHtmlEscaped(), shownText);
}

} // namespace

QString usedBy(const Study& study, const std::string& material) {
  QStringList checks;
  for (const Place& check : checksBy(study, material))
    checks << words(QT_TRANSLATE_NOOP("Material", "“%1” of %2"))
                  .arg(fromUtf8(check.item), fromUtf8(check.owner));
  if (checks.isEmpty())
    return {};
  constexpr qsizetype most = 6;
  if (checks.size() > most)
    checks = checks.first(most - 1)
             << words(QT_TRANSLATE_NOOP("Material", "%1 more")).arg(checks.size() - most + 1);
  return words(QT_TRANSLATE_NOOP("Material",
                                 "Checks by it: %1. When the material is removed, they go with it."))
      .arg(checks.join(QStringLiteral(", ")));
}

QString sheetOf(const Material& material, const Look& look) {
  const QString soft = look.colour(Role::soft).name();
  return QStringLiteral("<p style=\"margin-bottom:2px\"><span style=\"font-size:17px\"><b>%1</b></span></p>"
                        "<p style=\"margin-top:0;margin-bottom:8px;color:%2\">%3</p>")
             .arg(escaped(material.name), soft,
                  words(QT_TRANSLATE_NOOP("Material", "%1; %2 strengths"))
                      .arg(shown(labelOf(material.kind)), shown(labelOf(material.basis)))
                      .toHtmlEscaped()) +
         sentence(words(QT_TRANSLATE_NOOP("Material", "How read")), material.trust, soft) +
         sentence(words(QT_TRANSLATE_NOOP("Material", "Source")), material.source, soft) +
         sentence(words(QT_TRANSLATE_NOOP("Material", "Edition")), material.edition, soft) +
         part(words(QT_TRANSLATE_NOOP("Material", "Strengths")), strengthRows(material, soft)) +
         part(words(QT_TRANSLATE_NOOP("Material", "Factors")), factorRows(material, soft));
}

} // namespace planewright
