/**
 * How a placement hangs: shapes, pulls, wind, ropes, new masts, the feed line's run.
 *
 * <p>Units: metres, newtons, kilograms, m/s. Frame: x east and y north of the plan, z up from the
 * plan's zero. A span is a chain of pieces (rope, wire, wire, rope) with weights where they meet
 * (insulators, centre piece and feed line). Each piece is an exact elastic catenary (H. M. Irvine,
 * <em>Cable Structures</em>, 1981, §1.3; written here for any direction of the load so that wind
 * comes in as one more component) and the pieces meet in balance of forces. The unknown tension at
 * one end is the minimum of the chain's complementary energy, which is convex, so a damped Newton
 * iteration always arrives. Where ropes hold the wire at bends, and in loops, the chains form a net
 * whose nodes are found together, by the same convexity. Wind is ½ρv²·Cd·d for each metre, level
 * and square to the span (EN 1991-1-4 for ½ρv²); ice is a sleeve of 900 kg/m³ that widens what the
 * gust meets.
 *
 * <p>What it does not do: dynamics (galloping, gusts against a moving tree), bending stiffness,
 * friction in pulleys, wire that runs through its holding points, creep. The level pull of a slack
 * feed line on its feedpoint is left out.
 *
 * <p>Front doors: {@link spanwright.rigging.Rigging} for layouts, {@link
 * spanwright.rigging.Hanging} for one wire.
 */
package spanwright.rigging;
