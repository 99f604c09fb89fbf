package spanwright.moments;

import java.util.ArrayList;
import java.util.List;

/**
 * Finds the greatest gain: from the best places of the sampled sky uphill, each step to the top of
 * the paraboloid through nine directions round about.
 */
final class PeakSearch {
  private static final int STARTS = 3;

  /** Of the grid round a place. */
  private static final int POINTS = 9;

  /** A start must come so near to the best sampled [power ratio]. */
  private static final double WORTH = 0.75;

  private static final double FIRST_STEP = 0.08;
  private static final double LAST_STEP = 5e-3;
  private static final int MOST_TURNS = 24;

  private final FarField field;
  private final boolean grounded;

  PeakSearch(FarField field, boolean grounded) {
    this.field = field;
    this.grounded = grounded;
  }

  /** The peak; gain is intensity times factor. */
  Peak find(FarField.Sky sky, double factor) {
    List<Climb> climbs = starts(sky);
    List<Climb> going = new ArrayList<>(climbs);
    for (int turn = 0; turn < MOST_TURNS && !going.isEmpty(); turn++) {
      double[] f = intensities(going);
      for (int i = 0; i < going.size(); i++) {
        going.get(i).turn(f, POINTS * i);
      }
      going.removeIf(climb -> climb.step <= LAST_STEP);
    }
    Climb best = climbs.get(0);
    for (Climb climb : climbs) {
      best = climb.most > best.most * (1 + 1e-6) ? climb : best;
    }
    double azimuth = Math.atan2(best.top[0], best.top[1]);
    double elevation = Math.asin(Math.max(-1, Math.min(1, best.top[2])));
    return new Peak(
        Gain.dbi(factor * best.most), azimuth < 0 ? azimuth + 2 * Math.PI : azimuth, elevation);
  }

  /** From the best of the sampled sky, and from others nearly as good that lie well apart. */
  private List<Climb> starts(FarField.Sky sky) {
    double[] left = sky.intensity().clone();
    List<Climb> climbs = new ArrayList<>();
    double best = 0;
    while (climbs.size() < STARTS) {
      int top = 0;
      for (int i = 1; i < left.length; i++) {
        if (left[i] > left[top] * (1 + 1e-7)) {
          top = i;
        }
      }
      if (!climbs.isEmpty() && left[top] < WORTH * best) {
        break;
      }
      best = Math.max(best, left[top]);
      double[] start = unit(sky.azimuths()[top], sky.elevations()[top]);
      climbs.add(new Climb(start));
      for (int i = 0; i < left.length; i++) {
        if (left[i] >= WORTH * best && near(unit(sky.azimuths()[i], sky.elevations()[i]), start)) {
          left[i] = -1;
        }
      }
    }
    return climbs;
  }

  private static boolean near(double[] a, double[] b) {
    return a[0] * b[0] + a[1] * b[1] + a[2] * b[2] > Math.cos(4 * FIRST_STEP);
  }

  private static double[] unit(double azimuth, double elevation) {
    return new double[] {
      Math.sin(azimuth) * Math.cos(elevation),
      Math.cos(azimuth) * Math.cos(elevation),
      Math.sin(elevation)
    };
  }

  /** One way uphill. */
  private final class Climb {
    private double[] here;
    private double[] east;
    private double[] north;
    private double step = FIRST_STEP;
    private double[] top;
    private double most = -1;

    Climb(double[] start) {
      here = start;
      top = start;
    }

    /** Directions on a 3 x 3 grid round about. */
    void look(double[] x, double[] y, double[] z, int at) {
      east = east(here);
      north = cross(here, east);
      for (int i = 0; i < POINTS; i++) {
        double[] d = shifted(here, east, north, step * (i % 3 - 1), step * (i / 3 - 1));
        x[at + i] = d[0];
        y[at + i] = d[1];
        z[at + i] = d[2];
      }
    }

    /** A step, given the intensities on the grid. */
    void turn(double[] all, int at) {
      double[] f = java.util.Arrays.copyOfRange(all, at, at + POINTS);
      int highest = 4;
      for (int i = 0; i < POINTS; i++) {
        highest = f[i] > f[highest] ? i : highest;
      }
      double u = step * (highest % 3 - 1);
      double v = step * (highest / 3 - 1);
      if (f[highest] > most) {
        most = f[highest];
        top = shifted(here, east, north, u, v);
      }
      double[] move = summit(f);
      if (move != null && Math.abs(move[0]) <= 1.5 && Math.abs(move[1]) <= 1.5) {
        here = shifted(here, east, north, step * move[0], step * move[1]);
        step *= 0.3;
      } else if (highest == 4) {
        step *= 0.4;
      } else {
        here = shifted(here, east, north, u, v);
      }
    }
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

  private double[] intensities(List<Climb> climbs) {
    int n = POINTS * climbs.size();
    double[] x = new double[n];
    double[] y = new double[n];
    double[] z = new double[n];
    for (int i = 0; i < climbs.size(); i++) {
      climbs.get(i).look(x, y, z, POINTS * i);
    }
    double[] horizontal = new double[n];
    double[] vertical = new double[n];
    field.intensity(Directions.toward(x, y, z), horizontal, vertical);
    for (int i = 0; i < n; i++) {
      horizontal[i] += vertical[i];
    }
    return horizontal;
  }
}
