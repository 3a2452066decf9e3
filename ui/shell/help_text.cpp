// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/help_text.h"

#include "ui/look/look.h"
#include "ui/manual/manual_html.h"
#include "ui/manual/pictures.h"

#include <QScrollBar>

#include <algorithm>

namespace planewright {

namespace {

/// A page is called "manual:/lines", so that a link to "keys" on it is taken as one to its neighbour.
constexpr auto pageScheme = QLatin1String("manual");

// Headings are anchors, so that links have the palette's colour and not one of the style's.
QString styleFor(const Look& look) {
  return QStringLiteral("body { color: %1; } h2 { font-size: 20px; margin-top: 4px; margin-bottom: 10px; }"
                        "h3 { font-size: 15px; margin-top: 18px; margin-bottom: 4px; }"
                        "p, ul, ol { margin-top: 4px; margin-bottom: 8px; line-height: 130%; }"
                        "p.picture { line-height: 100%; }"
                        "li { margin-bottom: 3px; }"
                        "pre { margin-top: 4px; margin-bottom: 8px; }"
                        "table { margin-top: 4px; margin-bottom: 8px; border-collapse: collapse; }"
                        "td, th { padding: 4px 14px 4px 0px; border-bottom: 1px solid %2;"
                        "border-top: 1px solid %2; border-left: 0px; border-right: 0px;"
                        "vertical-align: top; text-align: left; }"
                        "code, pre { font-family: 'Liberation Mono', 'DejaVu Sans Mono', monospace;"
                        "background-color: %3; }")
      .arg(look.colour(Role::ink).name(), look.colour(Role::rule).name(), look.colour(Role::window).name());
}

} // namespace

HelpText::HelpText(QString language, QWidget* parent)
    : QTextBrowser(parent), m_language(std::move(language)) {
  setOpenExternalLinks(false);
  connect(this, &QTextBrowser::sourceChanged, this, [this](const QUrl& shown) { m_shown = shown; });
  document()->setDocumentMargin(14);
  dress();
}

QString HelpText::page() const {
  return m_shown.path().mid(1);
}

QString HelpText::anchor() const {
  return m_shown.fragment();
}

void HelpText::showPlace(const QString& place) {
  setSource(QUrl(QStringLiteral("%1:/%2").arg(pageScheme, place)));
}

void HelpText::dress() {
  document()->setDefaultStyleSheet(styleFor(lookOf(*this)));
  if (source().isEmpty())
    return;
  const int at = verticalScrollBar()->value();
  document()->clear(); // a picture that was loaded keeps its colours
  reload();
  verticalScrollBar()->setValue(at);
}

QVariant HelpText::loadResource(int type, const QUrl& name) {
  if (name.scheme() == pageScheme)
    return QStringLiteral("<body>%1</body>")
        .arg(manualHtml(name.path().mid(1), m_language, ManualMedium::program));
  const QString picture = name.toString();
  if (!isPicture(picture))
    return QTextBrowser::loadResource(type, name);
  const int width = std::min(pictureSize(picture).width(), mostPictureWidth);
  return pictureImage(picture, lookOf(*this), qRound(width * devicePixelRatioF()));
}

void HelpText::mark(const QStringList& words) {
  m_marks.clear();
  for (const QString& word : words)
    for (QTextCursor found = document()->find(word); !found.isNull(); found = document()->find(word, found))
      m_marks += found;
  std::ranges::sort(m_marks, {}, &QTextCursor::selectionStart);
  QList<QTextEdit::ExtraSelection> selections;
  const Look look = lookOf(*this);
  for (const QTextCursor& found : std::as_const(m_marks)) {
    QTextEdit::ExtraSelection selection;
    selection.cursor = found;
    selection.format.setBackground(look.colour(Role::band));
    selection.format.setForeground(look.colour(Role::ink));
    selections += selection;
  }
  setExtraSelections(selections);
}

bool HelpText::goToMark(int step) {
  const int here = textCursor().selectionStart();
  const auto isBehind = [here](const QTextCursor& mark) { return mark.selectionStart() > here; };
  const auto isBefore = [here](const QTextCursor& mark) { return mark.selectionStart() < here; };
  if (step > 0) {
    const auto next = std::ranges::find_if(m_marks, isBehind);
    if (next == m_marks.end())
      return false;
    goTo(*next);
    return true;
  }
  const auto last = std::find_if(m_marks.rbegin(), m_marks.rend(), isBefore);
  if (last == m_marks.rend())
    return false;
  goTo(*last);
  return true;
}

void HelpText::goToFirstMark() {
  if (!m_marks.isEmpty())
    goTo(m_marks.front());
}

void HelpText::goToLastMark() {
  if (!m_marks.isEmpty())
    goTo(m_marks.back());
}

// A third of the page stands above what was found, so that it is read with what leads to it.
void HelpText::goTo(const QTextCursor& mark) {
  setTextCursor(mark);
  const int above = cursorRect(mark).top() - viewport()->height() / 3;
  verticalScrollBar()->setValue(verticalScrollBar()->value() + above);
}

} // namespace planewright
