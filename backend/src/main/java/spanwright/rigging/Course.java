package spanwright.rigging;

import java.util.Arrays;
import java.util.List;
import spanwright.plan.Place;

/**
 * A layout read as chains: which stretch of which wire lies between which attachments. Arc
 * positions run in metres along the first wire in the order of its attachments; those of a loop
 * from its first attachment round to it again.
 *
 * @param totals finished length of each conductor [m]
 * @param reversed whether the first conductor's points run against the attachments
 * @param loop whether the first conductor comes back to where it began
 * @param loopStart arc position of a loop's first point as drawn [m]
 * @param spans between neighbouring attachments
 * @param corners where each attachment's rope holds the wire, or null where the attachment itself
 *     does or the wire's end comes up to it
 * @param first attachment that holds the beginning of the first wire
 * @param last attachment that holds its end
 * @param headTail length that hangs free beyond the first attachment [m]
 * @param endTail length that hangs free beyond the last attachment [m]
 * @param feedAt arc position of the feedpoint [m]
 * @param feedHeld index of the attachment that holds the feedpoint, or -1
 * @param feedSpan index of the span the feedpoint hangs in, or -1
 */
record Course(
    double[] totals,
    boolean reversed,
    boolean loop,
    double loopStart,
    List<Stretch> spans,
    Place[] corners,
    int first,
    int last,
    double headTail,
    double endTail,
    double feedAt,
    int feedHeld,
    int feedSpan) {

  /**
   * A stretch of wire between two attachments.
   *
   * @param conductor index
   * @param fromHold index of the first attachment
   * @param toHold index of the second
   * @param from arc position [m]
   * @param to arc position [m]
   * @param ropeFrom rope at its first end as drawn [m]; 0 where the attachment holds the wire
   * @param ropeTo rope at its second end as drawn [m]
   */
  record Stretch(
      int conductor,
      int fromHold,
      int toHold,
      double from,
      double to,
      double ropeFrom,
      double ropeTo) {
    double wire() {
      return to - from;
    }
  }

  /** Reads a layout. */
  static Course of(Layout layout) {
    return new CourseReader(layout).read();
  }

  double total() {
    return totals[0];
  }

  /** Whether ropes hold the wire at bends, so that its stretches must be hung together. */
  boolean hangsTogether() {
    if (loop) {
      return true;
    }
    for (Place corner : corners) {
      if (corner != null) {
        return true;
      }
    }
    return false;
  }

  /** Indices of the spans that an attachment holds, in order. */
  int[] at(int attachment) {
    int[] found = new int[spans.size()];
    int count = 0;
    for (int i = 0; i < found.length; i++) {
      if (spans.get(i).fromHold() == attachment || spans.get(i).toHold() == attachment) {
        found[count++] = i;
      }
    }
    return Arrays.copyOf(found, count);
  }

  /** Whether an attachment holds the end of one wire and nothing else. */
  boolean isOuter(int attachment) {
    return at(attachment).length == 1;
  }
}
