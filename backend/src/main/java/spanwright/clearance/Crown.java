package spanwright.clearance;

import java.util.function.IntPredicate;
import spanwright.plan.Canopy;
import spanwright.plan.Place;
import spanwright.plan.Point;
import spanwright.rigging.RuleBook;

/**
 * A tree's crown: an upright cylinder, which holds whatever round shape the crown truly has. Wire
 * keeps its distance on a calm day and stays out of the crown in the gust; the wire's ends keep
 * more. The crown of the tree that holds the wire moves with it in the gust. The feed line keeps
 * out on a calm day, new masts and their guys always. Ropes may touch.
 */
final class Crown implements Obstacle {
  private final String id;
  private final double x;
  private final double y;
  private final double radius;
  private final double low;
  private final double high;
  private final double[] box;
  private final double wire;
  private final double end;
  private final double line;
  private final double rigging;

  Crown(String id, Point at, Canopy canopy, double ground, RuleBook rules) {
    this.id = id;
    x = at.x();
    y = at.y();
    radius = canopy.radius();
    low = ground + canopy.from();
    high = ground + canopy.to();
    box = new double[] {x - radius, y - radius, low, x + radius, y + radius, high};
    wire = rules.value("canopy-wire");
    end = rules.value("canopy-end");
    line = rules.value("canopy-feed-line");
    rigging = rules.value("canopy-mast");
  }

  @Override
  public double[] box() {
    return box;
  }

  @Override
  public void check(Strand strand, Scene scene, Tally tally) {
    switch (strand.part) {
      case WIRE -> {
        Tally.Worst worst = tally.of("canopy-wire", id);
        boolean own = isOwn(strand.from, scene) || isOwn(strand.to, scene);
        walk(strand, strand::isStill, wire, worst);
        if (!own) {
          walk(strand, index -> !strand.isStill(index), 0, worst);
        }
        double[] calm = strand.states[strand.calm];
        if (strand.startIsEnd) {
          end(calm, 0, tally);
        }
        if (strand.endIsEnd) {
          end(calm, calm.length - 3, tally);
        }
      }
      case MAST, GUY -> walk(strand, Walk.ALL, rigging, tally.of("canopy-mast", id));
      case FEED_LINE -> {
        if (!isOwn(strand.from, scene)) {
          walk(strand, strand::isStill, line, tally.of("canopy-feed-line", id));
        }
      }
      default -> {
        // ropes and what runs down a tree may touch leaves
      }
    }
  }

  private boolean isOwn(int attachment, Scene scene) {
    return attachment >= 0 && scene.holders().get(attachment).id().equals(id);
  }

  private void end(double[] points, int i, Tally tally) {
    double distance = signed(points[i], points[i + 1], points[i + 2]);
    Tally.Worst worst = tally.of("canopy-end", id);
    if (distance < worst.range(end)) {
      Place at = Obstacle.place(points, i);
      worst.offer(distance, end, "wire's end", at, nearest(at));
    }
  }

  private void walk(Strand strand, IntPredicate which, double required, Tally.Worst worst) {
    Walk.along(
        strand,
        box,
        which,
        () -> worst.reach(required),
        (index, points, i, allowance) -> {
          double t = nearestShare(points, i);
          Place at =
              new Place(
                  points[i] + t * (points[i + 3] - points[i]),
                  points[i + 1] + t * (points[i + 4] - points[i + 1]),
                  points[i + 2] + t * (points[i + 5] - points[i + 2]));
          double distance = signed(at.x(), at.y(), at.z()) - allowance;
          if (distance < worst.range(required)) {
            worst.offer(distance, required, strand.part.word, at, nearest(at));
          }
        });
  }

  /** Where along a piece the crown is nearest: the distance to a convex body has one valley. */
  private double nearestShare(double[] p, int i) {
    double from = 0;
    double to = 1;
    for (int k = 0; k < 48; k++) {
      double a = from + (to - from) * 0.382;
      double b = from + (to - from) * 0.618;
      if (along(p, i, a) <= along(p, i, b)) {
        to = b;
      } else {
        from = a;
      }
    }
    double middle = (from + to) / 2;
    double best = along(p, i, 0) < along(p, i, middle) ? 0 : middle;
    return along(p, i, 1) < along(p, i, best) ? 1 : best;
  }

  private double along(double[] p, int i, double t) {
    return signed(
        p[i] + t * (p[i + 3] - p[i]),
        p[i + 1] + t * (p[i + 4] - p[i + 1]),
        p[i + 2] + t * (p[i + 5] - p[i + 2]));
  }

  /** Distance to the cylinder; inside, less than nothing by the way to its surface. Convex. */
  double signed(double px, double py, double pz) {
    double side = Space.hypot(px - x, py - y) - radius;
    double end = Math.max(low - pz, pz - high);
    if (side <= 0 || end <= 0) {
      return Math.max(side, end);
    }
    return Space.hypot(side, end);
  }

  private Place nearest(Place at) {
    double away = Space.hypot(at.x() - x, at.y() - y);
    double share = away <= radius || away == 0 ? 1 : radius / away;
    return new Place(
        x + share * (at.x() - x), y + share * (at.y() - y), Math.max(low, Math.min(high, at.z())));
  }
}
