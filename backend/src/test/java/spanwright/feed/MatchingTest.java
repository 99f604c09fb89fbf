package spanwright.feed;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;

/** A unit's choice against a ladder worked out apart and against trying every setting. */
class MatchingTest {
  private static final MatchingNetwork L_UNIT = unit(MatchingNetwork.Kind.L, 3000);
  private static final MatchingNetwork T_UNIT = unit(MatchingNetwork.Kind.T, 3000);

  private static MatchingNetwork unit(MatchingNetwork.Kind kind, double peakVolts) {
    return new MatchingNetwork(kind, 0, 3e-5, 1e-11, 5e-10, 150, 1000, peakVolts);
  }

  private static Match match(Complex load, double mhz, MatchingNetwork unit) {
    return Matching.match(load, mhz, unit, 100);
  }

  /** Power, voltages and impedance through a ladder of parts, from the load back. */
  private static final class Ladder {
    private Complex volt;
    private Complex amp;
    private final double out;
    private double largest;

    private Ladder(Complex load) {
      volt = load;
      amp = Complex.ONE;
      out = load.getReal();
    }

    private void series(Complex z) {
      Complex drop = amp.multiply(z);
      largest = Math.max(largest, drop.abs());
      volt = volt.add(drop);
    }

    private void across(Complex z) {
      largest = Math.max(largest, volt.abs());
      amp = amp.add(volt.divide(z));
    }

    private double in() {
      return volt.multiply(amp.conjugate()).getReal();
    }

    private double swr() {
      return FeedChain.swr(volt.divide(amp), 50);
    }

    private double lossDb() {
      return 10 * Math.log10(in() / out);
    }

    private double peakVolts(double power) {
      return largest * Math.sqrt(2 * power / in());
    }

    private Verdict state(MatchingNetwork unit) {
      return Judgement.ofSwr(swr())
          .worse(Judgement.ofLoss(lossDb()))
          .worse(Judgement.ofVolts(peakVolts(100), unit.peakVolts()));
    }

    /** The state, then loss with mismatch. */
    private double cost(MatchingNetwork unit) {
      double swr = swr();
      double r = (swr - 1) / (swr + 1);
      return 1000 * state(unit).ordinal() + lossDb() - 10 * Math.log10(1 - r * r);
    }
  }

  private static Complex coil(MatchingNetwork unit, double mhz, double henries) {
    double x = 2e6 * Math.PI * mhz * henries;
    return new Complex(x / unit.coilQ(), x);
  }

  private static Complex capacitor(MatchingNetwork unit, double mhz, double farads) {
    double x = 1 / (2e6 * Math.PI * mhz * farads);
    return new Complex(x / unit.capacitorQ(), -x);
  }

  private static Ladder ladder(
      Complex load, double mhz, MatchingNetwork unit, Match.Settings settings) {
    Ladder ladder = new Ladder(load);
    Complex coil = coil(unit, mhz, settings.inductance());
    Complex capacitor = capacitor(unit, mhz, settings.capacitance());
    if (settings.secondCapacitance() != null) {
      ladder.series(capacitor(unit, mhz, settings.secondCapacitance()));
      ladder.across(coil);
      ladder.series(capacitor);
      return ladder;
    }
    boolean atLine = settings.layout().endsWith("line's side");
    boolean coilInSeries = settings.layout().startsWith("coil in series");
    Complex series = coilInSeries ? coil : capacitor;
    Complex across = coilInSeries ? capacitor : coil;
    if (atLine) {
      ladder.across(across);
      ladder.series(series);
    } else {
      ladder.series(series);
      ladder.across(across);
    }
    return ladder;
  }

  private static Complex randomLoad(Random random) {
    double r = Math.pow(10, 0.3 + 3.3 * random.nextDouble());
    double x = (random.nextBoolean() ? 1 : -1) * Math.pow(10, 4 * random.nextDouble());
    return new Complex(r, x);
  }

  private static double band(Random random) {
    double[] bands = {1.85, 3.65, 7.1, 10.12, 14.175, 21.2, 28.4};
    return bands[random.nextInt(bands.length)];
  }

  @Test
  void settings_lie_in_the_ranges_and_do_what_is_said_of_them() {
    Random random = new Random(17);
    for (int k = 0; k < 4000; k++) {
      MatchingNetwork unit = k % 2 == 0 ? L_UNIT : T_UNIT;
      Complex load = randomLoad(random);
      double mhz = band(random);
      Match found = match(load, mhz, unit);
      Match.Settings settings = found.settings();
      inRange(settings.inductance(), unit.leastInductance(), unit.mostInductance());
      inRange(settings.capacitance(), unit.leastCapacitance(), unit.mostCapacitance());
      if (settings.secondCapacitance() != null) {
        inRange(settings.secondCapacitance(), unit.leastCapacitance(), unit.mostCapacitance());
      }
      Ladder ladder = ladder(load, mhz, unit, settings);
      String what = load + " at " + mhz + ": " + found;
      assertEquals(ladder.swr(), found.swr(), 1e-5 * ladder.swr(), what);
      assertEquals(ladder.lossDb(), found.lossDb(), 1e-7, what);
      assertEquals(ladder.peakVolts(100), found.peakVolts(), 1e-6 * found.peakVolts(), what);
    }
  }

  private static void inRange(double value, double least, double most) {
    assertTrue(value >= least * (1 - 1e-8) && value <= most * (1 + 1e-8), "setting " + value);
  }

  /** Trying every setting may find a little less loss, since it may leave some SWR standing. */
  private static void assertNoBetter(
      double least, Match found, Complex load, double mhz, MatchingNetwork unit) {
    Ladder ours = ladder(load, mhz, unit, found.settings());
    String what = load + " at " + mhz + " MHz: " + found + ", tried " + least;
    assertEquals(ours.state(unit), found.state(), what);
    assertTrue(found.state().ordinal() <= (int) (least / 1000), what);
    if (found.state() == Verdict.CLEAR) {
      assertTrue(ours.cost(unit) <= least + 0.05, what);
    }
  }

  @Test
  void no_setting_of_an_L_tried_one_by_one_is_better() {
    Random random = new Random(18);
    String[] layouts = {
      "coil in series, at line's side", "coil in series, at transmitter's side",
      "capacitor in series, at line's side", "capacitor in series, at transmitter's side"
    };
    int n = 120;
    for (int k = 0; k < 100; k++) {
      Complex load = randomLoad(random);
      double mhz = band(random);
      double least = Double.POSITIVE_INFINITY;
      for (String layout : layouts) {
        for (int i = 0; i <= n; i++) {
          double henries = i == 0 ? 1e-12 : 3e-5 * Math.pow(1e-4, 1 - (double) i / n);
          for (int j = 0; j <= n; j++) {
            double farads = 1e-11 * Math.pow(50, (double) j / n);
            Match.Settings settings = new Match.Settings(layout, henries, farads, null);
            least = Math.min(least, ladder(load, mhz, L_UNIT, settings).cost(L_UNIT));
          }
        }
      }
      assertNoBetter(least, match(load, mhz, L_UNIT), load, mhz, L_UNIT);
    }
  }

  @Test
  void no_setting_of_a_T_tried_one_by_one_is_better() {
    Random random = new Random(19);
    int n = 50;
    for (int k = 0; k < 40; k++) {
      Complex load = randomLoad(random);
      double mhz = band(random);
      double least = Double.POSITIVE_INFINITY;
      for (int i = 0; i <= n; i++) {
        double henries = 3e-5 * Math.pow(1e-3, 1 - (double) i / n);
        for (int j = 0; j <= n; j++) {
          double farads = 1e-11 * Math.pow(50, (double) j / n);
          for (int m = 0; m <= n; m++) {
            double second = 1e-11 * Math.pow(50, (double) m / n);
            Match.Settings settings = new Match.Settings("", henries, farads, second);
            least = Math.min(least, ladder(load, mhz, T_UNIT, settings).cost(T_UNIT));
          }
        }
      }
      assertNoBetter(least, match(load, mhz, T_UNIT), load, mhz, T_UNIT);
    }
  }

  @Test
  void every_exact_match_shows_the_target_and_passes_all_power_without_loss() {
    Random random = new Random(20);
    MatchingNetwork ideal = new MatchingNetwork(MatchingNetwork.Kind.L, 0, 1, 0, 1, 1e15, 1e15, 0);
    int matches = 0;
    for (int k = 0; k < 5000; k++) {
      Complex load = randomLoad(random);
      for (LSection section : Matching.layouts(load, band(random), ideal, 50)) {
        double[] exact = section.exact();
        for (int n = 0; n < exact.length; n += 2) {
          LSection.Setting found = section.setting(exact[n], exact[n + 1], 100);
          assertEquals(0, found.reflection(), 1e-9);
          assertEquals(1, found.powerIn() / found.powerOut(), 1e-9);
          matches++;
        }
      }
    }
    assertTrue(matches >= 10_000, "every load has two matches at least: " + matches);
  }

  @Test
  void the_same_question_gets_the_same_answer_bit_for_bit() {
    Complex load = new Complex(31, -477);
    assertEquals(match(load, 3.65, T_UNIT), match(load, 3.65, T_UNIT));
    assertEquals(match(load, 3.65, L_UNIT), match(load, 3.65, L_UNIT));
  }

  @Test
  void an_easy_load_is_clear_and_says_what_it_loses() {
    Match found = match(new Complex(150, 60), 7.1, L_UNIT);
    assertEquals(Verdict.CLEAR, found.state());
    assertTrue(found.why().startsWith("matches to SWR 1.0, losing 0."), found.why());
    assertEquals(1, found.swr(), 1e-9);
  }

  @Test
  void a_load_that_needs_no_matching_is_left_almost_alone() {
    Match found = match(new Complex(50, 0), 7.1, L_UNIT);
    assertEquals(Verdict.CLEAR, found.state());
    assertTrue(found.lossDb() < 0.01 && found.swr() < 1.05, found::toString);
  }

  @Test
  void the_part_that_runs_out_is_named_with_what_a_match_wants() {
    MatchingNetwork small =
        new MatchingNetwork(MatchingNetwork.Kind.L, 0, 3e-5, 1e-11, 1e-10, 150, 1000, 0);
    Match found = match(new Complex(12, 5), 1.85, small);
    assertEquals(Verdict.FOUL, found.state());
    assertTrue(found.why().startsWith("its capacitor runs out (a match wants "), found.why());
    assertTrue(found.why().contains("it goes up to 100 pF"), found.why());
    MatchingNetwork short_ =
        new MatchingNetwork(MatchingNetwork.Kind.L, 0, 1e-6, 1e-11, 1e-9, 150, 1000, 0);
    String why = match(new Complex(200, 1500), 3.65, short_).why();
    assertTrue(why.contains("coil"), why);
  }

  @Test
  void volts_over_what_the_parts_stand_are_foul_and_near_it_tight() {
    Complex load = new Complex(4000, 0);
    double volts = match(load, 7.1, unit(MatchingNetwork.Kind.L, 0)).peakVolts();
    Match over = match(load, 7.1, unit(MatchingNetwork.Kind.L, 0.5 * volts));
    assertEquals(Verdict.FOUL, over.state());
    assertTrue(over.why().contains("volts over what its parts stand"), over.why());
    Match near = match(load, 7.1, unit(MatchingNetwork.Kind.L, 1.02 * volts));
    assertEquals(Verdict.TIGHT, near.state());
    assertTrue(near.why().contains("volts near what its parts stand"), near.why());
  }

  @Test
  void a_match_that_heats_the_coil_is_foul() {
    Match found = match(new Complex(0.5, -400), 3.65, unit(MatchingNetwork.Kind.L, 0));
    assertEquals(Verdict.FOUL, found.state());
    assertTrue(found.why().contains("dB would heat its parts"), found.why());
    Match nothing = match(new Complex(0, -400), 3.65, unit(MatchingNetwork.Kind.L, 0));
    assertEquals(Verdict.FOUL, nothing.state());
    assertTrue(nothing.why().contains("takes next to no power"), nothing.why());
    assertEquals(Double.POSITIVE_INFINITY, nothing.lossDb());
  }

  @Test
  void odd_units_and_loads_never_give_a_figure_that_is_no_number() {
    double[][] ranges = {
      {0, 3e-5, 0, 5e-10},
      {0, 0, 1e-11, 5e-10},
      {0, 3e-5, 0, 0},
      {0, 0, 0, 0},
      {5e-6, 5e-6, 1e-10, 1e-10},
      {0, 1, 0, 1}
    };
    Complex[] loads = {
      Complex.ZERO,
      new Complex(50, 0),
      new Complex(0, 300),
      new Complex(0, -300),
      new Complex(1e9, 0),
      new Complex(1e-6, 1e9),
      new Complex(3, -2000)
    };
    for (double[] r : ranges) {
      for (Complex load : loads) {
        for (MatchingNetwork.Kind kind : MatchingNetwork.Kind.values()) {
          MatchingNetwork unit = new MatchingNetwork(kind, r[0], r[1], r[2], r[3], 150, 1000, 3000);
          Match found = match(load, 7.1, unit);
          String what = unit + " on " + load + ": " + found;
          assertTrue(found.lossDb() >= 0 && found.swr() >= 1, what);
          assertTrue(found.peakVolts() >= 0 && found.peakAmps() >= 0, what);
          assertTrue(!found.why().isBlank() && !found.why().contains("NaN"), what);
        }
      }
    }
  }

  @Test
  void a_balun_is_judged_by_the_swr_on_50_ohm() {
    MatchingNetwork balun = MatchingNetwork.balun(3000);
    assertEquals(Verdict.CLEAR, match(new Complex(95, 0), 7.1, balun).state());
    assertEquals(Verdict.TIGHT, match(new Complex(140, 0), 7.1, balun).state());
    Match foul = match(new Complex(160, 0), 7.1, balun);
    assertEquals(Verdict.FOUL, foul.state());
    assertEquals("a balun matches nothing; SWR 3.2 on 50 ohm", foul.why());
    assertEquals(0, foul.lossDb());
    Match volts = match(new Complex(60, 0), 7.1, MatchingNetwork.balun(100));
    assertEquals(Verdict.FOUL, volts.state());
    assertTrue(volts.why().contains("volts over"), volts.why());
  }

  @Test
  void a_larger_output_capacitor_of_a_T_loses_less_on_low_resistances() {
    double last = 0;
    for (double most = 5e-10; most > 6e-11; most /= 1.3) {
      MatchingNetwork unit =
          new MatchingNetwork(MatchingNetwork.Kind.T, 0, 3e-5, 1e-11, most, 200, 1e12, 0);
      double loss = match(new Complex(10, 0), 7.1, unit).lossDb();
      assertTrue(loss > last, "loss " + loss + " with up to " + most);
      last = loss;
    }
  }
}
