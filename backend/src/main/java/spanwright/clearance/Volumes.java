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

  /** Where people are. No wire comes into it, calm or blown; less than nothing is inside. */
  static final class People implements Obstacle {
    private final PeopleVolume source;
    private final Area area;
    private final GroundSurface ground;
    private final double[] box;
    private final double required;
    private final double range;

    People(PeopleVolume source, GroundSurface ground, RuleBook rules, double range) {
      this.source = source;
      this.ground = ground;
      this.range = range;
      area = new Area(source.area());
      double[] h = heights(area, ground);
      box = area.box(h[0] + source.from(), h[1] + source.to());
      required = rules.value("people");
    }

    @Override
    public double[] box() {
      return box;
    }

    @Override
    public void check(Strand strand, Scene scene, Tally tally) {
      if (strand.part != Strand.Part.WIRE) {
        return;
      }
      Tally.Worst worst = tally.of("people", source.id());
      Narrowing narrowing = new Narrowing(this::signed, ground.isLevel() ? 1 : 1.5);
      for (int s = 0; s < strand.states.length; s++) {
        double[] state = strand.states[s];
        if (strand.isFarther(s, box, Math.min(range, worst.spare() + required))) {
          continue;
        }
        for (int i = 0; i + 3 < state.length; i += 3) {
          double allowance = strand.slack(s, i);
          double most = Math.min(range, worst.spare() + required);
          if (Obstacle.gap(state, i, box) - allowance > most) {
            continue;
          }
          double least = narrowing.least(state, i, most + allowance);
          if (least - allowance < most) {
            Place at = new Place(narrowing.x, narrowing.y, narrowing.z);
            worst.offer(least - allowance, required, "wire", at, near(at));
          }
        }
      }
    }

    /** Distance to the volume; on a slope its floor and ceiling are those of the nearest point. */
    private double signed(double x, double y, double z) {
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
    private final double range;

    NoWire(Zone source, RuleBook rules, double range) {
      this.source = source;
      this.range = range;
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
      if (strand.part != Strand.Part.WIRE) {
        return;
      }
      Tally.Worst worst = tally.of("zone-no-wire", source.id());
      Narrowing narrowing = new Narrowing((x, y, z) -> area.signed(x, y), 1);
      for (int s = 0; s < strand.states.length; s++) {
        double[] state = strand.states[s];
        if (strand.isFarther(s, box, Math.min(range, worst.spare() + required))) {
          continue;
        }
        for (int i = 0; i + 3 < state.length; i += 3) {
          double allowance = strand.slack(s, i);
          double most = Math.min(range, worst.spare() + required);
          if (Obstacle.gap(state, i, box) - allowance > most) {
            continue;
          }
          double least = narrowing.least(state, i, most + allowance);
          if (least - allowance < most) {
            Place at = new Place(narrowing.x, narrowing.y, narrowing.z);
            double[] foot = area.footOnEdge(area.nearestEdge(at.x(), at.y()), at.x(), at.y());
            Place edge = new Place(foot[0], foot[1], at.z());
            worst.offer(least - allowance, required, "wire", at, edge);
          }
        }
      }
    }
  }

  /** A zone with a headroom: wire, rope and feed line stay above it. */
  static final class Headroom implements Obstacle {
    private final Zone source;
    private final Area area;
    private final GroundSurface ground;
    private final double[] box;
    private final double required;

    Headroom(Zone source, GroundSurface ground, RuleBook rules) {
      this.source = source;
      this.ground = ground;
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
      if (strand.part == Strand.Part.MAST || strand.part == Strand.Part.HALYARD) {
        return;
      }
      Tally.Worst worst = tally.of("zone-headroom", source.id());
      for (int s = 0; s < strand.states.length; s++) {
        double[] state = strand.states[s];
        if (strand.isFarther(s, box, 0)) {
          continue;
        }
        for (int i = 0; i + 3 < state.length; i += 3) {
          double allowance = strand.slack(s, i);
          if (Obstacle.gap(state, i, box) == 0) {
            piece(strand, state, i, allowance, worst);
          }
        }
      }
    }

    private void piece(Strand strand, double[] p, int i, double allowance, Tally.Worst worst) {
      double[] cuts = area.cuts(p[i], p[i + 1], p[i + 3], p[i + 4]);
      for (int c = 0; c + 1 < cuts.length; c++) {
        double middle = (cuts[c] + cuts[c + 1]) / 2;
        boolean inside =
            area.contains(
                p[i] + middle * (p[i + 3] - p[i]), p[i + 1] + middle * (p[i + 4] - p[i + 1]));
        if (inside) {
          lowest(p, i, cuts[c], cuts[c + 1], ground, allowance, required, strand.part.word, worst);
        }
      }
    }
  }

  /**
   * Offers the lowest height above the ground along a piece between two shares of it. On slopes it
   * is sampled every decimetre and a centimetre taken off, more than a fold of the ground can hide.
   */
  static void lowest(
      double[] p,
      int i,
      double from,
      double to,
      GroundSurface ground,
      double allowance,
      double required,
      String what,
      Tally.Worst worst) {
    double length = Math.hypot(p[i + 3] - p[i], p[i + 4] - p[i + 1]) * (to - from);
    int steps = ground.isLevel() ? 1 : Math.max(1, (int) Math.ceil(length / 0.1));
    double hidden = ground.isLevel() ? 0 : 0.01;
    for (int k = 0; k <= steps; k++) {
      double t = from + (to - from) * k / steps;
      double x = p[i] + t * (p[i + 3] - p[i]);
      double y = p[i + 1] + t * (p[i + 4] - p[i + 1]);
      double z = p[i + 2] + t * (p[i + 5] - p[i + 2]);
      double base = ground.heightAt(x, y);
      double height = z - base - allowance - hidden;
      if (height - required < worst.spare()) {
        worst.offer(height, required, what, new Place(x, y, z), new Place(x, y, base));
      }
    }
  }
}
