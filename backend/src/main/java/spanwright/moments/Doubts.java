package spanwright.moments;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.complex.Complex;

/** What a solution should be doubted for, in words. */
final class Doubts {
  private static final double LOW_WIRE = 0.3;
  private static final double SHORT_PIECE = 6;
  private static final double CLOSE_WIRES = 6;

  private Doubts() {}

  static List<String> about(
      AntennaModel model, Ground ground, Outline outline, Mesh mesh, StaticPairs statics) {
    List<String> out = new ArrayList<>();
    thickness(model, outline, out);
    if (ground.kind() == Ground.Kind.REAL) {
      lowWires(model, mesh, out);
    }
    neighbours(mesh, statics, out);
    return out;
  }

  private static void thickness(AntennaModel model, Outline outline, List<String> out) {
    boolean[] told = new boolean[model.wires().size()];
    for (Outline.Piece piece : outline.pieces) {
      int w = piece.wire();
      double radius = model.wires().get(w).radius();
      if (!told[w] && piece.length() < SHORT_PIECE * radius) {
        told[w] = true;
        out.add(
            String.format(
                Locale.ROOT,
                "%s has a straight piece of %.3f m that is short for its radius of %.4f m: the"
                    + " thin-wire equation is doubtful there.",
                ModelCheck.name(w),
                piece.length(),
                radius));
      }
    }
  }

  private static void lowWires(AntennaModel model, Mesh mesh, List<String> out) {
    double[] lowest = new double[model.wires().size()];
    java.util.Arrays.fill(lowest, Double.POSITIVE_INFINITY);
    for (int e = 0; e < mesh.elements; e++) {
      double low = Math.min(mesh.z[e], mesh.z[e] + mesh.length[e] * mesh.tz[e]);
      lowest[mesh.wire[e]] = Math.min(lowest[mesh.wire[e]], low);
    }
    for (int w = 0; w < lowest.length; w++) {
      if (lowest[w] < LOW_WIRE) {
        out.add(
            String.format(
                Locale.ROOT,
                "%s comes within %.2f m of the ground: below 0.3 m the soil's surface, grass and"
                    + " wet matter as much as what is computed.",
                ModelCheck.name(w),
                lowest[w]));
      }
    }
  }

  private static void neighbours(Mesh mesh, StaticPairs statics, List<String> out) {
    List<String> told = new ArrayList<>();
    for (StaticPairs.Pair pair : statics.pairs) {
      int e = pair.e();
      int f = pair.f();
      if (pair.radius2() > 0 || mesh.wire[e] == mesh.wire[f]) {
        continue;
      }
      double radii = mesh.radius[e] + mesh.radius[f];
      double apart = statics.apart(e, f);
      String names = ModelCheck.name(mesh.wire[e]) + " and " + ModelCheck.name(mesh.wire[f]);
      if (apart < 0.5 * CLOSE_WIRES * radii && !told.contains(names)) {
        told.add(names);
        out.add(
            String.format(
                Locale.ROOT,
                "%s come within %.3f m of each other, which is close for their radii: current"
                    + " crowds to the near sides there, and that is not modelled.",
                names,
                apart));
      }
    }
  }

  static void ofAnswer(Complex impedance, SymmetricSystem system, Ground ground, List<String> out) {
    if (system.residual > 1e-6) {
      out.add(
          String.format(
              Locale.ROOT,
              "The linear system is nearly singular (residual %.1e): do not trust this answer.",
              system.residual));
    }
    if (ground.kind() == Ground.Kind.REAL
        && impedance.getReal() < 2e-4 * Math.abs(impedance.getImaginary())) {
      out.add(
          "The wire is so short for the frequency that its resistance is lost in the reactance:"
              + " resistance, gain and efficiency are uncertain.");
    }
  }
}
