import type { Closest } from '../enumerations';
import type { JobTaskFacts } from '../tasks';
import type { Answers, CrewAnswers } from './answers';
import type { Path } from './path';

/** `unknown`: something that says so is not answered. */
export type Qualification = 'yes' | 'no' | 'unknown';

export interface Person extends CrewAnswers {
  readonly index: number;
  readonly qualification: Qualification;
  /** Whoever enters the restricted boundary counts as `restricted`, whatever was answered. */
  readonly nearest: Closest | undefined;
  readonly enters: boolean;
}

export interface People {
  readonly crew: readonly Person[];
  /** Who enters the restricted boundary. */
  readonly entrants: readonly Person[];
  /** Someone enters; also while it is not known who. */
  readonly someoneEnters: boolean;
}

/**
 * A qualified person on the worksheet's day (29 CFR 1910.332 to .335). The tool
 * assumes nothing of an apprentice: what they may do, the employer records.
 */
function qualificationOf(member: CrewAnswers, day: string): Qualification {
  if (member.qualified === undefined) return 'unknown';
  if (!member.qualified) return 'no';
  if (member.qualifiedThrough === undefined) return 'unknown';
  return member.qualifiedThrough >= day ? 'yes' : 'no';
}

interface Question {
  answers: Answers;
  task: JobTaskFacts;
  path: Path;
  day: string;
  isBelowFiftyVolts: boolean;
}

/** Whether the one who tests reaches inside the restricted boundary. */
const testerEnters = ({ answers, path }: Question) =>
  path === 'off' || (path === 'testing' && answers.job.task === 'test or troubleshoot');

function entrantsOf(question: Question): ReadonlySet<CrewAnswers> {
  const { answers, path, task, isBelowFiftyVolts } = question;
  const crew = answers.crew.values;
  if (isBelowFiftyVolts) return new Set();
  const tester = answers.absenceTest.byCrewId;
  const isSomeoneRestricted = crew.some(({ closest }) => closest === 'restricted');
  return new Set(
    crew.filter(({ id, lead, closest }) => {
      if (closest === 'restricted') return true;
      if (testerEnters(question) && tester !== undefined && id === tester) return true;
      if (lead !== true || path === 'off') return false;
      const isRepairersLead = task.kind === 'repair' && !isSomeoneRestricted;
      return isRepairersLead || closest === undefined;
    }),
  );
}

/** Who does the work, how near they come and who of them is qualified. */
export function peopleOf(question: Question): People {
  const { answers, task, day, isBelowFiftyVolts } = question;
  const entering = entrantsOf(question);
  const crew = answers.crew.values.map((member, index): Person => {
    const enters = entering.has(member);
    return {
      ...member,
      index,
      qualification: qualificationOf(member, day),
      nearest: enters ? 'restricted' : member.closest,
      enters,
    };
  });
  const entrants = crew.filter(({ enters }) => enters);
  const mustEnter = testerEnters(question) || task.kind === 'repair';
  return {
    crew,
    entrants,
    someoneEnters: entrants.length > 0 || (mustEnter && !isBelowFiftyVolts),
  };
}

/** What the words of a finding about a person are filled with. */
export function personParams({ index, name }: Person): Record<string, string | number> {
  return name === undefined ? { index } : { index, name };
}

/**
 * How far the person of a crew id is qualified. Someone whom the crew does not
 * list is not, unless a member still lacks an id.
 */
export function qualificationOfId(id: string, { crew }: People, isCrewAnswered: boolean) {
  const matches = crew.filter((person) => person.id === id);
  if (matches.length === 0) {
    const mayBeListed = !isCrewAnswered || crew.some((person) => person.id === undefined);
    return mayBeListed ? 'unknown' : 'no';
  }
  if (matches.some(({ qualification }) => qualification === 'no')) return 'no';
  return matches.every(({ qualification }) => qualification === 'yes') ? 'yes' : 'unknown';
}
