package perveance.accuracy;

import java.util.List;

/** Something published that laws of the library are compared with. */
@FunctionalInterface
public interface AccuracySource {
  /** The lines that it adds to the accuracy table. */
  List<AccuracyLine> lines();
}
