package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonInclude;
import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.Map;

/**
 * A kind of rope in the catalogue.
 *
 * @param id unique among ropes
 * @param name material and size
 * @param diameter metres
 * @param weight kg/m
 * @param breaking newtons, new, without knots
 * @param stiffness EA [N]
 * @param workingShare share of the breaking strength that may be used
 * @param isDefault taken when the brief names none
 * @param sources field name to where its value comes from
 */
public record RopeKind(
    String id,
    String name,
    double diameter,
    double weight,
    double breaking,
    double stiffness,
    double workingShare,
    @JsonProperty("default") @JsonInclude(JsonInclude.Include.NON_DEFAULT) boolean isDefault,
    Map<String, String> sources) {}
