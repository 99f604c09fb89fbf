package spanwright;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static java.util.Map.entry;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** The direction of knowledge between packages: the table of docs/architecture.md, in Java. */
class ArchitectureTest {
  /** Package to the packages it may import; with them comes whatever they may import. */
  private static final Map<String, Set<String>> MAY_IMPORT =
      Map.ofEntries(
          entry("plan", Set.of()),
          entry("rigging", Set.of("plan")),
          entry("clearance", Set.of("plan", "rigging")),
          entry("moments", Set.of()),
          entry("feed", Set.of()),
          entry("path", Set.of()),
          entry("assess", Set.of("plan", "rigging", "clearance", "moments", "feed", "path")),
          entry("search", Set.of("assess")),
          entry("sheet", Set.of("assess", "rigging", "plan")),
          entry("store", Set.of("plan")),
          entry("web", Set.of("search", "sheet", "store")),
          entry("cli", Set.of("web", "search", "sheet")));

  private final JavaClasses ours =
      new ClassFileImporter()
          .withImportOption(new ImportOption.DoNotIncludeTests())
          .importPackages("spanwright");

  private static Set<String> closure(String name) {
    Set<String> all = new HashSet<>();
    for (String direct : MAY_IMPORT.get(name)) {
      all.add(direct);
      all.addAll(closure(direct));
    }
    return all;
  }

  @Test
  void packages_import_only_what_the_table_allows() {
    for (String name : MAY_IMPORT.keySet()) {
      Set<String> allowed = closure(name);
      String[] forbidden =
          MAY_IMPORT.keySet().stream()
              .filter(other -> !other.equals(name) && !allowed.contains(other))
              .map(other -> "spanwright." + other + "..")
              .toArray(String[]::new);
      if (forbidden.length > 0) {
        noClasses()
            .that()
            .resideInAPackage("spanwright." + name + "..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage(forbidden)
            .check(ours);
      }
    }
  }

  @Test
  void every_package_has_a_row_and_says_its_job() {
    Set<String> found = new TreeSet<>();
    ours.forEach(
        c -> {
          String rest = c.getPackageName().replaceFirst("^spanwright\\.?", "");
          found.add(rest.split("\\.")[0]);
        });
    assertEquals(new TreeSet<>(MAY_IMPORT.keySet()), found);
    for (String name : found) {
      Path essay = Path.of("src", "main", "java", "spanwright", name, "package-info.java");
      assertTrue(Files.exists(essay), name + " has no package-info.java");
    }
  }

  @Test
  void there_are_no_cycles() {
    slices().matching("spanwright.(*)..").should().beFreeOfCycles().check(ours);
  }

  @Test
  void pure_physics_knows_neither_geometry_library_nor_json() {
    noClasses()
        .that()
        .resideInAnyPackage("spanwright.moments..", "spanwright.feed..", "spanwright.path..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("org.locationtech..", "com.fasterxml..")
        .check(ours);
  }

  @Test
  void only_web_knows_the_http_server() {
    noClasses()
        .that()
        .resideOutsideOfPackage("spanwright.web..")
        .should()
        .dependOnClassesThat()
        .resideInAnyPackage("io.javalin..", "org.eclipse.jetty..", "jakarta.servlet..")
        .check(ours);
  }

  @Test
  void only_store_and_cli_touch_files() {
    noClasses()
        .that()
        .resideOutsideOfPackages("spanwright.store..", "spanwright.cli..")
        .should()
        .dependOnClassesThat()
        .haveNameMatching("java\\.nio\\.file\\.Files|java\\.io\\.File|java\\.io\\.File(In|Out).*")
        .check(ours);
  }

  /** JTS answers too far in about 8 % of pairs (its issue 585): on the dangerous side. */
  @Test
  void nobody_uses_the_geometry_librarys_distances_in_space() {
    noClasses()
        .should()
        .dependOnClassesThat()
        .haveFullyQualifiedName("org.locationtech.jts.algorithm.CGAlgorithms3D")
        .orShould()
        .dependOnClassesThat()
        .resideInAPackage("org.locationtech.jts.operation.distance3d..")
        .check(ours);
  }
}
