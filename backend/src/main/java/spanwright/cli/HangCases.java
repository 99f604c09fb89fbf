package spanwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import spanwright.plan.Fault;
import spanwright.plan.Place;
import spanwright.rigging.HangCase;
import spanwright.web.Form;

/** Reads the case of {@code hang}. */
final class HangCases {
  private static final double SMALLEST = 1e-6;

  private HangCases() {}

  /** What the file says. */
  record Read(HangCase hangCase, List<Fault> faults) {}

  static Read read(JsonNode tree) {
    List<Fault> faults = new ArrayList<>();
    Form form = Form.of(tree, faults);
    Place from = form.place("from");
    Place to = form.place("to");
    HangCase.Wire wire = wire(form.form("wire"));
    HangCase.Load load = form.has("load") ? load(form.form("load")) : null;
    HangCase hangCase =
        new HangCase(
            from,
            to,
            wire,
            load,
            form.number("pull", SMALLEST, 1e6, "N"),
            form.word(
                "held",
                Map.of(
                    "weight", HangCase.Held.WEIGHT,
                    "tied", HangCase.Held.TIED,
                    "spring", HangCase.Held.SPRING),
                null),
            form.number("wind", 0, 100, "m/s", null),
            form.number("drag", 0, 10, "", null),
            form.number("air", 0, 10, "kg/m³", null),
            form.number("spring", 1e-3, 1e9, "N/m", null));
    form.finish();
    return new Read(hangCase, faults);
  }

  private static HangCase.Wire wire(Form form) {
    HangCase.Wire wire =
        new HangCase.Wire(
            form.number("weight", SMALLEST, 100, "kg/m"),
            form.number("diameter", 0, 1, "m"),
            form.number("stiffness", 1e-3, 1e12, "N", null));
    form.finish();
    return wire;
  }

  private static HangCase.Load load(Form form) {
    HangCase.Load load =
        new HangCase.Load(form.number("fraction", 0, 1, ""), form.number("weight", 0, 1000, "kg"));
    form.finish();
    return load;
  }
}
