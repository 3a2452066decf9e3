// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/edit.h"

namespace planewright {

/// What matches a print with its file: the first 16 hexadecimal digits of the SHA-256 (FIPS 180-4) of the
/// study's file, in groups of four, "7f3a 91c2 0be4 55d0". The names of those who prepared and checked, and
/// which point and combination are shown, are not in it; everything else is.
std::string fingerprintOf(const Study& study);

/// How a name in the title block stands to the study as it is now.
enum class Signing {
  open,    ///< there is no name
  bound,   ///< given for the study as it is
  changed, ///< given for another state of the study
  unbound  ///< nothing says for which
};
struct Signings {
  Signing prepared = Signing::open;
  Signing checked = Signing::open;
};
Signings signingsOf(const Study& study);

/// "A. B.", "A. B., changed since checked"; empty where there is no name.
Text shownPrepared(const Study& study);
Text shownChecked(const Study& study);

/// `edited`; a name that the edits type as prepared or checked is bound to the study that they make.
Result<Study> editedAndSigned(const Study& study, const Edits& edits);

} // namespace planewright
