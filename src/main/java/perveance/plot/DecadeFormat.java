package perveance.plot;

import java.text.FieldPosition;
import java.text.NumberFormat;
import java.text.ParsePosition;
import java.util.Locale;

/** Figures of a logarithmic axis as the trade writes them: 10, 100, 1k, 10k. */
final class DecadeFormat extends NumberFormat {
  private static final long serialVersionUID = 1L;

  @Override
  public StringBuffer format(double number, StringBuffer to, FieldPosition pos) {
    if (number >= 1e6) {
      return to.append(trim(number / 1e6)).append('M');
    }
    if (number >= 1e3) {
      return to.append(trim(number / 1e3)).append('k');
    }
    return to.append(trim(number));
  }

  @Override
  public StringBuffer format(long number, StringBuffer to, FieldPosition pos) {
    return format((double) number, to, pos);
  }

  @Override
  public Number parse(String source, ParsePosition position) {
    throw new UnsupportedOperationException("axis figures are only printed");
  }

  private static String trim(double value) {
    String text = String.format(Locale.ROOT, "%.3f", value);
    return text.replaceAll("0+$", "").replaceAll("\\.$", "");
  }
}
