package perveance.desktop.viewmodel;

import javafx.beans.property.ObjectProperty;

/**
 * Everything that a window works with.
 *
 * @param bench the chassis on the bench
 * @param document its file
 * @param settings what is kept between runs
 * @param press makes the sheet
 * @param asking asks the person
 * @param drag what a hand on the characteristics does
 */
public record Desk(
    Workbench bench,
    Document document,
    ObjectProperty<Settings> settings,
    Press press,
    Asking asking,
    PointDrag drag) {
  /**
   * A text in the words that the person has chosen.
   *
   * @param text in British words
   * @return in the chosen words
   */
  public String say(String text) {
    return settings.get().vocabulary().say(text);
  }
}
