package perveance.app.wording;

import perveance.engine.base.Severity;

/**
 * One finding as it is told, perhaps for several places at once.
 *
 * @param severity how much it matters
 * @param where the place, or the places, as the person named them
 * @param text the sentence, without the remedy
 * @param remedy what cures it, empty when nothing is proposed
 */
public record FindingLine(Severity severity, String where, String text, String remedy) {
  /**
   * Severity in words.
   *
   * @return the word a report leads with, such as "OVER LIMIT"
   */
  public String word() {
    return severity.name().replace('_', ' ');
  }

  /**
   * Sentence and remedy together.
   *
   * @return what a report prints
   */
  public String told() {
    return remedy.isEmpty() ? text : text + " Remedy: " + remedy;
  }
}
