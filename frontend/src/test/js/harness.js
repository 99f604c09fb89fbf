// @ts-check
/** A harness of a few lines: test files call `test` as they load, the page calls `run` last. */

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

/** @param {unknown} found @param {unknown} expected compared as JSON */
export function equal(found, expected) {
  const [a, b] = [JSON.stringify(found), JSON.stringify(expected)];
  if (a !== b) throw new Error(`found ${a}, expected ${b}`);
}

/** @param {number} found @param {number} expected @param {number} tolerance */
export function near(found, expected, tolerance) {
  if (!(Math.abs(found - expected) <= tolerance)) throw new Error(`found ${found}, expected ${expected} ± ${tolerance}`);
}

/** Runs every test in turn and leaves the outcome for the one who opened the page. */
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
  Reflect.set(window, 'results', results);
}
