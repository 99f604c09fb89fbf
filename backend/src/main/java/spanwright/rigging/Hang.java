package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.LineKind;
import spanwright.plan.Place;
import spanwright.plan.WireKind;

/** The work on one layout: spans are set up, drawn to their pulls, blown, and read out. */
final class Hang {
  private static final double G = Hanging.GRAVITY;
  private static final int TRIES = 8;

  final Rigging rigging;
  final Layout layout;
  final Course course;
  final WireKind wire;
  final LineKind line;
  final Materials materials;
  final List<Holder> holders = new ArrayList<>();
  final boolean windy;

  private final List<SpanStatics> spans = new ArrayList<>();
  private final int[] weightSpan;
  private final double[] pulls;
  private final double[] floors;

  SpanStatics.Solved[] calm;
  SpanStatics.Solved[] gust;
  SpanStatics.Solved[] iced;
  final double[] lineOnHeld = new double[3];
  private double feedWeight;
  private double feedPush;
  private double feedIced;

  Hang(Rigging rigging, Layout layout, boolean windy) {
    this.rigging = rigging;
    this.layout = layout;
    this.windy = windy;
    if (layout.feed() == null) {
      throw new IllegalArgumentException("feed: is missing. Say where the feed line joins.");
    }
    if (layout.feed().conductor() != 0) {
      throw new IllegalArgumentException("feed.conductor: there is only conductor 0. Give 0.");
    }
    layout.attachments().forEach(each -> holders.add(rigging.holder(each.on())));
    course = Course.of(layout);
    wire = rigging.wire(layout.conductors().get(0).wire());
    line = rigging.line(layout.feed().line());
    materials = rigging.materials(wire);
    int count = course.spans().size();
    weightSpan = new int[layout.attachments().size()];
    java.util.Arrays.fill(weightSpan, -1);
    pulls = new double[count];
    floors = new double[count];
    calm = new SpanStatics.Solved[count];
    gust = new SpanStatics.Solved[count];
    iced = new SpanStatics.Solved[count];
  }

  Rigged rigged() {
    estimateLine();
    for (int i = 0; i < course.spans().size(); i++) {
      spans.add(span(i));
    }
    choosePulls();
    if (windy && preferWeights()) {
      choosePulls();
    }
    return new ReadOut(this).rigged();
  }

  SpanStatics statics(int i) {
    return spans.get(i);
  }

  /** The span whose counterweight hangs at an attachment, or -1. */
  int weightSpan(int attachment) {
    return weightSpan[attachment];
  }

  double feedWeight() {
    return feedWeight;
  }

  // --- setting up

  /** What the feed line will put on the feedpoint, from where that will be, near enough. */
  private void estimateLine() {
    Place near = feedEstimate();
    List<Place> feet = rigging.lineRun.foot(near);
    double length = LineRun.hangingLength(near, feet.get(0));
    double weight = LineRun.weight(line, materials, false);
    LineRun.Hung hung = LineRun.hang(near, feet, length, weight, 0, 0);
    double share = Math.max(0, -hung.pull().z()) / weight;
    feedWeight = share * weight + Practice.CENTRE_WEIGHT * G;
    feedIced = share * LineRun.weight(line, materials, true) + Practice.CENTRE_WEIGHT * G;
    feedPush = materials.push(line.diameter(), rigging.isIcy()) * length / 2;
  }

  private Place feedEstimate() {
    if (course.feedHeld() >= 0) {
      return layout.attachments().get(course.feedHeld()).at();
    }
    if (course.feedSpan() < 0) {
      boolean head = course.feedAt() < course.headTail();
      int at = head ? 0 : layout.attachments().size() - 1;
      Place hold = layout.attachments().get(at).at();
      double down = head ? course.headTail() - course.feedAt() : course.feedAt() - held(at);
      return new Place(hold.x(), hold.y(), hold.z() - down);
    }
    Course.Stretch stretch = course.spans().get(course.feedSpan());
    Place a = layout.attachments().get(course.feedSpan()).at();
    Place b = layout.attachments().get(course.feedSpan() + 1).at();
    double chord = Math.max(1e-6, a.distance(b));
    double along = stretch.ropeFrom() + course.feedAt() - stretch.from();
    double t = Math.min(1, along / chord);
    return new Place(
        a.x() + t * (b.x() - a.x()),
        a.y() + t * (b.y() - a.y()),
        a.z() + t * (b.z() - a.z()) - 0.02 * chord);
  }

  private double held(int attachment) {
    return attachment == 0 ? course.headTail() : course.spans().get(attachment - 1).to();
  }

  private SpanStatics span(int i) {
    Course.Stretch stretch = course.spans().get(i);
    boolean fed = course.feedSpan() == i;
    double before = fed ? course.feedAt() - stretch.from() : stretch.wire();
    Place from = layout.attachments().get(i).at();
    Place to = layout.attachments().get(i + 1).at();
    if (from.distance(to) < 0.3) {
      throw new IllegalArgumentException(
          "attachments: " + (i + 1) + " and " + (i + 2) + " are less than 0.3 m apart. Move one.");
    }
    SpanStatics.Make make =
        new SpanStatics.Make(
            from,
            to,
            holders.get(i).sway(),
            holders.get(i + 1).sway(),
            before,
            stretch.wire() - before,
            stretch.ropeFrom(),
            stretch.ropeTo(),
            stretch.ropeFrom() > 0,
            stretch.ropeTo() > 0,
            fed);
    boolean atEnd = pullAtEnd(i);
    int end = atEnd ? i + 1 : i;
    return statics(i, make, atEnd, isOuter(end) && holders.get(end).isTree());
  }

  private boolean isOuter(int attachment) {
    return attachment == 0 || attachment == layout.attachments().size() - 1;
  }

  private SpanStatics statics(int i, SpanStatics.Make make, boolean atEnd, boolean weight) {
    for (int end = i; end <= i + 1; end++) {
      weightSpan[end] = weightSpan[end] == i ? -1 : weightSpan[end];
    }
    if (weight) {
      weightSpan[atEnd ? i + 1 : i] = i;
    }
    SpanStatics statics = new SpanStatics(make, materials, atEnd, weight);
    int room = 57 - ReadOut.TAIL_PARTS * (isLoose(course.headTail()) + isLoose(course.endTail()));
    statics.setWireParts(Math.max(6, Math.min(28, room / course.spans().size())));
    statics.setFeedLoad(feedWeight, feedPush, feedIced);
    return statics;
  }

  private static int isLoose(double tail) {
    return tail > 1e-6 ? 1 : 0;
  }

  /** Whether the pull of a span is set at its second end. */
  private boolean pullAtEnd(int i) {
    int last = layout.attachments().size() - 1;
    boolean outerFrom = i == 0;
    boolean outerTo = i + 1 == last;
    if (outerFrom != outerTo) {
      return outerTo;
    }
    Holder from = holders.get(i);
    Holder to = holders.get(i + 1);
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
      double strongest =
          Math.min(Practice.CALM_SHARE * materials.wireBreaking(), materials.ropeWorking());
      double wanted = Math.min(strongest, span.tensionForSag(Practice.LEAST_SAG));
      for (int end = i; end <= i + 1; end++) {
        Double limit = holders.get(end).pullLimit();
        double share = weightSpan[end] == i ? 1.45 : 1.0;
        if (limit != null) {
          wanted = Math.min(wanted, limit / share);
        }
      }
      pulls[i] = Math.max(floors[i], wanted);
    }
    for (int attempt = 0; attempt < TRIES; attempt++) {
      solve();
      if (!windy || !letOut()) {
        return;
      }
    }
    solve();
  }

  /**
   * Where a tie that holds in the gust would hang loose on a calm day, a counterweight keeps the
   * pull and hangs tighter. True when a span was changed so.
   */
  private boolean preferWeights() {
    boolean changed = false;
    for (int i = 0; i < pulls.length; i++) {
      SpanStatics span = spans.get(i);
      double loose = span.sag(calm[i].points()) / span.chordLength;
      if (span.byWeight || span.slackerThanAsked || loose <= Practice.LOOSE_TIE) {
        continue;
      }
      double most = 0;
      boolean atEnd = true;
      for (int end = i + 1; end >= i; end--) {
        double pull = isOuter(end) ? pullByWeight(i, end) : 0;
        if (pull > most * 1.001) {
          most = pull;
          atEnd = end == i + 1;
        }
      }
      // The sag goes as one over the pull.
      if (most > 1.5 * span.tensionForSag(loose)) {
        SpanStatics tied = span;
        spans.set(i, statics(i, tied.make, atEnd, true));
        spans.get(i).calm(most);
        spans.get(i).loaded(true, rigging.isIcy());
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

  private double pullByWeight(int i, int end) {
    double pull = Math.min(Practice.CALM_SHARE * materials.wireBreaking(), materials.ropeWorking());
    Double here = holders.get(end).pullLimit();
    Double there = holders.get(end == i ? i + 1 : i).pullLimit();
    pull = here == null ? pull : Math.min(pull, here / 1.45);
    return there == null ? pull : Math.min(pull, 0.95 * there);
  }

  private void solve() {
    for (int i = 0; i < pulls.length; i++) {
      SpanStatics span = spans.get(i);
      span.slackerThanAsked = false;
      span.lifted = false;
      span.calm(pulls[i]);
      calm[i] = span.keep(false);
      gust[i] = windy ? span.loaded(true, rigging.isIcy()) : calm[i];
      iced[i] = windy && rigging.isIcy() ? span.loaded(false, true) : null;
    }
  }

  /** Lets spans out where something does not hold; false when nothing was or could be let out. */
  private boolean letOut() {
    boolean changed = false;
    double[] factor = new double[pulls.length];
    java.util.Arrays.fill(factor, 1);
    for (int i = 0; i < pulls.length; i++) {
      double most = Math.max(gust[i].greatest(), iced[i] == null ? 0 : iced[i].greatest());
      double allowed =
          Math.min(
              rigging.rules.value("wire-strength") * materials.wireBreaking(),
              rigging.rules.value("rope-strength") * materials.ropeWorking());
      factor[i] = Math.min(factor[i], Practice.HEADROOM * allowed / most);
    }
    for (int a = 0; a < holders.size(); a++) {
      Double limit = holders.get(a).pullLimit();
      if (limit != null && limit > 0) {
        double found = Math.max(onAttachment(a, false).size(), inGust(a).size());
        double share = Practice.HEADROOM * limit / Math.max(1e-9, found);
        for (int i = Math.max(0, a - 1); i <= Math.min(a, pulls.length - 1); i++) {
          factor[i] = Math.min(factor[i], share);
        }
      }
    }
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

  /** Whole force on an attachment in calm air. */
  Force onAttachment(int a, boolean frozen) {
    Force sum = lineOn(a, frozen);
    SpanStatics.Solved[] state = frozen ? iced : calm;
    if (a > 0) {
      sum = sum.plus(state[a - 1].onTo());
    }
    if (a < pulls.length) {
      sum = sum.plus(state[a].onFrom());
    }
    return sum.plus(counterweight(a));
  }

  private Force counterweight(int a) {
    int span = weightSpan[a];
    return span < 0 ? Force.NONE : new Force(0, 0, -spans.get(span).pull);
  }

  private Force lineOn(int a, boolean frozen) {
    double hung = tailWeight(a);
    if (course.feedHeld() == a) {
      hung += frozen ? feedIced : feedWeight;
    }
    return new Force(0, 0, -hung);
  }

  private double tailWeight(int a) {
    double length = 0;
    if (a == 0) {
      length += course.headTail();
    }
    if (a == holders.size() - 1) {
      length += course.endTail();
    }
    return length * materials.wireWeight() * G;
  }

  /** Whole force on an attachment in the worse gust: the winds on its two spans in any pairing. */
  Force inGust(int a) {
    Force still = lineOn(a, rigging.isIcy()).plus(counterweight(a));
    Force worst = Force.NONE;
    for (int pairing = 0; pairing < 4; pairing++) {
      Force sum = still;
      if (a > 0) {
        Force force = gust[a - 1].onTo();
        sum = sum.plus((pairing & 1) == 0 ? force : spans.get(a - 1).mirrored(force));
      }
      if (a < pulls.length) {
        Force force = gust[a].onFrom();
        sum = sum.plus((pairing & 2) == 0 ? force : spans.get(a).mirrored(force));
      }
      if (course.feedHeld() == a) {
        SpanStatics span = spans.get(Math.min(a, pulls.length - 1));
        double side = (pairing & 2) == 0 ? feedPush : -feedPush;
        sum = sum.plus(new Force(side * span.sideX, side * span.sideY, 0));
      }
      worst = sum.size() > worst.size() ? sum : worst;
    }
    if (rigging.isIcy() && windy) {
      Force frozen = onAttachment(a, true);
      worst = frozen.size() > worst.size() ? frozen : worst;
    }
    return worst;
  }
}
