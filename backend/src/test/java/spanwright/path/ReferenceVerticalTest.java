package spanwright.path;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class ReferenceVerticalTest {
  private static double power(double dbi) {
    return Math.pow(10, dbi / 10);
  }

  @Test
  void over_a_perfect_conductor_all_power_goes_to_the_sky() {
    int n = 20_000;
    double sum = 0;
    for (int k = 0; k < n; k++) {
      double elevation = Math.PI / 2 * (k + 0.5) / n;
      sum += power(ReferenceVertical.perfectGainDbi(elevation)) * Math.cos(elevation);
    }
    // mean over the whole sphere, of which the lower half gets nothing
    assertEquals(1, sum * Math.PI / 2 / n / 2, 1e-5);
  }

  @Test
  void over_soil_less_than_all_of_it_does() {
    int n = 2000;
    double sum = 0;
    for (int k = 0; k < n; k++) {
      double elevation = Math.PI / 2 * (k + 0.5) / n;
      sum += power(ReferenceVertical.gainDbi(elevation, 7.1, 13, 0.005)) * Math.cos(elevation);
    }
    double share = sum * Math.PI / 2 / n / 2;
    assertTrue(share > 0.2 && share < 0.6, "share " + share);
  }

  @Test
  void excellent_conductivity_comes_to_the_perfect_conductor() {
    double perfect = ReferenceVertical.perfectGainDbi(0.3);
    assertEquals(perfect, ReferenceVertical.gainDbi(0.3, 7.1, 13, 1e9), 1e-3);
  }

  @Test
  void the_mean_over_a_window_is_the_mean_of_power() {
    Window window = new Window(Layer.F2, 2, 3, 12.5);
    int n = 5000;
    double sum = 0;
    for (int k = 0; k < n; k++) {
      double elevation = Math.toRadians(3 + 9.5 * (k + 0.5) / n);
      sum += power(ReferenceVertical.gainDbi(elevation, 14.175, 13, 0.005));
    }
    double mean = 10 * Math.log10(sum / n);
    assertEquals(mean, ReferenceVertical.meanDbi(window, 14.175, 13, 0.005), 0.01);
  }

  @Test
  void straight_up_and_along_real_soil_there_is_nothing_and_no_infinity() {
    double zenith = ReferenceVertical.gainDbi(Math.PI / 2, 7.1, 13, 0.005);
    assertEquals(ReferenceVertical.NOTHING_DBI, zenith);
    assertEquals(ReferenceVertical.NOTHING_DBI, ReferenceVertical.gainDbi(0, 7.1, 13, 0.005));
  }

  @Test
  void the_whole_arch_stays_continuous_near_the_zenith() {
    double last = ReferenceVertical.gainDbi(Math.toRadians(89), 7.1, 13, 0.005);
    for (double degrees = 89.01; degrees < 89.9; degrees += 0.01) {
      double next = ReferenceVertical.gainDbi(Math.toRadians(degrees), 7.1, 13, 0.005);
      assertTrue(next < last && last - next < 1, "at " + degrees);
      last = next;
    }
  }
}
