// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

namespace planewright {

class ElementView;

/// Makes the element known to assistive techniques as a dial: its value is the angle of the handle that keys
/// turn, in words "reading plane, normal at 30.0 degrees"; its description tells all handles. May be called
/// more than once.
void installElementAccessibility();
/// Tells that an angle or the handle changed.
void announceElement(ElementView& view);

} // namespace planewright
