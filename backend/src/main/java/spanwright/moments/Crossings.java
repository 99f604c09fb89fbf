package spanwright.moments;

import java.util.List;

/** Refuses wires that run into each other without being joined. */
final class Crossings {
  /** Pieces that meet must open by at least this angle [rad]: 1°. */
  private static final double LEAST_ANGLE = Math.toRadians(1);

  private Crossings() {}

  /**
   * Refuses what crosses.
   *
   * @param within how near pieces must come to be told [m]
   * @return least distance between pieces that do not meet, where less than that; else infinite [m]
   */
  static double refuse(List<Outline.Piece> pieces, AntennaModel model, double within) {
    int n = pieces.size();
    double[][] line = new double[n][];
    for (int i = 0; i < n; i++) {
      Outline.Piece p = pieces.get(i);
      double length = p.length();
      line[i] =
          new double[] {
            p.a().x(),
            p.a().y(),
            p.a().z(),
            (p.b().x() - p.a().x()) / length,
            (p.b().y() - p.a().y()) / length,
            (p.b().z() - p.a().z()) / length,
            length
          };
    }
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < n; i++) {
      for (int j = i + 1; j < n; j++) {
        double apart = pair(pieces.get(i), line[i], pieces.get(j), line[j], model, within);
        least = apart < within ? Math.min(least, apart) : least;
      }
    }
    return least;
  }

  /** Distance of two pieces that do not meet, or infinite where it does not matter. */
  private static double pair(
      Outline.Piece p, double[] a, Outline.Piece q, double[] b, AntennaModel model, double within) {
    double need = model.wires().get(p.wire()).radius() + model.wires().get(q.wire()).radius();
    double dx = a[0] + 0.5 * a[6] * a[3] - b[0] - 0.5 * b[6] * b[3];
    double dy = a[1] + 0.5 * a[6] * a[4] - b[1] - 0.5 * b[6] * b[4];
    double dz = a[2] + 0.5 * a[6] * a[5] - b[2] - 0.5 * b[6] * b[5];
    double reach = 0.5 * (a[6] + b[6]) + Math.max(need, within);
    if (dx * dx + dy * dy + dz * dz > reach * reach) {
      return Double.POSITIVE_INFINITY;
    }
    boolean headA = p.nodeA() == q.nodeA() || p.nodeA() == q.nodeB();
    boolean tailA = p.nodeB() == q.nodeA() || p.nodeB() == q.nodeB();
    if (headA && tailA) {
      throw new ModelFault(
          names(p, q) + " run along each other from node to node: take one of them away.");
    }
    if (headA || tailA) {
      boolean sameEnd = headA ? p.nodeA() == q.nodeA() : p.nodeB() == q.nodeB();
      double cos = (a[3] * b[3] + a[4] * b[4] + a[5] * b[5]) * (sameEnd ? 1 : -1);
      if (cos > Math.cos(LEAST_ANGLE)) {
        throw new ModelFault(
            names(p, q)
                + " run back along each other from where they meet near "
                + place(headA ? p.a() : p.b())
                + ": open the angle between them.");
      }
      return Double.POSITIVE_INFINITY;
    }
    double[] at = new double[2];
    double d2 =
        Segments.squared(
            a[0], a[1], a[2], a[3], a[4], a[5], a[6], b[0], b[1], b[2], b[3], b[4], b[5], b[6], at);
    if (d2 < need * need) {
      Vertex where = new Vertex(a[0] + at[0] * a[3], a[1] + at[0] * a[4], a[2] + at[0] * a[5]);
      throw new ModelFault(
          names(p, q)
              + " touch or cross near "
              + place(where)
              + " without being joined: their middles are "
              + String.format(java.util.Locale.ROOT, "%.4f", Math.sqrt(d2))
              + " m apart and their radii add up to "
              + String.format(java.util.Locale.ROOT, "%.4f", need)
              + " m. Move one, or end a wire at the crossing.");
    }
    return Math.sqrt(d2);
  }

  private static String names(Outline.Piece p, Outline.Piece q) {
    if (p.wire() == q.wire()) {
      return "Two parts of " + ModelCheck.name(p.wire());
    }
    return ModelCheck.name(p.wire()) + " and " + ModelCheck.name(q.wire());
  }

  private static String place(Vertex v) {
    return String.format(java.util.Locale.ROOT, "(%.2f, %.2f, %.2f)", v.x(), v.y(), v.z());
  }
}
