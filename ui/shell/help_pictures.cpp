// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/element.h"
#include "core/study/edit.h"
#include "ui/paint/painter.h"
#include "ui/shell/help_pages.h"

#include <QPainter>

#include <cassert>

namespace planewright {

namespace {

constexpr QSize size(300, 250);

/// A state with three positive components and a line, read at 30 deg.
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

Picture pictureOf(bool turned) {
  const Study study = exampleOfSigns();
  const Readout readout = evaluate(study);
  ElementOrder order;
  order.centre = {size.width() / 2.0, size.height() / 2.0};
  order.outer = 104;
  order.turned = turned;
  order.wide = 2;
  order.cut = 3.5;
  order.medium = 1.4;
  order.narrow = 1;
  order.hair = 0.8;
  order.textSize = 14;
  order.translate = translation();
  Picture picture;
  picture.width = size.width();
  picture.height = size.height();
  const std::vector<LabelWish> wishes = drawElement(picture, study, readout, order);
  const LabelColumns columns{order.centre.x, 58, size.width() - 58.0, 4, size.height() - 4.0, 13, 0.8};
  std::vector<LabelWish> symbols = wishes;
  for (LabelWish& wish : symbols)
    wish.longForm = wish.shortForm;
  const PlacedLabels placed = placeLabels(symbols, columns);
  picture.parts.insert(picture.parts.end(), placed.leaders.begin(), placed.leaders.end());
  picture.parts.insert(picture.parts.end(), placed.labels.begin(), placed.labels.end());
  return picture;
}

} // namespace

QImage helpPicture(const QString& name, const Look& look, double scale) {
  QImage image(size * scale, QImage::Format_RGB32);
  image.fill(look.colour(Role::canvas));
  QPainter painter(&image);
  painter.scale(scale, scale);
  paintPicture(painter, pictureOf(name == QLatin1String("picture:turned")), look.palette);
  return image;
}

} // namespace planewright
