// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/caption.h"

#include "core/figure/metrics.h"
#include "core/quantity/format.h"
#include "core/study/named_directions.h"
#include "core/table/table.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr double margin = 8;
constexpr double textSize = 12;
constexpr double smallText = 11;
constexpr double firstLine = 24; ///< base lines, measured from below
constexpr double secondLine = 8;

/// Names of the directions on which an angle stands; multiples of 15 deg have none.
std::vector<Text> namesAt(Angle angle, const std::vector<NamedDirection>& directions) {
  std::vector<Text> names;
  for (const NamedDirection& direction : directions)
    if (direction.byName && coincide(direction.angle, angle))
      names.push_back(direction.name);
  return names;
}

Text joined(const std::vector<Text>& names) {
  Text all = names.front();
  for (std::size_t i = 1; i < names.size(); ++i)
    all = PW_TEXT("Element", "%1 and %2").with(all).with(names[i]);
  return all;
}

/// The caption with all names, with the first alone and with none: the first that fits is taken.
std::vector<Text> formsOf(const Text& angles, const std::vector<Text>& names) {
  std::vector<Text> result;
  const Text on = PW_TEXT("Element", "%1  ·  on %2").with(angles);
  if (names.size() > 1)
    result.push_back(on.with(joined(names)));
  if (!names.empty())
    result.push_back(on.with(names.front()));
  result.push_back(angles);
  return result;
}

struct Line {
  double fromBelow;
  double size;
  Role role;
  bool bold;
  const char* key;
};

/// The first of the forms that fits the width at nearly its size; the last is made as small as it needs.
void addLine(Picture& picture, const ElementCaption& caption, const Line& line,
             const std::vector<Text>& forms) {
  constexpr double nearly = 0.87;
  const double room = caption.size.width() - 2 * margin;
  for (const Text& form : forms) {
    const Runs words = runs(form, caption.translate);
    const double size = std::min(line.size, room / textWidth(words, 1, line.bold));
    if (size < nearly * line.size && form != forms.back())
      continue;
    picture.parts.push_back(Label{{caption.size.width() / 2, caption.size.height() - line.fromBelow},
                                  words,
                                  size,
                                  Align::middle,
                                  line.role,
                                  line.bold,
                                  false,
                                  line.key});
    return;
  }
}

Text stressesOfReading(const ElementCaption& caption) {
  const StateReading& state = caption.readout.state();
  const Angle t = caption.readout.reading.value + Angle::fromDegrees(90);
  const double onT = tractionOn(state.stress, {t}).sn;
  return symbol("σ_{n} %1    τ_{nt} %2    σ_{t} %3  %4")
      .with(shownStress(caption.study, state, state.reading.sn))
      .with(shownStress(caption.study, state, state.reading.tnt))
      .with(shownStress(caption.study, state, onT))
      .with(caption.study.units.stress);
}

} // namespace

void addHeading(Picture& picture, const ElementCaption& caption, bool snapping) {
  constexpr double base = 21;
  constexpr double left = 14;
  constexpr double right = 12;
  constexpr double headingSize = 13;
  picture.parts.push_back(Label{{left, base},
                                runs(PW_TEXT("Element", "Element"), caption.translate),
                                headingSize,
                                Align::start,
                                Role::ink,
                                true,
                                false,
                                "heading"});
  const Text fact = snapping ? PW_TEXT("Element", "snap on") : PW_TEXT("Element", "snap off");
  picture.parts.push_back(Label{{caption.size.width() - right, base},
                                runs(fact, caption.translate),
                                smallText,
                                Align::end,
                                Role::soft,
                                false,
                                false,
                                "fact"});
}

void addCaption(Picture& picture, const ElementCaption& caption, bool ofLine) {
  const Readout& readout = caption.readout;
  const bool begun = readout.state().stress != PlaneStress{};
  if (ofLine && !readout.lines.empty()) {
    const LineReading& line = readout.lines.front();
    const Text angle = PW_TEXT("Element", "%1 at %2").with(line.name).with(shownDegrees(line.angle.value, 1));
    addLine(picture, caption, {firstLine, textSize, Role::line, true, "caption"},
            formsOf(angle, namesAt(line.angle.value, directionsForLine(readout))));
  } else {
    const NormalAngle normal = readout.reading;
    const Text angles = PW_TEXT("Element", "normal at %1  ·  cut at %2")
                            .with(shownDegrees(normal.value, 1))
                            .with(shownDegrees(cutOf(normal).value, 1));
    addLine(
        picture, caption, {firstLine, textSize, Role::reading, true, "caption"},
        formsOf(angles, begun ? namesAt(normal.value, directionsForNormal(readout)) : std::vector<Text>()));
  }
  if (begun && caption.compact)
    addLine(picture, caption, {secondLine, textSize, Role::state, true, "stresses"},
            {stressesOfReading(caption)});
  else if (begun)
    addLine(picture, caption, {secondLine, smallText, Role::soft, false, "unit"},
            {PW_TEXT("Element", "stresses in %1").with(caption.study.units.stress)});
  else
    addLine(picture, caption, {secondLine, smallText, Role::ink, false, "beginning"},
            {PW_TEXT("Element", "Type the stresses from the hand calc; 18.6 kN/(90 mm*240 mm) is fine")});
}

} // namespace planewright
