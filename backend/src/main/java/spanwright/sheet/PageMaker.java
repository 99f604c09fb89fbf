package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;

/** Puts list and drawing together and numbers the pages. */
final class PageMaker {
  private PageMaker() {}

  static List<PaperPage> all(SheetModel model) {
    List<Pen> pens = new ArrayList<>(ListPages.of(model));
    double width = model.options().paper().width();
    double height = model.options().paper().height();
    pens.addAll(drawings(model, pens.size() + 1));
    List<PaperPage> pages = new ArrayList<>();
    for (int i = 0; i < pens.size(); i++) {
      foot(pens.get(i), model, i + 1, pens.size(), height);
      pages.add(new PaperPage(width, height, pens.get(i).inks()));
    }
    return pages;
  }

  /** Plan and side views, numbered from a sheet on. */
  private static List<Pen> drawings(SheetModel model, int first) {
    SidePages sides = new SidePages(model);
    int sheets = first + sides.plan().pages().size();
    List<Pen> pens = new ArrayList<>();
    pens.add(new DrawingPage(model).draw(first, sheets));
    pens.addAll(sides.draw(first + 1, sheets));
    return pens;
  }

  /** The site drawing on pages of its own: the plan, then the side views. */
  static List<PaperPage> drawing(SheetModel model) {
    int first = ListPages.of(model).size() + 1;
    double width = model.options().paper().width();
    double height = model.options().paper().height();
    List<Pen> pens = drawings(model, first);
    List<PaperPage> pages = new ArrayList<>();
    for (int i = 0; i < pens.size(); i++) {
      foot(pens.get(i), model, first + i, first + pens.size() - 1, height);
      pages.add(new PaperPage(width, height, pens.get(i).inks()));
    }
    return pages;
  }

  private static void foot(Pen pen, SheetModel model, int number, int of, double height) {
    double y = height - ListPages.FOOT + 2;
    double right = model.options().paper().width() - ListPages.MARGIN;
    String saved =
        model.head().savedAt() == null ? "" : "Plan as saved " + model.head().savedAt() + " · ";
    pen.text(ListPages.MARGIN, y, "Rigging sheet", 7.5, Ink.Anchor.START, false, 0.7);
    pen.text(
        right,
        y,
        saved
            + model.head().placement()
            + " · revision "
            + model.head().revision()
            + " · "
            + number
            + " of "
            + of,
        7.5,
        Ink.Anchor.END,
        false,
        0.7);
  }
}
