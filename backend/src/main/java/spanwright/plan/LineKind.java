package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonInclude;
import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.Map;

/**
 * A kind of feed line in the catalogue. Loss is computed from k1·√f + k2·f.
 *
 * @param id unique among lines
 * @param name kind and size
 * @param impedance ohm, high-frequency, real
 * @param velocityFactor of light in vacuum
 * @param conductorLoss k1: dB per 100 m at 1 MHz, grows with √f
 * @param dielectricLoss k2: dB per 100 m at 1 MHz, grows with f
 * @param balanced true for two-wire line
 * @param weight kg/m
 * @param diameter overall width that wind sees [m]
 * @param spacing of the two wires of a balanced line, middle to middle [m]; null for others
 * @param peakVolts stands; 0 when not known
 * @param isDefault taken when the brief names none
 * @param sources field name to where its value comes from
 */
public record LineKind(
    String id,
    String name,
    double impedance,
    double velocityFactor,
    double conductorLoss,
    double dielectricLoss,
    boolean balanced,
    double weight,
    double diameter,
    Double spacing,
    double peakVolts,
    @JsonProperty("default") @JsonInclude(JsonInclude.Include.NON_DEFAULT) boolean isDefault,
    Map<String, String> sources) {}
