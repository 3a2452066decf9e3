// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/slopes.h"

#include "core/quantity/angle.h"
#include "core/quantity/value.h"
#include "core/quantity/writing_problems.h"

#include <cmath>

namespace planewright {

namespace {

using Kind = Token::Kind;

/// [sign] number, and what stands behind it.
struct Rise {
  Piece number;
  bool negative = false;
};

std::optional<Rise> riseAt(Cursor& cursor) {
  const bool negative = cursor.next(Kind::minus);
  if (negative || cursor.next(Kind::plus))
    cursor.take();
  if (!cursor.next(Kind::number))
    return std::nullopt;
  const Rise rise{cursor.here(), negative};
  cursor.take();
  return rise;
}

/// Of "-1 in -12": the same slope with its sign in front, if any.
std::string signInFront(const Rise& rise, const Token& word, std::string_view run) {
  const std::string between = word.is(Kind::colon) ? ":" : " in ";
  return (rise.negative ? "" : "-") + std::string(rise.number.text) + between + std::string(run);
}

/// The run of a slope; 100 for one in per cent. None when no slope stands here.
std::optional<Result<double>> runAt(Cursor& cursor, const Rise& rise, Slopes slopes) {
  const Token& sign = cursor.peek();
  if (sign.text == "%" && slopes != Slopes::tolerance && cursor.peek(1).is(Kind::end)) {
    cursor.take();
    return 100.0;
  }
  const bool negative = cursor.peek(1).is(Kind::minus);
  const std::size_t number = negative ? 2 : 1;
  if ((sign.text != "in" && !sign.is(Kind::colon)) || !cursor.peek(number).is(Kind::number) ||
      !cursor.peek(number + 1).is(Kind::end))
    return std::nullopt;
  cursor.take();
  const std::size_t start = cursor.at();
  if (negative)
    cursor.take();
  const Piece piece = cursor.here();
  cursor.take();
  if (negative && slopes == Slopes::tolerance)
    return tl::unexpected(negativeTolerance(cursor.since(0)));
  if (negative)
    return tl::unexpected(signBehindSlope(cursor.since(start), signInFront(rise, sign, piece.text)));
  const auto run = numberOf(piece);
  if (!run)
    return tl::unexpected(run.error());
  if (run->number == 0)
    return tl::unexpected(slopeOverNothing(piece));
  return run->number;
}

} // namespace

std::optional<Result<double>> readSlope(std::string_view text, const Tokens& tokens, Slopes slopes) {
  Cursor cursor(text, tokens);
  const auto rise = riseAt(cursor);
  if (!rise)
    return std::nullopt;
  const auto run = runAt(cursor, *rise, slopes);
  if (!run)
    return std::nullopt;
  if (slopes == Slopes::none)
    return tl::unexpected(slopeForNormal(cursor.since(0)));
  if (!*run)
    return *run;
  const auto number = numberOf(rise->number);
  if (!number)
    return tl::unexpected(number.error());
  const double angle = Angle::fromRadians(std::atan2(number->number, **run)).degrees();
  return rise->negative ? 0.0 - angle : angle;
}

} // namespace planewright
