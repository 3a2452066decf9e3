// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/section_forces.h"

#include "core/quantity/format.h"
#include "core/working/written.h"
#include "tests/support/section_gen.h"
#include "tests/support/strips.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

using testing::Contains;
using testing::HasSubstr;

SectionModel model(const Section& section) {
  auto made = modelOf(section);
  EXPECT_TRUE(made) << (made ? "" : plain(made.error().front()));
  return *std::move(made);
}

FibreStress at(const Section& section, const SectionForces& forces, const Fibre& fibre,
               ShearRule rule = ShearRule::upward) {
  auto stress = stressAt(model(section), forces, fibre, rule);
  EXPECT_TRUE(stress) << (stress ? "" : plain(stress.error()));
  return stress ? *std::move(stress) : FibreStress{};
}

std::string problemOf(const Section& section, const SectionForces& forces, const Fibre& fibre) {
  const auto stress = stressAt(model(section), forces, fibre, ShearRule::upward);
  return stress ? "none" : plain(stress.error());
}

std::vector<std::string> cautionsOf(const Section& section, const SectionForces& forces, const Fibre& fibre) {
  std::vector<std::string> cautions;
  for (const Text& caution : at(section, forces, fibre).cautions)
    cautions.push_back(plain(caution));
  return cautions;
}

const Section beam = rectangleSection(90, 240);
const Section joist = iSection(300, 8, 150, 10, 150, 10, 0);
const Section angle = builtSection({{100, 10, 5, 50, {}}, {10, 90, 55, 5, {}}});

SectionForces anyForces() {
  const auto any = [] { return *rc::gen::inRange(-1000, 1001); };
  return {any() * 100.0, any() * 100.0, any() * 100.0, 0, any() * 1e4, any() * 1e4};
}

TEST(SectionForces, saggingPullsBelowTheAxis) {
  EXPECT_NEAR(at(beam, {.Mz = 12.4e6}, {120, 0}).stress.sx, -12.4e6 / 864e3, 1e-9);
  EXPECT_NEAR(at(beam, {.Mz = 12.4e6}, {-120, 0}).stress.sx, 12.4e6 / 864e3, 1e-9);
  EXPECT_GT(at(beam, {.My = 1e6}, {0, 45}).stress.sx, 0);
  const FibreStress both = at(beam, {.N = -21600, .Mz = 8.64e6}, {-120, 0});
  EXPECT_NEAR(both.axial, -1, 1e-12);
  EXPECT_NEAR(both.bending, 10, 1e-12);
  EXPECT_EQ(both.stress.sx, both.axial + both.bending);
}

TEST(SectionForces, shearByEitherRule) {
  EXPECT_NEAR(at(beam, {.Vy = 14400}, {0, 45}).stress.txy, 1, 1e-12);
  EXPECT_NEAR(at(beam, {.Vy = 14400}, {0, 45}, ShearRule::slope).stress.txy, -1, 1e-12);
  EXPECT_EQ(at(beam, {.Vy = 14400}, {120, 45}).stress.txy, 0);
  // Seen from the top the second axis is -z.
  EXPECT_NEAR(at(beam, {.Vz = 14400}, {120, 0, View::top}).stress.txy, -1, 1e-12);
  EXPECT_NEAR(at(beam, {.Vz = 14400}, {120, 0, View::top}, ShearRule::slope).stress.txy, -1, 1e-12);
}

TEST(SectionForces, shearAndTorsionAddOnOneSideAndSubtractOnTheOther) {
  const SectionForces forces{.Vy = 20e3, .T = 2e5};
  for (const Section& section : {circleSection(60), tubeSection(60, 6), rectangleSection(60, 90),
                                 boxSection(60, 90, 4, 5), iSection(90, 6, 60, 8, 60, 8, 0)}) {
    const double face = section.shape == SectionShape::i ? 3 : 30;
    const FibreStress near = at(section, forces, {0, face});
    const FibreStress far = at(section, forces, {0, -face});
    EXPECT_GT(near.shear, 0);
    EXPECT_NEAR(near.shear, far.shear, 1e-12);
    EXPECT_LT(near.torsion->txy, 0);
    EXPECT_NEAR(near.stress.txy + far.stress.txy, 2 * near.shear, 1e-12);
    EXPECT_LT(std::abs(near.stress.txy), std::abs(far.stress.txy));
  }
}

// Equilibrium of a strip: what the growth of sx over dx pulls the part above the cut along is what the cut
// holds. dMz/dx = -Vy on the strip by the upward rule, dMy/dx = Vz.
double heldByCut(const SectionModel& model, const SectionForces& growth, double y) {
  return overStrips(model.region, y, [&](double level, const Span& span, double thin) {
    const Fibre middle{level, (span.from + span.to) / 2};
    return thin * span.length() * stressAt(model, growth, middle, ShearRule::upward)->stress.sx;
  });
}

RC_GTEST_PROP(SectionForces, theShearBalancesAStrip, ()) {
  const Section section = *rc::gen::element(0, 1) == 0 ? anySection() : angle;
  RC_PRE(problemsOf(section).empty());
  const SectionModel made = model(section);
  const double V = *rc::gen::inRange(-100, 101) * 1000.0;
  const double y =
      made.region.yLow + (made.region.yHigh - made.region.yLow) * *rc::gen::inRange(1, 100) / 100;
  std::vector<Span> spans = spansAt(made.region, nearestLevelOr(made.region, y), Side::above);
  if (spans.empty())
    spans = spansAt(made.region, nearestLevelOr(made.region, y), Side::below);
  const double z = section.shape == SectionShape::box || section.shape == SectionShape::tube ? spans.back().to
                   : section.shape == SectionShape::channel || section.shape == SectionShape::built
                       ? made.region.zLow + 1
                       : 0;
  const auto upward = stressAt(made, {.Vy = V}, {y, z}, ShearRule::upward);
  const auto slope = stressAt(made, {.Vy = V}, {y, z}, ShearRule::slope);
  RC_ASSERT(upward.has_value());
  const double scale = std::abs(V) / made.region.yHigh + 1e-9;
  const double width = upward->ofV.cut.width;
  RC_ASSERT(std::abs(upward->stress.txy * width - heldByCut(made, {.Mz = -V}, y)) <= 1e-3 * scale);
  RC_ASSERT(std::abs(slope->stress.txy * width - heldByCut(made, {.Mz = V}, y)) <= 1e-3 * scale);
}

TEST(SectionForces, theShearOfVzInAnUprightWallBalancesAStrip) {
  for (const Section& section : {channelSection(200, 80, 8, 12), angle}) {
    const SectionModel made = model(section);
    const double y = made.region.yLow + 60;
    const FibreStress stress = at(section, {.Vz = 10e3}, {y, made.region.zLow});
    EXPECT_NEAR(stress.stress.txy * stress.ofV.cut.width, heldByCut(made, {.My = 10e3}, y), 0.05);
    EXPECT_GT(std::abs(stress.stress.txy), 0.5);
  }
}

RC_GTEST_PROP(SectionForces, theShearOverTheDepthIsV, ()) {
  const Section section = anySection();
  RC_PRE(problemsOf(section).empty());
  const SectionModel made = model(section);
  const auto sumOver = [&](ShearRule rule) {
    return overStrips(made.region, made.region.yLow, [&](double y, const Span& span, double thin) {
      // In the web, where the formula holds; every wall of the cut takes its share.
      const double z = section.shape == SectionShape::channel ? made.region.zLow + 1
                       : section.shape == SectionShape::box || section.shape == SectionShape::tube ? span.to
                                                                                                   : 0;
      return thin * span.length() * stressAt(made, {.Vy = 1000}, {y, z}, rule)->stress.txy;
    });
  };
  RC_ASSERT(std::abs(sumOver(ShearRule::upward) - 1000) <= 0.5);
  RC_ASSERT(std::abs(sumOver(ShearRule::slope) + 1000) <= 0.5);
}

// The normal stresses of any section resultant in N, My and Mz; with a product of inertia too.
RC_GTEST_PROP(SectionForces, theNormalStressesAddUpToTheForces, ()) {
  const Section section = *rc::gen::element(0, 1) == 0 ? anySection() : angle;
  RC_PRE(problemsOf(section).empty());
  const SectionModel made = model(section);
  const SectionForces forces = anyForces();
  const auto sx = [&](double y, double z) {
    return stressAt(made, {.N = forces.N, .My = forces.My, .Mz = forces.Mz}, {y, z}, ShearRule::upward)
        ->stress.sx;
  };
  // Linear along a span: its middle gives the force, its ends the moment about its middle.
  const auto sum = [&](auto lever) {
    return overStrips(made.region, made.region.yLow, [&](double y, const Span& span, double thin) {
      const double middle = (span.from + span.to) / 2;
      const double rise = sx(y, span.to) - sx(y, span.from);
      return thin * span.length() * lever(sx(y, middle), y, middle, rise * span.length() / 12);
    });
  };
  const double size = std::abs(forces.N) * 100 + std::abs(forces.My) + std::abs(forces.Mz) + 1;
  RC_ASSERT(std::abs(sum([](double s, double, double, double) { return s; }) - forces.N) <= 1e-5 * size);
  RC_ASSERT(std::abs(sum([](double s, double y, double, double) { return -s * y; }) - forces.Mz) <=
            1e-3 * size);
  RC_ASSERT(std::abs(sum([](double s, double, double z, double own) { return s * z + own; }) - forces.My) <=
            1e-3 * size);
}

/// The whole turned about x by -90 deg: what looked up looks at the viewer.
Section turnedToTheSide(const Section& section) {
  std::vector<Block> blocks;
  for (const Block& block : blocksOf(rebuilt(section)))
    blocks.push_back({block.b, block.h, -block.z, block.y, block.turn + Angle::fromDegrees(-90)});
  return builtSection(blocks);
}

// The view from the top is the view from the side of the body turned to the side, with its forces.
RC_GTEST_PROP(SectionForces, theViewFromTheTopIsThatOfTheBodyTurnedToTheSide, ()) {
  const Section section = anySharpSection();
  RC_PRE(problemsOf(section).empty());
  RC_PRE(section.shape != SectionShape::rectangle);
  SectionForces f = anyForces();
  if (section.shape != SectionShape::box)
    f.T = *rc::gen::inRange(-100, 101) * 1e3;
  const SectionModel made = model(section);
  const SectionModel turned = model(turnedToTheSide(section));
  for (const NamedFibre& named : readyFibres(made)) {
    const Fibre& fibre = named.fibre;
    const auto top = stressAt(made, f, {fibre.y, fibre.z, View::top}, ShearRule::upward);
    const auto side = stressAt(turned, {f.N, -f.Vz, f.Vy, f.T, -f.Mz, f.My}, {-fibre.z, fibre.y, View::side},
                               ShearRule::upward);
    RC_ASSERT(top.has_value() == side.has_value());
    if (top) {
      RC_ASSERT(std::abs(top->stress.sx - side->stress.sx) <= 1e-6);
      RC_ASSERT(std::abs(top->stress.txy - side->stress.txy) <= 1e-6);
      RC_ASSERT(top->cautions.size() == side->cautions.size());
    }
  }
}

RC_GTEST_PROP(SectionForces, anyShapeIsTheSameShapeBuiltOfRectangles, ()) {
  const Section section = anySharpSection();
  RC_PRE(problemsOf(section).empty());
  const SectionModel made = model(section);
  const SectionModel again = model(rebuilt(section));
  const SectionForces forces = anyForces();
  for (const NamedFibre& named : readyFibres(made)) {
    const auto a = stressAt(made, forces, named.fibre, ShearRule::upward);
    const auto b = stressAt(again, forces, named.fibre, ShearRule::upward);
    RC_ASSERT(a.has_value() == b.has_value());
    if (a) {
      RC_ASSERT(std::abs(a->stress.sx - b->stress.sx) <= 1e-6);
      RC_ASSERT(std::abs(a->stress.txy - b->stress.txy) <= 1e-6);
    }
  }
}

// The sx of turned blocks under turned moments is that of the blocks as they were.
RC_GTEST_PROP(SectionForces, turningBlocksAndMomentsTogetherChangesNothing, ()) {
  const Angle turn = Angle::fromDegrees(*rc::gen::inRange(-1800, 1801) / 10.0);
  const auto [cos, sin] = cosSin(turn);
  std::vector<Block> blocks;
  for (const Block& block : blocksOf(angle))
    blocks.push_back({block.b, block.h, block.y * cos + block.z * sin, block.z * cos - block.y * sin, turn});
  const SectionForces f = anyForces();
  // A vector of moments by what it pulls: (pull along z, pull along y) = (My, -Mz).
  const double My = f.My * cos + f.Mz * sin;
  const double Mz = f.Mz * cos - f.My * sin;
  const Fibre fibre{-20, -20};
  const Fibre turned{fibre.y * cos + fibre.z * sin, fibre.z * cos - fibre.y * sin};
  const double before = at(angle, {.N = f.N, .My = f.My, .Mz = f.Mz}, fibre).stress.sx;
  const double after = at(builtSection(blocks), {.N = f.N, .My = My, .Mz = Mz}, turned).stress.sx;
  RC_ASSERT(std::abs(before - after) <= 1e-9 * (std::abs(before) + 1e3));
}

RC_GTEST_PROP(SectionForces, theStressIsLinearInTheForces, ()) {
  const Section section = anySection();
  RC_PRE(problemsOf(section).empty());
  const SectionModel made = model(section);
  const SectionForces a = anyForces();
  const SectionForces b = anyForces();
  for (const NamedFibre& named : readyFibres(made)) {
    const auto first = stressAt(made, a, named.fibre, ShearRule::upward);
    const auto second = stressAt(made, b, named.fibre, ShearRule::upward);
    const auto sum = stressAt(made, a + 2.5 * b, named.fibre, ShearRule::upward);
    if (first && second && sum) {
      RC_ASSERT(std::abs(first->stress.sx + 2.5 * second->stress.sx - sum->stress.sx) <= 1e-6);
      RC_ASSERT(std::abs(first->stress.txy + 2.5 * second->stress.txy - sum->stress.txy) <= 1e-6);
    }
  }
}

// Continuity at the upper right corner of a thin box: what flows towards +z along the top wall flows down the
// right one.
TEST(SectionForces, theShearOfABoxTurnsTheCorner) {
  const Section box = boxSection(200, 300, 1, 1);
  const double top = -at(box, {.Vz = 10e3}, {150, 99, View::top}).stress.txy;
  const double right = at(box, {.Vz = 10e3}, {149, 100, View::side}).stress.txy;
  EXPECT_GT(top, 0);
  EXPECT_NEAR(right, -top, 0.02 * top);
  EXPECT_NEAR(at(box, {.Vz = 10e3}, {-149, 100, View::side}).stress.txy, -right, 1e-9);
  EXPECT_EQ(at(box, {.Vz = 10e3}, {0, 100, View::side}).stress.txy, 0);
}

TEST(SectionForces, theFlangeCarriesShearAlongItself) {
  // V S/(I t) with the outstand beside the web, seen from the top: towards the web above, away below.
  const SectionModel made = model(joist);
  const double outstand = 71 * 10 * 145;
  const double expected = 50e3 * outstand / (made.properties.Iz * 10);
  EXPECT_NEAR(at(joist, {.Vy = 50e3}, {150, 4, View::top}).stress.txy, -expected, 1e-9);
  EXPECT_NEAR(at(joist, {.Vy = 50e3}, {150, -4, View::top}).stress.txy, expected, 1e-9);
  EXPECT_NEAR(at(joist, {.Vy = 50e3}, {-150, 4, View::top}).stress.txy, expected, 1e-9);
}

TEST(SectionForces, areRefusedWhereTheFormulaDoesNotHold) {
  EXPECT_EQ(problemOf(joist, {.N = 1}, {120, 40}),
            "y = 120.0, z = 40.00 mm is outside the material. Stay in it: "
            "from the centroid y is −150.0 to 150.0, z −75.00 to 75.00 "
            "mm at most.");
  EXPECT_EQ(
      problemOf(joist, {.Vy = 1e3}, {145, 40}),
      "V S/(I b) does not hold in a flange that overhangs the web: its shear runs across the plane that is "
      "seen. Take the fibre in the web, or look from the top.");
  EXPECT_EQ(problemOf(joist, {.Mz = 1e6}, {145, 40}), "none");
  EXPECT_EQ(problemOf(joist, {.Vy = 1e3}, {140, 40}), "none");
  EXPECT_NE(problemOf(boxSection(100, 200, 5, 8), {.Vy = 1e3}, {96, 0}), "none");
  EXPECT_NE(problemOf(channelSection(200, 80, 8, 12), {.Vy = 1e3}, {95, 40}), "none");
  EXPECT_NE(problemOf(joist, {.Vz = 1e3}, {20, 0, View::top}), "none");
  EXPECT_EQ(at(joist, {.Vy = 1e3}, {140, 40}).stress.txy, 0);
}

TEST(SectionForces, roundingIsNoShear) {
  // Nothing in 21.7 mm beside the middle is exact, and on the axis of symmetry no shear runs across.
  const Section channel = channelSection(217.3, 83.1, 7.7, 11.3);
  for (const double y : {-70.0, -13.7, 0.0, 31.9, 80.0}) {
    const double web = model(channel).region.zLow + 3.85;
    for (const std::string& caution : cautionsOf(channel, {.Vy = 1e3}, {y, web}))
      EXPECT_EQ(caution.find("e-"), std::string::npos) << caution;
    for (const std::string& caution : cautionsOf(channel, {.Vy = 1e3}, {y, web}))
      EXPECT_EQ(caution.find("0.0000000"), std::string::npos) << caution;
  }
}

TEST(SectionForces, cautionsSayWhatTheViewDoesNotSee) {
  EXPECT_THAT(cautionsOf(joist, {.Vy = 50e3}, {150, 4}),
              Contains(HasSubstr("across the plane that is seen")));
  EXPECT_THAT(cautionsOf(beam, {.Vz = 50e3}, {0, 0}), Contains(HasSubstr("V also gives τxz = 3.472 MPa")));
  EXPECT_THAT(cautionsOf(joist, {.Vy = 50e3}, {140, 4}),
              Contains(HasSubstr("b = 8.000 mm; on the other side b = 150.0")));
  EXPECT_THAT(cautionsOf(circleSection(60), {.Vy = 50e3}, {18, 24}), Contains(HasSubstr("inclined")));
  EXPECT_THAT(cautionsOf(rectangleSection(240, 90), {.Vy = 50e3}, {0, 120}),
              Contains(HasSubstr("wider than")));
  EXPECT_THAT(cautionsOf(channelSection(200, 80, 8, 12), {.Vy = 1e3},
                         {0, model(channelSection(200, 80, 8, 12)).region.zLow}),
              Contains(HasSubstr("centre of shear")));
  // One caution of principle alone where all is well.
  for (const Section& section :
       {beam, circleSection(60), tubeSection(60, 5), joist, boxSection(100, 200, 5, 8)}) {
    const SectionModel made = model(section);
    const Fibre face{0, spansAt(made.region, 0, Side::above).back().to};
    EXPECT_EQ(cautionsOf(section, {.Vy = 1e3, .Vz = 1e3}, face).size(), 1u);
    EXPECT_EQ(cautionsOf(section, {.Vy = 1e3}, {made.region.yHigh, 0}).size(), 1u);
    EXPECT_EQ(cautionsOf(section, {.N = 1e3, .Mz = 1e6}, face).size(), 0u);
  }
}

TEST(SectionForces, ofTabledValues) {
  const Section tabled{SectionShape::tabled,
                       {{"A", 5380}, {"I_z", 83.6e6}, {"S_z", 314e3}, {"b_y", 7.1}, {"J", 201e3}}};
  const FibreStress stress = at(tabled, {.N = 53.8e3, .Vy = 50e3, .Mz = 10e6}, {-150, 3.55});
  EXPECT_NEAR(stress.axial, 10, 1e-9);
  EXPECT_NEAR(stress.bending, 10e6 * 150 / 83.6e6, 1e-9);
  EXPECT_NEAR(stress.stress.txy, 50e3 * 314e3 / (83.6e6 * 7.1), 1e-9);
  EXPECT_NEAR(at(tabled, {.T = 1e5}, {0, 10}).stress.txy, -1e5 * 10 / 201e3, 1e-9);
  EXPECT_EQ(problemOf(tabled, {.My = 1}, {}),
            "I_y: The second moment about y is needed here and not given. Give it, "
            "or leave out the force that needs it.");
  const Section modulus{SectionShape::tabled, {{"W_z", 557e3}}};
  EXPECT_NEAR(at(modulus, {.Mz = 55.7e6}, {-1, 0}).stress.sx, 100, 1e-9);
  EXPECT_NEAR(at(modulus, {.Mz = 55.7e6}, {1, 0}).stress.sx, -100, 1e-9);
  EXPECT_THAT(problemOf(modulus, {.Mz = 55.7e6}, {0, 0}), HasSubstr("on which side"));
}

void expectStepsHold(const Section& section, const SectionForces& forces, ShearRule rule) {
  const SectionModel made = model(section);
  std::vector<NamedFibre> fibres = readyFibres(made);
  if (made.isTabled())
    fibres = {{{}, {-150, 3, View::side}}, {{}, {-150, 3, View::top}}};
  for (const NamedFibre& named : fibres) {
    const auto contribution = contributionOf(section, forces, named.fibre, rule);
    if (!contribution)
      continue;
    double txy = 0;
    for (const Step& step : contribution->steps) {
      EXPECT_NEAR(step.formula.valueWith(step.putIn), step.result, 1e-9 * (std::abs(step.result) + 1e-6))
          << plain(named.name) << ": " << plain(written(step));
      EXPECT_FALSE(step.source.empty());
      if (plain(step.symbol) == "τV" || plain(step.symbol) == "τT")
        txy += step.result;
    }
    EXPECT_NEAR(txy, contribution->stress.txy, 1e-12 * (1 + std::abs(txy))) << plain(named.name);
    EXPECT_EQ(contribution->axial + contribution->bending, contribution->stress.sx);
  }
}

TEST(SectionForceSteps, everyFormulaConfirmsItsResult) {
  const SectionForces bent{12e3, 30e3, -20e3, 0, 2e6, -9e6};
  const SectionForces twisted{0, 30e3, 0, 1e6, 0, -9e6};
  for (const ShearRule rule : {ShearRule::upward, ShearRule::slope})
    for (const SectionForces& forces : {bent, twisted})
      for (const Section& section : {beam, circleSection(60), tubeSection(60, 5), boxSection(100, 200, 5, 8),
                                     joist, iSection(300, 7.1, 150, 10.7, 120, 14, 15),
                                     tSection(200, 100, 8, 12), channelSection(200, 80, 8, 12), angle,
                                     Section{SectionShape::tabled,
                                             {{"A", 5380},
                                              {"I_z", 83.6e6},
                                              {"W_y", 80e3},
                                              {"I_y", 6e6},
                                              {"S_z", 314e3},
                                              {"b_y", 7.1},
                                              {"S_y", 60e3},
                                              {"b_z", 21},
                                              {"J", 201e3}}}})
        expectStepsHold(section, forces, rule);
}

TEST(SectionForceSteps, areWrittenForAChecker) {
  const auto made =
      contributionOf(beam, {.N = -21.6e3, .Vy = 14.4e3, .Mz = 8.64e6}, {-60, 45}, ShearRule::upward);
  ASSERT_TRUE(made);
  std::vector<std::string> lines;
  for (const Step& step : made->steps)
    lines.push_back(plain(written(step)));
  EXPECT_EQ(lines, (std::vector<std::string>{
                       "σN = N/A = (−21.6 kN)/(21.6 10³ mm²) = −1.000 MPa",
                       "σM = −Mz · y/Iz = −8.64 kN·m · (−60 mm)/(103.68 10⁶ mm⁴) = 5.000 MPa",
                       "Sz = A* · y* = 16.2 10³ mm² · 30 mm = 486.0 10³ mm³",
                       "τV = Vy · Sz/(Iz · b) = 14.4 kN · 486 10³ mm³/(103.68 10⁶ mm⁴ · 90 mm) = 0.7500 MPa",
                       "σx = σN + σM = −1 MPa + 5 MPa = 4.000 MPa"}));
  ASSERT_EQ(made->signRules.size(), 3u);
  EXPECT_EQ(plain(made->signRules[2]),
            "Vy is positive when it acts in +y on the +x face, so that dMz/dx = −Vy and τxy = +Vy S/(I b).");
}

TEST(ReadyFibres, lieInTheSectionAndHaveNames) {
  for (const Section& section : {beam, circleSection(60), tubeSection(60, 5), boxSection(100, 200, 5, 8),
                                 joist, iSection(300, 7.1, 150, 10.7, 120, 14, 15), tSection(200, 100, 8, 12),
                                 channelSection(200, 80, 8, 12), angle}) {
    const SectionModel made = model(section);
    const std::vector<NamedFibre> fibres = readyFibres(made);
    EXPECT_GE(fibres.size(), 7u);
    for (const NamedFibre& named : fibres) {
      EXPECT_TRUE(contains(made.region, named.fibre.y, named.fibre.z)) << plain(named.name);
      EXPECT_FALSE(named.name.empty());
    }
  }
}

TEST(ReadyFibres, ofARolledSectionStandOnTheWebWhereItsFilletsEnd) {
  std::vector<std::string> places;
  for (const NamedFibre& named : readyFibres(model(iSection(300, 8, 150, 10, 150, 10, 15))))
    if (named.fibre.view == View::side)
      places.push_back(plain(named.name) + " " + shownNumber(named.fibre.y, 0) + " " +
                       shownNumber(named.fibre.z, 0));
  EXPECT_EQ(places,
            (std::vector<std::string>{"extreme fibre, top 150 0", "top corner, near face 150 75",
                                      "top corner, far face 150 −75", "upper junction, near face 125 4",
                                      "axis, near face 0 4", "axis, far face 0 −4", "axis, middle 0 0",
                                      "lower junction, near face −125 4", "bottom corner, near face −150 75",
                                      "bottom corner, far face −150 −75", "extreme fibre, bottom −150 0"}));
}

} // namespace
} // namespace planewright
