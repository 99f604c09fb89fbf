package spanwright.moments;

/**
 * Adds up what the elements send toward a block of directions, direct and mirrored in the ground,
 * in level and upright polarisation. Directions run in the inner loops, which are kept so small
 * that they are worked several lanes at a time.
 *
 * <p>A direction and its antipode in azimuth share everything but signs: the level part of every
 * phase and cosine turns about, the upright part stays.
 */
final class FarSums {
  /** Directions worked at once: so many that all arrays stay near. */
  static final int BLOCK = 128;

  /** Level re, im, upright re, im of the direct wave, then of the mirrored one. */
  final double[][] sums;

  /** The same for the antipodes. */
  final double[][] opposite;

  private final Radiators elements;
  private final boolean mirrored;
  private final boolean both;
  private final double[] sa;
  private final double[] ca;
  private final double[] se;
  private final double[] ce;
  private final double[] angle;
  private final double[] sinLevel;
  private final double[] cosLevel;
  private final double[] sinUp;
  private final double[] cosUp;
  private final double[] sumRe;
  private final double[] sumIm;
  private final double[] differenceRe;
  private final double[] differenceIm;
  private final double[] direct;
  private final double[] image;
  private final double[] square;
  private final double[][] direct4;
  private final double[][] image4;
  // re, im of direct, mirrored, direct to the antipode, mirrored to the antipode
  private final double[][] piece;

  /**
   * @param mirrored whether there is a ground
   * @param both whether the antipodes are wanted too
   * @param count directions there will be
   */
  FarSums(Radiators elements, boolean mirrored, boolean both, int count) {
    int most = Math.min(BLOCK, count);
    this.elements = elements;
    this.mirrored = mirrored;
    this.both = both;
    sums = new double[8][most];
    opposite = new double[8][both ? most : 0];
    piece = new double[8][most];
    direct4 = new double[4][most];
    image4 = new double[4][most];
    sa = new double[most];
    ca = new double[most];
    se = new double[most];
    ce = new double[most];
    angle = new double[most];
    sinLevel = new double[most];
    cosLevel = new double[most];
    sinUp = new double[most];
    cosUp = new double[most];
    sumRe = new double[most];
    sumIm = new double[most];
    differenceRe = new double[most];
    differenceIm = new double[most];
    direct = new double[most];
    image = new double[most];
    square = new double[most];
  }

  /** Works out the sums of n directions from a place in the batch on. */
  void work(Directions d, int from, int n) {
    System.arraycopy(d.sinAzimuth, from, sa, 0, n);
    System.arraycopy(d.cosAzimuth, from, ca, 0, n);
    System.arraycopy(d.sinElevation, from, se, 0, n);
    System.arraycopy(d.cosElevation, from, ce, 0, n);
    clear(sums, n);
    if (both) {
      clear(opposite, n);
    }
    int e = 0;
    while (e < elements.count) {
      clear(piece, n);
      int first = e;
      cosines(first, n);
      for (; e < elements.count && elements.piece[e] == elements.piece[first]; e++) {
        element(e, n);
      }
      polarise(first, n);
    }
  }

  private static void clear(double[][] arrays, int n) {
    for (double[] array : arrays) {
      java.util.Arrays.fill(array, 0, n, 0);
    }
  }

  /** Cosines between a piece and the directions, and those mirrored. */
  private void cosines(int e, int n) {
    double tx = elements.tx[e];
    double ty = elements.ty[e];
    double tz = elements.tz[e];
    for (int i = 0; i < n; i++) {
      double level = ce[i] * (tx * sa[i] + ty * ca[i]);
      double up = se[i] * tz;
      direct[i] = level + up;
      image[i] = level - up;
    }
  }

  private void element(int e, int n) {
    levelPhase(elements.x[e], elements.y[e], n);
    SinCos.of(angle, n, sinLevel, cosLevel);
    double z = elements.z[e];
    for (int i = 0; i < n; i++) {
      angle[i] = z * se[i];
    }
    SinCos.of(angle, n, sinUp, cosUp);
    turns(n);
    series(e, direct, direct4, n);
    add(sumRe, sumIm, direct4, piece[0], piece[1], n);
    if (mirrored) {
      series(e, image, image4, n);
      add(differenceRe, differenceIm, image4, piece[2], piece[3], n);
      if (both) {
        // there the level phase and cosine are the other way about: e^{j(−a + b)}, f(−x)
        addTurned(differenceRe, differenceIm, image4, piece[4], piece[5], n);
        addTurned(sumRe, sumIm, direct4, piece[6], piece[7], n);
      }
    }
  }

  private void levelPhase(double x, double y, int n) {
    for (int i = 0; i < n; i++) {
      angle[i] = ce[i] * (x * sa[i] + y * ca[i]);
    }
  }

  /** e^{j(a + b)} and e^{j(a − b)} of the level phase a and the upright one b. */
  private void turns(int n) {
    for (int i = 0; i < n; i++) {
      double one = cosLevel[i] * cosUp[i];
      double other = sinLevel[i] * sinUp[i];
      sumRe[i] = one - other;
      differenceRe[i] = one + other;
    }
    for (int i = 0; i < n; i++) {
      double one = sinLevel[i] * cosUp[i];
      double other = cosLevel[i] * sinUp[i];
      sumIm[i] = one + other;
      differenceIm[i] = one - other;
    }
  }

  /** The series at x, its even and odd powers apart: even re, im, odd re, im. */
  private void series(int e, double[] x, double[][] out, int n) {
    for (int i = 0; i < n; i++) {
      square[i] = x[i] * x[i];
    }
    int top = elements.re[e].length - 1; // even
    half(elements.re[e], top, out[0], n);
    half(elements.im[e], top, out[1], n);
    half(elements.re[e], top - 1, out[2], n);
    half(elements.im[e], top - 1, out[3], n);
    times(x, out[2], n);
    times(x, out[3], n);
  }

  /** Every other coefficient from the top one down, as a polynomial in the square. */
  private void half(double[] c, int top, double[] out, int n) {
    java.util.Arrays.fill(out, 0, n, top < 0 ? 0 : c[top]);
    int m = top - 2;
    for (; m >= 2; m -= 4) {
      two(c[m], c[m - 2], out, n);
    }
    if (m >= 0) {
      one(c[m], out, n);
    }
  }

  private void two(double high, double low, double[] out, int n) {
    for (int i = 0; i < n; i++) {
      double u = square[i];
      out[i] = (out[i] * u + high) * u + low;
    }
  }

  private void one(double c, double[] out, int n) {
    for (int i = 0; i < n; i++) {
      out[i] = out[i] * square[i] + c;
    }
  }

  private static void times(double[] x, double[] out, int n) {
    for (int i = 0; i < n; i++) {
      out[i] *= x[i];
    }
  }

  /** Adds turn · (even + odd). */
  private static void add(
      double[] re, double[] im, double[][] f, double[] toRe, double[] toIm, int n) {
    double[] er = f[0];
    double[] ei = f[1];
    double[] or = f[2];
    double[] oi = f[3];
    for (int i = 0; i < n; i++) {
      double fr = er[i] + or[i];
      double fi = ei[i] + oi[i];
      toRe[i] += re[i] * fr - im[i] * fi;
      toIm[i] += re[i] * fi + im[i] * fr;
    }
  }

  /** Adds the conjugate of turn times (even − odd). */
  private static void addTurned(
      double[] re, double[] im, double[][] f, double[] toRe, double[] toIm, int n) {
    double[] er = f[0];
    double[] ei = f[1];
    double[] or = f[2];
    double[] oi = f[3];
    for (int i = 0; i < n; i++) {
      double fr = er[i] - or[i];
      double fi = ei[i] - oi[i];
      toRe[i] += re[i] * fr + im[i] * fi;
      toIm[i] += re[i] * fi - im[i] * fr;
    }
  }

  /** Takes a piece's sums apart into the level and the upright polarisation. */
  private void polarise(int e, int n) {
    double tx = elements.tx[e];
    double ty = elements.ty[e];
    double tz = elements.tz[e];
    for (int part = 0; part < (mirrored ? 2 : 1); part++) {
      double flip = part == 0 ? -1 : 1;
      for (int c = 0; c < 2; c++) {
        weigh(tx, ty, tz, 1, flip, piece[2 * part + c], sums, 4 * part + c, n);
        if (mirrored && both) {
          weigh(tx, ty, tz, -1, flip, piece[4 + 2 * part + c], opposite, 4 * part + c, n);
        }
      }
    }
  }

  private void weigh(
      double tx,
      double ty,
      double tz,
      double turn,
      double flip,
      double[] from,
      double[][] to,
      int at,
      int n) {
    double[] level = to[at];
    double[] upright = to[at + 2];
    double x = turn * tx;
    double y = turn * ty;
    for (int i = 0; i < n; i++) {
      level[i] += (x * ca[i] - y * sa[i]) * from[i];
    }
    for (int i = 0; i < n; i++) {
      upright[i] += (ce[i] * tz + flip * se[i] * (x * sa[i] + y * ca[i])) * from[i];
    }
  }
}
