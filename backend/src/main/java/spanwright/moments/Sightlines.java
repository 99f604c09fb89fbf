package spanwright.moments;

import java.util.Arrays;

/**
 * What the coupling of far pairs of elements takes from geometry alone, and so is the same at every
 * frequency: distances between the Gauss points, direct and to the image, and the turns of their
 * tangents. Worked out element by element into one scratch row, or kept when several frequencies
 * will ask.
 */
final class Sightlines {
  /** So many pairs of points are kept at most; beyond, rows are worked out anew [pairs]. */
  private static final long MOST_KEPT = 60_000;

  /**
   * Sight lines from the points of element {@code e} to all points of it and later elements: entry
   * q·columns + j goes from the q-th point of e to point from + j.
   */
  static final class Row {
    int e;
    int gauss;
    int columns;

    /** First point of the element. */
    int from;

    double[] direct = new double[0];

    /** One over the distance, 0 where the direct part is left to others. */
    double[] directInverse = new double[0];

    double[] image = new double[0];
    double[] imageInverse = new double[0];

    /** Scalar product of the tangents. */
    double[] dot = new double[0];

    /** (t·d) t′z − tz (t′·d) with d level from source to observer [m]. */
    double[] cross = new double[0];

    /** Whether any of the last is not 0. */
    boolean crossing;

    /** Elements f ≥ e whose image is left to be done on shorter stretches, then −1. */
    int[] low = new int[0];

    private void size(int e, SourcePoints points, int elements, boolean grounded) {
      this.e = e;
      from = points.first[e];
      gauss = points.first[e + 1] - from;
      columns = points.count - from;
      int size = gauss * columns;
      if (direct.length < size) {
        direct = new double[size];
        directInverse = new double[size];
        dot = new double[size];
      }
      if (grounded && image.length < size) {
        image = new double[size];
        imageInverse = new double[size];
        cross = new double[size];
      }
      if (low.length < elements + 1) {
        low = new int[elements + 1];
      }
    }
  }

  private final Mesh mesh;
  private final SourcePoints points;
  private final StaticPairs statics;
  private final boolean grounded;
  private final Row[] kept;

  /**
   * @param several whether more than one frequency will ask
   */
  Sightlines(
      Mesh mesh, SourcePoints points, StaticPairs statics, boolean grounded, boolean several) {
    this.mesh = mesh;
    this.points = points;
    this.statics = statics;
    this.grounded = grounded;
    long pairs = (long) points.count * (points.count + 1) / 2;
    kept = several && pairs <= MOST_KEPT ? new Row[mesh.elements] : null;
  }

  /** The sight lines of an element, in the scratch row unless they are kept. */
  Row of(int e, Row scratch) {
    if (kept == null) {
      work(e, scratch);
      return scratch;
    }
    if (kept[e] == null) {
      kept[e] = new Row();
      work(e, kept[e]);
    }
    return kept[e];
  }

  private void work(int e, Row row) {
    row.size(e, points, mesh.elements, grounded);
    int columns = row.columns;
    for (int q = 0; q < row.gauss; q++) {
      int i = row.from + q;
      int at = q * columns - row.from;
      distances(i, points.z[i], row.from, at, row.direct);
      dots(i, row.from, at, row.dot);
      if (grounded) {
        distances(i, -points.z[i], row.from, at, row.image);
      }
    }
    inverses(row.direct, row.directInverse, row.gauss * columns);
    blank(row, row.directInverse, e);
    for (int f : statics.close[e]) {
      blank(row, row.directInverse, f);
    }
    if (grounded) {
      images(row);
    }
  }

  private void images(Row row) {
    inverses(row.image, row.imageInverse, row.gauss * row.columns);
    int found = 0;
    boolean upright = mesh.tz[row.e] != 0;
    for (int f = row.e; f < mesh.elements; f++) {
      upright |= mesh.tz[f] != 0;
      if (low(row.e, f)) {
        blank(row, row.imageInverse, f);
        row.low[found++] = f;
      }
    }
    row.low[found] = -1;
    row.crossing = upright;
    for (int q = 0; upright && q < row.gauss; q++) {
      crosses(row.from + q, row.from, q * row.columns - row.from, row.cross);
    }
  }

  private void blank(Row row, double[] values, int f) {
    for (int q = 0; q < row.gauss; q++) {
      int at = q * row.columns - row.from;
      Arrays.fill(values, at + points.first[f], at + points.first[f + 1], 0);
    }
  }

  private void distances(int i, double zi, int from, int at, double[] out) {
    double xi = points.x[i];
    double yi = points.y[i];
    double[] x = points.x;
    double[] y = points.y;
    double[] z = points.z;
    int count = points.count;
    for (int j = from; j < count; j++) {
      double dx = x[j] - xi;
      double dy = y[j] - yi;
      double dz = z[j] - zi;
      out[at + j] = Math.sqrt(dx * dx + dy * dy + dz * dz + 1e-30);
    }
  }

  private void dots(int i, int from, int at, double[] out) {
    double tx = points.tx[i];
    double ty = points.ty[i];
    double tz = points.tz[i];
    double[] ux = points.tx;
    double[] uy = points.ty;
    double[] uz = points.tz;
    int count = points.count;
    for (int j = from; j < count; j++) {
      out[at + j] = tx * ux[j] + ty * uy[j] + tz * uz[j];
    }
  }

  private void crosses(int i, int from, int at, double[] out) {
    double tx = points.tx[i];
    double ty = points.ty[i];
    double tz = points.tz[i];
    double along = tx * points.x[i] + ty * points.y[i];
    double[] x = points.x;
    double[] y = points.y;
    double[] ux = points.tx;
    double[] uy = points.ty;
    double[] uz = points.tz;
    double xi = points.x[i];
    double yi = points.y[i];
    int count = points.count;
    for (int j = from; j < count; j++) {
      out[at + j] = (along - (tx * x[j] + ty * y[j])) * uz[j];
    }
    for (int j = from; j < count; j++) {
      out[at + j] -= tz * (ux[j] * (xi - x[j]) + uy[j] * (yi - y[j]));
    }
  }

  private static void inverses(double[] distance, double[] out, int count) {
    for (int i = 0; i < count; i++) {
      out[i] = 1 / distance[i];
    }
  }

  private double lowEnd(int e) {
    return Math.min(mesh.z[e], mesh.z[e] + mesh.length[e] * mesh.tz[e]);
  }

  /** Whether the image of one element lies near the other for their length. */
  private boolean low(int e, int f) {
    double longer = Math.max(mesh.length[e], mesh.length[f]);
    double height = lowEnd(e) + lowEnd(f);
    if (height > StaticPairs.CLOSE * longer) {
      return false;
    }
    double dx =
        mesh.x[e] - mesh.x[f] + 0.5 * (mesh.length[e] * mesh.tx[e] - mesh.length[f] * mesh.tx[f]);
    double dy =
        mesh.y[e] - mesh.y[f] + 0.5 * (mesh.length[e] * mesh.ty[e] - mesh.length[f] * mesh.ty[f]);
    double apart = Math.hypot(dx, dy) - 0.5 * (mesh.length[e] + mesh.length[f]);
    double reach = Math.hypot(Math.max(0, apart), height);
    return reach <= StaticPairs.CLOSE * longer;
  }
}
