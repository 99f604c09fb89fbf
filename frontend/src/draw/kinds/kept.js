// @ts-check
/**
 * Kept distance of an overhead line as the rules have it (docs/reference/rules.md, "overhead-…"): the default of its kind, or its
 * own figure where that is larger, or smaller and somebody allowed it on a day.
 */

/** @type {Record<string, number>} metres */
const DEFAULTS = { telephone: 0.6, 'low-voltage': 3.05, 'medium-voltage': 3.05, 'high-voltage': 6.1, unknown: 6.1 };

/**
 * @param {{kind?: string, clearance?: number, authorisedBy?: string, authorisedOn?: string}} line
 * @returns {number} metres
 */
export function keptDistance(line) {
  const usual = DEFAULTS[line.kind ?? 'unknown'] ?? DEFAULTS.unknown;
  const own = line.clearance;
  if (typeof own !== 'number' || !Number.isFinite(own)) return usual;
  return line.authorisedBy && line.authorisedOn ? own : Math.max(own, usual);
}
