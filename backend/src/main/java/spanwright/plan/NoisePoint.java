package spanwright.plan;

/**
 * Something that makes radio noise; shown as a distance.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param at its place
 * @param note or null
 */
public record NoisePoint(String id, String name, Point at, String note) {}
