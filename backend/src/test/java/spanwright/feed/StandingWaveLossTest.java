package spanwright.feed;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.complex.Complex;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** Loss of a mismatched line: power in against power out, beside the handbook formula. */
public class StandingWaveLossTest extends PublishedChecks {
  private static final String SOURCE =
      "handbook formula for a real impedance (from memory), worked out apart";

  /** Matched loss, SWR at the load, total loss, SWR at the input. */
  private static final double[][] ROWS = {
    {1, 2, 1.196, 1.720},
    {1, 3, 1.504, 2.318},
    {1, 5, 2.123, 3.251},
    {3, 3, 3.968, 1.669},
    {3, 10, 7.008, 2.390},
    {1.5, 20, 6.620, 4.564},
    {0.2, 20, 1.652, 13.71},
    {0.1, 10, 0.479, 8.978}
  };

  @Override
  public String heading() {
    return "Feed line: loss with standing waves";
  }

  @Override
  public String about() {
    return "Exact line equations, a resistive load on 30 m of line. For a real impedance the formula"
        + " is exact whatever the length, so the printed digits hold.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    double length = 30;
    for (double[] row : ROWS) {
      Line line = Line.ofLoss(450, 0.9, row[0] * 100 / length);
      Complex load = new Complex(450 * row[1], 0);
      FeedResult found = FeedChain.run(load, 7.1, line, length, null, 100);
      String where = String.format(Locale.ROOT, ", matched loss %.1f dB, SWR %.0f", row[0], row[1]);
      checks.add(
          Check.within("total loss" + where, row[2], found.lossDb(), 0.001, 3, "dB", SOURCE));
      checks.add(
          Check.within(
              "SWR at the input" + where,
              row[3],
              FeedChain.swr(found.atStation(), 450),
              row[3] > 10 ? 0.005 : 0.001,
              3,
              "",
              SOURCE));
    }
    return checks;
  }
}
