package spanwright.clearance;

import spanwright.plan.Place;

/**
 * One distance held against its rule.
 *
 * @param rule id in the rule catalogue
 * @param to id of the thing it is measured to
 * @param what which part of ours is nearest, in words: "wire", "rope", "feed line", "mast", "wire
 *     let go at the oak"
 * @param at our nearest place, z above the plan's zero
 * @param toAt the other thing's nearest place, likewise
 * @param distance found [m]
 * @param required by the rule [m]
 * @param state clear, tight or foul
 */
public record Clearance(
    String rule,
    String to,
    String what,
    Place at,
    Place toAt,
    double distance,
    double required,
    State state) {}
