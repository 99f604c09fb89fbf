package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.plan.Building;
import spanwright.plan.NoisePoint;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.rigging.Rigged;

/** What is worth saying about a placement beside its figures, as sentences. */
final class Notes {
  /** Metal roofs nearer than this in plan are warned about [m]. */
  private static final double METAL_ROOF_NEAR = 10;

  private static final double NOISE_NEAR = 10;

  /** Ground that falls by more than this under the wire makes the level plane a rough one [m]. */
  private static final double LEVEL_ENOUGH = 0.5;

  private final Plan plan;
  private final Antennas antennas;

  Notes(Plan plan, Antennas antennas) {
    this.plan = plan;
    this.antennas = antennas;
  }

  List<String> of(Hung hung, List<Row> rows, List<String> doubts) {
    List<String> notes = new ArrayList<>();
    hung.rigged().shortcomings().forEach(s -> notes.add(s.reason()));
    notes.addAll(doubts);
    notes.addAll(hung.rigged().notes());
    addGround(hung.rigged(), notes);
    addMetalRoofs(hung.rigged(), notes);
    addNoise(hung.rigged(), notes);
    for (Row row : rows) {
      for (Row.Look look : row.looks()) {
        String note = look.windows().note();
        if (row.middle() && !note.isEmpty()) {
          notes.add(look.target().name() + " on " + row.band().name() + ": " + note);
        }
      }
    }
    return notes.stream().distinct().toList();
  }

  private void addGround(Rigged rigged, List<String> notes) {
    double fall = antennas.fall(rigged);
    if (fall > LEVEL_ENOUGH) {
      notes.add(
          String.format(
              Locale.ROOT,
              "The ground under the wire falls by %.1f m; the radio figures take it as level at its"
                  + " mean height.",
              fall));
    }
  }

  private void addMetalRoofs(Rigged rigged, List<String> notes) {
    for (Building building : plan.buildings()) {
      double distance = building.metalRoof() ? distance(rigged, building.footprint()) : 1e9;
      if (distance < METAL_ROOF_NEAR) {
        notes.add(
            String.format(
                Locale.ROOT,
                "The metal roof of %s is %s of the wire in plan; it is not in the radio figures.",
                name(building.name(), building.id()),
                distance < 0.05
                    ? "within reach"
                    : String.format(Locale.ROOT, "within %.1f m", distance)));
      }
    }
  }

  private static double distance(Rigged rigged, List<Point> outline) {
    double least = Double.POSITIVE_INFINITY;
    for (Rigged.Conductor conductor : rigged.conductors()) {
      for (Place place : conductor.shapes().calm()) {
        for (int i = 0; i < outline.size(); i++) {
          Point a = outline.get(i);
          Point b = outline.get((i + 1) % outline.size());
          least = Math.min(least, distance(place.onPlan(), a, b));
        }
      }
    }
    return least;
  }

  private static double distance(Point p, Point a, Point b) {
    double dx = b.x() - a.x();
    double dy = b.y() - a.y();
    double square = dx * dx + dy * dy;
    double t =
        square == 0
            ? 0
            : Math.max(0, Math.min(1, ((p.x() - a.x()) * dx + (p.y() - a.y()) * dy) / square));
    return p.distance(new Point(a.x() + t * dx, a.y() + t * dy));
  }

  private void addNoise(Rigged rigged, List<String> notes) {
    for (NoisePoint noise : plan.noise()) {
      double least = Double.POSITIVE_INFINITY;
      for (Rigged.Conductor conductor : rigged.conductors()) {
        for (Place place : conductor.shapes().calm()) {
          least = Math.min(least, place.onPlan().distance(noise.at()));
        }
      }
      if (least < NOISE_NEAR) {
        notes.add(
            String.format(
                Locale.ROOT,
                "The wire passes %.1f m in plan from %s.",
                least,
                name(noise.name(), noise.id())));
      }
    }
  }

  private static String name(String name, String id) {
    return name == null || name.isBlank() ? id : name;
  }
}
