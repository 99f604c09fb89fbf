package spanwright.moments;

import java.util.List;

/** Refuses what cannot be solved, with a sentence that names the wire and what to do. */
final class ModelCheck {
  /** Lowest and highest frequency [MHz]. */
  static final double LOWEST_MHZ = 0.1;

  static final double HIGHEST_MHZ = 60;

  /** Points a model may have in all. */
  static final int MOST_POINTS = 5000;

  /** Coordinates lie within so many metres. */
  static final double FAR = 1e5;

  /** Consecutive points lie at least so far apart [m]. */
  static final double SHORTEST = 1e-5;

  private ModelCheck() {}

  /** How messages name a wire: as the case's file does. */
  static String name(int wire) {
    return "wires[" + wire + "]";
  }

  static void frequency(double frequencyMHz) {
    if (!(frequencyMHz >= LOWEST_MHZ && frequencyMHz <= HIGHEST_MHZ)) {
      throw new ModelFault(
          "The frequency "
              + frequencyMHz
              + " MHz is outside "
              + LOWEST_MHZ
              + " to "
              + HIGHEST_MHZ
              + " MHz: give it in megahertz within that range.");
    }
  }

  static void model(AntennaModel model, Ground ground) {
    List<WireSpec> wires = model.wires();
    if (wires.isEmpty()) {
      throw new ModelFault("There is no wire: give at least one.");
    }
    long points = 0;
    for (WireSpec wire : wires) {
      points += wire.points().size();
    }
    if (points > MOST_POINTS) {
      throw new ModelFault(
          "The wires have "
              + points
              + " points in all, more than the "
              + MOST_POINTS
              + " that can be solved: give fewer points.");
    }
    for (int i = 0; i < wires.size(); i++) {
      wire(name(i), wires.get(i), ground.kind() != Ground.Kind.NONE);
    }
    feed(model);
  }

  private static void wire(String name, WireSpec wire, boolean grounded) {
    List<Vertex> points = wire.points();
    if (points.size() < 2) {
      throw new ModelFault(
          name + " has " + points.size() + " points: give at least two, its ends.");
    }
    double radius = wire.radius();
    if (!(radius > 0 && radius <= 1)) {
      throw new ModelFault(
          name + " has a radius of " + radius + " m: give one above 0 and up to 1 m.");
    }
    material(name, wire);
    for (int i = 0; i < points.size(); i++) {
      Vertex p = points.get(i);
      if (!(Math.abs(p.x()) <= FAR && Math.abs(p.y()) <= FAR && Math.abs(p.z()) <= FAR)) {
        throw new ModelFault(
            name
                + ", point "
                + i
                + ": a coordinate is missing, no number or beyond 100 km. Give x, y and z in"
                + " metres.");
      }
      if (grounded && p.z() <= radius) {
        throw new ModelFault(
            name
                + ", point "
                + i
                + (p.z() < 0 ? " is below the ground" : " is at the ground")
                + " (z = "
                + p.z()
                + " m): raise it above z = "
                + radius
                + " m, the wire's radius; ground connections are not solved.");
      }
      if (i > 0 && points.get(i - 1).distanceTo(p) < SHORTEST) {
        throw new ModelFault(
            name
                + " has no length between points "
                + (i - 1)
                + " and "
                + i
                + ": take one of the two away.");
      }
    }
    double length = wire.length();
    if (radius >= 0.5 * length) {
      throw new ModelFault(
          name
              + " is "
              + length
              + " m long and "
              + 2 * radius
              + " m thick: a wire must be longer than thick. Give its radius in metres.");
    }
  }

  private static void material(String name, WireSpec wire) {
    if (!(wire.conductivity() > 0)) {
      throw new ModelFault(
          name
              + " has a conductivity of "
              + wire.conductivity()
              + " S/m: give one above 0, or 'perfect'.");
    }
    if (!(wire.permeability() >= 0.9 && wire.permeability() <= 1e5)) {
      throw new ModelFault(
          name
              + " has a relative permeability of "
              + wire.permeability()
              + ": give 1 for copper and aluminium, and up to 100000.");
    }
    Sheath sheath = wire.sheath();
    if (sheath == null) {
      return;
    }
    if (!(sheath.radius() > wire.radius() && sheath.radius() <= 1)) {
      throw new ModelFault(
          name
              + " has insulation of outer radius "
              + sheath.radius()
              + " m round a conductor of radius "
              + wire.radius()
              + " m: the outer radius must be the greater one.");
    }
    if (!(sheath.permittivity() >= 1 && sheath.permittivity() <= 100)) {
      throw new ModelFault(
          name
              + " has insulation of relative permittivity "
              + sheath.permittivity()
              + ": give one from 1 to 100.");
    }
  }

  private static void feed(AntennaModel model) {
    int index = model.feedWire();
    if (index < 0 || index >= model.wires().size()) {
      throw new ModelFault(
          "The feed is on wire "
              + index
              + ", but there are only "
              + model.wires().size()
              + ", counted from 0: name one of them.");
    }
    double fraction = model.feedFraction();
    if (!(fraction >= 0 && fraction <= 1)) {
      throw new ModelFault(
          "The feed on "
              + name(index)
              + " is at fraction "
              + fraction
              + " of its length: give one between 0 and 1.");
    }
    double gap = model.gap();
    WireSpec wire = model.wires().get(index);
    double length = wire.length();
    if (!(gap > 0 && gap < 0.5 * length)) {
      throw new ModelFault(
          "The feed gap of "
              + gap
              + " m does not fit "
              + name(index)
              + ", which is "
              + length
              + " m long: the gap must be above 0 and less than half the wire.");
    }
    double from = fraction * length - 0.5 * gap;
    double to = fraction * length + 0.5 * gap;
    if (!closed(wire) && (from < -1e-9 || to > length + 1e-9)) {
      throw new ModelFault(
          "The feed at fraction "
              + fraction
              + " of "
              + name(index)
              + " lies on its end: the middle of the feed must be at least "
              + 0.5 * gap
              + " m from it. Move the feed, or make the wire longer there.");
    }
  }

  /** Whether the wire's ends are one point. */
  static boolean closed(WireSpec wire) {
    List<Vertex> p = wire.points();
    return p.size() > 2 && p.get(0).distanceTo(p.get(p.size() - 1)) <= AntennaModel.JOIN_DISTANCE;
  }
}
