package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonInclude;
import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.Map;

/**
 * A kind of matching unit in the catalogue.
 *
 * @param id unique among units
 * @param name what it is
 * @param unit what it can do
 * @param isDefault taken when the brief names none
 * @param sources field name to where its value comes from
 */
public record MatchingKind(
    String id,
    String name,
    MatchingUnit unit,
    @JsonProperty("default") @JsonInclude(JsonInclude.Include.NON_DEFAULT) boolean isDefault,
    Map<String, String> sources) {}
