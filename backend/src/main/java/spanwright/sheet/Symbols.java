package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.clearance.State;

/** Marks and signs, drawn rather than typed, centred where they are asked for. Millimetres. */
final class Symbols {
  private Symbols() {}

  /** ✓ for clear, ! for tight, ✕ for foul. */
  static void state(Pen pen, double x, double y, double size, State state) {
    double r = size / 2;
    switch (state) {
      case CLEAR ->
          pen.path(
              List.of(
                  new double[] {x - 0.75 * r, y + 0.05 * r},
                  new double[] {x - 0.2 * r, y + 0.65 * r},
                  new double[] {x + 0.8 * r, y - 0.75 * r}),
              0.22 * r + 0.12,
              1);
      case TIGHT -> {
        pen.area(
            List.of(
                new double[] {x - 0.24 * r, y - 0.95 * r},
                new double[] {x + 0.24 * r, y - 0.95 * r},
                new double[] {x + 0.12 * r, y + 0.3 * r},
                new double[] {x - 0.12 * r, y + 0.3 * r}),
            0,
            Ink.NONE,
            1);
        pen.circle(x, y + 0.72 * r, 0.22 * r, 0, Ink.NONE, 1);
      }
      case FOUL -> {
        double w = 0.25 * r + 0.15;
        pen.line(x - 0.7 * r, y - 0.7 * r, x + 0.7 * r, y + 0.7 * r, w, 1);
        pen.line(x - 0.7 * r, y + 0.7 * r, x + 0.7 * r, y - 0.7 * r, w, 1);
      }
      default -> throw new IllegalArgumentException("no mark for " + state);
    }
  }

  /** A point number in its black square. */
  static void number(Pen pen, double x, double y, String number) {
    double half = 2.05;
    double wide = number.length() > 2 ? half + 0.8 : half;
    pen.rect(x - wide, y - half, 2 * wide, 2 * half, 0.5, 0, 1);
    pen.add(new Ink.Lettering(x, y + 1.05, number, 8.5, Ink.Anchor.MIDDLE, true, false, 0, 0, 0));
  }

  /** Datum: a triangle with a dot. */
  static void datum(Pen pen, double x, double y) {
    pen.area(
        List.of(
            new double[] {x, y - 2.0},
            new double[] {x + 1.75, y + 1.1},
            new double[] {x - 1.75, y + 1.1}),
        0.3,
        1,
        0);
    pen.circle(x, y, 0.3, 0, Ink.NONE, 1);
  }

  /** Tree: a dot in a ring. */
  static void tree(Pen pen, double x, double y) {
    pen.circle(x, y, 1.3, 0.35, 1, 0);
    pen.circle(x, y, 0.55, 0, Ink.NONE, 1);
  }

  /** Mast: a ring with a cross, the ring dashed when it is to be built. */
  static void mast(Pen pen, double x, double y, boolean built) {
    if (built) {
      pen.circle(x, y, 1.4, 0.35, 1, 0);
    } else {
      pen.circle(x, y, 1.4, 0.35, 1, 0, 0.7, 0.5);
    }
    pen.line(x - 2.1, y, x + 2.1, y, 0.25, 1);
    pen.line(x, y - 2.1, x, y + 2.1, 0.25, 1);
  }

  /** Pole: a disc in a ring. */
  static void pole(Pen pen, double x, double y) {
    pen.circle(x, y, 1.4, 0.35, 1, 0);
    pen.circle(x, y, 0.9, 0, Ink.NONE, 1);
  }

  /** A fixing on a wall or chimney: a half-filled disc. */
  static void wall(Pen pen, double x, double y) {
    pen.circle(x, y, 1.2, 0.35, 1, 0);
    pen.area(
        List.of(
            new double[] {x - 1.2, y},
            new double[] {x - 0.85, y + 0.85},
            new double[] {x, y + 1.2},
            new double[] {x + 0.85, y + 0.85},
            new double[] {x + 1.2, y}),
        0,
        Ink.NONE,
        1);
  }

  /** Anything else that holds: a square. */
  static void other(Pen pen, double x, double y) {
    pen.rect(x - 1.1, y - 1.1, 2.2, 2.2, 0.35, 1, 0);
  }

  /** Entry: an arrow onto a bar, the arrow coming along the given direction [mm, any length]. */
  static void entry(Pen pen, double x, double y, double dx, double dy) {
    double size = Math.hypot(dx, dy);
    double ux = size < 1e-9 ? 1 : dx / size;
    double uy = size < 1e-9 ? 0 : dy / size;
    pen.line(x - 1.8 * uy, y + 1.8 * ux, x + 1.8 * uy, y - 1.8 * ux, 0.7, 1);
    pen.area(
        List.of(
            new double[] {x, y},
            new double[] {x - 1.9 * ux - 0.8 * uy, y - 1.9 * uy + 0.8 * ux},
            new double[] {x - 1.9 * ux + 0.8 * uy, y - 1.9 * uy - 0.8 * ux}),
        0,
        Ink.NONE,
        1);
  }

  /** A line with a zig-zag of ±1.2 mm every 12 mm: an overhead line. */
  static List<double[]> zigZag(List<double[]> path) {
    List<double[]> out = new ArrayList<>();
    out.add(path.get(0));
    for (int i = 1; i < path.size(); i++) {
      double[] a = path.get(i - 1);
      double[] b = path.get(i);
      double length = Math.hypot(b[0] - a[0], b[1] - a[1]);
      int zigs = Math.max(length > 5 ? 1 : 0, (int) Math.min(2000, length / 12));
      double ux = length == 0 ? 0 : (b[0] - a[0]) / length;
      double uy = length == 0 ? 0 : (b[1] - a[1]) / length;
      for (int k = 0; k < zigs; k++) {
        double s = length * (k + 0.5) / zigs;
        out.add(new double[] {a[0] + ux * (s - 1.1), a[1] + uy * (s - 1.1)});
        out.add(new double[] {a[0] + ux * (s - 0.5) + 1.2 * uy, a[1] + uy * (s - 0.5) - 1.2 * ux});
        out.add(new double[] {a[0] + ux * (s + 0.5) - 1.2 * uy, a[1] + uy * (s + 0.5) + 1.2 * ux});
        out.add(new double[] {a[0] + ux * (s + 1.1), a[1] + uy * (s + 1.1)});
      }
      out.add(b);
    }
    return out;
  }
}
