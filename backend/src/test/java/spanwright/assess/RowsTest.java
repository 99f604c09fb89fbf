package spanwright.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.path.ReferenceVertical;
import spanwright.path.Window;

/** What is wanted on each frequency. */
class RowsTest {
  private static final String BRIEF =
      """
      "bands": [ { "name": "40 m", "frequencies": [7.2, 7.0, 7.1, 7.15] },
                 { "name": "20 m", "frequencies": [14.1] } ],
      "targets": [ { "name": "Far", "bearing": 285, "distanceKm": 5600, "weight": 3 },
                   { "name": "Near", "nearVerticalKm": 300, "bands": ["40 m"] },
                   { "name": "Other side", "bearing": 10, "distanceKm": 20015 },
                   { "name": "Next", "bearing": 80, "distanceKm": 900 } ]
      """;

  private final List<Row> rows =
      Rows.of(
          Gardens.of("\"ground\": { \"permittivity\": 5, \"conductivity\": 0.002 }", "", BRIEF));

  @Test
  void each_frequency_has_a_row_rising_within_its_band_and_one_is_the_middle() {
    assertEquals(List.of(7.0, 7.1, 7.15, 7.2, 14.1), rows.stream().map(Row::frequencyMHz).toList());
    assertEquals(
        List.of(7.15, 14.1), rows.stream().filter(Row::middle).map(Row::frequencyMHz).toList());
  }

  @Test
  void a_target_counts_on_its_own_bands_alone() {
    assertEquals(
        List.of(0, 1, 2, 3), rows.get(0).looks().stream().map(Row.Look::targetIndex).toList());
    assertEquals(
        List.of(0, 2, 3), rows.get(4).looks().stream().map(Row.Look::targetIndex).toList());
  }

  @Test
  void near_cover_and_the_antipode_have_no_bearing_and_no_profile() {
    List<Row.Look> looks = rows.get(2).looks();
    assertEquals(285.0, looks.get(0).bearing());
    assertNull(looks.get(1).bearing());
    assertNull(looks.get(2).bearing());
    long bearings = looks.stream().filter(look -> look.bearing() != null).count();
    assertEquals(Rows.ROSE + bearings * Rows.PROFILE, rows.get(2).drawn().count());
    assertNull(rows.get(1).drawn());
  }

  @Test
  void the_reference_is_averaged_over_the_scored_window_on_the_plots_own_soil() {
    for (Row row : rows) {
      for (Row.Look look : row.looks()) {
        Window scored = look.windows().scored();
        double sum = 0;
        for (double up : scored.elevationsDegrees()) {
          double dbi = ReferenceVertical.gainDbi(Math.toRadians(up), row.frequencyMHz(), 5, 0.002);
          sum += Math.pow(10, dbi / 10);
        }
        double mean = 10 * Math.log10(sum / scored.elevationsDegrees().length);
        assertEquals(mean, look.referenceDbi(), 1e-6);
        assertTrue(look.windows().all().contains(scored));
      }
    }
  }

  @Test
  void near_cover_looks_up_and_a_far_target_low() {
    List<Row.Look> looks = rows.get(2).looks();
    assertTrue(looks.get(1).windows().scored().fromDegrees() >= 50);
    assertTrue(looks.get(0).windows().scored().toDegrees() < 30);
  }

  @Test
  void the_rose_is_drawn_at_the_middle_of_the_heaviest_targets_window() {
    Row row = rows.get(4);
    Window far = row.looks().get(0).windows().scored();
    double middle = (far.fromDegrees() + far.toDegrees()) / 2;
    assertEquals(middle, row.roseElevation(), 0.051);
    assertTrue(middle < row.looks().get(2).windows().scored().fromDegrees());
  }
}
