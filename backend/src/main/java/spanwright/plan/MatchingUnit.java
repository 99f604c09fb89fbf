package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.List;

/**
 * What a matching unit (tuner) can do. Henries, farads, volts.
 *
 * @param network its circuit; a balun alone matches nothing
 * @param inductance least and most [H]
 * @param capacitance least and most [F]
 * @param coilQ quality factor of the coil
 * @param capacitorQ quality factor of the capacitors
 * @param peakVolts its parts stand
 */
public record MatchingUnit(
    Network network,
    List<Double> inductance,
    List<Double> capacitance,
    double coilQ,
    double capacitorQ,
    double peakVolts) {
  public MatchingUnit {
    inductance = inductance == null ? List.of() : List.copyOf(inductance);
    capacitance = capacitance == null ? List.of() : List.copyOf(capacitance);
  }

  /** Circuits of a matching unit. */
  public enum Network {
    L,
    T,
    @JsonProperty("balun")
    BALUN
  }
}
