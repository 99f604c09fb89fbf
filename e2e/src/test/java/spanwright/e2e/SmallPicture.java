package spanwright.e2e;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.awt.image.IndexColorModel;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageWriteParam;
import javax.imageio.ImageWriter;
import javax.imageio.stream.ImageOutputStream;

/**
 * Packs a screenshot small enough for the guide: the page's own colours exactly, the blends between
 * them as the nearest of those most used, 256 in all.
 */
final class SmallPicture {
  private static final int COLOURS = 256;

  private SmallPicture() {}

  /**
   * @param own colours that must stay as they are, however little is drawn in them: "#A2470B"
   */
  static void pack(Path file, List<String> own) throws IOException {
    BufferedImage shot = ImageIO.read(file.toFile());
    int width = shot.getWidth();
    int height = shot.getHeight();
    int[] pixels = shot.getRGB(0, 0, width, height, null, 0, width);
    Map<Integer, Integer> used = new HashMap<>();
    for (int pixel : pixels) {
      used.merge(pixel | 0xff000000, 1, Integer::sum);
    }
    Stream<Integer> exact = own.stream().map(hex -> Color.decode(hex).getRGB());
    Stream<Integer> frequent =
        used.entrySet().stream()
            .sorted(
                Map.Entry.<Integer, Integer>comparingByValue()
                    .reversed()
                    .thenComparing(Map.Entry.comparingByKey()))
            .map(Map.Entry::getKey);
    int[] palette =
        Stream.concat(exact, frequent)
            .distinct()
            .limit(COLOURS)
            .mapToInt(Integer::intValue)
            .toArray();
    Map<Integer, Integer> nearest = new HashMap<>();
    used.keySet().forEach(colour -> nearest.put(colour, nearest(palette, colour)));
    IndexColorModel colours = new IndexColorModel(8, palette.length, palette, 0, false, -1, 0);
    BufferedImage small =
        new BufferedImage(width, height, BufferedImage.TYPE_BYTE_INDEXED, colours);
    for (int i = 0; i < pixels.length; i++) {
      int index = nearest.get(pixels[i] | 0xff000000);
      small.getRaster().setSample(i % width, i / width, 0, index);
    }
    write(small, file);
  }

  private static int nearest(int[] palette, int colour) {
    int best = 0;
    int least = Integer.MAX_VALUE;
    for (int i = 0; i < palette.length && least > 0; i++) {
      int apart = 0;
      for (int shift = 0; shift <= 16; shift += 8) {
        int difference = (palette[i] >> shift & 255) - (colour >> shift & 255);
        apart += difference * difference;
      }
      if (apart < least) {
        least = apart;
        best = i;
      }
    }
    return best;
  }

  private static void write(BufferedImage image, Path file) throws IOException {
    ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
    ImageWriteParam smallest = writer.getDefaultWriteParam();
    smallest.setCompressionMode(ImageWriteParam.MODE_EXPLICIT);
    smallest.setCompressionQuality(0);
    Files.delete(file);
    try (ImageOutputStream out = ImageIO.createImageOutputStream(file.toFile())) {
      writer.setOutput(out);
      writer.write(null, new IIOImage(image, null, null), smallest);
    } finally {
      writer.dispose();
    }
  }
}
