package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.prep.PreparedGeometry;
import org.locationtech.jts.geom.prep.PreparedGeometryFactory;
import spanwright.plan.Building;
import spanwright.plan.Place;
import spanwright.plan.Point;

/**
 * Finds a place for a new datum where the known points do not serve: inside the plot and off every
 * building, itself fixed by two tapes from lettered points that cross well or sighted into the line
 * between two of them, and with one of them in sight of the points that wait for it, at a good
 * crossing. The one that serves most points, then the one whose tapes are shortest and squarest;
 * tried on a raster.
 */
final class NewDatum {
  /** Kept from walls and boundary, so that a peg can be driven and a tape held [m]. */
  private static final double OFF = 0.3;

  /** Places tried, about. */
  private static final int TRIED = 2500;

  /** Nearer than this to a point, a tape tells little [m]. */
  private static final double NEAR = 0.5;

  private final Job job;
  private final List<SetOutParts.Known> lettered;
  private final List<PreparedGeometry> walls = new ArrayList<>();
  private final List<Place> poor;

  NewDatum(Job job, List<SetOutParts.Known> lettered, List<Place> poor) {
    this.job = job;
    this.lettered = lettered;
    this.poor = poor;
    for (Building building : job.plan.buildings()) {
      Geometry core = Sight.core(building.footprint());
      if (!core.isEmpty()) {
        walls.add(PreparedGeometryFactory.prepare(core));
      }
    }
  }

  /**
   * A place for a datum.
   *
   * @param at on the ground
   * @param fixed the two tapes that fix it
   * @param pairs for each point that waits, its two tapes, or null where it does not serve
   * @param served how many it serves
   * @param cost the less the better
   */
  record Found(
      Place at, SetOutParts.Pair fixed, List<SetOutParts.Pair> pairs, int served, double cost) {}

  /** The best place, its letter given; null when none serves any point. */
  Found find(String letter) {
    Geometry room = room();
    if (room.isEmpty()) {
      return null;
    }
    PreparedGeometry inside = PreparedGeometryFactory.prepare(room);
    Envelope box = room.getEnvelopeInternal();
    double step = Math.max(0.5, Math.sqrt(box.getArea() / TRIED));
    Found best = null;
    for (double x = Math.ceil(box.getMinX() / step) * step; x <= box.getMaxX(); x += step) {
      for (double y = Math.ceil(box.getMinY() / step) * step; y <= box.getMaxY(); y += step) {
        // pegs go in at whole decimetres of the plan
        Point p = new Point(Math.rint(x * 10) / 10, Math.rint(y * 10) / 10);
        if (!inside.covers(Sight.SHAPES.createPoint(new Coordinate(p.x(), p.y())))) {
          continue;
        }
        Place at = job.onGround(p);
        best = greater(best, weigh(letter, at, fix(at)));
      }
    }
    for (int i = 0; i < lettered.size(); i++) {
      for (int k = i + 1; k < lettered.size(); k++) {
        best = greater(best, inLine(letter, inside, lettered.get(i), lettered.get(k)));
      }
    }
    return best;
  }

  /** On the line between two known points a peg is sighted in: there one tape fixes it. */
  private Found inLine(
      String letter, PreparedGeometry inside, SetOutParts.Known one, SetOutParts.Known two) {
    Place a = one.at();
    Place b = two.at();
    double length = a.onPlan().distance(b.onPlan());
    Found best = null;
    if (hidden(a, b)) {
      return null;
    }
    for (double s = NEAR; s < length - NEAR; s += 0.5) {
      double t = s / length;
      Point p = new Point(a.x() + t * (b.x() - a.x()), a.y() + t * (b.y() - a.y()));
      if (inside.covers(Sight.SHAPES.createPoint(new Coordinate(p.x(), p.y())))) {
        SetOutParts.Pair fixed =
            new SetOutParts.Pair(one.letter(), s, two.letter(), length - s, 180);
        best = greater(best, weigh(letter, job.onGround(p), fixed));
      }
    }
    return best;
  }

  private static Found greater(Found one, Found other) {
    if (one == null || other == null) {
      return one == null ? other : one;
    }
    boolean better =
        other.served() > one.served()
            || other.served() == one.served() && other.cost() < one.cost();
    return better ? other : one;
  }

  private Geometry room() {
    Geometry room = Sight.polygon(job.plan.boundary()).buffer(0).buffer(-OFF);
    for (Building building : job.plan.buildings()) {
      if (building.footprint().size() >= 3) {
        room = room.difference(Sight.polygon(building.footprint()).buffer(OFF));
      }
    }
    return room;
  }

  private Found weigh(String letter, Place at, SetOutParts.Pair fixed) {
    if (fixed == null) {
      return null;
    }
    double cost = cost(fixed);
    int served = 0;
    List<SetOutParts.Pair> pairs = new ArrayList<>();
    for (Place point : poor) {
      SetOutParts.Pair pair = serve(letter, at, point);
      pairs.add(pair);
      served += pair == null ? 0 : 1;
      cost += pair == null ? 0 : cost(pair);
    }
    return served == 0 ? null : new Found(at, fixed, pairs, served, cost);
  }

  /** Squareness and length weighed as for known points. */
  private static double cost(SetOutParts.Pair pair) {
    return Math.abs(pair.crossing() - 90) + pair.fromTape() + pair.withTape();
  }

  private SetOutParts.Pair fix(Place at) {
    SetOutParts.Pair best = null;
    for (int i = 0; i < lettered.size(); i++) {
      for (int k = i + 1; k < lettered.size(); k++) {
        SetOutParts.Known one = lettered.get(i);
        SetOutParts.Known two = lettered.get(k);
        best = lesser(best, pair(one.letter(), one.at(), two.letter(), two.at(), at));
      }
    }
    return best;
  }

  private SetOutParts.Pair serve(String letter, Place datum, Place point) {
    SetOutParts.Pair best = null;
    for (SetOutParts.Known known : lettered) {
      best = lesser(best, pair(letter, datum, known.letter(), known.at(), point));
    }
    return best;
  }

  private static SetOutParts.Pair lesser(SetOutParts.Pair one, SetOutParts.Pair other) {
    return one == null || other != null && cost(other) < cost(one) ? other : one;
  }

  /** Two tapes to a point, or null when one is hidden, very short, or they cross flat. */
  private SetOutParts.Pair pair(String from, Place a, String with, Place b, Place to) {
    double first = a.onPlan().distance(to.onPlan());
    double second = b.onPlan().distance(to.onPlan());
    double crossing = SetOutList.crossing(a, b, to);
    if (first < NEAR
        || second < NEAR
        || SetOutList.isFlat(crossing)
        || hidden(a, to)
        || hidden(b, to)) {
      return null;
    }
    return new SetOutParts.Pair(from, first, with, second, crossing);
  }

  private boolean hidden(Place from, Place to) {
    Geometry tape = Sight.path(List.of(from.onPlan(), to.onPlan()));
    return walls.stream().anyMatch(wall -> wall.intersects(tape));
  }
}
