import type { Finding } from '@/hazard';
import { fieldNameOf } from '@/shared/sections';
import type { FieldFault } from './rawContent';

const NO_FINDINGS: readonly Finding[] = [];

/**
 * Findings and faults by the name of their field. A field listens to its own
 * name only: a keystroke redraws the fields whose findings it changed, not
 * every field of the worksheet.
 */
export class FieldStore {
  private findings = new Map<string, readonly Finding[]>();
  private faults = new Map<string, FieldFault>();
  private readonly listeners = new Set<() => void>();

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  findingsOf(name: string): readonly Finding[] {
    return this.findings.get(name) ?? NO_FINDINGS;
  }

  faultOf(name: string): FieldFault | undefined {
    return this.faults.get(name);
  }

  update(findings: readonly Finding[], faults: readonly FieldFault[]): void {
    const byName = new Map<string, Finding[]>();
    for (const finding of findings) {
      const name = fieldNameOf(finding.path);
      byName.set(name, [...(byName.get(name) ?? []), finding]);
    }
    // An equal list keeps its identity, so that its field has nothing to draw again.
    const next = new Map<string, readonly Finding[]>(
      [...byName].map(([name, list]) => {
        const before = this.findings.get(name);
        return [name, JSON.stringify(before) === JSON.stringify(list) ? (before ?? list) : list];
      }),
    );
    const nextFaults = new Map(
      faults.map((fault) => {
        const before = this.faults.get(fault.name);
        return [fault.name, before?.code === fault.code ? before : fault];
      }),
    );
    this.findings = next;
    this.faults = nextFaults;
    for (const listener of this.listeners) listener();
  }
}
