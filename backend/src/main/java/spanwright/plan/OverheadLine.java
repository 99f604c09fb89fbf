package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.List;

/**
 * A power or telephone line over or near the plot.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param path z metres above the local ground at that spot; joined straight after raising each by
 *     its ground
 * @param kind what it carries
 * @param clearance kept distance [m], or null for the default of its kind; smaller than the default
 *     counts only when authorised
 * @param authorisedBy or null
 * @param authorisedOn ISO date, or null
 */
public record OverheadLine(
    String id,
    String name,
    List<Place> path,
    Kind kind,
    Double clearance,
    String authorisedBy,
    String authorisedOn) {
  public OverheadLine {
    path = path == null ? List.of() : List.copyOf(path);
  }

  /** Kinds of overhead line. */
  public enum Kind {
    @JsonProperty("telephone")
    TELEPHONE,
    @JsonProperty("low-voltage")
    LOW_VOLTAGE,
    @JsonProperty("medium-voltage")
    MEDIUM_VOLTAGE,
    @JsonProperty("high-voltage")
    HIGH_VOLTAGE,
    @JsonProperty("unknown")
    UNKNOWN
  }
}
