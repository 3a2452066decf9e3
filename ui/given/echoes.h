// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/expression.h"
#include "core/study/readout.h"

#include <QString>

namespace planewright {

/// The state of a single case, which stands among the states under the case's id.
const StateReading* stateOfCase(const Readout& readout, const std::string& caseId);

/// "8.611 MPa": a component as it is typed, without what sources of the case add to it, with the decimals of
/// that case's state.
QString echoOfStress(const Study& study, const Readout& readout, const std::string& caseId,
                     const std::string& typed);
/// The third normal stress of a case.
QString echoOfThird(const Study& study, const Readout& readout, const std::string& caseId);
/// "5.71° from +x, 1 in 10": an angle both ways, so that 10 for 1 in 10 is seen at once.
QString echoOfLine(const Readout& readout, std::size_t index);
/// "4.76°" of a tolerance that is not typed in plain degrees.
QString echoOfTolerance(const Study& study, const Readout& readout, std::size_t index);
/// "12.50 mm" of an expression of any other dimension; nothing where the text says it already.
QString echoOfValue(const EntryKind& kind, const std::string& typed);
/// "22.50°" of a direction that is not typed in plain, folded degrees.
QString echoOfDirection(const std::string& typed, Angle angle);

} // namespace planewright
