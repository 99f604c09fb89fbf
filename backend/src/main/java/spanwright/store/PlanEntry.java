package spanwright.store;

import java.time.Instant;

/**
 * One line of the list of plans.
 *
 * @param id its name in the folder
 * @param title as written in the plan, or its id when it has none
 * @param version changes with every save; opaque, without quotes
 * @param savedAt when it was last written
 */
public record PlanEntry(String id, String title, String version, Instant savedAt) {}
