package spanwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import picocli.CommandLine.Command;
import spanwright.rigging.Hanging;

/** Hangs one wire. */
@Command(name = "hang", description = "Hangs one wire, calm and in wind.")
final class HangCommand extends CaseCommand {
  HangCommand(Console console) {
    super(console);
  }

  @Override
  Object answer(Path file, JsonNode tree) {
    HangCases.Read read = HangCases.read(tree);
    require(file, read.faults());
    return reckon(file, () -> Hanging.solve(read.hangCase()));
  }
}
