package spanwright.sheet;

import java.util.List;
import java.util.Locale;

/**
 * Fields, rows and sections of CSV (RFC 4180), and figures as they stand in it. Fields that hold a
 * comma, a quote or a line break are quoted; a field of words that a spreadsheet would take for a
 * formula is given an apostrophe.
 */
final class CsvText {
  private final StringBuilder out = new StringBuilder();
  private final Figures figures;
  private final boolean metric;

  CsvText(SheetOptions.Units units) {
    this.figures = new Figures(units);
    this.metric = units == SheetOptions.Units.METRES;
  }

  Figures figures() {
    return figures;
  }

  /** The unit behind a heading. */
  String unit() {
    return " (" + figures.unit() + ")";
  }

  boolean metric() {
    return metric;
  }

  String length(double metres) {
    return metric ? plain(metres, 2) : figures.length(metres);
  }

  /** A length that may not be known. */
  String length(Double metres) {
    return metres == null ? "" : length(metres.doubleValue());
  }

  String required(double metres) {
    return metric ? plain(Figures.upToCentimetre(metres), 2) : figures.required(metres);
  }

  /** A distance found, never more than it is. */
  String found(double metres) {
    return metric ? plain(Math.floor(metres * 100 + 1e-6) / 100, 2) : figures.found(metres);
  }

  /** A number that may not be known, rounded down. */
  static String down(Double value, int decimals) {
    double tens = Math.pow(10, decimals);
    return value == null ? "" : plain(Math.floor(value * tens + 1e-6) / tens, decimals);
  }

  /** A number that a program reads: point, plain minus, no spaces. */
  static String plain(double value, int decimals) {
    String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
    return text.matches("-0(\\.0+)?") ? text.substring(1) : text;
  }

  void section(String title, String... headings) {
    if (!out.isEmpty()) {
      out.append("\r\n");
    }
    row(title);
    row(headings);
  }

  void row(String... fields) {
    for (int i = 0; i < fields.length; i++) {
      out.append(i == 0 ? "" : ",").append(field(fields[i]));
    }
    out.append("\r\n");
  }

  /** A field, made harmless to spreadsheets and quoted where it has to be. */
  static String field(String text) {
    String safe = text;
    boolean number = text.matches("-?\\d+(\\.\\d+)?");
    if (!number && !text.isEmpty() && "=+-@\t\r\n".indexOf(text.charAt(0)) >= 0) {
      safe = "'" + text;
    }
    if (safe.contains(",") || safe.contains("\"") || safe.contains("\n") || safe.contains("\r")) {
      return '"' + safe.replace("\"", "\"\"") + '"';
    }
    return safe;
  }

  void sentences(String title, List<String> sentences) {
    section(title, "Step", "Text");
    for (int i = 0; i < sentences.size(); i++) {
      row(String.valueOf(i + 1), sentences.get(i));
    }
  }

  /** All that was written. */
  String all() {
    return out.toString();
  }
}
