// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/study.h"
#include "ui/look/look.h"

namespace planewright {

/// "Judged by it: “grain” of P1. …": the checks that go when a material of the study goes; empty where none
/// does.
QString usedBy(const Study& study, const std::string& material);

/// A material of a library to be read, as rich text: how it was read stands first.
QString sheetOf(const Material& material, const Look& look);

} // namespace planewright
