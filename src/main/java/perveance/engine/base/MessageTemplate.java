package perveance.engine.base;

import java.util.List;
import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Fills numbered parts into a sentence. Not {@link java.text.MessageFormat}: that one formats
 * numbers by the machine's locale and gives apostrophes a meaning, both of which surprise here.
 */
final class MessageTemplate {
  private static final Pattern PART = Pattern.compile("\\{(\\d)}");

  private MessageTemplate() {}

  static String kebabCase(String name) {
    return name.toLowerCase(Locale.ROOT).replace('_', '-');
  }

  static int partCount(String template) {
    int count = 0;
    Matcher matcher = PART.matcher(template);
    while (matcher.find()) {
      count = Math.max(count, Integer.parseInt(matcher.group(1)) + 1);
    }
    return count;
  }

  static String fill(String template, List<String> parts) {
    int count = partCount(template);
    if (parts.size() != count) {
      throw new IllegalArgumentException(
          "parts has " + parts.size() + " texts, \"" + template + "\" takes " + count);
    }
    return PART.matcher(template)
        .replaceAll(match -> Matcher.quoteReplacement(parts.get(Integer.parseInt(match.group(1)))));
  }
}
