package spanwright.plan;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;

/**
 * Reads plan files. Every fault is gathered, not only the first: first the text (line and column),
 * then fields, types and sizes against the schema, then whether the things make sense, each alone
 * and together. A plan comes out only when there is no fault; absent scalars are then filled in.
 * Any text is answered quickly: size, depth and number of values are bounded before anything is
 * built.
 *
 * <p>Pure and safe between threads.
 */
public final class PlanReader {
  /** More faults than this are not even counted. */
  private static final int MOST = 2000;

  private PlanReader() {}

  /**
   * What reading gave.
   *
   * @param plan absent scalars filled in; null when there is any fault
   * @param faults empty when there is a plan
   */
  public record Outcome(Plan plan, List<Fault> faults) {
    public Outcome {
      faults = List.copyOf(faults.subList(0, Math.min(MOST, faults.size())));
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
      faults = List.copyOf(faults.subList(0, Math.min(MOST, faults.size())));
    }

    /** Whether there is a document. */
    public boolean isGood() {
      return json != null;
    }
  }

  /** Reads a whole plan from UTF-8, whatever the day. */
  public static Outcome read(byte[] utf8) {
    return whole(JsonText.parse(utf8), null);
  }

  /** Reads a whole plan, whatever the day. */
  public static Outcome read(String json) {
    return whole(JsonText.parse(json), null);
  }

  /**
   * Reads a whole plan; what is dated later than today does not count as allowed, and is a fault.
   */
  public static Outcome read(String json, LocalDate today) {
    return whole(JsonText.parse(json), today);
  }

  /** Reads a draft from UTF-8: syntax, types, sizes and unknown fields only. */
  public static Draft readDraft(byte[] utf8) {
    return draft(JsonText.parse(utf8));
  }

  /** Reads a draft: syntax, types, sizes and unknown fields only. */
  public static Draft readDraft(String json) {
    return draft(JsonText.parse(json));
  }

  private static Draft draft(JsonText.Parsed parsed) {
    List<Fault> faults = checked(parsed, true);
    return new Draft(faults.isEmpty() ? parsed.root() : null, faults);
  }

  private static Outcome whole(JsonText.Parsed parsed, LocalDate today) {
    List<Fault> faults = checked(parsed, false);
    if (parsed.root() instanceof ObjectNode) {
      faults.addAll(SurveyChecks.faults(parsed.root()));
      faults.addAll(ConsentChecks.faults(parsed.root(), today));
      faults.addAll(BriefChecks.faults(parsed.root()));
    }
    if (!faults.isEmpty()) {
      return new Outcome(null, faults);
    }
    return new Outcome(mapped((ObjectNode) parsed.root()), List.of());
  }

  private static List<Fault> checked(JsonText.Parsed parsed, boolean draft) {
    List<Fault> faults = new ArrayList<>(parsed.faults());
    if (parsed.root() instanceof ObjectNode plan) {
      faults.addAll(SchemaWalk.faults(plan, parsed.lengths(), draft));
    } else if (parsed.root() != null) {
      faults.add(Fault.of("", Wording.NOT_AN_OBJECT, SchemaWalk.found(parsed.root())));
    }
    return faults;
  }

  private static Plan mapped(ObjectNode plan) {
    try {
      return Json.mapper().treeToValue(PlanDefaults.filled(plan), Plan.class);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("the schema lets through what the records do not hold", e);
    }
  }
}
