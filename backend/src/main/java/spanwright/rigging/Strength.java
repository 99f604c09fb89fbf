package spanwright.rigging;

/**
 * How far a span is from parting. Supports are apart: each attachment has its own pull and limit.
 *
 * @param wire tensions against its breaking strength
 * @param rope tensions against half of its breaking strength, for a knot takes the other half; null
 *     where no rope holds the span
 * @param insulator tensions against what a small end insulator breaks at; likewise null
 * @param partsFirst "wire", "rope" or "insulator": that with the least margin
 * @param weakLink what a link let into the rope should part at, so that it goes before anything
 *     else and still holds the weather [N]; null where there is no room for one, or no rope
 * @param weather in which the wire is drawn hardest: "still air", "gust", "ice" or "ice and gust"
 */
public record Strength(
    Part wire, Part rope, Part insulator, String partsFirst, Double weakLink, String weather) {
  /**
   * One part of a span.
   *
   * @param calm tension in still air [N]
   * @param worst greatest tension in any weather [N]
   * @param holds what it breaks at [N]
   */
  public record Part(double calm, double worst, double holds) {
    /** What it breaks at over the greatest tension. */
    public double margin() {
      return holds / worst;
    }

    /** What it breaks at over the calm tension. */
    public double calmMargin() {
      return holds / calm;
    }
  }

  static Strength of(Look look, Materials materials) {
    Part wire = new Part(look.calm().greatest(), look.greatest(), materials.wireBreaking());
    if (look.ropeFrom() < 0.01 && look.ropeTo() < 0.01) {
      return new Strength(wire, null, null, "wire", null, look.governing());
    }
    double calm = look.calm().greatestRope();
    double worst = look.greatestRope();
    Part rope = new Part(calm, worst, Practice.KNOT * materials.ropeBreaking());
    Part insulator = new Part(calm, worst, Practice.INSULATOR_BREAKING);
    String first = "wire";
    double least = wire.margin();
    if (insulator.margin() < least) {
      first = "insulator";
      least = insulator.margin();
    }
    first = rope.margin() < least ? "rope" : first;
    double weakest = Math.min(wire.holds(), Math.min(rope.holds(), insulator.holds()));
    double link = Practice.WEAK_LINK * weakest;
    boolean room = link >= Practice.LINK_MARGIN * Math.max(worst, wire.worst());
    return new Strength(wire, rope, insulator, first, room ? link : null, look.governing());
  }
}
