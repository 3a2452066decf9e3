// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QWidget>

class QHBoxLayout;

namespace planewright {

class SteadyLabel;

/// A line under the state bar: a sentence, links that act on it, and a cross to put it away.
class Strip : public QWidget {
  Q_OBJECT

public:
  explicit Strip(QWidget* parent);

  /// A message about something wrong stands on its own ground with a mark.
  enum class Tone { quiet, wrong };
  /// Shows the strip with a sentence and no links yet.
  void say(const QString& sentence, Tone tone = Tone::quiet);
  /// Adds a link to the sentence that stands.
  template <class Act>
  void offer(const QString& words, Act act) {
    connect(this, &Strip::linkClicked, m_scope, [words, act](const QString& link) {
      if (link == words)
        act();
    });
    m_offers << words;
    write();
  }
  QString sentence() const { return m_sentence; }
  const QStringList& offers() const { return m_offers; }
  /// Does what a click on this link does.
  void follow(const QString& words) { Q_EMIT linkClicked(words); }

signals:
  void linkClicked(const QString& words);

protected:
  void changeEvent(QEvent* event) override;
  void paintEvent(QPaintEvent* event) override;

private:
  void write();

  SteadyLabel* m_label;
  QObject* m_scope; ///< lives as long as the sentence; its links end with it
  QString m_sentence;
  QStringList m_offers;
  Tone m_tone = Tone::quiet;
};

} // namespace planewright
