package spanwright.clearance;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanwright.plan.Building;
import spanwright.plan.Canopy;
import spanwright.plan.GroundSurface;
import spanwright.plan.OverheadLine;
import spanwright.plan.PeopleVolume;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Support;
import spanwright.plan.Tree;
import spanwright.plan.Zone;
import spanwright.rigging.Rigged;
import spanwright.rigging.Roof;

/**
 * The rules of the plan format by their own words, on points strewn over everything of ours, calm
 * and blown. Shares the hung shapes, the ground and the height of roofs with the program; its
 * distances are from points, its regions grids of points.
 */
final class RuleOracle {
  /** Told of a point inside, however deep [m]. */
  private static final double INSIDE = -2e-6;

  private static final double GRAIN = 0.25;

  /** The blown shapes it has are three of a sweep: what is told may be nearer by so much [m]. */
  private static final double SWEEP = 0.9;

  /** The least distance found for a rule and a thing. */
  record Found(String rule, String to, double distance, double required, double rough) {
    String key() {
      return rule + "|" + to;
    }
  }

  private final Plan plan;
  private final Rigged rigged;
  private final GroundSurface ground;
  private final Map<String, Found> found = new LinkedHashMap<>();
  private final List<Place> wire = new ArrayList<>();
  private final List<Place> calmWire = new ArrayList<>();
  private final List<Place> rope = new ArrayList<>();
  private final List<Place> guys = new ArrayList<>();
  private final List<Place> falls = new ArrayList<>();
  private final List<Place> halyards = new ArrayList<>();
  private final List<Place> masts = new ArrayList<>();
  private final List<Place> line = new ArrayList<>();
  private final List<Place> calmLine = new ArrayList<>();
  private final double shift;

  RuleOracle(Plan plan, Rigged rigged) {
    this.plan = plan;
    this.rigged = rigged;
    ground = GroundSurface.of(plan);
    double most = 0;
    for (Rigged.Span span : rigged.spans()) {
      for (List<Place> state : span.shapes().all()) {
        strew(state.subList(span.wireFrom(), span.wireTo() + 1), wire);
        strew(state.subList(0, span.wireFrom() + 1), rope);
        strew(state.subList(span.wireTo(), state.size()), rope);
      }
      strew(span.shapes().calm().subList(span.wireFrom(), span.wireTo() + 1), calmWire);
      most = Math.max(most, span.blowOut());
    }
    shift = most;
    for (Rigged.Rope each : rigged.ropes()) {
      List<Place> into =
          switch (each.what()) {
            case "guy" -> guys;
            case "fall" -> falls;
            case "halyard" -> halyards;
            default -> null;
          };
      if (into != null) {
        strew(each.shapes().calm(), into);
      }
    }
    rigged.masts().forEach(each -> strew(List.of(each.foot(), each.top()), masts));
    rigged.feedLine().shapes().all().forEach(each -> strew(each, line));
    rigged.feedLine().others().forEach(s -> s.all().forEach(each -> strew(each, line)));
    strew(rigged.feedLine().shapes().calm(), calmLine);
    overhead();
    site();
  }

  Collection<Found> found() {
    return found.values();
  }

  private void offer(String rule, String to, double distance, double required, double rough) {
    Found one = new Found(rule, to, distance, required, rough);
    found.merge(one.key(), one, (a, b) -> margin(a) <= margin(b) ? a : b);
  }

  private static double margin(Found f) {
    return f.distance - f.required;
  }

  // --- overhead lines

  private static double kept(OverheadLine line) {
    return switch (line.kind()) {
      case TELEPHONE -> 0.6;
      case LOW_VOLTAGE, MEDIUM_VOLTAGE -> 3.05;
      default -> 6.1;
    };
  }

  private void overhead() {
    List<Place> all = new ArrayList<>(wire);
    List.of(rope, guys, falls, halyards, masts, line).forEach(all::addAll);
    for (OverheadLine each : plan.overheadLines()) {
      List<Place> path = ground.raise(each.path());
      double kept = kept(each);
      String rule = "overhead-" + each.kind().name().toLowerCase(java.util.Locale.ROOT);
      double least = Double.POSITIVE_INFINITY;
      for (Place p : all) {
        least = Math.min(least, toPath(p, path));
      }
      offer(rule.replace('_', '-'), each.id(), least, kept, SWEEP + 0.3 * shift);
      if (each.kind() != OverheadLine.Kind.TELEPHONE) {
        letGo(each, path, kept);
        fall(each, path, kept);
      }
    }
  }

  private void letGo(OverheadLine each, List<Place> path, double kept) {
    double least = Double.POSITIVE_INFINITY;
    for (Rigged.Span span : rigged.spans()) {
      List<Place> shape = new ArrayList<>(span.shapes().calm());
      least = Math.min(least, region(shape, span.reach(true), path, kept));
      java.util.Collections.reverse(shape);
      least = Math.min(least, region(shape, span.reach(false), path, kept));
    }
    if (least < Double.POSITIVE_INFINITY) {
      offer("wire-let-go", each.id(), least, kept, 0.8);
    }
  }

  /** The least distance from points of what a wire may reach that has let go; far ones left out. */
  private static double region(List<Place> shape, double reach, List<Place> path, double kept) {
    Place hold = shape.get(0);
    Place end = shape.get(shape.size() - 1);
    double least = Double.POSITIVE_INFINITY;
    if (toPath(hold, path) > reach + kept + 4) {
      return least;
    }
    double course = Math.atan2(end.y() - hold.y(), end.x() - hold.x());
    for (int a = -4; a <= 4; a++) {
      double azimuth = course + Math.toRadians(7.5 * a);
      int next = 0;
      for (double out = 0; out <= reach; out += 0.5) {
        while (next + 1 < shape.size()
            && shape.get(next + 1).onPlan().distance(hold.onPlan()) < out) {
          next++;
        }
        double top = end.z();
        if (next + 1 < shape.size()) {
          double p = shape.get(next).onPlan().distance(hold.onPlan());
          double q = shape.get(next + 1).onPlan().distance(hold.onPlan());
          double t = q > p ? (out - p) / (q - p) : 1;
          top = shape.get(next).z() + t * (shape.get(next + 1).z() - shape.get(next).z());
        }
        double drop = Math.sqrt(Math.max(0, reach * reach - out * out));
        double x = hold.x() + out * Math.cos(azimuth);
        double y = hold.y() + out * Math.sin(azimuth);
        double low = hold.z() - drop;
        for (double z = Math.min(top, hold.z() + drop); z >= Math.max(low, -6); z -= 0.6) {
          least = Math.min(least, toPath(new Place(x, y, z), path));
        }
      }
    }
    return least;
  }

  private void fall(OverheadLine each, List<Place> path, double kept) {
    for (Rigged.Mast mast : rigged.masts()) {
      offer("mast-let-go", each.id(), toPath(mast.foot(), path), mast.height() + kept, 1e-6);
    }
    for (Rigged.Attachment on : rigged.attachments()) {
      for (Support s : plan.supports()) {
        boolean falls = s.kind() == Support.Kind.MAST || s.kind() == Support.Kind.POLE;
        if (s.id().equals(on.on()) && falls) {
          Place foot = new Place(s.at().x(), s.at().y(), ground.heightAt(s.at()));
          offer("mast-let-go", each.id(), toPath(foot, path), s.highest() + kept, 1e-6);
        }
      }
    }
  }

  // --- the plot

  private void site() {
    double rough = SWEEP + 0.3 * shift;
    for (Place p : wire) {
      offer("headroom", "ground", p.z() - ground.heightAt(p.onPlan()), 2.5, rough);
      boundary(p, rough);
    }
    line.forEach(p -> boundary(p, rough));
    for (Rigged.Mast mast : rigged.masts()) {
      boundary(mast.foot(), 1e-6);
      for (Place foot : mast.guyFeet()) {
        offer("guy-in-plot", "boundary", inPlot(foot), 0, 1e-6);
      }
    }
    for (Zone each : plan.zones()) {
      zone(each, rough);
    }
    for (PeopleVolume each : plan.people()) {
      wire.forEach(p -> people(each, "people", p, rough));
      List.of(rope, guys, falls)
          .forEach(l -> l.forEach(p -> people(each, "people-rope", p, rough)));
    }
    for (Building each : plan.buildings()) {
      Roof roof = Roof.of(each, ground);
      for (Place p : wire) {
        if (roof.covers(p.x(), p.y()) && p.z() < roof.heightAt(p.x(), p.y())) {
          offer("building-wire", each.id(), 0, 0.3, rough);
        }
      }
    }
    plan.trees().forEach(each -> tree(each, rough));
  }

  /** Inside the plot of 60 by 60 m, by its four sides. */
  private static double inPlot(Place p) {
    return Math.min(Math.min(p.x(), 60 - p.x()), Math.min(p.y(), 60 - p.y()));
  }

  private void boundary(Place p, double rough) {
    double inside = inPlot(p);
    if (inside < 4) {
      offer("boundary", "boundary", inside, 0, rough);
    }
  }

  private void zone(Zone zone, double rough) {
    switch (zone.rule()) {
      case NO_WIRE -> {
        for (Place p : wire) {
          if (inside(zone.area(), p.x(), p.y())) {
            offer("zone-no-wire", zone.id(), INSIDE, 0, rough);
          }
        }
      }
      case HEADROOM ->
          List.of(wire, rope, guys, falls, masts, line)
              .forEach(list -> list.forEach(p -> headroom(zone, p, rough)));
      case NO_MAST -> {
        for (Rigged.Mast mast : rigged.masts()) {
          if (inside(zone.area(), mast.foot().x(), mast.foot().y())) {
            offer("zone-no-mast", zone.id(), INSIDE, 0, 1e-6);
          }
        }
      }
    }
  }

  private void headroom(Zone zone, Place p, double rough) {
    if (inside(zone.area(), p.x(), p.y())) {
      double above = p.z() - ground.heightAt(p.onPlan());
      offer("zone-headroom", zone.id(), above, zone.height(), rough + 2);
    }
  }

  private void people(PeopleVolume volume, String rule, Place p, double rough) {
    double above = p.z() - ground.heightAt(p.onPlan());
    boolean within = above > volume.from() && above < volume.to();
    if (within && inside(volume.area(), p.x(), p.y())) {
      offer(rule, volume.id(), INSIDE, 0, rough);
    }
  }

  private void tree(Tree tree, double rough) {
    Canopy crown = tree.canopy();
    double level = ground.heightAt(tree.at());
    for (Place p : calmWire) {
      double away = toCrown(p, tree.at(), crown, level);
      if (away < 4) {
        offer("canopy-wire", tree.id(), away, 0.5, rough + 0.5);
      }
    }
    for (Place p : wire) {
      double away = toCrown(p, tree.at(), crown, level);
      if (away < 3) {
        offer("canopy-wire", tree.id(), away, 0, rough + 0.5);
      }
    }
    for (Place p : calmLine) {
      offer("canopy-feed-line", tree.id(), toCrown(p, tree.at(), crown, level), 0, 0.4);
    }
    List.of(masts, guys)
        .forEach(
            list ->
                list.forEach(
                    p ->
                        offer(
                            "canopy-mast",
                            tree.id(),
                            toCrown(p, tree.at(), crown, level),
                            0,
                            0.4)));
  }

  /** From a point to a crown; nought inside. */
  private static double toCrown(Place p, Point trunk, Canopy crown, double level) {
    double side = Math.max(0, p.onPlan().distance(trunk) - crown.radius());
    double z = p.z() - level;
    double upright = Math.max(0, Math.max(crown.from() - z, z - crown.to()));
    boolean within = side == 0 && upright == 0;
    return within ? INSIDE : Math.hypot(side, upright);
  }

  /** Whether a point lies in an outline: how often a way to the east crosses it. */
  private static boolean inside(List<Point> outline, double x, double y) {
    boolean odd = false;
    for (int i = 0; i < outline.size(); i++) {
      Point a = outline.get(i);
      Point b = outline.get((i + 1) % outline.size());
      if (a.y() > y != b.y() > y && x < a.x() + (y - a.y()) / (b.y() - a.y()) * (b.x() - a.x())) {
        odd = !odd;
      }
    }
    return odd;
  }

  private static void strew(List<Place> path, List<Place> into) {
    for (int i = 0; i + 1 < path.size(); i++) {
      Place a = path.get(i);
      Place b = path.get(i + 1);
      int steps = Math.max(1, (int) Math.ceil(a.distance(b) / GRAIN));
      for (int k = 0; k <= steps; k++) {
        double t = (double) k / steps;
        into.add(
            new Place(
                a.x() + t * (b.x() - a.x()),
                a.y() + t * (b.y() - a.y()),
                a.z() + t * (b.z() - a.z())));
      }
    }
  }

  /** From a point to a path, by the foot on each of its pieces. */
  static double toPath(Place p, List<Place> path) {
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i + 1 < path.size(); i++) {
      Place a = path.get(i);
      Place b = path.get(i + 1);
      double ux = b.x() - a.x();
      double uy = b.y() - a.y();
      double uz = b.z() - a.z();
      double along = (p.x() - a.x()) * ux + (p.y() - a.y()) * uy + (p.z() - a.z()) * uz;
      double t = Math.max(0, Math.min(1, along / (ux * ux + uy * uy + uz * uz)));
      double dx = p.x() - a.x() - t * ux;
      double dy = p.y() - a.y() - t * uy;
      double dz = p.z() - a.z() - t * uz;
      least = Math.min(least, dx * dx + dy * dy + dz * dz);
    }
    return Math.sqrt(least);
  }
}
