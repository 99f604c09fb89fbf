package spanwright.assess;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import spanwright.moments.GroundTables;
import spanwright.moments.Solver;
import spanwright.plan.Catalogues;
import spanwright.plan.Json;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.search.Effort;
import spanwright.search.Result;
import spanwright.search.Search;

/** Memory with ten bands of three frequencies in use. */
public final class TenBands {
  private static final double[] MIDDLES = {
    1.9, 3.65, 5.36, 7.1, 10.12, 14.15, 18.11, 21.2, 24.93, 28.5
  };

  private TenBands() {}

  /** Assesses and searches on ten bands, and says what that takes. */
  public static String memory() throws IOException {
    Plan plan = plan();
    GroundTables tables = new GroundTables();
    Assessor assessor = Assessor.of(plan, Catalogues.standard(), tables);
    Solver.warmUp();
    assessor.prepareTables(40, 12, 1);
    for (int i = 0; i < 40; i++) {
      assessor.assess(AssessBench.layout(i));
    }
    long held = tables.bytes();
    double live = live();
    Search.Options options = new Search.Options(Effort.NORMAL, 1, 12, 2);
    Result found = Search.run(plan, Catalogues.standard(), options, new Search.Listener() {});
    double after = live();
    return String.format(
        Locale.ROOT,
        "%d systems on %d frequencies, %d more in a search%n%n"
            + "| MiB | |%n| --- | ---: |%n| ground tables | %.1f |%n"
            + "| live heap, assessor and tables | %.1f |%n| live heap after the search | %.1f |%n"
            + "| heap allowed | %d |%n| resident | %s |%n| resident at most | %s |%n",
        assessor.tally().systems(),
        3 * MIDDLES.length,
        found.counts().systems(),
        mebi(held),
        mebi(live),
        mebi(after),
        Runtime.getRuntime().maxMemory() >> 20,
        resident("VmRSS"),
        resident("VmHWM"));
  }

  /** The demo plot, asked for ten bands and for every target on all of them. */
  private static Plan plan() throws IOException {
    ObjectNode tree = (ObjectNode) Json.mapper().readTree(AssessBench.json("corner-plot"));
    ObjectNode brief = (ObjectNode) tree.get("brief");
    ArrayNode bands = brief.putArray("bands");
    for (double middle : MIDDLES) {
      ObjectNode band = bands.addObject();
      band.put("name", middle + " MHz").put("weight", 1);
      band.putArray("frequencies").add(0.99 * middle).add(middle).add(1.01 * middle);
    }
    brief.get("targets").forEach(target -> ((ObjectNode) target).remove("bands"));
    PlanReader.Outcome outcome = PlanReader.read(tree.toString());
    if (!outcome.faults().isEmpty()) {
      throw new IllegalStateException(outcome.faults().toString());
    }
    return outcome.plan();
  }

  private static double mebi(double bytes) {
    return bytes / 1048576.0;
  }

  private static long live() {
    System.gc();
    Runtime runtime = Runtime.getRuntime();
    return runtime.totalMemory() - runtime.freeMemory();
  }

  /** As the system counts it, where it tells. */
  private static String resident(String what) throws IOException {
    Path file = Path.of("/proc/self/status");
    if (!Files.isReadable(file)) {
      return "not told here";
    }
    return Files.readAllLines(file).stream()
        .filter(line -> line.startsWith(what + ":"))
        .map(line -> line.replaceAll("[^0-9]", ""))
        .map(kibi -> String.format(Locale.ROOT, "%.0f", Long.parseLong(kibi) / 1024.0))
        .findFirst()
        .orElse("not told here");
  }
}
