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
 * <p>Far pairs: Gauss points of both elements. Rows over all points of an element and the later
 * ones hold e^{−jkR}/R, direct and to the image, then the two combined kernels (current, charge);
 * rows are folded with the shapes of the first element, then element by element with those of the
 * second. Loops are long, plain and over doubles, one store each, so that they run several lanes at
 * a time. Close pairs take their static part from {@link StaticPairs}; images nearer than an
 * element is long are left to {@link LowImage}.
 */
final class MatrixFill {
  private final Mesh mesh;
  private final StaticPairs statics;
  private final SourcePoints points;
  private final Sightlines sightlines;
  private final RatioRows ratioRows;
  private final Reflection reflection;
  private final double k;
  private final SymmetricSystem system;
  private final FillWork work;

  /** A fill of its own, for one frequency. */
  MatrixFill(Mesh mesh, StaticPairs statics, SourcePoints points, Reflection reflection, double k) {
    this(
        mesh,
        statics,
        points,
        new Sightlines(mesh, points, statics, reflection.present(), false),
        reflection.present() ? new RatioRows(mesh, points) : null,
        reflection,
        k,
        new SymmetricSystem(mesh.unknowns),
        new FillWork());
  }

  MatrixFill(
      Mesh mesh,
      StaticPairs statics,
      SourcePoints points,
      Sightlines sightlines,
      RatioRows ratioRows,
      Reflection reflection,
      double k,
      SymmetricSystem system,
      FillWork work) {
    this.mesh = mesh;
    this.statics = statics;
    this.points = points;
    this.sightlines = sightlines;
    this.ratioRows = ratioRows;
    this.reflection = reflection;
    this.k = k;
    this.system = system;
    this.work = work;
  }

  /** The filled system, without the wires' own impedance. */
  SymmetricSystem fields() {
    LowImage lowImage = new LowImage(mesh, reflection, k);
    for (int e = 0; e < mesh.elements; e++) {
      Sightlines.Row row = sightlines.of(e, work.row);
      work.size(row.gauss * row.columns, row.columns);
      direct(row);
      if (reflection.present()) {
        image(row);
      }
      foldRows(row);
      int low = 0;
      for (int f = e; f < mesh.elements; f++) {
        fold(row, f);
        if (reflection.present() && row.low[low] == f) {
          low++;
          lowImage.add(e, f, work.blockRe, work.blockIm);
        }
        scatter(e, f);
      }
    }
    ClosePairs close = new ClosePairs(mesh, k);
    for (StaticPairs.Pair pair : statics.pairs) {
      close.block(pair, work.blockRe, work.blockIm);
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
          work.blockRe[a * n + b] = mass * z.getReal();
          work.blockIm[a * n + b] =
              mass * z.getImaginary() - Shapes.STIFFNESS[a][b] / mesh.length[e] * x / omega;
        }
      }
      scatter(e, e);
    }
  }

  /** e^{−jkR}/R from each point of the element, times the tangents' product for the current. */
  private void direct(Sightlines.Row row) {
    int count = row.gauss * row.columns;
    wave(row.direct, row.directInverse, count, work.chargeRe, work.chargeIm);
    product(row.dot, work.chargeRe, work.currentRe, count);
    product(row.dot, work.chargeIm, work.currentIm, count);
  }

  /** Adds the ground's part: ratios times the image's wave. */
  private void image(Sightlines.Row row) {
    int count = row.gauss * row.columns;
    wave(row.image, row.imageInverse, count, work.imageRe, work.imageIm);
    ratioRows.work(row, reflection, work.ratios);
    double[][] ratio = work.ratios.parts;
    if (row.crossing) {
      addProduct(row.cross, ratio[4], ratio[0], count);
      addProduct(row.cross, ratio[5], ratio[1], count);
    }
    addReal(ratio[0], ratio[1], work.imageRe, work.imageIm, work.currentRe, count);
    addImaginary(ratio[0], ratio[1], work.imageRe, work.imageIm, work.currentIm, count);
    addReal(ratio[2], ratio[3], work.imageRe, work.imageIm, work.chargeRe, count);
    addImaginary(ratio[2], ratio[3], work.imageRe, work.imageIm, work.chargeIm, count);
  }

  private void wave(double[] distance, double[] inverse, int count, double[] re, double[] im) {
    double[] angle = work.angle;
    for (int i = 0; i < count; i++) {
      angle[i] = k * distance[i];
    }
    SinCos.of(angle, count, im, re);
    for (int i = 0; i < count; i++) {
      re[i] *= inverse[i];
    }
    for (int i = 0; i < count; i++) {
      im[i] *= -inverse[i];
    }
  }

  private static void product(double[] x, double[] y, double[] out, int count) {
    for (int i = 0; i < count; i++) {
      out[i] = x[i] * y[i];
    }
  }

  private static void addProduct(double[] x, double[] y, double[] out, int count) {
    for (int i = 0; i < count; i++) {
      out[i] += x[i] * y[i];
    }
  }

  private static void addReal(
      double[] xr, double[] xi, double[] yr, double[] yi, double[] out, int count) {
    for (int i = 0; i < count; i++) {
      out[i] += xr[i] * yr[i] - xi[i] * yi[i];
    }
  }

  private static void addImaginary(
      double[] xr, double[] xi, double[] yr, double[] yi, double[] out, int count) {
    for (int i = 0; i < count; i++) {
      out[i] += xr[i] * yi[i] + xi[i] * yr[i];
    }
  }

  /** Sums over the points of the first element with each of its shapes. */
  private void foldRows(Sightlines.Row row) {
    double[][] shape = Shapes.weighted(row.gauss);
    double[][] slope = Shapes.weightedSlopes(row.gauss);
    int n = row.columns;
    for (int a = 0; a <= mesh.order[row.e]; a++) {
      weigh(shape[a], work.currentRe, work.foldedCurrentRe[a], n, row.gauss);
      weigh(shape[a], work.currentIm, work.foldedCurrentIm[a], n, row.gauss);
      if (a > 0) {
        // the slope of shape 0 is that of shape 1, turned round
        weigh(slope[a], work.chargeRe, work.foldedChargeRe[a], n, row.gauss);
        weigh(slope[a], work.chargeIm, work.foldedChargeIm[a], n, row.gauss);
      }
    }
  }

  private static void weigh(double[] w, double[] rows, double[] out, int n, int gauss) {
    if (gauss == 4) {
      four(rows, w[0], w[1], w[2], w[3], n, out);
      return;
    }
    two(rows, w[0], w[1], n, out);
    for (int q = 2; q < gauss; q++) {
      more(rows, w[q], q * n, n, out);
    }
  }

  private static void four(
      double[] x, double w0, double w1, double w2, double w3, int n, double[] out) {
    for (int j = 0; j < n; j++) {
      out[j] = (w0 * x[j] + w1 * x[n + j]) + (w2 * x[2 * n + j] + w3 * x[3 * n + j]);
    }
  }

  private static void two(double[] x, double w0, double w1, int n, double[] out) {
    for (int j = 0; j < n; j++) {
      out[j] = w0 * x[j] + w1 * x[n + j];
    }
  }

  private static void more(double[] x, double w, int at, int n, double[] out) {
    for (int j = 0; j < n; j++) {
      out[j] += w * x[at + j];
    }
  }

  /** The block of the row's element and f, from the folded rows. */
  private void fold(Sightlines.Row row, int f) {
    int rows = mesh.order[row.e] + 1;
    int columns = mesh.order[f] + 1;
    int first = points.first[f] - row.from;
    int gauss = points.first[f + 1] - points.first[f];
    double[][] shape = Shapes.weighted(gauss);
    double[][] slope = Shapes.weightedSlopes(gauss);
    double current = Constants.ETA0 / (4 * Math.PI) * k * mesh.length[row.e] * mesh.length[f];
    double charge = Constants.ETA0 / (4 * Math.PI) / k;
    double[] blockRe = work.blockRe;
    double[] blockIm = work.blockIm;
    for (int a = 0; a < rows; a++) {
      double[] xr = work.foldedCurrentRe[a];
      double[] xi = work.foldedCurrentIm[a];
      double[] pr = work.foldedChargeRe[Math.max(1, a)];
      double[] pi = work.foldedChargeIm[Math.max(1, a)];
      double turned = a == 0 ? -charge : charge;
      for (int b = 0; b < columns; b++) {
        int at = a * columns + b;
        // (jη/4π)(k·current − charge/k)
        blockRe[at] = -current * sum(shape[b], xi, first, gauss);
        blockIm[at] = current * sum(shape[b], xr, first, gauss);
        if (b > 0) {
          blockRe[at] += turned * sum(slope[b], pi, first, gauss);
          blockIm[at] -= turned * sum(slope[b], pr, first, gauss);
        }
      }
      // the slope of shape 0 is that of shape 1, turned round
      int at = a * columns;
      blockRe[at] -= turned * sum(slope[1], pi, first, gauss);
      blockIm[at] += turned * sum(slope[1], pr, first, gauss);
    }
  }

  private static double sum(double[] w, double[] x, int at, int gauss) {
    if (gauss == 4) {
      return (w[0] * x[at] + w[1] * x[at + 1]) + (w[2] * x[at + 2] + w[3] * x[at + 3]);
    }
    double sum = w[0] * x[at] + w[1] * x[at + 1];
    for (int q = 2; q < gauss; q++) {
      sum += w[q] * x[at + q];
    }
    return sum;
  }

  private void scatter(int e, int f) {
    int columns = mesh.order[f] + 1;
    int[] ue = mesh.slotUnknown[e];
    int[] uf = mesh.slotUnknown[f];
    int[] shapeF = mesh.slotShape[f];
    double[] signF = mesh.slotSign[f];
    double[] blockRe = work.blockRe;
    double[] blockIm = work.blockIm;
    double[][] rows = system.row;
    for (int i = 0; i < ue.length; i++) {
      double si = mesh.slotSign[e][i];
      int row = mesh.slotShape[e][i] * columns;
      int p = ue[i];
      for (int j = 0; j < uf.length; j++) {
        int q = uf[j];
        double factor = si * signF[j];
        if (p == q && e != f) {
          factor *= 2;
        }
        int at = row + shapeF[j];
        if (q >= p) {
          rows[q][2 * p] += factor * blockRe[at];
          rows[q][2 * p + 1] += factor * blockIm[at];
        } else if (e != f) {
          rows[p][2 * q] += factor * blockRe[at];
          rows[p][2 * q + 1] += factor * blockIm[at];
        }
      }
    }
  }
}
