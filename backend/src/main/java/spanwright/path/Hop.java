package spanwright.path;

/**
 * One hop: a straight ray from the ground to a mirror at a height and down again, over a sphere.
 *
 * <p>Elevation &delta; for a ground range d and mirror height h: tan &delta; = cot(d/2R) &minus;
 * R/(R + h)&middot;cosec(d/2R). The geometry is exact; Recommendations ITU-R P.533 and P.1240 use
 * this form (from memory). Straight rays: the refraction on the way up is in the choice of the
 * height.
 */
public final class Hop {
  /** Mean radius of the earth (IUGG 1980, mean radius R1, rounded) [km]. */
  public static final double EARTH_RADIUS_KM = 6371;

  private Hop() {}

  /**
   * Elevation at which a ray leaves.
   *
   * @param rangeKm ground range of the hop, 0 or more and under half round the earth [km]
   * @param heightKm mirror height, over 0 [km]
   * @return radians; negative when the mirror is below the horizon at half way
   */
  public static double elevation(double rangeKm, double heightKm) {
    requireHeight(heightKm);
    if (!(rangeKm >= 0 && rangeKm < Math.PI * EARTH_RADIUS_KM)) {
      throw new IllegalArgumentException(
          "A hop of " + rangeKm + " km is none: give 0 km or more, under half round the earth.");
    }
    double half = rangeKm / (2 * EARTH_RADIUS_KM);
    double mirror = EARTH_RADIUS_KM + heightKm;
    // (R + h) cos(half) − R over (R + h) sin(half), the cosine's small difference taken exactly
    double sinQuarter = Math.sin(half / 2);
    double rise = heightKm - 2 * mirror * sinQuarter * sinQuarter;
    return Math.atan2(rise, mirror * Math.sin(half));
  }

  /**
   * Ground range of the hop that leaves at an elevation.
   *
   * @param elevation radians, 0 to &pi;/2
   * @param heightKm mirror height, over 0 [km]
   * @return kilometres
   */
  public static double rangeKm(double elevation, double heightKm) {
    return 2 * EARTH_RADIUS_KM * (Math.PI / 2 - elevation - incidence(elevation, heightKm));
  }

  /**
   * Angle between the ray and the vertical at the mirror: sin i = R cos &delta; / (R + h).
   *
   * @param elevation at the ground, radians, 0 to &pi;/2
   * @param heightKm mirror height, over 0 [km]
   * @return radians
   */
  public static double incidence(double elevation, double heightKm) {
    requireHeight(heightKm);
    if (!(elevation >= 0 && elevation <= Math.PI / 2)) {
      throw new IllegalArgumentException(
          "An elevation of " + elevation + " rad is outside 0 to half pi: a ray has to go up.");
    }
    return Math.asin(EARTH_RADIUS_KM * Math.cos(elevation) / (EARTH_RADIUS_KM + heightKm));
  }

  private static void requireHeight(double heightKm) {
    if (!(heightKm > 0 && heightKm < 2000)) {
      throw new IllegalArgumentException(
          "A mirror height of " + heightKm + " km is outside what the ionosphere has (0 to 2000).");
    }
  }
}
