// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/csv.h"

namespace planewright {

std::vector<std::string> csvFields(std::string_view row) {
  std::vector<std::string> fields(1);
  bool quoted = false;
  for (std::size_t at = 0; at < row.size(); ++at) {
    const char c = row[at];
    if (c == '"' && quoted && at + 1 < row.size() && row[at + 1] == '"')
      fields.back() += row[++at];
    else if (c == '"')
      quoted = !quoted;
    else if (c == ',' && !quoted)
      fields.emplace_back();
    else
      fields.back() += c;
  }
  return fields;
}

std::string csvField(std::string_view text) {
  if (text.find_first_of(",\"\r\n") == std::string_view::npos)
    return std::string(text);
  std::string field = "\"";
  for (const char c : text)
    field += c == '"' ? std::string("\"\"") : std::string(1, c);
  return field + '"';
}

std::string csvRow(const std::vector<std::string>& fields) {
  std::string row;
  for (const std::string& field : fields)
    row += (&field == fields.data() ? "" : ",") + csvField(field);
  return row + "\n";
}

} // namespace planewright
