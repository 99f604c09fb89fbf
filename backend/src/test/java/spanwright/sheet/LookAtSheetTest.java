package spanwright.sheet;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** Leaves the fixture's sheet in target/sheets, to be printed and looked at. */
class LookAtSheetTest {
  @Test
  void the_sheet_of_the_fixture_can_be_looked_at() throws IOException {
    Path folder = Files.createDirectories(Path.of("target", "sheets"));
    for (SheetOptions.Paper paper : SheetOptions.Paper.values()) {
      for (SheetOptions.Units units : SheetOptions.Units.values()) {
        SheetModel model = Fixture.model(paper, units);
        Path file = folder.resolve(paper.label() + "-" + units + ".pdf");
        Files.write(file, Sheets.toPdf(model));
        assertTrue(Files.size(file) > 10_000);
      }
    }
  }
}
