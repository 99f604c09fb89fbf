package spanwright.e2e;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.microsoft.playwright.Download;
import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.ColorScheme;
import com.microsoft.playwright.options.WaitForSelectorState;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** Nothing that was drawn is lost: by a reload, a stopped server, a second window, a slip. */
class KeepsWorkIT extends BrowserTest {

  /** The tests stop the server and let two windows meet: the browser notes both as errors. */
  @Override
  boolean expected(String complaint) {
    return complaint.contains("ERR_CONNECTION")
        || complaint.contains("ERR_INCOMPLETE_CHUNKED_ENCODING")
        || complaint.contains("status of 412");
  }

  @Test
  void a_reload_finds_the_plan_also_before_it_was_saved() throws IOException {
    open(1200, 800, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    drawLittle(hand);
    JsonNode drawn = kept();
    page.reload();
    hand.opened();
    assertEquals("4 corners", ledger("Boundary"));
    assertEquals("1, tallest 8.0 m", ledger("Supports"));
    assertEquals(drawn, kept());

    hand.place("supports", 6, 2);
    page.reload();
    hand.opened();
    assertEquals("2, tallest 8.0 m", ledger("Supports"));
    assertEquals(2, kept().at("/supports").size());
  }

  @Test
  void a_reload_finds_the_placements_again_while_the_server_holds_them() throws IOException {
    open(1200, 800, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    hand.opened();
    hand.search();
    String before = page.locator(".search-ended").innerText();
    page.reload();
    hand.opened();
    hand.go("placements");
    page.locator(".search-ended").waitFor();
    assertEquals(before, page.locator(".search-ended").innerText());
  }

  @Test
  void a_server_that_stops_and_comes_back_loses_nothing() throws IOException {
    open(1200, 800, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    drawLittle(hand);
    JsonNode before = kept();
    int port = program.port();
    program.close();
    hand.place("supports", 6, 2);
    page.locator(".saved[data-state=offline]").waitFor();
    String said = page.locator(".saved-text").innerText();
    assertTrue(said.matches("Not saved since \\d\\d:\\d\\d; still yours here"), said);

    program = Program.start(data, port);
    assertEquals(before, Served.newestPlan(page, program), "what was saved is there as it was");
    JsonNode after = kept();
    assertEquals(2, after.at("/supports").size());
    assertEquals(before.at("/boundary"), after.at("/boundary"));
    page.reload();
    hand.opened();
    assertEquals("2, tallest 8.0 m", ledger("Supports"));
  }

  @Test
  void two_windows_on_one_plot_keep_both() throws IOException {
    open(1200, 800, ColorScheme.LIGHT);
    Surveyor one = new Surveyor(page);
    drawLittle(one);
    kept();
    Page window = context.newPage();
    window.navigate(program.address() + "/");
    Surveyor two = new Surveyor(window);
    two.place("supports", 6, 2);
    window.locator(".saved[data-state=saved]").waitFor();

    one.place("datums", 4, 4);
    page.locator(".notice").filter(having("Another window saved this plot")).waitFor();
    assertEquals("Kept as a copy", page.locator(".saved-text").innerText());
    assertTrue(page.locator(".plot-name").innerText().contains("copy"));
    JsonNode plans = Served.get(page, program, "/api/plans");
    JsonNode theirs = titled(plans, "New plot");
    JsonNode mine = titled(plans, page.locator(".plot-name").innerText());
    assertEquals(2, theirs.at("/supports").size(), "the other window's support is kept");
    assertEquals(0, theirs.at("/datums").size());
    assertEquals(1, mine.at("/supports").size());
    assertEquals(1, mine.at("/datums").size(), "this window's datum is kept");
    window.close();
  }

  @Test
  void every_step_can_be_undone_and_done_again() throws IOException {
    open(1200, 800, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    drawLittle(hand);
    hand.figure("Name", "Pole by the gate");
    hand.figure("Highest fixing", "9");
    JsonNode drawn = kept();
    Locator undo = page.locator("#state button").filter(having("Undo"));
    Locator redo = page.locator("#state button").filter(having("Redo"));
    int steps = 0;
    while (undo.getAttribute("aria-disabled").equals("false")) {
      undo.click();
      steps++;
    }
    assertEquals(4, steps, "drawn, placed, named, raised");
    page.locator(".empty").waitFor();
    JsonNode bare = kept();
    assertNotEquals(drawn, bare);
    assertEquals(0, bare.at("/boundary").size());
    for (int i = 0; i < steps; i++) {
      redo.click();
    }
    assertEquals("true", redo.getAttribute("aria-disabled"));
    assertEquals(drawn, kept());
  }

  @Test
  void a_plan_goes_out_as_a_file_and_comes_back() throws IOException {
    open(1200, 800, ColorScheme.LIGHT);
    Surveyor hand = new Surveyor(page);
    drawLittle(hand);
    JsonNode drawn = kept();
    page.locator(".plot-name").click();
    Locator dialog = page.locator("dialog.plots");
    Download export = page.waitForDownload(() -> dialog.getByText("Export this plot").click());
    assertEquals("new-plot.json", export.suggestedFilename());
    Path file = data.resolve("taken").resolve("new-plot.json");
    export.saveAs(file);
    assertEquals(drawn, Served.json(Files.readString(file)));

    Path broken = data.resolve("taken").resolve("broken.json");
    Files.writeString(broken, "{ \"format\": ", StandardCharsets.UTF_8);
    page.locator("#plot-file").setInputFiles(broken);
    dialog.getByText("broken.json is not a plan").waitFor();

    int plans = Served.get(page, program, "/api/plans").size();
    page.locator("#plot-file").setInputFiles(file);
    page.locator("dialog.plots:not([open])")
        .waitFor(new Locator.WaitForOptions().setState(WaitForSelectorState.ATTACHED));
    assertEquals(drawn, kept());
    assertEquals(plans + 1, Served.get(page, program, "/api/plans").size());
  }

  private static void drawLittle(Surveyor hand) {
    hand.newPlot();
    hand.ring("boundary", 0, 0, "16", "90", "10", "0", "16", "L");
    hand.place("supports", 2, 8);
  }

  private String ledger(String what) {
    Locator row = page.locator(".ledger-table tr").filter(having(what));
    return row.locator("td").first().innerText();
  }

  private JsonNode titled(JsonNode plans, String title) {
    for (JsonNode plan : plans) {
      if (plan.at("/title").asText().equals(title)) {
        return Served.get(page, program, "/api/plans/" + plan.at("/id").asText());
      }
    }
    throw new AssertionError("no plan is called " + title + ": " + plans);
  }

  /** The plan as the server keeps it once the page says that it is saved. */
  private JsonNode kept() {
    page.locator(".saved[data-state=saved]").waitFor();
    return Served.newestPlan(page, program);
  }
}
