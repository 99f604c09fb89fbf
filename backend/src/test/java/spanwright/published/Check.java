package spanwright.published;

import java.util.Locale;

/**
 * One value held against the world: a line of {@code docs/accuracy.md}.
 *
 * @param what the quantity and its inputs
 * @param expected as printed by the source, with its unit
 * @param found by the program, rounded no finer than the tolerance deserves
 * @param tolerance allowed difference, in words and units
 * @param holds whether it is met
 * @param source author or body, title, table or equation; "common practice, no source"; "from
 *     memory" said so
 */
public record Check(
    String what, String expected, String found, String tolerance, boolean holds, String source) {

  /** A number within an absolute tolerance, shown with the given decimals. */
  public static Check within(
      String what,
      double expected,
      double found,
      double tolerance,
      int decimals,
      String unit,
      String source) {
    String form = "%." + decimals + "f %s";
    return new Check(
        what,
        String.format(Locale.ROOT, form, expected, unit).strip(),
        String.format(Locale.ROOT, form, found + 0.0, unit).strip(),
        "±" + trimmed(tolerance) + " " + unit,
        Math.abs(found - expected) <= tolerance,
        source);
  }

  private static String trimmed(double value) {
    return java.math.BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
  }
}
