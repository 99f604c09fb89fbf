package spanwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.math3.complex.Complex;
import spanwright.assess.FeedParts;
import spanwright.feed.FeedChain;
import spanwright.feed.FeedResult;
import spanwright.feed.Line;
import spanwright.feed.Match;
import spanwright.feed.MatchingNetwork;
import spanwright.plan.Catalogue;
import spanwright.plan.Fault;
import spanwright.plan.LineKind;
import spanwright.plan.MatchingUnit;
import spanwright.web.Form;

/** Reads the case of {@code feed} and writes its answer. */
final class FeedCases {
  private static final double LARGEST_OHM = 1e12;
  private static final double USUAL_POWER = 100;

  private FeedCases() {}

  /**
   * What the file says.
   *
   * @param load at the feedpoint [ohm]
   * @param frequencyMHz MHz
   * @param line the feed line
   * @param length metres
   * @param unit or null
   * @param power watts
   * @param faults when there are any, the rest is not to be used
   */
  record Read(
      Complex load,
      double frequencyMHz,
      Line line,
      double length,
      MatchingNetwork unit,
      double power,
      List<Fault> faults) {
    FeedResult run() {
      return FeedChain.run(load, frequencyMHz, line, length, unit, power);
    }
  }

  static Read read(JsonNode tree, Catalogue catalogue) {
    List<Fault> faults = new ArrayList<>();
    Form form = Form.of(tree, faults);
    double[] load = form.numbers("load", 2, 2, -LARGEST_OHM, LARGEST_OHM, "ohm");
    if (load.length == 2 && load[0] < 0) {
      form.note("load[0]", "the resistance must be 0 ohm or more: a feedpoint takes power.");
    }
    double frequencyMHz = form.number("frequency", 0.1, 300, "MHz");
    Line line = line(form, catalogue);
    double length = form.number("length", 0, 10_000, "m");
    MatchingNetwork unit = form.has("matching") ? unit(form, catalogue) : null;
    double power = form.number("power", 1e-6, 1e5, "W", USUAL_POWER);
    form.finish();
    Complex z = load.length == 2 ? new Complex(load[0], load[1]) : Complex.ZERO;
    return new Read(z, frequencyMHz, line, length, unit, power, faults);
  }

  private static Line line(Form form, Catalogue catalogue) {
    if (form.isText("line")) {
      String id = form.text("line");
      Optional<LineKind> kind =
          catalogue.lines().stream().filter(each -> each.id().equals(id)).findFirst();
      if (kind.isEmpty()) {
        form.note("line", "there is no such line in the catalogue. `catalogue` prints it.");
      }
      return kind.map(FeedParts::line).orElse(null);
    }
    Form given = form.form("line");
    double impedance = given.number("impedance", 1, 5000, "ohm");
    double velocityFactor = given.number("velocityFactor", 0.05, 1, "");
    double loss = given.number("lossDbPer100m", 0, 1000, "dB per 100 m");
    given.finish();
    // A stand-in keeps reading going where the figures are noted as faults already.
    return Line.ofLoss(impedance, velocityFactor, loss);
  }

  private static MatchingNetwork unit(Form form, Catalogue catalogue) {
    if (form.isText("matching")) {
      String id = form.text("matching");
      Optional<MatchingUnit> unit =
          catalogue.matchingUnits().stream()
              .filter(each -> each.id().equals(id))
              .map(each -> each.unit())
              .findFirst();
      if (unit.isEmpty()) {
        form.note(
            "matching", "there is no such matching unit in the catalogue. `catalogue` prints it.");
      }
      return unit.map(FeedParts::network).orElse(null);
    }
    return described(form.form("matching"));
  }

  private static MatchingNetwork described(Form form) {
    MatchingNetwork.Kind kind =
        form.word(
            "network",
            Map.of(
                "L", MatchingNetwork.Kind.L,
                "T", MatchingNetwork.Kind.T,
                "balun", MatchingNetwork.Kind.BALUN),
            null);
    boolean balun = kind == MatchingNetwork.Kind.BALUN;
    double[] inductance = range(form, "inductance", balun, "H");
    double[] capacitance = range(form, "capacitance", balun, "F");
    double coilQ = quality(form, "coilQ", balun);
    double capacitorQ = quality(form, "capacitorQ", balun);
    double peakVolts =
        balun ? form.number("peakVolts", 1, 1e7, "V", 0.0) : form.number("peakVolts", 1, 1e7, "V");
    form.finish();
    return balun || kind == null
        ? MatchingNetwork.balun(peakVolts)
        : new MatchingNetwork(
            kind,
            inductance[0],
            inductance[1],
            capacitance[0],
            capacitance[1],
            coilQ,
            capacitorQ,
            peakVolts);
  }

  private static double quality(Form form, String name, boolean balun) {
    return balun ? form.number(name, 1, 1e15, "", 1.0) : form.number(name, 1, 1e15, "");
  }

  private static double[] range(Form form, String name, boolean balun, String unit) {
    double[] none = {0, 0};
    if (balun && !form.has(name)) {
      return none;
    }
    double[] range = form.numbers(name, 2, 2, 0, 1, unit);
    if (range.length == 2 && range[0] > range[1]) {
      form.note(name, "the least comes before the most; swap them.");
      return none;
    }
    return range.length == 2 ? range : none;
  }

  /** The answer; what is infinite (a load that takes no power) is null. */
  static ObjectNode answer(FeedResult result) {
    ObjectNode answer = JsonNodeFactory.instance.objectNode();
    put(answer, "lineSwr", result.lineSwr());
    put(answer, "matchedLossDb", result.matchedLossDb());
    put(answer, "lossDb", result.lossDb());
    answer
        .putArray("atStation")
        .add(result.atStation().getReal())
        .add(result.atStation().getImaginary());
    put(answer, "stationSwr", result.stationSwr());
    put(answer, "peakVolts", result.peakVolts());
    put(answer, "peakAmps", result.peakAmps());
    answer.put("lineState", result.lineState().name().toLowerCase(Locale.ROOT));
    answer.put("lineWhy", result.lineWhy());
    if (result.matching() != null) {
      answer.set("matching", matching(result.matching()));
    }
    return answer;
  }

  private static ObjectNode matching(Match match) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    node.put("state", match.state().name().toLowerCase(Locale.ROOT));
    node.put("why", match.why());
    if (match.settings() != null) {
      ObjectNode settings = node.putObject("settings");
      settings.put("layout", match.settings().layout());
      put(settings, "inductance", match.settings().inductance());
      put(settings, "capacitance", match.settings().capacitance());
      if (match.settings().secondCapacitance() != null) {
        put(settings, "secondCapacitance", match.settings().secondCapacitance());
      }
    }
    put(node, "lossDb", match.lossDb());
    put(node, "swr", match.swr());
    put(node, "peakVolts", match.peakVolts());
    put(node, "peakAmps", match.peakAmps());
    return node;
  }

  private static void put(ObjectNode node, String name, double value) {
    if (Double.isFinite(value)) {
      node.put(name, value);
    } else {
      node.putNull(name);
    }
  }
}
