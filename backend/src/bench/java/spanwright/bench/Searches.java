package spanwright.bench;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.text.ParseException;
import java.util.List;
import java.util.Locale;
import jdk.jfr.Configuration;
import jdk.jfr.Recording;
import spanwright.plan.Catalogues;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.search.Effort;
import spanwright.search.Result;
import spanwright.search.Search;

/** Thorough searches of the demo plots on one thread: time per linear system, everything in it. */
final class Searches {
  private static final List<String> PLOTS = List.of("corner-plot", "old-orchard");

  private Searches() {}

  /**
   * Searches each plot.
   *
   * @param profiles where to leave recordings, or null for none
   */
  static String text(String python, Path script, Path profiles) throws IOException {
    StringBuilder text = new StringBuilder();
    text.append(
        "| plot | placements solved | systems | mean unknowns | s | µs a system | × zgesv |");
    text.append("\n| --- | ---: | ---: | ---: | ---: | ---: | ---: |\n");
    for (String plot : PLOTS) {
      Search.Options options = new Search.Options(Effort.THOROUGH, 1, 12, 1);
      Recording recording = profiles == null ? null : recording();
      Result result =
          Search.run(plan(plot), Catalogues.standard(), options, new Search.Listener() {});
      if (recording != null) {
        Path folder = Files.createDirectories(profiles.resolve("search of " + plot));
        recording.dump(folder.resolve("profile.jfr"));
        recording.close();
      }
      Result.Counts counts = result.counts();
      double each = 1e6 * result.seconds() / counts.systems();
      int size = (int) Math.round(counts.meanUnknowns());
      Zgesv zgesv = Zgesv.measure(python, script, List.of(size));
      text.append(
          String.format(
              Locale.ROOT,
              "| %s | %d | %d | %.1f | %.1f | %.0f | %.1f |%n",
              plot,
              counts.solved(),
              counts.systems(),
              counts.meanUnknowns(),
              result.seconds(),
              each,
              each / Zgesv.of(zgesv, zgesv, size)));
    }
    return text.toString();
  }

  private static Recording recording() throws IOException {
    try {
      Recording recording = new Recording(Configuration.getConfiguration("profile"));
      recording.start();
      return recording;
    } catch (ParseException e) {
      throw new IOException(e);
    }
  }

  private static Plan plan(String name) throws IOException {
    String resource = "/spanwright/shared/demo/" + name + ".json";
    try (InputStream in = Searches.class.getResourceAsStream(resource)) {
      return PlanReader.read(new String(in.readAllBytes(), StandardCharsets.UTF_8)).plan();
    }
  }
}
