// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/source/fibre.h"
#include "core/study/edit.h"

namespace planewright {

/// Edits that change sections and the fibres in them together, so that no study between is without sense.

/// Gives a section another shape: sizes that both shapes have stay, others come with a usual value that is to
/// be typed over; fibres of the section go to its lowest place.
Edits editsThatReshape(const Study& study, const std::string& section, SectionShape shape);

/// Types a size. A fibre that lies at a ready place (an extreme, a junction, the axis) stays at that place of
/// the changed section. The Problem when the size does not read or is none.
Result<Edits> editsThatResize(const Study& study, const Place& size, const std::string& text);

/// Adds a block to a section built of rectangles, on top of it.
Edits editsThatAddBlock(const Study& study, const std::string& section);
/// Takes its last block away; nothing where it has one only.
Edits editsThatDropBlock(const Study& study, const std::string& section);

/// Puts the fibre of a point at a place, in the study's unit of length.
Edits editsThatPlaceFibre(const Study& study, const std::string& point, const Fibre& fibre);

/// Gives a point a fibre in a section, a new rectangle where the name is new.
Edits editsThatGiveFibre(const Study& study, const std::string& point, const std::string& section);

/// What makes a section `to` right behind `from` with its shape and sizes.
Edits editsThatCopySection(const Study& study, const std::string& from, const std::string& to);

/// A name for a section that the study does not have: "section 2"; like another one "beam 2".
std::string freshSectionName(const Study& study);
std::string freshSectionName(const Study& study, const std::string& like);

/// The names of the points that lie in a section.
std::vector<std::string> pointsIn(const Study& study, const std::string& section);

} // namespace planewright
