package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonInclude;
import com.fasterxml.jackson.annotation.JsonProperty;
import java.util.List;
import java.util.Map;

/**
 * A set of RF exposure limits, by frequency.
 *
 * @param id unique among sets
 * @param name rule and who it protects
 * @param averagingMinutes time over which squares are averaged
 * @param rows by rising frequency
 * @param isDefault taken when the brief names none
 * @param sources field name to where its value comes from
 */
public record LimitSet(
    String id,
    String name,
    double averagingMinutes,
    List<Row> rows,
    @JsonProperty("default") @JsonInclude(JsonInclude.Include.NON_DEFAULT) boolean isDefault,
    Map<String, String> sources) {

  public LimitSet {
    rows = List.copyOf(rows);
  }

  /**
   * One row: the limit at f MHz is {@code coefficient · f^power}.
   *
   * @param fromMHz lower edge
   * @param toMHz upper edge
   * @param electric V/m, rms, at 1 MHz
   * @param electricPower power of f
   * @param magnetic A/m, rms, at 1 MHz
   * @param magneticPower power of f
   */
  public record Row(
      double fromMHz,
      double toMHz,
      double electric,
      double electricPower,
      double magnetic,
      double magneticPower) {}
}
