package spanwright.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

/**
 * Writes the pages on catalogues and rules, and fails when a committed page differs from what it
 * wrote.
 */
class CataloguePagesTest {
  private static final Path DOCS = Path.of("..", "docs", "reference");
  private final Catalogue catalogue = Catalogues.standard();

  @Test
  void the_page_on_catalogues_is_what_the_catalogues_hold() throws IOException {
    holds("catalogue.md", cataloguePage());
  }

  @Test
  void the_page_on_rules_is_what_the_rules_hold() throws IOException {
    holds("rules.md", rulesPage());
  }

  private static void holds(String name, String page) throws IOException {
    Path written = Path.of("target", name);
    Files.createDirectories(written.getParent());
    Files.writeString(written, page);
    Path committed = DOCS.resolve(name);
    String kept =
        Files.exists(committed)
            ? Files.readString(committed, StandardCharsets.UTF_8).replace("\r\n", "\n")
            : "";
    assertEquals(kept, page, name + " is stale: copy backend/target/" + name + " over it");
  }

  private String cataloguePage() {
    StringBuilder page = new StringBuilder();
    page.append(
        """
        # Catalogue

        Written by a test from `shared/catalogue`; do not edit. What a brief can name by its id: generic kinds by material and size,
        no makers' names. A star marks the default, taken when the brief names none. Each value's source stands under its table.

        """);
    table(
        page,
        "Wires",
        List.of("id", "kind", "radius mm", "S/m at HF", "sleeve", "g/m", "breaks at N", "EA kN"),
        catalogue.wires(),
        w ->
            List.of(
                id(w.id(), w.isDefault()),
                w.name(),
                n(w.radius() * 1000),
                n(w.conductivity()),
                w.insulation() == null
                    ? "bare"
                    : "to "
                        + n(w.insulation().radius() * 1000)
                        + " mm, εr "
                        + n(w.insulation().permittivity()),
                n(w.weight() * 1000),
                n(w.breaking()),
                n(w.stiffness() / 1000)),
        WireKind::sources,
        WireKind::id);
    table(
        page,
        "Feed lines",
        List.of("id", "kind", "ohm", "velocity", "k1", "k2", "balanced", "g/m", "mm", "peak V"),
        catalogue.lines(),
        l ->
            List.of(
                id(l.id(), l.isDefault()),
                l.name(),
                n(l.impedance()),
                n(l.velocityFactor()),
                n(l.conductorLoss()),
                n(l.dielectricLoss()),
                l.balanced() ? "yes" : "no",
                n(l.weight() * 1000),
                n(l.diameter() * 1000),
                l.peakVolts() == 0 ? "not known" : n(l.peakVolts())),
        LineKind::sources,
        LineKind::id);
    page.append("Loss in dB per 100 m at f MHz: k1·√f + k2·f.\n\n");
    table(
        page,
        "Ropes",
        List.of("id", "kind", "mm", "g/m", "breaks at N", "EA kN", "share that may be used"),
        catalogue.ropes(),
        r ->
            List.of(
                id(r.id(), r.isDefault()),
                r.name(),
                n(r.diameter() * 1000),
                n(r.weight() * 1000),
                n(r.breaking()),
                n(r.stiffness() / 1000),
                n(r.workingShare())),
        RopeKind::sources,
        RopeKind::id);
    table(
        page,
        "Matching units",
        List.of("id", "kind", "network", "µH", "pF", "coil Q", "capacitor Q", "peak V"),
        catalogue.matchingUnits(),
        m ->
            List.of(
                id(m.id(), m.isDefault()),
                m.name(),
                Json.mapper().valueToTree(m.unit().network()).asText(),
                span(m.unit().inductance(), 1e6),
                span(m.unit().capacitance(), 1e12),
                n(m.unit().coilQ()),
                n(m.unit().capacitorQ()),
                n(m.unit().peakVolts())),
        MatchingKind::sources,
        MatchingKind::id);
    table(
        page,
        "Soils",
        List.of("id", "kind", "permittivity", "conductivity S/m"),
        catalogue.soils(),
        s -> List.of(id(s.id(), s.isDefault()), s.name(), n(s.permittivity()), n(s.conductivity())),
        SoilKind::sources,
        SoilKind::id);
    table(
        page,
        "Bands",
        List.of("id", "band", "region 1 MHz", "region 2 MHz", "region 3 MHz"),
        catalogue.bands(),
        b ->
            List.of(
                id(b.id(), false),
                b.name(),
                span(b.regions().get("1"), 1),
                span(b.regions().get("2"), 1),
                span(b.regions().get("3"), 1)),
        BandKind::sources,
        BandKind::id);
    limits(page);
    return page.toString().strip() + "\n";
  }

  private void limits(StringBuilder page) {
    table(
        page,
        "Exposure limits",
        List.of("id", "limits", "averaged over min", "MHz: E in V/m; H in A/m, rms"),
        catalogue.limits(),
        l ->
            List.of(
                id(l.id(), l.isDefault()),
                l.name(),
                n(l.averagingMinutes()),
                String.join("<br>", l.rows().stream().map(CataloguePagesTest::row).toList())),
        LimitSet::sources,
        LimitSet::id);
  }

  private static String row(LimitSet.Row row) {
    return n(row.fromMHz())
        + " to "
        + n(row.toMHz())
        + ": "
        + power(row.electric(), row.electricPower())
        + "; "
        + power(row.magnetic(), row.magneticPower());
  }

  private static String power(double coefficient, double power) {
    return power == 0 ? n(coefficient) : n(coefficient) + "·f^" + n(power);
  }

  private String rulesPage() {
    StringBuilder page = new StringBuilder();
    page.append(
        """
        # Rules

        Written by a test from `shared/catalogue/rules.json`; do not edit. Every distance is a default. **The owner of a line, the
        local code and licensed practice decide**; where they ask for more, more is right.

        A brief may set another value under `rules.overrides`, within the range given, and only for rules that have one. The
        distances from overhead lines may be raised there, never lowered; one line's own `clearance` may be smaller only when
        its owner has authorised it in writing (`authorisedBy`, `authorisedOn`).

        | rule | what it keeps | default | may be set to | source |
        | --- | --- | --- | --- | --- |
        """);
    for (RuleKind rule : catalogue.rules()) {
      String unit = rule.unit().isEmpty() ? "" : " " + rule.unit();
      String range =
          rule.mayChange() ? n(rule.least()) + " to " + n(rule.most()) + unit : "nothing else";
      page.append(
          line(
              List.of(
                  "`" + rule.id() + "`",
                  rule.name(),
                  n(rule.defaultValue()) + unit,
                  range,
                  rule.source())));
    }
    return page.toString();
  }

  private static <K> void table(
      StringBuilder page,
      String heading,
      List<String> columns,
      List<K> kinds,
      Function<K, List<String>> cells,
      Function<K, Map<String, String>> sources,
      Function<K, String> idOf) {
    page.append("## ").append(heading).append("\n\n").append(line(columns));
    page.append(line(columns.stream().map(c -> "---").toList()));
    kinds.forEach(kind -> page.append(line(cells.apply(kind))));
    page.append("\nSources\n\n");
    for (K kind : kinds) {
      page.append("- `").append(idOf.apply(kind)).append("`: ");
      page.append(
          String.join(
              "; ",
              new java.util.TreeMap<>(sources.apply(kind))
                  .entrySet().stream().map(s -> s.getKey() + ": " + s.getValue()).toList()));
      page.append("\n");
    }
    page.append("\n");
  }

  private static String line(List<String> cells) {
    return "| " + String.join(" | ", cells) + " |\n";
  }

  private static String id(String id, boolean isDefault) {
    return "`" + id + "`" + (isDefault ? " ★" : "");
  }

  private static String span(List<Double> ends, double times) {
    return n(ends.get(0) * times) + " to " + n(ends.get(1) * times);
  }

  private static String n(double value) {
    return Wording.number(value);
  }
}
