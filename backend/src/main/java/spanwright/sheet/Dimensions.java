package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;

/** Dimension lines, as labels that find their own room: a line that finds none is left out. */
final class Dimensions {
  private static final double POINTS = 8;

  private Dimensions() {}

  /**
   * A length beside a straight line: extension lines, slash ticks, the figure in the line.
   *
   * @param a one end on paper
   * @param b the other
   * @param figure as it reads
   * @param offsets how far to the side it may stand [mm], the best first; signs are sides
   */
  static List<Labels.Spot> beside(double[] a, double[] b, String figure, double... offsets) {
    List<Labels.Spot> spots = new ArrayList<>();
    double dx = b[0] - a[0];
    double dy = b[1] - a[1];
    double length = Math.hypot(dx, dy);
    double width = Letters.width(figure, POINTS, true, true) + 2;
    if (length < width + 5) {
      return spots;
    }
    double nx = -dy / length;
    double ny = dx / length;
    double turn = Labels.along(dx, dy);
    int rank = 0;
    for (double off : offsets) {
      double[] p = {a[0] + nx * off, a[1] + ny * off};
      double[] q = {b[0] + nx * off, b[1] + ny * off};
      for (double share : new double[] {0.5, 0.35, 0.65, 0.22, 0.78}) {
        Labels.Spot text =
            Labels.text(
                p[0] + share * (q[0] - p[0]),
                p[1] + share * (q[1] - p[1]),
                figure,
                POINTS,
                true,
                turn,
                rank + Math.abs(share - 0.5));
        spots.add(
            new Labels.Spot(
                text.box(),
                text.cost(),
                List.of(Labels.line(List.of(p, q))),
                pen -> {
                  extension(pen, a, p, off);
                  extension(pen, b, q, off);
                  pen.line(p[0], p[1], q[0], q[1], 0.2, 1);
                  tick(pen, p, dx / length, dy / length);
                  tick(pen, q, dx / length, dy / length);
                  text.paint().accept(pen);
                }));
      }
      rank += 2;
    }
    return spots;
  }

  private static void extension(Pen pen, double[] from, double[] to, double off) {
    if (Math.abs(off) > 1.5) {
      double share = 1 / Math.abs(off);
      pen.line(
          from[0] + share * (to[0] - from[0]),
          from[1] + share * (to[1] - from[1]),
          to[0] + 1.2 * share * (to[0] - from[0]),
          to[1] + 1.2 * share * (to[1] - from[1]),
          0.15,
          1);
    }
  }

  private static void tick(Pen pen, double[] at, double ux, double uy) {
    double r = 1.1;
    double sx = (ux + uy) * 0.7071 * r;
    double sy = (uy - ux) * 0.7071 * r;
    pen.line(at[0] - sx, at[1] - sy, at[0] + sx, at[1] + sy, 0.4, 1);
  }

  /** A distance between two things, as a line with arrowheads and words beside it. */
  static List<Labels.Spot> between(double[] a, double[] b, String words) {
    List<Labels.Spot> spots = new ArrayList<>();
    double dx = b[0] - a[0];
    double dy = b[1] - a[1];
    double length = Math.hypot(dx, dy);
    double width = Letters.width(words, POINTS, true, true);
    List<double[]> anchors = new ArrayList<>();
    for (double share : new double[] {0.5, 0.3, 0.7, 0, 1}) {
      anchors.add(new double[] {a[0] + share * dx, a[1] + share * dy});
    }
    int rank = 0;
    for (double[] at : anchors) {
      for (Labels.Spot text : Labels.around(at[0], at[1], words, POINTS, true, 1.6)) {
        spots.add(
            new Labels.Spot(
                text.box(),
                text.cost() + rank,
                List.of(Labels.line(List.of(a, b))),
                pen -> {
                  pen.line(a[0], a[1], b[0], b[1], 0.25, 1, 1.6, 0.8);
                  if (length > 3) {
                    arrow(pen, a, -dx / length, -dy / length);
                    arrow(pen, b, dx / length, dy / length);
                  }
                  text.paint().accept(pen);
                }));
      }
      rank++;
    }
    return width > 0 ? spots : List.of();
  }

  private static void arrow(Pen pen, double[] tip, double ux, double uy) {
    pen.area(
        List.of(
            tip,
            new double[] {tip[0] - 1.8 * ux - 0.5 * uy, tip[1] - 1.8 * uy + 0.5 * ux},
            new double[] {tip[0] - 1.8 * ux + 0.5 * uy, tip[1] - 1.8 * uy - 0.5 * ux}),
        0,
        Ink.NONE,
        1);
  }
}
