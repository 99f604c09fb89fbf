package spanwright.sheet;

import java.util.Locale;

/**
 * Writes figures for people: metres or feet and inches, true minus, no more digits than their
 * accuracy. Distances found are never rounded up and lengths to cut never down, so that rounding
 * cannot make a thing look safer or longer than it is.
 */
final class Figures {
  private static final double FOOT = 0.3048;
  private static final double INCH = 0.0254;

  /** Swallows the last bits of sums such as 9.2 + 0.3 before rounding up or down [of a unit]. */
  private static final double CRUMB = 1e-6;

  private final boolean feet;

  Figures(SheetOptions.Units units) {
    feet = units == SheetOptions.Units.FEET;
  }

  /** The unit as a column's heading names it. */
  String unit() {
    return feet ? "ft in" : "m";
  }

  /**
   * The unit to write behind a figure in a sentence, with its space; feet carry their own signs.
   */
  private String suffix() {
    return feet ? "" : " m";
  }

  /** A figure and its unit stay on one line. */
  private static String unbroken(String figure) {
    return figure.replace(' ', '\u00a0');
  }

  /** A length to the nearest 10 mm or half inch. */
  String length(double metres) {
    return feet ? halfInches(Math.round(metres / (INCH / 2))) : fixed(metres, 2);
  }

  /** A length in a sentence, with its unit. */
  String say(double metres) {
    return unbroken(length(metres) + suffix());
  }

  /** A sag to sight: to 10 mm in millimetres, or to the half inch. */
  String sight(double metres) {
    return feet ? say(metres) : unbroken(whole(Math.round(metres * 100) * 10) + " mm");
  }

  /** The weight of a mass, rounded up [N]. */
  static String newtons(double kilograms) {
    return whole(Math.ceil(kilograms * 9.80665 - CRUMB));
  }

  /** A coordinate of the plan for an axis, in metres or whole feet. */
  String axis(double metres) {
    return whole(feet ? metres / FOOT : metres);
  }

  /** Metres in one unit of an axis. */
  double axisUnit() {
    return feet ? FOOT : 1;
  }

  /** A height to the nearest 0.1 m or inch. */
  String height(double metres) {
    return feet ? halfInches(2 * Math.round(metres / INCH)) : fixed(metres, 1);
  }

  /** A height in a sentence, with its unit. */
  String sayHeight(double metres) {
    return unbroken(height(metres) + suffix());
  }

  /** A distance found: never more than it is. */
  String found(double metres) {
    return feet
        ? halfInches(2 * (long) Math.floor(metres / INCH + CRUMB))
        : fixed(Math.floor(metres * 100 + CRUMB) / 100, 2);
  }

  /** A distance found in a sentence, with its unit. */
  String sayFound(double metres) {
    return unbroken(found(metres) + suffix());
  }

  /** A distance required: never less than it is. */
  String required(double metres) {
    return feet
        ? halfInches(2 * (long) Math.ceil(metres / INCH - CRUMB))
        : fixed(Math.ceil(metres * 100 - CRUMB) / 100, 2);
  }

  /**
   * A distance found of one required. Where rounding would turn which is the greater, both are told
   * to the millimetre.
   */
  String foundOf(double found, double required) {
    boolean enough = found >= required;
    long least = (long) Math.floor(found / rounding() + CRUMB);
    long most = (long) Math.ceil(required / rounding() - CRUMB);
    if (enough == least >= most) {
      return found(found) + " of " + required(required);
    }
    double down = Math.floor(found * 1000 + CRUMB) / 1000;
    double up = Math.ceil(required * 1000 - CRUMB) / 1000;
    if (enough && down < up) {
      down = up;
    }
    return feet
        ? whole(down * 1000) + " of " + whole(up * 1000) + " mm"
        : fixed(down, 3) + " of " + fixed(up, 3);
  }

  private double rounding() {
    return feet ? INCH : 0.01;
  }

  /** A length to cut: never shorter than it is, to 10 mm or the inch. */
  String cut(double metres) {
    return required(metres);
  }

  /** A length to cut in a sentence, with its unit. */
  String sayCut(double metres) {
    return unbroken(cut(metres) + suffix());
  }

  /** A rope to cut: to 0.5 m or the foot, upward. */
  String ropeCut(double metres) {
    return feet
        ? halfInches(24 * (long) Math.ceil(metres / FOOT - CRUMB))
        : fixed(Math.ceil(metres * 2 - CRUMB) / 2, 1);
  }

  private static String halfInches(long halves) {
    long size = Math.abs(halves);
    long wholeFeet = size / 24;
    long rest = size % 24;
    String inches = rest / 2 + (rest % 2 == 1 ? "½" : "") + "″";
    if (rest == 1) {
      inches = "½″";
    }
    return (halves < 0 ? "−" : "") + wholeFeet + "′ " + inches;
  }

  /** Up to 10 mm. */
  static double upToCentimetre(double metres) {
    return Math.ceil(metres * 100 - CRUMB) / 100;
  }

  /** Up to half a metre. */
  static double upToHalfMetre(double metres) {
    return Math.ceil(metres * 2 - CRUMB) / 2;
  }

  /** A number with fixed decimals, a true minus and thin spaces in thousands. */
  static String fixed(double value, int decimals) {
    String digits = String.format(Locale.ROOT, "%." + decimals + "f", Math.abs(value));
    boolean nought = digits.chars().allMatch(c -> c == '0' || c == '.');
    int point = digits.indexOf('.') < 0 ? digits.length() : digits.indexOf('.');
    StringBuilder out = new StringBuilder(digits);
    for (int at = point - 3; at > 0 && point > 4; at -= 3) {
      out.insert(at, '\u2009');
    }
    return (value < 0 && !nought ? "−" : "") + out;
  }

  /** A whole number. */
  static String whole(double value) {
    return fixed(value, 0);
  }

  /** Kilograms to 0.1. */
  static String kilograms(double value) {
    return fixed(value, 1);
  }

  /** An angle to the degree, 0 to 359. */
  static String bearing(double degrees) {
    long whole = Math.floorMod(Math.round(degrees), 360);
    return String.format(Locale.ROOT, "%03d°", whole);
  }

  /** An angle to the degree. */
  static String degrees(double degrees) {
    return Math.round(degrees) + "°";
  }

  /** An impedance, "35 − j410 Ω". */
  static String impedance(double resistance, double reactance) {
    int decimals = Math.abs(resistance) < 10 ? 1 : 0;
    return fixed(resistance, decimals)
        + (reactance < 0 ? " − j" : " + j")
        + whole(Math.abs(reactance))
        + " Ω";
  }
}
