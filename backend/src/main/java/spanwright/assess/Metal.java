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
  private static final int MOST_PASSES = 4;

  private record Piece(String name, List<Place> path, double radius) {}

  private final List<Piece> pieces;
  private final GroundSurface surface;

  private Metal(List<Piece> pieces, GroundSurface surface) {
    this.pieces = pieces;
    this.surface = surface;
  }

  static Metal of(Plan plan, GroundSurface surface) {
    List<Piece> raised = new ArrayList<>();
    for (Metalwork metal : plan.metalwork()) {
      List<Place> path = withoutRepeats(surface.raise(offTheGround(metal.path())));
      if (path.size() > 1) {
        String name = metal.name() == null ? metal.id() : metal.name();
        raised.add(new Piece(name, path, metal.radius()));
      }
    }
    return new Metal(parted(raised), surface);
  }

  private static List<Place> offTheGround(List<Place> path) {
    return path.stream().map(p -> new Place(p.x(), p.y(), Math.max(LEAST_HEIGHT, p.z()))).toList();
  }

  /** No metalwork at all. */
  static Metal none() {
    return new Metal(List.of(), GroundSurface.level());
  }

  /** The same without the piece of that name. */
  Metal without(String name) {
    return new Metal(pieces.stream().filter(piece -> !piece.name.equals(name)).toList(), surface);
  }

  boolean isEmpty() {
    return pieces.isEmpty();
  }

  /** Names of the pieces, in the order of the conductors. */
  List<String> names() {
    return pieces.stream().map(Piece::name).toList();
  }

  /** As conductors over a ground plane. */
  List<WireSpec> over(GroundPlane plane) {
    return pieces.stream()
        .map(
            piece ->
                WireSpec.of(
                    piece.path.stream().map(p -> over(p, plane)).toList(),
                    piece.radius,
                    CONDUCTIVITY))
        .toList();
  }

  /**
   * Height over the plane. Metal on ground that lies lower than the plane would come under it:
   * there it keeps half its height above its own ground at least, so that no two pieces fall
   * together.
   */
  private Vertex over(Place p, GroundPlane plane) {
    double aboveGround = p.z() - surface.heightAt(p.x(), p.y());
    double least = LEAST_HEIGHT + Math.max(0, aboveGround - LEAST_HEIGHT) / 2;
    Vertex there = plane.over(p);
    return new Vertex(there.x(), there.y(), Math.max(least, there.z()));
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
    // An end drawn onto one piece may leave another that touches it: then that follows.
    boolean moved = true;
    for (int pass = 0; pass < MOST_PASSES && moved; pass++) {
      moved = joinAll(paths, cuts);
    }
    List<Piece> parts = new ArrayList<>();
    for (int i = 0; i < paths.size(); i++) {
      for (List<Place> part : split(withoutRepeats(paths.get(i)), cuts.get(i))) {
        parts.add(new Piece(raised.get(i).name, part, raised.get(i).radius));
      }
    }
    return parts;
  }

  private static boolean joinAll(List<List<Place>> paths, List<List<Place>> cuts) {
    boolean moved = false;
    for (int i = 0; i < paths.size(); i++) {
      for (int j = 0; j < paths.size(); j++) {
        if (i != j) {
          moved |= join(paths.get(i), 0, paths.get(j), cuts.get(j));
          moved |= join(paths.get(i), paths.get(i).size() - 1, paths.get(j), cuts.get(j));
        }
      }
    }
    return moved;
  }

  /** Whether the end had to be moved to lie on the other piece. */
  private static boolean join(List<Place> path, int end, List<Place> other, List<Place> cuts) {
    Place tip = path.get(end);
    for (int s = 1; s < other.size(); s++) {
      Place a = other.get(s - 1);
      Place b = other.get(s);
      Place nearest = tip.nearestOn(a, b);
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
      return joint.distance(tip) > SAME;
    }
    return false;
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
