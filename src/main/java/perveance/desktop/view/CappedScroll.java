package perveance.desktop.view;

import javafx.beans.property.DoubleProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.scene.control.ScrollPane;

/** As high as its content, neither less nor more, up to a cap above which it scrolls. */
final class CappedScroll extends ScrollPane {
  private final DoubleProperty cap = new SimpleDoubleProperty(Double.MAX_VALUE);

  CappedScroll() {
    setFitToWidth(true);
    setHbarPolicy(ScrollBarPolicy.NEVER);
    cap.addListener((o, was, is) -> requestLayout());
  }

  /** Greatest height, in pixels. */
  DoubleProperty capProperty() {
    return cap;
  }

  @Override
  protected double computePrefHeight(double width) {
    double across = width > 0 ? width : getWidth();
    double content = getContent() == null ? 0 : getContent().prefHeight(across > 0 ? across : -1);
    return Math.min(cap.get(), Math.ceil(content));
  }

  @Override
  protected double computeMinHeight(double width) {
    return computePrefHeight(width);
  }

  @Override
  protected double computeMaxHeight(double width) {
    return computePrefHeight(width);
  }
}
