// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/files/field_file.h"

#include "ui/files/file_aside.h"
#include "ui/files/file_bytes.h"
#include "ui/files/file_pieces.h"

#include <unistd.h>

namespace planewright {

namespace {

using Why = UnreadField::Why;

tl::unexpected<UnreadField> unread(Why why, Problems problems, const std::string& path) {
  if (why == Why::refused)
    for (Problem& problem : problems)
      problem.place = path;
  return tl::unexpected(UnreadField{why, std::move(problems)});
}

} // namespace

tl::expected<FieldReading, UnreadField> fieldIn(const std::string& path, const Study& study,
                                                const ScreenPlan& plan,
                                                const std::vector<MappedHeading>& headings,
                                                const Watch& watch) {
  Result<FilePieces> file = FilePieces::of(path);
  if (!file)
    return unread(Why::unreadable, {std::move(file).error()}, path);
  FieldReader reader(study, plan.acts, headings);
  for (std::size_t done = 0;;) {
    const auto goesOn = [&] { return watch(done, file->size()); };
    const Result<std::string_view> piece = file->next(goesOn);
    if (!piece)
      return unread(Why::unreadable, {piece.error()}, path);
    done += piece->size();
    if (!goesOn())
      return unread(Why::ended, {}, path);
    if (piece->empty())
      break;
    if (Results<void> taken = reader.take(*piece); !taken)
      return unread(Why::refused, std::move(taken).error(), path);
  }
  Results<FieldReading> reading = reader.finish();
  if (!reading)
    return unread(Why::refused, std::move(reading).error(), path);
  if (reading->rows == 0)
    return unread(Why::refused,
                  {{path, 0, 0, "", PW_TEXT("Command", "The table has a header and no row."),
                    PW_TEXT("Command", "Give it a row for each point.")}},
                  path);
  return *std::move(reading);
}

Result<bool> writeField(const std::string& path, const std::function<bool(const Sink&)>& write,
                        const std::function<bool()>& goesOn) {
  Result<void> written;
  const auto into = [&](const auto& put) {
    return write([&](std::string_view bytes) {
      written = put(bytes);
      return written && goesOn();
    });
  };
  if (path == "-") {
    const bool isWhole =
        into([](std::string_view bytes) { return writeTo(STDOUT_FILENO, bytes, "standard output"); });
    return written ? Result<bool>(isWhole) : tl::unexpected(std::move(written).error());
  }
  Result<FileAside> file = FileAside::to(path);
  if (!file)
    return tl::unexpected(std::move(file).error());
  const bool isWhole = into([&](std::string_view bytes) { return file->write(bytes); });
  if (written && isWhole)
    written = file->finish();
  return written ? Result<bool>(isWhole) : tl::unexpected(std::move(written).error());
}

} // namespace planewright
