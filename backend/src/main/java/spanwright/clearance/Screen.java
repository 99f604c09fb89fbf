package spanwright.clearance;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.index.strtree.STRtree;
import spanwright.plan.Building;
import spanwright.plan.Canopy;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Zone;
import spanwright.rigging.Holder;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigging;
import spanwright.rigging.Roof;
import spanwright.rigging.RuleBook;

/**
 * The cheap look at a layout along its straight lines. A wire hangs below them, so what they fail
 * by more than any sag could mend, it fails. Rejects only what is foul by a good deal.
 */
final class Screen {
  /** Sag that a span may have, as a share of its length, when it is asked whether sag saves it. */
  private static final double SAG = 0.06;

  /** Fouling by less than this is left to the real check [m]. */
  private static final double LITTLE = 0.3;

  private final GroundSurface ground;
  private final Overhead overhead;
  private final Boundary boundary;
  private final Map<String, Holder> holders;
  private final STRtree roofs = new STRtree();
  private final List<Area> noWire = new ArrayList<>();
  private final List<double[]> noWireBoxes = new ArrayList<>();
  private final List<Area> noMast = new ArrayList<>();
  private final List<Spot> crowns = new ArrayList<>();
  private final List<Area> high = new ArrayList<>();
  private final List<Double> heights = new ArrayList<>();
  private final double headroom;
  private final double reach;
  private final double spacing;
  private final int newMasts;
  private final Rigging rigging;

  Screen(
      Plan plan,
      GroundSurface ground,
      RuleBook rules,
      Overhead overhead,
      Boundary boundary,
      Rigging rigging) {
    this.ground = ground;
    this.overhead = overhead;
    this.boundary = boundary;
    this.rigging = rigging;
    holders = Holder.all(plan);
    for (Building each : plan.buildings()) {
      Roof roof = Roof.of(each, ground);
      double[] box = new Area(each.footprint()).box(0, 0);
      roofs.insert(new Envelope(box[0], box[3], box[1], box[4]), roof);
    }
    roofs.build();
    for (Zone each : plan.zones()) {
      Area area = new Area(each.area());
      switch (each.rule()) {
        case NO_WIRE -> {
          noWire.add(area);
          noWireBoxes.add(area.box(0, 0));
        }
        case NO_MAST -> noMast.add(area);
        case HEADROOM -> {
          high.add(area);
          heights.add(each.height());
        }
      }
    }
    plan.supports().forEach(each -> crown(each.at(), each.canopy()));
    plan.trees().forEach(each -> crown(each.at(), each.canopy()));
    headroom = rules.value("headroom");
    reach = rules.value("support-reach");
    spacing = rules.value("mast-spacing");
    newMasts = plan.brief().newMasts();
  }

  /** A crown on the plan: where, how wide, and its height above the plan's zero. */
  private record Spot(Point at, double radius, double from, double to) {}

  private void crown(Point at, Canopy canopy) {
    if (canopy != null) {
      double level = ground.heightAt(at);
      crowns.add(new Spot(at, canopy.radius(), level + canopy.from(), level + canopy.to()));
    }
  }

  /** Whether a new mast may stand there, for all that can be seen of its foot and its length. */
  private boolean mayStand(Holder holder, Place top) {
    double x = top.x();
    double y = top.y();
    double foot = holder.footHeight(ground, x, y);
    for (Area each : noMast) {
      if (each.signed(x, y) < -1e-6) {
        return false;
      }
    }
    for (int i = 0; i < high.size(); i++) {
      boolean low = foot + 1e-6 < ground.heightAt(x, y) + heights.get(i);
      if (low && high.get(i).signed(x, y) < -1e-6) {
        return false;
      }
    }
    for (Spot each : crowns) {
      boolean beside = each.at.distance(top.onPlan()) < each.radius - 1e-6;
      if (beside && foot < each.to - 1e-6 && top.z() > each.from + 1e-6) {
        return false;
      }
    }
    for (Roof each : roofsAt(new Envelope(x, x, y, y))) {
      if (each.covers(x, y) && each.heightAt(x, y) - foot > Solid.SUNK + 1e-6) {
        return false;
      }
    }
    return boundary.inside(x, y) > -1e-6;
  }

  boolean passes(Layout layout) {
    return holds(layout) && lines(layout) && wire(layout);
  }

  // --- what it hangs on

  private boolean holds(Layout layout) {
    int masts = 0;
    for (int i = 0; i < layout.attachments().size(); i++) {
      Layout.Hold hold = layout.attachments().get(i);
      Holder holder = holders.get(hold.on());
      if (holder == null) {
        rigging.holderOf(hold.on());
      }
      if (holder.pullLimit() != null && holder.pullLimit() <= 0) {
        return false;
      }
      double above = hold.at().z() - ground.heightAt(hold.at().x(), hold.at().y());
      boolean fits =
          holder.away(hold.at().onPlan()) <= reach + 1e-6
              && above <= holder.highest() + 1e-6
              && above >= holder.lowest() - 1e-6;
      if (!fits) {
        return false;
      }
      if (holder.zone() != null) {
        masts += isOnEarlierMast(layout, i) ? 0 : 1;
        if (!mayStand(holder, hold.at())) {
          return false;
        }
      }
    }
    return masts <= newMasts;
  }

  private boolean isOnEarlierMast(Layout layout, int i) {
    Layout.Hold hold = layout.attachments().get(i);
    for (int k = 0; k < i; k++) {
      Layout.Hold other = layout.attachments().get(k);
      if (other.on().equals(hold.on())
          && other.at().onPlan().distance(hold.at().onPlan()) < spacing) {
        return true;
      }
    }
    return false;
  }

  // --- overhead lines

  private boolean lines(Layout layout) {
    for (Overhead.Line line : overhead.lines()) {
      if (!line.isTelephone() && !(mastsFall(layout, line) && letGo(layout, line))) {
        return false;
      }
      if (!kept(layout, line)) {
        return false;
      }
    }
    return true;
  }

  /** Rule 3 needs no hanging: it is decided here, to the last digit. */
  private boolean mastsFall(Layout layout, Overhead.Line line) {
    for (Layout.Hold hold : layout.attachments()) {
      Holder holder = holders.get(hold.on());
      double x = hold.at().x();
      double y = hold.at().y();
      double height;
      double foot;
      if (holder.zone() != null) {
        foot = holder.footHeight(ground, x, y);
        height = hold.at().z() - foot;
      } else if (holder.isStandingMast()) {
        x = holder.support().at().x();
        y = holder.support().at().y();
        foot = ground.heightAt(x, y);
        height = holder.highest();
      } else {
        continue;
      }
      Space.Near near = new Space.Near();
      for (int k = 0; k < line.segments(); k++) {
        Space.pointSegment(x, y, foot, line.path(), 3 * k, 3 * k + 3, true, near);
      }
      if (near.distance() < overhead.fallShare() * height + line.kept() - 1e-9) {
        return false;
      }
    }
    return true;
  }

  /**
   * Rule 2 with the straight way as reach and a deep sag as the old shape: a region within the true
   * one, so what it touches is foul.
   */
  private boolean letGo(Layout layout, Overhead.Line line) {
    if (layout.conductors().size() > 1) {
      return true; // which of its attachments are neighbours is for the rigging to say
    }
    for (int i = 0; i + 1 < layout.attachments().size(); i++) {
      Place a = layout.attachments().get(i).at();
      Place b = layout.attachments().get(i + 1).at();
      double reachHere = a.distance(b);
      if (!letGo(a, b, reachHere, line) || !letGo(b, a, reachHere, line)) {
        return false;
      }
    }
    return true;
  }

  private boolean letGo(Place held, Place lost, double length, Overhead.Line line) {
    double course = Math.atan2(lost.y() - held.y(), lost.x() - held.x());
    double level = Math.hypot(lost.x() - held.x(), lost.y() - held.y());
    Space.Near near = new Space.Near();
    for (int k = 0; k < line.segments(); k++) {
      Space.pointSegment(held.x(), held.y(), held.z(), line.path(), 3 * k, 3 * k + 3, true, near);
    }
    if (near.distance() > length + line.kept()) {
      return true;
    }
    double x = near.bx - held.x();
    double y = near.by - held.y();
    double away = Math.hypot(x, y);
    double off = Math.atan2(y, x) - course;
    off = Math.abs(off - 2 * Math.PI * Math.rint(off / (2 * Math.PI)));
    double share = level < 0.5 ? 1 : Math.min(1, away / level);
    double top = held.z() + share * (lost.z() - held.z()) - SAG * length;
    // The line's nearest point stands within the turn and no higher than the kept distance above.
    return off > overhead.half()
        || away > 0.97 * length
        || near.bz - top > line.kept()
        || level < 0.5;
  }

  private boolean kept(Layout layout, Overhead.Line line) {
    for (Layout.Run run : layout.conductors()) {
      double[] p = Strand.flat(run.points());
      double length = 0;
      Space.Near near = new Space.Near();
      for (int i = 0; i + 3 < p.length; i += 3) {
        length += Obstacle.place(p, i).distance(Obstacle.place(p, i + 3));
        for (int k = 0; k < line.segments(); k++) {
          Space.segments(p, i, i + 3, line.path(), 3 * k, 3 * k + 3, near);
        }
      }
      // Where the line is above, the sag leads away from it.
      double away = near.bz >= near.az ? SAG * length + LITTLE : LITTLE / 2;
      if (near.distance() + away < line.kept()) {
        return false;
      }
    }
    return true;
  }

  // --- the wire's straight lines

  private boolean wire(Layout layout) {
    for (Layout.Run run : layout.conductors()) {
      List<Place> points = run.points();
      for (int i = 0; i < points.size(); i++) {
        Place at = points.get(i);
        double above = at.z() - ground.heightAt(at.x(), at.y());
        if (above < headroom - LITTLE / 3) {
          return false;
        }
        if (i + 1 < points.size() && !piece(at, points.get(i + 1))) {
          return false;
        }
      }
    }
    return true;
  }

  @SuppressWarnings("unchecked")
  private List<Roof> roofsAt(Envelope where) {
    return roofs.query(where);
  }

  private boolean piece(Place a, Place b) {
    if (boundary.signed(a.x(), a.y(), b.x(), b.y(), false) < -LITTLE) {
      return false;
    }
    double length = a.distance(b);
    int steps = (int) Math.max(2, Math.ceil(length / 0.75));
    double lowest = Math.min(a.z(), b.z());
    List<Roof> under = new ArrayList<>();
    for (Roof each : roofsAt(new Envelope(a.x(), b.x(), a.y(), b.y()))) {
      if (lowest < each.top() - LITTLE) {
        under.add(each);
      }
    }
    if (under.isEmpty() && noWire.isEmpty() && high.isEmpty()) {
      return true;
    }
    for (int k = 0; k <= steps; k++) {
      double t = (double) k / steps;
      double x = a.x() + t * (b.x() - a.x());
      double y = a.y() + t * (b.y() - a.y());
      double z = a.z() + t * (b.z() - a.z());
      for (Roof each : under) {
        if (z < each.top() - LITTLE && each.covers(x, y) && z < each.heightAt(x, y) - LITTLE) {
          return false;
        }
      }
      for (int i = 0; i < noWire.size(); i++) {
        double[] box = noWireBoxes.get(i);
        boolean near = x > box[0] && x < box[3] && y > box[1] && y < box[4];
        if (near && noWire.get(i).signed(x, y) < -LITTLE) {
          return false;
        }
      }
      for (int i = 0; i < high.size(); i++) {
        double height = z - heights.get(i) + LITTLE / 3;
        if (height < ground.heightAt(x, y) && high.get(i).contains(x, y)) {
          return false;
        }
      }
    }
    return true;
  }
}
