package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonInclude;
import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.Map;

/**
 * A kind of wire in the catalogue.
 *
 * @param id unique among wires
 * @param name material and size
 * @param radius of the conductor [m]
 * @param conductivity effective at HF [S/m]
 * @param permeability relative
 * @param insulation null when bare
 * @param weight kg/m, insulation included
 * @param breaking newtons
 * @param stiffness EA [N]
 * @param isDefault taken when the brief names none
 * @param sources field name to where its value comes from
 */
public record WireKind(
    String id,
    String name,
    double radius,
    double conductivity,
    double permeability,
    Insulation insulation,
    double weight,
    double breaking,
    double stiffness,
    @JsonProperty("default") @JsonInclude(JsonInclude.Include.NON_DEFAULT) boolean isDefault,
    Map<String, String> sources) {}
