package spanwright.moments;

import java.util.Arrays;

/**
 * The ground's ratios along whole elements. They vary over the distance to the image, which is most
 * often far more than an element is long: so they are looked up at one to four Gauss points of an
 * element, as its length against that distance asks, and interpolated to all its points.
 *
 * <p>What is interpolated for a pair of elements is the current's ratio th·t′h GA + tz t′z GZ, the
 * charge's GP, and F/ρ, whose sine over ρ is smooth where F's direction is not.
 */
final class RatioRows {
  /** Values at a node: current, charge, cross, as re and im. */
  static final int PARTS = 6;

  /** Ratio of length to distance up to which one, two and three nodes do. */
  private static final double[] REACH = {0.1, 0.5, 1.5};

  private static final int MOST_NODES = 4;
  private static final int MOST = Shapes.MOST + 2;

  /** Lagrange's polynomials of n Gauss nodes at m Gauss points: [n][m][node][point]. */
  private static final double[][][][] SPREAD = new double[MOST + 1][MOST + 1][][];

  static {
    for (int n = 1; n <= MOST; n++) {
      for (int m = 1; m <= MOST; m++) {
        SPREAD[n][m] = lagrange(GaussRule.of(n).nodes, GaussRule.of(m).nodes);
      }
    }
  }

  private final Mesh mesh;
  private final SourcePoints points;

  /** Nodes of element e are first[e] .. first[e + 1] − 1. */
  private final int[] first;

  private final double[] x;
  private final double[] y;
  private final double[] z;

  /** Most nodes of any element. */
  private final int terms;

  /** First node of the element of each point. */
  private final int[] node;

  /** Weight of that node and the following at each point: [which][point]; 0 beyond the element. */
  private final double[][] weight;

  RatioRows(Mesh mesh, SourcePoints points) {
    this.mesh = mesh;
    this.points = points;
    first = new int[mesh.elements + 1];
    double lowest = Double.MAX_VALUE;
    for (int e = 0; e < mesh.elements; e++) {
      lowest = Math.min(lowest, low(e));
    }
    for (int e = 0; e < mesh.elements; e++) {
      int all = points.first[e + 1] - points.first[e];
      first[e + 1] = first[e] + Math.min(all, nodes(mesh.length[e] / (low(e) + lowest)));
    }
    int count = first[mesh.elements];
    x = new double[count];
    y = new double[count];
    z = new double[count];
    for (int e = 0; e < mesh.elements; e++) {
      double[] t = GaussRule.of(first[e + 1] - first[e]).nodes;
      for (int i = first[e]; i < first[e + 1]; i++) {
        double s = mesh.length[e] * t[i - first[e]];
        x[i] = mesh.x[e] + s * mesh.tx[e];
        y[i] = mesh.y[e] + s * mesh.ty[e];
        z[i] = mesh.z[e] + s * mesh.tz[e];
      }
    }
    terms = most();
    node = new int[points.count];
    weight = new double[MOST_NODES][points.count];
    for (int e = 0; e < mesh.elements; e++) {
      int gauss = points.first[e + 1] - points.first[e];
      double[][] spread = SPREAD[first[e + 1] - first[e]][gauss];
      for (int q = 0; q < gauss; q++) {
        int j = points.first[e] + q;
        node[j] = first[e];
        for (int b = 0; b < spread.length; b++) {
          weight[b][j] = spread[b][q];
        }
      }
    }
  }

  private int most() {
    int most = 1;
    for (int e = 0; e < mesh.elements; e++) {
      most = Math.max(most, first[e + 1] - first[e]);
    }
    return most;
  }

  private double low(int e) {
    return Math.min(mesh.z[e], mesh.z[e] + mesh.length[e] * mesh.tz[e]);
  }

  private static int nodes(double part) {
    int n = 0;
    while (n < REACH.length && part > REACH[n]) {
      n++;
    }
    return n + 1;
  }

  private static double[][] lagrange(double[] nodes, double[] at) {
    double[][] out = new double[nodes.length][at.length];
    for (int a = 0; a < nodes.length; a++) {
      for (int i = 0; i < at.length; i++) {
        double product = 1;
        for (int b = 0; b < nodes.length; b++) {
          if (b != a) {
            product *= (at[i] - nodes[b]) / (nodes[a] - nodes[b]);
          }
        }
        out[a][i] = product;
      }
    }
    return out;
  }

  /** Scratch arrays. */
  static final class Work {
    private double[] rho = new double[0];
    private double[] zeta = new double[0];
    private final double[][] ratios = new double[Reflection.RATIOS][0];
    private double[][] columns = new double[0][];

    /** Ratios from every point of an element to every later point, as {@link Sightlines.Row}. */
    final double[][] parts = new double[PARTS][0];

    private void size(int nodes, int mine, int columnCount, int gauss) {
      if (rho.length < nodes) {
        rho = new double[nodes];
        zeta = new double[nodes];
        for (int m = 0; m < ratios.length; m++) {
          // weights of 0 reach beyond the last node
          ratios[m] = new double[nodes + MOST_NODES];
        }
      }
      if (columns.length < PARTS * MOST) {
        columns = new double[PARTS * MOST][0];
      }
      for (int c = 0; c < PARTS * mine; c++) {
        if (columns[c].length < columnCount) {
          columns[c] = new double[columnCount];
        }
      }
      for (int c = 0; c < PARTS; c++) {
        if (parts[c].length < gauss * columnCount) {
          parts[c] = new double[gauss * columnCount];
        }
      }
    }
  }

  /** Works out the ratios along the sight lines of a row. */
  void work(Sightlines.Row row, Reflection reflection, Work work) {
    int e = row.e;
    int mine = first[e + 1] - first[e];
    int parts = row.crossing ? PARTS : PARTS - 2;
    work.size(first[mesh.elements] - first[e], mine, row.columns, row.gauss);
    for (int a = 0; a < mine; a++) {
      lookUp(e, first[e] + a, reflection, work);
      turn(e, row.crossing, work);
      acrossColumns(e, row.from, parts, a, work);
    }
    double[][] spread = SPREAD[mine][row.gauss];
    for (int c = 0; c < parts; c++) {
      double[] out = work.parts[c];
      for (int q = 0; q < row.gauss; q++) {
        int at = q * row.columns;
        scaled(spread[0][q], work.columns[c], out, at, row.columns);
        for (int a = 1; a < mine; a++) {
          added(spread[a][q], work.columns[PARTS * a + c], out, at, row.columns);
        }
      }
    }
  }

  private void lookUp(int e, int i, Reflection reflection, Work work) {
    int from = first[e];
    int count = first[mesh.elements] - from;
    for (int j = 0; j < count; j++) {
      double dx = x[from + j] - x[i];
      double dy = y[from + j] - y[i];
      work.zeta[j] = z[from + j] + z[i];
      // not quite 0, for F/rho to have its limit
      work.rho[j] = Math.max(Math.sqrt(dx * dx + dy * dy), 1e-3 * work.zeta[j]);
    }
    reflection.ratios(work.rho, work.zeta, count, work.ratios);
    for (double[] values : work.ratios) {
      // what a weight of 0 reaches must be a number
      Arrays.fill(values, count, count + MOST_NODES, 0);
    }
  }

  /** Makes the pair's three ratios of the table's four; they take the place of the first six. */
  private void turn(int e, boolean crossing, Work work) {
    double[][] r = work.ratios;
    for (int f = e; f < mesh.elements; f++) {
      double level = mesh.tx[e] * mesh.tx[f] + mesh.ty[e] * mesh.ty[f];
      double upright = mesh.tz[e] * mesh.tz[f];
      for (int j = first[f] - first[e]; j < first[f + 1] - first[e]; j++) {
        r[0][j] = level * r[0][j] + upright * r[4][j];
        r[1][j] = level * r[1][j] + upright * r[5][j];
        if (crossing) {
          r[4][j] = r[6][j] / work.rho[j];
          r[5][j] = r[7][j] / work.rho[j];
        }
      }
    }
  }

  /** From the nodes to every point. */
  private void acrossColumns(int e, int from, int parts, int a, Work work) {
    int shift = first[e];
    for (int c = 0; c < parts; c++) {
      double[] values = work.ratios[c];
      double[] out = work.columns[PARTS * a + c];
      switch (terms) {
        case 1 -> one(values, out, from, shift);
        case 2 -> two(values, out, from, shift);
        case 3 -> three(values, out, from, shift);
        default -> four(values, out, from, shift);
      }
    }
  }

  private void one(double[] values, double[] out, int from, int shift) {
    for (int j = from; j < points.count; j++) {
      out[j - from] = values[node[j] - shift];
    }
  }

  private void two(double[] values, double[] out, int from, int shift) {
    for (int j = from; j < points.count; j++) {
      int at = node[j] - shift;
      out[j - from] = weight[0][j] * values[at] + weight[1][j] * values[at + 1];
    }
  }

  private void three(double[] values, double[] out, int from, int shift) {
    double[] w0 = weight[0];
    double[] w1 = weight[1];
    double[] w2 = weight[2];
    for (int j = from; j < points.count; j++) {
      int at = node[j] - shift;
      out[j - from] = w0[j] * values[at] + w1[j] * values[at + 1] + w2[j] * values[at + 2];
    }
  }

  private void four(double[] values, double[] out, int from, int shift) {
    double[] w0 = weight[0];
    double[] w1 = weight[1];
    double[] w2 = weight[2];
    double[] w3 = weight[3];
    for (int j = from; j < points.count; j++) {
      int at = node[j] - shift;
      out[j - from] =
          w0[j] * values[at]
              + w1[j] * values[at + 1]
              + (w2[j] * values[at + 2] + w3[j] * values[at + 3]);
    }
  }

  private static void scaled(double factor, double[] from, double[] to, int at, int count) {
    for (int j = 0; j < count; j++) {
      to[at + j] = factor * from[j];
    }
  }

  private static void added(double factor, double[] from, double[] to, int at, int count) {
    for (int j = 0; j < count; j++) {
      to[at + j] += factor * from[j];
    }
  }
}
