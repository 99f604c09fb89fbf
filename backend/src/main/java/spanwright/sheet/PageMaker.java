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
    int sheets = pens.size() + 1;
    pens.add(new DrawingPage(model).draw(sheets, sheets));
    List<PaperPage> pages = new ArrayList<>();
    for (int i = 0; i < pens.size(); i++) {
      foot(pens.get(i), model, i + 1, pens.size(), height);
      pages.add(new PaperPage(width, height, pens.get(i).inks()));
    }
    return pages;
  }

  /** The site drawing on a page of its own. */
  static PaperPage drawing(SheetModel model) {
    int sheets = ListPages.of(model).size() + 1;
    Pen pen = new DrawingPage(model).draw(sheets, sheets);
    foot(pen, model, sheets, sheets, model.options().paper().height());
    return new PaperPage(
        model.options().paper().width(), model.options().paper().height(), pen.inks());
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
