package spanwright.sheet;

import java.util.List;
import spanwright.clearance.State;

/** The overhead lines of a sheet: first of all. Metres and newtons unless said otherwise. */
public final class OverheadParts {
  private OverheadParts() {}

  /**
   * Overhead lines, first of all.
   *
   * @param say what to read aloud before work
   * @param lines every line of the plan, power before telephone, the nearest first
   */
  public record Overhead(List<String> say, List<Line> lines) {
    public Overhead {
      say = List.copyOf(say);
      lines = List.copyOf(lines);
    }
  }

  /**
   * One overhead line.
   *
   * @param id in the plan
   * @param name shown to people
   * @param kind word of the plan format
   * @param lowest height above the ground under its points [m]
   * @param highest likewise
   * @param keep kept distance [m], or null when no check of it was made
   * @param nearest of anything of ours, calm or in the gust; null when none was made
   * @param wireLetGo if a wire lets go; null when the rule asks nothing
   * @param mastFalls if a mast falls; null when the rule asks nothing
   * @param authority who allowed a smaller distance and when, or null
   */
  public record Line(
      String id,
      String name,
      String kind,
      double lowest,
      double highest,
      Double keep,
      Reach nearest,
      Reach wireLetGo,
      Reach mastFalls,
      String authority) {}

  /**
   * A distance to an overhead line against what is required.
   *
   * @param what which part of ours
   * @param distance found [m]
   * @param required [m]
   * @param state clear, tight or foul
   */
  public record Reach(String what, double distance, double required, State state) {}
}
