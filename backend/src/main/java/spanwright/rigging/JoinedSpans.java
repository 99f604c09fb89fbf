package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.AllowedSolution;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * Spans whose wire is held at bends by ropes, closed loops among them: all of it hangs together.
 *
 * <p>The wire is made fast at each bend, so each stretch keeps its own length. One number is free:
 * how far the ropes that may be changed are let out or taken in, all alike (those at the ends of a
 * wire; at every bend of a loop). It is set so that the greatest calm tension of any wire is the
 * pull wanted. The gust blows one way at a time over everything: square to each stretch in turn,
 * from either side, on each piece with the part of it that meets the piece square.
 */
final class JoinedSpans implements Statics {
  private static final int TRIES = 8;

  /** A stretch with more wire than this share of its chord hangs loose by design. */
  private static final double LOOSE = 1.03;

  private final Hang hang;
  private final Course course;
  private final JoinedModel model;
  private final JoinedReader reader;
  private final List<double[]> winds = new ArrayList<>();
  private final List<List<JoinedState>> states = new ArrayList<>();
  private final int weightAt;
  private JoinedState calm;
  private double letOut;
  private double pull;
  private double weight;
  private double up;
  private double down;
  private boolean slack;
  private boolean lifted;

  JoinedSpans(Hang hang) {
    this.hang = hang;
    course = hang.course;
    model = new JoinedModel(hang);
    reader = new JoinedReader(model);
    weightAt = weightAt();
  }

  /**
   * The one rope that runs over a pulley to a counterweight: at the tree that sways most, or -1.
   */
  private int weightAt() {
    int best = -1;
    for (int a = 0; a < hang.holders.size(); a++) {
      if (hang.holders.get(a).isTree() && model.hasRope(a)) {
        double more = best < 0 ? 1 : hang.holders.get(a).sway() - hang.holders.get(best).sway();
        boolean end = more == 0 && course.isOuter(a) && !course.isOuter(best);
        best = more > 0 || end ? a : best;
      }
    }
    return best;
  }

  // --- pulls

  @Override
  public void hang() {
    double floor = 0;
    double wanted = Double.POSITIVE_INFINITY;
    double tightest = 0;
    for (int i = 0; i < course.spans().size(); i++) {
      Materials materials = hang.materials(course.spans().get(i).conductor());
      double strongest =
          Math.min(Practice.CALM_SHARE * materials.wireBreaking(), materials.ropeWorking());
      wanted = Math.min(wanted, strongest);
      if (model.drawnSlack(i) < LOOSE) {
        floor = Math.max(floor, model.shell(i).tensionForSag(Practice.MOST_SAG));
        tightest = Math.max(tightest, model.shell(i).tensionForSag(Practice.LEAST_SAG));
      }
    }
    wanted = tightest > 0 ? Math.min(wanted, tightest) : wanted;
    pull = Math.max(floor, wanted);
    double best = 0;
    double bestPull = pull;
    for (int attempt = 0; attempt <= TRIES; attempt++) {
      solve();
      double factor = hang.windy ? factor() : 1;
      if (factor > best) {
        best = factor;
        bestPull = pull;
      }
      if (factor >= 1 || slack || pull <= floor * (1 + 1e-9)) {
        break;
      }
      pull = Math.max(floor, pull * Math.max(0.5, factor * factor));
    }
    // A lighter weight may be drawn up where a heavier one held: the best of what was tried stands.
    if (best < 1 && bestPull != pull) {
      pull = bestPull;
      solve();
    }
  }

  /** By how much the pull is too great for what must hold; 1 or more when everything holds. */
  private double factor() {
    double factor = 1;
    for (List<JoinedState> each : states) {
      for (JoinedState state : each) {
        for (int i = 0; i < course.spans().size(); i++) {
          factor = Math.min(factor, hang.allowed(i) / state.greatest()[i]);
        }
      }
    }
    for (int a = 0; a < hang.holders.size(); a++) {
      Double limit = hang.holders.get(a).pullLimit();
      if (limit != null && limit > 0) {
        double found = Math.max(calm(a).size(), worst(a).size());
        factor = Math.min(factor, Practice.HEADROOM * limit / Math.max(1e-9, found));
      }
    }
    return factor;
  }

  // --- solving

  private void solve() {
    slack = false;
    lifted = false;
    up = 0;
    down = 0;
    model.begin();
    // From the second time on the wire's own tension says by how much it is stretched.
    model.stretchBy(pull);
    tighten();
    for (int pass = 0; pass < 8 && model.stretchedOtherwise() > 2e-6; pass++) {
      model.stretchBy(Double.NaN);
      tighten();
    }
    calm = reader.state();
    weight = weightAt < 0 ? 0 : calm.ropeTension()[weightAt];
    winds.clear();
    states.clear();
    if (hang.windy) {
      for (int i = 0; i < course.spans().size(); i++) {
        winds(calm.side(i));
      }
      for (Weather weather : hang.weathers()) {
        states.add(weather(weather));
      }
    }
    model.restore();
  }

  private void winds(double[] side) {
    for (double[] each : winds) {
      if (each[0] * side[0] + each[1] * side[1] > 0.97) {
        return;
      }
      if (each[0] * side[0] + each[1] * side[1] < -0.97) {
        return;
      }
    }
    winds.add(side);
    winds.add(new double[] {-side[0], -side[1]});
  }

  /** Lets the ropes out or in until the greatest tension of the wire is the pull. */
  private void tighten() {
    double target = 1 / (pull * pull);
    DoubleUnaryOperator excess =
        out -> {
          double tension = model.calm(out);
          return 1 / (tension * tension) - target;
        };
    double step = 0.02;
    double low = letOut;
    double atLow = excess.applyAsDouble(low);
    double high = low;
    double atHigh = atLow;
    for (int i = 0; i < 40 && atLow > 0 && low > model.leastOut; i++) {
      high = low;
      atHigh = atLow;
      low = Math.max(model.leastOut, low - step);
      atLow = excess.applyAsDouble(low);
      step *= 2;
    }
    for (int i = 0; i < 40 && atHigh < 0 && high < model.mostOut; i++) {
      low = high;
      atLow = atHigh;
      high = Math.min(model.mostOut, high + step);
      atHigh = excess.applyAsDouble(high);
      step *= 2;
    }
    if (atLow > 0 || atHigh < 0) {
      // The wire is longer than this pull leaves room for, or heavier: it hangs as long as it is.
      slack = true;
      letOut = atLow > 0 ? low : high;
    } else if (high > low) {
      letOut =
          new BracketingNthOrderBrentSolver(1e-10, 1e-8, 1e-5 * target, 3)
              .solve(60, excess::applyAsDouble, low, high, AllowedSolution.ANY_SIDE);
    }
    pull = slack ? model.calm(letOut) : pull;
    model.calm(letOut);
  }

  private List<JoinedState> weather(Weather weather) {
    List<JoinedState> found = new ArrayList<>();
    List<double[]> blowing = weather.windy() ? winds : List.of(new double[] {0, 0});
    for (double[] wind : blowing) {
      model.restore();
      model.blow(weather, wind);
      if (weightAt >= 0) {
        run();
      }
      found.add(reader.state());
    }
    return found;
  }

  /** Lets the counterweight's rope run until it pulls again with its weight. */
  private void run() {
    double still = model.rope(weightAt);
    double target = 1 / (weight * weight);
    DoubleUnaryOperator excess =
        length -> {
          double tension = model.run(weightAt, length);
          return 1 / (tension * tension) - target;
        };
    double atStill = excess.applyAsDouble(still);
    boolean runsOut = atStill < 0;
    double step = runsOut ? 0.05 : -0.05;
    double last = still;
    double atLast = atStill;
    for (int i = 0; i < 12; i++) {
      double next = Math.max(model.leastRope(weightAt), still + step);
      double atNext = excess.applyAsDouble(next);
      if (atNext >= 0 == runsOut) {
        double found =
            new BracketingNthOrderBrentSolver(1e-8, 1e-6, 1e-4 * target, 3)
                .solve(
                    60,
                    excess::applyAsDouble,
                    Math.min(last, next),
                    Math.max(last, next),
                    AllowedSolution.ANY_SIDE);
        excess.applyAsDouble(found);
        up = Math.max(up, found - still);
        down = Math.max(down, still - found);
        return;
      }
      if (next == last || step > 4) {
        break;
      }
      last = next;
      step *= 2;
    }
    // Its insulator has come up to the pulley, or the weight is drawn up to a stop.
    lifted |= runsOut;
    down = runsOut ? down : Math.max(down, still - last);
    excess.applyAsDouble(runsOut ? still : last);
  }

  // --- what was found

  @Override
  public Counterweight weight(int attachment) {
    return attachment == weightAt ? new Counterweight(weight, up, down, lifted) : null;
  }

  @Override
  public Look look(int i) {
    double[] side = calm.side(i);
    boolean icy = states.size() > 1;
    Course.Stretch stretch = course.spans().get(i);
    return new Look(
        calm.solved(i),
        pick(0, i, side, 1),
        pick(0, i, side, -1),
        icy ? states.get(1).get(0).solved(i) : null,
        icy ? pick(2, i, side, 1) : null,
        icy ? pick(2, i, side, -1) : null,
        side[0],
        side[1],
        model.ropeAt(stretch.fromHold(), i),
        model.ropeAt(stretch.toHold(), i),
        calm.solved(i).greatest(),
        calm.chord(i),
        slack,
        lifted);
  }

  /** The state in which the wind blows nearest to square on a span. */
  private Solved pick(int weather, int i, double[] side, int sign) {
    if (states.isEmpty()) {
      return calm.solved(i);
    }
    int best = 0;
    double most = Double.NEGATIVE_INFINITY;
    for (int k = 0; k < winds.size(); k++) {
      double along = sign * (winds.get(k)[0] * side[0] + winds.get(k)[1] * side[1]);
      if (along > most) {
        most = along;
        best = k;
      }
    }
    return states.get(weather).get(best).solved(i);
  }

  @Override
  public Force calm(int a) {
    return on(a, calm, Weather.CALM);
  }

  private Force on(int a, JoinedState state, Weather weather) {
    Force sum = hang.hungOn(a, weather).plus(state.onAttachment()[a]);
    return a == weightAt ? sum.plus(new Force(0, 0, -weight)) : sum;
  }

  @Override
  public Force worst(int a) {
    Force worst = states.isEmpty() ? calm(a) : Force.NONE;
    for (int w = 0; w < states.size(); w++) {
      Weather weather = hang.weathers().get(w);
      for (int k = 0; k < states.get(w).size(); k++) {
        Force force = on(a, states.get(w).get(k), weather);
        if (course.feedHeld() == a && course.corners()[a] == null && weather.windy()) {
          double push = hang.feedLoad.push(weather);
          force = force.plus(new Force(push * winds.get(k)[0], push * winds.get(k)[1], 0));
        }
        worst = force.size() > worst.size() ? force : worst;
      }
    }
    return worst;
  }
}
