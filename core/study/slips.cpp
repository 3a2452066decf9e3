// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/slips.h"

#include "core/study/place.h"

#include <cmath>

namespace planewright {

template <>
const std::vector<Named<Asked>>& namesOf() {
  static const std::vector<Named<Asked>> names = {
      {Asked::sn, "sn", PW_TEXT("Slip", "σ_{n} on the reading plane")},
      {Asked::tnt, "tnt", PW_TEXT("Slip", "τ_{nt} on the reading plane")},
      {Asked::along, "along", PW_TEXT("Slip", "stress along the line")},
      {Asked::across, "across", PW_TEXT("Slip", "stress across the line")},
      {Asked::shear, "shear", PW_TEXT("Slip", "shear on the cut that crosses the line")},
      {Asked::s1, "s1", PW_TEXT("Slip", "principal stress σ_{1}")},
      {Asked::s2, "s2", PW_TEXT("Slip", "principal stress σ_{2}")},
      {Asked::tauMax, "tau_max", PW_TEXT("Slip", "greatest shear in the plane")}};
  return names;
}

namespace {

/// What an answer is made of: the state and the angle of the plane or of the line.
struct Inputs {
  PlaneStress stress;
  Angle angle;
};

bool isOnLine(Asked asked) {
  return asked == Asked::along || asked == Asked::across || asked == Asked::shear;
}
bool isShear(Asked asked) {
  return asked == Asked::tnt || asked == Asked::shear;
}
bool isPrincipal(Asked asked) {
  return asked == Asked::s1 || asked == Asked::s2 || asked == Asked::tauMax;
}

std::optional<Inputs> inputsOf(Asked asked, const Readout& readout) {
  const PlaneStress& stress = readout.state().stress;
  if (!isOnLine(asked))
    return Inputs{stress, readout.reading.value};
  if (readout.lines.empty())
    return std::nullopt;
  return Inputs{stress, readout.lines.front().angle.value};
}

double mean(const PlaneStress& stress) {
  return (stress.sx + stress.sy) / 2;
}
double halfDifference(const PlaneStress& stress) {
  return (stress.sx - stress.sy) / 2;
}

double principal(Asked asked, double centre, double radius) {
  return asked == Asked::s1 ? centre + radius : asked == Asked::s2 ? centre - radius : radius;
}

double answer(Asked asked, const Inputs& inputs) {
  const PlaneStress& s = inputs.stress;
  if (isPrincipal(asked))
    return principal(asked, mean(s), std::hypot(halfDifference(s), s.txy));
  const Angle angle = asked == Asked::across ? inputs.angle + Angle::fromDegrees(90) : inputs.angle;
  const Traction traction = tractionOn(s, {angle});
  return isShear(asked) ? traction.tnt : traction.sn;
}

/// The transformation with any two numbers in place of the cosine and the sine of the doubled angle.
double transformed(Asked asked, const PlaneStress& s, double cosine, double sine) {
  const double turned = halfDifference(s) * cosine + s.txy * sine;
  if (isShear(asked))
    return -halfDifference(s) * sine + s.txy * cosine;
  return asked == Asked::across ? mean(s) - turned : mean(s) + turned;
}

class Slips {
public:
  Slips(Asked asked, const Inputs& inputs, const Readout& readout)
      : m_asked(asked), m_inputs(inputs), m_readout(readout), m_right(answer(asked, inputs)) {}

  std::vector<Slip> all() {
    if (isPrincipal(m_asked))
      addOfPrincipal();
    else
      addOfAngle();
    addOfState();
    return std::move(m_slips);
  }

private:
  /// A slip that makes the right number shows nothing.
  void add(Text words, double value) {
    const double scale =
        std::abs(mean(m_inputs.stress)) + std::hypot(halfDifference(m_inputs.stress), m_inputs.stress.txy);
    if (std::abs(value - m_right) > 1e-12 * scale)
      m_slips.push_back({std::move(words), value});
  }

  void addTurned(Text words, Angle angle) {
    add(std::move(words), answer(m_asked, {m_inputs.stress, angle}));
  }
  void addState(Text words, const PlaneStress& stress) {
    add(std::move(words), answer(m_asked, {stress, m_inputs.angle}));
  }

  void addOfAngle() {
    const Angle angle = m_inputs.angle;
    const double degrees = angle.degrees();
    const PlaneStress& s = m_inputs.stress;
    if (isOnLine(m_asked))
      addTurned(
          PW_TEXT("Slip", "the angle of the line taken for that of the normal of the cut that follows it"),
          angle + Angle::fromDegrees(90));
    else
      addTurned(PW_TEXT("Slip", "the angle of the cut taken for that of its normal"),
                angle + Angle::fromDegrees(90));
    addTurned(PW_TEXT("Slip", "θ and 90° − θ exchanged"), Angle::fromDegrees(90) - angle);
    addTurned(PW_TEXT("Slip", "the angle turned clockwise"), -angle);
    addTurned(PW_TEXT("Slip", "θ where 2θ belongs: the doubling forgotten"), Angle::fromDegrees(degrees / 2));
    addTurned(PW_TEXT("Slip", "2θ taken for θ: doubled twice"), Angle::fromDegrees(2 * degrees));
    add(PW_TEXT("Slip", "degrees put into functions of radians"),
        transformed(m_asked, s, std::cos(2 * degrees), std::sin(2 * degrees)));
    addTurned(PW_TEXT("Slip", "radians taken for degrees"), Angle::fromDegrees(angle.radians()));
    addOfSlope();
    const CosSin two = cosSinOfDouble(angle);
    add(PW_TEXT("Slip", "the term of τ_{xy} with half its value: sin θ cos θ where sin 2θ belongs"),
        transformed(m_asked, {s.sx, s.sy, s.txy / 2}, two.cos, two.sin));
    add(PW_TEXT("Slip", "the term of τ_{xy} forgotten"),
        transformed(m_asked, {s.sx, s.sy, 0}, two.cos, two.sin));
    if (m_asked == Asked::along)
      add(PW_TEXT("Slip", "the stress across the line taken for that along it"),
          answer(Asked::across, m_inputs));
    if (m_asked == Asked::across)
      add(PW_TEXT("Slip", "the stress along the line taken for that across it"),
          answer(Asked::along, m_inputs));
  }

  /// A slope 1 in n read as n degrees, or as 1/n degrees.
  void addOfSlope() {
    if (!isOnLine(m_asked))
      return;
    const double tangent = std::tan(m_inputs.angle.radians());
    if (tangent == 0 || !std::isfinite(1 / tangent))
      return;
    addTurned(PW_TEXT("Slip", "a slope 1 in n read as n degrees"), Angle::fromDegrees(1 / tangent));
    addTurned(PW_TEXT("Slip", "a slope taken as degrees"), Angle::fromDegrees(tangent));
    addTurned(PW_TEXT("Slip", "a slope in per cent read as degrees"), Angle::fromDegrees(100 * tangent));
  }

  void addOfPrincipal() {
    const PlaneStress& s = m_inputs.stress;
    const double radius = std::hypot(halfDifference(s), s.txy);
    add(PW_TEXT("Slip", "the radius with the whole difference: √((σ_{x} − σ_{y})² + τ_{xy}²)"),
        principal(m_asked, mean(s), std::hypot(2 * halfDifference(s), s.txy)));
    add(PW_TEXT("Slip", "the radius with the mean: √(((σ_{x} + σ_{y})/2)² + τ_{xy}²)"),
        principal(m_asked, mean(s), std::hypot(mean(s), s.txy)));
    add(PW_TEXT("Slip", "the mean without its half: σ_{x} + σ_{y}"), principal(m_asked, 2 * mean(s), radius));
    add(PW_TEXT("Slip", "σ = r ± mean in place of mean ± r"),
        m_asked == Asked::s2 ? radius - mean(s) : principal(m_asked, mean(s), radius));
    add(PW_TEXT("Slip", "τ_{xy} forgotten"), principal(m_asked, mean(s), std::abs(halfDifference(s))));
    add(PW_TEXT("Slip", "the root left out: ((σ_{x} − σ_{y})/2)² + τ_{xy}²"),
        principal(m_asked, mean(s), radius * radius));
    if (m_asked == Asked::s1 || m_asked == Asked::s2)
      add(PW_TEXT("Slip", "σ_{1} and σ_{2} exchanged"),
          answer(m_asked == Asked::s1 ? Asked::s2 : Asked::s1, m_inputs));
    else
      add(PW_TEXT("Slip", "the greatest shear of all planes, with the third principal stress"),
          m_readout.state().circle.tauAbsMax);
  }

  void addOfState() {
    const PlaneStress& s = m_inputs.stress;
    addState(PW_TEXT("Slip", "the sign of τ_{xy}"), {s.sx, s.sy, -s.txy});
    addState(PW_TEXT("Slip", "σ_{x} and σ_{y} exchanged"), {s.sy, s.sx, s.txy});
    addState(PW_TEXT("Slip", "the sign of σ_{x}"), {-s.sx, s.sy, s.txy});
    addState(PW_TEXT("Slip", "the sign of σ_{y}"), {s.sx, -s.sy, s.txy});
    addState(PW_TEXT("Slip", "σ_{y} forgotten"), {s.sx, 0, s.txy});
    addState(PW_TEXT("Slip", "σ_{x} forgotten"), {0, s.sy, s.txy});
    add(isShear(m_asked) ? PW_TEXT("Slip", "the sign of the shear: another convention, or the other face")
                         : PW_TEXT("Slip", "the sign: compression and tension exchanged"),
        -m_right);
  }

  Asked m_asked;
  Inputs m_inputs;
  const Readout& m_readout;
  double m_right;
  std::vector<Slip> m_slips;
};

} // namespace

std::vector<Slip> slipsFor(Asked asked, const Readout& readout) {
  const std::optional<Inputs> inputs = inputsOf(asked, readout);
  return inputs ? Slips(asked, *inputs, readout).all() : std::vector<Slip>();
}

std::optional<double> answerTo(Asked asked, const Readout& readout) {
  const std::optional<Inputs> inputs = inputsOf(asked, readout);
  return inputs ? std::optional(answer(asked, *inputs)) : std::nullopt;
}

Result<Comparison> compared(const Study& study, const Readout& readout, Asked asked, std::string_view typed) {
  Result<Entry> entry = readEntry(typed, entryKindOf(study, Spot::sx));
  if (!entry)
    return tl::unexpected(std::move(entry).error());
  const std::optional<double> ours = answerTo(asked, readout);
  if (!ours)
    return tl::unexpected(Problem{{},
                                  0,
                                  0,
                                  std::string(typed),
                                  PW_TEXT("Slip", "This point has no line."),
                                  PW_TEXT("Slip", "Give the line, or ask about a plane.")});
  const auto makes = [&](double value) {
    return std::abs(value - entry->value) <= entry->halfWidth * (1 + 1e-9);
  };
  Comparison result{*ours, makes(*ours), {}};
  if (!result.agrees)
    for (Slip& slip : slipsFor(asked, readout))
      if (makes(slip.value))
        result.slips.push_back(std::move(slip.words));
  return result;
}

} // namespace planewright
