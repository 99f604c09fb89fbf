package spanwright.moments;

/**
 * Finds the greatest gain: from the best places of the sampled sky uphill, each step to the top of
 * the paraboloid through nine directions round about.
 */
final class PeakSearch {
  private static final int STARTS = 3;

  /** A start must come so near to the best found [power ratio]. */
  private static final double WORTH = 0.75;

  private static final double FIRST_STEP = 0.08;
  private static final double LAST_STEP = 2e-3;
  private static final int MOST_TURNS = 24;

  private final FarField field;
  private final boolean grounded;

  PeakSearch(FarField field, boolean grounded) {
    this.field = field;
    this.grounded = grounded;
  }

  /** The peak; gain is intensity times factor. */
  Peak find(FarField.Sky sky, double factor) {
    double[] left = sky.intensity().clone();
    double[] best = {-1, 0, 0};
    for (int s = 0; s < STARTS; s++) {
      int top = 0;
      for (int i = 1; i < left.length; i++) {
        if (left[i] > left[top] * (1 + 1e-7)) {
          top = i;
        }
      }
      if (s > 0 && left[top] < WORTH * best[0]) {
        break;
      }
      double azimuth = sky.azimuths()[top];
      double elevation = sky.elevations()[top];
      double[] found = climb(unit(azimuth, elevation));
      if (found[0] > best[0] * (1 + 1e-6)) {
        best = found;
      }
      for (int i = 0; i < left.length; i++) {
        if (near(sky.azimuths()[i], sky.elevations()[i], azimuth, elevation)) {
          left[i] = -1;
        }
      }
    }
    return new Peak(Gain.dbi(factor * best[0]), best[1], best[2]);
  }

  private static boolean near(double a1, double e1, double a2, double e2) {
    double cos = Math.sin(e1) * Math.sin(e2) + Math.cos(e1) * Math.cos(e2) * Math.cos(a1 - a2);
    return cos > Math.cos(4 * FIRST_STEP);
  }

  private static double[] unit(double azimuth, double elevation) {
    return new double[] {
      Math.sin(azimuth) * Math.cos(elevation),
      Math.cos(azimuth) * Math.cos(elevation),
      Math.sin(elevation)
    };
  }

  /** From a direction uphill: intensity, azimuth, elevation. */
  private double[] climb(double[] start) {
    double[] here = start;
    double[] best = {-1, 0, 0};
    double step = FIRST_STEP;
    for (int turn = 0; turn < MOST_TURNS && step > LAST_STEP; turn++) {
      double[] east = east(here);
      double[] north = cross(here, east);
      double[] azimuths = new double[9];
      double[] elevations = new double[9];
      for (int i = 0; i < 9; i++) {
        double[] d = shifted(here, east, north, step * (i % 3 - 1), step * (i / 3 - 1));
        azimuths[i] = Math.atan2(d[0], d[1]);
        elevations[i] = Math.asin(Math.max(-1, Math.min(1, d[2])));
      }
      double[] f = intensities(azimuths, elevations);
      int top = 4;
      for (int i = 0; i < 9; i++) {
        if (f[i] > f[top]) {
          top = i;
        }
      }
      if (f[top] > best[0]) {
        best = new double[] {f[top], azimuths[top], elevations[top]};
      }
      double[] move = summit(f);
      if (move != null && Math.abs(move[0]) <= 1.5 && Math.abs(move[1]) <= 1.5) {
        here = shifted(here, east, north, step * move[0], step * move[1]);
        step *= 0.3;
      } else if (top == 4) {
        step *= 0.4;
      } else {
        here = shifted(here, east, north, step * (top % 3 - 1), step * (top / 3 - 1));
      }
    }
    double full = 2 * Math.PI;
    best[1] = ((best[1] % full) + full) % full;
    return best;
  }

  /** Top of the paraboloid through nine values on a 3 x 3 grid, in steps; null if it has none. */
  private static double[] summit(double[] f) {
    double gx = (f[2] + f[5] + f[8] - f[0] - f[3] - f[6]) / 6;
    double gy = (f[6] + f[7] + f[8] - f[0] - f[1] - f[2]) / 6;
    double xx = (f[0] + f[3] + f[6] + f[2] + f[5] + f[8] - 2 * (f[1] + f[4] + f[7])) / 3;
    double yy = (f[0] + f[1] + f[2] + f[6] + f[7] + f[8] - 2 * (f[3] + f[4] + f[5])) / 3;
    double xy = (f[0] + f[8] - f[2] - f[6]) / 4;
    double det = xx * yy - xy * xy;
    if (!(xx < 0 && det > 1e-12 * xx * xx)) {
      return null;
    }
    return new double[] {(xy * gy - yy * gx) / det, (xy * gx - xx * gy) / det};
  }

  private static double[] east(double[] d) {
    double level = Math.hypot(d[0], d[1]);
    return level < 1e-9 ? new double[] {1, 0, 0} : new double[] {d[1] / level, -d[0] / level, 0};
  }

  private static double[] cross(double[] a, double[] b) {
    return new double[] {
      b[1] * a[2] - b[2] * a[1], b[2] * a[0] - b[0] * a[2], b[0] * a[1] - b[1] * a[0]
    };
  }

  private double[] shifted(double[] d, double[] east, double[] north, double u, double v) {
    double[] out = new double[3];
    double square = 0;
    for (int c = 0; c < 3; c++) {
      out[c] = d[c] + u * east[c] + v * north[c];
    }
    if (grounded) {
      out[2] = Math.max(0, out[2]);
    }
    for (int c = 0; c < 3; c++) {
      square += out[c] * out[c];
    }
    double size = Math.sqrt(square);
    for (int c = 0; c < 3; c++) {
      out[c] /= size;
    }
    return out;
  }

  private double[] intensities(double[] azimuths, double[] elevations) {
    double[] horizontal = new double[azimuths.length];
    double[] vertical = new double[azimuths.length];
    field.intensity(Directions.of(azimuths, elevations), horizontal, vertical);
    for (int i = 0; i < horizontal.length; i++) {
      horizontal[i] += vertical[i];
    }
    return horizontal;
  }
}
