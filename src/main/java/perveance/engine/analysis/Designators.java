package perveance.engine.analysis;

import java.util.HashMap;
import java.util.Map;
import perveance.engine.stage.StageCircuit.PartType;

/** Hands out designators, R1, C1 and so on, counted over the whole chassis. */
final class Designators {
  private final Map<String, Integer> last = new HashMap<>();

  String next(PartType type) {
    String letter =
        switch (type) {
          case RESISTOR -> "R";
          case CAPACITOR, ELECTROLYTIC -> "C";
          case INDUCTOR -> "L";
          case TRANSFORMER -> "T";
          case JUNCTION -> "D";
        };
    return letter + last.merge(letter, 1, Integer::sum);
  }
}
