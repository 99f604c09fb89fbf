package spanwright.web;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonMappingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectReader;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import spanwright.assess.Placement;
import spanwright.plan.Catalogue;
import spanwright.plan.Fault;
import spanwright.plan.Json;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.Shape;
import spanwright.rigging.Layout;

/**
 * Reads an element of {@code placements}: as a layout to be assessed, of which only shape,
 * attachments, conductors and feed count; or whole, for a sheet. Fields it does not use are let
 * through, since a result may come from a newer version.
 */
public final class PlacementReader {
  private static final int MOST_HOLDS = 20;
  private static final int MOST_CONDUCTORS = 10;
  private static final int MOST_POINTS = 500;
  private static final double LONGEST_LINE = 1000;

  private static final ObjectReader WHOLE =
      Json.mapper()
          .readerFor(Placement.class)
          .without(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
          .with(DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES);

  private final Set<String> holders = new HashSet<>();
  private final String usualWire;
  private final Map<String, String> wires = new HashMap<>();
  private final Map<String, String> lines = new HashMap<>();

  /** For placements on one plan. */
  public PlacementReader(Plan plan, Catalogue catalogue) {
    usualWire = catalogue.wire(plan.brief().wire()).id();
    plan.supports().forEach(each -> holders.add(each.id()));
    plan.bracketLines().forEach(each -> holders.add(each.id()));
    plan.mastZones().forEach(each -> holders.add(each.id()));
    catalogue.wires().forEach(each -> wires.put(each.id(), each.id()));
    catalogue.lines().forEach(each -> lines.put(each.id(), each.id()));
  }

  /**
   * The layout of a placement.
   *
   * @param path of the node in its document, for the faults; may be empty
   * @param faults are added to; if there are any, what is returned must not be used
   */
  public Layout layout(JsonNode node, String path, List<Fault> faults) {
    Form form = Form.at(path, node, faults);
    Shape shape = form.word("shape", shapes(), null);
    List<Layout.Hold> holds = form.forms("attachments", 2, MOST_HOLDS, this::hold);
    List<Layout.Run> runs = form.forms("conductors", 1, MOST_CONDUCTORS, this::run);
    Layout.FeedChoice feed = feed(form.form("feed"), runs.size());
    return new Layout(shape == null ? "" : shape.word(), holds, runs, feed);
  }

  private static Map<String, Shape> shapes() {
    Map<String, Shape> shapes = new HashMap<>();
    for (Shape shape : Shape.values()) {
      shapes.put(shape.word(), shape);
    }
    return shapes;
  }

  private Layout.Hold hold(Form form) {
    String on = form.text("on");
    if (!on.isEmpty() && !holders.contains(on)) {
      form.note(
          "on",
          "the plan has no support, bracket line or mast zone of this id. Check its spelling.");
    }
    return new Layout.Hold(on, form.place("at"));
  }

  private Layout.Run run(Form form) {
    List<Place> points = form.places("points", 2, MOST_POINTS);
    return new Layout.Run(points, form.word("wire", wires, usualWire));
  }

  private Layout.FeedChoice feed(Form form, int conductors) {
    int conductor = form.index("conductor", Math.max(0, conductors - 1));
    double fraction = form.number("fraction", 0, 1, "");
    String line = form.has("line") ? form.word("line", lines, null) : null;
    Double length = form.number("lineLength", 0, LONGEST_LINE, "m", null);
    return new Layout.FeedChoice(conductor, fraction, line, length);
  }

  /**
   * The whole placement.
   *
   * @param path of the node in its document, for the faults; may be empty
   * @param faults are added to; if there are any, what is returned must not be used
   */
  public Placement whole(JsonNode node, String path, List<Fault> faults) {
    layout(node, path, faults);
    if (faults.isEmpty()) {
      WholeRecord.checkNames(Placement.class, node, path, faults);
    }
    if (!faults.isEmpty()) {
      return null;
    }
    try {
      Placement placement = WHOLE.readValue(node);
      WholeRecord.check(placement, path, faults);
      checkIndexes(placement, path, faults);
      return placement;
    } catch (JsonProcessingException e) {
      faults.add(new Fault(at(path, e), "This is missing or is not what a result holds here."));
      return null;
    } catch (IOException e) {
      throw new IllegalStateException("a tree is read without any input", e);
    }
  }

  private static void checkIndexes(Placement placement, String path, List<Fault> faults) {
    if (!faults.isEmpty()) {
      return;
    }
    int holds = placement.attachments().size();
    List<Integer> used = new ArrayList<>();
    placement.spans().forEach(span -> used.addAll(List.of(span.from(), span.to())));
    placement.ropes().forEach(rope -> used.add(rope.attachment()));
    if (used.stream().anyMatch(i -> i < 0 || i >= holds)) {
      faults.add(
          new Fault(path, "A span or rope names an attachment that the placement does not have."));
    }
  }

  private static String at(String path, JsonProcessingException e) {
    StringBuilder at = new StringBuilder(path);
    if (e instanceof JsonMappingException mapping) {
      for (JsonMappingException.Reference step : mapping.getPath()) {
        if (step.getFieldName() == null) {
          at.append('[').append(step.getIndex()).append(']');
        } else {
          at.append(at.isEmpty() ? "" : ".").append(step.getFieldName());
        }
      }
    }
    return at.toString();
  }
}
