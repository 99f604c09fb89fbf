package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.plan.LineLengths;
import spanwright.plan.Place;
import spanwright.plan.Point;

/** What of a hung layout does not hold: reach, pulls, strength, number of masts, lengths. */
final class Shortcomings {
  private static final double ROUNDING = 1e-6;

  private final Hang hang;
  private final Rigging rigging;
  private final List<Look> looks;
  private final Rigged rigged;
  private final List<Rigged.Shortcoming> all = new ArrayList<>();
  private final List<String> notes = new ArrayList<>();

  Shortcomings(Hang hang, List<Look> looks, Rigged rigged) {
    this.hang = hang;
    this.rigging = hang.rigging;
    this.looks = looks;
    this.rigged = rigged;
  }

  Rigged added() {
    for (int a = 0; a < rigged.attachments().size(); a++) {
      reach(a);
      pull(a);
      ropeOnly(a);
      weight(a);
    }
    for (int i = 0; i < rigged.spans().size(); i++) {
      strength(i);
      hangs(i);
    }
    masts();
    line();
    return new Rigged(
        rigged.layout(),
        rigged.conductors(),
        rigged.attachments(),
        rigged.spans(),
        rigged.tails(),
        rigged.ropes(),
        rigged.feedLine(),
        rigged.masts(),
        all,
        notes);
  }

  private void add(
      String rule,
      String to,
      String what,
      Place at,
      double found,
      double allowed,
      String reason,
      String cure) {
    all.add(new Rigged.Shortcoming(rule, to, what, at, found, allowed, reason, cure));
  }

  private static String say(String form, Object... values) {
    return String.format(Locale.ROOT, form, values);
  }

  // --- attachments

  private void reach(int a) {
    Holder holder = hang.holders.get(a);
    Rigged.Attachment attachment = rigged.attachments().get(a);
    Point at = attachment.at().onPlan();
    double away = holder.away(at);
    double allowed = holder.zone() != null ? 0 : rigging.rules.value("support-reach");
    if (away > allowed + ROUNDING) {
      add(
          holder.zone() != null ? "mast-zone" : "support-reach",
          holder.id(),
          "attachment",
          attachment.at(),
          away,
          allowed,
          say(
              holder.zone() != null
                  ? "The mast stands %.2f m outside %s."
                  : "The attachment is %.2f m from %s; at most 0.5 m is a place on it.",
              away,
              holder.name()),
          say("Move it %.2f m towards %s.", away - allowed, holder.name()));
    }
    double height = attachment.aboveGround();
    boolean high = height > holder.highest() + ROUNDING;
    if (high || height < holder.lowest() - ROUNDING) {
      double bound = high ? holder.highest() : holder.lowest();
      add(
          "support-reach",
          holder.id(),
          "attachment",
          attachment.at(),
          height,
          bound,
          say(
              "The attachment is %.2f m above the ground; %s holds between %.2f m and %.2f m.",
              height, holder.name(), holder.lowest(), holder.highest()),
          say("%s it to %.2f m.", high ? "Lower" : "Raise", bound));
    }
  }

  private void pull(int a) {
    Rigged.Attachment attachment = rigged.attachments().get(a);
    Double limit = attachment.pullLimit();
    Holder holder = hang.holders.get(a);
    if (limit == null) {
      notes.add(say("What %s may take is not known: its pull is not checked.", holder.name()));
      return;
    }
    double found = Math.max(attachment.pull().size(), attachment.pullInWind().size());
    if (limit <= 0) {
      add(
          "support-pull",
          holder.id(),
          "pull",
          attachment.at(),
          found,
          0,
          say("%s must never be used to hold anything.", holder.name()),
          null);
    } else if (found > limit * rigging.rules.value("support-pull")) {
      add(
          "support-pull",
          holder.id(),
          "pull",
          attachment.at(),
          found / limit,
          rigging.rules.value("support-pull"),
          say(
              "The pull on %s is %.0f N in the gust; it may take %.0f N, and the wire already"
                  + " hangs as loose as is sensible.",
              holder.name(), found, limit),
          null);
    }
  }

  private void ropeOnly(int a) {
    Holder holder = hang.holders.get(a);
    if (!holder.ropeOnly()) {
      return;
    }
    double rope = Double.POSITIVE_INFINITY;
    for (Rigged.Span span : rigged.spans()) {
      rope = span.from() == a ? Math.min(rope, span.ropeFrom()) : rope;
      rope = span.to() == a ? Math.min(rope, span.ropeTo()) : rope;
    }
    if (rope < Practice.SHORTEST_TAIL) {
      add(
          "rope-only",
          holder.id(),
          "wire",
          rigged.attachments().get(a).at(),
          rope,
          Practice.SHORTEST_TAIL,
          say("%s may hold a rope, but the wire itself comes up to it.", holder.name()),
          "End the wire short of it and go on with a rope of 1 m.");
    }
  }

  // --- spans

  private void strength(int i) {
    Rigged.Span span = rigged.spans().get(i);
    Materials materials = hang.materials(span.conductor());
    double share = span.greatestTension() / materials.wireBreaking();
    double allowed = rigging.rules.value("wire-strength");
    Place middle = span.shapes().calm().get(span.shapes().calm().size() / 2);
    if (share > allowed) {
      add(
          "wire-strength",
          hang.wire(span.conductor()).id(),
          "wire",
          middle,
          share,
          allowed,
          say(
              "The wire would carry %.0f N in the gust, %.0f %% of what breaks it; at most %.0f %%"
                  + " is allowed.",
              span.greatestTension(), 100 * share, 100 * allowed),
          null);
    }
    double rope = looks.get(i).greatestRope();
    double working = rope / materials.ropeWorking();
    double most = rigging.rules.value("rope-strength");
    if (working > most && (span.ropeFrom() > 0.01 || span.ropeTo() > 0.01)) {
      add(
          "rope-strength",
          rigging.rope().id(),
          "rope",
          middle,
          working,
          most,
          say(
              "The rope would carry %.0f N in the gust; its working load is %.0f N.",
              rope, materials.ropeWorking()),
          say("Take a rope with a working load of at least %.0f N.", Math.ceil(rope / most)));
    }
  }

  private void hangs(int i) {
    Look look = looks.get(i);
    Rigged.Span span = rigged.spans().get(i);
    Place middle = span.shapes().calm().get(span.shapes().calm().size() / 2);
    String from = hang.holders.get(span.from()).name();
    String to = hang.holders.get(span.to()).name();
    // Of a loop between two supports, the lower half is meant to hang.
    boolean meant = rigged.isLoop() && rigged.attachments().size() == 2;
    if (look.slack() && span.sag() > 0.25 * look.chord() && !meant) {
      boolean joined = hang.course.hangsTogether();
      double ropes = joined ? 0 : span.ropeFrom() + span.ropeTo();
      double over = ropes + span.wireLength() - look.chord();
      add(
          "hangs",
          hang.holders.get(span.from()).id(),
          "wire",
          middle,
          span.sag(),
          0.25 * look.chord(),
          say(
              "The wire is %.1f m longer than the way between %s and %s; it would hang %.1f m"
                  + " deep.",
              over, from, to, span.sag()),
          say("Shorten the wire by %.1f m.", over));
    }
    if (look.lifted()) {
      lifted(span);
    }
  }

  /** What a counterweight needs to be hung right. */
  private void weight(int a) {
    Rigged.Attachment at = rigged.attachments().get(a);
    if (at.kilograms() == null) {
      return;
    }
    String name = hang.holders.get(a).name();
    if (at.slackAtPulley() < Practice.SHORTEST_TAIL) {
      notes.add(
          say(
              "As %s sways, the wire's end comes up to the pulley there: %.1f m more rope between"
                  + " them would let the weight go down its whole way.",
              name, Practice.SHORTEST_TAIL - at.slackAtPulley()));
    }
    if (at.weightDown() > Practice.WEIGHT_HEIGHT - 0.3) {
      notes.add(
          say(
              "The weight at %s goes down %.1f m in the gust: hang it %.1f m above the ground.",
              name, at.weightDown(), at.weightDown() + 0.3));
    }
  }

  private void lifted(Rigged.Span span) {
    for (int a : new int[] {span.from(), span.to()}) {
      Statics.Counterweight weight = hang.statics.weight(a);
      String note =
          say(
              "In the design gust the counterweight at %s is drawn up: tie a stop into its rope at"
                  + " the pulley, from where the span holds as if tied.",
              hang.holders.get(a).name());
      if (weight != null && weight.lifted() && !notes.contains(note)) {
        notes.add(note);
      }
    }
  }

  // --- masts and line

  private void masts() {
    int built = rigged.masts().size();
    int allowed = rigging.plan.brief().newMasts();
    if (built > allowed) {
      Rigged.Mast last = rigged.masts().get(built - 1);
      add(
          "new-masts",
          last.zone(),
          "mast",
          last.top(),
          built,
          allowed,
          say("It needs %d new masts; the brief allows %d.", built, allowed),
          say("Allow %d in the brief, or hang it from what stands.", built));
    }
    for (Rigged.Mast each : rigged.masts()) {
      if (each.consent() != null && !each.consent().equalsIgnoreCase("none")) {
        notes.add(say("The mast of %.1f m needs: %s.", each.height(), each.consent()));
      }
    }
  }

  private void line() {
    Rigged.FeedLine line = rigged.feedLine();
    LineLengths atHand = rigging.plan.brief().lineLengths();
    boolean proposed = rigged.layout().feed().lineLength() == null && !atHand.isFree();
    double longest = atHand.lengths().stream().mapToDouble(l -> l).max().orElse(0);
    if (proposed && longest < line.runLength() - ROUNDING) {
      add(
          "hangs",
          "entry",
          "feed line",
          line.feedpoint(),
          longest,
          line.runLength(),
          say(
              "No feed line at hand reaches: the longest is %.1f m, the way to the entry takes"
                  + " %.1f m.",
              longest, line.runLength()),
          say(
              "Add a length of at least %.1f m to the brief's line lengths.",
              Math.ceil(line.runLength() * 10) / 10));
      return;
    }
    if (line.length() < line.runLength() - ROUNDING) {
      add(
          "hangs",
          "entry",
          "feed line",
          line.feedpoint(),
          line.length(),
          line.runLength(),
          say(
              "The feed line of %.1f m does not reach: the way to the entry takes %.1f m.",
              line.length(), line.runLength()),
          say("Take a feed line of at least %.1f m.", Math.ceil(line.runLength() * 10) / 10));
    } else if (line.stowed() > 0.5) {
      notes.add(
          say(
              "%.1f m of feed line are left over: lead them to and fro on stand-offs near the"
                  + " entry, never in a coil.",
              line.stowed()));
    }
  }
}
