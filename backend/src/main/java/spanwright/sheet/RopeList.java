package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.plan.RopeKind;

/**
 * Ropes and guys, as the rigging has reckoned with them when something lets go: a rope to a weight
 * runs over its pulley and is cut no longer than its run and its knots; a halyard is endless, and
 * the tail that is tied to it cannot run through. What it takes beyond that to bring an end down to
 * the ground is a line kept aside.
 */
final class RopeList {
  private final Job job;
  private final List<WireList.Piece> pieces;
  private final List<CutParts.Rope> ropes = new ArrayList<>();
  private int lifts;
  private double lowering;
  private CutParts.Rope lowered;
  private String loweredAt;
  private int guys;

  private RopeList(Job job) {
    this.job = job;
    this.pieces = WireList.pieces(job.placement);
  }

  static List<CutParts.Rope> of(Job job) {
    RopeList list = new RopeList(job);
    for (int i = 0; i < job.placement.attachments().size(); i++) {
      list.addRopes(i);
    }
    list.addLoweringLine();
    job.placement.masts().forEach(list::addGuys);
    return list.ropes;
  }

  private List<Placement.RopeRun> runs(int attachment, String... words) {
    return job.placement.ropes().stream()
        .filter(r -> r.attachment() == attachment && List.of(words).contains(r.what()))
        .toList();
  }

  private void addRopes(int attachment) {
    List<Placement.RopeRun> tails = new ArrayList<>(runs(attachment, "tail"));
    for (Placement.RopeRun fall : runs(attachment, "fall")) {
      addWeightRope(attachment, tails.isEmpty() ? null : tails.remove(0), fall);
    }
    List<Placement.RopeRun> halyards = runs(attachment, "halyard");
    tails.forEach(tail -> addTail(attachment, tail, !halyards.isEmpty()));
    halyards.forEach(halyard -> addHalyard(attachment, halyard));
  }

  /** From the wire's end over a pulley to a weight: one rope, no longer than it must be. */
  private void addWeightRope(int attachment, Placement.RopeRun tail, Placement.RopeRun fall) {
    Placement.Attachment held = job.placement.attachments().get(attachment);
    double run = (tail == null ? 0 : tail.length()) + fall.length();
    add(
        fall.rope(),
        end(attachment),
        pulley(held),
        weightWords(held),
        "tied to the weight",
        run,
        2 * Allowances.KNOT);
    double more = 2 * held.aboveGround() - run;
    if (more > lowering) {
      lowering = more;
      lowered = ropes.get(ropes.size() - 1);
      loweredAt = pulley(held);
    }
  }

  private void addTail(int attachment, Placement.RopeRun tail, boolean toHalyard) {
    Placement.Attachment held = job.placement.attachments().get(attachment);
    add(
        tail.rope(),
        end(attachment),
        null,
        toHalyard ? "the halyard at " + job.holder(held) : job.holder(held),
        toHalyard ? "tied to the halyard, so that it cannot run through" : "tied",
        tail.length(),
        2 * Allowances.KNOT);
  }

  /** Endless: up one side and down the other, both parts on the cleat. */
  private void addHalyard(int attachment, Placement.RopeRun halyard) {
    Placement.Attachment held = job.placement.attachments().get(attachment);
    add(
        halyard.rope(),
        "cleat at the foot",
        pulley(held),
        "the same cleat",
        "endless: both parts made off",
        halyard.length(),
        Allowances.KNOT + Allowances.CLEAT);
  }

  /** A line kept aside: bent on to a weight's rope, it lets the end down to the ground. */
  private void addLoweringLine() {
    if (lowered == null) {
      return;
    }
    add(
        lowered.rope(),
        "kept aside: bent on at the weight end of " + lowered.mark() + " to lower it",
        loweredAt,
        "the hand",
        "never left up",
        lowering,
        Allowances.KNOT + Allowances.HAND);
  }

  private void add(
      String rope,
      String from,
      String over,
      String to,
      String madeOff,
      double run,
      double allowance) {
    RopeKind kind = job.rope(rope);
    ropes.add(
        new CutParts.Rope(
            "R" + ++lifts,
            kind.id(),
            kind.name(),
            from,
            over,
            to,
            madeOff,
            run,
            allowance,
            Figures.upToHalfMetre(run + allowance)));
  }

  private String pulley(Placement.Attachment held) {
    return (job.isTree(held.on()) ? "pulley or limb, " : "pulley, ") + job.holder(held);
  }

  private static String weightWords(Placement.Attachment held) {
    return held.kilograms() == null
        ? "weight"
        : "weight, " + Figures.kilograms(held.kilograms()) + " kg";
  }

  private String end(int attachment) {
    return pieces.stream()
        .filter(p -> p.far() == attachment && !p.loop())
        .findFirst()
        .map(
            p ->
                p.free() > 0
                    ? "insulator on "
                        + p.mark()
                        + ", "
                        + job.figures.say(p.free())
                        + " from its end as it hangs"
                    : "end of " + p.mark())
        .orElse(
            "centre".equals(job.placement.attachments().get(attachment).held())
                ? "centre piece"
                : isLoop() ? "insulator at a corner of the loop" : "insulator on the wire");
  }

  private boolean isLoop() {
    return pieces.stream().anyMatch(WireList.Piece::loop);
  }

  private void addGuys(Placement.NewMast mast) {
    String kindId =
        job.placement.ropes().stream()
            .filter(r -> r.what().equals("guy"))
            .map(Placement.RopeRun::rope)
            .findFirst()
            .orElse(job.placement.ropes().isEmpty() ? null : job.placement.ropes().get(0).rope());
    for (var foot : mast.guyFeet()) {
      double run =
          job.placement.ropes().stream()
              .filter(r -> r.what().equals("guy") && !r.points().isEmpty())
              .filter(r -> reaches(r, foot))
              .mapToDouble(Placement.RopeRun::length)
              .findFirst()
              .orElse(mast.top().distance(foot));
      double allowance = 2 * Allowances.GUY_END;
      ropes.add(
          new CutParts.Rope(
              "G" + ++guys,
              kindId == null ? "" : kindId,
              kindId == null ? "guy rope" : job.rope(kindId).name(),
              "ring at the head of " + lower(job.mastName(mast)) + ", " + job.name(mast.zone()),
              null,
              "peg, " + Job.wind(job.bearing(mast.foot().onPlan(), foot.onPlan())),
              "hitched at the peg",
              run,
              allowance,
              Figures.upToHalfMetre(run + allowance)));
    }
  }

  private static boolean reaches(Placement.RopeRun guy, spanwright.plan.Place foot) {
    var points = guy.points();
    return points.get(points.size() - 1).onPlan().distance(foot.onPlan()) < 0.05
        || points.get(0).onPlan().distance(foot.onPlan()) < 0.05;
  }

  private static String lower(String text) {
    return Character.toLowerCase(text.charAt(0)) + text.substring(1);
  }
}
