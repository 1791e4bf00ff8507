import * as chai from 'chai';
import { JestAsymmetricMatchers, JestChaiExpect, JestExtend } from '@vitest/expect';

chai.use(JestExtend);
chai.use(JestChaiExpect);
chai.use(JestAsymmetricMatchers);

const rowOf = (row) => (Array.isArray(row) ? row : [row]);

/**
 * What the tests of `hazard/` import of vitest, gathering instead of running.
 * All rows of a table are one test: the first that fails is enough.
 */
export function collector() {
  const tests = [];
  const names = [];
  const describe = (name, body) => {
    names.push(name);
    body();
    names.pop();
  };
  describe.each = (rows) => (name, body) => {
    for (const row of rows) describe(name, () => body(...rowOf(row)));
  };
  const it = (name, run) => {
    const full = [...names, name].join(' > ');
    tests.push({ id: `${tests.length} ${full}`, name: full, run });
  };
  it.each = (rows) => (name, check) =>
    it(name, async () => {
      for (const row of rows) await check(...rowOf(row));
    });
  return { tests, vitest: { describe, it, expect: chai.expect, vi: { setConfig() {} } } };
}
