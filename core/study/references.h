// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/study/place.h"

namespace planewright {

/// Takes away what cannot stand without the thing that was removed from `place`.
void dropReferences(Study& study, const Place& place);

/// Rewrites what refers to the thing at `place` under its old name.
void renameReferences(Study& study, const Place& place, const std::string& name);

} // namespace planewright
