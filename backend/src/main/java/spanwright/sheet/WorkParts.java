package spanwright.sheet;

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
}
