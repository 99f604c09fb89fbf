package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;

/**
 * Spans between attachments that hold the wire themselves: each is hung on its own, drawn to its
 * pull, blown square to itself, and let out until everything holds.
 */
final class SeparateSpans implements Statics {
  private static final int TRIES = 8;

  private final Hang hang;
  private final Rigging rigging;
  private final Course course;
  private final List<Holder> holders;
  private final boolean windy;
  private final List<SpanStatics> spans = new ArrayList<>();
  private final int[] weightSpan;
  private final double[] pulls;
  private final double[] floors;
  private final Solved[][] states;

  SeparateSpans(Hang hang) {
    this.hang = hang;
    rigging = hang.rigging;
    course = hang.course;
    holders = hang.holders;
    windy = hang.windy;
    int count = course.spans().size();
    weightSpan = new int[holders.size()];
    java.util.Arrays.fill(weightSpan, -1);
    pulls = new double[count];
    floors = new double[count];
    states = new Solved[Weather.values().length][count];
    for (int i = 0; i < count; i++) {
      spans.add(span(i));
    }
  }

  @Override
  public void hang() {
    choosePulls();
    if (windy && preferWeights()) {
      choosePulls();
    }
  }

  // --- setting up

  private SpanStatics span(int i) {
    Course.Stretch stretch = course.spans().get(i);
    boolean fed = course.feedSpan() == i;
    double before = fed ? course.feedAt() - stretch.from() : stretch.wire();
    SpanStatics.Make make =
        new SpanStatics.Make(
            hang.at(stretch.fromHold()),
            hang.at(stretch.toHold()),
            holders.get(stretch.fromHold()).sway(),
            holders.get(stretch.toHold()).sway(),
            before,
            stretch.wire() - before,
            stretch.ropeFrom(),
            stretch.ropeTo(),
            stretch.ropeFrom() > 0,
            stretch.ropeTo() > 0,
            fed);
    boolean atEnd = pullAtEnd(stretch);
    int end = atEnd ? stretch.toHold() : stretch.fromHold();
    return statics(i, make, atEnd, course.isOuter(end) && holders.get(end).isTree());
  }

  private SpanStatics statics(int i, SpanStatics.Make make, boolean atEnd, boolean weight) {
    Course.Stretch stretch = course.spans().get(i);
    for (int end : new int[] {stretch.fromHold(), stretch.toHold()}) {
      weightSpan[end] = weightSpan[end] == i ? -1 : weightSpan[end];
    }
    if (weight) {
      weightSpan[atEnd ? stretch.toHold() : stretch.fromHold()] = i;
    }
    SpanStatics statics = new SpanStatics(make, hang.materials(stretch.conductor()), atEnd, weight);
    statics.setWireParts(hang.wireParts(i));
    statics.setFeedLoad(hang.feedLoad);
    return statics;
  }

  /** Whether the pull of a span is set at its second end. */
  private boolean pullAtEnd(Course.Stretch stretch) {
    boolean outerFrom = course.isOuter(stretch.fromHold());
    boolean outerTo = course.isOuter(stretch.toHold());
    if (outerFrom != outerTo) {
      return outerTo;
    }
    Holder from = holders.get(stretch.fromHold());
    Holder to = holders.get(stretch.toHold());
    if (outerFrom && from.isTree() != to.isTree()) {
      return to.isTree();
    }
    return !outerFrom || !from.isTree() || to.sway() >= from.sway();
  }

  // --- pulls

  private void choosePulls() {
    for (int i = 0; i < pulls.length; i++) {
      SpanStatics span = spans.get(i);
      floors[i] = span.tensionForSag(Practice.MOST_SAG);
      double wanted = Math.min(strongest(i), span.tensionForSag(Practice.LEAST_SAG));
      for (int end : ends(i)) {
        Double limit = holders.get(end).pullLimit();
        double share = weightSpan[end] == i ? 1.45 : 1.0;
        if (limit != null) {
          wanted = Math.min(wanted, limit / share);
        }
      }
      pulls[i] = Math.max(floors[i], wanted);
    }
    solve();
    if (!windy) {
      return;
    }
    double best = 0;
    double[] bestPulls = pulls.clone();
    for (int attempt = 0; attempt <= TRIES; attempt++) {
      double[] factor = factors();
      double least = java.util.Arrays.stream(factor).min().orElse(1);
      if (least > best) {
        best = least;
        System.arraycopy(pulls, 0, bestPulls, 0, pulls.length);
      }
      if (attempt == TRIES || !letOut(factor)) {
        break;
      }
      solve();
    }
    // A lighter weight may be drawn up where a heavier one held: the best of what was tried stands.
    if (best < 1 && !java.util.Arrays.equals(bestPulls, pulls)) {
      System.arraycopy(bestPulls, 0, pulls, 0, pulls.length);
      solve();
    }
  }

  /**
   * Where a tie that holds in the gust would hang loose on a calm day, a counterweight keeps the
   * pull and hangs tighter. True when a span was changed so.
   */
  private boolean preferWeights() {
    boolean changed = false;
    for (int i = 0; i < pulls.length; i++) {
      SpanStatics span = spans.get(i);
      double loose = Solved.sag(calm()[i].points()) / span.chordLength;
      if (span.byWeight || span.slackerThanAsked || loose <= Practice.LOOSE_TIE) {
        continue;
      }
      double most = 0;
      boolean atEnd = true;
      int[] ends = ends(i);
      for (int k = 1; k >= 0; k--) {
        double pull = course.isOuter(ends[k]) ? pullByWeight(i, ends[k], ends[1 - k]) : 0;
        if (pull > most * 1.001) {
          most = pull;
          atEnd = k == 1;
        }
      }
      // The sag goes as one over the pull.
      if (most > 1.5 * span.tensionForSag(loose)) {
        SpanStatics tied = span;
        spans.set(i, statics(i, tied.make, atEnd, true));
        spans.get(i).calm(most);
        for (Weather weather : weathers()) {
          spans.get(i).loaded(weather);
        }
        if (spans.get(i).lifted) {
          // takes the weight off again; the span goes back as it was hung
          statics(i, tied.make, tied.pullAtEnd, false);
          spans.set(i, tied);
        } else {
          changed = true;
        }
      }
    }
    return changed;
  }

  private int[] ends(int i) {
    return new int[] {course.spans().get(i).fromHold(), course.spans().get(i).toHold()};
  }

  private double strongest(int i) {
    Materials materials = hang.materials(course.spans().get(i).conductor());
    return Math.min(Practice.CALM_SHARE * materials.wireBreaking(), materials.ropeWorking());
  }

  private double pullByWeight(int i, int end, int other) {
    double pull = strongest(i);
    Double here = holders.get(end).pullLimit();
    Double there = holders.get(other).pullLimit();
    pull = here == null ? pull : Math.min(pull, here / 1.45);
    return there == null ? pull : Math.min(pull, 0.95 * there);
  }

  private List<Weather> weathers() {
    return hang.weathers();
  }

  private void solve() {
    for (int i = 0; i < pulls.length; i++) {
      SpanStatics span = spans.get(i);
      span.slackerThanAsked = false;
      span.lifted = false;
      span.weightTravel = 0;
      span.calm(pulls[i]);
      calm()[i] = span.keep(false);
      for (Weather weather : weathers()) {
        states[weather.ordinal()][i] = span.loaded(weather);
      }
    }
  }

  private Solved[] calm() {
    return states[Weather.CALM.ordinal()];
  }

  private Solved state(Weather weather, int i) {
    return states[weather.ordinal()][i];
  }

  /** By how much each span's pull is too great for what must hold; 1 where all of it holds. */
  private double[] factors() {
    double[] factor = new double[pulls.length];
    java.util.Arrays.fill(factor, 1);
    for (int i = 0; i < pulls.length; i++) {
      double most = 0;
      for (Weather weather : weathers()) {
        most = Math.max(most, state(weather, i).greatest());
      }
      factor[i] = Math.min(factor[i], hang.allowed(i) / most);
    }
    for (int a = 0; a < holders.size(); a++) {
      Double limit = holders.get(a).pullLimit();
      if (limit != null && limit > 0) {
        double found = Math.max(calm(a).size(), worst(a).size());
        double share = Practice.HEADROOM * limit / Math.max(1e-9, found);
        for (int i : course.at(a)) {
          factor[i] = Math.min(factor[i], share);
        }
      }
    }
    return factor;
  }

  /** Lets spans out where something does not hold; false when nothing was or could be let out. */
  private boolean letOut(double[] factor) {
    boolean changed = false;
    for (int i = 0; i < pulls.length; i++) {
      boolean room = pulls[i] > floors[i] * (1 + 1e-9) && !spans.get(i).slackerThanAsked;
      if (factor[i] < 1 && room) {
        // A tied span's pull in the gust follows its calm pull only in part.
        double step = Math.max(0.5, isTied(i) ? factor[i] * factor[i] : factor[i]);
        pulls[i] = Math.max(floors[i], pulls[i] * step);
        changed = true;
      }
    }
    return changed;
  }

  private boolean isTied(int i) {
    return !spans.get(i).byWeight || spans.get(i).lifted;
  }

  // --- what was found

  @Override
  public Counterweight weight(int attachment) {
    int span = weightSpan[attachment];
    if (span < 0) {
      return null;
    }
    SpanStatics statics = spans.get(span);
    double sway = windy ? statics.make.swayFrom() + statics.make.swayTo() : 0;
    double travel = statics.weightTravel;
    return new Counterweight(
        statics.pull, Math.max(0, travel) + sway, Math.max(0, -travel) + sway, statics.lifted);
  }

  @Override
  public Look look(int i) {
    SpanStatics statics = spans.get(i);
    Solved calm = calm()[i];
    Solved gust = windy ? state(Weather.GUST, i) : calm;
    boolean icy = windy && rigging.isIcy();
    Solved iced = icy ? state(Weather.ICY_GUST, i) : null;
    return new Look(
        calm,
        gust,
        windy ? mirrored(i, gust) : calm,
        icy ? state(Weather.ICE, i) : null,
        iced,
        icy ? mirrored(i, iced) : null,
        statics.sideX,
        statics.sideY,
        Math.max(0, statics.ropeFrom),
        Math.max(0, statics.ropeTo),
        statics.pull,
        statics.chordLength,
        statics.slackerThanAsked,
        statics.lifted);
  }

  private Solved mirrored(int i, Solved gust) {
    SpanStatics span = spans.get(i);
    return gust.with(
        span.mirrored(gust.points()), span.mirrored(gust.onFrom()), span.mirrored(gust.onTo()));
  }

  @Override
  public Force calm(int a) {
    return still(a, Weather.CALM);
  }

  /** Force on an attachment in a weather without wind. */
  private Force still(int a, Weather weather) {
    Force sum = hang.hungOn(a, weather).plus(counterweight(a));
    for (int i : course.at(a)) {
      sum = sum.plus(on(a, i, state(weather, i)));
    }
    return sum;
  }

  private Force on(int a, int i, Solved state) {
    return course.spans().get(i).fromHold() == a ? state.onFrom() : state.onTo();
  }

  private Force counterweight(int a) {
    int span = weightSpan[a];
    return span < 0 ? Force.NONE : new Force(0, 0, -spans.get(span).pull);
  }

  /** The worst of every weather, the winds on the spans of an attachment in any pairing. */
  @Override
  public Force worst(int a) {
    Force worst = windy ? Force.NONE : calm(a);
    for (Weather weather : weathers()) {
      Force force = weather.windy() ? blown(a, weather) : still(a, weather);
      worst = force.size() > worst.size() ? force : worst;
    }
    return worst;
  }

  private Force blown(int a, Weather weather) {
    Force still = hang.hungOn(a, weather).plus(counterweight(a));
    int[] here = course.at(a);
    Force worst = Force.NONE;
    for (int pairing = 0; pairing < 1 << here.length; pairing++) {
      Force sum = still;
      for (int k = 0; k < here.length; k++) {
        Force force = on(a, here[k], state(weather, here[k]));
        sum = sum.plus((pairing >> k & 1) == 0 ? force : spans.get(here[k]).mirrored(force));
      }
      if (course.feedHeld() == a) {
        SpanStatics span = spans.get(here[here.length - 1]);
        double push = hang.feedLoad.push(weather);
        double side = (pairing >> here.length - 1 & 1) == 0 ? push : -push;
        sum = sum.plus(new Force(side * span.sideX, side * span.sideY, 0));
      }
      worst = sum.size() > worst.size() ? sum : worst;
    }
    return worst;
  }
}
