package spanwright.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import spanwright.assess.Assessor;
import spanwright.assess.Placement;
import spanwright.plan.Catalogues;
import spanwright.plan.Fault;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.web.PlacementReader;

/** Assesses one placement, also a foul one. */
@Command(
    name = "assess",
    description = "Assesses one placement on a plan; of it only the geometry is read.")
final class AssessCommand implements Callable<Integer> {
  private final Console console;

  @Mixin Help help = new Help();

  @Parameters(index = "0", paramLabel = "PLAN.json", description = "The plan.")
  String planFile;

  @Parameters(
      index = "1",
      paramLabel = "PLACEMENT.json",
      description = "One element of placements: shape, attachments, conductors, feed.")
  String placementFile;

  @Option(
      names = "--out",
      paramLabel = "FILE",
      description = "Where to write the placement (default: standard output).")
  String out;

  AssessCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    Path target = Documents.target(out);
    Plan plan = Documents.plan(planFile);
    Path file = Documents.path(placementFile);
    List<Fault> faults = new ArrayList<>();
    Layout layout =
        new PlacementReader(plan, Catalogues.standard())
            .layout(Documents.tree(file, Documents.LONGEST_CASE), "", faults);
    CaseCommand.require(file, faults);
    Assessor assessor = Assessor.of(plan, Catalogues.standard());
    Placement placement = CaseCommand.reckon(file, () -> assessor.assess(layout));
    Documents.write(console, target, Documents.json(placement));
    return Exit.DONE;
  }
}
