package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import spanwright.plan.Building;
import spanwright.plan.NoisePoint;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.rigging.Rigged;

/** What is worth saying about a placement beside its figures, as sentences. */
final class Notes {
  private static final GeometryFactory GEOMETRY = new GeometryFactory();

  /** Metal roofs nearer than this in plan are warned about [m]. */
  private static final double METAL_ROOF_NEAR = 10;

  private static final double NOISE_NEAR = 10;

  /** A slope is told from this on [rad], and ground that departs so far from the plane [m]. */
  private static final double LEVEL_ENOUGH = Math.toRadians(0.5);

  private static final double EVEN_ENOUGH = 0.1;

  private final Plan plan;

  Notes(Plan plan) {
    this.plan = plan;
  }

  List<String> of(Hung hung, GroundPlane plane, List<Row> rows, List<String> doubts) {
    List<String> notes = new ArrayList<>();
    hung.rigged().shortcomings().forEach(s -> notes.add(s.reason()));
    notes.addAll(doubts);
    notes.addAll(hung.rigged().notes());
    addGround(hung.rigged(), plane, notes);
    addMetalRoofs(hung.rigged(), notes);
    addNoise(hung.rigged(), notes);
    for (Row row : rows) {
      for (Row.Look look : row.looks()) {
        String note = look.windows().note();
        if (row.middle() && !note.isEmpty()) {
          notes.add(look.target().name() + " on " + row.band().name() + ": " + note);
        }
        if (row.middle()) {
          addUphill(row, look, plane, notes);
        }
      }
    }
    return notes.stream().distinct().toList();
  }

  private void addGround(Rigged rigged, GroundPlane plane, List<String> notes) {
    if (Antennas.isDown(rigged, plane)) {
      notes.add(
          "Some of the wire hangs to the ground, or below the plane of its slope; the radio"
              + " figures take that part as 0.05 m up.");
    }
    if (plane.slope() >= LEVEL_ENOUGH || plane.departure() >= EVEN_ENOUGH) {
      notes.add(ground(plane));
    }
  }

  private String ground(GroundPlane plane) {
    String departs =
        plane.departure() < EVEN_ENOUGH
            ? ""
            : String.format(
                Locale.ROOT,
                " True ground departs from that plane by up to %.1f m.",
                plane.departure());
    if (plane.slope() < LEVEL_ENOUGH) {
      return "Reckoned over level ground at its mean height under the wire." + departs;
    }
    double toward = Math.toDegrees(plane.fallsToward()) + plan.site().planNorth();
    return String.format(
            Locale.ROOT,
            "Reckoned over ground that falls %.0f° toward %.0f°.",
            Math.toDegrees(plane.slope()),
            Math.floor((toward % 360 + 360) % 360 + 0.5) % 360)
        + departs;
  }

  /** Where the slope stands in a target's window: the plane sends nothing into itself. */
  private void addUphill(Row row, Row.Look look, GroundPlane plane, List<String> notes) {
    if (look.bearing() == null) {
      return;
    }
    double toward = Math.toRadians(look.bearing() - plan.site().planNorth());
    double rise = Math.toDegrees(plane.rise(toward));
    if (rise > look.windows().scored().fromDegrees()) {
      notes.add(
          String.format(
              Locale.ROOT,
              "%s on %s: the ground rises %.0f° that way, and nothing is reckoned below that.",
              look.target().name(),
              row.band().name(),
              rise));
    }
  }

  private void addMetalRoofs(Rigged rigged, List<String> notes) {
    Geometry wire = inPlan(rigged);
    for (Building building : plan.buildings()) {
      if (!building.metalRoof()) {
        continue;
      }
      double distance = wire.distance(outline(building.footprint()));
      if (distance < METAL_ROOF_NEAR) {
        notes.add(
            String.format(
                Locale.ROOT,
                "The metal roof of %s is %s; it is not in the radio figures.",
                name(building.name(), building.id()),
                distance < 0.05
                    ? "under the wire"
                    : String.format(Locale.ROOT, "within %.1f m of the wire in plan", distance)));
      }
    }
  }

  private void addNoise(Rigged rigged, List<String> notes) {
    Geometry wire = inPlan(rigged);
    for (NoisePoint noise : plan.noise()) {
      double distance = wire.distance(GEOMETRY.createPoint(coordinate(noise.at())));
      if (distance < NOISE_NEAR) {
        notes.add(
            String.format(
                Locale.ROOT,
                "The wire passes %.1f m in plan from %s.",
                distance,
                name(noise.name(), noise.id())));
      }
    }
  }

  private static Geometry inPlan(Rigged rigged) {
    return GEOMETRY.createMultiLineString(
        rigged.conductors().stream()
            .map(conductor -> conductor.shapes().calm())
            .map(points -> points.stream().map(p -> coordinate(p.onPlan())))
            .map(points -> GEOMETRY.createLineString(points.toArray(Coordinate[]::new)))
            .toArray(LineString[]::new));
  }

  private static Geometry outline(List<Point> corners) {
    List<Point> ring = new ArrayList<>(corners);
    ring.add(corners.get(0));
    return GEOMETRY.createPolygon(ring.stream().map(Notes::coordinate).toArray(Coordinate[]::new));
  }

  private static Coordinate coordinate(Point point) {
    return new Coordinate(point.x(), point.y());
  }

  private static String name(String name, String id) {
    return name == null || name.isBlank() ? id : name;
  }
}
