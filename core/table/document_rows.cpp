// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/document_rows.h"

#include "core/words/characters.h"

#include <algorithm>
#include <array>

namespace planewright {

namespace {

Text headingOf(const Column& column) {
  return column.unit.empty() ? column.heading : symbol("%1 (%2)").with(column.heading).with(column.unit);
}

/// Line ends and tabs part rows and cells, so none may stand inside one.
std::string_view inCell(std::string_view bytes) {
  return bytes == "\n" || bytes == "\r" || bytes == "\t" ? std::string_view(" ") : bytes;
}

std::string markdownOf(const Text& text, const Translate& translate) {
  std::string result;
  for (const Run& run : runs(text, translate)) {
    std::string words;
    for (const Character& character : charactersOf(run.text)) {
      const std::string_view bytes = inCell(character.bytes);
      if (bytes.size() == 1 && std::string_view("\\`*_{}[]<>#|~").find(bytes) != std::string_view::npos)
        words += '\\';
      words += bytes;
    }
    result += run.lowered ? "<sub>" + words + "</sub>" : words;
  }
  return result;
}

struct Written {
  std::string_view bytes;
  std::string_view latex;
  bool isMath;
};

/// What LaTeX does not take as it is.
constexpr std::array written = {Written{"σ", "\\sigma", true},
                                Written{"τ", "\\tau", true},
                                Written{"θ", "\\theta", true},
                                Written{"φ", "\\varphi", true},
                                Written{"γ", "\\gamma", true},
                                Written{"β", "\\beta", true},
                                Written{"ν", "\\nu", true},
                                Written{"ε", "\\varepsilon", true},
                                Written{"°", "^{\\circ}", true},
                                Written{"−", "-", true},
                                Written{"±", "\\pm", true},
                                Written{"·", "\\cdot", true},
                                Written{"²", "^{2}", true},
                                Written{"³", "^{3}", true},
                                Written{"|", "|", true},
                                Written{"<", "<", true},
                                Written{">", ">", true},
                                Written{"\\", "\\textbackslash{}", false},
                                Written{"~", "\\textasciitilde{}", false},
                                Written{"^", "\\textasciicircum{}", false},
                                Written{"&", "\\&", false},
                                Written{"%", "\\%", false},
                                Written{"$", "\\$", false},
                                Written{"#", "\\#", false},
                                Written{"_", "\\_", false},
                                Written{"{", "\\{", false},
                                Written{"}", "\\}", false}};

std::string latexOf(const Text& text, const Translate& translate) {
  std::string result;
  bool inMath = false;
  const auto math = [&](bool on) {
    if (inMath != on)
      result += '$';
    inMath = on;
  };
  for (const Run& run : runs(text, translate)) {
    if (run.lowered) {
      math(true);
      result += "_{\\mathrm{";
    }
    for (const Character& character : charactersOf(run.text)) {
      const auto row = std::ranges::find(written, character.bytes, &Written::bytes);
      const bool isKnown = row != written.end();
      if (!run.lowered)
        math(isKnown && row->isMath);
      result += isKnown ? row->latex : inCell(character.bytes);
    }
    if (run.lowered)
      result += "}}";
  }
  math(false);
  return result;
}

} // namespace

std::string markdown(const Table& table, const Translate& translate) {
  std::string heading = "|";
  std::string rule = "|";
  for (const Column& column : table.columns) {
    heading += " " + markdownOf(headingOf(column), translate) + " |";
    rule += column.isNumber ? " ---: |" : " --- |";
  }
  std::string result = heading + "\n" + rule + "\n";
  for (const Row& row : table.rows) {
    result += "|";
    for (const Cell& cell : row.cells)
      result += " " + markdownOf(cell.shown, translate) + " |";
    result += "\n";
  }
  for (const Text& caution : table.cautions)
    result += "\n" + markdownOf(caution, translate) + "\n";
  return result;
}

std::string latexRows(const Table& table, const Translate& translate) {
  std::string result;
  const auto put = [&](bool first, const Text& text) {
    result += (first ? "" : " & ") + latexOf(text, translate);
  };
  for (const Column& column : table.columns)
    put(&column == &table.columns.front(), headingOf(column));
  result += " \\\\\n\\hline\n";
  for (const Row& row : table.rows) {
    for (const Cell& cell : row.cells)
      put(&cell == &row.cells.front(), cell.shown);
    result += " \\\\\n";
  }
  for (const Text& caution : table.cautions) {
    std::string words = plain(caution, translate);
    std::ranges::replace(words, '\n', ' ');
    result += "% " + words + "\n";
  }
  return result;
}

} // namespace planewright
