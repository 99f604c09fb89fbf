package spanwright.clearance;

import spanwright.plan.GroundSurface;
import spanwright.plan.PeopleVolume;
import spanwright.plan.Place;
import spanwright.plan.Zone;
import spanwright.rigging.RuleBook;

/** Volumes over the ground: where people are, zones without wire, zones with a headroom. */
final class Volumes {
  private static final double DEEP = 1000;

  private Volumes() {}

  /** Height of ground over an area: least and greatest, near enough for a box [m]. */
  private static double[] heights(Area area, GroundSurface ground) {
    double[] box = area.box(0, 0);
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    int steps = ground.isLevel() ? 1 : 24;
    for (int i = 0; i <= steps; i++) {
      for (int k = 0; k <= steps; k++) {
        double x = box[0] + (box[3] - box[0]) * i / steps;
        double y = box[1] + (box[4] - box[1]) * k / steps;
        double z = ground.heightAt(x, y);
        low = Math.min(low, z);
        high = Math.max(high, z);
      }
    }
    double slack = ground.isLevel() ? 0 : 0.5;
    return new double[] {low - slack, high + slack};
  }

  /**
   * Where people are. No wire comes into it, calm or blown, and no guy, rope or counterweight that
   * somebody could walk into or be under; less than nothing is inside.
   */
  static final class People implements Obstacle {
    private final PeopleVolume source;
    private final Area area;
    private final GroundSurface ground;
    private final double[] box;
    private final double wire;
    private final double rope;

    People(PeopleVolume source, GroundSurface ground, RuleBook rules) {
      this.source = source;
      this.ground = ground;
      area = new Area(source.area());
      double[] h = heights(area, ground);
      box = area.box(h[0] + source.from(), h[1] + source.to());
      wire = rules.value("people");
      rope = rules.value("people-rope");
    }

    @Override
    public double[] box() {
      return box;
    }

    @Override
    public void check(Strand strand, Scene scene, Tally tally) {
      switch (strand.part) {
        case WIRE -> nearest(strand, tally.of("people", source.id()), wire);
        case ROPE, GUY, FALL -> nearest(strand, tally.of("people-rope", source.id()), rope);
        default -> {
          // masts and halyards stand where they stand and the line comes to the house: told in
          // notes
        }
      }
    }

    private void nearest(Strand strand, Tally.Worst worst, double required) {
      double rate = 1 + ground.steepest();
      leastOf(strand, box, this::signed, rate, worst, required, this::near);
    }

    String id() {
      return source.id();
    }

    /** Whether some of a strand on a calm day is inside. */
    boolean holds(Strand strand) {
      double[] p = strand.states[strand.calm];
      for (int i = 0; i + 3 < p.length; i += 3) {
        for (int k = 0; k <= 8; k++) {
          double t = k / 8.0;
          double x = p[i] + t * (p[i + 3] - p[i]);
          double y = p[i + 1] + t * (p[i + 4] - p[i + 1]);
          if (signed(x, y, p[i + 2] + t * (p[i + 5] - p[i + 2])) < 0) {
            return true;
          }
        }
      }
      return false;
    }

    /** Distance to the volume; on a slope its floor and ceiling are those of the nearest point. */
    double signed(double x, double y, double z) {
      double side = area.signed(x, y);
      double base = ground.heightAt(x, y);
      if (side > 0 && !ground.isLevel()) {
        double[] foot = area.footOnEdge(area.nearestEdge(x, y), x, y);
        base = ground.heightAt(foot[0], foot[1]);
      }
      double upright = Math.max(base + source.from() - z, z - base - source.to());
      return side <= 0 || upright <= 0 ? Math.max(side, upright) : Math.hypot(side, upright);
    }

    private Place near(Place at) {
      double x = at.x();
      double y = at.y();
      if (!area.contains(x, y)) {
        double[] foot = area.footOnEdge(area.nearestEdge(x, y), x, y);
        x = foot[0];
        y = foot[1];
      }
      double base = ground.heightAt(x, y);
      double z = Math.max(base + source.from(), Math.min(base + source.to(), at.z()));
      return new Place(x, y, z);
    }
  }

  /** A zone without wire, at any height. */
  static final class NoWire implements Obstacle {
    private final Zone source;
    private final Area area;
    private final double[] box;
    private final double required;

    NoWire(Zone source, RuleBook rules) {
      this.source = source;
      area = new Area(source.area());
      box = area.box(-DEEP, DEEP);
      required = rules.value("zone-no-wire");
    }

    @Override
    public double[] box() {
      return box;
    }

    @Override
    public void check(Strand strand, Scene scene, Tally tally) {
      if (strand.part == Strand.Part.WIRE) {
        Tally.Worst worst = tally.of("zone-no-wire", source.id());
        Narrowing.Field field = (x, y, z) -> area.signed(x, y);
        leastOf(strand, box, field, 1, worst, required, this::edge);
      }
    }

    private Place edge(Place at) {
      double[] foot = area.footOnEdge(area.nearestEdge(at.x(), at.y()), at.x(), at.y());
      return new Place(foot[0], foot[1], at.z());
    }
  }

  /** The place of the other thing that answers to a place of ours. */
  private interface Answer {
    Place to(Place ours);
  }

  /** Offers the least of a field of distance along a strand. */
  private static void leastOf(
      Strand strand,
      double[] box,
      Narrowing.Field field,
      double rate,
      Tally.Worst worst,
      double required,
      Answer theirs) {
    Narrowing narrowing = new Narrowing(field, rate);
    Walk.along(
        strand,
        box,
        Walk.ALL,
        () -> worst.reach(required),
        (index, points, i, allowance) -> {
          double most = worst.reach(required);
          double least = narrowing.least(points, i, most + allowance);
          if (least - allowance < most) {
            Place at = new Place(narrowing.x, narrowing.y, narrowing.z);
            worst.offer(least - allowance, required, strand.part.word, at, theirs.to(at));
          }
        });
  }

  /**
   * A zone with a headroom: wire, rope and feed line stay above it, and no mast or guy stands in
   * it. A halyard runs down what stands there already.
   */
  static final class Headroom implements Obstacle {
    private final Zone source;
    private final Area area;
    private final Lowest lowest;
    private final double[] box;
    private final double required;

    Headroom(Zone source, Lowest lowest, RuleBook rules) {
      this.source = source;
      this.lowest = lowest;
      area = new Area(source.area());
      box = area.box(-DEEP, DEEP);
      required = source.height() + rules.value("zone-headroom");
    }

    @Override
    public double[] box() {
      return box;
    }

    @Override
    public void check(Strand strand, Scene scene, Tally tally) {
      if (strand.part == Strand.Part.HALYARD) {
        return;
      }
      Tally.Worst worst = tally.of("zone-headroom", source.id());
      Walk.along(
          strand,
          box,
          Walk.ALL,
          () -> 0,
          (index, points, i, allowance) -> piece(strand, points, i, allowance, worst));
    }

    private void piece(Strand strand, double[] p, int i, double allowance, Tally.Worst worst) {
      double[] cuts = area.cuts(p[i], p[i + 1], p[i + 3], p[i + 4]);
      for (int c = 0; c + 1 < cuts.length; c++) {
        double middle = (cuts[c] + cuts[c + 1]) / 2;
        boolean inside =
            area.contains(
                p[i] + middle * (p[i + 3] - p[i]), p[i + 1] + middle * (p[i + 4] - p[i + 1]));
        if (inside) {
          lowest.offer(p, i, cuts[c], cuts[c + 1], allowance, required, strand.part.word, worst);
        }
      }
    }
  }
}
