package spanwright.sheet;

import java.util.List;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;

/** The fixture's placement with one thing changed. */
final class Placements {
  private Placements() {}

  static Placement withConductors(Placement p, List<Placement.Conductor> conductors) {
    return copy(p, p.attachments(), conductors, p.feed(), p.clearances(), p.spans(), p.state());
  }

  static Placement withAttachments(Placement p, List<Placement.Attachment> attachments) {
    return copy(p, attachments, p.conductors(), p.feed(), p.clearances(), p.spans(), p.state());
  }

  static Placement withFeed(Placement p, Placement.Feed feed) {
    return copy(p, p.attachments(), p.conductors(), feed, p.clearances(), p.spans(), p.state());
  }

  static Placement withClearances(Placement p, List<Clearance> clearances, State state) {
    return copy(p, p.attachments(), p.conductors(), p.feed(), clearances, p.spans(), state);
  }

  static Placement withSpans(Placement p, List<Placement.Span> spans) {
    return copy(p, p.attachments(), p.conductors(), p.feed(), p.clearances(), spans, p.state());
  }

  private static Placement copy(
      Placement p,
      List<Placement.Attachment> attachments,
      List<Placement.Conductor> conductors,
      Placement.Feed feed,
      List<Clearance> clearances,
      List<Placement.Span> spans,
      State state) {
    return new Placement(
        p.id(),
        p.rank(),
        p.score(),
        p.scoreParts(),
        p.shape(),
        conductors,
        attachments,
        feed,
        clearances,
        p.bands(),
        spans,
        p.ropes(),
        p.masts(),
        state,
        p.notes(),
        p.exposure(),
        p.quality());
  }
}
