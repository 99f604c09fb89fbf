package spanwright.store;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;

/**
 * The sheets issued of one plan.
 *
 * @param sheets in the order they were issued, each as it was given; none at first
 * @param version changes with every sheet; opaque
 */
public record IssuedRecord(List<JsonNode> sheets, String version) {
  public IssuedRecord {
    sheets = List.copyOf(sheets);
  }
}
