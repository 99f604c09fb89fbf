package spanwright.store;

import java.time.Instant;

/**
 * One plan as it lies on the disk.
 *
 * @param id its name in the folder, checked
 * @param json its text exactly as it was sent
 * @param version changes with every save; opaque, without quotes
 * @param savedAt when it was last written
 */
public record SavedPlan(String id, String json, String version, Instant savedAt) {}
