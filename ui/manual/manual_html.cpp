// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/manual/manual_html.h"

#include "core/strength/criterion.h"
#include "ui/look/look.h"
#include "ui/manual/manual.h"
#include "ui/manual/pictures.h"

#include <QRegularExpression>

#include <functional>

namespace planewright {

namespace {

/// The text with each match of the pattern replaced by what `with` makes of it.
QString replaced(const QString& text, const QRegularExpression& pattern,
                 const std::function<QString(const QRegularExpressionMatch&)>& with) {
  QString result;
  qsizetype end = 0;
  for (const QRegularExpressionMatch& match : pattern.globalMatch(text)) {
    result += QStringView(text).mid(end, match.capturedStart() - end);
    result += with(match);
    end = match.capturedEnd();
  }
  result += QStringView(text).mid(end);
  return result;
}

/// What the program knows of a criterion, in the language of a page.
class Facts {
public:
  explicit Facts(QString language) : m_language(std::move(language)) {}

  /// Nothing for a criterion that is not there.
  QString of(const QString& id) const {
    for (const Named<Criterion>& named : namesOf<Criterion>())
      if (id == QLatin1String(named.word))
        return of(named);
    return {};
  }

private:
  QString of(const Named<Criterion>& named) const {
    const CriterionRow& facts = rowOf(named.value);
    QString rows = row(PW_TEXT("Manual", "Limit"), rich(symbol(facts.equation))) +
                   row(PW_TEXT("Manual", "Materials"), kindsOf(named.value));
    if (!facts.domain.empty())
      rows += row(PW_TEXT("Manual", "Meant for"), rich(facts.domain));
    rows += row(PW_TEXT("Manual", "Source"), rich(facts.source));
    QString heading = rich(named.label);
    heading[0] = heading[0].toUpper();
    return QStringLiteral("<h3><a name=\"%1\">%2</a></h3>\n<table>\n%3</table>\n")
        .arg(QLatin1String(named.word), heading, rows);
  }

  QString kindsOf(Criterion criterion) const {
    QStringList kinds;
    for (const Named<MaterialKind>& kind : namesOf<MaterialKind>())
      if (applies(criterion, kind.value))
        kinds += rich(kind.label);
    return kinds.join(QStringLiteral(", "));
  }

  QString row(const Text& name, const QString& value) const {
    return QStringLiteral("<tr><td>%1</td><td>%2</td></tr>\n").arg(rich(name), value);
  }

  QString rich(const Text& text) const { return richText(manualRuns(text, m_language)); }

  QString m_language;
};

QString withCriteria(const QString& html, const QString& language) {
  static const QRegularExpression place(QStringLiteral("\\{\\{criterion ([a-z0-9-]+)\\}\\}"));
  const Facts facts(language);
  return replaced(html, place,
                  [&facts](const QRegularExpressionMatch& match) { return facts.of(match.captured(1)); });
}

/// In the program a picture is at most as wide as a page beside the contents.
QSize shownSize(const QString& name, ManualMedium medium) {
  const QSize size = pictureSize(name);
  if (medium == ManualMedium::file || size.width() <= mostPictureWidth)
    return size;
  return {mostPictureWidth, size.height() * mostPictureWidth / size.width()};
}

/// A picture that is a paragraph of its own is one of a class, for its style.
QString withPictures(QString html, ManualMedium medium) {
  html.replace(QStringLiteral("<p><img "), QStringLiteral("<p class=\"picture\"><img "));
  static const QRegularExpression picture(QStringLiteral("<img src=\"([^\"]*)\""));
  return replaced(html, picture, [medium](const QRegularExpressionMatch& match) {
    const QString name = match.captured(1);
    const QSize size = shownSize(name, medium);
    return QStringLiteral("<img src=\"%1\" width=\"%2\" height=\"%3\"")
        .arg(medium == ManualMedium::file ? fileOfPicture(name) : name)
        .arg(size.width())
        .arg(size.height());
  });
}

/// "lines#slopes" is called "lines.html#slopes" in a file; a heading that is a place carries an id there.
QString withFileNames(const QString& html) {
  static const QRegularExpression link(QStringLiteral("<a href=\"([a-z-]*)(#[^\"]*)?\""));
  QString result = replaced(html, link, [](const QRegularExpressionMatch& match) {
    const QString file =
        match.captured(1).isEmpty() ? QString() : match.captured(1) + QStringLiteral(".html");
    return QStringLiteral("<a href=\"%1%2\"").arg(file, match.captured(2));
  });
  return result.replace(QStringLiteral("<a name="), QStringLiteral("<a id="));
}

} // namespace

QString manualHtml(const QString& page, const QString& language, ManualMedium medium) {
  const QString html = withPictures(withCriteria(manualSource(page, language), language), medium);
  return medium == ManualMedium::file ? withFileNames(html) : html;
}

QString fileOfPicture(const QString& name) {
  const QString kind = isDrawn(name) ? QStringLiteral(".svg") : QStringLiteral(".png");
  return QStringLiteral("pictures/") + name.section(QLatin1Char(':'), 1) + kind;
}

} // namespace planewright
