package spanwright.sheet;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.List;
import spanwright.assess.Placement;

/** What to measure and write down, and when to come back and look. */
final class MeasureList {
  private static final String BEFORE = "before";
  private static final String AFTER = "after";

  private final Job job;
  private final OverheadParts.Overhead overhead;
  private final SetOutParts.SetOut setOut;
  private final List<HangParts.Sag> sags;

  MeasureList(
      Job job,
      OverheadParts.Overhead overhead,
      SetOutParts.SetOut setOut,
      List<HangParts.Sag> sags) {
    this.job = job;
    this.overhead = overhead;
    this.setOut = setOut;
    this.sags = sags;
  }

  List<WorkParts.Measure> list() {
    List<WorkParts.Measure> list = new ArrayList<>();
    for (OverheadParts.Line line : overhead.lines()) {
      list.add(
          measure(
              BEFORE,
              line.name() + ", lowest over the plot, by laser from the ground",
              job.figures.sayHeight(line.lowest())));
    }
    double base = setOut.a().at().onPlan().distance(setOut.b().at().onPlan());
    list.add(
        measure(
            BEFORE,
            "Tape from " + setOut.a().letter() + " to " + setOut.b().letter(),
            job.figures.say(base)));
    for (int i = 0; i < job.placement.attachments().size(); i++) {
      Placement.Attachment held = job.placement.attachments().get(i);
      list.add(
          measure(
              BEFORE,
              "Point " + (i + 1) + ", height of the pulley or fixing above the ground",
              job.figures.sayHeight(held.aboveGround())));
      if (held.kilograms() != null) {
        list.add(
            measure(
                BEFORE,
                "Point " + (i + 1) + ", the weight on a scale",
                Figures.kilograms(held.kilograms()) + " kg"));
      }
    }
    for (HangParts.Sag sag : sags) {
      list.add(
          measure(
              AFTER,
              "Span " + sag.span() + ", sag half way along under the sight line",
              job.figures.sight(sag.middle())));
      list.add(
          measure(
              AFTER,
              "Span " + sag.span() + ", height half way along above the ground",
              job.figures.sayHeight(sag.heightMiddle())));
    }
    for (OverheadParts.Line line : overhead.lines()) {
      if (line.nearest() != null) {
        list.add(
            measure(
                AFTER,
                line.name() + " to the nearest of wire, rope, line and mast, at least",
                job.figures.sayCut(line.nearest().required())));
      }
    }
    return list;
  }

  private static WorkParts.Measure measure(String when, String what, String expect) {
    return new WorkParts.Measure(when, what, expect);
  }

  /** From the date of issue where there is one; else by time of year, to be written in. */
  static List<WorkParts.Inspection> inspections(String issued) {
    LocalDate from = null;
    try {
      from =
          issued == null || issued.length() < 10 ? null : LocalDate.parse(issued.substring(0, 10));
    } catch (DateTimeParseException e) {
      // a date that reads otherwise gives no days to reckon with
    }
    List<WorkParts.Inspection> days = new ArrayList<>();
    days.add(
        new WorkParts.Inspection(
            from == null ? "a month after" : from.plusMonths(1).toString(),
            "knots, ropes where they bear, sag of each span"));
    days.add(new WorkParts.Inspection("after the first gale", "everything, from the ground"));
    if (from == null) {
      days.add(new WorkParts.Inspection("each 1 April", YEARLY));
      days.add(new WorkParts.Inspection("each 1 October", YEARLY));
      return days;
    }
    LocalDate next = from;
    for (int i = 0; i < 4; i++) {
      next = nextSeason(next);
      days.add(new WorkParts.Inspection(next.toString(), YEARLY));
    }
    return days;
  }

  private static final String YEARLY =
      "pulls and weights, ropes and guys, crowns grown near, overhead lines moved or new";

  private static LocalDate nextSeason(LocalDate day) {
    LocalDate april = LocalDate.of(day.getYear(), 4, 1);
    LocalDate october = LocalDate.of(day.getYear(), 10, 1);
    return day.isBefore(april) ? april : day.isBefore(october) ? october : april.plusYears(1);
  }
}
