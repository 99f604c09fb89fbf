package spanwright.moments;

/**
 * Radiation of solved currents: the direct wave and the wave reflected with Fresnel's coefficients
 * at the direction's angle, exact for the far zone above the horizon. {@link FarSums} adds up what
 * the elements send.
 */
final class FarField {
  private final SourcePoints points;
  private final double k;
  private final Ground ground;
  private final double epsR;
  private final double epsI;
  private final Radiators elements;

  FarField(Currents currents, SourcePoints points, Ground ground, double k) {
    this.points = points;
    this.k = k;
    this.ground = ground;
    epsR = ground.permittivity();
    epsI = -ground.conductivity() / (k * Constants.LIGHT * Constants.EPSILON0);
    elements = new Radiators(currents, k);
  }

  /**
   * Radiation intensity for the solved currents, horizontal and vertical polarisation [W/sr];
   * nothing goes below the horizon of a ground.
   */
  void intensity(Directions d, double[] horizontal, double[] vertical) {
    intensity(d, d.count, false, horizontal, vertical);
  }

  /** The first directions of a batch and, when asked for, their antipodes behind them. */
  private void intensity(
      Directions d, int count, boolean both, double[] horizontal, double[] vertical) {
    boolean grounded = ground.kind() != Ground.Kind.NONE;
    FarSums sums = new FarSums(elements, grounded, both, count);
    double[] fresnel = new double[4];
    for (int from = 0; from < count; from += FarSums.BLOCK) {
      int n = Math.min(FarSums.BLOCK, count - from);
      sums.work(d, from, n);
      for (int i = 0; i < n; i++) {
        int at = from + i;
        double se = d.sinElevation[at];
        if (grounded) {
          coefficients(Math.max(0, se), d.cosElevation[at], fresnel);
        }
        boolean below = grounded && se < -1e-12;
        horizontal[at] = below ? 0 : size(sums.sums, 0, i, fresnel);
        vertical[at] = below ? 0 : size(sums.sums, 2, i, fresnel);
        if (both) {
          horizontal[count + at] = below ? 0 : size(sums.opposite, 0, i, fresnel);
          vertical[count + at] = below ? 0 : size(sums.opposite, 2, i, fresnel);
        }
      }
    }
  }

  /** Intensity of one polarisation: direct wave plus coefficient times mirrored wave. */
  private double size(double[][] sums, int at, int i, double[] fresnel) {
    double mr = sums[4 + at][i];
    double mi = sums[5 + at][i];
    double re = sums[at][i] + (fresnel[at] * mr - fresnel[at + 1] * mi);
    double im = sums[at + 1][i] + (fresnel[at] * mi + fresnel[at + 1] * mr);
    return Constants.ETA0 * k * k / (32 * Math.PI * Math.PI) * (re * re + im * im);
  }

  /**
   * Fresnel's coefficients at an elevation: R_h = (s − n)/(s + n), R_v = (εs − n)/(εs + n), s the
   * sine of the elevation, n = √(ε − cos²); −1 and +1 over a perfect ground. Written as re, im of
   * R_h, then of R_v.
   */
  private void coefficients(double se, double ce, double[] out) {
    if (ground.kind() == Ground.Kind.PERFECT) {
      out[0] = -1;
      out[1] = 0;
      out[2] = 1;
      out[3] = 0;
      return;
    }
    fresnel(epsR, epsI, se, ce, out);
  }

  /** Fresnel's coefficients of a ground of complex relative permittivity epsR + j epsI. */
  static void fresnel(double epsR, double epsI, double se, double ce, double[] out) {
    double ur = epsR - ce * ce;
    double size = Math.sqrt(ur * ur + epsI * epsI);
    double nr = Math.sqrt(0.5 * (size + ur));
    double ni = epsI <= 0 ? -Math.sqrt(Math.max(0, 0.5 * (size - ur))) : 0;
    divide(se - nr, -ni, se + nr, ni, out, 0);
    divide(epsR * se - nr, epsI * se - ni, epsR * se + nr, epsI * se + ni, out, 2);
  }

  private static void divide(double ar, double ai, double br, double bi, double[] out, int at) {
    double d = br * br + bi * bi;
    out[at] = (ar * br + ai * bi) / d;
    out[at + 1] = (ai * br - ar * bi) / d;
  }

  /**
   * Intensity over all directions (over the sky, with a ground), on a Gauss rule in elevation and
   * even steps in azimuth, fine enough for the wires' extent.
   *
   * @param azimuths radians
   * @param elevations radians
   * @param intensity both polarisations [W/sr]
   * @param weights solid angles [sr]
   */
  record Sky(double[] azimuths, double[] elevations, double[] intensity, double[] weights) {
    /** Power radiated [W]. */
    double power() {
      double sum = 0;
      for (int i = 0; i < intensity.length; i++) {
        sum += weights[i] * intensity[i];
      }
      return sum;
    }
  }

  /** Samples the whole pattern; over a ground, directions and their antipodes in one go. */
  Sky sky() {
    double reach = k * reach();
    boolean grounded = ground.kind() != Ground.Kind.NONE;
    int across = 12 + 2 * (int) Math.ceil(reach);
    int up = Math.min(60, 14 + (int) Math.ceil((grounded ? 0.8 : 1.0) * reach));
    int count = across * up;
    double[] azimuths = new double[count];
    double[] elevations = new double[count];
    double[] weights = new double[count];
    double[] horizontal = new double[count];
    double[] vertical = new double[count];
    Directions all = Directions.sky(across, up, grounded, azimuths, elevations, weights);
    intensity(all, grounded ? count / 2 : count, grounded, horizontal, vertical);
    for (int i = 0; i < count; i++) {
      horizontal[i] += vertical[i];
    }
    return new Sky(azimuths, elevations, horizontal, weights);
  }

  /** Greatest distance of a point from the middle of all, or from its foot if that is more [m]. */
  double reach() {
    double[] low = {Double.MAX_VALUE, Double.MAX_VALUE, Double.MAX_VALUE};
    double[] high = {-Double.MAX_VALUE, -Double.MAX_VALUE, -Double.MAX_VALUE};
    for (int i = 0; i < points.count; i++) {
      double[] p = {points.x[i], points.y[i], points.z[i]};
      for (int c = 0; c < 3; c++) {
        low[c] = Math.min(low[c], p[c]);
        high[c] = Math.max(high[c], p[c]);
      }
    }
    if (ground.kind() != Ground.Kind.NONE) {
      low[2] = -high[2];
    }
    double square = 0;
    for (int c = 0; c < 3; c++) {
      square += (high[c] - low[c]) * (high[c] - low[c]);
    }
    return 0.5 * Math.sqrt(square);
  }
}
