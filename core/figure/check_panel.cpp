// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/check_panel.h"

#include "core/figure/text_lines.h"
#include "core/figure/utilisation_drawing.h"
#include "core/table/check_words.h"

#include <algorithm>

namespace planewright {

namespace {

constexpr double lineHeight = 1.25; // em
constexpr double plotHeight = 45;   // mm at 160 mm
constexpr double gap = 5;           // mm between sentences and plot

class CheckPanel {
public:
  CheckPanel(Picture& picture, const Setting& setting) : m_picture(picture), m_setting(setting) {}

  double drawn(double left, double right, double top) {
    const Readout& readout = m_setting.readout;
    const Verdict verdict = verdictOf(readout);
    const std::optional<JudgedCheck>& told = toldOf(verdict);
    if (!told)
      return top;
    top += 0.6 * m_setting.text; // below the rule of the table
    const bool hasPlot = m_setting.order.parts.utilisation && readout.checks[told->check].band.has_value();
    const bool beside = hasPlot && !m_setting.isNarrow && m_setting.order.parts.check;
    const double middle = beside ? left + (right - left) * 75 / 160 : right;
    double bottom = top;
    if (m_setting.order.parts.check)
      bottom = words(verdict, *told, left, middle, top);
    if (hasPlot) {
      const double plotTop = beside ? top : bottom + 0.5 * m_setting.text;
      const double plotLeft = beside ? middle + gap : left;
      const double height = plotHeight * (m_setting.isNarrow ? 0.9 : (right - left) / 160);
      plot(told->check, verdict, {plotLeft, plotTop, right, plotTop + height});
      bottom = std::max(bottom, plotTop + height);
    }
    return bottom + 0.7 * m_setting.text;
  }

private:
  double paragraph(const Text& text, double left, double right, double top, double size, Role role,
                   bool bold) {
    for (const Runs& line : brokenLines(m_setting.runsOf(text), right - left, size, bold)) {
      setWords(m_picture, {left, top + size}, line, size, Align::start, role, bold);
      top += lineHeight * size;
    }
    return top;
  }

  double words(const Verdict& verdict, const JudgedCheck& told, double left, double right, double top) {
    const Readout& readout = m_setting.readout;
    const CheckSetup& check = readout.checks[told.check];
    const CheckReading& reading = readingOf(readout, told);
    const double size = m_setting.text;
    const Role role = verdict.standing == Standing::exceeds ? Role::limit : Role::ink;
    top = paragraph(
        PW_TEXT("Figure", "%1 (%2)").with(shortVerdict(verdict)).with(readout.states[told.state].combination),
        left, right, top, size, role, true);
    std::vector<Text> sentences = {checkName(check), verdictSentence(verdict)};
    if (reading.problem)
      sentences.push_back(notJudgedSentence(readout, told));
    else {
      sentences.push_back(multiplierSentence(reading));
      sentences.push_back(worstSentence(check, reading));
      sentences.push_back(factorSentence(reading.factor));
    }
    for (const Text& sentence : sentences)
      if (!sentence.empty())
        top = paragraph(sentence, left, right, top, size, Role::ink, false);
    for (const Text& caution : cautionsOf(readout, told.check))
      top = paragraph(caution, left, right, top, m_setting.small, Role::soft, false);
    return top;
  }

  void plot(std::size_t check, const Verdict& verdict, const Box& room) {
    const Readout& readout = m_setting.readout;
    const UtilisationCurves curves = utilisationCurvesOf(readout, check);
    const CheckSetup& setup = readout.checks[check];
    std::optional<WorstInBand> worst;
    if (verdict.governing && verdict.governing->check == check)
      if (const CheckReading& reading = readingOf(readout, *verdict.governing); reading.worstAngle)
        worst = {reading.worst, *reading.worstAngle};
    const double keyTop = room.bottom - heightOfKey(curves, m_setting.small);
    const UtilisationFrame frame =
        utilisationFrameIn({room.left, room.top, room.right, keyTop}, m_setting.small, m_setting.narrow,
                           curves.highest, suitsLogarithm(worst), m_setting.order.translate);
    append(utilisationKey({frame.plot.left, keyTop, room.right, room.bottom}, m_setting.small,
                          m_setting.narrow, curves, readout.state().combination, m_setting.order.translate));
    append(utilisationGround(frame, setup, directionsWithin(readout, check), m_setting.order.translate));
    for (const UtilisationCurve& other : curves.others)
      append(utilisationLines(frame, other, {Role::other, m_setting.hair, Dash::solid}));
    append(utilisationLines(frame, curves.greatest, {Role::state, m_setting.medium, Dash::shortDash}));
    append(utilisationLines(frame, curves.shown, {Role::state, m_setting.wide, Dash::solid}));
    append(utilisationMarks(frame, setup, worst));
  }

  void append(const Picture& more) {
    m_picture.parts.insert(m_picture.parts.end(), more.parts.begin(), more.parts.end());
  }
  void append(const std::vector<Path>& more) {
    m_picture.parts.insert(m_picture.parts.end(), more.begin(), more.end());
  }

  Picture& m_picture;
  const Setting& m_setting;
};

} // namespace

double drawCheck(Picture& picture, const Setting& setting, double left, double right, double top) {
  return CheckPanel(picture, setting).drawn(left, right, top);
}

} // namespace planewright
