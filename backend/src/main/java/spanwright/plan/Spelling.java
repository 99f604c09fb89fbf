package spanwright.plan;

/** How near two spellings are, to guess what was meant. */
final class Spelling {
  private Spelling() {}

  /** Letters to add, drop or change from one word to the other (Levenshtein 1966), case ignored. */
  static int steps(String from, String to) {
    if (Math.abs(from.length() - to.length()) > 3) {
      return Integer.MAX_VALUE;
    }
    String a = from.toLowerCase(java.util.Locale.ROOT);
    String b = to.toLowerCase(java.util.Locale.ROOT);
    int[] row = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      row[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int corner = row[0];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int change = corner + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        corner = row[j];
        row[j] = Math.min(change, 1 + Math.min(row[j], row[j - 1]));
      }
    }
    return row[b.length()];
  }
}
