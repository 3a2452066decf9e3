// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/check_values.h"
#include "core/record/json_writer.h"
#include "core/record/readout_file.h"
#include "core/table/cautions.h"
#include "core/table/check_words.h"
#include "core/table/table.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr int readoutVersion = 1;

/// Writes the parts of a readout, stresses in the study's unit.
class ReadoutWriter {
public:
  explicit ReadoutWriter(const Study& study) : m_study(study), m_unit(stressUnitOf(study)) {}

  std::string written(const std::vector<Readout>& points) {
    m_json.beginObject();
    text("format", "planewright-readout");
    m_json.key("version").whole(readoutVersion);
    head();
    governing(points);
    m_json.key("points").beginList();
    for (const Readout& readout : points)
      point(readout);
    m_json.endList();
    m_json.endObject();
    return m_json.taken();
  }

private:
  void text(const char* key, std::string_view words) { m_json.key(key).text(words); }
  void stress(const char* key, double value) { m_json.key(key).number(m_unit.fromBase(value)); }
  void angle(const char* key, Angle value) { m_json.key(key).number(value.degrees()); }
  void angle(const char* key, const std::optional<NormalAngle>& normal) {
    if (normal)
      angle(key, normal->value);
    else
      m_json.key(key).null();
  }

  void head() {
    m_json.key("units").beginObject();
    text("stress", m_study.units.stress);
    text("angle", "deg");
    m_json.endObject();
    m_json.key("convention").beginObject();
    text("positive", wordOf(m_study.convention.positive));
    m_json.endObject();
  }

  void governing(const std::vector<Readout>& points) {
    m_json.key("governing");
    const std::optional<JudgedCheck> worst = verdictOf(points).governing;
    if (!worst)
      return m_json.null();
    const Readout& readout = *std::ranges::find(points, worst->point, &Readout::point);
    const CheckReading& reading = readingOf(readout, *worst);
    m_json.beginObject();
    text("point", worst->point);
    text("combination", readout.states[worst->state].combination);
    text("check", readout.checks[worst->check].id);
    value({"utilisation", finite(reading.worst.utilisation)});
    value({"load_multiplier", finite(reading.leastMultiplier())});
    value({"angle", reading.worstAngle ? CheckValue(reading.worstAngle->degrees()) : CheckValue()});
    value({"mode", modeOf(reading.worst)});
    m_json.endObject();
  }

  void cautions(const std::vector<Text>& texts) {
    m_json.key("cautions").beginList();
    for (const Text& caution : texts)
      m_json.text(plain(caution));
    m_json.endList();
  }

  void point(const Readout& readout) {
    m_json.beginObject();
    text("name", readout.point);
    cautions(cautionsOf(readout));
    m_json.key("states").beginList();
    for (const StateReading& one : readout.states)
      state(readout, one);
    m_json.endList();
    m_json.endObject();
  }

  void state(const Readout& readout, const StateReading& state) {
    m_json.beginObject();
    text("combination", state.combination);
    m_json.key("judged").boolean(state.judged);
    stress("sx", state.stress.sx);
    stress("sy", state.stress.sy);
    stress("txy", state.stress.txy);
    stress("sz", state.sz);
    stress("sx_axial", state.axial);
    stress("sx_bending", state.bending);
    circle(state.circle);
    m_json.key("planes").beginList();
    for (std::size_t i = 0; i < readout.watched.size(); ++i)
      plane(readout.watched[i], state.watched[i]);
    m_json.endList();
    m_json.key("lines").beginList();
    for (std::size_t i = 0; i < readout.lines.size(); ++i)
      line(readout.lines[i], state, state.lines[i]);
    m_json.endList();
    freeEdge(readout, state);
    m_json.key("checks").beginList();
    for (std::size_t i = 0; i < state.checks.size(); ++i)
      check(readout.checks[i], state.checks[i]);
    m_json.endList();
    m_json.endObject();
  }

  void circle(const Circle& circle) {
    stress("mean", circle.mean);
    stress("radius", circle.radius);
    stress("s1", circle.s1);
    stress("s2", circle.s2);
    angle("theta1", circle.theta1);
    stress("tau_max", circle.radius);
    angle("theta_tau_max", circle.thetaTauMax);
    stress("tau_abs_max", circle.tauAbsMax);
  }

  void plane(const WatchedReading& plane, const Traction& traction) {
    m_json.beginObject();
    text("name", plane.name);
    angle("normal", plane.normal.value);
    angle("cut", cutOf(plane.normal).value);
    stress("sn", traction.sn);
    stress("tnt", traction.tnt);
    m_json.endObject();
  }

  void freeEdge(const Readout& readout, const StateReading& state) {
    m_json.key("free_edge");
    if (!state.edge)
      return m_json.null();
    m_json.beginObject();
    angle("edge", readout.edge->value);
    stress("sn", state.edge->traction.sn);
    stress("tnt", state.edge->traction.tnt);
    m_json.endObject();
  }

  void line(const LineReading& line, const StateReading& state, const LineStress& stresses) {
    const AlongParts parts = alongPartsOf(state, line.angle);
    m_json.beginObject();
    text("name", line.name);
    text("kind", wordOf(line.kind));
    angle("angle", line.angle.value);
    angle("tolerance", line.tolerance);
    stress("along", stresses.along);
    stress("across", stresses.across);
    stress("shear", stresses.shear);
    stress("along_axial", parts.axial);
    stress("along_bending", parts.bending);
    m_json.endObject();
  }

  void value(const CheckField& field) {
    m_json.key(field.key);
    switch (field.value.is) {
    case CheckValue::Is::text:
      return m_json.text(field.value.text);
    case CheckValue::Is::number:
      return m_json.number(field.value.number);
    case CheckValue::Is::truth:
      return m_json.boolean(field.value.truth);
    case CheckValue::Is::nothing:
      return m_json.null();
    }
  }

  void values(const std::vector<CheckField>& fields) {
    for (const CheckField& field : fields)
      value(field);
  }

  void check(const CheckSetup& setup, const CheckReading& reading) {
    m_json.beginObject();
    text("id", setup.id);
    values(subjectOf(setup));
    m_json.key("parameters").beginObject();
    values(parametersOf(setup, m_unit));
    m_json.endObject();
    values(nominalOf(setup, reading));
    m_json.key("band");
    if (setup.band) {
      m_json.beginList();
      m_json.number(setup.band->from().degrees());
      m_json.number(setup.band->to().degrees());
      m_json.endList();
    } else
      m_json.null();
    values(worstOf(reading));
    cautions(cautionsOf(setup, reading));
    m_json.endObject();
  }

  const Study& m_study;
  Unit m_unit;
  JsonWriter m_json;
};

} // namespace

std::string readoutJson(const Study& study, const std::vector<Readout>& points) {
  return ReadoutWriter(study).written(points);
}

} // namespace planewright
