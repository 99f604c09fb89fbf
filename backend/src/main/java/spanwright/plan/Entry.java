package spanwright.plan;

/**
 * Where the feed line enters the station.
 *
 * @param at its place
 * @param height metres above the local ground at that spot
 */
public record Entry(Point at, double height) {}
