package spanwright.plan;

/**
 * A sleeve on a wire.
 *
 * @param radius outer [m]
 * @param permittivity relative
 */
public record Insulation(double radius, double permittivity) {}
