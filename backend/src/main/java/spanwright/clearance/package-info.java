/**
 * What a hung placement must clear: distances in space, the rules, and refusals with their cure.
 *
 * <p>Units: metres. Frame: x east and y north of the plan, z up from the plan's zero. Everything of
 * ours is taken calm, blown to either side by the design gust, and in between. The three rules for
 * overhead lines (kept distance, wire let go, mast let go) refuse; nothing outweighs them, and
 * every line gets a clearance however far it is. Distances are our own: between segments, from a
 * segment to a triangle, to a crown, to the region a freed wire may reach; where something is
 * approximated the answer errs towards too near. The geometry library serves plan geometry and
 * indexing only.
 *
 * <p>What it does not do: decide. Rules are data with a source beside each default; local code, the
 * line's owner and licensed practice decide.
 *
 * <p>Front door: {@link spanwright.clearance.Clearances}.
 */
package spanwright.clearance;
