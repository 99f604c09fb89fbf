package spanwright.sheet;

import java.util.List;

/**
 * A mark on paper. All measures in millimetres, x to the right and y down from the page's top left
 * corner. Shades run from 0 (white) to 1 (black): sheets are read in black and white.
 */
sealed interface Ink {

  /** No paint. */
  double NONE = -1;

  /**
   * Lines and areas.
   *
   * @param strokes pieces, painted together
   * @param width of the line
   * @param dash lengths of dashes and gaps; empty for a solid line
   * @param line shade of the line, or NONE
   * @param fill shade inside, or NONE
   */
  record Shape(List<Stroke> strokes, double width, List<Double> dash, double line, double fill)
      implements Ink {}

  /**
   * One run of the pen.
   *
   * @param path "M" or "L" with x and y, "C" with three pairs, in order
   * @param closed back to where it began
   */
  record Stroke(List<Step> path, boolean closed) {}

  /**
   * A step of the pen: a straight line to (x, y), or a curve with two controls.
   *
   * @param curve whether the controls count
   * @param x1 first control
   * @param y1 first control
   * @param x2 second control
   * @param y2 second control
   * @param x end
   * @param y end
   */
  record Step(boolean curve, double x1, double y1, double x2, double y2, double x, double y) {
    static Step to(double x, double y) {
      return new Step(false, 0, 0, 0, 0, x, y);
    }
  }

  /**
   * Lettering on one line.
   *
   * @param x of the anchor
   * @param y of the foot of the letters
   * @param text one line
   * @param points size in points
   * @param anchor where x is
   * @param bold heavy
   * @param narrow the narrow cut, for drawings
   * @param turn degrees clockwise about the anchor
   * @param halo width of paper kept free around the letters; 0 for none
   * @param shade of the letters
   */
  record Lettering(
      double x,
      double y,
      String text,
      double points,
      Anchor anchor,
      boolean bold,
      boolean narrow,
      double turn,
      double halo,
      double shade)
      implements Ink {
    public Lettering {
      text = Letters.printable(text);
    }
  }

  /** What x is of the lettering. */
  enum Anchor {
    START,
    MIDDLE,
    END
  }

  /**
   * Marks that end at a window's edge.
   *
   * @param x left
   * @param y top
   * @param width of the window
   * @param height of the window
   * @param inside marks
   */
  record Window(double x, double y, double width, double height, List<Ink> inside) implements Ink {}
}
