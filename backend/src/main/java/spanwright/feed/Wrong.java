package spanwright.feed;

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
    return value == Math.rint(value) && Math.abs(value) < 1e9
        ? String.format(Locale.ROOT, "%.0f", value)
        : String.format(Locale.ROOT, "%.4g", value);
  }
}
