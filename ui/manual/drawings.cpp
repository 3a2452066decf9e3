// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/manual/drawings.h"

#include "core/figure/circle_panel.h"
#include "core/figure/element.h"
#include "core/figure/section_drawing.h"
#include "core/figure/signs.h"
#include "core/study/case_sources.h"
#include "core/study/edit.h"
#include "ui/look/look.h"
#include "ui/manual/drawings_of_cuts.h"

#include <cassert>
#include <functional>

namespace planewright {

namespace {

constexpr double pixelsOfMm = 3.78;

/// A state with three positive components and a line, read at 30 deg; invented.
Study exampleOfSigns() {
  const Study plain = newStudy();
  const std::string point = plain.points.front().name;
  const std::string loadCase = plain.cases.front().id;
  const Result<Study> study = edited(plain, Edits{Type{{Spot::sx, point, loadCase}, "8 MPa"},
                                                  Type{{Spot::sy, point, loadCase}, "5 MPa"},
                                                  Type{{Spot::txy, point, loadCase}, "3 MPa"},
                                                  Type{{Spot::lineAngle, point, "grain"}, "1 in 10"},
                                                  Type{{Spot::reading, point, {}}, "30 deg"}});
  assert(study);
  return *study;
}

Study exampleOfTolerance() {
  const Study plain = exampleOfSigns();
  const std::string point = plain.points.front().name;
  const Result<Study> study = edited(plain, Edits{Type{{Spot::lineAngle, point, "grain"}, "20 deg"},
                                                  Type{{Spot::lineTolerance, point, "grain"}, "10 deg"},
                                                  Type{{Spot::reading, point, {}}, "20 deg"}});
  assert(study);
  return *study;
}

Study exampleOfCompression() {
  Study study = exampleOfSigns();
  study.convention.positive = Positive::compression;
  return study;
}

/// An element with its symbols at both sides.
Picture elementOf(const Study& study, bool turned) {
  const Readout readout = evaluate(study);
  Picture picture;
  picture.width = 300;
  picture.height = 216;
  ElementOrder order;
  order.centre = {picture.width / 2, 112};
  order.outer = 104;
  order.turned = turned;
  order.wide = 2;
  order.cut = 3.5;
  order.medium = 1.4;
  order.narrow = 1;
  order.hair = 0.8;
  order.textSize = 14;
  order.translate = translation();
  std::vector<LabelWish> symbols = drawElement(picture, study, readout, order);
  for (LabelWish& wish : symbols)
    wish.longForm = wish.shortForm;
  const LabelColumns columns{order.centre.x, 58, picture.width - 58, 4, picture.height - 4, 13, 0.8};
  const PlacedLabels placed = placeLabels(symbols, columns);
  picture.parts.insert(picture.parts.end(), placed.leaders.begin(), placed.leaders.end());
  picture.parts.insert(picture.parts.end(), placed.labels.begin(), placed.labels.end());
  return picture;
}

std::optional<Pen> larger(std::optional<Pen> pen, double factor) {
  if (pen)
    pen->width *= factor;
  return pen;
}

/// A picture in mm as one in pixels.
Picture larger(Picture picture, double factor) {
  struct Grow {
    double factor;
    void operator()(Path& path) const {
      for (Vec& point : path.points)
        point = factor * point;
      path.pen = larger(path.pen, factor);
    }
    void operator()(Arc& arc) const {
      arc.centre = factor * arc.centre;
      arc.radius *= factor;
      arc.pen = larger(arc.pen, factor);
    }
    void operator()(Label& label) const {
      label.at = factor * label.at;
      label.size *= factor;
    }
  };
  picture.width *= factor;
  picture.height *= factor;
  for (auto& part : picture.parts)
    std::visit(Grow{factor}, part);
  return picture;
}

/// The circle of the figure: the shear axis drawn downwards, or upwards.
Picture circleOf(ShearAxis axis) {
  Study study = exampleOfSigns();
  study.points.front().reading = "60 deg"; // far enough from σ1 to be told from it
  study.convention.shearAxis = axis;
  const Readout readout = evaluate(study);
  FigureOrder order;
  order.translate = translation();
  Picture picture;
  picture.width = 84;
  picture.height = 74;
  drawCirclePanel(picture, settingOf(study, readout, order), {1, 1, picture.width - 1, picture.height - 1});
  return larger(picture, pixelsOfMm);
}

/// A rectangle under bending and shear, its fibre in the lower half of the side; invented.
Picture sectionOf() {
  Study study = exampleOfSigns();
  TypedSection section;
  section.name = "beam";
  section.sizes = {{"b", "90 mm"}, {"h", "240 mm"}};
  study.sections.push_back(section);
  Point& point = study.points.front();
  point.fibre = FibreTexts{"beam", "-60 mm", "45 mm", View::side};
  CaseStress& stress = point.stress.front();
  stress.sx = stress.sy = stress.txy = "0 MPa";
  stress.forces = ForceTexts{};
  stress.forces->Vy = "12 kN";
  stress.forces->Mz = "8 kN*m";
  const Readout readout = evaluate(study);
  const std::optional<LoadedSection> loaded = loadedSectionOf(study, readout, readout.state());
  assert(loaded);
  const auto drawn = drawnSection(*loaded, stressFormOf(study, readout.state()), 380, 240, 13);
  assert(drawn);
  return drawn->picture;
}

/// One sign, small enough to stand in a line of text.
Picture pictureOf(Sign sign, Role role) {
  Picture picture;
  picture.width = picture.height = 18;
  drawSign(picture, {sign, role, {9, 9}, 11, 1.4});
  return picture;
}

struct Drawing {
  const char* name;
  std::function<Picture()> draw;
};

const std::vector<Drawing>& drawings() {
  static const std::vector<Drawing> all = {
      {"given", [] { return elementOf(exampleOfSigns(), false); }},
      {"given-compression", [] { return elementOf(exampleOfCompression(), false); }},
      {"turned", [] { return elementOf(exampleOfSigns(), true); }},
      {"tolerance", [] { return elementOf(exampleOfTolerance(), false); }},
      {"crossing", [] { return cutByLine(true); }},
      {"following", [] { return cutByLine(false); }},
      {"slope", slopeOfOneInTen},
      {"gauges", gaugesOfRosette},
      {"circle", [] { return circleOf(ShearAxis::tensorDown); }},
      {"circle-up", [] { return circleOf(ShearAxis::tensorUp); }},
      {"section", sectionOf},
      {"sign-reading", [] { return pictureOf(Sign::filledRound, Role::reading); }},
      {"sign-watched", [] { return pictureOf(Sign::hollowRound, Role::ink); }},
      {"sign-x", [] { return pictureOf(Sign::filledSquare, Role::state); }},
      {"sign-y", [] { return pictureOf(Sign::hollowSquare, Role::state); }},
      {"sign-principal", [] { return pictureOf(Sign::uprightTick, Role::state); }},
      {"sign-shear", [] { return pictureOf(Sign::levelTick, Role::state); }},
      {"sign-crossing", [] { return pictureOf(Sign::filledLozenge, Role::line); }},
      {"sign-following", [] { return pictureOf(Sign::hollowLozenge, Role::line); }}};
  return all;
}

} // namespace

QStringList drawingNames() {
  QStringList names;
  for (const Drawing& one : drawings())
    names += QString::fromLatin1(one.name);
  return names;
}

Picture drawing(const QString& name) {
  for (const Drawing& one : drawings())
    if (name == QLatin1String(one.name))
      return one.draw();
  return {};
}

} // namespace planewright
