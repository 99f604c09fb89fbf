package spanwright.clearance;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogues;
import spanwright.plan.GroundSurface;
import spanwright.plan.OverheadLine;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Support;
import spanwright.plan.Tree;
import spanwright.plan.Zone;
import spanwright.rigging.Layout;
import spanwright.rigging.PlanShapes;
import spanwright.rigging.Plots;
import spanwright.rigging.Rigged;
import spanwright.rigging.Rigging;
import spanwright.rigging.Roof;

/**
 * Seeded random plots, audited by points alone: what the check lets pass must hold at every one of
 * thousands of points strewn over wires, ropes, masts and the regions of what may let go. The audit
 * shares the hung shapes with the program, nothing else: its distances are from points.
 */
class DenseAuditTest {
  private static final double GRAIN = 0.15;

  private static Plan plot(Random random) {
    String terrain =
        String.format(
            Locale.ROOT,
            "[[0,0,%.2f],[60,0,%.2f],[60,60,%.2f],[0,60,%.2f],[30,30,%.2f]]",
            0.0,
            4 * random.nextDouble(),
            6 * random.nextDouble() - 3,
            3 * random.nextDouble(),
            4 * random.nextDouble() - 2);
    StringBuilder lines = new StringBuilder("[");
    String[] kinds = {"telephone", "low-voltage", "medium-voltage", "high-voltage", "unknown"};
    for (int i = 0; i < 3; i++) {
      double turn = random.nextDouble() * 6.3;
      double away = 18 + 30 * random.nextDouble();
      double x = 30 + away * Math.cos(turn);
      double y = 30 + away * Math.sin(turn);
      double ux = -Math.sin(turn + random.nextGaussian() / 3) * 40;
      double uy = Math.cos(turn + random.nextGaussian() / 3) * 40;
      lines.append(
          String.format(
              Locale.ROOT,
              "%s{\"id\":\"line%d\",\"kind\":\"%s\",\"path\":[[%.2f,%.2f,%.2f],[%.2f,%.2f,%.2f],[%.2f,%.2f,%.2f]]}",
              i == 0 ? "" : ",",
              i,
              kinds[random.nextInt(5)],
              x - ux,
              y - uy,
              6 + 6 * random.nextDouble(),
              x,
              y,
              4 + 6 * random.nextDouble(),
              x + ux,
              y + uy,
              6 + 6 * random.nextDouble()));
    }
    double hx = 12 + 30 * random.nextDouble();
    double hy = 12 + 30 * random.nextDouble();
    String house =
        String.format(
            Locale.ROOT,
            "[{\"id\":\"house\",\"footprint\":[[%1$.2f,%2$.2f],[%3$.2f,%2$.2f],[%3$.2f,%4$.2f],[%1$.2f,%4$.2f]],\"eaves\":4,\"ridge\":7,\"roof\":\"%5$s\",\"ridgeLine\":[[%6$.2f,%7$.2f],[%8$.2f,%7$.2f]]}]",
            hx,
            hy,
            hx + 9,
            hy + 6,
            random.nextBoolean() ? "gable" : "hip",
            hx + 2,
            hy + 3,
            hx + 7);
    String trees =
        String.format(
            Locale.ROOT,
            "[{\"id\":\"birch\",\"at\":[%.2f,%.2f],\"canopy\":{\"radius\":3,\"from\":3,\"to\":11}}]",
            10 + 40 * random.nextDouble(),
            10 + 40 * random.nextDouble());
    String zones =
        String.format(
            Locale.ROOT,
            "[{\"id\":\"nowire\",\"area\":[[%1$.1f,%2$.1f],[%3$.1f,%2$.1f],[%3$.1f,%4$.1f]],\"rule\":\"no-wire\"},{\"id\":\"drive\",\"area\":[[%4$.1f,5],[%5$.1f,5],[%5$.1f,55],[%4$.1f,55]],\"rule\":\"headroom\",\"height\":4.5}]",
            hx - 8,
            hy - 8,
            hx - 3,
            hy - 2,
            hy + 3);
    return Plots.bare()
        .terrain(terrain)
        .entry("[30, 24]")
        .poles(
            """
            , { "id": "mast", "name": "Mast", "kind": "mast", "at": [30, 14], "lowest": 2, "highest": 8 },
              { "id": "oak", "name": "Oak", "kind": "tree", "at": [8, 48], "lowest": 3, "highest": 9, "sway": 0.4,
                "canopy": { "radius": 2.5, "from": 3, "to": 12 } }""")
        .with(
            "mastZones",
            """
            [ { "id": "lawn", "name": "Lawn", "area": [[20,20],[44,20],[44,54],[20,54]], "highest": 8, "guyRadius": 2 } ]""")
        .with("overheadLines", lines + "]")
        .with("buildings", house)
        .with("trees", trees)
        .with("zones", zones)
        .plan();
  }

  private static Layout layout(Random random, Plan plan, Rigging rigging) {
    GroundSurface ground = GroundSurface.of(plan);
    List<Layout.Hold> holds = new ArrayList<>();
    int count = random.nextInt(3) == 0 ? 3 : 2;
    for (int i = 0; i < count; i++) {
      boolean middle = count == 3 && i == 1;
      int pick = middle ? 4 : random.nextInt(5);
      if (pick == 4) {
        double x = 20 + 24 * random.nextDouble();
        double y = 20 + 34 * random.nextDouble();
        holds.add(Plots.hold("lawn", x, y, ground.heightAt(x, y) + 4 + 4 * random.nextDouble()));
      } else {
        Support on = plan.supports().get(pick);
        double z = on.lowest() + (0.5 + 0.5 * random.nextDouble()) * (on.highest() - on.lowest());
        holds.add(Plots.hold(on.id(), on.at().x(), on.at().y(), ground.heightAt(on.at()) + z));
      }
    }
    for (int i = 0; i + 1 < count; i++) {
      if (holds.get(i).at().distance(holds.get(i + 1).at()) < 14) {
        return null;
      }
    }
    double tail = 0.5;
    for (Layout.Hold each : holds) {
      double above = each.at().z() - ground.heightAt(each.at().x(), each.at().y());
      tail = Math.max(tail, rigging.leastTail(each.on(), above));
    }
    return Plots.straight(
        count == 3 ? "apex" : "level", tail, 0.5, holds.toArray(new Layout.Hold[0]));
  }

  @Test
  void what_is_let_pass_holds_at_every_point() {
    int passed = 0;
    int refused = 0;
    for (int seed = 0; seed < 60; seed++) {
      Random random = new Random(seed);
      Plan plan = plot(random);
      Rigging rigging = Rigging.of(plan, Catalogues.standard());
      Clearances clearances = Clearances.of(plan, Catalogues.standard());
      for (int i = 0; i < 25; i++) {
        Layout layout = layout(random, plan, rigging);
        if (layout == null) {
          continue;
        }
        Rigged rigged = rigging.hang(layout);
        List<Clearance> found = clearances.check(rigged);
        boolean foul = found.stream().anyMatch(each -> each.state() == State.FOUL);
        if (foul) {
          refused++;
          notRefusedForNothing(found);
        } else {
          passed++;
          audit(plan, rigged, "seed " + seed + " layout " + layout.attachments());
        }
      }
    }
    assertTrue(passed > 60 && refused > 60, passed + " passed, " + refused + " refused");
  }

  // --- the audit

  private static void audit(Plan plan, Rigged rigged, String where) {
    GroundSurface ground = GroundSurface.of(plan);
    List<Place> wire = new ArrayList<>();
    List<Place> rope = new ArrayList<>();
    for (Rigged.Span span : rigged.spans()) {
      for (List<Place> state : span.shapes().all()) {
        strew(state.subList(span.wireFrom(), span.wireTo() + 1), wire);
        strew(state.subList(0, span.wireFrom() + 1), rope);
        strew(state.subList(span.wireTo(), state.size()), rope);
      }
    }
    List<Place> line = new ArrayList<>();
    rigged.feedLine().shapes().all().forEach(each -> strew(each, line));
    List<Place> all = new ArrayList<>(wire);
    all.addAll(rope);
    all.addAll(line);
    rigged.masts().forEach(each -> strew(List.of(each.foot(), each.top()), all));
    for (OverheadLine each : plan.overheadLines()) {
      List<Place> path = ground.raise(each.path());
      double kept = kept(each);
      for (Place p : all) {
        hold(RuleOracle.toPath(p, path) >= kept - 1e-9, where, p);
      }
      if (each.kind() != OverheadLine.Kind.TELEPHONE) {
        letGo(plan, rigged, path, kept, where + each.id());
      }
    }
    for (Place p : wire) {
      hold(p.z() - ground.heightAt(p.x(), p.y()) >= 2.5 - 1e-6, where, p);
      hold(PlanShapes.contains(plan.boundary(), p.x(), p.y()), where, p);
      for (Tree tree : plan.trees()) {
        boolean beside = p.onPlan().distance(tree.at()) < tree.canopy().radius();
        double above = p.z() - ground.heightAt(tree.at());
        boolean within = above > tree.canopy().from() && above < tree.canopy().to();
        hold(!(beside && within), where, p);
      }
    }
    zonesAndRoofs(plan, ground, wire, rope, line, where);
  }

  private static void zonesAndRoofs(
      Plan plan,
      GroundSurface ground,
      List<Place> wire,
      List<Place> rope,
      List<Place> line,
      String where) {
    Roof roof = Roof.of(plan.buildings().get(0), ground);
    for (Place p : wire) {
      boolean inside = roof.covers(p.x(), p.y()) && p.z() < roof.heightAt(p.x(), p.y());
      hold(!inside, where, p);
      hold(!PlanShapes.contains(plan.zones().get(0).area(), p.x(), p.y()), where, p);
    }
    Zone drive = plan.zones().get(1);
    List<Place> under = new ArrayList<>(wire);
    under.addAll(rope);
    under.addAll(line);
    for (Place p : under) {
      boolean low = p.z() - ground.heightAt(p.x(), p.y()) < drive.height() - 1e-6;
      hold(!(low && PlanShapes.contains(drive.area(), p.x(), p.y())), where, p);
    }
  }

  private static void letGo(Plan plan, Rigged rigged, List<Place> path, double kept, String where) {
    GroundSurface ground = GroundSurface.of(plan);
    for (Rigged.Span span : rigged.spans()) {
      for (boolean first : new boolean[] {true, false}) {
        List<Place> shape = new ArrayList<>(span.shapes().calm());
        if (!first) {
          java.util.Collections.reverse(shape);
        }
        double reach = span.ropeFrom() + span.wireLength() + span.ropeTo();
        for (Place p : region(shape, reach, ground)) {
          hold(RuleOracle.toPath(p, path) >= kept - 1e-9, where, p);
        }
      }
    }
    for (Rigged.Mast mast : rigged.masts()) {
      hold(RuleOracle.toPath(mast.foot(), path) >= mast.height() + kept - 1e-9, where, mast.foot());
    }
    for (Rigged.Attachment each : rigged.attachments()) {
      if (each.on().equals("mast")) {
        Place foot = new Place(30, 14, ground.heightAt(30, 14));
        hold(RuleOracle.toPath(foot, path) >= 8 + kept - 1e-9, where, foot);
      }
    }
  }

  /** Points of the region of rule 2, by its words. */
  private static List<Place> region(List<Place> shape, double reach, GroundSurface ground) {
    Place hold = shape.get(0);
    Place end = shape.get(shape.size() - 1);
    double course = Math.atan2(end.y() - hold.y(), end.x() - hold.x());
    List<Place> points = new ArrayList<>();
    for (int a = -6; a <= 6; a++) {
      double azimuth = course + Math.toRadians(5.0 * a);
      for (double out = 0; out <= reach; out += 0.3) {
        double top = end.z();
        for (int i = 0; i + 1 < shape.size(); i++) {
          double p = shape.get(i).onPlan().distance(hold.onPlan());
          double q = shape.get(i + 1).onPlan().distance(hold.onPlan());
          if (out >= p && out <= q) {
            top =
                shape.get(i).z() + (out - p) / (q - p) * (shape.get(i + 1).z() - shape.get(i).z());
          }
        }
        double drop = Math.sqrt(Math.max(0, reach * reach - out * out));
        double x = hold.x() + out * Math.cos(azimuth);
        double y = hold.y() + out * Math.sin(azimuth);
        double low = Math.max(ground.heightAt(x, y), hold.z() - drop);
        for (double z = Math.min(top, hold.z() + drop); z >= low; z -= 0.4) {
          points.add(new Place(x, y, z));
        }
      }
    }
    return points;
  }

  /** What is refused for its kept distance is truly near: no empty refusals. */
  private static void notRefusedForNothing(List<Clearance> found) {
    for (Clearance each : found) {
      if (each.state() == State.FOUL && each.rule().startsWith("overhead-")) {
        double apart = each.at().distance(each.toAt());
        hold(apart <= each.required() + 0.6, each.toString(), each.at());
      }
    }
  }

  private static double kept(OverheadLine line) {
    return switch (line.kind()) {
      case TELEPHONE -> 0.6;
      case LOW_VOLTAGE, MEDIUM_VOLTAGE -> 3.05;
      default -> 6.1;
    };
  }

  /** A plain question: the words are put together only when it fails. */
  private static void hold(boolean holds, String where, Place at) {
    if (!holds) {
      throw new AssertionError(where + " at " + at);
    }
  }

  private static void strew(List<Place> path, List<Place> into) {
    for (int i = 0; i + 1 < path.size(); i++) {
      Place a = path.get(i);
      Place b = path.get(i + 1);
      int steps = (int) Math.ceil(a.distance(b) / GRAIN);
      for (int k = 0; k <= steps; k++) {
        double t = steps == 0 ? 0 : (double) k / steps;
        into.add(
            new Place(
                a.x() + t * (b.x() - a.x()),
                a.y() + t * (b.y() - a.y()),
                a.z() + t * (b.z() - a.z())));
      }
    }
  }
}
