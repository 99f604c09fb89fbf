package spanwright.sheet;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import spanwright.plan.Json;

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

  /** Which revision a sheet is and what it changes, as it reads where there is no table. */
  static String sentences(SheetModel.Head head) {
    StringBuilder words = new StringBuilder("Revision " + head.revision());
    words.append(head.date() == null ? ", not yet issued." : ", issued " + head.date() + ".");
    if (head.since() != null) {
      words.append(" Changed since revision ").append(head.since()).append(": ");
      words.append(String.join(" ", head.changes()));
    }
    return words.toString();
  }

  /** The same for programs; what is not known yet is left out. */
  static ObjectNode members(SheetModel.Head head) {
    ObjectNode members = Json.mapper().createObjectNode();
    members.put("revision", head.revision());
    if (head.date() != null) {
      members.put("issued", head.date());
    }
    if (head.since() != null) {
      members.put("since", head.since());
      head.changes().forEach(members.putArray("changes")::add);
    }
    return members;
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
