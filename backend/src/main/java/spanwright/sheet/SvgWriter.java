package spanwright.sheet;

import java.util.List;
import java.util.Locale;

/**
 * Writes pages of marks as SVG in millimetres, true to scale, standing alone. Presentation
 * attributes only: no style, no script, nothing fetched, so that it shows under the strictest
 * policy.
 */
final class SvgWriter {
  private static final String FAMILY = "'Liberation Sans', Arial, Helvetica, sans-serif";
  private static final String NARROW_FAMILY =
      "'Liberation Sans Narrow', 'Arial Narrow', Arial, Helvetica, sans-serif";

  private final StringBuilder out = new StringBuilder(1 << 16);
  private int windows;

  private SvgWriter() {}

  /** Pages of one size, one under another. */
  static String write(String title, String words, List<PaperPage> pages) {
    SvgWriter writer = new SvgWriter();
    double width = pages.get(0).width();
    double height = pages.get(0).height() * pages.size();
    writer.out.append("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<svg");
    writer.attribute("xmlns", "http://www.w3.org/2000/svg");
    writer.attribute("width", number(width) + "mm");
    writer.attribute("height", number(height) + "mm");
    writer.attribute("viewBox", "0 0 " + number(width) + " " + number(height));
    writer.attribute("role", "img");
    writer.out.append(">\n<title>").append(escape(title)).append("</title>\n");
    writer.out.append("<desc>").append(escape(words)).append("</desc>\n");
    writer.out.append("<rect width=\"100%\" height=\"100%\" fill=\"#ffffff\"/>\n");
    for (int i = 0; i < pages.size(); i++) {
      writer.out.append("<g");
      writer.attribute("transform", "translate(0 " + number(i * pages.get(0).height()) + ")");
      writer.out.append(">\n");
      writer.draw(pages.get(i).inks());
      writer.out.append("</g>\n");
    }
    return writer.out.append("</svg>\n").toString();
  }

  private void attribute(String name, String value) {
    out.append(' ').append(name).append("=\"").append(value).append('"');
  }

  private void draw(List<Ink> inks) {
    for (Ink ink : inks) {
      if (ink instanceof Ink.Shape shape) {
        draw(shape);
      } else if (ink instanceof Ink.Lettering lettering) {
        draw(lettering);
      } else if (ink instanceof Ink.Window window) {
        draw(window);
      }
    }
  }

  private void draw(Ink.Window window) {
    String id = "sheet-window-" + ++windows;
    out.append("<clipPath id=\"").append(id).append("\"><rect");
    attribute("x", number(window.x()));
    attribute("y", number(window.y()));
    attribute("width", number(window.width()));
    attribute("height", number(window.height()));
    out.append("/></clipPath>\n<g clip-path=\"url(#").append(id).append(")\">\n");
    draw(window.inside());
    out.append("</g>\n");
  }

  private void draw(Ink.Shape shape) {
    out.append("<path d=\"");
    for (Ink.Stroke stroke : shape.strokes()) {
      trace(stroke);
    }
    out.append('"');
    attribute("fill", shape.fill() >= 0 ? grey(shape.fill()) : "none");
    if (shape.line() >= 0 && shape.width() > 0) {
      attribute("stroke", grey(shape.line()));
      attribute("stroke-width", number(shape.width()));
      attribute("stroke-linejoin", "round");
      if (!shape.dash().isEmpty()) {
        StringBuilder dash = new StringBuilder();
        shape.dash().forEach(d -> dash.append(dash.isEmpty() ? "" : " ").append(number(d)));
        attribute("stroke-dasharray", dash.toString());
      }
    }
    out.append("/>\n");
  }

  private void trace(Ink.Stroke stroke) {
    boolean first = true;
    for (Ink.Step s : stroke.path()) {
      if (s.curve() && !first) {
        out.append('C').append(pair(s.x1(), s.y1())).append(' ').append(pair(s.x2(), s.y2()));
        out.append(' ').append(pair(s.x(), s.y()));
      } else {
        out.append(first ? 'M' : 'L').append(pair(s.x(), s.y()));
      }
      first = false;
    }
    if (stroke.closed()) {
      out.append('Z');
    }
  }

  private void draw(Ink.Lettering lettering) {
    if (lettering.text().isBlank()) {
      return;
    }
    out.append("<text");
    attribute("x", number(lettering.x()));
    attribute("y", number(lettering.y()));
    attribute("font-family", lettering.narrow() ? NARROW_FAMILY : FAMILY);
    attribute("font-size", number(lettering.points() * Letters.POINT));
    if (lettering.bold()) {
      attribute("font-weight", "700");
    }
    if (lettering.anchor() != Ink.Anchor.START) {
      attribute("text-anchor", lettering.anchor() == Ink.Anchor.MIDDLE ? "middle" : "end");
    }
    if (lettering.text().length() > 1) {
      // keeps the width that was laid out, whatever font is at hand
      attribute("textLength", number(Letters.width(lettering)));
      attribute("lengthAdjust", "spacingAndGlyphs");
    }
    if (lettering.turn() != 0) {
      attribute(
          "transform",
          "rotate(" + number(lettering.turn()) + " " + pair(lettering.x(), lettering.y()) + ")");
    }
    attribute("fill", grey(lettering.shade()));
    if (lettering.halo() > 0) {
      attribute("stroke", "#ffffff");
      attribute("stroke-width", number(2 * lettering.halo()));
      attribute("stroke-linejoin", "round");
      attribute("paint-order", "stroke");
    }
    out.append('>').append(escape(lettering.text())).append("</text>\n");
  }

  private static String grey(double shade) {
    int level = (int) Math.round(255 * (1 - Math.min(1, Math.max(0, shade))));
    return String.format(Locale.ROOT, "#%02x%02x%02x", level, level, level);
  }

  private static String pair(double x, double y) {
    return number(x) + " " + number(y);
  }

  /** To a micrometre, without needless noughts. */
  static String number(double value) {
    String text = String.format(Locale.ROOT, "%.3f", value);
    text = text.replaceFirst("0+$", "").replaceFirst("\\.$", "");
    return text.equals("-0") ? "0" : text;
  }

  static String escape(String text) {
    return text.replace("&", "&amp;")
        .replace("<", "&lt;")
        .replace(">", "&gt;")
        .replace("\"", "&quot;");
  }
}
