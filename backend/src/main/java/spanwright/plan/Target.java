package spanwright.plan;

import com.fasterxml.jackson.annotation.JsonIgnore;
import java.util.List;

/**
 * Someone to be reached: by bearing and distance, or near-vertical within a radius.
 *
 * @param name shown to people
 * @param bearing degrees from true north in which the wave leaves; null for near-vertical
 * @param distanceKm over 20,000 means the long way round; null for near-vertical
 * @param nearVerticalKm radius of cover, or null
 * @param weight in the score
 * @param bands names of bands it counts on; empty means all
 */
public record Target(
    String name,
    Double bearing,
    Double distanceKm,
    Double nearVerticalKm,
    double weight,
    List<String> bands) {
  public Target {
    bands = bands == null ? List.of() : List.copyOf(bands);
  }

  /** Whether the target is near-vertical cover. */
  @JsonIgnore
  public boolean isNearVertical() {
    return nearVerticalKm != null;
  }

  /** Whether the target counts on a band. */
  public boolean countsOn(Band band) {
    return bands.isEmpty() || bands.contains(band.name());
  }
}
