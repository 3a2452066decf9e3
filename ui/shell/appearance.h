// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

namespace planewright {

/// How the window looks: as the system, or always light or dark.
enum class Appearance { system, light, dark };

/// The user's choice, kept in the settings.
Appearance chosenAppearance();
void chooseAppearance(Appearance appearance);

/// Dresses the application: style, font and the palette of the chosen appearance. Called at the start, when
/// the choice changes and when the system's theme does.
void dressApplication();

} // namespace planewright
