package spanwright.sheet;

import java.util.List;
import spanwright.clearance.State;

/**
 * What is worked by: what a sweep should find, cautions. Metres and newtons unless said otherwise.
 */
public final class WorkParts {
  private WorkParts() {}

  /**
   * What a sweep at the station's end of the line should find.
   *
   * @param band name
   * @param frequency MHz
   * @param resistance ohm
   * @param reactance ohm
   * @param lineSwr at the load
   * @param match state of the match
   */
  public record Expected(
      String band,
      double frequency,
      double resistance,
      double reactance,
      double lineSwr,
      State match) {}

  /**
   * A caution.
   *
   * @param text a sentence
   * @param pressing whether it is marked
   */
  public record Caution(String text, boolean pressing) {}

  /**
   * The best placement for one set of consents.
   *
   * @param needs the consents in words, "no consent" when none
   * @param mastHeights of its new masts, foot to head [m]
   * @param zones where they stand
   * @param placement id
   * @param shape word
   * @param score decibels over the reference
   * @param here whether it is the placement of this sheet
   */
  public record Alternative(
      String needs,
      List<Double> mastHeights,
      List<String> zones,
      String placement,
      String shape,
      double score,
      boolean here) {
    public Alternative {
      mastHeights = List.copyOf(mastHeights);
      zones = List.copyOf(zones);
    }
  }

  /**
   * Something to measure and write down.
   *
   * @param when "before" or "after"
   * @param what to measure, and how
   * @param expect the figure as it reads, in the units asked for; empty when there is none
   */
  public record Measure(String when, String what, String expect) {}

  /**
   * A day to look at it all again.
   *
   * @param when date or time of year
   * @param what to look at
   */
  public record Inspection(String when, String what) {}
}
