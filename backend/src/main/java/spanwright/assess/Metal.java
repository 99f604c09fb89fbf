package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import spanwright.moments.Vertex;
import spanwright.moments.WireSpec;
import spanwright.plan.GroundSurface;
import spanwright.plan.Metalwork;
import spanwright.plan.Place;
import spanwright.plan.Plan;

/**
 * The plan's metalwork as conductors: raised by the ground under it, parted where another piece
 * touches it, so that what touches is joined. Low-carbon steel and zinc alike are taken at 5e6 S/m.
 * Nothing is earthed: what ends at the ground ends just above it.
 */
final class Metal {
  static final double CONDUCTIVITY = 5e6;

  /** Metal at the ground is taken this far up [m]. */
  private static final double LEAST_HEIGHT = 0.05;

  /** An end within this of another piece touches it [m]. */
  private static final double TOUCH = 0.02;

  private static final double SAME = 1e-6;

  private record Piece(String name, List<Place> path, double radius) {}

  private final List<Piece> pieces;

  private Metal(List<Piece> pieces) {
    this.pieces = pieces;
  }

  static Metal of(Plan plan, GroundSurface surface) {
    List<Piece> raised = new ArrayList<>();
    for (Metalwork metal : plan.metalwork()) {
      List<Place> path = withoutRepeats(surface.raise(metal.path()));
      if (path.size() > 1) {
        String name = metal.name() == null ? metal.id() : metal.name();
        raised.add(new Piece(name, path, metal.radius()));
      }
    }
    return new Metal(parted(raised));
  }

  boolean isEmpty() {
    return pieces.isEmpty();
  }

  /** Names of the pieces, in the order of the conductors. */
  List<String> names() {
    return pieces.stream().map(Piece::name).toList();
  }

  /** Highest point above the plan's zero [m]. */
  double highest() {
    return pieces.stream()
        .flatMap(piece -> piece.path.stream())
        .mapToDouble(Place::z)
        .max()
        .orElse(0);
  }

  /** As conductors over a ground plane at a height above the plan's zero [m]. */
  List<WireSpec> over(double plane) {
    return pieces.stream()
        .map(
            piece ->
                WireSpec.of(
                    piece.path.stream()
                        .map(p -> new Vertex(p.x(), p.y(), Math.max(LEAST_HEIGHT, p.z() - plane)))
                        .toList(),
                    piece.radius,
                    CONDUCTIVITY))
        .toList();
  }

  private static List<Place> withoutRepeats(List<Place> path) {
    List<Place> kept = new ArrayList<>();
    for (Place place : path) {
      if (kept.isEmpty() || kept.get(kept.size() - 1).distance(place) > SAME) {
        kept.add(place);
      }
    }
    return kept;
  }

  /** Draws every end onto the piece it touches, and parts that piece there. */
  private static List<Piece> parted(List<Piece> raised) {
    List<List<Place>> paths = new ArrayList<>();
    raised.forEach(piece -> paths.add(new ArrayList<>(piece.path)));
    List<List<Place>> cuts = new ArrayList<>();
    raised.forEach(piece -> cuts.add(new ArrayList<>()));
    for (int i = 0; i < paths.size(); i++) {
      for (int j = 0; j < paths.size(); j++) {
        if (i != j) {
          join(paths.get(i), 0, paths.get(j), cuts.get(j));
          join(paths.get(i), paths.get(i).size() - 1, paths.get(j), cuts.get(j));
        }
      }
    }
    List<Piece> parts = new ArrayList<>();
    for (int i = 0; i < paths.size(); i++) {
      for (List<Place> part : split(paths.get(i), cuts.get(i))) {
        parts.add(new Piece(raised.get(i).name, part, raised.get(i).radius));
      }
    }
    return parts;
  }

  private static void join(List<Place> path, int end, List<Place> other, List<Place> cuts) {
    Place tip = path.get(end);
    for (int s = 1; s < other.size(); s++) {
      Place a = other.get(s - 1);
      Place b = other.get(s);
      Place nearest = nearest(a, b, tip);
      if (nearest.distance(tip) > TOUCH) {
        continue;
      }
      boolean atFirst = nearest.distance(a) < TOUCH;
      boolean atSecond = nearest.distance(b) < TOUCH;
      Place joint = atFirst ? a : atSecond ? b : nearest;
      path.set(end, joint);
      if (!atFirst && !atSecond) {
        other.add(s, joint);
      }
      cuts.add(joint);
      return;
    }
  }

  private static Place nearest(Place a, Place b, Place p) {
    double dx = b.x() - a.x();
    double dy = b.y() - a.y();
    double dz = b.z() - a.z();
    double square = dx * dx + dy * dy + dz * dz;
    double along = (p.x() - a.x()) * dx + (p.y() - a.y()) * dy + (p.z() - a.z()) * dz;
    double t = Math.max(0, Math.min(1, along / square));
    return new Place(a.x() + t * dx, a.y() + t * dy, a.z() + t * dz);
  }

  private static List<List<Place>> split(List<Place> path, List<Place> cuts) {
    List<List<Place>> parts = new ArrayList<>();
    List<Place> part = new ArrayList<>();
    for (int i = 0; i < path.size(); i++) {
      Place place = path.get(i);
      part.add(place);
      boolean inside = i > 0 && i < path.size() - 1;
      if (inside && cuts.stream().anyMatch(cut -> cut.distance(place) < SAME)) {
        parts.add(part);
        part = new ArrayList<>(List.of(place));
      }
    }
    if (part.size() > 1) {
      parts.add(part);
    }
    return parts;
  }
}
