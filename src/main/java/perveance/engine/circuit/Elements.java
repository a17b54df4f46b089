package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.List;

/** Finds the elements of one kind. */
final class Elements {
  private Elements() {}

  static List<Integer> indices(Circuit circuit, Class<? extends Element> kind) {
    List<Integer> found = new ArrayList<>();
    for (int i = 0; i < circuit.elements().size(); i++) {
      if (kind.isInstance(circuit.elements().get(i))) {
        found.add(i);
      }
    }
    return found;
  }

  static int[] indexArray(Circuit circuit, Class<? extends Element> kind) {
    return indices(circuit, kind).stream().mapToInt(Integer::intValue).toArray();
  }
}
