package spanwright.moments;

/**
 * The solved current on the elements of a mesh, for one volt (peak) across the feed gap: element e
 * carries the sum over a of (re[e][a] + j im[e][a]) times shape a.
 */
final class Currents {
  final Mesh mesh;
  final double[][] re;
  final double[][] im;

  Currents(Mesh mesh, double[] answerRe, double[] answerIm) {
    this.mesh = mesh;
    re = new double[mesh.elements][];
    im = new double[mesh.elements][];
    for (int e = 0; e < mesh.elements; e++) {
      re[e] = new double[mesh.order[e] + 1];
      im[e] = new double[mesh.order[e] + 1];
      for (int i = 0; i < mesh.slotShape[e].length; i++) {
        double sign = mesh.slotSign[e][i];
        int unknown = mesh.slotUnknown[e][i];
        re[e][mesh.slotShape[e][i]] += sign * answerRe[unknown];
        im[e][mesh.slotShape[e][i]] += sign * answerIm[unknown];
      }
    }
  }

  /** Sum of coefficients times the shapes (or their slopes) at t. */
  static double at(double[] coefficients, double[][] powers, double t) {
    double sum = 0;
    for (int a = 0; a < coefficients.length; a++) {
      sum += coefficients[a] * Shapes.at(powers[a], t);
    }
    return sum;
  }

  /** Power lost in the wires [W], given each wire's resistance [ohm/m]. */
  double loss(double[] resistance) {
    double sum = 0;
    for (int e = 0; e < mesh.elements; e++) {
      double square = 0;
      for (int a = 0; a < re[e].length; a++) {
        for (int b = 0; b < re[e].length; b++) {
          square += Shapes.MASS[a][b] * (re[e][a] * re[e][b] + im[e][a] * im[e][b]);
        }
      }
      sum += 0.5 * resistance[mesh.wire[e]] * mesh.length[e] * square;
    }
    return sum;
  }
}
