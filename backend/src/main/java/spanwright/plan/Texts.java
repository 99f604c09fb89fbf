package spanwright.plan;

/** What text may hold. */
final class Texts {
  private Texts() {}

  /** Whether a code point may not stand in a text: controls, separators of lines, half pairs. */
  static boolean isForbidden(int codePoint) {
    return switch (Character.getType(codePoint)) {
      case Character.CONTROL,
          Character.SURROGATE,
          Character.LINE_SEPARATOR,
          Character.PARAGRAPH_SEPARATOR ->
          true;
      default -> false;
    };
  }

  /**
   * Index (in code points, from 0) of the first forbidden one, or −1; line breaks may be let by.
   */
  static int findForbidden(String text, boolean lineBreaks) {
    int index = 0;
    for (int at = 0; at < text.length(); index++) {
      int codePoint = text.codePointAt(at);
      boolean isBreak = codePoint == '\n' || codePoint == '\r';
      if (isForbidden(codePoint) && !(lineBreaks && isBreak)) {
        return index;
      }
      at += Character.charCount(codePoint);
    }
    return -1;
  }
}
