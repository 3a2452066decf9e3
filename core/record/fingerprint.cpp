// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/fingerprint.h"

#include "core/record/study_file.h"

#include <algorithm>
#include <array>
#include <nettle/sha2.h>

namespace planewright {

namespace {

constexpr std::size_t shownBytes = 8;

std::array<std::uint8_t, SHA256_DIGEST_SIZE> sha256Of(std::string_view bytes) {
  sha256_ctx context;
  sha256_init(&context);
  sha256_update(&context, bytes.size(), reinterpret_cast<const std::uint8_t*>(bytes.data()));
  std::array<std::uint8_t, SHA256_DIGEST_SIZE> digest{};
  sha256_digest(&context, digest.size(), digest.data());
  return digest;
}

Signing signingOf(const std::string& name, const std::string& state, const std::string& fingerprint) {
  if (name.empty())
    return Signing::open;
  if (state.empty())
    return Signing::unbound;
  return state == fingerprint ? Signing::bound : Signing::changed;
}

bool types(const Edits& edits, Spot spot) {
  return std::ranges::any_of(edits, [spot](const Edit& edit) {
    const auto* type = std::get_if<Type>(&edit);
    return type && type->place.spot == spot;
  });
}

} // namespace

std::string fingerprintOf(const Study& study) {
  Study told = study;
  told.shown = {};
  for (std::string Title::*text :
       {&Title::prepared, &Title::preparedFor, &Title::checked, &Title::checkedFor})
    (told.title.*text).clear();
  constexpr std::string_view hex = "0123456789abcdef";
  const auto digest = sha256Of(writeStudy(told));
  std::string result;
  for (std::size_t i = 0; i < shownBytes; ++i) {
    if (i > 0 && i % 2 == 0)
      result += ' ';
    result += hex[digest[i] >> 4];
    result += hex[digest[i] & 0xF];
  }
  return result;
}

Signings signingsOf(const Study& study) {
  const Title& title = study.title;
  if (title.prepared.empty() && title.checked.empty())
    return {};
  const std::string fingerprint = fingerprintOf(study);
  return {signingOf(title.prepared, title.preparedFor, fingerprint),
          signingOf(title.checked, title.checkedFor, fingerprint)};
}

namespace {

Text shownName(const std::string& name, Signing signing, const Text& changed) {
  if (signing == Signing::changed)
    return changed.with(name);
  return signing == Signing::unbound ? PW_TEXT("Signing", "%1, for an unknown state").with(name)
                                     : verbatim(name);
}

} // namespace

Text shownPrepared(const Study& study) {
  return shownName(study.title.prepared, signingsOf(study).prepared,
                   PW_TEXT("Signing", "%1, changed since prepared"));
}

Text shownChecked(const Study& study) {
  return shownName(study.title.checked, signingsOf(study).checked,
                   PW_TEXT("Signing", "%1, changed since checked"));
}

Result<Study> editedAndSigned(const Study& study, const Edits& edits) {
  Result<Study> after = edited(study, edits);
  if (!after)
    return after;
  Title& title = after->title;
  const auto bind = [&](Spot spot, const std::string& name, std::string& state) {
    if (types(edits, spot))
      state = name.empty() ? std::string() : fingerprintOf(*after);
  };
  bind(Spot::titlePrepared, title.prepared, title.preparedFor);
  bind(Spot::titleChecked, title.checked, title.checkedFor);
  return after;
}

} // namespace planewright
