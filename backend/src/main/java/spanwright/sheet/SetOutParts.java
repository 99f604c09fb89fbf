package spanwright.sheet;

import java.util.List;
import spanwright.plan.Place;

/** Setting out by two tapes. Metres and newtons unless said otherwise. */
public final class SetOutParts {
  private SetOutParts() {}

  /**
   * Setting out by two tapes.
   *
   * @param a first known point
   * @param b second known point
   * @param c third known point, for the check; null when the plan has none off the line A to B
   * @param points numbered from 1
   * @param proposed a new datum to drive, for points that no known points serve; null when there
   *     are none, or nothing serves them
   * @param notes as sentences
   */
  public record SetOut(
      Known a, Known b, Known c, List<Mark> points, Proposed proposed, List<String> notes) {
    public SetOut {
      points = List.copyOf(points);
      notes = List.copyOf(notes);
    }
  }

  /**
   * A place for a new datum.
   *
   * @param known its letter, words and place
   * @param fixed the two tapes that it is set out by
   * @param side of the line between those two, walking from the first: "left", "right" or "on"
   */
  public record Proposed(Known known, Pair fixed, String side) {}

  /**
   * A known point that a tape is held at.
   *
   * @param letter on sheet and drawing
   * @param what it is, in words
   * @param at its place, z of the ground there
   */
  public record Known(String letter, String what, Place at) {}

  /**
   * A point to set out.
   *
   * @param number in its black square
   * @param name in words
   * @param at the point on the ground, z of the ground there
   * @param fromA level tape [m]
   * @param fromB level tape [m]
   * @param side of the line from A to B, walking from A: "left", "right" or "on"
   * @param check level tape from C [m], or null
   * @param crossing angle at which the two tapes cross [degrees]
   * @param flat whether that is under 30° or over 150°
   * @param blocked what stands in the way of a tape, as words, or null
   * @param better what to use instead when it is flat or blocked, or null
   * @param bearing true, from A [degrees]
   * @param magnetic by the compass, from A [degrees]
   * @param height of what is there above the ground [m]
   */
  public record Mark(
      int number,
      String name,
      Place at,
      double fromA,
      double fromB,
      String side,
      Double check,
      double crossing,
      boolean flat,
      String blocked,
      Pair better,
      double bearing,
      double magnetic,
      double height) {
    /** How {@link #blocked} begins for what stands on a building. */
    static final String ON = "on ";

    /** Whether it must be set out otherwise, and nothing is known that serves. */
    boolean waits() {
      return (flat || blocked != null) && better == null && !onBuilding();
    }

    /** Whether it stands on a building, where no tape from the ground is level. */
    boolean onBuilding() {
      return blocked != null && blocked.startsWith(ON);
    }

    Mark with(Pair pair) {
      return new Mark(
          number, name, at, fromA, fromB, side, check, crossing, flat, blocked, pair, bearing,
          magnetic, height);
    }
  }

  /**
   * Two tapes that serve better than those from A and B.
   *
   * @param from first known point
   * @param fromTape level tape [m]
   * @param with second known point
   * @param withTape level tape [m]
   * @param crossing angle at which they cross [degrees]
   */
  public record Pair(String from, double fromTape, String with, double withTape, double crossing) {}
}
