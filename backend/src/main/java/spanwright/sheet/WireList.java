package spanwright.sheet;

import java.util.ArrayList;
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
   */
  record Piece(
      String mark, int conductor, double from, double to, boolean fed, int far, boolean loop) {}

  static List<Piece> pieces(Placement placement) {
    List<Piece> pieces = new ArrayList<>();
    for (int c = 0; c < placement.conductors().size(); c++) {
      Placement.Conductor conductor = placement.conductors().get(c);
      Place first = conductor.points().get(0);
      Place last = conductor.points().get(conductor.points().size() - 1);
      double fed = placement.feed().conductor() == c ? placement.feed().fraction() : -1;
      if (first.distance(last) < 0.05) {
        pieces.add(new Piece(mark(pieces), c, 0, 1, fed >= 0, nearest(placement, first), true));
      } else if (fed > AT_THE_END && fed < 1 - AT_THE_END) {
        pieces.add(new Piece(mark(pieces), c, 0, fed, true, nearest(placement, first), false));
        pieces.add(new Piece(mark(pieces), c, fed, 1, true, nearest(placement, last), false));
      } else {
        boolean fedAtLast = fed >= 1 - AT_THE_END;
        int far = nearest(placement, fedAtLast ? first : last);
        pieces.add(new Piece(mark(pieces), c, 0, 1, fed >= 0, far, false));
      }
    }
    return pieces;
  }

  private static String mark(List<Piece> before) {
    return "W" + (before.size() + 1);
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
    double trim =
        Figures.upToCentimetre(Math.max(Allowances.TRIM_LEAST, Allowances.TRIM_SHARE * finished));
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
    if (piece.fed()) {
      return "feedpoint to " + far;
    }
    return "to " + far + ", not fed";
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
