// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QVBoxLayout>
#include <QWidget>

#include <functional>
#include <utility>

namespace planewright {

/// The place of a page that is made when it is first shown or asked for, so that a window opens without it.
template <class Page>
class Later : public QWidget {
public:
  /// `make` makes the page in the parent that it is given.
  Later(std::function<Page*(QWidget*)> make, QWidget* parent) : QWidget(parent), m_make(std::move(make)) {}

  /// The page ends first: a place that ends would take the keys from a page that still asks what is no more.
  ~Later() override { delete m_page; }

  Page& page() {
    if (!m_page)
      build();
    return *m_page;
  }
  bool isMade() const { return m_page; }

protected:
  void showEvent(QShowEvent* event) override {
    page();
    QWidget::showEvent(event);
  }

private:
  void build() {
    m_page = m_make(this);
    takePlaceInTabs();
    auto* whole = new QVBoxLayout(this);
    whole->setContentsMargins(0, 0, 0, 0);
    whole->addWidget(m_page);
    setFocusProxy(m_page);
    m_page->show();
  }

  static bool takesTab(const QWidget& widget) {
    return widget.focusPolicy() & Qt::TabFocus && !widget.focusProxy();
  }
  /// What is made last would be reached last, not where it stands.
  void takePlaceInTabs() {
    QList<QWidget*> inside;
    for (QWidget* next = nextInFocusChain(); next != this; next = next->nextInFocusChain())
      if (isAncestorOf(next) && takesTab(*next))
        inside += next;
    QWidget* before = previousInFocusChain();
    while (before != this && !takesTab(*before))
      before = before->previousInFocusChain();
    for (QWidget* one : inside) {
      QWidget::setTabOrder(before, one);
      before = one;
    }
  }

  std::function<Page*(QWidget*)> m_make;
  Page* m_page = nullptr;
};

} // namespace planewright
