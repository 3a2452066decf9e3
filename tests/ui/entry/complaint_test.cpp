// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/complaint.h"

#include "core/study/edit.h"
#include "core/study/text_fields.h"
#include "ui/look/font.h"
#include "ui/look/look.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

TEST(Complaint, eachSentenceHasItsLineWhereBothFit) {
  EXPECT_EQ(complaintLines("Too long.", "Write less.", programFont(13), 200),
            (QStringList{"Too long.", "Write less."}));
  EXPECT_EQ(complaintLines("Too long.", "", programFont(13), 200), QStringList{"Too long."});
}

TEST(Complaint, neverTakesMoreThanThreeLines) {
  const QString what = "“12 kN” is a force and cannot stand where a stress is needed by this field.";
  const QString mend = "Divide it by an area.";
  const QFont font = programFont(13);
  for (int width = 90; width <= 400; width += 10) {
    const QStringList lines = complaintLines(what, mend, font, width);
    EXPECT_LE(lines.size(), 3) << width;
    for (const QString& line : lines)
      EXPECT_LE(QFontMetrics(font).horizontalAdvance(line), width) << line.toStdString();
  }
}

TEST(Complaint, aStrengthThatIsNotPositiveIsRefusedInSentencesThatFitTheirField) {
  Study study = newStudy();
  study.materials = {Material{}};
  study.materials[0].name = "C24";
  for (const StrengthKey key : keysOf(MaterialKind::timber)) {
    const Result<Study> after = edited(study, Edits{Type{{spotOf(key), "C24", {}}, "-1 MPa"}});
    ASSERT_FALSE(after);
    const QStringList lines =
        complaintLines(shown(after.error().what), shown(after.error().mend), programFont(13), 270);
    EXPECT_FALSE(lines.join(' ').contains("…")) << lines.join('|').toStdString();
  }
}

TEST(Complaint, theMendStaysWhole) {
  const QString what = QString(4000, 'x') + " does not read.";
  const QStringList lines = complaintLines(what, "Write 1.5.", programFont(13), 200);
  EXPECT_TRUE(lines.join(' ').endsWith("Write 1.5.")) << lines.join('|').toStdString();
  EXPECT_TRUE(lines.join(' ').contains("…"));
}

} // namespace
} // namespace planewright
