// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/ranges.h"

#include "core/study/stress_form.h"
#include "ui/circle/signs.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr double barWidth = 3;
constexpr double tickHalf = 5;
constexpr double tickWidth = 2;
/// Of the pointer from the middle of a bar.
constexpr double reach = 4;

QPointF into(const QRectF& plot, QPointF pixel) {
  return {std::clamp(pixel.x(), plot.left(), plot.right()), std::clamp(pixel.y(), plot.top(), plot.bottom())};
}

/// A bar and its tick across; `along` is its direction. A tick at the cut end would tell of a value that is
/// not there.
void drawBar(Picture& picture, QPointF from, QPointF to, QPointF at, QPointF along, bool isInView) {
  const Pen bar{Role::other, barWidth, Dash::solid};
  drawStroke(picture, vecOf(from), vecOf(to), bar);
  const QPointF half = tickHalf * QPointF(along.y(), along.x());
  if (isInView)
    drawStroke(picture, vecOf(at - half), vecOf(at + half), {Role::other, tickWidth, Dash::solid});
}

bool isOn(QPointF from, QPointF to, QPointF pixel) {
  return QRectF(from, to).normalized().adjusted(-reach, -reach, reach, reach).contains(pixel);
}

Text fromTo(const Stage& stage, const Text& form, const Extreme& least, const Extreme& greatest) {
  const StressForm stresses = stressFormOf(stage.study, stage.readout);
  const auto nameOf = [&](const Extreme& extreme) { return stage.readout.states[extreme.state].combination; };
  return Text(form)
      .with(stresses.withUnit(least.stress))
      .with(nameOf(least))
      .with(stresses.withUnit(greatest.stress))
      .with(nameOf(greatest));
}

} // namespace

std::optional<RangeBars> rangeBarsOf(const Stage& stage) {
  const std::optional<Envelope> envelope = envelopeOn(stage.readout, stage.readout.reading);
  if (!envelope)
    return std::nullopt;
  const Traction& shown = stage.readout.state().reading;
  const auto at = [&](double sn, double tnt) { return into(stage.scale.plot(), stage.pixelOf({sn, tnt})); };
  return RangeBars{
      *envelope,       at(envelope->leastNormal.stress, 0), at(envelope->greatestNormal.stress, 0),
      at(shown.sn, 0), at(0, envelope->leastTnt.stress),    at(0, envelope->greatestTnt.stress),
      at(0, shown.tnt)};
}

Picture rangesLayer(const Stage& stage) {
  Picture picture;
  const std::optional<RangeBars> bars = rangeBarsOf(stage);
  if (!bars)
    return picture;
  const QPointF mark = stage.pixelOf(stage.readout.state().reading);
  const QRectF& plot = stage.scale.plot();
  drawBar(picture, bars->normalFrom, bars->normalTo, bars->normalAt, {1, 0},
          mark.x() >= plot.left() && mark.x() <= plot.right());
  drawBar(picture, bars->shearFrom, bars->shearTo, bars->shearAt, {0, 1},
          mark.y() >= plot.top() && mark.y() <= plot.bottom());
  return picture;
}

Text rangeWords(const Stage& stage, QPointF pixel) {
  const std::optional<RangeBars> bars = rangeBarsOf(stage);
  if (bars && isOn(bars->normalFrom, bars->normalTo, pixel))
    return fromTo(stage, PW_TEXT("Circle", "σ_{n} on the reading plane: from %1 in %2 to %3 in %4"),
                  bars->envelope.leastNormal, bars->envelope.greatestNormal);
  if (bars && isOn(bars->shearFrom, bars->shearTo, pixel))
    return fromTo(stage, PW_TEXT("Circle", "τ_{nt} on the reading plane: from %1 in %2 to %3 in %4"),
                  bars->envelope.leastTnt, bars->envelope.greatestTnt);
  return {};
}

} // namespace planewright
