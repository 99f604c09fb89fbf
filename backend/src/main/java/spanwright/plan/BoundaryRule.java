package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonProperty;

/**
 * What may pass over one edge of the boundary.
 *
 * @param edge edge n runs from boundary point n to n + 1, from 0
 * @param overhang what may pass
 * @param agreedBy who agreed, or null
 */
public record BoundaryRule(int edge, Overhang overhang, String agreedBy) {

  /** What may pass over an edge. */
  public enum Overhang {
    @JsonProperty("none")
    NONE,
    @JsonProperty("ropes")
    ROPES,
    @JsonProperty("wires")
    WIRES
  }
}
