import type { EnergySource } from '../content';
import type { Answers } from './answers';
import { asksAtService } from './asksAtService';
import type { Facts } from './facts';
import { isAmong } from './isAmong';
import { personParams } from './people';
import { notAnswered } from './rule';
import type { Hit } from './rule';
import { sourceParams } from './sources';
import type { Source } from './sources';

type Kind = NonNullable<EnergySource['kind']>;

/** The kinds that may be of another system than the circuit's. */
const OF_A_SYSTEM: readonly Kind[] = ['generator', 'central inverter', 'backfeed', 'control'];

/** A hit for each of the named answers that is missing. */
function missing(
  path: string,
  answers: Readonly<Record<string, unknown>>,
  params: Hit['params'] = {},
): Hit[] {
  return Object.entries(answers)
    .filter(([, answer]) => answer === undefined)
    .map(([name]) => notAnswered(`${path}/${name}`, params));
}

/** An id that another element before it has is none. */
const uniqueId = (
  id: string | undefined,
  index: number,
  all: readonly { id?: string | undefined }[],
) => (all.findIndex((other) => other.id === id) === index ? id : undefined);

function job({ answers, path }: Facts): Hit[] {
  const { siteId, area, equipment, task, description, pointsOfWork } = answers.job;
  return missing('/job', {
    siteId,
    area,
    equipment,
    task,
    description,
    ...(path === 'off' ? { pointsOfWork } : {}),
  });
}

function supply({ answers, path, voltage }: Facts): Hit[] {
  const { panel, circuit, neutralShared, switching, atService } = answers.supply;
  return missing('/supply', {
    panel,
    circuit,
    ...(path === 'off' && voltage.isPhaseToNeutral ? { neutralShared } : {}),
    ...(path === 'testing' ? { switching: switching.isAnswered || undefined } : {}),
    ...(path === 'energized' && asksAtService(answers) ? { atService } : {}),
  });
}

function source(one: Source, all: readonly Source[]): Hit[] {
  const { index, id, kind, from, system, hasOwnConductors } = one;
  const asksSystem = hasOwnConductors && isAmong(kind, OF_A_SYSTEM);
  return missing(
    `/sources/${index}`,
    { id: uniqueId(id, index, all), kind, from, ...(asksSystem ? { system } : {}) },
    sourceParams(one),
  );
}

function decision({ answers }: Facts): Hit[] {
  return missing('/decision', { mode: answers.decision.mode });
}

function arcFlash({ answers, path, isBelowFiftyVolts }: Facts): Hit[] {
  if (isBelowFiftyVolts) return [];
  const { equipment, task } = answers.arcFlash;
  return missing('/arcFlash', { ...(path === 'off' ? {} : { task }), equipment });
}

function surroundings({ surroundings }: Answers): Hit[] {
  return missing('/surroundings', { access: surroundings.access });
}

function crew({ people }: Facts): Hit[] {
  return people.crew.flatMap((person) => {
    const { index, id, name, qualified, closest } = person;
    return missing(
      `/crew/${index}`,
      { id: uniqueId(id, index, people.crew), name, qualified, closest },
      personParams(person),
    );
  });
}

/** Sections with required fields that no rule of their own asks for. */
const SECTIONS: readonly [section: string, find: (facts: Facts) => Hit[]][] = [
  ['job', job],
  ['supply', supply],
  ['sources', ({ sources }) => sources.flatMap((one) => source(one, sources))],
  ['decision', decision],
  ['arcFlash', arcFlash],
  ['surroundings', ({ answers }) => surroundings(answers)],
  ['crew', crew],
];

/** The codes of required fields without a rule of their own. */
export const UNANSWERED_CODES: readonly string[] = SECTIONS.map(
  ([section]) => `${section}.unanswered`,
);

/** Every required field that no rule reads and that is not answered, in the order of the content. */
export function unansweredOf(facts: Facts): { code: string; hit: Hit }[] {
  return SECTIONS.flatMap(([section, find]) =>
    find(facts).map((hit) => ({ code: `${section}.unanswered`, hit })),
  );
}
