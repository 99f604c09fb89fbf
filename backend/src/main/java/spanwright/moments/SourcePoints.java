package spanwright.moments;

/**
 * Gauss points of all elements, one after the other: element e owns first[e] .. first[e + 1] − 1.
 */
final class SourcePoints {
  final int count;
  final int[] first;
  final double[] x;
  final double[] y;
  final double[] z;
  final double[] tx;
  final double[] ty;
  final double[] tz;

  SourcePoints(Mesh mesh) {
    first = new int[mesh.elements + 1];
    for (int e = 0; e < mesh.elements; e++) {
      first[e + 1] = first[e] + points(mesh.order[e]);
    }
    count = first[mesh.elements];
    x = new double[count];
    y = new double[count];
    z = new double[count];
    tx = new double[count];
    ty = new double[count];
    tz = new double[count];
    for (int e = 0; e < mesh.elements; e++) {
      GaussRule rule = GaussRule.of(first[e + 1] - first[e]);
      for (int q = 0; q < rule.nodes.length; q++) {
        int i = first[e] + q;
        double s = mesh.length[e] * rule.nodes[q];
        x[i] = mesh.x[e] + s * mesh.tx[e];
        y[i] = mesh.y[e] + s * mesh.ty[e];
        z[i] = mesh.z[e] + s * mesh.tz[e];
        tx[i] = mesh.tx[e];
        ty[i] = mesh.ty[e];
        tz[i] = mesh.tz[e];
      }
    }
  }

  /** Gauss points of an element of this order. */
  static int points(int order) {
    return order + 1;
  }
}
