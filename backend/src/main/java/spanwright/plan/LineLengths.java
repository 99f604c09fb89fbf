package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonCreator;
import com.fasterxml.jackson.annotation.JsonValue;
import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;

/**
 * Feed line lengths at hand. In JSON the word "free" or a list of metres.
 *
 * @param lengths metres; empty means free
 */
public record LineLengths(List<Double> lengths) {

  public LineLengths {
    lengths = List.copyOf(lengths);
  }

  /** Any length may be cut. */
  public static LineLengths free() {
    return new LineLengths(List.of());
  }

  /** Reads the JSON form. */
  @JsonCreator(mode = JsonCreator.Mode.DELEGATING)
  static LineLengths read(JsonNode json) {
    List<Double> lengths = new ArrayList<>();
    if (json.isArray()) {
      json.forEach(length -> lengths.add(length.asDouble()));
    }
    return new LineLengths(lengths);
  }

  @JsonValue
  Object toJson() {
    return isFree() ? "free" : lengths;
  }

  /** Whether any length may be cut. */
  public boolean isFree() {
    return lengths.isEmpty();
  }
}
