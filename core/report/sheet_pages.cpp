// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/sheet_pages.h"

#include "core/figure/metrics.h"
#include "core/figure/text_lines.h"
#include "core/quantity/shown_count.h"
#include "core/report/page_flow.h"

#include <algorithm>

namespace planewright {

template <>
const std::vector<Named<Paper>>& namesOf<Paper>() {
  static const std::vector<Named<Paper>> names = {{Paper::a4, "A4", PW_TEXT("Sheet", "A4")},
                                                  {Paper::letter, "Letter", PW_TEXT("Sheet", "Letter")}};
  return names;
}

namespace {

// mm.
constexpr double left = 25;
constexpr double right = 15;
constexpr double top = 12;
constexpr double bottom = 9;
constexpr double titleHeight = 18;
constexpr double titleGap = 5;
constexpr double footHeight = 10;

Vec sizeOf(Paper paper) {
  return paper == Paper::a4 ? Vec{210, 297} : Vec{215.9, 279.4};
}

/// Title block and foot of a page.
class PageFrame {
public:
  PageFrame(Picture& page, const Sheet& sheet, const Translate& translate)
      : m_page(page), m_sheet(sheet), m_translate(translate), m_width(page.width - left - right) {}

  void drawTitle(std::size_t number, std::size_t count) {
    const SheetTitle& title = m_sheet.title;
    // Number, revision and page keep their widths; the project has the rest.
    const double project = m_width - 34 - 28 - 23;
    const double columns[] = {left, left + project, left + project + 34, left + project + 62, left + m_width};
    for (const double x : {columns[1], columns[2], columns[3]})
      line({x, top}, {x, top + titleHeight}, 0.18);
    line({left, top + titleHeight / 2}, {left + m_width, top + titleHeight / 2}, 0.18);
    m_page.parts.emplace_back(Path{
        {{left, top}, {left + m_width, top}, {left + m_width, top + titleHeight}, {left, top + titleHeight}},
        true,
        Pen{Role::ink, 0.35, Dash::solid},
        std::nullopt});
    const auto cell = [&](int column, int row, const Text& key, const Text& value, bool bold = false) {
      addCell({columns[column], top + row * titleHeight / 2}, columns[column + 1] - columns[column], key,
              value, bold);
    };
    cell(0, 0, PW_TEXT("Sheet", "Project"), verbatim(title.project), true);
    cell(1, 0, PW_TEXT("Sheet", "Number"), verbatim(title.number));
    cell(2, 0, PW_TEXT("Sheet", "Revision"), verbatim(title.revision));
    cell(3, 0, PW_TEXT("Sheet", "Page"),
         PW_TEXT("Sheet", "%1 of %2").with(shownCount(number)).with(shownCount(count)), true);
    cell(0, 1, PW_TEXT("Sheet", "Subject"), verbatim(title.subject));
    cell(1, 1, PW_TEXT("Sheet", "Prepared"), title.prepared);
    cell(2, 1, PW_TEXT("Sheet", "Checked"), title.checked);
    cell(3, 1, PW_TEXT("Sheet", "Date"), verbatim(title.date));
  }

  void drawFoot() {
    constexpr double size = points(7);
    const double y = m_page.height - bottom - footHeight + 2.5;
    line({left, y}, {left + m_width, y}, 0.18);
    label(elided(runs(m_sheet.caution, m_translate), m_width, size, false), size, {left, y + 3.2});
    const Runs routes = runs(m_sheet.routes, m_translate);
    const double room = m_width - textWidth(routes, size, m_sheet.disagrees) - 4;
    label(elided(runs(m_sheet.identity, m_translate), room, size, false), size, {left, y + 6.6});
    label(routes, size, {left + m_width, y + 6.6}, m_sheet.disagrees ? Role::limit : Role::soft,
          m_sheet.disagrees, Align::end);
  }

private:
  void line(Vec from, Vec to, double width) {
    m_page.parts.emplace_back(Path{{from, to}, false, Pen{Role::ink, width, Dash::solid}, std::nullopt});
  }

  void label(Runs runs, double size, Vec at, Role role = Role::soft, bool bold = false,
             Align align = Align::start) {
    m_page.parts.emplace_back(lettering(std::move(runs), size, at, role, bold, align));
  }

  /// One line at 9 pt, smaller to 7 pt where that is needed, else two lines.
  void addCell(Vec corner, double width, const Text& key, const Text& value, bool bold) {
    constexpr double inner = 1.4;
    label(runs(key, m_translate), points(6), {corner.x + inner, corner.y + 2.7});
    const Runs words = runs(value, m_translate);
    if (words.empty())
      return;
    const double room = width - 2 * inner;
    const double full = textWidth(words, points(9), bold);
    const double size = std::max(points(7), std::min(points(9), points(9) * room / full));
    if (textWidth(words, size, bold) <= room + 1e-9)
      return label(words, size, {corner.x + inner, corner.y + 7.2}, Role::ink, bold);
    constexpr double two = points(6.5);
    std::vector<Runs> lines = brokenLines(words, room, two, bold);
    if (lines.size() > 2) {
      lines.resize(2);
      lines[1] = elided(Runs{lines[1].front(), {" …", false}}, room, two, bold);
    }
    for (std::size_t i = 0; i < lines.size(); ++i)
      label(lines[i], two, {corner.x + inner, corner.y + 5.3 + 2.6 * static_cast<double>(i)}, Role::ink,
            bold);
  }

  Picture& m_page;
  const Sheet& m_sheet;
  const Translate& m_translate;
  double m_width;
};

} // namespace

std::vector<Picture> pagesOf(const Sheet& sheet, Paper paper, const Translate& translate) {
  const WritesDecimals decimals(sheet.decimal);
  const Vec size = sizeOf(paper);
  const double bodyTop = top + titleHeight + titleGap;
  const std::vector<std::vector<PicturePart>> bodies =
      flowed(stripsOf(sheet, size.x - left - right, translate), size.y - bottom - footHeight - bodyTop);
  std::vector<Picture> pages;
  for (const std::vector<PicturePart>& body : bodies) {
    Picture& page = pages.emplace_back();
    page.width = size.x;
    page.height = size.y;
    page.title = sheet.title.subject.empty() ? sheet.title.project : sheet.title.subject;
    PageFrame frame(page, sheet, translate);
    frame.drawTitle(pages.size(), bodies.size());
    for (const PicturePart& part : body)
      page.parts.push_back(moved(part, {left, bodyTop}));
    frame.drawFoot();
  }
  return pages;
}

} // namespace planewright
