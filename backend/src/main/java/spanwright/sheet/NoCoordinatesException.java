package spanwright.sheet;

/** The plan does not say where on the earth it lies, so nothing can be put on a map. */
public final class NoCoordinatesException extends IllegalArgumentException {
  NoCoordinatesException() {
    super(
        "The plan has no place on the earth (site.latitude, site.longitude), so the sheet cannot be"
            + " written as GeoJSON. Give the plot's latitude and longitude and ask again.");
  }
}
