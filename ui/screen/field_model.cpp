// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/screen/field_model.h"

#include "core/quantity/format.h"
#include "core/strength/shown_ratio.h"
#include "ui/look/look.h"

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

constexpr int angleDecimals = 2;

bool isNumber(FieldKey key) {
  return key == FieldKey::utilisation || key == FieldKey::multiplier || key == FieldKey::worstAngle ||
         key == FieldKey::x || key == FieldKey::y;
}

std::vector<FieldKey> keysOf(const ScreenedField& field) {
  using enum FieldKey;
  const Field::Columns& columns = field.reading.field.columns();
  std::vector<FieldKey> keys = {point};
  if (columns.layer)
    keys.push_back(layer);
  if (columns.region)
    keys.push_back(region);
  keys.insert(keys.end(), {utilisation, multiplier, combination});
  if (field.plan.checks.size() > 1)
    keys.push_back(check);
  keys.insert(keys.end(), {mode, worstAngle});
  if (columns.x)
    keys.push_back(x);
  if (columns.y)
    keys.push_back(y);
  return keys;
}

} // namespace

void FieldModel::show(std::shared_ptr<const ScreenedField> field) {
  beginResetModel();
  m_field = std::move(field);
  m_rows = std::make_shared<const std::vector<std::uint32_t>>();
  m_keys = m_field ? keysOf(*m_field) : std::vector<FieldKey>();
  endResetModel();
}

// Where as many rows come as there were, nothing but their texts is another: views then keep what they know
// of a million rows.
void FieldModel::take(FieldRows rows) {
  if (rows->size() == m_rows->size()) {
    m_rows = std::move(rows);
    if (!m_rows->empty())
      Q_EMIT dataChanged(index(0, 0), index(rowCount() - 1, columnCount() - 1));
    return;
  }
  beginResetModel();
  m_rows = std::move(rows);
  endResetModel();
}

int FieldModel::rowCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : static_cast<int>(m_rows->size());
}

int FieldModel::columnCount(const QModelIndex& parent) const {
  return parent.isValid() ? 0 : static_cast<int>(m_keys.size());
}

int FieldModel::columnOf(FieldKey key) const {
  return static_cast<int>(std::ranges::find(m_keys, key) - m_keys.begin());
}

std::optional<int> FieldModel::rowOf(std::uint32_t point) const {
  const auto at = std::ranges::find(*m_rows, point);
  return at == m_rows->end() ? std::nullopt : std::optional(static_cast<int>(at - m_rows->begin()));
}

void FieldModel::sort(int column, Qt::SortOrder order) {
  if (column >= 0 && column < columnCount())
    Q_EMIT sortWanted({keyOf(column), order == Qt::DescendingOrder});
}

QString FieldModel::textOf(std::uint32_t point, FieldKey key) const {
  const Field& field = m_field->reading.field;
  const auto placed = [&](double value) {
    const Unit unit = *readUnit(m_field->study.units.length, dimension::length);
    return std::isnan(value) ? QString() : fromUtf8(exactNumber(unit.fromBase(value)));
  };
  switch (key) {
  case FieldKey::point:
    return fromUtf8(std::string(field.nameOf(point)));
  case FieldKey::layer:
    return shown(labelOf(field.layerOf(point)));
  case FieldKey::region:
    return fromUtf8(std::string(field.regionOf(point)));
  case FieldKey::x:
    return placed(field.xOf(point));
  case FieldKey::y:
    return placed(field.yOf(point));
  default:
    break;
  }
  const PointResult result = m_field->results[point];
  if (result.isJudged())
    return textOfJudged(result, key);
  if (key != FieldKey::utilisation)
    return {};
  return field.standingOf(point) == PointStanding::leftOut ? tr("left out") : tr("incomplete");
}

QString FieldModel::textOfJudged(const PointResult& result, FieldKey key) const {
  switch (key) {
  case FieldKey::utilisation:
    return (exceedsLimit(result.utilisation) ? QStringLiteral("▲ ") : QString()) +
           fromUtf8(shownUtilisation(result.utilisation));
  case FieldKey::multiplier:
    return result.multiplier() ? fromUtf8(shownMultiplier(*result.multiplier())) : QString();
  case FieldKey::combination:
    return fromUtf8(m_field->plan.combinations[result.combination].name);
  case FieldKey::check:
    return fromUtf8(m_field->plan.checks[result.check].setup.id);
  case FieldKey::mode:
    return result.mode ? shown(labelOf(*result.mode)) : QString();
  default:
    return fromUtf8(shownDegrees(Angle::fromDegrees(result.worstAngle), angleDecimals));
  }
}

QString FieldModel::linesOf(std::uint32_t point) const {
  QStringList lines;
  for (int column = 0; column < columnCount(); ++column)
    if (const QString text = textOf(point, keyOf(column)); !text.isEmpty())
      lines << tr("%1: %2").arg(headerData(column, Qt::Horizontal, Qt::DisplayRole).toString(), text);
  return lines.join(QLatin1Char('\n'));
}

QVariant FieldModel::data(const QModelIndex& index, int role) const {
  if (!index.isValid() || !m_field)
    return {};
  const FieldKey key = keyOf(index.column());
  if (role == Qt::DisplayRole)
    return textOf(pointAt(index.row()), key);
  if (role == Qt::ToolTipRole && key == FieldKey::utilisation)
    if (const double utilisation = m_field->results.utilisations()[pointAt(index.row())];
        !std::isnan(utilisation))
      return fromUtf8(exactNumber(utilisation));
  if (role == Qt::TextAlignmentRole && isNumber(key))
    return QVariant(Qt::AlignRight | Qt::AlignVCenter);
  return {};
}

QVariant FieldModel::headerData(int section, Qt::Orientation orientation, int role) const {
  if (orientation != Qt::Horizontal || section >= columnCount())
    return {};
  if (role == Qt::TextAlignmentRole && isNumber(keyOf(section)))
    return QVariant(Qt::AlignRight | Qt::AlignVCenter);
  if (role != Qt::DisplayRole)
    return {};
  const QString length = fromUtf8(m_field->study.units.length);
  switch (keyOf(section)) {
  case FieldKey::point:
    return tr("point");
  case FieldKey::layer:
    return tr("layer");
  case FieldKey::region:
    return tr("region");
  case FieldKey::utilisation:
    return tr("utilisation");
  case FieldKey::multiplier:
    return tr("load multiplier");
  case FieldKey::combination:
    return tr("combination");
  case FieldKey::check:
    return tr("check");
  case FieldKey::mode:
    return tr("mode");
  case FieldKey::worstAngle:
    return tr("worst angle");
  case FieldKey::x:
    return tr("x (%1)").arg(length);
  default:
    return tr("y (%1)").arg(length);
  }
}

} // namespace planewright
