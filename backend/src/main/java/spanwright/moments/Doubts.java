package spanwright.moments;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.complex.Complex;

/**
 * What a solution should be doubted for, in words. A warning says what the figures leave out; a
 * failing, which is also a warning, that they must not be relied on.
 */
final class Doubts {
  private static final double LOW_WIRE = 0.3;
  private static final double SHORT_PIECE = 6;
  private static final double CLOSE_WIRES = 6;

  /** A residual beyond this share of the excitation spoils the answer. */
  private static final double RESIDUAL = 1e-6;

  /** Power that goes in and comes out nowhere, or the other way round, as a share. */
  private static final double UNACCOUNTED = 0.01;

  /** Moving so far on a finer mesh, as a multiple of what was aimed at, spoils the answer. */
  private static final double FAR_OFF = 5;

  final List<String> warnings;
  final List<String> failings;

  Doubts(List<String> warnings, List<String> failings) {
    this.warnings = new ArrayList<>(warnings);
    this.failings = new ArrayList<>(failings);
  }

  /** The same so far, to be added to on its own. */
  Doubts copy() {
    return new Doubts(warnings, failings);
  }

  static Doubts about(
      AntennaModel model, Ground ground, Outline outline, Mesh mesh, StaticPairs statics) {
    Doubts out = new Doubts(List.of(), List.of());
    thickness(model, outline, out.warnings);
    if (ground.kind() == Ground.Kind.REAL) {
      lowWires(model, mesh, out.warnings);
    }
    neighbours(mesh, statics, out.warnings);
    return out;
  }

  private void fail(String sentence) {
    warnings.add(sentence);
    failings.add(sentence);
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

  /**
   * A thick wire's feed: how wide its field is taken decides the susceptance. The size is what
   * doubling that width moved on whole waves of 5 to 30 mm at 28.5 MHz, where it is worst.
   */
  void ofFeed(AntennaModel model, double frequencyMHz) {
    double radius = model.wires().get(model.feedWire()).radius();
    double move = 3 * radius * frequencyMHz / 28.5;
    if (move >= 0.015) {
      warnings.add(
          String.format(
              Locale.ROOT,
              "%s is fed and %.3f m in radius: where its impedance is high the reflection"
                  + " coefficient (400 ohm) hangs on the form of the feed, by up to %.2f.",
              ModelCheck.name(model.feedWire()),
              radius,
              Math.min(move, 0.2)));
    }
  }

  void ofAnswer(Complex impedance, SymmetricSystem system, Ground ground) {
    if (!(system.residual <= RESIDUAL)) {
      fail(
          String.format(
              Locale.ROOT,
              "The linear system is nearly singular (residual %.1e): do not trust this answer.",
              system.residual));
    }
    if (ground.kind() == Ground.Kind.REAL
        && impedance.getReal() < 2e-4 * Math.abs(impedance.getImaginary())) {
      fail(
          "The wire is so short for the frequency that its resistance is lost in the reactance:"
              + " resistance, gain and efficiency are uncertain.");
    }
  }

  void ofRefinement(double change, double allowed) {
    if (change <= allowed) {
      return;
    }
    String sentence =
        String.format(
            Locale.ROOT,
            "A finer mesh moves the reflection coefficient (400 ohm) by %.3f, more than the %.2f"
                + " aimed at: %s.",
            change,
            allowed,
            change > FAR_OFF * allowed
                ? "impedance, and what follows from it, must not be relied on"
                : "take the impedance as no better than that");
    if (change > FAR_OFF * allowed) {
      fail(sentence);
    } else {
      warnings.add(sentence);
    }
  }

  /**
   * @param accounted radiated and lost in the wires, over input
   * @param soil whether the ground may take a share as well
   */
  static List<String> ofPower(double accounted, boolean soil) {
    boolean closes = soil ? accounted < 1 + UNACCOUNTED : Math.abs(accounted - 1) < UNACCOUNTED;
    return closes
        ? List.of()
        : List.of(
            String.format(
                Locale.ROOT,
                "Power does not balance: %.1f %% of the input is radiated or lost in the wires,"
                    + " where %s 100 %% can be. Do not trust this answer.",
                100 * accounted,
                soil ? "at most" : "just"));
  }
}
