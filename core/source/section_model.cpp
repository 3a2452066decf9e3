// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/section_model.h"

namespace planewright {

Results<SectionModel> modelOf(const Section& section) {
  Problems problems = problemsOf(section);
  if (!problems.empty())
    return tl::unexpected(std::move(problems));
  SectionModel model{section, {}, {}, {}};
  if (model.isTabled())
    return model;
  model.region = regionOf(section);
  model.transposed = transposed(model.region);
  model.properties = propertiesOf(model.region);
  model.isMirroredAboutY = isMirrored(model.region);
  model.isMirroredAboutZ = isMirrored(model.transposed);
  return model;
}

} // namespace planewright
