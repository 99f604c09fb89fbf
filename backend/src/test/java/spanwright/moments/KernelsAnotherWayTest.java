package spanwright.moments;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Random;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;

/**
 * The kernels at random places against a quadrature that shares no line with theirs: another path
 * (half an ellipse over the branch points, then the real axis), another rule (double exponential,
 * doubled until nothing moves), Bessel functions by Bessel's integral, and the reflection
 * coefficients in their textbook form.
 */
class KernelsAnotherWayTest {
  private static final double TOLERANCE = 1e-6;

  @Test
  void kernels_agree_with_another_path_and_rule_at_random_places() {
    Random random = new Random(31);
    double[][] soils = {{3, 1e-4}, {5, 0.001}, {13, 0.005}, {20, 0.03}, {80, 5}, {4, 0}};
    for (double[] soil : soils) {
      for (int i = 0; i < 3; i++) {
        double mhz = 1.8 * Math.pow(30, random.nextDouble());
        double zeta = 0.6 * Math.pow(40, random.nextDouble());
        double rho = 6 * zeta * random.nextDouble();
        double[] found = HalfSpaceKernels.of(Ground.real(soil[0], soil[1]), mhz).at(rho, zeta);
        double[] other = new Another(soil, mhz, rho, zeta).kernels();
        for (int c = 0; c < other.length; c++) {
          String where = c + ": " + soil[0] + ", " + soil[1] + " S/m, " + mhz + " MHz, " + rho;
          assertEquals(other[c], found[c], TOLERANCE, where + " m, " + zeta + " m");
        }
      }
    }
  }

  /** One place, the other way. */
  private static final class Another {
    private static final double LIGHT = 299_792_458.0;
    private final double k0;
    private final Complex eps;
    private final double rho;
    private final double zeta;

    Another(double[] soil, double mhz, double rho, double zeta) {
      double omega = 2e6 * Math.PI * mhz;
      k0 = omega / LIGHT;
      eps = new Complex(soil[0], -soil[1] / (omega * 8.8541878128e-12));
      this.rho = rho;
      this.zeta = zeta;
    }

    double[] kernels() {
      // an arch from 0 over both branch points, then on along the real axis
      double end = 1.4 * Math.max(k0, eps.sqrt().getReal() * k0);
      end = Math.min(end, k0 * 1.5 + 30 / zeta);
      double height = Math.min(0.5 * k0, 3 / Math.max(rho, 1e-3));
      double last = end + 28 / zeta;
      double[] before = null;
      for (int n = 400; n <= 102_400; n *= 2) {
        double[] sum = new double[10];
        arch(end, height, n, sum);
        tail(end, last, n, sum);
        if (before != null && apart(before, sum) < 1e-8) {
          return sum;
        }
        before = sum;
      }
      throw new AssertionError("no convergence at " + rho + ", " + zeta);
    }

    private static double apart(double[] a, double[] b) {
      double worst = 0;
      for (int i = 0; i < a.length; i++) {
        worst = Math.max(worst, Math.abs(a[i] - b[i]));
      }
      return worst;
    }

    /** λ = end·(1 − cos t)/2 + j·height·sin t; its speed vanishes nowhere but at the ends. */
    private void arch(double end, double height, int n, double[] sum) {
      doubleExponential(
          n,
          (s, w) -> {
            double t = Math.PI * s;
            Complex at = new Complex(0.5 * end * (1 - Math.cos(t)), height * Math.sin(t));
            Complex speed = new Complex(0.5 * end * Math.sin(t), height * Math.cos(t));
            add(at, speed.multiply(Math.PI * w), sum);
          });
    }

    private void tail(double from, double to, int n, double[] sum) {
      doubleExponential(
          n, (s, w) -> add(new Complex(from + s * (to - from)), new Complex(w * (to - from)), sum));
    }

    private interface Point {
      void at(double s, double weight);
    }

    /** Takahasi and Mori's rule on 0..1. */
    private static void doubleExponential(int n, Point point) {
      double reach = 3.2;
      double step = 2 * reach / n;
      for (int i = 0; i <= n; i++) {
        double t = -reach + step * i;
        double a = 0.5 * Math.PI * Math.sinh(t);
        double s = 1 / (1 + Math.exp(-2 * a));
        double c = Math.cosh(a);
        double weight = step * 0.25 * Math.PI * Math.cosh(t) / (c * c);
        point.at(s, weight);
      }
    }

    private void add(Complex l, Complex measure, double[] sum) {
      Complex l2 = l.multiply(l);
      Complex g0 = root(l2.subtract(k0 * k0));
      Complex g1 = root(l2.subtract(eps.multiply(k0 * k0)));
      Complex te = g0.subtract(g1).divide(g0.add(g1));
      Complex tm = eps.multiply(g0).subtract(g1).divide(eps.multiply(g0).add(g1));
      Complex w = eps.subtract(1).multiply(2).divide(g0.add(g1).multiply(eps.multiply(g0).add(g1)));
      Complex[] j = bessel(l.multiply(rho));
      Complex fall = g0.multiply(-zeta).exp().multiply(measure);
      Complex s = fall.multiply(j[0]).multiply(l).divide(g0);
      Complex g02 = g0.multiply(g0);
      put(0, te.multiply(s), sum);
      put(1, w.multiply(k0 * k0).subtract(tm).multiply(s), sum);
      put(2, tm.add(g02.multiply(w)).multiply(s), sum);
      put(3, w.multiply(l2).multiply(fall).multiply(j[1]), sum);
      put(4, tm.multiply(s), sum);
    }

    private static void put(int m, Complex value, double[] sum) {
      sum[2 * m] += value.getReal();
      sum[2 * m + 1] += value.getImaginary();
    }

    private static Complex root(Complex z) {
      Complex r = z.sqrt();
      return r.getReal() < 0 ? r.negate() : r;
    }

    /** J0 and J1 by Bessel's integral; trapezes of a periodic function converge at once. */
    private static Complex[] bessel(Complex z) {
      int n = 24 + (int) (1.2 * z.abs());
      Complex zero = Complex.ZERO;
      Complex one = Complex.ZERO;
      for (int i = 0; i < n; i++) {
        double t = Math.PI * (i + 0.5) / n;
        Complex a = z.multiply(Math.sin(t));
        zero = zero.add(a.cos());
        one = one.add(a.sin().multiply(Math.sin(t)));
      }
      return new Complex[] {zero.divide(n), one.divide(n)};
    }
  }
}
