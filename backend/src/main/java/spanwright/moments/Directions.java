package spanwright.moments;

/**
 * A batch of directions with their sines and cosines: made once, used for every placement and
 * frequency.
 */
public final class Directions {
  final int count;
  final double[] sinAzimuth;
  final double[] cosAzimuth;
  final double[] sinElevation;
  final double[] cosElevation;

  private Directions(double[] azimuths, double[] elevations) {
    count = azimuths.length;
    sinAzimuth = new double[count];
    cosAzimuth = new double[count];
    sinElevation = new double[count];
    cosElevation = new double[count];
    for (int i = 0; i < count; i++) {
      if (!Double.isFinite(azimuths[i]) || !Double.isFinite(elevations[i])) {
        throw new ModelFault("Direction " + i + " is not a number: give azimuth and elevation.");
      }
      sinAzimuth[i] = Math.sin(azimuths[i]);
      cosAzimuth[i] = Math.cos(azimuths[i]);
      sinElevation[i] = Math.sin(elevations[i]);
      cosElevation[i] = Math.cos(elevations[i]);
    }
  }

  /**
   * Directions one by one.
   *
   * @param azimuths radians clockwise from +y
   * @param elevations radians above the horizon, as many
   */
  public static Directions of(double[] azimuths, double[] elevations) {
    if (azimuths.length != elevations.length) {
      throw new ModelFault(
          azimuths.length + " azimuths but " + elevations.length + " elevations: give as many.");
    }
    return new Directions(azimuths, elevations);
  }

  /** All round at one elevation [rad]: {@code count} azimuths from +y clockwise. */
  public static Directions ring(int count, double elevation) {
    double[] azimuths = new double[count];
    double[] elevations = new double[count];
    for (int i = 0; i < count; i++) {
      azimuths[i] = 2 * Math.PI * i / count;
      elevations[i] = elevation;
    }
    return new Directions(azimuths, elevations);
  }

  /** One azimuth [rad], {@code count} elevations from {@code low} to {@code high} inclusive. */
  public static Directions profile(double azimuth, double low, double high, int count) {
    double[] azimuths = new double[count];
    double[] elevations = new double[count];
    for (int i = 0; i < count; i++) {
      azimuths[i] = azimuth;
      elevations[i] = count == 1 ? low : low + (high - low) * i / (count - 1);
    }
    return new Directions(azimuths, elevations);
  }

  /** How many. */
  public int count() {
    return count;
  }
}
