// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/record/json_writer.h"
#include "core/record/object_reader.h"
#include "core/study/material.h"

namespace planewright {

/// A material as an object of a list of materials, in a study and in a library.
void read(const Json& json, Reading& reading, Material& material);
void put(JsonWriter& json, const Material& material);

} // namespace planewright
