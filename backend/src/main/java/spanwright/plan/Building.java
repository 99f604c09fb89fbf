package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.List;

/**
 * A building: a solid under its real roof.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param footprint corners in order, not closed
 * @param eaves metres above the local ground at that spot
 * @param ridge metres above the local ground at that spot; a flat roof given one above its eaves
 *     counts as a block up to the ridge
 * @param metalRoof warned about, not modelled
 * @param roof its form
 * @param ridgeLine two points, or empty where the form needs none: flat roofs, hips that come to a
 *     point, and gables and lean-tos that do not rise; for a lean-to its high edge
 */
public record Building(
    String id,
    String name,
    List<Point> footprint,
    double eaves,
    double ridge,
    boolean metalRoof,
    Roof roof,
    List<Point> ridgeLine) {
  public Building {
    footprint = footprint == null ? List.of() : List.copyOf(footprint);
    ridgeLine = ridgeLine == null ? List.of() : List.copyOf(ridgeLine);
  }

  /** Forms of roof. */
  public enum Roof {
    @JsonProperty("flat")
    FLAT,
    @JsonProperty("gable")
    GABLE,
    @JsonProperty("hip")
    HIP,
    @JsonProperty("lean-to")
    LEAN_TO
  }
}
