package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonCreator;
import com.fasterxml.jackson.annotation.JsonValue;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;

/**
 * The matching unit of a brief: a catalogue id, or the unit described in place. Exactly one is set.
 *
 * @param id catalogue id, or null
 * @param unit described in place, or null
 */
public record MatchingChoice(String id, MatchingUnit unit) {

  /** Reads the JSON form. */
  @JsonCreator(mode = JsonCreator.Mode.DELEGATING)
  static MatchingChoice read(JsonNode json) throws JsonProcessingException {
    return json.isTextual()
        ? new MatchingChoice(json.asText(), null)
        : new MatchingChoice(null, new ObjectMapper().treeToValue(json, MatchingUnit.class));
  }

  @JsonValue
  Object toJson() {
    return id != null ? id : unit;
  }
}
