package spanwright.web;

import com.fasterxml.jackson.databind.JsonNode;
import java.lang.reflect.RecordComponent;
import java.util.List;
import java.util.Set;
import spanwright.plan.Fault;

/** Finds what is missing in a record that was read from JSON, all the way down. */
final class WholeRecord {
  /** What may be absent in a placement; everything else has to be there. */
  private static final Set<String> MAY_BE_ABSENT =
      Set.of(
          "Placement.quality",
          "BandQuality.refinementChange",
          "Attachment.pullLimit",
          "Attachment.kilograms",
          "NewMast.consent",
          "BandResult.powerBalance",
          "Attachment.weightUp",
          "Attachment.weightDown",
          "Attachment.slackAtPulley",
          "Span.greatestTension",
          "Span.strength",
          "SpanStrength.rope",
          "SpanStrength.insulator",
          "SpanStrength.weakLink",
          "SpanStrength.weather",
          "BandResult.rose",
          "BandResult.profiles",
          "Matching.inductance",
          "Matching.capacitance",
          "TargetResult.bearing");

  private static final String MISSING = "This is missing. A result of rank or assess has it.";

  private WholeRecord() {}

  /** Before a record is made, whose lists must be there: which of its own fields are not. */
  static void checkNames(
      Class<? extends Record> kind, JsonNode node, String path, List<Fault> faults) {
    for (RecordComponent part : kind.getRecordComponents()) {
      String name = kind.getSimpleName() + "." + part.getName();
      if (!node.hasNonNull(part.getName()) && !MAY_BE_ABSENT.contains(name)) {
        faults.add(new Fault(at(path, part), MISSING));
      }
    }
  }

  private static String at(String path, RecordComponent part) {
    return path.isEmpty() ? part.getName() : path + "." + part.getName();
  }

  static void check(Record value, String path, List<Fault> faults) {
    for (RecordComponent part : value.getClass().getRecordComponents()) {
      String name = value.getClass().getSimpleName() + "." + part.getName();
      String at = at(path, part);
      Object held = held(value, part);
      if (held == null) {
        if (!MAY_BE_ABSENT.contains(name)) {
          faults.add(new Fault(at, MISSING));
        }
      } else {
        checkHeld(held, at, faults);
      }
    }
  }

  private static void checkHeld(Object held, String at, List<Fault> faults) {
    if (held instanceof Record inner) {
      check(inner, at, faults);
    } else if (held instanceof Double number && !Double.isFinite(number)) {
      faults.add(new Fault(at, "The number is not finite."));
    } else if (held instanceof List<?> list) {
      for (int i = 0; i < list.size(); i++) {
        String each = at + "[" + i + "]";
        if (list.get(i) == null) {
          faults.add(new Fault(each, MISSING));
        } else {
          checkHeld(list.get(i), each, faults);
        }
      }
    }
  }

  private static Object held(Record value, RecordComponent part) {
    try {
      return part.getAccessor().invoke(value);
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException(e);
    }
  }
}
