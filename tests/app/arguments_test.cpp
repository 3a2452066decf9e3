// SPDX-License-Identifier: GPL-3.0-or-later
#include "app/arguments.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <array>

namespace planewright {
namespace {

using Takes = OptionRow::Takes;
using Words = std::vector<std::string>;

constexpr std::array known = {OptionRow{"--sx"}, OptionRow{"--normal", Takes::manyValues},
                              OptionRow{"--mono", Takes::nothing}, OptionRow{"-o"}};

Result<Arguments> read(const Words& words, std::size_t mostOperands = 1) {
  return argumentsOf(words, known, mostOperands);
}

std::string faultOf(const Words& words) {
  const Result<Arguments> arguments = read(words);
  return arguments ? "none" : plain(arguments.error());
}

TEST(Arguments, takeAValueThatBeginsWithADashEitherWay) {
  EXPECT_EQ(*read({"--sx", "-30"})->valueOf("--sx"), "-30");
  EXPECT_EQ(*read({"--sx=-30"})->valueOf("--sx"), "-30");
  EXPECT_EQ(*read({"--sx=a=b"})->valueOf("--sx"), "a=b");
  EXPECT_EQ(*read({"-o", "-"})->valueOf("-o"), "-");
}

TEST(Arguments, keepTheOrderOfOptionsThatMayBeRepeated) {
  const Result<Arguments> arguments = read({"--normal", "1", "a.planewright", "--normal=2"});
  ASSERT_TRUE(arguments);
  EXPECT_EQ(arguments->operands, Words{"a.planewright"});
  ASSERT_EQ(arguments->options.size(), 2U);
  EXPECT_EQ(arguments->options[0].value, "1");
  EXPECT_EQ(arguments->options[1].value, "2");
}

TEST(Arguments, takeNoOptionForAValue) {
  for (const Words& words : {Words{"--sx", "--normal", "25"}, Words{"--sx=--normal"}, Words{"--sx"},
                             Words{"--sx", " "}, Words{"--sx="}, Words{"--sx", "--help"}})
    EXPECT_THAT(faultOf(words), testing::HasSubstr("The option --sx needs a value."));
}

TEST(Arguments, refuseWhatIsGivenTwice) {
  EXPECT_THAT(faultOf({"--sx", "1", "--sx", "2"}), testing::HasSubstr("The option --sx is given twice."));
  EXPECT_THAT(faultOf({"--sx=1", "--sx", "1"}), testing::HasSubstr("The option --sx is given twice."));
}

TEST(Arguments, refuseWhatIsUnknownAndNameWhatIsKnown) {
  EXPECT_THAT(faultOf({"--sigma", "1"}), testing::HasSubstr("There is no option --sigma here."));
  EXPECT_THAT(faultOf({"--sigma", "1"}), testing::HasSubstr("--sx --normal --mono -o"));
  EXPECT_THAT(faultOf({"-x"}), testing::HasSubstr("There is no option -x here."));
  EXPECT_THAT(faultOf({"--s", "1"}), testing::HasSubstr("There is no option --s here."));
  EXPECT_THAT(faultOf({"--mono=yes"}), testing::HasSubstr("The option --mono takes no value."));
}

TEST(Arguments, countOperands) {
  EXPECT_EQ(read({"-"})->operands, Words{"-"});
  EXPECT_EQ(read({"--", "--sx"})->operands, Words{"--sx"});
  EXPECT_THAT(faultOf({"a", "b"}), testing::HasSubstr("The word “b” is one too many."));
}

TEST(Arguments, noticeThatHelpIsAsked) {
  EXPECT_TRUE(read({"--help"})->helpAsked);
  EXPECT_FALSE(read({})->helpAsked);
}

} // namespace
} // namespace planewright
