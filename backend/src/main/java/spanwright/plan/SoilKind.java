package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonInclude;
import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.Map;

/**
 * A kind of ground in the catalogue.
 *
 * @param id unique among soils
 * @param name what it is
 * @param permittivity relative
 * @param conductivity S/m
 * @param isDefault taken when the plan says nothing
 * @param sources field name to where its value comes from
 */
public record SoilKind(
    String id,
    String name,
    double permittivity,
    double conductivity,
    @JsonProperty("default") @JsonInclude(JsonInclude.Include.NON_DEFAULT) boolean isDefault,
    Map<String, String> sources) {}
