package spanwright.assess;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.UnaryOperator;
import org.apache.commons.math3.complex.Complex;

/** Whether the radio figures of a placement may be relied on, and why not. */
final class Judgement {
  /** Of the reflection coefficient on 400 ohm, on the next finer mesh: what the mesh aims at. */
  static final double MOST_CHANGE = 0.01;

  private static final double OHM = 400;

  private Judgement() {}

  /**
   * @param named turns a sentence of the field solver into one of the plan
   */
  static Placement.Quality of(List<Fields.Seen> rows, UnaryOperator<String> named) {
    List<String> doubts = new ArrayList<>();
    List<Placement.BandQuality> bands = new ArrayList<>();
    for (Fields.Seen seen : rows) {
      for (String failing : seen.solution().failings()) {
        addOnce(named.apply(failing), doubts);
      }
      if (seen.row().middle()) {
        Double change =
            seen.finer() == null ? null : change(seen.solution().impedance(), seen.finer());
        bands.add(
            new Placement.BandQuality(
                seen.row().band().name(),
                seen.row().frequencyMHz(),
                change == null ? null : rounded(change),
                rounded(seen.solution().residual())));
        if (change != null && change > MOST_CHANGE) {
          addOnce(doubt(seen.row().band().name(), change), doubts);
        }
      }
    }
    return new Placement.Quality(doubts.isEmpty(), doubts, bands);
  }

  private static void addOnce(String sentence, List<String> doubts) {
    if (!doubts.contains(sentence)) {
      doubts.add(sentence);
    }
  }

  private static String doubt(String band, double change) {
    return String.format(
        Locale.ROOT,
        "On %s a finer mesh moves the reflection coefficient (400 ohm) by %s; up to %s is"
            + " good.",
        band,
        rounded(change),
        MOST_CHANGE);
  }

  private static double change(Complex full, Complex finer) {
    return reflection(full).subtract(reflection(finer)).abs();
  }

  private static Complex reflection(Complex z) {
    return z.subtract(OHM).divide(z.add(OHM));
  }

  /** Three digits. */
  private static double rounded(double value) {
    return new BigDecimal(value).round(new MathContext(3)).doubleValue();
  }

  /** What is said in a placement's notes. */
  static List<String> notes(Placement.Quality quality) {
    return quality.doubts().stream()
        .map(doubt -> "The radio figures are not to be relied on. " + doubt)
        .toList();
  }
}
