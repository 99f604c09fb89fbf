package spanwright.plan;

/**
 * The crown of a tree: a round volume about its stem.
 *
 * @param radius metres
 * @param from foot of the crown, metres above the local ground at that spot
 * @param to top of the crown, metres above the local ground at that spot
 */
public record Canopy(double radius, double from, double to) {}
