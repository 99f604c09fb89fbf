package spanwright.moments;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** The reflected half-space kernels themselves. */
public class SommerfeldKernelsTest extends PublishedChecks {
  private static final String[] NAMES = {"GA", "GP", "GZ", "F", "GT"};

  /** εr, σ, MHz, ρ, ζ, then re and im of GA, GP, GZ, F, GT. */
  private static final double[][] TABLE = {
    {
      13,
      0.005,
      14,
      7.3,
      2.6,
      0.05979252,
      0.08663912,
      0.07705254,
      0.08601445,
      -0.09653197,
      -0.02171520,
      -0.04748742,
      -0.02611147,
      -0.07927195,
      -0.02233987
    },
    {
      20,
      0.03,
      28,
      3.1,
      0.8,
      0.07061580,
      0.26703422,
      0.09951521,
      0.27856141,
      -0.20528922,
      -0.18859306,
      -0.06318702,
      -0.09679069,
      -0.17638980,
      -0.17706587
    },
    {
      5,
      0.001,
      3.6,
      22,
      6,
      -0.00156852,
      0.02981080,
      0.00928305,
      0.03417294,
      -0.03648679,
      -0.02063285,
      -0.01133055,
      -0.02477585,
      -0.02563522,
      -0.01627071
    },
    {
      20,
      0.03,
      50,
      11,
      0.7,
      -0.04618232,
      -0.07493921,
      -0.04512093,
      -0.07304711,
      0.04854675,
      -0.02656814,
      0.01920387,
      0.01410495,
      0.04960814,
      -0.02467604
    },
    {
      5,
      0.001,
      14,
      0.05,
      3,
      -0.08095593,
      0.03401797,
      -0.13849795,
      0.18914668,
      0.12701699,
      -0.33192706,
      0.00133591,
      -0.00182315,
      0.06947496,
      -0.17679835
    },
    {
      13,
      0.005,
      3.65,
      12,
      2.2,
      -0.04956434,
      0.04978737,
      -0.04320291,
      0.06569923,
      0.01331587,
      -0.08972490,
      0.01604432,
      -0.04089175,
      0.01967731,
      -0.07381304
    },
  };

  @Override
  public String heading() {
    return "Field solver: kernels over real ground";
  }

  @Override
  public String about() {
    return "Reflected kernels in 1/m, image included, against adaptive quadrature in 20 digits on"
        + " another path in the complex plane (our own; no publication prints such values).";
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    for (double[] row : TABLE) {
      double[] found = HalfSpaceKernels.of(Ground.real(row[0], row[1]), row[2]).at(row[3], row[4]);
      for (int m = 0; m < NAMES.length; m++) {
        double re = row[5 + 2 * m];
        double im = row[6 + 2 * m];
        double off = Math.hypot(found[2 * m] - re, found[2 * m + 1] - im);
        checks.add(
            new Check(
                String.format(
                    Locale.ROOT,
                    "%s, ground %s, %s S/m, %s MHz, rho %s m, zeta %s m",
                    NAMES[m],
                    row[0],
                    row[1],
                    row[2],
                    row[3],
                    row[4]),
                complex(re, im),
                complex(found[2 * m], found[2 * m + 1]),
                "±1e-6",
                off <= 1e-6,
                "own adaptive quadrature in 20 digits"));
      }
    }
    return checks;
  }

  private static String complex(double re, double im) {
    return String.format(Locale.ROOT, "%.6f %+.6fj", re + 0.0, im + 0.0);
  }
}
