package spanwright.feed;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** Matching networks against worked examples. */
public class MatchingExamplesTest extends PublishedChecks {
  private static final double LOSSLESS = 1e12;
  private static final double MHZ = 10;
  private static final double OMEGA = 2e6 * Math.PI * MHZ;
  private static final String TUTORIAL = "tutorial with worked numbers";
  private static final String POZAR = "Pozar, Microwave Engineering, example 5.1";
  private static final String MANUAL = "RF utility manual, worked run";
  private static final String ALGEBRA = "circuit algebra, worked out apart";

  @Override
  public String heading() {
    return "Matching unit: worked examples";
  }

  @Override
  public String about() {
    return "Exact matches of an L section and of a T with its output capacitor given.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    addPlain(checks, 75, 1000, 263, 284, 0.5, TUTORIAL);
    addPlain(checks, 50, 200, 86.6, 115.5, 0.1, "worked example");
    addPlain(checks, 100, 1000, 300, 333.3, 0.1, "Bowick, RF Circuit Design, ch. 4, from memory");
    addPlain(checks, 50, 500, 150, 166.7, 0.1, "RF textbook, ch. 5, problem 21");
    addComplex(checks);
    addLoss(checks);
    addTee(checks);
    return checks;
  }

  private static MatchingNetwork unit(double coilQ, double capacitorQ) {
    return new MatchingNetwork(MatchingNetwork.Kind.L, 0, 1, 1e-15, 1, coilQ, capacitorQ, 0);
  }

  /** From a low resistance to a high one: the part across stands on the high side. */
  private static void addPlain(
      List<Check> checks,
      double low,
      double high,
      double series,
      double across,
      double percent,
      String source) {
    LSection[] layouts = Matching.layouts(new Complex(high, 0), MHZ, unit(LOSSLESS, LOSSLESS), low);
    double[] exact = layouts[0].exact();
    String what = "L, " + (int) low + " to " + (int) high + " ohm, ";
    add(checks, what + "reactance across", across, 1 / exact[0], percent, source);
    add(checks, what + "reactance in series", series, exact[1], percent, source);
  }

  private static void addComplex(List<Check> checks) {
    MatchingNetwork ideal = unit(LOSSLESS, LOSSLESS);
    LSection[] pozar = Matching.layouts(new Complex(200, -100), 500, ideal, 100);
    double[] first = pozar[0].exact();
    double omega = 2e6 * Math.PI * 500;
    String what = "L, 200 − j100 to 100 ohm at 500 MHz, ";
    add(checks, what + "capacitor [pF]", 0.92, first[0] / omega * 1e12, 0.5, POZAR);
    add(checks, what + "coil [nH]", 38.98, first[1] / omega * 1e9, 0.5, POZAR);
    double[] other = pozar[2].exact();
    add(checks, what + "coil across [nH]", 46.1, 1 / (omega * other[0]) * 1e9, 0.5, POZAR);
    add(checks, what + "capacitor in series [pF]", 2.60, 1e12 / (omega * other[1]), 0.5, POZAR);
    LSection[] manual = Matching.layouts(new Complex(100, 20), MHZ, ideal, 50);
    // printed from the load's side: series part at the transmitter, part across at the load
    double[] coil = manual[0].exact();
    double[] capacitor = manual[2].exact();
    add(checks, "L, 100 + j20 to 50 ohm, coil in series", 51.96, coil[1], 0.02, MANUAL);
    add(checks, "L, 100 + j20 to 50 ohm, capacitor across", 83.92, 1 / coil[0], 0.02, MANUAL);
    add(checks, "L, 100 + j20 to 50 ohm, capacitor in series", 51.96, capacitor[1], 0.02, MANUAL);
    add(checks, "L, 100 + j20 to 50 ohm, coil across", 123.92, 1 / capacitor[0], 0.02, MANUAL);
  }

  private static void addLoss(List<Check> checks) {
    String source = "efficiency 1 − Q/Qu and exact, standard approximation";
    double[][] rows = {{500, 0.971, 0.13}, {2450, 0.935, 0.29}};
    for (double[] row : rows) {
      LSection lossy = Matching.layouts(new Complex(row[0], 0), MHZ, unit(100, LOSSLESS), 50)[0];
      double[] exact = lossy.exact();
      LSection.Setting found = lossy.setting(exact[0], exact[1], 100);
      double efficiency = found.powerOut() / found.powerIn();
      String what = "L, 50 to " + (int) row[0] + " ohm, coil Q 100, efficiency";
      add(checks, what, row[1], efficiency, 0.3, source);
    }
  }

  private static void addTee(List<Check> checks) {
    double[][] rows = {
      {10, 50, 36.7, 100.3, 0.151},
      {10, 100, 69.5, 211.1, 0.305},
      {10, 200, 135.8, 415.0, 0.598},
      {10, 400, 265.2, 782.6, 1.146}
    };
    for (double[] row : rows) {
      Tee tee = new Tee(row[0], row[1]);
      String what = "T, load 10 ohm, output capacitor " + (int) row[1] + " ohm, ";
      add(checks, what + "coil [ohm]", row[2], tee.coil, 1, ALGEBRA);
      add(checks, what + "input capacitor [ohm]", row[3], tee.input, 1, ALGEBRA);
      add(checks, what + "loss [dB]", row[4], tee.lossDb, 1, ALGEBRA);
    }
    double[][] losses = {
      {50, 50, 0.043},
      {50, 100, 0.086},
      {50, 200, 0.172},
      {50, 400, 0.341},
      {1000, 50, 0.096},
      {1000, 400, 0.111}
    };
    for (double[] row : losses) {
      String what = "T, load " + (int) row[0] + " ohm, output capacitor " + (int) row[1] + " ohm, ";
      add(checks, what + "loss [dB]", row[2], new Tee(row[0], row[1]).lossDb, 1.2, ALGEBRA);
    }
  }

  /** A T with coil Q 200 and ideal capacitors, its output capacitor given; the less lossy match. */
  private static final class Tee {
    private double coil;
    private double input;
    private double lossDb = Double.POSITIVE_INFINITY;

    private Tee(double load, double output) {
      LSection section =
          Matching.layouts(new Complex(load, -output), MHZ, unit(200, LOSSLESS), 50)[2];
      double[] exact = section.exact();
      for (int k = 0; k < exact.length; k += 2) {
        LSection.Setting found = section.setting(exact[k], exact[k + 1], 100);
        double loss = 10 * Math.log10(found.powerIn() / found.powerOut());
        if (loss < lossDb) {
          lossDb = loss;
          coil = OMEGA * section.first().toValue(exact[k]);
          input = 1 / (OMEGA * section.second().toValue(exact[k + 1]));
        }
      }
    }
  }

  private static void add(
      List<Check> checks,
      String what,
      double expected,
      double found,
      double percent,
      String source) {
    int decimals = Math.abs(expected) < 2 ? 3 : 2;
    double allowed = Math.round(Math.abs(expected) * percent * 1e4) / 1e6;
    checks.add(Check.within(what, expected, found, allowed, decimals, "", source));
  }
}
