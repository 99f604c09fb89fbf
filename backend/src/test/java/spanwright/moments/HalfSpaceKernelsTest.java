package spanwright.moments;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.apache.commons.math3.special.BesselJ;
import org.junit.jupiter.api.Test;

class HalfSpaceKernelsTest {
  private static final double[][] PLACES = {
    {0, 0.6}, {0.05, 3}, {2, 5}, {40, 0.7}, {40, 12}, {75, 0.3}, {3, 30}
  };

  @Test
  void earth_that_is_air_reflects_nothing() {
    HalfSpaceKernels kernels = HalfSpaceKernels.of(Ground.real(1, 0), 14);
    for (double[] p : PLACES) {
      for (double v : kernels.at(p[0], p[1])) {
        assertEquals(0, v, 1e-9);
      }
    }
  }

  @Test
  void earth_that_conducts_without_limit_gives_plain_images() {
    double k = Constants.waveNumber(14);
    HalfSpaceKernels kernels = new HalfSpaceKernels(k, 1, -1e14);
    double[] sign = {-1, -1, 1, 0, 1};
    for (double[] p : PLACES) {
      double r = Math.hypot(p[0], p[1]);
      double[] found = kernels.at(p[0], p[1]);
      for (int m = 0; m < 5; m++) {
        assertEquals(sign[m] * Math.cos(k * r) / r, found[2 * m], 3e-6 / r);
        assertEquals(-sign[m] * Math.sin(k * r) / r, found[2 * m + 1], 3e-6 / r);
      }
    }
  }

  @Test
  void the_static_limit_is_the_charge_image() {
    // at 0.1 MHz and half a metre the earth acts by its complex permittivity alone
    double k = Constants.waveNumber(0.1);
    double[] found = new HalfSpaceKernels(k, 9, 0).at(0.3, 0.4);
    assertEquals(-0.8 / 0.5, found[2], 1e-4);
  }

  /** The turned path and the straight one have only the integrand in common. */
  @Test
  void the_turned_path_joins_the_straight_one() {
    HalfSpaceKernels kernels = HalfSpaceKernels.of(Ground.real(5, 0.001), 21);
    double zeta = 1.0;
    // a grid with a small first rho goes straight; a single far rho turns
    double[] straight = kernels.grid(new double[] {0.5, 3.5}, new double[] {zeta});
    double[] turned = kernels.at(3.5, zeta);
    for (int c = 0; c < 10; c++) {
      assertEquals(straight[10 + c], turned[c], 2e-9);
    }
  }

  @Test
  void a_table_finds_what_the_quadrature_finds() {
    Random random = new Random(11);
    double[][] grounds = {{13, 0.005, 3.6}, {5, 0.001, 28.5}, {20, 0.03, 14.2}, {81, 5, 7.1}};
    double[] out = new double[3 * Reflection.ALL];
    double[] eight = new double[Reflection.RATIOS];
    for (double[] g : grounds) {
      Ground ground = Ground.real(g[0], g[1]);
      GroundTable table = new GroundTable(ground, g[2]);
      HalfSpaceKernels kernels = HalfSpaceKernels.of(ground, g[2]);
      double k = Constants.waveNumber(g[2]);
      for (int i = 0; i < 60; i++) {
        double rho = 80 * random.nextDouble() * random.nextDouble();
        double zeta = 0.6 * Math.pow(50, random.nextDouble());
        double r = Math.hypot(rho, zeta);
        table.ratios(rho, zeta, eight);
        table.ratiosAndSlopes(rho, zeta, out);
        double[] exact = kernels.at(rho, zeta);
        for (int m = 0; m < 5; m++) {
          double re = (out[2 * m] * Math.cos(k * r) + out[2 * m + 1] * Math.sin(k * r)) / r;
          double im = (out[2 * m + 1] * Math.cos(k * r) - out[2 * m] * Math.sin(k * r)) / r;
          assertTrue(Math.hypot(re - exact[2 * m], im - exact[2 * m + 1]) * r < 2e-4);
          if (m < 4) {
            assertEquals(out[2 * m], eight[2 * m], 1e-4);
          }
        }
      }
    }
  }

  @Test
  void a_tables_slopes_are_those_of_its_values() {
    GroundTable table = new GroundTable(Ground.real(13, 0.005), 14);
    double[] at = new double[3 * Reflection.ALL];
    double[] up = new double[3 * Reflection.ALL];
    double step = 1e-5;
    table.ratiosAndSlopes(3.3, 5.1, at);
    table.ratiosAndSlopes(3.3 + step, 5.1, up);
    for (int m = 0; m < Reflection.ALL; m++) {
      assertEquals((up[m] - at[m]) / step, at[Reflection.ALL + m], 1e-5);
    }
    table.ratiosAndSlopes(3.3, 5.1 + step, up);
    for (int m = 0; m < Reflection.ALL; m++) {
      assertEquals((up[m] - at[m]) / step, at[2 * Reflection.ALL + m], 1e-5);
    }
  }

  @Test
  void a_plots_table_is_small_and_quick() {
    GroundTable table = new GroundTable(Ground.real(13, 0.005), 14);
    table.fill(80, 0.6, 30);
    assertTrue(table.bytes() < 400_000, "bytes " + table.bytes());
  }

  @Test
  void tables_stay_within_their_memory() {
    GroundTables tables = new GroundTables(200_000);
    for (int i = 0; i < 12; i++) {
      tables.prepare(new double[] {3 + i}, Ground.real(13, 0.005), 40, 3, 12, 2);
    }
    assertTrue(tables.bytes() < 400_000, "bytes " + tables.bytes());
    assertThrows(
        ModelFault.class,
        () -> tables.prepare(new double[] {3}, Ground.real(13, 0.005), 40, 0, 12, 2));
  }

  @Test
  void bessel_functions_agree_with_the_library_on_the_axis_and_join_at_the_border() {
    double[] out = new double[4];
    for (double x = 0.1; x < 60; x += 0.37) {
      ComplexBessel.regular(x, 0, out, 0);
      assertEquals(BesselJ.value(0, x), out[0], 2e-11);
      assertEquals(BesselJ.value(1, x), out[2], 2e-11);
      assertEquals(0, out[1], 2e-11);
    }
    double[] below = new double[4];
    double x = Math.sqrt(ComplexBessel.BORDER * ComplexBessel.BORDER - 9);
    ComplexBessel.regular(x - 1e-9, 3, below, 0);
    ComplexBessel.regular(x + 1e-9, 3, out, 0);
    for (int i = 0; i < 4; i++) {
      assertEquals(below[i], out[i], 1e-7);
    }
  }
}
