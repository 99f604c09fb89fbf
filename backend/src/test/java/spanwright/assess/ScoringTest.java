package spanwright.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.Place;

/** The score and its parts. */
class ScoringTest {
  private static final String TWO_BANDS =
      """
      "bands": [ { "name": "40 m", "frequencies": [7.0, 7.1], "weight": 3 },
                 { "name": "20 m", "frequencies": [14.1] } ],
      "targets": [ { "name": "Far", "bearing": 285, "distanceKm": 5600, "weight": 2 },
                   { "name": "Near", "nearVerticalKm": 300, "bands": ["40 m"] } ]
      """;

  private static final Place HERE = new Place(0, 0, 5);

  private static Scoring scoring(String brief) {
    return new Scoring(Gardens.of("", "", brief).brief());
  }

  private static Placement.TargetResult target(String name, double delivered, double reference) {
    return new Placement.TargetResult(
        name, null, List.of(3.0, 14.0), List.of(), delivered, reference);
  }

  private static Placement.BandResult row(
      String band, State matching, Placement.TargetResult... targets) {
    return new Placement.BandResult(
        band,
        7,
        List.of(50.0, 0.0),
        1,
        0,
        List.of(50.0, 0.0),
        new Placement.Matching(matching, "", 0, 0, null, null),
        0,
        0,
        0,
        1,
        null,
        List.of(targets),
        null,
        null);
  }

  private static Clearance clearance(String rule, String to, State state) {
    return new Clearance(rule, to, "wire", HERE, HERE, 1, 1, state);
  }

  private static Placement.NewMast mast(String consent) {
    return new Placement.NewMast("bed", HERE, HERE, 5, List.of(), consent);
  }

  private static double points(List<Placement.ScorePart> parts, String what) {
    return parts.stream()
        .filter(part -> part.what().contains(what))
        .mapToDouble(Placement.ScorePart::points)
        .sum();
  }

  @Test
  void the_mean_weighs_each_target_on_each_band_and_averages_the_rows_of_a_band() {
    List<Placement.BandResult> rows =
        List.of(
            row("40 m", State.CLEAR, target("Far", 1, 0), target("Near", -4, -5)),
            row("40 m", State.CLEAR, target("Far", 3, 0), target("Near", -3, -5)),
            row("20 m", State.CLEAR, target("Far", 0, 5)));
    List<Placement.ScorePart> parts = scoring(TWO_BANDS).parts(rows, List.of(), List.of());
    // 40 m: Far weighs 3 · 2 at +2.0, Near 3 · 1 at +1.5; 20 m: Far weighs 1 · 2 at -5
    double mean = (6 * 2.0 + 3 * 1.5 + 2 * -5.0) / 11;
    assertEquals(1, parts.size(), parts::toString);
    assertEquals(mean, parts.get(0).points(), 0.006);
    assertEquals(mean, Scoring.total(parts), 0.006);
  }

  @Test
  void two_targets_of_one_name_are_told_apart() {
    String brief =
        """
        "bands": [ { "name": "20 m", "frequencies": [14.1] } ],
        "targets": [ { "name": "Far", "bearing": 285, "distanceKm": 5600, "weight": 3 },
                     { "name": "Far", "bearing": 90, "distanceKm": 5600 } ]
        """;
    var rows = List.of(row("20 m", State.CLEAR, target("Far", 4, 0), target("Far", -8, 0)));
    assertEquals(1.0, Scoring.total(scoring(brief).parts(rows, List.of(), List.of())), 1e-9);
  }

  @Test
  void a_band_that_cannot_be_matched_costs_ten_decibels_times_its_share() {
    List<Placement.BandResult> rows =
        List.of(
            row("40 m", State.FOUL, target("Far", 0, 0), target("Near", 0, 0)),
            row("40 m", State.TIGHT, target("Far", 0, 0), target("Near", 0, 0)),
            row("20 m", State.CLEAR, target("Far", 0, 0)));
    List<Placement.ScorePart> parts = scoring(TWO_BANDS).parts(rows, List.of(), List.of());
    // 40 m weighs 3 · (2 + 1) of 9 + 2; half of its rows each
    assertEquals(-10 * 9 / 11.0 / 2, points(parts, "40 m cannot be matched on part"), 0.006);
    assertEquals(-1 * 9 / 11.0 / 2, points(parts, "40 m is matched only just"), 0.006);
  }

  @Test
  void a_band_that_is_only_heard_is_never_held_against_its_matching() {
    String heard = TWO_BANDS.replace("\"weight\": 3 }", "\"weight\": 3, \"receiveOnly\": true }");
    List<Placement.BandResult> rows =
        List.of(
            row("40 m", State.FOUL, target("Far", 0, 0), target("Near", 0, 0)),
            row("20 m", State.CLEAR, target("Far", 0, 0)));
    assertEquals(0, Scoring.total(scoring(heard).parts(rows, List.of(), List.of())));
  }

  @Test
  void masts_consents_and_tight_clearances_are_named_and_bounded() {
    List<Clearance> clearances = new ArrayList<>();
    for (int i = 0; i < 9; i++) {
      clearances.add(clearance("boundary", "edge " + i, State.TIGHT));
      clearances.add(clearance("boundary", "edge " + i, State.TIGHT));
      clearances.add(clearance("headroom", "edge " + i, State.CLEAR));
    }
    var rows = List.of(row("20 m", State.CLEAR, target("Far", 0, 0)));
    List<Placement.ScorePart> parts =
        scoring(TWO_BANDS)
            .parts(
                rows, List.of(mast("planning permission"), mast("none"), mast(null)), clearances);
    assertEquals(-1.5, points(parts, "a new mast"), 1e-9);
    assertEquals(-0.5, points(parts, "planning permission"), 1e-9);
    assertEquals(-0.5, points(parts, "9 tight clearances"), 1e-9);
    assertEquals(-2.5, Scoring.total(parts), 1e-9);
  }

  @Test
  void the_parts_add_up_to_the_score_to_the_last_digit_shown() {
    Random random = new Random(4);
    Scoring scoring = scoring(TWO_BANDS);
    for (int i = 0; i < 200; i++) {
      List<Placement.BandResult> rows = new ArrayList<>();
      for (String band : List.of("40 m", "40 m", "20 m")) {
        State state = State.values()[random.nextInt(3)];
        var far = target("Far", 20 * random.nextDouble() - 15, -6.37);
        rows.add(
            band.equals("20 m")
                ? row(band, state, far)
                : row(band, state, far, target("Near", 9 * random.nextDouble(), -8.11)));
      }
      List<Placement.ScorePart> parts = scoring.parts(rows, List.of(mast("none")), List.of());
      double sum = parts.stream().mapToDouble(Placement.ScorePart::points).sum();
      assertEquals(sum, Scoring.total(parts), 1e-9);
      assertTrue(parts.size() >= 2);
    }
  }
}
