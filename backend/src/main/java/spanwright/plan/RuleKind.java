package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonProperty;

/**
 * A rule with its default and where that comes from.
 *
 * @param id unique among rules
 * @param name in words
 * @param defaultValue in the unit
 * @param unit of the value: "m", "degrees", "×" for a share, or empty
 * @param least the lowest value a brief may set, or null when it may not be changed
 * @param most the highest value a brief may set, or null when it may not be changed
 * @param source where the default comes from
 */
public record RuleKind(
    String id,
    String name,
    @JsonProperty("default") double defaultValue,
    String unit,
    Double least,
    Double most,
    String source) {

  /** Whether a brief may set another value. */
  public boolean mayChange() {
    return least != null && most != null;
  }
}
