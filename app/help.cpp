// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/help.h"

#include "core/words/version.h"

namespace planewright {

// The command line speaks English alone: scripts and other people's notes quote it.

std::string programHelp() {
  return R"help(Planewright: plane stress at a point, resolved to the line that matters.

planewright [STUDY]            opens the window, with a study or with a figure that carries one
planewright resolve ...        prints everything that follows from a study or from three components
planewright figure STUDY ...   writes the labelled figure as SVG, PDF or PNG
planewright sheet STUDY ...    writes the calculation sheet as PDF or HTML
planewright screen POINTS ...  judges the points of a table by the checks of a point of a study
planewright compare A B        tells what changed from one study to another
planewright validate           recomputes every published value that is shipped with it
planewright manual ...         writes the handbook as HTML into a folder
planewright COMMAND --help     explains a command
planewright --version          prints the version

A first word that is a command is a command: write ./figure for a file of that name.
Commands need no display. “-” is standard input or output.

Exit codes: 0 done; 1 done, and a check exceeds or could not be judged; 2 wrong use or bad input: nothing is written; 3 the machine failed (disk, permission, font); 4 done, but rows or points were left out on request (screen); 5 a self-check disagreed (validate, sheet).

An aid to a licensed engineer: it looks at one point in plane stress. It sees no volume, size, moisture,
duration, edge, notch or third-direction effects. Local codes govern.
)help";
}

std::string programVersionLines() {
  return "Planewright " + std::string(programVersion()) + R"help(
Free software under the GNU General Public License, version 3 or later; there is no warranty.
Figures are set in Liberation Sans, under the SIL Open Font License 1.1.
)help";
}

std::string resolveHelp() {
  return R"help(planewright resolve STUDY [options]
planewright resolve --sx STRESS --sy STRESS --txy STRESS [--sz STRESS] [options]

Prints everything that follows from a study, or from three components. Without a study, numbers without a unit
are MPa and degrees.

--sx, --sy, --txy, --sz STRESS   components in the point's axes, for instance "18.6 kN/(90 mm*240 mm)"
--positive tension|compression   which normal stress counts positive; tension without it
--normal ANGLE                   one more plane, by its normal from +x, counter-clockwise; may be repeated
--line ANGLE                     one more line, for instance "25 deg" or "1 in 10"; may be repeated
--tolerance ANGLE                how far the --line before it may be off, to either side
--format text|json|csv           text without it
-o FILE                          writes there; "-" or nothing is standard output

The cut that crosses a line has its normal along the line; the cut that follows it, at 90 deg to it.
Shear τxy is positive on the +x face in the +y direction.

planewright resolve --sx "80 MPa" --sy "20 MPa" --txy "-30 MPa" --normal "25 deg" --line "1 in 10" --format json
)help";
}

std::string compareHelp() {
  return R"help(planewright compare EARLIER LATER [-o FILE]

Tells what changed from one study to another: everything typed that differs, and the results that differ.

-o FILE   writes there; "-" or nothing is standard output

planewright compare beam-A.planewright beam-B.planewright
)help";
}

std::string validateHelp() {
  return R"help(planewright validate [-o FILE|FILE.html|FILE.pdf]

Recomputes every published value that the program carries and prints it beside the computed one, with its source,
its place there and how far it can be trusted. Exit code 5 where one disagrees.

-o FILE   writes there, as a report where the name ends with .html or .pdf, else as text; "-" or nothing is
          standard output
)help";
}

std::string manualHelp() {
  return R"help(planewright manual -o FOLDER [--replace] [--language NAME]

Writes the handbook as HTML into a folder, with its pictures and its style beside it; nothing in it leads outside.
Prints the name of the page to begin with.

-o FOLDER        where it goes; it is made where it is not there
--replace        writes over files that are there; without it nothing is written then
--language NAME  in which language, as “en”; without it, that of the program

planewright manual -o handbook
)help";
}

std::string screenHelp() {
  return R"help(planewright screen POINTS.csv --study STUDY -o OUT.csv [options]

Judges very many points by the line, tolerance and checks of one point of a study, over all its combinations, and
writes for each what governs: utilisation, load multiplier, combination, check, mode and worst angle. A summary goes
to standard error.

POINTS.csv has the columns point,case,sx,sy,txy with a row for each case at a point, or point and three columns for
each case ("sx G", "sy G", "txy G"). Besides them it may have layer (top, mid, bottom), axes (turn of the row's
x axis), line (the row's own angle of the line), region, x and y. Units stand behind: "sx [MPa]"; without them the
study's count.

--study STUDY          combinations, and the point with the checks
--point NAME           that point; without it, the one that the study shows, else its first
--check ID             only this check; may be repeated; without it, all that can judge a field
--column NAME=HEADING  what a column with another heading is: "sx [psi]=SXX"; "unread" passes it over; may be repeated
--leave-out            goes on without faulty rows; without it they stop the run and nothing is written
--except NAME          leaves out a point or region, or all whose names begin so ("corner*"); may be repeated
--except-list FILE     leaves out the points that are named in it, one a line
--top N                only the N worst points, worst first
--principals           adds s1, s2 and theta1 of the governing combination
-o FILE                "-" is standard output

planewright screen deck.csv --study beam.planewright --except "support*" -o worst.csv --top 100
)help";
}

std::string figureHelp() {
  return R"help(planewright figure STUDY -o FILE.svg|.pdf|.png [options]
planewright figure STUDY --folder FOLDER [--format svg|pdf|png] [--replace] [options]

Writes the labelled figure of one point and combination, or one for each point into a folder; the names of these
files, made of study, point and combination, are printed.

-o FILE              the ending says the kind; "-" is standard output, as SVG
--folder FOLDER      where the figures of all points go; it is made where it is not there
--format svg|pdf|png their kind; svg without it
--replace            writes over files that are there; without it nothing is written then
--point NAME         without it, the point that the study shows, else its first; with --folder it may be repeated, and
                     without it all points are drawn
--combination NAME   without it, the combination that the study shows, else the first; with --folder, the one that
                     governs each point
--width MM           width of the figure, 90 to 400 mm; 160 without it
--text PT            size of the text, 7 to 10 pt; 8 without it
--mono               black and greys only
--arrange beside|below|by-width
                     elements and circle in one row, or one below another; without it, by width: in one row from
                     130 mm on
--order LIST         what stands uppermost and to the left, for instance "circle" or "planes,elements"; of elements,
                     circle, planes, check those left out follow in this order
--dpi N              resolution of a PNG; 300 without it
--language CODE      of the words: en or de; en without it
--decimal point|comma
                     in the numbers; point without it. What is typed keeps its points
--without-study      the figure alone, for sending outside

Without that option the whole study, with all its points and notes, travels inside the file, and opening the
figure brings it back. A STUDY may be such a figure, here and in resolve.

planewright figure beam.planewright -o beam.pdf --width 90
planewright figure beam.planewright --folder figures --format pdf
)help";
}

std::string sheetHelp() {
  return R"help(planewright sheet STUDY -o FILE.pdf|.html|.txt [options]

Writes the calculation sheet: what governs, everything as typed, the working, the checks, a second route through
the program, conclusion and lines to sign.

-o FILE                        the ending says the kind; "-" is standard output, as HTML
--point NAME                   only this point; may be repeated; without it, all
--depth results|governing|all  how much of the working: none, of the governing combination of each point (without
                               the option), of every combination
--paper A4|Letter              of a PDF; A4 without it
--language CODE                of the words: en or de; en without it
--decimal point|comma          in the numbers; point without it. What is typed keeps its points
--without-figures              no element and circle
--without-study                the file does not carry the study
--since STUDY                  adds what changed since that revision

Exit code 5 where the two routes disagree; the sheet says so at its top.

planewright sheet beam.planewright -o beam-sheet.pdf --point "P1"
)help";
}

} // namespace planewright
