package spanwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.file.Path;
import picocli.CommandLine.Command;
import spanwright.moments.MeshAim;
import spanwright.moments.Solver;

/** Solves one antenna. */
@Command(name = "solve", description = "Solves one antenna case: impedance, gains, fields.")
final class SolveCommand extends CaseCommand {
  SolveCommand(Console console) {
    super(console);
  }

  @Override
  Object answer(Path file, JsonNode tree) {
    SolveCases.Read read = SolveCases.read(tree);
    require(file, read.faults());
    ObjectNode answer = JsonNodeFactory.instance.objectNode();
    ArrayNode results = answer.putArray("results");
    Solver solver = new Solver();
    for (double frequencyMHz : read.frequenciesMHz()) {
      results.add(
          reckon(
              file,
              () ->
                  SolveCases.row(
                      read,
                      solver.solveAndRefine(
                          read.model(), read.ground(), frequencyMHz, MeshAim.FULL))));
    }
    return answer;
  }
}
