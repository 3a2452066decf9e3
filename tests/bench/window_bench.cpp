// SPDX-License-Identifier: GPL-3.0-or-later
// What a drag and an edit cost from the event until everything is painted, beside a circle painted by hand in
// the same run, and what an evaluation costs beside plain arithmetic. Offscreen, 1400x900.
// Times depend on the machine and its load; the ratios are what to watch.
#include "tests/bench/samples.h"

#include "ui/circle/circle_plot.h"
#include "ui/circle/circle_view.h"
#include "ui/element/element_view.h"
#include "ui/given/given_panel.h"
#include "ui/look/font.h"
#include "ui/planes/planes_panel.h"
#include "ui/strength/strength_panel.h"
#include "ui/strength/utilisation_plot.h"

#include <QApplication>
#include <QMouseEvent>
#include <QPainter>
#include <QSplitter>

#include <cmath>
#include <cstdio>

namespace planewright {
namespace {

constexpr QSize windowSize(1400, 900);
constexpr int rounds = 6;
constexpr int eventsInRound = 60;

/// One case or, with more than one, as many combinations of two.
Study studyWith(int combinations) {
  Study study = newStudy();
  Point& point = study.points.front();
  point.stress = {{study.cases.front().id, "5 MPa", "-1 MPa", "2 MPa", "0 MPa"}};
  point.lines.front().angle = "1 in 10";
  point.lines.front().tolerance = "3 deg";
  point.reading = "30 deg";
  if (combinations == 1)
    return study;
  study.cases.push_back({"Q", "Variable", Nature::variable, Duration::medium, {}});
  point.stress.push_back({"Q", "1.5 MPa", "0.4 MPa", "-1.2 MPa", "0 MPa"});
  for (int i = 0; i < combinations; ++i)
    study.combinations.push_back({"k" + std::to_string(i),
                                  {{study.cases.front().id, "1"}, {"Q", std::to_string(0.1 * i)}},
                                  Basis::design});
  return study; // the first one is the single case with factor 1 and can be drawn by its ear
}

/// The same with a check of the line against invented strengths of timber.
Study checked(Study study) {
  Material timber;
  timber.name = "timber";
  timber.kind = MaterialKind::timber;
  timber.alongTension = "14.5 MPa";
  timber.alongCompression = "21 MPa";
  timber.acrossTension = "0.4 MPa";
  timber.acrossCompression = "2.5 MPa";
  timber.shear = "4 MPa";
  study.materials = {timber};
  Point& point = study.points.front();
  point.checks = {{"grain", "timber", Criterion::sumOfSquares, point.lines.front().name, "", {}}};
  return study;
}

/// The same circles, opaque pens, nothing else: the measure of what painting costs here.
class HandPainted : public QWidget {
public:
  explicit HandPainted(int circles) : m_circles(circles) {
    setAttribute(Qt::WA_OpaquePaintEvent);
    resize(windowSize);
    show();
  }
  void turn() {
    m_turn += 0.01;
    update();
  }

protected:
  void paintEvent(QPaintEvent*) override {
    QPainter painter(this);
    painter.fillRect(rect(), Qt::white);
    painter.setRenderHint(QPainter::Antialiasing);
    const QPointF centre = rect().center();
    const double radius = 0.4 * height();
    QPen pen(Qt::lightGray, 1);
    pen.setCosmetic(true);
    painter.setPen(pen);
    for (int i = 1; i < m_circles; ++i)
      painter.drawEllipse(centre + QPointF(4 * i, 0), radius - 3 * i, radius - 3 * i);
    painter.setPen(QPen(Qt::darkCyan, 2));
    painter.drawEllipse(centre, radius, radius);
    painter.drawLine(centre, centre + radius * QPointF(std::cos(m_turn), std::sin(m_turn)));
  }

private:
  int m_circles;
  double m_turn = 0;
};

/// Delivers what is posted, painting included.
void paintAll() {
  QCoreApplication::sendPostedEvents();
  QCoreApplication::processEvents();
}

void send(QAbstractScrollArea& plot, QEvent::Type type, QPointF at,
          Qt::KeyboardModifiers keys = Qt::ControlModifier) {
  const Qt::MouseButton button = type == QEvent::MouseMove ? Qt::NoButton : Qt::LeftButton;
  QMouseEvent event(type, at, plot.viewport()->mapToGlobal(at), button, Qt::LeftButton, keys);
  QCoreApplication::sendEvent(plot.viewport(), &event);
}

/// What stands in a window, beside the circle as it stands in the program.
enum class Views { circle, all, allWithStrengths };

/// A window on one desk.
struct Window {
  Window(int combinations, Views views)
      : desk(views == Views::allWithStrengths ? checked(studyWith(combinations)) : studyWith(combinations)),
        circle(new CircleView(desk, nullptr)) {
    if (views == Views::circle)
      columns.addWidget(circle);
    else
      addAll(views == Views::allWithStrengths);
    columns.resize(windowSize);
    columns.show();
    paintAll();
  }

  void addAll(bool withStrengths) {
    auto* drawings = new QSplitter;
    drawings->addWidget(new ElementView(desk));
    drawings->addWidget(circle);
    drawings->setSizes({48, 52});
    auto* rows = new QSplitter(Qt::Vertical);
    rows->addWidget(drawings);
    rows->addWidget(new PlanesPanel(desk));
    rows->setSizes({65, 35});
    columns.addWidget(new GivenPanel(desk));
    columns.addWidget(rows);
    columns.setSizes({300, 1100});
    if (withStrengths) {
      strengths = new StrengthPanel(desk);
      columns.addWidget(strengths);
      columns.setSizes({300, 780, 320});
    }
  }

  void drag(Samples& samples, Handle handle) {
    CirclePlot& plot = circle->plot();
    const QPointF start = *plot.handleAt(handle);
    const Round round = plot.round();
    send(plot, QEvent::MouseButtonPress, start);
    for (int i = 1; i <= eventsInRound; ++i) {
      const Angle seen = round.seenAt(start) + Angle::fromDegrees(6.1 * i);
      const QPointF on = handle == Handle::reading
                             ? round.at(seen, round.radius)
                             : start + 20 * QPointF(std::sin(0.1 * i), std::cos(0.13 * i));
      samples.time([&] {
        send(plot, QEvent::MouseMove, on);
        paintAll();
      });
    }
    send(plot, QEvent::MouseButtonRelease, start);
    paintAll();
  }

  /// Turns the line by the cursor of the plot of utilisation.
  void dragCursor(Samples& samples) {
    UtilisationPlot& plot = strengths->plot();
    const UtilisationFrame& frame = plot.frame();
    const auto at = [&](double degrees) {
      const Vec on = frame.at({degrees, 0.5});
      return QPointF(on.x, on.y);
    };
    const double nominal = desk.readout().checks.front().band->nominal.degrees();
    send(plot, QEvent::MouseButtonPress, at(nominal), Qt::NoModifier);
    for (int i = 1; i <= eventsInRound; ++i)
      samples.time([&] {
        send(plot, QEvent::MouseMove, at(nominal + 20 * std::sin(0.1 * i)), Qt::NoModifier);
        paintAll();
      });
    send(plot, QEvent::MouseButtonRelease, at(nominal), Qt::NoModifier);
    paintAll();
  }

  /// Typed stresses: everything follows, the axes too.
  void edit(Samples& samples) {
    const Place place{Spot::sx, desk.readout().point, desk.study().cases.front().id};
    for (int i = 1; i <= eventsInRound; ++i)
      samples.time([&] {
        const std::string text = std::to_string(5 + 0.1 * (i % 17)) + " MPa";
        desk.request({Type{place, text}}, desk.newGesture(), QStringLiteral("Type"));
        paintAll();
      });
  }

  Desk desk;
  CircleView* circle;
  StrengthPanel* strengths = nullptr;
  QSplitter columns;
};

/// What an idle machine has to keep, in ms, and the circle alone as a multiple of the circle by hand.
struct Limits {
  double median;
  double percentile99;
};
constexpr Limits dragLimits{6, 16};
constexpr Limits editLimits{16, 33};
constexpr double ratioLimit = 10;

void print(const Samples& samples, const Samples& byHand, Limits limits) {
  const bool inside = samples.median() <= limits.median && samples.percentile99() <= limits.percentile99;
  std::printf("  %-36s %8.2f %8.2f %8.2f   limits %3.0f %3.0f ms: %s\n", samples.name().c_str(),
              samples.median(), samples.percentile99(), samples.median() / byHand.median(), limits.median,
              limits.percentile99, inside ? "inside" : "over");
}

/// True when the circle alone costs no more than its multiple of the circle by hand.
bool windowCosts(int combinations) {
  Samples byHand("circle painted by hand");
  Samples turn("circle alone: drag the reading mark");
  Samples draw("circle alone: drag the ear");
  Samples type("circle alone: type a stress");
  Samples turnAll("all views: drag the reading mark");
  Samples typeAll("all views: type a stress");
  Samples turnLine("with strengths: drag the line");
  Samples turnJudged("with strengths: drag the mark");
  Samples typeJudged("with strengths: type a stress");
  HandPainted hand(combinations);
  Window alone(combinations, Views::circle);
  Window whole(combinations, Views::all);
  Window judged(combinations, Views::allWithStrengths);
  for (int round = 0; round < rounds; ++round) {
    for (int i = 0; i < eventsInRound; ++i)
      byHand.time([&] {
        hand.turn();
        paintAll();
      });
    alone.drag(turn, Handle::reading);
    alone.drag(draw, Handle::ear);
    alone.edit(type);
    whole.drag(turnAll, Handle::reading);
    whole.edit(typeAll);
    judged.dragCursor(turnLine);
    judged.drag(turnJudged, Handle::reading);
    judged.edit(typeJudged);
  }
  std::printf("%d combination(s), ms: median, 99th percentile, median as a multiple of the circle by hand\n",
              combinations);
  std::printf("  %-36s %8.2f %8.2f %8.2f\n", byHand.name().c_str(), byHand.median(), byHand.percentile99(),
              1.0);
  print(turn, byHand, dragLimits);
  print(draw, byHand, editLimits);
  print(type, byHand, editLimits);
  print(turnAll, byHand, dragLimits);
  print(typeAll, byHand, editLimits);
  print(turnLine, byHand, dragLimits);
  print(turnJudged, byHand, dragLimits);
  print(typeJudged, byHand, editLimits);
  const double worst = std::max({turn.median(), draw.median(), type.median()}) / byHand.median();
  std::printf("  the circle alone costs at most %.1f times the circle by hand; limit %.0f\n", worst,
              ratioLimit);
  return worst <= ratioLimit;
}

/// An evaluation in units of a thousand sine-cosine pairs.
void evaluationCost(int combinations) {
  const Study study = studyWith(combinations);
  Samples evaluation("evaluate");
  Samples arithmetic("a thousand sines and cosines");
  double sum = 0;
  for (int i = 0; i < 400; ++i) {
    evaluation.time([&] { sum += evaluate(study).state().circle.radius; });
    arithmetic.time([&] {
      for (int k = 0; k < 1000; ++k) {
        const CosSin direction = cosSin(Angle::fromDegrees(0.1 * k + sum * 1e-9));
        sum += direction.cos * direction.sin;
      }
    });
  }
  std::printf(
      "evaluate, %3d combination(s): %.4f ms, %.2f times a thousand sines and cosines (%.4f ms, sum %.3g)\n",
      combinations, evaluation.median(), evaluation.median() / arithmetic.median(), arithmetic.median(), sum);
}

} // namespace
} // namespace planewright

int main(int argc, char** argv) {
  qputenv("QT_QPA_PLATFORM", "offscreen");
  QApplication application(argc, argv);
  if (!planewright::loadProgramFont())
    return 3;
  QApplication::setFont(planewright::programFont(13));
  const bool one = planewright::windowCosts(1);
  const bool twenty = planewright::windowCosts(20);
  planewright::evaluationCost(1);
  planewright::evaluationCost(20);
  const bool many = planewright::windowCosts(200);
  planewright::evaluationCost(200);
  return one && twenty && many ? 0 : 1;
}
