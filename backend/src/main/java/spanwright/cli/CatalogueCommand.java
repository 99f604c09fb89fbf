package spanwright.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import spanwright.plan.Catalogues;

/** Prints what can be chosen. */
@Command(
    name = "catalogue",
    description =
        "Prints the catalogues: wires, lines, ropes, matching units, soils, bands, rules.")
final class CatalogueCommand implements Callable<Integer> {
  private final Console console;

  @Mixin Help help = new Help();

  CatalogueCommand(Console console) {
    this.console = console;
  }

  @Override
  public Integer call() {
    Documents.write(console, null, Documents.json(Catalogues.standard()));
    return Exit.DONE;
  }
}
