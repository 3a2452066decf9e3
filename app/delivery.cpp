// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/delivery.h"

#include "ui/files/file_bytes.h"

#include <unistd.h>

namespace planewright {

Result<std::string> outputOf(const Arguments& arguments) {
  const std::string* file = arguments.valueOf("-o");
  if (!file)
    return "-";
  if (*file != "-" && !arguments.operands.empty() && isSameFile(*file, arguments.operands.front()))
    return tl::unexpected(Problem{"-o", 0, 0, *file,
                                  PW_TEXT("Command", "“%1” is the study itself.").with(*file),
                                  PW_TEXT("Command", "Give the output another name.")});
  return *file;
}

Outcome<void> delivered(const Delivery& delivery) {
  const Result<void> written = delivery.file == "-"
                                   ? writeTo(STDOUT_FILENO, delivery.bytes, "standard output")
                                   : writeAside(delivery.file, delivery.bytes);
  if (!written)
    return machineFailed(written.error());
  return {};
}

} // namespace planewright
