package spanwright.path;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class TakeOffTest {
  private static double degrees(double rangeKm, double heightKm) {
    return Math.toDegrees(Hop.elevation(rangeKm, heightKm));
  }

  private static Window find(Windows windows, Layer layer, int hops) {
    return windows.all().stream()
        .filter(w -> w.layer() == layer && w.hops() == hops)
        .findFirst()
        .orElseThrow(() -> new AssertionError("no such window in " + windows));
  }

  @Test
  void a_far_target_is_scored_on_the_fewest_F2_hops_over_the_range_of_heights() {
    Windows windows = TakeOff.toward(5600, 14.175);
    assertEquals(2, windows.scored().hops());
    assertEquals(Layer.F2, windows.scored().layer());
    assertEquals(degrees(2800, 250), windows.scored().fromDegrees(), 1e-9);
    assertEquals(degrees(2800, 400), windows.scored().toDegrees(), 1e-9);
    assertEquals("", windows.note());
    assertEquals(List.of(2, 3, 4), windows.all().stream().map(Window::hops).toList());
  }

  @Test
  void
      the_least_elevation_cuts_a_window_and_a_hop_that_only_the_highest_mirror_makes_is_not_scored() {
    Windows windows = TakeOff.toward(3900, 14.175);
    Window one = find(windows, Layer.F2, 1);
    assertEquals(TakeOff.LEAST_DEGREES, one.fromDegrees());
    assertEquals(degrees(3900, 400), one.toDegrees(), 1e-9);
    assertEquals(2, windows.scored().hops());
  }

  @Test
  void a_single_hop_is_scored_while_the_middle_height_serves_it() {
    assertEquals(1, TakeOff.toward(3600, 14.175).scored().hops());
    assertEquals(2, TakeOff.toward(3700, 14.175).scored().hops());
  }

  @Test
  void E_and_sporadic_E_have_windows_of_their_own_at_short_distance() {
    Windows windows = TakeOff.toward(1500, 7.1);
    for (Layer layer : new Layer[] {Layer.E, Layer.ES}) {
      Window window = find(windows, layer, 1);
      assertEquals(degrees(1500, 100), window.fromDegrees(), 1e-9);
      assertTrue(window.fromDegrees() < 4.89 && window.toDegrees() > 4.89);
    }
    assertEquals(Layer.F2, windows.scored().layer());
  }

  @Test
  void the_E_layer_lets_a_high_frequency_through_where_sporadic_E_does_not() {
    Windows windows = TakeOff.toward(1500, 21.2);
    assertTrue(windows.all().stream().noneMatch(w -> w.layer() == Layer.E));
    assertEquals(1, find(windows, Layer.ES, 1).hops());
  }

  @Test
  void where_F2_lets_the_frequency_through_sporadic_E_is_scored_and_the_note_says_so() {
    Windows windows = TakeOff.toward(900, 28.4);
    assertEquals(Layer.ES, windows.scored().layer());
    assertTrue(windows.note().contains("sporadic E"), windows.note());
  }

  @Test
  void where_nothing_turns_the_frequency_back_the_geometry_stands_with_a_note() {
    Windows windows = TakeOff.toward(200, 28.4);
    assertEquals(1, windows.all().size());
    assertEquals(degrees(200, 400), windows.scored().toDegrees(), 1e-9);
    assertTrue(windows.note().contains("28.4 MHz is hardly ever turned back"), windows.note());
  }

  @Test
  void the_secant_law_cuts_the_steep_end_of_a_window() {
    Window window = find(TakeOff.toward(1500, 28.4), Layer.F2, 1);
    double incidence = Double.NaN;
    for (double h = 250; h <= 400; h += 0.001) {
      if (degrees(1500, h) >= window.toDegrees()) {
        incidence = Hop.incidence(Math.toRadians(window.toDegrees()), h);
        break;
      }
    }
    assertEquals(12, 28.4 * Math.cos(incidence), 1e-3);
  }

  @Test
  void near_vertical_cover_runs_from_the_edge_of_the_area_to_the_zenith() {
    Windows windows = TakeOff.nearVertical(300, 3.65);
    assertEquals(degrees(300, 250), windows.scored().fromDegrees(), 1e-9);
    assertEquals(57.87, windows.scored().fromDegrees(), 0.01);
    assertEquals(90, windows.scored().toDegrees());
    assertEquals("", windows.note());
    assertFalse(TakeOff.nearVertical(300, 14.2).note().isEmpty());
  }

  @Test
  void the_long_way_round_takes_more_hops() {
    assertEquals(5, TakeOff.toward(15_000, 14.175).scored().hops());
    assertEquals(7, TakeOff.toward(25_000, 14.175).scored().hops());
  }

  @Test
  void every_bearing_leads_to_the_antipode() {
    assertTrue(TakeOff.bearingIsAny(20_000));
    assertFalse(TakeOff.bearingIsAny(19_900));
    assertTrue(GreatCircle.between(51, -1, -51, 179).anyBearing());
    assertFalse(GreatCircle.between(51, -1, 40, -74).anyBearing());
  }

  @Test
  void the_other_way_round_is_the_opposite_bearing_and_the_rest_of_the_circle() {
    GreatCircle there = GreatCircle.between(51.5, -0.12, 40.7, -74.0);
    GreatCircle round = there.otherWay();
    assertEquals(108.363007, round.bearingDegrees(), 1e-6);
    assertEquals(2 * Math.PI * 6371, there.distanceKm() + round.distanceKm(), 1e-9);
  }

  @Test
  void input_that_makes_no_sense_is_refused_with_a_sentence() {
    assertSays("Give 0 to 40,100 km", () -> TakeOff.toward(50_000, 14));
    assertSays("Give 0 to 40,100 km", () -> TakeOff.toward(Double.NaN, 14));
    assertSays("megahertz, not hertz", () -> TakeOff.toward(1000, 14_175_000));
    assertSays("is not near-vertical", () -> TakeOff.nearVertical(0, 7));
    assertSays("The to latitude is 91.0 degrees", () -> GreatCircle.between(0, 0, 91, 0));
    assertSays("look above the horizon", () -> ReferenceVertical.gainDbi(-0.1, 7, 13, 0.005));
    assertSays("permittivity is 1 to 10,000", () -> Fresnel.of(7, 0.5, 0.005));
    assertSays("has to lie between 0 and 90", () -> new Window(Layer.F2, 1, 20, 10));
  }

  private static void assertSays(String part, Runnable call) {
    String text = assertThrows(IllegalArgumentException.class, call::run).getMessage();
    assertTrue(text.contains(part), text);
  }

  @Test
  void any_distance_and_frequency_gives_windows_in_order_that_hold_the_scored_one() {
    Random random = new Random(7);
    for (int k = 0; k < 20_000; k++) {
      double distance = k == 0 ? 0 : random.nextDouble() * 40_100;
      double frequency = 1.8 + random.nextDouble() * 60;
      Windows windows = TakeOff.toward(distance, frequency);
      assertTrue(windows.all().contains(windows.scored()));
      for (Window w : windows.all()) {
        assertTrue(w.fromDegrees() >= TakeOff.LEAST_DEGREES - 1e-9, w::toString);
        assertTrue(w.toDegrees() >= w.fromDegrees() && w.toDegrees() <= 90, w::toString);
      }
    }
  }

  @Test
  void a_window_holds_just_the_elevations_that_some_height_of_the_layer_makes() {
    Random random = new Random(8);
    for (int k = 0; k < 300; k++) {
      double distance = 50 + random.nextDouble() * 12_000;
      double frequency = 3 + random.nextDouble() * 26;
      for (Window w : TakeOff.toward(distance, frequency).all()) {
        double least = 90;
        double most = 0;
        for (double h = w.layer().lowestKm(); h <= w.layer().highestKm(); h += 0.05) {
          double elevation = Hop.elevation(distance / w.hops(), h);
          boolean back =
              elevation >= 0
                  && frequency * Math.cos(Hop.incidence(elevation, h)) <= w.layer().criticalMHz();
          if (back && Math.toDegrees(elevation) >= TakeOff.LEAST_DEGREES) {
            least = Math.min(least, Math.toDegrees(elevation));
            most = Math.max(most, Math.toDegrees(elevation));
          }
        }
        if (most > 0) {
          assertEquals(least, w.fromDegrees(), 0.05, w::toString);
          assertEquals(most, w.toDegrees(), 0.05, w::toString);
        }
      }
    }
  }

  @Test
  void elevation_and_range_of_a_hop_undo_each_other() {
    Random random = new Random(9);
    for (int k = 0; k < 10_000; k++) {
      double height = 80 + random.nextDouble() * 400;
      double elevation = random.nextDouble() * Math.PI / 2;
      double range = Hop.rangeKm(elevation, height);
      assertEquals(elevation, Hop.elevation(range, height), 1e-9);
    }
  }
}
