package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Polygon;
import spanwright.plan.Place;
import spanwright.plan.Point;

/**
 * The window a drawing stands in, and the way from metres to millimetres of paper.
 *
 * @param left of the window [mm]
 * @param top of the window [mm]
 * @param width of the window [mm]
 * @param height of the window [mm]
 * @param x0 metres at the left edge
 * @param y0 metres at the foot
 * @param scale n of 1 : n
 */
record Frame(
    double left, double top, double width, double height, double x0, double y0, int scale) {

  /** Millimetres of paper for metres. */
  double mm(double metres) {
    return metres * 1000 / scale;
  }

  /** Metres for millimetres of paper. */
  double metres(double mm) {
    return mm * scale / 1000;
  }

  double x(double x) {
    return left + mm(x - x0);
  }

  double y(double y) {
    return top + height - mm(y - y0);
  }

  double[] at(Point p) {
    return new double[] {x(p.x()), y(p.y())};
  }

  double[] at(Place p) {
    return new double[] {x(p.x()), y(p.y())};
  }

  List<double[]> points(List<Point> points) {
    List<double[]> out = new ArrayList<>();
    points.forEach(p -> out.add(at(p)));
    return out;
  }

  List<double[]> places(List<Place> places) {
    List<double[]> out = new ArrayList<>();
    places.forEach(p -> out.add(at(p)));
    return out;
  }

  boolean holds(double[] mm, double margin) {
    return mm[0] >= left + margin
        && mm[0] <= left + width - margin
        && mm[1] >= top + margin
        && mm[1] <= top + height - margin;
  }

  /** The window as an area on paper, widened by a margin. */
  Polygon window(double margin) {
    return (Polygon)
        Sight.SHAPES.toGeometry(
            new Envelope(
                left - margin, left + width + margin, top - margin, top + height + margin));
  }
}
