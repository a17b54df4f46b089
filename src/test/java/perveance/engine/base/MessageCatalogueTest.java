package perveance.engine.base;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class MessageCatalogueTest {
  static List<MessageCode> all() {
    return MessageCatalogue.all();
  }

  /** Every entry takes its parts, each of them, and leaves no brace behind. */
  @ParameterizedTest
  @MethodSource("all")
  void formatsEveryEntry(MessageCode message) {
    String[] parts =
        IntStream.range(0, message.partCount()).mapToObj(i -> "<" + i + ">").toArray(String[]::new);
    String text = message.format(parts);
    for (String part : parts) {
      assertTrue(text.contains(part), message.code() + " leaves out " + part);
    }
    assertFalse(text.contains("{") || text.contains("}"), text);
    assertTrue(text.endsWith("."), "a sentence: " + text);
    assertTrue(text.startsWith("<") || Character.isUpperCase(text.charAt(0)), text);
    assertTrue(text.length() < 160, "short enough for one glance: " + text);
    String[] tooMany = Arrays.copyOf(parts, parts.length + 1);
    tooMany[parts.length] = "too many";
    assertThrows(IllegalArgumentException.class, () -> message.format(tooMany));
  }

  @ParameterizedTest
  @MethodSource("all")
  void codesAreKebabCase(MessageCode message) {
    assertTrue(message.code().matches("[a-z]+(-[a-z0-9]+)*"), message.code());
    assertEquals(message, MessageCatalogue.find(message.code()).orElseThrow());
  }

  /** No voltage and no valve is ever called so. */
  @ParameterizedTest
  @MethodSource("all")
  void nothingIsCalledSafe(MessageCode message) {
    assertFalse(message.template().toLowerCase(Locale.ROOT).contains("safe"), message.code());
  }

  @Test
  void codesAreUnique() {
    Set<String> codes = new HashSet<>();
    for (MessageCode message : all()) {
      assertTrue(codes.add(message.code()), "twice: " + message.code());
    }
  }

  /** The catalogue lists every topic there is. */
  @Test
  void everyTopicIsListed() {
    int count = 0;
    for (Class<?> topic : MessageCode.class.getPermittedSubclasses()) {
      count += topic.getEnumConstants().length;
    }
    assertEquals(count, all().size());
  }

  @Test
  void findsNothingUnderAnUnknownCode() {
    assertTrue(MessageCatalogue.find("no-such-code").isEmpty());
    assertEquals(
        SignalMessage.GRID_CURRENT_FIRST,
        MessageCatalogue.find("grid-current-first").orElseThrow());
  }

  /** Texts with signs that mean something to formatters or patterns come through as they are. */
  @Test
  void partsAreTakenLiterally() {
    assertEquals(
        "V1a's $1 \\ {0} dissipates 50 %, over its rating of {9}.",
        PartMessage.RESISTOR_POWER_OVER.format("V1a's $1 \\ {0}", "50 %", "{9}"));
  }
}
