package spanwright.plan;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * Reads plan files. Every fault is gathered, not only the first; a plan comes out only when there
 * is none.
 */
public final class PlanReader {
  private PlanReader() {}

  /**
   * What reading gave.
   *
   * @param plan absent scalars filled in; null when there is any fault
   * @param faults empty when there is a plan
   */
  public record Outcome(Plan plan, List<Fault> faults) {
    public Outcome {
      faults = List.copyOf(faults);
    }

    /** Whether there is a plan. */
    public boolean isGood() {
      return plan != null;
    }
  }

  /**
   * What reading a draft gave.
   *
   * @param json the document as it stands; null when there is any fault
   * @param faults empty when there is a document
   */
  public record Draft(JsonNode json, List<Fault> faults) {
    public Draft {
      faults = List.copyOf(faults);
    }
  }

  /** Reads a whole plan from UTF-8 text. */
  public static Outcome read(byte[] utf8) {
    return read(new String(utf8, StandardCharsets.UTF_8));
  }

  /** Reads a whole plan. */
  public static Outcome read(String json) {
    Draft draft = readDraft(json);
    if (draft.json() == null) {
      return new Outcome(null, draft.faults());
    }
    try {
      return new Outcome(
          Json.mapper().treeToValue(PlanDefaults.filled((ObjectNode) draft.json()), Plan.class),
          List.of());
    } catch (JsonProcessingException e) {
      return new Outcome(null, List.of(Fault.of("", Wording.NOT_A_PLAN, "its fields do not fit")));
    }
  }

  /** Checks syntax, types, sizes and unknown fields only. */
  public static Draft readDraft(String json) {
    try {
      JsonNode node = Json.mapper().readTree(json);
      return node.isObject()
          ? new Draft(node, List.of())
          : new Draft(null, List.of(Fault.of("", Wording.NOT_A_PLAN, "it must be an object")));
    } catch (JsonProcessingException e) {
      return new Draft(null, List.of(Fault.of("", Wording.NOT_A_PLAN, "it is not JSON")));
    }
  }
}
