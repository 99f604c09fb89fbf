package spanwright.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class CataloguesTest {
  private final Catalogue catalogue = Catalogues.standard();

  @Test
  void each_catalogue_has_exactly_one_default() {
    assertEquals(1, catalogue.wires().stream().filter(WireKind::isDefault).count());
    assertEquals(1, catalogue.lines().stream().filter(LineKind::isDefault).count());
    assertEquals(1, catalogue.ropes().stream().filter(RopeKind::isDefault).count());
    assertEquals(1, catalogue.matchingUnits().stream().filter(MatchingKind::isDefault).count());
    assertEquals(1, catalogue.soils().stream().filter(SoilKind::isDefault).count());
    assertEquals(1, catalogue.limits().stream().filter(LimitSet::isDefault).count());
  }
}
