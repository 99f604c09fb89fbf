package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;

/**
 * Sets blocks one under another, on as many pages as they need, in one column or in two side by
 * side. A block's head stays with its first strip and is set again where the block goes on.
 */
final class Flow {
  /** A piece that is never cut: its height in millimetres and how it is drawn at its top left. */
  record Strip(double height, Painter painter) {}

  /** Draws at a place. */
  @FunctionalInterface
  interface Painter {
    void paint(Pen pen, double x, double y);
  }

  /**
   * A block.
   *
   * @param head before the first strip
   * @param again set instead of the head on a next page while rows remain
   * @param strips that may part from one another
   * @param rows how many of the strips are rows; notes follow them
   * @param boxed whether an ink line runs round it
   */
  record Block(List<Strip> head, List<Strip> again, List<Strip> strips, int rows, boolean boxed) {
    Block {
      head = List.copyOf(head);
      again = List.copyOf(again);
      strips = List.copyOf(strips);
    }

    /** Height in one piece, without a box [mm]. */
    double height() {
      return head.stream().mapToDouble(Strip::height).sum()
          + strips.stream().mapToDouble(Strip::height).sum();
    }

    private List<Strip> headAt(int strip) {
      return strip == 0 ? head : strip < rows ? again : List.of();
    }
  }

  /** Inner margin of a box [mm]. */
  static final double BOX = 3.5;

  private static final double BOX_LINE = 0.6;

  private final double left;
  private final double width;
  private final double nextTop;
  private final double bottom;
  private final List<Pen> pages = new ArrayList<>();

  /**
   * A place down the pages.
   *
   * @param page from 0
   * @param y from the top
   */
  private record At(int page, double y) {
    At later(At other) {
      return page > other.page || (page == other.page && y >= other.y) ? this : other;
    }
  }

  private At at;

  /**
   * Begins.
   *
   * @param left edge [mm]
   * @param width of the column [mm]
   * @param firstTop where the first page begins [mm]
   * @param nextTop where later pages begin [mm]
   * @param bottom where pages end [mm]
   */
  Flow(double left, double width, double firstTop, double nextTop, double bottom) {
    this.left = left;
    this.width = width;
    this.nextTop = nextTop;
    this.bottom = bottom;
    this.at = new At(0, firstTop);
    pages.add(new Pen());
  }

  List<Pen> pages() {
    return pages;
  }

  void gap(double height) {
    at = new At(at.page(), at.y() + height);
  }

  /** One block over the whole width. */
  void add(Block block) {
    at = place(block, at, left, width);
  }

  /** Blocks under one another in two columns, both beginning at the same height. */
  void pair(List<Block> leftBlocks, List<Block> rightBlocks, double gutter, double gap) {
    double half = (width - gutter) / 2;
    At a = column(leftBlocks, left, half, gap);
    At b = column(rightBlocks, left + half + gutter, half, gap);
    at = a.later(b);
  }

  private At column(List<Block> blocks, double x, double columnWidth, double gap) {
    At cursor = at;
    boolean first = true;
    for (Block block : blocks) {
      if (!first) {
        cursor = new At(cursor.page(), cursor.y() + gap);
      }
      cursor = place(block, cursor, x, columnWidth);
      first = false;
    }
    return cursor;
  }

  private At place(Block block, At from, double x, double columnWidth) {
    double inset = block.boxed() ? BOX : 0;
    int i = 0;
    At cursor = from;
    boolean first = true;
    while (i < block.strips().size() || first) {
      List<Strip> head = block.headAt(i);
      double least =
          head.stream().mapToDouble(Strip::height).sum()
              + 2 * inset
              + (i < block.strips().size() ? block.strips().get(i).height() : 0);
      if (cursor.y() + least > bottom && (first ? cursor.y() > nextTop : true)) {
        cursor = new At(cursor.page() + 1, nextTop);
      }
      Pen pen = page(cursor.page());
      double top = cursor.y();
      double y = top + inset;
      for (Strip strip : head) {
        strip.painter().paint(pen, x + inset, y);
        y += strip.height();
      }
      int placed = 0;
      while (i < block.strips().size()
          && (placed == 0 || y + block.strips().get(i).height() + inset <= bottom)) {
        Strip strip = block.strips().get(i);
        strip.painter().paint(pen, x + inset, y);
        y += strip.height();
        i++;
        placed++;
      }
      y += inset;
      if (block.boxed()) {
        pen.rect(x, top, columnWidth, y - top, BOX_LINE, 1, Ink.NONE);
      }
      cursor = new At(cursor.page(), y);
      first = false;
    }
    return cursor;
  }

  private Pen page(int number) {
    while (pages.size() <= number) {
      pages.add(new Pen());
    }
    return pages.get(number);
  }
}
