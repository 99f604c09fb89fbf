package spanwright.plan;

/**
 * What the ground is to a radio wave.
 *
 * @param permittivity relative, at least 1
 * @param conductivity S/m
 */
public record Soil(double permittivity, double conductivity) {}
