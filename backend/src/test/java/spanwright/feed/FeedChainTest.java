package spanwright.feed;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;

class FeedChainTest {
  private static final Line OPEN_WIRE = Line.of(400, 0.91, 0.12, 0.005);

  private static FeedResult run(Complex load, Line line, double length) {
    return FeedChain.run(load, 7.1, line, length, null, 100);
  }

  @Test
  void a_line_of_no_length_changes_nothing() {
    Complex load = new Complex(35, -410);
    FeedResult found = run(load, OPEN_WIRE, 0);
    assertEquals(0, found.lossDb());
    assertEquals(0, found.matchedLossDb());
    assertEquals(35, found.atStation().getReal(), 1e-12);
    assertEquals(-410, found.atStation().getImaginary(), 1e-12);
    assertEquals(Math.sqrt(2 * 100 / 35.0), found.peakAmps(), 1e-12);
    assertEquals(load.abs() * Math.sqrt(2 * 100 / 35.0), found.peakVolts(), 1e-9);
    assertNull(found.matching());
  }

  @Test
  void a_matched_line_loses_its_matched_loss_and_shows_its_impedance() {
    FeedResult found = run(new Complex(400, 0), Line.ofLoss(400, 0.91, 0.3), 50);
    assertEquals(1, found.lineSwr(), 1e-12);
    assertEquals(0.15, found.matchedLossDb(), 1e-12);
    assertEquals(0.15, found.lossDb(), 1e-12);
    assertEquals(400, found.atStation().getReal(), 1e-9);
    assertEquals(Math.sqrt(2 * 100 * 400), found.peakVolts(), 1e-9);
  }

  @Test
  void an_impedance_with_a_given_loss_stays_real_and_one_with_computed_loss_turns() {
    Complex real = Line.ofLoss(400, 0.91, 0.3).at(7.1).impedance();
    assertEquals(0, real.getImaginary());
    assertEquals(400, real.getReal(), 1e-12);
    Complex computed = OPEN_WIRE.at(7.1).impedance();
    LineConstants line = OPEN_WIRE.at(7.1);
    double perMetre = 1 / (100 * LineConstants.DECIBELS_PER_NEPER);
    double conductor = 0.12 * Math.sqrt(7.1) * perMetre;
    double dielectric = 0.005 * 7.1 * perMetre;
    assertEquals(conductor + dielectric, line.attenuation(), 1e-15);
    double turn = (dielectric - conductor) / line.phase();
    assertEquals(400 * turn, computed.getImaginary(), 1e-4);
    assertTrue(computed.getImaginary() < 0, "conductor loss turns it capacitive");
  }

  @Test
  void a_quarter_wave_turns_low_into_high() {
    double quarter = 0.91 * 299.792458 / 7.1 / 4;
    FeedResult found = run(new Complex(50, 0), Line.ofLoss(400, 0.91, 0), quarter);
    assertEquals(400 * 400 / 50.0, found.atStation().getReal(), 1e-6);
    assertEquals(0, found.lossDb(), 1e-12);
  }

  @Test
  void loads_that_take_no_power_are_said_to_by_infinite_loss_and_swr() {
    for (double reactance : new double[] {0, -410, 1e9}) {
      FeedResult found = run(new Complex(0, reactance), OPEN_WIRE, 20);
      assertEquals(Double.POSITIVE_INFINITY, found.lineSwr());
      assertEquals(Double.POSITIVE_INFINITY, found.lossDb());
      assertTrue(found.atStation().getReal() > 0);
      assertTrue(Double.isFinite(found.peakVolts()) && found.peakVolts() > 100);
      assertTrue(Double.isFinite(found.peakAmps()));
    }
    FeedResult nowhere = run(Complex.ZERO, Line.ofLoss(400, 0.91, 0), 20);
    assertEquals(Double.POSITIVE_INFINITY, nowhere.peakVolts());
  }

  @Test
  void an_open_end_and_very_high_swr_give_finite_figures() {
    FeedResult open = run(new Complex(1e9, 0), OPEN_WIRE, 20);
    assertEquals(1e9 / 400, open.lineSwr(), 1);
    assertTrue(open.lossDb() > 30 && open.lossDb() < 80, "loss " + open.lossDb());
    FeedResult high = run(new Complex(0.001, 5000), OPEN_WIRE, 20);
    assertTrue(Double.isFinite(high.lossDb()) && Double.isFinite(high.peakVolts()));
  }

  @Test
  void kilometres_of_lossy_line_do_not_overflow() {
    FeedResult found = run(new Complex(10, 300), Line.ofLoss(50, 0.66, 50), 10_000);
    assertEquals(5000, found.matchedLossDb(), 1e-6);
    assertTrue(found.lossDb() > 5000 && Double.isFinite(found.lossDb()));
    assertEquals(50, found.atStation().getReal(), 1e-9);
    assertEquals(100, found.peakVolts(), 1e-6);
    assertEquals(2, found.peakAmps(), 1e-9);
  }

  @Test
  void without_power_there_are_no_volts_and_the_rest_stands() {
    MatchingNetwork unit =
        new MatchingNetwork(MatchingNetwork.Kind.L, 0, 3e-5, 1e-11, 5e-10, 150, 1000, 3000);
    Complex load = new Complex(200, 30);
    FeedResult none = FeedChain.run(load, 7.1, OPEN_WIRE, 12, unit, 0);
    FeedResult some = FeedChain.run(load, 7.1, OPEN_WIRE, 12, unit, 100);
    assertEquals(0, none.peakVolts());
    assertEquals(0, none.matching().peakVolts());
    assertEquals(some.lossDb(), none.lossDb());
    assertEquals(some.matching().lossDb(), none.matching().lossDb(), 1e-12);
  }

  @Test
  void the_line_is_judged_by_what_it_stands() {
    Complex load = new Complex(4000, 0);
    double volts = run(load, OPEN_WIRE, 20).peakVolts();
    assertEquals(Verdict.CLEAR, run(load, OPEN_WIRE, 20).lineState());
    assertEquals(Verdict.CLEAR, run(load, OPEN_WIRE.withPeakVolts(2 * volts), 20).lineState());
    assertEquals(Verdict.TIGHT, run(load, OPEN_WIRE.withPeakVolts(1.1 * volts), 20).lineState());
    FeedResult over = run(load, OPEN_WIRE.withPeakVolts(0.9 * volts), 20);
    assertEquals(Verdict.FOUL, over.lineState());
    assertTrue(over.lineWhy().contains("over the"), over.lineWhy());
  }

  @Test
  void input_that_makes_no_sense_is_refused_with_a_sentence() {
    assertSays(
        "resistance of -3 ohm. A feedpoint takes power",
        () -> run(new Complex(-3, 0), OPEN_WIRE, 5));
    assertSays("Write an open end as", () -> run(Complex.INF, OPEN_WIRE, 5));
    assertSays("Write an open end as", () -> run(Complex.NaN, OPEN_WIRE, 5));
    assertSays("The length of the feed line is -1 m", () -> run(Complex.ONE, OPEN_WIRE, -1));
    assertSays(
        "from 0.1 to 1000 MHz", () -> FeedChain.run(Complex.ONE, 7.1e6, OPEN_WIRE, 1, null, 100));
    assertSays("The power is -1 W", () -> FeedChain.run(Complex.ONE, 7, OPEN_WIRE, 1, null, -1));
    assertSays("velocity factor is 1.2", () -> Line.of(400, 1.2, 0, 0));
    assertSays("loss is not a number", () -> Line.ofLoss(400, 0.9, Double.NaN));
    assertSays("impedance is 0 ohm", () -> Line.of(0, 0.9, 0, 0));
    assertSays("spacing is", () -> new TwoWire(0.001, 0.002, 1, 5.8e7));
  }

  private static void assertSays(String part, Runnable call) {
    String text = assertThrows(IllegalArgumentException.class, call::run).getMessage();
    assertTrue(text.contains(part), text);
  }
}
