// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/look/later.h"
#include "ui/shell/filing.h"

#include <QMainWindow>
#include <QPointer>

class QMenu;
class QStackedWidget;

namespace planewright {

class Areas;
class Body;
class CircleView;
class ElementView;
class EvidenceDialog;
class FigureDialog;
class ScreenDialog;
class SheetDialog;
class GivenPanel;
class HelpKey;
class MaterialsDialog;
class PlanesPanel;
class PreferencesDialog;
class SlipDialog;
class WorkingDialog;
class StateBar;
class StrengthPanel;
class SummaryPage;
class StatusLine;
class Strip;
class Recovery;
class ThingsDialog;
class TitleDialog;
class UnsavedDialog;

/// The window: state bar, panels and status line over one desk. The only place where views, files and menus
/// meet.
class MainWindow : public QMainWindow {
  Q_OBJECT

public:
  /// With the questions about files asked by dialogs, or by those given.
  MainWindow();
  explicit MainWindow(FileQuestions questions);
  ~MainWindow() override;

  /// Opens a study; false, with the reasons in the window, when it cannot be read.
  bool open(const QString& path);

  /// Shows what windows that ended left unsaved, if anything.
  void offerUnsaved();

  Desk& desk() { return m_desk; }
  Filing& filing() { return *m_filing; }
  StateBar& stateBar() const { return *m_stateBar; }
  StatusLine& statusLine() const { return *m_status; }
  Body& body() const { return *m_body; }
  GivenPanel& given() const { return *m_given; }
  ElementView& element() const { return *m_element; }
  CircleView& circle() const { return *m_circle; }
  PlanesPanel& planes() const { return *m_planes; }
  StrengthPanel& strength() const { return *m_strength; }
  SummaryPage& summary() const;
  /// The strip that greets, and the one that tells of files.
  Strip& welcome() const { return *m_welcome; }
  Strip& trouble() const { return *m_trouble; }
  HelpKey& help() const { return *m_help; }

public slots:
  void arrangeFigure();
  void showSheet();
  /// The point with its drawings and tables; all points in one table.
  void showPointPage();
  void showSummary();
  void enterStrength();
  void showMaterials();
  void openWorkedExample();

protected:
  bool event(QEvent* event) override;
  bool eventFilter(QObject* watched, QEvent* event) override;
  void closeEvent(QCloseEvent* event) override;

private:
  /// Makes a dialog that follows the study when it is first asked for, and shows it; `more` is what it is
  /// made of besides the study.
  template <class Dialog, class... More>
  void bringUp(QPointer<Dialog>& dialog, const More&... more);
  static void raised(QDialog& dialog);
  void build();
  void connectViews();
  SummaryPage* newSummary(QWidget* parent);
  void restoreGeometryAndSizes();

  void addFileMenu();
  void addEditMenu();
  void addStudyMenu();
  void addListsOfStudy(QMenu& menu);
  void addViewMenu();
  void addAppearanceMenu(QMenu& menu);
  void addHelpMenu();
  template <class Act>
  QAction* add(QMenu& menu, const QString& words, const QKeySequence& keys, Act act);
  void listRecent();

  void settleDrafts();
  void beginStudy();
  void showFile(const QString& path);
  void showTitle();
  void showUnsaved();
  void showPreferences();
  void showRefusal(const QString& path, const Problems& problems);
  void tellStep(int index);
  void copyFromFocus();
  void pasteTable();
  void importPoints();
  void screenPoints();
  void showTable(std::string table, const QString& title);
  void copyStresses(const std::vector<Point>& points, const QString& said);
  void copyFigureNow();
  void printFigureNow();
  void showEvidence();
  void showAbout();

  Desk m_desk;
  Filing* m_filing;
  Recovery* m_recovery;
  StateBar* m_stateBar;
  Strip* m_welcome;
  Strip* m_trouble;
  GivenPanel* m_given;
  ElementView* m_element;
  CircleView* m_circle;
  PlanesPanel* m_planes;
  StrengthPanel* m_strength;
  Later<SummaryPage>* m_summary;
  Body* m_body;
  QStackedWidget* m_pages;
  StatusLine* m_status;
  Areas* m_areas;
  HelpKey* m_help;
  QMenu* m_recent = nullptr;
  int m_toldStep = 0; ///< where the undo stack stood when a step was last told
  QPointer<FigureDialog> m_figure;
  QPointer<SheetDialog> m_sheet;
  // A window of its own: as a dialog of this one it would always lie over it.
  QPointer<ScreenDialog> m_screen;
  QPointer<EvidenceDialog> m_evidence;
  QPointer<TitleDialog> m_title;
  QPointer<UnsavedDialog> m_unsaved;
  QPointer<PreferencesDialog> m_preferences;
  QPointer<SlipDialog> m_slips;
  QPointer<WorkingDialog> m_working;
  QPointer<MaterialsDialog> m_materials;
  QPointer<ThingsDialog> m_cases;
  QPointer<ThingsDialog> m_combinations;
  QPointer<ThingsDialog> m_points;
  QPointer<ThingsDialog> m_sections;
};

} // namespace planewright
