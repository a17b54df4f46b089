package perveance.plot;

import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * The words and figures that a drawing carries, apart from its geometry.
 *
 * @param parts text beside each part, by element name
 * @param nodes text beside each marked node, by node name
 * @param pins pin numbers of each valve, by element name
 * @param chosen parts drawn as chosen
 * @param zigzag true for zigzag resistors
 */
public record SchematicText(
    Map<String, PartText> parts,
    Map<String, NodeText> nodes,
    Map<String, PinText> pins,
    Set<String> chosen,
    boolean zigzag) {
  /** Copies the collections. */
  public SchematicText {
    parts = Map.copyOf(parts);
    nodes = Map.copyOf(nodes);
    pins = Map.copyOf(pins);
    chosen = Set.copyOf(chosen);
  }

  /**
   * Text beside a part.
   *
   * @param value bold line, for example {@code R1 100k}
   * @param duty second line, for example {@code 104 V, 0.11 W}; may be empty
   * @param over word for a limit that is exceeded, drawn with a triangle; empty when none
   */
  public record PartText(String value, String duty, Optional<String> over) {}

  /**
   * Text beside a node.
   *
   * @param value bold line, for example {@code 187-206 V}
   * @param detail second line, for example {@code test point 1}; may be empty
   */
  public record NodeText(String value, String detail) {}

  /**
   * Pin numbers; an empty text is not shown.
   *
   * @param anode anode pin
   * @param grid grid pin
   * @param cathode cathode pin
   * @param screen screen pin
   */
  public record PinText(String anode, String grid, String cathode, String screen) {}
}
