package spanwright.plan;

import java.util.List;

/**
 * Where people are: no wire comes into it.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param area corners in order, not closed
 * @param from metres above the local ground at that spot
 * @param to metres above the local ground at that spot
 */
public record PeopleVolume(String id, String name, List<Point> area, double from, double to) {
  public PeopleVolume {
    area = area == null ? List.of() : List.copyOf(area);
  }
}
