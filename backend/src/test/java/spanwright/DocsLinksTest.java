package spanwright;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Every link and picture of the project's pages leads somewhere. */
class DocsLinksTest {
  private static final Path ROOT = Path.of("..");
  private static final Set<String> NOT_OURS = Set.of("target", "node_modules", ".git");
  private static final Pattern LINK = Pattern.compile("!?\\[[^\\]]*]\\(<?([^)>\\s]+)[^)]*\\)");
  private static final Pattern CODE = Pattern.compile("`[^`]*`");
  private static final Pattern ELSEWHERE = Pattern.compile("[a-z][a-z0-9+.-]*:.*");

  @Test
  void every_relative_link_leads_to_a_file_and_every_anchor_to_a_heading() throws IOException {
    List<String> broken = new ArrayList<>();
    int links = 0;
    for (Path page : pages()) {
      List<String> lines = prose(page);
      for (int i = 0; i < lines.size(); i++) {
        Matcher link = LINK.matcher(withoutCode(lines.get(i)));
        while (link.find()) {
          String target = link.group(1);
          if (!ELSEWHERE.matcher(target).matches()) {
            links++;
            if (!leadsSomewhere(page, target)) {
              broken.add(ROOT.relativize(page) + ":" + (i + 1) + ": " + target);
            }
          }
        }
      }
    }
    assertEquals(List.of(), broken, "links that lead nowhere");
    assertTrue(links > 40, "only " + links + " links were found");
  }

  private static List<Path> pages() throws IOException {
    try (Stream<Path> all = Files.walk(ROOT)) {
      return all.filter(page -> page.toString().endsWith(".md"))
          .filter(page -> notBuilt(ROOT.relativize(page)))
          .sorted()
          .toList();
    }
  }

  private static boolean notBuilt(Path page) {
    for (Path part : page) {
      if (NOT_OURS.contains(part.toString())) {
        return false;
      }
    }
    return true;
  }

  /** The lines of a page; those of fenced code are empty. */
  private static List<String> prose(Path page) throws IOException {
    List<String> lines = new ArrayList<>();
    boolean fenced = false;
    for (String line : Files.readAllLines(page, StandardCharsets.UTF_8)) {
      boolean fence = line.stripLeading().startsWith("```");
      fenced ^= fence;
      lines.add(fenced || fence ? "" : line);
    }
    return lines;
  }

  /** Code between backticks is no link, but may be the words of one. */
  private static String withoutCode(String line) {
    return CODE.matcher(line).replaceAll(code -> "x".repeat(code.group().length()));
  }

  private static boolean leadsSomewhere(Path page, String target) throws IOException {
    int hash = target.indexOf('#');
    String file = hash < 0 ? target : target.substring(0, hash);
    Path to = file.isEmpty() ? page : page.resolveSibling(file).normalize();
    if (!Files.exists(to)) {
      return false;
    }
    return hash < 0 || anchors(to).contains(target.substring(hash + 1));
  }

  /** What headings are called in links: small letters, no signs, hyphens for spaces. */
  private static Set<String> anchors(Path page) throws IOException {
    return prose(page).stream()
        .filter(line -> line.startsWith("#"))
        .map(line -> line.replaceFirst("^#+\\s*", "").strip().toLowerCase(Locale.ROOT))
        .map(line -> line.replaceAll("[^\\p{L}\\p{N}\\- ]", "").replace(' ', '-'))
        .collect(Collectors.toSet());
  }
}
