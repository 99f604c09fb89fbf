package spanwright.clearance;

import com.fasterxml.jackson.annotation.JsonProperty;

/** The three states of anything checked, worst last. */
public enum State {
  @JsonProperty("clear")
  CLEAR,
  /** Allowed, but inside the margin. */
  @JsonProperty("tight")
  TIGHT,
  /** Not allowed. */
  @JsonProperty("foul")
  FOUL;

  /** The worse of two states. */
  public State worse(State other) {
    return compareTo(other) >= 0 ? this : other;
  }
}
