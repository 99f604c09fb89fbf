package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.List;

/**
 * An area with a rule.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param area corners in order, not closed
 * @param rule what it forbids
 * @param height headroom above the ground [m]; null for the other rules
 */
public record Zone(String id, String name, List<Point> area, Rule rule, Double height) {
  public Zone {
    area = area == null ? List.of() : List.copyOf(area);
  }

  /** Rules of a zone. */
  public enum Rule {
    @JsonProperty("no-wire")
    NO_WIRE,
    @JsonProperty("no-mast")
    NO_MAST,
    @JsonProperty("headroom")
    HEADROOM
  }
}
