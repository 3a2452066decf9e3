# SPDX-License-Identifier: GPL-3.0-or-later
"""Looks at the window of Planewright through AT-SPI, as assistive techniques do, and works in it by that alone.

looks.py TREE: the tree of what is there is written to the file TREE. The study is the worked example.
"""
import sys
import time

import pyatspi

faults = []


def check(holds, words):
    if not holds:
        faults.append(words)


def waited_for(found, what, seconds=60):
    """What `found` gives once it gives something."""
    end = time.time() + seconds
    while time.time() < end:
        try:
            if result := found():
                return result
        except Exception:  # the tree may change while it is walked
            pass
        time.sleep(0.1)
    sys.exit("not there: " + what)


def application():
    desktop = pyatspi.Registry.getDesktop(0)
    for child in desktop:
        if child and child.name == "planewright" and child.childCount > 0:
            return child
    return None


def parts(node):
    yield node
    if node.getRoleName() in ("table", "tree", "tree table"):
        return  # its cells are looked at by themselves
    for child in node:
        if child:
            yield from parts(child)


def has(node, state):
    return node.getState().contains(state)


def value_of(node):
    try:
        return node.queryValue()
    except NotImplementedError:
        return None


def table_of(node):
    try:
        return node.queryTable()
    except NotImplementedError:
        return None


def named(root, name, role=None):
    for node in parts(root):
        if node.name == name and (role is None or node.getRoleName() == role):
            return node
    return None


def starting(root, words):
    return next((node for node in parts(root) if node.name.startswith(words)), None)


def write_tree(root, path):
    def lines(node, depth):
        value, table = value_of(node), table_of(node)
        words = ["  " * depth + node.getRoleName(), repr(node.name)]
        if node.description:
            words.append("described as " + repr(node.description))
        if value:
            words.append(f"value {value.currentValue:g} of {value.minimumValue:g} to {value.maximumValue:g}")
        if table:
            words.append(f"{table.nRows} rows, {table.nColumns} columns")
        if has(node, pyatspi.STATE_FOCUSABLE):
            words.append("takes the focus")
        yield " ".join(words)
        if table:
            for row in range(table.nRows):
                cells = [table.getAccessibleAt(row, column).name for column in range(table.nColumns)]
                yield "  " * (depth + 1) + " | ".join(cells)
            return
        for child in node:
            if child and (has(child, pyatspi.STATE_SHOWING) or child.getRoleName() in ("menu item", "popup menu")):
                yield from lines(child, depth + 1)

    with open(path, "w", encoding="utf-8") as file:
        file.write("\n".join(lines(root, 0)) + "\n")


app = waited_for(application, "the program")
window = waited_for(lambda: next((f for f in app if "study" in f.name), None), "its window")
waited_for(lambda: named(window, "Element", "dial"), "the element")
waited_for(lambda: named(window, "Utilisation over the angle of the line", "dial"), "the plot of utilisation")
write_tree(window, sys.argv[1])



def check_names(root):
    """Whatever takes the focus has a name; the inner part of a drawing passes it on, an empty label says nothing."""
    for node in parts(root):
        takes = has(node, pyatspi.STATE_FOCUSABLE) and has(node, pyatspi.STATE_SHOWING)
        if takes and node.getRoleName() != "label" and node.parent.getRoleName() != "dial":
            check(node.name, f"without a name: {node.getRoleName()} in {node.parent.name!r} of {root.name!r}")


check_names(window)
for node in parts(window):
    if node.getRoleName() == "push button" and has(node, pyatspi.STATE_SHOWING) and has(node, pyatspi.STATE_ENABLED):
        check(node.queryAction().nActions > 0, f"cannot be pressed: {node.name!r}")

# The drawings are values with words.
element = named(window, "Element", "dial")
circle = named(window, "Reading plane on the circle", "dial")
plot = named(window, "Utilisation over the angle of the line", "dial")
for dial in (element, circle, plot):
    check(dial is not None, "a drawing is no dial")
check(element.queryValue().currentValue == 20, "the element's value")
check("normal at 20.0 degrees" in element.description, "the element's words: " + element.description)
check("normal stress 11.27 MPa, shear stress" in circle.description, "the circle's words: " + circle.description)
check("1.11 at 4.76" in plot.description, "the plot's words: " + plot.description)
check(abs(plot.queryValue().currentValue - 4.7636) < 1e-3, "the plot's value")

# What turns by its value turns everything.
element.queryValue().currentValue = -35
waited_for(lambda: circle.queryValue().currentValue == -35, "the circle after the element was turned")
field = starting(window, "normal at,")
waited_for(lambda: "-35" in field.queryText().getText(0, -1), "the field after the element was turned")
plot.queryValue().currentValue = 8
waited_for(lambda: "at 8.0 degrees" in element.description, "the line after the plot was turned")

# Tables are tables.
planes = table_of(named(window, "Planes", "table"))
check(planes.nRows >= 10 and planes.nColumns == 8, f"planes: {planes.nRows} rows, {planes.nColumns} columns")
check(planes.getAccessibleAt(0, 0).name == "Reading plane", "first row: " + planes.getAccessibleAt(0, 0).name)
check(planes.getAccessibleAt(0, 1).name.startswith("\u221235.00"), "its angle: " + planes.getAccessibleAt(0, 1).name)
check(planes.getColumnDescription(1) == "normal at", "heading: " + planes.getColumnDescription(1))
checks = table_of(named(window, "Checks of the point"))
check(checks is not None and checks.nRows == 2, "the checks are no table")

# Another case is chosen by a press; the fields show what it has.
moment = waited_for(lambda: starting(window, "Mz,"), "the field of the moment")
check("5.2 kN" in moment.queryText().getText(0, -1), "the moment of case G")
named(window, "case S").queryAction().doAction(0)
waited_for(lambda: "8.1 kN" in moment.queryText().getText(0, -1), "the moment of case S")

# A dialog comes by a press and tells its name.
named(window, "Figure\u2026", "push button").queryAction().doAction(0)
dialog = waited_for(lambda: next((f for f in app if f != window and has(f, pyatspi.STATE_SHOWING)), None),
                    "the dialog of the figure")
check(dialog.name, "the dialog has no title")
check_names(dialog)

for fault in faults:
    print(fault)
sys.exit(1 if faults else 0)
