// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/look.h"

#include <array>
#include <cstddef>

namespace planewright {

namespace {

struct Shade {
  Role role;
  std::uint32_t light;
  std::uint32_t dark;
  std::uint32_t mono;
  std::uint32_t contrast;
};

// Contrast of the light and dark sets was computed with the WCAG formula; hush, grain, grid and rule are
// below 3:1 on purpose: nothing depends on them alone.
constexpr std::array shades = {Shade{Role::ink, 0x1C2529, 0xE6EBE9, 0x000000, 0xFFFFFF},
                               Shade{Role::soft, 0x4E5A60, 0xA9B4B6, 0x000000, 0xE0E0E0},
                               Shade{Role::state, 0x0B3C4C, 0xA8E4E8, 0x000000, 0x7FE9FF},
                               Shade{Role::reading, 0xBC4108, 0xF6AF66, 0x000000, 0xFFB454},
                               Shade{Role::line, 0x5A3FC0, 0xAE93F6, 0x000000, 0xC9B3FF},
                               Shade{Role::limit, 0x75222B, 0xF8529F, 0x000000, 0xFF8AC0},
                               Shade{Role::other, 0x828684, 0x727978, 0x595959, 0xB0B0B0},
                               Shade{Role::hush, 0xC9CFCC, 0x3B4649, 0xBDBDBD, 0x6A6A6A},
                               Shade{Role::grain, 0xCFC8EC, 0x463F6B, 0xBDBDBD, 0x7468B8},
                               Shade{Role::grid, 0xE4E9E6, 0x262E32, 0xE2E2E2, 0x444444},
                               Shade{Role::rule, 0xC5CDCA, 0x3C474B, 0x000000, 0x9A9A9A},
                               Shade{Role::band, 0xE8E3F9, 0x332E52, 0xE2E2E2, 0x3B2F6B},
                               Shade{Role::canvas, 0xFBFCFA, 0x151A1D, 0xFFFFFF, 0x000000},
                               Shade{Role::window, 0xEDF0EE, 0x20272B, 0xFFFFFF, 0x000000},
                               Shade{Role::field, 0xFFFFFF, 0x10151A, 0xFFFFFF, 0x000000},
                               Shade{Role::wrong, 0xA3200F, 0xFF8F7A, 0x000000, 0xFF9C8A},
                               Shade{Role::wrongGround, 0xFBEAE4, 0x3A211D, 0xFFFFFF, 0x4A0A00},
                               Shade{Role::focus, 0x0B6E8A, 0x5CC6E0, 0x000000, 0xFFE14D},
                               Shade{Role::selection, 0xD5E6EA, 0x1F4450, 0xE2E2E2, 0x004C78},
                               Shade{Role::safeGround, 0xD6E9DF, 0x1F3A31, 0xFFFFFF, 0x003A24},
                               Shade{Role::safeEdge, 0x2E7D68, 0x58A98E, 0x000000, 0x5CE0A8},
                               Shade{Role::utilised50, 0xD8E3E2, 0x2E3A3F, 0xDEDEDE, 0x283233},
                               Shade{Role::utilised80, 0x93A7AD, 0x546E73, 0xA3A3A3, 0x596D71},
                               Shade{Role::utilised95, 0x526F7B, 0x7DA7AC, 0x6B6B6B, 0x8EAFB6},
                               Shade{Role::utilised100, 0x0B3C4C, 0xA8E4E8, 0x373737, 0xC8F6FF}};

constexpr bool inOrder() {
  for (std::size_t i = 0; i < shades.size(); ++i)
    if (static_cast<std::size_t>(shades[i].role) != i)
      return false;
  return true;
}
static_assert(inOrder(), "the table is indexed by role");

} // namespace

Colour colourOf(Role role, Palette palette) {
  const Shade& shade = shades[static_cast<std::size_t>(role)];
  switch (palette) {
  case Palette::light:
    return {shade.light};
  case Palette::dark:
    return {shade.dark};
  case Palette::paper:
    return {role == Role::canvas || role == Role::window ? 0xFFFFFF : shade.light};
  case Palette::contrast:
    return {shade.contrast};
  case Palette::mono:
    break;
  }
  return {shade.mono};
}

} // namespace planewright
