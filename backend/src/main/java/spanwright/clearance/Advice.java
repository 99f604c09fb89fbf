package spanwright.clearance;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.plan.BoundaryRule;
import spanwright.plan.OverheadLine;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.RuleBook;

/** What refuses nothing and must be known all the same before anyone climbs, as sentences. */
final class Advice {
  private final Plan plan;
  private final Overhead overhead;
  private final Clearances clearances;
  private final List<Solid> solids;
  private final List<Volumes.People> people;
  private final double poleLine;
  private final double highLine;
  private final Place entry;

  Advice(
      Plan plan,
      Overhead overhead,
      Clearances clearances,
      List<Solid> solids,
      List<Volumes.People> people,
      RuleBook rules,
      Place entry) {
    this.plan = plan;
    this.overhead = overhead;
    this.clearances = clearances;
    this.solids = solids;
    this.people = people;
    this.entry = entry;
    poleLine = rules.value("consult-pole-line");
    highLine = rules.value("consult-high-line");
  }

  List<String> of(List<Strand> strands) {
    List<String> said = new ArrayList<>();
    for (Overhead.Line line : overhead.lines()) {
      consult(line, strands, said);
      lowered(line.source(), line.kept(), said);
    }
    for (Solid solid : solids) {
      double deep = strands.stream().mapToDouble(s -> solid.leaned(s, entry)).max().orElse(0);
      if (deep > 0.05) {
        said.add(
            "In the gust the feed line leans on "
                + clearances.name(solid.id())
                + ": hold it off on stand-offs.");
      }
    }
    people.forEach(each -> amidPeople(each, strands, said));
    overhang(strands, said);
    return said;
  }

  private void consult(Overhead.Line line, List<Strand> strands, List<String> said) {
    if (line.isTelephone()) {
      return;
    }
    boolean high =
        line.source().kind() == OverheadLine.Kind.HIGH_VOLTAGE
            || line.source().kind() == OverheadLine.Kind.UNKNOWN;
    double within = high ? highLine : poleLine;
    double[] path = flattened(line.path());
    Space.Near near = new Space.Near();
    for (Strand strand : strands) {
      double[] p = flattened(strand.states[strand.calm]);
      for (int i = 0; i + 3 < p.length; i += 3) {
        for (int k = 0; k + 3 < path.length; k += 3) {
          Space.segments(p, i, i + 3, path, k, k + 3, near);
        }
      }
    }
    if (near.distance() < within) {
      said.add(
          String.format(
              Locale.ROOT,
              "%s passes %s: speak with its operator before any work within %.0f m of it.",
              clearances.name(line.source().id()),
              apart(near.distance()),
              within));
    }
  }

  private static String apart(double distance) {
    return distance < 0.05
        ? "straight over or under this rigging"
        : String.format(Locale.ROOT, "%.1f m on the plan from this rigging", distance);
  }

  private static double[] flattened(double[] points) {
    double[] flat = points.clone();
    for (int i = 2; i < flat.length; i += 3) {
      flat[i] = 0;
    }
    return flat;
  }

  private void lowered(OverheadLine line, double kept, List<String> said) {
    boolean both = line.authorisedBy() != null && line.authorisedOn() != null;
    if (both && line.clearance() != null && line.clearance() == kept) {
      said.add(
          String.format(
              Locale.ROOT,
              "The kept distance to %s is %.2f m on the word of %s, given on %s.",
              clearances.name(line.id()),
              kept,
              line.authorisedBy(),
              line.authorisedOn()));
    }
  }

  private void amidPeople(Volumes.People volume, List<Strand> strands, List<String> said) {
    String where = clearances.name(volume.id());
    boolean line = false;
    boolean stands = false;
    for (Strand strand : strands) {
      boolean in = volume.holds(strand);
      line |= in && strand.part == Strand.Part.FEED_LINE;
      stands |= in && (strand.part == Strand.Part.MAST || strand.part == Strand.Part.HALYARD);
    }
    if (line) {
      said.add(
          "The feed line comes through "
              + where
              + ", where people are: lead it out of reach, and nobody touches it while sending.");
    }
    if (stands) {
      said.add(
          "A mast or its halyard comes down in "
              + where
              + ", where people are: make it off out of children's reach.");
    }
  }

  /** What passes over an edge that nobody is named for. */
  private void overhang(List<Strand> strands, List<String> said) {
    Area area = new Area(plan.boundary());
    for (BoundaryRule rule : plan.boundaryRules()) {
      boolean lets = rule.overhang() == BoundaryRule.Overhang.WIRES;
      lets |= rule.overhang() == BoundaryRule.Overhang.ROPES;
      boolean named = rule.agreedBy() != null && !rule.agreedBy().isBlank();
      if (lets && !named && strands.stream().anyMatch(s -> passes(s, area, rule.edge()))) {
        said.add(
            "Something of this passes over edge "
                + rule.edge()
                + " of the boundary; the plan does not say who agreed.");
      }
    }
  }

  private static boolean passes(Strand strand, Area area, int edge) {
    for (double[] p : strand.states) {
      for (int i = 0; i < p.length; i += 3) {
        if (!area.contains(p[i], p[i + 1]) && area.nearestEdge(p[i], p[i + 1]) == edge) {
          return true;
        }
      }
    }
    return false;
  }
}
