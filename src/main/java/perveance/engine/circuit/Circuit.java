package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A circuit: named nodes and elements, immutable.
 *
 * @param nodes names by node number; node 0 is chassis
 * @param elements in the order they were added
 */
public record Circuit(List<String> nodes, List<Element> elements) {
  /**
   * Copies the lists.
   *
   * @throws IllegalArgumentException when an element is joined to a node that does not exist
   */
  public Circuit {
    nodes = List.copyOf(nodes);
    elements = List.copyOf(elements);
    for (Element element : elements) {
      for (int node : Terminals.of(element)) {
        if (node < 0 || node >= nodes.size()) {
          throw new IllegalArgumentException(element.name() + " is joined to node " + node);
        }
      }
    }
  }

  /**
   * Place of a named element in {@link #elements}.
   *
   * @param name element name
   * @return index
   * @throws IllegalArgumentException when there is no such element
   */
  public int element(String name) {
    for (int i = 0; i < elements.size(); i++) {
      if (elements.get(i).name().equals(name)) {
        return i;
      }
    }
    throw new IllegalArgumentException("no element named " + name);
  }

  /**
   * Number of a named node.
   *
   * @param name node name
   * @return node number
   * @throws IllegalArgumentException when there is no such node
   */
  public int node(String name) {
    int index = nodes.indexOf(name);
    if (index < 0) {
      throw new IllegalArgumentException("no node named " + name);
    }
    return index;
  }

  /** Collects nodes and elements. */
  public static final class Builder {
    private final Map<String, Integer> numbers = new LinkedHashMap<>();
    private final Map<String, Element> elements = new LinkedHashMap<>();

    /** Starts with chassis as node 0. */
    public Builder() {
      numbers.put("chassis", 0);
    }

    /**
     * Number of a node, made on first use.
     *
     * @param name node name
     * @return node number
     */
    public int node(String name) {
      Integer known = numbers.get(name);
      if (known != null) {
        return known;
      }
      int number = numbers.size();
      numbers.put(name, number);
      return number;
    }

    /**
     * Adds an element.
     *
     * @param element element with a name of its own
     * @return this builder
     * @throws IllegalArgumentException when the name is taken
     */
    public Builder add(Element element) {
      if (elements.putIfAbsent(element.name(), element) != null) {
        throw new IllegalArgumentException("two elements named " + element.name());
      }
      return this;
    }

    /**
     * The circuit as collected so far.
     *
     * @return an immutable circuit
     */
    public Circuit build() {
      return new Circuit(new ArrayList<>(numbers.keySet()), new ArrayList<>(elements.values()));
    }
  }
}
