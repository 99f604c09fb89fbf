package spanwright.e2e;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.microsoft.playwright.Download;
import com.microsoft.playwright.Locator;
import com.microsoft.playwright.options.ColorScheme;
import com.microsoft.playwright.options.SelectOption;
import com.microsoft.playwright.options.WaitForSelectorState;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;

/** A newcomer does the whole job: a garden from an empty page to a rigging list in the hand. */
class DrawsAGardenIT extends BrowserTest {
  private static final double[][] GARDEN = {{0, 0}, {24, 0}, {24, 16}, {0, 16}};
  private static final Pattern NO_FIGURE = Pattern.compile("\\b(NaN|Infinity|undefined|null)\\b");

  @Test
  void from_an_empty_page_to_a_rigging_list() throws IOException {
    open(1440, 900, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    hand.newPlot();
    draw(hand);
    hand.settled();
    checkLedger();
    page.locator(".next-step.ready .link").click();
    sayWhatItMustDo();
    checkKept();
    watchSearch();
    hand.search();
    checkSearchWasSeen();
    checkList();
    checkPlacement();
    page.locator("[data-key=sheet]").click();
    checkSheet();
    checkIssue();
  }

  @Test
  void the_survey_is_drawn_and_nudged_by_keyboard_alone() throws IOException {
    open(1440, 900, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    tabTo(".plot-name");
    press("Enter");
    tabTo("dialog.plots .strong");
    press("Enter");
    page.locator(".empty").waitFor();
    tabTo("[data-tool=boundary]");
    press("Enter", "Shift+ArrowLeft", "Shift+ArrowDown", "Enter");
    hand.typeSides("18", "90", "12", "0", "18", "270");
    press("c");
    page.locator(".thing-figures").waitFor();
    tabTo("[data-tool=supports]");
    press("Enter", "Shift+ArrowRight", "Shift+ArrowRight", "Enter");
    page.locator(".thing-figures").waitFor();
    List<Double> placed = numbers(kept().at("/supports/0/at"));
    press("Shift+ArrowUp", "ArrowRight", "ArrowRight", "ArrowRight");
    List<Double> nudged = numbers(kept().at("/supports/0/at"));
    assertEquals(placed.get(0) + 0.3, nudged.get(0), 1e-9);
    assertEquals(placed.get(1) + 1, nudged.get(1), 1e-9);
    press("Control+z");
    assertEquals(placed, numbers(kept().at("/supports/0/at")), "the nudges are one step");
    press("Control+Shift+z");
    tabTo("#figure-highest");
    page.keyboard().type("9.2");
    press("Enter");
    assertEquals(9.2, kept().at("/supports/0/highest").asDouble());
    assertEquals(nudged, numbers(kept().at("/supports/0/at")));
    tabTo(".plan [data-ref='boundary/']");
    press("Enter", "]", "ArrowLeft");
    List<Double> corner = numbers(kept().at("/boundary/0"));
    assertEquals(numbers(kept().at("/boundary/3")).get(0) - 0.1, corner.get(0), 1e-9);
  }

  /** The plan as kept once what is done is saved. */
  private JsonNode kept() {
    page.locator(".saved[data-state=saved]").waitFor();
    return Served.newestPlan(page, program);
  }

  private void press(String... keys) {
    for (String key : keys) {
      page.keyboard().press(key);
    }
  }

  /** Presses Tab until the focus is on what is looked for: it can be reached. */
  private void tabTo(String selector) {
    for (int i = 0; i < 120; i++) {
      if ((Boolean) page.evaluate("s => Boolean(document.activeElement?.matches(s))", selector)) {
        return;
      }
      press("Tab");
    }
    throw new AssertionError("Tab does not reach " + selector);
  }

  private void draw(Surveyor hand) {
    hand.ring("boundary", 0, 0, "24", "90", "16", "0", "24", "L");
    hand.showAll();
    hand.ring("buildings", 2, 1, "9", "90", "6.5 m", "L", "900 cm", "L");
    hand.figure("Name", "House");
    hand.figure("Eaves", "5");
    hand.figure("Ridge or high side", "7.4");
    hand.support("tree", "Pear", 21.5, 13.5, "3", "7.5");
    hand.support("mast", "Shed mast", 1, 14.5, "3", "7");
    hand.support("chimney", "Stack", 6.5, 4.3, "7.6", "8.4");
    hand.place("entry", 11, 6);
    hand.figure("Height", "1.4");
    hand.place("datums", 2, 7.5);
    hand.place("datums", 11, 7.5);
  }

  private void checkLedger() {
    Map<String, String> held =
        Map.of(
            "Boundary", "4 corners",
            "Buildings", "1 building",
            "Supports", "3, tallest 8.4 m",
            "Station entry", "1.4 m up",
            "Datums", "A, B");
    held.forEach(
        (what, words) -> {
          var row = page.locator(".ledger-table tr.ledger-held").filter(having(what));
          assertEquals(words, row.locator("td").first().innerText(), what);
        });
    assertEquals("384 m²", page.locator(".ledger-area").innerText());
    assertEquals(0, page.locator(".survey-faults .fault").count());
  }

  private void sayWhatItMustDo() {
    page.locator("[data-key=band-2]").click();
    page.locator("[data-key=band-2-remove]").click();
    page.locator("#brief button", text("+ 30 m")).click();
    page.locator("[data-key=target-1]").click();
    page.locator("#brief-target-1-name").fill("Over the ocean");
    page.locator("#brief-target-1-name").press("Tab");
    page.locator("#brief-target-1-bearing").fill("285");
    page.locator("#brief-target-1-bearing").press("Tab");
    page.locator("#brief-target-1-distance").fill("5600");
    page.locator("#brief-target-1-distance").press("Tab");
    page.locator(".target-row", text("5\u2009600 km")).waitFor();
    page.locator(".saved[data-state=saved]").waitFor();
  }

  /** What the server keeps is what was drawn and said. */
  private void checkKept() {
    JsonNode plan = Served.newestPlan(page, program);
    for (int i = 0; i < GARDEN.length; i++) {
      assertEquals(GARDEN[i][0], plan.at("/boundary/" + i + "/0").asDouble(), 1e-6);
      assertEquals(GARDEN[i][1], plan.at("/boundary/" + i + "/1").asDouble(), 1e-6);
    }
    assertEquals(4, plan.at("/boundary").size());
    assertEquals("House", plan.at("/buildings/0/name").asText());
    assertEquals(5.0, plan.at("/buildings/0/eaves").asDouble());
    assertEquals(7.4, plan.at("/buildings/0/ridge").asDouble());
    assertEquals(List.of(11.0, 7.5), numbers(plan.at("/buildings/0/footprint/2")));
    assertEquals("tree", plan.at("/supports/0/kind").asText());
    assertEquals(List.of(21.5, 13.5), numbers(plan.at("/supports/0/at")));
    assertEquals(8.4, plan.at("/supports/2/highest").asDouble());
    assertEquals(1.4, plan.at("/entry/height").asDouble());
    assertEquals("30 m", plan.at("/brief/bands/2/name").asText());
    assertEquals(285, plan.at("/brief/targets/1/bearing").asDouble());
    assertEquals(5600, plan.at("/brief/targets/1/distanceKm").asDouble());
    assertEquals(
        0, Served.check(page, program, plan).at("/faults").size(), "the plan has no fault");
  }

  /** Notes down what is seen of a search, also when it is over in a moment. */
  private void watchSearch() {
    page.evaluate(
        "() => { window.seen = { rule: 0, words: [], candidates: 0 };"
            + " new MutationObserver(() => { const s = window.seen;"
            + " if (document.querySelector('[role=progressbar]')) s.rule += 1;"
            + " const w = document.querySelector('.search-running b')?.textContent;"
            + " if (w && !s.words.includes(w)) s.words.push(w);"
            + " s.candidates = Math.max(s.candidates,"
            + " document.querySelectorAll('.plan .candidate').length);"
            + " }).observe(document.body, { subtree: true, childList: true }); }");
  }

  private void checkSearchWasSeen() {
    JsonNode seen = Served.json(page.evaluate("() => JSON.stringify(window.seen)").toString());
    assertTrue(seen.at("/rule").asInt() > 0, "a progress rule was shown");
    assertTrue(seen.at("/words").size() > 0, "what is being tried was said");
    assertTrue(seen.at("/candidates").asInt() > 0, "candidates were drawn on the plan");
  }

  private void checkList() {
    List<String> rows = page.locator("#placements .row").allInnerTexts();
    assertTrue(rows.size() >= 3, "at least three placements, but " + rows.size());
    assertEquals(rows.size(), new HashSet<>(rows).size(), "no two rows are the same");
    for (String row : rows) {
      assertTrue(row.contains("dB"), row);
      assertTrue(row.matches("(?s).*(Pear|Stack|Shed mast).*"), row);
      assertFalse(NO_FIGURE.matcher(row).find(), row);
    }
  }

  /** The second of the list, opened: its wire, clearances, profile and bands. */
  private void checkPlacement() {
    String first = page.locator("#placement .placement-head").innerText();
    page.locator("#placements .row").nth(1).click();
    page.locator("#placement .placement-head", text("Placement 2,")).waitFor();
    String second = page.locator("#placement .placement-head").innerText();
    assertNotEquals(first, second);
    assertTrue(second.startsWith("Placement 2, "), second);
    List<String> clearances = page.locator("#placement .clearances tbody tr").allInnerTexts();
    assertTrue(clearances.size() >= 3, clearances.toString());
    assertTrue(clearances.stream().allMatch(r -> r.matches("(?s).*\\d\\.\\d\\d.*")));
    page.locator("#placement .profile svg path").nth(2).waitFor(attached());
    assertTrue(page.locator("#placement .profile svg path").count() >= 3, "launch profile");
    Set<String> bands = new HashSet<>(page.locator("#placement .gains tbody th").allInnerTexts());
    assertEquals(Set.of("40 m", "20 m", "30 m"), bands);
    assertEquals(9, page.locator("#placement .feed tbody tr").count(), "each frequency");
    page.locator("#side-view svg path").nth(3).waitFor(attached());
    assertTrue(page.locator("#side-view svg path").count() >= 4, "side view along the wire");
    page.locator(".plan .layer-placement path").nth(1).waitFor(attached());
    assertTrue(page.locator(".plan .layer-placement path").count() >= 2, "the wire on the plan");
    page.locator(".plan .layer-rose path").nth(1).waitFor(attached());
    assertTrue(page.locator(".plan .layer-rose path").count() >= 2, "the reach rose");
    for (String part : List.of("#placements", "#placement", "#side-view", "#plan-box")) {
      String markup = (String) page.locator(part).evaluate("part => part.outerHTML");
      assertFalse(NO_FIGURE.matcher(markup).find(), part + " shows only finite figures");
    }
    page.locator("#placements .row").first().click();
    page.locator("#placement .placement-head", text("Placement 1,")).waitFor();
  }

  private void checkSheet() throws IOException {
    page.locator(".page.list").waitFor();
    page.locator(".page.drawing img").waitFor();
    assertEquals("Overhead lines first", page.locator(".overhead h3").innerText());
    assertEquals(
        1,
        page.locator(".page.list section")
            .first()
            .locator("xpath=self::*[@class='overhead']")
            .count(),
        "overhead lines stand before everything");
    JsonNode sheet = Served.json(new String(take("json"), StandardCharsets.UTF_8));
    checkModel(sheet);
    String csv = new String(take("csv"), StandardCharsets.UTF_8).replace("\r\n", "\n");
    checkCsv(csv, sheet);
    checkPdf(take("pdf"), sheet);
    String svg = new String(take("svg"), StandardCharsets.UTF_8);
    assertTrue(svg.contains("<svg") && svg.contains("210mm"), "a drawing on A4");
    assertTrue(svg.contains("House") && svg.contains("Pear"), "the drawing names what was drawn");
    assertFalse(NO_FIGURE.matcher(svg).find(), "the drawing has only finite figures");
    String shown = page.locator(".page.list").innerText();
    for (JsonNode wire : sheet.at("/wires")) {
      assertTrue(shown.contains(String.format("%.2f", wire.at("/cut").asDouble())), shown);
    }
  }

  /**
   * Handed out by keyboard; another placement is then the next revision and says what it changes.
   */
  private void checkIssue() throws IOException {
    page.locator(".revision h2", text("Revision A, not yet issued")).waitFor();
    tabTo("[data-key=issue]");
    press("Enter");
    page.locator(".revision h2", text("Revision A, issued")).waitFor();
    assertEquals("Revision A is issued.", page.locator("#news").textContent());
    assertEquals(1, page.locator(".revision .issued li").count());
    assertTrue(
        (Boolean) page.evaluate("() => document.activeElement.matches('.revision h2')"),
        "the focus stays where the button was");
    page.locator("#sheet-placement").selectOption(new SelectOption().setIndex(1));
    page.locator(".revision h2", text("Revision B, not yet issued")).waitFor();
    JsonNode head = Served.json(new String(take("json"), StandardCharsets.UTF_8)).at("/head");
    assertEquals("A", head.at("/since").asText());
    String summary = page.locator(".revision summary").innerText();
    assertEquals(head.at("/changes").size() + " changes since revision A", summary);
  }

  private void checkModel(JsonNode sheet) {
    assertEquals("spanwright-sheet/1", sheet.at("/format").asText());
    Set<String> mine = Set.of("Pear", "Shed mast", "Stack");
    for (JsonNode hold : sheet.at("/attachments")) {
      assertTrue(mine.contains(hold.at("/name").asText()), hold.toString());
      double height = hold.at("/aboveGround").asDouble();
      assertTrue(height >= 3 && height <= 8.4, hold.toString());
      assertTrue(hold.at("/pullInWind").asDouble() > 0, hold.toString());
    }
    double garden = Math.hypot(24, 16);
    double wire = 0;
    for (JsonNode piece : sheet.at("/wires")) {
      double asked =
          piece.at("/finished").asDouble()
              + piece.at("/turnsBack").asDouble()
              + piece.at("/trim").asDouble();
      double cut = piece.at("/cut").asDouble();
      assertTrue(cut >= asked - 1e-9 && cut < asked + 0.0101, piece.toString());
      assertTrue(piece.at("/finished").asDouble() < garden, piece.toString());
      wire += piece.at("/finished").asDouble();
    }
    assertEquals(sheet.at("/head/wireLength").asDouble(), wire, 0.02);
    for (JsonNode rope : sheet.at("/ropes")) {
      double asked = rope.at("/run").asDouble() + rope.at("/allowance").asDouble();
      assertTrue(rope.at("/cut").asDouble() >= asked - 1e-9, rope.toString());
    }
    checkSetOut(sheet.at("/setOut"));
  }

  /** The two tapes of each point lead back to its place, and that lies in the garden. */
  private void checkSetOut(JsonNode setOut) {
    assertEquals(List.of(2.0, 7.5), numbers(setOut.at("/a/at")).subList(0, 2));
    assertEquals(List.of(11.0, 7.5), numbers(setOut.at("/b/at")).subList(0, 2));
    assertTrue(setOut.at("/points").size() >= 3, setOut.toString());
    for (JsonNode point : setOut.at("/points")) {
      double x = point.at("/at/0").asDouble();
      double y = point.at("/at/1").asDouble();
      assertTrue(x >= 0 && x <= 24 && y >= 0 && y <= 16, point.toString());
      assertEquals(Math.hypot(x - 2, y - 7.5), point.at("/fromA").asDouble(), 0.01);
      assertEquals(Math.hypot(x - 11, y - 7.5), point.at("/fromB").asDouble(), 0.01);
    }
  }

  private static void checkCsv(String csv, JsonNode sheet) {
    assertTrue(csv.contains("Overhead lines"), csv);
    int overhead = csv.indexOf("\nOverhead lines\n");
    int wire = csv.indexOf("\nWire\n");
    assertTrue(overhead > 0 && overhead < wire, "overhead lines come before the wire");
    for (JsonNode piece : sheet.at("/wires")) {
      String line =
          csv.lines()
              .filter(l -> l.startsWith(piece.at("/mark").asText() + ","))
              .findFirst()
              .orElse("");
      assertTrue(line.endsWith(String.format(",%.2f", piece.at("/cut").asDouble())), line);
    }
    for (JsonNode hold : sheet.at("/attachments")) {
      assertTrue(csv.contains(hold.at("/name").asText()), hold.toString());
    }
    assertFalse(NO_FIGURE.matcher(csv).find(), csv);
  }

  private static void checkPdf(byte[] pdf, JsonNode sheet) throws IOException {
    assertEquals("%PDF", new String(pdf, 0, 4, StandardCharsets.US_ASCII));
    try (PDDocument document = Loader.loadPDF(pdf)) {
      String words = new PDFTextStripper().getText(document);
      assertTrue(document.getNumberOfPages() >= 2, "list and drawing");
      assertTrue(words.contains("Overhead lines first"), words);
      assertTrue(words.contains("≤") && words.contains("°"), words);
      assertTrue(words.indexOf("Overhead lines first") < words.indexOf("Wire"), words);
      for (JsonNode piece : sheet.at("/wires")) {
        assertTrue(words.contains(String.format("%.2f", piece.at("/cut").asDouble())), words);
      }
      assertFalse(NO_FIGURE.matcher(words).find(), words);
    }
  }

  private byte[] take(String type) throws IOException {
    Download download =
        page.waitForDownload(() -> page.locator("[data-key=get-" + type + "]").click());
    Path file = data.resolve("taken." + type);
    download.saveAs(file);
    assertTrue(download.suggestedFilename().endsWith("." + type), download.suggestedFilename());
    return Files.readAllBytes(file);
  }

  private static List<Double> numbers(JsonNode point) {
    List<Double> values = new java.util.ArrayList<>();
    point.forEach(value -> values.add(value.asDouble()));
    return values;
  }

  /** Drawn, though perhaps out of sight. */
  private static Locator.WaitForOptions attached() {
    return new Locator.WaitForOptions().setState(WaitForSelectorState.ATTACHED);
  }
}
