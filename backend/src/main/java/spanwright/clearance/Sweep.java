package spanwright.clearance;

import spanwright.rigging.Rigged;

/** The states that a strand goes through between still air and the gust. */
final class Sweep {
  private static final int STEPS = Strand.STEPS;

  /** Another model of the same gust may put a wire this share of its shift farther out. */
  private static final double MODEL = 0.03;

  /** Free wire: it swings about the point that it hangs from. */
  static final Way SWINGING = Sweep::swung;

  private Sweep() {}

  /** The states of one thing: left to right in steps, then iced, still and in its gust. */
  static double[][] of(Rigged.Shapes shapes, Way way, double[] slack) {
    double[] calm = Strand.flat(shapes.calm());
    if (shapes.left().equals(shapes.calm()) && shapes.right().equals(shapes.calm())) {
      return shapes.iced().isEmpty() || shapes.iced().equals(shapes.calm())
          ? new double[][] {calm}
          : threeOf(calm, Strand.flat(shapes.iced()));
    }
    double[] left = Strand.flat(shapes.left());
    double[] right = Strand.flat(shapes.right());
    int iced = shapes.iced().isEmpty() ? 0 : shapes.icedLeft().isEmpty() ? 1 : 3;
    double[][] states = new double[2 * STEPS + 1 + iced][];
    states[0] = left;
    states[STEPS] = calm;
    states[2 * STEPS] = right;
    for (int k = 1; k < STEPS; k++) {
      double share = (double) k / STEPS;
      states[STEPS - k] = way.at(calm, left, share, STEPS - k, slack);
      states[STEPS + k] = way.at(calm, right, share, STEPS + k, slack);
    }
    if (iced > 0) {
      states[2 * STEPS + 1] = Strand.flat(shapes.iced());
    }
    if (iced > 1) {
      states[2 * STEPS + 2] = Strand.flat(shapes.icedLeft());
      states[2 * STEPS + 3] = Strand.flat(shapes.icedRight());
    }
    return states;
  }

  private static double[][] threeOf(double[] calm, double[] iced) {
    double[][] states = new double[2 * STEPS + 2][];
    java.util.Arrays.fill(states, calm);
    states[2 * STEPS + 1] = iced;
    return states;
  }

  /** How a thing goes from calm to blown. */
  interface Way {
    double[] at(double[] calm, double[] blown, double share, int state, double[] slack);
  }

  /** Each point about the chord, the first point where {@code firsts} has it for a state. */
  static Way turning(double[][] firsts) {
    return (calm, blown, share, state, slack) ->
        between(calm, blown, share, firsts == null ? null : firsts[state], slack);
  }

  /** Free wire between calm and blown: it swings about the point that it hangs from. */
  private static double[] swung(
      double[] calm, double[] blown, double share, int state, double[] slack) {
    double[] now = new double[calm.length];
    double[] c = new double[3];
    double[] b = new double[3];
    for (int i = 0; i < calm.length; i += 3) {
      double dot = 0;
      for (int k = 0; k < 3; k++) {
        c[k] = calm[i + k] - calm[k];
        b[k] = blown[i + k] - blown[k];
        dot += c[k] * b[k];
      }
      double r0 = size(c);
      double r1 = size(b);
      double angle = r0 * r1 < 1e-12 ? 0 : Math.acos(Math.max(-1, Math.min(1, dot / (r0 * r1))));
      double radius = mix(r0, r1, share);
      boolean turns = angle > 1e-3 && angle < 3.1;
      double f0 = turns ? radius / r0 * Math.sin((1 - share) * angle) / Math.sin(angle) : 1 - share;
      double f1 = turns ? radius / r1 * Math.sin(share * angle) / Math.sin(angle) : share;
      for (int k = 0; k < 3; k++) {
        now[i + k] = mix(calm[k], blown[k], share) + f0 * c[k] + f1 * b[k];
      }
      double greater = Math.max(r0, r1);
      double facet = greater * (1 - Math.cos(angle / STEPS / 2));
      slack[i / 3] = Math.max(slack[i / 3], facet);
    }
    return now;
  }

  /** A state between calm and blown. */
  private static double[] between(
      double[] calm, double[] blown, double share, double[] first, double[] slack) {
    int end = calm.length - 3;
    double[] state = new double[calm.length];
    double[] e0 = axis(calm, end);
    double[] e1 = axis(blown, end);
    double[] o0 = new double[3];
    double[] o1 = new double[3];
    double[] start = new double[3];
    double[] finish = new double[3];
    for (int k = 0; k < 3; k++) {
      start[k] = first == null ? mix(calm[k], blown[k], share) : first[k];
      finish[k] = mix(calm[end + k], blown[end + k], share);
    }
    for (int i = 0; i <= end; i += 3) {
      double a0 = offset(calm, i, e0, o0);
      double a1 = offset(blown, i, e1, o1);
      double along = mix(a0, a1, share);
      double r0 = size(o0);
      double r1 = size(o1);
      double cos =
          r0 * r1 < 1e-12 ? 1 : (o0[0] * o1[0] + o0[1] * o1[1] + o0[2] * o1[2]) / (r0 * r1);
      double angle = Math.acos(Math.max(-1, Math.min(1, cos)));
      double radius = mix(r0, r1, share);
      boolean turns = angle > 1e-3 && angle < 3.1;
      double f0 = turns ? radius / r0 * Math.sin((1 - share) * angle) / Math.sin(angle) : 1 - share;
      double f1 = turns ? radius / r1 * Math.sin(share * angle) / Math.sin(angle) : share;
      for (int k = 0; k < 3; k++) {
        state[i + k] = start[k] + along * (finish[k] - start[k]) + f0 * o0[k] + f1 * o1[k];
      }
      double greater = Math.max(r0, r1);
      double facet = greater * (1 - Math.cos(angle / STEPS / 2));
      double rest = MODEL * greater + 4 * greater / (end / 3.0 * end / 3.0);
      slack[i / 3] = Math.max(slack[i / 3], facet + rest);
    }
    return state;
  }

  /** The chord as a vector, with its length squared last. */
  private static double[] axis(double[] points, int end) {
    double x = points[end] - points[0];
    double y = points[end + 1] - points[1];
    double z = points[end + 2] - points[2];
    return new double[] {x, y, z, x * x + y * y + z * z};
  }

  /** Splits a point into its share along the chord (returned) and its offset from the chord. */
  private static double offset(double[] points, int i, double[] axis, double[] into) {
    double x = points[i] - points[0];
    double y = points[i + 1] - points[1];
    double z = points[i + 2] - points[2];
    double share = axis[3] < 1e-12 ? 0 : (x * axis[0] + y * axis[1] + z * axis[2]) / axis[3];
    into[0] = x - share * axis[0];
    into[1] = y - share * axis[1];
    into[2] = z - share * axis[2];
    return share;
  }

  private static double size(double[] v) {
    return Math.sqrt(v[0] * v[0] + v[1] * v[1] + v[2] * v[2]);
  }

  private static double mix(double a, double b, double share) {
    return a + share * (b - a);
  }
}
