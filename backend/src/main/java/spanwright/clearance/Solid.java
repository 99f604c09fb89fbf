package spanwright.clearance;

import java.util.List;
import java.util.function.IntPredicate;
import spanwright.plan.Place;
import spanwright.rigging.Holder;
import spanwright.rigging.PlanShapes;
import spanwright.rigging.Roof;
import spanwright.rigging.RuleBook;

/** A building under its roof. Less than nothing is how deep something lies inside. */
final class Solid implements Obstacle {
  /** Ropes and wire at a wall's own bracket, the line at its entry: the touch that must be [m]. */
  private static final double OWN = 0.6;

  private static final double DEPTH = 50;

  /** An entry this near to a building's outline is in its wall [m]. */
  private static final double AT_ENTRY = 1;

  /**
   * A zone's base over a pitched roof is one height: a foot may lie this much under the tiles [m].
   */
  static final double SUNK = 1.5;

  private final Roof roof;
  private final List<double[]> faces;
  private final List<double[]> faceBoxes;
  private final double[] box;
  private final double wire;
  private final double rope;
  private final double line;
  private final double mast;

  Solid(Roof roof, RuleBook rules) {
    this.roof = roof;
    double[] outline = Space.emptyBox();
    roof.building()
        .footprint()
        .forEach(
            each ->
                Space.grow(
                    outline, new double[] {each.x(), each.y(), 0, each.x(), each.y(), roof.top()}));
    outline[2] = Math.min(0, roof.top()) - DEPTH;
    outline[5] = roof.top();
    box = outline;
    faces = roof.faces(outline[2]);
    faceBoxes = faces.stream().map(each -> Space.box(each, 0, 2)).toList();
    wire = rules.value("building-wire");
    rope = rules.value("building-rope");
    line = rules.value("building-feed-line");
    mast = rules.value("building-mast");
  }

  @Override
  public double[] box() {
    return box;
  }

  @Override
  public void check(Strand strand, Scene scene, Tally tally) {
    String id = roof.building().id();
    switch (strand.part) {
      case WIRE -> walk(strand, scene, Walk.ALL, wire, tally.of("building-wire", id));
      case ROPE, GUY -> walk(strand, scene, Walk.ALL, rope, tally.of("building-rope", id));
      case FALL -> {
        if (!scene.holders().get(strand.from).isWall()) {
          walk(strand, scene, Walk.ALL, rope, tally.of("building-rope", id));
        }
      }
      case FEED_LINE -> {
        Tally.Worst worst = tally.of("building-feed-line", id);
        walk(strand, scene, strand::isStill, line, worst);
        if (!isAt(scene.entry())) {
          walk(strand, scene, index -> !strand.isStill(index), 0, worst);
        }
      }
      case MAST -> foot(strand, tally);
      default -> {
        // halyards run down what holds them
      }
    }
  }

  /**
   * Whether this is the building the feed line goes into: in the gust it may lean on that one's
   * wall, which the notes tell.
   */
  private boolean isAt(Place entry) {
    return Space.boxes(
                new double[] {entry.x(), entry.y(), 0, entry.x(), entry.y(), 0},
                new double[] {box[0], box[1], 0, box[3], box[4], 0})
            < AT_ENTRY
        && PlanShapes.toPath(roof.building().footprint(), entry.onPlan(), true) < AT_ENTRY;
  }

  String id() {
    return roof.building().id();
  }

  /** How deep the blown feed line is drawn into the building it goes into [m]; 0 when it is not. */
  double leaned(Strand strand, Place entry) {
    double most = 0;
    if (strand.part == Strand.Part.FEED_LINE && isAt(entry)) {
      for (int s = 0; s < strand.states.length; s++) {
        double[] p = strand.states[s];
        for (int i = 0; i < p.length && !strand.isStill(s); i += 3) {
          boolean led = Obstacle.place(p, i).distance(entry) < OWN;
          most = led ? most : Math.max(most, depth(p[i], p[i + 1], p[i + 2]));
        }
      }
    }
    return most;
  }

  /** A mast stands beside a building or on its roof, not in it. */
  private void foot(Strand strand, Tally tally) {
    double[] p = strand.states[0];
    double depth = depth(p[0], p[1], p[2]);
    if (depth > SUNK) {
      Place at = Obstacle.place(p, 0);
      Place top = new Place(at.x(), at.y(), at.z() + depth);
      tally
          .of("building-mast", roof.building().id())
          .offer(-depth, mast, strand.part.word, at, top);
    }
  }

  private void walk(
      Strand strand, Scene scene, IntPredicate which, double required, Tally.Worst worst) {
    double[] piece = new double[6];
    Walk.along(
        strand,
        box,
        which,
        () -> worst.reach(required),
        (index, points, i, allowance) -> {
          System.arraycopy(points, i, piece, 0, 6);
          // Rope and line may touch what holds them; wire keeps its distance there too.
          if (strand.part == Strand.Part.WIRE || !exempt(strand, scene, piece)) {
            piece(strand, piece, allowance, worst, required);
          }
        });
  }

  private void piece(
      Strand strand, double[] piece, double slack, Tally.Worst worst, double required) {
    for (int end = 0; end < 6; end += 3) {
      double depth = depth(piece[end], piece[end + 1], piece[end + 2]);
      if (depth > 1e-6) {
        Place at = Obstacle.place(piece, end);
        Place top = new Place(at.x(), at.y(), at.z() + depth);
        worst.offer(-depth, required, strand.part.word, at, top);
      }
    }
    Space.Near near = new Space.Near();
    double enough = worst.reach(required) + slack;
    for (int i = 0; i < faces.size(); i++) {
      if (Obstacle.gap(piece, 0, faceBoxes.get(i)) < Math.min(enough, near.distance())) {
        Space.segmentTriangle(piece, 0, 3, faces.get(i), true, near);
      }
    }
    if (near.distance() >= enough) {
      return;
    }
    double distance = Math.max(0, near.distance() - slack);
    // A piece that pierces a face is inside, if only by a hand.
    double found = near.square < 1e-18 && pierces(piece) ? -0.01 : distance;
    worst.offer(
        found,
        required,
        strand.part.word,
        new Place(near.ax, near.ay, near.az),
        new Place(near.bx, near.by, near.bz));
  }

  private double depth(double x, double y, double z) {
    return roof.covers(x, y) ? roof.heightAt(x, y) - z : -1;
  }

  /** Whether some of a piece that touches a face lies truly inside. */
  private boolean pierces(double[] p) {
    for (int k = 1; k < 20; k++) {
      double t = k / 20.0;
      double x = p[0] + t * (p[3] - p[0]);
      double y = p[1] + t * (p[4] - p[1]);
      if (depth(x, y, p[2] + t * (p[5] - p[2])) > 1e-3) {
        return true;
      }
    }
    return false;
  }

  /**
   * Takes off a piece what may touch; true when nothing is left. Ropes within reach of their own
   * attachment; wire and feedpoint at an attachment on a wall; guys at their feet; the line at its
   * entry.
   */
  private static boolean exempt(Strand strand, Scene scene, double[] piece) {
    boolean gone = false;
    if (strand.part == Strand.Part.FEED_LINE) {
      gone = cut(piece, scene.entry());
    } else if (strand.part == Strand.Part.GUY) {
      double[] all = strand.states[0];
      gone = cut(piece, Obstacle.place(all, all.length - 3));
    }
    for (int a : new int[] {strand.from, strand.to}) {
      if (!gone && a >= 0) {
        Holder holder = scene.holders().get(a);
        boolean may = strand.part != Strand.Part.WIRE && strand.part != Strand.Part.FEED_LINE;
        gone = (may || holder.isWall()) && cut(piece, scene.at().get(a));
      }
    }
    return gone;
  }

  /** Cuts off what lies within reach of a place; true when that is all of it. */
  private static boolean cut(double[] p, Place at) {
    double first = apart(p, 0, at);
    double last = apart(p, 3, at);
    if (first >= OWN && last >= OWN) {
      return false;
    }
    if (first < OWN && last < OWN) {
      return true;
    }
    int inside = first < OWN ? 0 : 3;
    int outside = 3 - inside;
    double low = 0;
    double high = 1;
    double[] probe = new double[3];
    for (int i = 0; i < 40; i++) {
      double t = (low + high) / 2;
      for (int k = 0; k < 3; k++) {
        probe[k] = p[inside + k] + t * (p[outside + k] - p[inside + k]);
      }
      if (apart(probe, 0, at) < OWN) {
        low = t;
      } else {
        high = t;
      }
    }
    System.arraycopy(probe, 0, p, inside, 3);
    return false;
  }

  private static double apart(double[] p, int i, Place at) {
    return Obstacle.place(p, i).distance(at);
  }
}
