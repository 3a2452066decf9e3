// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/field_csv.h"

#include "core/record/csv.h"

#include <array>
#include <charconv>
#include <cmath>
#include <cstring>

namespace planewright {

namespace {

constexpr std::size_t bufferSize = 1 << 16;
constexpr std::size_t longestNumber = 32;
constexpr int significant = 12;
constexpr int decimalsOfAngles = 6;

class Writer {
public:
  Writer(const ScreenPlan& plan, const Field& field, const FieldResults& results,
         const FieldPrincipals* principals, const Unit& unit, const Sink& sink)
      : m_field(field), m_results(results), m_principals(principals), m_unit(unit), m_sink(sink),
        m_buffer(bufferSize) {
    for (const ScreenedCombination& combination : plan.combinations)
      m_combinations.push_back("," + csvField(combination.name));
    for (const ScreenedCheck& check : plan.checks)
      m_checks.push_back("," + csvField(check.setup.id));
    for (const Named<Mode>& mode : namesOf<Mode>())
      m_modes.push_back("," + csvField(mode.word));
  }

  void header() {
    put(m_field.columns().layer ? "point,layer" : "point");
    put(",utilisation,load_multiplier,combination,check,mode,worst_angle");
    put(m_principals ? ",s1,s2,theta1\n" : "\n");
  }

  void row(std::size_t point) {
    const PointResult result = m_results[point];
    if (!result.isJudged())
      return;
    name(m_field.nameOf(point));
    if (m_field.columns().layer) {
      put(",");
      put(wordOf(m_field.layerOf(point)));
    }
    put(",");
    number(result.utilisation);
    put(",");
    if (const std::optional<double> multiplier = result.multiplier())
      number(*multiplier);
    put(m_combinations[result.combination]);
    put(m_checks[result.check]);
    put(result.mode ? std::string_view(m_modes[static_cast<std::size_t>(*result.mode)]) : ",");
    put(",");
    angle(result.worstAngle);
    if (m_principals)
      principals(point);
    put("\n");
  }

  bool end() {
    flush();
    return m_goesOn;
  }
  bool goesOn() const { return m_goesOn; }

private:
  void principals(std::size_t point) {
    put(",");
    number(m_unit.fromBase(m_principals->s1[point]));
    put(",");
    number(m_unit.fromBase(m_principals->s2[point]));
    put(",");
    if (const double theta1 = m_principals->theta1[point]; !std::isnan(theta1))
      angle(theta1);
  }

  void name(std::string_view name) {
    if (name.find_first_of(",\"") == std::string_view::npos)
      put(name);
    else
      put(csvField(name));
  }

  void number(double value) {
    make(longestNumber);
    char* at = m_buffer.data() + m_size;
    value += 0.0; // no -0
    const auto end = std::to_chars(at, at + longestNumber, value, std::chars_format::general, significant);
    m_size += static_cast<std::size_t>(end.ptr - at);
  }

  void angle(double degrees) {
    make(longestNumber);
    char* at = m_buffer.data() + m_size;
    char* end =
        std::to_chars(at, at + longestNumber, degrees, std::chars_format::fixed, decimalsOfAngles).ptr;
    while (end[-1] == '0')
      --end;
    if (end[-1] == '.')
      --end;
    if (end - at == 2 && at[0] == '-' && at[1] == '0') {
      at[0] = '0';
      --end;
    }
    m_size = static_cast<std::size_t>(end - m_buffer.data());
  }

  void put(std::string_view text) {
    make(text.size());
    std::memcpy(m_buffer.data() + m_size, text.data(), text.size());
    m_size += text.size();
  }

  /// Names are at most 200 bytes, so that all pieces fit.
  void make(std::size_t room) {
    if (m_size + room > m_buffer.size())
      flush();
  }

  void flush() {
    if (m_goesOn && m_size > 0)
      m_goesOn = m_sink({m_buffer.data(), m_size});
    m_size = 0;
  }

  const Field& m_field;
  const FieldResults& m_results;
  const FieldPrincipals* m_principals;
  Unit m_unit;
  const Sink& m_sink;
  std::vector<std::string> m_combinations, m_checks, m_modes;
  std::vector<char> m_buffer;
  std::size_t m_size = 0;
  bool m_goesOn = true;
};

} // namespace

bool writeFieldCsv(const Study& study, const ScreenPlan& plan, const Field& field,
                   const FieldResults& results, const Sink& sink, const std::vector<std::uint32_t>* points,
                   const FieldPrincipals* principals) {
  Writer writer(plan, field, results, principals, *readUnit(study.units.stress, dimension::stress), sink);
  writer.header();
  if (points)
    for (const std::uint32_t point : *points)
      writer.row(point);
  else
    for (std::size_t point = 0; point < field.size() && writer.goesOn(); ++point)
      writer.row(point);
  return writer.end();
}

} // namespace planewright
