package spanwright.sheet;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.font.PDType0Font;
import org.apache.pdfbox.pdmodel.graphics.state.RenderingMode;
import org.apache.pdfbox.util.Matrix;

/** Writes pages of marks as PDF. The font is embedded; the same pages give the same bytes. */
final class PdfWriter {
  private static final float POINTS_PER_MM = (float) (72 / 25.4);

  /** Stands for a random file id, so that bytes repeat. */
  private static final long DOCUMENT_ID = 7330L;

  private final PDPageContentStream out;
  private final PDFont font;

  private PdfWriter(PDPageContentStream out, PDFont font) {
    this.out = out;
    this.font = font;
  }

  static byte[] write(String title, List<PaperPage> pages) {
    try (PDDocument document = new PDDocument();
        InputStream letters = Letters.font()) {
      PDFont font = PDType0Font.load(document, letters, true);
      document.setDocumentId(DOCUMENT_ID);
      document.getDocumentInformation().setTitle(title);
      document.getDocumentInformation().setProducer("Spanwright");
      document.getDocumentCatalog().setLanguage("en-GB");
      for (PaperPage page : pages) {
        PDPage sheet =
            new PDPage(
                new PDRectangle(
                    (float) page.width() * POINTS_PER_MM, (float) page.height() * POINTS_PER_MM));
        document.addPage(sheet);
        try (PDPageContentStream out = new PDPageContentStream(document, sheet)) {
          // from here on in millimetres from the top left corner, y down
          out.transform(
              new Matrix(
                  POINTS_PER_MM, 0, 0, -POINTS_PER_MM, 0, (float) page.height() * POINTS_PER_MM));
          new PdfWriter(out, font).draw(page.inks());
        }
      }
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      document.save(bytes);
      return bytes.toByteArray();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private void draw(List<Ink> inks) throws IOException {
    for (Ink ink : inks) {
      if (ink instanceof Ink.Shape shape) {
        draw(shape);
      } else if (ink instanceof Ink.Lettering lettering) {
        draw(lettering);
      } else if (ink instanceof Ink.Window window) {
        out.saveGraphicsState();
        out.addRect(
            (float) window.x(),
            (float) window.y(),
            (float) window.width(),
            (float) window.height());
        out.clip();
        draw(window.inside());
        out.restoreGraphicsState();
      }
    }
  }

  private void draw(Ink.Shape shape) throws IOException {
    boolean line = shape.line() >= 0 && shape.width() > 0;
    boolean fill = shape.fill() >= 0;
    if (!line && !fill) {
      return;
    }
    if (line) {
      out.setLineWidth((float) shape.width());
      out.setStrokingColor((float) (1 - shape.line()));
      float[] dash = new float[shape.dash().size()];
      for (int i = 0; i < dash.length; i++) {
        dash[i] = shape.dash().get(i).floatValue();
      }
      out.setLineDashPattern(dash, 0);
      out.setLineJoinStyle(1);
    }
    if (fill) {
      out.setNonStrokingColor((float) (1 - shape.fill()));
    }
    for (Ink.Stroke stroke : shape.strokes()) {
      trace(stroke);
    }
    if (line && fill) {
      out.fillAndStroke();
    } else if (fill) {
      out.fill();
    } else {
      out.stroke();
    }
  }

  private void trace(Ink.Stroke stroke) throws IOException {
    boolean first = true;
    for (Ink.Step s : stroke.path()) {
      if (first) {
        out.moveTo((float) s.x(), (float) s.y());
      } else if (s.curve()) {
        out.curveTo(
            (float) s.x1(),
            (float) s.y1(),
            (float) s.x2(),
            (float) s.y2(),
            (float) s.x(),
            (float) s.y());
      } else {
        out.lineTo((float) s.x(), (float) s.y());
      }
      first = false;
    }
    if (stroke.closed()) {
      out.closePath();
    }
  }

  private void draw(Ink.Lettering lettering) throws IOException {
    if (lettering.text().isBlank()) {
      return;
    }
    if (lettering.halo() > 0) {
      show(lettering, RenderingMode.STROKE, 2 * lettering.halo(), 0);
    }
    if (lettering.bold()) {
      show(
          lettering,
          RenderingMode.FILL_STROKE,
          Letters.BOLD * lettering.points() * Letters.POINT,
          lettering.shade());
    } else {
      show(lettering, RenderingMode.FILL, 0, lettering.shade());
    }
  }

  private void show(Ink.Lettering lettering, RenderingMode mode, double outline, double shade)
      throws IOException {
    double width = Letters.width(lettering);
    double shift =
        switch (lettering.anchor()) {
          case START -> 0;
          case MIDDLE -> -width / 2;
          case END -> -width;
        };
    double turn = Math.toRadians(lettering.turn());
    double cos = Math.cos(turn);
    double sin = Math.sin(turn);
    double x = lettering.x() + shift * cos;
    double y = lettering.y() + shift * sin;
    out.saveGraphicsState();
    out.setStrokingColor((float) (1 - shade));
    out.setNonStrokingColor((float) (1 - shade));
    out.setLineWidth((float) outline);
    out.setLineDashPattern(new float[0], 0);
    out.setLineJoinStyle(1);
    out.beginText();
    out.setFont(font, (float) (lettering.points() * Letters.POINT));
    out.setHorizontalScaling((float) (lettering.narrow() ? 100 * Letters.NARROW : 100));
    out.setRenderingMode(mode);
    // letters stand upright on a page whose y runs down
    out.setTextMatrix(
        new Matrix((float) cos, (float) sin, (float) sin, (float) -cos, (float) x, (float) y));
    out.showText(lettering.text());
    out.endText();
    out.restoreGraphicsState();
  }
}
