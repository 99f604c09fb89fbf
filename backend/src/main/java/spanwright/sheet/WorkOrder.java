package spanwright.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;

/** The order of work, and what to check before and after. Overhead lines come first in each. */
final class WorkOrder {
  private final Job job;
  private final SetOutParts.SetOut setOut;
  private final List<CutParts.Rope> ropes;
  private final List<HangParts.Sag> sags;
  private final List<String> steps = new ArrayList<>();

  WorkOrder(
      Job job, SetOutParts.SetOut setOut, List<CutParts.Rope> ropes, List<HangParts.Sag> sags) {
    this.job = job;
    this.setOut = setOut;
    this.ropes = ropes;
    this.sags = sags;
  }

  List<String> steps() {
    steps.add(
        job.plan.overheadLines().isEmpty()
            ? "Look up and all round for overhead lines. The plan has none: stop if you find one."
            : "Overhead lines: read each row of the box aloud on site and check it by laser from"
                + " the ground. Anything nearer or other than drawn: stop.");
    setOutStep();
    steps.add("Drive the earth rod and fit the arrester before the line reaches the entry.");
    for (Placement.NewMast mast : job.placement.masts()) {
      raise(mast);
    }
    ropeSteps();
    steps.add(
        WireList.pieces(job.placement).stream()
                .map(WireList.Piece::mark)
                .collect(Collectors.joining(", "))
            + " and L1: join at the feedpoint on the ground, strain relief taking the pull.");
    hoist();
    sag();
    steps.add(
        "Lead L1 to the entry on its stand-offs, drip loop below; connect it to the arrester.");
    steps.add("Sweep each band at the station, hold it against the table, keep the file.");
    return steps;
  }

  private void setOutStep() {
    String check = setOut.c() == null ? "" : "; check each from " + setOut.c().letter();
    boolean pegs = job.placement.masts().stream().anyMatch(m -> !m.guyFeet().isEmpty());
    steps.add(
        "Set out points 1 to "
            + setOut.points().size()
            + " from "
            + setOut.a().letter()
            + " and "
            + setOut.b().letter()
            + check
            + (pegs ? ". Drive the guy pegs." : "."));
  }

  private void raise(Placement.NewMast mast) {
    String number = job.mastName(mast).substring("New ".length());
    String where = number + " in " + job.name(mast.zone());
    String height = job.figures.sayHeight(mast.height());
    Optional<Clearance> line = nearestPowerLine(mast);
    String guys =
        mast.guyFeet().isEmpty()
            ? " One person at the foot, two on lines from the head."
            : " One person on each guy, one at the foot.";
    if (line.isEmpty()) {
      steps.add("Raise the " + where + ", " + height + "." + guys);
      return;
    }
    String away = Job.wind(job.bearing(line.get().toAt().onPlan(), mast.foot().onPlan()));
    steps.add(
        "Raise the "
            + where
            + ", "
            + height
            + ", from the "
            + away
            + ": lay it pointing away from "
            + job.name(line.get().to())
            + ", and hold it back from that side as it comes upright."
            + guys);
  }

  /** The nearest line that a mast can fall on, telephone lines too when there is no other. */
  private Optional<Clearance> nearestPowerLine(Placement.NewMast mast) {
    return job.placement.clearances().stream()
        .filter(c -> job.plan.overheadLines().stream().anyMatch(line -> line.id().equals(c.to())))
        .min(
            Comparator.comparing((Clearance c) -> isTelephone(c.to()))
                .thenComparingDouble(c -> c.toAt().onPlan().distance(mast.foot().onPlan())));
  }

  private boolean isTelephone(String id) {
    return job.plan.overheadLines().stream()
        .anyMatch(line -> line.id().equals(id) && OverheadList.kind(line).equals("telephone"));
  }

  private void ropeSteps() {
    Map<String, List<String>> same = new LinkedHashMap<>();
    for (CutParts.Rope rope : ropes) {
      boolean aside = rope.from().startsWith("kept aside");
      boolean onHalyard = rope.to().startsWith("the halyard");
      if (!rope.mark().startsWith("G") && !aside && !onHalyard) {
        same.computeIfAbsent(how(rope), how -> new ArrayList<>()).add(rope.mark());
      }
    }
    same.forEach((how, marks) -> steps.add(String.join(", ", marks) + ": " + how));
  }

  private static String how(CutParts.Rope rope) {
    if (rope.over() == null) {
      return "tie to " + rope.to() + " by ladder; one foots, one works.";
    }
    return rope.over().contains("limb")
        ? "by throw line over the limb, or draw the pulley up to it; from the ground, nobody"
            + " climbs."
        : "reeve through the pulley at its attachment, both parts in hand.";
  }

  private void hoist() {
    List<Placement.Attachment> held = job.placement.attachments();
    List<String> order = new ArrayList<>();
    for (String kind : List.of("centre", "tied", "weight")) {
      for (int i = 0; i < held.size(); i++) {
        if (kind.equals(held.get(i).held())) {
          order.add(hoistWords(i + 1, held.get(i)));
        }
      }
    }
    steps.add("Hoist slowly, all in hand: " + String.join(", then ", order) + ".");
  }

  private static String hoistWords(int number, Placement.Attachment held) {
    return switch (held.held()) {
      case "centre" -> "point " + number + " with the feed line";
      case "weight" ->
          "point "
              + number
              + (held.kilograms() == null
                  ? " to its weight"
                  : " to its weight of " + Figures.kilograms(held.kilograms()) + " kg");
      default -> "point " + number + ", tied";
    };
  }

  private void sag() {
    if (sags.isEmpty()) {
      return;
    }
    String each =
        sags.stream()
            .map(s -> s.span() + ": " + job.figures.sight(s.middle()))
            .collect(Collectors.joining(", "));
    steps.add("Sight the sag at mid-span: " + each + ". Tied ends: take up or let out to suit.");
  }

  /** How many hands, and where: as the steps need them. */
  List<String> people() {
    int masts =
        job.placement.masts().stream()
            .mapToInt(m -> m.guyFeet().isEmpty() ? 3 : m.guyFeet().size() + 1)
            .max()
            .orElse(0);
    int hoist = job.placement.attachments().size();
    int people = Math.max(2, Math.max(masts, hoist));
    List<String> say = new ArrayList<>();
    say.add(
        people
            + " people: one on each point while hoisting"
            + (masts > 0 ? ", and for the mast one on each guy or line and one at its foot" : "")
            + ".");
    say.add("One of them only watches: the overhead lines, the mast, the people.");
    return say;
  }

  List<String> before() {
    List<String> checks = new ArrayList<>();
    checks.add(
        job.plan.overheadLines().isEmpty()
            ? "No overhead line in reach of wire, rope, mast or ladder."
            : "Each overhead line seen, and at least as far off as the box says.");
    checks.add("Nothing buried where pegs and earth rod go: ask before driving.");
    checks.add("Weather within the limits at the head; nobody alone.");
    checks.add("Knots, shackles and insulators pulled by hand; rope without cuts or glazing.");
    if (job.placement.attachments().stream().anyMatch(a -> job.isTree(a.on()))) {
      checks.add("Trees looked over from the ground: no dead limb above or below a rope.");
    }
    if (job.placement.attachments().stream().anyMatch(a -> job.isBracket(a.on()))) {
      checks.add("Brackets pulled with the gust's pull before the wire goes up.");
    }
    return checks;
  }

  List<String> after() {
    List<String> checks = new ArrayList<>();
    if (!job.plan.overheadLines().isEmpty()) {
      checks.add("Overhead lines once more, with the wire at rest and pushed by hand.");
    }
    checks.add("Sag and mid-span height of each span written beside the figures.");
    checks.add("Weights free to move, clear of people, with a safety line.");
    if (!job.placement.masts().isEmpty()) {
      checks.add("Masts plumb; guys evenly taut; pegs marked so that nobody trips.");
    }
    checks.add("Line and mast earthed; arrester bonded by a short, straight conductor.");
    checks.add("Looked at again after the first gale, then each spring and autumn.");
    return checks;
  }
}
