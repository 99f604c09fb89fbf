package spanwright.path;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** The reference vertical against its space-wave formula worked out apart. */
public class QuarterWaveVerticalTest extends PublishedChecks {
  private static final String FORMULA =
      "space wave of a quarter-wave vertical (formula of Rec. ITU-R BS.705, from memory), worked"
          + " out apart";
  private static final double[] FREQUENCIES = {3.65, 7.1, 14.175};
  private static final double[] ELEVATIONS = {5, 10, 20, 30};
  private static final double[][] SOILS = {{13, 0.005}, {5, 0.001}, {20, 0.0303}, {81, 5}};
  private static final double[][][] GAINS = {
    {{-5.0, -1.5, 0.4, 0.4}, {-6.3, -2.6, -0.3, -0.1}, {-6.9, -3.0, -0.6, -0.3}},
    {{-9.4, -5.1, -2.2, -1.7}, {-9.8, -5.4, -2.4, -1.8}, {-9.7, -5.4, -2.3, -1.7}},
    {{-0.3, 1.9, 2.6, 2.1}, {-1.9, 0.8, 1.9, 1.6}, {-3.7, -0.5, 1.1, 1.0}},
    {{4.6, 4.7, 4.3, 3.3}, {4.5, 4.6, 4.2, 3.3}, {4.2, 4.5, 4.1, 3.2}}
  };

  @Override
  public String heading() {
    return "Path: reference vertical";
  }

  @Override
  public String about() {
    return "Quarter-wave vertical on a perfect screen, far field reflected by the soil. Tolerance:"
        + " the tenth that is printed.";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    for (int s = 0; s < SOILS.length; s++) {
      for (int f = 0; f < FREQUENCIES.length; f++) {
        for (int e = 0; e < ELEVATIONS.length; e++) {
          double found =
              ReferenceVertical.gainDbi(
                  Math.toRadians(ELEVATIONS[e]), FREQUENCIES[f], SOILS[s][0], SOILS[s][1]);
          String what =
              String.format(
                  Locale.ROOT,
                  "gain at %.0f°, %.5g MHz, over %.0f, %.4g S/m",
                  ELEVATIONS[e],
                  FREQUENCIES[f],
                  SOILS[s][0],
                  SOILS[s][1]);
          checks.add(Check.within(what, GAINS[s][f][e], found, 0.06, 2, "dBi", FORMULA));
        }
      }
    }
    checks.add(
        Check.within(
            "gain at the horizon over a perfect conductor",
            5.16,
            ReferenceVertical.perfectGainDbi(0),
            0.01,
            2,
            "dBi",
            "half-wave dipole + 3 dB (Balanis, Antenna Theory, sec. 4.7)"));
    checks.add(
        Check.within(
            "gain at 5° over average soil, 7.1 MHz",
            -6,
            ReferenceVertical.gainDbi(Math.toRadians(5), 7.1, 13, 0.005),
            1,
            1,
            "dBi",
            "common practice, no source"));
    return checks;
  }
}
