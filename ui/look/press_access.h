// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace planewright {

/// Has assistive techniques press buttons as a click does. The toolkit's own way sets those that stay down
/// (choices, checks, folds) without a click, and whoever waits for clicks, as all views here do, hears
/// nothing; and it offers no press at all of a tool button that could have a menu. May be called more than
/// once.
void installPressAccess();

} // namespace planewright
