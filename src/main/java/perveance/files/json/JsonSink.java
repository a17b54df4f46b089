package perveance.files.json;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Writes members so that the promises of the format hold everywhere: absent is left out, never
 * null; a number that is not finite is absent.
 */
final class JsonSink {
  /** More than any figure is known to, fewer than the noise of binary fractions. */
  private static final MathContext DIGITS = new MathContext(12);

  private final JsonGenerator out;

  JsonSink(JsonGenerator out) {
    this.out = out;
  }

  /** The members of an object. */
  @FunctionalInterface
  interface Members {
    void write() throws IOException;
  }

  /** The members of an object made from one thing of many. */
  @FunctionalInterface
  interface MembersOf<T> {
    void write(T one) throws IOException;
  }

  void object(String name, Members members) throws IOException {
    out.writeObjectFieldStart(name);
    members.write();
    out.writeEndObject();
  }

  void root(Members members) throws IOException {
    out.writeStartObject();
    members.write();
    out.writeEndObject();
  }

  <T> void objects(String name, Collection<T> all, MembersOf<T> members) throws IOException {
    out.writeArrayFieldStart(name);
    for (T one : all) {
      out.writeStartObject();
      members.write(one);
      out.writeEndObject();
    }
    out.writeEndArray();
  }

  /** Like {@link #objects}, but left out when there is none. */
  <T> void someObjects(String name, Collection<T> all, MembersOf<T> members) throws IOException {
    if (!all.isEmpty()) {
      objects(name, all, members);
    }
  }

  void text(String name, String text) throws IOException {
    out.writeStringField(name, text);
  }

  void text(String name, Optional<String> text) throws IOException {
    if (text.isPresent()) {
      text(name, text.get());
    }
  }

  /** A text that is empty where there is none. */
  void someText(String name, String text) throws IOException {
    if (!text.isEmpty()) {
      text(name, text);
    }
  }

  void texts(String name, List<String> texts) throws IOException {
    if (!texts.isEmpty()) {
      out.writeArrayFieldStart(name);
      for (String text : texts) {
        out.writeString(text);
      }
      out.writeEndArray();
    }
  }

  void texts(String name, Map<String, String> texts) throws IOException {
    if (!texts.isEmpty()) {
      out.writeObjectFieldStart(name);
      for (Map.Entry<String, String> entry : texts.entrySet()) {
        out.writeStringField(entry.getKey(), entry.getValue());
      }
      out.writeEndObject();
    }
  }

  void whole(String name, int number) throws IOException {
    out.writeNumberField(name, number);
  }

  void flag(String name, boolean flag) throws IOException {
    out.writeBooleanField(name, flag);
  }

  void number(String name, double number) throws IOException {
    if (Double.isFinite(number)) {
      out.writeNumberField(name, rounded(number));
    }
  }

  void number(String name, OptionalDouble number) throws IOException {
    if (number.isPresent()) {
      number(name, number.getAsDouble());
    }
  }

  /** A list keeps its places, so a number that is not finite has no business in it. */
  void numbers(String name, List<Double> numbers) throws IOException {
    out.writeArrayFieldStart(name);
    for (double number : numbers) {
      out.writeNumber(rounded(number));
    }
    out.writeEndArray();
  }

  private static double rounded(double number) {
    if (number == 0) {
      return 0; // no negative zero
    }
    return new BigDecimal(number).round(DIGITS).doubleValue();
  }
}
