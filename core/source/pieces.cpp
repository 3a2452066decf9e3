// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/pieces.h"

#include "core/quantity/shown_count.h"

#include <algorithm>
#include <cassert>
#include <cmath>

namespace planewright {

namespace {

using Pieces = std::vector<Piece>;

Piece plate(Text name, Span y, Span z) {
  return pieceOf(std::move(name), polygon({{y.from, z.from}, {y.from, z.to}, {y.to, z.to}, {y.to, z.from}}),
                 Piece::Kind::plate);
}

Piece centredPlate(Text name, Span y, double width) {
  return plate(std::move(name), y, {-width / 2, width / 2});
}

/// The rest of a square of side r at a re-entrant corner, beyond the quarter circle that touches both walls.
/// `up` and `right` are +1 or -1: where the square lies from the corner.
Piece fillet(Text name, const SectionPoint& corner, double r, double up, double right) {
  const SectionPoint onWeb{corner.y + up * r, corner.z};
  const SectionPoint onFlange{corner.y, corner.z + right * r};
  const SectionPoint centre{corner.y + up * r, corner.z + right * r};
  Contour contour = {{corner, onFlange}, {onFlange, onWeb, centre, r}, {onWeb, corner}};
  if (up * right < 0)
    contour = reversed(contour);
  return pieceOf(std::move(name), contour, Piece::Kind::fillet);
}

Pieces ofI(const Section& s) {
  const double h = s.size("h");
  const double low = s.size("t_bottom");
  const double high = h - s.size("t_top");
  const double halfWeb = s.size("t_w") / 2;
  const double r = s.size("r");
  Pieces pieces = {centredPlate(PW_TEXT("Source", "top flange"), {high, h}, s.size("b_top")),
                   centredPlate(PW_TEXT("Source", "web"), {low, high}, s.size("t_w")),
                   centredPlate(PW_TEXT("Source", "bottom flange"), {0, low}, s.size("b_bottom"))};
  for (const double right : {1.0, -1.0})
    if (r > 0) {
      pieces.push_back(
          fillet(PW_TEXT("Source", "fillets at the top"), {high, right * halfWeb}, r, -1, right));
      pieces.push_back(
          fillet(PW_TEXT("Source", "fillets at the bottom"), {low, right * halfWeb}, r, 1, right));
    }
  return pieces;
}

Pieces ofT(const Section& s) {
  const double h = s.size("h");
  const double junction = h - s.size("t_f");
  return {centredPlate(PW_TEXT("Source", "flange"), {junction, h}, s.size("b")),
          centredPlate(PW_TEXT("Source", "web"), {0, junction}, s.size("t_w"))};
}

Pieces ofChannel(const Section& s) {
  const double h = s.size("h");
  const double t = s.size("t_f");
  const Span flange{0, s.size("b")};
  return {plate(PW_TEXT("Source", "top flange"), {h - t, h}, flange),
          plate(PW_TEXT("Source", "web"), {t, h - t}, {0, s.size("t_w")}),
          plate(PW_TEXT("Source", "bottom flange"), {0, t}, flange)};
}

Pieces ofBox(const Section& s) {
  const double h = s.size("h");
  const double half = s.size("b") / 2;
  const double t = s.size("t_f");
  const Span between{t, h - t};
  return {centredPlate(PW_TEXT("Source", "top wall"), {h - t, h}, 2 * half),
          plate(PW_TEXT("Source", "right wall"), between, {half - s.size("t_w"), half}),
          plate(PW_TEXT("Source", "left wall"), between, {-half, -half + s.size("t_w")}),
          centredPlate(PW_TEXT("Source", "bottom wall"), {0, t}, 2 * half)};
}

Pieces ofBlocks(const Section& section) {
  Pieces pieces;
  for (const Block& block : blocksOf(section)) {
    const bool straight = std::fmod(block.turn.degrees(), 90) == 0;
    pieces.push_back(pieceOf(PW_TEXT("Source", "block %1").with(shownCount(pieces.size() + 1)),
                             polygon(cornersOf(block)), straight ? Piece::Kind::plate : Piece::Kind::other));
  }
  return pieces;
}

Pieces round(const Section& section, double inner) {
  Contour contour = circle(section.size("d") / 2);
  if (inner > 0)
    for (const Edge& edge : reversed(circle(inner / 2)))
      contour.push_back(edge);
  return {pieceOf(PW_TEXT("Source", "circle"), contour, Piece::Kind::other)};
}

} // namespace

Piece pieceOf(Text name, Contour contour, Piece::Kind kind) {
  Piece piece{std::move(name), std::move(contour), kind};
  const SectionPoint& first = piece.contour.front().from;
  piece.yLow = piece.yHigh = first.y;
  piece.zLow = piece.zHigh = first.z;
  for (const Edge& edge : piece.contour) {
    piece.yLow = std::min(piece.yLow, edge.from.y);
    piece.yHigh = std::max(piece.yHigh, edge.from.y);
    piece.zLow = std::min(piece.zLow, edge.from.z);
    piece.zHigh = std::max(piece.zHigh, edge.from.z);
  }
  return piece;
}

std::vector<Piece> piecesOf(const Section& section) {
  switch (section.shape) {
  case SectionShape::rectangle:
    return {centredPlate(PW_TEXT("Source", "rectangle"), {0, section.size("h")}, section.size("b"))};
  case SectionShape::circle:
    return round(section, 0);
  case SectionShape::tube:
    return round(section, section.size("d") - 2 * section.size("t"));
  case SectionShape::box:
    return ofBox(section);
  case SectionShape::i:
    return ofI(section);
  case SectionShape::t:
    return ofT(section);
  case SectionShape::channel:
    return ofChannel(section);
  case SectionShape::built:
    return ofBlocks(section);
  case SectionShape::tabled:
    break;
  }
  assert(false && "a tabled section has no pieces");
  return {};
}

} // namespace planewright
