// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/look/steady_label.h"

#include <QCoreApplication>
#include <QLabel>
#include <QVBoxLayout>

#include <gtest/gtest.h>

namespace planewright {
namespace {

/// Counts how often it is laid out.
struct Neighbours : QWidget {
  bool event(QEvent* event) override {
    layouts += event->type() == QEvent::LayoutRequest;
    return QWidget::event(event);
  }
  int layouts = 0;
};

class SteadyLabelTest : public testing::Test {
protected:
  SteadyLabelTest()
      : m_label(new SteadyLabel(&m_around)), m_below(new QLabel(QStringLiteral("below"), &m_around)) {
    auto* rows = new QVBoxLayout(&m_around);
    rows->addWidget(m_label);
    rows->addWidget(m_below);
    rows->addStretch();
    m_label->setText(QStringLiteral("Utilisation grows by 0.07."));
    m_around.resize(260, 300);
    m_around.show();
    QCoreApplication::sendPostedEvents();
    m_around.layouts = 0;
  }

  int below() const { return m_below->y(); }

  Neighbours m_around;
  SteadyLabel* m_label;
  QLabel* m_below;
};

TEST_F(SteadyLabelTest, movesNothingForATextOfTheSameHeight) {
  const int before = below();
  m_label->setText(QStringLiteral("Utilisation grows by 0.0712."));
  QCoreApplication::sendPostedEvents();
  EXPECT_EQ(m_around.layouts, 0);
  EXPECT_EQ(below(), before);
  EXPECT_EQ(m_label->label().text(), QStringLiteral("Utilisation grows by 0.0712."));
}

TEST_F(SteadyLabelTest, takesRoomForLinesAndGivesItBack) {
  const int before = below();
  m_label->setText(QStringLiteral("one<br>two<br>three"));
  QCoreApplication::sendPostedEvents();
  EXPECT_GT(m_around.layouts, 0);
  EXPECT_GT(below(), before);
  EXPECT_GE(m_label->height(), m_label->label().heightForWidth(m_label->width()));
  EXPECT_EQ(m_label->label().size(), m_label->size());
  m_label->setText(QStringLiteral("one"));
  QCoreApplication::sendPostedEvents();
  EXPECT_EQ(below(), before);
}

} // namespace
} // namespace planewright
