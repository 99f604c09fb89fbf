package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Catalogues;
import spanwright.plan.Place;
import spanwright.plan.WireKind;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** A weight on a wire against the funicular polygon of any statics text; strengths from tables. */
public class PointLoadTest extends PublishedChecks {
  private static final String FUNICULAR =
      "funicular polygon of a weightless cable: drop = W·a·b/(H·L) (any statics text)";
  private static final String MIXED =
      "parabola and point load added, H·drop = the beam's moment (any statics text)";

  @Override
  public String heading() {
    return "Rigging: a weight on the wire, and strength";
  }

  @Override
  public String about() {
    return "The cable's drop times its level pull is the bending moment of a beam under the same"
        + " loads. Strengths are what the margins are reckoned from.";
  }

  private static HangAnswer.Calm hang(
      double span, double kilograms, double at, double load, double level) {
    double w = kilograms * Hanging.GRAVITY;
    double up = w * span / 2 + load * Hanging.GRAVITY * at;
    return Hanging.solve(
            new HangCase(
                new Place(0, 0, 0),
                new Place(span, 0, 0),
                new HangCase.Wire(kilograms, 0.0, null),
                new HangCase.Load(at, load),
                Math.hypot(level, up),
                HangCase.Held.TIED,
                null,
                null,
                null))
        .calm();
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    double g = Hanging.GRAVITY;
    for (double at : new double[] {0.25, 0.5}) {
      // The load sits at its share of the length, which is nearly that of the span.
      HangAnswer.Calm light = hang(20, 1e-6, at, 0.5, 200);
      checks.add(
          Check.within(
              "drop under 0.5 kg at " + at + " of 20 m, 200 N level",
              0.5 * g * at * (1 - at) * 20 / 200,
              light.sag(),
              2e-4,
              4,
              "m",
              FUNICULAR));
    }
    HangAnswer.Calm both = hang(20, 0.03, 0.5, 0.35, 100);
    checks.add(
        Check.within(
            "sag of 20 m at 0.03 kg/m with 0.35 kg mid-span, 100 N level",
            (0.03 * g * 400 / 8 + 0.35 * g * 20 / 4) / 100,
            both.sag(),
            2e-4,
            4,
            "m",
            MIXED));
    checks.add(
        Check.within(
            "level pull of the same",
            100,
            Math.hypot(both.pullFrom().x(), both.pullFrom().y()),
            0.05,
            2,
            "N",
            MIXED));
    checks.add(strength());
    return checks;
  }

  /** Hard-drawn copper of 2.053 mm: 337 lbf. The catalogue's own wires have a test of their own. */
  private static Check strength() {
    WireKind wire =
        new WireKind("w", "w", 0.0010265, 5.8e7, 1, null, 0.0294, 1499, 387_000, false, null);
    Materials materials = Materials.of(wire, Catalogues.standard().ropes().get(0), 25, 0);
    Solved solved = new Solved(List.of(), 0, 0, 0, Force.NONE, Force.NONE, 225, 225);
    Look look =
        new Look(solved, solved, solved, null, null, null, 0, 1, 0, 0, 225, 20, false, false);
    return Check.within(
        "margin of 12 AWG hard-drawn copper at 225 N",
        1499.0 / 225,
        Strength.of(look, materials).wire().margin(),
        1e-9,
        3,
        "",
        "ASTM B1, table 1: 337 lbf (from memory, area times strength agrees)");
  }
}
