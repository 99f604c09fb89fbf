package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Consent;
import spanwright.plan.GroundSurface;
import spanwright.plan.MastZone;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Point;
import spanwright.plan.Zone;

/** The new masts of a layout: which attachments share one, where it stands, how it is guyed. */
final class Masts {
  private static final int GUYS = 3;
  private static final int TURNS = 12;

  private final Plan plan;
  private final GroundSurface ground;
  private final double spacing;

  Masts(Plan plan, GroundSurface ground, double spacing) {
    this.plan = plan;
    this.ground = ground;
    this.spacing = spacing;
  }

  /**
   * The masts that a layout needs.
   *
   * @param holders of the attachments
   * @param pulls calm, on the attachments; the first guy is set against them
   */
  List<Rigged.Mast> of(List<Layout.Hold> holds, List<Holder> holders, List<Force> pulls) {
    List<Rigged.Mast> masts = new ArrayList<>();
    boolean[] done = new boolean[holds.size()];
    for (int i = 0; i < holds.size(); i++) {
      if (done[i] || holders.get(i).zone() == null) {
        continue;
      }
      List<Integer> on = new ArrayList<>();
      int top = i;
      double x = 0;
      double y = 0;
      for (int k = i; k < holds.size(); k++) {
        boolean same =
            holds.get(k).on().equals(holds.get(i).on())
                && holds.get(k).at().onPlan().distance(holds.get(i).at().onPlan()) < spacing;
        if (same) {
          done[k] = true;
          on.add(k);
          x += pulls.get(k).x();
          y += pulls.get(k).y();
          top = holds.get(k).at().z() > holds.get(top).at().z() ? k : top;
        }
      }
      masts.add(mast(holders.get(i).zone(), holds.get(top).at(), on, x, y));
    }
    return masts;
  }

  private Rigged.Mast mast(MastZone zone, Place top, List<Integer> on, double pullX, double pullY) {
    double level = ground.heightAt(top.x(), top.y());
    Place foot = new Place(top.x(), top.y(), level + zone.base());
    return new Rigged.Mast(
        zone.id(),
        foot,
        top,
        top.z() - foot.z(),
        zone.guyRadius() > 0 ? guys(zone, foot, pullX, pullY) : List.of(),
        consent(zone, top.z() - level),
        on);
  }

  private static String consent(MastZone zone, double height) {
    for (Consent each : zone.consents()) {
      if (height <= each.highest() + 1e-9) {
        return each.needs();
      }
    }
    return null;
  }

  /** Three guys, turned so that their feet stay in the plot and off ways with a headroom. */
  private List<Place> guys(MastZone zone, Place foot, double pullX, double pullY) {
    double against = Math.hypot(pullX, pullY) < 1e-9 ? 0 : Math.atan2(-pullY, -pullX);
    List<Place> best = null;
    int fewest = Integer.MAX_VALUE;
    for (int turn = 0; turn < TURNS && fewest > 0; turn++) {
      double offset = (turn + 1) / 2 * (turn % 2 == 0 ? 1 : -1) * 2 * Math.PI / GUYS / TURNS;
      List<Place> feet = new ArrayList<>();
      int faults = 0;
      for (int k = 0; k < GUYS; k++) {
        double angle = against + offset + k * 2 * Math.PI / GUYS;
        double x = foot.x() + zone.guyRadius() * Math.cos(angle);
        double y = foot.y() + zone.guyRadius() * Math.sin(angle);
        feet.add(new Place(x, y, ground.heightAt(x, y) + zone.base()));
        faults += faults(x, y, zone.base() == 0);
      }
      if (faults < fewest) {
        fewest = faults;
        best = feet;
      }
    }
    return best;
  }

  private int faults(double x, double y, boolean onGround) {
    int faults = PlanShapes.contains(plan.boundary(), x, y) ? 0 : 1;
    for (Zone each : plan.zones()) {
      boolean way = each.rule() == Zone.Rule.HEADROOM && PlanShapes.contains(each.area(), x, y);
      faults += way ? 1 : 0;
    }
    if (onGround) {
      for (var each : plan.buildings()) {
        Point at = new Point(x, y);
        faults += PlanShapes.contains(each.footprint(), at.x(), at.y()) ? 1 : 0;
      }
    }
    return faults;
  }
}
