package spanwright.moments;

/**
 * Insulation round a wire.
 *
 * @param radius outer radius [m], more than the conductor's
 * @param permittivity relative, 1 or more
 */
public record Sheath(double radius, double permittivity) {}
