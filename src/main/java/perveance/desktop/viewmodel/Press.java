package perveance.desktop.viewmodel;

import java.util.List;
import perveance.engine.analysis.ChassisAnswer;

/** Makes the printed sheet and brings it to paper. */
public interface Press {
  /**
   * The sheet of a chassis.
   *
   * @param answer a thorough answer
   * @param settings paper, words and symbols
   * @return PDF file
   */
  byte[] sheet(ChassisAnswer answer, Settings settings);

  /**
   * The printers that take the sheet as it is.
   *
   * @return their names, empty when there is none
   */
  List<String> printers();

  /**
   * Prints.
   *
   * @param sheet PDF file
   * @param printer name of a printer
   * @param settings paper
   * @throws DocumentException when the printer does not take it
   */
  void print(byte[] sheet, String printer, Settings settings) throws DocumentException;
}
