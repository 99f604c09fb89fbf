package spanwright.plan;

import java.util.List;
import java.util.Map;

/**
 * A band with its edges by ITU region.
 *
 * @param id unique among bands
 * @param name shown to people
 * @param regions "1", "2", "3" to lower and upper edge [MHz]
 * @param sources field name to where its value comes from
 */
public record BandKind(
    String id, String name, Map<String, List<Double>> regions, Map<String, String> sources) {}
