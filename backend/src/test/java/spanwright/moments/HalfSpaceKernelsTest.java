package spanwright.moments;

import static org.junit.jupiter.api.Assertions.assertEquals;

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
    double[] straight =
        kernels.grid(new double[] {0.5, 3.5}, new double[] {zeta}, HalfSpaceKernels.Care.FULL);
    double[] turned = kernels.at(3.5, zeta);
    for (int c = 0; c < 10; c++) {
      assertEquals(straight[10 + c], turned[c], 2e-9);
    }
  }

  @Test
  void bessel_functions_agree_with_the_library_on_the_axis_and_join_at_the_border() {
    int count = 163;
    ComplexBessel bessel = new ComplexBessel(count);
    double[] x = new double[count];
    double[] y = new double[count];
    for (int i = 0; i < count; i++) {
      x[i] = 0.1 + 0.37 * i;
    }
    bessel.regular(x, y, count);
    for (int i = 0; i < count; i++) {
      assertEquals(BesselJ.value(0, x[i]), bessel.re[0][i], 2e-11);
      assertEquals(BesselJ.value(1, x[i]), bessel.re[1][i], 2e-11);
      assertEquals(0, bessel.im[0][i], 2e-11);
    }
    double border = Math.sqrt(ComplexBessel.BORDER * ComplexBessel.BORDER - 9);
    double[] two = {border - 1e-9, border + 1e-9};
    bessel.regular(two, new double[] {3, 3}, 2);
    for (int order = 0; order < 2; order++) {
      assertEquals(bessel.re[order][0], bessel.re[order][1], 1e-7);
      assertEquals(bessel.im[order][0], bessel.im[order][1], 1e-7);
    }
  }
}
