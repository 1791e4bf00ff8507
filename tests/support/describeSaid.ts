import { describe, expect, it } from 'vitest';
import type { Finding } from '@/hazard';
import type { Base, Edits } from './ruleTable';
import { assessBase } from './ruleTable';

/** `severity /path`, and what the words are filled with: no more and no less. */
export type Said = [finding: string, params: Finding['params']];
export type SaidRow = [code: string, title: string, base: Base, edits: Edits, said: Said[]];

/** One test for each row: what the findings of one code carry for their words. */
export function describeSaid(of: string, rows: SaidRow[]): void {
  describe(`what a finding says of ${of}`, () => {
    it.each(rows)('%s: %s', (code, _title, base, edits, said) => {
      const findings = assessBase(base, edits).findings.filter((finding) => finding.code === code);
      expect(
        findings.map(({ severity, path, params }) => [`${severity} ${path}`, params]),
      ).toStrictEqual(said);
    });
  });
}
