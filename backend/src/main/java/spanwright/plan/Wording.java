package spanwright.plan;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/**
 * Every sentence that reading a plan can say, in one place; each is pinned by a test. The first
 * part names the thing by the name its author gave it. Numbers are put in by {@link #number}.
 */
enum Wording {
  // the text itself
  EMPTY("There is nothing in the file. A plan is a JSON object in braces."),
  TOO_BIG("The file has %s bytes; at most %s are allowed. Leave out what the plan does not need."),
  TOO_MUCH("The file holds more than %s values. Leave out points that change nothing."),
  NOT_UTF8("The file is not UTF-8 text from here on. Save it as UTF-8."),
  NOT_AN_OBJECT("A plan is a JSON object in braces, but this is %s."),
  ENDS_EARLY(
      "The text ends too early: something opened before is not closed. Check the last"
          + " brackets and quotes."),
  FOLLOWS_THE_END("Something follows the end of the plan. Take it out."),
  TOO_DEEP(
      "Brackets are nested more than %s deep; a plan needs no more than ten. Check for a"
          + " bracket too many."),
  TOO_LONG_A_NUMBER("A number here has more than %s digits. Write fewer."),
  TOO_LONG_A_TEXT("A text here has more than %s characters. Shorten it."),
  NOT_A_JSON_NUMBER(
      "%s is not a number that JSON knows. Give a plain number, or leave the field" + " out."),
  NOT_A_VALUE("%s is not a value. Texts stand in double quotes; yes and no are true and false."),
  COMMA_EXPECTED("Found %s where a comma or a closing bracket should stand."),
  NAME_EXPECTED(
      "Found %s where a field's name in double quotes should stand. Is there a comma too"
          + " many, or a quote missing?"),
  COLON_EXPECTED("Found %s where a colon should stand between a field's name and its value."),
  VALUE_EXPECTED("Found %s where a value should stand. Is a value missing, or a comma too many?"),
  WRONG_BRACKET(
      "Found %s, which does not close the bracket opened last. Check the brackets before"
          + " this place."),
  MISWRITTEN_NUMBER(
      "This number is not written as JSON has it: no leading zero, no plus sign, a"
          + " digit on both sides of the point."),
  BROKEN_TEXT(
      "A text is broken here by a line end or another control character. Close its quotes,"
          + " or write \\n for a line end."),
  BAD_ESCAPE(
      "A backslash in a text here is followed by something JSON does not know. Write \\\\ for"
          + " a backslash."),
  NO_COMMENTS("JSON has no comments. Put the remark into \"notes\"."),
  NOT_JSON("The text is not JSON from here on."),

  // fields, types and sizes
  TWICE("\"%s\" is there twice. Keep one."),
  UNKNOWN_FIELD("%s: \"%s\" is not a field of the plan format here. Take it out."),
  UNKNOWN_FIELD_LIKE("%s: \"%s\" is not a field of the plan format here. Did you mean \"%s\"?"),
  MISSING("%s: \"%s\" is missing. Add %s: %s."),
  MUST_BE("%s: %s must be %s; found %s."),
  NUMBER_IN_QUOTES("%s: %s must be %s; found %s. Write the number alone, without quotes and unit."),
  NOT_WHOLE("%s: %s must be a whole number; found %s."),
  NOT_FINITE("%s: %s holds a number too large to be used. Give a smaller one."),
  WRONG_FORMAT("%s: %s must be \"%s\", but is %s. This program reads no other."),
  FAR_AWAY(
      "%s: %s has the coordinate %s m; coordinates lie within 100 km (100000 m) of the plan's"
          + " origin. Is it in the right unit?"),
  TOO_MANY(
      "%s: %s: %s entries are too many, at most %s are allowed. Leave out those that change"
          + " nothing."),
  TOO_FEW("%s: %s: at least %s needed, found %s."),
  TOO_LONG("%s: %s has %s characters; at most %s are allowed. Shorten it."),
  NOTHING_WRITTEN("%s: %s is empty. Write something."),
  CONTROL_CHARACTER("%s: %s holds a control character (U+%s) as character %s. Take it out."),

  // ids and names
  SAME_ID("%s: the id \"%s\" is already that of %s. Give each thing its own."),
  SAME_BAND("Band %s: another band before it has the same name. Give each its own."),
  SAME_DATUM("Datum %s: another datum before it has the same name. Give each its own."),

  // outlines and paths
  FEW_CORNERS("%s: %s needs at least three corners, but has %s. Add the missing ones."),
  CLOSED_OUTLINE(
      "%s: the last corner of %s is the first again. Leave the last one out; the outline"
          + " closes by itself."),
  SAME_CORNER("%s: corners %s and %s of %s are on one spot. Leave one out."),
  CROSSES_ITSELF(
      "%s: %s crosses itself: the side from corner %s to %s meets the side from corner %s"
          + " to %s. Move a corner, or draw it again."),
  NO_AREA("%s: %s encloses no area. Its corners lie on one line; move one."),
  SHORT_PATH("%s: the path needs at least two points, but has %s. Add the missing ones."),
  SAME_POINT("%s: points %s and %s of the path are on one spot. Leave one out."),

  // heights and forms
  REACH_SWAPPED(
      "%s: the lowest height (%s m) is above the highest (%s m). Swap them, or measure"
          + " again."),
  CROWN_SWAPPED(
      "%s: the crown's foot (%s m) is above its top (%s m). Swap them, or measure again."),
  AMID_LEAVES(
      "%s: all of its reach (%s to %s m) lies among the leaves of %s (%s to %s m), where nothing can"
          + " be hoisted. Correct its place or the crown, or leave it out."),
  PEOPLE_SWAPPED("%s: the foot (%s m) is not below the top (%s m). Swap them, or measure again."),
  ROOF_SWAPPED("%s: the eaves (%s m) are above the ridge (%s m). Swap them, or measure again."),
  NO_RIDGE_LINE("%s: a %s roof needs a ridge line. Add \"ridgeLine\" with its two ends."),
  HALF_RIDGE_LINE("%s: the ridge line needs two ends, but has %s. Add the other."),
  RIDGE_POINT("%s: both ends of the ridge line are on one spot. Move one."),
  RIDGE_OUTSIDE(
      "%s: end %s of the ridge line lies %s m outside the footprint; at most %s m are"
          + " allowed. Move it onto the building."),
  BASE_TOO_HIGH(
      "%s: the base (%s m) is not below the highest top (%s m). Both are measured from the"
          + " ground; lower the base, or raise the top."),
  NO_HEADROOM("%s: a headroom zone needs its height. Add \"height\" in metres."),
  CONSENTS_NOT_RISING(
      "%s: the consents must rise; consent %s (%s m) is not above the one before it"
          + " (%s m). Put them in order."),
  CONSENTS_TOO_LOW(
      "%s: the consents reach only %s m, but a mast may be %s m high. Say what the"
          + " height above needs."),

  // where things are
  ZONE_OUTSIDE("%s: the area lies wholly outside the boundary. Move it, or the boundary."),
  ENTRY_OUTSIDE(
      "The entry lies %s m outside the boundary; at most %s m are allowed. Move it, or the"
          + " boundary."),
  NO_SUCH_EDGE("Boundary rule for edge %s: the boundary has edges 0 to %s. Correct the number."),
  EDGE_TWICE("Boundary rule for edge %s: there is one for that edge before it. Keep one."),
  DATUMS_TOGETHER("Datum %s: it is on the same spot as datum %s. Tapes need two spots; move one."),
  HALF_POSITION("The site: %s is given, but %s is not. Give both, or neither."),
  FEW_SPOTS(
      "The terrain: %s spot heights make no triangle; give at least three, or leave the terrain"
          + " out."),
  SAME_SPOT("The terrain: spot heights %s and %s are on one spot. Leave one out."),
  SPOTS_IN_LINE(
      "The terrain: all spot heights lie on one line and make no triangle. Add one to the"
          + " side."),
  FEW_PLACES(
      "There is %s to hang a wire; at least two are needed. Add a support, a bracket line, or"
          + " a mast zone together with new masts in the brief."),

  // overhead lines
  CLEARANCE_UNAUTHORISED(
      "%s: a kept distance of %s m is less than the %s m for a line of this kind. It counts"
          + " only with who allowed it (\"authorisedBy\") and on what day (\"authorisedOn\"); %s"
          + " missing. Ask the line's owner, or give %s."),
  DATE_TO_COME(
      "%s: authorisedOn is %s, which is still to come (today is %s). Give the day on which it was"
          + " allowed; until then the full distance is kept."),
  ROPE_NOT_AGREED(
      "%s: it stands %s m outside the boundary and takes a rope, but nobody is named who agreed."
          + " Ask, and put the name into \"agreedBy\"; or leave the support out."),
  BAD_DATE("%s: authorisedOn must be a date as YYYY-MM-DD, but is %s."),

  // brief
  IN_HERTZ("%s: %s looks like hertz. Frequencies are in MHz: write %s."),
  IN_KILOHERTZ("%s: %s looks like kilohertz. Frequencies are in MHz: write %s."),
  FREQUENCY_OUT("%s: %s MHz is outside the range the program works in, 1.8 to 54 MHz."),
  SAME_FREQUENCY("%s: %s MHz is there twice. Keep one."),
  NO_TARGET_KIND(
      "%s: it needs a bearing and a distance, or a radius of near-vertical cover. Add"
          + " \"bearing\" and \"distanceKm\", or \"nearVerticalKm\"."),
  BOTH_TARGET_KINDS(
      "%s: it has both a direction and near-vertical cover. Keep \"bearing\" and"
          + " \"distanceKm\", or keep \"nearVerticalKm\"."),
  HALF_TARGET("%s: %s is given, but %s is not. A far target needs both."),
  NO_SUCH_BAND("%s: there is no band called %s. The bands are %s."),
  ALL_WEIGHTS_ZERO(
      "The brief: every one of %s has the weight 0, so nothing could be ranked. Give at"
          + " least one a weight above 0."),
  NOT_IN_CATALOGUE("The brief: there is no %s called %s in the catalogue. Choose one of %s."),
  NO_SUCH_RULE("The rules: there is no rule called %s. Those that may be set are %s."),
  FIXED_RULE("The rules: \"%s\" may not be changed. Take it out."),
  RULE_TOO_LOW("The rules: \"%s\" may be set to %s %s at the least, but is %s %s."),
  RULE_TOO_HIGH("The rules: \"%s\" may be set to %s %s at the most, but is %s %s."),
  RANGE_SWAPPED("The matching unit: the least %s (%s) is above the most (%s). Swap them.");

  private final String form;

  Wording(String form) {
    this.form = form;
  }

  /** The sentence with its parts put in. */
  String with(Object... parts) {
    Object[] words = new Object[parts.length];
    for (int i = 0; i < parts.length; i++) {
      words[i] = parts[i] instanceof Double value ? number(value) : parts[i];
    }
    return String.format(Locale.ROOT, form, words);
  }

  /** A number as people write it: seven digits at most, no trailing zeros. */
  static String number(double value) {
    if (value == 0 || Double.isNaN(value) || Double.isInfinite(value)) {
      return value == 0 ? "0" : String.valueOf(value);
    }
    BigDecimal rounded = new BigDecimal(value).round(new MathContext(7)).stripTrailingZeros();
    int tens = rounded.precision() - rounded.scale() - 1;
    return tens >= -3 && tens < 12
        ? rounded.toPlainString()
        : rounded.scaleByPowerOfTen(-tens).toPlainString() + "e" + tens;
  }

  /** A user's text in quotes, shortened, with nothing in it that could upset a terminal. */
  static String quoted(String text) {
    return "\"" + clean(text) + "\"";
  }

  /** A user's text, shortened, with nothing in it that could upset a terminal. */
  static String clean(String text) {
    StringBuilder shown = new StringBuilder();
    text.codePoints()
        .limit(41)
        .forEach(
            c -> shown.appendCodePoint(Texts.isForbidden(c) || c == '\n' || c == '\r' ? '?' : c));
    return text.codePointCount(0, text.length()) > 40
        ? shown.substring(0, shown.offsetByCodePoints(0, 40)) + "…"
        : shown.toString();
  }

  /** Words as "a, b or c". */
  static String either(List<String> words) {
    if (words.size() < 2) {
      return words.isEmpty() ? "none" : words.get(0);
    }
    String front = words.subList(0, words.size() - 1).stream().collect(Collectors.joining(", "));
    return front + " or " + words.get(words.size() - 1);
  }
}
