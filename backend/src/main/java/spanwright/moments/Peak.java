package spanwright.moments;

/**
 * The greatest gain over all directions.
 *
 * @param dbi total gain
 * @param azimuth radians clockwise from +y
 * @param elevation radians above the horizon
 */
public record Peak(double dbi, double azimuth, double elevation) {}
