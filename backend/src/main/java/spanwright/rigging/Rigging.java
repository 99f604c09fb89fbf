package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.function.Predicate;
import spanwright.plan.Building;
import spanwright.plan.Canopy;
import spanwright.plan.Catalogue;
import spanwright.plan.GroundSurface;
import spanwright.plan.LineKind;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.RopeKind;
import spanwright.plan.WireKind;

/**
 * Hangs layouts on a plan. Prepared once for a plan; immutable and safe for any number of threads.
 *
 * <p>The wire keeps its finished length, read from the layout's points; the ropes take up the rest
 * of the way. The rule for the pull: each span is drawn until the wire carries 15 % of its breaking
 * strength or hangs with a sag of 1 %, whichever pulls less (common practice, no source), and let
 * out again until every support, the wire and the rope hold in the gust. A span that ends at a tree
 * ends there over a pulley at a counterweight, so that the tree may sway; every other end is tied.
 */
public final class Rigging {
  final Plan plan;
  final GroundSurface ground;
  final RuleBook rules;
  final Map<String, Holder> holders;
  final List<Roof> roofs;
  final LineRun lineRun;
  final Masts masts;
  private final Catalogue catalogue;
  private final RopeKind rope;
  private final double wind;
  private final double ice;

  private Rigging(Plan plan, Catalogue catalogue) {
    this.plan = plan;
    this.catalogue = catalogue;
    ground = GroundSurface.of(plan);
    rules = RuleBook.of(plan, catalogue);
    holders = Holder.all(plan);
    List<Roof> all = new ArrayList<>();
    for (Building each : plan.buildings()) {
      all.add(Roof.of(each, ground));
    }
    roofs = List.copyOf(all);
    lineRun = new LineRun(plan, ground, roofs);
    masts = new Masts(plan, ground, rules.value("mast-spacing"));
    rope = pick(catalogue.ropes(), plan.brief().rope(), RopeKind::id, RopeKind::isDefault, "rope");
    wind = plan.brief().rules() == null ? 25 : plan.brief().rules().wind();
    ice = plan.brief().rules() == null ? 0 : plan.brief().rules().ice();
  }

  /** Prepares a plan. */
  public static Rigging of(Plan plan, Catalogue catalogue) {
    return new Rigging(plan, catalogue);
  }

  /** Hangs one layout: {@code of(plan, catalogue).hang(layout)}. */
  public static Rigged hang(Plan plan, Catalogue catalogue, Layout layout) {
    return of(plan, catalogue).hang(layout);
  }

  /**
   * Hangs a layout, calm and in the design gust.
   *
   * @throws IllegalArgumentException with a sentence when the layout makes no sense: an unknown id,
   *     fewer than two attachments, a wire without length
   */
  public Rigged hang(Layout layout) {
    return new Hang(this, layout, true).rigged();
  }

  /**
   * The calm shape alone, for screening: as {@link #hang(Layout)}, but the blown shapes are the
   * calm ones again, pulls in wind are the calm pulls, and the pull is not let out for the gust.
   */
  public Rigged hangCalm(Layout layout) {
    return new Hang(this, layout, false).rigged();
  }

  /**
   * The shortest rope between a holding point and the wire's end that keeps the end out of the
   * foliage of what holds it [m], for a wire that leaves it about level.
   *
   * @param on id of a support, bracket line or mast zone
   * @param height of the holding point above the ground there [m]
   */
  public double leastTail(String on, double height) {
    Holder holder = holder(on);
    double least = holder.isTree() ? 1.0 : 0.3;
    Canopy canopy = holder.canopy();
    if (canopy == null) {
      return holder.ropeOnly() ? Math.max(least, 1.0) : least;
    }
    double clear = rules.value("canopy-end");
    boolean beside = height > canopy.from() - clear && height < canopy.to() + clear;
    // Half a metre more for the sag and a hand's breadth of survey.
    return beside ? canopy.radius() + clear + 0.1 : least;
  }

  /**
   * What an attachment is on.
   *
   * @throws IllegalArgumentException with a sentence when the plan has no such thing
   */
  public Holder holderOf(String id) {
    return holder(id);
  }

  Holder holder(String id) {
    Holder holder = id == null ? null : holders.get(id);
    if (holder == null) {
      throw new IllegalArgumentException(
          "attachments: the plan has no support, bracket line or mast zone \""
              + id
              + "\". Name one that it has.");
    }
    return holder;
  }

  WireKind wire(String id) {
    String wanted = id == null ? plan.brief().wire() : id;
    return pick(catalogue.wires(), wanted, WireKind::id, WireKind::isDefault, "wire");
  }

  LineKind line(String id) {
    String wanted = id == null ? plan.brief().line() : id;
    return pick(catalogue.lines(), wanted, LineKind::id, LineKind::isDefault, "feed line");
  }

  RopeKind rope() {
    return rope;
  }

  Materials materials(WireKind wire) {
    return Materials.of(wire, rope, wind, ice);
  }

  boolean isIcy() {
    return ice > 0;
  }

  private static <K> K pick(
      List<K> kinds, String id, Function<K, String> name, Predicate<K> isDefault, String what) {
    for (K each : kinds) {
      if (id == null ? isDefault.test(each) : name.apply(each).equals(id)) {
        return each;
      }
    }
    throw new IllegalArgumentException(
        id == null
            ? "catalogue: no " + what + " is marked as the default. Name one in the brief."
            : "catalogue: there is no " + what + " \"" + id + "\". Choose one of the catalogue.");
  }

  /** Lighter wires of the catalogue than this one, heaviest first. */
  public List<String> lighterWires(String id) {
    double weight = wire(id).weight();
    return catalogue.wires().stream()
        .filter(each -> each.weight() < weight)
        .sorted((a, b) -> Double.compare(b.weight(), a.weight()))
        .map(WireKind::id)
        .toList();
  }

  /** The point of the entry, z above the plan's zero. */
  public Place entry() {
    return lineRun.entry();
  }
}
