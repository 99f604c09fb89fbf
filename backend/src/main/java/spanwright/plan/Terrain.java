package spanwright.plan;

import java.util.List;

/**
 * Spot heights joined by Delaunay triangles; outside them the height of the nearest point of the
 * triangulated area.
 *
 * @param spots x, y in the plan frame; z metres above the plan's zero
 */
public record Terrain(List<Place> spots) {
  public Terrain {
    spots = spots == null ? List.of() : List.copyOf(spots);
  }
}
