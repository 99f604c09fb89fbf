package spanwright.sheet;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import javax.xml.parsers.DocumentBuilderFactory;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;
import spanwright.plan.Json;
import spanwright.plan.Plan;
import spanwright.plan.Site;
import spanwright.plan.Soil;

/** CSV, JSON, SVG and GeoJSON, read back by other means than those that wrote them. */
class SheetFormatsTest {
  private static final String NASTY = "=SUM(\"A1\"), <b>Ash & Co</b>\u2028";

  private final SheetModel model = Fixture.model(SheetOptions.Paper.A4, SheetOptions.Units.METRES);

  private static SheetModel named(String title) {
    Plan plan =
        Fixture.plan(title, Fixture.plan().site(), Fixture.plan().datums(), Fixture.lines());
    return Sheets.of(plan, Fixture.catalogue(), Fixture.placement(), SheetOptions.standard());
  }

  /** A reader of RFC 4180, so that the writer is not its own judge. */
  private static List<List<String>> parse(String csv) {
    List<List<String>> rows = new ArrayList<>();
    List<String> row = new ArrayList<>();
    StringBuilder field = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < csv.length(); i++) {
      char c = csv.charAt(i);
      if (quoted) {
        if (c == '"' && i + 1 < csv.length() && csv.charAt(i + 1) == '"') {
          field.append('"');
          i++;
        } else if (c == '"') {
          quoted = false;
        } else {
          field.append(c);
        }
      } else if (c == '"' && field.isEmpty()) {
        quoted = true;
      } else if (c == ',') {
        row.add(field.toString());
        field.setLength(0);
      } else if (c == '\r' && csv.charAt(i + 1) == '\n') {
        row.add(field.toString());
        field.setLength(0);
        rows.add(List.copyOf(row));
        row.clear();
        i++;
      } else {
        assertTrue(c != '"' && c != '\n' && c != '\r', "a bare " + (int) c + " in the CSV");
        field.append(c);
      }
    }
    assertTrue(row.isEmpty() && field.isEmpty() && !quoted, "the CSV ends in the middle");
    return rows;
  }

  @Test
  void the_csv_holds_sections_with_as_many_fields_as_headings() {
    List<List<String>> rows = parse(Sheets.toCsv(model));
    int at = rows.indexOf(List.of("Wire"));
    assertEquals("Cut (m)", rows.get(at + 1).get(6));
    assertEquals(List.of("W1", "16.94"), List.of(rows.get(at + 2).get(0), rows.get(at + 2).get(6)));
    int setOut = rows.indexOf(List.of("Set-out"));
    for (int i = 2; i < 2 + model.setOut().points().size(); i++) {
      assertEquals(rows.get(setOut + 1).size(), rows.get(setOut + i).size());
    }
    assertEquals("18.11", rows.get(setOut + 2).get(2));
    int overhead = rows.indexOf(List.of("Overhead lines"));
    assertTrue(overhead < at, "overhead lines come before the wire");
    assertEquals("10.19", rows.get(overhead + 2).get(10));
    assertEquals("tight", rows.get(overhead + 2).get(12));
  }

  @Test
  void a_cell_that_a_spreadsheet_would_reckon_is_made_harmless() {
    for (String evil : List.of("=1+1", "+1+1", "-1+1", "@SUM(A1)", "\t=1", "\r=1")) {
      String read = parse(CsvText.field(evil) + "\r\n").get(0).get(0);
      assertEquals("'" + evil, read);
    }
    assertEquals("-3.25", CsvText.field("-3.25"));
    assertEquals("'-", CsvText.field("-"));
    List<List<String>> rows = parse(Sheets.toCsv(named(NASTY)));
    assertTrue(rows.contains(List.of("Plot", "'" + NASTY)));
  }

  @Test
  void the_json_is_the_model_without_its_sources_and_has_no_gaps() throws Exception {
    JsonNode json = Json.mapper().readTree(Sheets.toJson(model));
    assertEquals("spanwright-sheet/1", json.get("format").asText());
    assertFalse(json.has("source"));
    assertEquals(16.94, json.get("wires").get(0).get("cut").asDouble(), 1e-9);
    assertEquals("A4", json.get("options").get("paper").asText());
    assertEquals("m", json.get("options").get("units").asText());
    assertEquals(
        "tight", json.get("overhead").get("lines").get(0).get("mastFalls").get("state").asText());
    assertFalse(Sheets.toJson(model).contains("NaN"));
    CutParts.Allowance trim = model.allowances().get(1);
    assertEquals("common practice, no source", trim.source());
  }

  private static Document xml(String svg) throws Exception {
    DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
    factory.setNamespaceAware(true);
    return factory.newDocumentBuilder().parse(new InputSource(new StringReader(svg)));
  }

  @Test
  void the_svg_is_in_millimetres_and_uses_nothing_a_strict_policy_forbids() throws Exception {
    Document document = xml(Sheets.toSvg(named(NASTY)));
    Element root = document.getDocumentElement();
    assertEquals("210mm", root.getAttribute("width"));
    assertEquals("594mm", root.getAttribute("height"));
    assertEquals("0 0 210 594", root.getAttribute("viewBox"));
    Set<String> allowed = Set.of("svg", "title", "desc", "rect", "path", "text", "g", "clipPath");
    NodeList all = document.getElementsByTagName("*");
    Set<String> ids = new HashSet<>();
    for (int i = 0; i < all.getLength(); i++) {
      Element e = (Element) all.item(i);
      assertTrue(allowed.contains(e.getTagName()), e.getTagName());
      for (int k = 0; k < e.getAttributes().getLength(); k++) {
        String name = e.getAttributes().item(k).getNodeName();
        String value = e.getAttributes().item(k).getNodeValue();
        assertFalse(name.equals("style") || name.startsWith("on") || name.contains("href"), name);
        assertFalse(value.contains("NaN") || value.contains("Infinity"), value);
        assertTrue(!name.equals("id") || ids.add(value), "two things share the id " + value);
      }
    }
    assertTrue(root.getElementsByTagName("title").item(0).getTextContent().contains("<b>Ash & Co"));
  }

  @Test
  void letter_paper_is_letter_sized_in_svg() throws Exception {
    SheetModel letter = Fixture.model(SheetOptions.Paper.LETTER, SheetOptions.Units.FEET);
    Element root = xml(Sheets.toSvg(letter)).getDocumentElement();
    assertEquals("215.9mm", root.getAttribute("width"));
    assertEquals("558.8mm", root.getAttribute("height"));
  }

  @Test
  void the_csv_says_all_that_the_model_says() {
    String csv = Sheets.toCsv(model);
    for (String part :
        List.of(
            "Issued,",
            "Place,",
            "Stand-offs",
            "Margins",
            "People",
            "Measure and write down",
            "Look again",
            "What the consents buy")) {
      assertTrue(csv.contains("\r\n" + part), part);
    }
    model.people().forEach(p -> assertTrue(csv.contains(CsvText.field(p)), p));
    model
        .measures()
        .forEach(m -> assertTrue(csv.contains(m.when() + "," + CsvText.field(m.what())), m.what()));
    model.inspections().forEach(i -> assertTrue(csv.contains(CsvText.field(i.what())), i.what()));
    List<Double> at = model.feedLine().standOffsAt();
    for (int i = 0; i < at.size(); i++) {
      String row = "\r\n" + (i + 1) + "," + CsvText.plain(at.get(i), 2) + "\r\n";
      assertTrue(csv.contains(row), row);
    }
  }

  @Test
  void geojson_lies_where_the_plan_says_by_the_geodesic() throws Exception {
    JsonNode root = Json.mapper().readTree(Sheets.toGeoJson(model));
    assertEquals("FeatureCollection", root.get("type").asText());
    JsonNode ash = feature(root, "support", "ash").get("geometry").get("coordinates");
    GeodesicData found =
        Geodesic.WGS84.Inverse(52.0, -1.5, ash.get(1).asDouble(), ash.get(0).asDouble());
    // (6, 26): √712 = 26.6833 m at atan2(6, 26) = 12.995° on the plan, + 10°
    assertEquals(26.6833, found.s12, 0.002);
    assertEquals(22.995, found.azi1, 0.005);
    // by hand: 1° of latitude at 52° is 111 267 m: 26.6833 cos 22.995° = 24.563 m north
    assertEquals(52.0 + 24.563 / 111_267, ash.get(1).asDouble(), 2e-8);
  }

  @Test
  void geojson_rings_close_and_turn_anticlockwise() throws Exception {
    JsonNode root = Json.mapper().readTree(Sheets.toGeoJson(model));
    int rings = 0;
    for (JsonNode f : root.get("features")) {
      assertEquals("Feature", f.get("type").asText());
      assertNotNull(f.get("properties").get("kind"));
      if (f.get("geometry").get("type").asText().equals("Polygon")) {
        JsonNode ring = f.get("geometry").get("coordinates").get(0);
        assertEquals(ring.get(0), ring.get(ring.size() - 1));
        double twice = 0;
        for (int i = 1; i < ring.size(); i++) {
          twice +=
              (ring.get(i - 1).get(0).asDouble() + 1.5) * (ring.get(i).get(1).asDouble() - 52)
                  - (ring.get(i).get(0).asDouble() + 1.5)
                      * (ring.get(i - 1).get(1).asDouble() - 52);
        }
        assertTrue(twice > 0);
        rings++;
      }
    }
    assertEquals(4, rings);
    assertEquals(7, count(root, "point"));
    assertEquals(1, count(root, "wire"));
  }

  private static int count(JsonNode root, String kind) {
    int count = 0;
    for (JsonNode f : root.get("features")) {
      count += f.get("properties").get("kind").asText().equals(kind) ? 1 : 0;
    }
    return count;
  }

  private static JsonNode feature(JsonNode root, String kind, String id) {
    for (JsonNode f : root.get("features")) {
      JsonNode p = f.get("properties");
      if (p.get("kind").asText().equals(kind) && p.path("id").asText().equals(id)) {
        return f;
      }
    }
    throw new AssertionError("no " + kind + " " + id);
  }

  @Test
  void a_plot_across_the_date_line_keeps_its_longitudes_in_range() throws Exception {
    Plan plan =
        Fixture.plan(
            "Far side",
            new Site(-17.0, 179.99995, 0, 0, new Soil(13, 0.005), null),
            Fixture.plan().datums(),
            List.of());
    SheetModel far =
        Sheets.of(plan, Fixture.catalogue(), Fixture.placement(), SheetOptions.standard());
    JsonNode root = Json.mapper().readTree(Sheets.toGeoJson(far));
    double east =
        feature(root, "tree", "birch").get("geometry").get("coordinates").get(0).asDouble();
    double ash =
        feature(root, "support", "ash").get("geometry").get("coordinates").get(0).asDouble();
    assertTrue(east < 180 && east > 179.9);
    assertTrue(ash >= -180 && ash < -179.9, "" + ash);
  }

  @Test
  void without_coordinates_geojson_is_refused_in_a_sentence() {
    Plan plan =
        Fixture.plan(
            "Nowhere",
            new Site(null, null, 0, 0, new Soil(13, 0.005), null),
            Fixture.plan().datums(),
            List.of());
    SheetModel lost =
        Sheets.of(plan, Fixture.catalogue(), Fixture.placement(), SheetOptions.standard());
    NoCoordinatesException refused =
        assertThrows(NoCoordinatesException.class, () -> Sheets.toGeoJson(lost));
    assertTrue(refused.getMessage().contains("latitude and longitude"));
  }

  @Test
  void the_same_input_gives_the_same_bytes() {
    SheetModel again = Fixture.model(SheetOptions.Paper.A4, SheetOptions.Units.METRES);
    assertArrayEquals(Sheets.toPdf(model), Sheets.toPdf(again));
    assertEquals(Sheets.toSvg(model), Sheets.toSvg(again));
    assertEquals(Sheets.toCsv(model), Sheets.toCsv(again));
    assertEquals(Sheets.toJson(model), Sheets.toJson(again));
    assertEquals(Sheets.toGeoJson(model), Sheets.toGeoJson(again));
  }

  @Test
  void unknown_paper_and_units_are_refused_in_a_sentence() {
    assertThrows(IllegalArgumentException.class, () -> SheetOptions.of("A5", null, null));
    assertThrows(IllegalArgumentException.class, () -> SheetOptions.of(null, "yards", null));
    assertEquals(SheetOptions.Paper.LETTER, SheetOptions.of("letter", "ft", null).paper());
  }
}
