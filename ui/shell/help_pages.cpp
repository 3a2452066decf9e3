// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/help_pages.h"

#include "core/strength/criterion.h"

#include <QCoreApplication>

namespace planewright {

namespace {

QString words(const char* source) {
  return QCoreApplication::translate("Help", source);
}

QString entries() {
  return words(QT_TRANSLATE_NOOP("Help", R"help(
<p>Type a component the way the hand calculation has it, with its units; below the field stands what it comes to.</p>
<p><code>-18.6 kN/(90 mm*240 mm)</code> &nbsp; <code>1.5*12 kN/(90 mm*240 mm)</code> &nbsp; <code>0.4*sqrt(3) MPa</code></p>
<table cellpadding="3">
<tr><td>Operators</td><td><code>+ - * / ^</code>, parentheses; <code>sqrt abs min max sin cos tan</code>; <code>pi</code></td></tr>
<tr><td>Stress</td><td>Pa kPa MPa GPa psi ksi psf bar, or a force over an area</td></tr>
<tr><td>Force</td><td>N kN MN lbf kip kgf tf</td></tr>
<tr><td>Length</td><td>um mm cm m in ft</td></tr>
<tr><td>Angle</td><td>deg rad; a plain number is in degrees</td></tr>
</table>
<p>A unit binds tighter than <code>*</code> and <code>/</code>: <code>12 kN / 100 mm^2</code> is 12 kN over 100 square
millimetres. A number without a unit takes the study's unit and is completed with it, so that another unit never
changes a stress.</p>
<p>The angle and the tolerance of a line also read slopes: <code>1 in 12</code>, <code>1:12</code>, the angle <code>8 %</code> too.
The echo gives both, 5.71° and 1 in 10, so that 10 for 1 in 10 is seen at once. The normal of a plane takes no slope.</p>
<p>Edit, Paste table reads a table from a spreadsheet: a row for each case, with headings such as <code>point</code>,
<code>case</code>, <code>sx [MPa]</code>, <code>sy</code>, <code>txy</code> or <code>N</code>, <code>V</code>, <code>M</code>;
a new point lies in a section of the study by <code>section</code>, <code>y</code>, <code>z</code>, <code>view</code>. It shows
what would be kept and takes all of it or nothing.</p>
<p>A decimal comma is not read in a field; write 1.5. In a table it is, where it can mean nothing else. A text that does not read stays in its field, marked, with what is wrong and
how to mend it; the study keeps the last text that did.</p>
)help"));
}

QString conventions() {
  return words(QT_TRANSLATE_NOOP("Help", R"help(
<table cellpadding="6"><tr>
<td><img src="picture:given" width="300" height="250"></td>
<td><img src="picture:turned" width="300" height="250"></td></tr>
<tr><td>Given: positive components, tension positive.</td>
<td>Turned: the heavy face is the cut; its normal n stands at θ.</td></tr></table>
<p>x runs along the member, y up; everything is seen from +z. All angles are measured from +x, counter-clockwise, and
reported from −90° (excluded) to 90°.</p>
<p><b>A plane is named by its normal.</b> The cut itself runs 90° further; the table has both. τ<sub>nt</sub> is positive
towards t, the normal turned by +90°.</p>
<p><b>A line has an angle of its own</b>, φ. The cut that <i>crosses</i> the line has its normal along it, at φ: its normal
stress acts <i>along</i> the line. The cut that <i>follows</i> the line has its normal at φ + 90°: its normal stress acts
<i>across</i> the line. Both carry the same shear with opposite signs.</p>
<p>On the circle τ<sub>nt</sub> is drawn positive downwards, so that the circle turns the way the element turns, by twice
the angle. A study may choose upwards; then the circle turns the other way.</p>
<p>A study may count compression positive: then every typed and reported component has the opposite sign. The arrows of
the element show what the body feels and do not change.</p>
)help"));
}

/// One row of the table of criteria, from core's own.
QString criterionRow(Criterion criterion) {
  const CriterionRow& row = rowOf(criterion);
  const QString domain = row.domain.empty() ? QString() : QStringLiteral("<br>") + shown(row.domain);
  return QStringLiteral("<tr><td><b>%1</b></td><td>%2%3<br><i>%4</i></td></tr>")
      .arg(shown(labelOf(criterion)), shownRich(symbol(row.equation)), domain, shown(row.source));
}

QString strength() {
  QString rows;
  for (const Named<Criterion>& one : namesOf<Criterion>())
    rows += criterionRow(one.value);
  return words(QT_TRANSLATE_NOOP("Help", R"help(
<p>A check asks whether the stresses of a point are within the strengths of a material, along and across its line or on a
watched plane, over all combinations and over the tolerance of the angle. Take a material into the study (Study,
Materials), then Strength, Add a check.</p>
<p><b>Utilisation</b> is 1 over the load multiplier: the factor on all loads together that brings the point to its limit.
It is rounded upwards, the multiplier downwards. For planes with friction it is the mobilised ratio, since clamping grows
with the loads too.</p>
<p><b>Strength belongs to the combination:</b> characteristic strengths are multiplied by the factor of the shortest duration
that acts and divided by the partial factor, or multiplied by a factor of your own. So a permanent combination can govern
though its stresses are lower. Where stresses come from section forces, the strength along the line is that of the mix of
axial and bending parts.</p>
<p><b>The tolerance counts always:</b> the worst of the band is exact, not scanned. A slope of grain whose sense is not known is
entered as the tolerance to either side of the line's angle, which stays (Line, Slope of unknown sense): the sense of τ<sub>xy</sub> decides whether
the grain is pulled or pressed across.</p>
<p>The plot shows utilisation over the angle: the shown combination as a full line, the greatest of all dashed, the others as
hairs; the limit is hatched, the tolerance a strip, the worst a triangle, angles within the limit a bar on the base line.
Drag the line's cursor to try other angles. "All criteria side by side" shows how much of the answer is the criterion.</p>
<p>A combination outside what a criterion was published for is not judged, and then nothing is said of the point.</p>
<p>1 = along the line, 2 = across it, τ = shear; X and Y by the sign of the stress.</p>
<table cellpadding="4">%1</table>
)help"))
      .arg(rows);
}

QString screening() {
  return words(QT_TRANSLATE_NOOP("Help", R"help(
<p>File, Screen points judges the points of a table, a million of them too, by the line, the tolerance and the checks of
one point of the study, over all combinations. It finds the few that are worth opening.</p>
<p><b>The table</b> is CSV in UTF-8, with a row for each case at a point (<code>point,case,sx,sy,txy</code>) or with three
columns for each case (<code>sx G</code>, <code>sy G</code>, <code>txy G</code>). A heading may name its unit, as in
<code>sx [MPa]</code>; without one the study's unit counts. <code>layer</code> (top, mid, bottom), <code>axes</code> (of the
row's own stresses), <code>line</code> (of its own), <code>region</code>, <code>x</code> and <code>y</code> may stand beside
them. What a column with another heading means is chosen from the list above it.</p>
<p>A row with a fault, NaN and infinity among them, stops the run and is told with its line; "Leave faulty rows out" goes
on, and they are counted. Points and regions are left out by name; <code>corner*</code> is all names that begin so.</p>
<p><b>The greatest value is not yet a verdict.</b> At a re-entrant corner or under a point load the stresses of an analysis
grow with every refinement of its mesh. The value that 99.9 % of the points stay within stands beside the greatest one.</p>
<p><b>Map</b> (where the table has x and y): the classes are in the legend, hatched exceeds, pale is kept back by a
filter. The ring is at the chosen row. <b>Bars</b> count the points by utilisation; a bar shows its points alone. <b>Notes</b> say what was
judged and read, and the cautions.</p>
<p>Open as a point makes the chosen row a point of the study, with its cases and the checks that judged it, in one step that
can be undone.</p>
<table cellpadding="4">
<tr><td><b>Enter</b></td><td>in the table: open the row as a point of the study</td></tr>
<tr><td><b>Alt+M, Alt+B, Alt+N</b></td><td>map, bars, notes</td></tr>
<tr><td><b>click; wheel; drag</b></td><td>on the map: choose the point; closer or wider about the pointer; move</td></tr>
<tr><td><b>+, −; arrows; Home</b></td><td>on the map: closer, wider; move; all of the field</td></tr>
<tr><td><b>Ctrl+arrows</b></td><td>on the map: choose the nearest point that way</td></tr>
<tr><td><b>Up, Down; Space</b></td><td>on the bars: to a bar; its points alone, and once more all</td></tr>
<tr><td><b>Esc</b></td><td>cancel what is running; close the window</td></tr>
</table>
)help"));
}

QString keys() {
  return words(QT_TRANSLATE_NOOP("Help", R"help(
<table cellpadding="4">
<tr><td><b>F1</b></td><td>help on the focused area</td></tr>
<tr><td><b>F6, Shift+F6</b></td><td>next, previous area</td></tr>
<tr><td><b>Tab</b></td><td>next field; inside a drawing the next handle</td></tr>
<tr><td><b>F8, Shift+F8</b></td><td>next, previous entry that is not taken</td></tr>
<tr><td><b>Left, Down; Right, Up</b></td><td>turn a handle by −1°, +1°; with Shift 0.1°, with Ctrl 15°</td></tr>
<tr><td><b>PageUp, PageDown</b></td><td>on a handle: next, previous named direction</td></tr>
<tr><td><b>Home, Enter, Esc</b></td><td>on a handle: to 0°; type an angle; a drag back to its start</td></tr>
<tr><td><b>Ctrl, Shift</b></td><td>in a drag: turn freely; turn at a tenth</td></tr>
<tr><td><b>F2, Enter</b></td><td>in Planes: edit; bring the reading plane there, or show the combination of a least or greatest value</td></tr>
<tr><td><b>Ctrl+Enter</b></td><td>in Planes: the other plane with the same stress</td></tr>
<tr><td><b>Insert, Delete</b></td><td>in Planes: watch the reading plane; remove</td></tr>
<tr><td><b>Ctrl+PageUp, Ctrl+PageDown</b></td><td>previous, next point</td></tr>
<tr><td><b>Alt+PageUp, Alt+PageDown</b></td><td>previous, next combination</td></tr>
<tr><td><b>Ctrl+G</b></td><td>the combination with the greatest utilisation at this point; without checks the greatest σ<sub>1</sub>, again: the greatest shear in the plane</td></tr>
<tr><td><b>Ctrl+Shift+G</b></td><td>the same over all points of the study</td></tr>
<tr><td><b>Ctrl+Shift+V</b></td><td>paste a table of stresses or section forces</td></tr>
<tr><td><b>Ctrl+1, Ctrl+2</b></td><td>the point with its drawings; the summary of all points</td></tr>
<tr><td><b>Ctrl+E, Ctrl+0</b></td><td>arrange the figure; fit the circle</td></tr>
<tr><td><b>Ctrl+N, O, S, P, Q, Z, C; F11</b></td><td>as everywhere</td></tr>
</table>
)help"));
}

QString cautions() {
  return words(QT_TRANSLATE_NOOP("Help", R"help(
<p><b>Planewright looks at one point in plane stress.</b> It is an aid to a licensed engineer, who decides, under the
code that governs where the structure stands. It is no design check.</p>
<p>It does not see:</p>
<ul>
<li>the stressed volume, effects of size and depth;</li>
<li>moisture, temperature, duration of load, fatigue;</li>
<li>notches, holes, edges, ends, curved parts, ply drops, where stresses out of the plane are not small;</li>
<li>stresses in the third direction beyond the one normal stress that may be given;</li>
<li>the scatter of a material, buckling, and whatever acts at another point.</li>
</ul>
<p>The components are taken as they are typed: an error in them is an error in everything that follows. Compare the
signs with the picture of positive stresses before trusting a result.</p>
)help"));
}

} // namespace

QString titleOf(HelpPage page) {
  switch (page) {
  case HelpPage::entries:
    return words(QT_TRANSLATE_NOOP("Help", "Entries and units"));
  case HelpPage::conventions:
    return words(QT_TRANSLATE_NOOP("Help", "Conventions"));
  case HelpPage::strength:
    return words(QT_TRANSLATE_NOOP("Help", "Strength"));
  case HelpPage::screening:
    return words(QT_TRANSLATE_NOOP("Help", "Screening a field"));
  case HelpPage::keys:
    return words(QT_TRANSLATE_NOOP("Help", "Keys"));
  case HelpPage::cautions:
    break;
  }
  return words(QT_TRANSLATE_NOOP("Help", "Cautions"));
}

QString htmlOf(HelpPage page, const Look& look) {
  const QString body = page == HelpPage::entries       ? entries()
                       : page == HelpPage::conventions ? conventions()
                       : page == HelpPage::strength    ? strength()
                       : page == HelpPage::screening   ? screening()
                       : page == HelpPage::keys        ? keys()
                                                       : cautions();
  return QStringLiteral("<body style=\"color:%1\"><h2>%2</h2>%3</body>")
      .arg(look.colour(Role::ink).name(), titleOf(page), body);
}

} // namespace planewright
