package spanwright.rigging;

import java.util.List;
import spanwright.plan.Place;
import spanwright.plan.RopeKind;
import spanwright.plan.WireKind;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** Wind and ice on a round wire against codes and worked examples. */
public class WindOnWireTest extends PublishedChecks {
  @Override
  public String heading() {
    return "Rigging: wind and ice";
  }

  @Override
  public String about() {
    return "½ρv² with 1.25 kg/m³ and a drag coefficient of 1.2, level and square to the span.";
  }

  private static Materials at(double wind, double iceMillimetres, double diameter) {
    WireKind wire =
        new WireKind("w", "w", diameter / 2, 5.8e7, 1, null, 0.02, 1000, 2e5, false, null);
    RopeKind rope = new RopeKind("r", "r", 0.006, 0.02, 4000, 1e5, 0.15, false, null);
    return Materials.of(wire, rope, wind, iceMillimetres);
  }

  @Override
  public List<Check> checks() {
    String own = "F = ½·1.25·v²·1.2·d, worked out apart";
    double d = 0.002053;
    return List.of(
        Check.within(
            "velocity pressure at 40.9 m/s",
            1046,
            at(40.9, 0, d).windPressure() / HangCase.DRAG,
            1,
            0,
            "Pa",
            "EN 1991-1-4, expression 4.10, calculation sheet"),
        Check.within(
            "push on 12 AWG at 20 m/s", 0.616, at(20, 0, d).push(d, false), 0.003, 3, "N/m", own),
        Check.within(
            "push on 12 AWG at 25 m/s", 0.962, at(25, 0, d).push(d, false), 0.005, 3, "N/m", own),
        Check.within(
            "push on 12 AWG at 40 m/s", 2.463, at(40, 0, d).push(d, false), 0.012, 3, "N/m", own),
        Check.within(
            "ice of 10 mm on a wire of 2 mm, as if 915 kg/m³",
            915 * Math.PI * 0.01 * 0.012,
            (at(0, 10, 0.002).weight(0, 0.002, true) / Hanging.GRAVITY) * 915 / 900,
            1e-9,
            5,
            "kg/m",
            "Chakrabarti et al., example 5.9: 915·π·t·(d + t); the plan format has 900 kg/m³"),
        combined());
  }

  /**
   * A tied, weightless-sided check: the load in wind is √(w² + f²), so sag and blow-out split so.
   */
  private static Check combined() {
    HangCase given =
        new HangCase(
            new Place(0, 0, 10),
            new Place(30, 0, 10),
            new HangCase.Wire(0.03, 0.002, 2e5),
            null,
            100.0,
            HangCase.Held.TIED,
            25.0,
            null,
            null);
    HangAnswer.InWind wind = Hanging.solve(given).inWind();
    double push = 0.5 * 1.25 * 625 * 1.2 * 0.002;
    return Check.within(
        "blow-out over sag, 30 m of wire at 25 m/s: push over weight",
        push / (0.03 * Hanging.GRAVITY),
        wind.blowOut() / wind.sag(),
        1e-6,
        4,
        "",
        "power-systems examples: loads at right angles add as vectors");
  }
}
