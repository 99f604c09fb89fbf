package spanwright.sheet;

import com.fasterxml.jackson.annotation.JsonIgnore;
import java.util.ArrayList;
import java.util.List;
import spanwright.clearance.State;

/**
 * A part of the rigging list as it reads, every figure already rounded and in the units asked for:
 * paper and page are both set from it, so that no figure is rounded twice in two ways.
 *
 * @param title over it
 * @param columns of its table; empty when it has none
 * @param rows of its table
 * @param items of its list of sentences
 * @param before sentences between title and rows
 * @param notes sentences under it
 * @param boxed whether it stands in the sheet's only box
 */
public record ListPart(
    String title,
    List<Column> columns,
    List<List<Cell>> rows,
    List<Item> items,
    List<String> before,
    List<String> notes,
    boolean boxed) {

  public ListPart {
    columns = List.copyOf(columns);
    rows = List.copyOf(rows);
    items = List.copyOf(items);
    before = List.copyOf(before);
    notes = List.copyOf(notes);
  }

  static ListPart table(
      String title, List<Column> columns, List<List<Cell>> rows, List<String> notes) {
    return new ListPart(title, columns, rows, List.of(), List.of(), notes, false);
  }

  static ListPart boxed(
      String title,
      List<Column> columns,
      List<List<Cell>> rows,
      List<String> notes,
      List<String> before) {
    return new ListPart(title, columns, rows, List.of(), before, notes, true);
  }

  static ListPart list(String title, List<Item> items) {
    return new ListPart(title, List.of(), List.of(), items, List.of(), List.of(), false);
  }

  /** Whether there is nothing under its title. */
  @JsonIgnore
  boolean isEmpty() {
    return rows.isEmpty() && items.isEmpty() && before.isEmpty() && notes.isEmpty();
  }

  /** Every part of a sheet's list, in the order it reads. */
  static List<ListPart> of(SheetModel model) {
    RigTables rig = new RigTables(model);
    WorkTables work = new WorkTables(model);
    List<ListPart> parts =
        new ArrayList<>(
            List.of(
                rig.overhead(),
                rig.wire(),
                rig.rope(),
                rig.sags(),
                rig.attachments(),
                rig.margins(),
                work.setOut(),
                work.people(),
                work.order(),
                work.measures(),
                work.hardware(),
                work.cautions(),
                work.alternatives(),
                work.checks("Checks before", model.before()),
                work.checks("Checks after", model.after()),
                work.inspections(),
                work.sweep(),
                work.notes(),
                work.changes()));
    parts.removeIf(ListPart::isEmpty);
    return List.copyOf(parts);
  }

  /**
   * A column of a table.
   *
   * @param heading over it
   * @param width on paper in millimetres; 0 takes what is left
   * @param right whether figures end at its right edge
   */
  public record Column(String heading, @JsonIgnore double width, boolean right) {
    static Column left(String heading, double width) {
      return new Column(heading, width, false);
    }

    static Column right(String heading, double width) {
      return new Column(heading, width, true);
    }
  }

  /**
   * A cell.
   *
   * @param text as it reads
   * @param bold heavy
   * @param mark a state drawn after the text, or null
   * @param square whether the text stands in a black square
   */
  public record Cell(String text, boolean bold, State mark, boolean square) {
    static Cell of(String text) {
      return new Cell(text, false, null, false);
    }

    static Cell bold(String text) {
      return new Cell(text, true, null, false);
    }

    static Cell square(int number) {
      return new Cell(String.valueOf(number), true, null, true);
    }

    static Cell state(String text, State mark) {
      return new Cell(text, mark != null && mark != State.CLEAR, mark, false);
    }
  }

  /**
   * An item of a list.
   *
   * @param number before it, or empty
   * @param box whether it has a tick box
   * @param pressing whether it has a mark
   * @param text a sentence
   */
  public record Item(String number, boolean box, boolean pressing, String text) {}
}
