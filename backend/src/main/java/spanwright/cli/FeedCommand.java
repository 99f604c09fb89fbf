package spanwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import picocli.CommandLine.Command;
import spanwright.plan.Catalogues;

/** Sends power through a line and a matching unit. */
@Command(name = "feed", description = "Takes one load through a line and a matching unit.")
final class FeedCommand extends CaseCommand {
  FeedCommand(Console console) {
    super(console);
  }

  @Override
  Object answer(Path file, JsonNode tree) {
    FeedCases.Read read = reckon(file, () -> FeedCases.read(tree, Catalogues.standard()));
    require(file, read.faults());
    return FeedCases.answer(reckon(file, read::run));
  }
}
