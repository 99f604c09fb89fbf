package spanwright.plan;

/**
 * Where the plot is and what its ground is.
 *
 * @param latitude degrees north (WGS 84), or null when not known
 * @param longitude degrees east, or null when not known
 * @param planNorth true bearing of the plan's +y, degrees clockwise
 * @param magneticVariation degrees, east positive
 * @param ground soil under the plot
 * @param terrain null where the plot is level
 */
public record Site(
    Double latitude,
    Double longitude,
    double planNorth,
    double magneticVariation,
    Soil ground,
    Terrain terrain) {}
