package spanwright.clearance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import spanwright.plan.Catalogue;
import spanwright.plan.Catalogues;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.rigging.Layout;
import spanwright.rigging.Rigging;

/**
 * A feed line that leads off square to its span. A wind along the span moves the line and not its
 * feedpoint, so the line hangs slack and swings far; blown along with the span only, it was found
 * clear of a telephone line that it can touch.
 */
class BlownFeedLineTest {
  private static final Catalogue CATALOGUE = Catalogues.standard();

  /**
   * Wire west to east at 8 m; the station 16 m to the south; a telephone line beside the feed line.
   */
  private static Clearance kept(double beside) {
    Plan plan =
        PlanReader.read(
                String.format(
                    Locale.ROOT,
                    """
                    { "format": "spanwright-plan/1", "boundary": [[-14,-22],[14,-22],[14,5],[-14,5]],
                      "supports": [
                        { "id": "west", "kind": "other", "at": [-11,0], "lowest": 8, "highest": 8 },
                        { "id": "east", "kind": "other", "at": [11,0], "lowest": 8, "highest": 8 } ],
                      "overheadLines": [ { "id": "drop", "kind": "telephone",
                        "path": [[%1$f,-15,4.2],[%1$f,-5,4.2]] } ],
                      "entry": { "at": [0,-16], "height": 2.2 },
                      "brief": { "bands": [ { "name": "20 m", "frequencies": [14.175] } ],
                        "targets": [ { "name": "north", "bearing": 0, "distanceKm": 3000 } ] } }""",
                    beside))
            .plan();
    Layout layout =
        new Layout(
            "level",
            List.of(
                new Layout.Hold("west", new Place(-11, 0, 8)),
                new Layout.Hold("east", new Place(11, 0, 8))),
            List.of(new Layout.Run(List.of(new Place(-10, 0, 8), new Place(10, 0, 8)), null)),
            new Layout.FeedChoice(0, 0.5, null, null));
    var rigged = Rigging.of(plan, CATALOGUE).hang(layout);
    return Clearances.of(plan, CATALOGUE).check(rigged).stream()
        .filter(c -> c.rule().equals("overhead-telephone"))
        .findFirst()
        .orElseThrow();
  }

  @Test
  void a_line_beside_it_is_refused_as_far_out_as_it_can_swing() {
    // A run of 16 m with 2 % of slack and 0.1 m swings out by up to √(3/8 · 16.8 · 0.43) ≈ 1.6 m.
    assertEquals(State.FOUL, kept(1.5).state());
    assertEquals("feed line", kept(1.5).what());
    assertTrue(kept(1.5).distance() < 0.2, () -> "told " + kept(1.5).distance());
  }

  @Test
  void either_side_is_held_alike() {
    assertEquals(kept(1.5).distance(), kept(-1.5).distance(), 0.02);
  }

  @Test
  void a_line_well_beyond_its_swing_is_allowed() {
    assertTrue(kept(4).state() != State.FOUL, () -> "told " + kept(4).distance());
  }
}
