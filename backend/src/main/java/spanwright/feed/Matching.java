package spanwright.feed;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;

/** Settings of a matching unit for a load: the best state first, then the least loss. */
final class Matching {
  /** Steps over a T's capacitor on the line's side, then its refinement. */
  private static final int STEPS = 48;

  private static final int REFINEMENTS = 36;

  /** A range from 0 F is searched down to this share of its greatest value. */
  private static final double LEAST_SHARE = 1e-4;

  private final double r;
  private final double x;
  private final double omega;
  private final MatchingNetwork unit;
  private final double power;
  private final double targetOhm;

  private Matching(
      Complex load, double frequencyMHz, MatchingNetwork unit, double power, double targetOhm) {
    r = load.getReal();
    x = load.getImaginary();
    omega = 2e6 * Math.PI * frequencyMHz;
    this.unit = unit;
    this.power = power;
    this.targetOhm = targetOhm;
  }

  static Match match(Complex load, double frequencyMHz, MatchingNetwork unit, double power) {
    double target = FeedChain.TRANSMITTER_OHM;
    return new Matching(load, frequencyMHz, unit, power, target).match();
  }

  /** The four layouts of an L, in a fixed order. */
  static LSection[] layouts(
      Complex load, double frequencyMHz, MatchingNetwork unit, double targetOhm) {
    return new Matching(load, frequencyMHz, unit, 1, targetOhm).layouts();
  }

  private Match match() {
    if (unit.kind() == MatchingNetwork.Kind.BALUN) {
      return balun();
    }
    boolean isT = unit.kind() == MatchingNetwork.Kind.T;
    List<Candidate> tunings = isT ? tuningOfT() : tunings();
    Candidate tuned = tuned(tunings);
    if (tuned == null) {
      return new Match(
          Verdict.FOUL,
          "its ranges leave it no working coil and capacitor",
          null,
          0,
          FeedChain.swr(new Complex(r, x), targetOhm),
          0,
          0);
    }
    Candidate best = tuned;
    for (Candidate one : tuned.state() == Verdict.CLEAR ? List.<Candidate>of() : tunings) {
      Candidate detuned = detuned(one);
      if (detuned.state().compareTo(tuned.state()) < 0) {
        best = better(best, detuned);
      }
    }
    return new Match(
        best.state(),
        best == tuned ? why(best, isT) : whyDetuned(best, tuned, isT),
        settings(best),
        best.lossDb(),
        best.swr(),
        best.volts(),
        best.amps());
  }

  /** The least costly when that is clear, else the least costly full match, if there is one. */
  private Candidate tuned(List<Candidate> tunings) {
    Candidate best = null;
    Candidate full = null;
    for (Candidate one : tunings) {
      best = better(best, one);
      full = one.isExact() ? better(full, one) : full;
    }
    boolean take = full == null || best.state() == Verdict.CLEAR;
    return take ? best : full;
  }

  private Match balun() {
    double swr = FeedChain.swr(new Complex(r, x), targetOhm);
    double amps = r > 0 ? Math.sqrt(2 * power / r) : Double.POSITIVE_INFINITY;
    double size = Math.hypot(r, x);
    double volts = size == 0 ? 0 : amps * size;
    Verdict bySwr = Judgement.of(swr, Judgement.BALUN_CLEAR_SWR, Judgement.BALUN_TIGHT_SWR);
    Verdict state = bySwr.worse(Judgement.ofVolts(volts, unit.peakVolts()));
    String why =
        state != bySwr
            ? overVolts(volts)
            : Judgement.said("a balun matches nothing; SWR %s on 50 ohm", shownSwr(swr));
    return new Match(state, why, null, 0, swr, volts, amps);
  }

  private LSection[] layouts() {
    Part seriesCoil = Part.coil(unit, true, omega);
    Part coilAcross = Part.coil(unit, false, omega);
    Part seriesCapacitor = Part.capacitor(unit, true, omega);
    Part capacitorAcross = Part.capacitor(unit, false, omega);
    return new LSection[] {
      new LSection(r, x, capacitorAcross, seriesCoil, targetOhm),
      new LSection(r, x, seriesCoil, capacitorAcross, targetOhm),
      new LSection(r, x, coilAcross, seriesCapacitor, targetOhm),
      new LSection(r, x, seriesCapacitor, coilAcross, targetOhm)
    };
  }

  /** The best of each layout of an L. */
  private List<Candidate> tunings() {
    List<Candidate> tunings = new ArrayList<>();
    for (LSection section : layouts()) {
      boolean shorted = r == 0 && x == 0 && !section.first().series();
      Candidate best = shorted ? null : best(section, 0);
      if (best != null) {
        tunings.add(best);
      }
    }
    return tunings;
  }

  /** What lies across the T's capacitor on the line's side: coil next to it, capacitor beyond. */
  private LSection behind(double second) {
    Part capacitor = Part.capacitor(unit, true, omega);
    double reactance = capacitor.ofValue(second);
    return new LSection(
        r + reactance * capacitor.dissipation(),
        x - reactance,
        Part.coil(unit, false, omega),
        capacitor,
        targetOhm);
  }

  private List<Candidate> tuningOfT() {
    boolean lacksPart = unit.mostCapacitance() == 0 || unit.mostInductance() == 0;
    Candidate best = lacksPart ? null : bestT();
    return best == null ? List.of() : List.of(best);
  }

  private Candidate bestT() {
    double most = unit.mostCapacitance();
    double least = Math.max(unit.leastCapacitance(), most * LEAST_SHARE);
    double step = Math.log(most / least) / STEPS;
    Candidate best = null;
    int at = 0;
    for (int k = 0; k <= STEPS; k++) {
      Candidate here = bestT(most * Math.exp(-k * step));
      if (better(best, here) != best) {
        best = here;
        at = k;
      }
    }
    double low = Math.max(0, at - 1);
    double high = Math.min(STEPS, at + 1);
    double golden = (Math.sqrt(5) - 1) / 2;
    for (int n = 0; n < REFINEMENTS && step > 0; n++) {
      double left = high - golden * (high - low);
      double right = low + golden * (high - low);
      Candidate one = bestT(most * Math.exp(-left * step));
      Candidate other = bestT(most * Math.exp(-right * step));
      best = better(better(best, one), other);
      if (cost(one) <= cost(other)) {
        high = right;
      } else {
        low = left;
      }
    }
    return best;
  }

  private Candidate bestT(double second) {
    return best(behind(second), second);
  }

  /** Exact matches within the ranges; failing those, the least reflection on their edges. */
  private Candidate best(LSection section, double second) {
    Candidate best = null;
    double[] exact = section.exact();
    for (int k = 0; k < exact.length; k += 2) {
      if (section.first().reaches(exact[k]) && section.second().reaches(exact[k + 1])) {
        best = better(best, candidate(section, exact[k], exact[k + 1], second));
      }
    }
    if (best == null) {
      double[] edges = section.edges();
      for (int k = 0; k < edges.length; k += 2) {
        best = better(best, candidate(section, edges[k], edges[k + 1], second));
      }
    }
    return best;
  }

  /**
   * What is not clear is tried a little off: some SWR taken on may bring volts or loss inside their
   * limits. A compass search in the logarithms of the settings, diagonals included. A part set to
   * nothing stays so.
   */
  private Candidate detuned(Candidate start) {
    Candidate best = start;
    for (double step = 0.2; step > 5e-4; ) {
      Candidate found = best;
      int sides = best.second() > 0 ? 1 : 0; // the second capacitor is a T's alone
      for (int i = -1; i <= 1; i++) {
        for (int j = -1; j <= 1; j++) {
          for (int k = -sides; k <= sides; k++) {
            found = better(found, moved(best, i * step, j * step, k * step));
          }
        }
      }
      step = found == best ? step / 2 : step;
      best = found;
    }
    return best;
  }

  private Candidate moved(Candidate from, double one, double other, double second) {
    LSection section = from.section();
    double capacitance = from.second();
    if (second != 0) {
      double least = Math.max(unit.leastCapacitance(), unit.mostCapacitance() * LEAST_SHARE);
      capacitance *= Math.exp(second);
      capacitance = Math.max(least, Math.min(unit.mostCapacitance(), capacitance));
      section = behind(capacitance);
    }
    double t = section.first().within(from.setting().first() * Math.exp(one));
    double back = section.second().within(from.setting().second() * Math.exp(other));
    return candidate(section, t, back, capacitance);
  }

  private Candidate candidate(LSection section, double t, double back, double second) {
    LSection.Setting setting = section.setting(t, back, power);
    if (second == 0) {
      return Candidate.of(
          section,
          setting,
          0,
          setting.powerOut(),
          setting.volts(),
          setting.amps(),
          unit.peakVolts());
    }
    Part capacitor = Part.capacitor(unit, true, omega);
    double reactance = capacitor.ofValue(second);
    double resistance = r + reactance * capacitor.dissipation();
    double size = Math.hypot(resistance, x - reactance);
    double amps = setting.drive() / size;
    return Candidate.of(
        section,
        setting,
        second,
        r / (size * size),
        Math.max(setting.volts(), amps * capacitor.size(reactance)),
        Math.max(setting.amps(), amps),
        unit.peakVolts());
  }

  private Candidate better(Candidate one, Candidate other) {
    return cost(other) < cost(one) ? other : one;
  }

  private double cost(Candidate candidate) {
    return candidate == null ? Double.POSITIVE_INFINITY : candidate.cost(unit.peakVolts());
  }

  private static Match.Settings settings(Candidate best) {
    Part first = best.section().first();
    Part second = best.section().second();
    double one = first.toValue(best.setting().first());
    double other = second.toValue(best.setting().second());
    double inductance = first.coil() ? one : other;
    double capacitance = first.coil() ? other : one;
    if (best.second() > 0) {
      String layout = "capacitors in series, coil to earth between them";
      return new Match.Settings(layout, inductance, capacitance, best.second());
    }
    String layout =
        Judgement.said(
            "%s in series, %s across the %s side",
            first.series() ? first.named() : second.named(),
            first.series() ? second.named() : first.named(),
            first.series() ? "transmitter's" : "line's");
    return new Match.Settings(layout, inductance, capacitance, null);
  }

  private String why(Candidate best, boolean isT) {
    if (Judgement.ofSwr(best.swr()) != Verdict.CLEAR) {
      String reached = Judgement.said("; SWR %s at best", shownSwr(best.swr()));
      return runsOut(isT) + reached;
    }
    if (Judgement.ofVolts(best.volts(), unit.peakVolts()) == Verdict.FOUL
        || Judgement.ofLoss(best.lossDb()) == Verdict.CLEAR && best.state() == Verdict.TIGHT) {
      return overVolts(best.volts());
    }
    if (best.state() != Verdict.CLEAR) {
      return best.lossDb() < 99
          ? Judgement.said("%.1f dB would heat its parts", best.lossDb())
          : "the load takes next to no power; all of it would heat the unit";
    }
    return Judgement.said("matches to SWR %s, losing %.2f dB", shownSwr(best.swr()), best.lossDb());
  }

  private String whyDetuned(Candidate best, Candidate tuned, boolean isT) {
    return Judgement.said(
        "left at SWR %s on purpose; tuned full out, %s", shownSwr(best.swr()), why(tuned, isT));
  }

  private String overVolts(double volts) {
    String how = volts > unit.peakVolts() ? "volts over" : "volts near";
    return Judgement.said("%s what its parts stand (%.0f of %.0f V)", how, volts, unit.peakVolts());
  }

  /** Which part a match would want beyond its range: that of the match least far outside. */
  private String runsOut(boolean isT) {
    LSection[] sections = isT ? sectionsOfT() : layouts();
    double least = Double.POSITIVE_INFINITY;
    String found = "no setting of its circuit matches this load";
    for (LSection section : sections) {
      double[] exact = section.exact();
      for (int k = 0; k < exact.length; k += 2) {
        double one = section.first().beyond(exact[k]);
        double other = section.second().beyond(exact[k + 1]);
        if (one + other < least) {
          least = one + other;
          found = runsOut(section, exact[k], exact[k + 1], one, other);
        }
      }
    }
    return least > 0 ? found : "a full match would ask still more of its parts";
  }

  private static String runsOut(LSection section, double t, double back, double one, double other) {
    if (one > 0 && other > 0) {
      return "both its coil and its capacitor run out";
    }
    Part part = one > 0 ? section.first() : section.second();
    double wants = part.toValue(one > 0 ? t : back);
    double limit = wants > part.most() ? part.most() : part.least();
    return Judgement.said(
        "its %s runs out (a match wants %s, it goes %s to %s)",
        part.named(),
        Part.shown(part.coil(), wants),
        wants > part.most() ? "up" : "down",
        Part.shown(part.coil(), limit));
  }

  private LSection[] sectionsOfT() {
    double most = unit.mostCapacitance();
    double least = Math.max(unit.leastCapacitance(), most * LEAST_SHARE);
    LSection[] sections = new LSection[STEPS + 1];
    for (int k = 0; k <= STEPS; k++) {
      sections[k] = behind(most * Math.pow(least / most, (double) k / STEPS));
    }
    return sections;
  }

  private static String shownSwr(double swr) {
    return swr > 99 ? "over 99" : Judgement.said("%.1f", swr);
  }
}
