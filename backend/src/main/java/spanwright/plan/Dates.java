package spanwright.plan;

import java.time.DateTimeException;
import java.time.LocalDate;

/** Dates in a plan: YYYY-MM-DD, of the calendar. */
final class Dates {
  private Dates() {}

  static boolean isDate(String text) {
    if (text == null || !text.matches("[0-9]{4}-[0-9]{2}-[0-9]{2}")) {
      return false;
    }
    try {
      LocalDate.parse(text);
      return true;
    } catch (DateTimeException e) {
      return false;
    }
  }
}
