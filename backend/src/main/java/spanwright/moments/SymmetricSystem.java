package spanwright.moments;

import java.util.Arrays;

/**
 * A complex symmetric system, factored as L D Lᵀ without pivoting, which halves the work; the
 * answer is held against the system, and a pivoted LU takes over when the residual is not small.
 *
 * <p>Layout: row[i] holds the entries j = 0..i, real and imaginary part in turn. A row then loses a
 * complex multiple of another in one plain loop over doubles, given that other row once as (re, im)
 * and once as (im, −re); two pivots are taken at a time, so that each row is fetched half as often.
 * Reusable: rows are kept for the next system.
 */
final class SymmetricSystem {
  private static final double GOOD = 1e-9;

  int size;
  double[][] row = new double[0][];

  /** The answer; its first {@link #size} parts count. */
  double[] answerRe = new double[0];

  double[] answerIm = new double[0];

  /** Greatest part of the residual over the greatest part of the right-hand side. */
  double residual;

  /** Whether the pivoted factorisation was needed. */
  boolean pivoted;

  // the factors, and below them the right-hand side as one more row
  private double[][] factor = new double[0][];
  private double[] lastRow = new double[0];
  // columns of two pivots, as (re, im) and (im, −re)
  private double[] first = new double[0];
  private double[] firstTurned = new double[0];
  private double[] second = new double[0];
  private double[] secondTurned = new double[0];

  SymmetricSystem(int size) {
    reset(size);
  }

  /** Makes this an empty system of a size. */
  void reset(int size) {
    this.size = size;
    if (row.length < size) {
      row = grown(row, size);
      factor = grown(factor, size);
      answerRe = new double[size];
      answerIm = new double[size];
      lastRow = new double[2 * size];
      first = new double[2 * size + 2];
      firstTurned = new double[2 * size + 2];
      second = new double[2 * size + 2];
      secondTurned = new double[2 * size + 2];
    }
    for (int i = 0; i < size; i++) {
      Arrays.fill(row[i], 0);
    }
    residual = 0;
    pivoted = false;
  }

  /** Real part of entry (i, j), j up to i. */
  double re(int i, int j) {
    return row[i][2 * j];
  }

  /** Imaginary part of entry (i, j), j up to i. */
  double im(int i, int j) {
    return row[i][2 * j + 1];
  }

  /** Sets entry (i, j), j up to i, and with it (j, i). */
  void set(int i, int j, double re, double im) {
    row[i][2 * j] = re;
    row[i][2 * j + 1] = im;
  }

  private static double[][] grown(double[][] rows, int size) {
    double[][] more = Arrays.copyOf(rows, size);
    for (int i = rows.length; i < size; i++) {
      more[i] = new double[2 * i + 2];
    }
    return more;
  }

  /** Solves for a real right-hand side; the matrix stays as it is. */
  void solve(double[] right) {
    for (int i = 0; i < size; i++) {
      System.arraycopy(row[i], 0, factor[i], 0, 2 * i + 2);
      lastRow[2 * i] = right[i];
      lastRow[2 * i + 1] = 0;
    }
    int k = 0;
    for (; k + 1 < size; k += 2) {
      pivots(k);
    }
    if (k < size) {
      lastPivot(k);
    }
    substitute();
    residual = residual(right);
    if (!(residual < GOOD)) {
      pivoted = true;
      PivotedLu.solve(this, right);
      residual = residual(right);
    }
  }

  /** Eliminates with pivots k and k + 1. */
  private void pivots(int k) {
    double[] top = factor[k];
    double[] next = factor[k + 1];
    int at = 2 * k;
    double scale = 1 / (top[at] * top[at] + top[at + 1] * top[at + 1]);
    double pr = top[at] * scale;
    double pi = -top[at + 1] * scale;
    double xr = next[at];
    double xi = next[at + 1];
    double fr = xr * pr - xi * pi;
    double fi = xr * pi + xi * pr;
    double dr = next[at + 2] - (fr * xr - fi * xi);
    double di = next[at + 3] - (fr * xi + fi * xr);
    next[at] = fr;
    next[at + 1] = fi;
    next[at + 2] = dr;
    next[at + 3] = di;
    scale = 1 / (dr * dr + di * di);
    double qr = dr * scale;
    double qi = -di * scale;
    for (int i = k + 2; i <= size; i++) {
      double[] r = i < size ? factor[i] : lastRow;
      double ar = r[at];
      double ai = r[at + 1];
      double gr = ar * pr - ai * pi;
      double gi = ar * pi + ai * pr;
      double br = r[at + 2] - (gr * xr - gi * xi);
      double bi = r[at + 3] - (gr * xi + gi * xr);
      r[at] = gr;
      r[at + 1] = gi;
      r[at + 2] = br * qr - bi * qi;
      r[at + 3] = br * qi + bi * qr;
      first[2 * i] = ar;
      first[2 * i + 1] = ai;
      firstTurned[2 * i] = ai;
      firstTurned[2 * i + 1] = -ar;
      second[2 * i] = br;
      second[2 * i + 1] = bi;
      secondTurned[2 * i] = bi;
      secondTurned[2 * i + 1] = -br;
    }
    for (int i = k + 2; i < size; i++) {
      update(factor[i], at, 2 * i + 2);
    }
    update(lastRow, at, 2 * size);
  }

  private void update(double[] r, int at, int to) {
    lose(
        r,
        first,
        firstTurned,
        second,
        secondTurned,
        -r[at],
        r[at + 1],
        -r[at + 2],
        r[at + 3],
        at + 4,
        to);
  }

  /** Most of the time goes here. */
  private static void lose(
      double[] r,
      double[] a,
      double[] b,
      double[] c,
      double[] d,
      double p,
      double q,
      double u,
      double v,
      int from,
      int to) {
    for (int j = from; j < to; j++) {
      r[j] = r[j] + (p * a[j] + q * b[j]) + (u * c[j] + v * d[j]);
    }
  }

  private void lastPivot(int k) {
    double dr = factor[k][2 * k];
    double di = factor[k][2 * k + 1];
    double scale = 1 / (dr * dr + di * di);
    double ar = lastRow[2 * k];
    double ai = lastRow[2 * k + 1];
    lastRow[2 * k] = (ar * dr + ai * di) * scale;
    lastRow[2 * k + 1] = (ai * dr - ar * di) * scale;
  }

  /** The right-hand side went through the elimination as a row: what is left is Lᵀ. */
  private void substitute() {
    double[] s = first;
    double[] t = second;
    Arrays.fill(s, 0);
    Arrays.fill(t, 0);
    for (int i = size - 1; i >= 0; i--) {
      answerRe[i] = lastRow[2 * i] - (s[2 * i] - t[2 * i + 1]);
      answerIm[i] = lastRow[2 * i + 1] - (s[2 * i + 1] + t[2 * i]);
      spread(factor[i], answerRe[i], answerIm[i], s, t, 2 * i);
    }
  }

  /** Adds xr times a row to s and xi times it to t: (s − t turned) is the complex product. */
  private static void spread(double[] r, double xr, double xi, double[] s, double[] t, int count) {
    for (int j = 0; j < count; j++) {
      s[j] += xr * r[j];
      t[j] += xi * r[j];
    }
  }

  private double residual(double[] right) {
    double[] s = first;
    double[] t = second;
    double[] left = lastRow;
    Arrays.fill(s, 0);
    Arrays.fill(t, 0);
    double most = 0;
    for (int i = 0; i < size; i++) {
      most = Math.max(most, Math.abs(right[i]));
      spread(row[i], answerRe[i], answerIm[i], s, t, 2 * i);
      product(i, left);
    }
    double worst = 0;
    for (int i = 0; i < size; i++) {
      double re = right[i] - left[2 * i] - (s[2 * i] - t[2 * i + 1]);
      double im = -left[2 * i + 1] - (s[2 * i + 1] + t[2 * i]);
      double part = Math.hypot(re, im);
      worst = part > worst || Double.isNaN(part) ? part : worst;
    }
    return worst / most;
  }

  /** Row i, up to and with its diagonal, times the answer; two sums at a time. */
  private void product(int i, double[] out) {
    double[] r = row[i];
    double re0 = 0;
    double im0 = 0;
    double re1 = 0;
    double im1 = 0;
    int j = 0;
    for (; j < i; j += 2) {
      int at = 2 * j;
      re0 += r[at] * answerRe[j] - r[at + 1] * answerIm[j];
      im0 += r[at] * answerIm[j] + r[at + 1] * answerRe[j];
      re1 += r[at + 2] * answerRe[j + 1] - r[at + 3] * answerIm[j + 1];
      im1 += r[at + 2] * answerIm[j + 1] + r[at + 3] * answerRe[j + 1];
    }
    if (j == i) {
      re0 += r[2 * j] * answerRe[j] - r[2 * j + 1] * answerIm[j];
      im0 += r[2 * j] * answerIm[j] + r[2 * j + 1] * answerRe[j];
    }
    out[2 * i] = re0 + re1;
    out[2 * i + 1] = im0 + im1;
  }
}
