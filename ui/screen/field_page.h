// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

// Qt's reader of headers stumbles where these come first.
#include "ui/desk/beside.h"
#include "ui/screen/field_model.h"

#include <QWidget>

class QCheckBox;
class QComboBox;
class QLabel;
class QLineEdit;
class QPlainTextEdit;
class QPushButton;
class QTabWidget;
class QTableView;

namespace planewright {

class FieldMapView;
class HistogramView;
class MapLegend;
class Strip;

/// The results of a screened field: a row for each point, to sort, to filter, to open as a point of the study
/// and to save. They belong to the study as it was; where that has changed since, it says so and opens none.
class FieldPage : public QWidget {
  Q_OBJECT

public:
  explicit FieldPage(Desk& desk, QWidget* parent = nullptr);

  void show(std::shared_ptr<const ScreenedField> field);
  /// Makes the point of the current row one of the study, and shows it.
  void openCurrent();
  /// Writes all rows beside the window, as the command does.
  void saveTo(const QString& path);

  FieldModel& model() const { return *m_model; }
  QTableView& table() const { return *m_table; }
  QLineEdit& text() const { return *m_text; }
  QLineEdit& from() const { return *m_from; }
  QCheckBox& exceedsOnly() const { return *m_exceeds; }
  QComboBox& combination() const { return *m_combination; }
  QPushButton& open() const { return *m_open; }
  HistogramView& histogram() const { return *m_histogram; }
  FieldMapView& map() const { return *m_map; }
  QPlainTextEdit& notes() const { return *m_notes; }
  QTabWidget& views() const { return *m_views; }
  Strip& strip() const { return *m_strip; }
  QString heading() const;

signals:
  void saveWanted();
  void anotherWanted();
  /// A point was made and is shown.
  void opened();
  /// Other rows are in the table.
  void arranged();

protected:
  void showEvent(QShowEvent* event) override;
  bool eventFilter(QObject* watched, QEvent* event) override;

private:
  QWidget* tableColumn();
  void buildViews();
  QWidget* mapPage();
  QWidget* barsPage();
  QLayout* buttons();
  void arrange();
  void takeRows(FieldRows rows);
  void tellRows();
  void tellClasses();
  void follow();
  void offer(bool isOfStudy);
  bool isOfStudy() const;
  FieldFilter filter() const;

  Desk& m_desk;
  std::shared_ptr<const ScreenedField> m_field;
  FieldSort m_sort;
  Strip* m_strip;
  QLabel* m_heading;
  QLineEdit* m_text;
  QLineEdit* m_from;
  QCheckBox* m_exceeds;
  QComboBox* m_combination;
  QLabel* m_count;
  FieldModel* m_model;
  QTableView* m_table;
  HistogramView* m_histogram;
  FieldMapView* m_map = nullptr;
  MapLegend* m_legend;
  QPlainTextEdit* m_notes;
  QTabWidget* m_views;
  QPushButton* m_open;
  Beside m_rows;
  Beside m_saving;
};

} // namespace planewright
