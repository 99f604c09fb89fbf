package spanwright.clearance;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import spanwright.plan.Catalogue;
import spanwright.plan.GroundSurface;
import spanwright.plan.OverheadLine;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.Holder;
import spanwright.rigging.Rigged;
import spanwright.rigging.RuleBook;

/**
 * The three rules for overhead lines: kept distance, wire let go, mast let go. They refuse; they
 * are never weighed against anything. Telephone lines know the first only.
 */
final class Overhead {
  /** Rope and wire stretch: the reach is taken longer by this share. */
  private static final double STRETCH = 1.003;

  /** Farther than this beyond what is kept, three states of the sweep tell enough [m]. */
  private static final double FAR = 4;

  /**
   * A line as it hangs over this plan.
   *
   * @param source in the plan
   * @param rule id of its kept distance
   * @param kept metres
   * @param path x, y, z above the plan's zero, in turn
   * @param box about the path
   */
  record Line(OverheadLine source, String rule, double kept, double[] path, double[] box) {
    boolean isTelephone() {
      return source.kind() == OverheadLine.Kind.TELEPHONE;
    }

    int segments() {
      return path.length / 3 - 1;
    }
  }

  private final List<Line> lines;
  private final double half;
  private final double fallShare;
  private final double margin;

  Overhead(Plan plan, Catalogue catalogue, GroundSurface ground, RuleBook rules) {
    List<Line> all = new ArrayList<>();
    for (OverheadLine each : plan.overheadLines()) {
      double[] path = Strand.flat(ground.raise(each.path()));
      all.add(
          new Line(
              each,
              catalogue.overheadRule(each.kind()).id(),
              catalogue.keptDistance(each, plan.brief().rules()),
              path,
              Space.box(path, 0, path.length / 3 - 1)));
    }
    lines = List.copyOf(all);
    half = Math.toRadians(rules.value("wire-let-go"));
    fallShare = rules.value("mast-let-go");
    margin = rules.value("tight-margin");
  }

  List<Line> lines() {
    return lines;
  }

  double half() {
    return half;
  }

  double fallShare() {
    return fallShare;
  }

  /**
   * Every clearance to every line: one of the first rule at least, however far.
   *
   * @param closely whether a distance that is clear need only be told to be so
   */
  void check(
      Rigged rigged,
      List<Strand> strands,
      List<Holder> holders,
      GroundSurface ground,
      boolean closely,
      List<Clearance> into) {
    for (Line line : lines) {
      double enough = closely ? line.kept() + margin : Double.POSITIVE_INFINITY;
      into.add(keptDistance(line, strands, enough));
      if (!line.isTelephone()) {
        letGo(line, rigged, holders, enough, into);
        mastLetGo(line, rigged, holders, ground, into);
      }
    }
  }

  // --- kept distance

  private Clearance keptDistance(Line line, List<Strand> strands, double enough) {
    Space.Near near = new Space.Near();
    Strand nearest = strands.get(0);
    double least = enough;
    if (least < Double.POSITIVE_INFINITY) {
      // should nothing come nearer, some place must still be named
      double[] p = nearest.states[0];
      Space.pointSegment(p[0], p[1], p[2], line.path(), 0, 3, true, near);
    }
    for (Strand strand : strands) {
      if (Space.boxes(strand.box, line.box) - strand.mostSlack() >= least) {
        continue;
      }
      Space.Near here = new Space.Near();
      double distance = toLine(strand, line, least, here);
      if (distance < least) {
        least = distance;
        nearest = strand;
        near = here;
      }
    }
    return clearance(line.rule(), line, nearest.part.word, near, least, line.kept());
  }

  private Clearance clearance(
      String rule, Line line, String what, Space.Near near, double distance, double required) {
    return new Clearance(
        rule,
        line.source().id(),
        what,
        new Place(near.ax, near.ay, near.az),
        new Place(near.bx, near.by, near.bz),
        distance,
        required,
        Judge.state(distance, required, margin));
  }

  /**
   * A distance no greater than that from a strand, wherever the weather puts it, to a line [m];
   * exact below {@code enough} but for the slack of the sweep, never less than nothing.
   */
  static double toLine(Strand strand, Line line, double enough, Space.Near near) {
    boolean far = Space.boxes(strand.box, line.box()) > line.kept() + FAR;
    double least = enough;
    for (int i = 0; i + 3 < 3 * strand.points(); i += 3) {
      for (int state = 0; state < strand.states.length; state++) {
        boolean main = strand.isStill(state) || state == 0 || state == strand.sweep - 1;
        double slack = strand.slack(state, i);
        if ((main || !far) && gap(strand, state, i, line) - slack < least) {
          Space.Near here = new Space.Near();
          piece(strand.states[state], i, line, here);
          for (int next : far ? new int[0] : strand.onward(state)) {
            between(strand.states[state], strand.states[next], i, line, here);
            slack = Math.max(slack, strand.slack(next, i));
          }
          double distance = Math.max(0, here.distance() - slack);
          if (distance < least) {
            least = distance;
            near.square = Double.POSITIVE_INFINITY;
            near.offer(here.ax, here.ay, here.az, here.bx, here.by, here.bz);
          }
        }
      }
    }
    return least;
  }

  /** How far a piece is at least, on its way to the next state too. */
  private static double gap(Strand strand, int state, int i, Line line) {
    double here = Obstacle.gap(strand.states[state], i, line.box());
    double[] one = strand.states[state];
    double moves = 0;
    for (int onward : strand.onward(state)) {
      double[] next = strand.states[onward];
      moves = Math.max(moves, Math.max(apart(one, i, next, i), apart(one, i + 3, next, i + 3)));
    }
    return here - moves;
  }

  private static void piece(double[] ours, int i, Line line, Space.Near near) {
    double[] path = line.path();
    for (int k = 0; k + 3 < path.length; k += 3) {
      Space.segments(ours, i, i + 3, path, k, k + 3, near);
    }
  }

  /** The surface between two states of a piece, as two triangles. */
  private static void between(double[] one, double[] other, int i, Line line, Space.Near near) {
    double[] path = line.path();
    double[] triangle = new double[9];
    double across =
        Math.max(
            Math.max(apart(one, i, one, i + 3), apart(one, i, other, i)),
            apart(one, i, other, i + 3));
    for (int k = 0; k + 3 < path.length; k += 3) {
      Space.Near corner = new Space.Near();
      Space.pointSegment(one[i], one[i + 1], one[i + 2], path, k, k + 3, true, corner);
      if (corner.distance() - across < near.distance()) {
        put(triangle, one, i, one, i + 3, other, i);
        Space.segmentTriangle(path, k, k + 3, triangle, false, near);
        put(triangle, one, i + 3, other, i + 3, other, i);
        Space.segmentTriangle(path, k, k + 3, triangle, false, near);
      }
    }
  }

  private static double apart(double[] p, int i, double[] q, int j) {
    double dx = p[i] - q[j];
    double dy = p[i + 1] - q[j + 1];
    double dz = p[i + 2] - q[j + 2];
    return Math.sqrt(dx * dx + dy * dy + dz * dz);
  }

  private static void put(double[] into, double[] a, int i, double[] b, int j, double[] c, int k) {
    System.arraycopy(a, i, into, 0, 3);
    System.arraycopy(b, j, into, 3, 3);
    System.arraycopy(c, k, into, 6, 3);
  }

  // --- wire let go

  /** One end that lets go: what still holds, and how near its region can be at all. */
  private record Loss(Rigged.Span span, boolean fromFirst, double[] seen, double bound) {
    double reach() {
      return span.reach(fromFirst) * STRETCH;
    }
  }

  private void letGo(
      Line line, Rigged rigged, List<Holder> holders, double enough, List<Clearance> into) {
    List<Loss> losses = new ArrayList<>();
    for (Rigged.Span span : rigged.spans()) {
      double[] shape = Strand.flat(span.shapes().calm());
      for (boolean fromFirst : new boolean[] {true, false}) {
        double[] seen = fromFirst ? shape : backwards(shape);
        // What lies farther than the reach from the point that holds cannot be touched.
        Space.Near direct = new Space.Near();
        for (int k = 0; k < line.segments(); k++) {
          Space.pointSegment(
              seen[0], seen[1], seen[2], line.path(), 3 * k, 3 * k + 3, true, direct);
        }
        double reach = span.reach(fromFirst) * STRETCH;
        losses.add(new Loss(span, fromFirst, seen, direct.distance() - reach));
      }
    }
    losses.sort(Comparator.comparingDouble(Loss::bound));
    double least = Double.POSITIVE_INFINITY;
    Space.Near nearest = new Space.Near();
    String what = "";
    for (Loss loss : losses) {
      if (loss.bound >= least) {
        break;
      }
      LetGo region = new LetGo(loss.seen, loss.reach(), half);
      Space.Near near = new Space.Near();
      double found = Double.POSITIVE_INFINITY;
      for (int k = 0; k < line.segments(); k++) {
        double most = Math.min(enough, Math.min(least, found));
        double here = region.toSegment(line.path(), 3 * k, 3 * k + 3, line.kept(), most, near);
        found = Math.min(found, here);
      }
      if (found < least) {
        least = found;
        nearest = near;
        what =
            "wire let go at "
                + holders.get(loss.fromFirst ? loss.span.to() : loss.span.from()).name();
      }
    }
    into.add(clearance("wire-let-go", line, what, nearest, least, line.kept()));
  }

  private static double[] backwards(double[] shape) {
    double[] other = new double[shape.length];
    for (int i = 0; i < shape.length; i += 3) {
      System.arraycopy(shape, i, other, shape.length - 3 - i, 3);
    }
    return other;
  }

  // --- mast let go

  private void mastLetGo(
      Line line, Rigged rigged, List<Holder> holders, GroundSurface ground, List<Clearance> into) {
    Clearance worst = null;
    for (Rigged.Mast mast : rigged.masts()) {
      Holder zone = holders.get(mast.attachments().get(0));
      worst = worse(worst, fall(line, mast.foot(), mast.height(), "mast let go in " + zone.name()));
    }
    for (Holder each : holders) {
      if (each.isStandingMast()) {
        double x = each.support().at().x();
        double y = each.support().at().y();
        Place foot = new Place(x, y, ground.heightAt(x, y));
        worst = worse(worst, fall(line, foot, each.highest(), each.name() + " let go"));
      }
    }
    if (worst != null) {
      into.add(worst);
    }
  }

  private static Clearance worse(Clearance one, Clearance other) {
    boolean first =
        one != null && one.distance() - one.required() <= other.distance() - other.required();
    return first ? one : other;
  }

  private Clearance fall(Line line, Place foot, double height, String what) {
    Space.Near near = new Space.Near();
    for (int k = 0; k < line.segments(); k++) {
      Space.pointSegment(foot.x(), foot.y(), foot.z(), line.path(), 3 * k, 3 * k + 3, true, near);
    }
    double required = fallShare * height + line.kept();
    return clearance("mast-let-go", line, what, near, near.distance(), required);
  }
}
