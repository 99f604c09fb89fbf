package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.clearance.State;

/** Sets headings, tables and sentences as strips for the flow. Measures in millimetres. */
final class Setting {
  static final double TEXT = 9;
  static final double HEAD = 8;
  static final double TITLE = 11;
  private static final double LEADING = 3.8;
  private static final double PAD = 1.15;
  private static final double GREY = 0.68;
  private static final double RULE = 0.35;

  private Setting() {}

  /** A part of the list, its rows ruled off. */
  static Flow.Block block(ListPart part, double width) {
    List<ListPart.Column> columns = part.columns();
    double inner = part.boxed() ? width - 2 * Flow.BOX : width;
    double[] widths = widths(columns, inner);
    List<Flow.Strip> head = new ArrayList<>();
    List<Flow.Strip> again = new ArrayList<>();
    head.add(title(part.title()));
    again.add(title(part.title() + ", continued"));
    part.before().forEach(line -> head.addAll(sentence(line, inner, TEXT, false)));
    if (columns.stream().anyMatch(c -> !c.heading().isEmpty()) && !part.rows().isEmpty()) {
      head.add(headings(columns, widths, inner));
      again.add(headings(columns, widths, inner));
    }
    List<Flow.Strip> strips = new ArrayList<>();
    part.rows().forEach(row -> strips.add(row(columns, widths, row, inner)));
    part.items().forEach(item -> strips.add(item(item, inner)));
    int rows = strips.size();
    part.notes().forEach(note -> strips.addAll(sentence(note, inner, TEXT - 0.5, false)));
    return new Flow.Block(head, again, strips, rows, part.boxed());
  }

  private static Flow.Strip title(String title) {
    return new Flow.Strip(
        6.2, (pen, x, y) -> pen.text(x, y + 4.2, title, TITLE, Ink.Anchor.START, true));
  }

  private static double[] widths(List<ListPart.Column> columns, double width) {
    double fixed = columns.stream().mapToDouble(ListPart.Column::width).sum();
    long open = columns.stream().filter(c -> c.width() == 0).count();
    double rest = open == 0 ? 0 : Math.max(12, (width - fixed) / open);
    return columns.stream().mapToDouble(c -> c.width() == 0 ? rest : c.width()).toArray();
  }

  private static Flow.Strip headings(List<ListPart.Column> columns, double[] widths, double width) {
    List<List<String>> lines = new ArrayList<>();
    int most = 1;
    for (int i = 0; i < columns.size(); i++) {
      lines.add(wrap(columns.get(i).heading(), widths[i] - PAD, HEAD, false));
      most = Math.max(most, lines.get(i).size());
    }
    double height = most * 3.4 + 1.4;
    return new Flow.Strip(
        height,
        (pen, x, y) -> {
          double at = x;
          for (int i = 0; i < widths.length; i++) {
            boolean right = columns.get(i).right();
            List<String> cell = lines.get(i);
            for (int k = 0; k < cell.size(); k++) {
              pen.text(
                  right ? at + widths[i] : at,
                  y + height - 1.5 - (cell.size() - 1 - k) * 3.4,
                  cell.get(k),
                  HEAD,
                  right ? Ink.Anchor.END : Ink.Anchor.START,
                  false,
                  GREY);
            }
            at += widths[i];
          }
          pen.line(x, y + height, x + width, y + height, 0.18, RULE + 0.2);
        });
  }

  private static Flow.Strip row(
      List<ListPart.Column> columns, double[] widths, List<ListPart.Cell> cells, double width) {
    List<List<String>> lines = new ArrayList<>();
    int most = 1;
    for (int i = 0; i < cells.size(); i++) {
      double room = widths[i] - PAD - marks(cells.get(i));
      lines.add(wrap(cells.get(i).text(), room, TEXT, cells.get(i).bold()));
      most = Math.max(most, lines.get(i).size());
    }
    double height = most * LEADING + 1.3;
    return new Flow.Strip(
        height,
        (pen, x, y) -> {
          double at = x;
          for (int i = 0; i < cells.size(); i++) {
            cell(pen, at, y, widths[i], columns.get(i).right(), cells.get(i), lines.get(i));
            at += widths[i];
          }
          pen.line(x, y + height, x + width, y + height, 0.18, RULE);
        });
  }

  private static double marks(ListPart.Cell cell) {
    return cell.mark() == null
        ? 0
        : 4.2 + Letters.width(word(cell.mark()), TEXT, cell.bold(), false);
  }

  private static String word(State state) {
    return " " + state.name().toLowerCase(java.util.Locale.ROOT);
  }

  private static void cell(
      Pen pen,
      double x,
      double y,
      double width,
      boolean right,
      ListPart.Cell cell,
      List<String> lines) {
    if (cell.square()) {
      Symbols.number(pen, x + 2.1, y + 2.55, cell.text());
      return;
    }
    double marks = marks(cell);
    double last = 0;
    for (int k = 0; k < lines.size(); k++) {
      double foot = y + 3.4 + k * LEADING;
      pen.text(
          right ? x + width - marks : x,
          foot,
          lines.get(k),
          TEXT,
          right ? Ink.Anchor.END : Ink.Anchor.START,
          cell.bold());
      last = Letters.width(lines.get(k), TEXT, cell.bold(), false);
    }
    if (cell.mark() != null) {
      double foot = y + 3.4 + (lines.size() - 1) * LEADING;
      double at = right ? x + width - marks : x + last;
      Symbols.state(pen, at + 2.4, foot - 1.15, 2.6, cell.mark());
      pen.text(at + 4.2, foot, word(cell.mark()), TEXT, Ink.Anchor.START, cell.bold());
    }
  }

  private static Flow.Strip item(ListPart.Item item, double width) {
    double indent = (item.number().isEmpty() ? 0 : 6) + (item.box() ? 5.5 : 0);
    indent = Math.max(indent, 5);
    List<String> lines = wrap(item.text(), width - indent, TEXT, false);
    double height = lines.size() * LEADING + 1.3;
    double textX = indent;
    return new Flow.Strip(
        height,
        (pen, x, y) -> {
          double at = x;
          if (!item.number().isEmpty()) {
            pen.text(at, y + 3.4, item.number(), TEXT, Ink.Anchor.START, true);
            at += 6;
          }
          if (item.box()) {
            pen.rect(at, y + 0.8, 2.9, 2.9, 0.3, 1, Ink.NONE);
          }
          if (item.pressing()) {
            Symbols.state(pen, x + 1.6, y + 2.4, 2.8, State.TIGHT);
          }
          for (int k = 0; k < lines.size(); k++) {
            pen.text(x + textX, y + 3.4 + k * LEADING, lines.get(k), TEXT, Ink.Anchor.START, false);
          }
          pen.line(x, y + height, x + width, y + height, 0.18, RULE);
        });
  }

  /** A sentence over as many lines as it needs. */
  static List<Flow.Strip> sentence(String text, double width, double points, boolean bold) {
    List<Flow.Strip> strips = new ArrayList<>();
    List<String> lines = wrap(text, width, points, bold);
    for (int k = 0; k < lines.size(); k++) {
      String line = lines.get(k);
      double height = LEADING - 0.1 + (k == lines.size() - 1 ? 0.7 : 0);
      strips.add(
          new Flow.Strip(
              height, (pen, x, y) -> pen.text(x, y + 3.3, line, points, Ink.Anchor.START, bold)));
    }
    return strips;
  }

  /** Breaks a text into lines no wider than asked; a word too long for one is cut. */
  static List<String> wrap(String text, double width, double points, boolean bold) {
    List<String> lines = new ArrayList<>();
    String line = "";
    for (String word : Letters.printable(text).split(" ", -1)) {
      String longer = line.isEmpty() ? word : line + " " + word;
      if (Letters.width(longer, points, bold, false) <= width) {
        line = longer;
        continue;
      }
      if (!line.isEmpty()) {
        lines.add(line);
      }
      line = word;
      while (line.length() > 1 && Letters.width(line, points, bold, false) > width) {
        int fit = line.length() - 1;
        while (fit > 1 && Letters.width(line.substring(0, fit), points, bold, false) > width) {
          fit--;
        }
        lines.add(line.substring(0, fit));
        line = line.substring(fit);
      }
    }
    lines.add(line);
    return lines;
  }
}
