// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QString>

#include <array>

namespace planewright {

/// How the window looks: as the system, or always light, dark or with much contrast.
enum class Appearance { system, light, dark, contrast };

/// The user's choice, kept in the settings.
Appearance chosenAppearance();
void chooseAppearance(Appearance appearance);

/// Sizes of the window's text in percent of that of the system.
inline constexpr std::array textPercents = {100, 115, 130, 150};
int chosenTextPercent();
void chooseTextPercent(int percent);

/// Dresses the application: style, font and the palette of the chosen appearance. Called at the start, when
/// the choice changes and when the system's theme does.
void dressApplication();

} // namespace planewright
