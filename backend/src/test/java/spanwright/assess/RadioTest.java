package spanwright.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import spanwright.clearance.State;
import spanwright.feed.FeedResult;
import spanwright.feed.Match;
import spanwright.feed.Verdict;
import spanwright.moments.AntennaModel;
import spanwright.moments.Ground;
import spanwright.moments.MeshAim;
import spanwright.moments.Solution;
import spanwright.moments.Solver;
import spanwright.moments.Vertex;
import spanwright.moments.WireSpec;
import spanwright.plan.Plan;

/** From a solution to the figures of a row, on a sloping wire whose pattern is lopsided. */
class RadioTest {
  private static final double PLAN_NORTH = 30;

  private static final String BRIEF =
      """
      "bands": [ { "name": "20 m", "frequencies": [14.0, 14.175, 14.35] } ],
      "targets": [ { "name": "Far", "bearing": 285, "distanceKm": 5600 },
                   { "name": "Near", "nearVerticalKm": 300 } ]
      """;

  private final Plan plan = Gardens.of("\"planNorth\": 30", "", BRIEF);
  private final List<Row> rows = Rows.of(plan);
  private final Solution solution =
      new Solver()
          .solve(
              AntennaModel.of(
                  List.of(
                      WireSpec.of(
                          List.of(new Vertex(0, 0, 3), new Vertex(6, 1, 10)), 0.001, 5.8e7)),
                  0,
                  0.4),
              Ground.perfect(),
              14.175,
              MeshAim.COARSE);

  private static FeedResult feed(double lineLossDb, Verdict line, Match match) {
    Complex fifty = new Complex(50, 0);
    return new FeedResult(
        1, lineLossDb, lineLossDb, fifty, 1, 100, 2, line, "the line's volts", match);
  }

  private static Match match(Verdict state, double lossDb) {
    return new Match(state, "the unit", null, lossDb, 1, 10, 1);
  }

  private Placement.BandResult row(Row row, FeedResult feed) {
    Radio.Far far = Radio.look(row, solution, GroundPlane.level(0));
    return new Radio(PLAN_NORTH).row(row, solution, far, feed);
  }

  private Placement.BandResult row(FeedResult feed) {
    return row(rows.get(1), feed);
  }

  /** Mean power over a window, by our own dense sum. */
  private double meanDbi(double fromDegrees, double toDegrees, double... azimuths) {
    double sum = 0;
    int steps = 400;
    for (double azimuth : azimuths) {
      for (int i = 0; i < steps; i++) {
        double up = fromDegrees + (toDegrees - fromDegrees) * (i + 0.5) / steps;
        double dbi = solution.gain(Math.toRadians(azimuth), Math.toRadians(up)).totalDbi();
        sum += Math.pow(10, dbi / 10);
      }
    }
    return 10 * Math.log10(sum / steps / azimuths.length);
  }

  @Test
  void a_target_gets_the_mean_power_over_its_window_toward_its_true_bearing_less_all_losses() {
    Placement.TargetResult far =
        row(feed(0.7, Verdict.CLEAR, match(Verdict.CLEAR, 0.4))).targets().get(0);
    double expected = meanDbi(far.window().get(0), far.window().get(1), 285 - PLAN_NORTH);
    assertEquals(expected - 1.1, far.deliveredDbi(), 0.03);
    double mirrored = meanDbi(far.window().get(0), far.window().get(1), 285 + PLAN_NORTH);
    assertTrue(Math.abs(mirrored - expected) > 0.3, "a slip in the bearing's sign would show");
  }

  @Test
  void near_vertical_cover_is_the_mean_over_all_azimuths_too() {
    Placement.TargetResult near =
        row(feed(0, Verdict.CLEAR, match(Verdict.CLEAR, 0))).targets().get(1);
    double[] round = new double[72];
    for (int i = 0; i < round.length; i++) {
      round[i] = 5.0 * i;
    }
    assertNull(near.bearing());
    assertEquals(
        meanDbi(near.window().get(0), near.window().get(1), round), near.deliveredDbi(), 0.03);
  }

  @Test
  void the_peak_is_told_from_true_north() {
    Placement.BandResult row = row(feed(0, Verdict.CLEAR, match(Verdict.CLEAR, 0)));
    double inPlan = Math.toDegrees(solution.peak().azimuth());
    assertEquals((inPlan + PLAN_NORTH + 360) % 360, row.peakAzimuth(), 0.051);
    assertTrue(row.peakAzimuth() >= 0 && row.peakAzimuth() < 360);
  }

  @Test
  void only_the_middle_frequency_carries_drawings() {
    FeedResult feed = feed(0, Verdict.CLEAR, match(Verdict.CLEAR, 0));
    assertEquals(Rows.ROSE, row(feed).rose().dbi().size());
    assertEquals(2, row(feed).profiles().size(), "one bearing and the peak");
    Placement.BandResult edge = row(rows.get(0), feed);
    assertNull(edge.rose());
    assertNull(edge.profiles());
  }

  @Test
  void volts_over_what_the_line_stands_make_the_matching_foul_with_the_lines_reason() {
    Placement.Matching matching = row(feed(0, Verdict.FOUL, match(Verdict.TIGHT, 0))).matching();
    assertEquals(State.FOUL, matching.state());
    assertEquals("the line's volts", matching.why());
    assertEquals("the unit", row(feed(0, Verdict.TIGHT, match(Verdict.TIGHT, 0))).matching().why());
  }

  @Test
  void a_loss_without_end_is_shown_as_a_finite_one() {
    Placement.BandResult row =
        row(
            feed(
                Double.POSITIVE_INFINITY,
                Verdict.CLEAR,
                match(Verdict.FOUL, Double.POSITIVE_INFINITY)));
    assertEquals(99, row.lineLossDb());
    assertEquals(Radio.NOTHING_DBI, row.targets().get(0).deliveredDbi());
  }
}
