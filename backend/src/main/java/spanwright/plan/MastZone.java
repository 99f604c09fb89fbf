package spanwright.plan;

import java.util.List;

/**
 * An area where a new mast may stand.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param area corners in order, not closed
 * @param base height of a roof that the mast stands on, metres above the local ground at that spot
 * @param highest of the mast's top, metres above the ground there
 * @param guyRadius metres; 0 for none
 * @param pullLimit newtons, or null when not known
 * @param consents by rising height; empty when nothing is said
 */
public record MastZone(
    String id,
    String name,
    List<Point> area,
    double base,
    double highest,
    double guyRadius,
    Double pullLimit,
    List<Consent> consents) {
  public MastZone {
    area = area == null ? List.of() : List.copyOf(area);
    consents = consents == null ? List.of() : List.copyOf(consents);
  }
}
