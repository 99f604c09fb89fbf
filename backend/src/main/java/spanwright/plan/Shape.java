package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.Locale;

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
  INVERTED_L;

  /** The word for it in plan and result files. */
  public String word() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }
}
