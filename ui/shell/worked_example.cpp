// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/shell/worked_example.h"

#include "core/record/study_file.h"

#include <QFile>

#include <cassert>

namespace planewright {

const Study& workedExample() {
  static const Study example = [] {
    QFile file(QStringLiteral(":/planewright/demo/boat-shed-beam.planewright"));
    const bool opened = file.open(QIODevice::ReadOnly);
    assert(opened);
    Results<Study> study = readStudy(opened ? file.readAll().toStdString() : std::string());
    assert(study);
    return *std::move(study);
  }();
  return example;
}

bool isWorkedExample(const Study& study) {
  Study shown = workedExample();
  shown.shown = study.shown;
  return study == shown;
}

} // namespace planewright
