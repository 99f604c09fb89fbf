package spanwright.search;

import java.util.Locale;
import java.util.Optional;

/**
 * How much work a search may do. A budget of work, never of time, so that the answer is the same on
 * any machine and with any number of threads.
 */
public enum Effort {
  QUICK(6, 1, 2, 4_000, 1_600, 100, 16, 10),
  NORMAL(14, 2, 3, 16_000, 8_000, 800, 120, 24),
  THOROUGH(30, 3, 5, 60_000, 24_000, 3_000, 1_050, 40);

  /** Places tried in each mast zone, and along each bracket line a third of that. */
  final int mastPlaces;

  /** Heights tried at each place beside the highest. */
  final int heights;

  /** Lengths tried on each span. */
  final int lengths;

  /** Layouts made at most. */
  final int considered;

  /** Layouts hung and checked against every rule at most. */
  final int hung;

  /** Placements solved on the coarse mesh at band centres at most. */
  final int coarse;

  /** Placements assessed in full at most. */
  final int full;

  /** Refusals explained, with their cures, at most. */
  final int refusals;

  Effort(
      int mastPlaces,
      int heights,
      int lengths,
      int considered,
      int hung,
      int coarse,
      int full,
      int refusals) {
    this.mastPlaces = mastPlaces;
    this.heights = heights;
    this.lengths = lengths;
    this.considered = considered;
    this.hung = hung;
    this.coarse = coarse;
    this.full = full;
    this.refusals = refusals;
  }

  /** The word in files and on the command line. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** The effort of a word, if there is one. */
  public static Optional<Effort> find(String word) {
    for (Effort effort : values()) {
      if (effort.word().equals(word)) {
        return Optional.of(effort);
      }
    }
    return Optional.empty();
  }
}
