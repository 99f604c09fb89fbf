package spanwright.sheet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Polygon;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.OverheadLine;
import spanwright.plan.Place;
import spanwright.plan.Plan;

/** The sheet as it prints: what it says, on what paper, in what order, at what scale. */
class PrintedSheetTest {
  private static String text(SheetModel model) throws IOException {
    try (PDDocument document = Loader.loadPDF(Sheets.toPdf(model))) {
      return new PDFTextStripper().getText(document);
    }
  }

  private static final byte[] METRIC = Sheets.toPdf(metric());

  private static String metricText() throws IOException {
    try (PDDocument document = Loader.loadPDF(METRIC)) {
      return new PDFTextStripper().getText(document);
    }
  }

  private static SheetModel metric() {
    return Fixture.model(SheetOptions.Paper.A4, SheetOptions.Units.METRES);
  }

  private static SheetModel with(Plan plan, Placement placement) {
    return Sheets.of(plan, Fixture.catalogue(), placement, SheetOptions.standard());
  }

  @Test
  void signs_print_and_their_font_is_embedded() throws IOException {
    String text = metricText();
    for (String sign : List.of("Ω", "≤", "°", "−", "–", "×", "·")) {
      assertTrue(text.contains(sign), sign);
    }
    assertFalse(text.contains("#"));
    assertFalse(text.contains(String.valueOf(Letters.MISSING)));
    try (PDDocument document = Loader.loadPDF(METRIC)) {
      for (PDPage page : document.getPages()) {
        for (COSName name : page.getResources().getFontNames()) {
          PDFont font = page.getResources().getFont(name);
          assertTrue(font.isEmbedded(), font.getName());
          assertTrue(font.getName().endsWith("LiberationSans"), font.getName());
        }
      }
    }
  }

  @Test
  void pages_have_the_size_of_the_paper() throws IOException {
    for (SheetOptions.Paper paper : SheetOptions.Paper.values()) {
      try (PDDocument document =
          Loader.loadPDF(Sheets.toPdf(Fixture.model(paper, SheetOptions.Units.METRES)))) {
        for (PDPage page : document.getPages()) {
          assertEquals(paper.width(), page.getMediaBox().getWidth() / 72 * 25.4, 0.01);
          assertEquals(paper.height(), page.getMediaBox().getHeight() / 72 * 25.4, 0.01);
        }
      }
    }
  }

  @Test
  void overhead_lines_come_first_with_their_states_in_words() throws IOException {
    String text = metricText();
    int box = text.indexOf("Overhead lines first");
    assertTrue(box > 0 && box < text.indexOf("Piece"));
    assertTrue(text.contains("Treat every line as live"));
    assertTrue(text.contains("10.19 of 10.05"));
    assertTrue(text.contains("tight"));
    assertTrue(text.contains("not required"));
    assertTrue(text.contains("not checked"));
    assertTrue(text.contains("RF exposure not computed") || text.contains("exposure not computed"));
  }

  @Test
  void no_overhead_line_on_the_plan_is_no_all_clear() throws IOException {
    Plan bare = Fixture.plan("Bare", Fixture.plan().site(), Fixture.plan().datums(), List.of());
    String text = text(with(bare, Fixture.placement()));
    assertTrue(text.contains("look again on site"));
  }

  @Test
  void a_line_without_any_distance_is_never_shown_as_clear() throws IOException {
    SheetModel model =
        with(
            Fixture.plan(), Placements.withClearances(Fixture.placement(), List.of(), State.CLEAR));
    assertTrue(text(model).contains("not computed"));
    assertEquals(State.FOUL, OverheadList.state(model.overhead().lines().get(0)));
  }

  @Test
  void a_foul_placement_says_at_its_head_that_it_must_not_be_rigged() throws IOException {
    List<Clearance> foul = new ArrayList<>(Fixture.clearances());
    foul.add(
        new Clearance(
            "overhead-low-voltage",
            "drop",
            "wire",
            new Place(15, 12, 7),
            new Place(17, 10, 5),
            2.2,
            3.05,
            State.FOUL));
    SheetModel model =
        with(Fixture.plan(), Placements.withClearances(Fixture.placement(), foul, State.FOUL));
    assertTrue(text(model).contains("Do not rig it"));
    assertEquals(2.2, model.overhead().lines().get(0).nearest().distance());
  }

  @Test
  void a_smaller_distance_names_who_allowed_it_and_when() throws IOException {
    OverheadLine allowed =
        new OverheadLine(
            "drop",
            "Service drop",
            Fixture.lines().get(0).path(),
            OverheadLine.Kind.LOW_VOLTAGE,
            1.5,
            "the network's surveyor",
            "2026-05-01");
    Plan plan =
        Fixture.plan("Plot", Fixture.plan().site(), Fixture.plan().datums(), List.of(allowed));
    assertTrue(
        text(with(plan, Fixture.placement())).contains("the network's surveyor, 2026-05-01"));
  }

  @Test
  void nothing_on_the_list_runs_over_the_margin_or_into_its_neighbour() {
    for (SheetOptions.Paper paper : SheetOptions.Paper.values()) {
      for (SheetOptions.Units units : SheetOptions.Units.values()) {
        for (Pen page : ListPages.of(Fixture.model(paper, units))) {
          List<Polygon> boxes = new ArrayList<>();
          for (Ink ink : page.inks()) {
            if (ink instanceof Ink.Lettering l) {
              double width = Letters.width(l);
              double left =
                  switch (l.anchor()) {
                    case START -> l.x();
                    case MIDDLE -> l.x() - width / 2;
                    case END -> l.x() - width;
                  };
              assertTrue(left >= ListPages.MARGIN - 0.01, l.text());
              assertTrue(left + width <= paper.width() - ListPages.MARGIN + 0.01, l.text());
              double tall = l.points() * Letters.POINT * 0.7;
              boxes.add(Labels.box(left + width / 2, l.y() - tall / 2, width, tall, 0));
            }
          }
          for (int i = 0; i < boxes.size(); i++) {
            for (int k = i + 1; k < boxes.size(); k++) {
              assertFalse(boxes.get(i).intersects(boxes.get(k)), boxes.get(i) + " " + page);
            }
          }
        }
      }
    }
  }

  @Test
  void feet_and_inches_stand_on_every_page_that_lengths_do() throws IOException {
    String text = text(Fixture.model(SheetOptions.Paper.LETTER, SheetOptions.Units.FEET));
    assertTrue(text.contains("Feet and inches."));
    // 18.1108 m from A to the ash: 59′ 5″
    assertTrue(text.contains("59′ 5″"));
    assertFalse(text.contains("16.94"));
  }

  @Test
  void names_in_any_writing_never_break_the_print() throws IOException {
    Plan plan =
        Fixture.plan(
            "Ярд № 5 <i>& \"Ω\"</i> 庭 🌳 \u200b\u0301 ".repeat(4) + "x".repeat(300),
            Fixture.plan().site(),
            Fixture.plan().datums(),
            Fixture.lines());
    String text = text(with(plan, Fixture.placement()));
    assertTrue(text.contains("Ярд"));
    assertTrue(text.contains("□"));
  }

  @Test
  void a_long_list_flows_to_more_pages_and_every_row_is_there() throws IOException {
    List<OverheadLine> many = new ArrayList<>();
    for (int i = 0; i < 70; i++) {
      many.add(
          new OverheadLine(
              "line" + i,
              "Line number " + i,
              List.of(new Place(100 + i, 0, 6), new Place(100 + i, 40, 6)),
              OverheadLine.Kind.UNKNOWN,
              null,
              null,
              null));
    }
    Plan plan = Fixture.plan("Many", Fixture.plan().site(), Fixture.plan().datums(), many);
    String text = text(with(plan, Fixture.placement()));
    for (int i = 0; i < 70; i++) {
      assertTrue(text.contains("Line number " + i), "line " + i);
    }
  }

  @Test
  void the_scale_bar_is_true_to_the_plan() {
    // drawn from the same figures: 10 m at 1 : 250 is 40 mm
    assertEquals(10, TitleBlock.barLength(250, 1));
    assertEquals(2, TitleBlock.barLength(50, 1));
    for (int scale : DrawingPage.SCALES) {
      double mm = TitleBlock.barLength(scale, 1) * 1000 / scale;
      assertTrue(mm <= 52 && (mm >= 20 || scale < 50), scale + ": " + mm);
    }
    SheetModel model = metric();
    DrawingPage page = new DrawingPage(model);
    int scale = page.scale();
    double expected = TitleBlock.barLength(scale, 1) * 1000 / scale;
    double left = Double.POSITIVE_INFINITY;
    double right = Double.NEGATIVE_INFINITY;
    for (Ink ink : page.draw(1, 1).inks()) {
      // the bar is the only row of filled boxes 1.5 mm tall
      if (ink instanceof Ink.Shape s && s.strokes().size() == 1 && s.strokes().get(0).closed()) {
        double[] y = s.strokes().get(0).path().stream().mapToDouble(Ink.Step::y).toArray();
        if (y.length == 4 && Math.abs(y[2] - y[0] - 1.5) < 1e-9 && s.width() == 0.2) {
          for (Ink.Step step : s.strokes().get(0).path()) {
            left = Math.min(left, step.x());
            right = Math.max(right, step.x());
          }
        }
      }
    }
    assertEquals(expected, right - left, 0.01);
  }

  @Test
  void the_boundary_is_drawn_to_the_scale_in_the_title_block() {
    SheetModel model = metric();
    DrawingPage page = new DrawingPage(model);
    int scale = page.scale();
    assertEquals(200, scale);
    double widest = 0;
    for (Ink ink : page.draw(1, 1).inks()) {
      if (ink instanceof Ink.Window w) {
        for (Ink inside : w.inside()) {
          if (inside instanceof Ink.Shape s && s.dash().size() == 4) {
            double[] x = s.strokes().get(0).path().stream().mapToDouble(Ink.Step::x).toArray();
            widest = Math.max(widest, x[1] - x[0]);
          }
        }
      }
    }
    // 24 m at 1 : 200
    assertEquals(120, widest, 1e-6);
  }

  @Test
  void no_two_labels_of_the_drawing_overlap() {
    for (SheetOptions.Paper paper : SheetOptions.Paper.values()) {
      for (SheetOptions.Units units : SheetOptions.Units.values()) {
        DrawingPage page = new DrawingPage(Fixture.model(paper, units));
        page.draw(1, 1);
        SidePages sides = new SidePages(Fixture.model(paper, units));
        sides.draw(2, 2);
        assertTrue(page.lettering().size() > 25);
        assertTrue(sides.lettering().get(0).size() > 5);
        List<List<Polygon>> pages = new ArrayList<>(sides.lettering());
        pages.add(page.lettering());
        for (List<Polygon> boxes : pages) {
          for (int i = 0; i < boxes.size(); i++) {
            for (int k = i + 1; k < boxes.size(); k++) {
              assertFalse(boxes.get(i).intersects(boxes.get(k)), i + " and " + k);
            }
          }
        }
      }
    }
  }

  @Test
  void every_point_number_finds_room() {
    SheetModel model = metric();
    assertEquals(7, squares(new DrawingPage(model).draw(1, 2)));
    // along the side views, the ends of each of two rows
    assertEquals(4, squares(new SidePages(model).draw(2, 2).get(0)));
  }

  private static long squares(Pen page) {
    long squares = 0;
    for (Ink ink : page.inks()) {
      if (ink instanceof Ink.Window w) {
        squares +=
            w.inside().stream().filter(i -> i instanceof Ink.Lettering l && l.shade() == 0).count();
      }
    }
    return squares;
  }

  @Test
  void a_placement_of_another_plan_is_refused_in_a_sentence() {
    Placement stranger =
        Placements.withAttachments(
            Fixture.placement(),
            List.of(
                Fixture.placement().attachments().get(0),
                new Placement.Attachment(
                    "nowhere", Fixture.POLE, 8.5, 1, 1, null, State.CLEAR, "tied", null)));
    IllegalArgumentException refused =
        org.junit.jupiter.api.Assertions.assertThrows(
            IllegalArgumentException.class, () -> with(Fixture.plan(), stranger));
    assertTrue(refused.getMessage().contains("\"nowhere\""));
  }
}
