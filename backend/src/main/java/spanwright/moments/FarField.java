package spanwright.moments;

/**
 * Radiation of solved currents: the direct wave and the wave reflected with Fresnel's coefficients
 * at the direction's angle, exact for the far zone above the horizon.
 *
 * <p>For each direction the vector sums of I t e^{jk r̂·r} over the points, direct and mirrored,
 * are gathered with directions in the inner loop; polarisations are made from them at the end.
 */
final class FarField {
  private final Mesh mesh;
  private final SourcePoints points;
  private final double k;
  private final Ground ground;
  private final double epsR;
  private final double epsI;
  // current times weight times length at each point
  private final double[] momentRe;
  private final double[] momentIm;

  FarField(Currents currents, SourcePoints points, Ground ground, double k) {
    this.mesh = currents.mesh;
    this.points = points;
    this.k = k;
    this.ground = ground;
    epsR = ground.permittivity();
    epsI = -ground.conductivity() / (k * Constants.LIGHT * Constants.EPSILON0);
    momentRe = new double[points.count];
    momentIm = new double[points.count];
    for (int e = 0; e < mesh.elements; e++) {
      int first = points.first[e];
      int gauss = points.first[e + 1] - first;
      double[][] shape = Shapes.weighted(gauss);
      for (int q = 0; q < gauss; q++) {
        for (int a = 0; a <= mesh.order[e]; a++) {
          momentRe[first + q] += mesh.length[e] * currents.re[e][a] * shape[a][q];
          momentIm[first + q] += mesh.length[e] * currents.im[e][a] * shape[a][q];
        }
      }
    }
  }

  /** Vector sums over the points for a batch: [component·2 + (0 re, 1 im)][direction]. */
  private double[][] sums(Directions d, boolean mirrored) {
    int n = d.count;
    double[][] sum = new double[6][n];
    double[] angle = new double[n];
    double[] sin = new double[n];
    double[] cos = new double[n];
    double[] partRe = new double[n];
    double[] partIm = new double[n];
    double sign = mirrored ? -k : k;
    for (int e = 0; e < mesh.elements; e++) {
      java.util.Arrays.fill(partRe, 0);
      java.util.Arrays.fill(partIm, 0);
      for (int i = points.first[e]; i < points.first[e + 1]; i++) {
        phase(d, k * points.x[i], k * points.y[i], sign * points.z[i], angle);
        SinCos.of(angle, n, sin, cos);
        gather(momentRe[i], momentIm[i], sin, cos, partRe, partIm, n);
      }
      double[] t = {mesh.tx[e], mesh.ty[e], mesh.tz[e]};
      for (int c = 0; c < 3; c++) {
        if (t[c] != 0) {
          axpy(t[c], partRe, sum[2 * c], n);
          axpy(t[c], partIm, sum[2 * c + 1], n);
        }
      }
    }
    return sum;
  }

  private static void phase(Directions d, double kx, double ky, double kz, double[] angle) {
    double[] sa = d.sinAzimuth;
    double[] ca = d.cosAzimuth;
    double[] se = d.sinElevation;
    double[] ce = d.cosElevation;
    for (int i = 0; i < d.count; i++) {
      angle[i] = ce[i] * (kx * sa[i] + ky * ca[i]) + kz * se[i];
    }
  }

  private static void gather(
      double mr, double mi, double[] sin, double[] cos, double[] re, double[] im, int n) {
    for (int i = 0; i < n; i++) {
      re[i] += mr * cos[i] - mi * sin[i];
      im[i] += mr * sin[i] + mi * cos[i];
    }
  }

  private static void axpy(double factor, double[] from, double[] to, int n) {
    for (int i = 0; i < n; i++) {
      to[i] += factor * from[i];
    }
  }

  /**
   * Radiation intensity for the solved currents, horizontal and vertical polarisation [W/sr];
   * nothing goes below the horizon of a ground.
   */
  void intensity(Directions d, double[] horizontal, double[] vertical) {
    boolean grounded = ground.kind() != Ground.Kind.NONE;
    double[][] s = sums(d, false);
    double[][] m = grounded ? sums(d, true) : null;
    double factor = Constants.ETA0 * k * k / (32 * Math.PI * Math.PI);
    double[] fresnel = new double[4];
    for (int i = 0; i < d.count; i++) {
      double sa = d.sinAzimuth[i];
      double ca = d.cosAzimuth[i];
      double se = d.sinElevation[i];
      double ce = d.cosElevation[i];
      double hr = ca * s[0][i] - sa * s[2][i];
      double hi = ca * s[1][i] - sa * s[3][i];
      double vr = ce * s[4][i] - se * (sa * s[0][i] + ca * s[2][i]);
      double vi = ce * s[5][i] - se * (sa * s[1][i] + ca * s[3][i]);
      if (grounded) {
        if (se < -1e-12) {
          horizontal[i] = 0;
          vertical[i] = 0;
          continue;
        }
        coefficients(se, ce, fresnel);
        double ir = ca * m[0][i] - sa * m[2][i];
        double ii = ca * m[1][i] - sa * m[3][i];
        hr += fresnel[0] * ir - fresnel[1] * ii;
        hi += fresnel[0] * ii + fresnel[1] * ir;
        ir = ce * m[4][i] + se * (sa * m[0][i] + ca * m[2][i]);
        ii = ce * m[5][i] + se * (sa * m[1][i] + ca * m[3][i]);
        vr += fresnel[2] * ir - fresnel[3] * ii;
        vi += fresnel[2] * ii + fresnel[3] * ir;
      }
      horizontal[i] = factor * (hr * hr + hi * hi);
      vertical[i] = factor * (vr * vr + vi * vi);
    }
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
    double size = Math.hypot(ur, epsI);
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

  /** Samples the whole pattern. */
  Sky sky() {
    double reach = k * reach();
    boolean grounded = ground.kind() != Ground.Kind.NONE;
    int across = 12 + 2 * (int) Math.ceil(reach);
    int up = Math.min(60, 14 + (int) Math.ceil((grounded ? 0.8 : 1.0) * reach));
    GaussRule rule = GaussRule.of(up);
    double low = grounded ? 0 : -0.5 * Math.PI;
    double span = 0.5 * Math.PI - low;
    double[] azimuths = new double[across * up];
    double[] elevations = new double[across * up];
    double[] weights = new double[across * up];
    for (int j = 0; j < up; j++) {
      double elevation = low + span * rule.nodes[j];
      for (int i = 0; i < across; i++) {
        azimuths[j * across + i] = 2 * Math.PI * (i + 0.25) / across;
        elevations[j * across + i] = elevation;
        weights[j * across + i] =
            rule.weights[j] * span * Math.cos(elevation) * 2 * Math.PI / across;
      }
    }
    double[] horizontal = new double[across * up];
    double[] vertical = new double[across * up];
    intensity(Directions.of(azimuths, elevations), horizontal, vertical);
    for (int i = 0; i < horizontal.length; i++) {
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
