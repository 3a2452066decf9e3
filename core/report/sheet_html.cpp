// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/sheet_html.h"

#include "core/figure/svg.h"
#include "core/report/mathml.h"
#include "core/words/markup.h"

namespace planewright {

namespace {

constexpr std::string_view style = R"(
body { font: 11pt/1.4 "Liberation Sans", Arial, sans-serif; color: #1C2529; max-width: 52rem; margin: 2rem auto; padding: 0 1rem; }
h1 { font-size: 1.25em; border-bottom: 1px solid; margin: 1.6em 0 .5em; }
h2 { font-size: 1.05em; margin: 1.2em 0 .3em; }
h1, h2 { break-after: avoid; }
table { border-collapse: collapse; margin: .4em 0; font-size: .88em; }
th { border-top: 1.5px solid; border-bottom: 1px solid; text-align: left; vertical-align: bottom; }
tr:last-child td { border-bottom: 1.5px solid; }
th, td { padding: .1em .8em .1em 0; }
.n { text-align: right; font-variant-numeric: tabular-nums; }
.title { width: 100%; border: 1.5px solid; font-size: 1em; }
.title td { border: .5px solid; padding: .1em .4em; }
.title small, .soft, .name { color: #4E5A60; }
.box { border: 1.5px solid; padding: .5em .8em; }
.box p { margin: .2em 0; }
.alarm { border: 2px solid #75222B; }
.alarm p:first-child { color: #75222B; font-weight: bold; }
.box p:first-child, .strong { font-weight: bold; }
.caution { border-left: 3px solid #75222B; padding-left: .8em; }
.step { display: grid; grid-template-columns: 5rem minmax(0, 1fr) 7rem 4.5rem 2.5rem; row-gap: .3em; break-inside: avoid; margin: .7em 0; }
.step math { math-style: normal; }
.step .name { grid-column: 2 / -1; font-size: .8em; }
.step .put { grid-column: 2 / -1; color: #4E5A60; }
.step b { text-align: right; padding-right: .4em; }
.step .ref { text-align: right; color: #4E5A60; font-size: .8em; }
.sign td { border-top: 1px solid; width: 33%; vertical-align: top; }
figure { margin: .8em 0; }
figcaption, footer { color: #4E5A60; font-size: .8em; }
footer { border-top: 1px solid; margin-top: 2em; }
svg { max-width: 100%; height: auto; }
@media print { body { margin: 0; max-width: none; font-size: 9pt; } }
)";

std::string tagged(const std::string& tag, const std::string& inside, const char* kind = nullptr) {
  return "<" + tag + (kind ? std::string(" class=\"") + kind + "\"" : std::string()) + ">" + inside + "</" +
         tag + ">";
}

/// Writes block after block.
class HtmlWriter {
public:
  explicit HtmlWriter(const Translate& translate) : m_translate(translate) {}

  std::string page(const Sheet& sheet) {
    const std::string name =
        markupOf(sheet.title.subject.empty() ? sheet.title.project : sheet.title.subject);
    m_out = "<!DOCTYPE html>\n<html lang=\"" + words(PW_TEXT("Language", "en")) +
            "\">\n<head>\n<meta charset=\"utf-8\">\n<title>" +
            (name.empty() ? words(PW_TEXT("Sheet", "Calculation sheet")) : name) + "</title>\n<style>" +
            std::string(style) + "</style>\n</head>\n<body>\n";
    title(sheet.title);
    for (const SheetBlock& block : sheet.blocks)
      std::visit([this](const auto& one) { write(one); }, block);
    m_out += tagged("footer", tagged("p", words(sheet.caution)) +
                                  tagged("p", words(sheet.identity) + " · " + words(sheet.routes)));
    m_out += "\n</body>\n</html>\n";
    return std::move(m_out);
  }

private:
  std::string words(const Text& text) const { return markupOf(text, m_translate); }

  std::string titleCell(const Text& key, const std::string& value) const {
    return tagged("td", tagged("small", words(key)) + "<br>" + (value.empty() ? "—" : value));
  }

  void title(const SheetTitle& title) {
    m_out += "<table class=\"title\"><tr>" +
             titleCell(PW_TEXT("Sheet", "Project"), tagged("b", markupOf(title.project))) +
             titleCell(PW_TEXT("Sheet", "Number"), markupOf(title.number)) +
             titleCell(PW_TEXT("Sheet", "Revision"), markupOf(title.revision)) +
             titleCell(PW_TEXT("Sheet", "Date"), markupOf(title.date)) + "</tr>\n<tr>" +
             titleCell(PW_TEXT("Sheet", "Subject"), markupOf(title.subject)) +
             titleCell(PW_TEXT("Sheet", "Prepared"), words(title.prepared)) +
             titleCell(PW_TEXT("Sheet", "Checked"), words(title.checked)) + "<td></td></tr></table>\n";
  }

  void write(const SheetHeading& heading) {
    const std::string number = heading.number.empty() ? "" : markupOf(heading.number) + "&ensp;";
    m_out += tagged(heading.level == 1 ? "h1" : "h2", number + words(heading.words)) + "\n";
  }

  void write(const SheetText& text) {
    const char* kind = text.voice == Voice::soft      ? "soft"
                       : text.voice == Voice::strong  ? "strong"
                       : text.voice == Voice::caution ? "caution"
                                                      : nullptr;
    m_out += tagged("p", words(text.words), kind) + "\n";
  }

  void write(const SheetBox& box) {
    std::string lines;
    for (const Text& line : box.lines)
      lines += tagged("p", words(line));
    m_out += tagged("div", lines, box.alarms ? "box alarm" : "box") + "\n";
  }

  void write(const SheetStep& block) {
    const Step& step = block.step;
    const ShownValue shown = shownValue(step);
    m_out += "<div class=\"step\">";
    if (!step.name.empty())
      m_out += tagged("span", words(step.name), "name");
    m_out += tagged("span", words(step.symbol)) + tagged("span", "= " + mathml(step.formula)) +
             tagged("b", markupOf(shown.number)) + tagged("span", markupOf(shown.unit)) +
             tagged("span", markupOf(block.reference), "ref");
    if (!step.putIn.empty())
      m_out += tagged("span", "= " + mathml(step.formula, &step.putIn), "put");
    m_out += "</div>\n";
  }

  void write(const SheetTable& table) {
    m_out += "<table><thead><tr>";
    for (const SheetColumn& column : table.columns)
      m_out += tagged("th", words(column.heading), column.isNumber ? "n" : nullptr);
    m_out += "</tr></thead>\n<tbody>\n";
    for (const std::vector<Text>& row : table.rows) {
      m_out += "<tr>";
      for (std::size_t i = 0; i < row.size(); ++i)
        m_out += tagged("td", words(row[i]), table.columns[i].isNumber ? "n" : nullptr);
      m_out += "</tr>\n";
    }
    m_out += "</tbody></table>\n";
  }

  void write(const SheetFigure& figure) {
    const std::string svg = svgOf(figure.picture, Palette::paper);
    m_out +=
        tagged("figure", svg.substr(svg.find("<svg")) + tagged("figcaption", words(figure.caption))) + "\n";
  }

  void write(const SheetSignatures& lines) {
    const auto cell = [&](const Text& key, const Text& value) {
      return tagged("td", words(value) + "<br>" + tagged("small", words(key)));
    };
    m_out += "<table class=\"sign\" style=\"width:100%\"><tr>" +
             cell(PW_TEXT("Sheet", "Prepared"), lines.prepared) +
             cell(PW_TEXT("Sheet", "Checked"), lines.checked) + cell(PW_TEXT("Sheet", "Date"), lines.date) +
             "</tr></table>\n";
  }

  const Translate& m_translate;
  std::string m_out;
};

} // namespace

std::string sheetHtml(const Sheet& sheet, const Translate& translate) {
  const WritesDecimals decimals(sheet.decimal);
  return HtmlWriter(translate).page(sheet);
}

} // namespace planewright
