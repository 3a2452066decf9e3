// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/embedded_study.h"

#include "core/record/base64.h"
#include "core/record/crc32.h"
#include "core/record/study_file.h"
#include "tests/support/study_gen.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <functional>

namespace planewright {
namespace {

using testing::AnyOf;
using testing::HasSubstr;
using testing::StartsWith;

/// One white pixel.
const std::string smallPng("\x89PNG\r\n\x1A\n\0\0\0\rIHDR\0\0\0\1\0\0\0\1\x08\0\0\0\0\x3A\x7E\x9B\x55"
                           "\0\0\0\nIDAT\x78\x9C\x63\xF8\x0F\0\1\1\1\0\x1B\xB6\xEE\x56"
                           "\0\0\0\0IEND\xAE\x42\x60\x82",
                           67);
const std::string smallSvg =
    "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<svg xmlns=\"http://www.w3.org/2000/"
    "svg\" width=\"9mm\">\n<title>“planewright-study” &lt;b&gt;</title>\n</svg>\n";
const std::string smallHtml = "<!DOCTYPE html>\n<html><head><title>application/x-planewright+json</title>"
                              "</head><body><p>planewright-study</p></body></html>\n";

std::string pdfAround(const std::string& xmp) {
  return "%PDF-1.4\n1 0 obj\n<< /Type /Metadata >>\nstream\n" + xmp + "\nendstream\nendobj\n%%EOF\n";
}

struct Carrier {
  const char* name;
  std::string without;
  std::function<Result<std::string>(std::string_view study)> with;
};

const std::vector<Carrier>& carriers() {
  static const std::vector<Carrier> all = {
      {"svg", smallSvg, [](std::string_view study) { return svgWithStudy(smallSvg, study); }},
      {"png", smallPng, [](std::string_view study) { return pngWithStudy(smallPng, study); }},
      {"pdf", pdfAround(""), [](std::string_view study) { return xmpWithStudy(study).map(pdfAround); }},
      {"html", smallHtml, [](std::string_view study) { return htmlWithStudy(smallHtml, study); }}};
  return all;
}

/// The study that is carried, or why there is none.
std::string found(std::string_view bytes) {
  const auto study = carriedStudy(bytes);
  return study ? *study ? **study : plain(study->error()) : "no carrier";
}

std::string replaced(std::string text, const std::string& old, const std::string& with) {
  const std::size_t at = text.find(old);
  EXPECT_NE(at, std::string::npos) << old;
  return at == std::string::npos ? text : text.replace(at, old.size(), with);
}

TEST(Crc32, hasThePublishedCheckValue) {
  EXPECT_EQ(crc32("123456789"), 0xCBF43926u); // ISO 3309 and ITU-T V.42, as commonly printed
  EXPECT_EQ(crc32(""), 0u);
  EXPECT_EQ(crc32("IEND"), 0xAE426082u); // every PNG ends with it
}

TEST(Base64, hasTheValuesOfItsStandard) {
  // RFC 4648, section 10.
  for (const auto& [bytes, text] : {std::pair{"", ""},
                                    {"f", "Zg=="},
                                    {"fo", "Zm8="},
                                    {"foo", "Zm9v"},
                                    {"foob", "Zm9vYg=="},
                                    {"fooba", "Zm9vYmE="},
                                    {"foobar", "Zm9vYmFy"}}) {
    const std::string line = *text ? std::string(text) + "\n" : std::string();
    EXPECT_EQ(base64Lines(bytes), line);
    EXPECT_EQ(bytesOfBase64(line), bytes);
    EXPECT_EQ(bytesOfBase64(text).value().size(), std::string(bytes).size());
  }
}

TEST(Base64, refusesEveryOtherText) {
  for (const char* text :
       {"Z", "Zg", "Zg=", "Zh==", "Zm9=", "Zm9v=", "====", "Zg==Zg==", "Zm9v!", "Z-9v", "=", "Zm9vYg==="})
    EXPECT_EQ(bytesOfBase64(text), std::nullopt) << text;
}

RC_GTEST_PROP(Base64, readsBackWhatItWroteInLinesOf76, (const std::string& bytes)) {
  const std::string text = base64Lines(bytes);
  RC_ASSERT(bytesOfBase64(text) == bytes);
  std::size_t start = 0;
  for (std::size_t end; (end = text.find('\n', start)) != std::string::npos; start = end + 1)
    RC_ASSERT(end - start == 76 || (end - start < 76 && end + 1 == text.size()));
  RC_ASSERT(start == text.size());
}

TEST(EmbeddedStudy, comesBackByteForByteFromEveryKindOfFile) {
  for (const Carrier& carrier : carriers())
    for (const std::string& study : {std::string(), std::string("x"), writeStudy(newStudy()),
                                     std::string("\0\xFF<&>]]>-->\"'", 13), std::string(100000, '<')}) {
      const Result<std::string> bytes = carrier.with(study);
      ASSERT_TRUE(bytes) << carrier.name;
      EXPECT_EQ(found(*bytes), study) << carrier.name;
    }
}

RC_GTEST_PROP(EmbeddedStudy, isTheStudyThatWasPutIn, ()) {
  const Study study = *anyStudy();
  for (const Carrier& carrier : carriers()) {
    const Results<OpenedStudy> opened = openedStudy(carrier.with(writeStudy(study)).value());
    RC_ASSERT(opened);
    RC_ASSERT(opened->study == study);
    RC_ASSERT(opened->isRestored);
  }
}

TEST(EmbeddedStudy, aStudyFileIsReadAsItself) {
  EXPECT_EQ(carriedStudy(writeStudy(newStudy())), std::nullopt);
  const Results<OpenedStudy> opened = openedStudy(writeStudy(newStudy()));
  ASSERT_TRUE(opened);
  EXPECT_FALSE(opened->isRestored);
  const Results<OpenedStudy> bad = openedStudy("{\"format\":\"planewright-study\",\n\"version\":1,\"a\":1}");
  ASSERT_FALSE(bad);
  EXPECT_EQ(bad.error().front().line, 2);
}

TEST(EmbeddedStudy, aFileWithoutOneSaysSo) {
  for (const Carrier& carrier : carriers())
    EXPECT_THAT(found(carrier.without), StartsWith("This file carries no study.")) << carrier.name;
}

TEST(EmbeddedStudy, anotherKindOfFileIsNoCarrier) {
  for (const char* bytes :
       {"", " ", "{", "[<", "GIF89a", "\xFF\xD8\xFF\xE0", "%PD", "\x89PN", "\xEF\xBB\xBF"})
    EXPECT_EQ(found(bytes), "no carrier") << bytes;
}

// Wherever a file is cut, the whole study comes back or none, and why not is said.
TEST(EmbeddedStudy, isWholeOrCutOffWhereverTheFileIsCut) {
  for (const Carrier& carrier : carriers()) {
    const std::string bytes = carrier.with("a small study").value();
    for (std::size_t length = 0; length < bytes.size(); ++length) {
      const std::string result = found(std::string_view(bytes).substr(0, length));
      EXPECT_TRUE(result == "a small study" || result == "no carrier" ||
                  result.starts_with("This file is cut off") ||
                  result.starts_with("This file carries no study."))
          << carrier.name << " cut to " << length << ": " << result;
    }
  }
}

TEST(EmbeddedStudy, noChangedCharacterOfItPassesUnseen) {
  for (const Carrier& carrier : carriers()) {
    const std::string bytes = carrier.with("a small study, 25 bytes..").value();
    const std::size_t start = bytes.find("1 25 ");
    ASSERT_NE(start, std::string::npos);
    const std::size_t end = bytes.find('=', start);
    for (std::size_t at = start; at < end; ++at)
      for (const char c : {'A', '7', '/', '<', '\0', '-'}) {
        std::string changed = bytes;
        changed[at] = c;
        if (changed == bytes)
          continue;
        EXPECT_THAT(found(changed), AnyOf(StartsWith("This file is cut"), StartsWith("The study in")))
            << carrier.name << " at " << at - start;
      }
  }
}

TEST(EmbeddedStudy, saysWhatIsWrongWithIt) {
  const std::string svg = svgWithStudy(smallSvg, "a small study").value();
  EXPECT_THAT(found(replaced(svg, "YSBz", "YSBt")), StartsWith("The study inside this file was changed"));
  EXPECT_THAT(found(replaced(svg, "YSBz", "YS")), StartsWith("This file is cut off"));
  EXPECT_THAT(found(replaced(svg, ">1 13 ", ">2 13 ")), HasSubstr("in form 2; this program reads form 1"));
  EXPECT_THAT(found(replaced(svg, ">1 13 ", ">1 14 ")), HasSubstr("was changed"));
  EXPECT_THAT(found(replaced(svg, ">1 13 ", ">1 99999999999999999999 ")), HasSubstr("was changed"));
  EXPECT_THAT(found(replaced(svg, ">1 13 ", ">1 16777217 ")), HasSubstr("was changed"));
  EXPECT_THAT(found(replaced(svg, ">1 13 ", ">1 -13 ")), HasSubstr("was changed"));
  EXPECT_THAT(found(replaced(svg, ">1 13 ", ">0 13 ")), HasSubstr("was changed"));
}

TEST(EmbeddedStudy, isFoundAfterAnotherProgramWroteTheMarkupAnew) {
  const std::string svg = svgWithStudy(smallSvg, "a small study").value();
  for (const auto& [old, with] :
       {std::pair{"<planewright-study xmlns=\"urn:planewright:study\">",
                  "<ns0:planewright-study\n  id='m1'\n  xmlns:ns0='urn:planewright:study'  >\r\n   "},
        {"</planewright-study>", "\r\n\t</planewright-study >"},
        {"YSBz", "YS\r\n    Bz"},
        {"<?xml version=\"1.0\" encoding=\"UTF-8\"?>", "\xEF\xBB\xBF\r\n<!-- made anew -->"}})
    EXPECT_EQ(found(replaced(svg, old, with)), "a small study") << with;
}

TEST(EmbeddedStudy, wordsOfAUserAreNotTakenForIt) {
  for (const char* title :
       {"planewright-study 1 3 00000000 AAAA", "&lt;planewright-study&gt;1 3", "x:planewright-study>1 3",
        "&lt;script application/x-planewright+json>", "urn:planewright:study"}) {
    const std::string svg = replaced(smallSvg, "“planewright-study”", title);
    EXPECT_THAT(found(svg), StartsWith("This file carries no study.")) << title;
    EXPECT_EQ(found(svgWithStudy(svg, "a small study").value()), "a small study") << title;
  }
}

TEST(EmbeddedStudy, copiesCountAsOneAndTwoStudiesAreRefused) {
  for (const Carrier& carrier : carriers()) {
    if (carrier.name == std::string("png"))
      continue;
    const std::string one = carrier.with("first").value();
    EXPECT_EQ(found(one + one), "first") << carrier.name;
    EXPECT_THAT(found(one + carrier.with("second").value()),
                StartsWith("This file carries more than one study."))
        << carrier.name;
  }
  const std::string one = pngWithStudy(smallPng, "first").value();
  EXPECT_EQ(found(pngWithStudy(one, "first").value()), "first");
  EXPECT_THAT(found(pngWithStudy(one, "second").value()), StartsWith("This file carries more than one"));
}

std::string chunk(const std::string& type, const std::string& data) {
  const auto number = [](std::uint32_t value) {
    std::string bytes;
    for (const int shift : {24, 16, 8, 0})
      bytes += static_cast<char>(value >> shift);
    return bytes;
  };
  return number(static_cast<std::uint32_t>(data.size())) + type + data + number(crc32(type + data));
}

std::string pngWithChunk(const std::string& type, const std::string& data) {
  std::string png = smallPng;
  return png.insert(png.size() - 12, chunk(type, data));
}

TEST(EmbeddedStudy, isFoundInEveryUnpackedChunkOfText) {
  const std::string carried = "1 13 20424673\nYSBzbWFsbCBzdHVkeQ==";
  const std::string key = "planewright-study";
  ASSERT_THAT(pngWithStudy(smallPng, "a small study").value(), HasSubstr(carried));
  const auto null = [](const char* text) { return std::string(text) + '\0'; };
  EXPECT_EQ(found(pngWithChunk("tEXt", key + '\0' + carried)), "a small study");
  EXPECT_EQ(found(pngWithChunk("iTXt", key + std::string("\0\0\0", 3) + null("en") + null("kw") + carried)),
            "a small study");
  EXPECT_THAT(found(pngWithChunk("iTXt", key + std::string("\0\1\0\0\0", 5) + carried)),
              HasSubstr("changed"));
  EXPECT_THAT(found(pngWithChunk("zTXt", key + std::string("\0\0", 2) + carried)), HasSubstr("was changed"));
  EXPECT_THAT(found(pngWithChunk("iTXt", key)), HasSubstr("was changed"));
  EXPECT_THAT(found(pngWithChunk("iTXt", key + std::string("\0\0", 2))), HasSubstr("is cut off"));
  EXPECT_THAT(found(pngWithChunk("tEXt", key)), HasSubstr("is cut off"));
  EXPECT_THAT(found(pngWithChunk("tEXt", "Title" + std::string(1, '\0') + carried)), HasSubstr("no study"));
  EXPECT_THAT(found(pngWithChunk("prIv", key + '\0' + carried)), HasSubstr("no study"));
}

TEST(EmbeddedStudy, theChunkOfAPngHasItsChecksum) {
  const std::string png = pngWithStudy(smallPng, "a small study").value();
  EXPECT_EQ(png, pngWithChunk("tEXt", "planewright-study" + std::string(1, '\0') +
                                          "1 13 20424673\nYSBzbWFsbCBzdHVkeQ==\n"));
}

TEST(EmbeddedStudy, aPngSentAsTextIsToldAsChanged) {
  EXPECT_THAT(found(replaced(smallPng, "\r\n\x1A\n", "\n\x1A\n")), HasSubstr("was changed"));
}

TEST(EmbeddedStudy, hugeLengthsCostNothing) {
  const std::string png = pngWithStudy(smallPng, "a small study").value();
  for (const std::string& length :
       {std::string("\xFF\xFF\xFF\xFF"), std::string("\x7F\xFF\xFF\xFF"), std::string("\0\1\0\0", 4)}) {
    std::string changed = png;
    changed.replace(33, 4, length); // of the second chunk
    EXPECT_THAT(found(changed), HasSubstr("is cut off"));
  }
}

TEST(EmbeddedStudy, isRefusedWhereItOrItsFileIsLargerThanIsRead) {
  const std::string large(greatestStudyFile, ' ');
  EXPECT_EQ(found(svgWithStudy(smallSvg, large).value()), large);
  for (const Carrier& carrier : carriers()) {
    const Result<std::string> refused = carrier.with(large + ' ');
    ASSERT_FALSE(refused) << carrier.name;
    EXPECT_THAT(plain(refused.error()), HasSubstr("too large"));
  }
  std::string file = smallSvg;
  file.resize(greatestCarrier + 1, ' ');
  EXPECT_THAT(found(file), HasSubstr("too large"));
  file.pop_back();
  EXPECT_THAT(found(file), HasSubstr("no study"));
}

TEST(EmbeddedStudy, problemsOfItSpeakOfItsPlaceAndNotOfALine) {
  const std::string bytes = replaced(writeStudy(newStudy()), "\"version\": 1", "\"version\": 2");
  const Results<OpenedStudy> opened = openedStudy(svgWithStudy(smallSvg, bytes).value());
  ASSERT_FALSE(opened);
  EXPECT_THAT(plain(opened.error().front()), StartsWith("version: This file has version 2"));
}

} // namespace
} // namespace planewright
