package spanwright.plan;

import java.util.List;

/**
 * A line of metal that is solved as a conductor.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param path z metres above the local ground at that spot
 * @param radius metres
 */
public record Metalwork(String id, String name, List<Place> path, double radius) {
  public Metalwork {
    path = path == null ? List.of() : List.copyOf(path);
  }
}
