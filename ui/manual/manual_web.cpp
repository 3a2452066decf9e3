// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/manual/manual_web.h"

#include "core/words/version.h"
#include "ui/look/look.h"
#include "ui/manual/manual.h"
#include "ui/manual/manual_html.h"
#include "ui/manual/pictures.h"

#include <QFile>
#include <QRegularExpression>

namespace planewright {

namespace {

QString fileOf(const QString& page) {
  return page + QStringLiteral(".html");
}

/// One manual in one language.
class Web {
public:
  explicit Web(QString language)
      : m_language(std::move(language)),
        m_handbook(manualWords(PW_TEXT("Manual", "Planewright handbook"), m_language)) {
    for (const QString& page : manualPages())
      m_titles += manualTitle(page, m_language);
  }

  std::vector<ManualFile> files() {
    std::vector<ManualFile> files = {{QStringLiteral("index.html"), contentsPage()},
                                     {QStringLiteral("style.css"), style()}};
    for (qsizetype i = 0; i < manualPages().size(); ++i)
      files.push_back({fileOf(manualPages()[i]), page(i)});
    for (const QString& name : picturesShown())
      files.push_back({fileOfPicture(name), pictureFile(name)});
    return files;
  }

private:
  QByteArray contentsPage() const {
    const QString body =
        QStringLiteral("<h1>%1</h1>\n<p>%2</p>\n%3")
            .arg(m_handbook,
                 manualWords(PW_TEXT("Manual",
                                     "Plane stress at a point, resolved to the line that matters. An "
                                     "aid to a licensed engineer; the code that governs locally decides."),
                             m_language),
                 contents(-1));
    return document(m_handbook, QStringLiteral("<main class=\"contents\">\n%1</main>\n").arg(body));
  }

  QByteArray page(qsizetype index) const {
    const QString text = manualHtml(manualPages()[index], m_language, ManualMedium::file);
    const QString body =
        QStringLiteral("<nav>\n<p><a href=\"index.html\">%1</a></p>\n%2</nav>\n<main>\n%3%4</main>\n")
            .arg(m_handbook, contents(index), text, neighbours(index));
    return document(m_titles[index] + QStringLiteral(" – ") + m_handbook, body);
  }

  /// The list of pages, the one at hand marked.
  QString contents(qsizetype current) const {
    QString rows;
    for (qsizetype i = 0; i < m_titles.size(); ++i)
      rows += QStringLiteral("<li><a href=\"%1\"%2>%3</a></li>\n")
                  .arg(fileOf(manualPages()[i]),
                       i == current ? QStringLiteral(" aria-current=\"page\"") : QString(), m_titles[i]);
    return QStringLiteral("<ol>\n%1</ol>\n").arg(rows);
  }

  /// Links to the pages before and behind.
  QString neighbours(qsizetype index) const {
    QString links;
    if (index > 0)
      links += QStringLiteral("<a rel=\"prev\" href=\"%1\">← %2</a>\n")
                   .arg(fileOf(manualPages()[index - 1]), m_titles[index - 1]);
    if (index + 1 < m_titles.size())
      links += QStringLiteral("<a rel=\"next\" href=\"%1\">%2 →</a>\n")
                   .arg(fileOf(manualPages()[index + 1]), m_titles[index + 1]);
    return QStringLiteral("<p class=\"neighbours\">%1</p>\n").arg(links);
  }

  QByteArray document(const QString& title, const QString& body) const {
    return QStringLiteral(
               "<!DOCTYPE html>\n<html lang=\"%1\">\n<head>\n<meta charset=\"utf-8\">\n"
               "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n"
               "<title>%2</title>\n<link rel=\"stylesheet\" href=\"style.css\">\n</head>\n<body>\n%3"
               "<footer>Planewright %4</footer>\n</body>\n</html>\n")
        .arg(m_language, title, body, fromUtf8(std::string(programVersion())))
        .toUtf8();
  }

  QStringList picturesShown() const {
    static const QRegularExpression picture(QStringLiteral("<img src=\"([^\"]*)\""));
    QStringList names;
    for (const QString& one : manualPages())
      for (const QRegularExpressionMatch& match : picture.globalMatch(manualSource(one, m_language)))
        names += match.captured(1);
    names.removeDuplicates();
    return names;
  }

  static QByteArray style() {
    QFile file(QStringLiteral(":/planewright/manual/style.css"));
    return file.open(QIODevice::ReadOnly) ? file.readAll() : QByteArray();
  }

  QString m_language;
  QString m_handbook;
  QStringList m_titles;
};

} // namespace

std::vector<ManualFile> webManual(const QString& language) {
  return Web(language).files();
}

} // namespace planewright
