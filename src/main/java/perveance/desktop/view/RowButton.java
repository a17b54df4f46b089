package perveance.desktop.view;

import javafx.geometry.Orientation;
import javafx.scene.control.Button;
import javafx.scene.layout.Region;

/** A row of a list to press, as wide as the list and as high as its words, broken there, need. */
final class RowButton extends Button {
  private final Region content;

  RowButton(Region content) {
    this.content = content;
    setGraphic(content);
    setMaxWidth(Double.MAX_VALUE);
    setMinHeight(USE_PREF_SIZE);
    content.prefWidthProperty().bind(widthProperty().subtract(across()));
    getStyleClass().setAll("chassis-row");
    insetsProperty()
        .addListener(
            (o, was, is) -> {
              content.prefWidthProperty().unbind();
              content.prefWidthProperty().bind(widthProperty().subtract(across()));
            });
  }

  private double across() {
    return getInsets().getLeft() + getInsets().getRight();
  }

  @Override
  public Orientation getContentBias() {
    return Orientation.HORIZONTAL;
  }

  @Override
  protected double computePrefHeight(double width) {
    double within = width > 0 ? Math.max(0, width - across()) : -1;
    return getInsets().getTop() + content.prefHeight(within) + getInsets().getBottom();
  }
}
