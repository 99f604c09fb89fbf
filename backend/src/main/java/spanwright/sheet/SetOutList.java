package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import spanwright.assess.Placement;
import spanwright.plan.Building;
import spanwright.plan.Datum;
import spanwright.plan.Place;
import spanwright.plan.Point;

/**
 * Every point by two level tapes from known points, with a third to catch a point set out on the
 * wrong side or a tape misread. Tapes are level: distances are those of the plan.
 */
final class SetOutList {
  /** Tapes that cross under this angle, or over 180° less it, fix a point poorly [degrees]. */
  static final double FLAT = 30;

  /** Known points nearer to each other than this are one point [m]. */
  private static final double APART = 1.0;

  /**
   * A tape longer than this is awkward; farther known points are taken only when none is nearer.
   */
  private static final double TAPE = 30;

  /** A feedpoint this near to an attachment in plan needs no point of its own [m]. */
  private static final double SAME = 0.3;

  private final Job job;
  private final List<SetOutParts.Known> corners = new ArrayList<>();
  private final List<String> notes = new ArrayList<>();

  private SetOutList(Job job) {
    this.job = job;
    for (Building building : job.plan.buildings()) {
      for (Point corner : building.footprint()) {
        String wind = job.cornerWind(building.footprint(), corner);
        addCorner(wind + " corner of " + job.name(building.id()), corner);
      }
    }
    for (Point corner : job.plan.boundary()) {
      addCorner(job.cornerWind(job.plan.boundary(), corner) + " corner of the boundary", corner);
    }
  }

  private void addCorner(String what, Point at) {
    corners.add(new SetOutParts.Known("", what, job.onGround(at)));
  }

  static SetOutParts.SetOut of(Job job) {
    return new SetOutList(job).work();
  }

  /**
   * A point before it has its tapes.
   *
   * @param name in words
   * @param at its place on the ground
   * @param height of what is there above the ground [m]
   */
  private record Wanted(String name, Place at, double height) {}

  private SetOutParts.SetOut work() {
    List<Wanted> wanted = wanted();
    List<SetOutParts.Known> pair = firstTwo(wanted);
    SetOutParts.Known a = pair.get(0);
    SetOutParts.Known b = pair.get(1);
    SetOutParts.Known c = third(a, b, wanted);
    List<SetOutParts.Mark> marks = new ArrayList<>();
    for (int i = 0; i < wanted.size(); i++) {
      marks.add(mark(i + 1, wanted.get(i), a, b, c));
    }
    addNotes(c);
    SetOutParts.Proposed proposed = propose(marks, a, b, c);
    String poor =
        marks.stream()
            .filter(SetOutParts.Mark::waits)
            .map(m -> String.valueOf(m.number()))
            .collect(Collectors.joining(", "));
    if (!poor.isEmpty()) {
      notes.add("No pair of known points serves " + poor + " well: measure twice.");
    }
    if (marks.stream().anyMatch(SetOutParts.Mark::onBuilding)) {
      notes.add("What stands on a building is found from its walls; the tapes only check it.");
    }
    return new SetOutParts.SetOut(a, b, c, marks, proposed, notes);
  }

  private List<Wanted> wanted() {
    List<Wanted> wanted = new ArrayList<>();
    for (Placement.Attachment held : job.placement.attachments()) {
      String part = job.mastOf(held).isPresent() ? ", foot" : "";
      wanted.add(
          new Wanted(
              job.holder(held) + part, job.onGround(held.at().onPlan()), held.aboveGround()));
    }
    for (Placement.NewMast mast : job.placement.masts()) {
      for (Place foot : mast.guyFeet()) {
        String wind = Job.wind(job.bearing(mast.foot().onPlan(), foot.onPlan()));
        String of = job.placement.masts().size() > 1 ? " of " + job.mastName(mast) : "";
        wanted.add(
            new Wanted(
                "Guy" + of.toLowerCase(Locale.ROOT) + ", " + wind, job.onGround(foot.onPlan()), 0));
      }
    }
    Place feed = job.placement.feed().at();
    if (wanted.stream().allMatch(w -> w.at().onPlan().distance(feed.onPlan()) > SAME)) {
      Place below = job.onGround(feed.onPlan());
      wanted.add(new Wanted("Plumb below the feedpoint", below, feed.z() - below.z()));
    }
    if (job.plan.entry() != null) {
      wanted.add(
          new Wanted(
              "Entry, centre of plate",
              job.onGround(job.plan.entry().at()),
              job.plan.entry().height()));
    }
    return wanted;
  }

  private List<SetOutParts.Known> firstTwo(List<Wanted> wanted) {
    List<SetOutParts.Known> known = new ArrayList<>();
    for (Datum datum : job.plan.datums()) {
      SetOutParts.Known next = datum(datum, known.isEmpty() ? "A" : "B");
      if (known.isEmpty() || apart(known.get(0), next)) {
        known.add(next);
      }
      if (known.size() == 2) {
        return known;
      }
    }
    notes.add(
        known.isEmpty()
            ? "The plan has no datum points: corners are used instead."
            : "The plan has only one datum point: a corner is used as the other.");
    while (known.size() < 2) {
      String letter = known.isEmpty() ? "A" : "B";
      SetOutParts.Known best =
          corners.stream()
              .filter(corner -> known.isEmpty() || apart(known.get(0), corner))
              .min(Comparator.comparingDouble(corner -> cost(corner, known, wanted)))
              .orElseThrow(
                  () ->
                      new IllegalArgumentException(
                          "The plan has no two known points apart: draw its boundary first."));
      known.add(new SetOutParts.Known(letter, best.what(), best.at()));
    }
    return known;
  }

  /** Datums keep their own short name as their letter. */
  private SetOutParts.Known datum(Datum datum, String letter) {
    String name = datum.name() == null ? "" : datum.name().strip();
    boolean shortName = !name.isEmpty() && name.length() <= 2;
    String what = name.isEmpty() || shortName ? "datum " + (shortName ? name : letter) : name;
    String where = cornerAt(datum.at());
    return new SetOutParts.Known(
        shortName ? name : letter,
        where == null ? what : what + ", " + where,
        job.onGround(datum.at()));
  }

  private String cornerAt(Point at) {
    return corners.stream()
        .filter(c -> c.at().onPlan().distance(at) < 0.1)
        .map(SetOutParts.Known::what)
        .findFirst()
        .orElse(null);
  }

  private static boolean apart(SetOutParts.Known one, SetOutParts.Known other) {
    return one.at().onPlan().distance(other.at().onPlan()) >= APART;
  }

  /** Longest tape, and a penalty for each point that a building hides or a flat crossing spoils. */
  private double cost(
      SetOutParts.Known corner, List<SetOutParts.Known> known, List<Wanted> wanted) {
    double cost = 0;
    for (Wanted w : wanted) {
      double tape = tape(corner, w.at());
      cost += tape + (tape > TAPE ? 50 : 0);
      cost += job.between(corner.at().onPlan(), w.at().onPlan()) != null ? 40 : 0;
      if (!known.isEmpty() && isFlat(crossing(known.get(0).at(), corner.at(), w.at()))) {
        cost += 30;
      }
    }
    return cost;
  }

  /** The third known point: off the line from A to B, near, and in sight of most. */
  private SetOutParts.Known third(SetOutParts.Known a, SetOutParts.Known b, List<Wanted> wanted) {
    List<SetOutParts.Known> from = new ArrayList<>();
    for (Datum datum : job.plan.datums()) {
      from.add(datum(datum, "C"));
    }
    from.addAll(corners);
    double base = a.at().onPlan().distance(b.at().onPlan());
    double enough = Math.min(3, Math.max(1, 0.15 * base));
    return from.stream()
        .filter(c -> apart(a, c) && apart(b, c))
        .filter(c -> Math.abs(offset(a, b, c.at())) >= enough)
        .min(Comparator.comparingDouble(c -> cost(c, List.of(), wanted)))
        .map(c -> new SetOutParts.Known(letter(c, a, b), c.what(), c.at()))
        .orElse(null);
  }

  /**
   * Gives points that no known points serve their tapes from a new datum, and says where it goes.
   */
  private SetOutParts.Proposed propose(
      List<SetOutParts.Mark> marks, SetOutParts.Known a, SetOutParts.Known b, SetOutParts.Known c) {
    List<SetOutParts.Mark> waiting = marks.stream().filter(SetOutParts.Mark::waits).toList();
    if (waiting.isEmpty()) {
      return null;
    }
    List<SetOutParts.Known> lettered = new ArrayList<>(List.of(a, b));
    if (c != null) {
      lettered.add(c);
    }
    List<String> taken = lettered.stream().map(SetOutParts.Known::letter).toList();
    String letter =
        Stream.of("D", "E", "F", "G").filter(l -> !taken.contains(l)).findFirst().orElse("D");
    NewDatum.Found found =
        new NewDatum(job, lettered, waiting.stream().map(SetOutParts.Mark::at).toList())
            .find(letter);
    if (found == null) {
      return null;
    }
    for (int i = 0; i < waiting.size(); i++) {
      SetOutParts.Mark mark = waiting.get(i);
      marks.set(marks.indexOf(mark), mark.with(found.pairs().get(i)));
    }
    SetOutParts.Pair fixed = found.fixed();
    SetOutParts.Known from = named(lettered, fixed.from());
    SetOutParts.Known with = named(lettered, fixed.with());
    double off = offset(from, with, found.at());
    boolean inLine = Math.abs(off) < 1e-6;
    String side = inLine ? "on" : off > 0 ? "left" : "right";
    notes.add(
        "Drive a new datum "
            + letter
            + " first, "
            + job.figures.say(fixed.fromTape())
            + " from "
            + fixed.from()
            + " and "
            + job.figures.say(fixed.withTape())
            + " from "
            + fixed.with()
            + (inLine
                ? ", sighted into the line between them."
                : ", on the "
                    + side
                    + " of the line "
                    + fixed.from()
                    + " to "
                    + fixed.with()
                    + ": these tapes cross at "
                    + Figures.degrees(fixed.crossing())
                    + "."));
    return new SetOutParts.Proposed(
        new SetOutParts.Known(letter, "new datum, to be driven", found.at()), fixed, side);
  }

  private static SetOutParts.Known named(List<SetOutParts.Known> known, String letter) {
    return known.stream().filter(k -> k.letter().equals(letter)).findFirst().orElseThrow();
  }

  private static String letter(SetOutParts.Known c, SetOutParts.Known a, SetOutParts.Known b) {
    List<String> taken = List.of(a.letter(), b.letter());
    if (!c.letter().isEmpty() && !taken.contains(c.letter())) {
      return c.letter();
    }
    return List.of("C", "D", "E").stream().filter(l -> !taken.contains(l)).findFirst().orElse("C");
  }

  /** Distance to the left of the line from A to B [m]. */
  private static double offset(SetOutParts.Known a, SetOutParts.Known b, Place p) {
    double ux = b.at().x() - a.at().x();
    double uy = b.at().y() - a.at().y();
    return (ux * (p.y() - a.at().y()) - uy * (p.x() - a.at().x())) / Math.hypot(ux, uy);
  }

  private SetOutParts.Mark mark(
      int number, Wanted w, SetOutParts.Known a, SetOutParts.Known b, SetOutParts.Known c) {
    double crossing = crossing(a.at(), b.at(), w.at());
    boolean flat = isFlat(crossing);
    String blocked = blocked(w.at(), a, b);
    double side = offset(a, b, w.at());
    double bearing = job.bearing(a.at().onPlan(), w.at().onPlan());
    return new SetOutParts.Mark(
        number,
        w.name(),
        w.at(),
        tape(a, w.at()),
        tape(b, w.at()),
        Math.abs(side) < 0.05 ? "on" : side > 0 ? "left" : "right",
        c == null ? null : Double.valueOf(tape(c, w.at())),
        crossing,
        flat,
        blocked,
        flat || blocked != null ? better(w.at(), a, b, c) : null,
        bearing,
        job.magnetic(bearing),
        w.height());
  }

  private String blocked(Place at, SetOutParts.Known a, SetOutParts.Known b) {
    Building under = job.under(at.onPlan());
    if (under != null) {
      return SetOutParts.Mark.ON + job.name(under.id());
    }
    List<String> found = new ArrayList<>();
    for (SetOutParts.Known known : List.of(a, b)) {
      Building building = job.between(known.at().onPlan(), at.onPlan());
      if (building != null) {
        found.add("from " + known.letter() + " by " + job.name(building.id()));
      }
    }
    return found.isEmpty() ? null : "hidden " + String.join(", ", found);
  }

  /** The pair of known points in sight that cross nearest to square, lettered points first. */
  private SetOutParts.Pair better(
      Place at, SetOutParts.Known a, SetOutParts.Known b, SetOutParts.Known c) {
    List<SetOutParts.Known> known = new ArrayList<>(List.of(a, b));
    if (c != null) {
      known.add(c);
    }
    int lettered = known.size();
    corners.stream()
        .filter(k -> known.stream().limit(lettered).allMatch(l -> apart(l, k)))
        .forEach(known::add);
    SetOutParts.Pair best = null;
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < known.size(); i++) {
      for (int k = Math.max(i + 1, 1); k < known.size(); k++) {
        SetOutParts.Known one = known.get(i);
        SetOutParts.Known two = known.get(k);
        double crossing = crossing(one.at(), two.at(), at);
        if (isFlat(crossing) || !inSight(one, at) || !inSight(two, at)) {
          continue;
        }
        double cost =
            Math.abs(crossing - 90)
                + tape(one, at)
                + tape(two, at)
                + (i >= lettered ? 100 : 0)
                + (k >= lettered ? 100 : 0);
        if (cost < least) {
          least = cost;
          best =
              new SetOutParts.Pair(label(one), tape(one, at), label(two), tape(two, at), crossing);
        }
      }
    }
    return best;
  }

  private boolean inSight(SetOutParts.Known known, Place at) {
    return tape(known, at) > 0.2 && job.between(known.at().onPlan(), at.onPlan()) == null;
  }

  private static String label(SetOutParts.Known known) {
    return known.letter().isEmpty() ? known.what() : known.letter();
  }

  private static double tape(SetOutParts.Known known, Place at) {
    return known.at().onPlan().distance(at.onPlan());
  }

  static boolean isFlat(double crossing) {
    return crossing < FLAT || crossing > 180 - FLAT;
  }

  /** Angle at a point between the tapes to two known points [degrees, 0 to 180]. */
  static double crossing(Place a, Place b, Place p) {
    double ax = a.x() - p.x();
    double ay = a.y() - p.y();
    double bx = b.x() - p.x();
    double by = b.y() - p.y();
    if (Math.hypot(ax, ay) < 1e-9 || Math.hypot(bx, by) < 1e-9) {
      return 0;
    }
    return Math.toDegrees(Math.abs(Math.atan2(ax * by - ay * bx, ax * bx + ay * by)));
  }

  private void addNotes(SetOutParts.Known c) {
    notes.add("Hold tapes level, and plumb down where the ground falls.");
    if (c == null) {
      notes.add(
          "No third known point lies off the line from A to B: check each point by its side.");
    }
  }
}
