/**
 * The plot and the brief: records, reading, validation, the ground, and the catalogues.
 *
 * <p>Job: turn a plan file into records that later parts may trust, or into sentences that help its
 * author. Reading goes in three steps, each gathering all it finds: the text (bounded in size,
 * depth and number of values before anything is built), fields and types and sizes by a walk along
 * the JSON Schema file itself, then whether things make sense alone and together. Absent scalars
 * are filled in last, so a record holds a value wherever one is due and compact constructors need
 * not judge.
 *
 * <p>Units and frame: metres; x east and y north <em>of the plan</em>, z up; heights in a plan file
 * stand above the local ground at that spot, and {@link spanwright.plan.GroundSurface} raises them
 * to the plan's zero. Angles in degrees as people write them; frequencies in MHz, named so.
 *
 * <p>Method: outlines are checked with the geometry library's validity (OGC simple features); the
 * ground is its Delaunay triangulation, looked up by barycentric coordinates. Catalogue values
 * stand beside their sources in {@code shared/catalogue}.
 *
 * <p>What it does not do: files (that is {@code store} and {@code cli}), or whether a wire may hang
 * (that is {@code clearance}): a mast zone that leans over the boundary reads well here.
 *
 * <p>Front doors: {@link spanwright.plan.PlanReader}, {@link spanwright.plan.Catalogues}, {@link
 * spanwright.plan.GroundSurface}, {@link spanwright.plan.DemoPlans}; {@link
 * spanwright.plan.Json#mapper()} reads and writes every other document.
 */
package spanwright.plan;
