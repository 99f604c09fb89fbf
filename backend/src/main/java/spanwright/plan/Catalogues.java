package spanwright.plan;

import com.fasterxml.jackson.core.type.TypeReference;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;

/** The catalogues that come with the program: {@code shared/catalogue}, read once. */
public final class Catalogues {
  private static final Catalogue STANDARD =
      new Catalogue(
          load("wires", new TypeReference<List<WireKind>>() {}),
          load("lines", new TypeReference<List<LineKind>>() {}),
          load("ropes", new TypeReference<List<RopeKind>>() {}),
          load("matching-units", new TypeReference<List<MatchingKind>>() {}),
          load("soils", new TypeReference<List<SoilKind>>() {}),
          load("bands", new TypeReference<List<BandKind>>() {}),
          load("limits", new TypeReference<List<LimitSet>>() {}),
          load("rules", new TypeReference<List<RuleKind>>() {}));

  private Catalogues() {}

  /** The one set of catalogues. */
  public static Catalogue standard() {
    return STANDARD;
  }

  private static <K> List<K> load(String name, TypeReference<List<K>> kinds) {
    String place = "/spanwright/shared/catalogue/" + name + ".json";
    try (InputStream in = Catalogues.class.getResourceAsStream(place)) {
      if (in == null) {
        throw new IllegalStateException(place + " is not on the class path");
      }
      return Json.mapper().readValue(in, kinds);
    } catch (IOException e) {
      throw new UncheckedIOException("cannot read " + place, e);
    }
  }
}
