package spanwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import spanwright.assess.Placement;
import spanwright.plan.Catalogues;
import spanwright.plan.Fault;
import spanwright.plan.Plan;
import spanwright.search.Result;
import spanwright.sheet.NoCoordinatesException;
import spanwright.sheet.SheetModel;
import spanwright.sheet.SheetOptions;
import spanwright.sheet.Sheets;
import spanwright.web.PlacementReader;

/** Writes the sheet of one placement in every format. */
@Command(
    name = "sheet",
    description = "Writes the rigging sheet of one placement as PDF, CSV, JSON, SVG and GeoJSON.")
final class SheetCommand implements Callable<Integer> {
  private static final DateTimeFormatter CLOCK =
      DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm").withZone(ZoneId.systemDefault());

  private final Console console;

  @Spec CommandSpec spec;
  @Mixin Help help = new Help();

  @Parameters(index = "0", paramLabel = "PLAN.json", description = "The plan.")
  String planFile;

  @Parameters(
      index = "1",
      paramLabel = "RESULT.json",
      description = "The result of rank on that plan.")
  String resultFile;

  @Option(
      names = "--placement",
      paramLabel = "ID",
      required = true,
      description = "Which placement, such as p01.")
  String placementId;

  @Option(
      names = "--dir",
      paramLabel = "OUT",
      required = true,
      description = "Folder to write into; made if missing.")
  String dir;

  @Option(names = "--paper", paramLabel = "SIZE", description = "A4 (default) or Letter.")
  String paper;

  @Option(names = "--units", paramLabel = "UNIT", description = "m (default) or ft.")
  String units;

  SheetCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    Plan plan = Documents.plan(planFile);
    SheetOptions options = options();
    Path file = Documents.path(resultFile);
    Placement placement = placement(plan, file);
    Path folder = folder();
    IssuedSheets issued = IssuedSheets.in(folder);
    List<Placement> others = others(plan, file);
    SheetModel model =
        CaseCommand.reckon(
            file,
            () ->
                Sheets.of(plan, Catalogues.standard(), placement, options, others, issued.list()));
    String stem = issued.stem(model);
    write(folder, stem + ".pdf", Sheets.toPdf(model));
    write(folder, stem + ".csv", Sheets.toCsv(model).getBytes(StandardCharsets.UTF_8));
    write(folder, stem + ".json", Sheets.toJson(model).getBytes(StandardCharsets.UTF_8));
    write(folder, stem + ".svg", Sheets.toSvg(model).getBytes(StandardCharsets.UTF_8));
    try {
      write(folder, stem + ".geojson", Sheets.toGeoJson(model).getBytes(StandardCharsets.UTF_8));
    } catch (NoCoordinatesException e) {
      console.err().println("No GeoJSON is written: " + e.getMessage());
    }
    issued.keep(Sheets.issue(model, options.date()));
    return Exit.DONE;
  }

  private void write(Path folder, String name, byte[] bytes) {
    Path file = folder.resolve(name);
    Documents.write(file, bytes);
    console.out().println(file);
  }

  private SheetOptions options() {
    String saved = null;
    try {
      saved = CLOCK.format(Files.getLastModifiedTime(Documents.path(planFile)).toInstant());
    } catch (IOException e) {
      // The sheet then shows no time.
    }
    try {
      SheetOptions options = SheetOptions.of(paper, units, saved);
      return saved == null ? options : options.on(saved.substring(0, 10));
    } catch (IllegalArgumentException e) {
      throw new ParameterException(spec.commandLine(), e.getMessage());
    }
  }

  private Placement placement(Plan plan, Path file) {
    JsonNode tree = Documents.tree(file, Documents.LONGEST_RESULT);
    if (!Result.FORMAT.equals(tree.path("format").asText())) {
      throw Failure.badInput(
          file + ": format: This is not a result. Give the document that rank wrote.");
    }
    JsonNode placements = tree.path("placements");
    List<String> ids = new ArrayList<>();
    for (int i = 0; i < placements.size(); i++) {
      String id = placements.get(i).path("id").asText();
      ids.add(id);
      if (id.equals(placementId)) {
        List<Fault> faults = new ArrayList<>();
        Placement placement =
            new PlacementReader(plan, Catalogues.standard())
                .whole(placements.get(i), "placements[" + i + "]", faults);
        CaseCommand.require(file, faults);
        return placement;
      }
    }
    String has = ids.isEmpty() ? "It has none." : "It has " + String.join(", ", ids) + ".";
    throw Failure.badInput(file + ": there is no placement " + placementId + ". " + has);
  }

  /** Every placement of the result that can be read, to say what consents buy. */
  private static List<Placement> others(Plan plan, Path file) {
    JsonNode placements = Documents.tree(file, Documents.LONGEST_RESULT).path("placements");
    PlacementReader reader = new PlacementReader(plan, Catalogues.standard());
    List<Placement> others = new ArrayList<>();
    for (JsonNode each : placements) {
      List<Fault> faults = new ArrayList<>();
      Placement other = reader.whole(each, "placements", faults);
      if (faults.isEmpty() && other != null) {
        others.add(other);
      }
    }
    return others;
  }

  private Path folder() {
    Path folder = Documents.path(dir);
    try {
      return Files.createDirectories(folder);
    } catch (IOException e) {
      throw Failure.couldNot(folder + ": this folder cannot be made. Choose another with --dir.");
    }
  }
}
