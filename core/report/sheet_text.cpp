// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/sheet_text.h"

#include "core/table/aligned_rows.h"

namespace planewright {

namespace {

class TextWriter {
public:
  explicit TextWriter(const Translate& translate) : m_translate(translate) {}

  std::string text(const Sheet& sheet) {
    title(sheet.title);
    for (const SheetBlock& block : sheet.blocks)
      std::visit([this](const auto& one) { write(one); }, block);
    m_out += '\n';
    for (const Text* foot : {&sheet.caution, &sheet.identity, &sheet.routes})
      if (!foot->empty())
        line(words(*foot));
    return std::move(m_out);
  }

private:
  std::string words(const Text& text) const { return plain(text, m_translate); }
  void line(const std::string& words) { m_out += words + '\n'; }

  void title(const SheetTitle& title) {
    const auto entry = [this](const Text& key, const std::string& value) {
      if (!value.empty())
        line(words(symbol("%1: %2").with(key).with(value)));
    };
    entry(PW_TEXT("Sheet", "Project"), title.project);
    entry(PW_TEXT("Sheet", "Subject"), title.subject);
    entry(PW_TEXT("Sheet", "Number"), title.number);
    entry(PW_TEXT("Sheet", "Revision"), title.revision);
    entry(PW_TEXT("Sheet", "Date"), title.date);
    entry(PW_TEXT("Sheet", "Prepared"), words(title.prepared));
    entry(PW_TEXT("Sheet", "Checked"), words(title.checked));
    m_out += '\n';
  }

  void write(const SheetHeading& heading) {
    m_out += '\n';
    line(heading.number.empty() ? words(heading.words) : heading.number + " " + words(heading.words));
  }

  void write(const SheetText& text) { line(words(text.words)); }

  void write(const SheetBox& box) {
    for (const Text& text : box.lines)
      line("| " + words(text));
  }

  void write(const SheetStep& block) {
    const std::string step = block.step.name.empty()
                                 ? plain(written(block.step), m_translate)
                                 : words(symbol("%1: %2").with(block.step.name).with(written(block.step)));
    line(block.reference.empty() ? step : step + " " + block.reference);
  }

  void write(const SheetTable& table) {
    std::vector<std::vector<std::string>> rows(1);
    std::vector<ColumnSide> sides;
    for (const SheetColumn& column : table.columns) {
      rows.front().push_back(words(column.heading));
      sides.push_back(column.isNumber ? ColumnSide::right : ColumnSide::left);
    }
    for (const std::vector<Text>& row : table.rows) {
      std::vector<std::string>& cells = rows.emplace_back();
      for (const Text& cell : row)
        cells.push_back(words(cell));
    }
    m_out += alignedRows(rows, "  ", sides);
  }

  void write(const SheetFigure& figure) { line(words(PW_TEXT("Sheet", "[Figure] %1").with(figure.caption))); }

  void write(const SheetSignatures& lines) {
    const auto toSign = [this](const Text& key, const Text& value) {
      line(words(symbol("%1: %2").with(key).with(value.empty() ? verbatim("____________________") : value)));
    };
    toSign(PW_TEXT("Sheet", "Prepared"), lines.prepared);
    toSign(PW_TEXT("Sheet", "Checked"), lines.checked);
    toSign(PW_TEXT("Sheet", "Date"), lines.date);
  }

  const Translate& m_translate;
  std::string m_out;
};

} // namespace

std::string sheetText(const Sheet& sheet, const Translate& translate) {
  const WritesDecimals decimals(sheet.decimal);
  return TextWriter(translate).text(sheet);
}

} // namespace planewright
