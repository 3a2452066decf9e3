// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <cstdint>
#include <string_view>

namespace planewright {

/// The checksum of ISO 3309 that chunks of a PNG have: polynomial 04C11DB7, reflected.
std::uint32_t crc32(std::string_view bytes);

} // namespace planewright
