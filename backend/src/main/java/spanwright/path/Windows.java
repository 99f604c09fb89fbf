package spanwright.path;

import java.util.List;

/**
 * Every take-off window of a target on a frequency, and the one that is scored.
 *
 * @param all F2 first, then E, then sporadic E, each by hops; holds {@code scored}
 * @param scored the window whose gain counts
 * @param note what a reader should know, as a sentence; empty when there is nothing
 */
public record Windows(List<Window> all, Window scored, String note) {
  public Windows {
    all = List.copyOf(all);
  }
}
