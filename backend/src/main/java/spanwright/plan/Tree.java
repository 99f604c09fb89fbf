package spanwright.plan;

/**
 * A tree that holds nothing but is in the way.
 *
 * @param id unique in the plan
 * @param name shown to people
 * @param at its stem
 * @param canopy its crown
 */
public record Tree(String id, String name, Point at, Canopy canopy) {}
