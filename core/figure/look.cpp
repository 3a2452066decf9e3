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
};

// Contrast of the light and dark sets was computed with the WCAG formula; hush, grain, grid and rule are
// below 3:1 on purpose: nothing depends on them alone.
constexpr std::array shades = {Shade{Role::ink, 0x1C2529, 0xE6EBE9, 0x000000},
                               Shade{Role::soft, 0x4E5A60, 0xA9B4B6, 0x000000},
                               Shade{Role::state, 0x0B3C4C, 0xA8E4E8, 0x000000},
                               Shade{Role::reading, 0xBC4108, 0xF6AF66, 0x000000},
                               Shade{Role::line, 0x5A3FC0, 0xAE93F6, 0x000000},
                               Shade{Role::limit, 0x75222B, 0xF8529F, 0x000000},
                               Shade{Role::other, 0x828684, 0x727978, 0x595959},
                               Shade{Role::hush, 0xC9CFCC, 0x3B4649, 0xBDBDBD},
                               Shade{Role::grain, 0xCFC8EC, 0x463F6B, 0xBDBDBD},
                               Shade{Role::grid, 0xE4E9E6, 0x262E32, 0xE2E2E2},
                               Shade{Role::rule, 0xC5CDCA, 0x3C474B, 0x000000},
                               Shade{Role::band, 0xE8E3F9, 0x332E52, 0xE2E2E2},
                               Shade{Role::canvas, 0xFBFCFA, 0x151A1D, 0xFFFFFF},
                               Shade{Role::window, 0xEDF0EE, 0x20272B, 0xFFFFFF},
                               Shade{Role::field, 0xFFFFFF, 0x10151A, 0xFFFFFF},
                               Shade{Role::wrong, 0xA3200F, 0xFF8F7A, 0x000000},
                               Shade{Role::wrongGround, 0xFBEAE4, 0x3A211D, 0xFFFFFF},
                               Shade{Role::focus, 0x0B6E8A, 0x5CC6E0, 0x000000},
                               Shade{Role::selection, 0xD5E6EA, 0x1F4450, 0xE2E2E2},
                               Shade{Role::safeGround, 0xD6E9DF, 0x1F3A31, 0xFFFFFF},
                               Shade{Role::safeEdge, 0x2E7D68, 0x58A98E, 0x000000},
                               Shade{Role::utilised50, 0xD8E3E2, 0x2E3A3F, 0xDEDEDE},
                               Shade{Role::utilised80, 0x93A7AD, 0x546E73, 0xA3A3A3},
                               Shade{Role::utilised95, 0x526F7B, 0x7DA7AC, 0x6B6B6B},
                               Shade{Role::utilised100, 0x0B3C4C, 0xA8E4E8, 0x373737}};

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
  case Palette::mono:
    break;
  }
  return {shade.mono};
}

} // namespace planewright
