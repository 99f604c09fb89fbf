package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;

/** Gathers marks on a page or in a window of it. */
final class Pen {
  /** Control distance that makes four cubic curves a circle, share of the radius. */
  private static final double ROUND = 0.5522847498;

  private final List<Ink> inks = new ArrayList<>();

  List<Ink> inks() {
    return List.copyOf(inks);
  }

  void add(Ink ink) {
    inks.add(ink);
  }

  void addAll(List<Ink> more) {
    inks.addAll(more);
  }

  /** A straight line. */
  void line(
      double x1, double y1, double x2, double y2, double width, double shade, double... dash) {
    path(List.of(new double[] {x1, y1}, new double[] {x2, y2}), width, shade, dash);
  }

  /** Points joined straight, open. */
  void path(List<double[]> points, double width, double shade, double... dash) {
    if (points.size() > 1) {
      shape(List.of(stroke(points, false)), width, shade, Ink.NONE, dash);
    }
  }

  /** A closed outline. */
  void area(List<double[]> points, double width, double shade, double fill, double... dash) {
    if (points.size() > 2) {
      shape(List.of(stroke(points, true)), width, shade, fill, dash);
    }
  }

  /** Any strokes. */
  void shape(List<Ink.Stroke> strokes, double width, double shade, double fill, double... dash) {
    List<Double> dashes = new ArrayList<>();
    for (double d : dash) {
      dashes.add(d);
    }
    inks.add(new Ink.Shape(List.copyOf(strokes), width, List.copyOf(dashes), shade, fill));
  }

  static Ink.Stroke stroke(List<double[]> points, boolean closed) {
    return new Ink.Stroke(points.stream().map(p -> Ink.Step.to(p[0], p[1])).toList(), closed);
  }

  void circle(
      double x, double y, double r, double width, double shade, double fill, double... dash) {
    shape(List.of(round(x, y, r, r)), width, shade, fill, dash);
  }

  /** An ellipse as four curves. */
  static Ink.Stroke round(double x, double y, double rx, double ry) {
    double kx = rx * ROUND;
    double ky = ry * ROUND;
    return new Ink.Stroke(
        List.of(
            Ink.Step.to(x + rx, y),
            new Ink.Step(true, x + rx, y + ky, x + kx, y + ry, x, y + ry),
            new Ink.Step(true, x - kx, y + ry, x - rx, y + ky, x - rx, y),
            new Ink.Step(true, x - rx, y - ky, x - kx, y - ry, x, y - ry),
            new Ink.Step(true, x + kx, y - ry, x + rx, y - ky, x + rx, y)),
        true);
  }

  void rect(double x, double y, double w, double h, double width, double shade, double fill) {
    area(
        List.of(
            new double[] {x, y},
            new double[] {x + w, y},
            new double[] {x + w, y + h},
            new double[] {x, y + h}),
        width,
        shade,
        fill);
  }

  /** Plain lettering. */
  void text(double x, double y, String text, double points, Ink.Anchor anchor, boolean bold) {
    text(x, y, text, points, anchor, bold, 1);
  }

  /** Lettering in a shade. */
  void text(
      double x,
      double y,
      String text,
      double points,
      Ink.Anchor anchor,
      boolean bold,
      double shade) {
    if (!text.isEmpty()) {
      inks.add(new Ink.Lettering(x, y, text, points, anchor, bold, false, 0, 0, shade));
    }
  }
}
