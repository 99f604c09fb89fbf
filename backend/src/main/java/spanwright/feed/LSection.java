package spanwright.feed;

/**
 * A load, the part next to it and the part toward the transmitter: one of the four layouts of an L,
 * or the last two thirds of a T.
 *
 * <p>With the first part across, w0 = g0 + jb0 is the load's admittance and N the wanted
 * resistance; with the first part in series, w0 is its impedance and N the wanted conductance. The
 * first part makes it w = g + jb, g = g0 + t/Q1, b = b0 + st; the second adds to 1/w = (g &minus;
 * jb)/m, m = g&sup2; + b&sup2;, what cancels the imaginary part: t2 = sb/m. What is left must be N:
 *
 * <p>N(g&sup2; + b&sup2;) = g + sb/Q2, a quadratic in t. Exact with the parts' losses.
 */
final class LSection {
  private final Part first;
  private final Part second;
  private final double loadRe;
  private final double loadIm;
  private final double wanted;
  private final double targetOhm;
  private final int sign;

  /**
   * @param r load resistance [ohm]
   * @param x load reactance [ohm]
   * @param first next to the load
   * @param second toward the transmitter, of the other kind and the other connection
   * @param targetOhm to be shown to the transmitter
   */
  LSection(double r, double x, Part first, Part second, double targetOhm) {
    this.first = first;
    this.second = second;
    this.targetOhm = targetOhm;
    sign = first.sign();
    if (first.series()) {
      loadRe = r;
      loadIm = x;
      wanted = 1 / targetOhm;
    } else {
      double size = r * r + x * x;
      loadRe = r / size;
      loadIm = -x / size;
      wanted = targetOhm;
    }
  }

  Part first() {
    return first;
  }

  Part second() {
    return second;
  }

  /**
   * Every exact match, whatever the parts' ranges.
   *
   * @return [t1, t2, t1, t2], of which the first {@code 2n} count, n the matches there are
   */
  double[] exact() {
    double q1 = first.dissipation();
    double q2 = second.dissipation();
    double a = wanted * (1 + q1 * q1);
    double half = wanted * (loadRe * q1 + sign * loadIm) - (q1 + q2) / 2;
    double c = wanted * (loadRe * loadRe + loadIm * loadIm) - loadRe - sign * loadIm * q2;
    double discriminant = half * half - a * c;
    if (!(discriminant >= 0)) {
      return new double[0];
    }
    double far = -half - Math.copySign(Math.sqrt(discriminant), half);
    double[] roots = far == 0 ? new double[] {0} : new double[] {far / a, c / far};
    double[] found = new double[2 * roots.length];
    int n = 0;
    for (double t : roots) {
      double back = secondFor(t);
      if (t >= 0 && back >= 0) {
        found[n++] = t;
        found[n++] = back;
      }
    }
    return java.util.Arrays.copyOf(found, n);
  }

  private double secondFor(double t) {
    double g = loadRe + t * first.dissipation();
    double b = loadIm + sign * t;
    return sign * b / (g * g + b * b);
  }

  /**
   * The settings of least reflection on each edge of the ranges.
   *
   * @return pairs [t1, t2]; none where an edge lies at infinity
   */
  double[] edges() {
    double[] found = new double[8];
    int n = 0;
    for (double t : new double[] {first.lowest(), first.highest()}) {
      double back = leastOverSecond(t);
      if (finite(t, back)) {
        found[n++] = t;
        found[n++] = back;
      }
    }
    for (double back : new double[] {second.lowest(), second.highest()}) {
      double t = leastOverFirst(back);
      if (finite(t, back)) {
        found[n++] = t;
        found[n++] = back;
      }
    }
    return java.util.Arrays.copyOf(found, n);
  }

  private static boolean finite(double one, double other) {
    return Math.abs(one) < 1e300 && Math.abs(other) < 1e300; // false for NaN too
  }

  /** Reflection with t1 fixed is |(p − N) + ct2| / |(p + N) + ct2|, p = 1/w. */
  private double leastOverSecond(double t) {
    if (!(t < 1e300)) {
      return Double.NaN;
    }
    double g = loadRe + t * first.dissipation();
    double b = loadIm + sign * t;
    double m = g * g + b * b;
    double q = second.dissipation();
    return leastRatio(
        new double[] {g / m - wanted, -b / m, q, sign},
        new double[] {g / m + wanted, -b / m, q, sign},
        second.lowest(),
        second.highest());
  }

  /** Reflection with t2 fixed is |1 + (e − N)(w0 + ct)| / |1 + (e + N)(w0 + ct)|. */
  private double leastOverFirst(double back) {
    if (!(back < 1e300)) {
      return Double.NaN;
    }
    double re = back * second.dissipation();
    double im = sign * back;
    return leastRatio(
        bilinear(re - wanted, im), bilinear(re + wanted, im), first.lowest(), first.highest());
  }

  /** 1 + f(w0 + ct) as constant and slope: [Re, Im, Re, Im]. */
  private double[] bilinear(double fRe, double fIm) {
    double q = first.dissipation();
    return new double[] {
      1 + fRe * loadRe - fIm * loadIm,
      fRe * loadIm + fIm * loadRe,
      fRe * q - fIm * sign,
      fRe * sign + fIm * q
    };
  }

  /**
   * The t in [low, high] of least |A + Bt|/|C + Dt|: a stationary point, of which a ratio of two
   * quadratics has at most two, or an end.
   */
  private static double leastRatio(double[] over, double[] under, double low, double high) {
    double n0 = over[0] * over[0] + over[1] * over[1];
    double n1 = 2 * (over[0] * over[2] + over[1] * over[3]);
    double n2 = over[2] * over[2] + over[3] * over[3];
    double d0 = under[0] * under[0] + under[1] * under[1];
    double d1 = 2 * (under[0] * under[2] + under[1] * under[3]);
    double d2 = under[2] * under[2] + under[3] * under[3];
    double a = n2 * d1 - n1 * d2;
    double half = n2 * d0 - n0 * d2;
    double c = n1 * d0 - n0 * d1;
    double root = Math.sqrt(Math.max(0, half * half - a * c));
    double far = -half - Math.copySign(root, half);
    double best = Double.NaN;
    double least = Double.POSITIVE_INFINITY;
    for (double t : new double[] {low, high, far / a, c / far}) {
      double value = (n0 + t * (n1 + t * n2)) / (d0 + t * (d1 + t * d2));
      if (t >= low && t <= high && value < least) {
        least = value;
        best = t;
      }
    }
    return best;
  }

  /**
   * What a setting does.
   *
   * @param t of the first part
   * @param back t of the second
   * @param power into the section [W]
   */
  Setting setting(double t, double back, double power) {
    double q1 = first.dissipation();
    double q2 = second.dissipation();
    double g = loadRe + t * q1;
    double b = loadIm + sign * t;
    double m = g * g + b * b;
    double re = g / m + back * q2;
    double im = -b / m + sign * back;
    double reflection = Math.hypot(re - wanted, im) / Math.hypot(re + wanted, im);
    double in = loadRe + t * q1 + m * back * q2; // for 1 V across, or 1 A through, the first part
    double scale = Math.sqrt(2 * power / in);
    double between = scale * Math.sqrt(m);
    double volts;
    double amps;
    if (first.series()) {
      volts = Math.max(scale * first.size(t), between);
      amps = Math.max(scale, between * second.size(back));
    } else {
      volts = Math.max(scale, between * second.size(back));
      amps = Math.max(scale * first.size(t), between);
    }
    return new Setting(t, back, reflection, in, loadRe, scale, volts, amps);
  }

  /** Target resistance [ohm]. */
  double targetOhm() {
    return targetOhm;
  }

  /**
   * A setting's figures.
   *
   * @param first t of the part next to the load
   * @param second t of the other
   * @param reflection size of the coefficient at the transmitter
   * @param powerIn for the unit drive
   * @param powerOut likewise, into the load
   * @param drive peak volts across a first part that stands across, else peak amps through it
   * @param volts largest across a part
   * @param amps largest through a part
   */
  record Setting(
      double first,
      double second,
      double reflection,
      double powerIn,
      double powerOut,
      double drive,
      double volts,
      double amps) {}
}
