package spanwright.sheet;

import java.util.List;

/** Which revision a sheet is, held against those issued before it. */
final class Revisions {
  private Revisions() {}

  /**
   * The sheet as the revision it is: the last one issued when it says the same, else the next, with
   * what it changes.
   *
   * @param model without a revision of its own
   * @param issued the sheets issued before, in order
   */
  static SheetModel revise(SheetModel model, List<Issued> issued) {
    if (issued.isEmpty()) {
      return model;
    }
    Issued last = issued.get(issued.size() - 1);
    List<String> changes = Facts.changes(last.facts(), Facts.of(model));
    if (!changes.isEmpty()) {
      return model.revised(
          after(last.revision()), model.options().date(), last.revision(), changes);
    }
    if (issued.size() == 1) {
      return model.revised(last.revision(), last.date(), null, List.of());
    }
    Issued before = issued.get(issued.size() - 2);
    return model.revised(
        last.revision(),
        last.date(),
        before.revision(),
        Facts.changes(before.facts(), last.facts()));
  }

  /** A to Z, then AA and on. */
  static String after(String letters) {
    StringBuilder out = new StringBuilder(letters);
    for (int i = out.length() - 1; i >= 0; i--) {
      if (out.charAt(i) != 'Z') {
        out.setCharAt(i, (char) (out.charAt(i) + 1));
        return out.toString();
      }
      out.setCharAt(i, 'A');
    }
    return out.insert(0, 'A').toString();
  }
}
