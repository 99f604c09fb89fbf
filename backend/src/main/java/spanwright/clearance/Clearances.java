package spanwright.clearance;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.strtree.STRtree;
import spanwright.plan.Building;
import spanwright.plan.Catalogue;
import spanwright.plan.GroundSurface;
import spanwright.plan.Metalwork;
import spanwright.plan.PeopleVolume;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Support;
import spanwright.plan.Tree;
import spanwright.plan.Zone;
import spanwright.rigging.Holder;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;
import spanwright.rigging.Roof;
import spanwright.rigging.RuleBook;

/**
 * What stands in the way on a plan. Prepared once for a plan; immutable and safe for any number of
 * threads.
 */
public final class Clearances {
  /** Things farther away than this beyond what is required are not worth a line [m]. */
  private static final double RANGE = 5;

  /** Rules held against things that are looked up by their place; a brief may set them wide. */
  private static final List<String> BY_PLACE =
      List.of(
          "people",
          "people-rope",
          "zone-no-wire",
          "building-wire",
          "building-rope",
          "building-feed-line",
          "canopy-wire",
          "canopy-end",
          "canopy-feed-line",
          "canopy-mast",
          "metalwork-wire");

  private final GroundSurface ground;
  private final Lowest lowest;
  private final RuleBook rules;
  private final double margin;

  /** Nothing farther than this can be foul, tight or worth a line [m]. */
  private final double farthest;

  private final Rigging rigging;
  private final Overhead overhead;
  private final Boundary boundary;
  private final STRtree index = new STRtree();
  private final List<Zone> noMast = new ArrayList<>();
  private final double headroom;
  private final Screen screen;
  private final Map<String, String> names = new HashMap<>();
  private final List<Holder> holders;
  private final Advice advice;

  private Clearances(Plan plan, Catalogue catalogue) {
    ground = GroundSurface.of(plan);
    lowest = new Lowest(ground);
    rules = RuleBook.of(plan, catalogue);
    margin = rules.value("tight-margin");
    double widest = BY_PLACE.stream().mapToDouble(rules::value).max().orElse(0);
    farthest = Math.max(RANGE, widest + margin);
    headroom = rules.value("headroom");
    rigging = Rigging.of(plan, catalogue);
    overhead = new Overhead(plan, catalogue, ground, rules);
    boundary = new Boundary(plan, rules);
    List<Obstacle> obstacles = obstacles(plan);
    for (Obstacle each : obstacles) {
      double[] box = each.box();
      index.insert(new Envelope(box[0], box[3], box[1], box[4]), each);
    }
    index.build();
    List<Solid> solids = kindOf(obstacles, Solid.class);
    List<Volumes.People> people = kindOf(obstacles, Volumes.People.class);
    advice = new Advice(plan, overhead, this, solids, people, rules, rigging.entry());
    name(plan);
    holders = Holder.all(plan).values().stream().sorted(Comparator.comparing(Holder::id)).toList();
    screen = new Screen(plan, ground, rules, overhead, boundary, rigging);
  }

  private static <T> List<T> kindOf(List<Obstacle> all, Class<T> kind) {
    return all.stream().filter(kind::isInstance).map(kind::cast).toList();
  }

  private List<Obstacle> obstacles(Plan plan) {
    List<Obstacle> all = new ArrayList<>();
    for (Building each : plan.buildings()) {
      all.add(new Solid(Roof.of(each, ground), rules));
    }
    for (Support each : plan.supports()) {
      if (each.canopy() != null) {
        double level = ground.heightAt(each.at());
        all.add(new Crown(each.id(), each.at(), each.canopy(), level, rules));
      }
    }
    for (Tree each : plan.trees()) {
      if (each.canopy() != null) {
        double level = ground.heightAt(each.at());
        all.add(new Crown(each.id(), each.at(), each.canopy(), level, rules));
      }
    }
    for (PeopleVolume each : plan.people()) {
      all.add(new Volumes.People(each, ground, rules));
    }
    for (Zone each : plan.zones()) {
      switch (each.rule()) {
        case NO_WIRE -> all.add(new Volumes.NoWire(each, rules));
        case HEADROOM -> all.add(new Volumes.Headroom(each, lowest, rules));
        case NO_MAST -> noMast.add(each);
      }
    }
    for (Metalwork each : plan.metalwork()) {
      all.add(new Metal(each, ground, rules));
    }
    return all;
  }

  private void name(Plan plan) {
    names.put("ground", "the ground");
    names.put("boundary", "the boundary");
    plan.buildings().forEach(each -> names.put(each.id(), each.name()));
    plan.supports().forEach(each -> names.put(each.id(), each.name()));
    plan.trees().forEach(each -> names.put(each.id(), each.name()));
    plan.bracketLines().forEach(each -> names.put(each.id(), each.name()));
    plan.mastZones().forEach(each -> names.put(each.id(), each.name()));
    plan.overheadLines().forEach(each -> names.put(each.id(), each.name()));
    plan.zones().forEach(each -> names.put(each.id(), each.name()));
    plan.people().forEach(each -> names.put(each.id(), each.name()));
    plan.metalwork().forEach(each -> names.put(each.id(), each.name()));
  }

  /** What people call a thing of the plan. */
  String name(String id) {
    String name = names.get(id);
    return name == null || name.isBlank() ? id : name;
  }

  /** Everything of the plan that can hold a wire, by id. */
  List<Holder> holders() {
    return holders;
  }

  /** Prepares a plan: solids, crowns, zones, lines, boundary. */
  public static Clearances of(Plan plan, Catalogue catalogue) {
    return new Clearances(plan, catalogue);
  }

  /**
   * Every distance of a hung layout held against its rule, tightest first: foul, then tight, then
   * clear. Each overhead line has one at least, however far; other things are left out where they
   * are more than a few metres beyond what is required.
   */
  public List<Clearance> check(Rigged rigged) {
    return check(rigged, RANGE);
  }

  /**
   * What is foul or tight, and every overhead line: as {@link #check}, without looking at what is
   * clear by more. For a search, that only wants to know what is allowed.
   */
  public List<Clearance> checkClosely(Rigged rigged) {
    return check(rigged, 0);
  }

  private List<Clearance> check(Rigged rigged, double range) {
    List<Strand> strands = Strand.of(rigged);
    List<Holder> holders = holders(rigged);
    List<Place> at = rigged.attachments().stream().map(Rigged.Attachment::at).toList();
    Obstacle.Scene scene = new Obstacle.Scene(holders, at, rigging.entry());
    Tally tally = new Tally(margin, range);
    for (Strand strand : strands) {
      height(strand, tally);
      boundary.check(strand, scene, tally);
      for (Obstacle each : near(strand)) {
        each.check(strand, scene, tally);
      }
    }
    masts(rigged, tally);
    List<Clearance> all = new ArrayList<>(tally.clearances());
    overhead.check(rigged, strands, holders, ground, range < RANGE, all);
    all.sort(
        Comparator.comparing(Clearance::state)
            .reversed()
            .thenComparingDouble(each -> each.distance() - each.required()));
    return List.copyOf(all);
  }

  @SuppressWarnings("unchecked")
  private List<Obstacle> near(Strand strand) {
    double[] box = strand.box;
    Envelope where = new Envelope(box[0], box[3], box[1], box[4]);
    where.expandBy(farthest + strand.mostSlack);
    return index.query(where);
  }

  private List<Holder> holders(Rigged rigged) {
    List<Holder> holders = new ArrayList<>();
    for (Rigged.Attachment each : rigged.attachments()) {
      holders.add(rigging.holderOf(each.on()));
    }
    return holders;
  }

  private void height(Strand strand, Tally tally) {
    if (strand.part != Strand.Part.WIRE) {
      return;
    }
    Tally.Worst worst = tally.of("headroom", "ground");
    for (int s = 0; s < strand.states.length; s++) {
      double[] state = strand.states[s];
      for (int i = 0; i + 3 < state.length; i += 3) {
        lowest.offer(state, i, 0, 1, strand.slack(s, i), headroom, strand.part.word, worst);
      }
    }
  }

  private void masts(Rigged rigged, Tally tally) {
    double required = rules.value("zone-no-mast");
    for (Rigged.Mast mast : rigged.masts()) {
      for (Zone each : noMast) {
        Area area = new Area(each.area());
        double away = area.signed(mast.foot().x(), mast.foot().y());
        Tally.Worst worst = tally.of("zone-no-mast", each.id());
        if (away < worst.range(required)) {
          double[] edge =
              area.footOnEdge(
                  area.nearestEdge(mast.foot().x(), mast.foot().y()),
                  mast.foot().x(),
                  mast.foot().y());
          Place theirs = new Place(edge[0], edge[1], mast.foot().z());
          worst.offer(away, required, "mast", mast.foot(), theirs);
        }
      }
    }
  }

  /**
   * What refuses nothing and must be known all the same, as sentences: whom to speak with before
   * working near a line, what was allowed by whom, what comes where people are.
   */
  public List<String> notes(Rigged rigged) {
    return advice.of(Strand.of(rigged));
  }

  /**
   * A cheap look at a layout before it is hung. False means it fouls something by so much that no
   * sag, wind or small shift would change it; true promises nothing.
   */
  public boolean screen(Layout layout) {
    return screen.passes(layout);
  }

  /**
   * A refusal for each thing that is foul and each shortcoming of the rigging, with the smallest
   * change that cures it, found by calculation and checked again. Empty when nothing is foul.
   */
  public List<Refusal> refuse(Layout layout, Rigged rigged, List<Clearance> clearances) {
    Trials trials = new Trials(this, rigging, ground, layout, rigged, clearances);
    return new Cures(this, trials, layout, rigged, clearances).refusals();
  }
}
