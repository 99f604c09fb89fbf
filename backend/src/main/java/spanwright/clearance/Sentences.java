package spanwright.clearance;

import java.util.Locale;

/** What a foul clearance says. */
final class Sentences {
  private Sentences() {}

  private static String say(String form, Object... values) {
    return String.format(Locale.ROOT, form, values);
  }

  private static String first(String words) {
    return words.isEmpty() ? words : Character.toUpperCase(words.charAt(0)) + words.substring(1);
  }

  /**
   * Why a placement is refused.
   *
   * @param name of the thing it is measured to
   */
  static String reason(Clearance c, String name) {
    String ours = "The " + c.what();
    double d = c.distance();
    double r = c.required();
    return switch (c.rule()) {
      case "wire-let-go" ->
          d < 0.005
              ? say("%s could touch %s; %.2f m must be kept.", first(c.what()), name, r)
              : say(
                  "%s could come within %.2f m of %s; %.2f m must be kept.",
                  first(c.what()), d, name, r);
      case "mast-let-go" ->
          say(
              "%s: its foot is %.2f m from %s; its height and the kept distance make %.2f m.",
              first(c.what()), d, name, r);
      case "headroom" -> say("%s hangs %s; %.2f m is the least.", ours, height(d), r);
      case "zone-headroom" ->
          say("%s passes %s in %s; %.2f m is the least.", ours, height(d), name, r);
      case "people" ->
          d < 0
              ? say("%s comes into %s, where people are.", ours, name)
              : say("%s comes within %.2f m of %s; %.2f m must be kept.", ours, d, name, r);
      case "zone-no-wire" ->
          d < 0
              ? say("%s comes %.2f m into %s, where no wire may be.", ours, -d, name)
              : say("%s comes within %.2f m of %s; %.2f m must be kept.", ours, d, name, r);
      case "zone-no-mast" ->
          say("The mast stands %.2f m inside %s, where no mast may be.", Math.max(0, -d), name);
      case "boundary" ->
          d < 0
              ? say("%s passes %.2f m over a boundary that does not allow it.", ours, -d)
              : say("%s comes within %.2f m of the boundary; %.2f m must be kept.", ours, d, r);
      case "guy-in-plot" ->
          say("A guy would be made off %.2f m outside the boundary.", Math.max(0, -d));
      default ->
          d < 0
              ? say("%s would pass %.2f m inside %s.", ours, -d, name)
              : d < 0.005
                  ? say("%s would touch %s; %.2f m must be kept.", ours, name, r)
                  : say("%s comes within %.2f m of %s; %.2f m must be kept.", ours, d, name, r);
    };
  }

  private static String height(double above) {
    return above < 0
        ? say("%.2f m below the ground", -above)
        : say("%.2f m above the ground", above);
  }
}
