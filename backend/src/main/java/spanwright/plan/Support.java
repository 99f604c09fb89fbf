package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonProperty;

/**
 * Something that stands and may hold a wire or a rope.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param kind what it is
 * @param at its place
 * @param lowest lowest height a rope can be fixed, metres above the local ground at that spot
 * @param highest highest, likewise
 * @param accuracy how far the heights may be off [m]
 * @param sway how far it moves in the gust [m]
 * @param pullLimit newtons, calm and in the gust; 0 means never use it; null means not known and
 *     not checked
 * @param canopy null where it has none
 * @param ropeOnly a rope may go there, no wire
 * @param agreedBy who allows its use, or null
 */
public record Support(
    String id,
    String name,
    Kind kind,
    Point at,
    double lowest,
    double highest,
    double accuracy,
    double sway,
    Double pullLimit,
    Canopy canopy,
    boolean ropeOnly,
    String agreedBy) {

  /** Kinds of support. */
  public enum Kind {
    @JsonProperty("tree")
    TREE,
    @JsonProperty("mast")
    MAST,
    @JsonProperty("pole")
    POLE,
    @JsonProperty("chimney")
    CHIMNEY,
    @JsonProperty("wall")
    WALL,
    @JsonProperty("other")
    OTHER
  }
}
