package spanwright.moments;

import org.apache.commons.math3.complex.Complex;

/**
 * Fills the matrix of one mesh at one frequency: the reaction of each pair of elements by the
 * mixed-potential form
 *
 * <p>Z = (jωμ0/4π) ∬ N N′ [t_h·t′_h (g + GA) + t_z t′_z (g + GZ) + F((t·ρ̂) t′_z − t_z (t′·ρ̂))] +
 * (1/(jω4πε0)) ∬ N_s N′_s (g + GP)
 *
 * <p>(Michalski and Mosig 1997, with the kernels of {@link HalfSpaceKernels}), plus each wire's
 * internal impedance and insulation.
 *
 * <p>Far pairs: Gauss points of both elements. For each point of an element, rows over all points
 * of the later elements hold distances, then e^{−jkR}/R, then the two combined kernels (current,
 * charge); rows are folded with the shapes of the first element, then element by element with those
 * of the second. Close pairs take their static part from {@link StaticPairs}; images nearer than an
 * element is long are done on shorter stretches.
 */
final class MatrixFill {
  private static final int MOST_STRETCHES = 24;

  private final Mesh mesh;
  private final StaticPairs statics;
  private final SourcePoints points;
  private final Reflection reflection;
  private final double k;
  private final SymmetricSystem system;
  private final boolean[] skipDirect;
  private final boolean[] skipImage;

  // rows over all points: direct kernel, image kernel, combined kernels of current and charge
  private final double[] angle;
  private final double[] far;
  private final double[] sin;
  private final double[] cos;
  private final double[] directRe;
  private final double[] directIm;
  private final double[] imageRe;
  private final double[] imageIm;
  private final double[] currentRe;
  private final double[] currentIm;
  private final double[] chargeRe;
  private final double[] chargeIm;
  // rows folded with the shapes of the first element: [shape][point]
  private final double[][] foldedCurrentRe;
  private final double[][] foldedCurrentIm;
  private final double[][] foldedChargeRe;
  private final double[][] foldedChargeIm;
  private final double[] ratio = new double[Reflection.RATIOS];
  // one pair's block: [a·columns + b]
  private final double[] blockRe = new double[(Shapes.MOST + 1) * (Shapes.MOST + 1)];
  private final double[] blockIm = new double[(Shapes.MOST + 1) * (Shapes.MOST + 1)];

  MatrixFill(Mesh mesh, StaticPairs statics, SourcePoints points, Reflection reflection, double k) {
    this.mesh = mesh;
    this.statics = statics;
    this.points = points;
    this.reflection = reflection;
    this.k = k;
    system = new SymmetricSystem(mesh.unknowns);
    skipDirect = new boolean[mesh.elements];
    skipImage = new boolean[mesh.elements];
    int n = points.count;
    angle = new double[n];
    far = new double[n];
    sin = new double[n];
    cos = new double[n];
    directRe = new double[n];
    directIm = new double[n];
    imageRe = new double[n];
    imageIm = new double[n];
    currentRe = new double[n];
    currentIm = new double[n];
    chargeRe = new double[n];
    chargeIm = new double[n];
    foldedCurrentRe = new double[Shapes.MOST + 1][n];
    foldedCurrentIm = new double[Shapes.MOST + 1][n];
    foldedChargeRe = new double[Shapes.MOST + 1][n];
    foldedChargeIm = new double[Shapes.MOST + 1][n];
  }

  /** The filled system, without the wires' own impedance. */
  SymmetricSystem fields() {
    for (int e = 0; e < mesh.elements; e++) {
      mark(e);
      rows(e);
      for (int f = e; f < mesh.elements; f++) {
        fold(e, f);
        if (skipImage[f]) {
          lowImage(e, f);
        }
        scatter(e, f);
      }
    }
    ClosePairs close = new ClosePairs(mesh, k);
    for (StaticPairs.Pair pair : statics.pairs) {
      close.block(pair, blockRe, blockIm);
      scatter(pair.e(), pair.f());
    }
    return system;
  }

  /** Adds internal impedance [ohm/m] and insulation's elastance [m/F] of each wire. */
  void addMaterial(Complex[] impedance, double[] elastance) {
    double omega = k * Constants.LIGHT;
    for (int e = 0; e < mesh.elements; e++) {
      Complex z = impedance[mesh.wire[e]];
      double x = elastance[mesh.wire[e]];
      if (z.equals(Complex.ZERO) && x == 0) {
        continue;
      }
      int n = mesh.order[e] + 1;
      for (int a = 0; a < n; a++) {
        for (int b = 0; b < n; b++) {
          double mass = Shapes.MASS[a][b] * mesh.length[e];
          blockRe[a * n + b] = mass * z.getReal();
          blockIm[a * n + b] =
              mass * z.getImaginary() - Shapes.STIFFNESS[a][b] / mesh.length[e] * x / omega;
        }
      }
      scatter(e, e);
    }
  }

  /** Which elements' direct kernel or image the rows of e leave out. */
  private void mark(int e) {
    java.util.Arrays.fill(skipDirect, e, mesh.elements, false);
    java.util.Arrays.fill(skipImage, e, mesh.elements, false);
    skipDirect[e] = true;
    for (int f : statics.close[e]) {
      skipDirect[f] = true;
    }
    if (reflection.present()) {
      for (int f = e; f < mesh.elements; f++) {
        skipImage[f] = stretches(e, f) > 1;
      }
    }
  }

  private double lowEnd(int e) {
    return Math.min(mesh.z[e], mesh.z[e] + mesh.length[e] * mesh.tz[e]);
  }

  /** Into how many stretches the longer element is cut for the image of the other. */
  private int stretches(int e, int f) {
    double longer = Math.max(mesh.length[e], mesh.length[f]);
    double height = lowEnd(e) + lowEnd(f);
    if (height > StaticPairs.CLOSE * longer) {
      return 1;
    }
    double dx =
        mesh.x[e] - mesh.x[f] + 0.5 * (mesh.length[e] * mesh.tx[e] - mesh.length[f] * mesh.tx[f]);
    double dy =
        mesh.y[e] - mesh.y[f] + 0.5 * (mesh.length[e] * mesh.ty[e] - mesh.length[f] * mesh.ty[f]);
    double apart = Math.hypot(dx, dy) - 0.5 * (mesh.length[e] + mesh.length[f]);
    double reach = Math.hypot(Math.max(0, apart), height);
    if (reach > StaticPairs.CLOSE * longer) {
      return 1;
    }
    return Math.min(MOST_STRETCHES, 1 + (int) (0.7 * longer / reach));
  }

  /** Kernels from each point of e to all points of e and later elements, folded with e's shapes. */
  private void rows(int e) {
    int from = points.first[e];
    int to = points.count;
    int shapes = mesh.order[e] + 1;
    int gauss = points.first[e + 1] - from;
    for (int a = 0; a < shapes; a++) {
      java.util.Arrays.fill(foldedCurrentRe[a], from, to, 0);
      java.util.Arrays.fill(foldedCurrentIm[a], from, to, 0);
      java.util.Arrays.fill(foldedChargeRe[a], from, to, 0);
      java.util.Arrays.fill(foldedChargeIm[a], from, to, 0);
    }
    double[][] shape = Shapes.weighted(gauss);
    double[][] slope = Shapes.weightedSlopes(gauss);
    for (int q = 0; q < gauss; q++) {
      int i = from + q;
      kernel(i, points.z[i], from, to, directRe, directIm);
      blank(e, skipDirect, directRe, directIm);
      combineDirect(i, from, to);
      if (reflection.present()) {
        kernel(i, -points.z[i], from, to, imageRe, imageIm);
        combineImage(i, e);
      }
      for (int a = 0; a < shapes; a++) {
        axpy(shape[a][q], currentRe, foldedCurrentRe[a], from, to);
        axpy(shape[a][q], currentIm, foldedCurrentIm[a], from, to);
        axpy(slope[a][q], chargeRe, foldedChargeRe[a], from, to);
        axpy(slope[a][q], chargeIm, foldedChargeIm[a], from, to);
      }
    }
  }

  private static void axpy(double factor, double[] from, double[] to, int low, int high) {
    for (int j = low; j < high; j++) {
      to[j] += factor * from[j];
    }
  }

  private void blank(int e, boolean[] skip, double[] re, double[] im) {
    for (int f = e; f < mesh.elements; f++) {
      if (skip[f]) {
        java.util.Arrays.fill(re, points.first[f], points.first[f + 1], 0);
        java.util.Arrays.fill(im, points.first[f], points.first[f + 1], 0);
      }
    }
  }

  /** e^{−jkR}/R from point i, taken at height zi, to points from .. to − 1. */
  private void kernel(int i, double zi, int from, int to, double[] re, double[] im) {
    double xi = points.x[i];
    double yi = points.y[i];
    double[] x = points.x;
    double[] y = points.y;
    double[] z = points.z;
    for (int j = from; j < to; j++) {
      double dx = x[j] - xi;
      double dy = y[j] - yi;
      double dz = z[j] - zi;
      far[j - from] = Math.sqrt(dx * dx + dy * dy + dz * dz + 1e-30);
    }
    for (int j = 0; j < to - from; j++) {
      angle[j] = k * far[j];
    }
    SinCos.of(angle, to - from, sin, cos);
    for (int j = from; j < to; j++) {
      re[j] = cos[j - from] / far[j - from];
    }
    for (int j = from; j < to; j++) {
      im[j] = -sin[j - from] / far[j - from];
    }
  }

  private void combineDirect(int i, int from, int to) {
    double tx = points.tx[i];
    double ty = points.ty[i];
    double tz = points.tz[i];
    double[] ux = points.tx;
    double[] uy = points.ty;
    double[] uz = points.tz;
    for (int j = from; j < to; j++) {
      double dot = tx * ux[j] + ty * uy[j] + tz * uz[j];
      currentRe[j] = dot * directRe[j];
      currentIm[j] = dot * directIm[j];
    }
    System.arraycopy(directRe, from, chargeRe, from, to - from);
    System.arraycopy(directIm, from, chargeIm, from, to - from);
  }

  private void combineImage(int i, int e) {
    double tx = points.tx[i];
    double ty = points.ty[i];
    double tz = points.tz[i];
    for (int f = e; f < mesh.elements; f++) {
      if (skipImage[f]) {
        continue;
      }
      double level = tx * mesh.tx[f] + ty * mesh.ty[f];
      double upright = tz * mesh.tz[f];
      for (int j = points.first[f]; j < points.first[f + 1]; j++) {
        // from source j to observer i
        double dx = points.x[i] - points.x[j];
        double dy = points.y[i] - points.y[j];
        double rho = Math.sqrt(dx * dx + dy * dy);
        reflection.ratios(rho, points.z[i] + points.z[j], ratio);
        double cross = 0;
        if (rho > 1e-9) {
          cross =
              ((tx * dx + ty * dy) * mesh.tz[f] - tz * (mesh.tx[f] * dx + mesh.ty[f] * dy)) / rho;
        }
        double vr = level * ratio[0] + upright * ratio[4] + cross * ratio[6];
        double vi = level * ratio[1] + upright * ratio[5] + cross * ratio[7];
        double gr = imageRe[j];
        double gi = imageIm[j];
        currentRe[j] += vr * gr - vi * gi;
        currentIm[j] += vr * gi + vi * gr;
        chargeRe[j] += ratio[2] * gr - ratio[3] * gi;
        chargeIm[j] += ratio[2] * gi + ratio[3] * gr;
      }
    }
  }

  /** The block of (e, f) from the folded rows. */
  private void fold(int e, int f) {
    int rows = mesh.order[e] + 1;
    int columns = mesh.order[f] + 1;
    int first = points.first[f];
    int gauss = points.first[f + 1] - first;
    double[][] shape = Shapes.weighted(gauss);
    double[][] slope = Shapes.weightedSlopes(gauss);
    double area = mesh.length[e] * mesh.length[f];
    for (int a = 0; a < rows; a++) {
      for (int b = 0; b < columns; b++) {
        double cr = 0;
        double ci = 0;
        double pr = 0;
        double pi = 0;
        for (int q = 0; q < gauss; q++) {
          double w = shape[b][q];
          double d = slope[b][q];
          cr += w * foldedCurrentRe[a][first + q];
          ci += w * foldedCurrentIm[a][first + q];
          pr += d * foldedChargeRe[a][first + q];
          pi += d * foldedChargeIm[a][first + q];
        }
        put(a * columns + b, area * cr, area * ci, pr, pi);
      }
    }
  }

  /** (jη/4π)(k·current − charge/k). */
  private void put(int at, double currentR, double currentI, double chargeR, double chargeI) {
    double factor = Constants.ETA0 / (4 * Math.PI);
    blockRe[at] = -factor * (k * currentI - chargeI / k);
    blockIm[at] = factor * (k * currentR - chargeR / k);
  }

  /** Adds the image of a low pair on shorter stretches of both elements. */
  private void lowImage(int e, int f) {
    LowImage low = new LowImage(mesh, reflection, k);
    double longer = Math.max(mesh.length[e], mesh.length[f]);
    int most = stretches(e, f);
    int me = Math.max(1, (int) Math.ceil(most * mesh.length[e] / longer));
    int mf = Math.max(1, (int) Math.ceil(most * mesh.length[f] / longer));
    low.add(e, f, me, mf, blockRe, blockIm);
  }

  private void scatter(int e, int f) {
    int columns = mesh.order[f] + 1;
    int[] ue = mesh.slotUnknown[e];
    int[] uf = mesh.slotUnknown[f];
    for (int i = 0; i < ue.length; i++) {
      double si = mesh.slotSign[e][i];
      int row = mesh.slotShape[e][i] * columns;
      for (int j = 0; j < uf.length; j++) {
        double sign = si * mesh.slotSign[f][j];
        int at = row + mesh.slotShape[f][j];
        int p = ue[i];
        int q = uf[j];
        if (e == f && p < q) {
          continue;
        }
        double twice = e != f && p == q ? 2 * sign : sign;
        if (p >= q) {
          system.re[p][q] += twice * blockRe[at];
          system.im[p][q] += twice * blockIm[at];
        } else {
          system.re[q][p] += twice * blockRe[at];
          system.im[q][p] += twice * blockIm[at];
        }
      }
    }
  }
}
