package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.plan.RopeKind;

/**
 * Ropes and guys. Rope between wire and pulley and what runs on from the pulley is one rope, and it
 * is cut long enough to bring its end down to the ground again.
 */
final class RopeList {
  private final Job job;
  private final List<WireList.Piece> pieces;
  private final List<SheetModel.Rope> ropes = new ArrayList<>();
  private int lifts;
  private int guys;

  private RopeList(Job job) {
    this.job = job;
    this.pieces = WireList.pieces(job.placement);
  }

  static List<SheetModel.Rope> of(Job job) {
    RopeList list = new RopeList(job);
    for (int i = 0; i < job.placement.attachments().size(); i++) {
      list.addLifts(i);
    }
    job.placement.masts().forEach(list::addGuys);
    return list.ropes;
  }

  private List<Placement.RopeRun> runs(int attachment, String... words) {
    return job.placement.ropes().stream()
        .filter(r -> r.attachment() == attachment && List.of(words).contains(r.what()))
        .toList();
  }

  private void addLifts(int attachment) {
    List<Placement.RopeRun> tails = runs(attachment, "tail");
    List<Placement.RopeRun> falls = runs(attachment, "halyard", "fall");
    int joined = Math.min(tails.size(), falls.size());
    for (int i = 0; i < joined; i++) {
      addLift(attachment, tails.get(i), falls.get(i));
    }
    for (int i = joined; i < falls.size(); i++) {
      addLift(attachment, null, falls.get(i));
    }
    for (int i = joined; i < tails.size(); i++) {
      addTie(attachment, tails.get(i));
    }
  }

  private void addLift(int attachment, Placement.RopeRun tail, Placement.RopeRun fall) {
    Placement.Attachment held = job.placement.attachments().get(attachment);
    boolean weight = "weight".equals(held.held()) || "fall".equals(fall.what());
    double run = (tail == null ? 0 : tail.length()) + fall.length();
    double lowering = 2 * held.aboveGround();
    double allowance =
        Allowances.KNOT
            + (weight ? Allowances.KNOT : Allowances.CLEAT)
            + (lowering > run ? Allowances.HAND : 0);
    RopeKind kind = job.rope(fall.rope());
    ropes.add(
        new SheetModel.Rope(
            "R" + ++lifts,
            kind.id(),
            kind.name(),
            end(attachment),
            (job.isTree(held.on()) ? "pulley or limb, " : "pulley, ") + job.holder(held),
            weight ? weightWords(held) : "cleat at the foot",
            weight
                ? "tied to the weight, surplus coiled there to lower the end by"
                : "cleat, surplus coiled",
            run,
            lowering,
            allowance,
            Figures.upToHalfMetre(Math.max(run, lowering) + allowance)));
  }

  private void addTie(int attachment, Placement.RopeRun tail) {
    Placement.Attachment held = job.placement.attachments().get(attachment);
    RopeKind kind = job.rope(tail.rope());
    double allowance = 2 * Allowances.KNOT;
    ropes.add(
        new SheetModel.Rope(
            "R" + ++lifts,
            kind.id(),
            kind.name(),
            end(attachment),
            null,
            job.holder(held),
            "tied at the attachment",
            tail.length(),
            null,
            allowance,
            Figures.upToHalfMetre(tail.length() + allowance)));
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
        .map(p -> "end of " + p.mark())
        .orElse(
            "centre".equals(job.placement.attachments().get(attachment).held())
                ? "centre piece"
                : "insulator on the wire");
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
          new SheetModel.Rope(
              "G" + ++guys,
              kindId == null ? "" : kindId,
              kindId == null ? "guy rope" : job.rope(kindId).name(),
              "ring at the head of the new mast, " + job.name(mast.zone()),
              null,
              "peg, " + Job.wind(job.bearing(mast.foot().onPlan(), foot.onPlan())),
              "hitched at the peg",
              run,
              null,
              allowance,
              Figures.upToHalfMetre(run + allowance)));
    }
  }

  private static boolean reaches(Placement.RopeRun guy, spanwright.plan.Place foot) {
    var points = guy.points();
    return points.get(points.size() - 1).onPlan().distance(foot.onPlan()) < 0.05
        || points.get(0).onPlan().distance(foot.onPlan()) < 0.05;
  }
}
