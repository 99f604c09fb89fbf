package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.AllowedSolution;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;
import spanwright.plan.Place;

/**
 * One wire between two points, exactly: calm and in wind, stretching or not, with or without a load
 * on it. See the package's essay for the statics.
 */
public final class Hanging {
  /** Standard gravity [m/s²]. */
  public static final double GRAVITY = 9.80665;

  private static final int PARTS = 60;
  private static final double LIMIT = 1e6;

  private Hanging() {}

  /**
   * Hangs a wire.
   *
   * @throws IllegalArgumentException with a sentence that says what, where and what to do
   */
  public static HangAnswer solve(HangCase given) {
    HangCaseCheck.check(given);
    return new One(given).answer();
  }

  /** The work on one case. */
  private static final class One {
    private final HangCase given;
    private final double dx;
    private final double dy;
    private final double dz;
    private final double chord;
    private final double fraction;
    private final double[] side;
    private final Chain chain = new Chain(2);
    private final Tightening tightening;
    private double slackUnderPull;

    One(HangCase given) {
      this.given = given;
      dx = given.to().x() - given.from().x();
      dy = given.to().y() - given.from().y();
      dz = given.to().z() - given.from().z();
      chord = given.from().distance(given.to());
      double level = Math.hypot(dx, dy);
      // Upright spans have no side of their own; the wind then blows along y.
      side = level < 1e-9 * chord ? new double[] {0, 1} : new double[] {-dy / level, dx / level};
      fraction = given.load() == null ? 0.5 : given.load().fraction();
      tightening = new Tightening(chain, dx, dy, dz);
      Double stiffness = given.wire().stiffness();
      java.util.Arrays.fill(chain.flexibility, stiffness == null ? 0 : 1 / stiffness);
    }

    HangAnswer answer() {
      setLoads(0);
      if (Double.isNaN(slackUnderPull = tightening.toPull(given.pull(), true, this::whole))) {
        throw new IllegalArgumentException(tooSlack());
      }
      HangAnswer.Calm calm = calm();
      double first = chain.length[0];
      if (given.wind() > 0) {
        setLoads(given.wind());
        blow(first);
      }
      return new HangAnswer(calm, inWind());
    }

    private void setLoads(double wind) {
      double weight = given.wire().weight() * GRAVITY;
      double push = 0.5 * given.air() * wind * wind * given.drag() * given.wire().diameter();
      for (int i = 0; i < 2; i++) {
        chain.setLoad(i, push * side[0], push * side[1], -weight);
      }
      double hung = given.load() == null ? 0 : given.load().weight() * GRAVITY;
      chain.setPoint(0, 0, 0, -hung);
    }

    private double stretchUnderPull() {
      return given.wire().stiffness() == null ? 0 : given.pull() / given.wire().stiffness();
    }

    private void whole(double slack) {
      double length = (chord + slack) / (1 + stretchUnderPull());
      chain.length[0] = fraction * length;
      chain.length[1] = length - chain.length[0];
    }

    private void blow(double first) {
      if (given.held() == HangCase.Held.TIED) {
        double stretch = stretchUnderPull();
        if (!tightening.asLong((slackUnderPull - chord * stretch) / (1 + stretch))) {
          throw new IllegalArgumentException(
              "wire: a wire without weight that does not stretch cannot stand any wind between two"
                  + " ties. Give its weight or its stiffness, or hold it by a weight.");
        }
        return;
      }
      boolean holds =
          given.held() == HangCase.Held.SPRING ? spring(first) : run(given.pull(), first);
      if (!holds) {
        throw new IllegalArgumentException(
            String.format(
                Locale.ROOT,
                given.held() == HangCase.Held.SPRING
                    ? "wind: a spring set to %.1f N (pull) cannot hold this wire in %.1f m/s. Use a"
                        + " stiffer spring or a tie."
                    : "wind: a counterweight of %.1f N (pull) cannot hold this wire in %.1f m/s."
                        + " Use a heavier weight or a tie.",
                given.pull(),
                given.wind()));
      }
    }

    /** Lets the wire run over the pulley until it pulls so much there; false when it never does. */
    private boolean run(double pull, double first) {
      double stretch = stretchUnderPull();
      double slack =
          tightening.toPull(
              pull,
              true,
              s -> {
                double rest = (chord + s) / (1 + stretch) - first;
                chain.length[0] = rest > 0 ? first : first + rest;
                chain.length[1] = Math.max(0, rest);
              });
      return !Double.isNaN(slack);
    }

    /**
     * Lets the wire draw the spring out: its pull is that of still air and so much more for each
     * metre that has run over the pulley. With more pull less wire runs, so there is one answer at
     * most; false where a spring so soft lets out more wire than its own pull could then hold.
     */
    private boolean spring(double first) {
      double whole = chain.totalLength();
      UnivariateFunction over =
          pull ->
              run(pull, first)
                  ? pull - given.pull() - given.spring() * (chain.totalLength() - whole)
                  : -pull;
      double low = given.pull();
      if (over.value(low) >= 0) {
        return run(low, first);
      }
      double high = 2 * low;
      while (over.value(high) < 0) {
        low = high;
        high *= 2;
        if (high > 1e9) {
          return false;
        }
      }
      double pull =
          new BracketingNthOrderBrentSolver(1e-12, 1e-9, 1e-9 * given.pull(), 5)
              .solve(200, over, low, high, AllowedSolution.ANY_SIDE);
      // Below the wire's least pull nothing hangs, and the balance leaps there without an answer.
      return Math.abs(over.value(pull)) < 1e-4 * pull && run(pull, first);
    }

    private String tooSlack() {
      return String.format(
          Locale.ROOT,
          "pull: %.3g N is less than this wire pulls however slack it hangs. Raise the pull (the"
              + " wire and its load weigh %.3g N over the chord alone).",
          given.pull(),
          given.wire().weight() * GRAVITY * chord
              + (given.load() == null ? 0 : given.load().weight() * GRAVITY));
    }

    private HangAnswer.Calm calm() {
      List<Place> points = sample();
      double sag = 0;
      for (Place each : points) {
        sag = Math.max(sag, drop(each));
      }
      return new HangAnswer.Calm(points, chain.stretchedLength(), sag, pullFrom(), pullTo());
    }

    private HangAnswer.InWind inWind() {
      List<Place> points = sample();
      double sag = 0;
      double out = 0;
      for (Place each : points) {
        sag = Math.max(sag, drop(each));
        double x = each.x() - given.from().x();
        double y = each.y() - given.from().y();
        out = Math.max(out, Math.abs(x * side[0] + y * side[1]));
      }
      return new HangAnswer.InWind(points, chain.stretchedLength(), sag, out, pullFrom(), pullTo());
    }

    private double drop(Place at) {
      double level2 = dx * dx + dy * dy;
      double x = at.x() - given.from().x();
      double y = at.y() - given.from().y();
      double z = at.z() - given.from().z();
      if (level2 < 1e-12 * chord * chord) {
        return Math.min(0, dz) - z;
      }
      double share = Math.min(1, Math.max(0, (x * dx + y * dy) / level2));
      return share * dz - z;
    }

    private Force pullFrom() {
      return new Force(chain.start[0], chain.start[1], chain.start[2]);
    }

    private Force pullTo() {
      double[] end = chain.end();
      return new Force(-end[0], -end[1], -end[2]);
    }

    /** Points along the wire; the holding points stand as given, to the last digit. */
    private List<Place> sample() {
      int[] parts = {parts(chain.length[0]), parts(chain.length[1])};
      double[] xyz = new double[3 * (parts[0] + parts[1] + 1)];
      int count = chain.sample(parts, xyz);
      List<Place> points = new ArrayList<>(count);
      for (int i = 0; i < count; i++) {
        points.add(
            new Place(
                given.from().x() + xyz[3 * i],
                given.from().y() + xyz[3 * i + 1],
                given.from().z() + xyz[3 * i + 2]));
      }
      points.set(0, given.from());
      points.set(count - 1, given.to());
      return points;
    }

    private int parts(double length) {
      double total = chain.totalLength();
      return length <= 0 ? 0 : Math.max(4, (int) Math.round(PARTS * length / total));
    }
  }

  /** What a case must keep, each in a sentence. */
  private static final class HangCaseCheck {
    static void check(HangCase given) {
      require(given.from() != null, "from: the first holding point is missing. Give [x, y, z].");
      require(given.to() != null, "to: the second holding point is missing. Give [x, y, z].");
      place("from", given.from());
      place("to", given.to());
      double apart = given.from().distance(given.to());
      require(apart >= 1e-3, "to: the holding points are less than 1 mm apart. Move one of them.");
      require(given.wire() != null, "wire: is missing. Give its weight and diameter.");
      number("wire.weight", given.wire().weight(), 0, 1000, "kg/m");
      number("wire.diameter", given.wire().diameter(), 0, 1, "m");
      if (given.wire().stiffness() != null) {
        number("wire.stiffness", given.wire().stiffness(), 1e-3, 1e12, "N");
      }
      number("pull", given.pull(), 1e-6, 1e9, "N");
      require(given.held() != null, "held: is missing. Say \"weight\", \"tied\" or \"spring\".");
      if (given.held() == HangCase.Held.SPRING) {
        number("spring", given.spring(), 1e-3, 1e9, "N/m");
      } else {
        require(given.spring() == null, "spring: holds nothing here. Say \"spring\" in held.");
      }
      number("wind", given.wind(), 0, 100, "m/s");
      number("drag", given.drag(), 0, 10, "");
      number("air", given.air(), 0, 10, "kg/m³");
      if (given.load() != null) {
        number("load.fraction", given.load().fraction(), 0, 1, "");
        number("load.weight", given.load().weight(), 0, LIMIT, "kg");
      }
    }

    private static void place(String what, Place place) {
      number(what + "[0]", place.x(), -LIMIT, LIMIT, "m");
      number(what + "[1]", place.y(), -LIMIT, LIMIT, "m");
      number(what + "[2]", place.z(), -LIMIT, LIMIT, "m");
    }

    private static void number(String what, Double value, double least, double most, String unit) {
      require(value != null, what + ": is missing. Give a number.");
      require(
          value >= least && value <= most,
          String.format(
              Locale.ROOT,
              "%s: is %s; it must lie between %s and %s%s.",
              what,
              plain(value),
              plain(least),
              plain(most),
              unit.isEmpty() ? "" : " " + unit));
    }

    private static String plain(double value) {
      return Double.isFinite(value)
          ? java.math.BigDecimal.valueOf(value).stripTrailingZeros().toPlainString()
          : "not a number";
    }

    private static void require(boolean holds, String sentence) {
      if (!holds) {
        throw new IllegalArgumentException(sentence);
      }
    }
  }
}
