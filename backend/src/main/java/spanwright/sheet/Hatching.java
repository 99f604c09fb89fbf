package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;

/** Hatching cut to an area: real lines, so that they print alike everywhere. */
final class Hatching {
  private Hatching() {}

  /** An area on paper. */
  static Polygon area(List<double[]> outline) {
    Coordinate[] ring = new Coordinate[outline.size() + 1];
    for (int i = 0; i <= outline.size(); i++) {
      double[] p = outline.get(i % outline.size());
      ring[i] = new Coordinate(p[0], p[1]);
    }
    return Sight.SHAPES.createPolygon(ring);
  }

  /**
   * Hatches an area at 45°.
   *
   * @param pen to draw with
   * @param area on paper
   * @param step between lines [mm]
   * @param rising from left to right, or falling
   * @param width of the lines [mm]
   * @param shade of the lines
   */
  static void draw(
      Pen pen, Geometry area, double step, boolean rising, double width, double shade) {
    if (area.isEmpty() || !area.isValid()) {
      return;
    }
    Envelope box = area.getEnvelopeInternal();
    double across = box.getWidth() + box.getHeight();
    double slant = step * Math.sqrt(2);
    double least = box.getMinX() + (rising ? box.getMinY() : -box.getMaxY());
    double from = Math.floor(least / slant) * slant;
    List<Ink.Stroke> strokes = new ArrayList<>();
    for (double c = from; c <= from + across + slant; c += slant) {
      Coordinate a =
          new Coordinate(box.getMinX() - 1, rising ? c - box.getMinX() + 1 : box.getMinX() - 1 - c);
      Coordinate b =
          new Coordinate(box.getMaxX() + 1, rising ? c - box.getMaxX() - 1 : box.getMaxX() + 1 - c);
      LineString line = Sight.SHAPES.createLineString(new Coordinate[] {a, b});
      Geometry cut = area.intersection(line);
      for (int i = 0; i < cut.getNumGeometries(); i++) {
        if (cut.getGeometryN(i) instanceof LineString piece && piece.getLength() > 0.1) {
          strokes.add(
              Pen.stroke(
                  List.of(
                      new double[] {piece.getCoordinateN(0).x, piece.getCoordinateN(0).y},
                      new double[] {
                        piece.getCoordinateN(piece.getNumPoints() - 1).x,
                        piece.getCoordinateN(piece.getNumPoints() - 1).y
                      }),
                  false));
        }
      }
    }
    if (!strokes.isEmpty()) {
      pen.shape(strokes, width, shade, Ink.NONE);
    }
  }

  /** The outline of an area as points, outer ring only. */
  static List<double[]> outline(Polygon area) {
    List<double[]> out = new ArrayList<>();
    Coordinate[] ring = area.getExteriorRing().getCoordinates();
    for (int i = 0; i < ring.length - 1; i++) {
      out.add(new double[] {ring[i].x, ring[i].y});
    }
    return out;
  }
}
