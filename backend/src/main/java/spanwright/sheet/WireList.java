package spanwright.sheet;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import spanwright.assess.Placement;
import spanwright.plan.Place;
import spanwright.plan.WireKind;

/** Pieces of wire and the feed line: what to cut, and from where to where it goes. */
final class WireList {
  /** A feedpoint this near the end of its conductor feeds the end [share of its length]. */
  private static final double AT_THE_END = 0.005;

  /** A return wire's end is this near to the feedpoint [m]. */
  private static final double JOINED = 0.3;

  /** A free end's lean: sideways over its length, in still air. */
  private static final double PLUMB = 0.02;

  /** Wire that hangs down by less than this is no free end [m]. */
  private static final double LEAST_FREE = 0.2;

  private WireList() {}

  /**
   * A piece before it has its allowances.
   *
   * @param mark "W1"
   * @param conductor index
   * @param from share of the conductor's length where it begins
   * @param to share where it ends
   * @param fed whether its first end is at the feedpoint
   * @param far index of the attachment at its other end
   * @param loop whether it comes back to where it began
   * @param back whether it is a return wire: from the feedpoint, on the line's other side
   * @param free of it that hangs down freely beyond what holds its far end [m]; 0 when none does
   */
  record Piece(
      String mark,
      int conductor,
      double from,
      double to,
      boolean fed,
      int far,
      boolean loop,
      boolean back,
      double free) {}

  static List<Piece> pieces(Placement placement) {
    List<Piece> pieces = new ArrayList<>();
    for (int c = 0; c < placement.conductors().size(); c++) {
      Placement.Conductor conductor = placement.conductors().get(c);
      Place first = conductor.points().get(0);
      Place last = conductor.points().get(conductor.points().size() - 1);
      double fed = placement.feed().conductor() == c ? placement.feed().fraction() : -1;
      List<Place> run = conductor.points();
      if (first.distance(last) < 0.05) {
        pieces.add(piece(pieces, c, 0, 1, fed >= 0, nearest(placement, first), true, false, 0));
      } else if (fed > AT_THE_END && fed < 1 - AT_THE_END) {
        pieces.add(end(placement, pieces, c, 0, fed, true, false, back(run)));
        pieces.add(end(placement, pieces, c, fed, 1, true, false, run));
      } else {
        boolean back = fed < 0 && joins(placement, run);
        boolean atLast =
            fed >= 1 - AT_THE_END || back && last.distance(placement.feed().at()) < JOINED;
        pieces.add(end(placement, pieces, c, 0, 1, fed >= 0, back, atLast ? back(run) : run));
      }
    }
    return pieces;
  }

  /** A piece, its far end being the last point of a run. */
  private static Piece end(
      Placement placement,
      List<Piece> before,
      int conductor,
      double from,
      double to,
      boolean fed,
      boolean back,
      List<Place> run) {
    int far = nearest(placement, run.get(run.size() - 1));
    return piece(before, conductor, from, to, fed, far, false, back, free(run));
  }

  private static Piece piece(
      List<Piece> before,
      int conductor,
      double from,
      double to,
      boolean fed,
      int far,
      boolean loop,
      boolean back,
      double free) {
    String mark = "W" + (before.size() + 1);
    return new Piece(mark, conductor, from, to, fed, far, loop, back, free);
  }

  static List<Place> back(List<Place> run) {
    List<Place> other = new ArrayList<>(run);
    Collections.reverse(other);
    return other;
  }

  /** Whether an end of a wire that is not fed itself meets the feedpoint. */
  private static boolean joins(Placement placement, List<Place> run) {
    Place feed = placement.feed().at();
    return run.get(0).distance(feed) < JOINED || run.get(run.size() - 1).distance(feed) < JOINED;
  }

  /** How much of a run hangs plumb at its last end [m]; 0 when less than can be told. */
  static double free(List<Place> run) {
    double sum = 0;
    for (int i = run.size() - 1; i > 0; i--) {
      Place low = run.get(i);
      Place high = run.get(i - 1);
      double step = low.distance(high);
      if (high.z() <= low.z() || low.onPlan().distance(high.onPlan()) > PLUMB * step) {
        break;
      }
      sum += step;
    }
    return sum < LEAST_FREE || sum > 0.98 * Job.length(run) ? 0 : sum;
  }

  private static int nearest(Placement placement, Place end) {
    List<Placement.Attachment> held = placement.attachments();
    return IntStream.range(0, held.size())
        .boxed()
        .min(Comparator.comparingDouble(i -> held.get(i).at().distance(end)))
        .orElse(0);
  }

  static List<CutParts.WirePiece> of(Job job) {
    return pieces(job.placement).stream().map(piece -> cut(job, piece)).toList();
  }

  private static CutParts.WirePiece cut(Job job, Piece piece) {
    Placement.Conductor conductor = job.placement.conductors().get(piece.conductor());
    WireKind kind = job.wire(conductor.wire());
    double finished = conductor.length() * (piece.to() - piece.from());
    double turnsBack = 2 * Allowances.TURN_BACK;
    // rounded once, in the cut: rounding the trim too could add a second centimetre
    double trim = Math.max(Allowances.TRIM_LEAST, Allowances.TRIM_SHARE * finished);
    return new CutParts.WirePiece(
        piece.mark(),
        describe(job, piece),
        kind.id(),
        kind.name(),
        finished,
        2,
        turnsBack,
        trim,
        Figures.upToCentimetre(finished + turnsBack + trim));
  }

  private static String describe(Job job, Piece piece) {
    String far = job.holder(job.placement.attachments().get(piece.far()));
    if (piece.loop()) {
      return piece.fed() ? "loop, feedpoint round to feedpoint" : "loop, closed on itself";
    }
    String way =
        piece.back()
            ? "return wire, feedpoint to " + far + ", not earthed"
            : piece.fed() ? "feedpoint to " + far : "to " + far + ", not fed";
    return piece.free() > 0
        ? way + ", its last " + job.figures.say(piece.free()) + " hanging free"
        : way;
  }

  /** Part of a run, between two shares of its length. */
  static List<Place> part(List<Place> run, double from, double to) {
    double whole = Job.length(run);
    List<Place> out = new ArrayList<>();
    out.add(at(run, from * whole));
    double sum = 0;
    for (int i = 1; i < run.size(); i++) {
      sum += run.get(i - 1).distance(run.get(i));
      if (sum > from * whole + 1e-6 && sum < to * whole - 1e-6) {
        out.add(run.get(i));
      }
    }
    out.add(at(run, to * whole));
    return out;
  }

  /** The place so far along a run. */
  static Place at(List<Place> run, double along) {
    double left = along;
    for (int i = 1; i < run.size(); i++) {
      Place a = run.get(i - 1);
      Place b = run.get(i);
      double step = a.distance(b);
      if (left <= step && step > 0) {
        double t = Math.max(0, left / step);
        return new Place(
            a.x() + t * (b.x() - a.x()), a.y() + t * (b.y() - a.y()), a.z() + t * (b.z() - a.z()));
      }
      left -= step;
    }
    return run.get(run.size() - 1);
  }
}
