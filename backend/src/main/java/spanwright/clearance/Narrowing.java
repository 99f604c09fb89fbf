package spanwright.clearance;

/**
 * The least value along a segment of a field that changes by no more than a given rate for each
 * metre: halving until no piece can hold anything lower.
 */
final class Narrowing {
  /** A field in space. */
  interface Field {
    double at(double x, double y, double z);
  }

  private static final double TOLERANCE = 0.002;

  private final Field field;
  private final double rate;
  private double[] p;
  private int a;
  private double enough;
  private double best;
  private double bound;

  double x;
  double y;
  double z;

  Narrowing(Field field, double rate) {
    this.field = field;
    this.rate = rate;
  }

  /**
   * A value no greater than the least along points a to a + 3 of p.
   *
   * @param enoughValue where the least lies above this, the answer may be rough, but not under it
   */
  double least(double[] points, int from, double enoughValue) {
    p = points;
    a = from;
    enough = enoughValue;
    best = Double.POSITIVE_INFINITY;
    bound = Double.POSITIVE_INFINITY;
    double dx = p[a + 3] - p[a];
    double dy = p[a + 4] - p[a + 1];
    double dz = p[a + 5] - p[a + 2];
    double first = value(0);
    double last = value(1);
    search(0, 1, first, last, Math.sqrt(dx * dx + dy * dy + dz * dz) * rate);
    return Math.min(best, bound);
  }

  private double value(double t) {
    double px = p[a] + t * (p[a + 3] - p[a]);
    double py = p[a + 1] + t * (p[a + 4] - p[a + 1]);
    double pz = p[a + 2] + t * (p[a + 5] - p[a + 2]);
    double v = field.at(px, py, pz);
    if (v < best) {
      best = v;
      x = px;
      y = py;
      z = pz;
    }
    return v;
  }

  private void search(double from, double to, double atFrom, double atTo, double change) {
    double lower = (atFrom + atTo - change) / 2;
    if (lower >= enough || lower >= best - TOLERANCE || change < 1e-4) {
      bound = Math.min(bound, Math.max(lower, Math.min(atFrom, atTo) - TOLERANCE));
      return;
    }
    double middle = (from + to) / 2;
    double atMiddle = value(middle);
    if (atFrom <= atTo) {
      search(from, middle, atFrom, atMiddle, change / 2);
      search(middle, to, atMiddle, atTo, change / 2);
    } else {
      search(middle, to, atMiddle, atTo, change / 2);
      search(from, middle, atFrom, atMiddle, change / 2);
    }
  }
}
