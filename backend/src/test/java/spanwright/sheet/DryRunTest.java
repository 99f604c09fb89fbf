package spanwright.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.assess.Placement;
import spanwright.plan.Catalogues;
import spanwright.plan.Json;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;

/**
 * The sheet of a demo plot gone through with paper and tape: every length worked out again here,
 * from the plan and the hanging shape alone, and held against the sheet to the centimetre.
 */
class DryRunTest {
  private static final double CENTIMETRE = 0.0101;

  private static final Plan PLAN = plan();
  private static final Placement PLACEMENT = placement();
  private static final SheetModel SHEET = sheet(List.of());

  private static Plan plan() {
    try {
      Path file = Path.of("..", "shared", "demo", "garden-in-steps.json");
      return PlanReader.read(Files.readString(file)).plan();
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }

  private static Placement placement() {
    try (InputStream in = DryRunTest.class.getResourceAsStream("garden-in-steps-p01.json")) {
      return Json.mapper().readValue(in, Placement.class);
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }

  private static SheetModel sheet(List<Issued> issued) {
    return Sheets.of(
        PLAN, Catalogues.standard(), PLACEMENT, SheetOptions.standard(), List.of(), issued);
  }

  private static double tape(List<Place> run) {
    double sum = 0;
    for (int i = 1; i < run.size(); i++) {
      Place a = run.get(i - 1);
      Place b = run.get(i);
      sum += Math.sqrt(sq(a.x() - b.x()) + sq(a.y() - b.y()) + sq(a.z() - b.z()));
    }
    return sum;
  }

  private static double sq(double v) {
    return v * v;
  }

  @Test
  void every_wire_is_as_long_as_it_hangs_with_its_turns_and_trim() {
    double whole = tape(PLACEMENT.conductors().get(0).points());
    double fraction = PLACEMENT.feed().fraction();
    double[] pieces = {whole * fraction, whole * (1 - fraction)};
    assertEquals(2, SHEET.wires().size());
    for (int i = 0; i < 2; i++) {
      double trim = Math.max(0.20, 0.02 * pieces[i]);
      assertEquals(pieces[i], SHEET.wires().get(i).finished(), CENTIMETRE);
      assertEquals(pieces[i] + 0.30 + trim, SHEET.wires().get(i).cut(), CENTIMETRE);
      assertTrue(SHEET.wires().get(i).cut() > pieces[i] + 0.30 + trim - 0.001);
      assertEquals(
          SHEET.wires().get(i).finished() + 0.30 + SHEET.wires().get(i).trim(),
          SHEET.wires().get(i).cut(),
          CENTIMETRE);
    }
  }

  @Test
  void the_feed_line_and_its_stand_offs_follow_its_run() {
    double run = tape(PLACEMENT.feed().path());
    assertEquals(run, SHEET.feedLine().run(), CENTIMETRE);
    assertEquals(PLACEMENT.feed().lineLength() + 0.20, SHEET.feedLine().cut(), CENTIMETRE);
    assertEquals(SHEET.feedLine().standOffs(), SHEET.feedLine().standOffsAt().size());
    for (int i = 1; i < SHEET.feedLine().standOffsAt().size(); i++) {
      double apart =
          SHEET.feedLine().standOffsAt().get(i) - SHEET.feedLine().standOffsAt().get(i - 1);
      assertTrue(apart > 0.25, "stand-offs " + apart + " m apart");
    }
    assertTrue(SHEET.feedLine().standOffsAt().get(SHEET.feedLine().standOffs() - 1) <= run);
  }

  @Test
  void every_tape_is_the_level_distance_from_its_datum() {
    Place a = SHEET.setOut().a().at();
    Place b = SHEET.setOut().b().at();
    Place c = SHEET.setOut().c().at();
    assertEquals(PLAN.datums().get(0).at().x(), a.x(), 1e-9);
    assertEquals(PLAN.datums().get(1).at().y(), b.y(), 1e-9);
    for (int i = 0; i < SHEET.setOut().points().size(); i++) {
      SetOutParts.Mark m = SHEET.setOut().points().get(i);
      assertEquals(Math.hypot(m.at().x() - a.x(), m.at().y() - a.y()), m.fromA(), 0.005);
      assertEquals(Math.hypot(m.at().x() - b.x(), m.at().y() - b.y()), m.fromB(), 0.005);
      assertEquals(Math.hypot(m.at().x() - c.x(), m.at().y() - c.y()), m.check(), 0.005);
      double base = Math.hypot(a.x() - b.x(), a.y() - b.y());
      double cosine = (sq(m.fromA()) + sq(m.fromB()) - sq(base)) / (2 * m.fromA() * m.fromB());
      assertEquals(Math.toDegrees(Math.acos(cosine)), m.crossing(), 0.1);
      if (i < PLACEMENT.attachments().size()) {
        assertEquals(PLACEMENT.attachments().get(i).at().x(), m.at().x(), 1e-9);
        assertEquals(PLACEMENT.attachments().get(i).at().y(), m.at().y(), 1e-9);
      }
    }
  }

  @Test
  void every_rope_covers_its_run_and_is_not_half_a_metre_longer_than_it_need_be() {
    double runs = 0;
    for (CutParts.Rope rope : SHEET.ropes()) {
      double need = rope.run() + rope.allowance();
      assertTrue(rope.cut() >= need - 1e-6 && rope.cut() < need + 0.5, rope.mark());
      runs += rope.from().startsWith("kept aside") ? 0 : rope.run();
    }
    // a halyard is endless: up one side and down the other
    double plan =
        PLACEMENT.ropes().stream()
            .mapToDouble(r -> (r.what().equals("halyard") ? 2 : 1) * tape(r.points()))
            .sum();
    assertEquals(plan, runs, CENTIMETRE * PLACEMENT.ropes().size());
  }

  @Test
  void the_sag_to_sight_is_the_drop_below_a_string_from_end_to_end() {
    for (int i = 0; i < SHEET.sags().size(); i++) {
      List<Place> run = PLACEMENT.spans().get(i).points();
      Place first = run.get(0);
      Place last = run.get(run.size() - 1);
      double mx = (first.x() + last.x()) / 2;
      double my = (first.y() + last.y()) / 2;
      Place near = first;
      for (Place p : run) {
        if (Math.hypot(p.x() - mx, p.y() - my) < Math.hypot(near.x() - mx, near.y() - my)) {
          near = p;
        }
      }
      double along =
          Math.hypot(near.x() - first.x(), near.y() - first.y())
              / Math.hypot(last.x() - first.x(), last.y() - first.y());
      double drop = first.z() + along * (last.z() - first.z()) - near.z();
      assertEquals(drop, SHEET.sags().get(i).middle(), 0.02);
    }
  }

  @Test
  void a_sheet_that_says_the_same_keeps_its_letter_and_another_gets_the_next() {
    Issued first = Sheets.issue(SHEET, "2026-05-14");
    assertEquals("A", sheet(List.of(first)).head().revision());
    assertEquals("2026-05-14", sheet(List.of(first)).head().date());
    List<Issued.Fact> other =
        first.facts().stream()
            .map(f -> f.what().equals("Survey: House") ? new Issued.Fact(f.what(), "0") : f)
            .toList();
    SheetModel second = sheet(List.of(new Issued("A", "2026-05-01", "p01", other)));
    assertEquals("B", second.head().revision());
    assertEquals(List.of("Survey: House: changed."), second.head().changes());
    assertEquals("AA", Revisions.after("Z"));
  }
}
