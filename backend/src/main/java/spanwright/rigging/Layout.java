package spanwright.rigging;

import java.util.List;
import spanwright.plan.Place;

/**
 * A placement as chosen, before it hangs: what {@code assess} reads of a placement. Heights are
 * above the plan's zero.
 *
 * @param shape one of the shape words of the plan format
 * @param attachments in order along the wire
 * @param conductors radiating wire
 * @param feed where the line joins
 */
public record Layout(String shape, List<Hold> attachments, List<Run> conductors, FeedChoice feed) {

  public Layout {
    attachments = List.copyOf(attachments);
    conductors = List.copyOf(conductors);
  }

  /**
   * A holding point.
   *
   * @param on id of a support, bracket line or mast zone
   * @param at the point on the support, mast or bracket, not the wire's end
   */
  public record Hold(String on, Place at) {}

  /**
   * A conductor.
   *
   * @param points its ends and where it bends, or any polyline along its hanging shape
   * @param wire catalogue id
   */
  public record Run(List<Place> points, String wire) {
    public Run {
      points = List.copyOf(points);
    }
  }

  /**
   * Where the feed line joins.
   *
   * @param conductor index of the conductor
   * @param fraction share of the conductor's length from its first point
   * @param line catalogue id of the feed line
   * @param lineLength metres, or null to be proposed
   */
  public record FeedChoice(int conductor, double fraction, String line, Double lineLength) {}
}
