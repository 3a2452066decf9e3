// SPDX-License-Identifier: GPL-3.0-or-later
#include "element_rig.h"

#include "core/figure/metrics.h"
#include "core/quantity/format.h"
#include "ui/look/look.h"

#include <QImage>
#include <QToolTip>

#include <algorithm>
#include <cmath>

namespace planewright {
namespace {

constexpr QSize shapes[] = {{342, 369}, {460, 580}, {700, 560}, {401, 300}, {900, 420}};

ElementScene sceneOf(const Typed& typed, QSize size, const ElementGlance& glance = {}) {
  const Study study = studyOf(typed);
  ElementGlance sized = glance;
  sized.size = size;
  return elementScene(study, evaluate(study), sized, {});
}

std::vector<Label> standing(const Picture& picture) {
  std::vector<Label> labels = partsOf<Label>(picture);
  std::erase_if(labels, [](const Label& label) { return label.key == "knob"; });
  return labels;
}

/// The letters on the drawing, its columns and captions, wherever the element is turned.
TEST(ElementScene, labelsNeverMeetNorLeaveThePanel) {
  for (const QSize size : shapes)
    for (int reading = -87; reading <= 90; reading += 3)
      for (const char* line : {"0 deg", "5.7 deg", "-88 deg", "45 deg"}) {
        const ElementScene scene =
            sceneOf({.reading = angleText(Angle::fromDegrees(reading)), .line = line}, size);
        const std::vector<Label> labels = standing(scene.picture);
        for (std::size_t i = 0; i < labels.size(); ++i) {
          const Box box = boxOf(labels[i]);
          EXPECT_TRUE(box.left >= 0 && box.top >= 0 && box.right <= size.width() &&
                      box.bottom <= size.height())
              << labels[i].key << " at " << reading << " in " << size.width();
          for (std::size_t k = 0; k < i; ++k)
            EXPECT_FALSE(overlap(box, boxOf(labels[k]))) << labels[i].key << " on " << labels[k].key << " at "
                                                         << reading << ", " << line << " in " << size.width();
        }
      }
}

/// Places along a stroke, close to each other.
std::vector<Vec> placesOf(const Path& path) {
  std::vector<Vec> places;
  for (std::size_t i = 0; path.pen && i + (path.closed ? 0 : 1) < path.points.size(); ++i)
    for (int k = 0; k <= 80; ++k)
      places.push_back(path.points[i] +
                       k / 80.0 * (path.points[(i + 1) % path.points.size()] - path.points[i]));
  return places;
}
std::vector<Vec> placesOf(const Arc& arc) {
  std::vector<Vec> places;
  for (int k = 0; arc.pen && k <= 400; ++k) {
    const CosSin d = cosSin(Angle::fromDegrees(arc.start + arc.sweep * k / 400));
    places.push_back(arc.centre + arc.radius * Vec{d.cos, -d.sin});
  }
  return places;
}
std::vector<Vec> placesOf(const Label&) {
  return {};
}

/// The stroke that lies over a label, or under one that has no ground of its own; none is -1.
int strokeOn(const Picture& picture, std::size_t index) {
  const Label& label = std::get<Label>(picture.parts[index]);
  const Box box = boxOf(label);
  for (std::size_t i = label.ground ? index : 0; i < picture.parts.size(); ++i)
    for (const Vec place : std::visit([](const auto& part) { return placesOf(part); }, picture.parts[i]))
      if (place.x > box.left && place.x < box.right && place.y > box.top && place.y < box.bottom)
        return static_cast<int>(i);
  return -1;
}

// A line behind a number reads as a minus.
TEST(ElementScene, noStrokeRunsThroughALabel) {
  ElementGlance glance;
  glance.held = ElementHandle::reading;
  glance.onSnap = true;
  for (const QSize size : shapes)
    for (int reading = -85; reading <= 90; reading += 5) {
      const Picture picture =
          sceneOf({.reading = angleText(Angle::fromDegrees(reading)), .tolerance = "12 deg"}, size, glance)
              .picture;
      for (std::size_t i = 0; i < picture.parts.size(); ++i) {
        const Label* label = std::get_if<Label>(&picture.parts[i]);
        if (label && label->key != "knob") {
          EXPECT_EQ(strokeOn(picture, i), -1) << label->key << " at " << reading << " in " << size.width();
        }
      }
    }
}

TEST(ElementScene, aNarrowPanelHasTheStressesInItsCaption) {
  const Picture narrow = sceneOf({}, {342, 369}).picture;
  EXPECT_EQ(labelOf(narrow, "sigma_n"), "");
  EXPECT_EQ(labelOf(narrow, "stresses"), "σn 7.969    τnt −2.847    σt −0.169  MPa");
  const Picture wide = sceneOf({}, {460, 580}).picture;
  EXPECT_EQ(labelOf(wide, "sigma_n"), "σn 7.969");
  EXPECT_EQ(labelOf(wide, "stresses"), "");
  EXPECT_EQ(labelOf(wide, "unit"), "stresses in MPa");
}

TEST(ElementScene, theCaptionSaysNormalAndCut) {
  EXPECT_EQ(labelOf(sceneOf({}, {460, 580}).picture, "caption"), "normal at 30.0°  ·  cut at −60.0°");
  ElementGlance glance;
  glance.held = ElementHandle::line;
  EXPECT_EQ(labelOf(sceneOf({.line = "7.4 deg"}, {460, 580}, glance).picture, "caption"), "grain at 7.4°");
}

TEST(ElementScene, sayHowToBeginWhereNothingWasTyped) {
  const Typed nothing{.sx = "0 MPa", .sy = "0 MPa", .txy = "0 MPa", .reading = "0 deg", .line = "0 deg"};
  for (const QSize size : shapes) {
    const Picture picture = sceneOf(nothing, size).picture;
    EXPECT_EQ(labelOf(picture, "beginning"),
              "Type the stresses from the hand calc; 18.6 kN/(90 mm*240 mm) is fine");
    EXPECT_EQ(labelOf(picture, "sigma_n"), "");
    for (const Label& label : partsOf<Label>(picture)) {
      EXPECT_GE(boxOf(label).left, 0);
      EXPECT_LE(boxOf(label).right, size.width());
    }
  }
  EXPECT_EQ(labelOf(sceneOf({}, {460, 580}).picture, "beginning"), "");
}

TEST(ElementScene, theHeadingSaysWhetherHandlesSnap) {
  ElementGlance glance;
  EXPECT_EQ(labelOf(sceneOf({}, {460, 580}, glance).picture, "fact"), "snap on");
  glance.snapping = false;
  EXPECT_EQ(labelOf(sceneOf({}, {460, 580}, glance).picture, "fact"), "snap off");
  EXPECT_EQ(labelOf(sceneOf({}, {460, 580}, glance).picture, "heading"), "Element");
}

// A drag across the vertical: a label changes its column at most once, and never to and fro.
TEST(ElementScene, labelsDoNotHopDuringADrag) {
  ElementGlance glance;
  glance.held = ElementHandle::reading;
  int changes = 0;
  for (int tenths = -300; tenths <= 300; ++tenths) {
    const int wavering = tenths + (tenths % 2 ? 15 : -15);
    const ElementScene scene =
        sceneOf({.reading = exactNumber(wavering / 10.0) + " deg"}, {460, 580}, glance);
    if (glance.sides)
      changes += glance.sides->at("sigma_t") != scene.sides.at("sigma_t") ? 1 : 0;
    glance.sides = scene.sides;
  }
  EXPECT_LE(changes, 1);
}

TEST(ElementScene, aSnapGivesTheKnobASecondRing) {
  const auto rings = [](bool onSnap) {
    ElementGlance glance;
    glance.held = ElementHandle::reading;
    glance.onSnap = onSnap;
    const Picture picture = sceneOf({}, {460, 580}, glance).picture;
    return std::ranges::count_if(partsOf<Arc>(picture), [](const Arc& arc) {
      return arc.pen && arc.pen->role == Role::reading && arc.sweep == 360;
    });
  };
  EXPECT_EQ(rings(false), 0);
  EXPECT_EQ(rings(true), 1);
}

TEST(ElementPaint, followsThePaletteAtTheStartAndOnAChange) {
  ElementRig rig;
  const auto ground = [&] { return rig.view.grab().toImage().pixelColor(2, 200); };
  rig.view.setPalette(paletteFor({Palette::dark}));
  EXPECT_EQ(ground(), Look{Palette::dark}.colour(Role::canvas));
  rig.view.setPalette(paletteFor({Palette::light}));
  EXPECT_EQ(ground(), Look{Palette::light}.colour(Role::canvas));
}

TEST(ElementPaint, aDarkPanelHasNoBrightArea) {
  ElementRig rig;
  rig.view.setPalette(paletteFor({Palette::dark}));
  const QImage image = rig.view.grab().toImage();
  int bright = 0;
  for (int y = 0; y < image.height(); ++y)
    for (int x = 0; x < image.width(); ++x)
      bright += qGray(image.pixel(x, y)) > 198 ? 1 : 0;
  EXPECT_GT(bright, 0) << "arrows are drawn";
  EXPECT_LT(bright, image.width() * image.height() / 50);
}

TEST(ElementHover, tellsAllDigitsOfALabel) {
  ElementRig rig({}, {700, 560});
  for (const Label& label : partsOf<Label>(rig.view.picture())) {
    if (label.key != "sigma_n")
      continue;
    const Box box = boxOf(label);
    const QPoint at(int((box.left + box.right) / 2), int((box.top + box.bottom) / 2));
    QHelpEvent help(QEvent::ToolTip, at, rig.view.mapToGlobal(at));
    QApplication::sendEvent(&rig.view, &help);
    EXPECT_TRUE(QToolTip::text().startsWith(QStringLiteral("σn = 7.9686"))) << QToolTip::text().toStdString();
  }
}

} // namespace
} // namespace planewright
