package spanwright.sheet;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Arrays;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.pdmodel.PDDocument;

/**
 * How wide lettering is, from the font that the PDF embeds, and which characters it has. Bold is
 * the same cut drawn with an outline, narrow the same cut set at 82 % of its width: only the
 * regular cut comes with the PDF library.
 */
final class Letters {
  /** The font as a class-path resource of the PDF library. */
  private static final String FONT = "/org/apache/pdfbox/resources/ttf/LiberationSans-Regular.ttf";

  /** Width of the narrow cut, share of the regular one. */
  static final double NARROW = 0.82;

  /** Outline that makes a letter bold, share of its size. */
  static final double BOLD = 0.035;

  /** Millimetres in a point. */
  static final double POINT = 25.4 / 72;

  /** Shown for a character the font does not have. */
  static final char MISSING = '□';

  /** Advance of each character of the basic plane [thousandths of the size]; −1 where missing. */
  private static final short[] ADVANCE = read();

  private Letters() {}

  static InputStream font() {
    InputStream stream = PDDocument.class.getResourceAsStream(FONT);
    if (stream == null) {
      throw new IllegalStateException("the sheet's font is not on the class path");
    }
    return stream;
  }

  private static short[] read() {
    short[] advance = new short[0x10000];
    Arrays.fill(advance, (short) -1);
    try (InputStream stream = font();
        TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(stream))) {
      CmapLookup glyphs = font.getUnicodeCmapLookup();
      double unit = 1000.0 / font.getUnitsPerEm();
      for (int c = 0x20; c < advance.length; c++) {
        int glyph = glyphs.getGlyphId(c);
        if (glyph > 0 && !Character.isSurrogate((char) c) && !Character.isISOControl(c)) {
          advance[c] = (short) Math.round(font.getAdvanceWidth(glyph) * unit);
        }
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return advance;
  }

  /** The text in characters that the font has, on one line. */
  static String printable(String text) {
    StringBuilder out = new StringBuilder(text.length());
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      if (Character.isWhitespace(c) && ADVANCE[c] < 0) {
        out.append(' ');
      } else if (ADVANCE[c] >= 0) {
        out.append(c);
      } else if (c == '\u2009' || c == '\u202f') {
        out.append(' ');
      } else if (!Character.isLowSurrogate(c) && !isUnseen(c)) {
        out.append(MISSING);
      }
    }
    return out.toString();
  }

  private static boolean isUnseen(char c) {
    int type = Character.getType(c);
    return type == Character.FORMAT || type == Character.CONTROL;
  }

  /** Width of a line [mm]. */
  static double width(String text, double points, boolean bold, boolean narrow) {
    double sum = 0;
    for (int i = 0; i < text.length(); i++) {
      sum += Math.max(0, ADVANCE[text.charAt(i)]);
    }
    double outline = bold && !text.isEmpty() ? BOLD * 1000 : 0;
    return (sum + outline) / 1000 * points * POINT * (narrow ? NARROW : 1);
  }

  /** Width of lettering on paper [mm]. */
  static double width(Ink.Lettering lettering) {
    return width(lettering.text(), lettering.points(), lettering.bold(), lettering.narrow());
  }
}
