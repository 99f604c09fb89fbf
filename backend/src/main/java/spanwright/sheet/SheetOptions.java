package spanwright.sheet;

import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.Locale;

/**
 * How a sheet is set out. The sheet reads no clock: whatever time it shows is given here.
 *
 * @param paper it prints on
 * @param units lengths are written in
 * @param savedAt when the plan was saved, as it shall read ("2026-05-14 14:58"), or null when it is
 *     not known
 * @param revision letter of the sheet, "A" for the first
 * @param date the sheet is issued on ("2026-05-14"), or null when it is not
 */
public record SheetOptions(Paper paper, Units units, String savedAt, String revision, String date) {

  public SheetOptions {
    paper = paper == null ? Paper.A4 : paper;
    units = units == null ? Units.METRES : units;
    revision = revision == null || revision.isBlank() ? "A" : revision;
  }

  /** The same, issued on a day ("2026-05-14"). */
  public SheetOptions on(String day) {
    return new SheetOptions(paper, units, savedAt, revision, day);
  }

  /** A first revision. */
  public SheetOptions(Paper paper, Units units, String savedAt) {
    this(paper, units, savedAt, "A", null);
  }

  /** A4, metres, no time. */
  public static SheetOptions standard() {
    return new SheetOptions(Paper.A4, Units.METRES, null);
  }

  /**
   * Options from the words of a query or a command line.
   *
   * @param paper "A4", "Letter" or null for A4
   * @param units "m", "ft" or null for metres
   * @param savedAt as it shall read, or null
   * @throws IllegalArgumentException with a sentence for people when a word is not known
   */
  public static SheetOptions of(String paper, String units, String savedAt) {
    return new SheetOptions(Paper.of(paper), Units.of(units), savedAt);
  }

  /** Sizes of paper, portrait. */
  public enum Paper {
    @JsonProperty("A4")
    A4(210, 297),
    @JsonProperty("Letter")
    LETTER(215.9, 279.4);

    private final double width;
    private final double height;

    Paper(double width, double height) {
      this.width = width;
      this.height = height;
    }

    /** Width in millimetres. */
    public double width() {
      return width;
    }

    /** Height in millimetres. */
    public double height() {
      return height;
    }

    /** As it reads on the sheet. */
    public String label() {
      return this == A4 ? "A4" : "Letter";
    }

    static Paper of(String word) {
      if (word == null || word.isBlank()) {
        return A4;
      }
      return switch (word.trim().toLowerCase(Locale.ROOT)) {
        case "a4" -> A4;
        case "letter" -> LETTER;
        default ->
            throw new IllegalArgumentException(
                "The paper of the sheet is not known. Ask for A4 or Letter.");
      };
    }
  }

  /** Units lengths are written in. */
  public enum Units {
    @JsonProperty("m")
    METRES,
    @JsonProperty("ft")
    FEET;

    static Units of(String word) {
      if (word == null || word.isBlank()) {
        return METRES;
      }
      return switch (word.trim().toLowerCase(Locale.ROOT)) {
        case "m" -> METRES;
        case "ft" -> FEET;
        default ->
            throw new IllegalArgumentException(
                "The units of the sheet are not known. Ask for m or ft.");
      };
    }
  }
}
