package spanwright.search;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Shape;
import spanwright.rigging.Layout;

/**
 * Makes layouts from the places that can hold a wire: level and sloping spans between two of them,
 * fed in the middle or off centre, and legs from a held middle to two ends. Ideas are ordered by
 * promise and taken family by family, so that no one pair of supports takes all the work.
 */
final class Candidates {
  private static final double LONGEST_SPAN = 150;
  private static final double LEVEL_WITHIN = 0.25;
  private static final double APEX_ABOVE = 0.5;
  private static final double OFF_CENTRE = 0.34;
  private static final double LEAST_LEG = 2.0;

  /** Ideas kept at most before the best are taken. */
  private static final int MOST_IDEAS = 200_000;

  private static final int MOST_BARRED = 30;

  private final Plan plan;
  private final List<HoldSite> sites;
  private final WireRoom room;
  private final Promise promise;
  private final WireLengths lengths;
  private final Effort effort;
  private final Set<Shape> shapes;
  private final String wire;
  private final String line;

  /** Holding points at their heights, before the wire is fitted between them. */
  private record Idea(Shape shape, List<HoldSite> sites, List<Place> at, double promise) {
    /** What it hangs on. */
    String on() {
      return String.join("+", sites.stream().map(HoldSite::on).toList());
    }

    String family() {
      return shape.word() + ":" + on();
    }
  }

  Candidates(
      Plan plan,
      List<HoldSite> sites,
      WireRoom room,
      Promise promise,
      WireLengths lengths,
      Effort effort,
      String wire,
      String line) {
    this.plan = plan;
    this.sites = sites;
    this.room = room;
    this.promise = promise;
    this.lengths = lengths;
    this.effort = effort;
    this.shapes = Set.copyOf(plan.brief().shapes());
    this.wire = wire;
    this.line = line;
  }

  /**
   * Every layout worth checking, best promise first within what the effort allows. Where nothing
   * leaves room for wire, the best ideas as if they did: so that a reader learns what is in the
   * way.
   */
  List<Candidate> list() {
    List<Idea> ideas = byFamily(ideas(), effort.considered);
    List<Candidate> made = new ArrayList<>();
    for (Idea idea : ideas) {
      if (made.size() >= effort.considered) {
        break;
      }
      if (idea.at.size() == 2) {
        addSpans(idea, made);
      } else {
        addLegs(idea, made);
      }
    }
    if (made.isEmpty()) {
      ideas.stream().limit(MOST_BARRED).forEach(idea -> addBarred(idea, made));
    }
    return made;
  }

  private List<Idea> ideas() {
    List<Idea> ideas = new ArrayList<>();
    for (int i = 0; i < sites.size(); i++) {
      for (int j = i + 1; j < sites.size(); j++) {
        if (mayPair(sites.get(i), sites.get(j))) {
          addPairs(sites.get(i), sites.get(j), ideas);
        }
      }
      bound(ideas);
    }
    if (shapes.contains(Shape.APEX) || shapes.contains(Shape.BENT)) {
      List<HoldSite> ends = ends();
      for (HoldSite middle : middles()) {
        addTriples(middle, ends, ideas);
        bound(ideas);
      }
    }
    return ideas;
  }

  /** Lets go of the less promising when there are far too many, so that memory stays bounded. */
  private static void bound(List<Idea> ideas) {
    if (ideas.size() > 2 * MOST_IDEAS) {
      ideas.sort(Comparator.comparingDouble((Idea idea) -> -idea.promise));
      ideas.subList(MOST_IDEAS, ideas.size()).clear();
    }
  }

  private boolean mayPair(HoldSite a, HoldSite b) {
    double span = a.at().distance(b.at());
    boolean sameThing = a.on().equals(b.on()) && !a.newMast();
    return span > lengths.least() + 2 * WireRoom.LEAST_TAIL
        && span < LONGEST_SPAN
        && !sameThing
        && masts(List.of(a, b)) <= plan.brief().newMasts();
  }

  private static int masts(List<HoldSite> used) {
    return (int) used.stream().filter(HoldSite::newMast).count();
  }

  private void addPairs(HoldSite a, HoldSite b, List<Idea> ideas) {
    Set<List<Double>> heights = new HashSet<>();
    for (double ha : a.heights()) {
      for (double hb : b.heights()) {
        double za = a.ground() + ha;
        double zb = b.ground() + hb;
        double low = Math.min(za, zb);
        if (a.reaches(low) && b.reaches(low) && shapes.contains(Shape.LEVEL)) {
          addPair(a, b, low, low, heights, ideas);
        }
        addPair(a, b, za, zb, heights, ideas);
      }
    }
  }

  private void addPair(
      HoldSite a, HoldSite b, double za, double zb, Set<List<Double>> heights, List<Idea> ideas) {
    Shape shape = Math.abs(za - zb) <= LEVEL_WITHIN ? Shape.LEVEL : Shape.SLOPING;
    boolean wanted = shapes.contains(shape) || shapes.contains(Shape.OFF_CENTRE);
    if (wanted && heights.add(List.of(za, zb))) {
      List<Place> at = List.of(place(a, za), place(b, zb));
      double span = at.get(0).distance(at.get(1));
      double worth = promise.of(at, span - 2 * WireRoom.LEAST_TAIL, plan.site().planNorth());
      ideas.add(new Idea(shape, List.of(a, b), at, worth));
    }
  }

  /**
   * Middles hold the wire itself, so no crowns and no rope-only supports; at their two highest
   * heights.
   */
  private List<HoldSite> middles() {
    return sites.stream().filter(site -> site.takesWire() && !site.crowned()).toList();
  }

  /**
   * Ends for legs: every standing thing, and new masts thinned to every second place to bound the
   * triples.
   */
  private List<HoldSite> ends() {
    List<HoldSite> ends = new ArrayList<>();
    int masts = 0;
    for (HoldSite site : sites) {
      if (!site.newMast() || masts++ % 2 == 0) {
        ends.add(site);
      }
    }
    return ends;
  }

  private void addTriples(HoldSite middle, List<HoldSite> ends, List<Idea> ideas) {
    for (int i = 0; i < ends.size(); i++) {
      HoldSite a = ends.get(i);
      if (!mayLeg(middle, a)) {
        continue;
      }
      for (int j = i + 1; j < ends.size(); j++) {
        HoldSite b = ends.get(j);
        boolean sameThing = a.on().equals(b.on()) && !a.newMast();
        boolean allowed =
            mayLeg(middle, b)
                && !sameThing
                && masts(List.of(a, middle, b)) <= plan.brief().newMasts();
        if (allowed) {
          addTriple(middle, a, b, ideas);
        }
      }
    }
  }

  private static boolean mayLeg(HoldSite middle, HoldSite end) {
    double leg = middle.at().distance(end.at());
    boolean sameThing = middle.on().equals(end.on()) && !middle.newMast();
    return leg > LEAST_LEG + WireRoom.LEAST_TAIL && leg < LONGEST_SPAN / 2 && !sameThing;
  }

  private void addTriple(HoldSite middle, HoldSite a, HoldSite b, List<Idea> ideas) {
    double ax = a.at().x() - middle.at().x();
    double ay = a.at().y() - middle.at().y();
    double bx = b.at().x() - middle.at().x();
    double by = b.at().y() - middle.at().y();
    double cosine = (ax * bx + ay * by) / (Math.hypot(ax, ay) * Math.hypot(bx, by));
    if (cosine > 0.35) {
      return; // legs closer than about 70 degrees work against each other
    }
    for (double hm : middle.heights().subList(0, Math.min(2, middle.heights().size()))) {
      double zm = middle.ground() + hm;
      double za = a.ground() + a.heights().get(0);
      double zb = b.ground() + b.heights().get(0);
      boolean apex = zm >= za + APEX_ABOVE && zm >= zb + APEX_ABOVE;
      Shape shape = apex ? Shape.APEX : Shape.BENT;
      if (!shapes.contains(shape)) {
        continue;
      }
      List<Place> at = List.of(place(a, za), place(middle, zm), place(b, zb));
      double span = at.get(0).distance(at.get(1)) + at.get(1).distance(at.get(2));
      double worth = promise.of(at, span - 2 * WireRoom.LEAST_TAIL, plan.site().planNorth());
      ideas.add(new Idea(shape, List.of(a, middle, b), at, worth));
    }
  }

  private static Place place(HoldSite site, double z) {
    return new Place(site.at().x(), site.at().y(), z);
  }

  /**
   * Takes the best of every family in turn: first each family's best, then each one's second, and
   * so on.
   */
  private static List<Idea> byFamily(List<Idea> ideas, int most) {
    List<Idea> ordered = new ArrayList<>(ideas);
    ordered.sort(Comparator.comparingDouble((Idea idea) -> -idea.promise));
    List<Idea> chosen = new ArrayList<>();
    for (List<Idea> round : ByFamily.rounds(ordered, Idea::family)) {
      chosen.addAll(round);
    }
    return chosen.subList(0, Math.min(most, chosen.size()));
  }

  private void addSpans(Idea idea, List<Candidate> made) {
    Place a = idea.at.get(0);
    Place b = idea.at.get(1);
    WireRoom.Room free = room.along(a, b, WireRoom.LEAST_TAIL, WireRoom.LEAST_TAIL);
    double span = a.distance(b);
    for (double length : lengths.in(free.length())) {
      double start = free.from() + (free.length() - length) / 2;
      List<Place> wirePoints =
          List.of(between(a, b, start / span), between(a, b, (start + length) / span));
      if (shapes.contains(idea.shape)) {
        made.add(candidate(idea, idea.shape, wirePoints, length, 0.5, made.size()));
      }
      if (shapes.contains(Shape.OFF_CENTRE)) {
        made.add(candidate(idea, Shape.OFF_CENTRE, wirePoints, length, OFF_CENTRE, made.size()));
      }
    }
  }

  /** Wire all the way, but for the ropes at its ends. */
  private void addBarred(Idea idea, List<Candidate> made) {
    List<Place> points = new ArrayList<>(idea.at);
    int last = points.size() - 1;
    double first = points.get(0).distance(points.get(1));
    double end = points.get(last - 1).distance(points.get(last));
    points.set(0, between(idea.at.get(0), idea.at.get(1), WireRoom.LEAST_TAIL / first));
    points.set(last, between(idea.at.get(last), idea.at.get(last - 1), WireRoom.LEAST_TAIL / end));
    double length = first - WireRoom.LEAST_TAIL;
    double fraction = 0.5;
    if (last == 1) {
      length -= WireRoom.LEAST_TAIL;
    } else {
      double leg = length;
      length += end - WireRoom.LEAST_TAIL;
      fraction = leg / length;
    }
    made.add(candidate(idea, idea.shape, points, length, fraction, made.size()));
  }

  private void addLegs(Idea idea, List<Candidate> made) {
    Place a = idea.at.get(0);
    Place middle = idea.at.get(1);
    Place b = idea.at.get(2);
    WireRoom.Room roomA = room.along(middle, a, 0, WireRoom.LEAST_TAIL);
    WireRoom.Room roomB = room.along(middle, b, 0, WireRoom.LEAST_TAIL);
    if (roomA.from() > 0.01
        || roomB.from() > 0.01
        || roomA.length() < LEAST_LEG
        || roomB.length() < LEAST_LEG) {
      return;
    }
    Set<Double> tried = new HashSet<>();
    for (double length : lengths.in(roomA.length() + roomB.length())) {
      // Legs as equal as the room allows.
      double legA = Math.min(roomA.length(), Math.max(length / 2, length - roomB.length()));
      double legB = Math.min(roomB.length(), length - legA);
      addLegPair(idea, legA, legB, tried, made);
    }
    double equal = Math.min(roomA.length(), roomB.length());
    addLegPair(idea, equal, equal, tried, made);
  }

  private void addLegPair(
      Idea idea, double legA, double legB, Set<Double> tried, List<Candidate> made) {
    Place a = idea.at.get(0);
    Place middle = idea.at.get(1);
    Place b = idea.at.get(2);
    double length = legA + legB;
    boolean fits = legA >= LEAST_LEG && legB >= LEAST_LEG && length >= lengths.least();
    if (!fits || !tried.add((double) Math.round(20 * length))) {
      return;
    }
    List<Place> points =
        List.of(
            between(middle, a, legA / middle.distance(a)),
            middle,
            between(middle, b, legB / middle.distance(b)));
    made.add(candidate(idea, idea.shape, points, length, legA / length, made.size()));
  }

  private static Place between(Place a, Place b, double t) {
    return new Place(
        a.x() + t * (b.x() - a.x()), a.y() + t * (b.y() - a.y()), a.z() + t * (b.z() - a.z()));
  }

  private Candidate candidate(
      Idea idea, Shape shape, List<Place> points, double length, double fraction, int number) {
    List<Layout.Hold> holds = new ArrayList<>();
    for (int i = 0; i < idea.sites.size(); i++) {
      holds.add(new Layout.Hold(idea.sites.get(i).on(), idea.at.get(i)));
    }
    String word = shape.word();
    Layout layout =
        new Layout(
            word,
            holds,
            List.of(new Layout.Run(points, wire)),
            new Layout.FeedChoice(0, fraction, line, null));
    return new Candidate(
        layout,
        masts(idea.sites),
        promise.of(points, length, plan.site().planNorth()),
        word + ":" + idea.on(),
        number);
  }
}
