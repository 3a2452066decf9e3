// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/words/names.h"
#include "core/words/text.h"

#include <string>
#include <string_view>

namespace planewright {

/// What stands between whole and fraction in the numbers of printed outputs. What is typed, and what programs
/// read, has the point always.
enum class DecimalSign { point, comma };
template <>
const std::vector<Named<DecimalSign>>& namesOf<DecimalSign>();

/// As long as it lives, the numbers that this thread writes for people have the sign.
class WritesDecimals {
public:
  explicit WritesDecimals(DecimalSign sign);
  ~WritesDecimals();
  WritesDecimals(const WritesDecimals&) = delete;
  WritesDecimals& operator=(const WritesDecimals&) = delete;

private:
  DecimalSign m_before;
};

/// A number for people, written with the point, as this thread writes it now.
std::string withDecimalSign(std::string number);

/// A number within a Text that is kept: `written` with the point, shown as the thread that shows it writes
/// numbers.
Text numberText(std::string_view written);
/// The context of such Texts, which no translator sees.
inline constexpr std::string_view numberContext = "Number";

} // namespace planewright
