// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/picture.h"

namespace planewright {

Vec operator+(Vec a, Vec b) {
  return {a.x + b.x, a.y + b.y};
}
Vec operator-(Vec a, Vec b) {
  return {a.x - b.x, a.y - b.y};
}
Vec operator*(double factor, Vec a) {
  return {factor * a.x, factor * a.y};
}

} // namespace planewright
