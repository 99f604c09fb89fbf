package spanwright.clearance;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanwright.plan.Place;

/** Keeps, of each rule against each thing, the place where it is worst. */
final class Tally {
  private final Map<String, Worst> all = new LinkedHashMap<>();
  private final double margin;
  private final double range;

  /** One that keeps what is foul or tight, and beyond that what lies within a range [m]. */
  Tally(double margin, double range) {
    this.margin = margin;
    this.range = range;
  }

  /** The worst place of one rule against one thing. */
  final class Worst {
    private final String rule;
    private final String to;
    private String what = "";
    private double distance;
    private double required;
    private double spare = Double.POSITIVE_INFINITY;
    private Place at;
    private Place toAt;

    private Worst(String rule, String to) {
      this.rule = rule;
      this.to = to;
    }

    /** What is to spare so far [m]. */
    double spare() {
      return spare;
    }

    /** How near something must come to be told of at all [m]. */
    double range(double needed) {
      return Math.max(range, needed + margin);
    }

    /** How near something must come to be worse than what was found [m]. */
    double reach(double needed) {
      return Math.min(range(needed), spare + needed);
    }

    void offer(double found, double needed, String part, Place ours, Place theirs) {
      if (found - needed < spare) {
        spare = found - needed;
        distance = found;
        required = needed;
        what = part;
        at = ours;
        toAt = theirs;
      }
    }
  }

  Worst of(String rule, String to) {
    return all.computeIfAbsent(rule + "|" + to, key -> new Worst(rule, to));
  }

  /** Everything found, in the order it was met. */
  List<Clearance> clearances() {
    List<Clearance> list = new ArrayList<>();
    for (Worst each : all.values()) {
      if (each.at != null) {
        list.add(
            new Clearance(
                each.rule,
                each.to,
                each.what,
                each.at,
                each.toAt,
                each.distance + 0.0,
                each.required,
                Judge.state(each.distance, each.required, margin)));
      }
    }
    return list;
  }
}
