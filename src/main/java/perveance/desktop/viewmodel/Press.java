package perveance.desktop.viewmodel;

import perveance.engine.analysis.ChassisAnswer;

/** Makes the printed sheet. */
@FunctionalInterface
public interface Press {
  /**
   * The sheet of a chassis.
   *
   * @param answer a thorough answer
   * @param settings paper, words and symbols
   * @return PDF file
   */
  byte[] sheet(ChassisAnswer answer, Settings settings);
}
