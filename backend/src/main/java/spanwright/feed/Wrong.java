package spanwright.feed;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;

/** Sentences for input that cannot be used. */
final class Wrong {
  private Wrong() {}

  static void unlessWithin(String what, double value, double least, double most, String unit) {
    if (!(value >= least && value <= most)) {
      throw new IllegalArgumentException(
          String.format(
              Locale.ROOT,
              "%s is %s %s; it has to be from %s to %s %s.",
              what,
              plain(value),
              unit,
              plain(least),
              plain(most),
              unit));
    }
  }

  static String plain(double value) {
    if (Double.isNaN(value) || Double.isInfinite(value)) {
      return "not a number";
    }
    double rounded = new BigDecimal(value).round(new MathContext(4)).doubleValue();
    return Math.abs(rounded) >= 1e9 || Math.abs(rounded) < 1e-3
        ? Double.toString(rounded).replaceFirst("\\.0(?=E|$)", "")
        : new BigDecimal(Double.toString(rounded)).stripTrailingZeros().toPlainString();
  }
}
