package spanwright.path;

/**
 * A take-off window: the range of elevations that reach a target by one layer in a number of hops.
 *
 * @param layer that turns the wave back
 * @param hops number, from 1
 * @param fromDegrees least elevation, 0 to 90
 * @param toDegrees greatest elevation, not less than {@code fromDegrees}
 */
public record Window(Layer layer, int hops, double fromDegrees, double toDegrees) {
  /** Elevations are taken at least this close together when a window is averaged [degrees]. */
  private static final double STEP_DEGREES = 1.0;

  public Window {
    if (!(fromDegrees >= 0 && toDegrees >= fromDegrees && toDegrees <= 90)) {
      throw new IllegalArgumentException(
          "A take-off window from "
              + fromDegrees
              + " to "
              + toDegrees
              + " degrees is none: it has to lie between 0 and 90 degrees, least first.");
    }
  }

  /**
   * Elevations to average over: the middles of equal steps of at most one degree, at least three,
   * so that the mean of the gains there (as power) is the mean over the window.
   */
  public double[] elevationsDegrees() {
    int count = Math.max(3, (int) Math.ceil((toDegrees - fromDegrees) / STEP_DEGREES));
    double[] elevations = new double[count];
    for (int k = 0; k < count; k++) {
      elevations[k] = fromDegrees + (toDegrees - fromDegrees) * (k + 0.5) / count;
    }
    return elevations;
  }
}
