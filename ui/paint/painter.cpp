// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/paint/painter.h"

#include "core/figure/advances.h"
#include "core/figure/metrics.h"
#include "core/words/characters.h"
#include "ui/look/font.h"
#include "ui/look/look.h"

#include <QFontMetricsF>
#include <QPainter>
#include <QPainterPath>

#include <algorithm>

namespace planewright {

namespace {

/// Texts are set in the font's own units and scaled to their size: every advance is a whole number then, and
/// no size is rounded to pixels.
constexpr double em = unitsPerEm;

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

/// A stretch of a run: measured characters, or one that the table of widths lacks.
struct Stretch {
  std::string text;
  bool measured;
};

std::vector<Stretch> stretchesOf(const std::string& text) {
  std::vector<Stretch> result;
  for (const Character& character : charactersOf(text)) {
    const bool measured = advanceOf(character.code) != nullptr;
    if (!measured || result.empty() || !result.back().measured)
      result.push_back({"", measured});
    result.back().text += character.bytes;
  }
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
    const Box box = boxOf(label);
    if (label.ground)
      m_painter.fillRect(QRectF(QPointF(box.left, box.top), QPointF(box.right, box.bottom)),
                         m_look.colour(Role::canvas));
    Vec at{box.left + boxSide * label.size, label.at.y};
    m_painter.setPen(m_look.colour(label.role));
    for (const Run& run : label.runs) {
      const double size = run.lowered ? loweredSize * label.size : label.size;
      set(run.text, at + Vec{0, run.lowered ? loweredDrop * label.size : 0}, size, label.bold);
      at.x += textWidth({{run.text, false}}, size, label.bold);
    }
  }

private:
  void set(const std::string& text, Vec at, double size, bool bold) {
    m_painter.save();
    m_painter.translate(at.x, at.y);
    m_painter.scale(size / em, size / em);
    double pen = 0;
    for (const Stretch& stretch : stretchesOf(text)) {
      if (stretch.measured)
        setMeasured(fromUtf8(stretch.text), pen, bold);
      else
        setForeign(fromUtf8(stretch.text), pen, bold);
      pen += textWidth({{stretch.text, false}}, em, bold);
    }
    m_painter.restore();
  }

  void setMeasured(const QString& text, double pen, bool bold) {
    m_painter.setFont(m_fonts[bold ? 1 : 0]);
    m_painter.drawText(QPointF(pen, 0), text);
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
