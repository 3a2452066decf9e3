// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/paint/painter.h"

#include "core/figure/metrics.h"
#include "ui/look/font.h"
#include "ui/look/look.h"

#include <QFontMetricsF>
#include <QPainter>
#include <QPainterPath>

#include <algorithm>

namespace planewright {

namespace {

/// The em in which texts are set before they are scaled to their size: the font's own design units, so that
/// every advance is a whole number and no size is rounded to pixels.
constexpr double em = 2048;

/// The program's font alone: what it lacks is not silently taken from another one.
QFont setterOf(bool bold) {
  QFont font = programFont(em, bold);
  font.setStyleStrategy(QFont::StyleStrategy(QFont::PreferAntialias | QFont::NoFontMerging));
  return font;
}

QPen penOf(const std::optional<Pen>& pen, const Look& look) {
  if (!pen)
    return QPen(Qt::NoPen);
  QPen result(look.colour(pen->role), pen->width, Qt::SolidLine, Qt::FlatCap, Qt::MiterJoin);
  const std::vector<double> lengths = dashLengths(pen->dash);
  if (!lengths.empty())
    result.setDashPattern(QList<qreal>(lengths.begin(), lengths.end()));
  return result;
}

QBrush brushOf(const std::optional<Role>& fill, const Look& look) {
  return fill ? QBrush(look.colour(*fill)) : QBrush(Qt::NoBrush);
}

QPointF pointOf(Vec at) {
  return {at.x, at.y};
}

/// A stretch of a run: in the program's font, or one character that it lacks, in a cell of one em.
struct Stretch {
  QString text;
  double width;
  bool foreign;
};

std::vector<Stretch> stretchesOf(const QString& text, const QFontMetricsF& metrics) {
  std::vector<Stretch> result;
  const auto finish = [&] {
    if (!result.empty() && !result.back().foreign)
      result.back().width = metrics.horizontalAdvance(result.back().text);
  };
  qsizetype at = 0;
  for (const uint character : text.toUcs4()) {
    const qsizetype length = QChar::requiresSurrogates(character) ? 2 : 1;
    const QString piece = text.mid(at, length);
    at += length;
    const bool foreign = !metrics.inFontUcs4(character);
    if (!foreign && !result.empty() && !result.back().foreign) {
      result.back().text += piece;
      continue;
    }
    finish();
    result.push_back({piece, em, foreign});
  }
  finish();
  return result;
}

/// Paints the parts of one picture.
class Brushwork {
public:
  Brushwork(QPainter& painter, Palette palette)
      : m_painter(painter), m_look{palette}, m_fonts{setterOf(false), setterOf(true)} {}

  void operator()(const Path& path) {
    QPolygonF points;
    for (const Vec point : path.points)
      points << pointOf(point);
    m_painter.setPen(penOf(path.pen, m_look));
    m_painter.setBrush(brushOf(path.fill, m_look));
    if (path.closed || path.fill)
      m_painter.drawPolygon(points);
    else
      m_painter.drawPolyline(points);
  }

  void operator()(const Arc& arc) {
    m_painter.setPen(penOf(arc.pen, m_look));
    m_painter.setBrush(brushOf(arc.fill, m_look));
    const QRectF box(arc.centre.x - arc.radius, arc.centre.y - arc.radius, 2 * arc.radius, 2 * arc.radius);
    if (arc.sweep >= 360 || arc.sweep <= -360) {
      m_painter.drawEllipse(box);
      return;
    }
    QPainterPath path;
    path.arcMoveTo(box, arc.start);
    path.arcTo(box, arc.start, arc.sweep);
    m_painter.drawPath(path);
  }

  void operator()(const Label& label) {
    const double width = widthOf(label);
    const double shift = label.align == Align::start ? 0 : label.align == Align::middle ? width / 2 : width;
    QPointF at(label.at.x - shift, label.at.y);
    if (label.ground) {
      const QRectF box(at.x(), at.y() - ascent * label.size, width, (ascent + descent) * label.size);
      m_painter.fillRect(box, m_look.colour(Role::canvas));
    }
    m_painter.setPen(m_look.colour(label.role));
    for (const Run& run : label.runs) {
      const double size = run.lowered ? loweredSize * label.size : label.size;
      const double drop = run.lowered ? loweredDrop * label.size : 0;
      at.rx() += set(QString::fromStdString(run.text), at + QPointF(0, drop), size, label.bold);
    }
  }

private:
  double widthOf(const Label& label) const {
    const QFontMetricsF metrics(m_fonts[label.bold ? 1 : 0]);
    double width = 0;
    for (const Run& run : label.runs)
      for (const Stretch& stretch : stretchesOf(QString::fromStdString(run.text), metrics))
        width += stretch.width * (run.lowered ? loweredSize : 1) * label.size / em;
    return width;
  }

  /// Sets one run from `at` and says how far it went.
  double set(const QString& text, QPointF at, double size, bool bold) {
    const QFont& font = m_fonts[bold ? 1 : 0];
    const QFontMetricsF metrics(font);
    m_painter.save();
    m_painter.setFont(font);
    m_painter.translate(at);
    m_painter.scale(size / em, size / em);
    double pen = 0;
    for (const Stretch& stretch : stretchesOf(text, metrics)) {
      if (stretch.foreign)
        setForeign(stretch.text, pen, bold);
      else
        m_painter.drawText(QPointF(pen, 0), stretch.text);
      pen += stretch.width;
    }
    m_painter.restore();
    return pen * size / em;
  }

  /// A character from whatever font has it, in the middle of a cell of one em, made narrower to fit.
  void setForeign(const QString& text, double pen, bool bold) {
    const QFont font = programFont(em, bold);
    const double width = QFontMetricsF(font).horizontalAdvance(text);
    m_painter.save();
    m_painter.setFont(font);
    m_painter.translate(pen + em / 2, 0);
    m_painter.scale(std::min(1.0, em / width), 1);
    m_painter.drawText(QPointF(-width / 2, 0), text);
    m_painter.restore();
  }

  QPainter& m_painter;
  Look m_look;
  QFont m_fonts[2];
};

} // namespace

void paintPicture(QPainter& painter, const Picture& picture, Palette palette) {
  painter.save();
  painter.setRenderHints(QPainter::Antialiasing | QPainter::TextAntialiasing);
  Brushwork brushwork(painter, palette);
  for (const auto& part : picture.parts)
    std::visit(brushwork, part);
  painter.restore();
}

} // namespace planewright
