// @ts-check
/**
 * A harness of a few lines: test files call `test` as they load, whoever opened them calls `run`
 * last, which answers with, and leaves in `globalThis.results`, `[{name, ok, error}]`.
 */

/** @type {{name: string, body: () => void|Promise<void>}[]} */
const tests = [];

/** @param {string} name a sentence @param {() => void|Promise<void>} body throws when it fails */
export function test(name, body) {
  tests.push({ name, body });
}

/** @param {unknown} truth @param {string} [message] */
export function assert(truth, message = 'it does not hold') {
  if (!truth) throw new Error(message);
}

/** @param {unknown} found @param {unknown} expected compared as JSON @param {string} [words] */
export function equal(found, expected, words = '') {
  const [a, b] = [JSON.stringify(found), JSON.stringify(expected)];
  if (a !== b) throw new Error(`${words} found ${a}, expected ${b}`);
}

/** @param {number|null|undefined} found @param {number} expected @param {number} [tolerance] @param {string} [words] */
export function near(found, expected, tolerance = 1e-6, words = '') {
  if (!(Math.abs(/** @type {number} */ (found) - expected) <= tolerance)) {
    throw new Error(`${words} found ${found}, expected ${expected} ± ${tolerance}`);
  }
}

assert.same = equal;
assert.near = near;

/** Runs every test in turn. @returns {Promise<{name: string, ok: boolean, error: string}[]>} */
export async function run() {
  const results = [];
  for (const { name, body } of tests) {
    try {
      await body();
      results.push({ name, ok: true, error: '' });
    } catch (error) {
      results.push({ name, ok: false, error: error instanceof Error ? `${error.message}\n${error.stack}` : String(error) });
    }
  }
  Reflect.set(globalThis, 'results', results);
  return results;
}
