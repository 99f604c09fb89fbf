package spanwright.plan;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The plots that come with the program, invented, to look at and to start from. */
public final class DemoPlans {
  private static final List<String> NAMES =
      List.of("corner-plot", "garden-in-steps", "old-orchard");

  private DemoPlans() {}

  /**
   * A demo plot.
   *
   * @param name of its file, without ".json"
   * @param title shown to people
   * @param json the plan file
   */
  public record Demo(String name, String title, String json) {}

  /** Every demo plot, the one to open first in front. */
  public static List<Demo> list() {
    return NAMES.stream().map(DemoPlans::load).toList();
  }

  private static Demo load(String name) {
    String place = "/spanwright/shared/demo/" + name + ".json";
    try (InputStream in = DemoPlans.class.getResourceAsStream(place)) {
      if (in == null) {
        throw new IllegalStateException(place + " is not on the class path");
      }
      String json = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      return new Demo(name, Json.mapper().readTree(json).path("title").asText(), json);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot read " + place, e);
    }
  }
}
