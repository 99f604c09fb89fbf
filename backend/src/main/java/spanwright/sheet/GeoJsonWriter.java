package spanwright.sheet;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import net.sf.geographiclib.GeodesicMask;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import spanwright.assess.Placement;
import spanwright.plan.GroundSurface;
import spanwright.plan.Json;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Site;

/**
 * Writes the site as GeoJSON (RFC 7946): longitude and latitude on WGS 84, outer rings
 * anticlockwise. The plan is a plane that touches the ellipsoid at the site's latitude and
 * longitude, which stand at the plan's (0, 0), turned by {@code planNorth}. Within 1 km of that
 * point the plane and the earth part by less than 1 mm; elevations are left out, since the plan's
 * zero has no known height.
 */
final class GeoJsonWriter {
  private final SheetModel model;
  private final Plan plan;
  private final Placement placement;
  private final double latitude;
  private final double longitude;
  private final ArrayNode features = Json.mapper().createArrayNode();

  private GeoJsonWriter(SheetModel model) {
    this.model = model;
    this.plan = model.source().plan();
    this.placement = model.source().placement();
    Site site = plan.site();
    if (site.latitude() == null || site.longitude() == null) {
      throw new NoCoordinatesException();
    }
    this.latitude = site.latitude();
    this.longitude = site.longitude();
  }

  static String write(SheetModel model) {
    return new GeoJsonWriter(model).all();
  }

  /**
   * Longitude and latitude of a place of the plan [degrees]: the geodesic from the site's point
   * that leaves in its true direction and is as long as it is far on the plan (C. F. F. Karney,
   * Algorithms for geodesics, J. Geodesy 87, 2013).
   */
  private double[] lonLat(double x, double y) {
    double azimuth = Math.toDegrees(Math.atan2(x, y)) + plan.site().planNorth();
    GeodesicData to =
        Geodesic.WGS84.Direct(
            latitude,
            longitude,
            azimuth,
            Math.hypot(x, y),
            GeodesicMask.LATITUDE | GeodesicMask.LONGITUDE);
    return new double[] {round(to.lon2), round(to.lat2)};
  }

  /** To 1e-8 of a degree, about a millimetre. */
  private static double round(double degrees) {
    return Math.rint(degrees * 1e8) / 1e8;
  }

  private String all() {
    survey();
    rigging();
    ObjectNode root = Json.mapper().createObjectNode();
    root.put("type", "FeatureCollection");
    // A member of our own, as RFC 7946 section 6.1 lets one add.
    root.set("sheet", Revisions.members(model.head()));
    root.set("features", features);
    try {
      return Json.mapper().writerWithDefaultPrettyPrinter().writeValueAsString(root) + "\n";
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("the sheet could not be written as GeoJSON", e);
    }
  }

  private void survey() {
    ring(plan.boundary(), properties("boundary", "", model.head().title()));
    plan.buildings()
        .forEach(
            b ->
                ring(
                    b.footprint(),
                    properties("building", b.id(), b.name())
                        .put("eaves", b.eaves())
                        .put("ridge", b.ridge())));
    plan.zones()
        .forEach(
            z -> {
              ObjectNode p = properties("zone", z.id(), z.name());
              p.set("rule", Json.mapper().valueToTree(z.rule()));
              ring(z.area(), p);
            });
    plan.supports()
        .forEach(
            s ->
                point(
                    s.at(),
                    properties("support", s.id(), s.name())
                        .put("lowest", s.lowest())
                        .put("highest", s.highest())));
    plan.trees().forEach(t -> point(t.at(), properties("tree", t.id(), t.name())));
    for (OverheadParts.Line line : model.overhead().lines()) {
      plan.overheadLines().stream()
          .filter(l -> l.id().equals(line.id()))
          .forEach(
              l -> {
                ObjectNode p =
                    properties("overhead line", l.id(), l.name())
                        .put("carries", line.kind())
                        .put("lowest", line.lowest())
                        .put("highest", line.highest());
                if (line.keep() != null) {
                  p.put("keep", line.keep());
                }
                path(l.path(), p);
              });
    }
    plan.metalwork().forEach(m -> path(m.path(), properties("metalwork", m.id(), m.name())));
    plan.datums().forEach(d -> point(d.at(), properties("datum", "", d.name())));
    if (plan.entry() != null) {
      point(plan.entry().at(), properties("entry", "", "").put("height", plan.entry().height()));
    }
  }

  private void rigging() {
    GroundSurface ground = GroundSurface.of(plan);
    for (Placement.Conductor c : placement.conductors()) {
      ObjectNode p = properties("wire", "", "").put("length", c.length()).put("wire", c.wire());
      ArrayNode heights = p.putArray("heightsAboveGround");
      c.points()
          .forEach(
              q -> heights.add(Math.round((q.z() - ground.heightAt(q.onPlan())) * 1000) / 1000.0));
      path(c.points(), p);
    }
    for (Placement.RopeRun r : placement.ropes()) {
      path(r.points(), properties("rope", "", r.what()).put("length", r.length()));
    }
    path(
        placement.feed().path(),
        properties("feed line", "", "").put("length", placement.feed().lineLength()));
    for (SetOutParts.Mark m : model.setOut().points()) {
      point(
          m.at().onPlan(),
          properties("point", "", m.name()).put("number", m.number()).put("height", m.height()));
    }
    if (model.setOut().proposed() != null) {
      SetOutParts.Known datum = model.setOut().proposed().known();
      point(datum.at().onPlan(), properties("new datum", "", datum.letter()));
    }
    List<Place> line = placement.feed().path();
    for (double along : model.feedLine().standOffsAt()) {
      Place at = WireList.at(line, Math.max(0, Job.length(line) - along));
      point(at.onPlan(), properties("stand-off", "", "").put("fromEntry", along));
    }
  }

  private static ObjectNode properties(String kind, String id, String name) {
    ObjectNode p = Json.mapper().createObjectNode();
    p.put("kind", kind);
    if (!id.isEmpty()) {
      p.put("id", id);
    }
    if (name != null && !name.isEmpty()) {
      p.put("name", name);
    }
    return p;
  }

  private void feature(String type, ArrayNode coordinates, ObjectNode properties) {
    ObjectNode feature = features.addObject();
    feature.put("type", "Feature");
    ObjectNode geometry = feature.putObject("geometry");
    geometry.put("type", type);
    geometry.set("coordinates", coordinates);
    feature.set("properties", properties);
  }

  private ArrayNode position(double x, double y) {
    double[] at = lonLat(x, y);
    return Json.mapper().createArrayNode().add(at[0]).add(at[1]);
  }

  private void point(Point at, ObjectNode properties) {
    feature("Point", position(at.x(), at.y()), properties);
  }

  private void path(List<Place> path, ObjectNode properties) {
    if (path.size() < 2) {
      return;
    }
    ArrayNode line = Json.mapper().createArrayNode();
    path.forEach(p -> line.add(position(p.x(), p.y())));
    feature("LineString", line, properties);
  }

  private void ring(List<Point> outline, ObjectNode properties) {
    if (outline.size() < 3) {
      return;
    }
    Coordinate[] ring = Sight.polygon(outline).getCoordinates();
    boolean anticlockwise = Orientation.isCCW(ring);
    ArrayNode closed = Json.mapper().createArrayNode();
    for (int i = 0; i < ring.length; i++) {
      Coordinate c = ring[anticlockwise ? i : ring.length - 1 - i];
      closed.add(position(c.x, c.y));
    }
    ArrayNode polygon = Json.mapper().createArrayNode();
    polygon.add(closed);
    feature("Polygon", polygon, properties);
  }
}
