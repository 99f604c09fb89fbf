package spanwright;

import static java.util.Map.entry;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Holds the page to its own rules: the table of frontend/README.md, read from the sources. */
class FrontEndRulesTest {
  private static final Path FRONT_END = Path.of("..", "frontend");
  private static final Path SOURCES = FRONT_END.resolve("src");
  private static final int MOST_LINES = 400;

  /** Folder to the folders it may import besides itself. */
  private static final Map<String, Set<String>> MAY_IMPORT =
      Map.ofEntries(
          entry("geometry", Set.of()),
          entry("units", Set.of()),
          entry("api", Set.of()),
          entry("state", Set.of("geometry")),
          entry("draw", Set.of("geometry", "units", "state", "charts")),
          entry("charts", Set.of("geometry", "units", "draw")),
          entry("tools", Set.of("state", "geometry")),
          entry("panels", Set.of("geometry", "state", "units", "api", "draw", "charts")));

  private static final Pattern IMPORT =
      Pattern.compile("(?m)^(?:import|export)\\s[^;'\"]*?from\\s*'([^']+)'|^import\\s*'([^']+)'");
  private static final Pattern COLOUR =
      Pattern.compile("#[0-9A-Fa-f]{3,8}\\b(?![\\w-])|\\b(?:rgb|hsl|oklch|lab)a?\\(");

  private static List<Path> files(Path folder, String ending) {
    try (Stream<Path> all = Files.walk(folder)) {
      return all.filter(p -> p.toString().endsWith(ending)).sorted().toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static String text(Path file) {
    try {
      return Files.readString(file);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static List<Path> modules() {
    return files(SOURCES, ".js").stream()
        .filter(p -> !p.startsWith(SOURCES.resolve("test")))
        .toList();
  }

  /** Every file that breaks a rule, with what it does. */
  private static void hold(List<Path> files, Function<Path, Stream<String>> broken) {
    List<String> found = new ArrayList<>();
    for (Path file : files) {
      broken.apply(file).forEach(what -> found.add(FRONT_END.relativize(file) + ": " + what));
    }
    assertEquals(List.of(), found);
  }

  private static String folder(Path file) {
    Path inside = SOURCES.relativize(file.normalize());
    return inside.getNameCount() > 1 ? inside.getName(0).toString() : "";
  }

  @Test
  void there_is_a_page_to_hold() {
    assertTrue(modules().size() > 40, "found " + modules().size());
  }

  @Test
  void modules_import_only_what_the_table_allows() {
    hold(
        modules(),
        file -> {
          String own = folder(file);
          if (own.isEmpty()) {
            return Stream.empty();
          }
          Set<String> allowed = MAY_IMPORT.get(own);
          if (allowed == null) {
            return Stream.of("its folder has no row in the table");
          }
          return IMPORT
              .matcher(text(file))
              .results()
              .map(m -> m.group(1) != null ? m.group(1) : m.group(2))
              .filter(
                  name -> {
                    if (!name.startsWith(".")) {
                      return true;
                    }
                    String other = folder(file.getParent().resolve(name));
                    return !other.equals(own) && !allowed.contains(other);
                  })
              .map(name -> "may not import " + name);
        });
  }

  @Test
  void text_never_enters_as_markup() {
    Pattern markup =
        Pattern.compile(
            "innerHTML|outerHTML|insertAdjacentHTML|document\\.write|\\beval\\(|new Function\\(");
    hold(modules(), file -> markup.matcher(text(file)).results().map(m -> "uses " + m.group()));
  }

  @Test
  void colours_stand_only_in_the_tokens() {
    List<Path> all = new ArrayList<>(modules());
    files(FRONT_END.resolve("styles"), ".css").stream()
        .filter(p -> !p.endsWith("tokens.css"))
        .forEach(all::add);
    hold(
        all,
        file ->
            COLOUR
                .matcher(
                    text(file).replaceAll("url\\(#[^)]*\\)", "").replaceAll("[\"'`]#[\\w$-]+", ""))
                .results()
                .map(m -> "writes the colour " + m.group()));
  }

  @Test
  void every_colour_that_is_used_is_a_token() {
    String tokens = text(FRONT_END.resolve("styles/tokens.css"));
    Pattern used = Pattern.compile("var\\((--[a-z0-9-]+)\\)");
    hold(
        files(FRONT_END.resolve("styles"), ".css"),
        file -> {
          String css = text(file);
          return used.matcher(css)
              .results()
              .map(m -> m.group(1))
              .filter(name -> !tokens.contains(name + ":") && !css.contains(name + ":"))
              .distinct()
              .map(name -> "uses " + name + ", which no token defines");
        });
  }

  @Test
  void files_are_short_enough_to_read() {
    List<Path> all = new ArrayList<>(files(SOURCES, ".js"));
    all.addAll(files(FRONT_END.resolve("styles"), ".css"));
    hold(
        all,
        file -> {
          long lines = text(file).lines().count();
          return lines > MOST_LINES ? Stream.of(lines + " lines") : Stream.empty();
        });
  }

  @Test
  void every_module_is_checked_by_editors() {
    hold(
        files(SOURCES, ".js"),
        file ->
            text(file).startsWith("// @ts-check") ? Stream.empty() : Stream.of("no // @ts-check"));
  }

  @Test
  void nothing_is_remembered_outside_the_store() {
    Pattern variable = Pattern.compile("(?m)^(?:export )?(?:let|var) .*");
    hold(modules(), file -> variable.matcher(text(file)).results().map(m -> m.group()));
  }

  @Test
  void the_page_itself_has_no_inline_script_or_style() {
    String page = text(FRONT_END.resolve("index.html"));
    assertTrue(
        !page.contains("style=")
            && !page.contains("<style")
            && !page.matches("(?s).*\\son\\w+=.*"));
    assertTrue(!page.matches("(?s).*<script(?![^>]*src=)[^>]*>.*"));
  }

  /** Text must stand at 4.5 : 1, lines that carry meaning at 3 : 1 (WCAG 2.2, 1.4.3 and 1.4.11). */
  @Test
  void every_colour_can_be_told_from_its_ground_light_and_dark() {
    String css = text(FRONT_END.resolve("styles/tokens.css"));
    int dark = css.indexOf("prefers-color-scheme: dark");
    Map<String, String> light = colours(css.substring(0, dark));
    Map<String, String> darkSet = new HashMap<>(light);
    darkSet.putAll(colours(css.substring(dark, css.indexOf("forced-colors"))));
    List<String> faint = new ArrayList<>();
    for (Map<String, String> set : List.of(light, darkSet)) {
      String name = set == light ? "light" : "dark";
      for (String ground : List.of("paper", "field", "ground-wash")) {
        for (String text :
            List.of("ink", "ink2", "ink3", "copper", "rope", "clear", "tight", "foul")) {
          need(faint, name, set, text, ground, 4.5);
        }
        need(faint, name, set, "leaf", ground, 3);
      }
      need(faint, name, set, "copper", "copper-wash", 4.5);
      need(faint, name, set, "rope", "rope-wash", 4.5);
      need(faint, name, set, "foul", "foul-wash", 4.5);
      for (String wash : List.of("copper-wash", "rope-wash", "leaf-wash", "foul-wash")) {
        need(faint, name, set, "ink3", wash, 4.5);
      }
    }
    assertEquals(List.of(), faint);
  }

  private static Map<String, String> colours(String css) {
    Map<String, String> found = new HashMap<>();
    Pattern.compile("--([a-z0-9-]+):\\s*(#[0-9A-Fa-f]{6})")
        .matcher(css)
        .results()
        .forEach(m -> found.put(m.group(1), m.group(2)));
    return found;
  }

  private static void need(
      List<String> faint,
      String set,
      Map<String, String> of,
      String on,
      String ground,
      double least) {
    double found = contrast(of.get(on), of.get(ground));
    if (found < least) {
      faint.add(String.format("%s: %s on %s is %.2f, needs %.1f", set, on, ground, found, least));
    }
  }

  /** Contrast ratio of two sRGB colours, WCAG 2.2, "contrast ratio" and "relative luminance". */
  private static double contrast(String a, String b) {
    double one = luminance(a);
    double two = luminance(b);
    return (Math.max(one, two) + 0.05) / (Math.min(one, two) + 0.05);
  }

  private static double luminance(String hex) {
    double[] weight = {0.2126, 0.7152, 0.0722};
    double sum = 0;
    for (int i = 0; i < 3; i++) {
      double c = Integer.parseInt(hex.substring(1 + 2 * i, 3 + 2 * i), 16) / 255.0;
      sum += weight[i] * (c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4));
    }
    return sum;
  }
}
