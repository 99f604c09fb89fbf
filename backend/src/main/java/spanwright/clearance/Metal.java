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

  Metal(Metalwork source, GroundSurface ground, RuleBook rules) {
    this.source = source;
    path = Strand.flat(ground.raise(source.path()));
    box = Space.box(path, 0, path.length / 3 - 1);
    for (int k = 0; k < 3; k++) {
      box[k] -= source.radius();
      box[k + 3] += source.radius();
    }
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
    Walk.along(
        strand,
        box,
        Walk.ALL,
        () -> worst.reach(required),
        (index, points, i, allowance) -> {
          Space.Near near = new Space.Near();
          for (int k = 0; k + 3 < path.length; k += 3) {
            Space.segments(points, i, i + 3, path, k, k + 3, near);
          }
          double distance = Math.max(0, near.distance() - allowance - source.radius());
          if (distance < worst.range(required)) {
            Place at = new Place(near.ax, near.ay, near.az);
            Place toAt = new Place(near.bx, near.by, near.bz);
            worst.offer(distance, required, strand.part.word, at, toAt);
          }
        });
  }
}
