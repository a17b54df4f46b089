package perveance.engine.base;

import java.util.List;

/**
 * One kind of finding: a stable code and a sentence with numbered parts {0}, {1} and so on. The
 * catalogue is closed and split by topic, one enum each; {@link MessageCatalogue} lists all.
 *
 * <p>A part is text that is already rendered, with its unit ("187 V"), so that the sentence never
 * formats a number itself.
 */
public sealed interface MessageCode
    permits BiasMessage,
        DataMessage,
        HazardMessage,
        OutputMessage,
        PartMessage,
        RatingMessage,
        SignalMessage,
        SupplyMessage {
  /**
   * Returns the constant's name; every topic is an enum.
   *
   * @return the name in capitals
   */
  String name();

  /**
   * Returns the sentence with its numbered parts.
   *
   * @return the template
   */
  String template();

  /**
   * Tells which way is worse when two equal findings are merged.
   *
   * @return true if the lower value is the worse one, as for a quantity that must reach a minimum
   */
  default boolean lowerIsWorse() {
    return false;
  }

  /**
   * Returns the code for machine-readable output.
   *
   * @return the name in lower case with hyphens, such as "grid-current-first"
   */
  default String code() {
    return MessageTemplate.kebabCase(name());
  }

  /**
   * Returns how many parts the sentence takes.
   *
   * @return the number of parts, 0 or more
   */
  default int partCount() {
    return MessageTemplate.partCount(template());
  }

  /**
   * Puts the parts into the sentence.
   *
   * @param parts one rendered text for each number, in order
   * @return the sentence
   */
  default String format(String... parts) {
    return MessageTemplate.fill(template(), List.of(parts));
  }
}
