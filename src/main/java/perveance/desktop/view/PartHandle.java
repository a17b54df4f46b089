package perveance.desktop.view;

import javafx.css.PseudoClass;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Button;
import perveance.plot.Hotspot;

/** A part of the drawing as something that can be focused, pressed and read aloud. */
final class PartHandle extends Button {
  private static final PseudoClass MARKED = PseudoClass.getPseudoClass("marked");

  PartHandle(String name) {
    getStyleClass().setAll("part-handle");
    setId("part-" + name);
    setAccessibleRole(AccessibleRole.BUTTON);
    setAccessibleText(name);
    setMinSize(8, 8);
  }

  /** Marks the part as one that a finding is about. */
  void mark(boolean on) {
    pseudoClassStateChanged(MARKED, on);
  }

  void place(Hotspot spot) {
    double edge = 3;
    setLayoutX(Math.round(spot.x() - edge));
    setLayoutY(Math.round(spot.y() - edge));
    double width = Math.round(spot.width() + 2 * edge);
    double height = Math.round(spot.height() + 2 * edge);
    setPrefSize(width, height);
    setMaxSize(width, height);
  }
}
