package spanwright.rigging;

import spanwright.plan.RopeKind;
import spanwright.plan.WireKind;

/**
 * What a span is made of and the weather it must stand.
 *
 * @param wireWeight kg/m
 * @param wireDiameter that the wind sees [m]
 * @param wireStiffness EA [N]
 * @param wireBreaking newtons
 * @param ropeWeight kg/m
 * @param ropeDiameter metres
 * @param ropeStiffness EA [N]
 * @param ropeBreaking newtons, without knots
 * @param ropeWorking newtons that may be used
 * @param windPressure of the gust with drag, ½ρv²·Cd [Pa]
 * @param ice radial [m]
 */
record Materials(
    double wireWeight,
    double wireDiameter,
    double wireStiffness,
    double wireBreaking,
    double ropeWeight,
    double ropeDiameter,
    double ropeStiffness,
    double ropeBreaking,
    double ropeWorking,
    double windPressure,
    double ice) {

  static Materials of(WireKind wire, RopeKind rope, double wind, double iceMillimetres) {
    within("wind", wind, 100, "m/s");
    within("ice", iceMillimetres, 100, "mm");
    double radius = wire.insulation() == null ? wire.radius() : wire.insulation().radius();
    return new Materials(
        positive(wire.weight(), "wire", wire.id(), "weight"),
        2 * positive(radius, "wire", wire.id(), "radius"),
        positive(wire.stiffness(), "wire", wire.id(), "stiffness"),
        positive(wire.breaking(), "wire", wire.id(), "breaking strength"),
        positive(rope.weight(), "rope", rope.id(), "weight"),
        positive(rope.diameter(), "rope", rope.id(), "diameter"),
        positive(rope.stiffness(), "rope", rope.id(), "stiffness"),
        positive(rope.breaking(), "rope", rope.id(), "breaking strength"),
        rope.breaking() * positive(rope.workingShare(), "rope", rope.id(), "working share"),
        0.5 * HangCase.AIR * wind * wind * HangCase.DRAG,
        iceMillimetres / 1000);
  }

  private static void within(String what, double value, double most, String unit) {
    CourseReader.require(
        value >= 0 && value <= most,
        "brief.rules.%s: is %.4g %s; it must lie between 0 and %.0f. Give the design figure of the"
            + " place.",
        what,
        value,
        unit,
        most);
  }

  private static double positive(double value, String kind, String id, String what) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(
          String.format(
              "catalogue: the %s \"%s\" has no %s. Give it, or choose another %s.",
              kind, id, what, kind));
    }
    return value;
  }

  /** Push of the gust on a metre of something round [N/m]. */
  double push(double diameter, boolean iced) {
    return windPressure * (diameter + (iced ? 2 * ice : 0));
  }

  /** Push of a weather's wind on a metre of something round that it meets square [N/m]. */
  double push(double diameter, Weather weather) {
    return weather.windShare * push(diameter, weather.iced);
  }

  /** Weight of a metre of something round [N/m], its ice included. */
  double weight(double kilogramsPerMetre, double diameter, boolean iced) {
    double sleeve = iced ? Practice.ICE_DENSITY * Math.PI * ice * (diameter + ice) : 0;
    return (kilogramsPerMetre + sleeve) * Hanging.GRAVITY;
  }
}
