package spanwright.plan;

/**
 * What a mast up to a height needs.
 *
 * @param highest metres above the ground
 * @param needs the consent in words; "none" when it needs none
 */
public record Consent(double highest, String needs) {}
