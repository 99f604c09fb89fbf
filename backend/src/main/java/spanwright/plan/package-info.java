/**
 * The plot and the brief: records, reading, validation, and the catalogues.
 *
 * <p>Frame: metres; x east and y north <em>of the plan</em>, z up. Heights in a plan file stand
 * above the local ground. Front doors: {@code PlanReader}, {@code Catalogues}, {@code
 * GroundSurface}.
 */
package spanwright.plan;
