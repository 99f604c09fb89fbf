package spanwright.sheet;

import java.util.List;

/**
 * A page as it prints.
 *
 * @param width millimetres
 * @param height millimetres
 * @param inks back to front
 */
record PaperPage(double width, double height, List<Ink> inks) {
  PaperPage {
    inks = List.copyOf(inks);
  }
}
