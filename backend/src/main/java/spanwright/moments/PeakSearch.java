package spanwright.moments;

/**
 * Finds the greatest gain: a grid fine enough for the wires' extent, then from its best places
 * uphill by halving steps.
 */
final class PeakSearch {
  private static final int STARTS = 3;
  private static final double LAST_STEP = 5e-4;

  private final FarField field;
  private final boolean grounded;
  private final double factor;

  /** Gain is intensity times factor. */
  PeakSearch(FarField field, boolean grounded, double factor) {
    this.field = field;
    this.grounded = grounded;
    this.factor = factor;
  }

  Peak find(double extent) {
    int up = Math.min(90, 9 + (int) (0.9 * extent)) * (grounded ? 1 : 2);
    int across = Math.min(144, 14 + (int) (1.2 * extent));
    double low = grounded ? 0 : -0.5 * Math.PI;
    double rise = (0.5 * Math.PI - low) / up;
    double[] azimuths = new double[across * (up + 1)];
    double[] elevations = new double[azimuths.length];
    for (int j = 0; j <= up; j++) {
      for (int i = 0; i < across; i++) {
        azimuths[j * across + i] = 2 * Math.PI * i / across;
        // without a ground level directions come first, and keep the peak where all are equal
        elevations[j * across + i] = low + rise * (grounded ? j : (j + up / 2) % (up + 1));
      }
    }
    double[] gain = gains(azimuths, elevations);
    double turn = 2 * Math.PI / across;
    double[] best = {-1, 0, 0};
    for (int s = 0; s < STARTS; s++) {
      int top = 0;
      for (int i = 1; i < gain.length; i++) {
        if (gain[i] > gain[top] * (1 + 1e-7)) {
          top = i;
        }
      }
      if (s > 0 && gain[top] < 0.5 * best[0]) {
        break;
      }
      double[] found = climb(azimuths[top], elevations[top], gain[top], Math.max(turn, rise));
      if (found[0] > best[0] * (1 + 1e-9)) {
        best = found;
      }
      for (int i = 0; i < gain.length; i++) {
        if (near(azimuths[i], elevations[i], azimuths[top], elevations[top], 2.5 * rise)) {
          gain[i] = -1;
        }
      }
    }
    return new Peak(Gain.dbi(best[0]), best[1], best[2]);
  }

  private static boolean near(double a1, double e1, double a2, double e2, double angle) {
    double cos = Math.sin(e1) * Math.sin(e2) + Math.cos(e1) * Math.cos(e2) * Math.cos(a1 - a2);
    return cos > Math.cos(angle);
  }

  private double[] climb(double azimuth, double elevation, double start, double step) {
    double[] here = {start, azimuth, elevation};
    while (step > LAST_STEP) {
      double stretch = 1 / Math.max(0.05, Math.cos(here[2]));
      double[] az = new double[8];
      double[] el = new double[8];
      for (int i = 0; i < 8; i++) {
        double t = Math.PI * i / 4;
        az[i] = here[1] + step * stretch * Math.sin(t);
        el[i] = here[2] + step * Math.cos(t);
        if (el[i] > 0.5 * Math.PI) {
          el[i] = Math.PI - el[i];
          az[i] += Math.PI;
        }
        el[i] = Math.max(el[i], grounded ? 0 : -0.5 * Math.PI);
      }
      double[] gain = gains(az, el);
      int top = 0;
      for (int i = 1; i < 8; i++) {
        if (gain[i] > gain[top]) {
          top = i;
        }
      }
      if (gain[top] > here[0] * (1 + 1e-12)) {
        here = new double[] {gain[top], az[top], el[top]};
      } else {
        step *= 0.4;
      }
    }
    double full = 2 * Math.PI;
    here[1] = ((here[1] % full) + full) % full;
    return here;
  }

  private double[] gains(double[] azimuths, double[] elevations) {
    double[] horizontal = new double[azimuths.length];
    double[] vertical = new double[azimuths.length];
    field.intensity(Directions.of(azimuths, elevations), horizontal, vertical);
    for (int i = 0; i < horizontal.length; i++) {
      horizontal[i] = factor * (horizontal[i] + vertical[i]);
    }
    return horizontal;
  }
}
