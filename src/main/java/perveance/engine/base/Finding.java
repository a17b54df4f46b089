package perveance.engine.base;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Something that a person should know about a stage or a chassis.
 *
 * @param code what kind of finding it is
 * @param severity how much it matters
 * @param where the place, as the person named it, such as "V1a"
 * @param value the figure it is about [in the unit]; empty where there is none
 * @param limit what the figure is held against [in the unit]; empty where there is none
 * @param unit the unit of value and limit; present whenever one of them is
 * @param text the whole sentence
 * @param remedy the cure the engine has computed, where there is one
 * @param part the part to mark on the drawing, such as "V1a.anode_load", where there is one
 */
public record Finding(
    MessageCode code,
    Severity severity,
    String where,
    OptionalDouble value,
    OptionalDouble limit,
    Optional<Unit> unit,
    String text,
    Optional<Remedy> remedy,
    Optional<String> part) {
  /** Refuses figures without a unit and figures that are not finite. */
  public Finding {
    Objects.requireNonNull(code, "code");
    Objects.requireNonNull(severity, "severity");
    Objects.requireNonNull(where, "where");
    Objects.requireNonNull(text, "text");
    Objects.requireNonNull(remedy, "remedy");
    Objects.requireNonNull(part, "part");
    if ((value.isPresent() || limit.isPresent()) && unit.isEmpty()) {
      throw new IllegalArgumentException("unit is absent beside a value or limit: " + text);
    }
    requireFinite(value, "value");
    requireFinite(limit, "limit");
  }

  private static void requireFinite(OptionalDouble figure, String name) {
    if (figure.isPresent() && !Double.isFinite(figure.getAsDouble())) {
      throw new IllegalArgumentException(name + " is not finite: " + figure.getAsDouble());
    }
  }

  /**
   * Creates a finding without figures, remedy or part.
   *
   * @param code what kind of finding it is
   * @param severity how much it matters
   * @param where the place, as the person named it
   * @param parts the rendered parts of the sentence, in order
   * @return the finding
   */
  public static Finding of(MessageCode code, Severity severity, String where, String... parts) {
    return new Finding(
        code,
        severity,
        where,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        code.format(parts),
        Optional.empty(),
        Optional.empty());
  }

  /**
   * Adds the figure the finding is about.
   *
   * @param figure the figure [in newUnit]
   * @param newUnit its unit
   * @return the finding with the figure
   */
  public Finding withValue(double figure, Unit newUnit) {
    return new Finding(
        code,
        severity,
        where,
        OptionalDouble.of(figure),
        limit,
        Optional.of(newUnit),
        text,
        remedy,
        part);
  }

  /**
   * Adds the figure the finding is about and what it is held against.
   *
   * @param figure the figure [in newUnit]
   * @param bound the limit [in newUnit]
   * @param newUnit the unit of both
   * @return the finding with both figures
   */
  public Finding withValue(double figure, double bound, Unit newUnit) {
    return new Finding(
        code,
        severity,
        where,
        OptionalDouble.of(figure),
        OptionalDouble.of(bound),
        Optional.of(newUnit),
        text,
        remedy,
        part);
  }

  /**
   * Adds the cure.
   *
   * @param cure what the engine has computed
   * @return the finding with the cure
   */
  public Finding withRemedy(Remedy cure) {
    return new Finding(code, severity, where, value, limit, unit, text, Optional.of(cure), part);
  }

  /**
   * Adds the part to mark on the drawing.
   *
   * @param marked the part
   * @return the finding with the part
   */
  public Finding onPart(String marked) {
    return new Finding(
        code, severity, where, value, limit, unit, text, remedy, Optional.of(marked));
  }
}
