package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Place;

/**
 * One span: rope, wire, feedpoint, wire, rope between two attachments, in calm, gust and ice. Not
 * safe for several threads at once; made anew for each hang.
 */
final class SpanStatics {
  private static final double G = Hanging.GRAVITY;

  /**
   * What a span is made of.
   *
   * @param from first attachment
   * @param to second attachment
   * @param swayFrom sideways shift of the first attachment in the gust [m]
   * @param swayTo likewise of the second
   * @param wire length before the feedpoint and after it [m]; all of it first where the feedpoint
   *     is elsewhere
   * @param wireAfter see {@code wire}
   * @param ropeFrom as drawn [m]
   * @param ropeTo as drawn [m]
   * @param insulatorFrom whether an insulator joins wire and rope at the first end
   * @param insulatorTo likewise at the second
   * @param fed whether the feedpoint hangs between the two lengths of wire
   */
  record Make(
      Place from,
      Place to,
      double swayFrom,
      double swayTo,
      double wire,
      double wireAfter,
      double ropeFrom,
      double ropeTo,
      boolean insulatorFrom,
      boolean insulatorTo,
      boolean fed) {}

  final Make make;
  final boolean pullAtEnd;
  final boolean byWeight;
  final double chordLength;

  /** Level, square to the span: to its left. */
  final double sideX;

  final double sideY;

  private final Materials materials;
  private final Chain chain = new Chain(4);
  private final double dx;
  private final double dy;
  private final double dz;
  private final boolean adjustTo;
  private final double[] calmLengths = new double[4];
  private FeedLoad feedLoad = FeedLoad.NONE;

  double pull;
  double ropeFrom;
  double ropeTo;
  double weightTravel;
  boolean slackerThanAsked;
  boolean lifted;

  SpanStatics(Make make, Materials materials, boolean pullAtEnd, boolean byWeight) {
    this.make = make;
    this.materials = materials;
    this.pullAtEnd = pullAtEnd;
    this.byWeight = byWeight;
    dx = make.to().x() - make.from().x();
    dy = make.to().y() - make.from().y();
    dz = make.to().z() - make.from().z();
    chordLength = Math.sqrt(dx * dx + dy * dy + dz * dz);
    double level = Math.hypot(dx, dy);
    sideX = level < 1e-6 ? 0 : -dy / level;
    sideY = level < 1e-6 ? 1 : dx / level;
    boolean wanted = pullAtEnd ? make.ropeTo() > 0.01 : make.ropeFrom() > 0.01;
    adjustTo = wanted ? pullAtEnd : pullAtEnd ? make.ropeFrom() <= 0.01 : make.ropeTo() > 0.01;
    double flexibility = 1 / materials.wireStiffness();
    chain.flexibility[0] = 1 / materials.ropeStiffness();
    chain.flexibility[1] = flexibility;
    chain.flexibility[2] = flexibility;
    chain.flexibility[3] = 1 / materials.ropeStiffness();
  }

  /** Sets what bears on the feedpoint of this span. */
  void setFeedLoad(FeedLoad load) {
    feedLoad = load;
  }

  private void load(Weather weather) {
    double fx = weather.windy() ? sideX : 0;
    double fy = weather.windy() ? sideY : 0;
    double rope = materials.push(materials.ropeDiameter(), weather);
    double wire = materials.push(materials.wireDiameter(), weather);
    boolean iced = weather.iced;
    double ropeWeight = materials.weight(materials.ropeWeight(), materials.ropeDiameter(), iced);
    double wireWeight = materials.weight(materials.wireWeight(), materials.wireDiameter(), iced);
    chain.setLoad(0, fx * rope, fy * rope, -ropeWeight);
    chain.setLoad(1, fx * wire, fy * wire, -wireWeight);
    chain.setLoad(2, fx * wire, fy * wire, -wireWeight);
    chain.setLoad(3, fx * rope, fy * rope, -ropeWeight);
    double insulator = -Practice.INSULATOR_WEIGHT * G;
    chain.setPoint(0, 0, 0, make.insulatorFrom() ? insulator : 0);
    chain.setPoint(2, 0, 0, make.insulatorTo() ? insulator : 0);
    if (make.fed()) {
      double push = feedLoad.push(weather);
      chain.setPoint(1, fx * push, fy * push, -feedLoad.weight(weather));
    }
  }

  /** The tension that draws the span to a sag of this share of its chord, by the beam [N]. */
  double tensionForSag(double share) {
    double wire = make.wire() + make.wireAfter();
    double level = Math.hypot(dx, dy);
    double even =
        (materials.wireWeight() * wire + materials.ropeWeight() * Math.max(0, chordLength - wire))
            * G
            / chordLength;
    double at = (make.ropeFrom() + make.wire()) / chordLength;
    double a = make.fed() ? Math.max(0.02, Math.min(0.98, at)) : 0.5;
    double moment =
        even * chordLength * level / 8
            + (make.fed() ? feedLoad.weight(Weather.CALM) * a * (1 - a) * level : 0);
    // A steep span must bear its own weight whatever its sag.
    double steep = Math.abs(dz) / chordLength;
    double borne =
        3 + 1.2 * steep * (even * chordLength + (make.fed() ? feedLoad.weight(Weather.CALM) : 0));
    return Math.max(borne, moment / (share * chordLength));
  }

  /** Hangs it calm with the pull, letting rope out or in. */
  void calm(double wantedPull) {
    pull = wantedPull;
    load(Weather.CALM);
    double least = make.ropeFrom() < 0.01 && make.ropeTo() < 0.01 ? 0 : Practice.SHORTEST_TAIL;
    Tightening tightening = new Tightening(chain, dx, dy, dz);
    double slack = tightening.toPull(pull, pullAtEnd, s -> setRope(chordLength + s, pull));
    double free = adjustTo ? ropeTo : ropeFrom;
    double drawn = adjustTo ? make.ropeTo() : make.ropeFrom();
    least = Math.min(least, drawn);
    if (Double.isNaN(slack) || free < least) {
      // The wire is longer than this pull leaves room for: it hangs as long as it is.
      slackerThanAsked = true;
      setFreeRope(least, 0);
      tightening.asLong(chain.totalLength() - chordLength);
      pull = pullAtEnd ? chain.tensionAtEnd() : chain.tensionAtStart();
    }
    System.arraycopy(chain.length, 0, calmLengths, 0, 4);
  }

  /** Sets the free rope so that everything, stretched by the tension, is so long. */
  private void setRope(double stretched, double tension) {
    double fixed = adjustTo ? make.ropeFrom() : make.ropeTo();
    setFreeRope(stretched - fixed - make.wire() - make.wireAfter(), tension);
  }

  /**
   * Wire and ropes as drawn are as long as they hang; unstretched they are shorter by what the
   * tension stretches them.
   */
  private void setFreeRope(double free, double tension) {
    ropeFrom = adjustTo ? make.ropeFrom() : free;
    ropeTo = adjustTo ? free : make.ropeTo();
    double rope = 1 + tension / materials.ropeStiffness();
    double wire = 1 + tension / materials.wireStiffness();
    chain.length[0] = Math.max(0, ropeFrom) / rope;
    chain.length[1] = make.wire() / wire;
    chain.length[2] = make.wireAfter() / wire;
    chain.length[3] = Math.max(0, ropeTo) / rope;
    // While the solver gropes, a rope shorter than nothing is taken off the wire beside it.
    if (free < 0) {
      int beside = adjustTo ? (make.wireAfter() > 0 ? 2 : 1) : 1;
      chain.length[beside] = Math.max(1e-6, chain.length[beside] + free);
    }
  }

  /** Keeps what a solve found, so that other states can be taken in turn. */
  Solved keep(boolean gust) {
    double[] d = offset(gust);
    int[] parts = parts();
    double[] xyz = new double[3 * (parts[0] + parts[1] + parts[2] + parts[3] + 1)];
    int count = chain.sample(parts, xyz);
    double[] end = chain.end();
    double x = make.from().x() + (gust ? make.swayFrom() * sideX : 0);
    double y = make.from().y() + (gust ? make.swayFrom() * sideY : 0);
    double z = make.from().z();
    List<Place> points = new ArrayList<>(count);
    for (int i = 0; i < count; i++) {
      points.add(new Place(x + xyz[3 * i], y + xyz[3 * i + 1], z + xyz[3 * i + 2]));
    }
    points.set(0, new Place(x, y, z));
    points.set(count - 1, new Place(x + d[0], y + d[1], z + dz));
    return new Solved(
        points,
        parts[0],
        count - 1 - parts[3],
        parts[0] + parts[1],
        new Force(chain.start[0], chain.start[1], chain.start[2]),
        new Force(-end[0], -end[1], -end[2]),
        chain.greatestTension(),
        chain.greatestTension());
  }

  private double[] offset(boolean gust) {
    double sway = gust ? make.swayTo() - make.swayFrom() : 0;
    return new double[] {dx + sway * sideX, dy + sway * sideY};
  }

  private int wireParts = 28;

  void setWireParts(int parts) {
    wireParts = parts;
  }

  private int[] parts() {
    return cut(wireParts, make.wire(), make.wireAfter(), chain.length[0], chain.length[3]);
  }

  /** Into how many parts each piece of a span is drawn. */
  static int[] cut(int wireParts, double wire, double after, double ropeFrom, double ropeTo) {
    int share = (int) Math.round(wireParts * wire / (wire + after));
    int before =
        after <= 0 ? wireParts : wire <= 0 ? 0 : Math.max(2, Math.min(wireParts - 2, share));
    return new int[] {ropeFrom > 0 ? 4 : 0, before, wireParts - before, ropeTo > 0 ? 4 : 0};
  }

  /** Hangs it in the gust, or under ice alone, from its calm lengths. */
  Solved loaded(Weather weather) {
    boolean gust = weather.windy();
    double keepFrom = ropeFrom;
    double keepTo = ropeTo;
    load(weather);
    double[] d = offset(gust);
    double chordNow = Math.sqrt(d[0] * d[0] + d[1] * d[1] + dz * dz);
    Tightening tightening = new Tightening(chain, d[0], d[1], dz);
    boolean runs = byWeight && !slackerThanAsked && adjustTo == pullAtEnd;
    if (runs) {
      double slack = tightening.toPull(pull, pullAtEnd, s -> setRope(chordNow + s, pull));
      lifted |= Double.isNaN(slack);
      runs = !Double.isNaN(slack);
    }
    if (!runs) {
      System.arraycopy(calmLengths, 0, chain.length, 0, 4);
      tightening.asLong(chain.totalLength() - chordNow);
    }
    Solved solved = keep(gust);
    double travel = runs ? (adjustTo ? ropeTo - keepTo : ropeFrom - keepFrom) : 0;
    if (Math.abs(travel) > Math.abs(weightTravel)) {
      weightTravel = travel;
    }
    ropeFrom = keepFrom;
    ropeTo = keepTo;
    return solved;
  }

  /** The same gust from the other side: everything mirrored in the upright plane of the span. */
  List<Place> mirrored(List<Place> points) {
    List<Place> other = new ArrayList<>(points.size());
    for (Place each : points) {
      double off = (each.x() - make.from().x()) * sideX + (each.y() - make.from().y()) * sideY;
      other.add(new Place(each.x() - 2 * off * sideX, each.y() - 2 * off * sideY, each.z()));
    }
    return other;
  }

  /** A force in the gust from the other side. */
  Force mirrored(Force force) {
    double off = force.x() * sideX + force.y() * sideY;
    return new Force(force.x() - 2 * off * sideX, force.y() - 2 * off * sideY, force.z());
  }
}
