// SPDX-License-Identifier: GPL-3.0-or-later
#include "field_rig.h"

#include "ui/look/look.h"
#include "ui/screen/field_map_view.h"

#include <QSignalSpy>
#include <QTabWidget>
#include <QWheelEvent>

namespace planewright {
namespace {

class FieldMapPage : public FieldRig {
protected:
  void screenMesh() {
    m_dialog.setup().except().setText("n33");
    screen(mesh());
    drawn();
  }
  FieldMapView& map() { return page().map(); }
  void drawn() {
    ASSERT_TRUE(QTest::qWaitFor([&] { return map().isDrawn(); }, 10000));
  }
  void arranged(const std::function<void()>& act) {
    QSignalSpy spy(&page(), &FieldPage::arranged);
    act();
    ASSERT_TRUE(spy.wait(10000));
    drawn();
  }
  std::uint32_t current() { return model().pointAt(page().table().currentIndex().row()); }
  void click(QPointF at) { QTest::mouseClick(&map(), Qt::LeftButton, {}, at.toPoint()); }
  void wheel(QPointF at, int notches) {
    QWheelEvent event(at, map().mapToGlobal(at), {}, {0, 120 * notches}, Qt::NoButton, Qt::NoModifier,
                      Qt::NoScrollPhase, false);
    QApplication::sendEvent(&map(), &event);
  }
  /// How many pixels of a role lie around a point of the mesh.
  int pixelsOf(Role role, std::uint32_t point) {
    const QColor colour = lookOf(map()).colour(role);
    const QImage image = map().grab().toImage();
    const QPoint at = map().placeOf(point).toPoint();
    int found = 0;
    for (int y = at.y() - 4; y <= at.y() + 4; ++y)
      for (int x = at.x() - 4; x <= at.x() + 4; ++x)
        found += image.valid(x, y) && image.pixelColor(x, y) == colour;
    return found;
  }
};

TEST_F(FieldMapPage, coloursPointsByTheirClassOfUtilisation) {
  screenMesh();
  EXPECT_TRUE(page().views().isTabVisible(0));
  EXPECT_EQ(page().views().currentIndex(), 0);
  page().table().setCurrentIndex({}); // its ring would lie over some
  for (const std::uint32_t point : {120U, 0U, 299U, 214U, 219U}) {
    const double utilisation = model().field()->results.utilisations()[point];
    Role role = Role::limit;
    if (utilisation <= 1)
      role = utilisation <= 0.5    ? Role::utilised50
             : utilisation <= 0.8  ? Role::utilised80
             : utilisation <= 0.95 ? Role::utilised95
                                   : Role::utilised100;
    EXPECT_GT(pixelsOf(role, point), 30) << "n" << point << " at " << utilisation;
  }
  EXPECT_GT(pixelsOf(Role::other, 33), 10); // not judged
  EXPECT_GT(model().field()->summary.exceeding, 10U);
}

TEST_F(FieldMapPage, aClickMakesThePointTheCurrentRow) {
  screenMesh();
  for (const std::uint32_t point : {0U, 29U, 33U, 150U, 299U}) {
    click(map().placeOf(point));
    EXPECT_EQ(current(), point);
    EXPECT_TRUE(page().table().selectionModel()->isRowSelected(page().table().currentIndex().row()));
  }
  click({2, 2});
  EXPECT_EQ(current(), 299U);
  QSignalSpy opened(&m_dialog, &ScreenDialog::opened);
  page().open().click();
  EXPECT_EQ(m_desk.readout().point, "n299");
}

TEST_F(FieldMapPage, theCurrentRowHasARing) {
  screenMesh();
  page().table().setCurrentIndex(model().index(*model().rowOf(150), 0));
  const QImage ringed = map().grab().toImage();
  const QPoint at = map().placeOf(150).toPoint();
  EXPECT_EQ(ringed.pixelColor(at - QPoint(9, 0)), lookOf(map()).colour(Role::reading));
  page().table().setCurrentIndex(model().index(*model().rowOf(17), 0)); // it has no place
  EXPECT_NE(map().grab().toImage().pixelColor(at - QPoint(9, 0)), lookOf(map()).colour(Role::reading));
}

TEST_F(FieldMapPage, whatAFilterKeepsBackStaysPaleAndIsNotPicked) {
  screenMesh();
  EXPECT_EQ(pixelsOf(Role::hush, 120), 0);
  arranged([&] { page().exceedsOnly().click(); });
  EXPECT_GT(pixelsOf(Role::hush, 120), 10);
  const std::uint32_t before = current();
  click(map().placeOf(120));
  EXPECT_EQ(current(), before);
  click(map().placeOf(299));
  EXPECT_EQ(current(), 299U);
  // A filter that lets nothing through leaves the outline.
  arranged([&] { QTest::keyClicks(&page().from(), "99"); });
  EXPECT_EQ(model().rowCount(), 0);
  EXPECT_GT(pixelsOf(Role::hush, 299), 10);
}

TEST_F(FieldMapPage, zoomsAboutThePointerAndShowsAllAgain) {
  screenMesh();
  const QPointF all = map().placeOf(0);
  const QPointF kept = map().placeOf(150);
  wheel(kept, 5);
  EXPECT_LT((map().placeOf(150) - kept).manhattanLength(), 0.01);
  EXPECT_GT((map().placeOf(0) - kept).manhattanLength(), 2 * (all - kept).manhattanLength());
  drawn();
  click(map().placeOf(151));
  EXPECT_EQ(current(), 151U);
  QTest::keyClick(&map(), Qt::Key_Home);
  EXPECT_EQ(map().placeOf(0), all);
  wheel(kept, -3); // not smaller than all
  EXPECT_EQ(map().placeOf(0), all);
}

TEST_F(FieldMapPage, aDragMovesItAndPicksNothing) {
  screenMesh();
  const std::uint32_t before = current();
  for (int i = 0; i < 8; ++i)
    QTest::keyClick(&map(), Qt::Key_Plus);
  const QPoint from = map().placeOf(150).toPoint();
  const QPointF place = map().placeOf(150);
  QTest::mousePress(&map(), Qt::LeftButton, {}, from);
  QTest::mouseMove(&map(), from + QPoint(15, 10));
  QTest::mouseMove(&map(), from + QPoint(30, -20));
  QTest::mouseRelease(&map(), Qt::LeftButton, {}, from + QPoint(30, -20));
  EXPECT_LT((map().placeOf(150) - place - QPointF(30, -20)).manhattanLength(), 0.01);
  EXPECT_EQ(current(), before);
  QTest::keyClick(&map(), Qt::Key_Left);
  EXPECT_GT(map().placeOf(150).x(), place.x() + 60);
  // The middle stays within the field.
  for (int i = 0; i < 200; ++i)
    QTest::keyClick(&map(), Qt::Key_Up);
  const double top = map().placeOf(299).y();
  EXPECT_GT(top, 0);
  EXPECT_LT(top, map().height());
}

TEST_F(FieldMapPage, controlAndAnArrowChooseTheNextPointThatWay) {
  screenMesh();
  const auto press = [&](Qt::Key key) { QTest::keyClick(&map(), key, Qt::ControlModifier); };
  page().table().setCurrentIndex(model().index(*model().rowOf(150), 0));
  press(Qt::Key_Right);
  EXPECT_EQ(current(), 151U);
  press(Qt::Key_Up);
  EXPECT_EQ(current(), 181U);
  press(Qt::Key_Left);
  press(Qt::Key_Down);
  EXPECT_EQ(current(), 150U);
  page().table().setCurrentIndex(model().index(*model().rowOf(0), 0));
  press(Qt::Key_Down);
  EXPECT_EQ(current(), 0U);
  // Where the next one lies outside, the map goes there.
  for (int i = 0; i < 15; ++i)
    QTest::keyClick(&map(), Qt::Key_Plus);
  press(Qt::Key_Right);
  EXPECT_EQ(current(), 1U);
  EXPECT_TRUE(map().rect().contains(map().placeOf(1).toPoint()));
}

TEST_F(FieldMapPage, isDrawnWhereAFilterLetsNothingThroughBeforeItIsFirstShown) {
  m_dialog.setup().setTable(written(mesh()));
  m_dialog.hide();
  run();
  QSignalSpy spy(&page(), &FieldPage::arranged);
  page().from().setText("99");
  Q_EMIT page().from().textEdited("99");
  ASSERT_TRUE(QTest::qWaitFor([&] { return model().rowCount() == 0; }, 10000));
  m_dialog.show();
  drawn();
  EXPECT_GT(pixelsOf(Role::hush, 299), 10);
}

TEST_F(FieldMapPage, tellsWhatTheTableHasOfAPoint) {
  screenMesh();
  const QString lines = model().linesOf(29);
  EXPECT_TRUE(lines.startsWith("point: n29\nutilisation: ")) << lines.toStdString();
  EXPECT_TRUE(lines.contains("x (mm): 2900")) << lines.toStdString();
  EXPECT_EQ(map().pointAt(map().placeOf(29)), 29U);
}

TEST_F(FieldMapPage, anotherFieldIsShownWhole) {
  screenMesh();
  wheel(map().placeOf(150), 5);
  m_dialog.setup().except().clear();
  screen("point,x,y,sx G,sy G,txy G,sx S,sy S,txy S\na,0,0,1,0,0,1,0,0\nb,5,7,2,0,0,2,0,0\n");
  drawn();
  EXPECT_EQ(map().pointAt(map().placeOf(0)), 0U);
  EXPECT_EQ(map().pointAt(map().placeOf(1)), 1U);
  EXPECT_TRUE(map().rect().contains(map().placeOf(1).toPoint()));
  screen("point,x,y,sx G,sy G,txy G,sx S,sy S,txy S\na,3,3,1,0,0,1,0,0\n");
  drawn();
  EXPECT_EQ(map().pointAt(map().placeOf(0)), 0U);
}

} // namespace
} // namespace planewright
