// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/problem.h"

namespace planewright {

/// Why a file gives no study back; each tells what to do.
Problem noStudyCarried();
Problem studyCutOff();
Problem studyChanged();
Problem studiesDiffer();
Problem carrierTooLarge();

/// The bytes of a study as the text that every kind of file carries: version, count of bytes and checksum in
/// the first line, then base64. ASCII without any character that markup gives a meaning to. A Problem for
/// more bytes than are read of a study.
Result<std::string> carriedText(std::string_view study);

/// The bytes of the study in such a text, exactly as they were; blanks do not count. Takes no more memory
/// than the text has characters.
Result<std::string> studyOfCarriedText(std::string_view text);

} // namespace planewright
