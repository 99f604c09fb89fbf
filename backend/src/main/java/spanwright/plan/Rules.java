package spanwright.plan;

import java.util.Map;

/**
 * The rules of the brief that differ from their default, and the design weather.
 *
 * @param overrides rule id to value in the unit of that rule
 * @param wind design gust [m/s]
 * @param ice radial ice [mm], 900 kg/m³
 */
public record Rules(Map<String, Double> overrides, double wind, double ice) {

  public Rules {
    overrides = overrides == null ? Map.of() : Map.copyOf(overrides);
  }
}
