package spanwright.web;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import spanwright.plan.Json;
import spanwright.sheet.Issued;
import spanwright.sheet.SheetModel;
import spanwright.sheet.Sheets;
import spanwright.store.IssuedRecord;
import spanwright.store.PlanStore;

/** The sheets handed out of each saved plan: what was, and one more. */
final class IssuedSheets {
  private static final ObjectReader READER =
      Json.mapper()
          .readerFor(Issued.class)
          .without(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES);

  private final PlanStore store;

  IssuedSheets(PlanStore store) {
    this.store = store;
  }

  /** Those of a plan in order; none when the plan is not known. */
  List<Issued> of(String planId) {
    return sheets(store.issued().of(planId));
  }

  /**
   * Adds a sheet to a plan's record, unless it says the same as the one issued last. One at a time:
   * the letter and what changed are those against the record that it is added to.
   *
   * @param planId of a saved plan
   * @param make the sheet, held against those issued before
   * @param seen the revision that was shown when somebody said to issue it, or null
   */
  synchronized Outcome issue(String planId, Function<List<Issued>, SheetModel> make, String seen) {
    IssuedRecord record = store.issued().of(planId);
    List<Issued> before = sheets(record);
    SheetModel model = make.apply(before);
    if (model.head().date() != null) {
      return new Outcome(before.get(before.size() - 1), false);
    }
    String revision = model.head().revision();
    if (seen != null && !seen.equals(revision)) {
      throw new ProblemException(meanwhile(seen, revision));
    }
    Issued sheet = Sheets.issue(model, LocalDate.now().toString());
    JsonNode tree = Json.mapper().valueToTree(sheet);
    Optional<IssuedRecord> kept = store.issued().add(planId, tree, record.version());
    if (kept.isEmpty()) {
      throw PlanRoutes.gone(planId);
    }
    return new Outcome(sheet, true);
  }

  /**
   * What came of issuing.
   *
   * @param sheet as it stands in the record
   * @param fresh false when the same was issued before
   */
  record Outcome(Issued sheet, boolean fresh) {}

  private static Problem meanwhile(String seen, String revision) {
    return Problem.of(
        409,
        "issued-meanwhile",
        "Another sheet was issued meanwhile",
        "You looked at revision "
            + (seen.length() > 6 ? seen.substring(0, 6) + "…" : seen)
            + ", but this sheet would now be revision "
            + revision
            + ". Nothing was issued. Look at what it changes, then issue it.");
  }

  private static List<Issued> sheets(IssuedRecord record) {
    return record.sheets().stream().map(IssuedSheets::read).toList();
  }

  private static Issued read(JsonNode sheet) {
    try {
      return READER.readValue(sheet);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("the store keeps whole sheets only", e);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
