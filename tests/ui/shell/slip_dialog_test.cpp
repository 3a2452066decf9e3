// SPDX-License-Identifier: GPL-3.0-or-later
#include "shell_test.h"
#include "ui/entry/draft_edit.h"
#include "ui/shell/slip_dialog.h"

#include <QComboBox>
#include <QTest>

namespace planewright {
namespace {

class SlipDialogTest : public ShellTest {
protected:
  SlipDialogTest() {
    type(m_desk, Spot::sx, "80 MPa");
    type(m_desk, Spot::sy, "20 MPa");
    type(m_desk, Spot::txy, "-30 MPa");
    type(m_desk, Spot::reading, "25 deg");
  }
  void ask(const char* number) {
    m_dialog.number().selectAll();
    QTest::keyClicks(&m_dialog.number(), number);
  }

  Desk m_desk{newStudy()};
  SlipDialog m_dialog{m_desk, nullptr};
};

TEST_F(SlipDialogTest, saysThatANumberAgreesOrWhichSlipMakesIt) {
  EXPECT_TRUE(m_dialog.answer().startsWith("Type the number"));
  ask("46.30");
  EXPECT_EQ(m_dialog.answer(), "Agrees with this study: 46.30 MPa.");
  ask("53.70");
  EXPECT_EQ(m_dialog.answer(),
            QString::fromUtf8("In this study it is 46.30 MPa. The other number comes out with:\n"
                              "  •  the angle of the cut taken for that of its normal"));
  ask("12.345");
  EXPECT_TRUE(m_dialog.answer().contains("No slip that this program knows"));
}

TEST_F(SlipDialogTest, followsTheStudyAndTheQuestion) {
  ask("46.30");
  type(m_desk, Spot::reading, "30 deg");
  EXPECT_FALSE(m_dialog.answer().startsWith("Agrees"));
  m_dialog.question().setFocus();
  QTest::keyClick(&m_dialog.question(), Qt::Key_Down);
  ask("-40.98");
  EXPECT_EQ(m_dialog.answer(), QString::fromUtf8("Agrees with this study: −40.98 MPa."));
}

TEST_F(SlipDialogTest, aNumberThatDoesNotReadIsRefusedInPlace) {
  ask("12 kN");
  EXPECT_TRUE(m_dialog.number().isWrong());
  EXPECT_TRUE(m_dialog.answer().isEmpty());
  ask("46.30");
  EXPECT_FALSE(m_dialog.number().isWrong());
}

} // namespace
} // namespace planewright
