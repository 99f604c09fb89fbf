/**
 * One placement, the whole chain: it hangs ({@code rigging}), clears or fouls ({@code clearance}),
 * is solved over the plot's ground together with the plan's metalwork ({@code moments}), and its
 * power followed down the line and through the matching unit ({@code feed}) and out to the targets'
 * take-off windows ({@code path}).
 *
 * <p>Frame: metres, plan frame, z above the plan's zero; azimuths from true north; elevations up;
 * decibels over an isotropic radiator. The solver's ground is the plane through the ground under
 * the wire, tilted as that is ({@code GroundPlane}).
 *
 * <p>Delivered gain is the gain toward the target, averaged as power over its scored take-off
 * window (and over all azimuths for near-vertical cover), less line loss and matching loss. The
 * score is the weighted mean over bands and targets of delivered gain minus the gain of the
 * reference vertical over the same window, less named deductions ({@code Scoring}).
 *
 * <p>It does not search, and it refuses nothing by itself: a foul placement is assessed too, and
 * says it is foul. Front door: {@link spanwright.assess.Assessor}.
 */
package spanwright.assess;
