package spanwright.search;

import java.util.List;
import spanwright.assess.Aim;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;

/**
 * A rough estimate of what a wire would deliver, from its mean height, length and direction: the
 * interference of the direct wave with one reflected at 0.75, a dipole's figure of eight softened
 * by a tenth, and a penalty for wire much shorter than half a wave. It orders work and decides
 * nothing.
 */
final class Promise {
  private static final double LIGHT = 299.792458; // metres times MHz
  private static final double REFLECTED = 0.75;

  private final List<Aim> aims;
  private final GroundSurface surface;

  Promise(List<Aim> aims, GroundSurface surface) {
    this.aims = aims;
    this.surface = surface;
  }

  /**
   * @param legs wire as straight pieces from the feed outward or from end to end, z above the
   *     plan's zero
   * @param length of wire [m]
   * @param planNorth true bearing of the plan's +y [degrees]
   */
  double of(List<Place> legs, double length, double planNorth) {
    double height = 0;
    double weightX = 0;
    double weightY = 0;
    double total = 0;
    for (int i = 1; i < legs.size(); i++) {
      Place a = legs.get(i - 1);
      Place b = legs.get(i);
      double step = a.distance(b);
      double x = (a.x() + b.x()) / 2;
      double y = (a.y() + b.y()) / 2;
      height += step * ((a.z() + b.z()) / 2 - surface.heightAt(x, y));
      weightX += b.x() - a.x();
      weightY += b.y() - a.y();
      total += step;
    }
    if (total == 0) {
      return Double.NEGATIVE_INFINITY;
    }
    double axis = Math.toDegrees(Math.atan2(weightX, weightY)) + planNorth;
    double straightness = Math.hypot(weightX, weightY) / total;
    return mean(Math.max(1, height / total), length, axis, straightness);
  }

  private double mean(double height, double length, double axisDegrees, double straightness) {
    double sum = 0;
    double weights = 0;
    for (Aim aim : aims) {
      double k = 2 * Math.PI * aim.frequencyMHz() / LIGHT;
      double up = Math.toRadians((aim.fromElevation() + aim.toElevation()) / 2);
      double direct =
          1 + REFLECTED * REFLECTED - 2 * REFLECTED * Math.cos(2 * k * height * Math.sin(up));
      double side = 1;
      if (!aim.allRound()) {
        double across = Math.sin(Math.toRadians(aim.bearing() - axisDegrees));
        double broad = across * across * straightness + (1 - straightness) / 2;
        side = 0.1 + 0.9 * (broad * Math.cos(up) * Math.cos(up) + Math.sin(up) * Math.sin(up));
      }
      double waves = length * aim.frequencyMHz() / LIGHT;
      double shortness = Math.min(1, Math.pow(waves / 0.38, 1.5));
      sum += aim.weight() * 10 * Math.log10(Math.max(1e-3, direct * side * shortness));
      weights += aim.weight();
    }
    return weights == 0 ? 0 : sum / weights;
  }
}
