import type { Conductor } from '@/hazard';
import type { Messages } from '@/shared/messages';
import type { Cell } from './proofForm';
import type { ReadingPlan } from './plan';

type Said = Messages['proof']['readings'];

/**
 * How a conductor is called: of one circuit a phase has no letter on the site,
 * so it is "Phase"; of whole equipment it is A, B or C.
 */
export function conductorName(conductor: Conductor, plan: ReadingPlan, said: Said): string {
  const place = plan.phases.indexOf(conductor);
  if (!plan.isOneCircuit || place < 0) return said.conductor[conductor];
  if (plan.phases.length === 1) return said.phase;
  return place === 0 ? said.firstPhase : said.secondPhase;
}

export function toConductor(conductor: Conductor, plan: ReadingPlan, said: Said): string {
  const place = plan.phases.indexOf(conductor);
  if (!plan.isOneCircuit || place < 0) return said.to[conductor];
  if (plan.phases.length === 1) return said.toPhase;
  return place === 0 ? said.toFirstPhase : said.toSecondPhase;
}

/** A cell in words, for a screen reader and for what was kept: "C3, Phase to ground". */
export function cellWords(cell: Cell, point: string, plan: ReadingPlan, said: Said): string {
  if (cell.sourceId === undefined) {
    const from = cell.from === undefined ? '' : conductorName(cell.from, plan, said);
    const to = cell.to === undefined ? '' : toConductor(cell.to, plan, said);
    return `${point}, ${from} ${to}`;
  }
  const to = cell.to === undefined ? said.plusMinus : toConductor(cell.to, plan, said);
  return `${point}, ${cell.current === 'dc' ? said.dc : said.ac} ${to}`;
}
