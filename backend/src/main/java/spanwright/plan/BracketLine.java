package spanwright.plan;

import java.util.List;

/**
 * An edge along which a bracket may be fixed.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param path the edge
 * @param lowest metres above the local ground at that spot
 * @param highest metres above the local ground at that spot
 * @param pullLimit newtons, or null when not known
 */
public record BracketLine(
    String id, String name, List<Point> path, double lowest, double highest, Double pullLimit) {
  public BracketLine {
    path = path == null ? List.of() : List.copyOf(path);
  }
}
