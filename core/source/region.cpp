// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/region.h"

#include "core/source/pieces.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

Piece movedPiece(const Piece& piece, double y, double z) {
  return pieceOf(piece.name, moved(piece.contour, y, z), piece.kind);
}

/// Makes coordinates equal that differ by rounding alone, so that touching pieces share their levels.
void align(std::vector<Piece>& pieces, double SectionPoint::*coordinate, double slack) {
  std::vector<double*> values;
  for (Piece& piece : pieces)
    for (Edge& edge : piece.contour) {
      values.push_back(&(edge.from.*coordinate));
      values.push_back(&(edge.to.*coordinate));
    }
  std::ranges::sort(values, {}, [](const double* value) { return *value; });
  double shared = *values.front();
  for (double* value : values) {
    if (*value - shared > slack)
      shared = *value;
    *value = shared;
  }
}

Region regionAround(std::vector<Piece> pieces) {
  Region region;
  region.pieces = std::move(pieces);
  region.yLow = region.zLow = 1e300;
  region.yHigh = region.zHigh = -1e300;
  region.upright = true;
  for (const Piece& piece : region.pieces) {
    region.moments = region.moments + momentsOf(piece.contour);
    region.yLow = std::min(region.yLow, piece.yLow);
    region.yHigh = std::max(region.yHigh, piece.yHigh);
    region.zLow = std::min(region.zLow, piece.zLow);
    region.zHigh = std::max(region.zHigh, piece.zHigh);
    region.upright = region.upright && piece.kind != Piece::Kind::other;
  }
  return region;
}

/// Spans of touching pieces made one.
std::vector<Span> joined(std::vector<Span> spans, double slack) {
  std::ranges::sort(spans, {}, &Span::from);
  std::vector<Span> result;
  for (const Span& span : spans) {
    if (!result.empty() && span.from <= result.back().to + slack)
      result.back().to = std::max(result.back().to, span.to);
    else
      result.push_back(span);
  }
  return result;
}

} // namespace

double Region::slack() const {
  return 1e-9 * std::max(yHigh - yLow, zHigh - zLow);
}

Region regionOf(const Section& section) {
  std::vector<Piece> aligned = piecesOf(section);
  const double slack = regionAround(aligned).slack();
  align(aligned, &SectionPoint::y, slack);
  align(aligned, &SectionPoint::z, slack);
  const Region placed = regionAround(std::move(aligned));
  // What cancelling halves leave is no distance.
  const auto centroid = [&](double first) {
    const double place = first / placed.moments.area;
    return std::abs(place) <= 1e-4 * placed.slack() ? 0 : place;
  };
  const double y = centroid(placed.moments.y);
  const double z = centroid(placed.moments.z);
  std::vector<Piece> pieces;
  pieces.reserve(placed.pieces.size());
  for (const Piece& piece : placed.pieces)
    pieces.push_back(movedPiece(piece, -y, -z));
  return regionAround(std::move(pieces));
}

Region transposed(const Region& region) {
  std::vector<Piece> pieces;
  pieces.reserve(region.pieces.size());
  for (const Piece& piece : region.pieces)
    pieces.push_back(pieceOf(piece.name, transposed(piece.contour), piece.kind));
  return regionAround(std::move(pieces));
}

std::vector<double> levelsOf(const Region& region) {
  std::vector<double> levels;
  for (const Piece& piece : region.pieces)
    for (const Edge& edge : piece.contour)
      levels.push_back(edge.from.y);
  std::ranges::sort(levels);
  const double slack = region.slack();
  const auto repeated = std::ranges::unique(levels, [&](double a, double b) { return b - a <= slack; });
  levels.erase(repeated.begin(), repeated.end());
  return levels;
}

double nearestLevelOr(const Region& region, double y) {
  const double slack = region.slack();
  for (const Piece& piece : region.pieces)
    for (const Edge& edge : piece.contour)
      if (std::abs(edge.from.y - y) <= slack)
        return edge.from.y;
  return y;
}

std::vector<Span> spansAt(const Region& region, double y, Side side) {
  std::vector<Span> spans;
  for (const Piece& piece : region.pieces)
    if (piece.yLow <= y && y <= piece.yHigh)
      for (const Span& span : spansAt(piece.contour, y, side))
        spans.push_back(span);
  return joined(std::move(spans), region.slack());
}

std::optional<Span> spanHolding(const Region& region, double y, double z, Side side) {
  const double slack = region.slack();
  for (const Span& span : spansAt(region, y, side))
    if (span.from - slack <= z && z <= span.to + slack)
      return span;
  return std::nullopt;
}

bool contains(const Region& region, double y, double z) {
  const double level = nearestLevelOr(region, y);
  return spanHolding(region, level, z, Side::below) || spanHolding(region, level, z, Side::above);
}

bool isMirrored(const Region& region) {
  const std::vector<double> levels = levelsOf(region);
  const double slack = region.slack();
  for (std::size_t i = 0; i + 1 < levels.size(); ++i) {
    const std::vector<Span> spans =
        spansAt(region, levels[i] + 0.4 * (levels[i + 1] - levels[i]), Side::above);
    for (std::size_t k = 0; k < spans.size(); ++k)
      if (std::abs(spans[k].from + spans[spans.size() - 1 - k].to) > 10 * slack)
        return false;
  }
  return true;
}

} // namespace planewright
