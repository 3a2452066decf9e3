// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/record/check_values.h"
#include "core/record/csv.h"
#include "core/record/readout_file.h"
#include "core/table/cautions.h"
#include "core/table/check_words.h"
#include "core/table/table.h"

namespace planewright {

namespace {

using Fields = std::vector<std::string>;

const Fields& heading() {
  static const Fields names = {"point",
                               "combination",
                               "judged",
                               "stress_unit",
                               "positive",
                               "sx",
                               "sy",
                               "txy",
                               "sz",
                               "mean",
                               "radius",
                               "s1",
                               "s2",
                               "theta1",
                               "tau_max",
                               "theta_tau_max",
                               "tau_abs_max",
                               "row",
                               "name",
                               "normal",
                               "cut",
                               "sn",
                               "tnt",
                               "kind",
                               "angle",
                               "tolerance",
                               "along",
                               "across",
                               "shear",
                               "along_axial",
                               "along_bending",
                               "sx_axial",
                               "sx_bending",
                               "edge_sn",
                               "edge_tnt",
                               "material",
                               "criterion",
                               "check_line",
                               "check_plane",
                               "parameters",
                               "basis",
                               "factor",
                               "utilisation",
                               "load_multiplier",
                               "mode",
                               "band_from",
                               "band_to",
                               "worst_angle",
                               "worst_utilisation",
                               "worst_load_multiplier",
                               "worst_mode",
                               "exceeds",
                               "pairing",
                               "problem",
                               "check_cautions",
                               "cautions"};
  return names;
}

/// The rows of one state: its own numbers stand in each of them.
class StateRows {
public:
  StateRows(const Study& study, const Readout& readout, const StateReading& state)
      : m_unit(stressUnitOf(study)), m_study(study), m_readout(readout), m_state(state) {}

  std::string written() const {
    std::string rows;
    for (std::size_t i = 0; i < m_readout.watched.size(); ++i)
      rows += row("plane", m_readout.watched[i].name, {planeFields(i), {}, {}});
    for (std::size_t i = 0; i < m_readout.lines.size(); ++i)
      rows += row("line", m_readout.lines[i].name, {{}, lineFields(i), {}});
    for (std::size_t i = 0; i < m_state.checks.size(); ++i)
      rows += row("check", m_readout.checks[i].id, {{}, {}, checkFields(i)});
    // A state without planes, lines and checks is not lost.
    return rows.empty() ? row("state", "", {}) : rows;
  }

private:
  /// What only rows of one kind have; empty in the others.
  struct Own {
    Fields plane{};
    Fields line{};
    Fields check{};
  };

  std::string stress(double value) const { return exactNumber(m_unit.fromBase(value)); }
  static std::string angle(Angle value) { return exactNumber(value.degrees()); }
  static std::string angle(const std::optional<NormalAngle>& normal) {
    return normal ? angle(normal->value) : "";
  }

  Fields stateFields() const {
    const PlaneStress& s = m_state.stress;
    const Circle& circle = m_state.circle;
    return {m_readout.point,
            m_state.combination,
            m_state.judged ? "true" : "false",
            m_study.units.stress,
            std::string(wordOf(m_study.convention.positive)),
            stress(s.sx),
            stress(s.sy),
            stress(s.txy),
            stress(m_state.sz),
            stress(circle.mean),
            stress(circle.radius),
            stress(circle.s1),
            stress(circle.s2),
            angle(circle.theta1),
            stress(circle.radius),
            angle(circle.thetaTauMax),
            stress(circle.tauAbsMax)};
  }

  Fields planeFields(std::size_t i) const {
    const NormalAngle normal = m_readout.watched[i].normal;
    return {angle(normal.value), angle(cutOf(normal).value), stress(m_state.watched[i].sn),
            stress(m_state.watched[i].tnt)};
  }

  Fields lineFields(std::size_t i) const {
    const LineReading& line = m_readout.lines[i];
    const LineStress& stresses = m_state.lines[i];
    const AlongParts parts = alongPartsOf(m_state, line.angle);
    return {std::string(wordOf(line.kind)),
            angle(line.angle.value),
            angle(line.tolerance),
            stress(stresses.along),
            stress(stresses.across),
            stress(stresses.shear),
            stress(parts.axial),
            stress(parts.bending)};
  }

  Fields sourceFields() const {
    const std::optional<FreeEdge>& edge = m_state.edge;
    return {stress(m_state.axial), stress(m_state.bending), edge ? stress(edge->traction.sn) : "",
            edge ? stress(edge->traction.tnt) : ""};
  }

  static std::string joined(const std::vector<Text>& cautions) {
    std::string words;
    for (const Text& caution : cautions)
      words += (words.empty() ? "" : " ") + plain(caution);
    return words;
  }

  static std::string written(const CheckValue& value) {
    switch (value.is) {
    case CheckValue::Is::text:
      return value.text;
    case CheckValue::Is::number:
      return exactNumber(value.number);
    case CheckValue::Is::truth:
      return value.truth ? "true" : "false";
    case CheckValue::Is::nothing:
      break;
    }
    return "";
  }

  static void append(Fields& fields, const std::vector<CheckField>& more) {
    for (const CheckField& field : more)
      fields.push_back(written(field.value));
  }

  Fields checkFields(std::size_t i) const {
    const CheckSetup& check = m_readout.checks[i];
    Fields fields;
    append(fields, subjectOf(check));
    std::string parameters;
    for (const CheckField& field : parametersOf(check, m_unit))
      parameters += std::string(parameters.empty() ? "" : "; ") + field.key + "=" + written(field.value);
    fields.push_back(parameters);
    append(fields, nominalOf(check, m_state.checks[i]));
    fields.push_back(check.band ? angle(check.band->from()) : "");
    fields.push_back(check.band ? angle(check.band->to()) : "");
    append(fields, worstOf(m_state.checks[i]));
    fields.push_back(joined(cautionsOf(check, m_state.checks[i])));
    return fields;
  }

  static void append(Fields& fields, const Fields& more, std::size_t columns) {
    fields.insert(fields.end(), more.begin(), more.end());
    fields.resize(fields.size() + columns - more.size());
  }

  std::string row(const char* kind, const std::string& name, const Own& own) const {
    Fields fields = stateFields();
    fields.insert(fields.end(), {kind, name});
    append(fields, own.plane, 4);
    append(fields, own.line, 8);
    append(fields, sourceFields(), 4);
    append(fields, own.check, 20);
    fields.push_back(joined(cautionsOf(m_readout, m_state)));
    return csvRow(fields);
  }

  Unit m_unit;
  const Study& m_study;
  const Readout& m_readout;
  const StateReading& m_state;
};

} // namespace

std::string readoutCsv(const Study& study, const std::vector<Readout>& points) {
  std::string rows = csvRow(heading());
  for (const Readout& readout : points)
    for (const StateReading& state : readout.states)
      rows += StateRows(study, readout, state).written();
  return rows;
}

} // namespace planewright
