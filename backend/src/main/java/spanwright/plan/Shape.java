package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonProperty;

/** Shapes a wire may be hung in. */
public enum Shape {
  @JsonProperty("level")
  LEVEL,
  @JsonProperty("sloping")
  SLOPING,
  /** Legs fall from a high middle. */
  @JsonProperty("apex")
  APEX,
  /** Bent in plan about a held middle. */
  @JsonProperty("bent")
  BENT,
  @JsonProperty("drooping")
  DROOPING,
  @JsonProperty("off-centre")
  OFF_CENTRE,
  @JsonProperty("loop")
  LOOP,
  @JsonProperty("inverted-l")
  INVERTED_L
}
