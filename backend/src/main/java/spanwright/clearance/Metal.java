package spanwright.clearance;

import spanwright.plan.GroundSurface;
import spanwright.plan.Metalwork;
import spanwright.plan.Place;
import spanwright.rigging.RuleBook;

/** A line of metal that the wire keeps off. */
final class Metal implements Obstacle {
  private final Metalwork source;
  private final double[] path;
  private final double[] box;
  private final double required;
  private final double range;

  Metal(Metalwork source, GroundSurface ground, RuleBook rules, double range) {
    this.source = source;
    this.range = range;
    path = Strand.flat(ground.raise(source.path()));
    box = Space.box(path, 0, path.length / 3 - 1);
    required = rules.value("metalwork-wire");
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
    Tally.Worst worst = tally.of("metalwork-wire", source.id());
    for (int s = 0; s < strand.states.length; s++) {
      double[] state = strand.states[s];
      if (strand.isFarther(s, box, Math.min(range, worst.spare() + required) + source.radius())) {
        continue;
      }
      for (int i = 0; i + 3 < state.length; i += 3) {
        double allowance = strand.slack(s, i) + source.radius();
        double most = Math.min(range, worst.spare() + required) + allowance;
        if (Obstacle.gap(state, i, box) > most) {
          continue;
        }
        Space.Near near = new Space.Near();
        for (int k = 0; k + 3 < path.length; k += 3) {
          Space.segments(state, i, i + 3, path, k, k + 3, near);
        }
        worst.offer(
            Math.max(0, near.distance() - allowance),
            required,
            strand.part.word,
            new Place(near.ax, near.ay, near.az),
            new Place(near.bx, near.by, near.bz));
      }
    }
  }
}
