// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace planewright {

class CirclePlot;
class Desk;

/// Gives the plot a name, a value (the angle of the reading plane) and the means to change it for those who
/// work without seeing it.
void makeAccessible(CirclePlot& plot, Desk& desk);

} // namespace planewright
