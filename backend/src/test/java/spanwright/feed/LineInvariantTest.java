package spanwright.feed;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;

/** What must hold on any line, with seeded random loads and lines. */
class LineInvariantTest {
  private final Random random = new Random(61);

  private Complex load() {
    double r = Math.pow(10, -1 + 5 * random.nextDouble());
    double x = (random.nextBoolean() ? 1 : -1) * Math.pow(10, -1 + 5 * random.nextDouble());
    return new Complex(r, x);
  }

  private Line line() {
    double z = 25 + 600 * random.nextDouble();
    double vf = 0.6 + 0.4 * random.nextDouble();
    double k1 = random.nextBoolean() ? 0 : 2 * random.nextDouble();
    double k2 = random.nextBoolean() ? 0 : 0.2 * random.nextDouble();
    double fixed = random.nextBoolean() ? 0 : 10 * random.nextDouble();
    return new Line(z, vf, k1, k2, fixed, 0);
  }

  private double mhz() {
    return 1.8 + 28 * random.nextDouble();
  }

  /** Voltage and current at z from the load, by the library's complex functions. */
  private static Complex[] at(Complex load, LineConstants line, double z) {
    Complex gamma = new Complex(line.attenuation(), line.phase()).multiply(z);
    Complex volt = load.multiply(gamma.cosh()).add(line.impedance().multiply(gamma.sinh()));
    Complex amp = gamma.cosh().add(load.divide(line.impedance()).multiply(gamma.sinh()));
    return new Complex[] {volt, amp};
  }

  private static double power(Complex[] at) {
    return at[0].multiply(at[1].conjugate()).getReal();
  }

  @Test
  void the_hyperbolic_equations_in_a_librarys_complex_functions_agree() {
    for (int k = 0; k < 5000; k++) {
      Complex load = load();
      Line line = line();
      double mhz = mhz();
      double length = 60 * random.nextDouble();
      Complex[] end = at(load, line.at(mhz), length);
      FeedResult found = FeedChain.run(load, mhz, line, length, null, 100);
      Complex z = end[0].divide(end[1]);
      assertTrue(z.subtract(found.atStation()).abs() <= 1e-7 * z.abs(), "case " + k);
      double loss = 10 * Math.log10(power(end) / load.getReal());
      assertEquals(loss, found.lossDb(), 1e-6 * (1 + found.lineSwr() / 1e3), "case " + k);
    }
  }

  @Test
  void the_telegraphers_equations_integrated_step_by_step_agree() {
    for (int k = 0; k < 20; k++) {
      Complex load = load();
      Line line = line();
      double mhz = mhz();
      double length = 30 * random.nextDouble();
      LineConstants constants = line.at(mhz);
      Complex gamma = new Complex(constants.attenuation(), constants.phase());
      Complex series = gamma.multiply(constants.impedance());
      Complex shunt = gamma.divide(constants.impedance());
      Complex volt = load;
      Complex amp = Complex.ONE;
      int n = 20_000;
      double step = length / n;
      for (int s = 0; s < n; s++) { // midpoint rule
        Complex midVolt = volt.add(series.multiply(amp).multiply(step / 2));
        Complex midAmp = amp.add(shunt.multiply(volt).multiply(step / 2));
        volt = volt.add(series.multiply(midAmp).multiply(step));
        amp = amp.add(shunt.multiply(midVolt).multiply(step));
      }
      double loss = 10 * Math.log10(power(new Complex[] {volt, amp}) / load.getReal());
      double found = FeedChain.run(load, mhz, line, length, null, 100).lossDb();
      assertEquals(loss, found, 0.002 * (1 + found), "case " + k);
    }
  }

  @Test
  void the_largest_volts_and_amps_are_those_of_dense_sampling() {
    for (int k = 0; k < 600; k++) {
      Complex load = load();
      Line line = line();
      double mhz = mhz();
      double length = 80 * random.nextDouble() * random.nextDouble();
      LineConstants constants = line.at(mhz);
      double scale = Math.sqrt(2 * 100 / power(at(load, constants, length)));
      double volts = 0;
      double amps = 0;
      int n = 4000;
      for (int s = 0; s <= n; s++) {
        Complex[] there = at(load, constants, length * s / n);
        volts = Math.max(volts, scale * there[0].abs());
        amps = Math.max(amps, scale * there[1].abs());
      }
      FeedResult found = FeedChain.run(load, mhz, line, length, null, 100);
      assertTrue(found.peakVolts() >= volts * (1 - 1e-8), "volts missed in case " + k);
      assertTrue(found.peakAmps() >= amps * (1 - 1e-8), "amps missed in case " + k);
      assertEquals(volts, found.peakVolts(), 2e-3 * volts, "case " + k);
      assertEquals(amps, found.peakAmps(), 2e-3 * amps, "case " + k);
    }
  }

  @Test
  void a_line_cut_in_two_is_the_same_line() {
    for (int k = 0; k < 2000; k++) {
      Complex load = load();
      Line line = line();
      double mhz = mhz();
      double one = 30 * random.nextDouble();
      double other = 30 * random.nextDouble();
      FeedResult whole = FeedChain.run(load, mhz, line, one + other, null, 100);
      FeedResult near = FeedChain.run(load, mhz, line, one, null, 100);
      FeedResult far = FeedChain.run(near.atStation(), mhz, line, other, null, 100);
      double size = whole.atStation().abs();
      assertTrue(far.atStation().subtract(whole.atStation()).abs() < 1e-6 * size, "case " + k);
      assertEquals(whole.lossDb(), near.lossDb() + far.lossDb(), 1e-6 * (1 + whole.lossDb()));
    }
  }

  @Test
  void a_line_without_loss_passes_all_power() {
    for (int k = 0; k < 5000; k++) {
      Line line = Line.ofLoss(50 + 500 * random.nextDouble(), 0.9, 0);
      Complex load =
          new Complex(1 + 3000 * random.nextDouble(), 6000 * (random.nextDouble() - 0.5));
      FeedResult found = FeedChain.run(load, mhz(), line, 40 * random.nextDouble(), null, 100);
      assertEquals(1, Math.pow(10, found.lossDb() / 10), 1e-9);
    }
  }

  @Test
  void a_lossy_line_never_gains_and_standing_waves_never_help_a_real_impedance() {
    for (int k = 0; k < 5000; k++) {
      Complex load = load();
      double length = 60 * random.nextDouble();
      assertTrue(FeedChain.run(load, mhz(), line(), length, null, 1).lossDb() >= 0);
      Line real = Line.ofLoss(50, 0.66, 10 * random.nextDouble());
      FeedResult found = FeedChain.run(load, mhz(), real, length, null, 1);
      assertTrue(found.lossDb() >= found.matchedLossDb() - 1e-9 * (1 + found.lineSwr()));
    }
  }

  @Test
  void swr_is_the_same_for_an_impedance_and_its_inverse() {
    for (int k = 0; k < 1000; k++) {
      Complex load = load();
      double swr = FeedChain.swr(load, 50);
      assertEquals(swr, FeedChain.swr(load.reciprocal().multiply(2500), 50), 1e-9 * swr);
      double reflection = load.subtract(50).divide(load.add(50)).abs();
      assertEquals((swr - 1) / (swr + 1), reflection, 1e-9);
    }
  }
}
