package spanwright.store;

import java.text.Normalizer;
import java.util.Locale;
import java.util.regex.Pattern;

/** Names of plans in the folder: a word from the title and a number. */
final class PlanIds {
  private static final Pattern SOUND = Pattern.compile("[a-z0-9]+(-[a-z0-9]+)*");
  private static final int LONGEST = 64;
  private static final int LONGEST_WORD = 40;

  private PlanIds() {}

  /** Whether a name can be a plan's: then, and only then, may it become part of a path. */
  static boolean isSound(String id) {
    return id != null && id.length() <= LONGEST && SOUND.matcher(id).matches();
  }

  /** The title in plain small letters: "Königs' Garten" gives "konigs-garten". */
  static String word(String title) {
    String plain =
        Normalizer.normalize(title == null ? "" : title, Normalizer.Form.NFKD)
            .replaceAll("['’]", "")
            .replaceAll("\\p{M}+", "")
            .toLowerCase(Locale.ROOT)
            .replaceAll("[^a-z0-9]+", "-");
    String cut = plain.substring(0, Math.min(plain.length(), LONGEST_WORD));
    String word = cut.replaceAll("^-+|-+$", "");
    return word.isEmpty() ? "plan" : word;
  }
}
