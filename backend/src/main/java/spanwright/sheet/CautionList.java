package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.OverheadLine;
import spanwright.plan.Support;

/**
 * Cautions for this site: overhead lines before all, then what is tight, then the standing ones.
 */
final class CautionList {
  private final Job job;
  private final OverheadParts.Overhead overhead;
  private final List<WorkParts.Caution> cautions = new ArrayList<>();

  private CautionList(Job job, OverheadParts.Overhead overhead) {
    this.job = job;
    this.overhead = overhead;
  }

  static List<WorkParts.Caution> of(Job job, OverheadParts.Overhead overhead) {
    CautionList list = new CautionList(job, overhead);
    list.addOverhead();
    list.addNotClear();
    list.addPulls();
    list.addPermissions();
    list.addStanding();
    return list.cautions.stream().distinct().toList();
  }

  private void press(String text) {
    cautions.add(new WorkParts.Caution(text, true));
  }

  private void say(String text) {
    cautions.add(new WorkParts.Caution(text, false));
  }

  private void addOverhead() {
    if (overhead.lines().isEmpty()) {
      press("No overhead line is on the plan: that is no proof that there is none.");
      return;
    }
    press(
        "Overhead lines kill without being touched. Keep wire, rope, mast, ladder and tools"
            + " outside every kept distance, also while raising and lowering.");
    for (OverheadParts.Line line : overhead.lines()) {
      if (line.nearest() == null) {
        press(line.name() + ": no distance was computed. Do not rig.");
      } else if (OverheadList.state(line) == State.TIGHT) {
        press(
            line.name()
                + " is tight: measure it on site, and ask its owner before anything is raised.");
      }
      if (line.authority() != null) {
        press(line.name() + ": smaller distance allowed by " + line.authority() + ".");
      }
    }
  }

  private void addNotClear() {
    for (Clearance c : job.placement.clearances()) {
      boolean line =
          job.plan.overheadLines().stream().map(OverheadLine::id).anyMatch(c.to()::equals);
      if (c.state() == State.CLEAR || line) {
        continue;
      }
      String thing = "boundary".equals(c.to()) ? "the boundary" : job.name(c.to());
      press(
          capital(c.what())
              + " to "
              + thing
              + ": "
              + job.figures.foundOf(c.distance(), c.required())
              + (job.figures.unit().equals("m") ? " m, " : ", ")
              + (c.state() == State.TIGHT ? "tight. Look again each spring." : "foul."));
    }
  }

  private static String capital(String text) {
    return text == null || text.isEmpty()
        ? "Wire"
        : Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }

  private void addPulls() {
    for (Placement.Attachment held : job.placement.attachments()) {
      String name = job.holder(held);
      if (held.pullLimit() == null) {
        press(name + ": what it may take is not known, so its pull was not checked.");
      } else if (held.state() != State.CLEAR) {
        press(
            name
                + " is close to its limit in a gust: "
                + Figures.whole(Math.ceil(held.pullInWind()))
                + " N of "
                + Figures.whole(held.pullLimit())
                + " N."
                + (held.state() == State.FOUL ? " Foul: do not rig." : ""));
      }
    }
  }

  private void addPermissions() {
    for (Placement.NewMast mast : job.placement.masts()) {
      if (mast.consent() != null && !mast.consent().equalsIgnoreCase("none")) {
        press("The mast in " + job.name(mast.zone()) + " needs " + mast.consent() + ".");
      }
    }
    for (Placement.Attachment held : job.placement.attachments()) {
      job.support(held.on())
          .map(Support::agreedBy)
          .ifPresent(by -> say(job.name(held.on()) + ": use agreed by " + by + "."));
    }
  }

  private void addStanding() {
    if (job.placement.attachments().stream().anyMatch(a -> needsLadder(a.on()))) {
      press("Ladders: one foots, one works; three points of contact; none against a gutter.");
    }
    if (job.placement.attachments().stream().anyMatch(a -> job.isTree(a.on()))) {
      press("Trees sway and drop limbs: lines by throw line from the ground, nobody under them.");
    }
    if (job.placement.masts().stream().anyMatch(m -> !m.guyFeet().isEmpty())) {
      press("Guys trip and cut: mark them to head height, keep mowers and children off.");
    }
    press("Stop for lightning within 10 km. When not in use, disconnect and earth the line.");
    press(
        "Live wire burns at "
            + Figures.whole(job.plan.brief().power())
            + " W: nobody touches wire or line while transmitting. Keep people clear of the ends; "
            + exposure()
            + ".");
    say(
        "If an end comes down, switch off, stay clear, and treat it as live until it is seen not"
            + " to touch a line.");
  }

  private String exposure() {
    return job.placement.exposure() == null || job.placement.exposure().isBlank()
        ? "RF exposure not computed"
        : job.placement.exposure();
  }

  private boolean needsLadder(String on) {
    return job.isBracket(on)
        || job.support(on)
            .map(s -> s.kind() != Support.Kind.TREE && s.kind() != Support.Kind.OTHER)
            .orElse(false);
  }
}
