package spanwright.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Writes the accuracy report from every {@link PublishedChecks} and fails when the committed page
 * differs.
 */
class AccuracyReportTest {
  private static final Path COMMITTED = Path.of("..", "docs", "accuracy.md");
  private static final Path WRITTEN = Path.of("target", "accuracy.md");

  @Test
  void the_committed_page_is_what_the_tests_find() throws Exception {
    String page = page();
    Files.createDirectories(WRITTEN.getParent());
    Files.writeString(WRITTEN, page);
    String committed = Files.exists(COMMITTED) ? read(COMMITTED) : "";
    assertEquals(
        committed,
        page,
        "docs/accuracy.md is stale: look at the difference, then copy backend/target/accuracy.md over it");
  }

  private static String read(Path path) throws IOException {
    return Files.readString(path, StandardCharsets.UTF_8).replace("\r\n", "\n");
  }

  private static String page() throws ReflectiveOperationException {
    StringBuilder page =
        new StringBuilder(
            """
            # Accuracy

            Written by the tests; do not edit. Each line is a value from outside the program, what the program finds, and where the value
            comes from. A line that does not hold fails the build, and so does a page that is stale.
            """);
    for (PublishedChecks part : parts()) {
      page.append("\n## ")
          .append(part.heading())
          .append("\n\n")
          .append(part.about())
          .append("\n\n");
      page.append(
          "| check | expected | allowed | found | source |\n| --- | --- | --- | --- | --- |\n");
      for (Check check : part.checks()) {
        page.append("| ").append(cell(check.what()));
        page.append(" | ").append(cell(check.expected()));
        page.append(" | ").append(cell(check.tolerance()));
        page.append(" | ").append(cell(check.found()));
        page.append(" | ").append(cell(check.source())).append(" |\n");
      }
    }
    return page.toString();
  }

  private static String cell(String text) {
    return text.replace("|", "\\|").replace("\n", " ");
  }

  private static List<PublishedChecks> parts() throws ReflectiveOperationException {
    List<PublishedChecks> parts = new java.util.ArrayList<>();
    for (JavaClass found : new ClassFileImporter().importPackages("spanwright")) {
      if (found.isAssignableTo(PublishedChecks.class)
          && !found.getModifiers().contains(JavaModifier.ABSTRACT)) {
        parts.add((PublishedChecks) Class.forName(found.getName()).getConstructor().newInstance());
      }
    }
    parts.sort(Comparator.comparing(PublishedChecks::heading));
    return parts;
  }
}
