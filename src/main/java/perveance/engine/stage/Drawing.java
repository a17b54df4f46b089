package perveance.engine.stage;

import java.util.List;
import java.util.Optional;

/**
 * A schematic as plain data: symbols and wires on a grid, one unit between neighbouring grid
 * points; x to the right, y down.
 *
 * @param width grid units
 * @param height grid units
 * @param symbols symbols
 * @param wires straight wires
 * @param marks nodes that show their voltage
 */
public record Drawing(
    int width, int height, List<Symbol> symbols, List<Wire> wires, List<NodeMark> marks) {
  /** Copies the lists. */
  public Drawing {
    symbols = List.copyOf(symbols);
    wires = List.copyOf(wires);
    marks = List.copyOf(marks);
  }

  /**
   * A symbol; two-terminal symbols span four grid units centred at (x, y); a valve's envelope has a
   * radius of three units, with anode at (x, y-4), grid at (x-4, y), cathode at (x, y+4), screen at
   * (x+4, y). {@link SymbolShape} gives the terminals, the room and the room for text of each.
   *
   * @param type what is drawn
   * @param x centre
   * @param y centre
   * @param turned true when a two-terminal symbol lies along x instead of along y
   * @param mirrored true when a valve's grid is on the right, or a terminal is on the other side of
   *     its wire than usual (input left, output right)
   * @param part name of the circuit element it shows: a part or a valve of the stage, a capacitor
   *     that must be there but is not stated, {@code ref.source} at the input terminal, {@code
   *     ref.grid_bias} at a bias, {@code supply.A} at a rail; empty for ground, outputs and dots
   * @param label side on which its text stands
   * @param text fixed text, for example the name of a supply node; may be empty
   */
  public record Symbol(
      SymbolType type,
      int x,
      int y,
      boolean turned,
      boolean mirrored,
      Optional<String> part,
      Side label,
      String text) {}

  /** What is drawn. */
  public enum SymbolType {
    /** Resistor. */
    RESISTOR,
    /** Capacitor. */
    CAPACITOR,
    /** Electrolytic capacitor, plus at the top or left. */
    ELECTROLYTIC,
    /** Inductor or choke. */
    INDUCTOR,
    /** Output transformer: primary on the left, secondary on the right, eight units high. */
    TRANSFORMER,
    /** Transformer with a centre-tapped primary, sixteen units high. */
    CENTRE_TAPPED_TRANSFORMER,
    /** Diode. */
    DIODE,
    /** Zener diode. */
    ZENER,
    /** Light-emitting diode. */
    LED,
    /** Current source. */
    CURRENT_SOURCE,
    /** Triode. */
    TRIODE,
    /** Pentode. */
    PENTODE,
    /** Beam tetrode. */
    BEAM_TETRODE,
    /** Directly heated triode. */
    DIRECTLY_HEATED_TRIODE,
    /** Chassis. */
    GROUND,
    /** Supply rail. */
    SUPPLY,
    /** Negative bias supply. */
    BIAS,
    /** Input terminal. */
    INPUT,
    /** Output terminal. */
    OUTPUT,
    /** Connection dot. */
    DOT
  }

  /** Where text stands beside a symbol. */
  public enum Side {
    /** To the left. */
    LEFT,
    /** To the right. */
    RIGHT,
    /** Above. */
    ABOVE,
    /** Below. */
    BELOW
  }

  /**
   * A straight wire.
   *
   * @param x1 start
   * @param y1 start
   * @param x2 end
   * @param y2 end
   */
  public record Wire(int x1, int y1, int x2, int y2) {}

  /**
   * A node that shows its voltage.
   *
   * @param x where
   * @param y where
   * @param node name of the circuit node
   * @param label side on which the voltage stands
   */
  public record NodeMark(int x, int y, String node, Side label) {}
}
